import { describe, expect, it } from 'vitest';
import { startFrom, startingLayouts } from '@/lib/airframe/layouts';
import { resolve } from '@/lib/airframe/resolve';
import type { Airframe } from '@/lib/airframe/schema/airframe';
import type { Body } from '@/lib/airframe/schema/fuselage';
import type { Vec2 } from '@/lib/numerics/vec';
import { develop, developResolved } from '@/lib/parts/develop';
import type { Operation, Part } from '@/lib/parts/types';
import { massList } from './masses';
import { partMasses } from './partMasses';

// Sheet that is folded weighs where it stands folded, not where the flat sheet would stick out.

const trainer = startFrom('trainer', 'Test');
const pusher = startFrom('pusher', 'Test');

function foam(airframe: Airframe) {
  const resolved = resolve(airframe);
  if (!resolved.ok) throw new RangeError('the layout resolves');
  const development = develop(airframe);
  expect(development.problems).toEqual([]);
  return {
    resolved: resolved.value,
    parts: development.parts,
    lines: massList(airframe, resolved.value, development).filter(({ group }) => group === 'foam'),
  };
}

const withBody = (airframe: Airframe, change: (body: Body) => Body): Airframe => ({
  ...airframe,
  bodies: airframe.bodies.map(change),
});

describe('a strip folded once', () => {
  const fold = (rest: Partial<Operation>): Operation => ({
    id: 'fold',
    kind: 'crease',
    path: [
      [100, 0],
      [100, 100],
    ],
    closed: false,
    face: 'upper',
    angleDeg: 90,
    ...rest,
  });
  const strip = (rest: Partial<Part>): Part => ({
    key: 'wing/strip/centre',
    name: 'Strip',
    elementId: 'wing',
    side: 'centre',
    materialId: 'board-5',
    thicknessMm: 5,
    face: 'upper',
    outline: [
      [0, 0],
      [200, 0],
      [200, 100],
      [0, 100],
    ],
    holes: [],
    operations: [fold({})],
    labels: [],
    grainDeg: null,
    frame: { origin: [0, 0, 0], ex: [1, 0, 0], ey: [0, 1, 0] },
    ...rest,
  });
  const at = (part: Part) => partMasses(pusher, [part])[0]?.foam;
  // Half stays, its middle at (50, 50, 0). The other half turns about the face left whole, 2.5 mm from the middle of the
  // sheet: its middle, 50 mm beyond the fold, comes to 2.5 mm short of the fold and 47.5 mm to the side it closes.
  it('closes the face it is worked from', () => {
    expect(at(strip({}))?.at.map((v) => Math.round(v * 1e9) / 1e9)).toEqual([73.75, 50, 23.75]);
    expect(at(strip({ operations: [fold({ face: 'lower' })] }))?.at[2]).toBeCloseTo(-23.75, 9);
    expect(at(strip({ operations: [fold({ angleDeg: -90 })] }))?.at.map((v) => Math.round(v * 1e9) / 1e9)).toEqual([
      76.25, 50, -26.25,
    ]);
  });
  it('leaves the half with the first corner where the frame says', () => {
    const outline: Vec2[] = [
      [200, 0],
      [200, 100],
      [0, 100],
      [0, 0],
    ];
    expect(at(strip({ outline }))?.at.map((v) => Math.round(v * 1e9) / 1e9)).toEqual([126.25, 50, 23.75]);
  });
  it('takes an opening across the fold off both halves', () => {
    const hole: Vec2[] = [
      [80, 20],
      [80, 80],
      [140, 80],
      [140, 20],
    ];
    const parted = [
      fold({
        path: [
          [100, 0],
          [100, 20],
        ],
      }),
      fold({
        id: 'fold-2',
        path: [
          [100, 80],
          [100, 100],
        ],
      }),
    ];
    const line = at(strip({ holes: [hole], operations: parted }));
    // 20 000 less 3600 mm2 of 320 g/m2; along the strip the first half holds 10 000 x 50 less 1200 x 90.
    expect(line?.massG).toBeCloseTo(16_400 * 320e-6, 9);
    const second = 10_000 - 2400;
    const height = -2.5 + (10_000 * 50 - 2400 * 20) / second;
    expect(line?.at[0]).toBeCloseTo((10_000 * 50 - 1200 * 90 + second * 97.5) / 16_400, 9);
    expect(line?.at[2]).toBeCloseTo((second * height) / 16_400, 9);
  });
});

describe('bodies', () => {
  it.each(startingLayouts)('$id: every sheet of a body weighs inside the body', ({ id }) => {
    const airframe = startFrom(id, 'Test');
    const { resolved, parts, lines } = foam(airframe);
    for (const body of airframe.bodies) {
      const [x = 0, y = 0, z = 0] = resolved.places.get(body.id)?.at ?? [];
      const stations = (pick: (s: Body['stations'][number]) => number) => body.stations.map(pick);
      const box = [
        [x + Math.min(...stations((s) => s.xMm)), x + Math.max(...stations((s) => s.xMm))],
        [y - Math.max(...stations((s) => s.widthMm)) / 2, y + Math.max(...stations((s) => s.widthMm)) / 2],
        [z + Math.min(...stations((s) => s.bottomMm)), z + Math.max(...stations((s) => s.topMm))],
      ];
      const own = parts.filter(({ key }) => key.startsWith(`${body.id}/`)).map(({ key }) => key);
      expect(own.length).toBeGreaterThan(3);
      for (const line of lines.filter(({ key }) => own.includes(key)))
        for (const [axis, [low = 0, high = 0]] of box.entries()) {
          expect(line.at[axis], `${line.key} ${axis}`).toBeGreaterThan(low);
          expect(line.at[axis], `${line.key} ${axis}`).toBeLessThan(high);
        }
    }
  });
  it('a body that is the same upside down weighs the same in its top and its bottom, at mirrored heights', () => {
    const even = withBody(trainer, (body) => ({
      ...body,
      openings: [],
      stations: body.stations.map((s) => ({
        ...s,
        topMm: (s.topMm - s.bottomMm) / 2,
        bottomMm: (s.bottomMm - s.topMm) / 2,
      })),
    }));
    const { lines } = foam(even);
    const [top, bottom] = ['body/top/centre', 'body/bottom/centre'].map((key) =>
      lines.find((line) => line.key === key),
    );
    const place = foam(even).resolved.places.get('body')?.at ?? [0, 0, 0];
    expect(top?.massG).toBeCloseTo(bottom?.massG ?? 0, 9);
    expect(top?.at[0]).toBeCloseTo(bottom?.at[0] ?? 0, 9);
    expect((top?.at[2] ?? 0) - place[2]).toBeCloseTo(place[2] - (bottom?.at[2] ?? 0), 9);
    expect((top?.at[2] ?? 0) - place[2]).toBeGreaterThan(10);
  });
  it('weighs its two sides at mirrored places', () => {
    const { lines } = foam(trainer);
    const [stbd, port] = ['body/side/stbd', 'body/side/port'].map((key) => lines.find((line) => line.key === key));
    expect(port?.at[1]).toBeCloseTo(-(stbd?.at[1] ?? 0), 9);
    expect(port?.at[0]).toBeCloseTo(stbd?.at[0] ?? 0, 9);
  });
  it('weighs no more folded than flat', () => {
    const { parts, lines } = foam(trainer);
    const unfolded = parts.map((part) => ({
      ...part,
      operations: part.operations.map((operation) =>
        operation.kind === 'crease' || operation.kind === 'cutToPaper'
          ? { ...operation, kind: 'reference' as const }
          : operation,
      ),
    }));
    const grooved = parts.some(({ operations }) => operations.some(({ id }) => /^fold-.*bevel/.test(id)));
    expect(grooved).toBe(false);
    const total = (list: readonly { massG: number }[]) => list.reduce((sum, { massG }) => sum + massG, 0);
    expect(total(lines)).toBeCloseTo(total(partMasses(trainer, unfolded).map(({ foam }) => foam)), 9);
  });
});

describe('parts with and without marks', () => {
  it.each(startingLayouts)('$id: weigh the same', ({ id }) => {
    const airframe = startFrom(id, 'Test');
    const resolved = resolve(airframe);
    if (!resolved.ok) throw new RangeError('the layout resolves');
    const plain = massList(airframe, resolved.value, developResolved(airframe, resolved.value));
    expect(plain).toEqual(massList(airframe, resolved.value, develop(airframe)));
  });
});

describe('controls at rest', () => {
  const withNeutral = (neutralDeg: number, endGapMm: number): Airframe => ({
    ...pusher,
    surfaces: pusher.surfaces.map((surface) => ({
      ...surface,
      controls: surface.controls.map((control) => ({
        ...control,
        endGapMm,
        neutralDeg: surface.id === 'wing' ? neutralDeg : 0,
        throwsDeg: { ...control.throwsDeg, up: 5, down: 5 },
      })),
    })),
  });
  it.each([0, 1.5])('a hinged control set down weighs below its wing, with end gaps of %s mm', (gap) => {
    const wing = (neutralDeg: number) =>
      foam(withNeutral(neutralDeg, gap)).lines.find(({ key }) => key.startsWith('wing/'));
    const [down, level, up] = [wing(8), wing(0), wing(-8)];
    expect(down?.massG).toBeCloseTo(level?.massG ?? 0, 9);
    // Both ailerons are 154 mm long and a share of the chord wide; their middles go half of that times sin(8 degrees).
    const control = pusher.surfaces[0]?.controls[0];
    const [inner = 0, outer = 0] = control?.chordShare ?? [];
    const chord = (160 * (inner + outer)) / 2;
    const share = (2 * 154 * chord) / (2 * 350 * 170);
    const drop = share * (chord / 2) * Math.sin((8 * Math.PI) / 180);
    expect((level?.at[2] ?? 0) - (down?.at[2] ?? 0)).toBeGreaterThan(drop * 0.94);
    expect((level?.at[2] ?? 0) - (down?.at[2] ?? 0)).toBeLessThan(drop * 1.06);
    expect(up?.at[2]).toBeGreaterThan(level?.at[2] ?? 0);
  });
});
