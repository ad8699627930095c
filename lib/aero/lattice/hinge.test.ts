import { describe, expect, it } from 'vitest';
import { flapEffectiveness, rowWeights, turnShares } from './hinge';

describe('flapEffectiveness', () => {
  it.each([
    [0, 0],
    [0.1, 0.3958],
    [0.25, 0.609],
    [0.5, 0.8183],
    [1, 1],
  ])('of %d of the chord is %d (Glauert, ARC R&M 1095)', (share, expected) => {
    expect(flapEffectiveness(share)).toBeCloseTo(expected, 4);
  });

  it('refuses a share outside the chord', () => expect(() => flapEffectiveness(1.01)).toThrow('1.01'));
});

describe('rowWeights', () => {
  it('for two rows, worked by hand: control points 3/8 and 7/8, vortices 1/8 and 5/8, give 1/4 and 3/4', () => {
    const [first, second] = rowWeights(2);
    expect(first).toBeCloseTo(0.25, 12);
    expect(second).toBeCloseTo(0.75, 12);
  });
  it.each([1, 3, 6, 10])('of %d rows make one', (rows) => {
    expect(rowWeights(rows).reduce((a, b) => a + b, 0)).toBeCloseTo(1, 12);
  });
});

describe('turnShares', () => {
  it('turns everything for a whole surface and nothing for no control', () => {
    expect(turnShares(5, 1).map((s) => s.toFixed(9))).toEqual(Array(5).fill('1.000000000'));
    expect(turnShares(5, 0)).toEqual([0, 0, 0, 0, 0]);
  });
  it('turns rows from the trailing edge forward, one of them in part', () => {
    const shares = turnShares(6, 0.3);
    expect(shares.slice(0, 3)).toEqual([0, 0, 0]);
    expect(shares.at(-1)).toBe(1);
    expect(shares.filter((s) => s > 0 && s < 1)).toHaveLength(1);
  });
});
