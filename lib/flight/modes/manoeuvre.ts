import type { SymmetricEffect } from '@/lib/aero/model';
import { degFromRad } from '@/lib/numerics/vec';
import { STANDARD_GRAVITY } from '@/lib/units/factors';
import { type FlightPoint, levelLift } from './point';

// Steady pull-ups: lift and moment in balance with angle of attack, pitch rate and elevator. Etkin & Reid, "Dynamics of Flight",
// ch. 3 (elevator angle per g, stick-fixed manoeuvre point). The derivatives are about the CG.

export interface PullDerivatives {
  readonly alpha: SymmetricEffect;
  readonly pitchRate: SymmetricEffect;
}

/** Pitch rate of one g more, as q c / 2V: q = g / V. */
const ratePerG = ({ chordMm, speedMs }: FlightPoint): number =>
  (STANDARD_GRAVITY * (chordMm / 1000)) / (2 * speedMs ** 2);

/** Stiffness against load factor: negative ahead of the manoeuvre point. */
function manoeuvreStiffness(point: FlightPoint, { alpha, pitchRate }: PullDerivatives): number {
  const rate = ratePerG(point);
  return alpha.pitch * (levelLift(point) - pitchRate.lift * rate) + alpha.lift * pitchRate.pitch * rate;
}

/**
 * Load factor that a control adds in a steady pull-up, g per unit of the control whose effect is given; null at and behind the
 * manoeuvre point, where it pulls ever tighter.
 */
export function pullOf(point: FlightPoint, d: PullDerivatives, control: SymmetricEffect): number | null {
  const stiffness = manoeuvreStiffness(point, d);
  if (!(stiffness < 0)) return null;
  return (d.alpha.pitch * control.lift - d.alpha.lift * control.pitch) / stiffness;
}

/** How far the CG lies ahead of the stick-fixed manoeuvre point, as a share of the chord. */
export const manoeuvreMargin = (point: FlightPoint, d: PullDerivatives): number =>
  -manoeuvreStiffness(point, d) / (d.alpha.lift * levelLift(point));

/** Pitch rate of a steady pull-up of one g more, degrees a second. */
export const pitchRateDegSPerG = ({ speedMs }: FlightPoint): number => degFromRad(STANDARD_GRAVITY / speedMs);

/** The same derivatives when lift due to angle of attack acts a share of the chord further aft. */
export const withNeutralPointMoved = <D extends PullDerivatives>(d: D, byChords: number): D => ({
  ...d,
  alpha: { lift: d.alpha.lift, pitch: d.alpha.pitch - byChords * d.alpha.lift },
});
