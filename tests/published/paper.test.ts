import { PDFDocument } from 'pdf-lib';
import { describe, expect, it } from 'vitest';
import { layOut } from '@/lib/layout/layOut';
import { LAYOUT_DEFAULTS } from '@/lib/layout/stock';
import { draw } from '@/lib/plan/draw';
import { expectedLines } from '@/lib/plan/expected';
import { PAPERS } from '@/lib/plan/paper';
import { tile } from '@/lib/plan/tile';
import { planFonts } from '@/tests/support/fonts';
import { makePart, rectangle } from '@/tests/support/parts';

describe('paper sizes', () => {
  // ISO 216:2007, Writing paper and certain classes of printed matter: trimmed sizes, A series.
  it.each([
    { paper: PAPERS.a4, size: [210, 297] },
    { paper: PAPERS.a3, size: [297, 420] },
    { paper: PAPERS.a2, size: [420, 594] },
    { paper: PAPERS.a1, size: [594, 841] },
    { paper: PAPERS.a0, size: [841, 1189] },
  ])('$paper.name', ({ paper, size }) => {
    expect([paper.wMm, paper.hMm]).toEqual(size);
  });

  // ANSI/ASME Y14.1, Decimal Inch Drawing Sheet Size and Format: A 8.5 x 11, B 11 x 17, C 17 x 22, D 22 x 34, E 34 x 44 in.
  it.each([
    { paper: PAPERS.letter, inches: [8.5, 11] },
    { paper: PAPERS.tabloid, inches: [11, 17] },
    { paper: PAPERS['ansi-c'], inches: [17, 22] },
    { paper: PAPERS['ansi-d'], inches: [22, 34] },
    { paper: PAPERS['ansi-e'], inches: [34, 44] },
  ])('$paper.name', ({ paper, inches }) => {
    expect([paper.wMm / 25.4, paper.hMm / 25.4]).toEqual(inches.map((value) => expect.closeTo(value, 6)));
  });
});

describe('PDF user space', () => {
  // ISO 32000-1:2008, 8.3.2.3: one unit of default user space is 1/72 in, so A4 is 595.276 x 841.890 and Letter 612 x 792.
  it.each([
    { paper: PAPERS.a4, points: [595.276, 841.89] },
    { paper: PAPERS.letter, points: [612, 792] },
  ])('a page of $paper.name', async ({ paper, points }) => {
    const parts = [makePart('part', rectangle(60, 200))];
    const sheet = {
      id: 's',
      materialId: 'foam-5',
      thicknessMm: 5,
      wMm: 400,
      hMm: 300,
      count: null,
      grain: 'none',
    } as const;
    const layout = layOut(parts, [sheet], LAYOUT_DEFAULTS);
    const { pdf } = await tile(draw(parts, layout), paper, {
      design: 'Test',
      revision: null,
      figures: null,
      expected: expectedLines(parts, layout),
      fonts: planFonts(),
    });
    const doc = await PDFDocument.load(pdf, { updateMetadata: false });
    expect(doc.getPageCount()).toBeGreaterThan(1);
    for (const page of doc.getPages()) {
      const { width, height } = page.getMediaBox();
      const upright = width < height ? [width, height] : [height, width];
      expect(Math.abs((upright[0] ?? 0) - (points[0] ?? 0))).toBeLessThan(0.01);
      expect(Math.abs((upright[1] ?? 0) - (points[1] ?? 0))).toBeLessThan(0.01);
      expect(page.getRotation().angle).toBe(0);
    }
  });
});
