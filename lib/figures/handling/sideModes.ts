import {
  DUTCH_ROLL_DAMPING,
  DUTCH_ROLL_DECAY,
  DUTCH_ROLL_RADS,
  FROUDE_FACTOR,
  judge,
  ROLL_MODE_S,
  SPIRAL_DOUBLE_S,
  scaledLevels,
  worse,
} from '@/lib/flight/criteria';
import { lateralModesOf } from '@/lib/flight/modes/lateral';
import { dampingOf, doublingS, type LateralModes, naturalRadSOf } from '@/lib/flight/modes/roots';
import type { Problem } from '@/lib/numerics/result';
import { texts } from '@/lib/text/en/figures/handling';
import { fill } from '@/lib/text/fill';
import { fixedDigits } from '@/lib/units/number';
import { bandBySquares } from '../bySquares';
import type { FigureContext } from '../context';
import { CATEGORY_CRUISE, DEAD_TIMES_TO_DOUBLE, LEAST_GROWTH_PER_S, PILOT_DEAD_TIME_S } from '../handlingBands';
import type { FigureValue } from '../types';
import { doesNotApply, type FigureSet, known, missing } from '../value';
import { type Cruise, inertiaEnds, limitInput, scaleInput, speedInput } from './cruise';
import { sideEnds } from './sideEnds';
import { levelVerdict, mindingWeakEnd } from './verdict';

const { verdicts, inputs, problems, causes } = texts;

type Verdicted = NonNullable<FigureValue['verdict']>;

/** The modes as worked out, and at the ends of each cause by itself; null at an end that no mass has. */
interface SideModes {
  readonly middle: LateralModes;
  /** Fins weaker and the body stronger, and the other way round. */
  readonly byFins: readonly LateralModes[];
  readonly byRollInertia: readonly (LateralModes | null)[];
  readonly byYawInertia: readonly (LateralModes | null)[];
}

/** A number of the modes at the ends of every cause, by cause. */
const atEnds = ({ byFins, byRollInertia, byYawInertia }: SideModes, of: (modes: LateralModes) => number | null) =>
  [byFins, byRollInertia, byYawInertia].map((ends) => ends.map((modes) => modes && of(modes)));

/** Roll mode, Dutch roll and spiral at cruise. The point must have inertia. */
export function sideFigures(context: FigureContext, cruise: Cruise): FigureSet {
  const { point, trim, lateral } = cruise;
  const by = (axis: 'xx' | 'zz') =>
    inertiaEnds(cruise, axis).map((end) => end && lateralModesOf(end, trim.alphaRad, lateral));
  const all: SideModes = {
    middle: lateralModesOf(point, trim.alphaRad, lateral),
    byFins: sideEnds(context, lateral).map((d) => lateralModesOf(point, trim.alphaRad, d)),
    byRollInertia: by('xx'),
    byYawInertia: by('zz'),
  };
  return { ...rollAndSpiral(cruise, all), ...dutchRoll(cruise, all) };
}

function rollAndSpiral(cruise: Cruise, modes: SideModes): FigureSet {
  const { rollSpiral } = modes.middle;
  if (rollSpiral.kind === 'oscillation') {
    const joined = rollSpiralJoined((2 * Math.PI) / rollSpiral.swingRadS);
    return { rollModeS: missing(joined), spiralDoubleS: missing(joined) };
  }
  const rate = (which: 0 | 1) => (at: LateralModes) =>
    at.rollSpiral.kind === 'aperiodic' ? at.rollSpiral.ratesPerS[which] : null;
  return {
    rollModeS: rollModeFigure(cruise, rollSpiral.ratesPerS[0], atEnds(modes, rate(0))),
    spiralDoubleS: spiralFigure(cruise, rollSpiral.ratesPerS[1], modes.byFins.map(rate(1))),
  };
}

const rollSpiralJoined = (seconds: number): Problem => ({
  code: 'roll-spiral-joined',
  path: 'surfaces',
  message: fill(problems.rollSpiralJoined, { s: fixedDigits(seconds, 1) }),
  fix: problems.rollSpiralJoinedFix,
});

const ROLL_MODE_WORDS = {
  veryLow: verdicts.rollModeGood,
  low: verdicts.rollModeGood,
  good: verdicts.rollModeGood,
  high: verdicts.rollModeSlow,
  veryHigh: verdicts.rollModeVerySlow,
};

type Rates = readonly (number | null)[];

function rollModeFigure(cruise: Cruise, rate: number, ends: readonly Rates[]): FigureValue {
  if (!(rate < -LEAST_GROWTH_PER_S))
    return missing({ code: 'roll-undamped', path: 'surfaces', message: problems.rollGrows });
  const value = -1 / rate;
  const seconds = (end: number | null) => (end !== null && end < 0 ? -1 / end : null);
  const found = bandBySquares(
    value,
    ends.map((each) => each.map(seconds)),
    causes.rollDamping,
  );
  const levels = scaledLevels(ROLL_MODE_S[CATEGORY_CRUISE], FROUDE_FACTOR.time(cruise.scale));
  const verdict = (at: number) => levelVerdict(judge(at, levels), ROLL_MODE_WORDS);
  return known(value, {
    ...found,
    verdict: mindingWeakEnd(verdict(value), verdict(found?.band?.high ?? value)),
    inputs: [
      speedInput(cruise),
      { name: inputs.rollInertia, value: cruise.point.inertiaKgM2.xx, unit: 'kg m²' },
      scaleInput(cruise),
      limitInput(levels.bounds[0].most ?? 0, 's'),
    ],
  });
}

/** Time to double of a bank; negative: it halves in that time. The band is left out where one end grows and the other does not. */
function spiralFigure(cruise: Cruise, rate: number, ends: Rates): FigureValue {
  if (Math.abs(rate) < LEAST_GROWTH_PER_S) return doesNotApply(problems.spiralNeutral);
  const value = doublingS(rate);
  const sameWay = (end: number | null) =>
    end !== null && end * rate > 0 && Math.abs(end) >= LEAST_GROWTH_PER_S ? doublingS(end) : null;
  const fastest = Math.max(rate, ...ends.filter((end) => end !== null));
  const verdict = spiralVerdict(cruise, value);
  return known(value, {
    ...bandBySquares(value, [ends.map(sameWay)], causes.side),
    verdict:
      fastest > LEAST_GROWTH_PER_S ? mindingWeakEnd(verdict, spiralVerdict(cruise, doublingS(fastest))) : verdict,
    inputs: [
      speedInput(cruise),
      scaleInput(cruise),
      limitInput(spiralLevels(cruise).bounds[0].least ?? 0, 's'),
      { name: inputs.deadTime, value: PILOT_DEAD_TIME_S.value, unit: 's' },
    ],
  });
}

const spiralLevels = ({ scale }: Cruise) => scaledLevels(SPIRAL_DOUBLE_S[CATEGORY_CRUISE], FROUDE_FACTOR.time(scale));

/** Level 1 and 2 scaled, but never faster than what gets away from a pilot, who does not scale. */
function spiralVerdict(cruise: Cruise, seconds: number): Verdicted {
  if (seconds < 0) return { level: 'good', words: fill(verdicts.spiralRights, { s: fixedDigits(-seconds, 1) }) };
  const { level } = judge(seconds, spiralLevels(cruise));
  const escapes = seconds < DEAD_TIMES_TO_DOUBLE.value * PILOT_DEAD_TIME_S.value;
  if (escapes || (level !== 1 && level !== 2)) return { level: 'bad', words: verdicts.spiralFast };
  return level === 1 ? { level: 'good', words: verdicts.spiralSlow } : { level: 'watch', words: verdicts.spiralGrows };
}

const yawDiverges: Problem = {
  code: 'yaw-diverges',
  path: 'surfaces',
  message: problems.yawDiverges,
  fix: problems.yawDivergesFix,
};

const FREQUENCY_WORDS = {
  veryLow: verdicts.dutchFrequencyLow,
  low: verdicts.dutchFrequencyLow,
  good: verdicts.dutchFrequencyGood,
  high: verdicts.dutchFrequencyGood,
  veryHigh: verdicts.dutchFrequencyGood,
};
const DAMPING_WORDS = {
  veryLow: verdicts.dutchDampingVeryLow,
  low: verdicts.dutchDampingLow,
  good: verdicts.dutchDampingGood,
  high: verdicts.dutchDampingGood,
  veryHigh: verdicts.dutchDampingGood,
};

const swingsAway: Verdicted = { level: 'bad', words: verdicts.dutchSwingsAway };

function dutchRoll(cruise: Cruise, modes: SideModes): FigureSet {
  const natural = naturalRadSOf(modes.middle.dutchRoll);
  const damping = dampingOf(modes.middle.dutchRoll);
  if (natural === null || damping === null)
    return { dutchRollHz: missing(yawDiverges), dutchRollDamping: missing(yawDiverges) };
  const own = [
    speedInput(cruise),
    { name: inputs.yawInertia, value: cruise.point.inertiaKgM2.zz, unit: 'kg m²' },
    scaleInput(cruise),
  ];
  // An end at which the nose swings away does not swing back: its frequency is none, and it has no damping.
  const naturals = atEnds(modes, ({ dutchRoll: pair }) => naturalRadSOf(pair) ?? 0);
  const dampings = atEnds(modes, ({ dutchRoll: pair }) => dampingOf(pair));
  const radS = bandBySquares(natural, naturals, causes.sideAndInertia, 0);
  const ratio = bandBySquares(damping, dampings, causes.sideAndInertia);
  const weakRadS = radS?.band?.low ?? natural;
  const weak = ratio?.band ? wagVerdict(cruise, weakRadS, ratio.band.low) : swingsAway;
  return {
    dutchRollHz: frequencyFigure(cruise, natural, radS?.band, own),
    dutchRollDamping: known(damping, {
      ...ratio,
      verdict: mindingWeakEnd(wagVerdict(cruise, natural, damping), weak),
      inputs: [...own, limitInput(DUTCH_ROLL_DAMPING[CATEGORY_CRUISE].bounds[0].least ?? 0, '')],
    }),
  };
}

const byFrequency = ({ scale }: Cruise) => FROUDE_FACTOR.frequency(scale);

/** The criterion wants both: a ratio, which does not scale, and its product with the frequency, which does. */
function wagVerdict(cruise: Cruise, natural: number, damping: number): Verdicted {
  if (damping < 0) return { level: 'bad', words: verdicts.dutchDampingGrows };
  const ratio = judge(damping, DUTCH_ROLL_DAMPING[CATEGORY_CRUISE]);
  const decay = judge(damping * natural, scaledLevels(DUTCH_ROLL_DECAY[CATEGORY_CRUISE], byFrequency(cruise)));
  return levelVerdict(worse(ratio, decay), DAMPING_WORDS);
}

function frequencyFigure(
  cruise: Cruise,
  natural: number,
  band: FigureValue['band'],
  own: NonNullable<FigureValue['inputs']>,
): FigureValue {
  const hz = (radS: number) => radS / (2 * Math.PI);
  const levels = scaledLevels(DUTCH_ROLL_RADS[CATEGORY_CRUISE], byFrequency(cruise));
  const verdict = (at: number) => (at > 0 ? levelVerdict(judge(at, levels), FREQUENCY_WORDS) : swingsAway);
  return known(hz(natural), {
    ...(band ? { band: { low: hz(band.low), high: hz(band.high), cause: band.cause } } : {}),
    verdict: mindingWeakEnd(verdict(natural), verdict(band?.low ?? natural)),
    inputs: [...own, limitInput(hz(levels.bounds[0].least ?? 0), 'Hz')],
  });
}
