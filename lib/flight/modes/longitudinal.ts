import type { AeroModel, SymmetricEffect, SymmetricState } from '@/lib/aero/model';
import { STANDARD_GRAVITY } from '@/lib/units/factors';
import { assertPoint, type FlightPoint, levelLift, unitForceN } from './point';
import { type LongitudinalModes, longitudinalModes } from './roots';
import { type Matrix4, type Row4, rootsOf } from './system';

/** Symmetric derivatives about the CG in level flight: per radian, rates per q c / 2V. Thrust does not change with speed. */
export interface LongitudinalDerivatives {
  readonly alpha: SymmetricEffect;
  readonly pitchRate: SymmetricEffect;
  readonly drag: number;
  readonly dragAlpha: number;
  /** By the rate of change of the angle of attack, per alpha' c / 2V: what a steady lattice cannot give. */
  readonly alphaDot?: SymmetricEffect;
}

/** Small enough to be straight, large enough to be far above rounding. */
const SLOPE_STEP_RAD = 0.01;

/**
 * Derivatives of a model at a trim in level flight. Drag is the induced drag and `profileDrag`, a coefficient on the wing area that
 * does not change with the angle of attack. The lattice is steady: there is no alpha-dot term.
 */
export function longitudinalOf(model: AeroModel, trim: SymmetricState, profileDrag: number): LongitudinalDerivatives {
  const { alphaRad, deflectionsRad } = trim;
  const induced = (alpha: number) => model.inducedDrag({ alphaRad: alpha, deflectionsRad });
  return {
    alpha: model.alpha,
    pitchRate: model.pitchRate,
    drag: profileDrag + induced(alphaRad),
    dragAlpha: (induced(alphaRad + SLOPE_STEP_RAD) - induced(alphaRad - SLOPE_STEP_RAD)) / (2 * SLOPE_STEP_RAD),
  };
}

/** The motion in the plane of symmetry: x' = A x + b c, with c the control in the unit its effect is given for. */
interface LongitudinalSystem {
  /** States: change of speed as a share, angle of attack rad, pitch rate rad/s, pitch angle rad. */
  readonly matrix: Matrix4;
  /** Rates of change that one unit of a control makes. */
  readonly input: (control: SymmetricEffect) => Row4;
}

/**
 * Small motions about level flight in stability axes, linear. Moments are in balance, so speed alone pitches nothing; air without
 * compressibility. Etkin & Reid, "Dynamics of Flight", section 4.9 (equations 4.9,18); Nelson, "Flight Stability and Automatic
 * Control", table 3.5 and ch. 4, both with the lift by pitch rate kept. Throws RangeError for a point that cannot fly.
 */
export function longitudinalSystem(point: FlightPoint, d: LongitudinalDerivatives): LongitudinalSystem {
  assertPoint(point);
  const { speedMs, chordMm, inertiaKgM2, massG } = point;
  const force = unitForceN(point);
  const perS = force / ((massG / 1000) * speedMs);
  const moment = (force * (chordMm / 1000)) / inertiaKgM2.yy;
  const unitRateS = chordMm / 1000 / (2 * speedMs);
  const dot = d.alphaDot ?? { lift: 0, pitch: 0 };
  const lift = levelLift(point);
  const inert = 1 + dot.lift * perS * unitRateS;
  const alpha: Row4 = [
    (-2 * lift * perS) / inert,
    (-(d.alpha.lift + d.drag) * perS) / inert,
    (1 - d.pitchRate.lift * perS * unitRateS) / inert,
    0,
  ];
  const lag = dot.pitch * unitRateS * moment;
  const pitch: Row4 = [
    lag * alpha[0],
    moment * d.alpha.pitch + lag * alpha[1],
    moment * d.pitchRate.pitch * unitRateS + lag * alpha[2],
    0,
  ];
  const speed: Row4 = [-2 * d.drag * perS, (lift - d.dragAlpha) * perS, 0, -STANDARD_GRAVITY / speedMs];
  const input = (control: SymmetricEffect): Row4 => {
    const sink = (-control.lift * perS) / inert;
    return [0, sink, moment * control.pitch + lag * sink, 0];
  };
  return { matrix: [speed, alpha, pitch, [0, 0, 1, 0]], input };
}

/** Short period and phugoid of level flight. Throws RangeError for a point that cannot fly. */
export const longitudinalModesOf = (point: FlightPoint, d: LongitudinalDerivatives): LongitudinalModes =>
  longitudinalModes(rootsOf(longitudinalSystem(point, d).matrix));

/** Load factor that a radian of angle of attack makes at this speed, g/rad. */
export const loadPerAlpha = (point: FlightPoint, liftSlope: number): number => liftSlope / levelLift(point);
