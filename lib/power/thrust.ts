import type { Airframe } from '@/lib/airframe/schema/airframe';
import type { Drive } from '@/lib/airframe/schema/equipment';
import { ok, type Problem, type Result, refuse } from '@/lib/numerics/result';
import { exactly, type Spread, type SpreadEnd, spread } from '@/lib/numerics/spread';
import { texts } from '@/lib/text/en/figures/performance';
import { discThrustN, exitSpeedMs, FREE_STREAM_SHARE, figureOfMerit } from './disc';
import { pitchSpeedMs } from './pitchSpeed';
import {
  GENERIC_PROPELLER,
  genericPowerCoefficient,
  genericThrustCoefficient,
  propellerPowerW,
  turnsForThrust,
} from './propeller';

// Thrust from what the document holds, until motor, pack and propeller are worked out together: a stated static thrust, else what the
// motor's largest power gives by momentum theory, falling in a straight line with speed.

/** Share of the motor's input that its shaft gives. Common practice for small brushless motors, no source. */
const MOTOR_EFFICIENCY: Spread = { value: 0.75, low: 0.65, high: 0.85 };
/** Share of a fan's shaft power that ends up in its jet. From memory. */
const FAN_EFFICIENCY: Spread = { value: 0.62, low: 0.5, high: 0.75 };
/** Exit over swept area of a fan whose duct is not drawn. Common practice, no source: 80 to 95 %. */
const FAN_EXIT_SHARE = 0.875;
/**
 * How far past pitch speed the high end of the straight line reaches. A measured propeller of 0.47 pitch over diameter pulls to an advance
 * ratio of 0.657, 1.4 times its pitch, and its curve bulges over a straight line to there; with 1.65 times the line passes over it from
 * an advance ratio of 0.3 and at most 3 % under it where it is slower (UIUC Propeller Database, volume 1, 10 x 4.7 in).
 */
const PULL_BEYOND_PITCH_SPEED = 1.65;

/** One kind of drive; `count` of them are fitted, each with these figures. */
export interface DriveThrust {
  readonly index: number;
  readonly count: number;
  readonly basis: 'stated' | 'estimated';
  readonly staticN: Spread;
  /** Flying speed at which nothing is left, m/s. */
  readonly spentMs: Spread;
  /** Of a propeller: turns a minute at the static thrust, the shaft power for it and how far it screws in a second. */
  readonly propeller: { readonly rpm: number; readonly shaftW: number; readonly pitchSpeedMs: Spread } | null;
  /** Power that momentum theory needs over the motor's largest; over 1 is impossible. Null without a stated thrust and power. */
  readonly merit: number | null;
}

export interface Thrust {
  readonly drives: readonly DriveThrust[];
  readonly staticN: Spread;
}

const noThrust = (index: number): Problem => ({
  code: 'no-thrust',
  path: `drives.${index}.statedThrustN`,
  message: texts.problems.noThrust,
  fix: texts.problems.noThrustFix,
});

/** Thrust of all drives together; null for a glider. Refused, with the path of its stated thrust, when nothing says what a drive gives. */
export function thrustOf({ drives }: Pick<Airframe, 'drives'>, densityKgM3: number): Result<Thrust | null> {
  if (drives.length === 0) return ok(null);
  const found = drives.map((drive, index) => driveThrust(drive, index, densityKgM3));
  const each = found.filter((drive) => drive !== null);
  if (each.length < found.length) return refuse(noThrust(found.indexOf(null)));
  return ok({ drives: each, staticN: spread((end) => each.reduce((sum, d) => sum + d.count * d.staticN[end], 0)) });
}

/**
 * Thrust in N at a flying speed: each drive's falls in a straight line from standing still to the speed at which it is spent, and is
 * nothing beyond.
 */
export function thrustAtN({ drives }: Thrust, speedMs: number, end: SpreadEnd = 'value'): number {
  return drives.reduce(
    (sum, { count, staticN, spentMs }) => sum + count * staticN[end] * Math.max(0, 1 - speedMs / spentMs[end]),
    0,
  );
}

/** Speed in m/s beyond which no drive pulls. */
export const spentSpeedMs = ({ drives }: Thrust, end: SpreadEnd = 'value'): number =>
  drives.reduce((most, { spentMs }) => Math.max(most, spentMs[end]), 0);

function driveThrust(drive: Drive, index: number, densityKgM3: number): DriveThrust | null {
  const { areaM2, exitShare } = discOf(drive);
  const { statedThrustN: stated, motor } = drive;
  const estimate = motor.maxW === undefined ? null : estimatedN(drive, motor.maxW, densityKgM3);
  const staticN = stated && stated > 0 ? exactly(stated) : estimate;
  if (!staticN) return null;
  const merit =
    stated && motor.maxW !== undefined
      ? figureOfMerit(stated, motor.maxW, (areaM2 * exitShare) / FREE_STREAM_SHARE, densityKgM3)
      : null;
  const base = {
    index,
    count: drive.mirrored ? 2 : 1,
    basis: stated ? 'stated' : 'estimated',
    staticN,
    merit,
  } as const;
  if (drive.kind === 'ductedFan') {
    // What a fixed jet pushes falls in a straight line until it is no faster than the flight.
    const spentMs = spread((end) => exitSpeedMs(staticN[end], areaM2 * exitShare, densityKgM3));
    return { ...base, spentMs, propeller: null };
  }
  const propeller = screwOf(drive, staticN, densityKgM3);
  const { value, low, high } = propeller.pitchSpeedMs;
  return { ...base, propeller, spentMs: { value, low, high: high * PULL_BEYOND_PITCH_SPEED } };
}

/** Swept area in m2, hub taken off, and the exit's share of it. */
function discOf(drive: Drive): { readonly areaM2: number; readonly exitShare: number } {
  const ring = (outerMm: number, innerMm: number) => ((Math.PI / 4) * (outerMm ** 2 - innerMm ** 2)) / 1e6;
  if (drive.kind === 'propeller') return { areaM2: ring(drive.propeller.diameterMm, 0), exitShare: FREE_STREAM_SHARE };
  const areaM2 = ring(drive.fan.diameterMm, drive.fan.hubMm);
  return { areaM2, exitShare: drive.duct ? drive.duct.outletMm2 / 1e6 / areaM2 : FAN_EXIT_SHARE };
}

function estimatedN(drive: Drive, maxW: number, densityKgM3: number): Spread {
  const { areaM2, exitShare } = discOf(drive);
  const merit = drive.kind === 'propeller' ? GENERIC_PROPELLER.figureOfMerit : FAN_EFFICIENCY;
  return spread((end) => discThrustN(maxW * MOTOR_EFFICIENCY[end] * merit[end], areaM2, exitShare, densityKgM3));
}

/** Turns and pitch speed by the generic propeller: a low coefficient must turn faster for the same thrust. */
function screwOf(drive: Extract<Drive, { kind: 'propeller' }>, staticN: Spread, densityKgM3: number) {
  const { diameterMm, pitchMm, blades } = drive.propeller;
  const ct = genericThrustCoefficient(blades);
  const turns = (thrustN: number, coefficient: number) =>
    turnsForThrust(thrustN, coefficient, diameterMm / 1000, densityKgM3);
  const middle = turns(staticN.value, ct);
  const speed = (turnsPerS: number) => pitchSpeedMs(turnsPerS * 60, pitchMm);
  return {
    rpm: middle * 60,
    shaftW: propellerPowerW(genericPowerCoefficient(ct), middle, diameterMm / 1000, densityKgM3),
    pitchSpeedMs: {
      value: speed(middle),
      low: speed(turns(staticN.low, genericThrustCoefficient(blades, 'high'))),
      high: speed(turns(staticN.high, genericThrustCoefficient(blades, 'low'))),
    },
  };
}
