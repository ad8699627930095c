import { describe, expect, it } from 'vitest';
import { lateralModesOf, type SideDerivatives } from '@/lib/flight/modes/lateral';
import { type LongitudinalDerivatives, loadPerAlpha, longitudinalModesOf } from '@/lib/flight/modes/longitudinal';
import { manoeuvreMargin } from '@/lib/flight/modes/manoeuvre';
import type { FlightPoint } from '@/lib/flight/modes/point';
import { dampingOf, type ModePair, naturalRadSOf } from '@/lib/flight/modes/roots';

// A light aircraft, the Navion, in level flight at sea level, 176 ft/s, CG at 29.5 % of the chord: Nelson, "Flight Stability and
// Automatic Control", app. B, in the book's units times exact factors. CD 0.05, CD_alpha 0.33 and CL_alphadot 0 are from memory.

/** kg m2 in a slug ft2. */
const SLUG_FT2 = 1.3558179483;
const FT = 304.8;

const NAVION: FlightPoint = {
  massG: 2750 * 453.59237,
  inertiaKgM2: { xx: 1048 * SLUG_FT2, yy: 3000 * SLUG_FT2, zz: 3530 * SLUG_FT2, xz: 0 },
  areaMm2: 184 * FT ** 2,
  chordMm: 5.7 * FT,
  spanMm: 33.4 * FT,
  speedMs: 176 * 0.3048,
  densityKgM3: 1.225,
};

// The book drops the lift by pitch rate (3.8) from its equations of motion; its numbers are reproduced without it.
const STEADY: LongitudinalDerivatives = {
  alpha: { lift: 4.44, pitch: -0.683 },
  pitchRate: { lift: 0, pitch: -9.96 },
  drag: 0.05,
  dragAlpha: 0.33,
};
const LAGGING: LongitudinalDerivatives = { ...STEADY, alphaDot: { lift: 0, pitch: -4.36 } };

const swing = (pair: ModePair) => {
  if (pair.kind !== 'oscillation') throw new RangeError('it does not swing');
  return pair;
};
const share = (value: number, expected: number) => Math.abs(value / expected - 1);

describe('A1, A5: short period and phugoid (Nelson, ex. 4.2 and 4.3, from memory)', () => {
  const { shortPeriod, phugoid } = longitudinalModesOf(NAVION, LAGGING);

  it('with the alpha-dot term: 3.61 rad/s, damping 0.695, roots -2.5 +- 2.59 i', () => {
    const { naturalRadS, damping, growthPerS, swingRadS } = swing(shortPeriod);
    expect(share(naturalRadS, 3.61)).toBeLessThan(0.01);
    expect(share(damping, 0.695)).toBeLessThan(0.01);
    expect(share(growthPerS, -2.5)).toBeLessThan(0.01);
    expect(share(swingRadS, 2.59)).toBeLessThan(0.01);
  });

  it('without the alpha-dot term, as a steady lattice has it: damping 0.569', () => {
    const steady = swing(longitudinalModesOf(NAVION, STEADY).shortPeriod);
    expect(share(steady.damping, 0.569)).toBeLessThan(0.01);
    expect(share(steady.naturalRadS, 3.61)).toBeLessThan(0.01);
  });

  it('phugoid -0.0171 +- 0.213 i (from memory)', () => {
    const { growthPerS, swingRadS } = swing(phugoid);
    expect(share(growthPerS, -0.0171)).toBeLessThan(0.01);
    expect(share(swingRadS, 0.213)).toBeLessThan(0.01);
  });

  it('load factor for a radian of angle of attack 10.93 g; control anticipation 1.19', () => {
    const perAlpha = loadPerAlpha(NAVION, STEADY.alpha.lift);
    expect(share(perAlpha, 10.93)).toBeLessThan(0.01);
    expect(share((naturalRadSOf(shortPeriod) ?? 0) ** 2 / perAlpha, 1.19)).toBeLessThan(0.01);
  });

  it('the lift by pitch rate that the book drops shifts frequency and damping by under 2 %', () => {
    const whole = swing(
      longitudinalModesOf(NAVION, { ...LAGGING, pitchRate: { lift: 3.8, pitch: -9.96 } }).shortPeriod,
    );
    expect(share(whole.naturalRadS, 3.61)).toBeLessThan(0.02);
    expect(share(whole.damping, 0.695)).toBeLessThan(0.02);
  });
});

describe('A2: static margin 0.683 / 4.44 = 0.1538, neutral point at 0.449 of the chord', () => {
  it('is what is left of the manoeuvre margin without pitch damping', () => {
    const margin = manoeuvreMargin(NAVION, { ...STEADY, pitchRate: { lift: 0, pitch: 0 } });
    expect(margin).toBeCloseTo(0.1538, 4);
    expect(0.295 + margin).toBeCloseTo(0.449, 3);
  });

  it('stick-fixed manoeuvre point: h_n - Cm_q / 2 mu, mu = 2 m / (rho S c) (Etkin & Reid, ch. 3)', () => {
    // 2 * 1247.38 / (1.225 * 17.0942 * 1.73736) = 68.573; 0.15383 + 9.96 / 137.146 = 0.22645.
    expect(manoeuvreMargin(NAVION, STEADY)).toBeCloseTo(0.22645, 4);
  });
});

describe('A3: second published set of the same aircraft (Seckel & Morris, FAA-RD-71-6, 1971)', () => {
  // 135 kt at 10 000 ft: density 0.9046 kg/m3 (standard atmosphere).
  const point = { ...NAVION, speedMs: 69.45, densityKgM3: 0.9046, spanMm: 33.38 * FT };
  const { shortPeriod } = longitudinalModesOf(point, {
    alpha: { lift: 6.04, pitch: -0.715 },
    pitchRate: { lift: 0, pitch: -13.39 },
    drag: 0.05,
    dragAlpha: 0.33,
    alphaDot: { lift: 0, pitch: -4.91 },
  });

  it('keeps to the short-period approximation (Nelson, table 4.4): w^2 = Z_a M_q / V - M_a, 2 z w = -(M_q + M_adot + Z_a / V)', () => {
    // q S = 2181.6 * 17.0942 = 37292 N; Z_a / V = -37292 * 6.04 / (1247.38 * 69.45) = -2.6000;
    // M_a = -37292 * 1.73736 * 0.715 / 4067.45 = -11.389; c / 2 V = 0.012508; M_q = -2.6678; M_adot = -0.97826.
    expect(share(naturalRadSOf(shortPeriod) ?? 0, Math.sqrt(2.6 * 2.6678 + 11.389))).toBeLessThan(0.01);
    expect(share((dampingOf(shortPeriod) ?? 0) * (naturalRadSOf(shortPeriod) ?? 0), 6.246 / 2)).toBeLessThan(0.02);
  });
});

describe('phugoid of Lanchester: constant angle of attack (Etkin & Reid, section 6.3)', () => {
  // So stiff in pitch that the angle of attack cannot change.
  const stiff = longitudinalModesOf(NAVION, {
    alpha: { lift: 4.44, pitch: -60 },
    pitchRate: { lift: 0, pitch: -9.96 },
    drag: 0.05,
    dragAlpha: 0,
  });

  it('swings with the root of 2 times g / V, whatever the aircraft', () => {
    expect(share(naturalRadSOf(stiff.phugoid) ?? 0, (Math.SQRT2 * 9.80665) / 53.6448)).toBeLessThan(0.01);
  });

  it('has the damping CD / (root of 2 CL)', () => {
    // CL 0.4058 carries 2750 lb.
    expect(share(dampingOf(stiff.phugoid) ?? 0, 0.05 / (Math.SQRT2 * 0.4058))).toBeLessThan(0.03);
  });
});

describe('A1: roll and yaw (Nelson, app. B and the lateral example of ch. 5, from memory)', () => {
  const side: SideDerivatives = {
    beta: { side: -0.564, roll: -0.074, yaw: 0.071 },
    rollRate: { side: 0, roll: -0.41, yaw: -0.0575 },
    yawRate: { side: 0, roll: 0.107, yaw: -0.125 },
  };
  const { dutchRoll, rollSpiral } = lateralModesOf(NAVION, 0, side);
  const [roll, spiral] = rollSpiral.kind === 'aperiodic' ? rollSpiral.ratesPerS : [0, 0];

  it('Dutch roll -0.487 +- 2.335 i', () => {
    const { growthPerS, swingRadS } = swing(dutchRoll);
    expect(share(growthPerS, -0.487)).toBeLessThan(0.01);
    expect(share(swingRadS, 2.335)).toBeLessThan(0.01);
  });

  it('roll -8.435', () => expect(share(roll, -8.435)).toBeLessThan(0.01));

  it('spiral -0.00877: a small difference of large numbers, so only to a tenth', () =>
    expect(share(spiral, -0.00877)).toBeLessThan(0.1));
});
