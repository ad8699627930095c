import { describe, expect, it } from 'vitest';
import { alphaPitch, figure, LATERAL, levelOf, run, type Turn, value, yawStiffness } from '@/tests/support/handling';
import { fin, plain, tail, wing } from '@/tests/support/plainAircraft';
import { PITCH_FEEL, ROLL_HELIX } from '../bands';
import { PULL_PER_STICK, STICK_TRAVEL_MM } from '../handlingBands';

describe('pull', () => {
  it('per mm of stick is the pull per degree times degrees', () => {
    const pull = value('pitchPowerPerDeg');
    const throwDeg = plain().surfaces[1]?.controls[0]?.throwsDeg.up ?? Number.NaN;
    expect(value('pullPerStickMm')).toBeCloseTo((pull * throwDeg) / STICK_TRAVEL_MM.value, 12);
    // One g of pull turns the path by g / V.
    const cruise = plain().flight.cruiseMs;
    expect(value('pitchRatePerDeg')).toBeCloseTo((pull * 9.80665 * 180) / (cruise * Math.PI), 10);
  });

  it('its band is what the ends of the neutral point give, and is open where one is past the manoeuvre point', () => {
    const { band } = figure('pitchPowerPerDeg');
    expect(band?.low).toBeLessThan(value('pitchPowerPerDeg'));
    expect(band?.high).toBeGreaterThan(value('pitchPowerPerDeg'));
    // With the neutral point certain the power of the elevator is left: the lattice may be 5 % off.
    expect(figure('pitchPowerPerDeg', { halfMm: 0 }).band?.high).toBeCloseTo(1.05 * value('pitchPowerPerDeg'), 12);
    expect(figure('pitchPowerPerDeg', { halfMm: 80 }).band).toBeUndefined();
  });

  /** A control this many times as strong pulls as many times as much. */
  const strength = (times: number): Turn => ({
    model: { controls: new Map([['tail/elevator', { lift: 0.4 * times, pitch: -1.1 * times }]]) },
  });
  const timesFor = (wanted: number) => wanted / value('pullPerStickMm', strength(1));

  it.each([
    { at: PULL_PER_STICK.watch[0], below: 'bad', above: 'watch' },
    { at: PULL_PER_STICK.good[0], below: 'watch', above: 'good' },
    { at: PULL_PER_STICK.good[1], below: 'good', above: 'watch' },
    { at: PULL_PER_STICK.watch[1], below: 'watch', above: 'bad' },
  ])('per mm of stick: $below below $at g, $above above it', ({ at, below, above }) => {
    expect(levelOf('pullPerStickMm', strength(timesFor(at * 0.999)))).toBe(below);
    expect(levelOf('pullPerStickMm', strength(timesFor(at * 1.001)))).toBe(above);
  });

  it('does not apply without an elevator, and the rest still shows', () => {
    const turn = { airframe: plain({ surfaces: [wing(), tail(560, { controls: [] }), fin()] }) };
    for (const id of ['pitchPowerPerDeg', 'pitchRatePerDeg', 'pullPerStickMm', 'slopPullG'] as const)
      expect(figure(id, turn).problem?.code).toBe('does-not-apply');
    expect(value('manoeuvreMarginPct', turn)).toBeCloseTo(value('manoeuvreMarginPct'), 9);
    expect(run(turn).charts?.map(({ id }) => id)).toEqual(['rollStep', 'yawRelease']);
  });
});

/** Both verdict bands of feel, tried on both sides of each of their four limits. */
describe('what the thumb feels', () => {
  const cases = [
    { name: 'pull per degree', id: 'pitchPowerPerDeg', band: PITCH_FEEL },
    { name: 'helix angle', id: 'rollHelix', band: ROLL_HELIX },
  ] as const;
  const strength = (times: number): Turn => ({
    model: { controls: new Map([['tail/elevator', { lift: 0.4 * times, pitch: -1.1 * times }]]) },
    lateral: { controls: new Map([['wing/aileron', { side: 0, roll: -0.3 * times, yaw: 0 }]]) },
  });
  it.each(cases)('$name', ({ id, band: { good, watch } }) => {
    const one = value(id, strength(1));
    const levels = [watch[0], good[0], good[1], watch[1]].flatMap((limit) =>
      [0.999, 1.001].map((side) => levelOf(id, strength((limit * side) / one))),
    );
    expect(levels).toEqual(['bad', 'watch', 'watch', 'good', 'good', 'watch', 'watch', 'bad']);
  });
});

describe('the manoeuvre point', () => {
  it('an aft neutral point adds margin; the verdict minds the low end of the band', () => {
    expect(value('manoeuvreMarginPct', alphaPitch(-0.8))).toBeGreaterThan(value('manoeuvreMarginPct') + 3);
    expect(levelOf('manoeuvreMarginPct', { halfMm: 5 })).toBe('good');
    expect(levelOf('manoeuvreMarginPct', { halfMm: 80 })).toBe('watch');
    expect(levelOf('manoeuvreMarginPct', alphaPitch(2))).toBe('bad');
  });

  it('behind it nothing can be said of pull and short period, but how fast it runs away can', () => {
    const turn = alphaPitch(2);
    for (const id of ['pitchPowerPerDeg', 'slopPullG', 'shortPeriodHz', 'controlAnticipation'] as const)
      expect(figure(id, turn).problem?.code, id).toBe('behind-manoeuvre-point');
    expect(value('pitchDoubleS', turn)).toBeGreaterThan(0);
    expect(levelOf('pitchDoubleS', turn)).toBe('bad');
  });

  it('time to double: seven dead times of 0.3 s can be held, less cannot', () => {
    // The further behind, the faster; look for both sides of 2.1 s.
    const found = [0.1, 0.2, 0.3, 0.35, 0.4, 0.45, 0.5, 0.6, 0.8].map((pitch) =>
      figure('pitchDoubleS', alphaPitch(pitch)),
    );
    const judged = found.filter(({ value: seconds }) => seconds !== null);
    const levels = new Set(judged.map(({ verdict }) => verdict?.level));
    expect([...levels].sort()).toEqual(['bad', 'watch']);
    for (const { value: seconds, verdict } of judged)
      expect(verdict?.level).toBe((seconds ?? 0) >= 2.1 ? 'watch' : 'bad');
  });
});

describe('the short period', () => {
  it('more pitch inertia swings slower, and anticipates less', () => {
    const heavy = { inertia: { yy: 0.024 } };
    expect(value('shortPeriodHz', heavy)).toBeLessThan(value('shortPeriodHz') * 0.8);
    expect(value('controlAnticipation', heavy)).toBeLessThan(value('controlAnticipation') * 0.64);
    expect(value('pitchPowerPerDeg', heavy)).toBe(value('pitchPowerPerDeg'));
  });

  it('more pitch damping damps more and halves sooner', () => {
    const damped = { model: { pitchRate: { lift: 7, pitch: -12 } } };
    expect(value('shortPeriodDamping', damped)).toBeGreaterThan(value('shortPeriodDamping'));
    expect(value('shortPeriodHalfS', damped)).toBeLessThan(value('shortPeriodHalfS'));
  });

  it('control anticipation is judged by 0.16 to 3.6 and 0.096 to 10, times an N of 10', () => {
    const inertias = [0.0005, 0.001, 0.002, 0.004, 0.02, 0.05, 0.1, 0.13, 0.16, 0.2, 0.25, 0.3, 0.4, 1];
    const found = inertias.map((yy) => figure('controlAnticipation', { inertia: { yy } }));
    for (const { value: anticipation, verdict } of found) {
      const at = anticipation ?? Number.NaN;
      const expected = at >= 1.6 && at <= 36 ? 'good' : at >= 0.96 && at <= 100 ? 'watch' : 'bad';
      expect(verdict?.level).toBe(expected);
    }
    expect(found.map(({ verdict }) => verdict?.level).filter((level, i, all) => level !== all[i - 1])).toEqual([
      ...['bad', 'watch', 'good', 'watch', 'bad'],
    ]);
  });

  it('damping is judged by 0.35 to 1.3 and 0.25 to 2, which do not scale', () => {
    const dampings = [-0.1, 1, 2, 3, 4, 6, 10, 16, 24, 32, 40, 50, 60, 80];
    const found = dampings.map((damping) =>
      figure('shortPeriodDamping', {
        model: { alpha: { lift: 4.6, pitch: -6 }, pitchRate: { lift: 7, pitch: -damping } },
      }),
    );
    for (const { value: ratio, verdict } of found) {
      const at = ratio ?? Number.NaN;
      const expected = at >= 0.35 && at <= 1.3 ? 'good' : at >= 0.25 && at <= 2 ? 'watch' : 'bad';
      expect(verdict?.level).toBe(expected);
    }
    expect(new Set(found.map(({ verdict }) => verdict?.words)).size).toBeGreaterThan(3);
  });

  it('a tail behind the wing opens the band of damping upwards, for the lag that the lattice leaves out', () => {
    const tailless = { airframe: plain({ surfaces: [wing(), fin()] }) };
    const width = (turn: Turn) =>
      (figure('shortPeriodDamping', turn).band?.high ?? 0) - value('shortPeriodDamping', turn);
    expect(width({})).toBeGreaterThan(2 * width(tailless));
    expect(figure('shortPeriodHalfS').band?.cause).toContain('alpha-dot');
    expect(figure('shortPeriodHalfS', tailless).band?.cause).not.toContain('alpha-dot');
  });
});

describe('roll and yaw', () => {
  it('steady roll is the aileron against the damping; twice the damping, half the rate', () => {
    const twice = { lateral: { rollRate: { ...LATERAL.rollRate, roll: -0.84 } } };
    expect(value('rollHelix', twice)).toBeCloseTo(value('rollHelix') / 2, 12);
    // 15 degrees both ways: 0.3 * 0.2617994 / 0.42.
    expect(value('rollHelix')).toBeCloseTo(0.187, 4);
    expect(value('rollModeS', twice)).toBeLessThan(value('rollModeS') * 0.6);
  });

  it('the roll mode is judged by 1.4 and 3 s over the root of N', () => {
    const level = { lateral: { beta: { ...LATERAL.beta, roll: 0 } } };
    const found = [0.007, 0.05, 0.1, 0.15, 0.2, 0.3, 0.5].map((xx) =>
      figure('rollModeS', { ...level, inertia: { xx, zz: 1, xz: 0 } }),
    );
    for (const { value: seconds, verdict } of found) {
      const s = seconds ?? Number.NaN;
      const expected = s <= 1.4 / Math.sqrt(10) ? 'good' : s <= 3 / Math.sqrt(10) ? 'watch' : 'bad';
      expect(verdict?.level).toBe(expected);
    }
    expect(new Set(found.map(({ verdict }) => verdict?.level)).size).toBe(3);
  });

  it('larger fins wag faster', () =>
    expect(value('dutchRollHz', yawStiffness(0.2))).toBeGreaterThan(value('dutchRollHz') * 1.2));

  it('the tail wag is judged by 0.08 and 0.02, and by 0.15 and 0.05 1/s times the root of N for how fast it dies away', () => {
    const found = [-0.3, -0.1, 0, 0.05, 0.1, 0.12, 0.14, 0.16, 0.2].map((yaw) => {
      const turn = { lateral: { yawRate: { side: 0, roll: 0, yaw }, rollRate: { ...LATERAL.rollRate, yaw: 0 } } };
      return { ratio: figure('dutchRollDamping', turn), hz: value('dutchRollHz', turn) };
    });
    for (const { ratio, hz } of found) {
      const z = ratio.value ?? Number.NaN;
      const decay = (z * 2 * Math.PI * hz) / Math.sqrt(10);
      const expected = z >= 0.08 && decay >= 0.15 ? 'good' : z >= 0.02 && decay >= 0.05 ? 'watch' : 'bad';
      expect(ratio.verdict?.level).toBe(expected);
    }
    expect(new Set(found.map(({ ratio }) => ratio.verdict?.level)).size).toBe(3);
  });

  it('without yaw damping the tail keeps wagging; unstable in yaw the nose swings away', () => {
    const undamped = yawStiffness(0.09, {
      yawRate: { side: 0, roll: 0, yaw: 0.06 },
      rollRate: { ...LATERAL.rollRate, yaw: 0 },
    });
    expect(levelOf('dutchRollDamping', undamped)).not.toBe('good');
    const away = yawStiffness(-0.15, { beta: { side: -0.3, roll: 0, yaw: -0.15 } });
    expect(figure('dutchRollHz', away).problem?.code).toBe('yaw-diverges');
  });

  it('fins that a body nearly undoes are watched: at the weak end it swings away', () => {
    const beta = { side: -0.3, roll: -0.02, yaw: 0.02 };
    const body = { name: 'bodies', alpha: { lift: 0, pitch: 0 }, beta: { side: 0, roll: 0, yaw: -0.12 } } as const;
    const turn = { lateral: { beta }, model: { contributions: [body] } };
    expect(figure('dutchRollHz', turn).band?.low).toBe(0);
    const unsure = { level: 'watch', words: 'at the weak end of its band: the nose swings away from the wind' };
    expect(figure('dutchRollHz', turn).verdict).toEqual(unsure);
    // What swings away has no damping to show, and is no better for it.
    expect(figure('dutchRollDamping', turn).verdict).toEqual(unsure);
    expect(levelOf('dutchRollHz', { lateral: { beta } })).toBe('good');
  });

  it('dihedral rights a bank, too much fin lets it grow; the sign says which', () => {
    const righting = yawStiffness(0.05, { beta: { side: -0.3, roll: -0.15, yaw: 0.05 } });
    expect(value('spiralDoubleS', righting)).toBeLessThan(0);
    expect(levelOf('spiralDoubleS', righting)).toBe('good');
    const growing = { lateral: { beta: { side: -0.3, roll: 0.02, yaw: 0.12 } } };
    expect(value('spiralDoubleS', growing)).toBeGreaterThan(0);
  });

  it('a bank that doubles: 20 and 8 s over the root of N, but never under seven dead times', () => {
    const found = [-0.06, -0.04, -0.02, 0, 0.02, 0.06, 0.1, 0.2].map((roll) =>
      figure('spiralDoubleS', { lateral: { beta: { side: -0.3, roll, yaw: 0.12 } } }),
    );
    const growing = found.filter(({ value: seconds }) => (seconds ?? -1) > 0);
    expect(new Set(growing.map(({ verdict }) => verdict?.level)).size).toBeGreaterThan(1);
    for (const { value: seconds, verdict } of growing) {
      const s = seconds ?? 0;
      const least = Math.max(8 / Math.sqrt(10), 2.1);
      expect(verdict?.level).toBe(s >= 20 / Math.sqrt(10) ? 'good' : s >= least ? 'watch' : 'bad');
    }
  });
});
