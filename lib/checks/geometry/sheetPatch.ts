import { resolveControl } from '@/lib/airframe/resolve';
import type { ResolvedPanel, ResolvedSurface } from '@/lib/airframe/resolved';
import type { Control, SectionShape } from '@/lib/airframe/schema/surface';
import { chordDirection, pointAt, sectionOfPanel } from '@/lib/airframe/section';
import { contains, type Outline } from '@/lib/geometry/polygons';
import { add3, cross3, dot3, length3, lerp3, radFromDeg, scale3, sub3, type Vec3 } from '@/lib/numerics/vec';
import type { Patch } from './nearest';

// Surfaces and moved controls as patches: along the panel, along the chord, and through the thickness. Starboard side.

const PANEL_GRID = [33, 17, 2];
const CONTROL_GRID = [17, 7, 2];
/** A slab is thickest about here, as a share of the chord; a folded section says its own place. */
const SLAB_MAX_AT = 0.3;

/** Half of the thickness at a share of the chord, mm: sheets all through, thicker sections as a wedge each way from where they are thickest. */
function halfThickness(section: SectionShape, sheetMm: number, chordMm: number, share: number): number {
  if (section.kind === 'flat' || section.kind === 'stepped') return sheetMm / 2;
  const maxAt = section.kind === 'folded' ? section.maxAt : SLAB_MAX_AT;
  const wedge = share < maxAt ? share / maxAt : (1 - share) / (1 - maxAt);
  return Math.max(sheetMm / 2, (section.thicknessShare * chordMm * wedge) / 2);
}

/** Unit vector out of a panel's upper face. */
function outOf(panel: ResolvedPanel): Vec3 {
  const normal = cross3(chordDirection(panel.root.incidenceDeg, panel.rollDeg), sub3(panel.tip.le, panel.root.le));
  return scale3(normal, 1 / length3(normal));
}

/** A panel with its thickness, without what its surface has cut out. */
export function panelPatch({ surface }: ResolvedSurface, panel: ResolvedPanel, sheetMm: number): Patch {
  const cutouts: Outline[] = surface.cutouts.map(({ outline }) => outline);
  const normal = outOf(panel);
  return {
    grid: PANEL_GRID,
    place: ([along = 0, share = 0, face = 0]) => {
      const { le, te, station, chordMm } = sectionOfPanel(panel, along);
      if (cutouts.some((outline) => contains(outline, [station, share]))) return null;
      const half = halfThickness(panel.panel.section, sheetMm, chordMm, share);
      return add3(lerp3(le, te, share), scale3(normal, (2 * face - 1) * half));
    },
  };
}

/** Turns a point about an axis through a point (right-handed; O. Rodrigues' formula, in any text on rigid motion). */
function turned(point: Vec3, through: Vec3, axis: Vec3, angleDeg: number): Vec3 {
  const angle = radFromDeg(angleDeg);
  const from = sub3(point, through);
  const parts = [
    scale3(from, Math.cos(angle)),
    scale3(cross3(axis, from), Math.sin(angle)),
    scale3(axis, dot3(axis, from) * (1 - Math.cos(angle))),
  ];
  return parts.reduce(add3, through);
}

/** A control turned about its hinge, trailing edge down positive, with its thickness. Null for a hinge without length. */
export function controlPatch(
  resolved: ResolvedSurface,
  control: Control,
  sheetMm: number,
  turnDeg: number,
): Patch | null {
  const { hingeInner, hingeOuter, inner, outer } = resolveControl(resolved, control);
  const hinge = sub3(hingeOuter, hingeInner);
  if (length3(hinge) === 0) return null;
  const axis = scale3(hinge, 1 / length3(hinge));
  const across = cross3(axis, sub3(inner.te, inner.le));
  const normal = scale3(across, -1 / length3(across));
  const [from, to] = control.kind === 'allMoving' ? [inner.le, outer.le] : [hingeInner, hingeOuter];
  return {
    grid: CONTROL_GRID,
    place: ([along = 0, share = 0, face = 0]) => {
      const station = control.from + (control.to - control.from) * along;
      const flat = lerp3(lerp3(from, to, along), pointAt(resolved, station, 1), share);
      return turned(add3(flat, scale3(normal, (face - 0.5) * sheetMm)), hingeInner, axis, turnDeg);
    },
  };
}
