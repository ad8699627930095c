import { halfPlanform } from '@/lib/geometry/planform';
import { radFromDeg } from '@/lib/numerics/vec';
import { cp } from './defaults';
import { resolveControl } from './resolve';
import type { ResolvedAirframe, ResolvedSurface, Section } from './resolved';
import type { Control } from './schema/surface';
import { panelAt } from './section';

// What each side of a control does for the sticks: how far and which way. The document alone decides it, never the CG: a set-up sheet must
// not turn over because a pack moved. Turns count from neutral, trailing edge down positive; on every panel "down" is away from its upper
// face, so also on one that stands upright or lies on its back.

const STICKS = ['pitch', 'roll', 'yaw', 'flap'] as const;
export type Stick = (typeof STICKS)[number];
/** From -1 to 1: nose up, right, right, flaps out are positive. */
export type Sticks = Readonly<Partial<Record<Stick, number>>>;
export type Side = 'stbd' | 'port' | 'centre';

/** A control with what its place decides about the way it turns. */
export interface MixedControl {
  readonly control: Control;
  /** It stands ahead of the wing, so that it works the other way: see `standsAhead`. */
  readonly ahead: boolean;
  readonly mirrored: boolean;
  /** Roll of the panel it hangs on: 0 flat, 90 upright, past 90 on its back. */
  readonly rollDeg: number;
}

/** A control on its surface, as the sticks move it. */
export function mixedControl(resolved: ResolvedAirframe, surface: ResolvedSurface, control: Control): MixedControl {
  const middle = Math.min(1, Math.max(0, (control.from + control.to) / 2));
  return {
    control,
    ahead: standsAhead(resolved, surface, control),
    mirrored: surface.surface.mirrored,
    rollDeg: panelAt(surface, middle).panel.rollDeg,
  };
}

/**
 * Whether a control counts as ahead of the wing. On a foreplane it does and on a wing it does not, wherever they stand: up stick lifts the
 * trailing edge of an elevon, as every builder sets it. Elsewhere the middle of its hinge decides, against the quarter point of the wing's
 * mean aerodynamic chord. Without a wing nothing is ahead.
 */
function standsAhead(resolved: ResolvedAirframe, surface: ResolvedSurface, control: Control): boolean {
  const { role } = surface.surface;
  if (role === 'foreplane' || role === 'wing') return role === 'foreplane';
  const { hingeInner, hingeOuter } = resolveControl(surface, control);
  const quarterX = wingQuarterX(resolved);
  return quarterX !== null && (hingeInner[0] + hingeOuter[0]) / 2 < quarterX;
}

/** x of the quarter point of the mean aerodynamic chord of all wings, projected; null without area. */
function wingQuarterX({ surfaces }: ResolvedAirframe): number | null {
  const panels = surfaces.flatMap(({ surface, panels }) => (surface.role === 'wing' && surface.mirrored ? panels : []));
  const station = ({ le, te, chordMm }: Section, y: number) => ({
    x: le[0] + (te[0] - le[0]) / 4,
    y,
    chord: chordMm,
  });
  let [area, moment] = [0, 0];
  for (const { root, tip } of panels) {
    const [a, b] = [root.le[1], tip.le[1]];
    const half = halfPlanform([station(root, a), station(tip, Math.max(a, b))]);
    area += half.areaHalf;
    moment += half.momentXLe;
  }
  return area > 0 ? moment / area : null;
}

/** Sides of a control, starboard first. */
export const sidesOf = ({ mirrored }: MixedControl): readonly Side[] => (mirrored ? ['stbd', 'port'] : ['centre']);

/** Sticks that a control answers to. */
export const sticksOf = ({ control: { mix } }: MixedControl): Stick[] => STICKS.filter((stick) => mix[stick] !== 0);

/** Which face of its panel looks to port: 1 the upper, as on a fin or V-tail, -1 the lower, as on a fin that hangs down. */
export const lean = ({ rollDeg }: MixedControl): number => (Math.sin(radFromDeg(rollDeg)) < -1e-9 ? -1 : 1);

/** Which face of its panel looks up: 1 the upper, -1 the lower, as on a tail that runs inward from two booms to a peak. */
export const face = ({ rollDeg }: MixedControl): number => (Math.cos(radFromDeg(rollDeg)) < -1e-9 ? -1 : 1);

/** Most that a control shared by pitch and roll turns for both together, one way: its linkage has no more. */
export const SHARED_THROW_DEG = cp(28, '°', 'pitch and roll together, one way');

type Thrown = Pick<Control, 'mix' | 'throwsDeg' | 'differential'>;

/**
 * Full elevator stick, degrees one way as a magnitude: its share of the mix. Where roll shares the control the two sticks may come
 * together, so pitch gets what roll leaves of the shared throw.
 */
function pitchThrowDeg({ mix, throwsDeg }: Thrown, way: 'up' | 'down'): number {
  const own = throwsDeg[way] * Math.abs(mix.pitch);
  if (mix.roll === 0) return own;
  return Math.max(0, Math.min(own, SHARED_THROW_DEG.value - throwsDeg[way] * Math.abs(mix.roll)));
}

/** Full aileron stick, degrees as magnitudes: the side that goes down moves less by the differential. */
function rollThrowsDeg({ mix, throwsDeg, differential }: Thrown): { up: number; down: number } {
  const share = Math.abs(mix.roll);
  const up = throwsDeg.up * share;
  return { up, down: Math.min(throwsDeg.down * share, up * (1 - differential)) };
}

/** Up stick, positive share: trailing edge up behind the wing and on it, down ahead of it. A negative share turns it the other way. */
function pitchTurn(mixed: MixedControl, stick: number): number {
  const { control, ahead } = mixed;
  const way = Math.sign(control.mix.pitch * stick) * (ahead ? 1 : -1) * face(mixed);
  return way * pitchThrowDeg(control, way > 0 ? 'down' : 'up') * Math.abs(stick);
}

/** Right stick, positive share: the starboard side goes up, the port side down. */
function rollTurn(mixed: MixedControl, side: Side, stick: number): number {
  const { up, down } = rollThrowsDeg(mixed.control);
  const way = -Math.sign(mixed.control.mix.roll * stick) * (side === 'port' ? -1 : 1) * face(mixed);
  return (way > 0 ? down : -up) * Math.abs(stick);
}

/**
 * Right rudder, positive share: trailing edges to starboard behind the wing and on it, to port ahead of it; on a V-tail that is starboard
 * down, port up.
 */
function yawTurn(mixed: MixedControl, side: Side, stick: number): number {
  const { mix, throwsDeg } = mixed.control;
  const way = Math.sign(mix.yaw * stick) * (mixed.ahead ? -1 : 1) * lean(mixed) * (side === 'port' ? -1 : 1);
  return way * (way > 0 ? throwsDeg.down : throwsDeg.up) * Math.abs(mix.yaw * stick);
}

/** Flaps out, positive share: trailing edge down. */
function flapTurn(mixed: MixedControl, stick: number): number {
  const { mix, throwsDeg } = mixed.control;
  const way = Math.sign(mix.flap * stick) * face(mixed);
  return way * (way > 0 ? throwsDeg.down : throwsDeg.up) * Math.abs(mix.flap * stick);
}

/** Turn of one side of a control from neutral, degrees, trailing edge down positive, at full rate. */
export function turnDeg(mixed: MixedControl, side: Side, sticks: Sticks): number {
  const { mix } = mixed.control;
  const part = (stick: Stick, turn: (value: number) => number): number => {
    const value = sticks[stick] ?? 0;
    return value === 0 || mix[stick] === 0 ? 0 : turn(value);
  };
  return (
    part('pitch', (value) => pitchTurn(mixed, value)) +
    part('roll', (value) => rollTurn(mixed, side, value)) +
    part('yaw', (value) => yawTurn(mixed, side, value)) +
    part('flap', (value) => flapTurn(mixed, value))
  );
}
