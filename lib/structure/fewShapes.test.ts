import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { factor, solve } from '@/lib/numerics/lu';
import { determinant, shapesOf, valueAt } from './fewShapes';

describe('determinant', () => {
  it('of I - q H for a matrix worked by hand', () => {
    // (1 - q)(1 - 4 q) - (-2 q)(-3 q) = 1 - 5 q - 2 q^2
    expect(
      determinant([
        [1, 2],
        [3, 4],
      ]),
    ).toEqual([1, -5, -2]);
  });

  it('of three rows, expanded by hand at q = 1', () => {
    // I - H has rows 0 -2 -1, -3 -1 -2, 0 -4 1: 0 (-1 - 8) + 2 (-3) - 1 (12) = -18
    const h = [
      [1, 2, 1],
      [3, 2, 2],
      [0, 4, 0],
    ];
    expect(valueAt(determinant(h), 1)).toBeCloseTo(-18, 12);
  });
});

describe('shapesOf', () => {
  const entry = fc.double({ min: -1, max: 1, noNaN: true });
  it('with as many shapes as rows solves (I - q F) x = q d as LU does', () => {
    const n = 5;
    const arrays = fc.tuple(
      fc.array(entry, { minLength: n * n, maxLength: n * n }),
      fc.array(fc.double({ min: 0.2, max: 1, noNaN: true }), { minLength: n, maxLength: n }),
    );
    fc.assert(
      fc.property(arrays, ([entries, rightSide]) => {
        const feedback = Float64Array.from(entries);
        const drive = Float64Array.from(rightSide);
        const q = 0.15;
        const { hessenberg, size, onto } = shapesOf(feedback, drive);
        const weights = Float64Array.from({ length: n }, (_, i) => Math.cos(i));
        const shares = onto(weights);
        const turned = hessenberg.map((row, i) => (i === 0 ? row.map((h, k) => h - size * (shares[k] ?? 0)) : row));
        const byShapes = valueAt(determinant(turned), q) / valueAt(determinant(hessenberg), q) - 1;
        const factored = factor(
          feedback.map((f, at) => (at % (n + 1) === 0 ? 1 : 0) - q * f),
          n,
        );
        if (!factored.ok) throw new RangeError('refused');
        const x = drive.map((d) => q * d);
        solve(factored.value, x, 1);
        expect(byShapes).toBeCloseTo(
          x.reduce((sum, xi, i) => sum + xi * (weights[i] ?? 0), 0),
          6,
        );
      }),
      { numRuns: 50 },
    );
  });

  it('stops where the next shape is already there', () => {
    const feedback = Float64Array.from([2, 0, 0, 3]);
    expect(shapesOf(feedback, Float64Array.from([1, 0])).hessenberg).toEqual([[2]]);
    expect(shapesOf(feedback, Float64Array.from([0, 0])).hessenberg).toEqual([]);
  });
});
