import { describe, expect, it } from 'vitest';
import { resolve } from '@/lib/airframe/resolve';
import type { ResolvedAirframe } from '@/lib/airframe/resolved';
import type { Airframe } from '@/lib/airframe/schema/airframe';
import { add3, radFromDeg, scale3, type Vec2, type Vec3 } from '@/lib/numerics/vec';
import { develop } from '@/lib/parts/develop';
import type { Part } from '@/lib/parts/types';
import { assertParts } from '@/lib/parts/validate';
import { airframe, board, boom, control, panel, surface } from '@/tests/support/airframe';
import { refold, TOLERANCE_MM, type Wanted } from '@/tests/support/refold/check';
import { apart, place } from '@/tests/support/refold/solid';
import {
  type ControlPlan,
  fromBelow,
  onBothSides,
  onPort,
  wantedControl,
  wantedSheet,
} from '@/tests/support/refold/wanted';

// Parts are folded up and laid on the lattice's mean surface from their outlines, fold lines, bevels and thickness alone.

const INSIDE: ControlPlan = { free: [false, false], separate: false };
const TO_TIP: ControlPlan = { free: [false, true], separate: false };
const WHOLE: ControlPlan = { free: [true, true], separate: false };
const apartFrom = (plan: ControlPlan): ControlPlan => ({ ...plan, separate: true });

const straight = airframe({ surfaces: [surface({ controls: [control()] })] });

const trainer = airframe({
  surfaces: [
    surface({
      incidenceDeg: 1,
      panels: [
        panel({ lengthMm: 280, rootChordMm: 210, tipChordMm: 205, sweepDeg: 2, dihedralDeg: 2 }),
        panel({ id: 'p2', lengthMm: 220, rootChordMm: 205, tipChordMm: 130, sweepDeg: 12, dihedralDeg: 5 }),
      ],
      controls: [
        control({
          id: 'flap',
          kind: 'flap',
          from: 0,
          to: 0.4,
          chordShare: [0.2, 0.2],
          mix: { pitch: 0, roll: 0, yaw: 0, flap: 1 },
        }),
        control({ from: 0.6, to: 1, neutralDeg: -3 }),
      ],
    }),
    surface({
      id: 'fin',
      role: 'fin',
      mount: { to: 'datum', at: [520, 0, 8] },
      mirrored: false,
      cantDeg: 90,
      panels: [panel({ lengthMm: 140, rootChordMm: 120, tipChordMm: 70, sweepDeg: 25 })],
      controls: [
        control({
          id: 'rudder',
          kind: 'rudder',
          from: 0,
          to: 1,
          chordShare: [0.4, 0.4],
          neutralDeg: 2,
          hinge: { kind: 'tape', side: 'upper', bevelDeg: [40, 40] },
        }),
      ],
    }),
  ],
});

const twinBoom = airframe({
  surfaces: [
    surface({
      panels: [
        panel({ lengthMm: 200, rootChordMm: 190, tipChordMm: 180, sweepDeg: 1 }),
        panel({ id: 'p2', lengthMm: 110, rootChordMm: 180, tipChordMm: 120, sweepDeg: 9 }),
      ],
      controls: [control({ from: 0.7, to: 0.96, hinge: { kind: 'paper', side: 'lower', bevelDeg: [35, 0] } })],
    }),
    surface({
      id: 'tail',
      role: 'tailplane',
      mount: { to: 'boom', at: [-95, -100, 6], end: 'aft' },
      panels: [panel({ lengthMm: 100, rootChordMm: 95, tipChordMm: 95 })],
      controls: [
        control({
          id: 'elevator',
          kind: 'elevator',
          from: 0,
          to: 1,
          chordShare: [0.35, 0.35],
          neutralDeg: 4,
          mix: { pitch: 1, roll: 0, yaw: 0, flap: 0 },
        }),
      ],
    }),
    surface({
      id: 'fin',
      role: 'fin',
      mount: { to: 'boom', at: [-90, 0, 4], end: 'aft' },
      cantDeg: 90,
      panels: [panel({ lengthMm: 95, rootChordMm: 90, tipChordMm: 55, sweepDeg: 20 })],
      controls: [
        control({
          id: 'rudder',
          kind: 'rudder',
          from: 0.1,
          to: 0.9,
          chordShare: [0.3, 0.4],
          mix: { pitch: 0, roll: 0, yaw: 1, flap: 0 },
        }),
      ],
    }),
  ],
  booms: [boom({ mount: { to: 'datum', at: [40, 100, -4] } })],
});

const vtail = airframe({
  surfaces: [
    surface({
      id: 'vtail',
      role: 'vtail',
      mount: { to: 'datum', at: [400, 0, 0] },
      cantDeg: 35,
      panels: [panel({ lengthMm: 160, rootChordMm: 110, tipChordMm: 80, sweepDeg: 10 })],
      controls: [control({ id: 'rv', kind: 'ruddervator', from: 0.15, to: 1, chordShare: [0.35, 0.35] })],
    }),
  ],
});

const delta = airframe({
  materials: [board({ sheets: [{ wMm: 500, hMm: 400 }] })],
  surfaces: [
    surface({
      panels: [panel({ lengthMm: 300, rootChordMm: 340, tipChordMm: 90, sweepDeg: 33 })],
      controls: [
        control({
          id: 'elevon',
          kind: 'elevon',
          from: 0.1,
          to: 1,
          chordShare: [0.15, 0.4],
          neutralDeg: -2.5,
          hinge: { kind: 'flexible', side: 'upper', bevelDeg: [0, 0] },
        }),
      ],
    }),
  ],
});

const tipsUp = airframe({
  surfaces: [
    surface({
      panels: [
        panel({ lengthMm: 220, rootChordMm: 180, tipChordMm: 170, sweepDeg: 2 }),
        panel({ id: 'p2', lengthMm: 130, rootChordMm: 170, tipChordMm: 110, sweepDeg: 8, dihedralDeg: 14 }),
      ],
      controls: [control({ from: 0.7, to: 0.95 })],
    }),
  ],
});

interface Case {
  readonly name: string;
  readonly airframe: Airframe;
  readonly plans: Readonly<Record<string, Readonly<Record<string, ControlPlan>>>>;
}

const cases: Case[] = [
  { name: 'straight wing in one piece', airframe: straight, plans: { wing: { aileron: INSIDE } } },
  {
    name: 'tapered, swept wing of two panels with dihedral, upright fin',
    airframe: trainer,
    plans: { wing: { flap: INSIDE, aileron: TO_TIP }, fin: { rudder: apartFrom(WHOLE) } },
  },
  {
    name: 'twin booms with tailplane and mirrored fins',
    airframe: twinBoom,
    plans: { wing: { aileron: INSIDE }, tail: { elevator: WHOLE }, fin: { rudder: INSIDE } },
  },
  { name: 'flat middle with tips turned up', airframe: tipsUp, plans: { wing: { aileron: INSIDE } } },
  { name: 'V-tail', airframe: vtail, plans: { vtail: { rv: TO_TIP } } },
  { name: 'swept wing in halves with elevons up', airframe: delta, plans: { wing: { elevon: TO_TIP } } },
];

const resolvedOf = (document: Airframe): ResolvedAirframe => {
  const resolved = resolve(document);
  if (!resolved.ok) throw new RangeError(JSON.stringify(resolved.problems));
  return resolved.value;
};

/** What a part must be, by its key alone: surface, panels or control, side. */
function wantedFor({ key, face }: Part, resolved: ResolvedAirframe, plans: Case['plans']): Wanted {
  const [surfaceId = '', what = '', kind, side] = key.split('/');
  const own = plans[surfaceId] ?? {};
  const mirrored = resolved.surfaces.find(({ surface: { id } }) => id === surfaceId)?.surface.mirrored ?? false;
  const plan = own[what];
  const half =
    kind === 'control' && plan
      ? wantedControl(resolved, surfaceId, what, plan)
      : wantedSheet(resolved, surfaceId, what.split('+'), own);
  const placed = side === 'port' ? onPort(half) : side === 'centre' && mirrored ? onBothSides(half) : half;
  return face === 'lower' ? fromBelow(placed) : placed;
}

const checked = ({ airframe: document, plans }: Case) => {
  const resolved = resolvedOf(document);
  const { parts, problems } = develop(document);
  return { parts, problems, wanted: (part: Part) => wantedFor(part, resolved, plans) };
};

const moved = (ring: readonly Vec2[], index: number, by: Vec2): Vec2[] =>
  ring.map((p, i): Vec2 => (i === index ? [p[0] + by[0], p[1] + by[1]] : p));

describe.each(cases)('$name', (entry) => {
  const { parts, problems, wanted } = checked(entry);

  it('develops without a problem into parts that can be cut', () => {
    expect(problems).toEqual([]);
    expect(() => assertParts(parts)).not.toThrow();
    expect(parts.length).toBeGreaterThan(0);
  });

  it.each(parts.map((part) => ({ key: part.key, part })))('$key lies on the surface when folded up', ({ part }) => {
    const result = refold(part, wanted(part));
    expect(result.faults).toEqual([]);
    expect(result.worstMm.off).toBeLessThanOrEqual(TOLERANCE_MM);
    expect(result.worstMm.bare).toBeLessThanOrEqual(TOLERANCE_MM);
  });

  it.each(parts.map((part) => ({ key: part.key, part })))('$key says where it stands', ({ part }) => {
    const { placement, facets } = refold(part, wanted(part));
    if (!placement) throw new RangeError('not placed');
    const { origin, ex, ey } = part.frame;
    const off = (facets[0] ?? []).map((p) => {
      const said: Vec3 = add3(origin, add3(scale3(ex, p[0]), scale3(ey, p[1])));
      return apart(said, place(placement, p));
    });
    expect(Math.max(...off)).toBeLessThanOrEqual(TOLERANCE_MM);
  });

  it('reports half a millimetre planted at any corner of the surface', () => {
    // A mirrored part is checked through its fellow.
    for (const part of parts.filter(({ mirrorOf }) => !mirrorOf)) {
      const target = wanted(part);
      const { placement } = refold(part, target);
      if (!placement) throw new RangeError('not placed');
      const isCorner = (p: Vec2): boolean =>
        target.corners.some((corner) => apart(place(placement, [p[0], p[1], 0]), corner) < 0.4);
      for (const [index, p] of part.outline.entries()) {
        if (!isCorner(p)) continue;
        for (const angle of [0, 45, 90, 135, 180, 225, 270, 315]) {
          const by: Vec2 = [0.5 * Math.cos(radFromDeg(angle)), 0.5 * Math.sin(radFromDeg(angle))];
          const faults = refold({ ...part, outline: moved(part.outline, index, by) }, target).faults;
          expect({ key: part.key, index, angle, faults }).toMatchObject({
            faults: expect.arrayContaining([expect.any(String)]),
          });
        }
      }
    }
  });
});

describe('what else is wrong with a part is reported', () => {
  const of = (entry: Case | undefined, key: string): { part: Part; wanted: Wanted } => {
    if (!entry) throw new RangeError('no such case');
    const { parts, wanted } = checked(entry);
    const part = parts.find((candidate) => candidate.key === key);
    if (!part) throw new RangeError(`no part ${key}`);
    expect(refold(part, wanted(part)).faults).toEqual([]);
    return { part, wanted: wanted(part) };
  };
  const turned = (part: Part, kind: string, byDeg: number): Part => ({
    ...part,
    operations: part.operations.map((op) =>
      op.kind === kind && op.angleDeg !== undefined ? { ...op, angleDeg: op.angleDeg + byDeg } : op,
    ),
  });

  it('a fold that leaves the trailing edge half a millimetre out', () => {
    const { part, wanted } = of(cases[2], 'tail/p1/sheet/centre');
    // The elevator is 0.35 of 95 mm deep: 0.9 degrees move its edge by 0.52 mm.
    expect(refold(turned(part, 'cutToPaper', 0.9), wanted).faults).not.toEqual([]);
    expect(refold(turned(part, 'cutToPaper', -0.9), wanted).faults).not.toEqual([]);
  });

  it('a bevel at the wrong angle', () => {
    const { part, wanted } = of(cases[4], 'vtail/p1/sheet/stbd');
    // 5 mm board at 35 degrees loses 1.75 mm at its middle; at 28 degrees 1.33 mm.
    expect(refold(turned(part, 'bevel', -7), wanted).faults).not.toEqual([]);
  });

  it('a part that is not mirrored, and one drawn on the wrong face', () => {
    const { part, wanted } = of(cases[1], 'wing/p2/sheet/port');
    const starboard = of(cases[1], 'wing/p2/sheet/stbd').part;
    expect(refold(starboard, wanted).faults).not.toEqual([]);
    expect(refold(part, fromBelow(wanted)).faults).not.toEqual([]);
  });

  it('a frame that is half a millimetre out', () => {
    const { part, wanted } = of(cases[2], 'fin/p1/sheet/port');
    const { placement, facets } = refold(part, wanted);
    if (!placement) throw new RangeError('not placed');
    const origin = add3(part.frame.origin, [0.5, 0, 0]);
    const off = (facets[0] ?? []).map((p) =>
      apart(add3(origin, add3(scale3(part.frame.ex, p[0]), scale3(part.frame.ey, p[1]))), place(placement, p)),
    );
    expect(Math.max(...off)).toBeGreaterThan(TOLERANCE_MM);
  });
});
