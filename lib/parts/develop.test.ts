import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { resolve } from '@/lib/airframe/resolve';
import type { Airframe } from '@/lib/airframe/schema/airframe';
import { add3, cross3, length3, lerp3, mirror3, scale3, sub3, type Vec2, type Vec3 } from '@/lib/numerics/vec';
import { airframe, board, boom, control, panel, surface } from '@/tests/support/airframe';
import { middleOutline } from '@/tests/support/refold/fold';
import { develop } from './develop';
import type { Part } from './types';
import { assertParts } from './validate';

const area = (ring: readonly Vec2[]): number =>
  ring.reduce((sum, [x, y], i) => {
    const [u, v] = ring[(i + 1) % ring.length] ?? [x, y];
    return sum + (x * v - u * y) / 2;
  }, 0);

const triangle = (a: Vec3, b: Vec3, c: Vec3): number => length3(cross3(sub3(b, a), sub3(c, a))) / 2;
const quad = (a: Vec3, b: Vec3, c: Vec3, d: Vec3): number => triangle(a, b, c) + triangle(a, c, d);

const resolved = (document: Airframe) => {
  const result = resolve(document);
  if (!result.ok) throw new RangeError(JSON.stringify(result.problems));
  return result.value;
};

/** Area of all surfaces, both sides, less the end gaps of controls that stop inside the sheet. */
function surfaceArea(document: Airframe): number {
  const { surfaces, controls } = resolved(document);
  return surfaces.reduce((sum, { surface: { id, mirrored }, panels, lengthMm }) => {
    const sheet = panels.reduce((total, { root, tip }) => total + quad(root.le, root.te, tip.te, tip.le), 0);
    const gaps = controls
      .filter(({ surfaceId }) => surfaceId === id)
      .reduce((total, { control: { from, to, endGapMm }, inner, outer, hingeInner, hingeOuter }) => {
        const share = endGapMm / ((to - from) * lengthMm);
        const strip = (a: number, b: number): number =>
          quad(
            lerp3(hingeInner, hingeOuter, a),
            lerp3(inner.te, outer.te, a),
            lerp3(inner.te, outer.te, b),
            lerp3(hingeInner, hingeOuter, b),
          );
        return total + (from > 0 ? strip(0, share) : 0) + (to < 1 ? strip(1 - share, 1) : 0);
      }, 0);
    return sum + (mirrored ? 2 : 1) * (sheet - gaps);
  }, 0);
}

const partArea = (parts: readonly Part[]): number =>
  parts.reduce(
    (sum, part) => sum + area(middleOutline(part)) + part.holes.reduce((holes, hole) => holes + area(hole), 0),
    0,
  );

const inSpace = ({ outline, frame: { origin, ex, ey } }: Part): Vec3[] =>
  outline.map(([x, y]) => add3(origin, add3(scale3(ex, x), scale3(ey, y))));

const chord = fc.double({ min: 80, max: 260, noNaN: true });
const anyWing = fc
  .record({
    chords: fc.tuple(chord, chord, chord),
    lengths: fc.tuple(fc.double({ min: 90, max: 300, noNaN: true }), fc.double({ min: 60, max: 200, noNaN: true })),
    sweep: fc.tuple(fc.double({ min: -15, max: 35, noNaN: true }), fc.double({ min: -15, max: 35, noNaN: true })),
    // Panels that are nearly flat are cut as one flat piece, which takes a share of 1e-6 off; from 1 degree on they are not.
    dihedral: fc.tuple(fc.double({ min: 1, max: 8, noNaN: true }), fc.double({ min: 9, max: 20, noNaN: true })),
    flat: fc.boolean(),
    hinge: fc.constantFrom('paper', 'tape' as const),
    ends: fc.tuple(fc.double({ min: 0.1, max: 0.4, noNaN: true }), fc.double({ min: 0.6, max: 1, noNaN: true })),
    share: fc.tuple(fc.double({ min: 0.15, max: 0.4, noNaN: true }), fc.double({ min: 0.15, max: 0.4, noNaN: true })),
  })
  .map(({ chords, lengths, sweep, dihedral, flat, hinge, ends, share }) => {
    const whole = lengths[0] + lengths[1];
    // The control lies on the outer panel, between two shares of that panel's own length.
    const at = (t: number): number => (lengths[0] + lengths[1] * t) / whole;
    const to = ends[1] > 0.95 ? 1 : at(ends[1]);
    return airframe({
      surfaces: [
        surface({
          panels: [
            panel({
              lengthMm: lengths[0],
              rootChordMm: chords[0],
              tipChordMm: chords[1],
              sweepDeg: sweep[0],
              dihedralDeg: flat ? 0 : dihedral[0],
            }),
            panel({
              id: 'p2',
              lengthMm: lengths[1],
              rootChordMm: chords[1],
              tipChordMm: chords[2],
              sweepDeg: sweep[1],
              dihedralDeg: flat ? 0 : dihedral[1],
            }),
          ],
          controls: [
            control({
              from: at(ends[0]),
              to,
              chordShare: [share[0], share[1]],
              hinge: {
                kind: hinge === 'tape' ? 'tape' : 'paper',
                side: 'upper',
                bevelDeg: hinge === 'tape' ? [40, 40] : [0, 40],
              },
            }),
          ],
        }),
      ],
    });
  });

describe('develop', () => {
  it('gives parts that can be cut, whose area is the surface less its gaps', () => {
    fc.assert(
      fc.property(anyWing, (document) => {
        const { parts, problems } = develop(document);
        expect(problems).toEqual([]);
        assertParts(parts);
        expect(partArea(parts) / surfaceArea(document)).toBeCloseTo(1, 6);
      }),
      { numRuns: 150 },
    );
  });

  it('gives every starboard part a true mirror on the port side', () => {
    fc.assert(
      fc.property(anyWing, (document) => {
        const { parts } = develop(document);
        const byKey = new Map(parts.map((part) => [part.key, part]));
        for (const part of parts) {
          if (part.side === 'centre') continue;
          const other = byKey.get(
            part.side === 'port' ? part.key.replace(/port$/, 'stbd') : part.key.replace(/stbd$/, 'port'),
          );
          expect(other).toBeDefined();
          if (!other || part.side !== 'port') continue;
          expect(part.mirrorOf).toBe(other.key);
          const there = inSpace(other).map(mirror3);
          for (const p of inSpace(part)) expect(Math.min(...there.map((q) => length3(sub3(p, q))))).toBeLessThan(1e-9);
          expect(area(part.outline)).toBeCloseTo(area(other.outline), 9);
        }
      }),
      { numRuns: 60 },
    );
  });

  it('cuts the same pieces when a panel is drawn as two', () => {
    fc.assert(
      fc.property(
        chord,
        chord,
        fc.double({ min: -10, max: 30, noNaN: true }),
        fc.double({ min: 0.1, max: 0.9, noNaN: true }),
        (root, tip, sweepDeg, t) => {
          const middle = root + (tip - root) * t;
          const one = [panel({ rootChordMm: root, tipChordMm: tip, sweepDeg })];
          const two = [
            panel({ lengthMm: 310 * t, rootChordMm: root, tipChordMm: middle, sweepDeg }),
            panel({ id: 'p2', lengthMm: 310 * (1 - t), rootChordMm: middle, tipChordMm: tip, sweepDeg }),
          ];
          const [whole, split] = [one, two].map(
            (panels) => develop(airframe({ surfaces: [surface({ panels })] })).parts,
          );
          expect(split?.length).toBe(whole?.length);
          expect(partArea(split ?? []) / partArea(whole ?? [])).toBeCloseTo(1, 9);
          expect(split?.[0]?.outline.length).toBe(whole?.[0]?.outline.length);
        },
      ),
      { numRuns: 60 },
    );
  });

  it('is the same every time', () => {
    const document = airframe({ surfaces: [surface({ controls: [control()] })], booms: [boom()] });
    expect(develop(structuredClone(document))).toEqual(develop(document));
  });

  it('cuts a tailplane in one piece when a sheet holds it, and in halves with a glued edge when none does', () => {
    const tail = surface({
      id: 'tail',
      role: 'tailplane',
      panels: [panel({ lengthMm: 240, rootChordMm: 100, tipChordMm: 100 })],
    });
    const on = (wMm: number) =>
      develop(airframe({ materials: [board({ sheets: [{ wMm, hMm: 300 }] })], surfaces: [tail] })).parts;
    // 480 mm of tailplane and a 5 mm margin at each end.
    expect(on(490).map(({ key }) => key)).toEqual(['tail/p1/sheet/centre']);
    expect(on(489).map(({ key }) => key)).toEqual(['tail/p1/sheet/stbd', 'tail/p1/sheet/port']);
    expect(on(489)[0]?.operations.map(({ kind }) => kind)).toContain('glue');
  });

  it('lays a piece along the grain, so that a sheet too short that way does not hold it', () => {
    const wing = surface({ panels: [panel({ lengthMm: 300, rootChordMm: 150, tipChordMm: 150 })] });
    const sides = (grain: 'alongWidth' | 'alongHeight' | 'none') =>
      develop(
        airframe({ materials: [board({ grain, sheets: [{ wMm: 700, hMm: 500 }] })], surfaces: [wing] }),
      ).parts.map(({ side }) => side);
    expect(sides('alongWidth')).toEqual(['centre']);
    expect(sides('none')).toEqual(['centre']);
    expect(sides('alongHeight')).toEqual(['stbd', 'port']);
  });

  it('bevels a dihedral joint at half the angle on both sides and cuts the longer face', () => {
    const wing = surface({
      panels: [panel({ dihedralDeg: 0, lengthMm: 200 }), panel({ id: 'p2', lengthMm: 150, dihedralDeg: 10 })],
    });
    const { parts } = develop(airframe({ surfaces: [wing] }));
    const bevels = parts.flatMap(({ key, operations }) =>
      operations.filter(({ kind }) => kind === 'bevel').map(({ angleDeg, face }) => ({ key, angleDeg, face })),
    );
    expect(bevels).toEqual(
      ['wing/p1/sheet/centre', 'wing/p1/sheet/centre', 'wing/p2/sheet/stbd', 'wing/p2/sheet/port'].map((key) => ({
        key,
        angleDeg: expect.closeTo(5, 9),
        face: 'upper',
      })),
    );
    // Half of 5 mm times tan 5 degrees, 0.2187 mm, beyond the 150 mm of the middle.
    const xs = parts.find(({ key }) => key === 'wing/p2/sheet/stbd')?.outline.map(([x]) => x) ?? [];
    expect(Math.max(...xs) - Math.min(...xs)).toBeCloseTo(150.2187, 4);
  });

  it('lets a straight spar run through from tip to tip as one tube, a swept one as two', () => {
    const spar = {
      id: 'spar',
      tubeId: 'tube',
      chordShare: [0.3, 0.3] satisfies [number, number],
      from: 0,
      to: 0.8,
      let: 'face',
      face: 'lower',
    } as const;
    const pieces = (sweepDeg: number) =>
      develop(airframe({ surfaces: [surface({ panels: [panel({ sweepDeg })], spars: [spar] })] })).stockPieces.map(
        ({ key, lengthMm, count }) => ({ key, lengthMm, count }),
      );
    expect(pieces(0)).toEqual([{ key: 'wing/spar/tube', lengthMm: expect.closeTo(2 * 0.8 * 310, 9), count: 1 }]);
    expect(pieces(20)).toEqual([
      { key: 'wing/spar/tube', lengthMm: expect.closeTo((0.8 * 310) / Math.cos((20 * Math.PI) / 180), 6), count: 2 },
    ]);
  });

  it('marks booms where they cross a sheet, as deep as they sink into it', () => {
    // A 4 mm tube whose axis lies 2 mm under the middle of a 5 mm sheet reaches 2.5 mm into its lower face.
    const { parts, stockPieces } = develop(airframe({ booms: [boom({ mount: { to: 'datum', at: [40, 90, -2] } })] }));
    const slots = parts.flatMap(({ operations }) => operations.filter(({ kind }) => kind === 'foamOut'));
    expect(slots.map(({ depthMm, widthMm, face }) => ({ depthMm, widthMm, face }))).toEqual([
      { depthMm: 2.5, widthMm: 4, face: 'lower' },
      { depthMm: 2.5, widthMm: 4, face: 'lower' },
    ]);
    // From 40 mm to the trailing edge at 190 mm.
    for (const {
      path: [from, to],
    } of slots)
      expect(Math.hypot((to?.[0] ?? 0) - (from?.[0] ?? 0), (to?.[1] ?? 0) - (from?.[1] ?? 0))).toBeCloseTo(150, 9);
    expect(stockPieces).toMatchObject([{ key: 'boom/tube', lengthMm: 420, count: 2 }]);
  });

  it('cuts a hole for a cutout inside the sheet and a notch for one at its edge', () => {
    const cut = (outline: [number, number][]) =>
      develop(airframe({ surfaces: [surface({ cutouts: [{ id: 'c', outline }] })] })).parts[0];
    const hole = cut([
      [0.4, 0.3],
      [0.6, 0.3],
      [0.6, 0.5],
      [0.4, 0.5],
    ]);
    expect(hole?.holes).toHaveLength(2);
    expect(hole?.outline).toHaveLength(4);
    const notch = cut([
      [0, 0.7],
      [0.2, 0.7],
      [0.2, 1],
      [0, 1],
    ]);
    expect(notch?.holes).toHaveLength(0);
    expect(area(notch?.outline ?? [])).toBeCloseTo(620 * 190 - 124 * 57, 3);
    assertParts([hole, notch].flatMap((part) => part ?? []).slice(0, 1));
  });
});

describe('tips and turning surfaces', () => {
  const wing = (tip: Airframe['surfaces'][number]['tip']) =>
    develop(airframe({ surfaces: [surface({ mirrored: false, tip, controls: [control({ to: 1 })] })] }));

  it('rake the tip inside the span: the longer edge keeps it', () => {
    for (const [angleDeg, keeps] of [
      [20, 'te'],
      [-20, 'le'],
    ] as const) {
      const { parts, problems } = wing({ shape: 'raked', angleDeg });
      expect(problems).toEqual([]);
      assertParts(parts);
      // The piece is drawn on its lower face, where the hinge is worked: seen from there the tip lies to the left.
      const outline = (parts[0]?.outline ?? []).map(([x, y]): Vec2 => [Math.abs(x), y]);
      const outermost = outline.filter(([x]) => x > 310 - 1e-6);
      expect(outermost).toHaveLength(1);
      expect(outermost[0]?.[1]).toBeCloseTo(keeps === 'te' ? -190 : 0, 9);
      const other = outline.filter(([, y]) => Math.abs(y - (keeps === 'te' ? 0 : -190)) < 1e-6).map(([x]) => x);
      expect(Math.max(...other)).toBeCloseTo(310 - 190 * Math.tan((20 * Math.PI) / 180), 6);
    }
  });

  it('round both corners of a tip', () => {
    const { parts, problems } = wing({ shape: 'rounded', radiusMm: 30 });
    expect(problems).toEqual([]);
    assertParts(parts);
    // Two corners lose (1 - pi/4) r2 each, less what straight pieces within 0.05 mm leave on; the control's inner gap is 1.5 mm wide.
    const lost = 310 * 190 - area(parts[0]?.outline ?? []) - 1.5 * 0.25 * 190;
    expect(lost).toBeGreaterThan(2 * (1 - Math.PI / 4) * 900 - 1);
    expect(lost).toBeLessThan(2 * (1 - Math.PI / 4) * 900 + 2 * 47 * 0.05);
  });

  it('turn an all-moving tail about its axis to its neutral setting, without a hinge in the sheet', () => {
    const turning = control({
      id: 'stab',
      kind: 'allMoving',
      from: 0,
      to: 1,
      neutralDeg: 5,
      hinge: { kind: 'pinned', side: 'upper', bevelDeg: [0, 0], axis: 0.25 },
      mix: { pitch: 1, roll: 0, yaw: 0, flap: 0 },
    });
    const { parts, problems } = develop(
      airframe({
        surfaces: [
          surface({
            id: 'tail',
            role: 'tailplane',
            panels: [panel({ lengthMm: 120, rootChordMm: 80, tipChordMm: 80 })],
            controls: [turning],
          }),
        ],
      }),
    );
    expect(problems).toEqual([]);
    const [tail] = parts;
    if (!tail) throw new RangeError('no tail');
    expect(parts).toHaveLength(1);
    expect(tail.operations.map(({ kind }) => kind)).toEqual(['reference']);
    // Trailing edge down by 60 sin 5 degrees behind the axis, leading edge up by 20 sin 5.
    const zs = inSpace(tail).map(([, , z]) => z);
    expect(Math.min(...zs)).toBeCloseTo(-60 * Math.sin((5 * Math.PI) / 180), 9);
    expect(Math.max(...zs)).toBeCloseTo(20 * Math.sin((5 * Math.PI) / 180), 9);
  });
});

describe('a swept wing set at an incidence', () => {
  it('is one flat sheet of both halves, with no joint on the centre line', () => {
    const swept = panel({ lengthMm: 300, rootChordMm: 180, tipChordMm: 120, sweepDeg: 25 });
    const document = airframe({ surfaces: [surface({ incidenceDeg: 6, panels: [swept] })] });
    const { parts, problems } = develop(document);
    expect(problems).toEqual([]);
    expect(parts.map(({ key }) => key)).toEqual(['wing/p1/sheet/centre']);
    expect(area(parts[0]?.outline ?? [])).toBeCloseTo(300 * (180 + 120), 6);
  });
});
