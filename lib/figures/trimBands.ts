import type { Limit } from '@/lib/flight/limits';

// Limits that trim and the neutral point's band rest on, each with where it comes from.

const PRACTICE = 'common practice, no source';

/** What the neutral point's band is made of beside its least width. */
export const NEUTRAL_POINT_SHARES = {
  /** % of the MAC, at the default lattice. */
  latticePct: { value: 0.5, source: 'own refinement of the lattice with a quarter-strip tip inset (Hough 1973)' },
  /** Share of a contribution by slender-body theory or by a propeller's normal force that may be wrong. */
  contribution: {
    value: 0.5,
    source: `${PRACTICE}; slender-body theory knows no separation and no upwash of the wing, and a slow propeller is not a disc`,
  },
} as const satisfies Record<string, Limit>;

/** Share of the throw that trim at cruise may take, %. */
export const TRIM_THROW_PCT = {
  watch: { value: 25, source: PRACTICE },
  bad: { value: 50, source: PRACTICE },
} as const satisfies Record<string, Limit>;

/** Full up has to reach this share of the greatest lift to flare, %. */
export const FLARE_LIFT_PCT: Limit = { value: 90, source: PRACTICE };

/** When less than this share of the up throw already stalls it, that is more throw than it needs, %. */
export const STALL_THROW_PCT: Limit = { value: 50, source: PRACTICE };

/** Change of the elevator with power that nobody notices, degrees: what servos and linkages of this size do not hold anyway. */
export const THROTTLE_UNNOTICED_DEG: Limit = { value: 0.5, source: PRACTICE };

/** Load factor that full throttle would bring at cruise if nobody held it, g: what startles, and what may break or stall it. */
export const THROTTLE_PULL_G = {
  watch: { value: 0.5, source: PRACTICE },
  bad: { value: 2, source: PRACTICE },
} as const satisfies Record<string, Limit>;

/** A finger under the wing needs this much of it on every side, mm. */
export const FINGER_MM: Limit = { value: 12, source: PRACTICE };
