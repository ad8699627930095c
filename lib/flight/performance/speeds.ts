import type { Air } from '@/lib/aero/atmosphere';
import { type WingClMax, wingClMax } from '@/lib/aero/clMax';
import type { Airframe } from '@/lib/airframe/schema/airframe';
import { rootBetween } from '@/lib/numerics/roots';
import { STANDARD_GRAVITY } from '@/lib/units/factors';

const MM2_PER_M2 = 1e6;

/** Level speed at which a lift coefficient carries the mass, m/s: V = sqrt(2 m g / (rho S CL)). */
function speedAtLift(massG: number, areaMm2: number, cl: number, densityKgM3: number): number {
  return Math.sqrt((2 * (massG / 1000) * STANDARD_GRAVITY) / (densityKgM3 * (areaMm2 / MM2_PER_M2) * cl));
}

export interface Stall {
  readonly speedMs: number;
  readonly clMax: WingClMax;
}

/**
 * Stall speed, power off, with the greatest lift coefficient that the sections have at that very speed: it falls with the Reynolds
 * number, so the two are solved together. The lower the lift the faster the stall, so there is one answer.
 */
export function stallOf(airframe: Airframe, areaMm2: number, massG: number, air: Air): Stall {
  const flownAt = (cl: number) => speedAtLift(massG, areaMm2, cl, air.densityKgM3);
  const excess = (speedMs: number) => speedMs - flownAt(wingClMax(airframe, speedMs, air).value);
  // Greatest lifts of sheet sections differ by far less than the nine times that this bracket allows for.
  const guess = flownAt(wingClMax(airframe, airframe.flight.cruiseMs, air).value);
  const speedMs = rootBetween(excess, guess / 3, guess * 3);
  if (speedMs === null) throw new RangeError(`no stall speed near ${guess} m/s`);
  const clMax = wingClMax(airframe, speedMs, air);
  return { speedMs: flownAt(clMax.value), clMax };
}

/** Radius of a level turn in m: V^2 / (g sqrt(n^2 - 1)) (Anderson, "Aircraft Performance and Design", ch. 6). Throws RangeError for n up to 1. */
export function turnRadiusM(speedMs: number, loadFactor: number): number {
  if (!(loadFactor > 1)) throw new RangeError(`a level turn needs more than 1 g, got ${loadFactor}`);
  return speedMs ** 2 / (STANDARD_GRAVITY * Math.sqrt(loadFactor ** 2 - 1));
}
