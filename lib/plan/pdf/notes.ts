import { plan } from '@/lib/text/en/plan';
import { fill } from '@/lib/text/fill';
import type { PageFormat } from '../tiling/grid';
import { joinChecks } from '../tiling/joinChecks';
import type { TiledSheet } from '../tiling/tileSheets';
import { card, ID1_MM } from './card';
import { type Column, heading, paragraph } from './column';
import type { Typefaces } from './fonts';
import type { FrontInput, FrontPage } from './front';
import { letter } from './ink';

// The pages for the bench: a card to check the scale, how to join, lengths to measure, and the key of marks on small parts.

const words = plan.cover;

const HEAD_MM = 6.5;
const ROW_MM = 3.7;
const ROW_STYLE = { face: 'text', capMm: 1.8 } as const;
/** Mean width of a letter over the height of a capital, rounded up. */
const LETTER_SHARE = 0.84;
/** Height of card and joining on top of the first of these pages. */
const TOP_MM = 78;

interface Section {
  readonly title: string;
  readonly rows: readonly string[];
}

interface Item {
  readonly kind: 'heading' | 'row';
  readonly text: string;
  /** Down from the top of the page's room, mm. */
  readonly downMm: number;
}

/** A text in lines of at most so many letters, broken between words; a longer word is broken by letters. */
export function wrapByCount(text: string, most: number): string[] {
  const lines: string[] = [];
  let current = '';
  for (const word of text.split(/\s+/).filter(Boolean)) {
    const joined = current ? `${current} ${word}` : word;
    if (joined.length <= most) {
      current = joined;
      continue;
    }
    if (current) lines.push(current);
    current = word;
    while (current.length > most) {
      lines.push(current.slice(0, most));
      current = current.slice(most);
    }
  }
  if (current) lines.push(current);
  return lines;
}

/** Sections in rows from page to page; a heading never stands alone at a page's foot. */
function flow(sections: readonly Section[], widthMm: number, firstMm: number, moreMm: number): Item[][] {
  const most = Math.max(20, Math.floor(widthMm / (ROW_STYLE.capMm * LETTER_SHARE)));
  let page: Item[] = [];
  const pages = [page];
  let downMm = 0;
  const make = (kind: Item['kind'], text: string, highMm: number, followedMm: number): void => {
    if (downMm + highMm + followedMm > (pages.length === 1 ? firstMm : moreMm)) {
      page = [];
      pages.push(page);
      downMm = 0;
    }
    page.push({ kind, text, downMm });
    downMm += highMm;
  };
  for (const { title, rows } of sections) {
    if (rows.length === 0) continue;
    make('heading', title, HEAD_MM, ROW_MM);
    for (const row of rows) for (const line of wrapByCount(row, most)) make('row', line, ROW_MM, 0);
    downMm += 3;
  }
  return pages;
}

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

/** Scale, joining, check lengths, key, and what is not on the sheets; one page, more when the key is long. */
export function notesPages(format: PageFormat, input: FrontInput): FrontPage[] {
  const [x0, y0, x1, y1] = format.clipMm;
  const frame: Column = { x: x0, widthMm: x1 - x0 };
  const sections: Section[] = [
    { title: words.checks, rows: input.sheets.flatMap(joinChecks) },
    { title: words.key, rows: keyRows(input.sheets) },
    { title: words.notDrawn, rows: input.notDrawn },
  ];
  const top = y1 - 2;
  const pages = flow(sections, frame.widthMm, Math.max(0, top - TOP_MM - y0), top - y0);
  return pages.map((items, i): FrontPage => {
    const from = i === 0 ? top - TOP_MM : top;
    const rows = (faces: Typefaces): string[] =>
      items.map(({ kind, text, downMm }) =>
        kind === 'heading'
          ? heading(faces, text, frame, from - downMm).ink
          : letter(faces, text, [frame.x, from - downMm - ROW_STYLE.capMm], ROW_STYLE),
      );
    return {
      kind: 'legend',
      name: plan.page.notes,
      ink: (faces) => [i === 0 ? topOf(faces, input, frame, top) : '', ...rows(faces)].filter(Boolean).join('\n'),
    };
  });
}
