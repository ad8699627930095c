import { factor, solve } from '@/lib/numerics/lu';

// How far a control turns the panels of a strip. The lattice stays where it is when the hinge moves; only these shares change.

/**
 * Lift effectiveness of a plain flap whose chord is `share` of the whole: what a radian of it lifts over what a radian of
 * the whole section lifts. H. Glauert, ARC R&M 1095 (1927): 1 - (t - sin t) / pi with cos t = 2 share - 1.
 */
export function flapEffectiveness(share: number): number {
  if (!(share >= 0 && share <= 1)) throw new RangeError(`flap share must lie in 0 to 1, got ${share}`);
  const t = Math.acos(2 * share - 1);
  return 1 - (t - Math.sin(t)) / Math.PI;
}

/**
 * Moment about the quarter chord, nose up, that a radian of a plain flap brings at unchanged angle of attack. H. Glauert, ARC R&M 1095
 * (1927): -(sin t)(1 - cos t) / 2 with cos t = 2 share - 1.
 */
export function flapMoment(share: number): number {
  if (!(share >= 0 && share <= 1)) throw new RangeError(`flap share must lie in 0 to 1, got ${share}`);
  const t = Math.acos(2 * share - 1);
  return (-Math.sin(t) * (1 - Math.cos(t))) / 2;
}

/** What each row's control point answers for, leading edge first, per radian that its normal turns. */
export interface RowWeights {
  /** Share of the lift of the whole section turned; together 1. */
  readonly lift: readonly number[];
  /** Moment about the quarter chord, nose up; together none. */
  readonly moment: readonly number[];
}

const known = new Map<number, RowWeights>();

/** Weights of a section's rows in two dimensions: vortices at the quarter and control points at three quarters of equal rows. */
export function rowWeights(rows: number): RowWeights {
  const kept = known.get(rows);
  if (kept) return kept;
  const matrix = Float64Array.from({ length: rows * rows }, (_, k) => 1 / (Math.floor(k / rows) - (k % rows) + 0.5));
  const factors = factor(matrix, rows);
  if (!factors.ok) throw new RangeError(`${rows} rows cannot be solved`);
  const strengths = Float64Array.from({ length: rows * rows }, (_, k) => (k % (rows + 1) === 0 ? 1 : 0));
  solve(factors.value, strengths, rows);
  const sum = (row: number, weight: (vortex: number) => number) =>
    Array.from({ length: rows }, (_, j) => (strengths[j * rows + row] ?? 0) * weight(j)).reduce((a, b) => a + b, 0);
  const each = Array.from({ length: rows }, (_, r) => r);
  const lift = each.map((r) => sum(r, () => 1));
  const whole = lift.reduce((a, b) => a + b, 0);
  const weights = {
    lift: lift.map((w) => w / whole),
    moment: each.map((r) => (-2 * Math.PI * sum(r, (j) => (j + 0.25) / rows - 0.25)) / whole),
  };
  known.set(rows, weights);
  return weights;
}

/**
 * By what share of the deflection each row's normal turns, so that in two dimensions lift and moment are Glauert's exactly, wherever the
 * hinge lies: rows well aft of it turn whole, rows well ahead not at all, and of the two about it each as much as both need. Turning
 * whole panels would be wrong by up to a fifth.
 */
export function turnShares(rows: number, share: number): number[] {
  const weights = rowWeights(rows);
  if (rows < 2) return [flapEffectiveness(share)];
  let best: readonly [at: number, first: number, second: number] = [0, 0, 0];
  let least = Number.POSITIVE_INFINITY;
  for (let k = 0; k < rows - 1; k++) {
    const [first, second] = pairShares(weights, k, share);
    const beyond = Math.max(0, -first, first - 1) + Math.max(0, -second, second - 1);
    if (beyond < least - 1e-12) {
      least = beyond;
      best = [k, first, second];
    }
  }
  const [at, first, second] = best;
  return weights.lift.map((_, r) => (r < at ? 0 : r === at ? first : r === at + 1 ? second : 1));
}

/** How much two neighbouring rows turn when all behind them turn whole. */
function pairShares({ lift, moment }: RowWeights, k: number, share: number): readonly [number, number] {
  const behind = (list: readonly number[]) => list.slice(k + 2).reduce((a, b) => a + b, 0);
  const restLift = flapEffectiveness(share) - behind(lift);
  const restMoment = flapMoment(share) - behind(moment);
  const [l0 = 0, l1 = 0] = lift.slice(k);
  const [m0 = 0, m1 = 0] = moment.slice(k);
  const size = l0 * m1 - l1 * m0;
  return [(restLift * m1 - l1 * restMoment) / size, (l0 * restMoment - m0 * restLift) / size];
}
