import { distance } from '@/lib/geometry/lines';
import { contains, edges } from '@/lib/geometry/polygons';
import { SAME_POINT_MM } from '@/lib/numerics/tolerances';
import type { Vec2 } from '@/lib/numerics/vec';

// Closed outlines in a part's own axes, mm: x right, y up. A ring is not closed by a repeated point.

export type Ring = readonly Vec2[];

/** Points nearer to each other, or to the line of their neighbours, than this (mm) say nothing: far below what a printer draws. */
export const NOTHING_MM = 1e-6;

/** Twice the area of the triangle a, b, c: positive when it runs counter-clockwise. mm2. */
export const turnOf = (a: Vec2, b: Vec2, c: Vec2): number =>
  (b[0] - a[0]) * (c[1] - a[1]) - (b[1] - a[1]) * (c[0] - a[0]);

/** The same point seen from the back of the sheet; no minus zero, which would print and hash differently. */
export const mirror2 = ([x, y]: Vec2): Vec2 => [x === 0 ? 0 : -x, y];

/** Distance from a point to a straight piece. */
export function distanceToEdge(p: Vec2, a: Vec2, b: Vec2): number {
  const dx = b[0] - a[0];
  const dy = b[1] - a[1];
  const square = dx * dx + dy * dy;
  const t = square === 0 ? 0 : Math.min(1, Math.max(0, ((p[0] - a[0]) * dx + (p[1] - a[1]) * dy) / square));
  const x = p[0] - a[0] - t * dx;
  const y = p[1] - a[1] - t * dy;
  return Math.sqrt(x * x + y * y);
}

/** Distance from a point to the ring's nearest edge. */
export function distanceToRing(p: Vec2, ring: Ring): number {
  let least = Number.POSITIVE_INFINITY;
  let a = ring.at(-1);
  for (const b of ring) {
    if (a) least = Math.min(least, distanceToEdge(p, a, b));
    a = b;
  }
  return least;
}

/**
 * Whether two straight pieces cross each other at a point inside both. Ends that lie on the other piece's line do not
 * count: pieces of one line, far apart, would else cross by rounding.
 */
export function edgesCross(a: Vec2, b: Vec2, c: Vec2, d: Vec2): boolean {
  return partsEnds(a, b, c, d) && partsEnds(c, d, a, b);
}

/** Whether the line through a and b runs between c and d. */
function partsEnds(a: Vec2, b: Vec2, c: Vec2, d: Vec2): boolean {
  const on = NOTHING_MM * distance(a, b);
  const [first, second] = [turnOf(a, b, c), turnOf(a, b, d)];
  return (first > on && second < -on) || (first < -on && second > on);
}

/** The ring without repeated points, points on the line of their neighbours, and spikes. Keeps the first point unless it is one of these. */
export function cleanRing(ring: Ring): Vec2[] {
  const points = [...ring];
  let index = 0;
  let kept = 0;
  // Goes round until every point has been kept since the last removal: a removal can make its neighbour idle.
  while (points.length > 2 && kept < points.length) {
    const n = points.length;
    const before = points[(index + n - 1) % n];
    const here = points[index % n];
    const after = points[(index + 1) % n];
    if (!before || !here || !after) break;
    if (isIdle(before, here, after)) {
      points.splice(index % n, 1);
      index = Math.max(0, (index % n) - 1);
      kept = 0;
    } else {
      index = (index + 1) % n;
      kept += 1;
    }
  }
  return points;
}

function isIdle(before: Vec2, here: Vec2, after: Vec2): boolean {
  if (distance(before, here) < NOTHING_MM) return true;
  const base = distance(before, after);
  if (base < NOTHING_MM) return true;
  return Math.abs(turnOf(before, here, after)) / Math.max(base, distance(before, here)) < NOTHING_MM;
}

/** The ring seen from the back, still counter-clockwise, beginning with the same corner. */
export function mirrorRing(ring: Ring): Vec2[] {
  const [first, ...rest] = ring.map(mirror2);
  return first ? [first, ...rest.reverse()] : [];
}

/** The same ring begun at one of its corners; unchanged when it has no such corner. */
export function beginAt(ring: Ring, corner: Vec2 | undefined): Vec2[] {
  const index = corner ? ring.findIndex((p) => distance(p, corner) < NOTHING_MM) : -1;
  return index > 0 ? [...ring.slice(index), ...ring.slice(0, index)] : [...ring];
}

/** Two edges of the ring that cross or touch each other, by index, or null for a simple ring. */
export function selfCrossing(ring: Ring): readonly [number, number] | null {
  const sides = edges(ring);
  for (let i = 0; i < sides.length; i++) {
    const one = sides[i];
    for (let j = i + 2; j < sides.length; j++) {
      const other = sides[j];
      if (!one || !other || (i === 0 && j === sides.length - 1) || apart(one, other)) continue;
      const [[a, b], [c, d]] = [one, other];
      const touching =
        Math.min(distanceToEdge(a, c, d), distanceToEdge(b, c, d), distanceToEdge(c, a, b), distanceToEdge(d, a, b)) <
        NOTHING_MM;
      if (touching || edgesCross(a, b, c, d)) return [i, j];
    }
  }
  return null;
}

/** True when two edges are too far apart, along x or along y, to meet: most are, and this is soon told. */
const apart = ([a, b]: Edge, [c, d]: Edge): boolean =>
  Math.min(a[0], b[0]) - Math.max(c[0], d[0]) > NOTHING_MM ||
  Math.min(c[0], d[0]) - Math.max(a[0], b[0]) > NOTHING_MM ||
  Math.min(a[1], b[1]) - Math.max(c[1], d[1]) > NOTHING_MM ||
  Math.min(c[1], d[1]) - Math.max(a[1], b[1]) > NOTHING_MM;

type Edge = readonly [Vec2, Vec2];

/** Whether a point lies inside the ring or on its edge, to what a blade can follow. */
export const onSheet = (p: Vec2, ring: Ring): boolean => contains(ring, p) || distanceToRing(p, ring) <= SAME_POINT_MM;
