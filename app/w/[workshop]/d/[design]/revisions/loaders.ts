import { orNotFound } from '@/app/orNotFound';
import { may } from '@/lib/contract/roles';
import { draft } from '@/server/read/designs';
import { revisions } from '@/server/read/revisions';
import { workshop } from '@/server/read/workshops';
import { requireWho } from '@/server/session';

/** Every revision of a design, the newest first. */
export async function revisionsPage(workshopId: string, designId: string) {
  const who = await requireWho();
  const shop = await orNotFound(workshop(who, workshopId));
  const { designName } = await orNotFound(draft(who, workshopId, designId));
  const list = await revisions(who, workshopId, designId);
  return {
    who,
    shop,
    designName,
    list: [...list].sort((a, b) => b.number - a.number),
    mayRelease: may(shop.roles, 'revision.release'),
    mayPrintDraft: may(shop.roles, 'draft.print'),
  };
}
