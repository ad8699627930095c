import type { Vec2 } from '@/lib/numerics/vec';
import { pointToSegment, type Segment } from '../draw/segments';
import type { Cell, Grid } from './grid';

// Match marks: the same cross with the same letter on both pages of a seam, in the middle of their overlap.

export interface Mark {
  /** Sheet mm. */
  readonly at: Vec2;
  readonly letter: string;
}

/** A mark and its letter reach this far from its centre, mm. */
export const MARK_REACH_MM = 4;
/** Where along a seam marks are wanted, as shares of its length. */
const WANTED = [0.18, 0.82] as const;
const TRIES = 24;

/** A, B, ... Z, AA, AB, ... */
export function letterOf(index: number): string {
  const first = Math.floor(index / 26);
  return (first > 0 ? letterOf(first - 1) : '') + String.fromCharCode(65 + (index % 26));
}

interface Seam {
  readonly from: Vec2;
  readonly to: Vec2;
}

const seamBetween = (a: Cell, b: Cell, sizeMm: Vec2, overlapMm: number): Seam | null => {
  const half = overlapMm / 2;
  const [w, h] = sizeMm;
  if (b.row === a.row && b.col === a.col + 1) {
    const x = b.fromMm[0] + half;
    return { from: [x, a.fromMm[1] + overlapMm], to: [x, a.fromMm[1] + h - overlapMm] };
  }
  if (b.col === a.col && b.row === a.row + 1) {
    const y = a.fromMm[1] + half;
    return { from: [a.fromMm[0] + overlapMm, y], to: [a.fromMm[0] + w - overlapMm, y] };
  }
  return null;
};

const along = ({ from, to }: Seam, t: number): Vec2 => [
  from[0] + (to[0] - from[0]) * t,
  from[1] + (to[1] - from[1]) * t,
];

const clearance = (point: Vec2, lines: readonly Segment[]): number =>
  lines.reduce((least, line) => Math.min(least, pointToSegment(point, line)), Infinity);

/** The spot nearest to the one wanted where the mark crosses no line; the clearest there is when every spot is crowded. */
function spotOn(seam: Seam, wanted: number, lines: readonly Segment[]): Vec2 {
  const room = MARK_REACH_MM + 1.5;
  let best = { at: along(seam, wanted), clear: -1 };
  for (let k = 0; k <= TRIES; k++) {
    for (const sign of k === 0 ? [1] : [1, -1]) {
      const at = along(seam, Math.min(1, Math.max(0, wanted + (sign * k * 0.3) / TRIES)));
      const clear = Math.min(room, clearance(at, lines));
      if (clear > best.clear) best = { at, clear };
      if (best.clear >= room) return best.at;
    }
  }
  return best.at;
}

const round = (value: number): number => Math.round(value * 1000) / 1000;

/** Two marks for each seam between pages that are both printed. `lines` are what the marks should keep clear of, sheet mm. */
export function findMarks(grid: Grid, overlapMm: number, lines: readonly Segment[]): Mark[] {
  const [x0, y0, x1, y1] = grid.format.clipMm;
  const marks: Mark[] = [];
  for (const a of grid.cells) {
    for (const b of grid.cells) {
      const seam = seamBetween(a, b, [x1 - x0, y1 - y0], overlapMm);
      if (!seam) continue;
      for (const wanted of WANTED) {
        const [x, y] = spotOn(seam, wanted, lines);
        marks.push({ at: [round(x), round(y)], letter: letterOf(marks.length) });
      }
    }
  }
  return marks;
}
