import type { Derivatives } from '@/lib/aero/lattice/derivatives';
import { controlKey } from '@/lib/aero/lattice/fromAirframe';
import type { Airframe } from '@/lib/airframe/schema/airframe';
import type { Control } from '@/lib/airframe/schema/surface';
import { radFromDeg } from '@/lib/numerics/vec';
import { SHARED_THROW_DEG } from './bands';

// What the sticks do: each control moves by its share of the mix, and all reach their throw together at full stick.

/** Full nose-up stick: what it lifts and pitches, and the largest deflection it makes. */
export interface PitchCommand {
  readonly lift: number;
  /** Nose up, about the lattice's reference point; always positive. */
  readonly pitch: number;
  readonly throwDeg: number;
}

/** Full right stick: the rolling moment and the deflection of the up-going side. */
export interface RollCommand {
  readonly roll: number;
  readonly throwDeg: number;
}

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
export function pitchCommand(airframe: Airframe, { symmetric }: Derivatives): PitchCommand | null {
  let [lift, pitch, throwDeg] = [0, 0, 0];
  for (const { key, control } of eachControl(airframe)) {
    const effect = symmetric.controls.get(key);
    if (!effect || control.mix.pitch === 0) continue;
    const down = effect.pitch > 0;
    const moved = stickThrowDeg(control, down ? control.throwsDeg.down : control.throwsDeg.up, 'pitch');
    const rad = radFromDeg(down ? moved : -moved);
    lift += effect.lift * rad;
    pitch += effect.pitch * rad;
    throwDeg = Math.max(throwDeg, moved);
  }
  return throwDeg > 0 ? { lift, pitch, throwDeg } : null;
}

/** Full right stick, or null when no control has a part in it. The down-going side moves less by the differential. */
export function rollCommand(airframe: Airframe, { antisymmetric }: Derivatives): RollCommand | null {
  let [roll, throwDeg] = [0, 0];
  for (const { key, control } of eachControl(airframe)) {
    const effect = antisymmetric?.controls.get(key);
    if (!effect || control.mix.roll === 0) continue;
    const up = stickThrowDeg(control, control.throwsDeg.up, 'roll');
    const down = Math.min(stickThrowDeg(control, control.throwsDeg.down, 'roll'), up * (1 - control.differential));
    // Starboard up and port down is minus one in the antisymmetric case, by the mean of both sides.
    roll -= effect.roll * Math.sign(control.mix.roll) * radFromDeg((up + down) / 2);
    throwDeg = Math.max(throwDeg, up);
  }
  return throwDeg > 0 ? { roll, throwDeg } : null;
}

/** Lift and pitching moment of all controls at rest, where their neutral is not zero. */
export function neutralControls(airframe: Airframe, { symmetric }: Derivatives): Neutral {
  let [lift, pitch] = [0, 0];
  for (const { key, control } of eachControl(airframe)) {
    const effect = symmetric.controls.get(key);
    if (!effect) continue;
    lift += effect.lift * radFromDeg(control.neutralDeg);
    pitch += effect.pitch * radFromDeg(control.neutralDeg);
  }
  return { lift, pitch };
}
