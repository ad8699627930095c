import { eq } from 'drizzle-orm';
import type { z } from 'zod';
import { lockWorkshop, memberById } from '@/db/queries/members';
import { membership } from '@/db/schema';
import type { MemberRow } from '@/lib/contract/answers';
import type { SetRoles } from '@/lib/contract/bodies';
import { type ActContext, transact } from '../context';
import { isId } from '../ids';
import type { Member } from '../permissions';
import { notFound } from '../problems';
import { audit } from './audit';
import { assertAnOwnerRemains } from './lastOwner';
import { withdrawInvitationsOf } from './withdrawInvitations';

/** Gives a member this set of roles. The workshop's last owner stays one. */
export function setRoles(
  context: ActContext,
  member: Member,
  memberId: string,
  input: z.infer<typeof SetRoles>,
): Promise<MemberRow> {
  return transact(context, async (tx) => {
    await lockWorkshop(tx, member.workshopId);
    const target = isId(memberId) ? await memberById(tx, member.workshopId, memberId) : undefined;
    if (target === undefined) throw notFound();
    if (!input.roles.includes('owner')) {
      await assertAnOwnerRemains(tx, member.workshopId, target.id);
      await withdrawInvitationsOf(tx, context, member.workshopId, target.userId);
    }
    await tx.update(membership).set({ roles: input.roles }).where(eq(membership.id, target.id));
    await audit(tx, context, {
      act: 'member.setRoles',
      workshopId: member.workshopId,
      subjectId: target.userId,
      detail: { roles: input.roles.join(' ') },
    });
    return { ...target, roles: input.roles };
  });
}
