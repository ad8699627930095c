import type { Problem } from '@/lib/numerics/result';
import { texts } from '@/lib/text/en/figures/handling';
import type { FigureContext, FigureGroupResult } from './context';
import { cruiseOf, turnsAgainstInertia } from './handling/cruise';
import { phugoidFigures } from './handling/phugoid';
import { pitchModes, shortPeriodFigures } from './handling/pitchModes';
import { manoeuvreFigures, pullFigures } from './handling/pull';
import { pitchStep, rollStep, yawRelease } from './handling/responses';
import { rollFigures } from './handling/rollFeel';
import { rudderFigures } from './handling/rudder';
import { sideFigures } from './handling/sideModes';
import { slopFigure } from './handling/slop';
import { twistedFigures } from './handling/twisted';
import type { FigureId } from './table/entry';
import { allMissing, type FigureSet, firstProblem } from './value';

const FEEL_IDS = ['pitchPowerPerDeg', 'rollRatePerDeg', 'rollHelix'] as const satisfies readonly FigureId[];
const STEADY_IDS = [
  'pitchRatePerDeg',
  'pullPerStickMm',
  'slopPullG',
  'rollRateTwistedPerDeg',
  'pitchPowerTwistedPerDeg',
  'manoeuvrePointXMm',
  'manoeuvreMarginPct',
  'sideslipPerDeg',
] as const satisfies readonly FigureId[];
const MODE_IDS = [
  'shortPeriodHz',
  'shortPeriodDamping',
  'shortPeriodHalfS',
  'controlAnticipation',
  'pitchDoubleS',
  'phugoidPeriodS',
  'phugoidDamping',
  'rollModeS',
  'dutchRollHz',
  'dutchRollDamping',
  'spiralDoubleS',
] as const satisfies readonly FigureId[];

/** What the thumb feels at cruise, cheap enough for every move of a handle: pull and roll per degree, helix angle at full stick. */
export function feelFigures(context: FigureContext): FigureSet {
  const cruise = cruiseOf(context);
  if (!cruise.ok) return allMissing(FEEL_IDS, firstProblem(cruise));
  const { pitchPowerPerDeg } = pullFigures(context, cruise.value);
  return { pitchPowerPerDeg, ...rollFigures(context, cruise.value) };
}

const noInertia: Problem = {
  code: 'no-inertia',
  path: 'items',
  message: texts.problems.noInertia,
  fix: texts.problems.noInertiaFix,
};

/** All figures of handling at cruise speed, with the motions in time as charts. */
export function handlingFigures(context: FigureContext): FigureGroupResult {
  const found = cruiseOf(context);
  if (!found.ok) return { figures: allMissing([...FEEL_IDS, ...STEADY_IDS, ...MODE_IDS], firstProblem(found)) };
  const cruise = found.value;
  const rigid = { ...pullFigures(context, cruise), ...rollFigures(context, cruise) };
  const steady = {
    ...rigid,
    slopPullG: slopFigure(context, cruise),
    ...twistedFigures(context, cruise, rigid),
    ...manoeuvreFigures(context, cruise),
    ...rudderFigures(context, cruise),
  };
  if (!turnsAgainstInertia(cruise.point))
    return { figures: { ...steady, ...allMissing(MODE_IDS, noInertia) }, problems: [noInertia] };
  const modes = pitchModes(context, cruise);
  const charts = [
    pitchStep(context, cruise, modes.derivatives),
    rollStep(context, cruise),
    yawRelease(context, cruise),
  ].filter((chart) => chart !== null);
  const moving = {
    ...shortPeriodFigures(context, cruise, modes),
    ...phugoidFigures(cruise, modes),
    ...sideFigures(context, cruise),
  };
  return { figures: { ...steady, ...moving }, charts };
}
