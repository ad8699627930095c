import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { factor, solve } from './lu';

const system = fc.integer({ min: 1, max: 90 }).chain((n) =>
  fc.record({
    n: fc.constant(n),
    entries: fc.array(fc.double({ min: -1, max: 1, noNaN: true }), { minLength: n * n, maxLength: n * n }),
    columns: fc.integer({ min: 1, max: 5 }),
  }),
);

describe('factor and solve', () => {
  it('solves a system worked by hand, with an exchange of rows', () => {
    // x + 2 z = 7, 3 y - z = 3, 4 x + y = 6 has x = 1, y = 2, z = 3; the first column needs a pivot.
    const factored = factor(Float64Array.from([1, 0, 2, 0, 3, -1, 4, 1, 0]), 3);
    if (!factored.ok) throw new RangeError('refused');
    const b = Float64Array.from([7, 3, 6]);
    solve(factored.value, b, 1);
    expect([...b].map((x) => Number(x.toFixed(12)))).toEqual([1, 2, 3]);
  });

  it('gives back the right-hand sides, for any size across the block width', () => {
    fc.assert(
      fc.property(system, ({ n, entries, columns }) => {
        const a = Float64Array.from(entries);
        // A heavy diagonal, out of order, so that every matrix is regular and rows have to be exchanged.
        for (let i = 0; i < n; i++) a[i * n + ((i + 1) % n)] = (a[i * n + ((i + 1) % n)] ?? 0) + n;
        const b = Float64Array.from({ length: n * columns }, (_, k) => Math.sin(k + 1));
        const factored = factor(a.slice(), n);
        if (!factored.ok) throw new RangeError('refused');
        const x = b.slice();
        solve(factored.value, x, columns);
        for (let i = 0; i < n; i++)
          for (let c = 0; c < columns; c++) {
            let sum = 0;
            for (let j = 0; j < n; j++) sum += (a[i * n + j] ?? 0) * (x[j * columns + c] ?? 0);
            expect(Math.abs(sum - (b[i * columns + c] ?? 0))).toBeLessThan(1e-10);
          }
      }),
      { numRuns: 60 },
    );
  });

  it.each([2, 5, 40, 77])('refuses two equal rows of %d as a problem', (n) => {
    const a = Float64Array.from({ length: n * n }, (_, k) => Math.sin(k * k + 1));
    a.copyWithin((n - 1) * n, 0, n);
    const refused = factor(a, n);
    expect(refused.ok ? 'solved' : refused.problems[0]?.code).toBe('singular-matrix');
  });

  it.each([Number.NaN, Number.POSITIVE_INFINITY])('refuses %d as a problem', (bad) => {
    const refused = factor(Float64Array.from([1, bad, 2, 3]), 2);
    expect(refused.ok ? 'solved' : refused.problems[0]?.code).toBe('matrix-not-finite');
  });
});
