// A propeller by its coefficients: T = CT rho n^2 D^4, P = CP rho n^3 D^5, n in turns a second.
// Data: UIUC Propeller Database, volume 1 (J. B. Brandt and M. S. Selig).

/** What a small propeller does standing still when nothing is known of it but its size. */
export const GENERIC_PROPELLER = {
  /** Middle of a 10 x 4.7 in propeller's 0.106 to 0.130 from 2400 to 6500 rpm. Steeper pitches reach 0.14. */
  thrustCoefficient: { value: 0.117, low: 0.1, high: 0.142 },
  /** Power that momentum theory needs over the shaft's: 0.64 to 0.70 for the same propeller. */
  figureOfMerit: { value: 0.67, low: 0.55, high: 0.75 },
  /** More blades than two: the coefficient grows by this power of their number over two. From memory: a third adds about a third. */
  bladePower: 0.75,
  source: 'UIUC Propeller Database, volume 1: static tests of a 10 x 4.7 in and a 9 in propeller',
} as const;

/** Thrust in N. Diameter in m, density in kg/m3. */
export function propellerThrustN(ct: number, turnsPerS: number, diameterM: number, densityKgM3: number): number {
  return ct * densityKgM3 * turnsPerS ** 2 * diameterM ** 4;
}

/** Shaft power in W. Diameter in m, density in kg/m3. */
export function propellerPowerW(cp: number, turnsPerS: number, diameterM: number, densityKgM3: number): number {
  return cp * densityKgM3 * turnsPerS ** 3 * diameterM ** 5;
}

/** Turns a second at which a propeller gives a thrust. Throws RangeError when an argument is not positive. */
export function turnsForThrust(thrustN: number, ct: number, diameterM: number, densityKgM3: number): number {
  if (!(thrustN > 0 && ct > 0 && diameterM > 0 && densityKgM3 > 0))
    throw new RangeError(`thrust, coefficient, diameter and density must be positive: ${thrustN}, ${ct}, ${diameterM}`);
  return Math.sqrt(thrustN / (ct * densityKgM3 * diameterM ** 4));
}

/** The generic thrust coefficient for a number of blades. */
export const genericThrustCoefficient = (blades: number, end: 'value' | 'low' | 'high' = 'value'): number =>
  GENERIC_PROPELLER.thrustCoefficient[end] * (blades / 2) ** GENERIC_PROPELLER.bladePower;

/** The power coefficient that goes with a thrust coefficient by the generic figure of merit: CT^1.5 sqrt(2 / pi) / FM. */
export const genericPowerCoefficient = (ct: number): number =>
  (ct ** 1.5 * Math.sqrt(2 / Math.PI)) / GENERIC_PROPELLER.figureOfMerit.value;
