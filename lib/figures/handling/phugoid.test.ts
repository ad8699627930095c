import { describe, expect, it } from 'vitest';
import { alphaPitch, figure, value } from '@/tests/support/handling';
import { plain } from '@/tests/support/plainAircraft';

describe('the phugoid', () => {
  it('is judged by a damping of 0.04 and of none, whatever the size', () => {
    // Drag of the section is about 0.03 here; what the wing's own lift adds is turned down to below none.
    const found = [0.02, 0, -0.02, -0.03, -0.04, -0.05, -0.06, -0.08].map((drag) =>
      figure('phugoidDamping', { model: { inducedDrag: () => drag } }),
    );
    for (const { value: ratio, band, verdict } of found) {
      const z = ratio ?? Number.NaN;
      const grows = (band?.low ?? z) < 0;
      expect(verdict?.level).toBe(z >= 0.04 && !grows ? 'good' : z >= 0 ? 'watch' : 'bad');
    }
    expect(new Set(found.map(({ verdict }) => verdict?.level)).size).toBe(3);
  });

  it('is watched where it is damped but grows at the weak end of its band', () => {
    const drags = Array.from({ length: 16 }, (_, i) => -0.004 * i);
    const found = drags.map((drag) => figure('phugoidDamping', { model: { inducedDrag: () => drag } }));
    const unsure = found.filter(({ value: z, band }) => (z ?? 0) >= 0.04 && (band?.low ?? 0) < 0);
    expect(unsure.length).toBeGreaterThan(0);
    for (const { verdict } of unsure)
      expect(verdict).toEqual({
        level: 'watch',
        words: 'at the weak end of its band: swings wider in speed and height by itself',
      });
  });

  it('is not judged where the aircraft runs away in pitch first', () => {
    expect(figure('phugoidDamping').verdict).toBeDefined();
    expect(figure('phugoidDamping', alphaPitch(2)).verdict).toBeUndefined();
  });

  it('takes longer the faster it flies: near the root of 2 times pi V / g', () => {
    const period = value('phugoidPeriodS', alphaPitch(-3));
    const lanchester = (Math.SQRT2 * Math.PI * plain().flight.cruiseMs) / 9.80665;
    expect(period / lanchester).toBeGreaterThan(0.9);
    expect(period / lanchester).toBeLessThan(1.3);
  });
});
