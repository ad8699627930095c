import type { Vec2 } from '@/lib/numerics/vec';
import { segmentsOf } from '../draw/segments';
import type { Drawing, Paper } from '../drawing';
import type { ManifestPage } from '../manifest';
import { formatsOf, type TileOptions } from './format';
import { type Cell, findGrid, type PageFormat } from './grid';
import { findMarks, type Mark } from './marks';
import { baseline, occupancyOf } from './occupancy';

/** One printed page of a sheet. */
export interface TilePage {
  /** From 0 among the tiles of the whole plan. */
  readonly index: number;
  readonly cell: Cell;
  readonly format: PageFormat;
  readonly pageFromSheet: ManifestPage['page_from_sheet'];
  /** Marks that fall on this page, sheet mm. */
  readonly marks: readonly Mark[];
  /** Index of the page that joins on each side, where there is one. */
  readonly joins: Readonly<Record<'left' | 'right' | 'above' | 'below', number | null>>;
}

export interface TiledSheet {
  readonly drawing: Drawing;
  readonly pages: readonly TilePage[];
}

const roundMm = (value: number): number => Math.round(value * 1000) / 1000;

function tileSheet(drawing: Drawing, paper: Paper, options: TileOptions, firstIndex: number): TiledSheet {
  const ink = occupancyOf(drawing);
  if (!ink) return { drawing, pages: [] };
  const grid = findGrid(formatsOf(paper, options), options.overlapMm, ink);
  const drawn = [...drawing.lines, ...drawing.texts.map(baseline)];
  const segments = drawn.flatMap(({ points, closed }) => segmentsOf(points, closed));
  const marks = findMarks(grid, options.overlapMm, segments);
  const indexAt = (row: number, col: number): number | null => {
    const found = grid.cells.findIndex((cell) => cell.row === row && cell.col === col);
    return found < 0 ? null : firstIndex + found;
  };
  const [x0, y0, x1, y1] = grid.format.clipMm;
  const pages = grid.cells.map((cell, i): TilePage => {
    const shift: Vec2 = [roundMm(x0 - cell.fromMm[0]), roundMm(y0 - cell.fromMm[1])];
    const shows = ([x, y]: Vec2): boolean =>
      x + shift[0] > x0 && x + shift[0] < x1 && y + shift[1] > y0 && y + shift[1] < y1;
    return {
      index: firstIndex + i,
      cell,
      format: grid.format,
      pageFromSheet: [1, 0, 0, 1, shift[0], shift[1]],
      marks: marks.filter(({ at }) => shows(at)),
      joins: {
        left: indexAt(cell.row, cell.col - 1),
        right: indexAt(cell.row, cell.col + 1),
        above: indexAt(cell.row - 1, cell.col),
        below: indexAt(cell.row + 1, cell.col),
      },
    };
  });
  return { drawing, pages };
}

/** Cuts every drawing into pages of the paper, by sheet, row and column; pages without anything to print are left out. */
export function tileSheets(drawings: readonly Drawing[], paper: Paper, options: TileOptions): TiledSheet[] {
  let index = 0;
  return drawings.map((drawing) => {
    const tiled = tileSheet(drawing, paper, options, index);
    index += tiled.pages.length;
    return tiled;
  });
}
