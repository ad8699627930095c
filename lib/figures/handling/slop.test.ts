import { describe, expect, it } from 'vitest';
import { control } from '@/tests/support/airframe';
import { figure, levelOf, type Turn, value } from '@/tests/support/handling';
import { fin, packAt, plain, tail, wing } from '@/tests/support/plainAircraft';
import { SLOP_PULL_G } from '../handlingBands';

describe('slop', () => {
  /** The plain aircraft with an elevator whose holes are 8 and so many mm from their shafts. */
  const linked = (hornMm: number, servoItemId = 'servo'): Turn => ({
    airframe: plain({
      surfaces: [
        wing(),
        tail(560, {
          controls: [
            control({
              id: 'elevator',
              kind: 'elevator',
              from: 0,
              to: 1,
              mix: { pitch: 1, roll: 0, yaw: 0, flap: 0 },
              linkage: { servoItemId, servoArmMm: 8, hornMm, hornStation: 0.1, rodMm: 1.2, face: 'upper' },
            }),
          ],
        }),
        fin(),
      ],
      items: [packAt(0), { ...packAt(400, 9), id: 'servo', kind: 'servo', sizeMm: [23, 12, 24] }],
    }),
  });

  it.each([16, 24])('slop is worth half its degrees times the pull, here with a horn of %d mm', (hornMm) => {
    // Two holes with 0.1 mm of play over the horn, and 1 degree of servo centring by arm over horn (common practice).
    const freeDeg = ((2 * 0.1) / hornMm) * (180 / Math.PI) + 8 / hornMm;
    const turn = linked(hornMm);
    // The rod runs a little aslant, which turns arm over horn by a per cent or so.
    const ratio = value('slopPullG', turn) / (value('pitchPowerPerDeg', turn) * (freeDeg / 2));
    expect(Math.abs(ratio - 1)).toBeLessThan(0.02);
    const { inputs = [] } = figure('slopPullG', turn);
    const perG = inputs.find(({ unit }) => unit === '°/g')?.value ?? Number.NaN;
    expect(perG * value('pitchPowerPerDeg', turn)).toBeCloseTo(1, 9);
  });

  it('the band of slop runs from a tight linkage to a loose one', () => {
    const { band, value: middle } = figure('slopPullG', { halfMm: 0 });
    // Half the usual play and centring, and twice.
    expect((band?.low ?? 0) / (middle ?? 0)).toBeCloseTo(0.5, 2);
    expect((band?.high ?? 0) / (middle ?? 0)).toBeCloseTo(2, 2);
  });

  it('slop says why when a linkage cannot be worked out', () =>
    expect(figure('slopPullG', linked(16, 'nobody')).problem?.code).toBe('linkage-no-servo'));

  /** A control this many times as strong pulls as many times as much. */
  const strength = (times: number): Turn => ({
    model: { controls: new Map([['tail/elevator', { lift: 0.4 * times, pitch: -1.1 * times }]]) },
  });
  const timesFor = (wanted: number) => wanted / value('slopPullG', strength(1));

  it.each([
    { at: SLOP_PULL_G.steady.value, below: 'good', above: 'watch' },
    { at: SLOP_PULL_G.loose.value, below: 'watch', above: 'bad' },
  ])('slop: $below below $at g, $above above it', ({ at, below, above }) => {
    expect(levelOf('slopPullG', strength(timesFor(at * 0.999)))).toBe(below);
    expect(levelOf('slopPullG', strength(timesFor(at * 1.001)))).toBe(above);
  });
});
