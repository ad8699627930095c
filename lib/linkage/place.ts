import { resolveControl, sectionAt } from '@/lib/airframe/resolve';
import type { ResolvedSurface, Section } from '@/lib/airframe/resolved';
import type { Control } from '@/lib/airframe/schema/surface';
import { cross3, dot3, length3, lerp3, scale3, sub3, type Vec3 } from '@/lib/numerics/vec';
import { JOINED_WITHIN_MM } from './practice';

/** A control as its linkage and the air see it: lengths square to the hinge, mm. */
export interface ControlPlace {
  readonly hingeInner: Vec3;
  readonly hingeOuter: Vec3;
  /** Unit vector along the hinge, outward. */
  readonly along: Vec3;
  /** From the hinge line to the trailing edge, where that is longest. */
  readonly widestMm: number;
  /** Integral of the chord squared along the hinge, mm3: the control's own chord, the whole chord of an all-moving surface. */
  readonly chordSquaredMm3: number;
  /** Control chord over the whole chord, mean of both ends. */
  readonly chordShare: number;
  /** Halves that one servo turns: 2 where they are joined and only move together. */
  readonly halves: 1 | 2;
}

const joined = (surface: ResolvedSurface, { mix }: Control, inner: Vec3): boolean =>
  surface.surface.mirrored && mix.roll === 0 && mix.yaw === 0 && Math.abs(inner[1]) <= JOINED_WITHIN_MM.value;

/** Works out a control's place; null when its hinge has no length, which the document's rules name. */
export function controlPlace(surface: ResolvedSurface, control: Control): ControlPlace | null {
  const { inner, outer, hingeInner, hingeOuter } = resolveControl(surface, control);
  const hinge = sub3(hingeOuter, hingeInner);
  const hingeMm = length3(hinge);
  if (!(hingeMm > 0)) return null;
  const along = scale3(hinge, 1 / hingeMm);
  const fromHinge = (point: Vec3): number => length3(cross3(sub3(point, hingeInner), along));
  const kinks = surface.panels
    .map(({ tip }) => tip.station)
    .filter((station) => station > control.from && station < control.to)
    .map((station) => sectionAt(surface, station));
  const whole = control.kind === 'allMoving';
  const chord = (section: Section): number => fromHinge(section.te) + (whole ? fromHinge(section.le) : 0);
  const [a, b] = [chord(inner), chord(outer)];
  const lengthMm = Math.max(0, hingeMm - 2 * control.endGapMm);
  return {
    hingeInner,
    hingeOuter,
    along,
    widestMm: Math.max(...[inner, ...kinks, outer].map(({ te }) => fromHinge(te))),
    chordSquaredMm3: (lengthMm * (a * a + a * b + b * b)) / 3,
    chordShare: whole ? 1 : (control.chordShare[0] + control.chordShare[1]) / 2,
    halves: joined(surface, control, hingeInner) ? 2 : 1,
  };
}

/** Axes of the plane in which a linkage turns, at a place on the hinge. */
export interface LinkagePlane {
  readonly hinge: Vec3;
  /** Along the chord, square to the hinge. */
  readonly aft: Vec3;
  /** Out of the upper face. */
  readonly up: Vec3;
}

/** The plane square to the hinge at a station of the surface; null when the station lies off the control. */
export function linkagePlane(
  surface: ResolvedSurface,
  control: Control,
  place: ControlPlace,
  station: number,
): LinkagePlane | null {
  const share = (station - control.from) / (control.to - control.from);
  if (!(share >= -1e-9 && share <= 1 + 1e-9)) return null;
  const { le, te } = sectionAt(surface, station);
  const chord = sub3(te, le);
  const square = sub3(chord, scale3(place.along, dot3(chord, place.along)));
  const aft = scale3(square, 1 / length3(square));
  return { hinge: lerp3(place.hingeInner, place.hingeOuter, share), aft, up: cross3(aft, place.along) };
}
