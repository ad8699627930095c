import { POWER } from '@/lib/airframe/practice';
import type { Limit } from '@/lib/flight/limits';
import type { VerdictBand } from './bands';

// What performance is judged by, with where it comes from.

const PRACTICE = 'common practice, no source';

/** Static thrust over weight: from the low end of a trainer to the high end of a sport aircraft. */
export const THRUST_TO_WEIGHT: VerdictBand = {
  good: [POWER.trainerThrustToWeight.value[0], POWER.sportThrustToWeight.value[1]],
  watch: [0.35, 2.5],
  source: `${PRACTICE}: trainer 0.6-0.8, sport 0.9-1.1`,
};

/** A fan needs more of it to leave the ground: its thrust comes late. */
export const FAN_THRUST_TO_WEIGHT: VerdictBand = {
  good: [POWER.fanThrustToWeight.value[0], POWER.sportThrustToWeight.value[1]],
  watch: [0.5, 2.5],
  source: `${PRACTICE}: ducted fan 0.8-0.9 and more`,
};

/** Pitch speed over stall speed. */
export const PITCH_SPEED_OVER_STALL: VerdictBand = {
  good: POWER.pitchSpeedOverStall.value,
  watch: [1.6, 5],
  source: `${PRACTICE}: 2.5 to 3 times the stall speed`,
};

/** Best rate of climb, m/s; nobody has too much of it. */
export const CLIMB_MS: VerdictBand = {
  good: [2, Number.MAX_VALUE],
  watch: [0.5, Number.MAX_VALUE],
  source: PRACTICE,
};

/** Share of a motor's largest power that momentum theory needs for the stated thrust. */
export const MERIT_IMPOSSIBLE: Limit = { value: 1, source: 'momentum theory: no disc does better (Rankine, Froude)' };
export const MERIT_DOUBTFUL: Limit = {
  value: 0.7,
  source:
    'a motor of 0.85 turning a propeller with a figure of merit of 0.8: better than any measured small one, from memory',
};

/** Load factor of the turn that is shown. */
export const TURN_LOAD_FACTOR = 2;
