import type { Limit } from '@/lib/flight/limits';
import type { VerdictBand } from './bands';

// What the verdicts of strength and stiffness rest on.

const PRACTICE = 'common practice, no source';

/** Load in g that a spar has to carry when the document asks for none. */
export const LOAD_FACTOR: Limit = { value: 6, source: PRACTICE };

/** Share of a control's power that twist takes at cruise, %; below zero the wing adds to it, and comes near to twisting off. */
export const CONTROL_LOSS_PCT: VerdictBand = { good: [-15, 25], watch: [-40, 50], source: PRACTICE };

/** Reversal and divergence speed over cruise: a dive doubles the speed. */
export const TWIST_SPEED_OVER_CRUISE: VerdictBand = {
  good: [2, Number.POSITIVE_INFINITY],
  watch: [1.4, Number.POSITIVE_INFINITY],
  source: `${PRACTICE}: a dive easily reaches twice the cruising speed`,
};
