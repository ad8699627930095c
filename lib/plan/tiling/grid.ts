import type { Vec2 } from '@/lib/numerics/vec';
import type { Occupancy } from './occupancy';

// Which pages a sheet needs: both orientations of the paper and every offset of the grid by 5 mm are tried.

/** A page's own geometry, mm. */
export interface PageFormat {
  readonly mediaMm: Vec2;
  /** Window in which sheet content is drawn, from the page's lower left. */
  readonly clipMm: readonly [x0: number, y0: number, x1: number, y1: number];
}

export interface Cell {
  /** From 0 at the top of the sheet, as pages are read. */
  readonly row: number;
  /** From 0 at the left. */
  readonly col: number;
  /** Window on the sheet that this page shows, lower left, mm. */
  readonly fromMm: Vec2;
  /** The part of the window that only this page answers for; cells of a grid meet without a gap. */
  readonly coreMm: readonly [x0: number, y0: number, x1: number, y1: number];
}

export interface Grid {
  readonly format: PageFormat;
  readonly rows: number;
  readonly cols: number;
  /** The cells that hold something to print, by row, then column. */
  readonly cells: readonly Cell[];
}

const OFFSET_STEP_MM = 5;

interface Line {
  /** Where the first window begins. */
  readonly startMm: number;
  readonly count: number;
}

/** Ways to lay windows of a size over [low, high] with an overlap: every start by 5 mm that still covers both ends. */
function waysAcross(low: number, high: number, windowMm: number, overlapMm: number): Line[] {
  const step = windowMm - overlapMm;
  const ways: Line[] = [];
  for (let back = 0; back < step; back += OFFSET_STEP_MM) {
    const length = high - low + back;
    const count = Math.max(1, Math.ceil((length - overlapMm) / step - 1e-9));
    // The same number of pages with the slack shared out evenly looks better than all of it at one end; kept as the first way.
    if (back === 0) {
      ways.push({ startMm: low - (count * step + overlapMm - length) / 2, count });
    }
    ways.push({ startMm: low - back, count });
  }
  return ways;
}

const coreOf = (line: Line, i: number, windowMm: number, overlapMm: number): [number, number] => {
  const step = windowMm - overlapMm;
  const from = line.startMm + i * step;
  const low = i === 0 ? from : from + overlapMm / 2;
  const high = i === line.count - 1 ? from + windowMm : from + windowMm - overlapMm / 2;
  return [low, high];
};

/** The cells with ink, or null as soon as there are more than `most`. */
function cellsOf(
  format: PageFormat,
  across: Line,
  up: Line,
  overlapMm: number,
  ink: Occupancy,
  most: number,
): Cell[] | null {
  const [x0, y0, x1, y1] = format.clipMm;
  const [w, h] = [x1 - x0, y1 - y0];
  const cells: Cell[] = [];
  for (let row = 0; row < up.count; row++) {
    const fromBottom = up.count - 1 - row;
    const [coreY0, coreY1] = coreOf(up, fromBottom, h, overlapMm);
    for (let col = 0; col < across.count; col++) {
      const [coreX0, coreX1] = coreOf(across, col, w, overlapMm);
      const coreMm: Cell['coreMm'] = [coreX0, coreY0, coreX1, coreY1];
      if (!ink.any(coreMm)) continue;
      if (cells.length === most) return null;
      const fromMm: Vec2 = [across.startMm + col * (w - overlapMm), up.startMm + fromBottom * (h - overlapMm)];
      cells.push({ row, col, fromMm, coreMm });
    }
  }
  return cells;
}

/**
 * The grid with the fewest pages that shows all ink, cells without ink left out. Among equals the one with fewer cells wins,
 * then the format that comes first. Windows must be wider and higher than the overlap.
 */
export function findGrid(formats: readonly PageFormat[], overlapMm: number, ink: Occupancy): Grid {
  const [low, high] = ink.boundsMm;
  let best: Grid | null = null;
  for (const format of formats) {
    const [x0, y0, x1, y1] = format.clipMm;
    for (const across of waysAcross(low[0], high[0], x1 - x0, overlapMm)) {
      for (const up of waysAcross(low[1], high[1], y1 - y0, overlapMm)) {
        const area = across.count * up.count;
        const cells = cellsOf(format, across, up, overlapMm, ink, best?.cells.length ?? Infinity);
        if (!cells || (best && cells.length === best.cells.length && area >= best.rows * best.cols)) continue;
        best = { format, rows: up.count, cols: across.count, cells };
      }
    }
  }
  if (!best) throw new RangeError('no page format was given');
  return best;
}
