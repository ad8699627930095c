import {
  areaPaths,
  EndType,
  FillRule,
  inflatePaths,
  JoinType,
  type Path64,
  type Paths64,
  simplifyPaths,
  union,
} from 'clipper2-ts';
import type { Vec2 } from '@/lib/numerics/vec';
import { placePath } from './turns';

// A part's outline made ready for no-fit polygons: turned, grown by half the spacing, in whole micrometres.

/** Micrometres in a millimetre: the clipping library works on whole numbers. */
export const UM = 1000;

/** Points this near the straight line between their neighbours are dropped; the outline grows by as much first, so it stays covered. */
const FLATTEN_UM = 100;
/** Mouths narrower than about twice this are closed: no part fits into them, and each costs corners in every no-fit polygon. */
const CLOSE_UM = 6000;
/** A mitred corner may reach this many times the growth before it is cut square. */
const MITRE = 2;

export interface Shape {
  /** Equal for shapes that are the same but for their place. */
  readonly key: string;
  /** The grown outline, its own lower left at zero. */
  readonly grown: Path64;
  /** Lower left of the true outline in turned part axes, micrometres, where `grown` is moved from. */
  readonly from: Vec2;
  /** Size of the true outline's box, micrometres. */
  readonly sizeUm: Vec2;
  /** How far the grown outline's box reaches past the true one, left and down, micrometres. */
  readonly rimUm: Vec2;
}

const grow = (paths: Paths64, deltaUm: number): Paths64 =>
  inflatePaths(paths, deltaUm, JoinType.Miter, EndType.Polygon, MITRE);

const boxOf = (path: readonly { x: number; y: number }[]) => {
  let [left, bottom, right, top] = [Infinity, Infinity, -Infinity, -Infinity];
  for (const { x, y } of path) {
    left = Math.min(left, x);
    bottom = Math.min(bottom, y);
    right = Math.max(right, x);
    top = Math.max(top, y);
  }
  return { left, bottom, right, top };
};

/** The ring that encloses most; rings of holes and crumbs are left out. */
const largest = (paths: Paths64): Path64 => {
  let best: Path64 = [];
  let bestArea = 0;
  for (const path of paths) {
    const area = areaPaths([path]);
    if (area > bestArea) {
      best = path;
      bestArea = area;
    }
  }
  return best;
};

/** The outline grown by half the spacing with narrow mouths closed: covers every point nearer to the part than that. */
function grownOutline(outline: Path64, halfSpacingUm: number): Path64 {
  const reachUm = halfSpacingUm + FLATTEN_UM;
  const plain = grow([outline], reachUm);
  // Mitred shrinking can cut below the plain growth at inner corners, so the two are joined.
  const closed = grow(grow([outline], CLOSE_UM), reachUm - CLOSE_UM);
  return largest(simplifyPaths([largest(union([...plain, ...closed], FillRule.NonZero))], FLATTEN_UM));
}

/** A part's outline (counter-clockwise, mm) at a turn, ready for packing with `spacingMm` between parts. */
export function shapeOf(outline: readonly Vec2[], turnDeg: number, spacingMm: number): Shape {
  const turned = placePath(outline, { turnDeg, moveMm: [0, 0] }).map(([x, y]) => ({
    x: Math.round(x * UM),
    y: Math.round(y * UM),
  }));
  const box = boxOf(turned);
  const atZero = turned.map(({ x, y }) => ({ x: x - box.left, y: y - box.bottom }));
  const grown = grownOutline(atZero, (spacingMm * UM) / 2);
  if (grown.length < 3) throw new RangeError(`outline encloses nothing: ${outline.length} points`);
  const rim = boxOf(grown);
  return {
    key: grown.map(({ x, y }) => `${x},${y}`).join(' '),
    grown,
    from: [box.left, box.bottom],
    sizeUm: [box.right - box.left, box.top - box.bottom],
    rimUm: [-rim.left, -rim.bottom],
  };
}
