import { orNotFound } from '@/app/orNotFound';
import { may } from '@/lib/contract/roles';
import { designs } from '@/server/read/designs';
import { invitations, members, workshop } from '@/server/read/workshops';
import { requireWho } from '@/server/session';

/** The workshop and its designs. */
export async function designsPage(workshopId: string) {
  const who = await requireWho();
  const shop = await orNotFound(workshop(who, workshopId));
  return { who, shop, list: await designs(who, workshopId) };
}

/** The workshop and its people; invitations for who may see them. */
export async function membersPage(workshopId: string) {
  const who = await requireWho();
  const shop = await orNotFound(workshop(who, workshopId));
  return {
    who,
    shop,
    people: await members(who, workshopId),
    invited: may(shop.roles, 'invitation.list') ? await invitations(who, workshopId) : [],
  };
}
