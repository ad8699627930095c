import { Duplex, PDFDocument, PDFName, type PDFRawStream, type PDFRef, PrintScaling } from 'pdf-lib';
import { plan } from '@/lib/text/en/plan';
import { fill } from '@/lib/text/fill';
import { releaseDay } from '../drawing';
import type { Manifest } from '../manifest';
import type { TileOptions } from '../tiling/format';
import type { PageFormat } from '../tiling/grid';
import type { TiledSheet, TilePage } from '../tiling/tileSheets';
import { embedFonts, type PlanFonts, type Typefaces } from './fonts';
import type { FrontPage } from './front';
import { type PlanNames, pageFoot, pageJoins, stateWords } from './furniture';
import { clip, grey, group, PT_PER_MM, shift, toMillimetres } from './ink';
import { matchMark } from './matchMark';
import { cutSegments, sheetContent } from './sheetContent';

export interface PdfInput {
  readonly sheets: readonly TiledSheet[];
  /** The pages before the first tile. */
  readonly front: readonly FrontPage[];
  /** Their format. */
  readonly coverFormat: PageFormat;
  readonly options: TileOptions;
  readonly names: PlanNames;
  readonly fonts: PlanFonts;
  /** The copy that is attached inside the file: without the file's own hash. */
  readonly manifest: Manifest;
}

/** Points to four decimals: finer than any printer, and a size that reads back the same. */
const points = (mm: number): number => Math.round(mm * PT_PER_MM * 1e4) / 1e4;

interface Writer {
  readonly doc: PDFDocument;
  readonly faces: Typefaces;
}

const fontResources = ({ text, bold, mono }: Typefaces) =>
  Object.fromEntries([text, bold, mono].map(({ resource, ref }) => [resource, ref]));

function addPage(writer: Writer, format: PageFormat, content: string, forms: Readonly<Record<string, PDFRef>>): void {
  const { doc, faces } = writer;
  const page = doc.addPage([points(format.mediaMm[0]), points(format.mediaMm[1])]);
  const stream = doc.context.flateStream(group(toMillimetres(), grey(0), content));
  page.node.set(PDFName.Contents, doc.context.register(stream));
  page.node.set(PDFName.of('Resources'), doc.context.obj({ Font: fontResources(faces), XObject: { ...forms } }));
}

/** The content of one sheet, stored once and shown by all its pages. */
function addForm(writer: Writer, sheet: TiledSheet): PDFRef {
  const { doc, faces } = writer;
  const [w, h] = sheet.drawing.sheetMm;
  const stream: PDFRawStream = doc.context.flateStream(sheetContent(sheet.drawing, faces), {
    Type: 'XObject',
    Subtype: 'Form',
    BBox: [-10, -10, Math.ceil(w) + 10, Math.ceil(h) + 10],
    Resources: { Font: fontResources(faces) },
  });
  return doc.context.register(stream);
}

export const tileName = (sheet: TiledSheet, { cell }: TilePage): string =>
  fill(plan.page.tile, { sheet: sheet.drawing.name, row: cell.row + 1, column: cell.col + 1 });

function addTile(
  writer: Writer,
  sheet: TiledSheet,
  tile: TilePage,
  form: PDFRef,
  input: PdfInput,
  first: number,
): void {
  const { faces } = writer;
  const pageOf = (index: number): number => first + index;
  const [x0, y0, x1, y1] = tile.format.clipMm;
  const cuts = cutSegments(sheet.drawing);
  const [, , , , dx, dy] = tile.pageFromSheet;
  const content = [
    group(clip(x0, y0, x1, y1), shift(dx, dy), '/S Do', ...tile.marks.map((mark) => matchMark(faces, mark, cuts))),
    pageFoot(faces, tile.format, tileName(sheet, tile), pageOf(tile.index), input.names),
    pageJoins(faces, tile, pageOf, input.options),
  ];
  addPage(writer, tile.format, content.join('\n'), { S: form });
}

function setDocument(doc: PDFDocument, { names }: PdfInput): void {
  const { design, revision } = names;
  doc.setTitle(fill(plan.page.plan, { design }));
  doc.setSubject(revision ? stateWords(revision) : plan.page.draftLong);
  doc.setProducer('Foldspar');
  doc.setCreator('Foldspar');
  if (revision) {
    // The only date the file holds is the revision's own, so that the same revision gives the same bytes on any day.
    const date = new Date(`${releaseDay(revision)}T00:00:00Z`);
    doc.setCreationDate(date);
    doc.setModificationDate(date);
  }
  const viewer = doc.catalog.getOrCreateViewerPreferences();
  viewer.setPrintScaling(PrintScaling.None);
  viewer.setDuplex(Duplex.Simplex);
  viewer.setPickTrayByPDFSize(true);
  viewer.setDisplayDocTitle(true);
}

/** The whole plan as PDF bytes: cover and map pages, then the tiles in order. The same input gives the same bytes. */
export async function writePdf(input: PdfInput): Promise<Uint8Array> {
  const doc = await PDFDocument.create({ updateMetadata: false });
  setDocument(doc, input);
  const writer: Writer = { doc, faces: await embedFonts(doc, input.fonts) };
  const before = input.front.length;
  input.front.forEach(({ name, ink }, i) => {
    const content = ink(writer.faces, { names: input.names, pageOf: (index) => before + 1 + index });
    const foot = pageFoot(writer.faces, input.coverFormat, name, i + 1, input.names);
    addPage(writer, input.coverFormat, [content, foot].join('\n'), {});
  });
  for (const sheet of input.sheets) {
    if (sheet.pages.length === 0) continue;
    const form = addForm(writer, sheet);
    for (const tile of sheet.pages) addTile(writer, sheet, tile, form, input, before + 1);
  }
  await doc.attach(new TextEncoder().encode(`${JSON.stringify(input.manifest)}\n`), 'manifest.json', {
    mimeType: 'application/json',
    description: 'Where every cut line lies on the pages, in millimetres',
  });
  return doc.save({ useObjectStreams: true, addDefaultPage: false });
}
