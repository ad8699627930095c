import { type Column, heading, LEADING } from './column';
import type { Typefaces } from './fonts';
import { type Lettering, letter, shorten } from './ink';

// Rows of text under headings, from page to page. They are broken by count, because how many pages there are must be known before the
// fonts are.

export const ROW_STYLE = { face: 'text', capMm: 2 } as const satisfies Lettering;
export const ROW_MM = 4.2;
export const HEADING_MM = 6.5;
/** Before a heading that is not the first of its page. */
const GAP_MM = 3;
/** As `heading` letters it. */
const HEADING_STYLE = { face: 'bold', capMm: 2.5 } as const;
/** Mean width of a letter over the height of a capital, of the widest of our sentences. */
const LETTER_SHARE = 0.72;
/** No column is taken for narrower than this many letters. */
const LEAST_LETTERS = 20;

export interface Section {
  readonly title: string;
  readonly rows: readonly string[];
}

export interface Placed {
  /** `first` is the first line of a row, `more` each further one. */
  readonly kind: 'heading' | 'first' | 'more';
  readonly text: string;
  /** Down from the top of the page's room, mm. */
  readonly downMm: number;
}

export interface FlowRoom {
  readonly widthMm: number;
  /** By page, from 0. */
  readonly roomMm: (page: number) => number;
  /** A section that fits on one page is not broken. */
  readonly whole?: boolean;
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

/** How a text is broken to a column before the fonts are known. */
export const linesIn = (text: string, widthMm: number, { capMm }: Pick<Lettering, 'capMm'>): string[] =>
  wrapByCount(text, Math.max(LEAST_LETTERS, Math.floor(widthMm / (capMm * LETTER_SHARE))));

/** Height of a paragraph, by count. */
export const textMm = (text: string, widthMm: number, style: Lettering): number =>
  linesIn(text, widthMm, style).length * style.capMm * LEADING;

type Line = Omit<Placed, 'downMm'>;

interface Block {
  readonly lines: readonly Line[];
  readonly heightMm: number;
  /** Height of the section that it opens. */
  readonly sectionMm: number | null;
}

/** Each row as one block that no page breaks, its heading with the first of them. */
function blocksOf({ title, rows }: Section, widthMm: number): Block[] {
  const wrapped = rows.map((row) =>
    linesIn(row, widthMm, ROW_STYLE).map((text, i): Line => ({ kind: i === 0 ? 'first' : 'more', text })),
  );
  const sectionMm = HEADING_MM + ROW_MM * wrapped.flat().length;
  return wrapped.map((lines, i): Block => {
    const heightMm = lines.length * ROW_MM;
    if (i > 0) return { lines, heightMm, sectionMm: null };
    return { lines: [{ kind: 'heading', text: title }, ...lines], heightMm: heightMm + HEADING_MM, sectionMm };
  });
}

/** Sections in rows from page to page; a heading never stands alone at a page's foot. A row higher than a page is broken. */
export function flow(sections: readonly Section[], { widthMm, roomMm, whole = false }: FlowRoom): Placed[][] {
  let page: Placed[] = [];
  const pages = [page];
  let downMm = 0;
  const fits = (heightMm: number): boolean => downMm + heightMm <= roomMm(pages.length - 1);
  const turn = (): void => {
    page = [];
    pages.push(page);
    downMm = 0;
  };
  for (const block of sections.flatMap((section) => blocksOf(section, widthMm))) {
    const { lines, heightMm, sectionMm } = block;
    const gapMm = sectionMm === null ? 0 : GAP_MM;
    const keep = whole && sectionMm !== null && sectionMm <= roomMm(pages.length) ? sectionMm : heightMm;
    if (page.length > 0 && !fits(gapMm + keep)) turn();
    if (page.length > 0) downMm += gapMm;
    for (const { kind, text } of lines) {
      const high = kind === 'heading' ? HEADING_MM : ROW_MM;
      if (page.length > 0 && !fits(high)) turn();
      page.push({ kind, text, downMm });
      downMm += high;
    }
  }
  return pages;
}

/** How far down a page's rows reach, mm. */
export function endMm(page: readonly Placed[]): number {
  const last = page.at(-1);
  return last ? last.downMm + (last.kind === 'heading' ? HEADING_MM : ROW_MM) : 0;
}

/** A line that was broken by count: one of nothing but wide letters is set smaller, so that it keeps to its room. */
export function fittedLine(
  faces: Typefaces,
  text: string,
  { x, widthMm }: Column,
  baseline: number,
  style: Lettering,
): string {
  const share = Math.min(1, widthMm / faces[style.face].width(text, style.capMm));
  return letter(faces, text, [x, baseline], { ...style, capMm: style.capMm * share });
}

/** A placed line; `from` is the top of the page's room. Rows stand `indentMm` in from the headings. */
export function rowInk(
  faces: Typefaces,
  { kind, text, downMm }: Placed,
  frame: Column,
  from: number,
  indentMm = 0,
): string {
  const top = from - downMm;
  if (kind === 'heading') return heading(faces, shorten(faces, text, frame.widthMm, HEADING_STYLE), frame, top).ink;
  const column = { x: frame.x + indentMm, widthMm: frame.widthMm - indentMm };
  return fittedLine(faces, text, column, top - ROW_STYLE.capMm, ROW_STYLE);
}
