import type { AeroModel, SymmetricState } from '@/lib/aero/model';
import type { Airframe } from '@/lib/airframe/schema/airframe';
import { neutralControls, neutralDeflections } from '../commands';
import { pitchAxis, trim } from '../trim';

/**
 * Angle of attack and controls of level flight at this lift coefficient, power off. Where the stick cannot trim it, the controls stay
 * at rest and only the lift is met: small motions hardly feel the difference. Null when nothing lifts.
 */
export function levelTrim(airframe: Airframe, model: AeroModel, lift: number): SymmetricState | null {
  if (!(model.alpha.lift > 0)) return null;
  const axis = pitchAxis(airframe, model);
  const trimmed = axis && trim(axis, { weight: lift, thrust: { lift: 0, liftPerRad: 0, pitch: 0 } });
  if (trimmed?.ok) return trimmed.value.state;
  const rest = neutralControls(airframe, model.controls);
  return {
    alphaRad: (lift - model.base.lift - rest.lift) / model.alpha.lift,
    deflectionsRad: neutralDeflections(airframe),
  };
}
