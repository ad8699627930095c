import { describe, expect, it } from 'vitest';
import { resolve } from '@/lib/airframe/resolve';
import { airframe, body } from '@/tests/support/airframe';
import { bodyCouples, rectangleFactor } from './slenderBody';

const station = (id: string, xMm: number, widthMm: number, heightMm: number) => ({
  id,
  xMm,
  widthMm,
  topMm: heightMm / 2,
  bottomMm: -heightMm / 2,
  cornerMm: 0,
});

/** A box from -300 to 300 mm, with a wing's root chord from 0 to 200 where asked. */
function couples(widthMm: number, heightMm: number, wing: boolean, upwash = () => 0) {
  const document = airframe({
    bodies: [
      body({
        mount: { to: 'datum', at: [-300, 0, 0] },
        stations: [station('a', 0, widthMm, heightMm), station('b', 600, widthMm, heightMm)],
      }),
    ],
  });
  const resolved = resolve(document);
  if (!resolved.ok) throw new RangeError('refused');
  const root = { le: [0, 0, 0] as const, chord: 200, incidenceRad: 0 };
  return bodyCouples(document, resolved.value, wing ? [[root]] : [], upwash);
}

describe('a body', () => {
  it('on its own turns by Munk: twice its volume of moved air, 1.51 of the circle for a square', () => {
    // 2 x 1.51 pi (25)^2 x 600, per unit dynamic pressure and radian.
    const expected = 2 * 1.51 * Math.PI * 25 ** 2 * 600;
    const { pitchMm3, yawMm3 } = couples(50, 50, false);
    expect(pitchMm3 / expected).toBeCloseTo(1, 9);
    expect(yawMm3 / expected).toBeCloseTo(1, 9);
  });

  it('does not turn in pitch where the wing straightens the stream: a third of this one', () => {
    expect(couples(50, 50, true).pitchMm3 / couples(50, 50, false).pitchMm3).toBeCloseTo(2 / 3, 9);
    expect(couples(50, 50, true).yawMm3).toBe(couples(50, 50, false).yawMm3);
  });

  it('turns more in the upwash ahead of a wing', () => {
    expect(couples(50, 50, false, () => 0.5).pitchMm3 / couples(50, 50, false).pitchMm3).toBeCloseTo(1.5, 9);
  });

  it('on edge, a profile, hardly pitches and yaws strongly', () => {
    const { pitchMm3, yawMm3 } = couples(5, 120, false);
    expect(yawMm3).toBeGreaterThan(100 * pitchMm3);
  });

  it('has factors that fall from a blade to a plate', () => {
    const factors = [0.05, 0.1, 0.3, 1, 3, 10, 100].map((shape) => rectangleFactor(shape, 1));
    expect(factors).toEqual([...factors].sort((a, b) => b - a));
    expect(factors.at(-1)).toBeCloseTo(1, 1);
    expect(rectangleFactor(0, 5)).toBe(0);
    expect(rectangleFactor(5, 0)).toBe(1);
  });
});
