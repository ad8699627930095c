import { judge, PHUGOID_DAMPING } from '@/lib/flight/criteria';
import type { LongitudinalModes } from '@/lib/flight/modes/roots';
import type { Problem } from '@/lib/numerics/result';
import { texts } from '@/lib/text/en/figures/handling';
import { bandBySquares } from '../bySquares';
import { LEAST_GROWTH_PER_S } from '../handlingBands';
import { type FigureSet, known, missing } from '../value';
import { type Cruise, speedInput } from './cruise';
import { atEnds, growthToStop, type PitchModes } from './pitchModes';
import { levelVerdict, mindingWeakEnd } from './verdict';

const { verdicts, inputs, problems, causes } = texts;

const noSwing: Problem = { code: 'does-not-apply', path: 'flight', message: problems.noPhugoidSwing };

const PHUGOID_WORDS = {
  veryLow: verdicts.phugoidGrows,
  low: verdicts.phugoidLow,
  good: verdicts.phugoidGood,
  high: verdicts.phugoidGood,
  veryHigh: verdicts.phugoidGood,
};

/** Phugoid: period and damping of the slow swing in speed and height. */
export function phugoidFigures(cruise: Cruise, { derivatives, middle, byMargin, byDrag }: PitchModes): FigureSet {
  const { phugoid } = middle;
  if (phugoid.kind === 'aperiodic') return { phugoidPeriodS: missing(noSwing), phugoidDamping: missing(noSwing) };
  const periodS = ({ phugoid: pair }: LongitudinalModes) =>
    pair.kind === 'oscillation' ? (2 * Math.PI) / pair.swingRadS : null;
  const damping = ({ phugoid: pair }: LongitudinalModes) => (pair.kind === 'oscillation' ? pair.damping : null);
  const band = (value: number, of: typeof damping) =>
    bandBySquares(value, [atEnds(byMargin, of), atEnds(byDrag, of)], causes.marginAndDrag);
  const period = (2 * Math.PI) / phugoid.swingRadS;
  const own = [speedInput(cruise), { name: inputs.drag, value: derivatives.drag, unit: '' }];
  const found = band(phugoid.damping, damping);
  const verdict = (at: number) => levelVerdict(judge(at, PHUGOID_DAMPING), PHUGOID_WORDS);
  return {
    phugoidPeriodS: known(period, { ...band(period, periodS), inputs: own }),
    phugoidDamping: known(phugoid.damping, {
      ...found,
      // Nobody waits for a slow swing of what has run away before.
      ...(growthToStop(middle) > LEAST_GROWTH_PER_S
        ? {}
        : { verdict: mindingWeakEnd(verdict(phugoid.damping), verdict(found?.band?.low ?? phugoid.damping)) }),
      inputs: own,
    }),
  };
}
