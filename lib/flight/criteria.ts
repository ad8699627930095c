// Flying qualities that others have published for aircraft with a pilot in them, and how they read for a smaller one.
// MIL-F-8785C, "Flying Qualities of Piloted Airplanes" (1980). Levels: 1 clearly adequate, 2 adequate with more work, 3 just controllable.

/** Flight phases: A rapid manoeuvring and precise tracking; B gradual manoeuvres, climb and cruise; C take-off and landing. */
export type Category = 'A' | 'B' | 'C';

/** What a level allows; an end that is left out is free. */
export interface Bound {
  readonly least?: number;
  readonly most?: number;
}

/** Bounds of levels 1, 2 and 3, each inside the next, and where they come from. */
export interface Levels {
  readonly bounds: readonly [one: Bound, two: Bound, three?: Bound];
  readonly source: string;
}

export type Level = 1 | 2 | 3 | 'beyond';

/** The level that a value meets, and on which side of level 1 it lies. */
export interface Judged {
  readonly level: Level;
  readonly side: 'low' | 'within' | 'high';
}

const MEMORY = 'from memory';
const of = (paragraph: string, ...bounds: Levels['bounds']): Levels => ({
  bounds,
  source: `MIL-F-8785C (1980), ${paragraph}`,
});

const dampingAC = of('3.2.2.1.2, table IV', { least: 0.35, most: 1.3 }, { least: 0.25, most: 2 }, { least: 0.15 });
/** Damping ratio of the short period. */
export const SHORT_PERIOD_DAMPING: Record<Category, Levels> = {
  A: dampingAC,
  B: of('3.2.2.1.2, table IV', { least: 0.3, most: 2 }, { least: 0.2, most: 2 }, { least: 0.15 }),
  C: dampingAC,
};

/** Control anticipation: square of the short period's frequency over the load factor per radian, 1/(g s2). */
export const CONTROL_ANTICIPATION: Record<Category, Levels> = {
  A: of('3.2.2.1.1, figures 1 to 3', { least: 0.28, most: 3.6 }, { least: 0.16, most: 10 }),
  B: of('3.2.2.1.1, figures 1 to 3', { least: 0.085, most: 3.6 }, { least: 0.038, most: 10 }),
  C: of('3.2.2.1.1, figures 1 to 3', { least: 0.16, most: 3.6 }, { least: 0.096, most: 10 }),
};

const rollAC = of('3.3.1.2, class I', { most: 1 }, { most: 1.4 }, { most: 10 });
/** Time constant of the roll mode, s. */
export const ROLL_MODE_S: Record<Category, Levels> = {
  A: rollAC,
  B: of('3.3.1.2, class I', { most: 1.4 }, { most: 3 }, { most: 10 }),
  C: rollAC,
};

const dutch = (one: number, two: number, three: number): Levels =>
  of(`3.3.1.1, table VI, class I (${MEMORY})`, { least: one }, { least: two }, { least: three });
/** Damping ratio of the Dutch roll. */
export const DUTCH_ROLL_DAMPING: Record<Category, Levels> = {
  A: dutch(0.19, 0.02, 0),
  B: dutch(0.08, 0.02, 0),
  C: dutch(0.08, 0.02, 0),
};
/** Undamped frequency of the Dutch roll, rad/s. */
export const DUTCH_ROLL_RADS: Record<Category, Levels> = {
  A: dutch(1, 0.4, 0.4),
  B: dutch(0.4, 0.4, 0.4),
  C: dutch(1, 0.4, 0.4),
};

/** Damping ratio times undamped frequency of the Dutch roll, 1/s: how fast its swing dies away. */
export const DUTCH_ROLL_DECAY: Record<Category, Levels> = {
  A: dutch(0.35, 0.05, 0),
  B: dutch(0.15, 0.05, 0),
  C: dutch(0.15, 0.05, 0),
};

const spiralAC = of(`3.3.1.3 (${MEMORY})`, { least: 12 }, { least: 8 }, { least: 4 });
/** Time in which a bank may double, s. */
export const SPIRAL_DOUBLE_S: Record<Category, Levels> = {
  A: spiralAC,
  B: of(`3.3.1.3 (${MEMORY})`, { least: 20 }, { least: 8 }, { least: 4 }),
  C: spiralAC,
};

/** Damping ratio of the phugoid, any phase. Level 3 is a time to double of 55 s, which a damping ratio cannot say. */
export const PHUGOID_DAMPING: Levels = of(`3.2.1.2 (${MEMORY})`, { least: 0.04 }, { least: 0 });

/** The worse of two judgements. */
export const worse = (a: Judged, b: Judged): Judged => (rank(b) > rank(a) ? b : a);

const rank = ({ level }: Judged): number => (level === 'beyond' ? 4 : level);

/** Span of the aircraft that those limits were written for, class I: light aircraft. */
const FULL_SIZE_SPAN_MM = 10_000;

/**
 * How many times smaller a wing of this span is than a light aircraft's. Aircraft that are alike in shape and mass distribution and fly
 * at equal Froude number V^2 / (g b) move alike, each in its own time: times shrink by the root of the scale, frequencies grow by it,
 * control anticipation grows by the scale, damping ratios stay. Throws RangeError unless the span is positive.
 * Source: dynamic similarity, e.g. Wolowicz, Bowman & Gilbert, NASA TP-1435 (1979), from memory.
 */
export function froudeScale(spanMm: number): number {
  if (!(spanMm > 0)) throw new RangeError(`spanMm must be positive, got ${spanMm}`);
  return FULL_SIZE_SPAN_MM / spanMm;
}

/** What a limit becomes for a small aircraft, by what it limits. */
export const FROUDE_FACTOR = {
  ratio: () => 1,
  time: (scale: number) => 1 / Math.sqrt(scale),
  frequency: (scale: number) => Math.sqrt(scale),
  /** 1/(g s2). */
  anticipation: (scale: number) => scale,
} as const;

/** Published bounds times a factor: the limits that a small aircraft is held to. */
export function scaledLevels({ bounds, source }: Levels, factor: number): Levels {
  const by = ({ least, most }: Bound): Bound => ({
    ...(least === undefined ? {} : { least: least * factor }),
    ...(most === undefined ? {} : { most: most * factor }),
  });
  const [one, two, three] = bounds;
  return { bounds: three ? [by(one), by(two), by(three)] : [by(one), by(two)], source };
}

const meets = (value: number, { least = Number.NEGATIVE_INFINITY, most = Number.POSITIVE_INFINITY }: Bound) =>
  value >= least && value <= most;

/** The best level whose bounds hold a value; a value on a bound meets it. */
export function judge(value: number, { bounds: [one, two, three] }: Levels): Judged {
  const side = meets(value, one) ? 'within' : value < (one.least ?? Number.NEGATIVE_INFINITY) ? 'low' : 'high';
  if (side === 'within') return { level: 1, side };
  if (meets(value, two)) return { level: 2, side };
  return { level: three && meets(value, three) ? 3 : 'beyond', side };
}
