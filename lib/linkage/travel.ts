import { radFromDeg } from '@/lib/numerics/vec';

/**
 * How far a trailing edge moves from neutral, by a rule laid from where it was to where it is: the chord of its arc, 2 r sin(d / 2), mm,
 * with r the distance from the hinge line. Builders measure this straight line, not the arc and not the height.
 */
export const edgeTravelMm = (radiusMm: number, turnDeg: number): number =>
  2 * radiusMm * Math.sin(Math.abs(radFromDeg(turnDeg)) / 2);
