import { PDFDocument } from 'pdf-lib';
import { beforeAll, describe, expect, it } from 'vitest';
import type { Airframe } from '@/lib/airframe/schema/airframe';
import { type SetUpSheet, setUpSheet } from '@/lib/figures/setUp';
import { setUpSections } from '@/lib/figures/setUpWords';
import { airframe, control, surface } from '@/tests/support/airframe';
import { planFonts } from '@/tests/support/fonts';
import type { PageFormat } from '../tiling/grid';
import { embedFonts, type Face, type Typefaces } from './fonts';
import { setUpPages } from './setUpPage';

const A4: PageFormat = { mediaMm: [210, 297], clipMm: [18, 22, 198, 285] };
const SMALL: PageFormat = { mediaMm: [148, 210], clipMm: [18, 22, 136, 198] };

const sheetOf = (from: Airframe): SetUpSheet => {
  const sheet = setUpSheet(from);
  if (!sheet.ok) throw new RangeError(sheet.problems[0]?.message);
  return sheet.value;
};
const plainSheet = () => sheetOf(airframe({ surfaces: [surface({ controls: [control()] })] }));
/** Nine surfaces under the longest name the document takes, without a space to break at. */
const long = (name: string) =>
  sheetOf(
    airframe({
      surfaces: Array.from({ length: 9 }, (_, i) =>
        surface({ id: `s${i}`, name, mount: { to: 'datum', at: [0, 0, 40 * i] }, controls: [control()] }),
      ),
    }),
  );

let real: Typefaces;
beforeAll(async () => {
  real = await embedFonts(await PDFDocument.create(), planFonts());
});

interface Drawn {
  readonly text: string;
  readonly x: number;
  readonly y: number;
  readonly rightX: number;
}

/** Every line of text on a page, with where it begins and ends, by the fonts' own widths. */
function drawn(page: ReturnType<typeof setUpPages>[number]): { texts: Drawn[]; ink: string } {
  const readable = (face: Face) => ({ ...real[face], encode: (text: string) => `[${encodeURIComponent(text)}]` });
  const faces: Typefaces = { text: readable('text'), bold: readable('bold'), mono: readable('mono') };
  const names = { design: 'Test', revision: null, pages: 1 };
  const ink = page.ink(faces, { names, pageOf: () => 1 });
  const texts = [...ink.matchAll(/BT \/(\w+) (\S+) Tf 1 0 0 1 (\S+) (\S+) Tm \[(\S*)\] Tj ET/g)].map(
    ([, resource, size, x, y, coded = '']) => {
      const text = decodeURIComponent(coded);
      const face = Object.values(real).find((one) => one.resource === resource) ?? real.text;
      const width = (face.width(text, 1) / face.sizeForCap(1)) * Number(size);
      return { text, x: Number(x), y: Number(y), rightX: Number(x) + width };
    },
  );
  return { texts, ink };
}

const words = (sheet: SetUpSheet): string =>
  setUpSections(sheet)
    .flatMap(({ title, rows }) => [title, ...rows.map(({ text }) => text)])
    .join('')
    .replaceAll(/\s/g, '');

describe('setUpPages', () => {
  it('says to take the propeller off, and has a box before each row', () => {
    const sheet = plainSheet();
    const pages = setUpPages(A4, sheet);
    expect(pages).toHaveLength(1);
    const [page] = pages.map(drawn);
    expect(page?.texts.some(({ text }) => text.includes('Propeller off for every set-up'))).toBe(true);
    const rows = setUpSections(sheet).reduce((sum, section) => sum + section.rows.length, 0);
    expect(page?.ink.match(/ re S/g)).toHaveLength(rows);
  });

  it('draws nothing when nothing moves', () => {
    expect(setUpPages(A4, sheetOf(airframe()))).toEqual([]);
  });

  it.each([
    ['long words', 'Long starboard outer wing panel with an unusually long name that goes on and on'],
    ['one long word', 'W'.repeat(80)],
  ])('%s stay inside the window on every page, no line on another, and nothing is lost', (_, name) => {
    for (const format of [A4, SMALL]) {
      const [x0, y0, x1, y1] = format.clipMm;
      const sheet = long(name);
      const pages = setUpPages(format, sheet).map(drawn);
      expect(pages.length).toBeGreaterThan(1);
      for (const { texts } of pages) {
        for (const { text, x, y, rightX } of texts) {
          expect(x, text).toBeGreaterThanOrEqual(x0);
          expect(rightX, text).toBeLessThanOrEqual(x1 + 0.01);
          expect(y, text).toBeGreaterThanOrEqual(y0);
          expect(y, text).toBeLessThanOrEqual(y1);
        }
        const heights = texts.map(({ y }) => y).sort((a, b) => a - b);
        for (const [i, y] of heights.slice(1).entries()) expect(y - (heights[i] ?? 0)).toBeGreaterThan(2.4);
      }
      const all = pages
        .map(({ texts }) => texts.map(({ text }) => text).join(''))
        .join('')
        .replaceAll(/\s/g, '');
      for (const row of setUpSections(sheet).flatMap(({ rows }) => rows)) {
        expect(all).toContain(row.text.replaceAll(/\s/g, ''));
      }
      expect(words(sheet).length).toBeGreaterThan(1000);
    }
  });

  it('no heading stands alone at the foot of a page', () => {
    const titles = new Set(setUpSections(long('Outer wing')).map(({ title }) => title));
    for (const { texts } of setUpPages(SMALL, long('Outer wing')).map(drawn)) {
      expect(titles.has(texts.at(-1)?.text ?? '')).toBe(false);
    }
  });
});
