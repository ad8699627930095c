import { radFromDeg, type Vec2 } from '@/lib/numerics/vec';
import type { Drawing, DrawnLine, DrawnText } from '../drawing';

// Where there is something to print, on a millimetre raster with running sums: asking about a window costs the same at any size.

export interface Occupancy {
  /** Lower left and upper right of everything that has to be printed, with a little room around it, mm. */
  readonly boundsMm: readonly [Vec2, Vec2];
  /** True when the window holds ink that has to be printed. */
  readonly any: (windowMm: readonly [x0: number, y0: number, x1: number, y1: number]) => boolean;
}

/** Room around the outermost line, mm, so that half a stroke never falls on a page's edge. */
const RIM_MM = 2;

/** A text takes its room along its baseline; a letter is about 0.9 of a capital's height wide at most. */
export const baseline = ({ at, text, heightMm, angleDeg, align }: DrawnText): Pick<DrawnLine, 'points' | 'closed'> => {
  const length = text.length * heightMm * 0.9;
  const before = align === 'left' ? 0 : align === 'centre' ? length / 2 : length;
  const [dx, dy] = [Math.cos(radFromDeg(angleDeg)), Math.sin(radFromDeg(angleDeg))];
  const end = (along: number): Vec2 => [at[0] + dx * along, at[1] + dy * along];
  return { points: [end(-before), end(length - before)], closed: false };
};

/** The sheet's own edge is drawn where a page shows it and is no reason for a page. Nor is a text: labels look for a page that there is. */
const matters = (line: DrawnLine): boolean => line.type !== 'sheetEdge';

/** The raster of a drawing, or null when there is nothing on it. */
export function occupancyOf(drawing: Drawing): Occupancy | null {
  const lines = drawing.lines.filter(matters);
  const points = lines.flatMap((line) => line.points);
  if (points.length === 0) return null;
  const low: Vec2 = [Math.min(...points.map(([x]) => x)) - RIM_MM, Math.min(...points.map(([, y]) => y)) - RIM_MM];
  const high: Vec2 = [Math.max(...points.map(([x]) => x)) + RIM_MM, Math.max(...points.map(([, y]) => y)) + RIM_MM];
  const cols = Math.ceil(high[0] - low[0]) + 1;
  const rows = Math.ceil(high[1] - low[1]) + 1;
  // One column and row more than cells: sums[r][c] counts the marked cells below r and left of c.
  const sums = new Uint32Array((cols + 1) * (rows + 1));
  const mark = ([x, y]: Vec2): void => {
    sums[(Math.floor(y - low[1]) + 1) * (cols + 1) + Math.floor(x - low[0]) + 1] = 1;
  };
  for (const { points: path, closed } of lines) {
    path.forEach((from, i) => {
      const to = path[i + 1] ?? (closed ? path[0] : undefined);
      if (!to) {
        mark(from);
        return;
      }
      const steps = Math.ceil(Math.hypot(to[0] - from[0], to[1] - from[1]) / 0.5) || 1;
      for (let k = 0; k <= steps; k++) {
        mark([from[0] + ((to[0] - from[0]) * k) / steps, from[1] + ((to[1] - from[1]) * k) / steps]);
      }
    });
  }
  const at = (row: number, col: number): number => sums[row * (cols + 1) + col] ?? 0;
  for (let row = 1; row <= rows; row++) {
    for (let col = 1; col <= cols; col++) {
      sums[row * (cols + 1) + col] = at(row, col) + at(row - 1, col) + at(row, col - 1) - at(row - 1, col - 1);
    }
  }
  const clampTo = (value: number, top: number) => Math.min(Math.max(value, 0), top);
  return {
    boundsMm: [low, high],
    any: ([x0, y0, x1, y1]) => {
      const c0 = clampTo(Math.floor(x0 - low[0]), cols);
      const c1 = clampTo(Math.ceil(x1 - low[0]), cols);
      const r0 = clampTo(Math.floor(y0 - low[1]), rows);
      const r1 = clampTo(Math.ceil(y1 - low[1]), rows);
      if (c1 <= c0 || r1 <= r0) return false;
      return at(r1, c1) - at(r0, c1) - at(r1, c0) + at(r0, c0) > 0;
    },
  };
}
