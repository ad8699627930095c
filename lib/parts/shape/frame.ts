import {
  add3,
  cross3,
  dot3,
  length3,
  mirror3,
  radFromDeg,
  scale3,
  sub3,
  type Vec2,
  type Vec3,
} from '@/lib/numerics/vec';
import type { PartFrame } from '../types';

// A flat part's plane in the aircraft: part (x, y) stands at origin + x ex + y ey.

export const unit3 = (a: Vec3): Vec3 => {
  const size = length3(a);
  if (!(size > 0)) throw new RangeError('a direction must have a length');
  return scale3(a, 1 / size);
};

/** Out of the part's worked face. */
export const normalOf = ({ ex, ey }: PartFrame): Vec3 => cross3(ex, ey);

/** A point of the aircraft in the part's axes, seen square on. */
export const toPart = ({ origin, ex, ey }: PartFrame, p: Vec3): Vec2 => {
  const from = sub3(p, origin);
  return [dot3(from, ex), dot3(from, ey)];
};

/** How far a point of the aircraft stands out of the part's plane, positive on the worked face's side. mm. */
export const offPart = (frame: PartFrame, p: Vec3): number => dot3(sub3(p, frame.origin), normalOf(frame));

/** A point of the part's mid-plane in the aircraft. */
export const fromPart = ({ origin, ex, ey }: PartFrame, [x, y]: Vec2): Vec3 =>
  add3(origin, add3(scale3(ex, x), scale3(ey, y)));

/** Frame of the mirrored part on the other side, when its outline is mirrored in x: the same face stays the worked one. */
export const mirrorFrame = ({ origin, ex, ey }: PartFrame): PartFrame => ({
  origin: mirror3(origin),
  ex: scale3(mirror3(ex), -1),
  ey: mirror3(ey),
});

/** Turns a direction about a unit axis, right-handed. Rodrigues' formula. */
export function turn3(a: Vec3, axis: Vec3, angleDeg: number): Vec3 {
  const angle = radFromDeg(angleDeg);
  const c = Math.cos(angle);
  const along = scale3(axis, dot3(axis, a) * (1 - c));
  return add3(add3(scale3(a, c), scale3(cross3(axis, a), Math.sin(angle))), along);
}

/** The frame turned about a line through a point, right-handed about the unit axis. */
export const turnFrame = ({ origin, ex, ey }: PartFrame, at: Vec3, axis: Vec3, angleDeg: number): PartFrame => ({
  origin: add3(at, turn3(sub3(origin, at), axis, angleDeg)),
  ex: turn3(ex, axis, angleDeg),
  ey: turn3(ey, axis, angleDeg),
});
