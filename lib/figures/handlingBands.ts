import type { Category } from '@/lib/flight/criteria';
import type { Limit } from '@/lib/flight/limits';
import type { VerdictBand } from './bands';

// What handling is judged by beside the published criteria of lib/flight/criteria.ts: what the pilot feels, who does not scale with the
// aircraft, and how far the numbers may be off.

const PRACTICE = 'common practice, no source';

/**
 * Phase of flight that each criterion is taken from. Damping ratio and control anticipation hardly change with speed, so they have to
 * serve for landing too; what changes with speed is worked out at cruise and held to cruise.
 */
export const CATEGORY_ANY_SPEED: Category = 'C';
export const CATEGORY_CRUISE: Category = 'B';

/** How far the end of a stick moves, mm each way. */
export const STICK_TRAVEL_MM: Limit = { value: 20, source: PRACTICE };

/** Load factor that a mm of stick adds, g/mm, stick and surface in proportion. */
export const PULL_PER_STICK: VerdictBand = { good: [0.03, 0.35], watch: [0.012, 0.7], source: PRACTICE };

/**
 * Load factor that slop is worth either way from trim, g; not scaled, for it is the pilot who has to take it out. A pilot notices 0.1 g and
 * hunts after 0.3 g: the nose then turns by itself at g / V times that, at 15 m/s 4 and 11 degrees a second, and 11 are 9 degrees before
 * a pilot with a dead time of 0.3 s has seen it, answered and been answered. The figure is the worst case, every joint against the same
 * stop; as a rule about half of it comes together (even spread: 0.58 for one linkage, 0.41 for the two of a pair of elevons), so the
 * limits are twice those.
 */
export const SLOP_PULL_G = {
  steady: { value: 0.2, source: `${PRACTICE}: twice the 0.1 g that a pilot notices, for a worst case` },
  loose: { value: 0.6, source: `${PRACTICE}: twice the 0.3 g that a pilot hunts after, for a worst case` },
} as const satisfies Record<string, Limit>;

/** From seeing a model move to the surface answering. */
export const PILOT_DEAD_TIME_S: Limit = { value: 0.3, source: PRACTICE };

/** What doubles within this many dead times gets away from a pilot. */
export const DEAD_TIMES_TO_DOUBLE: Limit = { value: 7, source: PRACTICE };

/** How far the lattice may be off in what turns the aircraft, as a share. */
export const LATTICE_ERROR = {
  fins: { value: 0.06, source: 'difference allowed between two independent lattices' },
  pitchDamping: { value: 0.06, source: 'difference allowed between two independent lattices, tailless wings' },
  rollDamping: { value: 0.03, source: 'difference allowed between two independent lattices' },
  controls: { value: 0.05, source: 'difference allowed between two independent lattices' },
} as const satisfies Record<string, Limit>;

/** What the lag of the downwash at a tail adds to pitch damping, as a share of it: the alpha-dot term that a steady lattice lacks. */
export const ALPHA_DOT_SHARE: Limit = {
  value: 0.44,
  source: 'Nelson, Flight Stability and Automatic Control, app. B: a light aircraft, 4.36 against 9.96',
};

/** How far the body's side force may be off, as a share. */
export const BODY_ERROR: Limit = { value: 0.5, source: `${PRACTICE}; slender-body theory on a box` };

/** A charted motion ends where the linear equations mean nothing any more. */
export const CHART_ENDS = { pullG: 4, sideslipDeg: 20 } as const;

/** Growth slower than this, 1/s, is none: it doubles in more than ten minutes. */
export const LEAST_GROWTH_PER_S = 1e-3;
