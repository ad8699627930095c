import { figureRows } from '@/components/figures/rows';
import type { UnitSystem } from '@/lib/units/quantity';
import { revisionPage } from '../loaders';

/** The figures frozen with the revision, as they are read in these units; charts are null where the engine of then made none. */
export async function figuresPage(workshopId: string, designId: string, number: number, system: UnitSystem) {
  const base = await revisionPage(workshopId, designId, number);
  const { figures } = base.revision;
  return {
    ...base,
    engine: figures.engine,
    rows: figureRows(figures, undefined, system),
    charts: figures.charts ?? null,
    problems: figures.problems,
  };
}
