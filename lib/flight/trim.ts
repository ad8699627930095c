import type { AeroModel, SymmetricEffect, SymmetricState } from '@/lib/aero/model';
import type { ResolvedAirframe } from '@/lib/airframe/resolved';
import type { Airframe } from '@/lib/airframe/schema/airframe';
import { thrustDirection } from '@/lib/airframe/thrust';
import { type Problem, type Result, refuse } from '@/lib/numerics/result';
import { degFromRad, sub3, type Vec3 } from '@/lib/numerics/vec';
import { texts } from '@/lib/text/en/figures/trim';
import { neutralControls, neutralDeflections, type PitchCommand, pitchCommand, upStickProblems } from './commands';

// Steady straight flight: the angle of attack and the stick at which no moment is left and lift carries the weight. The model is linear,
// so it is one pair of equations.

/** All that pitch needs: the aircraft with its controls at rest, angle of attack, and the elevator stick, about one point. */
export interface PitchAxis {
  /** Area mm2, chord mm, place of the moments along x in mm. */
  readonly areaMm2: number;
  readonly chordMm: number;
  readonly xMm: number;
  /** At no angle of attack, controls at rest. */
  readonly rest: SymmetricEffect;
  readonly alpha: SymmetricEffect;
  readonly up: PitchCommand;
  /** `null` when no control has travel that way. */
  readonly down: PitchCommand | null;
  readonly restRad: ReadonlyMap<string, number>;
  /** The control that moves most: its angle stands for the stick. */
  readonly leader: string;
}

/** What has to be balanced beside the aerodynamics, as coefficients; thrust turns with the aircraft, so its lift grows with alpha. */
interface TrimLoad {
  /** Weight over dynamic pressure and area. */
  readonly weight: number;
  readonly thrust: { readonly lift: number; readonly liftPerRad: number; readonly pitch: number };
}

/** A trimmed state. */
export interface Trim {
  readonly state: SymmetricState;
  /** Share of full stick, nose up positive; past one is more than there is. */
  readonly stick: number;
  /** Of the control that moves most, from its rest, trailing edge down positive. */
  readonly elevatorDeg: number;
}

/** Pitch about the model's reference point; null when no control answers to the elevator stick. */
export function pitchAxis(
  airframe: Airframe,
  { reference, base, alpha, controls }: Pick<AeroModel, 'reference' | 'base' | 'alpha' | 'controls'>,
): PitchAxis | null {
  const up = pitchCommand(airframe, controls);
  if (!up) return null;
  const atRest = neutralControls(airframe, controls);
  const [leader] = [...up.deflectionsRad].reduce((most, next) => (Math.abs(next[1]) > Math.abs(most[1]) ? next : most));
  return {
    areaMm2: reference.area,
    chordMm: reference.chord,
    xMm: reference.point[0],
    rest: { lift: base.lift + atRest.lift, pitch: base.pitch + atRest.pitch },
    alpha,
    up,
    down: pitchCommand(airframe, controls, 'down'),
    restRad: neutralDeflections(airframe),
    leader,
  };
}

/**
 * The same aircraft about another place along x, mm, with the stick turning the same controls the same way: a lift acts further ahead of
 * a point that moved aft (Etkin & Reid, "Dynamics of Flight", ch. 2). No lattice is needed for it.
 */
export function axisAbout(axis: PitchAxis, xMm: number): PitchAxis {
  const shift = (xMm - axis.xMm) / axis.chordMm;
  const about = <T extends SymmetricEffect>(effect: T): T => ({ ...effect, pitch: effect.pitch + shift * effect.lift });
  return {
    ...axis,
    xMm,
    rest: about(axis.rest),
    alpha: about(axis.alpha),
    up: about(axis.up),
    down: axis.down && about(axis.down),
  };
}

/** The same aircraft with its neutral point further aft by this many mm: what the band of the neutral point leaves open. */
export const withNeutralPoint = (axis: PitchAxis, aftMm: number): PitchAxis => ({
  ...axis,
  alpha: { ...axis.alpha, pitch: axis.alpha.pitch - (aftMm / axis.chordMm) * axis.alpha.lift },
});

/** Less than this share of the parts that it is the difference of is none. */
const LEAST_POWER_SHARE = 1e-9;

/** Lift slope times the moment that a command gives while the angle of attack makes up for its lift; null when that is none. */
function power(slope: number, alphaPitch: number, command: PitchCommand): number | null {
  const value = slope * command.pitch - alphaPitch * command.lift;
  const parts = Math.abs(slope * command.pitch) + Math.abs(alphaPitch * command.lift);
  return Math.abs(value) > LEAST_POWER_SHARE * parts ? value : null;
}

/** Whether up stick lifts the nose while the lift is held, as seen from the neutral point and not only from the CG. */
export const stickTrims = ({ alpha, up }: PitchAxis): boolean => (power(alpha.lift, alpha.pitch, up) ?? 0) > 0;

/**
 * Angle of attack and stick at which the moment is none and lift with thrust carries the weight: two linear equations (Etkin & Reid,
 * "Dynamics of Flight", ch. 2, longitudinal trim; Roskam, "Airplane Flight Dynamics" I, ch. 4). Drag gives no moment in this model.
 * Problems: a stick that cannot change the trim, or that has no travel on the side where the trim lies.
 */
export function trim(axis: PitchAxis, load: TrimLoad): Result<Trim> {
  const { rest, alpha, up, down, restRad, leader } = axis;
  const lift = load.weight - rest.lift - load.thrust.lift;
  const pitch = -(rest.pitch + load.thrust.pitch);
  const slope = alpha.lift + load.thrust.liftPerRad;
  const wanted = slope * pitch - alpha.pitch * lift;
  const [command, sign] = wanted < 0 ? [down, -1] : [up, 1];
  if (!command) return refuse(problem('no-travel-to-trim', texts.problems.noTravel, texts.problems.noTravelFix));
  const gain = power(slope, alpha.pitch, command);
  if (gain === null || gain * sign < 0) return refuse(doesNotTrim);
  const share = wanted / gain;
  const moved = (key: string) => share * (command.deflectionsRad.get(key) ?? 0);
  return {
    ok: true,
    value: {
      state: {
        alphaRad: (lift - share * command.lift) / slope,
        deflectionsRad: new Map([...restRad].map(([key, atRest]) => [key, atRest + moved(key)])),
      },
      stick: sign * share,
      elevatorDeg: degFromRad(moved(leader)),
    },
  };
}

const problem = (code: string, message: string, fix: string) => ({ code, path: 'surfaces', message, fix });

/** Why up stick does not trim: controls that turn the wrong way, or a stick that lifts and sinks without turning the nose. */
export function whyNoTrim(airframe: Airframe, model: Pick<AeroModel, 'alpha' | 'controls'>): readonly Problem[] {
  const wrong = upStickProblems(airframe, model);
  return wrong.length > 0 ? wrong : [doesNotTrim];
}

/** A stick that lifts or sinks the aircraft without turning its nose. */
const doesNotTrim = problem('stick-does-not-trim', texts.problems.doesNotTrim, texts.problems.doesNotTrimFix);

/**
 * The CG, x in mm, at which a share of up stick balances a lift coefficient, power off. In steady flight the moment about the CG is none:
 * with lift L and moment M about the reference point, x = x_ref - c M / L (Etkin & Reid, "Dynamics of Flight", ch. 2).
 */
export function trimmedCgX({ xMm, chordMm, rest, alpha, up }: PitchAxis, share: number, lift: number): number {
  const alphaRad = (lift - rest.lift - share * up.lift) / alpha.lift;
  return xMm - (chordMm * (rest.pitch + share * up.pitch + alpha.pitch * alphaRad)) / lift;
}

/** Force and moment of all drives about a point, in N and N m, both sides of mirrored ones together. */
export interface ThrustLine {
  /** Up at no angle of attack, and what each radian of it adds. */
  readonly upN: number;
  readonly upPerRadN: number;
  readonly noseUpNm: number;
}

/**
 * What the thrust of each drive does about a point: its line runs through the disc's centre and turns with the aircraft.
 * @param thrustN of one drive on one side, by its index in the document
 * @param downDeg turns every line down by this much more
 */
export function thrustLine(
  airframe: Airframe,
  { places }: ResolvedAirframe,
  point: Vec3,
  thrustN: (index: number) => number,
  downDeg = 0,
): ThrustLine {
  let [upN, upPerRadN, noseUpNm] = [0, 0, 0];
  for (const [index, drive] of airframe.drives.entries()) {
    const at = places.get(drive.id)?.at;
    if (!at) throw new RangeError(`drive ${drive.id} has no place`);
    const [down, right] = drive.thrustDeg;
    const [x, , z] = thrustDirection({ thrustDeg: [down + downDeg, right] });
    const [armX, , armZ] = sub3(at, point);
    const force = thrustN(index) * (drive.mirrored ? 2 : 1);
    upN += force * z;
    upPerRadN -= force * x;
    noseUpNm += (force * (armZ * x - armX * z)) / 1000;
  }
  return { upN, upPerRadN, noseUpNm };
}

/** No drive pulls. */
export const POWER_OFF: ThrustLine = { upN: 0, upPerRadN: 0, noseUpNm: 0 };

/** Weight and thrust as coefficients at a dynamic pressure. Throws RangeError when that is not positive. */
export function trimLoad(
  { areaMm2, chordMm }: PitchAxis,
  weightN: number,
  pressurePa: number,
  line: ThrustLine = POWER_OFF,
): TrimLoad {
  if (!(pressurePa > 0)) throw new RangeError(`dynamic pressure must be positive, got ${pressurePa}`);
  const force = pressurePa * (areaMm2 / 1e6);
  return {
    weight: weightN / force,
    thrust: {
      lift: line.upN / force,
      liftPerRad: line.upPerRadN / force,
      pitch: line.noseUpNm / (force * (chordMm / 1000)),
    },
  };
}
