import { cross3, dot3, length3, scale3, sub3, type Vec2, type Vec3 } from '@/lib/numerics/vec';

// A strip of straight lines (generators) between two edges in space, laid flat. A cone is unrolled about its apex and a cylinder square
// to its generators, both exactly; any other strip is laid flat as triangles, with the error that this leaves.

interface FlatStrip {
  readonly a: readonly Vec2[];
  readonly b: readonly Vec2[];
  readonly kind: 'cone' | 'cylinder' | 'triangles';
  /**
   * How much longer or shorter the diagonals that were not used came out flat than they are in space, summed along the strip, mm.
   * Nothing where every piece between two generators is flat.
   */
  readonly errorMm: number;
}

/** Edges whose shapes differ by less than this share of their size are similar: far below what a blade can follow. */
const SIMILAR_SHARE = 1e-9;
/** Edges whose sizes differ by less than this share have their apex so far away that rounding would show: they are laid as triangles. */
const LEAST_TAPER_SHARE = 1e-5;

const gap = (p: Vec3, q: Vec3): number => length3(sub3(p, q));

/** The angle between two directions, right for small angles too. */
const angleBetween = (u: Vec3, v: Vec3): number => Math.atan2(length3(cross3(u, v)), dot3(u, v));

interface Pair {
  readonly a: Vec3;
  readonly b: Vec3;
}

/** How many times larger edge b is than edge a when they have one shape and attitude, else null. */
function likeness(pairs: readonly Pair[], first: Pair): number | null {
  const size = pairs.reduce((most, { a }) => Math.max(most, gap(a, first.a)), 0);
  const farthest = pairs.find(({ a }) => gap(a, first.a) === size);
  if (!farthest || !(size > 0)) return null;
  const k = gap(farthest.b, first.b) / size;
  const off = (pair: Pair): number =>
    length3(sub3(sub3(pair.b, first.b), scale3(sub3(pair.a, first.a), k))) / Math.max(size, k * size);
  return pairs.every((pair) => off(pair) < SIMILAR_SHARE) ? k : null;
}

/** About the apex: every generator keeps its distance from there and its angle to the next. */
function unrollCone(pairs: readonly Pair[], first: Pair, k: number): FlatStrip {
  const apex = scale3(sub3(first.b, scale3(first.a, k)), 1 / (1 - k));
  const start = gap(first.a, apex);
  // The first generator lies along x; the apex stands beyond b where b is the smaller edge, else behind a.
  const ahead = k < 1;
  let angle = 0;
  let before = first;
  const flat = pairs.map((pair) => {
    angle += angleBetween(sub3(before.a, apex), sub3(pair.a, apex));
    before = pair;
    const on = (p: Vec3): Vec2 => {
      const r = gap(p, apex);
      const along = r * Math.cos(angle);
      return [ahead ? start - along : along - start, r * Math.sin(angle)];
    };
    return { a: on(pair.a), b: on(pair.b) };
  });
  return { a: flat.map(({ a }) => a), b: flat.map(({ b }) => b), kind: 'cone', errorMm: 0 };
}

/** Square to the generators, which stay parallel. */
function unrollCylinder(pairs: readonly Pair[], first: Pair): FlatStrip {
  const along = sub3(first.b, first.a);
  const u = scale3(along, 1 / length3(along));
  let y = 0;
  let before = first;
  const flat = pairs.map((pair) => {
    const step = sub3(pair.a, before.a);
    y += length3(cross3(step, u));
    before = pair;
    const on = (p: Vec3): Vec2 => [dot3(sub3(p, first.a), u), y];
    return { a: on(pair.a), b: on(pair.b) };
  });
  return { a: flat.map(({ a }) => a), b: flat.map(({ b }) => b), kind: 'cylinder', errorMm: 0 };
}

/** The point to the left of the line from p to q at given distances from both. */
function leftOf(p: Vec2, q: Vec2, fromP: number, fromQ: number): Vec2 {
  const d = Math.hypot(q[0] - p[0], q[1] - p[1]);
  const [ux, uy] = [(q[0] - p[0]) / d, (q[1] - p[1]) / d];
  const x = (fromP * fromP - fromQ * fromQ + d * d) / (2 * d);
  const y = Math.sqrt(Math.max(0, fromP * fromP - x * x));
  return [p[0] + ux * x - uy * y, p[1] + uy * x + ux * y];
}

/** Triangle by triangle: a, b and the next a, then that one, b and the next b. */
function unrollTriangles(pairs: readonly Pair[], first: Pair): FlatStrip {
  let before = first;
  let [p, q]: [Vec2, Vec2] = [
    [0, 0],
    [gap(first.a, first.b), 0],
  ];
  const flat = [{ a: p, b: q }];
  let errorMm = 0;
  for (const pair of pairs.slice(1)) {
    const a = leftOf(p, q, gap(before.a, pair.a), gap(before.b, pair.a));
    const b = leftOf(a, q, gap(pair.a, pair.b), gap(before.b, pair.b));
    errorMm += Math.abs(Math.hypot(b[0] - p[0], b[1] - p[1]) - gap(before.a, pair.b));
    flat.push({ a, b });
    [p, q, before] = [a, b, pair];
  }
  return { a: flat.map(({ a }) => a), b: flat.map(({ b }) => b), kind: 'triangles', errorMm };
}

/**
 * Lays the strip between two edges flat: point i of `a` and of `b` are the ends of generator i. mm. The first generator lies along x
 * from the origin, the strip to its left. Edges of one shape and attitude make a cone or a cylinder, which keep every length along the
 * surface; of anything else the edges, generators and one diagonal of each piece are kept, and the error says how far it is from flat.
 * Throws RangeError when the edges have not the same number of points, fewer than two, or a generator has no length.
 * Source: M. P. do Carmo, "Differential Geometry of Curves and Surfaces", section 3-5: cones, cylinders and tangent surfaces develop.
 */
export function unrollStrip(a: readonly Vec3[], b: readonly Vec3[]): FlatStrip {
  if (a.length !== b.length) throw new RangeError(`both edges need as many points, got ${a.length} and ${b.length}`);
  const pairs = a.flatMap((p, i): Pair[] => {
    const q = b[i];
    return q ? [{ a: p, b: q }] : [];
  });
  const [first] = pairs;
  if (!first || pairs.length < 2) throw new RangeError(`a strip needs two generators, got ${pairs.length}`);
  const bare = pairs.findIndex((pair) => !(gap(pair.a, pair.b) > 0));
  if (bare >= 0) throw new RangeError(`generator ${bare} has no length`);
  const k = likeness(pairs, first);
  if (k !== null && Math.abs(1 - k) > LEAST_TAPER_SHARE) return unrollCone(pairs, first, k);
  if (k !== null && Math.abs(1 - k) < SIMILAR_SHARE) return unrollCylinder(pairs, first);
  return unrollTriangles(pairs, first);
}
