import type { Airframe } from '@/lib/airframe/schema/airframe';
import type { Figures } from '@/lib/figures/types';
import type { LayoutFailure, SheetLayout } from '@/lib/layout/types';
import { ok, type Problem, type Result, refuse } from '@/lib/numerics/result';
import type { Development } from '@/lib/parts/types';
import { plan } from '@/lib/text/en/plan';
import { fill } from '@/lib/text/fill';
import { trimmedDigits } from '@/lib/units/number';
import { buildNotes } from './buildNotes';
import { draw } from './draw';
import type { Drawing, Paper, PlanRevision } from './drawing';
import { type ExpectedLines, expectedLines } from './expected';
import type { PlanFile } from './manifest';
import { materialWords } from './materialWords';
import type { PlanFonts } from './pdf/fonts';
import { tile } from './tile';
import { checkPaper, TILE_DEFAULTS, type TileOptions } from './tiling/format';
import { pageWindows } from './tiling/windows';

const words = plan.problems;

/** Pages of a plan: more than a printer's whole pack of paper is a mistake. */
export const MAX_PAGES = 500;

/** Where a part comes from in the document is not known here, so the problem is named by the part. */
const failureProblem = (failure: LayoutFailure): Problem => {
  const path = `parts.${failure.partKey}`;
  const part = failure.partKey;
  switch (failure.kind) {
    case 'too-large': {
      const [w, h] = failure.sizeMm;
      const message = fill(words.tooLarge, { part, w: trimmedDigits(w, 1), h: trimmedDigits(h, 1) });
      return { code: 'part-too-large', path, message, fix: words.tooLargeFix };
    }
    case 'no-stock': {
      const message = fill(words.noStock, { part, material: failure.materialId });
      return { code: 'part-without-stock', path, message, fix: words.noStockFix };
    }
    case 'no-room': {
      const message = fill(words.noRoom, { part, sheets: failure.sheetsTried });
      return { code: 'part-without-room', path, message, fix: words.noRoomFix };
    }
    case 'too-many-parts': {
      const message = fill(words.tooManyParts, { count: failure.count, most: failure.most });
      return { code: 'too-many-parts', path: 'parts', message, fix: words.tooManyPartsFix };
    }
    case 'too-many-sheets': {
      const message = fill(words.tooManySheets, { most: failure.most });
      return { code: 'too-many-sheets', path: 'parts', message, fix: words.tooManySheetsFix };
    }
  }
};

/** What keeps a layout of these parts from being printed; empty when nothing does. A plan that lacks a part is never made. */
export function layoutProblems(development: Development, layout: SheetLayout): Problem[] {
  if (layout.failures.length > 0) {
    const problems = layout.failures.map(failureProblem);
    // A limit is one problem, however many parts it keeps out.
    return problems.filter(
      ({ code, path }, i) => problems.findIndex((other) => other.code === code && other.path === path) === i,
    );
  }
  if (layout.sheets.length === 0) return [{ code: 'no-parts', path: '', message: words.noParts }];
  const known = new Set(development.parts.map(({ key }) => key));
  return layout.sheets.flatMap(({ placements }) =>
    placements
      .filter(({ partKey }) => !known.has(partKey))
      .map(({ partKey }) => ({
        code: 'layout-of-other-parts',
        path: `layout.${partKey}`,
        message: fill(words.strangeLayout, { part: partKey }),
      })),
  );
}

/** A problem in one line, with its place in the document unless the message names it. */
export const inWords = ({ path, message }: Problem): string =>
  path === '' || message.includes(path) ? message : `${path}: ${message}`;

export interface SheetDrawings {
  /** Made from parts and placements before the drawings. */
  readonly expected: ExpectedLines;
  readonly drawings: readonly Drawing[];
}

type Materials = Pick<Airframe, 'materials'>;

/** Cut lines to be expected and the drawings of every sheet for a cutter, or why there are none. */
export function drawSheets(
  { materials }: Materials,
  development: Development,
  layout: SheetLayout,
): Result<SheetDrawings> {
  const problems = layoutProblems(development, layout);
  if (problems.length > 0) return refuse(...problems);
  const expected = expectedLines(development.parts, layout);
  return ok({ expected, drawings: draw(development.parts, layout, { materialName: materialWords(materials) }) });
}

export interface PlanInput {
  readonly airframe: Airframe;
  readonly figures: Figures | null;
  readonly development: Development;
  readonly layout: SheetLayout;
  readonly paper: Paper;
  /** Without it every page says "draft". */
  readonly revision?: PlanRevision;
  readonly fonts: PlanFonts;
  readonly options?: TileOptions;
}

/** Drawings whose labels keep inside the printed pages, or a refusal when there would be too many pages. */
function drawForPaper(input: PlanInput, options: TileOptions): Result<Drawing[]> {
  const { airframe, development, layout, paper } = input;
  const bare = draw(development.parts, layout, { withoutTexts: true });
  const { pages, windows } = pageWindows(bare, paper, options);
  if (pages > MAX_PAGES) {
    const message = fill(words.tooManyPages, { pages, max: MAX_PAGES });
    return refuse({ code: 'too-many-pages', path: 'paper', message, fix: words.tooManyPagesFix });
  }
  return ok(draw(development.parts, layout, { materialName: materialWords(airframe.materials), windows }));
}

/**
 * The printed plan of an airframe from its parts and their layout. Refuses when a part has no place, when there are no parts,
 * when the paper is too small, or when the plan would take more than `MAX_PAGES` pages. What the development could not make
 * is listed on the first pages.
 */
export async function makePlan(input: PlanInput): Promise<Result<PlanFile>> {
  const { airframe, development, layout, figures } = input;
  const options = input.options ?? TILE_DEFAULTS;
  const problems = [...checkPaper(input.paper, options), ...layoutProblems(development, layout)];
  if (problems.length > 0) return refuse(...problems);
  const expected = expectedLines(development.parts, layout);
  const drawings = drawForPaper(input, options);
  if (!drawings.ok) return drawings;
  const file = await tile(drawings.value, input.paper, {
    design: input.revision?.design ?? airframe.name,
    revision: input.revision ?? null,
    figures,
    expected,
    fonts: input.fonts,
    notDrawn: development.problems.map(inWords),
    build: buildNotes(airframe, development, layout, figures),
    options,
  });
  return ok(file);
}
