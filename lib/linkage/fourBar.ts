import type { Vec2 } from '@/lib/numerics/vec';

// A servo arm, a rod and a horn in one plane, seen along the hinge. The hinge is the origin; the first coordinate runs aft along the
// chord, the second out of the face that the horn stands on; mm. Angles are measured from the second axis and count aft.

export interface FourBar {
  readonly shaft: Vec2;
  readonly armMm: number;
  readonly hornMm: number;
  /** Between the two holes. */
  readonly rodLengthMm: number;
  /** Where the arm points at neutral; the horn then stands square to the surface. */
  readonly armRad: number;
}

const crossOf = (a: Vec2, b: Vec2): number => a[0] * b[1] - a[1] * b[0];
const minus = (a: Vec2, b: Vec2): Vec2 => [a[0] - b[0], a[1] - b[1]];
const spoke = (lengthMm: number, angleRad: number): Vec2 => [
  lengthMm * Math.sin(angleRad),
  lengthMm * Math.cos(angleRad),
];
/** The same angle between minus and plus half a turn. */
const wrapped = (angleRad: number): number => Math.atan2(Math.sin(angleRad), Math.cos(angleRad));

const armEnd = ({ shaft, armMm, armRad }: FourBar, servoRad: number): Vec2 => {
  const [x, z] = spoke(armMm, armRad + servoRad);
  return [shaft[0] + x, shaft[1] + z];
};
const hornHole = ({ hornMm }: FourBar, hornRad: number): Vec2 => spoke(hornMm, hornRad);

/**
 * A linkage whose rod meets the arm at a right angle at neutral, the arm on the horn's side of the shaft, the horn square over the hinge.
 * Null when the servo stands too close for a rod: nearer to the horn's hole than the arm is long.
 */
export function layFourBar(shaft: Vec2, armMm: number, hornMm: number): FourBar | null {
  const [x, z] = minus([0, hornMm], shaft);
  const apartMm = Math.hypot(x, z);
  if (!(apartMm > armMm * 1.01)) return null;
  const towards = Math.atan2(x, z);
  const open = Math.acos(armMm / apartMm);
  const [one, other] = [towards - open, towards + open];
  const armRad = wrapped(Math.cos(one) >= Math.cos(other) ? one : other);
  return { shaft, armMm, hornMm, rodLengthMm: Math.sqrt(apartMm ** 2 - armMm ** 2), armRad };
}

/** Angle of a crank about the origin whose end lies `rodLengthMm` from a point, on the given side of the line to the point. */
function crankAngle(crankMm: number, to: Vec2, rodLengthMm: number, side: number): number | null {
  const farMm = Math.hypot(to[0], to[1]);
  const share = (crankMm ** 2 + farMm ** 2 - rodLengthMm ** 2) / (2 * crankMm * farMm);
  if (!(Math.abs(share) < 1)) return null;
  return Math.atan2(to[0], to[1]) + side * Math.acos(share);
}

function hornFrom(bar: FourBar, servoRad: number): number | null {
  const side = Math.sign(wrapped(-Math.atan2(...armEnd(bar, 0))));
  const angle = crankAngle(bar.hornMm, armEnd(bar, servoRad), bar.rodLengthMm, side);
  return angle === null ? null : wrapped(angle);
}

function servoFrom(bar: FourBar, hornRad: number): number | null {
  const side = Math.sign(wrapped(bar.armRad - Math.atan2(...minus(hornHole(bar, 0), bar.shaft))));
  const angle = crankAngle(bar.armMm, minus(hornHole(bar, hornRad), bar.shaft), bar.rodLengthMm, side);
  return angle === null ? null : wrapped(angle - bar.armRad);
}

const SAME_RAD = 1e-7;
const same = (a: number | null, b: number): boolean => a !== null && Math.abs(wrapped(a - b)) < SAME_RAD;

/**
 * Horn angle from servo angle, radians aft from neutral, exact: where the circle about the hinge meets the circle about the arm's end
 * (Norton, Design of Machinery, position analysis of the four-bar linkage; the same as Freudenstein's equation). Null at and beyond a
 * dead centre, where rod and horn or rod and arm come into line.
 */
export function hornAngleRad(bar: FourBar, servoRad: number): number | null {
  const horn = hornFrom(bar, servoRad);
  return horn !== null && same(servoFrom(bar, horn), servoRad) ? horn : null;
}

/** Servo angle for a wanted horn angle, radians aft from neutral; null when a dead centre comes before it. The inverse of `hornAngleRad`. */
export function servoAngleRad(bar: FourBar, hornRad: number): number | null {
  const servo = servoFrom(bar, hornRad);
  return servo !== null && same(hornFrom(bar, servo), hornRad) ? servo : null;
}

export interface Levers {
  /** Distance of the rod's line from the servo shaft and from the hinge, mm: their product with the rod's force is the torque. */
  readonly armMm: number;
  readonly hornMm: number;
  /** Horn turn per servo turn, and servo torque per hinge moment; negative when they turn against each other. */
  readonly ratio: number;
}

/** Lever arms of the rod at a servo angle, by virtual work (Norton, mechanical advantage); null at a dead centre. */
export function leversAt(bar: FourBar, servoRad: number): Levers | null {
  const horn = hornAngleRad(bar, servoRad);
  if (horn === null) return null;
  const end = armEnd(bar, servoRad);
  const hole = hornHole(bar, horn);
  const rod = minus(hole, end);
  const arm = crossOf(minus(end, bar.shaft), rod) / bar.rodLengthMm;
  const lever = crossOf(hole, rod) / bar.rodLengthMm;
  return { armMm: Math.abs(arm), hornMm: Math.abs(lever), ratio: arm / lever };
}
