import type { Vec2 } from '@/lib/numerics/vec';

// Plain arithmetic on segments and rings for keeping labels and fold lines clear of cut lines. mm.

export type Segment = readonly [Vec2, Vec2];

/** The segments of a path; a closed one ends where it began. */
export function segmentsOf(points: readonly Vec2[], closed: boolean): Segment[] {
  const out: Segment[] = [];
  points.forEach((point, i) => {
    const next = points[i + 1] ?? (closed ? points[0] : undefined);
    if (next) out.push([point, next]);
  });
  return out;
}

/** Distance of a point from a segment. */
export function pointToSegment([px, py]: Vec2, [[ax, ay], [bx, by]]: Segment): number {
  const [dx, dy] = [bx - ax, by - ay];
  const length2 = dx * dx + dy * dy;
  const t = length2 === 0 ? 0 : Math.min(1, Math.max(0, ((px - ax) * dx + (py - ay) * dy) / length2));
  return Math.hypot(px - ax - t * dx, py - ay - t * dy);
}

const side = ([ax, ay]: Vec2, [bx, by]: Vec2, [px, py]: Vec2): number => (bx - ax) * (py - ay) - (by - ay) * (px - ax);

const crossing = ([a, b]: Segment, [c, d]: Segment): boolean =>
  side(a, b, c) * side(a, b, d) < 0 && side(c, d, a) * side(c, d, b) < 0;

/** Least distance between two segments; 0 when they cross. */
export function segmentDistance(p: Segment, q: Segment): number {
  if (crossing(p, q)) return 0;
  return Math.min(pointToSegment(p[0], q), pointToSegment(p[1], q), pointToSegment(q[0], p), pointToSegment(q[1], p));
}

/** True when the point lies inside the ring, by the even-odd rule. */
export function insideRing([x, y]: Vec2, ring: readonly Vec2[]): boolean {
  let odd = false;
  for (const [[ax, ay], [bx, by]] of segmentsOf(ring, true)) {
    if (ay > y !== by > y && x < ax + ((y - ay) / (by - ay)) * (bx - ax)) odd = !odd;
  }
  return odd;
}
