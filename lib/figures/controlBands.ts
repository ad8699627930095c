import type { Limit } from '@/lib/flight/limits';
import type { VerdictBand } from './bands';

// Limits that the verdicts on controls and linkages rest on.

const PRACTICE = 'common practice, no source';

/** Until performance knows the highest level speed: so many times the cruise speed. */
export const TOP_OVER_CRUISE: Limit = { value: 1.5, source: PRACTICE };

/** A dive is reckoned with at so many times the highest level speed. */
export const DIVE_OVER_TOP: Limit = { value: 2, source: PRACTICE };

/**
 * Share of the servo's stall torque that full throw takes at twice the highest level speed, %. Half is enough. At 200 % the same throw
 * takes half of the torque at the highest level speed already, for the moment goes with the speed squared.
 */
export const HINGE_TORQUE: VerdictBand = { good: [0, 50], watch: [0, 200], source: PRACTICE };

/** Share of the servo's travel at full throw, %; transmitters stretch it to 125 %. */
export const SERVO_TRAVEL: VerdictBand = { good: [70, 100], watch: [0, 125], source: PRACTICE };

/** Free movement of a control, degrees from stop to stop. */
export const CONTROL_SLOP: VerdictBand = { good: [0, 2], watch: [0, 4], source: PRACTICE };

/** Buckling force of the rod over its load at twice the highest level speed. */
export const ROD_BUCKLING: VerdictBand = {
  good: [2, Number.POSITIVE_INFINITY],
  watch: [1, Number.POSITIVE_INFINITY],
  source: PRACTICE,
};
