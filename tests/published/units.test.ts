import { describe, expect, it } from 'vitest';
import * as factors from '@/lib/units/factors';
import { fromShown, shown } from '@/lib/units/quantity';

// S8. Source: A. Thompson and B. N. Taylor, "Guide for the Use of the International System of Units", NIST Special Publication
// 811 (2008), appendix B.8. Exact by definition, so compared exactly (the knot to the digits printed there).

describe('factors of NIST SP 811', () => {
  it.each([
    ['ounce, g', factors.G_PER_OZ, 28.349523125],
    ['inch, mm', factors.MM_PER_IN, 25.4],
    ['square foot, dm2', factors.DM2_PER_FT2, 9.290304],
    ['pound-force, N', factors.N_PER_LBF, 4.4482216152605],
    ['mile per hour, m/s', factors.MS_PER_MPH, 0.44704],
    ['pound, g', factors.G_PER_LB, 453.59237],
  ])('%s', (_, factor, expected) => expect(factor).toBe(expected));
  it('knot, m/s', () => expect(factors.MS_PER_KT).toBeCloseTo(0.514444, 6));
  it('ounce per square foot is 3.05152 g/dm2', () => expect(factors.GDM2_PER_OZFT2).toBeCloseTo(3.05152, 5));
  it('ounce per cubic foot is 1.001154 kg/m3', () => expect(factors.KGM3_PER_OZFT3).toBeCloseTo(1.001154, 6));
});

describe('loadings in both systems, 0.800 kg on 24 dm2 (exact factors)', () => {
  it('33.333 g/dm2 is 10.9235 oz/ft2', () => {
    expect(shown(800 / 24, 'gdm2', 3)).toEqual({ number: '33.333', unit: 'g/dm²' });
    expect(shown(800 / 24, 'gdm2', 4, 'imperial')).toEqual({ number: '10.9235', unit: 'oz/ft²' });
  });
  it('6.8041 kg/m3 is 6.7963 oz/ft3', () => {
    const cubic = 0.8 / 0.24 ** 1.5;
    expect(shown(cubic, 'kgm3', 4).number).toBe('6.8041');
    expect(shown(cubic, 'kgm3', 4, 'imperial').number).toBe('6.7963');
  });
  it('a typed inch is 25.4 mm', () => expect(fromShown(1, 'mm', 'imperial')).toBe(25.4));
});
