import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { leastBetween, rootBetween } from './roots';

describe('rootBetween', () => {
  it('finds the root of a cubic that is known by hand', () => {
    // (x - 3)(x + 2)(x + 7)
    const root = rootBetween((x) => (x - 3) * (x + 2) * (x + 7), 0, 40);
    expect(root).toBeCloseTo(3, 7);
  });

  it('keeps to the bracket where a curve is nearly flat on one side', () => {
    expect(rootBetween((x) => Math.exp(x) - 1e-6, -40, 5)).toBeCloseTo(Math.log(1e-6), 6);
  });

  it('answers an end that is the root, and null without a change of sign', () => {
    expect(rootBetween((x) => x - 4, 4, 9)).toBe(4);
    expect(rootBetween((x) => x - 9, 4, 9)).toBe(9);
    expect(rootBetween((x) => x * x + 1, -2, 5)).toBeNull();
  });

  it('refuses a function that is not finite at an end', () => {
    expect(() => rootBetween((x) => 1 / x, 0, 2)).toThrow(RangeError);
  });

  it('finds any root of a monotone curve', () => {
    fc.assert(
      fc.property(fc.double({ min: -20, max: 30, noNaN: true }), (wanted) => {
        const root = rootBetween((x) => (x - wanted) ** 3 + 0.01 * (x - wanted), -25, 35);
        expect(root).toBeCloseTo(wanted, 5);
      }),
    );
  });
});

describe('leastBetween', () => {
  it.each([
    { name: 'inside', low: 1, high: 9, wanted: 2.5 },
    { name: 'at the lower end', low: 4, high: 9, wanted: 4 },
    { name: 'at the upper end', low: -3, high: 2, wanted: 2 },
  ])('$name', ({ low, high, wanted }) => {
    expect(leastBetween((x) => (x - 2.5) ** 2 + 7, low, high)).toBeCloseTo(wanted, 4);
  });

  it('takes the deeper of two dips', () => {
    const twoDips = (x: number) => (x - 1) ** 2 * (x - 6) ** 2 - 0.4 * x;
    expect(leastBetween(twoDips, 0, 8)).toBeGreaterThan(5.5);
  });

  it('refuses an empty stretch', () => expect(() => leastBetween((x) => x, 3, 2)).toThrow(RangeError));
});
