import { cautionsFor } from '@/components/parts/cautions';
import { checkRows } from '@/components/parts/checkRows';
import { partPictures } from '@/components/parts/drawings';
import { planSprite } from '@/components/parts/where';
import { stockRows } from '@/components/review/partRows';
import { planOutlines } from '@/lib/airframe/outlines';
import { revisionParts } from '@/server/read/revisions';
import { revisionPage } from '../loaders';

/** The parts frozen with the revision, drawn, and what the check before cutting found: null where the engine of then did not check. */
export async function partsPage(workshopId: string, designId: string, number: number) {
  const base = await revisionPage(workshopId, designId, number);
  const { airframe, figures } = base.revision;
  const { development, checks } = await revisionParts(base.who, workshopId, designId, number);
  const sprite = planSprite(planOutlines(airframe));
  const pictures = partPictures(development.parts, airframe, figures.masses, sprite);
  const owners = pictures.groups.map(({ id }) => id);
  return {
    ...base,
    engine: figures.engine,
    problems: development.problems,
    sprite,
    pictures,
    stock: stockRows(development.stockPieces),
    cautions: cautionsFor(development, airframe),
    checks: checks === undefined ? null : checkRows(checks, airframe, owners),
  };
}
