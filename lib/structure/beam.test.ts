import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { ellipticMoment, endDeflection, uniformMoment } from './beam';

const pieces = (count: number, lengthMm: number, bendingNmm2: number) =>
  Array.from({ length: count }, (_, i) => ({
    fromMm: (i * lengthMm) / count,
    toMm: ((i + 1) * lengthMm) / count,
    bendingNmm2,
  }));

describe('endDeflection', () => {
  it('under an even load is w L^4 / 8 EI', () => {
    // 2 N over 400 mm on 1e6 N mm2: 2 * 400^3 / 8e6 = 16 mm.
    expect(endDeflection(pieces(16, 400, 1e6), (s) => uniformMoment(2, 400, s))).toBeCloseTo(16, 3);
  });

  it('a stiff root counts for more than a stiff tip', () => {
    const [root, tip] = [0, 1].map((stiff) =>
      endDeflection(
        pieces(2, 400, 1e6).map((piece, i) => (i === stiff ? { ...piece, bendingNmm2: 2e6 } : piece)),
        (s) => ellipticMoment(2, 400, s),
      ),
    );
    expect(root).toBeLessThan((tip ?? 0) * 0.7);
  });
});

describe('moments of a half wing', () => {
  const place = fc.double({ min: 0, max: 1, noNaN: true });

  it('an elliptic load lies further in than an even one: less moment at every place but the tip', () => {
    fc.assert(
      fc.property(place, (x) => {
        expect(ellipticMoment(10, 500, 500 * x)).toBeLessThanOrEqual(uniformMoment(10, 500, 500 * x) + 1e-9);
      }),
    );
  });

  it('the elliptic moment is that of the load summed up outboard', () => {
    const [load, half, at] = [10, 500, 180];
    let sum = 0;
    const steps = 20_000;
    for (let i = 0; i < steps; i++) {
      const y = at + ((half - at) * (i + 0.5)) / steps;
      sum += ((4 * load) / (Math.PI * half)) * Math.sqrt(1 - (y / half) ** 2) * (y - at) * ((half - at) / steps);
    }
    expect(ellipticMoment(load, half, at)).toBeCloseTo(sum, 2);
  });

  it('refuses a place beyond the tip', () => expect(() => uniformMoment(1, 500, 501)).toThrow('501'));
});
