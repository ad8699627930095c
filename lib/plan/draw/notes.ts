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

/** How far a part's plane must follow an axis before an edge of it is called the front or the top one. */
const FOLLOWS = 0.7;
const INWARD_MM = [4, 6, 9, 13, 18, 25] as const;

/** Which edge of a part points forward or, on a part that stands across the aircraft, upward; seen on the sheet. */
export function leadingEdge(
  part: Part,
  outline: readonly Vec2[],
  turn: (v: Vec2) => Vec2,
): { text: string; spots: Spot[] } | null {
  const { ex, ey } = part.frame;
  const forward: Vec2 = [-ex[0], -ey[0]];
  const upward: Vec2 = [ex[2], ey[2]];
  const isForward = Math.hypot(...forward) > FOLLOWS;
  if (!isForward && Math.hypot(...upward) <= FOLLOWS) return null;
  const direction = turn(isForward ? forward : upward);
  const size = Math.hypot(...direction);
  const [dx, dy] = [direction[0] / size, direction[1] / size];
  const reach = ([x, y]: Vec2): number => x * dx + y * dy;
  const farthest = Math.max(...outline.map(reach));
  const tips = outline.filter((point) => reach(point) > farthest - 0.5);
  const across = tips.map(([x, y]) => y * dx - x * dy);
  const [low, high] = [Math.min(...across), Math.max(...across)];
  const angleDeg = (Math.atan2(dx, -dy) * 180) / Math.PI;
  const spots = INWARD_MM.flatMap((inward) =>
    [0.5, 0.3, 0.7, 0.15, 0.85].map((share): Spot => {
      const [a, c] = [farthest - inward, low + (high - low) * share];
      return { at: [dx * a - dy * c, dy * a + dx * c], angleDeg };
    }),
  );
  return { text: isForward ? words.front : words.top, spots };
}
