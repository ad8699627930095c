import { liftingLineEfficiency } from '@/lib/aero/liftingLine';
import type { AeroModel } from '@/lib/aero/model';
import type { Airframe } from '@/lib/airframe/schema/airframe';
import type { Problem, Result } from '@/lib/numerics/result';
import { texts } from '@/lib/text/en/figures';
import { SPAN_EFFICIENCY_ERROR_PCT } from './bands';
import type { Areas, WingReference } from './reference';
import { reynoldsFigure } from './stall';
import type { FigureValue } from './types';
import { type FigureSet, firstProblem, known, missing } from './value';
import { handbookFigure, tailVolumeH, tailVolumeV } from './volumes';

/** Figures of the shape alone, and the lattice's beside the handbook's. */
export function shapeFigures(
  { airframe, areas, wing }: { readonly airframe: Airframe; readonly areas: Areas; readonly wing: WingReference },
  model: Result<AeroModel>,
): FigureSet {
  return {
    tailVolumeH: tailVolumeH(areas.surfaces, wing),
    tailVolumeV: tailVolumeV(areas.surfaces, wing),
    neutralPointHandbookXMm: handbookFigure(areas.surfaces, wing, model.ok ? model.value.neutralPointX : null),
    spanEfficiency: model.ok ? efficiencyFigure(areas, model.value) : missing(firstProblem(model)),
    reynoldsMac: reynoldsFigure(airframe, wing),
    liftSlopePerRad: model.ok ? known(model.value.alpha.lift) : missing(firstProblem(model)),
  };
}

const impossibleDrag: Problem = { code: 'drag-not-possible', path: 'surfaces', message: texts.problems.impossibleDrag };

/** By the far field of everything that lifts; beside it the first wing alone, by hand. */
function efficiencyFigure({ surfaces }: Areas, { spanEfficiency }: AeroModel): FigureValue {
  const wing = surfaces.find(({ surface }) => surface.role === 'wing');
  const stations = wing?.sections.map(({ le, chord, incidenceRad }) => ({ y: le[1], chord, incidenceRad }));
  const byHand = stations ? liftingLineEfficiency(stations) : null;
  const inputs = byHand === null ? [] : [{ name: texts.inputs.liftingLine, value: byHand, unit: '' }];
  if (!(spanEfficiency > 0)) return missing(impossibleDrag);
  const error = (spanEfficiency * SPAN_EFFICIENCY_ERROR_PCT.value) / 100;
  const band = { low: spanEfficiency - error, high: spanEfficiency + error, cause: texts.causes.latticeEnds };
  return known(spanEfficiency, { band, inputs });
}
