import { describe, expect, it } from 'vitest';
import { startFrom, startingLayouts } from '@/lib/airframe/layouts';
import { analyse } from '@/lib/figures/analyse';
import { develop } from '@/lib/parts/develop';

// Whoever starts from a layout starts from something that flies by the program's own figures and can be cut.

describe.each(startingLayouts)('starting layout $id', ({ id }) => {
  const airframe = startFrom(id, 'Layout');
  it('is cut without a problem', () => {
    expect(develop(airframe).problems).toEqual([]);
  });
  it('balances inside its range, with no bad verdict and a stall that a throw reaches', () => {
    const figures = analyse(airframe, { depth: 'full' });
    const value = (name: string) => figures.values[name]?.value ?? Number.NaN;
    expect(figures.problems).toEqual([]);
    expect(value('cgXMm')).toBeGreaterThan(value('cgForeLimitXMm'));
    expect(value('cgXMm')).toBeLessThan(value('cgAftLimitXMm'));
    expect(figures.values.packFirstFlightMm?.verdict?.level).toBe('good');
    expect(1.1 * value('stallSpeedMs')).toBeLessThan(8);
    const bad = Object.entries(figures.values).filter(([, { verdict }]) => verdict?.level === 'bad');
    expect(bad.map(([name]) => name)).toEqual([]);
  });
  it('balances on the centre line within 1 mm', () => {
    const [, y] = analyse(airframe, { depth: 'full' }).marks.cg ?? [0, Number.NaN, 0];
    expect(Math.abs(y)).toBeLessThan(1);
  });
});
