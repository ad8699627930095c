import { couponParts } from '@/lib/aids/coupon';
import { workshopAids } from '@/lib/aids/workshopAids';
import { resolve } from '@/lib/airframe/resolve';
import type { Airframe } from '@/lib/airframe/schema/airframe';
import { checkBeforeCut } from '@/lib/checks/checkBeforeCut';
import type { CheckFigures, CheckResult } from '@/lib/checks/types';
import { analyse } from '@/lib/figures/analyse';
import type { Figures } from '@/lib/figures/types';
import { layOut } from '@/lib/layout/layOut';
import { LAYOUT_DEFAULTS, stockOf } from '@/lib/layout/stock';
import { ok, type Result, refuse } from '@/lib/numerics/result';
import { develop } from '@/lib/parts/develop';
import type { Development } from '@/lib/parts/types';
import type { ExportFile, Frozen } from '@/lib/plan/job';
import { layoutProblems, makePlan } from '@/lib/plan/makePlan';
import type { PlanFile } from '@/lib/plan/manifest';
import { PAPERS, paperById } from '@/lib/plan/paper';
import type { PlanFonts } from '@/lib/plan/pdf/fonts';
import { plan } from '@/lib/text/en/plan';
import { fill } from '@/lib/text/fill';
import { readFonts } from './fonts';

/** The figures that the check before cutting asks for, as far as they could be worked out. */
function checkFigures({ marks, values }: Figures): CheckFigures {
  const known = (id: string): number | undefined => values[id]?.value ?? undefined;
  return {
    cg: marks.cg ?? undefined,
    packFirstFlightMm: known('packFirstFlightMm'),
    hingeTorquePct: known('hingeTorquePct'),
  };
}

/** What the check before cutting finds; undefined for an airframe whose pieces stand nowhere. */
function checksOf(airframe: Airframe, development: Development, figures: Figures): CheckResult[] | undefined {
  const resolved = resolve(airframe);
  if (!resolved.ok) return undefined;
  return checkBeforeCut({ airframe, resolved: resolved.value, development, figures: checkFigures(figures) });
}

/** Everything that is frozen at a release, computed from the document. */
export function compute(airframe: Airframe): Frozen {
  const development = develop(airframe);
  const layout = layOut(development.parts, stockOf(airframe), LAYOUT_DEFAULTS);
  const figures = analyse(airframe, { depth: 'full' });
  return { figures, development, layout, checks: checksOf(airframe, development, figures) };
}

/** What a release keeps; refused when the parts cannot be printed, for a revision is there to be cut. */
export function freeze(airframe: Airframe): Result<Frozen> {
  const frozen = compute(airframe);
  const problems = layoutProblems(frozen.development, frozen.layout);
  return problems.length > 0 ? refuse(...problems) : ok(frozen);
}

/** What to print: frozen artefacts as they were released, otherwise computed now. */
export const artefactsOf = (file: ExportFile): Frozen => file.frozen ?? compute(file.airframe);

/** Materials that foam parts are cut from: what a coupon can tell something of. */
const foamOf = ({ materials }: Airframe, { parts }: Development) =>
  materials.filter(
    ({ id, kind }) => kind !== 'ply' && kind !== 'balsa' && parts.some((part) => part.materialId === id),
  );

/** Workshop aids for this aircraft and a coupon of each foam sheet, on sheets of their own: they are cut from whatever is left over. */
export function aidsOf(airframe: Airframe, { figures, development }: Frozen): Frozen {
  const firstFlightCgXMm = figures.marks.firstFlightCgXMm;
  const parts = [
    ...workshopAids({ airframe, parts: development.parts, firstFlightCgXMm }),
    ...foamOf(airframe, development).flatMap((material) => couponParts(material, material.id, airframe.build)),
  ];
  const layout = layOut(parts, stockOf(airframe), LAYOUT_DEFAULTS);
  return { figures, development: { parts, stockPieces: [], problems: [] }, layout };
}

/** The plan of a file on a paper by its id. `fonts` reads the fonts where the program does not run from its bundle. */
export async function planOf(
  file: ExportFile,
  artefacts: Frozen,
  paperId: string,
  fonts: () => Promise<PlanFonts> | PlanFonts = readFonts,
): Promise<Result<PlanFile>> {
  const paper = paperById(paperId);
  if (!paper) {
    const message = fill(plan.problems.unknownPaper, { paper: paperId, known: Object.keys(PAPERS).join(', ') });
    return refuse({ code: 'unknown-paper', path: 'paper', message });
  }
  return makePlan({
    airframe: file.airframe,
    ...artefacts,
    paper,
    revision: file.revision,
    fonts: await fonts(),
  });
}
