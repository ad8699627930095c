import type { Problem } from '@/lib/numerics/result';
import { plan } from '@/lib/text/en/plan';
import { fill } from '@/lib/text/fill';
import { trimmedDigits } from '@/lib/units/number';
import type { Paper } from '../drawing';
import { PRINTER_MARGINS, type PrinterMargins } from '../paper';
import type { PageFormat } from './grid';

export interface TileOptions {
  readonly margins: PrinterMargins;
  readonly overlapMm: number;
}

/** Common practice, no source: 10 mm is wide enough for a glue stick. */
export const TILE_DEFAULTS: TileOptions = { margins: PRINTER_MARGINS, overlapMm: 10 };

/** Strips between what the printer reaches and the sheet's content: bars, names, page numbers and trim ticks stand there. */
export const STRIPS = { leftMm: 9, bottomMm: 11, rightMm: 4, topMm: 4 } as const;

const OVERLAP_MM = { least: 4, most: 40 } as const;
/** A window narrower than this beyond the overlap shows too little to join pages by, and cannot hold the 50 mm bar. */
const LEAST_STEP_MM = 60;

function formatOf(wMm: number, hMm: number, marginXMm: number, marginYMm: number): PageFormat {
  return {
    mediaMm: [wMm, hMm],
    clipMm: [
      marginXMm + STRIPS.leftMm,
      marginYMm + STRIPS.bottomMm,
      wMm - marginXMm - STRIPS.rightMm,
      hMm - marginYMm - STRIPS.topMm,
    ],
  };
}

/** The paper upright and lying, in this order. The ends of the paper keep their margin when it lies. */
export function formatsOf(paper: Paper, { margins }: TileOptions): readonly [upright: PageFormat, lying: PageFormat] {
  return [
    formatOf(paper.wMm, paper.hMm, margins.sidesMm, margins.endsMm),
    formatOf(paper.hMm, paper.wMm, margins.endsMm, margins.sidesMm),
  ];
}

/** Why nothing can be printed on this paper with these options; empty when it can. */
export function checkPaper(paper: Paper, options: TileOptions): Problem[] {
  const { least, most } = OVERLAP_MM;
  const got = options.overlapMm;
  if (!(got >= least && got <= most)) {
    const message = fill(plan.problems.badOverlap, { min: least, max: most, got });
    return [{ code: 'bad-overlap', path: 'overlapMm', message }];
  }
  for (const { mediaMm, clipMm } of formatsOf(paper, options)) {
    const left = Math.min(clipMm[2] - clipMm[0], clipMm[3] - clipMm[1]) - got;
    if (left >= LEAST_STEP_MM) continue;
    const message = fill(plan.problems.paperTooSmall, {
      paper: paper.name,
      w: trimmedDigits(mediaMm[0], 1),
      h: trimmedDigits(mediaMm[1], 1),
      left: trimmedDigits(left, 1),
      min: LEAST_STEP_MM,
    });
    return [{ code: 'paper-too-small', path: 'paper', message, fix: plan.problems.paperTooSmallFix }];
  }
  return [];
}
