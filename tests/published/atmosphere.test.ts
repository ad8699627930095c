import { describe, expect, it } from 'vitest';
import { airAt, reynoldsNumber } from '@/lib/aero/atmosphere';

// U.S. Standard Atmosphere 1976, NASA-TM-X-74335, by geopotential height: T, p, density, speed of sound, viscosity.
const TABLE = [
  { heightM: 0, t: 288.15, p: 101_325, rho: 1.225, a: 340.294, mu: 1.7894e-5 },
  { heightM: 500, t: 284.9, p: 95_460.8, rho: 1.16727, a: 338.37, mu: 1.7737e-5 },
  { heightM: 1000, t: 281.65, p: 89_874.6, rho: 1.11164, a: 336.434, mu: 1.75785e-5 },
  { heightM: 1500, t: 278.4, p: 84_556, rho: 1.05807, a: 334.487, mu: 1.742e-5 },
  { heightM: 2000, t: 275.15, p: 79_495.2, rho: 1.00649, a: 332.529, mu: 1.726e-5 },
  { heightM: 3000, t: 268.65, p: 70_108.5, rho: 0.909121, a: 328.578, mu: 1.6937e-5 },
] as const;

/** Relative tolerance: the table's last digits. */
const TOLERANCE = 2e-4;
const near = (got: number, expected: number, share = TOLERANCE) =>
  expect(Math.abs(got / expected - 1), `${got} against ${expected}`).toBeLessThan(share);

describe('P1: U.S. Standard Atmosphere 1976 (NASA-TM-X-74335)', () => {
  it.each(TABLE)('at $heightM m', ({ heightM, t, p, rho, a, mu }) => {
    const air = airAt(heightM);
    near(air.temperatureK, t);
    near(air.pressurePa, p);
    near(air.densityKgM3, rho);
    near(air.soundSpeedMs, a);
    near(air.viscosityPaS, mu);
  });

  it('thins by the ratio of temperatures on a hot day, at the pressure of the standard', () => {
    const hot = airAt(500, 20);
    near(hot.pressurePa, 95_460.8);
    near(hot.densityKgM3, (1.16727 * 284.9) / 304.9);
  });

  it('refuses heights above the tropopause', () => {
    expect(() => airAt(11_001)).toThrow(RangeError);
  });
});

describe('P3: Reynolds number, consequence of the 1976 standard (kinematic viscosity 1.46072e-5 at sea level)', () => {
  it.each([
    { speedMs: 10, lengthM: 0.2, heightM: 0, expected: 136_919 },
    { speedMs: 20, lengthM: 0.25, heightM: 0, expected: 342_297 },
    { speedMs: 15, lengthM: 0.18, heightM: 1500, expected: 163_999 },
  ])('$speedMs m/s, $lengthM m, $heightM m up', ({ speedMs, lengthM, heightM, expected }) => {
    near(reynoldsNumber(speedMs, lengthM, airAt(heightM)), expected);
  });
});
