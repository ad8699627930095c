import { orNotFound } from '@/app/orNotFound';
import { may } from '@/lib/contract/roles';
import { draft } from '@/server/read/designs';
import { workshop } from '@/server/read/workshops';
import { requireWho } from '@/server/session';

/** Whose draft is printed, and whether who asks may. */
export async function printDraftPage(workshopId: string, designId: string) {
  const who = await requireWho();
  const shop = await orNotFound(workshop(who, workshopId));
  const { designName } = await orNotFound(draft(who, workshopId, designId));
  return { who, shop, designName, mayPrint: may(shop.roles, 'draft.print') };
}
