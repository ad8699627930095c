import type { Vec2 } from '@/lib/numerics/vec';

// Straight lines in the plane, mm.

export const distance = (a: Vec2, b: Vec2): number => Math.hypot(b[0] - a[0], b[1] - a[1]);

/** Where two lines, each a point and a direction, meet; null when they are parallel. */
export function lineMeet(p: Vec2, along: Vec2, q: Vec2, other: Vec2): Vec2 | null {
  const across = along[0] * other[1] - along[1] * other[0];
  if (Math.abs(across) < 1e-12 * Math.hypot(...along) * Math.hypot(...other)) return null;
  const t = ((q[0] - p[0]) * other[1] - (q[1] - p[1]) * other[0]) / across;
  return [p[0] + along[0] * t, p[1] + along[1] * t];
}
