import { CARBON_E_GPA, CARBON_FROM_MM, STEEL_E_GPA } from './practice';

export type RodStuff = 'wire' | 'carbon';

/** What a rod of a diameter is made of, as far as the diameter tells. */
export const rodStuff = (diameterMm: number): RodStuff => (diameterMm < CARBON_FROM_MM.value ? 'wire' : 'carbon');

/** Bending stiffness E I of a solid round rod, N mm2. */
const stiffnessNmm2 = (diameterMm: number): number => {
  const eGpa = rodStuff(diameterMm) === 'wire' ? STEEL_E_GPA.value : CARBON_E_GPA.value;
  return (eGpa * 1000 * Math.PI * diameterMm ** 4) / 64;
};

/**
 * Force at which a straight rod with pinned ends buckles, N: pi2 E I / L2 (Euler; Young & Budynas, Roark's Formulas for Stress and
 * Strain, elastic stability of columns). Throws RangeError for a length that is not positive.
 */
export function bucklingForceN(diameterMm: number, lengthMm: number): number {
  if (!(lengthMm > 0)) throw new RangeError(`rod length must be positive, got ${lengthMm}`);
  return (Math.PI ** 2 * stiffnessNmm2(diameterMm)) / lengthMm ** 2;
}

/** Longest free length that carries a force without buckling, mm: from one guide to the next. */
export const freeLengthMm = (diameterMm: number, forceN: number): number =>
  Math.PI * Math.sqrt(stiffnessNmm2(diameterMm) / forceN);
