import { differenceD, FillRule, type PathsD } from 'clipper2-ts';
import type { Vec2 } from '@/lib/numerics/vec';
import type { Outline } from './polygons';

/** Decimal places of the clipping, mm: 1e-6 mm is far below what any cutter follows and keeps the products in range. */
const CLIP_PLACES = 6;
/** Clipping rounds to its own grid: a corner nearer than this to one that was given is that one, mm. */
const SAME_CORNER_MM = 2e-6;

/**
 * What is left of closed outlines when others are taken off: outer edges counter-clockwise, holes clockwise. Corners that were
 * given keep their exact place.
 */
export function subtractRings(subject: readonly Outline[], clip: readonly Outline[]): Vec2[][] {
  const toPaths = (rings: readonly Outline[]): PathsD => rings.map((ring) => ring.map(([x, y]) => ({ x, y })));
  const known = [...subject.flat(), ...clip.flat()];
  return differenceD(toPaths(subject), toPaths(clip), FillRule.NonZero, CLIP_PLACES).map((path) =>
    path.map(({ x, y }): Vec2 => known.find((q) => Math.hypot(x - q[0], y - q[1]) < SAME_CORNER_MM) ?? [x, y]),
  );
}
