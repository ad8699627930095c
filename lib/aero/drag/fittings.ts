import type { Airframe } from '@/lib/airframe/schema/airframe';
import type { Drive } from '@/lib/airframe/schema/equipment';
import type { Boom, Gear } from '@/lib/airframe/schema/fuselage';
import { exactly, type Spread, spread } from '@/lib/numerics/spread';
import { type Air, reynoldsNumber } from '../atmosphere';
import { turbulentFriction } from './friction';

// Drag of tubes, wheels, motors and of propellers that stand still, as areas in mm2, both sides of what is mirrored.
// Coefficients: S. F. Hoerner, "Fluid-Dynamic Drag" (1965), from memory, unless they say otherwise.

const sides = ({ mirrored }: { readonly mirrored: boolean }): number => (mirrored ? 2 : 1);
const scaled = (area: number, share: Spread): Spread => spread((end) => area * share[end]);

/** A tube along the stream: friction of its skin, and fittings at its ends. */
const BOOM_OFF: Spread = { value: 1, low: 0.8, high: 1.5 };

/** Drag area of a boom. */
export function boomDragArea(boom: Boom, { tubes }: Pick<Airframe, 'tubes'>, speedMs: number, air: Air): Spread {
  const [width, height] = tubes.find(({ id }) => id === boom.tubeId)?.outerMm ?? [0, 0];
  const skin = (Math.PI / 2) * (width + height) * boom.lengthMm;
  const friction = turbulentFriction(reynoldsNumber(speedMs, boom.lengthMm / 1000, air));
  return scaled(sides(boom) * skin * friction, BOOM_OFF);
}

/** A wheel over its diameter times its width; a wire or tube across the stream over its length times its diameter. */
const WHEEL: Spread = { value: 0.3, low: 0.2, high: 0.5 };
const WIRE: Spread = { value: 1.1, low: 0.9, high: 1.3 };
/** Width of a foam wheel over its diameter, and the wire of a leg without a tube, mm. Common practice, no source. */
const WHEEL_WIDTH_SHARE = 0.3;
const LEG_WIRE_MM = 2;

/** Drag area of a wheel, skid or hook: nothing for what has no size in the document. */
export function gearDragArea(gear: Gear, { tubes }: Pick<Airframe, 'tubes'>): Spread {
  const wheel = WHEEL_WIDTH_SHARE * (gear.wheelMm ?? 0) ** 2;
  const leg = (gear.legMm ?? 0) * (tubes.find(({ id }) => id === gear.tubeId)?.outerMm[0] ?? LEG_WIRE_MM);
  return spread((end) => sides(gear) * (wheel * WHEEL[end] + leg * WIRE[end]));
}

/** A motor in the open, over its frontal area: behind a spinner or cowl little, a bare one ahead of a firewall a bluff body. */
const MOTOR: Spread = { value: 0.4, low: 0.1, high: 1 };

/** Drag area of a propeller's motor; a fan's sits in its duct. */
export function motorDragArea(drive: Drive): Spread {
  if (drive.kind === 'ductedFan') return exactly(0);
  return scaled(sides(drive) * (Math.PI / 4) * drive.motor.diameterMm ** 2, MOTOR);
}

/** Blade area over the diameter's square, for each blade: a tenth of the diameter wide over four tenths of it. */
const BLADE_SHARE = 0.04;
/** A blade that stands across the stream; one that folds back costs little, one that turns freely more. */
const STOPPED_BLADE: Spread = { value: 0.9, low: 0.15, high: 1.3 };
/** A fan that stands still blocks its duct: over the swept area. From memory. */
const STOPPED_FAN: Spread = { value: 0.5, low: 0.2, high: 0.9 };

/** Drag area that a drive adds while its motor is off. */
export function stoppedDragArea(drive: Drive): Spread {
  if (drive.kind === 'propeller') {
    const { diameterMm, blades } = drive.propeller;
    return scaled(sides(drive) * blades * BLADE_SHARE * diameterMm ** 2, STOPPED_BLADE);
  }
  const { diameterMm, hubMm } = drive.fan;
  return scaled(sides(drive) * (Math.PI / 4) * (diameterMm ** 2 - hubMm ** 2), STOPPED_FAN);
}
