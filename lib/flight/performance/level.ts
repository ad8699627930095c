import { leastBetween, rootBetween } from '@/lib/numerics/roots';
import type { SpreadEnd } from '@/lib/numerics/spread';
import type { Polar } from './polar';

// Level flight, glide and climb from a polar: lift equals weight, angles small enough for that (J. D. Anderson, "Aircraft Performance
// and Design", ch. 5). Speeds m/s, forces N, powers W. Nothing is asked below the stall.

/** Lift coefficient that carries the weight at a speed. */
export const levelLift = ({ weightN, areaM2, densityKgM3 }: Polar, speedMs: number): number =>
  weightN / (0.5 * densityKgM3 * speedMs ** 2 * areaM2);

/** Drag in level flight. Throws RangeError below the stall. */
export function levelDragN(polar: Polar, speedMs: number, motor: 'on' | 'off', end: SpreadEnd = 'value'): number {
  if (!(speedMs >= polar.stallMs * (1 - 1e-9))) throw new RangeError(`${speedMs} m/s is below the stall`);
  const pressure = 0.5 * polar.densityKgM3 * speedMs ** 2;
  // Just at the stall rounding must not ask for more lift than there is.
  const cl = levelLift(polar, Math.max(speedMs, polar.stallMs));
  return pressure * polar.areaM2 * polar.dragCoefficient(cl, speedMs, motor, end);
}

/** Fastest glide looked at, in stall speeds: the best ones lie far below. */
const FASTEST_GLIDE = 4;

export interface Glide {
  readonly speedMs: number;
  /** Distance over height: lift over drag. */
  readonly ratio: number;
  /** Height lost in a second: power needed over weight. */
  readonly sinkMs: number;
}

/** The steady glide at a speed, motor off. */
function glideAt(polar: Polar, speedMs: number, end: SpreadEnd = 'value'): Glide {
  const drag = levelDragN(polar, speedMs, 'off', end);
  return { speedMs, ratio: polar.weightN / drag, sinkMs: (drag * speedMs) / polar.weightN };
}

/** The flattest glide: least drag. */
export function bestGlide(polar: Polar, end: SpreadEnd = 'value'): Glide {
  const cost = (speedMs: number) => levelDragN(polar, speedMs, 'off', end);
  return glideAt(polar, leastBetween(cost, polar.stallMs, polar.stallMs * FASTEST_GLIDE), end);
}

/** The slowest descent: least power. With much induced drag it lies at the stall. */
export function leastSink(polar: Polar, end: SpreadEnd = 'value'): Glide {
  const cost = (speedMs: number) => levelDragN(polar, speedMs, 'off', end) * speedMs;
  return glideAt(polar, leastBetween(cost, polar.stallMs, polar.stallMs * FASTEST_GLIDE), end);
}

/** Thrust by flying speed, and the speed at which nothing of it is left. */
export interface ThrustCurve {
  readonly thrustN: (speedMs: number) => number;
  readonly spentMs: number;
}

/** Steps in which an excess of thrust is looked for from above. */
const SCAN = 30;

/**
 * Highest level speed: the fastest at which thrust still equals drag. Null when the thrust is not enough to fly level at any speed above
 * the stall.
 */
export function topLevelSpeedMs(polar: Polar, thrust: ThrustCurve, end: SpreadEnd = 'value'): number | null {
  const excess = (speedMs: number) => thrust.thrustN(speedMs) - levelDragN(polar, speedMs, 'on', end);
  const { stallMs } = polar;
  if (!(thrust.spentMs > stallMs)) return null;
  let above = thrust.spentMs;
  for (let i = SCAN - 1; i >= 0; i -= 1) {
    const below = stallMs + ((thrust.spentMs - stallMs) * i) / SCAN;
    if (excess(below) >= 0) return rootBetween(excess, below, above);
    above = below;
  }
  return null;
}

/** Excess thrust over weight from which a climb is straight up; the best rate lies where it is just 1. */
const STRAIGHT_UP = 0.999;

export interface Climb {
  readonly speedMs: number;
  readonly climbMs: number;
  /** Thrust less drag is over the weight there: it can climb straight up, and the rate is its speed. */
  readonly straightUp: boolean;
}

/**
 * Best rate of climb: excess power over weight, at the speed where it is largest; null when the thrust is spent before the stall. It is
 * less than nothing when it can only sink. Lift is taken as in level flight, which makes a steep climb's drag too large.
 */
export function bestClimb(polar: Polar, thrust: ThrustCurve, end: SpreadEnd = 'value'): Climb | null {
  const { stallMs, weightN } = polar;
  if (!(thrust.spentMs > stallMs)) return null;
  const slope = (speedMs: number) => (thrust.thrustN(speedMs) - levelDragN(polar, speedMs, 'on', end)) / weightN;
  const rate = (speedMs: number) => speedMs * Math.min(1, slope(speedMs));
  const speedMs = leastBetween((v) => -rate(v), stallMs, thrust.spentMs);
  return { speedMs, climbMs: rate(speedMs), straightUp: slope(speedMs) >= STRAIGHT_UP };
}
