import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import type { Vec2 } from '@/lib/numerics/vec';
import { convexHull } from './hull';
import {
  assertOutline,
  bounds,
  centroid,
  contains,
  counterClockwise,
  perimeter,
  secondMoments,
  signedArea,
} from './polygons';

const L: Vec2[] = [
  [10, 5],
  [50, 5],
  [50, 15],
  [30, 15],
  [30, 45],
  [10, 45],
];
const cloud = fc.array(fc.tuple(fc.integer({ min: -500, max: 500 }), fc.integer({ min: -500, max: 500 })), {
  minLength: 3,
  maxLength: 20,
});
/** Convex, with real area. */
const convex = cloud.map((points) => convexHull(points)).filter((hull) => hull.length >= 3 && signedArea(hull) > 1);
const turned = (points: readonly Vec2[], deg: number, dx: number, dy: number): Vec2[] => {
  const [c, s] = [Math.cos((deg * Math.PI) / 180), Math.sin((deg * Math.PI) / 180)];
  return points.map(([x, y]) => [c * x - s * y + dx, s * x + c * y + dy]);
};

describe('polygons', () => {
  it('an angle piece as the sum of its two rectangles', () => {
    // 40 x 10 about (30, 10) and 20 x 30 about (20, 30).
    expect(signedArea(L)).toBe(1000);
    expect(centroid(L)).toEqual([24, 22]);
    const { ixx, iyy, ixy } = secondMoments(L);
    expect(ixx).toBeCloseTo((40 * 10 ** 3) / 12 + 400 * 12 ** 2 + (20 * 30 ** 3) / 12 + 600 * 8 ** 2, 6);
    expect(iyy).toBeCloseTo((10 * 40 ** 3) / 12 + 400 * 6 ** 2 + (30 * 20 ** 3) / 12 + 600 * 4 ** 2, 6);
    expect(ixy).toBeCloseTo(400 * 6 * -12 + 600 * -4 * 8, 6);
    expect(perimeter(L)).toBe(160);
    expect(bounds(L)).toEqual({ minX: 10, minY: 5, maxX: 50, maxY: 45 });
  });
  it('runs clockwise with the other sign, and the same moments', () => {
    const back = [...L].reverse();
    expect(signedArea(back)).toBe(-1000);
    expect(secondMoments(back)).toEqual({
      ...secondMoments(L),
      centroid: [expect.closeTo(24, 9), expect.closeTo(22, 9)],
      ixx: expect.closeTo(secondMoments(L).ixx, 4),
      iyy: expect.closeTo(secondMoments(L).iyy, 4),
      ixy: expect.closeTo(secondMoments(L).ixy, 4),
    });
    expect(counterClockwise(back)).toEqual(L);
  });
  it('knows inside from outside, the notch included', () => {
    expect(contains(L, [20, 30])).toBe(true);
    expect(contains(L, [40, 30])).toBe(false);
    expect(contains(L, [40, 10])).toBe(true);
    expect(contains(L, [0, 10])).toBe(false);
  });
  it('moved and turned keeps its area and its polar moment', () => {
    fc.assert(
      fc.property(convex, fc.integer({ min: 0, max: 360 }), fc.integer({ min: -900, max: 900 }), (outline, deg, dx) => {
        const a = secondMoments(outline);
        const b = secondMoments(turned(outline, deg, dx, -dx / 3));
        expect(b.area / a.area).toBeCloseTo(1, 9);
        expect((b.ixx + b.iyy) / (a.ixx + a.iyy)).toBeCloseTo(1, 6);
      }),
    );
  });
  it('a convex outline holds its own centroid, and its bounds hold every point', () => {
    fc.assert(
      fc.property(convex, (outline) => {
        expect(contains(outline, centroid(outline))).toBe(true);
        const box = bounds(outline);
        for (const [x, y] of outline) {
          expect(x >= box.minX && x <= box.maxX && y >= box.minY && y <= box.maxY).toBe(true);
        }
      }),
    );
  });
  it('the hull holds every point of the cloud and runs counter-clockwise', () => {
    fc.assert(
      fc.property(cloud, (points) => {
        const hull = convexHull(points);
        if (hull.length < 3) return;
        expect(() => assertOutline(hull)).not.toThrow();
        const total = signedArea(hull);
        for (const point of points) expect(signedArea(convexHull([...hull, point]))).toBeCloseTo(total, 6);
      }),
    );
  });
  it.each([
    {
      name: 'two points',
      outline: [
        [0, 0],
        [1, 0],
      ] satisfies Vec2[],
    },
    {
      name: 'clockwise',
      outline: [
        [0, 0],
        [0, 1],
        [1, 1],
      ] satisfies Vec2[],
    },
    {
      name: 'a line',
      outline: [
        [0, 0],
        [1, 1],
        [2, 2],
      ] satisfies Vec2[],
    },
    {
      name: 'not finite',
      outline: [
        [0, 0],
        [1, 0],
        [Number.NaN, 1],
      ] satisfies Vec2[],
    },
  ])('refuses $name', ({ outline }) => expect(() => assertOutline(outline)).toThrow(RangeError));
  it('refuses moments of what has no area', () => {
    expect(() =>
      secondMoments([
        [0, 0],
        [1, 1],
        [2, 2],
      ]),
    ).toThrow(RangeError);
    expect(() => bounds([])).toThrow(RangeError);
  });
});
