import type { Vec2, Vec3 } from '@/lib/numerics/vec';
import { cross3, dot3, length3, scale3, sub3 } from '@/lib/numerics/vec';

// Geometry for putting parts back together. Written apart from the code under test: nothing here knows how parts are made.

/** A rigid placement: rows of the turn, then a shift. */
export interface Placement {
  readonly rows: readonly [Vec3, Vec3, Vec3];
  readonly shift: Vec3;
}

export const place = ({ rows, shift }: Placement, p: Vec3): Vec3 => [
  dot3(rows[0], p) + shift[0],
  dot3(rows[1], p) + shift[1],
  dot3(rows[2], p) + shift[2],
];

export const turn = ({ rows }: Placement, p: Vec3): Vec3 => [dot3(rows[0], p), dot3(rows[1], p), dot3(rows[2], p)];

const unit = (a: Vec3): Vec3 => scale3(a, 1 / length3(a));
export const apart = (a: Vec3, b: Vec3): number => length3(sub3(a, b));

/** The basis of three points: along the first edge, square to it in their plane, and out of the plane. */
function basis(a: Vec3, b: Vec3, c: Vec3): readonly [Vec3, Vec3, Vec3] {
  const e1 = unit(sub3(b, a));
  const e3 = unit(cross3(e1, sub3(c, a)));
  return [e1, cross3(e3, e1), e3];
}

/** The placement that lays one triangle on another, first corner on first corner. */
export function byTriangle(from: readonly [Vec3, Vec3, Vec3], to: readonly [Vec3, Vec3, Vec3]): Placement {
  const f = basis(...from);
  const t = basis(...to);
  const entry = (axis: 0 | 1 | 2, k: 0 | 1 | 2): number =>
    t[0][axis] * f[0][k] + t[1][axis] * f[1][k] + t[2][axis] * f[2][k];
  const row = (axis: 0 | 1 | 2): Vec3 => [entry(axis, 0), entry(axis, 1), entry(axis, 2)];
  const rows: [Vec3, Vec3, Vec3] = [row(0), row(1), row(2)];
  const turned = turn({ rows, shift: [0, 0, 0] }, from[0]);
  return { rows, shift: sub3(to[0], turned) };
}

const mean = (points: readonly Vec3[]): Vec3 =>
  scale3(
    points.reduce<Vec3>((s, p) => [s[0] + p[0], s[1] + p[1], s[2] + p[2]], [0, 0, 0]),
    1 / points.length,
  );

/** Largest eigenvector of a symmetric 4 x 4 matrix by shifted power iteration. */
function topVector(m: readonly (readonly number[])[]): number[] {
  const shift = Math.max(...m.map((row) => row.reduce((sum, v) => sum + Math.abs(v), 0)));
  let v = [1, 0.1, 0.2, 0.3];
  for (let step = 0; step < 5000; step += 1) {
    const w = m.map((row, i) => row.reduce((sum, a, j) => sum + a * (v[j] ?? 0), shift * (v[i] ?? 0)));
    const size = Math.hypot(...w);
    v = w.map((x) => x / size);
  }
  return v;
}

/** Least-squares rigid placement of points on points (B. K. P. Horn, "Closed-form solution of absolute orientation using unit quaternions", 1987). */
export function bestPlacement(from: readonly Vec3[], to: readonly Vec3[]): Placement {
  const a = mean(from);
  const b = mean(to);
  const s = [0, 1, 2].map((i) =>
    [0, 1, 2].map((j) =>
      from.reduce((sum, p, k) => sum + ((p[i] ?? 0) - (a[i] ?? 0)) * ((to[k]?.[j] ?? 0) - (b[j] ?? 0)), 0),
    ),
  );
  const S = (i: number, j: number): number => s[i]?.[j] ?? 0;
  const n = [
    [S(0, 0) + S(1, 1) + S(2, 2), S(1, 2) - S(2, 1), S(2, 0) - S(0, 2), S(0, 1) - S(1, 0)],
    [S(1, 2) - S(2, 1), S(0, 0) - S(1, 1) - S(2, 2), S(0, 1) + S(1, 0), S(2, 0) + S(0, 2)],
    [S(2, 0) - S(0, 2), S(0, 1) + S(1, 0), -S(0, 0) + S(1, 1) - S(2, 2), S(1, 2) + S(2, 1)],
    [S(0, 1) - S(1, 0), S(2, 0) + S(0, 2), S(1, 2) + S(2, 1), -S(0, 0) - S(1, 1) + S(2, 2)],
  ];
  const [w = 1, x = 0, y = 0, z = 0] = topVector(n);
  const rows: [Vec3, Vec3, Vec3] = [
    [w * w + x * x - y * y - z * z, 2 * (x * y - w * z), 2 * (x * z + w * y)],
    [2 * (x * y + w * z), w * w - x * x + y * y - z * z, 2 * (y * z - w * x)],
    [2 * (x * z - w * y), 2 * (y * z + w * x), w * w - x * x - y * y + z * z],
  ];
  return { rows, shift: sub3(b, turn({ rows, shift: [0, 0, 0] }, a)) };
}

/** Distance from a point to a flat polygon in space. */
export function toPolygon(p: Vec3, polygon: readonly Vec3[]): number {
  const [a, b] = polygon;
  if (!a || !b) throw new RangeError('a polygon needs corners');
  // The widest triangle fan gives the plane, whatever corners coincide.
  const normal = polygon.reduce<Vec3>(
    (sum, q, i) => {
      const c = cross3(sub3(q, a), sub3(polygon[(i + 1) % polygon.length] ?? a, a));
      return [sum[0] + c[0], sum[1] + c[1], sum[2] + c[2]];
    },
    [0, 0, 0],
  );
  const n = unit(normal);
  const e1 = unit(sub3(polygon.find((q) => apart(q, a) > 1e-6) ?? b, a));
  const e2 = cross3(n, e1);
  const flat = (q: Vec3): Vec2 => [dot3(sub3(q, a), e1), dot3(sub3(q, a), e2)];
  const height = dot3(sub3(p, a), n);
  const ring = polygon.map(flat);
  const [x, y] = flat(p);
  let inside = false;
  let edge = Number.POSITIVE_INFINITY;
  for (const [i, u] of ring.entries()) {
    const v = ring[(i + 1) % ring.length] ?? u;
    if (u[1] > y !== v[1] > y && x < u[0] + ((v[0] - u[0]) * (y - u[1])) / (v[1] - u[1])) inside = !inside;
    const [dx, dy] = [v[0] - u[0], v[1] - u[1]];
    const t = Math.min(1, Math.max(0, ((x - u[0]) * dx + (y - u[1]) * dy) / (dx * dx + dy * dy || 1)));
    edge = Math.min(edge, Math.hypot(x - u[0] - t * dx, y - u[1] - t * dy));
  }
  return Math.hypot(height, inside ? 0 : edge);
}
