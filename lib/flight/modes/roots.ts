import type { Root } from './system';

// Four roots as two pairs. A pair swings, or it is two motions that grow or die away without swinging.

/** A pair of conjugate roots. */
interface Oscillation {
  readonly kind: 'oscillation';
  /** Undamped, rad/s. */
  readonly naturalRadS: number;
  /** Share of critical damping; negative when the swing grows. */
  readonly damping: number;
  /** Growth of the swing, 1/s; negative when it dies away. */
  readonly growthPerS: number;
  /** As it is seen, rad/s. */
  readonly swingRadS: number;
}

/** Two real roots: each grows (positive) or dies away (negative), 1/s. */
interface Aperiodic {
  readonly kind: 'aperiodic';
  readonly ratesPerS: readonly [first: number, second: number];
}

export type ModePair = Oscillation | Aperiodic;

/** Elevator and gusts: the two motions of the aircraft in its plane of symmetry. */
export interface LongitudinalModes {
  readonly shortPeriod: ModePair;
  /** Of two real roots the faster is first, in both pairs. */
  readonly phugoid: ModePair;
}

/** Roll and yaw. As a rule `rollSpiral` is two real roots, first that of rolling, then that of the spiral. */
export interface LateralModes {
  readonly dutchRoll: ModePair;
  readonly rollSpiral: ModePair;
}

const size = ({ re, im }: Root): number => Math.hypot(re, im);

function oscillation({ re, im }: Root): Oscillation {
  const naturalRadS = Math.hypot(re, im);
  return { kind: 'oscillation', naturalRadS, damping: -re / naturalRadS, growthPerS: re, swingRadS: im };
}

const aperiodic = (first: Root, second: Root): Aperiodic => ({ kind: 'aperiodic', ratesPerS: [first.re, second.re] });

interface Sorted {
  /** Fastest first. */
  readonly swings: readonly Oscillation[];
  /** By size, largest first. */
  readonly reals: readonly Root[];
}

function sorted(roots: readonly Root[]): Sorted {
  const bySize = [...roots].sort((a, b) => size(b) - size(a));
  return { swings: bySize.filter(({ im }) => im > 0).map(oscillation), reals: bySize.filter(({ im }) => im === 0) };
}

const notFour = (roots: readonly Root[]) => new RangeError(`four roots make two pairs, got ${JSON.stringify(roots)}`);

/**
 * Short period and phugoid: the faster pair and the slower one. With one swing and two real roots the swing is the short period when
 * it is faster than both, otherwise the short period has come apart into the real ones (Etkin & Reid, "Dynamics of Flight",
 * section 6.2: what becomes of the modes as the CG moves aft).
 */
export function longitudinalModes(roots: readonly Root[]): LongitudinalModes {
  const { swings, reals } = sorted(roots);
  const [fast, slow] = swings;
  const [a, b, c, d] = reals;
  if (fast && slow) return { shortPeriod: fast, phugoid: slow };
  if (fast && a && b) {
    const apart = aperiodic(a, b);
    return fast.naturalRadS >= size(a) ? { shortPeriod: fast, phugoid: apart } : { shortPeriod: apart, phugoid: fast };
  }
  if (a && b && c && d) return { shortPeriod: aperiodic(a, b), phugoid: aperiodic(c, d) };
  throw notFour(roots);
}

/**
 * Dutch roll, and roll with spiral. Of real roots the one that dies away fastest is the roll; the slowest of the rest is the spiral,
 * and what then remains is a Dutch roll that has come apart. Two swings: the faster is the Dutch roll, the slower a roll and spiral
 * that have joined (Etkin & Reid, "Dynamics of Flight", section 6.7; Nelson, "Flight Stability", ch. 5).
 */
export function lateralModes(roots: readonly Root[]): LateralModes {
  const { swings, reals } = sorted(roots);
  const [fast, slow] = swings;
  if (fast && slow) return { dutchRoll: fast, rollSpiral: slow };
  const [roll, ...rest] = [...reals].sort((a, b) => a.re - b.re);
  const [p, q, spiral] = rest.sort((a, b) => size(b) - size(a));
  if (fast && roll && p) return { dutchRoll: fast, rollSpiral: aperiodic(roll, p) };
  if (roll && p && q && spiral) return { dutchRoll: aperiodic(p, q), rollSpiral: aperiodic(roll, spiral) };
  throw notFour(roots);
}

/** Seconds in which a growth of this rate, 1/s, doubles what there is; negative: in which it halves. */
export const doublingS = (ratePerS: number): number => Math.LN2 / ratePerS;

/** The fastest growth of a pair, 1/s; negative when both die away. */
export const growthOf = (pair: ModePair): number =>
  pair.kind === 'oscillation' ? pair.growthPerS : Math.max(...pair.ratesPerS);

/** Undamped frequency of a pair, rad/s, also of one that is damped too much to swing; null when it runs away on one side. */
export function naturalRadSOf(pair: ModePair): number | null {
  if (pair.kind === 'oscillation') return pair.naturalRadS;
  const product = pair.ratesPerS[0] * pair.ratesPerS[1];
  return product > 0 ? Math.sqrt(product) : null;
}

/** Damping ratio of a pair: over one when it is damped too much to swing; null when it runs away on one side. */
export function dampingOf(pair: ModePair): number | null {
  if (pair.kind === 'oscillation') return pair.damping;
  const natural = naturalRadSOf(pair);
  return natural === null ? null : -(pair.ratesPerS[0] + pair.ratesPerS[1]) / (2 * natural);
}
