import { execFileSync } from 'node:child_process';
import { mkdtempSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { layOut } from '@/lib/layout/layOut';
import { LAYOUT_DEFAULTS } from '@/lib/layout/stock';
import { draw } from '@/lib/plan/draw';
import type { PlanRevision } from '@/lib/plan/drawing';
import { expectedLines } from '@/lib/plan/expected';
import type { PlanFile } from '@/lib/plan/manifest';
import { PAPERS } from '@/lib/plan/paper';
import { tile } from '@/lib/plan/tile';
import { planFonts } from '@/tests/support/fonts';
import { sampleParts } from '@/tests/support/parts';

// What a person reads on the pages, by another program's eyes: text as extracted, and ink as rendered.

const stock = [
  { id: 'foam', materialId: 'foam-5', thicknessMm: 5, wMm: 700, hMm: 500, count: null, grain: 'alongWidth' },
  { id: 'ply', materialId: 'ply-3', thicknessMm: 3, wMm: 300, hMm: 200, count: null, grain: 'none' },
] as const;
const folder = mkdtempSync(join(tmpdir(), 'pages-'));
afterAll(() => rmSync(folder, { recursive: true, force: true }));

const make = (revision: PlanRevision | null, design = 'Wren ± 620 °'): Promise<PlanFile> => {
  const parts = sampleParts();
  const layout = layOut(parts, stock, LAYOUT_DEFAULTS);
  return tile(draw(parts, layout), PAPERS.a4, {
    design,
    revision,
    figures: null,
    expected: expectedLines(parts, layout),
    fonts: planFonts(),
  });
};
const save = (name: string, { pdf }: PlanFile): string => {
  const path = join(folder, name);
  writeFileSync(path, pdf);
  return path;
};
const textOf = (pdf: string, page: number): string =>
  execFileSync('pdftotext', ['-f', String(page), '-l', String(page), '-layout', pdf, '-'], { encoding: 'utf8' });
const pagesOf = ({ manifest }: PlanFile): number =>
  manifest.otherPages.length + manifest.sheets.reduce((sum, { pages }) => sum + pages.length, 0);

interface Picture {
  readonly w: number;
  readonly h: number;
  readonly grey: Uint8Array;
}
/** A page at 50 dpi in grey, 0 black. */
const render = (pdf: string, page: number): Picture => {
  const base = join(folder, 'render');
  execFileSync('pdftoppm', ['-gray', '-r', '50', '-f', String(page), '-l', String(page), '-singlefile', pdf, base]);
  const bytes = readFileSync(`${base}.pgm`);
  const head = /^P5\s+(\d+)\s+(\d+)\s+255\s/.exec(bytes.subarray(0, 40).toString('latin1'));
  if (!head) throw new Error('pdftoppm gave no picture');
  return { w: Number(head[1]), h: Number(head[2]), grey: new Uint8Array(bytes.subarray(head[0].length)) };
};
const dark = ({ w, grey }: Picture, accept: (x: number, y: number) => boolean): number =>
  grey.reduce((sum, value, i) => sum + (value < 128 && accept(i % w, Math.floor(i / w)) ? 1 : 0), 0);

describe('pages as they are read', () => {
  let file: PlanFile;
  let pdf: string;
  beforeAll(async () => {
    file = await make(null);
    pdf = save('draft.pdf', file);
  });

  it('every page says draft, its number, the design and the 50 mm bars', () => {
    const pages = pagesOf(file);
    expect(pages).toBeGreaterThan(3);
    for (let page = 1; page <= pages; page++) {
      const text = textOf(pdf, page);
      expect(text).toContain('DRAFT');
      expect(text).toContain(`page ${page} of ${pages}`);
      expect(text).toContain('Wren ± 620 °');
      expect(text).toContain('50 mm');
    }
  });

  it('tiles are named by sheet, row and column as the manifest has them', () => {
    for (const { id, pages } of file.manifest.sheets) {
      for (const { page, row, col } of pages) {
        // "sheet-2" in the manifest is "Sheet 2" on paper.
        const name = id.replace('sheet-', 'Sheet ');
        expect(textOf(pdf, page)).toContain(`${name} · row ${row + 1} · column ${col + 1}`);
      }
    }
  });

  it('a released plan says its number, date and state on every page, and not draft', async () => {
    const released = await make({ number: 7, state: 'held', releasedAt: '2031-04-05', design: 'Wren' });
    const path = save('released.pdf', released);
    for (let page = 1; page <= pagesOf(released); page++) {
      const text = textOf(path, page);
      expect(text).toContain('revision 7 · 2031-04-05 · ON HOLD: do not cut');
      expect(text).not.toContain('DRAFT');
    }
  });

  it('the first page holds legend, cautions and both check lengths', () => {
    const text = textOf(pdf, 1);
    for (const words of [
      'cut through',
      'Before you cut',
      'Print at 100 %',
      '100 mm',
      '4 in',
      'Figures are estimates',
    ]) {
      expect(text).toContain(words);
    }
  });

  it('the second page holds the card outline, how to join, and lengths to measure', () => {
    const text = textOf(pdf, 2);
    for (const words of ['85.60 × 53.98 mm', 'overlap by 10 mm', 'Measure after joining', 'should read']) {
      expect(text).toContain(words);
    }
  });

  it('letters leave ink: a page is darker in its foot than in the strip that nothing stands in', () => {
    const picture = render(pdf, 2);
    const mm = 50 / 25.4;
    const foot = dark(picture, (x, y) => x > 130 * mm && y > picture.h - 15 * mm);
    expect(foot).toBeGreaterThan(40);
    // What the printer cannot reach stays white.
    const edge = 6.2 * mm;
    const outside = (x: number, y: number) => x < edge || y < edge || x > picture.w - edge || y > picture.h - edge;
    expect(dark(picture, outside)).toBe(0);
  });

  it('every letter of the design name draws something of its own', async () => {
    const inkOf = async (design: string): Promise<number> => {
      const path = save('name.pdf', await make(null, design));
      return dark(render(path, 1), (x, y) => y < 40 && x < 250);
    };
    const seen = new Map<number, string>();
    for (const letter of ['I', 'W', '±', '°']) {
      const ink = await inkOf(letter.repeat(6));
      expect(ink).toBeGreaterThan(5);
      expect(seen.get(ink)).toBeUndefined();
      seen.set(ink, letter);
    }
  });
});
