import { orNotFound } from '@/app/orNotFound';
import { may } from '@/lib/contract/roles';
import { design, draft } from '@/server/read/designs';
import { workshop } from '@/server/read/workshops';
import { requireWho } from '@/server/session';

/** The draft for the board, and what the person may do with it. */
export async function boardPage(workshopId: string, designId: string) {
  const who = await requireWho();
  const shop = await orNotFound(workshop(who, workshopId));
  const [now, summary] = await Promise.all([
    orNotFound(draft(who, workshopId, designId)),
    orNotFound(design(who, workshopId, designId)),
  ]);
  return {
    draft: now,
    latest: summary.latestRevision,
    may: {
      save: may(shop.roles, 'draft.save'),
      release: may(shop.roles, 'revision.release'),
      print: may(shop.roles, 'draft.print'),
    },
  };
}
