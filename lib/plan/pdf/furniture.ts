import { plan } from '@/lib/text/en/plan';
import { fill } from '@/lib/text/fill';
import { type PlanRevision, releaseDay } from '../drawing';
import type { TileOptions } from '../tiling/format';
import type { PageFormat } from '../tiling/grid';
import type { TilePage } from '../tiling/tileSheets';
import { bar } from './bars';
import type { Typefaces } from './fonts';
import { letter, line, lineStyle, shorten } from './ink';

// What stands around the window of a page: bars, names, page numbers, trim ticks. All of it outside the window.

const words = plan.page;

/** What every page says of the plan. */
export interface PlanNames {
  readonly design: string;
  readonly revision: PlanRevision | null;
  readonly pages: number;
}

/** The revision's state in words, short enough for a page's foot. */
export function stateWords(revision: PlanRevision | null): string {
  if (!revision) return words.draft;
  const states = {
    released: words.released,
    goodToCut: words.goodToCut,
    held: words.held,
  } as const;
  return fill(words.revision, {
    number: revision.number,
    date: releaseDay(revision),
    state: states[revision.state],
  });
}

/** Names and 50 mm bars of any page. */
export function pageFoot(faces: Typefaces, format: PageFormat, name: string, page: number, names: PlanNames): string {
  const [x0, y0, x1] = format.clipMm;
  const base = y0 - 10.4;
  const textX = x0 + 55;
  const state = stateWords(names.revision);
  const small = { face: 'mono', capMm: 1.8 } as const;
  const bold = { face: 'bold', capMm: 2.6 } as const;
  const pageOf = fill(words.ofPages, { page, pages: names.pages });
  const right = Math.max(faces.bold.width(state, bold.capMm), faces.mono.width(pageOf, small.capMm)) + 3;
  const room = x1 - textX - right;
  const level = { lengthMm: 50, label: words.bar, capMm: 1.8, everyMm: 10 } as const;
  return [
    bar(faces, { ...level, from: [x0, y0 - 8.8], upwards: false, labelSide: 'after' }),
    bar(faces, { ...level, from: [x0 - 6.6, y0], upwards: true, labelSide: 'after' }),
    letter(faces, shorten(faces, name, room, bold), [textX, base + 3.6], bold),
    letter(faces, shorten(faces, names.design, room, small), [textX, base + 0.4], small),
    letter(faces, state, [x1, base + 3.6], { ...bold, align: 'right' }),
    letter(faces, pageOf, [x1, base + 0.4], { ...small, align: 'right' }),
  ].join('\n');
}

/** Ticks where an edge that lies over its neighbour is cut, and the page that joins on each side. */
export function pageJoins(
  faces: Typefaces,
  tile: TilePage,
  pageOf: (index: number) => number,
  options: TileOptions,
): string {
  const [x0, y0, x1, y1] = tile.format.clipMm;
  const half = options.overlapMm / 2;
  const small = { face: 'mono', capMm: 1.8 } as const;
  const parts = [lineStyle(0.25)];
  const joins = (index: number | null): string => (index === null ? '' : fill(words.joinLeft, { page: pageOf(index) }));
  if (tile.joins.left !== null) {
    const x = x0 + half;
    parts.push(line([x, y0 - 0.6], [x, y0 - 3.4]), line([x, y1 + 0.6], [x, y1 + 3.4]));
    parts.push(
      letter(faces, words.trim, [x + 0.8, y0 - 3.2], small),
      letter(faces, words.trim, [x + 0.8, y1 + 1.2], small),
    );
  }
  if (tile.joins.below !== null) {
    const y = y0 + half;
    parts.push(line([x0 - 0.6, y], [x0 - 3.4, y]), line([x1 + 0.6, y], [x1 + 3.4, y]));
    parts.push(
      letter(faces, words.trim, [x0 - 1.2, y + 0.8], { ...small, angleDeg: 90 }),
      letter(faces, words.trim, [x1 + 2.9, y + 0.8], { ...small, angleDeg: 90 }),
    );
  }
  const [midX, midY] = [(x0 + x1) / 2, (y0 + y1) / 2];
  const centred = { ...small, align: 'centre' } as const;
  parts.push(
    letter(faces, joins(tile.joins.above), [midX, y1 + 1.2], centred),
    letter(faces, joins(tile.joins.below), [midX, y0 - 3.2], centred),
    letter(faces, joins(tile.joins.left), [x0 - 1.2, midY], { ...centred, angleDeg: 90 }),
    letter(faces, joins(tile.joins.right), [x1 + 2.9, midY], { ...centred, angleDeg: 90 }),
  );
  return parts.filter(Boolean).join('\n');
}
