import { controlKey } from '@/lib/aero/lattice/fromAirframe';
import type { AeroModel, AntisymmetricEffect, SymmetricEffect } from '@/lib/aero/model';
import { controlWithin } from '@/lib/airframe/names';
import { resolve } from '@/lib/airframe/resolve';
import type { Airframe } from '@/lib/airframe/schema/airframe';
import { type MixedControl, mixedControl, type Sticks, sidesOf, turnDeg } from '@/lib/airframe/sticks';
import type { Problem } from '@/lib/numerics/result';
import { radFromDeg } from '@/lib/numerics/vec';
import { setUp as words } from '@/lib/text/en/setUp';
import { fill } from '@/lib/text/fill';

// What the sticks do: each control moves by its share of the mix, the way that the document says, and all reach their throw together at
// full stick.

/** Full stick one way in pitch: what it lifts and pitches, and the largest deflection it makes. */
export interface PitchCommand {
  readonly lift: number;
  /** Nose up, about the model's reference point, of all controls together: of either sign, by where they stand and how they are mixed. */
  readonly pitch: number;
  readonly throwDeg: number;
  /** By control, trailing edge down positive. */
  readonly deflectionsRad: ReadonlyMap<string, number>;
}

/** Full right stick: its moments, force to starboard, and the deflection of the side that moves most. */
export interface RollCommand {
  /** Right wing down; negative where the controls roll it left. */
  readonly roll: number;
  readonly yaw: number;
  readonly side: number;
  readonly throwDeg: number;
}

/** Full right rudder: likewise; its yaw is negative where the controls turn the nose left. */
export type YawCommand = RollCommand;

/** What the trailing edges' rest position lifts and pitches. */
export interface Neutral {
  readonly lift: number;
  readonly pitch: number;
}

const eachControl = (airframe: Airframe) =>
  airframe.surfaces.flatMap((surface, s) =>
    surface.controls.map((control, c) => ({
      key: controlKey(surface, control),
      control,
      surface,
      path: `surfaces.${s}.controls.${c}`,
    })),
  );

/** A document never changes, so what its sticks do is worked out once for it. */
const known = new WeakMap<Airframe, ReadonlyMap<string, MixedControl>>();

/** Every control as the sticks move it, by key. Throws RangeError for a document that does not resolve. */
function mixedControls(airframe: Airframe): ReadonlyMap<string, MixedControl> {
  const kept = known.get(airframe);
  if (kept) return kept;
  const worked = workedOut(airframe);
  known.set(airframe, worked);
  return worked;
}

function workedOut(airframe: Airframe): ReadonlyMap<string, MixedControl> {
  const resolved = resolve(airframe);
  if (!resolved.ok) throw new RangeError('commands are for a document that resolves');
  const { value } = resolved;
  return new Map(
    value.surfaces.flatMap((surface) =>
      surface.surface.controls.map((control) => [
        controlKey(surface.surface, control),
        mixedControl(value, surface, control),
      ]),
    ),
  );
}

/** Full stick nose up (or down), or null when no control has a part in it. Throws RangeError for a document that does not resolve. */
export function pitchCommand(
  airframe: Airframe,
  controls: ReadonlyMap<string, SymmetricEffect>,
  nose: 'up' | 'down' = 'up',
): PitchCommand | null {
  let [lift, pitch, throwDeg] = [0, 0, 0];
  const deflectionsRad = new Map<string, number>();
  for (const [key, mixed] of mixedControls(airframe)) {
    const effect = controls.get(key);
    if (!effect || mixed.control.mix.pitch === 0) continue;
    const [side = 'centre'] = sidesOf(mixed);
    const turn = turnDeg(mixed, side, { pitch: nose === 'up' ? 1 : -1 });
    const rad = radFromDeg(turn);
    deflectionsRad.set(key, rad);
    lift += effect.lift * rad;
    pitch += effect.pitch * rad;
    throwDeg = Math.max(throwDeg, Math.abs(turn));
  }
  return throwDeg > 0 ? { lift, pitch, throwDeg, deflectionsRad } : null;
}

/**
 * Where full up stick ends with the nose down and the aircraft faster: a problem at the share of pitch of each control that has a part in
 * that. Judged with the lift held, which is the moment about the neutral point (Etkin & Reid, "Dynamics of Flight", ch. 2), so the CG has
 * no say here either. None while other controls outweigh it, as an elevator does a wing flap that moves with it.
 */
export function upStickProblems(
  airframe: Airframe,
  { alpha, controls }: Pick<AeroModel, 'alpha' | 'controls'>,
): Problem[] {
  const up = pitchCommand(airframe, controls);
  const noseUp = ({ lift, pitch }: SymmetricEffect) => alpha.lift * pitch - alpha.pitch * lift;
  if (!up || noseUp(up) >= 0) return [];
  return eachControl(airframe).flatMap(({ key, surface, control, path }): Problem[] => {
    const effect = controls.get(key);
    if (!effect || noseUp(effect) * (up.deflectionsRad.get(key) ?? 0) >= 0) return [];
    return [
      {
        code: 'up-stick-drops-nose',
        path: `${path}.mix.pitch`,
        message: fill(words.upStickDropsNose, { control: controlWithin(surface, control) }),
        fix: words.upStickDropsNoseFix,
      },
    ];
  });
}

/** What full stick comes to in the antisymmetric case: starboard trailing edge down, port up; on the centre plane its own turn. */
function antisymmetric(
  airframe: Airframe,
  controls: ReadonlyMap<string, AntisymmetricEffect>,
  stick: 'roll' | 'yaw',
): RollCommand | null {
  const full: Sticks = { [stick]: 1 };
  let [roll, yaw, side, throwDeg] = [0, 0, 0, 0];
  for (const [key, mixed] of mixedControls(airframe)) {
    const effect = controls.get(key);
    if (!effect || mixed.control.mix[stick] === 0) continue;
    const turns = sidesOf(mixed).map((one) => ({ one, turn: turnDeg(mixed, one, full) }));
    const sum = turns.reduce((total, { one, turn }) => total + (one === 'port' ? -turn : turn), 0);
    const rad = radFromDeg(sum / turns.length);
    roll += effect.roll * rad;
    yaw += effect.yaw * rad;
    side += effect.side * rad;
    throwDeg = Math.max(throwDeg, ...turns.map(({ turn }) => Math.abs(turn)));
  }
  return throwDeg > 0 ? { roll, yaw, side, throwDeg } : null;
}

/**
 * Full right stick, or null when no control has a part in it: by the mean of both sides, as the down-going one moves less by the
 * differential. Throws RangeError for a document that does not resolve.
 */
export const rollCommand = (
  airframe: Airframe,
  controls: ReadonlyMap<string, AntisymmetricEffect>,
): RollCommand | null => antisymmetric(airframe, controls, 'roll');

/**
 * Full right rudder, or null when no control has a part in it. A fin on the centre plane turns its trailing edge to starboard; a pair of
 * fins and a V-tail do so by turning one side down and the other up. Throws RangeError for a document that does not resolve.
 */
export const yawCommand = (airframe: Airframe, controls: ReadonlyMap<string, AntisymmetricEffect>): YawCommand | null =>
  antisymmetric(airframe, controls, 'yaw');

/** Lift and pitching moment of all controls at rest, where their neutral is not zero. */
export function neutralControls(airframe: Airframe, controls: ReadonlyMap<string, SymmetricEffect>): Neutral {
  let [lift, pitch] = [0, 0];
  for (const { key, control } of eachControl(airframe)) {
    const effect = controls.get(key);
    if (!effect) continue;
    lift += effect.lift * radFromDeg(control.neutralDeg);
    pitch += effect.pitch * radFromDeg(control.neutralDeg);
  }
  return { lift, pitch };
}

/** Deflections of all controls at rest, by key. */
export const neutralDeflections = (airframe: Airframe): Map<string, number> =>
  new Map(eachControl(airframe).map(({ key, control }) => [key, radFromDeg(control.neutralDeg)]));
