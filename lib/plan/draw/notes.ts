import type { Vec2 } from '@/lib/numerics/vec';
import type { Operation, Part } from '@/lib/parts/types';
import { plan } from '@/lib/text/en/plan';
import { fill } from '@/lib/text/fill';
import { trimmedDigits } from '@/lib/units/number';
import type { Spot } from './labels';
import { type Segment, segmentsOf } from './segments';

const words = plan.sheet;

function angleWords({ kind, angleDeg }: Operation): string | null {
  if (angleDeg === undefined || Math.abs(angleDeg) < 0.05) return null;
  const angle = trimmedDigits(Math.abs(angleDeg), 1);
  if (kind === 'bevel') return fill(words.bevelAngle, { angle });
  // A fold's angle is positive when the face that lies up closes: both sides then rise.
  if (kind === 'crease' || kind === 'cutToPaper') return fill(angleDeg > 0 ? words.foldUp : words.foldDown, { angle });
  return null;
}

/** What is written beside an operation's line, or null when its line type says all. */
export function noteOf(operation: Operation, part: Pick<Part, 'face'>): string | null {
  const bare = operation.kind === 'glue' || operation.kind === 'tape' ? plan.lines[operation.kind] : null;
  const said = [angleWords(operation), operation.note ?? bare].filter((text) => text !== null);
  if (said.length === 0) return null;
  // A line that is worked from the face below must say so: the paper shows the other one.
  if (operation.face !== part.face) said.push(fill(words.onFace, { face: plan.faces[operation.face] }));
  return said.join(' · ');
}

/** How far from its line a note may stand, mm; further off it would belong to no line. */
const OFFSETS_MM = [3, 4.5, 7, 10] as const;
const PITCH_MM = 12;

/** Spots beside a path's longest stretch on both sides, the nearest to the line and to its middle first. */
export function besideLongest(path: readonly Vec2[], closed: boolean): Spot[] {
  const lengthOf = ([[ax, ay], [bx, by]]: Segment): number => Math.hypot(bx - ax, by - ay);
  const [longest] = segmentsOf(path, closed).sort((a, b) => lengthOf(b) - lengthOf(a));
  const length = longest ? lengthOf(longest) : 0;
  if (!longest || length === 0) return [];
  const [[ax, ay], [bx, by]] = longest;
  const [ux, uy] = [(bx - ax) / length, (by - ay) / length];
  const angleDeg = (Math.atan2(uy, ux) * 180) / Math.PI;
  const steps = Math.max(2, Math.ceil(length / 2 / PITCH_MM));
  const along = [length / 2];
  for (let i = 1; i < steps; i++)
    along.push(length / 2 - (i * length) / 2 / steps, length / 2 + (i * length) / 2 / steps);
  return OFFSETS_MM.flatMap((off) =>
    along.flatMap((t) =>
      [1, -1].map((side): Spot => ({ at: [ax + ux * t - uy * off * side, ay + uy * t + ux * off * side], angleDeg })),
    ),
  );
}

/** How far a part's plane must follow an axis, and an edge face it, for the edge to be called the front or the top one. */
const FOLLOWS = 0.7;
const INWARD_MM = [3.5, 5, 8, 12] as const;
const ALONG = [0.5, 0.35, 0.65, 0.2, 0.8] as const;
/** Edges shorter than this, mm, have no room for a word. */
const LEAST_EDGE_MM = 5;

/** The edges of a counter-clockwise ring that look in a direction, the farthest that way first. */
function edgesFacing(outline: readonly Vec2[], [dx, dy]: Vec2): Segment[] {
  const reach = ([[ax, ay], [bx, by]]: Segment): number => (ax + bx) * dx + (ay + by) * dy;
  return segmentsOf(outline, true)
    .filter(([[ax, ay], [bx, by]]) => {
      const length = Math.hypot(bx - ax, by - ay);
      return length > LEAST_EDGE_MM && ((by - ay) * dx - (bx - ax) * dy) / length > FOLLOWS;
    })
    .sort((a, b) => reach(b) - reach(a));
}

/**
 * Which edge of a placed part is the front one or, on a part that stands across the aircraft, the top one, with the spots
 * where that may be written inside it. Null when no edge looks that way.
 */
export function leadingEdge(
  part: Part,
  outline: readonly Vec2[],
  turn: (v: Vec2) => Vec2,
): { text: string; spots: Spot[] } | null {
  // A coupon lies on the bench: it has no front.
  if (part.key.startsWith('aid/coupon/')) return null;
  const { ex, ey } = part.frame;
  const forward: Vec2 = [-ex[0], -ey[0]];
  const upward: Vec2 = [ex[2], ey[2]];
  const isForward = Math.hypot(...forward) > FOLLOWS;
  if (!isForward && Math.hypot(...upward) <= FOLLOWS) return null;
  const [x, y] = turn(isForward ? forward : upward);
  const size = Math.hypot(x, y);
  const spots = edgesFacing(outline, [x / size, y / size]).flatMap(([[ax, ay], [bx, by]]) => {
    const [ux, uy] = [bx - ax, by - ay];
    const length = Math.hypot(ux, uy);
    const angleDeg = (Math.atan2(uy, ux) * 180) / Math.PI;
    return INWARD_MM.flatMap((inward) =>
      ALONG.map(
        (share): Spot => ({
          at: [ax + ux * share - (uy / length) * inward, ay + uy * share + (ux / length) * inward],
          angleDeg,
        }),
      ),
    );
  });
  return spots.length === 0 ? null : { text: isForward ? words.front : words.top, spots };
}
