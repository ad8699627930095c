// A half wing as a beam held at the centre. Lengths mm, forces N, moments N mm.

/** A piece of the beam between two places, with its bending stiffness. */
export interface BeamPiece {
  readonly fromMm: number;
  readonly toMm: number;
  readonly bendingNmm2: number;
}

/**
 * Deflection of the free end, mm, under a bending moment along the beam: the integral of M (L - s) / EI (unit-load method; Young &
 * Budynas, "Roark's Formulas for Stress and Strain", ch. 8). Simpson's rule over each piece, exact for a moment of second degree.
 */
export function endDeflection(pieces: readonly BeamPiece[], momentNmm: (atMm: number) => number): number {
  const end = pieces.at(-1)?.toMm ?? 0;
  let sum = 0;
  for (const { fromMm, toMm, bendingNmm2 } of pieces) {
    const bend = (at: number) => momentNmm(at) * (end - at);
    const middle = (fromMm + toMm) / 2;
    sum += ((bend(fromMm) + 4 * bend(middle) + bend(toMm)) * (toMm - fromMm)) / (6 * bendingNmm2);
  }
  return sum;
}

/**
 * Bending moment at a place of half a wing that carries `loadN` laid out as half an ellipse, N mm; at the centre
 * loadN halfMm 4 / (3 pi). The weight of the wing itself, which relieves it, is left out.
 */
export function ellipticMoment(loadN: number, halfMm: number, atMm: number): number {
  const x = placeOn(halfMm, atMm);
  const root = Math.sqrt(1 - x * x);
  return ((4 * loadN * halfMm) / Math.PI) * (root ** 3 / 3 - (x / 2) * (Math.acos(x) - x * root));
}

/** The same with the load spread evenly: loadN (half - at)^2 / (2 half). */
export function uniformMoment(loadN: number, halfMm: number, atMm: number): number {
  return (loadN * halfMm * (1 - placeOn(halfMm, atMm)) ** 2) / 2;
}

function placeOn(halfMm: number, atMm: number): number {
  const x = atMm / halfMm;
  if (!(x >= 0 && x <= 1)) throw new RangeError(`${atMm} mm lies beyond the half wing of ${halfMm} mm`);
  return x;
}
