import type { Vec2 } from '@/lib/numerics/vec';
import { pointToSegment, type Segment, segmentsOf } from '../draw/segments';
import type { DrawnLine } from '../drawing';

// Fold, glue and place lines stop short of cut lines on paper, so that a cut line stays one clean line to follow.

/** Gap left between a cut line's middle and any other line, mm. */
export const CLEAR_MM = 1;

/** Shares of a segment that lie nearer to another one than the gap. Nearness to a segment is convex along a line, so it is one interval. */
function nearPart([a, b]: Segment, cut: Segment): readonly [number, number] | null {
  const at = (t: number): number => pointToSegment([a[0] + (b[0] - a[0]) * t, a[1] + (b[1] - a[1]) * t], cut);
  let [low, high] = [0, 1];
  for (let i = 0; i < 60; i++) {
    const [p, q] = [low + (high - low) / 3, high - (high - low) / 3];
    if (at(p) <= at(q)) high = q;
    else low = p;
  }
  const nearest = (low + high) / 2;
  if (at(nearest) >= CLEAR_MM) return null;
  const edge = (outer: number): number => {
    if (at(outer) < CLEAR_MM) return outer;
    let [near, far] = [nearest, outer];
    for (let i = 0; i < 40; i++) {
      const middle = (near + far) / 2;
      if (at(middle) < CLEAR_MM) near = middle;
      else far = middle;
    }
    return far;
  };
  return [edge(0), edge(1)];
}

const apart = ([a, b]: Segment, [c, d]: Segment): boolean =>
  Math.max(a[0], b[0]) + CLEAR_MM < Math.min(c[0], d[0]) ||
  Math.max(c[0], d[0]) + CLEAR_MM < Math.min(a[0], b[0]) ||
  Math.max(a[1], b[1]) + CLEAR_MM < Math.min(c[1], d[1]) ||
  Math.max(c[1], d[1]) + CLEAR_MM < Math.min(a[1], b[1]);

/** The shares of a segment that stay, in order. */
function stays(segment: Segment, cuts: readonly Segment[]): [number, number][] {
  const gone = cuts
    .filter((cut) => !apart(segment, cut))
    .map((cut) => nearPart(segment, cut))
    .filter((part) => part !== null)
    .sort((a, b) => a[0] - b[0]);
  const kept: [number, number][] = [];
  let from = 0;
  for (const [start, end] of gone) {
    if (start > from) kept.push([from, start]);
    from = Math.max(from, end);
  }
  if (from < 1) kept.push([from, 1]);
  return kept;
}

/** The pieces of a line that keep their distance from the cut lines. */
export function keepClear(line: Pick<DrawnLine, 'points' | 'closed'>, cuts: readonly Segment[]): Vec2[][] {
  const pieces: Vec2[][] = [];
  let open: Vec2[] | null = null;
  for (const segment of segmentsOf(line.points, line.closed)) {
    const [a, b] = segment;
    const at = (t: number): Vec2 => [a[0] + (b[0] - a[0]) * t, a[1] + (b[1] - a[1]) * t];
    const kept = stays(segment, cuts);
    if (kept.length === 0) open = null;
    for (const [from, to] of kept) {
      if (open === null || from > 0) {
        open = [at(from)];
        pieces.push(open);
      }
      open.push(at(to));
      if (to < 1) open = null;
    }
  }
  return pieces;
}
