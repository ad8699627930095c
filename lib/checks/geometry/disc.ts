import type { Drive } from '@/lib/airframe/schema/equipment';
import { motorCentre } from '@/lib/airframe/thrust';
import { dot3, length3, mirror3, radFromDeg, scale3, sub3, type Vec3 } from '@/lib/numerics/vec';

export type PropellerDrive = Extract<Drive, { kind: 'propeller' }>;

/** A propeller's disc whose shaft gives: the motor's foot stays, and the shaft leans any way by up to the flex. mm. */
export interface Disc {
  /** Middle of the motor's foot, about which the shaft leans. */
  readonly foot: Vec3;
  readonly centre: Vec3;
  /** Unit vector from the foot to the centre. */
  readonly axis: Vec3;
  readonly reachMm: number;
  readonly radiusMm: number;
  readonly flexDeg: number;
}

/** The discs of a drive, port too where it is mirrored. `flexDeg` is how far its shaft gives. */
export function discsOf(drive: PropellerDrive, centre: Vec3, flexDeg: number): Disc[] {
  const half = sub3(motorCentre(drive, centre), centre);
  const reachMm = drive.motor.lengthMm;
  const disc: Disc = {
    foot: sub3(centre, scale3(half, -2)),
    centre,
    axis: scale3(half, -1 / length3(half)),
    reachMm,
    radiusMm: drive.propeller.diameterMm / 2,
    flexDeg,
  };
  if (!drive.mirrored) return [disc];
  return [disc, { ...disc, foot: mirror3(disc.foot), centre: mirror3(disc.centre), axis: mirror3(disc.axis) }];
}

/**
 * Distance of a point from everything that the disc sweeps while its shaft leans, mm; 0 inside. In a plane through the shaft's own line
 * the disc is a straight line across it, and leaning turns that line about the foot: so the point is turned instead, and the least of its
 * distances is where the line's end, its middle or the line itself passes it, or at an end of the turn.
 */
export function distanceToDisc({ foot, axis, reachMm, radiusMm, flexDeg }: Disc, point: Vec3): number {
  const from = sub3(point, foot);
  const along = dot3(from, axis);
  const far = length3(from);
  const turn = Math.atan2(Math.sqrt(Math.max(0, far * far - along * along)), along);
  const flex = radFromDeg(flexDeg);
  const distanceAt = (angle: number): number => {
    const [x, r] = [far * Math.cos(angle), Math.abs(far * Math.sin(angle))];
    return Math.hypot(x - reachMm, Math.max(0, r - radiusMm));
  };
  const special = [0, Math.atan2(radiusMm, reachMm), ...(far >= reachMm ? [Math.acos(reachMm / far)] : [])];
  const angles = special.flatMap((angle) => [angle, -angle]);
  const within = angles.map((angle) => Math.min(turn + flex, Math.max(turn - flex, angle)));
  return Math.min(...[turn - flex, turn + flex, ...within].map(distanceAt));
}

/**
 * Least height of the unbent disc over a plane, mm: negative below it.
 * @param up unit vector out of the plane
 */
export function discOver({ centre, axis, radiusMm }: Disc, planePoint: Vec3, up: Vec3): number {
  const lean = dot3(axis, up);
  return dot3(sub3(centre, planePoint), up) - radiusMm * Math.sqrt(Math.max(0, 1 - lean * lean));
}
