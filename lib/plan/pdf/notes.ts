import { plan } from '@/lib/text/en/plan';
import { fill } from '@/lib/text/fill';
import type { PageFormat } from '../tiling/grid';
import { joinChecks } from '../tiling/joinChecks';
import type { TiledSheet } from '../tiling/tileSheets';
import { card, ID1_MM } from './card';
import { type Column, heading, paragraph } from './column';
import { coverRoom, listWidthsMm, rowsThatFit } from './coverRoom';
import type { Typefaces } from './fonts';
import type { FrontInput, FrontPage } from './front';
import { type Frame, map } from './map';
import { mapPages } from './mapPages';
import { endMm, flow, HEADING_MM, rowInk, type Section } from './rows';

// The pages for the bench: a card to check the scale, how to join, lengths to measure, and the key of marks on small parts.

const words = plan.cover;

/** Height of card and joining on top of the first of these pages. */
const TOP_MM = 78;

/** A map lower than this is too small to read; more sheets than these are. */
const LEAST_MAP_MM = 60;
const MOST_SHEETS = 6;
const MAP_GAP_MM = 4;

const keyRows = (sheets: readonly TiledSheet[]): string[] =>
  sheets.flatMap(({ drawing: { name: sheet, key } }) =>
    key.map(({ mark, text }) =>
      mark === null ? fill(words.keyBare, { sheet, text }) : fill(words.keyMarked, { sheet, mark, text }),
    ),
  );

function topOf(faces: Typefaces, input: FrontInput, frame: Column, top: number): string {
  const text = { face: 'text', capMm: 1.9 } as const;
  const scale: Column = { x: frame.x, widthMm: ID1_MM[0] };
  const x = scale.x + scale.widthMm + 10;
  const joining: Column = { x, widthMm: frame.x + frame.widthMm - x };
  const scaleHead = heading(faces, words.cardTitle, scale, top);
  const said = paragraph(faces, words.card, scale, scaleHead.top, text);
  const joinHead = heading(faces, words.joining, joining, top);
  const ink = [scaleHead.ink, said.ink, card([scale.x, said.top - 2 - ID1_MM[1]]), joinHead.ink];
  let at = joinHead.top;
  for (const line of words.joiningWords) {
    const made = paragraph(faces, fill(line, { overlap: input.overlapMm }), joining, at, text);
    ink.push(made.ink);
    at = made.top - 1.4;
  }
  return ink.join('\n');
}

/** Lists that the first page has no room for, in full. */
function cutLists(format: PageFormat, input: FrontInput): Section[] {
  const { build } = input;
  if (!build) return [];
  const { listLines } = coverRoom(format, input);
  const widths = listWidthsMm(format);
  const cut = (rows: readonly string[], widthMm: number): boolean => rowsThatFit(rows, widthMm, listLines).rest > 0;
  return [
    ...(cut(build.need, widths.need) ? [{ title: plan.build.need, rows: build.need }] : []),
    ...(cut(build.setUp, widths.setUp) ? [{ title: plan.build.setUp, rows: build.setUp }] : []),
  ];
}

/**
 * Scale, joining, check lengths, key, what is not on the sheets, and the map of sheets and pages; one page, more when there is much of
 * it. A map that has no room under the rest gets pages of its own.
 */
export function notesPages(format: PageFormat, input: FrontInput): FrontPage[] {
  const [x0, y0, x1, y1] = format.clipMm;
  const frame: Column = { x: x0, widthMm: x1 - x0 };
  const sections: Section[] = [
    { title: words.checks, rows: input.sheets.flatMap(joinChecks) },
    { title: words.key, rows: keyRows(input.sheets) },
    ...cutLists(format, input),
    { title: words.notDrawn, rows: input.notDrawn },
  ];
  const top = y1 - 2;
  const fromOf = (page: number): number => (page === 0 ? top - TOP_MM : top);
  const pages = flow(sections, { widthMm: frame.widthMm, roomMm: (page) => Math.max(0, fromOf(page) - y0) });
  const last = pages.length - 1;
  const mapTop = fromOf(last) - endMm(pages[last] ?? []) - MAP_GAP_MM;
  const mapFits = input.sheets.length <= MOST_SHEETS && mapTop - HEADING_MM - y0 >= LEAST_MAP_MM;
  const notes = pages.map((rows, page): FrontPage => {
    const ofRows = (faces: Typefaces): string[] => rows.map((row) => rowInk(faces, row, frame, fromOf(page)));
    return {
      kind: 'legend',
      name: plan.page.notes,
      ink: (faces, { pageOf }) =>
        [
          page === 0 ? topOf(faces, input, frame, top) : '',
          ...ofRows(faces),
          mapFits && page === last ? mapUnder(faces, input, frame, mapTop, y0, pageOf) : '',
        ]
          .filter(Boolean)
          .join('\n'),
    };
  });
  return mapFits ? notes : [...notes, ...mapPages(format, input.sheets)];
}

function mapUnder(
  faces: Typefaces,
  { sheets }: FrontInput,
  frame: Column,
  top: number,
  bottom: number,
  pageOf: (index: number) => number,
): string {
  const head = heading(faces, words.map, frame, top);
  const room: Frame = { x: frame.x, y: bottom, w: frame.widthMm, h: head.top - bottom };
  return [head.ink, map(faces, sheets, room, pageOf)].join('\n');
}
