import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import hask from '@/examples/hask.json';
import ombry from '@/examples/ombry-1000.json';
import quenlet from '@/examples/quenlet-700.json';
import quenletLong from '@/examples/quenlet-1050.json';
import tarrel from '@/examples/tarrel-620.json';
import { startFrom, startingLayouts } from '@/lib/airframe/layouts';
import { parseAirframe } from '@/lib/airframe/parse';
import { resolve } from '@/lib/airframe/resolve';
import type { Airframe } from '@/lib/airframe/schema/airframe';
import { analyse } from '@/lib/figures/analyse';
import { lerp3, mirror3, type Vec3 } from '@/lib/numerics/vec';
import { develop } from '@/lib/parts/develop';
import { fromPart } from '@/lib/parts/shape/frame';
import { mirror2, mirrorRing } from '@/lib/parts/shape/ring';
import type { Part } from '@/lib/parts/types';
import { assertParts } from '@/lib/parts/validate';
import { aidAircraft, aidsOf, tipOf } from '@/tests/support/aids';
import { airframe, board, control, panel, surface } from '@/tests/support/airframe';
import { workshopAids } from './workshopAids';

const example = (json: unknown): Airframe => {
  const parsed = parseAirframe(json);
  if (!parsed.ok) throw new RangeError(parsed.problems[0]?.message);
  return parsed.value;
};
const EXAMPLES = [
  { name: 'hask', airframe: example(hask) },
  { name: 'ombry', airframe: example(ombry) },
  { name: 'quenlet 1050', airframe: example(quenletLong) },
  { name: 'quenlet 700', airframe: example(quenlet) },
  { name: 'tarrel', airframe: example(tarrel) },
];
const under = (parts: readonly Part[], prefix: string): Part[] => parts.filter(({ key }) => key.startsWith(prefix));

function expectMirrored(parts: readonly Part[]): void {
  for (const part of parts.filter(({ mirrorOf }) => mirrorOf !== undefined)) {
    const fellow = parts.find(({ key }) => key === part.mirrorOf);
    if (!fellow) throw new RangeError(`${part.key} mirrors nothing`);
    expect(part.outline).toEqual(mirrorRing(fellow.outline));
    for (const p of fellow.outline) {
      const [here, there] = [fromPart(part.frame, mirror2(p)), mirror3(fromPart(fellow.frame, p))];
      for (const axis of [0, 1, 2] as const) expect(here[axis]).toBeCloseTo(there[axis], 6);
    }
  }
}

/** Where there is a stand, its fingers are under the CG line and have wing above them. */
function expectUnderWing(of: Airframe, aids: readonly Part[], cgX: number): void {
  const resolved = resolve(of);
  if (!resolved.ok) throw new RangeError('the document resolves');
  for (const upright of under(aids, 'aid/cg-stand/upright/')) {
    const [x, y, z] = tipOf(upright);
    expect(Math.abs(x - cgX)).toBeLessThan(0.3);
    const above = resolved.value.surfaces
      .flatMap(({ panels }) => panels)
      .flatMap(({ root, tip }) => {
        // A pitched chord of a tilted panel leans sideways: the station is found by the point over the finger, not by its leading edge.
        let share = 0;
        let point: Vec3 = root.le;
        for (let i = 0; i < 60; i++) {
          const [le, te] = [lerp3(root.le, tip.le, share), lerp3(root.te, tip.te, share)];
          point = lerp3(le, te, (x - le[0]) / (te[0] - le[0]));
          share += (Math.abs(y) - point[1]) / (tip.le[1] - root.le[1]);
        }
        const [front, back] = [
          root.le[0] + (tip.le[0] - root.le[0]) * share,
          root.te[0] + (tip.te[0] - root.te[0]) * share,
        ];
        return share > -1e-6 && share < 1 + 1e-6 && x > front && x < back ? [point] : [];
      });
    expect(above.length).toBeGreaterThan(0);
    // Half a sheet under the chord, more where it is tilted.
    expect(Math.max(...above.map((p) => p[2])) - z).toBeGreaterThan(0.9);
  }
}

describe.each(EXAMPLES)('the aids of $name', ({ airframe }) => {
  const figures = analyse(airframe, { depth: 'full' });
  const parts = develop(airframe).parts;
  const aids = workshopAids({ airframe, parts, firstFlightCgXMm: figures.marks.firstFlightCgXMm });

  it('can be cut, share no key and are no parts of the aircraft', () => {
    assertParts(aids);
    const own = new Set(parts.map(({ key }) => key));
    expect(aids.filter(({ key }) => own.has(key) || !key.startsWith('aid/'))).toEqual([]);
    expect(new Set(aids.map(({ materialId }) => materialId)).size).toBe(1);
    for (const { labels, name, key } of aids) {
      const texts = labels.map(({ text }) => text);
      expect(texts, key).toContain(name);
      expect(texts.join(' ').replaceAll(' · ', ' '), key).toContain('gauge, not a part of the aircraft');
      expect(texts.length, key).toBeGreaterThan(2);
    }
  });

  it('are as many as the aircraft needs', () => {
    expect(under(aids, 'aid/cg-stand/').map(({ key }) => key)).toEqual([
      'aid/cg-stand/upright/stbd',
      'aid/cg-stand/upright/port',
      'aid/cg-stand/base/centre',
      'aid/cg-stand/marker/centre',
    ]);
    const controls = airframe.surfaces.flatMap((one) =>
      one.controls.map(({ id }) => `aid/throw/${one.id}/${id}/centre`),
    );
    expect(under(aids, 'aid/throw/').map(({ key }) => key)).toEqual(controls);
    expect(under(aids, 'aid/boom-jig/').length).toBe(airframe.booms.some(({ mirrored }) => mirrored) ? 2 : 0);
    const flying = airframe.surfaces.filter(({ role }) => role !== 'fin' && role !== 'tipFin');
    const usual = under(aids, 'aid/incidence/').filter(({ key }) => !/-(tip|decalage)\//.test(key));
    expect(usual.map(({ key }) => key)).toEqual(flying.map(({ id }) => `aid/incidence/${id}/centre`));
  });

  it('come in true pairs', () => expectMirrored(aids));

  it('carry the aircraft on its CG line', () => {
    expectUnderWing(airframe, aids, figures.marks.firstFlightCgXMm ?? Number.NaN);
  });
});

it.each(startingLayouts)('$id: an aircraft just begun has aids that can be cut', ({ id }) => {
  const begun = startFrom(id, 'Test');
  const aids = aidsOf(begun, analyse(begun, { depth: 'full' }).marks.firstFlightCgXMm);
  assertParts(aids);
  expect(under(aids, 'aid/incidence/').length).toBeGreaterThan(0);
});

describe('what an aircraft does not need', () => {
  it('has no stand without a first-flight CG, or where the line passes under no wing', () => {
    expect(under(aidsOf(aidAircraft(), null), 'aid/cg-stand/')).toEqual([]);
    expect(under(aidsOf(aidAircraft(), 900), 'aid/cg-stand/')).toEqual([]);
    expect(under(aidsOf(aidAircraft(), 60), 'aid/cg-stand/')).toHaveLength(4);
  });
  it('has no jig without booms, no prop without dihedral, no gauge without controls', () => {
    const plain = aidsOf(airframe(), 60);
    expect(plain.map(({ key }) => key.split('/')[1])).not.toContain('boom-jig');
    expect(plain.map(({ key }) => key.split('/')[1])).not.toContain('dihedral');
    expect(plain.map(({ key }) => key.split('/')[1])).not.toContain('throw');
    const full = new Set(aidsOf(aidAircraft(), 60).map(({ key }) => key.split('/')[1]));
    expect([...full].sort()).toEqual(['bevel', 'boom-jig', 'cg-stand', 'dihedral', 'incidence', 'throw']);
  });
});

describe('any wing', () => {
  const wing = fc.record({
    thicknessMm: fc.double({ min: 2, max: 12, noNaN: true }),
    rootChordMm: fc.double({ min: 90, max: 500, noNaN: true }),
    tipChordMm: fc.double({ min: 60, max: 500, noNaN: true }),
    lengthMm: fc.double({ min: 150, max: 900, noNaN: true }),
    sweepDeg: fc.double({ min: -20, max: 40, noNaN: true }),
    dihedralDeg: fc.double({ min: -20, max: 45, noNaN: true }),
    washoutDeg: fc.constantFrom(0, -2, 3),
    incidenceDeg: fc.double({ min: -6, max: 6, noNaN: true }),
    section: fc.constantFrom('flat' as const, 'folded' as const),
    up: fc.double({ min: 1, max: 75, noNaN: true }),
    down: fc.double({ min: 0, max: 75, noNaN: true }),
    neutralDeg: fc.double({ min: -20, max: 20, noNaN: true }),
    chordShare: fc.double({ min: 0.05, max: 0.6, noNaN: true }),
    from: fc.double({ min: 0, max: 0.6, noNaN: true }),
    to: fc.double({ min: 0.65, max: 1, noNaN: true }),
    cgShare: fc.double({ min: -0.2, max: 1, noNaN: true }),
  });
  it('has aids that can be cut, in true pairs', () => {
    fc.assert(
      fc.property(
        wing,
        ({ thicknessMm, incidenceDeg, up, down, neutralDeg, chordShare, from, to, cgShare, ...shape }) => {
          const section =
            shape.section === 'flat'
              ? ({ kind: 'flat' } as const)
              : ({ kind: 'folded', thicknessShare: 0.1, maxAt: 0.3, lowerTo: 1, webAt: 0.3 } as const);
          const of = airframe({
            materials: [board({ thicknessMm })],
            surfaces: [
              surface({
                incidenceDeg,
                panels: [panel({ ...shape, section })],
                controls: [
                  control({
                    from,
                    to,
                    neutralDeg,
                    chordShare: [chordShare, chordShare],
                    throwsDeg: { up, down, lowShare: 0.6 },
                  }),
                ],
              }),
            ],
          });
          const aids = aidsOf(of, cgShare * shape.rootChordMm);
          assertParts(aids);
          expectMirrored(aids);
          expectUnderWing(of, aids, cgShare * shape.rootChordMm);
        },
      ),
      { numRuns: 150 },
    );
  });
});
