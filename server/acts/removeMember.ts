import { eq } from 'drizzle-orm';
import { lockWorkshop, memberById } from '@/db/queries/members';
import { membership } from '@/db/schema';
import { type ActContext, transact } from '../context';
import { isId } from '../ids';
import type { Member } from '../permissions';
import { notFound } from '../problems';
import { audit } from './audit';
import { assertAnOwnerRemains } from './lastOwner';
import { withdrawInvitationsOf } from './withdrawInvitations';

/** Ends a membership. What the person drew, wrote and released stays under their name. */
export function removeMember(context: ActContext, member: Member, memberId: string): Promise<null> {
  return transact(context, async (tx) => {
    await lockWorkshop(tx, member.workshopId);
    const target = isId(memberId) ? await memberById(tx, member.workshopId, memberId) : undefined;
    if (target === undefined) throw notFound();
    if (target.roles.includes('owner')) await assertAnOwnerRemains(tx, member.workshopId, target.id);
    await withdrawInvitationsOf(tx, context, member.workshopId, target.userId);
    await tx.delete(membership).where(eq(membership.id, target.id));
    await audit(tx, context, { act: 'member.remove', workshopId: member.workshopId, subjectId: target.userId });
    return null;
  });
}
