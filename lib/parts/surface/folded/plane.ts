import type { Section } from '@/lib/airframe/resolved';
import { add3, cross3, dot3, radFromDeg, scale3, sub3, type Vec3 } from '@/lib/numerics/vec';
import { normalOf, unit3 } from '../../shape/frame';
import type { PartFrame } from '../../types';
import { LEAST_BEVEL_DEG, type Seam } from '../joint';
import { quarterPoint, type Run } from '../run';

// Planes that end a folded panel: what lies on the side their normal points to is not there.

export interface Plane {
  readonly at: Vec3;
  readonly normal: Vec3;
}

/** How far along the line from a to b (0 to 1 between them) it meets the plane. Throws RangeError when it runs beside it. */
export function shareAt({ at, normal }: Plane, a: Vec3, b: Vec3): number {
  const rate = dot3(sub3(b, a), normal);
  if (rate === 0) throw new RangeError('the line runs along the plane');
  return dot3(sub3(at, a), normal) / rate;
}

/** The line in which two planes meet: a point and a direction of unit length. Throws RangeError when they are parallel. */
export function meetOf(p: Plane, q: Plane): { at: Vec3; along: Vec3 } {
  const along = unit3(cross3(p.normal, q.normal));
  // Of the points on both planes, the one nearest to p's own.
  const inP = cross3(along, p.normal);
  const t = dot3(sub3(q.at, p.at), q.normal) / dot3(inP, q.normal);
  return { at: add3(p.at, scale3(inP, t)), along };
}

/** Across the panel along its section. */
const sectionPlane = (frame: PartFrame, { le }: Section, end: Seam['end']): Plane => ({
  at: le,
  normal: scale3(frame.ex, end === 'root' ? -1 : 1),
});

/** Half-way between this panel and the one it meets at an angle, through the line along which their undersides meet. */
function seamPlane({ frame }: Run, section: Section, seam: Seam): Plane {
  if (Math.abs(seam.halfDeg) < LEAST_BEVEL_DEG) return sectionPlane(frame, section, seam.end);
  const [x, y] = seam.edge.along;
  const line = unit3(add3(scale3(frame.ex, x), scale3(frame.ey, y)));
  const up = normalOf(frame);
  const across = cross3(line, up);
  const outward = scale3(across, Math.sign(dot3(across, frame.ex)) * (seam.end === 'root' ? -1 : 1));
  const half = radFromDeg(seam.halfDeg);
  // Upper faces that close leave less room the higher one stands.
  const normal = unit3(add3(scale3(outward, Math.cos(half)), scale3(up, Math.sin(half))));
  return { at: quarterPoint(section), normal };
}

/** A free tip raked as flat sheet is: the longer of its two corners stays where it is. Null where the surface asks for none here. */
export function rakedPlane(run: Run, section: Section): Plane | null {
  const { surface, panels } = run.surface;
  const isTip = run.panels.at(-1)?.index === panels.length - 1;
  if (!isTip || surface.tip.shape !== 'raked') return null;
  const lean = Math.tan(radFromDeg(surface.tip.angleDeg));
  return {
    at: lean > 0 ? section.te : section.le,
    normal: unit3(add3(run.frame.ex, scale3(run.frame.ey, lean))),
  };
}

/** The plane in which a folded panel ends: half-way to its neighbour, or along its own section. */
export const endPlane = (run: Run, section: Section, end: Seam['end'], seam: Seam | undefined): Plane =>
  seam ? seamPlane(run, section, seam) : sectionPlane(run.frame, section, end);
