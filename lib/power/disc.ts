// Momentum theory of a disc that throws air back (Rankine and Froude; H. Glauert, "Airplane Propellers", in Durand's
// "Aerodynamic Theory" IV, 1935): an ideal that no propeller or fan beats.

/** Exit area over disc area: the stream of a free propeller shrinks to half of its disc; a duct decides for itself. */
export const FREE_STREAM_SHARE = 0.5;

export interface IdealHover {
  /** Speed of the air through the disc, m/s. */
  readonly inducedMs: number;
  /** Power that ends up in the air, W. */
  readonly powerW: number;
  /** Speed of the stream far behind, m/s. */
  readonly wakeMs: number;
}

const refuse = (name: string, value: number): void => {
  if (!(value > 0 && Number.isFinite(value))) throw new RangeError(`${name} must be positive, got ${value}`);
};

/**
 * The least that a free disc must do to hold a thrust while it stands still: v = sqrt(T / (2 rho A)), P = T v, wake 2 v.
 * @param areaM2 area of the disc, m2
 */
export function idealHover(thrustN: number, areaM2: number, densityKgM3: number): IdealHover {
  refuse('thrust', thrustN);
  refuse('area', areaM2);
  refuse('density', densityKgM3);
  const inducedMs = Math.sqrt(thrustN / (2 * densityKgM3 * areaM2));
  return { inducedMs, powerW: thrustN * inducedMs, wakeMs: 2 * inducedMs };
}

/**
 * Share of the power that momentum theory needs for a thrust standing still, P_ideal / P; for coefficients CT^1.5 / CP sqrt(2 / pi)
 * (J. G. Leishman, "Principles of Helicopter Aerodynamics", ch. 2). Over 1 it cannot be.
 */
export function figureOfMerit(thrustN: number, powerW: number, areaM2: number, densityKgM3: number): number {
  refuse('power', powerW);
  return idealHover(thrustN, areaM2, densityKgM3).powerW / powerW;
}

/**
 * Thrust in N of a disc standing still from the power that ends up in the air: P = T^1.5 / sqrt(4 rho s A)
 * (J. Pereira, "Hover and wind-tunnel testing of shrouded rotors", University of Maryland thesis, 2008).
 * @param areaM2 swept area, hub taken off, m2
 * @param exitShare s, the exit's area over the swept: 0.5 for a free propeller
 */
export function discThrustN(airPowerW: number, areaM2: number, exitShare: number, densityKgM3: number): number {
  refuse('power', airPowerW);
  refuse('area', areaM2);
  refuse('exit share', exitShare);
  refuse('density', densityKgM3);
  return (airPowerW ** 2 * 4 * densityKgM3 * exitShare * areaM2) ** (1 / 3);
}

/** Speed at which the stream of a thrust leaves its exit, standing still, m/s: T = rho A V^2. Flying that fast no thrust is left. */
export const exitSpeedMs = (thrustN: number, exitAreaM2: number, densityKgM3: number): number =>
  Math.sqrt(thrustN / (densityKgM3 * exitAreaM2));
