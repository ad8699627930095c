import { type PitchAxis, POWER_OFF, type ThrustLine, type Trim, thrustLine, trim, trimLoad } from '@/lib/flight/trim';
import type { Result } from '@/lib/numerics/result';
import type { SpreadEnd } from '@/lib/numerics/spread';
import { type Thrust, thrustAtN, thrustOf } from '@/lib/power/thrust';
import { STANDARD_GRAVITY } from '@/lib/units/factors';
import type { FigureContext } from './context';
import { massErrorOf } from './massError';

/** One aircraft in straight flight at any speed, CG and throttle. */
export interface TrimBench {
  readonly context: FigureContext;
  readonly axis: PitchAxis;
  readonly stallMs: number;
  /** How far the neutral point may lie from its middle as the CG sees it, mm: its own band, and by squares the CG's. */
  readonly shiftsMm: readonly [low: number, high: number];
  readonly thrust: Result<Thrust | null>;
}

/** Sets the aircraft of a context up for trimming. */
export function trimBench(context: FigureContext, axis: PitchAxis): TrimBench {
  const { neutralPointX, bandX, clMax } = context.stability;
  const cgErrorMm = massErrorOf(context).cgMm[0];
  return {
    context,
    axis,
    stallMs: speedAt(context, axis, clMax.value),
    shiftsMm: [-Math.hypot(bandX[0] - neutralPointX, cgErrorMm), Math.hypot(bandX[1] - neutralPointX, cgErrorMm)],
    thrust: thrustOf(context.airframe, context.air.densityKgM3),
  };
}

/** Level speed in m/s at a lift coefficient: V = sqrt(2 W / (rho S CL)). */
const speedAt = ({ balance, air }: FigureContext, { areaMm2 }: PitchAxis, cl: number): number =>
  Math.sqrt((2 * weightN(balance)) / (air.densityKgM3 * (areaMm2 / 1e6) * cl));

const weightN = ({ massG }: FigureContext['balance']): number => (massG / 1000) * STANDARD_GRAVITY;

/** The trim that holds a speed, about the CG of the given axis. */
export function holdSpeed(
  { context }: TrimBench,
  axis: PitchAxis,
  speedMs: number,
  line: ThrustLine = POWER_OFF,
): Result<Trim> {
  const pressurePa = 0.5 * context.air.densityKgM3 * speedMs ** 2;
  return trim(axis, trimLoad(axis, weightN(context.balance), pressurePa, line));
}

/** All drives at full throttle at a speed, about the CG; turned down by more where asked. */
export function fullThrottle(
  { context: { airframe, resolved, balance } }: TrimBench,
  thrust: Thrust,
  speedMs: number,
  end: SpreadEnd = 'value',
  downDeg = 0,
): ThrustLine {
  const each = new Map(
    thrust.drives.map((drive) => [drive.index, thrustAtN({ ...thrust, drives: [drive] }, speedMs, end) / drive.count]),
  );
  const [x, , z] = balance.cg;
  return thrustLine(airframe, resolved, [x, 0, z], (index) => each.get(index) ?? 0, downDeg);
}
