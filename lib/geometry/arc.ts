import type { Vec2 } from '@/lib/numerics/vec';
import { distance } from './lines';

/** An arc is drawn as straight pieces that leave it by at most this, mm: half a knife's kerf. */
export const ARC_TOLERANCE_MM = 0.05;

/**
 * The corner at `at` between two straight edges, rounded: points from the first edge to the second, both tangent points
 * among them, and how much of each edge the arc takes. All on or outside the true arc's chord side, within the tolerance.
 */
export function arcPoints(
  before: Vec2,
  at: Vec2,
  after: Vec2,
  radiusMm: number,
): { points: Vec2[]; tangentMm: number } {
  const a: Vec2 = [(before[0] - at[0]) / distance(before, at), (before[1] - at[1]) / distance(before, at)];
  const b: Vec2 = [(after[0] - at[0]) / distance(after, at), (after[1] - at[1]) / distance(after, at)];
  const between = Math.acos(Math.min(1, Math.max(-1, a[0] * b[0] + a[1] * b[1])));
  const sweep = Math.PI - between;
  if (!(sweep > 1e-9)) return { points: [at], tangentMm: 0 };
  const tangentMm = radiusMm * Math.tan(sweep / 2);
  const start: Vec2 = [at[0] + a[0] * tangentMm, at[1] + a[1] * tangentMm];
  const left = a[0] * b[1] - a[1] * b[0] > 0 ? -1 : 1;
  // The centre lies a radius from the first edge, on the side of the second.
  const centre: Vec2 = [start[0] + left * a[1] * radiusMm, start[1] - left * a[0] * radiusMm];
  const most = 2 * Math.acos(Math.max(0, 1 - ARC_TOLERANCE_MM / radiusMm));
  const pieces = Math.max(1, Math.ceil(sweep / most));
  const from = Math.atan2(start[1] - centre[1], start[0] - centre[0]);
  const points = Array.from({ length: pieces + 1 }, (_, index): Vec2 => {
    const angle = from + left * sweep * (index / pieces);
    return [centre[0] + radiusMm * Math.cos(angle), centre[1] + radiusMm * Math.sin(angle)];
  });
  return { points, tangentMm };
}
