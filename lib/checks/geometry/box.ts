import { lerp3, type Vec3 } from '@/lib/numerics/vec';
import { type Nearest, nearest } from './nearest';

/** A box along the aircraft's axes, mm. Items are not turned, so nothing else is needed. */
export interface Box {
  readonly min: Vec3;
  readonly max: Vec3;
}

/** A box of a size about its centre. */
export const boxAbout = ([x, y, z]: Vec3, [length, width, height]: Vec3): Box => ({
  min: [x - length / 2, y - width / 2, z - height / 2],
  max: [x + length / 2, y + width / 2, z + height / 2],
});

export const boxCentre = ({ min, max }: Box): Vec3 => lerp3(min, max, 0.5);

/** Free space between two ranges; negative is how far they lie into each other. */
const rangeGap = (aMin: number, aMax: number, bMin: number, bMax: number): number => Math.max(aMin - bMax, bMin - aMax);

/** Gaps along x, y and z. */
const gaps = (a: Box, b: Box): Vec3 => [
  rangeGap(a.min[0], a.max[0], b.min[0], b.max[0]),
  rangeGap(a.min[1], a.max[1], b.min[1], b.max[1]),
  rangeGap(a.min[2], a.max[2], b.min[2], b.max[2]),
];

/** Distance between two boxes, mm; negative: the shortest move along an axis that parts them (separating axes). */
export function boxGap(a: Box, b: Box): number {
  const [x, y, z] = gaps(a, b);
  const apart = Math.hypot(Math.max(0, x), Math.max(0, y), Math.max(0, z));
  return apart > 0 ? apart : Math.max(x, y, z);
}

/** Whether two boxes would meet if one were slid along x. */
export function sameLane(a: Box, b: Box): boolean {
  const [, y, z] = gaps(a, b);
  return y < 0 && z < 0;
}

/** Distance of a point from a box, mm; 0 inside. */
export const pointToBox = ({ min, max }: Box, [x, y, z]: Vec3): number =>
  Math.hypot(
    Math.max(0, min[0] - x, x - max[0]),
    Math.max(0, min[1] - y, y - max[1]),
    Math.max(0, min[2] - z, z - max[2]),
  );

/** The point of a line between two points that is nearest to a box. */
export function lineToBox(box: Box, from: Vec3, to: Vec3): Nearest {
  const found = nearest({ grid: [17], place: ([t = 0]) => lerp3(from, to, t) }, (point) => pointToBox(box, point));
  return found ?? { mm: pointToBox(box, from), at: from };
}
