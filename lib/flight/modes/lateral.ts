import type { AntisymmetricEffect, LateralDerivatives } from '@/lib/aero/model';
import { STANDARD_GRAVITY } from '@/lib/units/factors';
import { assertPoint, type FlightPoint, stabilityInertia, unitForceN } from './point';
import { type LateralModes, lateralModes } from './roots';
import { type Matrix4, type Row4, rootsOf } from './system';

/** What the equations of roll and yaw need of a model. */
export type SideDerivatives = Pick<LateralDerivatives, 'beta' | 'rollRate' | 'yawRate'>;

/** Roll and yaw: x' = A x + b c, with c the control in the unit its effect is given for. */
interface LateralSystem {
  /** States: sideslip rad, roll rate rad/s, yaw rate rad/s, bank rad. */
  readonly matrix: Matrix4;
  readonly input: (control: AntisymmetricEffect) => Row4;
}

/**
 * Small motions about level flight in stability axes, linear; inertia is given in the aircraft's axes and turned by the angle of attack.
 * Etkin & Reid, "Dynamics of Flight", section 4.9 (equations 4.9,19); Nelson, "Flight Stability and Automatic Control", ch. 5.
 * Throws RangeError for a point that cannot fly.
 */
export function lateralSystem(point: FlightPoint, alphaRad: number, d: SideDerivatives): LateralSystem {
  assertPoint(point);
  const { speedMs, spanMm, massG } = point;
  const { xx, zz, xz } = stabilityInertia(point.inertiaKgM2, alphaRad);
  const force = unitForceN(point);
  const perS = force / ((massG / 1000) * speedMs);
  const unitRateS = spanMm / 1000 / (2 * speedMs);
  // Rolling and yawing moments make each other's rates through the product of inertia.
  const couple = (force * (spanMm / 1000)) / (xx * zz - xz ** 2);
  const side = (effect: AntisymmetricEffect) => perS * effect.side;
  const roll = (effect: AntisymmetricEffect) => couple * (zz * effect.roll + xz * effect.yaw);
  const yaw = (effect: AntisymmetricEffect) => couple * (xz * effect.roll + xx * effect.yaw);
  const { beta, rollRate, yawRate } = d;
  return {
    matrix: [
      [side(beta), side(rollRate) * unitRateS, side(yawRate) * unitRateS - 1, STANDARD_GRAVITY / speedMs],
      [roll(beta), roll(rollRate) * unitRateS, roll(yawRate) * unitRateS, 0],
      [yaw(beta), yaw(rollRate) * unitRateS, yaw(yawRate) * unitRateS, 0],
      [0, 1, 0, 0],
    ],
    input: (control) => [side(control), roll(control), yaw(control), 0],
  };
}

/** Dutch roll, roll and spiral of level flight. Throws RangeError for a point that cannot fly. */
export const lateralModesOf = (point: FlightPoint, alphaRad: number, d: SideDerivatives): LateralModes =>
  lateralModes(rootsOf(lateralSystem(point, alphaRad, d).matrix));
