import {
  decodePDFRawStream,
  PDFArray,
  PDFBool,
  PDFDict,
  PDFDocument,
  PDFHexString,
  PDFName,
  PDFRawStream,
  PDFStream,
} from 'pdf-lib';
import { beforeAll, describe, expect, it } from 'vitest';
import { layOut } from '@/lib/layout/layOut';
import { LAYOUT_DEFAULTS } from '@/lib/layout/stock';
import type { SheetStock } from '@/lib/layout/types';
import { planFonts } from '@/tests/support/fonts';
import { sampleParts } from '@/tests/support/parts';
import { draw } from './draw';
import type { PlanRevision } from './drawing';
import { expectedLines } from './expected';
import type { PlanFile } from './manifest';
import { PAPERS } from './paper';
import { tile } from './tile';

const stock: readonly SheetStock[] = [
  { id: 'foam', materialId: 'foam-5', thicknessMm: 5, wMm: 700, hMm: 500, count: null, grain: 'alongWidth' },
  { id: 'ply', materialId: 'ply-3', thicknessMm: 3, wMm: 300, hMm: 200, count: null, grain: 'none' },
];
const parts = sampleParts();
const layout = layOut(parts, stock, LAYOUT_DEFAULTS);
const make = (revision: PlanRevision | null = null): Promise<PlanFile> =>
  tile(draw(parts, layout), PAPERS.a4, {
    design: 'Wren (test) \\ <b>',
    revision,
    figures: null,
    expected: expectedLines(parts, layout),
    fonts: planFonts(),
  });

describe('tile', () => {
  let file: PlanFile;
  let doc: PDFDocument;
  beforeAll(async () => {
    file = await make();
    doc = await PDFDocument.load(file.pdf, { updateMetadata: false });
  });

  it('gives the same bytes again', async () => {
    const again = await make();
    expect(Buffer.compare(Buffer.from(again.pdf), Buffer.from(file.pdf))).toBe(0);
    expect(again.manifest).toEqual(file.manifest);
  });

  it('numbers every page once, in the order of the file', () => {
    const tiles = file.manifest.sheets.flatMap(({ pages }) => pages.map(({ page }) => page));
    const numbers = [...file.manifest.otherPages.map(({ page }) => page), ...tiles];
    expect(numbers).toEqual(Array.from({ length: doc.getPageCount() }, (_, i) => i + 1));
  });

  it('says the size of every page to 0.01 mm', () => {
    const media = [...file.manifest.otherPages, ...file.manifest.sheets.flatMap(({ pages }) => pages)];
    for (const { page, media_mm } of media) {
      const { width, height } = doc.getPage(page - 1).getMediaBox();
      expect((width * 25.4) / 72).toBeCloseTo(media_mm[0], 3);
      expect((height * 25.4) / 72).toBeCloseTo(media_mm[1], 3);
    }
  });

  it('asks the viewer not to scale, to print one side, and to take the paper from the page', () => {
    const viewer = doc.catalog.lookup(PDFName.of('ViewerPreferences'), PDFDict);
    expect(viewer.lookup(PDFName.of('PrintScaling'), PDFName).asString()).toBe('/None');
    expect(viewer.lookup(PDFName.of('Duplex'), PDFName).asString()).toBe('/Simplex');
    expect(viewer.lookup(PDFName.of('PickTrayByPDFSize'), PDFBool).asBoolean()).toBe(true);
  });

  it('names its own hash, and attaches a manifest without one', async () => {
    const digest = await crypto.subtle.digest('SHA-256', new Uint8Array(file.pdf));
    expect(file.manifest.pdfSha256).toBe(Buffer.from(digest).toString('hex'));
    const { pdfSha256, ...bare } = file.manifest;
    expect(pdfSha256).toHaveLength(64);
    const files = doc.catalog.lookup(PDFName.of('Names'), PDFDict).lookup(PDFName.of('EmbeddedFiles'), PDFDict);
    const [name, spec] = files.lookup(PDFName.of('Names'), PDFArray).asArray();
    expect(name instanceof PDFHexString && name.decodeText()).toBe('manifest.json');
    const stream = doc.context
      .lookup(spec, PDFDict)
      .lookup(PDFName.of('EF'), PDFDict)
      .lookup(PDFName.of('F'), PDFStream);
    if (!(stream instanceof PDFRawStream)) throw new Error('the attachment is not a stream of bytes');
    expect(JSON.parse(Buffer.from(decodePDFRawStream(stream).decode()).toString('utf8'))).toEqual(bare);
  });

  it('leaves out every date for a draft, and holds the release date alone for a revision', async () => {
    expect(doc.getCreationDate()).toBeUndefined();
    const { pdf } = await make({ number: 3, state: 'goodToCut', releasedAt: '2031-04-05', design: 'Wren' });
    const released = await PDFDocument.load(pdf, { updateMetadata: false });
    expect(released.getCreationDate()?.toISOString()).toBe('2031-04-05T00:00:00.000Z');
    expect(released.getModificationDate()?.toISOString()).toBe('2031-04-05T00:00:00.000Z');
  });

  it('keeps a hostile name a title', () => {
    expect(doc.getTitle()).toBe('Plan of Wren (test) \\ <b>');
  });

  it('expects one test square a sheet, in no part and with true corners', () => {
    for (const { expected } of file.manifest.sheets) {
      const squares = expected.filter(({ part }) => part === 'check');
      expect(squares).toHaveLength(1);
      const [a, b, c] = squares[0]?.points ?? [];
      expect(Math.hypot((b?.[0] ?? 0) - (a?.[0] ?? 0), (b?.[1] ?? 0) - (a?.[1] ?? 0))).toBeCloseTo(100, 9);
      expect(Math.hypot((c?.[0] ?? 0) - (a?.[0] ?? 0), (c?.[1] ?? 0) - (a?.[1] ?? 0))).toBeCloseTo(Math.SQRT2 * 100, 9);
    }
  });

  it('refuses a paper that is too small', async () => {
    const tiny = { id: 'tiny', name: 'Tiny', wMm: 74, hMm: 105 };
    const context = {
      design: 'x',
      revision: null,
      figures: null,
      expected: expectedLines(parts, layout),
      fonts: planFonts(),
    };
    await expect(tile(draw(parts, layout), tiny, context)).rejects.toThrow(/Tiny.*74 × 105/);
  });
});
