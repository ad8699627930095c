import { controlKey } from '@/lib/aero/lattice/fromAirframe';
import type { AntisymmetricEffect, SymmetricEffect } from '@/lib/aero/model';
import type { Airframe } from '@/lib/airframe/schema/airframe';
import type { Control } from '@/lib/airframe/schema/surface';
import { radFromDeg } from '@/lib/numerics/vec';
import { SHARED_THROW_DEG } from './limits';

// What the sticks do: each control moves by its share of the mix, and all reach their throw together at full stick.

/** Full nose-up stick: what it lifts and pitches, and the largest deflection it makes. */
export interface PitchCommand {
  readonly lift: number;
  /** Nose up, about the model's reference point; always positive. */
  readonly pitch: number;
  readonly throwDeg: number;
  /** By control, trailing edge down positive. */
  readonly deflectionsRad: ReadonlyMap<string, number>;
}

/** Full right stick: its moments, force to starboard, and the deflection of the side that goes up most. */
export interface RollCommand {
  readonly roll: number;
  readonly yaw: number;
  readonly side: number;
  readonly throwDeg: number;
}

/** Full right rudder: likewise. */
export type YawCommand = RollCommand;

/** What the trailing edges' rest position lifts and pitches. */
export interface Neutral {
  readonly lift: number;
  readonly pitch: number;
}

/**
 * What a throw comes to for one stick: its share of the mix. When pitch and roll share a control the two may come together, and its
 * linkage has only so much: pitch gets what roll leaves.
 */
function stickThrowDeg({ mix }: Control, throwDeg: number, stick: 'pitch' | 'roll'): number {
  const own = throwDeg * Math.abs(mix[stick]);
  if (stick === 'roll' || mix.roll === 0) return own;
  return Math.max(0, Math.min(own, SHARED_THROW_DEG.value - throwDeg * Math.abs(mix.roll)));
}

const eachControl = (airframe: Airframe) =>
  airframe.surfaces.flatMap((surface) =>
    surface.controls.map((control) => ({ key: controlKey(surface, control), control })),
  );

/** Full nose-up stick, or null when no control has a part in it. Each control turns the way that lifts the nose. */
export function pitchCommand(airframe: Airframe, controls: ReadonlyMap<string, SymmetricEffect>): PitchCommand | null {
  let [lift, pitch, throwDeg] = [0, 0, 0];
  const deflectionsRad = new Map<string, number>();
  for (const { key, control } of eachControl(airframe)) {
    const effect = controls.get(key);
    if (!effect || control.mix.pitch === 0) continue;
    const down = effect.pitch > 0;
    const moved = stickThrowDeg(control, down ? control.throwsDeg.down : control.throwsDeg.up, 'pitch');
    const rad = radFromDeg(down ? moved : -moved);
    deflectionsRad.set(key, rad);
    lift += effect.lift * rad;
    pitch += effect.pitch * rad;
    throwDeg = Math.max(throwDeg, moved);
  }
  return throwDeg > 0 ? { lift, pitch, throwDeg, deflectionsRad } : null;
}

/** Full right stick, or null when no control has a part in it. The down-going side moves less by the differential. */
export function rollCommand(
  airframe: Airframe,
  controls: ReadonlyMap<string, AntisymmetricEffect>,
): RollCommand | null {
  let [roll, yaw, side, throwDeg] = [0, 0, 0, 0];
  for (const { key, control } of eachControl(airframe)) {
    const effect = controls.get(key);
    if (!effect || control.mix.roll === 0) continue;
    const up = stickThrowDeg(control, control.throwsDeg.up, 'roll');
    const down = Math.min(stickThrowDeg(control, control.throwsDeg.down, 'roll'), up * (1 - control.differential));
    // Starboard up and port down is minus one in the antisymmetric case, by the mean of both sides.
    const turn = -Math.sign(control.mix.roll) * radFromDeg((up + down) / 2);
    roll += effect.roll * turn;
    yaw += effect.yaw * turn;
    side += effect.side * turn;
    throwDeg = Math.max(throwDeg, up);
  }
  return throwDeg > 0 ? { roll, yaw, side, throwDeg } : null;
}

/**
 * Full right rudder, or null when no control has a part in it. A fin on the centre plane turns its trailing edge to starboard; a pair of
 * fins and a V-tail do so by turning one side down and the other up: each control turns the way that yaws the nose right.
 */
export function yawCommand(airframe: Airframe, controls: ReadonlyMap<string, AntisymmetricEffect>): YawCommand | null {
  let [roll, yaw, side, throwDeg] = [0, 0, 0, 0];
  for (const { key, control } of eachControl(airframe)) {
    const effect = controls.get(key);
    if (!effect || control.mix.yaw === 0) continue;
    const { up, down } = control.throwsDeg;
    const moved = ((up + down) / 2) * Math.abs(control.mix.yaw);
    const turn = Math.sign(effect.yaw) * radFromDeg(moved);
    roll += effect.roll * turn;
    yaw += effect.yaw * turn;
    side += effect.side * turn;
    throwDeg = Math.max(throwDeg, moved);
  }
  return throwDeg > 0 ? { roll, yaw, side, throwDeg } : null;
}

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
