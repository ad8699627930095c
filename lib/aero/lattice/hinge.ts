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
 * Share of a section's lift that each row's control point answers for, leading edge first; together 1. Vortices at the quarter and
 * control points at three quarters of equal rows make a Cauchy matrix, whose inverse is known in products.
 */
export function rowWeights(rows: number): number[] {
  const weights = Array.from({ length: rows }, (_, i) => {
    let weight = 1;
    for (let j = 0; j < rows; j++) {
      weight *= i + 0.5 - j;
      if (j !== i) weight /= i - j;
    }
    return weight;
  });
  const sum = weights.reduce((a, b) => a + b, 0);
  return weights.map((weight) => weight / sum);
}

/**
 * By what share of the deflection each row's normal turns, so that in two dimensions the lift is Glauert's exactly, wherever the
 * hinge lies: rows aft of it turn whole, rows ahead not at all, and the row at the hinge by what is left. Turning whole
 * panels would be wrong by up to a fifth.
 */
export function turnShares(rows: number, share: number): number[] {
  const shares = rowWeights(rows);
  let left = flapEffectiveness(share);
  for (let r = rows - 1; r >= 0; r--) {
    const weight = shares[r] ?? 1;
    shares[r] = Math.min(1, Math.max(0, left / weight));
    left -= weight;
  }
  return shares;
}
