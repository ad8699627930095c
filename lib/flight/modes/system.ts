import { EigenvalueDecomposition } from 'ml-matrix';

/** Rates of change of four states as sums of the states: x' = A x. */
export type Row4 = readonly [number, number, number, number];
export type Matrix4 = readonly [Row4, Row4, Row4, Row4];

/** One root of the characteristic equation, 1/s; of a conjugate pair the one with a positive imaginary part. */
export interface Root {
  readonly re: number;
  readonly im: number;
}

/**
 * Roots of a system of four states: conjugate pairs once, real roots each. Throws RangeError for a number that is not finite, which
 * the solver would turn over for ever.
 */
export function rootsOf(matrix: Matrix4): Root[] {
  if (!matrix.flat().every(Number.isFinite)) throw new RangeError('the system holds a number that is not finite');
  const { realEigenvalues, imaginaryEigenvalues } = new EigenvalueDecomposition(matrix.map((row) => [...row]));
  return realEigenvalues.map((re, i) => ({ re, im: imaginaryEigenvalues[i] ?? 0 })).filter(({ im }) => im >= 0);
}
