/**
 * Lift slope of a wing by the formula of Helmbold for any aspect ratio with the half-chord sweep, per radian, without compressibility:
 * 2 pi A / (2 + sqrt(4 + A^2 (1 + tan^2 L) / k^2)). Lowry & Polhamus, NACA TN 3911 (1957); USAF DATCOM section 4.1.3.2.
 * @param sectionShare k, the section's lift slope over 2 pi
 */
export function wingLiftSlope(aspectRatio: number, halfChordSweepRad: number, sectionShare = 1): number {
  if (!(aspectRatio > 0)) throw new RangeError(`aspect ratio must be positive, got ${aspectRatio}`);
  if (!(sectionShare > 0)) throw new RangeError(`section share must be positive, got ${sectionShare}`);
  const swept = (aspectRatio / sectionShare) ** 2 * (1 + Math.tan(halfChordSweepRad) ** 2);
  return (2 * Math.PI * aspectRatio) / (2 + Math.sqrt(4 + swept));
}
