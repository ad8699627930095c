import type { Vec2 } from '@/lib/numerics/vec';

const turn = (o: Vec2, a: Vec2, b: Vec2): number => (a[0] - o[0]) * (b[1] - o[1]) - (a[1] - o[1]) * (b[0] - o[0]);

const chain = (points: readonly Vec2[]): Vec2[] => {
  const hull: Vec2[] = [];
  for (const point of points) {
    for (;;) {
      const [a, b] = [hull.at(-2), hull.at(-1)];
      if (!a || !b || turn(a, b, point) > 0) break;
      hull.pop();
    }
    hull.push(point);
  }
  return hull.slice(0, -1);
};

/** Convex hull, counter-clockwise (monotone chain: A. M. Andrew, "Another efficient algorithm for convex hulls in two dimensions", 1979). */
export function convexHull(points: readonly Vec2[]): Vec2[] {
  const sorted = [...points].sort((a, b) => a[0] - b[0] || a[1] - b[1]);
  if (sorted.length < 3) return sorted;
  return [...chain(sorted), ...chain(sorted.toReversed())];
}
