import { STANDARD_GRAVITY } from '@/lib/units/factors';

// What flies, and how fast: all that the equations of motion need beside the derivatives.

/** Moments and product of inertia about the CG, kg m2; `xz` is the integral of x z over the mass. */
interface PlaneInertia {
  readonly xx: number;
  readonly yy: number;
  readonly zz: number;
  readonly xz: number;
}

/** Level flight at one speed. */
export interface FlightPoint {
  readonly massG: number;
  readonly inertiaKgM2: PlaneInertia;
  readonly areaMm2: number;
  readonly chordMm: number;
  readonly spanMm: number;
  readonly speedMs: number;
  readonly densityKgM3: number;
}

/** Dynamic pressure times wing area, N: what a force coefficient of one comes to. */
export const unitForceN = ({ areaMm2, speedMs, densityKgM3 }: FlightPoint): number =>
  0.5 * densityKgM3 * speedMs ** 2 * (areaMm2 / 1e6);

/** Lift coefficient of level flight. */
export const levelLift = (point: FlightPoint): number => ((point.massG / 1000) * STANDARD_GRAVITY) / unitForceN(point);

/**
 * Inertia turned from the aircraft's axes into stability axes, whose x axis points into the stream at this angle of attack.
 * Etkin & Reid, "Dynamics of Flight", section 4.5 (rotation of the inertia tensor in the plane of symmetry).
 */
export function stabilityInertia({ xx, yy, zz, xz }: PlaneInertia, alphaRad: number): PlaneInertia {
  const cos = Math.cos(alphaRad);
  const sin = Math.sin(alphaRad);
  const cross = 2 * sin * cos * xz;
  return {
    xx: xx * cos ** 2 + zz * sin ** 2 - cross,
    yy,
    zz: xx * sin ** 2 + zz * cos ** 2 + cross,
    xz: (xx - zz) * sin * cos + xz * (cos ** 2 - sin ** 2),
  };
}

/** Throws RangeError unless every number is finite and all but the product of inertia are positive. */
export function assertPoint(point: FlightPoint): void {
  const { xx, yy, zz, xz } = point.inertiaKgM2;
  const { massG, areaMm2, chordMm, spanMm, speedMs, densityKgM3 } = point;
  for (const [name, value] of Object.entries({ massG, areaMm2, chordMm, spanMm, speedMs, densityKgM3, xx, yy, zz }))
    if (!(value > 0 && value < Number.POSITIVE_INFINITY))
      throw new RangeError(`${name} must be positive, got ${value}`);
  if (!(xz ** 2 < xx * zz)) throw new RangeError(`no mass has the product of inertia ${xz} with ${xx} and ${zz}`);
}
