import type { Airframe } from '@/lib/airframe/schema/airframe';
import type { Figures } from '@/lib/figures/types';
import type { LayoutFailure, SheetLayout } from '@/lib/layout/types';
import { ok, type Problem, type Result, refuse } from '@/lib/numerics/result';
import type { Development } from '@/lib/parts/types';
import { plan } from '@/lib/text/en/plan';
import { fill } from '@/lib/text/fill';
import { trimmedDigits } from '@/lib/units/number';
import { draw } from './draw';
import type { Drawing, Paper, PlanRevision } from './drawing';
import { type ExpectedLines, expectedLines } from './expected';
import type { PlanFile } from './manifest';
import type { PlanFonts } from './pdf/fonts';
import { tile } from './tile';
import { checkPaper, TILE_DEFAULTS, type TileOptions } from './tiling/format';

const words = plan.problems;

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
  }
};

/** What keeps a layout of these parts from being printed; empty when nothing does. A plan that lacks a part is never made. */
export function layoutProblems(development: Development, layout: SheetLayout): Problem[] {
  if (layout.failures.length > 0) return layout.failures.map(failureProblem);
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

/** Cut lines to be expected and the drawings of every sheet, or why there are none. */
export function drawSheets(development: Development, layout: SheetLayout): Result<SheetDrawings> {
  const problems = layoutProblems(development, layout);
  if (problems.length > 0) return refuse(...problems);
  const expected = expectedLines(development.parts, layout);
  return ok({ expected, drawings: draw(development.parts, layout) });
}

export interface PlanInput {
  readonly airframe: Pick<Airframe, 'name'>;
  readonly figures: Figures | null;
  readonly development: Development;
  readonly layout: SheetLayout;
  readonly paper: Paper;
  /** Without it every page says "draft". */
  readonly revision?: PlanRevision;
  readonly fonts: PlanFonts;
  readonly options?: TileOptions;
}

/**
 * The printed plan of an airframe from its parts and their layout. Refuses when a part has no place, when there are no parts,
 * or when the paper is too small. What the development could not make is listed on the first page.
 */
export async function makePlan(input: PlanInput): Promise<Result<PlanFile>> {
  const options = input.options ?? TILE_DEFAULTS;
  const paperProblems = checkPaper(input.paper, options);
  if (paperProblems.length > 0) return refuse(...paperProblems);
  const drawn = drawSheets(input.development, input.layout);
  if (!drawn.ok) return drawn;
  const file = await tile(drawn.value.drawings, input.paper, {
    design: input.revision?.design ?? input.airframe.name,
    revision: input.revision ?? null,
    figures: input.figures,
    expected: drawn.value.expected,
    fonts: input.fonts,
    notDrawn: input.development.problems.map(inWords),
    options,
  });
  return ok(file);
}
