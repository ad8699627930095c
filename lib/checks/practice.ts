import { cp, m } from '@/lib/airframe/defaults';

// Limits of the check before cutting that nothing else needs. Clearances, ground and cooling stand in lib/airframe/practice.ts.

/** Boxes and plates that lie this far into each other still go together: foam gives. */
export const FIT_MM = cp(0.3, 'mm', 'largest clash that is none');

export const PACK = {
  playMm: cp(1, 'mm', 'a hatch is this much longer and wider than the pack'),
  tilt: cp(Math.SQRT2, '', 'opening over the height of a pack that goes in at 45°'),
} as const;

export const MOTOR = {
  firewallWithinMm: cp(40, 'mm', 'from the motor to the firewall that carries it, spacers included'),
  driverReachMm: cp(60, 'mm', 'from an opening to the motor screws'),
  driverWideMm: cp(12, 'mm', 'narrowest opening for a driver and two fingers'),
  hardLandingG: m(50, 'g', 'a hard landing on the nose'),
  glueMpa: m(0.1, 'MPa', 'glue on foam or its paper, in shear'),
  doublerWithinMm: cp(10, 'mm', 'from a doubler to the firewall that it backs'),
} as const;

export const AXIS_BODY_MM = cp(120, 'mm', 'a body on the shaft line within this carries the motor');

export const FAN_INLET_BAD = cp(0.8, '', 'of the swept area; less starves the fan');
/** Length of a fan unit ahead of its disc. */
export const FAN_LIP_MM = cp(10, 'mm', 'of the housing ahead of the blades');

/** A tube as stiff as this is carbon; one without a figure is taken for carbon. */
export const CARBON_FROM_GPA = m(60, 'GPa', 'glass 20 to 45, carbon 100 and more');

export const HINGE_TORQUE_PCT = {
  good: cp(50, '%', 'of the stall torque'),
  bad: cp(200, '%', 'stalls at level speed'),
} as const;

export const SPAR = {
  fromJointMm: cp(20, 'mm', 'from a spar end to a joint between panels'),
  middleMm: cp(1, 'mm', 'halves that begin this near the centre plane meet there'),
} as const;

export const HOLD = {
  freeMm: cp(60, 'mm', 'of bottom for fingers and thumb'),
  fromPropellerMm: cp(50, 'mm', 'from hand to disc'),
  wideMm: cp([15, 90] as const, 'mm', 'width that a hand closes on'),
} as const;

export const CAR_SPAN_MM = cp(1000, 'mm', 'goes into most cars in one piece');
