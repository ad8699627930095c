import { revisionPage } from '../loaders';

/** The set-up sheet frozen with the revision: undefined where the engine of then made none, null where it could make none of this airframe. */
export async function setUpPage(workshopId: string, designId: string, number: number) {
  const base = await revisionPage(workshopId, designId, number);
  const { engine, setUp } = base.revision.figures;
  return { ...base, engine, sheet: setUp };
}
