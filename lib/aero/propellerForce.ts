import type { Drive } from '@/lib/airframe/schema/equipment';

// A propeller or fan that meets the air at an angle pushes sideways, in its own disc: ahead of the CG it makes the aircraft less steady,
// behind it steadier.

/** Chord of a blade at three quarters of the radius, as a share of the diameter: the document does not know it. Common practice, no source. */
const BLADE_CHORD_SHARE = 0.09;
/** Angle between a blade's pitch and the one that its lift counts from, degrees. */
const ZERO_LIFT_DEG = 8;

/**
 * Force across the disc per unit of dynamic pressure and radian of inflow, mm2, gliding or at small thrust. Propeller: 4.25 s / (1 + 2 s)
 * sin(b + 8 deg) on the disc, s = (4 B / 3 pi)(c / D) the solidity and b the blade angle at three quarters of the radius; J. DeYoung,
 * "Propeller at High Incidence", Journal of Aircraft 2 (1965), from memory. Ducted fan: the stream through the fan at flight speed is
 * turned into the duct, 2 A.
 */
export function crossForceAreaMm2(drive: Drive): number {
  if (drive.kind === 'ductedFan') {
    const { diameterMm, hubMm } = drive.fan;
    return (Math.PI / 2) * (diameterMm ** 2 - hubMm ** 2);
  }
  const { diameterMm, pitchMm, blades } = drive.propeller;
  const solidity = ((4 * blades) / (3 * Math.PI)) * BLADE_CHORD_SHARE;
  const bladeRad = Math.atan(pitchMm / (0.75 * Math.PI * diameterMm)) + (ZERO_LIFT_DEG * Math.PI) / 180;
  const share = ((4.25 * solidity) / (1 + 2 * solidity)) * Math.sin(bladeRad);
  return share * (Math.PI / 4) * diameterMm ** 2;
}
