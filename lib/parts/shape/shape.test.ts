import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { ARC_TOLERANCE_MM, arcPoints } from '@/lib/geometry/arc';
import { signedArea } from '@/lib/geometry/polygons';
import type { Vec2 } from '@/lib/numerics/vec';
import { unroll } from '../body/unroll';
import { cutRing } from './cut';
import { offsetLine } from './polyline';
import { cleanRing, edgesCross, mirrorRing } from './ring';

const sheet: Vec2[] = [
  [0, 0],
  [70, -5],
  [110, 0],
  [110, 60],
  [0, 80],
];

describe('cutRing', () => {
  it('keeps the area, whatever the cut', () => {
    fc.assert(
      fc.property(
        fc.double({ min: 3, max: 67, noNaN: true }),
        fc.double({ min: 5, max: 40, noNaN: true }),
        fc.double({ min: 3, max: 30, noNaN: true }),
        (x, height, wide) => {
          const onEdge = (at: number): Vec2 => (at <= 70 ? [at, (-5 * at) / 70] : [at, -5 + (5 * (at - 70)) / 40]);
          const path: Vec2[] = [onEdge(x), [x, height], [x + wide, height], onEdge(x + wide)];
          const cut = cutRing(sheet, path);
          if (!cut) throw new RangeError('the cut ends on the edge');
          const { left, right } = cut;
          expect(signedArea(left) + signedArea(right)).toBeCloseTo(signedArea(sheet), 8);
          expect(signedArea(right)).toBeGreaterThan(0);
          expect(signedArea(left)).toBeGreaterThan(signedArea(right));
        },
      ),
    );
  });

  it('has no answer for a cut that ends off the outline', () => {
    expect(
      cutRing(sheet, [
        [10, 10],
        [20, 20],
      ]),
    ).toBeNull();
  });
});

describe('rings', () => {
  it('lose spikes and points on a line, and keep their area when mirrored', () => {
    const noisy: Vec2[] = [
      [0, 0],
      [35, -2.5],
      [70, -5],
      [110, 0],
      [110, 60],
      [150, 60],
      [110, 60],
      [0, 80],
      [0, 80],
    ];
    expect(cleanRing(noisy)).toEqual(sheet);
    expect(signedArea(mirrorRing(sheet))).toBeCloseTo(signedArea(sheet), 12);
    expect(mirrorRing(sheet)[0]).toEqual([0, 0]);
  });
});

describe('edges that cross', () => {
  it('are not pieces of one line far apart, whatever rounding says of them', () => {
    // Two pieces of one trailing edge, between them a notch; the products below round to opposite signs.
    const line = [
      [-40.16239536814436, -204.35610248304147],
      [-8.636109732426046, -115.99133085970155],
      [-7.136109732426047, -111.78699296317377],
      [0.1969773088175283, -91.23314246581569],
    ] satisfies Vec2[];
    const [a, b, c, d] = line;
    if (!a || !b || !c || !d) throw new RangeError('four points');
    expect(edgesCross(a, b, c, d)).toBe(false);
    expect(edgesCross([0, 0], [10, 4], [3, 5], [6, -2])).toBe(true);
    expect(edgesCross([0, 0], [10, 4], [3, 5], [6, 3])).toBe(false);
  });
});

describe('arcs', () => {
  it.each([{ radius: 3 }, { radius: 40 }, { radius: 150 }])(
    'of $radius mm leave the true arc by 0.05 mm at most',
    ({ radius }) => {
      const { points, tangentMm } = arcPoints([-400, 0], [0, 0], [0, -400], radius);
      expect(tangentMm).toBeCloseTo(radius, 9);
      const centre: Vec2 = [-radius, -radius];
      for (const [i, p] of points.entries()) {
        expect(Math.hypot(p[0] - centre[0], p[1] - centre[1])).toBeCloseTo(radius, 9);
        const next = points[i + 1];
        if (!next) continue;
        const middle = Math.hypot((p[0] + next[0]) / 2 - centre[0], (p[1] + next[1]) / 2 - centre[1]);
        expect(radius - middle).toBeLessThanOrEqual(ARC_TOLERANCE_MM + 1e-9);
      }
    },
  );
});

describe('bent sheets', () => {
  it('unroll to the length of a circle that they follow ever more finely', () => {
    // A quarter of a circle of 200 mm radius measures 100 pi; chords of n pieces fall short by (pi/2)^2 / (24 n^2).
    const quarter = (n: number): Vec2[] =>
      Array.from({ length: n + 1 }, (_, i) => {
        const angle = (Math.PI / 2) * (i / n);
        return [200 * Math.sin(angle), 200 * Math.cos(angle)];
      });
    const length = unroll(quarter(400), 5).lengthMm;
    expect(length).toBeCloseTo(100 * Math.PI, 2);
  });

  it('grow by thickness times the tangent of half the angle on each side of a fold that bends outward', () => {
    // Down by 45 degrees, then level: an inward corner, whose inner face is the whole one.
    const inward = unroll(
      [
        [0, 30],
        [30, 0],
        [80, 0],
      ],
      5,
    );
    expect(inward.lengthMm).toBeCloseTo(30 * Math.SQRT2 + 50 + 2 * 5 * Math.tan(Math.PI / 8), 9);
    expect(inward.folds).toMatchObject([{ face: 'outer', angleDeg: expect.closeTo(45, 9) }]);
    const outward = unroll(
      [
        [0, 0],
        [50, 0],
        [80, -30],
      ],
      5,
    );
    expect(outward.lengthMm).toBeCloseTo(50 + 30 * Math.SQRT2, 9);
    expect(outward.folds).toMatchObject([{ face: 'inner', sMm: 50 }]);
  });

  it('refuse a line that turns back', () => {
    expect(() =>
      unroll(
        [
          [0, 0],
          [20, 5],
          [20, 9],
        ],
        5,
      ),
    ).toThrow(RangeError);
  });

  it('are offset square to each piece', () => {
    const inner = offsetLine(
      [
        [0, 20],
        [40, 50],
        [100, 50],
      ],
      -5,
    );
    // 3-4-5: 5 mm square to a slope of 3/4 is 6.25 mm straight down.
    expect(inner[0]).toEqual([0, expect.closeTo(13.75, 9)]);
    expect(inner[1]).toEqual([expect.closeTo(40 + 5 / 3, 9), expect.closeTo(45, 9)]);
    expect(inner[2]).toEqual([100, expect.closeTo(45, 9)]);
  });
});
