import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { dampingOf, doublingS, growthOf, lateralModes, longitudinalModes, naturalRadSOf } from './roots';
import { type Matrix4, type Root, rootsOf } from './system';

const real = (re: number): Root => ({ re, im: 0 });
const pair = (re: number, im: number): Root => ({ re, im });

/** A matrix with two given 2 x 2 blocks has their roots: s^2 - trace s + determinant. */
const blocks = ([a, b]: readonly [number, number], [c, d]: readonly [number, number]): Matrix4 => [
  [0, 1, 0, 0],
  [-b, a, 0, 0],
  [0, 0, 0, 1],
  [0, 0, -d, c],
];

describe('roots of a system', () => {
  it('gives conjugate pairs once and real roots each', () => {
    // s^2 + 4 s + 13 has -2 +- 3 i; s^2 + 3 s - 10 has 2 and -5.
    const roots = rootsOf(blocks([-4, 13], [-3, -10]));
    expect(roots).toHaveLength(3);
    const [swing] = roots.filter(({ im }) => im > 0);
    expect(swing?.re).toBeCloseTo(-2, 10);
    expect(swing?.im).toBeCloseTo(3, 10);
    const reals = roots.filter(({ im }) => im === 0).map(({ re }) => re);
    expect(Math.max(...reals)).toBeCloseTo(2, 10);
    expect(Math.min(...reals)).toBeCloseTo(-5, 10);
  });

  it.each([Number.NaN, Number.POSITIVE_INFINITY])('refuses %d', (bad) =>
    expect(() => rootsOf(blocks([-4, bad], [-3, -10]))).toThrow(RangeError),
  );
});

describe('short period and phugoid', () => {
  it('two swings: the faster is the short period, in any order', () => {
    for (const roots of [
      [pair(-0.02, 0.2), pair(-2, 3)],
      [pair(-2, 3), pair(-0.02, 0.2)],
    ]) {
      const { shortPeriod, phugoid } = longitudinalModes(roots);
      expect(shortPeriod).toMatchObject({ kind: 'oscillation', swingRadS: 3, growthPerS: -2 });
      expect(phugoid).toMatchObject({ kind: 'oscillation', swingRadS: 0.2 });
    }
  });

  it('a slow swing with faster real roots: the short period is damped too much to swing, or runs off', () => {
    expect(longitudinalModes([real(-3), pair(-0.02, 0.2), real(-9)]).shortPeriod).toEqual({
      kind: 'aperiodic',
      ratesPerS: [-9, -3],
    });
    expect(longitudinalModes([real(1.5), pair(-0.3, 0.4), real(-9)]).shortPeriod).toEqual({
      kind: 'aperiodic',
      ratesPerS: [-9, 1.5],
    });
  });

  it('a fast swing with slow real roots: the phugoid drifts off', () => {
    const { shortPeriod, phugoid } = longitudinalModes([real(0.1), pair(-2, 3), real(-0.2)]);
    expect(shortPeriod.kind).toBe('oscillation');
    expect(phugoid).toEqual({ kind: 'aperiodic', ratesPerS: [-0.2, 0.1] });
  });

  it('four real roots: the two fastest are the short period', () => {
    const { shortPeriod, phugoid } = longitudinalModes([real(-0.4), real(-8), real(0.5), real(2)]);
    expect(shortPeriod).toEqual({ kind: 'aperiodic', ratesPerS: [-8, 2] });
    expect(phugoid).toEqual({ kind: 'aperiodic', ratesPerS: [0.5, -0.4] });
  });
});

describe('Dutch roll, roll and spiral', () => {
  it('one swing: it is the Dutch roll; roll dies away fastest, the other is the spiral', () => {
    const { dutchRoll, rollSpiral } = lateralModes([real(0.01), pair(-0.5, 2.3), real(-8)]);
    expect(dutchRoll).toMatchObject({ kind: 'oscillation', swingRadS: 2.3 });
    expect(rollSpiral).toEqual({ kind: 'aperiodic', ratesPerS: [-8, 0.01] });
  });

  it('two swings: roll and spiral have joined in the slower', () => {
    const { dutchRoll, rollSpiral } = lateralModes([pair(-1, 0.7), pair(-0.5, 4)]);
    expect(dutchRoll).toMatchObject({ swingRadS: 4 });
    expect(rollSpiral).toMatchObject({ kind: 'oscillation', swingRadS: 0.7 });
  });

  it('four real roots: without a fin the Dutch roll comes apart', () => {
    const { dutchRoll, rollSpiral } = lateralModes([real(-0.1), real(3), real(-20), real(-4)]);
    expect(dutchRoll).toEqual({ kind: 'aperiodic', ratesPerS: [-4, 3] });
    expect(rollSpiral).toEqual({ kind: 'aperiodic', ratesPerS: [-20, -0.1] });
  });
});

describe('numbers of a pair', () => {
  it('frequency and damping are those of s^2 + 2 z w s + w^2, on both sides of critical damping', () => {
    fc.assert(
      fc.property(
        fc.double({ min: 0.5, max: 20, noNaN: true }),
        fc.double({ min: -3, max: 3, noNaN: true }),
        (w, z) => {
          fc.pre(Math.abs(Math.abs(z) - 1) > 0.01);
          // A much slower pair beside it, so that it is the short period.
          const { shortPeriod } = longitudinalModes(rootsOf(blocks([-2 * z * w, w * w], [0, 1e-6])));
          expect(naturalRadSOf(shortPeriod)).toBeCloseTo(w, 5);
          expect(dampingOf(shortPeriod)).toBeCloseTo(z, 5);
          expect(shortPeriod.kind).toBe(Math.abs(z) < 1 ? 'oscillation' : 'aperiodic');
        },
      ),
    );
  });

  it('a pair that runs away on one side has neither, and grows by its positive root', () => {
    const saddle = { kind: 'aperiodic', ratesPerS: [-9, 1.5] } as const;
    expect(naturalRadSOf(saddle)).toBeNull();
    expect(dampingOf(saddle)).toBeNull();
    expect(growthOf(saddle)).toBe(1.5);
  });

  it('doubles in ln 2 over the rate, and halves in minus that', () => {
    expect(Math.exp(0.7 * doublingS(0.7))).toBeCloseTo(2, 12);
    expect(Math.exp(-0.7 * -doublingS(-0.7))).toBeCloseTo(0.5, 12);
  });
});
