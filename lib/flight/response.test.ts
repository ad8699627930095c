import { describe, expect, it } from 'vitest';
import type { Matrix4, Row4 } from './modes/system';
import { motion, rateOf } from './response';

const STILL: Row4 = [0, 0, 0, 0];
/** A swing of 3 rad/s with 0.2 of critical damping, a decay of 5 /s and a growth of 0.5 /s, apart from each other. */
const APART: Matrix4 = [
  [0, 1, 0, 0],
  [-9, -1.2, 0, 0],
  [0, 0, -5, 0],
  [0, 0, 0, 0.5],
];

describe('motion in time', () => {
  it('is the known solution of each part, whatever the step', () => {
    for (const stepS of [0.01, 0.25, 1]) {
      const states = motion(APART, { start: [2, 0, 3, 4], input: STILL, stepS, steps: 4 });
      expect(states).toHaveLength(5);
      for (const { timeS, state } of states) {
        const w = 3 * Math.sqrt(1 - 0.04);
        const swing = 2 * Math.exp(-0.6 * timeS) * (Math.cos(w * timeS) + (0.6 / w) * Math.sin(w * timeS));
        expect(state[0]).toBeCloseTo(swing, 11);
        expect(state[2]).toBeCloseTo(3 * Math.exp(-5 * timeS), 11);
        expect(state[3]).toBeCloseTo(4 * Math.exp(0.5 * timeS), 11);
      }
    }
  });

  it('goes to where a held control balances it', () => {
    const last = motion(APART, { start: STILL, input: [0, 18, 10, 0], stepS: 0.5, steps: 60 }).at(-1);
    expect(last?.timeS).toBe(30);
    // 9 x = 18, 5 y = 10.
    expect(last?.state[0]).toBeCloseTo(2, 6);
    expect(last?.state[1]).toBeCloseTo(0, 6);
    expect(last?.state[2]).toBeCloseTo(2, 9);
    expect(last?.state[3]).toBe(0);
  });

  it('two half steps are one step', () => {
    const mixed: Matrix4 = [
      [-0.1, 0.3, 0, -0.8],
      [-1.2, -6, 0.9, 0],
      [2, -50, -7, 0],
      [0, 0, 1, 0],
    ];
    const start: Row4 = [0.1, -0.2, 0.3, 0.4];
    const input: Row4 = [0, -0.1, 5, 0];
    const whole = motion(mixed, { start, input, stepS: 0.4, steps: 3 }).at(-1);
    const halves = motion(mixed, { start, input, stepS: 0.2, steps: 6 }).at(-1);
    for (const [i, x] of (whole?.state ?? []).entries()) expect(halves?.state[i]).toBeCloseTo(x, 11);
  });

  it('the rate of a state is the slope of its curve', () => {
    const input: Row4 = [0, 2, 0, 0];
    const [before, at, after] = motion(APART, { start: [1, 0, 0, 0], input, stepS: 1e-4, steps: 2 });
    if (!before || !at || !after) throw new RangeError('three moments');
    expect(rateOf(APART[1], at, 2)).toBeCloseTo((after.state[1] - before.state[1]) / 2e-4, 5);
  });

  it.each([0, -1, Number.NaN])('refuses a step of %d s', (stepS) =>
    expect(() => motion(APART, { start: STILL, input: STILL, stepS, steps: 2 })).toThrow(RangeError),
  );
});
