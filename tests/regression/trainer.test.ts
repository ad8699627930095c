import { describe, expect, it } from 'vitest';
import { analyse } from '@/lib/figures/analyse';
import { radFromDeg } from '@/lib/numerics/vec';
import { airframe, control, panel, surface } from '@/tests/support/airframe';

const within = (got: number | undefined, expected: number, share: number, what: string) =>
  expect(Math.abs((got ?? Number.NaN) / expected - 1), `${what}: ${got} against ${expected}`).toBeLessThan(share);

describe('A7 as a document, through the whole chain', () => {
  const outerMm = 300 / Math.cos(radFromDeg(5));
  const trainer = airframe({
    surfaces: [
      surface({
        panels: [
          panel({ id: 'p1', lengthMm: 300, rootChordMm: 200, tipChordMm: 200 }),
          panel({ id: 'p2', lengthMm: outerMm, rootChordMm: 200, tipChordMm: 200, dihedralDeg: 5 }),
        ],
        controls: [control({ from: 300 / (300 + outerMm), to: 1, chordShare: [0.25, 0.25] })],
      }),
      surface({
        id: 'tail',
        role: 'tailplane',
        mount: { to: 'datum', at: [620, 0, 20] },
        panels: [panel({ lengthMm: 220, rootChordMm: 130, tipChordMm: 130 })],
      }),
    ],
  });

  it('gives the same neutral point and lift slope as the bare planform', () => {
    const { values } = analyse(trainer, { depth: 'full' });
    expect(Math.abs((values.neutralPointXMm?.value ?? Number.NaN) - 108.4) / 200).toBeLessThan(0.005);
    within(values.liftSlopePerRad?.value ?? undefined, 4.718, 0.02, 'lift slope');
  });

  it('rolls at the rate that its two coefficients give: 0.330 and -0.444 at 12 m/s, 15 degrees up and down', () => {
    const { values } = analyse(trainer, { depth: 'full' });
    within(values.rollHelix?.value ?? undefined, (0.33 * radFromDeg(15)) / 0.444, 0.05, 'pb / 2V');
  });
});
