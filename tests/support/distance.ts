import type { Vec2 } from '@/lib/numerics/vec';

// Distances between polygons by plain segment arithmetic, so that a layout is not judged by the library that made it.

const pointToSegment = ([px, py]: Vec2, [ax, ay]: Vec2, [bx, by]: Vec2): number => {
  const [dx, dy] = [bx - ax, by - ay];
  const length2 = dx * dx + dy * dy;
  const t = length2 === 0 ? 0 : Math.min(1, Math.max(0, ((px - ax) * dx + (py - ay) * dy) / length2));
  return Math.hypot(px - ax - t * dx, py - ay - t * dy);
};

const side = ([ax, ay]: Vec2, [bx, by]: Vec2, [px, py]: Vec2): number => (bx - ax) * (py - ay) - (by - ay) * (px - ax);

const cross = (a: Vec2, b: Vec2, c: Vec2, d: Vec2): boolean =>
  side(a, b, c) * side(a, b, d) < 0 && side(c, d, a) * side(c, d, b) < 0;

const edgesOf = (ring: readonly Vec2[]): [Vec2, Vec2][] =>
  ring.map((point, i): [Vec2, Vec2] => [point, ring[(i + 1) % ring.length] ?? point]);

/** True when the point lies inside the ring (even-odd rule). */
export function inside([x, y]: Vec2, ring: readonly Vec2[]): boolean {
  let odd = false;
  for (const [[ax, ay], [bx, by]] of edgesOf(ring)) {
    if (ay > y !== by > y && x < ax + ((y - ay) / (by - ay)) * (bx - ax)) odd = !odd;
  }
  return odd;
}

/** Least distance between two solid polygons, mm; 0 when they overlap. */
export function polygonDistance(a: readonly Vec2[], b: readonly Vec2[]): number {
  const [firstA] = a;
  const [firstB] = b;
  if (!firstA || !firstB) throw new RangeError('a polygon needs points');
  if (inside(firstA, b) || inside(firstB, a)) return 0;
  let least = Infinity;
  for (const [p, q] of edgesOf(a)) {
    for (const [r, s] of edgesOf(b)) {
      if (cross(p, q, r, s)) return 0;
      least = Math.min(
        least,
        pointToSegment(p, r, s),
        pointToSegment(q, r, s),
        pointToSegment(r, p, q),
        pointToSegment(s, p, q),
      );
    }
  }
  return least;
}
