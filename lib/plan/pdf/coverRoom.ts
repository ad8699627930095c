import { throwRows } from '../throwRows';
import type { PageFormat } from '../tiling/grid';
import { FIGURE_ROW_MM } from './figureRow';
import type { FrontInput } from './front';
import { HEADING_MM, linesIn } from './rows';
import { throwRowsIn, throwTableMm } from './throwTable';

// What the first page has room for, known before the fonts are: what it cannot hold goes on the page after it.

/** Height of the check bars, with legend and cautions beside them, at the foot of the page. */
export const CHECK_MM = 116;
export const TITLE_MM = 14;
export const LIST_STYLE = { face: 'text', capMm: 1.9 } as const;
export const LIST_ROW_MM = 3.7;
export const LIST_GUTTER_MM = 8;
/** Lines that both lists are given before the table of throws gets more than one row. */
const LEAST_LINES = 5;
const LIST_END_MM = 3;

export interface CoverRoom {
  readonly throwRows: number;
  /** Lines of each list. */
  readonly listLines: number;
}

/** How the height between the title and the check bars is shared out. */
export function coverRoom(format: PageFormat, { figures }: Pick<FrontInput, 'figures'>): CoverRoom {
  const [, y0, , y1] = format.clipMm;
  const roomMm = y1 - y0 - TITLE_MM - CHECK_MM - 2 * FIGURE_ROW_MM - HEADING_MM;
  const listMm = (lines: number): number => HEADING_MM + lines * LIST_ROW_MM + LIST_END_MM;
  const wanted = figures?.setUp ? throwRows(figures.setUp).length : 0;
  const rows = Math.min(wanted, Math.max(1, throwRowsIn(roomMm - listMm(LEAST_LINES))));
  const leftMm = roomMm - (rows > 0 ? throwTableMm(rows) : 0) - listMm(0);
  return { throwRows: rows, listLines: Math.max(1, Math.floor(leftMm / LIST_ROW_MM)) };
}

/** Of the width: what is gathered takes less than what is set. */
const NEED_SHARE = 0.42;

/** Widths of both lists: what to gather, and what to set. */
export function listWidthsMm({ clipMm: [x0, , x1] }: PageFormat): { need: number; setUp: number } {
  const room = x1 - x0 - LIST_GUTTER_MM;
  return { need: room * NEED_SHARE, setUp: room * (1 - NEED_SHARE) };
}

/** As many whole rows as fit, in lines, with a line left for counting the rest. */
export function rowsThatFit(
  rows: readonly string[],
  widthMm: number,
  most: number,
): { lines: readonly string[]; rest: number } {
  const wrapped = rows.map((row) => linesIn(row, widthMm, LIST_STYLE));
  if (wrapped.flat().length <= most) return { lines: wrapped.flat(), rest: 0 };
  const lines: string[] = [];
  for (const [i, row] of wrapped.entries()) {
    if (lines.length + row.length > most - 1) return { lines, rest: rows.length - i };
    lines.push(...row);
  }
  return { lines, rest: 0 };
}
