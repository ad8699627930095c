import { describe, expect, it } from 'vitest';
import { balance, type Weighed } from '@/lib/balance/balance';
import { rodSpread } from '@/lib/balance/spread';

// S4. CG and pitch inertia of a mass list by parallel axes (exact arithmetic; the theorem as in any text on mechanics, e.g.
// J. L. Meriam and L. G. Kraige, "Engineering Mechanics: Dynamics", app. B). Masses in g, places in mm; tolerance 1e-5 of the value.

interface Row {
  readonly key: string;
  readonly massG: number;
  readonly xMm: number;
  /** Length along x of what has an extent of its own. */
  readonly lengthMm: number;
}

const ROWS: Row[] = [
  { key: 'battery', massG: 180, xMm: 20, lengthMm: 0 },
  { key: 'motor', massG: 90, xMm: -110, lengthMm: 0 },
  { key: 'wing', massG: 160, xMm: 120, lengthMm: 200 },
  { key: 'tail', massG: 45, xMm: 660, lengthMm: 130 },
  { key: 'boom', massG: 35, xMm: 400, lengthMm: 500 },
  { key: 'radio', massG: 60, xMm: 50, lengthMm: 0 },
];
const points: Weighed[] = ROWS.map(({ key, massG, xMm }) => ({ key, massG, at: [xMm, 0, 0] }));
const withExtent: Weighed[] = ROWS.map(({ key, massG, xMm, lengthMm }) => ({
  key,
  massG,
  at: [xMm, 0, 0],
  spread: rodSpread(massG, [xMm - lengthMm / 2, 0, 0], [xMm + lengthMm / 2, 0, 0]),
}));
const within = (value: number, expected: number) => expect(Math.abs(value / expected - 1)).toBeLessThan(1e-5);

describe('mass list S4 (parallel axes)', () => {
  it('weighs 570 g with its CG at 104.561 mm', () => {
    const { massG, cg } = balance(points);
    within(massG, 570);
    within(cg[0], 104.561);
  });
  it('has Iyy 0.0225851 kg m2 as points and 0.0239110 with m L^2 / 12 of its own', () => {
    within(balance(points).inertiaKgM2.yy, 0.0225851);
    within(balance(withExtent).inertiaKgM2.yy, 0.023911);
  });
  it('has a radius of gyration of 0.2048 m', () => {
    const { massG, inertiaKgM2 } = balance(withExtent);
    expect(Math.sqrt(inertiaKgM2.yy / (massG / 1000))).toBeCloseTo(0.2048, 4);
  });
});
