import { lineMeet } from '@/lib/geometry/lines';
import { add3, degFromRad, dot3, scale3, sub3, type Vec2 } from '@/lib/numerics/vec';
import { normalOf, toPart } from '../../shape/frame';
import type { Face, Operation, PartFrame } from '../../types';
import { LEAST_BEVEL_DEG } from '../joint';
import type { Plane } from './plane';

// A flat piece bounded by planes: where a plane leans against the sheet, the edge is bevelled, and the outline is its longer face.

export interface PlateEdge {
  readonly id: string;
  readonly plane: Plane;
}

/** How a plane leans from square to the sheet, degrees: positive leaves the back of the frame's face the longer one. */
const lean = (frame: PartFrame, { normal }: Plane): number =>
  degFromRad(Math.asin(Math.max(-1, Math.min(1, dot3(normal, normalOf(frame))))));

/** The edge on the plate's longer face, as a point and a direction with the plate on its left. `frame` lies in the plate's face. */
function edgeLine(frame: PartFrame, { plane }: PlateEdge, thicknessMm: number): { at: Vec2; along: Vec2 } {
  const out = toPart({ ...frame, origin: [0, 0, 0] }, plane.normal);
  const size = Math.hypot(...out);
  const n: Vec2 = [out[0] / size, out[1] / size];
  const depth = lean(frame, plane) > 0 ? thicknessMm : 0;
  // On that face the plane passes this far from the frame's origin, along its direction out.
  const back = scale3(normalOf(frame), -depth);
  const c = dot3(sub3(plane.at, add3(frame.origin, back)), plane.normal) / size;
  return { at: [n[0] * c, n[1] * c], along: [-n[1], n[0]] };
}

/**
 * The plate inside the planes, in the frame's axes; `frame` stands in the face that looks along its normal. Edges in order
 * counter-clockwise, no two neighbours parallel. Null when nothing is left inside.
 */
export function plateOf(
  frame: PartFrame,
  edges: readonly PlateEdge[],
  thicknessMm: number,
  faces: readonly [Face, Face],
): { outline: Vec2[]; bevels: Operation[] } | null {
  const lines = edges.map((edge) => edgeLine(frame, edge, thicknessMm));
  const corners = lines.map((line, i) => {
    const before = lines[(i + lines.length - 1) % lines.length] ?? line;
    return lineMeet(before.at, before.along, line.at, line.along);
  });
  const outline = corners.filter((p) => p !== null);
  if (outline.length < edges.length) return null;
  const runs = (a: Vec2, b: Vec2, along: Vec2): boolean => (b[0] - a[0]) * along[0] + (b[1] - a[1]) * along[1] > 0;
  const bevels: Operation[] = [];
  for (const [i, edge] of edges.entries()) {
    const [a, b, line] = [outline[i], outline[(i + 1) % outline.length], lines[i]];
    if (!a || !b || !line || !runs(a, b, line.along)) return null;
    const angle = lean(frame, edge.plane);
    if (Math.abs(angle) < LEAST_BEVEL_DEG) continue;
    bevels.push({
      id: `${edge.id}-bevel`,
      kind: 'bevel',
      path: [a, b],
      closed: false,
      face: angle > 0 ? faces[0] : faces[1],
      angleDeg: Math.abs(angle),
      depthMm: thicknessMm,
    });
  }
  return { outline, bevels };
}
