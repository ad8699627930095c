// Moment about the hinge of a plain flap on a thin aerofoil, as H = q Ch S c with the flap's own area and chord; positive trailing edge
// down. Both follow from the pressure of H. Glauert's flapped flat plate ("Theoretical relationships for an aerofoil with hinged flap",
// ARC R&M 1095, 1927), integrated over the flap; Etkin & Reid, Dynamics of Flight, appendix B, shows them as charts.

function angles(share: number): { overRad: number; sin: number; cos: number; lever: number } {
  if (!(share > 0 && share <= 1)) throw new RangeError(`flap share must lie in 0 to 1, got ${share}`);
  const cos = 2 * share - 1;
  const overRad = Math.PI - Math.acos(cos);
  const sin = Math.sin(overRad);
  return { overRad, sin, cos, lever: overRad * (cos - 0.5) + sin * (1 - 0.5 * cos) };
}

/** Change of the hinge moment coefficient with angle of attack, b1 per radian, for a flap of `share` of the chord. Throws RangeError outside 0 to 1. */
export const hingeByAlpha = (share: number): number => -angles(share).lever / share ** 2;

/** Change with the flap's own angle, b2 per radian. Throws RangeError outside 0 to 1. */
export function hingeByTurn(share: number): number {
  const { overRad, sin, cos, lever } = angles(share);
  return -((overRad / Math.PI) * lever + (sin / (2 * Math.PI)) * (overRad * cos + sin)) / share ** 2;
}

/** Moment of a whole thin plate about an axis at a share of its chord, per radian: lift of 2 pi at the quarter chord, `wander` further off than that. */
export const allMovingByTurn = (axisShare: number, wander: number): number =>
  -2 * Math.PI * (Math.abs(axisShare - 0.25) + wander);

/**
 * Hinge moment, N mm, from dynamic pressure in Pa, coefficient, and the integral of the flap's chord squared along the hinge, mm3.
 */
export const hingeMomentNmm = (pressurePa: number, coefficient: number, chordSquaredMm3: number): number =>
  pressurePa * 1e-6 * coefficient * chordSquaredMm3;
