import type { Limit } from '@/lib/flight/limits';

// Every limit that a verdict or a band rests on, with where it comes from. Nothing here is hidden in code elsewhere.

/** Usual from `good[0]` to `good[1]`; beyond `watch` it is bad. */
export interface VerdictBand {
  readonly good: readonly [low: number, high: number];
  readonly watch: readonly [low: number, high: number];
  readonly source: string;
}

const PRACTICE = 'common practice, no source';

/** Half width of the neutral point's band, % of the MAC. */
export const NEUTRAL_POINT_BAND_PCT = {
  /** Flying light aircraft have theirs 5 to 13 % ahead of a lattice without a body; the bodies here are slimmer. */
  body: { value: 3, source: `${PRACTICE}; bodies of light aircraft shift it by more` },
  pusherOrFan: { value: 5, source: PRACTICE },
  bare: { value: 2, source: `${PRACTICE}; error of the lattice is under 0.5 %` },
} as const satisfies Record<string, Limit>;

/** What the far field of the usual lattice is off, %: own tests of refinement, most with fins at the tips. */
export const SPAN_EFFICIENCY_ERROR_PCT: Limit = { value: 2, source: 'own tests of refinement: up to 1.5 %' };

/** When the simple estimate lies further than this from the lattice, % of the MAC, that is worth a look. */
export const HANDBOOK_DIFFERENCE_PCT: Limit = { value: 5, source: PRACTICE };

/** Share of the up-elevator that must be enough to trim, and share of the greatest lift that it must trim. */
export const TRIM_ELEVATOR_SHARE: Limit = { value: 0.8, source: PRACTICE };
export const TRIM_LIFT_SHARE: Limit = { value: 0.9, source: PRACTICE };

/** How far from the forward to the aft limit the first flight is balanced: inside the front third. */
export const FIRST_FLIGHT_SHARE: Limit = { value: 0.25, source: PRACTICE };

/** What a throw by hand gives, m/s, and how much over the stall it has to. */
export const HAND_THROW_MS: Limit = { value: 8, source: PRACTICE };
export const LAUNCH_OVER_STALL: Limit = { value: 1.1, source: PRACTICE };

export const TAIL_VOLUME_H: VerdictBand = {
  good: [0.4, 0.8],
  watch: [0.25, 1.1],
  source:
    'Raymer, Aircraft Design, table 6.4: 0.40 (fighter, agricultural 0.50) to 0.80 (twin); trainers 0.45-0.60, common practice',
};

export const TAIL_VOLUME_V: VerdictBand = {
  good: [0.02, 0.09],
  watch: [0.01, 0.12],
  source:
    'Raymer, Aircraft Design, table 6.4: 0.02 (sailplane) to 0.09 (transport); trainers 0.035-0.05, common practice',
};

/** Load factor a degree of elevator adds at cruise, g per degree. */
export const PITCH_FEEL: VerdictBand = { good: [0.05, 0.6], watch: [0.02, 1.2], source: PRACTICE };

/** pb / 2V at full aileron. */
export const ROLL_HELIX: VerdictBand = {
  good: [0.07, 0.35],
  watch: [0.04, 0.6],
  source: 'lower bound: Gilruth & Turner, NACA TR 715 (1941), from memory; upper bound: common practice, no source',
};
