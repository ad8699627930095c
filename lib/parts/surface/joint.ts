import type { ResolvedPanel, Section } from '@/lib/airframe/resolved';
import { distance } from '@/lib/geometry/lines';
import type { Problem } from '@/lib/numerics/result';
import { SAME_POINT_MM } from '@/lib/numerics/tolerances';
import {
  cross3,
  degFromRad,
  dot3,
  length3,
  mirror3,
  radFromDeg,
  scale3,
  type Vec2,
  type Vec3,
} from '@/lib/numerics/vec';
import { texts } from '@/lib/text/en/parts';
import { normalOf } from '../shape/frame';
import { distanceToEdge, type Ring } from '../shape/ring';
import type { Face, Operation } from '../types';
import { meetsItsMirror, panelFrame, quarterPoint, type Run } from './run';
import { type Across, endOf, type Strip, trimStrip } from './strip';

// Where two flat pieces meet at an angle, each is bevelled by half of it, so that the two cut faces lie on one plane.

/** A lean smaller than this is left square: over 5 mm of foam it is 0.04 mm, less than a blade wanders. */
export const LEAST_BEVEL_DEG = 0.5;
/** A blade held flatter than this tears the foam. Common practice, no source. */
export const MOST_BEVEL_DEG = 60;

export interface Seam {
  readonly end: 'root' | 'tip';
  /** The mid-plane's edge. */
  readonly edge: Across;
  /** Half of the angle between the two pieces; positive when the upper faces close. */
  readonly halfDeg: number;
  readonly bevelled: boolean;
}

/** Plane and place of the neighbour across a seam, or null at a free end. */
function neighbour(
  run: Run,
  end: 'root' | 'tip',
): { normal: Vec3; out: Vec3; section: Section; panel: ResolvedPanel } | null {
  const edgePanel = end === 'root' ? run.panels[0] : run.panels.at(-1);
  if (!edgePanel) return null;
  const section = end === 'root' ? edgePanel.root : edgePanel.tip;
  if (end === 'root' && edgePanel.index === 0) {
    if (run.centre || !meetsItsMirror(run.surface)) return null;
    const own = panelFrame(edgePanel);
    // The mirrored panel as if it came before this one: its outboard direction towards this one's root.
    return { normal: mirror3(normalOf(own)), out: scale3(mirror3(own.ex), -1), section, panel: edgePanel };
  }
  const other = run.surface.panels[edgePanel.index + (end === 'root' ? -1 : 1)];
  if (!other) return null;
  const frame = panelFrame(other);
  return { normal: normalOf(frame), out: frame.ex, section, panel: end === 'root' ? edgePanel : other };
}

/** The seam at one end of a piece, or null when the end is free. */
export function seamOf(run: Run, end: 'root' | 'tip'): Seam | null {
  const other = neighbour(run, end);
  if (!other) return null;
  const own = normalOf(run.frame);
  const inner = end === 'root' ? other.normal : own;
  const outerOut = end === 'root' ? run.frame.ex : other.out;
  const line = cross3(own, other.normal);
  const angle = degFromRad(Math.atan2(length3(line), dot3(own, other.normal)));
  const halfDeg = (Math.sign(dot3(outerOut, inner)) * angle) / 2;
  const bevelled = Math.abs(halfDeg) >= LEAST_BEVEL_DEG && other.panel.panel.joint !== 'none';
  const q = quarterPoint(other.section);
  const { origin, ex, ey } = run.frame;
  const from: Vec3 = [q[0] - origin[0], q[1] - origin[1], q[2] - origin[2]];
  // Two sheets that meet at an angle meet where their planes cross; nearly flat ones meet along the section.
  const along: Vec2 = Math.abs(halfDeg) < LEAST_BEVEL_DEG ? [0, -1] : [dot3(line, ex), dot3(line, ey)];
  return { end, edge: { at: [dot3(from, ex), dot3(from, ey)], along }, halfDeg, bevelled };
}

/** The piece cut to the seam: the longer face reaches past the mid-plane by what the bevel takes from the other. */
export function cutToSeam(strip: Strip, seam: Seam, thicknessMm: number): Strip {
  const size = Math.hypot(...seam.edge.along);
  const outboard: Vec2 = [
    Math.abs(seam.edge.along[1]) / size,
    (-Math.sign(seam.edge.along[1]) * seam.edge.along[0]) / size,
  ];
  const reach = seam.bevelled ? (thicknessMm / 2) * Math.tan(radFromDeg(Math.abs(seam.halfDeg))) : 0;
  const signed = seam.end === 'root' ? -reach : reach;
  const at: Vec2 = [seam.edge.at[0] + outboard[0] * signed, seam.edge.at[1] + outboard[1] * signed];
  return trimStrip(strip, seam.end, { at, along: seam.edge.along });
}

/** The part of a seam that is left on the fixed sheet: a control that begins at the seam takes the rest. */
function seamPath(strip: Strip, seam: Seam, solid: Ring): readonly [Vec2, Vec2] {
  const [le, te] = endOf(strip, seam.end);
  const onSeam = solid.filter((p) => distanceToEdge(p, le, te) < SAME_POINT_MM);
  const last = onSeam.reduce((far, p) => (distance(le, p) > distance(le, far) ? p : far), le);
  return [le, last];
}

/** Bevel and glue along a seam, on the cut strip; `solid` is what its controls leave of it. */
export function seamOperations(strip: Strip, seam: Seam, thicknessMm: number, solid: Ring): Operation[] {
  const face: Face = seam.halfDeg > 0 ? 'upper' : 'lower';
  const path = seamPath(strip, seam, solid);
  const glue: Operation = {
    id: `${seam.end}-glue`,
    kind: 'glue',
    path,
    closed: false,
    face,
    sharedBy: 2,
    note: seam.bevelled ? texts.notes.dihedralJoint : texts.notes.buttJoint,
  };
  if (!seam.bevelled) return [glue];
  const bevel: Operation = {
    id: `${seam.end}-bevel`,
    kind: 'bevel',
    path,
    closed: false,
    face,
    angleDeg: Math.abs(seam.halfDeg),
    depthMm: thicknessMm,
  };
  return [bevel, glue];
}

/** What a seam asks that a blade or a flat sheet cannot do. */
export function seamProblems(run: Run, seam: Seam): Problem[] {
  const panel = seam.end === 'root' ? run.panels[0] : run.panels.at(-1);
  if (!panel || Math.abs(seam.halfDeg) <= MOST_BEVEL_DEG) return [];
  const path = `surfaces.${run.surface.index}.panels.${panel.index}.dihedralDeg`;
  return [
    { code: 'joint-too-sharp', path, message: texts.problems.jointTooSharp, fix: texts.problems.jointTooSharpFix },
  ];
}
