import { STANDARD_GRAVITY } from '@/lib/units/factors';

// Air by the U.S. Standard Atmosphere 1976 (NASA-TM-X-74335), the same below 32 km as ISO 2533. Heights are geopotential metres;
// below 3 km they differ from a tape's by less than 0.05 %.

/** Gas constant of the 1976 standard, N m / (kmol K); its own value, not today's. */
const GAS_CONSTANT = 8314.32;
/** Molar mass of air, kg / kmol. */
const MOLAR_MASS = 28.9644;
const SEA_LEVEL_K = 288.15;
const SEA_LEVEL_PA = 101_325;
/** Temperature falls by this much a metre up to the tropopause. */
const LAPSE_K_PER_M = 0.0065;
const TROPOPAUSE_M = 11_000;
const HEAT_RATIO = 1.4;
/** Sutherland's law of viscosity, kg / (s m K^0.5) and K. */
const SUTHERLAND = { beta: 1.458e-6, kelvin: 110.4 } as const;

export interface Air {
  readonly temperatureK: number;
  readonly pressurePa: number;
  readonly densityKgM3: number;
  readonly soundSpeedMs: number;
  readonly viscosityPaS: number;
}

/**
 * Air at a geopotential height, from 5 km below sea level up to the tropopause at 11 km. `offsetK` warms the air against the standard at
 * the same pressure, as on a hot day. Throws RangeError outside the range or when the air would be colder than 150 K.
 */
export function airAt(heightM: number, offsetK = 0): Air {
  if (!(heightM >= -5000 && heightM <= TROPOPAUSE_M))
    throw new RangeError(`height must be -5000 to 11000 m, got ${heightM}`);
  const standardK = SEA_LEVEL_K - LAPSE_K_PER_M * heightM;
  const temperatureK = standardK + offsetK;
  if (!(temperatureK > 150)) throw new RangeError(`temperature offset leaves ${temperatureK} K`);
  const exponent = (STANDARD_GRAVITY * MOLAR_MASS) / (GAS_CONSTANT * LAPSE_K_PER_M);
  const pressurePa = SEA_LEVEL_PA * (standardK / SEA_LEVEL_K) ** exponent;
  const specific = GAS_CONSTANT / MOLAR_MASS;
  return {
    temperatureK,
    pressurePa,
    densityKgM3: pressurePa / (specific * temperatureK),
    soundSpeedMs: Math.sqrt(HEAT_RATIO * specific * temperatureK),
    viscosityPaS: (SUTHERLAND.beta * temperatureK ** 1.5) / (temperatureK + SUTHERLAND.kelvin),
  };
}

/** Reynolds number: speed times length over kinematic viscosity. */
export function reynoldsNumber(speedMs: number, lengthM: number, air: Air): number {
  return (speedMs * lengthM * air.densityKgM3) / air.viscosityPaS;
}
