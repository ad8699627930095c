import { dragAreaOf, dragBuildUp } from '@/lib/aero/drag/buildUp';
import { CONTROL_ANTICIPATION, FROUDE_FACTOR, judge, SHORT_PERIOD_DAMPING, scaledLevels } from '@/lib/flight/criteria';
import {
  type LongitudinalDerivatives,
  loadPerAlpha,
  longitudinalModesOf,
  longitudinalOf,
} from '@/lib/flight/modes/longitudinal';
import {
  dampingOf,
  doublingS,
  growthOf,
  type LongitudinalModes,
  type ModePair,
  naturalRadSOf,
} from '@/lib/flight/modes/roots';
import { texts } from '@/lib/text/en/figures/handling';
import { fill } from '@/lib/text/fill';
import { fixedDigits } from '@/lib/units/number';
import { bandBySquares } from '../bySquares';
import type { FigureContext } from '../context';
import {
  ALPHA_DOT_SHARE,
  CATEGORY_ANY_SPEED,
  DEAD_TIMES_TO_DOUBLE,
  LATTICE_ERROR,
  LEAST_GROWTH_PER_S,
  PILOT_DEAD_TIME_S,
} from '../handlingBands';
import type { FigureValue } from '../types';
import { doesNotApply, type FigureSet, known, missing } from '../value';
import { atMarginEnds, type Cruise, inertiaEnds, limitInput, scaleInput, speedInput } from './cruise';
import { behindManoeuvrePoint } from './pull';
import { levelVerdict, mindingWeakEnd } from './verdict';

const { verdicts, inputs, problems, causes } = texts;

/** The modes as worked out, and at the ends of each cause by itself; null at an end that no mass has. */
export interface PitchModes {
  readonly derivatives: LongitudinalDerivatives;
  readonly middle: LongitudinalModes;
  readonly byMargin: readonly LongitudinalModes[];
  readonly byDamping: readonly LongitudinalModes[];
  /** With the lag of a tail behind the wing; empty without such a tail. */
  readonly byLag: readonly LongitudinalModes[];
  readonly byDrag: readonly LongitudinalModes[];
  readonly byInertia: readonly (LongitudinalModes | null)[];
}

type EachEnd = readonly (LongitudinalModes | null)[];
/** A number of the modes at both ends of a cause. */
export const atEnds = (ends: EachEnd, of: (modes: LongitudinalModes) => number | null) =>
  ends.map((modes) => modes && of(modes));

/** Short period and phugoid in all the cases that their bands need. The point must have inertia. */
export function pitchModes(context: FigureContext, cruise: Cruise): PitchModes {
  const { airframe, resolved, model, wing, air } = context;
  const { point, trim } = cruise;
  const area = dragAreaOf(dragBuildUp(airframe, resolved, point.speedMs, air));
  const derivatives = longitudinalOf(model, trim, area.value / wing.areaMm2);
  const lags = airframe.surfaces.some(({ role }) => role === 'tailplane' || role === 'vtail');
  const modes = (d: LongitudinalDerivatives) => longitudinalModesOf(point, d);
  const withDrag = (end: number) => ({ ...derivatives, drag: derivatives.drag + (end - area.value) / wing.areaMm2 });
  return {
    derivatives,
    middle: modes(derivatives),
    byMargin: atMarginEnds(context, cruise, derivatives).map(modes),
    byDamping: dampingEnds(derivatives).map(modes),
    byLag: lags ? [modes(lagging(derivatives))] : [],
    byDrag: [withDrag(area.low), withDrag(area.high)].map(modes),
    byInertia: inertiaEnds(cruise, 'yy').map((end) => end && longitudinalModesOf(end, derivatives)),
  };
}

/** Pitch damping at the ends of the lattice's error. */
function dampingEnds(d: LongitudinalDerivatives): LongitudinalDerivatives[] {
  const { lift, pitch } = d.pitchRate;
  const error = LATTICE_ERROR.pitchDamping.value;
  return [1 - error, 1 + error].map((by) => ({ ...d, pitchRate: { lift, pitch: pitch * by } }));
}

/** With the lag of the downwash that a steady lattice leaves out. */
const lagging = (d: LongitudinalDerivatives): LongitudinalDerivatives => ({
  ...d,
  alphaDot: { lift: 0, pitch: d.pitchRate.pitch * ALPHA_DOT_SHARE.value },
});

/** Short period: frequency, damping, time to half, control anticipation, and the time to double of what runs away. */
export function shortPeriodFigures(context: FigureContext, cruise: Cruise, modes: PitchModes): FigureSet {
  const { shortPeriod } = modes.middle;
  const natural = naturalRadSOf(shortPeriod);
  const damping = dampingOf(shortPeriod);
  const pitchDoubleS = doubleFigure(modes);
  if (natural === null || damping === null) {
    const figure = missing(behindManoeuvrePoint);
    return {
      shortPeriodHz: figure,
      shortPeriodDamping: figure,
      shortPeriodHalfS: figure,
      controlAnticipation: figure,
      pitchDoubleS,
    };
  }
  const turns = (radS: number) => radS / (2 * Math.PI);
  // Where the band of the margin reaches past the manoeuvre point nothing swings any more: the frequency is none.
  const hz = (end: LongitudinalModes) => turns(naturalRadSOf(end.shortPeriod) ?? 0);
  const own = [
    speedInput(cruise),
    { name: inputs.pitchInertia, value: cruise.point.inertiaKgM2.yy, unit: 'kg m²' },
    { name: inputs.mass, value: cruise.point.massG, unit: 'g' },
  ];
  return {
    shortPeriodHz: known(turns(natural), {
      ...bandBySquares(
        turns(natural),
        [atEnds(modes.byMargin, hz), atEnds(modes.byInertia, hz)],
        causes.marginAndInertia,
        0,
      ),
      inputs: own,
    }),
    shortPeriodDamping: dampingFigure(damping, modes, cruise),
    shortPeriodHalfS: halfFigure(shortPeriod, modes),
    controlAnticipation: anticipationFigure(context, cruise, natural, modes),
    pitchDoubleS,
  };
}

const DAMPING_WORDS = {
  veryLow: verdicts.dampingVeryLow,
  low: verdicts.dampingLow,
  good: verdicts.dampingGood,
  high: verdicts.dampingHigh,
  veryHigh: verdicts.dampingVeryHigh,
};

function dampingFigure(damping: number, modes: PitchModes, cruise: Cruise): FigureValue {
  const of = (end: LongitudinalModes) => dampingOf(end.shortPeriod);
  const { byMargin, byDamping, byLag, byInertia } = modes;
  const ends = [byMargin, byDamping, byLag, byInertia].map((each) => atEnds(each, of));
  const levels = scaledLevels(SHORT_PERIOD_DAMPING[CATEGORY_ANY_SPEED], FROUDE_FACTOR.ratio());
  const verdict = (at: number) => levelVerdict(judge(at, levels), DAMPING_WORDS);
  const found = bandBySquares(damping, ends, byLag.length > 0 ? causes.dampingRatioLags : causes.dampingRatio);
  return known(damping, {
    ...found,
    verdict: mindingWeakEnd(verdict(damping), verdict(found?.band?.low ?? damping)),
    inputs: [speedInput(cruise), limitInput(levels.bounds[0].least ?? 0, '')],
  });
}

/** Time in which what a gust started dies away to half; a pair that grows has none. */
const halfS = (pair: ModePair): number | null => {
  const growth = growthOf(pair);
  return growth < -LEAST_GROWTH_PER_S ? -doublingS(growth) : null;
};

function halfFigure(pair: ModePair, { byDamping, byLag, byInertia }: PitchModes): FigureValue {
  const seconds = halfS(pair);
  if (seconds === null) return missing({ code: 'pitch-grows', path: 'surfaces', message: problems.pitchGrows });
  const ends = [byDamping, byLag, byInertia].map((each) => atEnds(each, (end) => halfS(end.shortPeriod)));
  return known(seconds, bandBySquares(seconds, ends, byLag.length > 0 ? causes.pitchDampingLags : causes.pitchDamping));
}

const ANTICIPATION_WORDS = {
  veryLow: verdicts.anticipationVeryLow,
  low: verdicts.anticipationLow,
  good: verdicts.anticipationGood,
  high: verdicts.anticipationHigh,
  veryHigh: verdicts.anticipationVeryHigh,
};

/** Control anticipation parameter: square of the short period's undamped frequency over the load factor per radian, 1/(g s2). */
function anticipationFigure(
  { model }: FigureContext,
  cruise: Cruise,
  natural: number,
  { byMargin, byInertia }: PitchModes,
): FigureValue {
  const perAlpha = loadPerAlpha(cruise.point, model.alpha.lift);
  const anticipation = (radS: number) => radS ** 2 / perAlpha;
  const value = anticipation(natural);
  const of = (end: LongitudinalModes) => anticipation(naturalRadSOf(end.shortPeriod) ?? 0);
  const found = bandBySquares(value, [atEnds(byMargin, of), atEnds(byInertia, of)], causes.marginAndInertia, 0);
  const levels = scaledLevels(CONTROL_ANTICIPATION[CATEGORY_ANY_SPEED], FROUDE_FACTOR.anticipation(cruise.scale));
  const verdict = (at: number) => levelVerdict(judge(at, levels), ANTICIPATION_WORDS);
  const [{ least = 0, most = 0 }] = levels.bounds;
  return known(value, {
    ...found,
    verdict: mindingWeakEnd(verdict(value), verdict(found?.band?.low ?? value)),
    inputs: [
      scaleInput(cruise),
      { name: inputs.loadPerAlpha, value: perAlpha, unit: 'g/rad' },
      limitInput(least, '1/(g s²)'),
      limitInput(most, '1/(g s²)'),
    ],
  });
}

/** The fastest growth that the pilot has to stop: a root that runs off, or a short swing that grows. A slow swing is the phugoid's. */
export function growthToStop({ shortPeriod, phugoid }: LongitudinalModes): number {
  const slow = phugoid.kind === 'aperiodic' ? growthOf(phugoid) : Number.NEGATIVE_INFINITY;
  return Math.max(growthOf(shortPeriod), slow);
}

/** Judged unscaled, against the pilot's own dead time: the pilot does not shrink with the aircraft. */
function doubleFigure({ middle, byMargin, byInertia }: PitchModes): FigureValue {
  const seconds = (modes: LongitudinalModes) => {
    const growth = growthToStop(modes);
    return growth > LEAST_GROWTH_PER_S ? doublingS(growth) : null;
  };
  const value = seconds(middle);
  if (value === null) return doesNotApply(problems.noPitchGrowth);
  const deadTimes = value / PILOT_DEAD_TIME_S.value;
  const held = deadTimes >= DEAD_TIMES_TO_DOUBLE.value;
  const words = fill(held ? verdicts.doubles : verdicts.doublesFast, {
    times: fixedDigits(deadTimes, 1),
    dead: fixedDigits(PILOT_DEAD_TIME_S.value, 1),
  });
  return known(value, {
    ...bandBySquares(value, [atEnds(byMargin, seconds), atEnds(byInertia, seconds)], causes.marginAndInertia, 0),
    verdict: { level: held ? 'watch' : 'bad', words },
    inputs: [{ name: inputs.deadTime, value: PILOT_DEAD_TIME_S.value, unit: 's' }],
  });
}
