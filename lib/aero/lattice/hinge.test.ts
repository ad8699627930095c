import { describe, expect, it } from 'vitest';
import { flapEffectiveness, flapMoment, rowWeights, turnShares } from './hinge';

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

describe('flapMoment', () => {
  it.each([
    [0.1, -0.54],
    [0.25, -0.6495],
    [0.5, -0.5],
  ])('of %d of the chord is %d (Glauert, ARC R&M 1095)', (share, expected) => {
    expect(flapMoment(share)).toBeCloseTo(expected, 4);
  });
  it('is nil for a whole surface that turns', () => expect(flapMoment(1)).toBeCloseTo(0, 12));
  it('refuses a share outside the chord', () => expect(() => flapMoment(-0.1)).toThrow('-0.1'));
});

describe('rowWeights', () => {
  it('for two rows, worked by hand: control points 3/8 and 7/8, vortices 1/8 and 5/8, give 1/4 and 3/4', () => {
    const [first, second] = rowWeights(2).lift;
    expect(first).toBeCloseTo(0.25, 12);
    expect(second).toBeCloseTo(0.75, 12);
  });
  it.each([1, 3, 6, 10])('of %d rows make one, and no moment: a flat plate lifts at its quarter chord', (rows) => {
    expect(rowWeights(rows).lift.reduce((a, b) => a + b, 0)).toBeCloseTo(1, 12);
    expect(rowWeights(rows).moment.reduce((a, b) => a + b, 0)).toBeCloseTo(0, 12);
  });
});

describe('turnShares', () => {
  it('turns everything for a whole surface and nothing for no control', () => {
    expect(turnShares(5, 1).map((s) => s.toFixed(9))).toEqual(Array(5).fill('1.000000000'));
    for (const share of turnShares(5, 0)) expect(share).toBeCloseTo(0, 9);
  });
  it('lifts and pitches as Glauert says, from the trailing edge forward, at most two rows in part and none by much too far', () => {
    for (const rows of [4, 5, 6, 12])
      for (const share of [0.1, 0.2, 0.27, 0.3, 0.5, 0.7]) {
        const shares = turnShares(rows, share);
        const sum = (weights: readonly number[]) => weights.reduce((all, w, r) => all + w * (shares[r] ?? 0), 0);
        expect(sum(rowWeights(rows).lift)).toBeCloseTo(flapEffectiveness(share), 9);
        expect(sum(rowWeights(rows).moment)).toBeCloseTo(flapMoment(share), 9);
        expect(shares.filter((s) => s !== 0 && s !== 1).length).toBeLessThanOrEqual(2);
        for (const s of shares) expect(Math.abs(s - 0.5)).toBeLessThan(0.75);
      }
  });
});
