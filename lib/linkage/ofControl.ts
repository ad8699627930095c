import { LINKAGE } from '@/lib/airframe/defaults';
import type { ResolvedAirframe, ResolvedSurface } from '@/lib/airframe/resolved';
import type { Airframe } from '@/lib/airframe/schema/airframe';
import type { Item } from '@/lib/airframe/schema/equipment';
import type { Control } from '@/lib/airframe/schema/surface';
import { ok, type Problem, type Result, refuse } from '@/lib/numerics/result';
import { degFromRad, dot3, radFromDeg, sub3, type Vec3 } from '@/lib/numerics/vec';
import { texts } from '@/lib/text/en/figures/controls';
import { type FourBar, hornAngleRad, type Levers, layFourBar, leversAt, servoAngleRad } from './fourBar';
import type { Reach } from './mix';
import { type ControlPlace, linkagePlane } from './place';
import { SERVO_TRAVEL_DEG } from './practice';
import { suggestFourBar } from './suggest';

/** The linkage of one control: as the document has it, or the suggested one where it has none. */
export interface ControlLinkage {
  readonly bar: FourBar;
  /** 1 when the rod pushed aft turns the trailing edge down (horn on the upper face), else -1. */
  readonly sign: 1 | -1;
  readonly servo: Item | null;
  /** Null where the linkage is only suggested: nobody knows yet where the rod runs. */
  readonly rod: { readonly diameterMm: number; readonly lengthMm: number } | null;
  readonly suggested: boolean;
}

const problem = (code: keyof typeof texts.problems, path: string, fix?: string): Problem => ({
  code: `linkage-${code.replaceAll(/[A-Z]/g, (letter) => `-${letter.toLowerCase()}`)}`,
  path,
  message: texts.problems[code],
  ...(fix ? { fix } : {}),
});

/** The servo to judge a suggested linkage by: the weakest that is listed. */
const lightestServo = ({ items }: Airframe): Item | null =>
  items.filter(({ kind }) => kind === 'servo').sort((a, b) => a.massG - b.massG)[0] ?? null;

function suggested(airframe: Airframe, reach: Reach, path: string): Result<ControlLinkage> {
  const bar = suggestFourBar(Math.max(reach.upDeg, reach.downDeg));
  if (!bar) return refuse(problem('tooFar', `${path}.throwsDeg`, texts.problems.tooFarFix));
  return ok({ bar, sign: 1, servo: lightestServo(airframe), rod: null, suggested: true });
}

/**
 * Linkage of a control. The servo's shaft is taken at the item's middle, on the control's side of the aircraft; the horn stands square
 * over the hinge and the rod meets the arm at a right angle at neutral, all in the plane square to the hinge. A rod that also runs
 * sideways is longer than its picture in that plane. Without a linkage in the document it is the usual holes that suit the throw.
 */
export function linkageOf(
  airframe: Airframe,
  { places }: ResolvedAirframe,
  surface: ResolvedSurface,
  control: Control,
  place: ControlPlace,
  reach: Reach,
): Result<ControlLinkage> {
  const index = surface.surface.controls.indexOf(control);
  const path = `surfaces.${surface.index}.controls.${index}`;
  const { linkage } = control;
  if (!linkage) return suggested(airframe, reach, path);
  const servo = airframe.items.find(({ id }) => id === linkage.servoItemId) ?? null;
  const at = places.get(linkage.servoItemId)?.at;
  if (!servo || !at) return refuse(problem('noServo', `${path}.linkage.servoItemId`));
  const plane = linkagePlane(surface, control, place, linkage.hornStation);
  if (!plane) return refuse(problem('hornOff', `${path}.linkage.hornStation`, texts.problems.hornOffFix));
  // A mirrored control is worked out on its starboard side, whichever servo is named.
  const beside: Vec3 = surface.surface.mirrored && plane.hinge[1] > 0 ? [at[0], Math.abs(at[1]), at[2]] : at;
  const to = sub3(beside, plane.hinge);
  const sign = linkage.face === 'upper' ? 1 : -1;
  const bar = layFourBar([dot3(to, plane.aft), dot3(to, plane.up) * sign], linkage.servoArmMm, linkage.hornMm);
  if (!bar) return refuse(problem('tooClose', `${path}.linkage.servoArmMm`, texts.problems.tooCloseFix));
  const lengthMm = Math.hypot(bar.rodLengthMm, dot3(to, place.along));
  return ok({ bar, sign, servo, rod: { diameterMm: linkage.rodMm, lengthMm }, suggested: false });
}

/** Servo angle that turns the surface by an angle, trailing edge down positive, degrees; null when a dead centre comes first. */
export function servoForDeg({ bar, sign }: ControlLinkage, surfaceDeg: number): number | null {
  const servo = servoAngleRad(bar, radFromDeg(surfaceDeg * sign));
  return servo === null ? null : degFromRad(servo);
}

/** Surface angle that a servo angle gives, trailing edge down positive, degrees; null at a dead centre. */
export function surfaceAtDeg({ bar, sign }: ControlLinkage, servoDeg: number): number | null {
  const horn = hornAngleRad(bar, radFromDeg(servoDeg));
  return horn === null ? null : degFromRad(horn) * sign;
}

/** Levers of the rod with the surface turned, trailing edge down positive; null at a dead centre. */
export function leversTurned(linkage: ControlLinkage, surfaceDeg: number): Levers | null {
  const servo = servoForDeg(linkage, surfaceDeg);
  return servo === null ? null : leversAt(linkage.bar, radFromDeg(servo));
}

export interface Travel {
  /** Servo angles at full throw up and down, degrees, as magnitudes. */
  readonly upDeg: number;
  readonly downDeg: number;
  /** The larger over what a servo has, %. */
  readonly usedPct: number;
}

/** How much of the servo's travel the throws take; null when the linkage meets a dead centre before them. */
export function travelOf(linkage: ControlLinkage, { upDeg, downDeg }: Reach): Travel | null {
  const [up, down] = [servoForDeg(linkage, -upDeg), servoForDeg(linkage, downDeg)];
  if (up === null || down === null) return null;
  const most = Math.max(Math.abs(up), Math.abs(down));
  return { upDeg: Math.abs(up), downDeg: Math.abs(down), usedPct: (100 * most) / SERVO_TRAVEL_DEG.value };
}

/** Longest free run of the usual wire, for who has no rod in the document yet, mm. */
export const USUAL_ROD = { diameterMm: LINKAGE.rodMm.value, freeMm: LINKAGE.freeRodMm.value } as const;
