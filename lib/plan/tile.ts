import type { Figures } from '@/lib/figures/types';
import type { BuildNotes } from './buildNotes';
import type { Drawing, Paper, PlanRevision } from './drawing';
import type { ExpectedLines } from './expected';
import type { Manifest, ManifestSheet, PlanFile } from './manifest';
import type { PlanFonts } from './pdf/fonts';
import { frontPages } from './pdf/front';
import { writePdf } from './pdf/writePdf';
import { checkPaper, formatsOf, TILE_DEFAULTS, type TileOptions } from './tiling/format';
import { type TiledSheet, tileSheets } from './tiling/tileSheets';

export interface TileContext {
  readonly design: string;
  /** Null prints "draft" on every page. */
  readonly revision: PlanRevision | null;
  readonly figures: Figures | null;
  /** Cut lines from the parts and placements, made before the drawings and without them. */
  readonly expected: ExpectedLines;
  readonly fonts: PlanFonts;
  readonly notDrawn?: readonly string[];
  /** What to gather and set, on the first page. */
  readonly build?: BuildNotes;
  readonly options?: TileOptions;
}

const manifestSheet = (
  sheet: TiledSheet,
  expected: ExpectedLines,
  firstPage: number,
  overlapMm: number,
): ManifestSheet => {
  const lines = expected.get(sheet.drawing.id);
  if (!lines) throw new RangeError(`no expected lines for ${sheet.drawing.id}`);
  return {
    id: sheet.drawing.id,
    sheet_mm: sheet.drawing.sheetMm,
    stroke_mm: sheet.drawing.strokeMm,
    pages: sheet.pages.map((tile) => ({
      page: firstPage + tile.index,
      kind: 'tile',
      row: tile.cell.row,
      col: tile.cell.col,
      media_mm: tile.format.mediaMm,
      page_from_sheet: tile.pageFromSheet,
      clip_mm: tile.format.clipMm,
      overlap_mm: overlapMm,
      marks_mm: tile.marks.map(({ at }) => [at[0] + tile.pageFromSheet[4], at[1] + tile.pageFromSheet[5]]),
    })),
    expected: lines,
  };
};

async function sha256Hex(bytes: Uint8Array): Promise<string> {
  // A copy in a buffer of its own: the digest takes no view on shared memory.
  const digest = await crypto.subtle.digest('SHA-256', new Uint8Array(bytes));
  return [...new Uint8Array(digest)].map((byte) => byte.toString(16).padStart(2, '0')).join('');
}

/**
 * Tiles the drawings onto paper: a PDF and the manifest that says where every cut line lies in it. The orientation and the
 * grid need the fewest pages; pages without anything to print are left out.
 * Throws RangeError for a paper that `checkPaper` refuses: ask that first and show its problems.
 */
export async function tile(drawings: readonly Drawing[], paper: Paper, context: TileContext): Promise<PlanFile> {
  const options = context.options ?? TILE_DEFAULTS;
  const [problem] = checkPaper(paper, options);
  if (problem) throw new RangeError(problem.message);
  const sheets = tileSheets(drawings, paper, options);
  const [coverFormat] = formatsOf(paper, options);
  const front = frontPages(coverFormat, {
    sheets,
    figures: context.figures,
    build: context.build ?? null,
    notDrawn: context.notDrawn ?? [],
    overlapMm: options.overlapMm,
  });
  const before = front.length;
  const manifest: Manifest = {
    version: 1,
    units: 'mm',
    otherPages: front.map(({ kind }, i) => ({ page: i + 1, kind, media_mm: coverFormat.mediaMm })),
    sheets: sheets.map((sheet) => manifestSheet(sheet, context.expected, before + 1, options.overlapMm)),
  };
  const pages = before + sheets.reduce((sum, sheet) => sum + sheet.pages.length, 0);
  const pdf = await writePdf({
    sheets,
    front,
    coverFormat,
    options,
    names: { design: context.design, revision: context.revision, pages },
    fonts: context.fonts,
    manifest,
  });
  return { pdf, manifest: { ...manifest, pdfSha256: await sha256Hex(pdf) } };
}
