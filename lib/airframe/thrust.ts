import { add3, radFromDeg, scale3, type Vec3 } from '@/lib/numerics/vec';
import type { Drive } from './schema/equipment';

/** Unit vector of a drive's thrust: forward, turned below the x axis by downthrust and to starboard by side thrust. */
export function thrustDirection({ thrustDeg: [downDeg, rightDeg] }: Pick<Drive, 'thrustDeg'>): Vec3 {
  const down = radFromDeg(downDeg);
  const right = radFromDeg(rightDeg);
  return [-Math.cos(down) * Math.cos(right), Math.cos(down) * Math.sin(right), -Math.sin(down)];
}

/** Centre of a drive's motor, half its length from the disc: aft of it for a tractor and in a duct, ahead of it for a pusher. */
export function motorCentre(drive: Drive, disc: Vec3): Vec3 {
  const ahead = drive.kind === 'propeller' && drive.facing === 'pusher' ? 1 : -1;
  return add3(disc, scale3(thrustDirection(drive), (ahead * drive.motor.lengthMm) / 2));
}
