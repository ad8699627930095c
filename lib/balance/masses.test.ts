import { describe, expect, it } from 'vitest';
import { startFrom } from '@/lib/airframe/layouts';
import { resolve } from '@/lib/airframe/resolve';
import type { Airframe } from '@/lib/airframe/schema/airframe';
import { develop } from '@/lib/parts/develop';
import type { Development, Operation, Part, StockPiece } from '@/lib/parts/types';
import { balance } from './balance';
import { massList } from './masses';

// Two square plates, a boom pair and a spar, typed by hand: the mass list must weigh what lies there, whoever cut it.

const base = startFrom('pusher', 'Test');
const operation = (kind: Operation['kind'], path: Operation['path'], closed = false): Operation => ({
  id: kind,
  kind,
  path,
  closed,
  face: 'upper',
});
const part = (key: string, rest: Partial<Part>): Part => ({
  key,
  name: key,
  elementId: 'wing',
  side: 'stbd',
  materialId: 'board-5',
  thicknessMm: 5,
  face: 'upper',
  outline: [
    [0, 0],
    [100, 0],
    [100, 200],
    [0, 200],
  ],
  holes: [],
  operations: [],
  labels: [],
  grainDeg: null,
  frame: { origin: [40, 0, 0], ex: [1, 0, 0], ey: [0, 1, 0] },
  ...rest,
});
const piece = (key: string, rest: Partial<StockPiece>): StockPiece => ({
  key,
  name: key,
  tubeId: 'carbon-5-3',
  lengthMm: 500,
  count: 2,
  from: [40, 110, -5],
  to: [540, 110, -5],
  ...rest,
});
const development = (rest: Partial<Development>): Development => ({
  parts: [],
  stockPieces: [],
  problems: [],
  ...rest,
});

function list(made: Partial<Development>, airframe: Airframe = base) {
  const resolved = resolve(airframe);
  if (!resolved.ok) throw new RangeError('the layout resolves');
  return massList(airframe, resolved.value, development(made));
}
const group = (lines: ReturnType<typeof list>, name: string) => lines.filter((line) => line.group === name);
const sum = (lines: ReturnType<typeof list>) => lines.reduce((total, { massG }) => total + massG, 0);

describe('mass list', () => {
  it('weighs a part by its area: 2 dm2 of 320 g/m2 is 6.4 g at its middle', () => {
    const [foam] = group(list({ parts: [part('a', {})] }), 'foam');
    expect(foam?.massG).toBeCloseTo(6.4, 9);
    expect(foam?.at).toEqual([90, 100, 0]);
    expect(foam?.key).toBe('a');
  });
  it('takes holes off', () => {
    const hole = part('a', {
      holes: [
        [
          [10, 10],
          [10, 60],
          [60, 60],
          [60, 10],
        ],
      ],
    });
    const own = group(list({ parts: [hole] }), 'foam').filter(({ key }) => key === 'a');
    expect(sum(own)).toBeCloseTo(6.4 * (17500 / 20000), 9);
  });
  it('weighs glue along what is marked: 200 mm at 8 g/m', () => {
    const glued = part('a', {
      operations: [
        operation('glue', [
          [0, 0],
          [0, 200],
        ]),
      ],
    });
    const [glue] = group(list({ parts: [glued] }), 'glue');
    expect(glue?.massG).toBeCloseTo(1.6, 9);
    expect(glue?.at).toEqual([40, 100, 0]);
  });
  it('weighs glue over an area and tape by its width', () => {
    const square: Operation['path'] = [
      [0, 0],
      [100, 0],
      [100, 100],
      [0, 100],
    ];
    const both = part('a', {
      operations: [
        operation('glue', square, true),
        {
          ...operation('tape', [
            [0, 0],
            [0, 200],
          ]),
          widthMm: 25,
        },
      ],
    });
    const lines = group(list({ parts: [both] }), 'glue').filter(({ key }) => key.startsWith('a/'));
    expect(lines.map(({ key, massG }) => [key, Math.round(massG * 1e6) / 1e6])).toEqual([
      ['a/glue', 0.3],
      ['a/tape', 0.25],
    ]);
  });
  it('weighs a joint that both its parts mark once: the trainer’s wing halves meet along 190 mm', () => {
    const trainer = startFrom('trainer', 'Test');
    const made = develop(trainer);
    const marked = made.parts.flatMap(({ key, operations }) =>
      operations.filter(({ id }) => id === 'root-glue').map(() => key),
    );
    expect(marked).toEqual(['wing/p1/sheet/stbd', 'wing/p1/sheet/port']);
    const lines = list(made, trainer).filter(({ key }) => /^wing.*sheet.*glue$/.test(key));
    // Root chord 190 mm at 8 g/m; 2 degrees of dihedral a side leave its length alone.
    expect(sum(lines)).toBeCloseTo(0.19 * 8, 4);
    expect(balance(lines).cg[1]).toBeCloseTo(0, 9);
  });
  it('weighs the tape over a hinge once, though wing and aileron both show it', () => {
    const taped: Airframe = {
      ...base,
      surfaces: base.surfaces.map((surface) => ({
        ...surface,
        controls: surface.controls.map((control) => ({
          ...control,
          hinge: { ...control.hinge, kind: surface.id === 'wing' ? ('tape' as const) : control.hinge.kind },
        })),
      })),
    };
    const lines = list(develop(taped), taped).filter(({ key }) => key.endsWith('/tape'));
    expect(lines.map(({ key }) => key)).toEqual([
      'wing/p1/sheet/centre/tape',
      'wing/aileron/control/stbd/tape',
      'wing/aileron/control/port/tape',
    ]);
    // Two strips of 48 mm at 50 g/m2 along hinges 154 mm long, less the gaps at the ailerons' ends.
    expect(sum(lines)).toBeGreaterThan(2 * 0.15 * 0.048 * 50);
    expect(sum(lines)).toBeLessThan(2 * 0.155 * 0.048 * 50);
  });
  it('falls back on a share of the foam when no part marks glue', () => {
    const loose: Airframe = { ...base, joints: [] };
    expect(sum(group(list({ parts: [part('a', {})] }, loose), 'glue'))).toBeCloseTo(6.4 * 0.05, 9);
  });
  it('weighs a pair of booms on both sides, without glue along them, and a spar with it', () => {
    const spar = piece('wing/spar/tube', {
      tubeId: 'carbon-4-2',
      lengthMm: 600,
      count: 1,
      from: [57, -300, 0],
      to: [57, 300, 0],
    });
    const lines = list({ stockPieces: [piece('boom', {}), spar] });
    const tubes = group(lines, 'tube');
    expect(tubes.map(({ key, massG }) => [key, massG])).toEqual([
      ['boom/stbd', 10],
      ['boom/port', 10],
      ['wing/spar/tube', 9],
    ]);
    expect(balance(tubes).cg[1]).toBeCloseTo(0, 12);
    expect(sum(group(lines, 'glue'))).toBeCloseTo(4.8, 9);
  });
  it('covers both faces of a panel on both sides', () => {
    const covered: Airframe = {
      ...base,
      coverings: [{ id: 'film', name: 'Film', arealMassGm2: 50 }],
      surfaces: base.surfaces.map((surface, index) =>
        index === 0
          ? { ...surface, panels: surface.panels.map((panel) => ({ ...panel, coveringId: 'film' })) }
          : surface,
      ),
    };
    const lines = group(list({}, covered), 'covering');
    // 350 mm of 190 and 150 mm: 5.95 dm2 a side, two faces, two sides.
    expect(sum(lines)).toBeCloseTo(4 * 0.0595 * 50, 9);
    const { cg } = balance(lines);
    expect(cg[1]).toBeCloseTo(0, 9);
    // The quarter chord is straight at x = 47.5; the area's centre lies a quarter of its own mean chord behind it.
    const meanSquare = (190 ** 2 + 190 * 150 + 150 ** 2) / 3 / 170;
    expect(cg[0]).toBeCloseTo(47.5 + meanSquare / 4, 6);
  });
  it('puts a pusher’s motor half its length ahead of the disc, the propeller on it', () => {
    const drive = group(list({}), 'drive');
    expect(drive.map(({ key, massG, at }) => [key, massG, at[0]])).toEqual([
      ['motor/motor', 28, 192],
      ['motor/propeller', 5, 205],
    ]);
  });
  it('holds every item at its place and gear on both sides', () => {
    const geared: Airframe = {
      ...base,
      gear: [
        {
          id: 'mains',
          kind: 'wheel',
          mount: { to: 'datum', at: [40, 90, -120] },
          mirrored: true,
          wheelMm: 50,
          massG: 12,
        },
      ],
    };
    const lines = list({}, geared);
    expect(group(lines, 'item').map(({ key }) => key)).toEqual(base.items.map(({ id }) => id));
    expect(group(lines, 'gear').map(({ at }) => at)).toEqual([
      [40, 90, -120],
      [40, -90, -120],
    ]);
    expect(new Set(lines.map(({ key }) => key)).size).toBe(lines.length);
  });
  it('calls things by their kind, never by an id', () => {
    const bare: Airframe = {
      ...base,
      surfaces: base.surfaces.map(({ name: _, ...one }) => one),
      booms: base.booms.map(({ name: _, ...one }) => one),
      items: base.items.map(({ name: _, ...one }) => one),
      drives: base.drives.map(({ name: _, ...one }) => one),
    };
    const names = list(develop(bare), bare).map(({ name }) => name);
    expect(names).toEqual(expect.arrayContaining(['Servo 1', 'Controller', 'Motor, propeller', 'Boom, starboard']));
    expect(names).toContain('Wing, spar, port');
    expect(names).toContain('Pod, firewall');
    expect(new Set(names).size).toBe(names.length);
    for (const name of names) expect(name).not.toMatch(/servo-|\besc\b|\brx\b|(\b\w+\b) \1$/);
  });
  it('refuses parts of another airframe by name', () => {
    expect(() => list({ parts: [part('a', { materialId: 'cork' })] })).toThrow(/cork/);
    expect(() => list({ stockPieces: [piece('b', { tubeId: 'reed' })] })).toThrow(/reed/);
  });
});
