import type { Figures } from '@/lib/figures/types';
import { plan } from '@/lib/text/en/plan';
import { fill } from '@/lib/text/fill';
import type { PageFormat } from '../tiling/grid';
import type { TiledSheet } from '../tiling/tileSheets';
import { bar } from './bars';
import { type Column, heading, paragraph } from './column';
import { estimates } from './estimates';
import type { Typefaces } from './fonts';
import { type PlanNames, stateWords } from './furniture';
import { letter, lineStyle, path, shorten, wrap } from './ink';
import { legend } from './legend';
import { type Frame, map } from './map';

const words = plan.cover;

/** Sheets on the first page's map; the rest go on map pages. */
const MAP_FIRST = 6;
const MAP_MORE = 20;

export interface CoverInput {
  readonly names: PlanNames;
  readonly figures: Figures | null;
  readonly sheets: readonly TiledSheet[];
  readonly pageOf: (index: number) => number;
  /** What the airframe holds and the sheets do not show, in words. */
  readonly notDrawn: readonly string[];
}

/** How many pages stand before the first tile. */
export function coverPages(sheetCount: number): number {
  return 1 + Math.ceil(Math.max(0, sheetCount - MAP_FIRST) / MAP_MORE);
}

const CHECK_MM = 118;
const TITLE_MM = 14;
const ESTIMATES_MM = 20;

function title(faces: Typefaces, { design, revision }: PlanNames, frame: Frame): string {
  const top = frame.y + frame.h;
  const state = { face: 'bold', capMm: revision ? 2.6 : 5 } as const;
  const stateText = stateWords(revision);
  const room = frame.w - faces.bold.width(stateText, state.capMm) - 6;
  const natural = faces.bold.width(design, 6);
  // A long name shrinks first, then takes two lines.
  const name = { face: 'bold', capMm: Math.min(6, Math.max(3.2, (6 * room) / natural)) } as const;
  const lines = wrap(faces, design, room, name);
  const [first = '', second] = lines.length > 2 ? [lines[0], lines.slice(1).join(' ')] : lines;
  const rule = top - 9.4;
  return [
    letter(faces, first, [frame.x, second === undefined ? top - 6.6 : top - 3], name),
    second === undefined ? '' : letter(faces, shorten(faces, second, room, name), [frame.x, top - 7.6], name),
    letter(faces, stateText, [frame.x + frame.w, top - 6.6], { ...state, align: 'right' }),
    lineStyle(0.25),
    path(
      [
        [frame.x, rule + 1.4],
        [frame.x + 1.4, rule],
        [frame.x + frame.w, rule],
      ],
      false,
    ),
  ].join('\n');
}

/** The 100 mm and 4 in bars along two sides of a square, with the legend inside it. */
function checkAndLegend(faces: Typefaces, input: CoverInput, x: number, y: number): string {
  const [x0, y0] = [x + 13, y + 13];
  const metric = { lengthMm: 100, label: words.bar100, capMm: 2, everyMm: 10, labelSide: 'after' } as const;
  const inch = { lengthMm: 101.6, label: words.bar4in, capMm: 2, everyMm: 25.4, labelSide: 'after' } as const;
  const inside: Column = { x: x0 + 8, widthMm: 92 };
  const head = heading(faces, words.legend, inside, y0 + 100);
  return [
    bar(faces, { ...metric, from: [x0, y0], upwards: false }),
    bar(faces, { ...metric, from: [x0, y0], upwards: true }),
    bar(faces, { ...inch, from: [x0, y0 - 8], upwards: false }),
    bar(faces, { ...inch, from: [x0 - 8, y0], upwards: true }),
    head.ink,
    legend(
      faces,
      input.sheets.map(({ drawing }) => drawing),
      inside,
      head.top,
    ),
  ].join('\n');
}

function advice(faces: Typefaces, column: Column, top: number): string {
  const text = { face: 'text', capMm: 1.9 } as const;
  const ink: string[] = [];
  let at = top;
  const add = (made: { ink: string; top: number }, gap: number): void => {
    ink.push(made.ink);
    at = made.top - gap;
  };
  add(heading(faces, words.printTitle, column, at), 0);
  add(paragraph(faces, words.printWords, column, at, text), 2.4);
  add(heading(faces, words.joining, column, at), 0);
  add(paragraph(faces, words.joiningWords, column, at, text), 2.4);
  add(heading(faces, words.cautions, column, at), 0);
  for (const caution of plan.cautions) add(paragraph(faces, caution, column, at, text), 1);
  return ink.join('\n');
}

function notDrawn(
  faces: Typefaces,
  items: readonly string[],
  column: Column,
  top: number,
): { ink: string; top: number } {
  if (items.length === 0) return { ink: '', top };
  const text = { face: 'text', capMm: 1.8 } as const;
  const head = heading(faces, words.notDrawn, column, top);
  const shown = items.length > 4 ? items.slice(0, 3) : items;
  const rest = items.length - shown.length;
  const lines = rest > 0 ? [...shown, fill(words.notDrawnMore, { count: rest })] : shown;
  const ink = [head.ink];
  let at = head.top;
  for (const item of lines) {
    ink.push(letter(faces, shorten(faces, item, column.widthMm, text), [column.x, at - text.capMm], text));
    at -= 3.4;
  }
  return { ink: ink.join('\n'), top: at - 2 };
}

/** The first page: name and state, estimates, map, check bars, legend, how to print and join, cautions. */
export function cover(faces: Typefaces, format: PageFormat, input: CoverInput): string {
  const [x0, y0, x1, y1] = format.clipMm;
  const frame: Frame = { x: x0, y: y0, w: x1 - x0, h: y1 - y0 };
  const whole: Column = { x: frame.x, widthMm: frame.w };
  const figuresTop = y1 - TITLE_MM;
  const missing = notDrawn(faces, input.notDrawn, whole, figuresTop - ESTIMATES_MM);
  const mapHead = heading(faces, words.map, whole, missing.top);
  const mapBottom = y0 + CHECK_MM + 4;
  const mapFrame: Frame = { x: frame.x, y: mapBottom, w: frame.w, h: Math.max(20, mapHead.top - mapBottom) };
  const column: Column = { x: frame.x + CHECK_MM + 6, widthMm: Math.min(90, frame.w - CHECK_MM - 6) };
  const more = coverPages(input.sheets.length) > 1;
  return [
    title(faces, input.names, frame),
    estimates(faces, input.figures, { x: frame.x, y: figuresTop - ESTIMATES_MM, w: frame.w, h: ESTIMATES_MM }),
    missing.ink,
    mapHead.ink,
    more
      ? letter(faces, fill(words.mapMore, { page: 2 }), [x1, missing.top - 2.5], {
          face: 'mono',
          capMm: 1.8,
          align: 'right',
        })
      : '',
    map(faces, input.sheets.slice(0, MAP_FIRST), mapFrame, input.pageOf),
    checkAndLegend(faces, input, frame.x, frame.y),
    advice(faces, column, y0 + CHECK_MM),
  ]
    .filter(Boolean)
    .join('\n');
}

/** A further map page; `page` counts from 1 for the first after the cover. */
export function mapPage(faces: Typefaces, format: PageFormat, input: CoverInput, page: number): string {
  const [x0, y0, x1, y1] = format.clipMm;
  const first = MAP_FIRST + (page - 1) * MAP_MORE;
  const head = heading(faces, words.map, { x: x0, widthMm: x1 - x0 }, y1 - 2);
  const frame: Frame = { x: x0, y: y0 + 2, w: x1 - x0, h: head.top - y0 - 2 };
  return [head.ink, map(faces, input.sheets.slice(first, first + MAP_MORE), frame, input.pageOf)].join('\n');
}
