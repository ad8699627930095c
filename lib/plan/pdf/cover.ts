import { plan } from '@/lib/text/en/plan';
import { fill } from '@/lib/text/fill';
import { cgFigures, estimateFigures } from '../cardFigures';
import { throwRows } from '../throwRows';
import type { PageFormat } from '../tiling/grid';
import { bar } from './bars';
import { type Column, heading, paragraph } from './column';
import {
  CHECK_MM,
  coverRoom,
  LIST_GUTTER_MM,
  LIST_ROW_MM,
  LIST_STYLE,
  listWidthsMm,
  rowsThatFit,
  TITLE_MM,
} from './coverRoom';
import { FIGURE_ROW_MM, figureRow } from './figureRow';
import type { Typefaces } from './fonts';
import type { FrontContext, FrontInput } from './front';
import { type PlanNames, stateWords } from './furniture';
import { letter, lineStyle, path, shorten, wrap } from './ink';
import { legend } from './legend';
import type { Frame } from './map';
import { fittedLine, HEADING_MM } from './rows';
import { throwTable } from './throwTable';

const words = plan.cover;

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
  most: number,
  column: Column,
  top: number,
): string {
  const head = heading(faces, title, column, top);
  const { lines, rest } = rowsThatFit(rows, column.widthMm, most);
  const more = rest > 0 ? [fill(plan.build.moreThere, { count: rest, page: plan.page.notes })] : [];
  const ink = [...lines, ...more].map((text, i) =>
    fittedLine(faces, text, column, head.top - LIST_STYLE.capMm - i * LIST_ROW_MM, LIST_STYLE),
  );
  return [head.ink, ...ink].join('\n');
}

/** The card itself, from the title down: estimates, where the CG is marked, throws, what to gather, and what else to set. */
function builderCard(faces: Typefaces, format: PageFormat, input: FrontInput, frame: Frame): string {
  const { figures, build } = input;
  const room = coverRoom(format, input);
  const whole: Column = { x: frame.x, widthMm: frame.w };
  const row = (top: number): Frame => ({ x: frame.x, y: top - FIGURE_ROW_MM, w: frame.w, h: FIGURE_ROW_MM });
  const cgTop = frame.y + frame.h - FIGURE_ROW_MM;
  const cgHead = heading(faces, words.cgTitle, whole, cgTop);
  const throwsTop = cgTop - HEADING_MM - FIGURE_ROW_MM;
  const throws =
    figures?.setUp && room.throwRows > 0
      ? throwTable(faces, throwRows(figures.setUp), room.throwRows, whole, throwsTop)
      : { ink: '', top: throwsTop };
  const widths = listWidthsMm(format);
  const left: Column = { x: frame.x, widthMm: widths.need };
  const right: Column = { x: left.x + left.widthMm + LIST_GUTTER_MM, widthMm: widths.setUp };
  return [
    figureRow(faces, estimateFigures(figures), row(frame.y + frame.h)),
    cgHead.ink,
    figureRow(faces, cgFigures(figures), row(cgHead.top)),
    throws.ink,
    ...(build
      ? [
          list(faces, plan.build.need, build.need, room.listLines, left, throws.top),
          list(
            faces,
            figures?.setUp ? plan.build.alsoSet : plan.build.setUp,
            build.setUp,
            room.listLines,
            right,
            throws.top,
          ),
        ]
      : []),
  ].join('\n');
}

/** The first page: the builder's card, then check bars, legend, how to print, and cautions. */
export function cover(faces: Typefaces, format: PageFormat, input: FrontInput, { names }: FrontContext): string {
  const [x0, y0, x1, y1] = format.clipMm;
  const frame: Frame = { x: x0, y: y0, w: x1 - x0, h: y1 - y0 };
  const column: Column = { x: frame.x + CHECK_MM + 6, widthMm: Math.min(90, frame.w - CHECK_MM - 6) };
  return [
    title(faces, names, frame),
    builderCard(faces, format, input, { ...frame, h: frame.h - TITLE_MM }),
    checks(faces, input, frame.x, frame.y),
    advice(faces, column, y0 + CHECK_MM),
  ].join('\n');
}
