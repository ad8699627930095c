import { type PitchCommand, pitchCommand } from '@/lib/flight/commands';
import { manoeuvreMargin, pitchRateDegSPerG, pullOf } from '@/lib/flight/modes/manoeuvre';
import type { Problem } from '@/lib/numerics/result';
import { texts } from '@/lib/text/en/figures/handling';
import { PITCH_FEEL, type VerdictBand } from '../bands';
import { bandBySquares, byShare } from '../bySquares';
import type { FigureContext } from '../context';
import { LATTICE_ERROR, PULL_PER_STICK, STICK_TRAVEL_MM } from '../handlingBands';
import type { FigureValue } from '../types';
import { allMissing, type BandWords, doesNotApply, type FigureSet, known, verdictOf } from '../value';
import { atMarginEnds, type Cruise, speedInput, throwInput } from './cruise';

// Steady pull-ups at cruise: what the thumb feels, and the CG behind which a pull tightens by itself.

export const behindManoeuvrePoint: Problem = {
  code: 'behind-manoeuvre-point',
  path: 'items',
  message: texts.problems.behindManoeuvrePoint,
  fix: texts.problems.behindManoeuvrePointFix,
};

const { verdicts, inputs } = texts;

const PITCH_WORDS = {
  veryLow: verdicts.pitchVerySluggish,
  low: verdicts.pitchSluggish,
  good: verdicts.pitchGood,
  high: verdicts.pitchQuick,
  veryHigh: verdicts.pitchVeryQuick,
};
const STICK_WORDS = {
  veryLow: verdicts.stickVerySluggish,
  low: verdicts.stickSluggish,
  good: verdicts.stickGood,
  high: verdicts.stickQuick,
  veryHigh: verdicts.stickVeryQuick,
};

/** Load factor per degree of the surface that moves most, and at the ends of the margin's band; null behind the manoeuvre point. */
interface PullPerDeg {
  readonly middle: number;
  readonly ends: readonly (number | null)[];
  readonly throwDeg: number;
}

function pullPerDeg(context: FigureContext, cruise: Cruise, command: PitchCommand): PullPerDeg | null {
  const { point } = cruise;
  const perDeg = { lift: command.lift / command.throwDeg, pitch: command.pitch / command.throwDeg };
  const middle = pullOf(point, context.model, perDeg);
  if (middle === null) return null;
  const { alpha, pitchRate } = context.model;
  const ends = atMarginEnds(context, cruise, { alpha, pitchRate }).map((d) => pullOf(point, d, perDeg));
  return { middle, ends, throwDeg: command.throwDeg };
}

/** Times so many, with the same band. */
const scaled = ({ middle, ends }: PullPerDeg, by: number) => {
  const value = middle * by;
  const byMargin = ends.map((end) => (end === null ? null : end * by));
  const byControl = byShare(value, LATTICE_ERROR.controls.value);
  return { value, ...bandBySquares(value, [byMargin, byControl], texts.causes.marginAndControl) };
};

/** How it feels; a stick that answers the wrong way is no matter of more throw. */
const feelVerdict = (value: number, limits: VerdictBand, words: BandWords): FigureValue['verdict'] =>
  value < 0 ? { level: 'bad', words: verdicts.pitchReversed } : verdictOf(value, limits, words);

const PULL_FIGURES = ['pitchPowerPerDeg', 'pitchRatePerDeg', 'pullPerStickMm'] as const;

/** Pull and pitch rate per degree, and pull per mm of stick. */
export function pullFigures(context: FigureContext, cruise: Cruise): FigureSet {
  const command = pitchCommand(context.airframe, context.model.controls);
  if (!command) {
    const figure = doesNotApply(texts.problems.noPitchControl);
    return Object.fromEntries(PULL_FIGURES.map((id) => [id, figure]));
  }
  const pull = pullPerDeg(context, cruise, command);
  if (!pull) return allMissing(PULL_FIGURES, behindManoeuvrePoint);
  const speedAndThrow = [speedInput(cruise), throwInput(pull.throwDeg)];
  const { value: rate, ...rateBand } = scaled(pull, pitchRateDegSPerG(cruise.point));
  const { value: perDeg, ...perDegBand } = scaled(pull, 1);
  return {
    pitchPowerPerDeg: known(perDeg, {
      ...perDegBand,
      verdict: feelVerdict(perDeg, PITCH_FEEL, PITCH_WORDS),
      inputs: speedAndThrow,
    }),
    pitchRatePerDeg: known(rate, { ...rateBand, inputs: speedAndThrow }),
    pullPerStickMm: perStick(pull, speedAndThrow),
  };
}

function perStick(pull: PullPerDeg, speedAndThrow: NonNullable<FigureValue['inputs']>): FigureValue {
  const { value, ...band } = scaled(pull, pull.throwDeg / STICK_TRAVEL_MM.value);
  return known(value, {
    ...band,
    verdict: feelVerdict(value, PULL_PER_STICK, STICK_WORDS),
    inputs: [...speedAndThrow, { name: inputs.stickTravel, value: STICK_TRAVEL_MM.value, unit: 'mm' }],
  });
}

/** The stick-fixed manoeuvre point and how far ahead of it the CG lies. */
export function manoeuvreFigures(context: FigureContext, cruise: Cruise): FigureSet {
  const { model, wing, balance } = context;
  const { alpha, pitchRate } = model;
  const margin = manoeuvreMargin(cruise.point, model);
  const [least, largest] = atMarginEnds(context, cruise, { alpha, pitchRate });
  const ends = [least, largest].map((d) => manoeuvreMargin(cruise.point, d));
  const x = (share: number) => balance.cg[0] + share * wing.macMm;
  // Where the point lies is not moved by a CG that is out, only how far ahead of it the CG is.
  const still = { error: { ...cruise.error, cgMm: [0, 0, 0] as const } };
  const places = atMarginEnds(context, still, { alpha, pitchRate }).map((d) => x(manoeuvreMargin(cruise.point, d)));
  return {
    manoeuvrePointXMm: known(x(margin), {
      ...bandBySquares(x(margin), [places], texts.causes.neutralPoint),
      inputs: [speedInput(cruise), { name: inputs.mass, value: balance.massG, unit: 'g' }],
    }),
    manoeuvreMarginPct: known(margin * 100, {
      ...bandBySquares(margin * 100, [ends.map((end) => end * 100)], texts.causes.margin),
      verdict: marginVerdict(margin, Math.min(margin, ...ends)),
      inputs: [
        { name: inputs.cg, value: balance.cg[0], unit: 'mm' },
        { name: inputs.mac, value: wing.macMm, unit: 'mm' },
      ],
    }),
  };
}

function marginVerdict(margin: number, low: number): FigureValue['verdict'] {
  if (margin <= 0) return { level: 'bad', words: verdicts.manoeuvreBehind };
  if (low <= 0) return { level: 'watch', words: verdicts.manoeuvrePerhaps };
  return { level: 'good', words: verdicts.manoeuvreAhead };
}
