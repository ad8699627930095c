import { bestClimb, topLevelSpeedMs } from '@/lib/flight/performance/level';
import type { AircraftPolar } from '@/lib/flight/performance/polar';
import type { Problem } from '@/lib/numerics/result';
import type { DriveThrust, Thrust } from '@/lib/power/thrust';
import { texts } from '@/lib/text/en/figures/performance';
import { fill } from '@/lib/text/fill';
import { fixedDigits } from '@/lib/units/number';
import { bandOf } from './bandOf';
import { thrustCurve } from './levelFlight';
import {
  CLIMB_MS,
  FAN_THRUST_TO_WEIGHT,
  MERIT_DOUBTFUL,
  MERIT_IMPOSSIBLE,
  PITCH_SPEED_OVER_STALL,
  THRUST_TO_WEIGHT,
} from './performanceBands';
import type { FigureValue } from './types';
import { doesNotApply, type FigureSet, known, missing, verdictOf } from './value';

const THRUST_WORDS = {
  veryLow: texts.verdicts.thrustVeryLow,
  low: texts.verdicts.thrustLow,
  good: texts.verdicts.thrustGood,
  high: texts.verdicts.thrustHigh,
  veryHigh: texts.verdicts.thrustVeryHigh,
};

const PITCH_SPEED_WORDS = {
  veryLow: texts.verdicts.pitchSpeedVeryLow,
  low: texts.verdicts.pitchSpeedLow,
  good: texts.verdicts.pitchSpeedGood,
  high: texts.verdicts.pitchSpeedHigh,
  veryHigh: texts.verdicts.pitchSpeedVeryHigh,
};

const CLIMB_WORDS = {
  veryLow: texts.verdicts.climbVeryLow,
  low: texts.verdicts.climbLow,
  good: texts.verdicts.climbGood,
  high: texts.verdicts.climbGood,
  veryHigh: texts.verdicts.climbGood,
};

/** Static thrust, against the motor's power and the weight, and pitch speed. */
export function thrustFigures(thrust: Thrust, polar: AircraftPolar): FigureSet {
  const { staticN, drives } = thrust;
  const estimated = drives.some(({ basis }) => basis === 'estimated');
  const band = (scale: number) =>
    estimated ? { band: bandOf(texts.causes.thrust, staticN.low * scale, staticN.high * scale) } : {};
  const ratio = staticN.value / polar.weightN;
  const limits = drives.some(({ propeller }) => propeller) ? THRUST_TO_WEIGHT : FAN_THRUST_TO_WEIGHT;
  const inputs = [{ name: texts.inputs.thrust, value: staticN.value, unit: 'N' }];
  return {
    staticThrustN: known(staticN.value, { ...band(1), ...meritVerdict(drives), inputs: drives.flatMap(driveInputs) }),
    thrustToWeight: known(ratio, {
      ...band(1 / polar.weightN),
      verdict: verdictOf(ratio, limits, THRUST_WORDS),
      inputs,
    }),
    pitchSpeedMs: pitchSpeedFigure(drives, polar.stallMs),
  };
}

function meritVerdict(drives: readonly DriveThrust[]): Pick<FigureValue, 'verdict'> {
  const merit = drives.reduce((most, drive) => Math.max(most, drive.merit ?? 0), 0);
  if (merit > MERIT_IMPOSSIBLE.value) return { verdict: { level: 'bad', words: texts.verdicts.thrustImpossible } };
  if (merit > MERIT_DOUBTFUL.value) return { verdict: { level: 'watch', words: texts.verdicts.thrustDoubtful } };
  return {};
}

const driveInputs = ({ propeller, spentMs, merit }: DriveThrust) => [
  ...(propeller
    ? [
        { name: texts.inputs.rpm, value: propeller.rpm, unit: 'rpm' },
        { name: texts.inputs.shaftPower, value: propeller.shaftW, unit: 'W' },
      ]
    : []),
  { name: texts.inputs.spent, value: spentMs.value, unit: 'm/s' },
  ...(merit === null ? [] : [{ name: texts.inputs.ideal, value: merit, unit: '' }]),
];

/** Pitch speed of the slowest propeller. */
function pitchSpeedFigure(drives: readonly DriveThrust[], stallMs: number): FigureValue {
  const propellers = drives.flatMap(({ propeller }) => propeller ?? []);
  const [slowest] = [...propellers].sort((a, b) => a.pitchSpeedMs.value - b.pitchSpeedMs.value);
  if (!slowest) {
    const jet = drives.reduce((most, { spentMs }) => Math.max(most, spentMs.value), 0);
    return doesNotApply(fill(texts.problems.fanPitchSpeed, { speed: fixedDigits(jet, 0) }));
  }
  const { value, low, high } = slowest.pitchSpeedMs;
  const ratio = value / stallMs;
  return known(value, {
    band: bandOf(texts.causes.coefficient, low, high),
    verdict: verdictOf(ratio, PITCH_SPEED_OVER_STALL, PITCH_SPEED_WORDS),
    inputs: [
      { name: texts.inputs.rpm, value: slowest.rpm, unit: 'rpm' },
      { name: texts.inputs.overStall, value: ratio, unit: '' },
    ],
  });
}

const cannotFlyLevel: Problem = {
  code: 'cannot-fly-level',
  path: 'drives',
  message: texts.problems.cannotFlyLevel,
  fix: texts.problems.cannotFlyLevelFix,
};

/**
 * Best climb and highest level speed. The low end has the least thrust and the most drag, the high end the other way round.
 * @param top highest level speed, null when it cannot fly level
 */
export function poweredFigures(thrust: Thrust, polar: AircraftPolar, top: number | null): FigureSet {
  const [worst, best] = [thrustCurve(thrust, 'low'), thrustCurve(thrust, 'high')];
  const curve = thrustCurve(thrust);
  const climb = bestClimb(polar, curve);
  const inputs = [
    { name: texts.inputs.thrust, value: thrust.staticN.value, unit: 'N' },
    { name: texts.inputs.spent, value: curve.spentMs, unit: 'm/s' },
  ];
  const band = (low: number | null | undefined, high: number | null | undefined) =>
    typeof low === 'number' && typeof high === 'number' ? { band: bandOf(texts.causes.thrustAndDrag, low, high) } : {};
  const straightUp = { level: 'good' as const, words: texts.verdicts.climbStraightUp };
  return {
    topSpeedMs:
      top === null
        ? missing(cannotFlyLevel)
        : known(top, { ...band(topLevelSpeedMs(polar, worst, 'high'), topLevelSpeedMs(polar, best, 'low')), inputs }),
    climbMs:
      climb === null
        ? missing(cannotFlyLevel)
        : known(climb.climbMs, {
            ...band(bestClimb(polar, worst, 'high')?.climbMs, bestClimb(polar, best, 'low')?.climbMs),
            verdict: climb.straightUp ? straightUp : verdictOf(climb.climbMs, CLIMB_MS, CLIMB_WORDS),
            inputs: [...inputs, { name: texts.inputs.speed, value: climb.speedMs, unit: 'm/s' }],
          }),
  };
}
