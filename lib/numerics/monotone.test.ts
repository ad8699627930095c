import fc from 'fast-check';
import { expect, it } from 'vitest';
import { monotoneCurve } from './monotone';

const TABLE = [
  [1, 3],
  [2, 3.5],
  [5, 9],
  [6, 30],
] as const;

it('runs through its points and holds its ends', () => {
  const curve = monotoneCurve(TABLE);
  for (const [x, y] of TABLE) expect(curve(x)).toBeCloseTo(y, 12);
  expect(curve(-4)).toBe(3);
  expect(curve(11)).toBe(30);
});

it('never falls where its points rise, and has no corners', () => {
  const curve = monotoneCurve(TABLE);
  fc.assert(
    fc.property(fc.double({ min: 1, max: 5.99, noNaN: true }), (x) => {
      expect(curve(x + 0.01)).toBeGreaterThanOrEqual(curve(x));
    }),
  );
  const slope = (x: number) => (curve(x + 1e-6) - curve(x)) / 1e-6;
  for (const [x] of TABLE.slice(1, 3)) expect(slope(x - 1e-6)).toBeCloseTo(slope(x), 3);
});

it('refuses less than two points', () => expect(() => monotoneCurve([[1, 1]])).toThrow(RangeError));
