import type { Box } from '../draw/room';
import type { Drawing, Paper } from '../drawing';
import type { TileOptions } from './format';
import { type TiledSheet, type TilePage, tileSheets } from './tileSheets';

/** Room kept from a window's edge where no page joins, mm: half a stroke and a bad printer. */
const RIM_MM = 2;

/** What a page shows of its sheet, less the strips that its neighbours cover or that are trimmed off. */
function windowOf({ cell, format, joins }: TilePage, overlapMm: number): Box {
  const [x0, y0, x1, y1] = format.clipMm;
  const [left, bottom] = cell.fromMm;
  const inset = (joined: number | null): number => (joined === null ? RIM_MM : overlapMm);
  return [
    left + inset(joins.left),
    bottom + inset(joins.below),
    left + (x1 - x0) - inset(joins.right),
    bottom + (y1 - y0) - inset(joins.above),
  ];
}

/** Of each sheet, by its id, the rectangles that are seen whole on one page away from its seams, sheet mm. */
export function windowsOf(
  sheets: readonly TiledSheet[],
  { overlapMm }: TileOptions,
): ReadonlyMap<string, readonly Box[]> {
  return new Map(sheets.map(({ drawing, pages }) => [drawing.id, pages.map((page) => windowOf(page, overlapMm))]));
}

/** As `windowsOf`, with the number of pages that the drawings take. Only their lines decide, never their texts. */
export function pageWindows(
  drawings: readonly Drawing[],
  paper: Paper,
  options: TileOptions,
): { readonly pages: number; readonly windows: ReadonlyMap<string, readonly Box[]> } {
  const sheets = tileSheets(drawings, paper, options);
  return { pages: sheets.reduce((sum, { pages }) => sum + pages.length, 0), windows: windowsOf(sheets, options) };
}
