import { and, eq, isNull } from 'drizzle-orm';
import { invitation } from '@/db/schema';
import { type ActContext, transact } from '../context';
import { isId } from '../ids';
import type { Member } from '../permissions';
import { notFound } from '../problems';
import { audit } from './audit';

/** Withdraws an invitation that nobody has accepted. Its link stops working at once. */
export function revokeInvitation(context: ActContext, member: Member, invitationId: string): Promise<null> {
  return transact(context, async (tx) => {
    if (!isId(invitationId)) throw notFound();
    const revoked = await tx
      .update(invitation)
      .set({ revokedAt: context.now })
      .where(
        and(
          eq(invitation.id, invitationId),
          eq(invitation.workshopId, member.workshopId),
          isNull(invitation.acceptedAt),
          isNull(invitation.revokedAt),
        ),
      )
      .returning({ id: invitation.id });
    if (revoked.length === 0) throw notFound();
    await audit(tx, context, {
      act: 'invitation.revoke',
      workshopId: member.workshopId,
      subjectId: invitationId,
    });
    return null;
  });
}
