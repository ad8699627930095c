import { plan } from '@/lib/text/en/plan';
import { fill } from '@/lib/text/fill';
import type { BuildNotes } from '../buildNotes';
import type { PageFormat } from '../tiling/grid';
import type { TiledSheet } from '../tiling/tileSheets';
import { bar } from './bars';
import { type Column, heading, paragraph } from './column';
import { estimates } from './estimates';
import type { Typefaces } from './fonts';
import type { FrontContext, FrontInput } from './front';
import { type PlanNames, stateWords } from './furniture';
import { letter, lineStyle, path, shorten, wrap } from './ink';
import { legend } from './legend';
import { type Frame, map } from './map';

const words = plan.cover;

/** Sheets on the first page's map; the rest go on map pages. */
const MAP_FIRST = 6;
const MAP_MORE = 20;

/** How many pages of maps follow the first page. */
export const mapPages = (sheetCount: number): number => Math.ceil(Math.max(0, sheetCount - MAP_FIRST) / MAP_MORE);

const CHECK_MM = 118;
const TITLE_MM = 14;
const ESTIMATES_MM = 20;
const ROW_MM = 3.5;
/** Lines of a list on the first page; the last of a longer one counts the rest. */
const MOST_ROWS = 9;

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
function checks(faces: Typefaces, { sheets }: FrontInput, x: number, y: number): string {
  const [x0, y0] = [x + 13, y + 13];
  const metric = { lengthMm: 100, label: words.bar100, capMm: 2, everyMm: 10, labelSide: 'after' } as const;
  const inch = { lengthMm: 101.6, label: words.bar4in, capMm: 2, everyMm: 25.4, labelSide: 'after' } as const;
  const inside: Column = { x: x0 + 10, widthMm: 86 };
  const head = heading(faces, words.legend, inside, y0 + 100);
  const drawings = sheets.map(({ drawing }) => drawing);
  return [
    bar(faces, { ...metric, from: [x0, y0], upwards: false }),
    bar(faces, { ...metric, from: [x0, y0], upwards: true }),
    bar(faces, { ...inch, from: [x0, y0 - 8], upwards: false }),
    bar(faces, { ...inch, from: [x0 - 8, y0], upwards: true }),
    head.ink,
    legend(faces, drawings, inside, head.top),
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
  add(heading(faces, words.cautions, column, at), 0);
  for (const caution of plan.cautions) add(paragraph(faces, caution, column, at, text), 1);
  return ink.join('\n');
}

function list(
  faces: Typefaces,
  title: string,
  rows: readonly string[],
  column: Column,
  top: number,
): { ink: string; top: number } {
  const style = { face: 'text', capMm: 1.8 } as const;
  const head = heading(faces, title, column, top);
  const shown = rows.length > MOST_ROWS ? rows.slice(0, MOST_ROWS - 1) : rows;
  const rest = rows.length - shown.length;
  const lines = rest > 0 ? [...shown, fill(plan.build.more, { count: rest })] : shown;
  const ink = lines.map((text, i) =>
    letter(faces, shorten(faces, text, column.widthMm, style), [column.x, head.top - style.capMm - i * ROW_MM], style),
  );
  return { ink: [head.ink, ...ink].join('\n'), top: head.top - lines.length * ROW_MM - 2 };
}

/** What to gather on the left, how to set it up on the right. */
function lists(faces: Typefaces, build: BuildNotes | null, frame: Column, top: number): { ink: string; top: number } {
  if (!build) return { ink: '', top };
  const widthMm = (frame.widthMm - 8) / 2;
  const need = list(faces, plan.build.need, build.need, { x: frame.x, widthMm }, top);
  const setUp = list(faces, plan.build.setUp, build.setUp, { x: frame.x + widthMm + 8, widthMm }, top);
  return { ink: [need.ink, setUp.ink].join('\n'), top: Math.min(need.top, setUp.top) };
}

/** The first page: name and state, estimates, what to gather and set, map, check bars, legend, how to print, cautions. */
export function cover(faces: Typefaces, format: PageFormat, input: FrontInput, context: FrontContext): string {
  const [x0, y0, x1, y1] = format.clipMm;
  const frame: Frame = { x: x0, y: y0, w: x1 - x0, h: y1 - y0 };
  const whole: Column = { x: frame.x, widthMm: frame.w };
  const figuresTop = y1 - TITLE_MM;
  const build = lists(faces, input.build, whole, figuresTop - ESTIMATES_MM);
  const mapHead = heading(faces, words.map, whole, build.top);
  const mapBottom = y0 + CHECK_MM + 4;
  const mapFrame: Frame = { x: frame.x, y: mapBottom, w: frame.w, h: Math.max(20, mapHead.top - mapBottom) };
  const column: Column = { x: frame.x + CHECK_MM + 6, widthMm: Math.min(90, frame.w - CHECK_MM - 6) };
  const more = mapPages(input.sheets.length) > 0;
  return [
    title(faces, context.names, frame),
    estimates(faces, input.figures, { x: frame.x, y: figuresTop - ESTIMATES_MM, w: frame.w, h: ESTIMATES_MM }),
    build.ink,
    mapHead.ink,
    more
      ? letter(faces, fill(words.mapMore, { page: 2 }), [x1, build.top - 2.5], {
          face: 'mono',
          capMm: 1.8,
          align: 'right',
        })
      : '',
    map(faces, input.sheets.slice(0, MAP_FIRST), mapFrame, context.pageOf),
    checks(faces, input, frame.x, frame.y),
    advice(faces, column, y0 + CHECK_MM),
  ]
    .filter(Boolean)
    .join('\n');
}

/** A further page of maps; `index` counts from 0 for the first after the first page. */
export function mapPage(
  faces: Typefaces,
  format: PageFormat,
  sheets: readonly TiledSheet[],
  pageOf: (index: number) => number,
  index: number,
): string {
  const [x0, y0, x1, y1] = format.clipMm;
  const first = MAP_FIRST + index * MAP_MORE;
  const head = heading(faces, words.map, { x: x0, widthMm: x1 - x0 }, y1 - 2);
  const frame: Frame = { x: x0, y: y0 + 2, w: x1 - x0, h: head.top - y0 - 2 };
  return [head.ink, map(faces, sheets.slice(first, first + MAP_MORE), frame, pageOf)].join('\n');
}
