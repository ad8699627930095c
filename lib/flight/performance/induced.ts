import type { AeroModel } from '@/lib/aero/model';
import type { Airframe } from '@/lib/airframe/schema/airframe';
import { neutralControls, neutralDeflections, pitchCommand } from '../commands';

/** Below this share of the parts that it is the difference of, the stick has no say in the trim. */
const LEAST_POWER_SHARE = 1e-9;

/**
 * Induced drag coefficient of the aircraft in trim, as a function of its lift coefficient. Angle of attack and stick that hold a lift
 * without moment are straight lines in it, so the far-field drag is a parabola, and three points are all of it.
 */
export function inducedPolar(airframe: Airframe, model: AeroModel): (cl: number) => number {
  const stateAt = trimmedStates(airframe, model);
  const [d0, d1, d2] = [0, 0.5, 1].map((cl) => model.inducedDrag(stateAt(cl)));
  if (d0 === undefined || d1 === undefined || d2 === undefined) throw new RangeError('three lifts give three drags');
  const curve = 2 * (d2 - 2 * d1 + d0);
  const slope = d2 - d0 - curve;
  return (cl) => d0 + slope * cl + curve * cl ** 2;
}

/** Angle of attack and deflections at a lift coefficient; without a pitch control the moment is left as it is. */
function trimmedStates(airframe: Airframe, { base, alpha, controls }: AeroModel) {
  const atRest = neutralControls(airframe, controls);
  const restRad = neutralDeflections(airframe);
  const up = pitchCommand(airframe, controls);
  const lift = base.lift + atRest.lift;
  const pitch = base.pitch + atRest.pitch;
  const power = up ? alpha.lift * up.pitch - alpha.pitch * up.lift : 0;
  const parts = up ? Math.abs(alpha.lift * up.pitch) + Math.abs(alpha.pitch * up.lift) : 0;
  const trims = Math.abs(power) > LEAST_POWER_SHARE * parts;
  return (cl: number) => {
    const wanted = cl - lift;
    const share = trims ? (-alpha.lift * pitch - alpha.pitch * wanted) / power : 0;
    return {
      alphaRad: (wanted - share * (up?.lift ?? 0)) / alpha.lift,
      deflectionsRad: new Map(
        [...restRad].map(([key, rad]) => [key, rad + share * (up?.deflectionsRad.get(key) ?? 0)]),
      ),
    };
  };
}
