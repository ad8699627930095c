import type { SetUpSheet } from '@/lib/figures/setUp';
import { setUpSections } from '@/lib/figures/setUpWords';
import { setUp as words } from '@/lib/text/en/setUp';
import type { PageFormat } from '../tiling/grid';
import { type Column, heading, paragraph } from './column';
import type { Typefaces } from './fonts';
import type { FrontPage } from './front';
import { box, lineStyle } from './ink';
import { flow, HEADING_MM, type Placed, ROW_STYLE, rowInk, textMm } from './rows';

// The set-up sheet on paper: a box to tick before each row.

const BOX_MM = 2.2;
const INDENT_MM = 4.6;
const CAUTION_STYLE = { face: 'bold', capMm: 2.2 } as const;
const TOP_GAP_MM = 3;

/** Height of title, caution and how to measure, on each page. */
const topMm = (widthMm: number): number =>
  HEADING_MM + textMm(words.caution, widthMm, CAUTION_STYLE) + textMm(words.how, widthMm, ROW_STYLE) + TOP_GAP_MM;

function topOf(faces: Typefaces, frame: Column, top: number): string {
  const head = heading(faces, words.title, frame, top);
  const caution = paragraph(faces, words.caution, frame, head.top, CAUTION_STYLE);
  const how = paragraph(faces, words.how, frame, caution.top, ROW_STYLE);
  return [head.ink, caution.ink, how.ink].join('\n');
}

/** A row with a box to tick before it. */
function tickRow(faces: Typefaces, row: Placed, frame: Column, from: number): string {
  const ink = rowInk(faces, row, frame, from, INDENT_MM);
  if (row.kind !== 'first') return ink;
  const middle = from - row.downMm - ROW_STYLE.capMm / 2;
  return [lineStyle(0.2), box(frame.x, middle - BOX_MM / 2, BOX_MM, BOX_MM, 'S'), ink].join('\n');
}

/** The set-up sheet's pages; none when nothing moves. The caution and how to measure stand on each. */
export function setUpPages(format: PageFormat, sheet: SetUpSheet): FrontPage[] {
  if (sheet.controls.length === 0) return [];
  const [x0, y0, x1, y1] = format.clipMm;
  const frame: Column = { x: x0, widthMm: x1 - x0 };
  const top = y1 - 2;
  const from = top - topMm(frame.widthMm);
  const sections = setUpSections(sheet).map(({ title, rows }) => ({ title, rows: rows.map(({ text }) => text) }));
  const roomMm = (): number => Math.max(0, from - y0);
  return flow(sections, { widthMm: frame.widthMm - INDENT_MM, roomMm, whole: true }).map(
    (rows): FrontPage => ({
      kind: 'legend',
      name: words.page,
      ink: (faces) => [topOf(faces, frame, top), ...rows.map((row) => tickRow(faces, row, frame, from))].join('\n'),
    }),
  );
}
