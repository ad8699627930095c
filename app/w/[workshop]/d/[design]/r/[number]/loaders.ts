import { orNotFound } from '@/app/orNotFound';
import { figureRows } from '@/components/figures/rows';
import { elementList } from '@/components/review/elements';
import { partRows, stockRows } from '@/components/review/partRows';
import { planOutlines } from '@/lib/airframe/outlines';
import { may } from '@/lib/contract/roles';
import { revision, revisionParts, threads, verdicts } from '@/server/read/revisions';
import { workshop } from '@/server/read/workshops';
import { requireWho } from '@/server/session';

/** The revision alone, for the pages that only print it. */
export async function revisionPage(workshopId: string, designId: string, number: number) {
  const who = await requireWho();
  const shop = await orNotFound(workshop(who, workshopId));
  return { who, shop, revision: await orNotFound(revision(who, workshopId, designId, number)) };
}

/** Everything that a reviewer reads: the frozen airframe drawn, its figures and parts, what was said, what may be said. */
export async function reviewPage(workshopId: string, designId: string, number: number) {
  const base = await revisionPage(workshopId, designId, number);
  const { who, shop, revision: frozen } = base;
  const figures = figureRows(frozen.figures);
  const { development } = await revisionParts(who, workshopId, designId, number);
  const parts = partRows(development.parts, frozen.airframe);
  return {
    ...base,
    board: {
      name: frozen.designName,
      subjects: {
        outlines: planOutlines(frozen.airframe),
        elements: elementList(frozen.airframe),
        parts: parts.map(({ key, name, elementId }) => ({ key, name, elementId })),
        figures: figures.map(({ id, name }) => ({ id, name })),
      },
      marks: frozen.figures.marks,
      lists: { figures, parts, stock: stockRows(development.stockPieces) },
      threads: await threads(who, workshopId, designId, number),
      verdicts: await verdicts(who, workshopId, designId, number),
      may: {
        comment: may(shop.roles, 'thread.create'),
        close: may(shop.roles, 'thread.close'),
        verdict: may(shop.roles, 'verdict.give'),
      },
      own: frozen.releasedBy.id === who.userId,
    },
  };
}
