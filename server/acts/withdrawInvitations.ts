import { and, eq, isNull } from 'drizzle-orm';
import { invitation } from '@/db/schema';
import type { Tx } from '@/db/types';
import type { ActContext } from '../context';
import { audit } from './audit';

/** Withdraws what somebody who is no owner any more has sent out: one of them may lead back to an address of their own. */
export async function withdrawInvitationsOf(
  tx: Tx,
  context: ActContext,
  workshopId: string,
  invitedBy: string,
): Promise<void> {
  const withdrawn = await tx
    .update(invitation)
    .set({ revokedAt: context.now })
    .where(
      and(
        eq(invitation.workshopId, workshopId),
        eq(invitation.invitedBy, invitedBy),
        isNull(invitation.acceptedAt),
        isNull(invitation.revokedAt),
      ),
    )
    .returning({ id: invitation.id });
  for (const { id } of withdrawn) await audit(tx, context, { act: 'invitation.revoke', workshopId, subjectId: id });
}
