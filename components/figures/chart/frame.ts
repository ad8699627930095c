import { type Ticks, ticks } from '../ruler';
import type { ChartLine } from './lines';

export interface Axis {
  readonly from: number;
  readonly to: number;
  readonly ticks: Ticks;
}
export interface ChartFrame {
  readonly x: Axis;
  readonly y: Axis;
}

/** As many as stay apart on a telephone. */
const MOST_X = 5;
const MOST_Y = 5;
/** Values whose lowest is under this share of their highest are drawn down to zero, so that heights compare. */
const DOWN_TO_ZERO = 0.5;
/** Air above and below the curves, as a share of their height. */
const AIR = 0.06;

/** Where a value lies on its axis: 0 at the start, 1 at the end. */
export const shareOf = ({ from, to }: Axis, value: number): number => (value - from) / (to - from);

/** A stretch that is never empty: a level curve gets room on both sides. */
function stretch(values: readonly number[]): readonly [number, number] {
  const low = Math.min(...values);
  const high = Math.max(...values);
  const spare = Math.abs(low) > 0 ? Math.abs(low) * 0.1 : 1;
  return high > low ? [low, high] : [low - spare, high + spare];
}

function yStretch(values: readonly number[]): readonly [number, number] {
  const [low, high] = stretch(values);
  const air = (high - low) * AIR;
  if (low >= 0 && low <= high * DOWN_TO_ZERO) return [0, high + air];
  if (high <= 0 && high >= low * DOWN_TO_ZERO) return [low - air, 0];
  return [low - air, high + air];
}

const axis = ([from, to]: readonly [number, number], most: number): Axis => ({
  from,
  to,
  ticks: ticks(from, to, most),
});

/** The axes that hold every line and every mark; null when there is nothing to draw. */
export function chartFrame(lines: readonly ChartLine[], marks: readonly { readonly x: number }[]): ChartFrame | null {
  const points = lines.flatMap(({ runs }) => runs.flat());
  if (points.length === 0) return null;
  const along = [...points.map(([x]) => x), ...marks.map(({ x }) => x).filter(Number.isFinite)];
  return { x: axis(stretch(along), MOST_X), y: axis(yStretch(points.map(([, y]) => y)), MOST_Y) };
}
