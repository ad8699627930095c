import { eq } from 'drizzle-orm';
import { invitationByToken } from '@/db/queries/members';
import { invitation } from '@/db/schema';
import type { WorkshopSummary } from '@/lib/contract/answers';
import { texts } from '@/lib/text/en/server';
import { fill } from '@/lib/text/fill';
import { type ActContext, transact } from '../context';
import { sha256 } from '../ids';
import { AppError, notFound } from '../problems';
import { audit } from './audit';
import { join } from './join';

/** Joins the workshop with the invited roles; a member who is invited again gains them. Only the invited address can accept. */
export function acceptInvitation(context: ActContext, token: string): Promise<WorkshopSummary> {
  return transact(context, async (tx) => {
    const found = await invitationByToken(tx, sha256(token));
    if (found === undefined) throw notFound();
    if (found.revokedAt !== null) throw new AppError('gone', texts.details.invitationRevoked);
    if (found.email !== context.who.email.toLowerCase())
      throw new AppError('forbidden', texts.details.invitationForAnother);
    if (found.acceptedAt !== null) throw new AppError('gone', texts.details.invitationUsed);
    if (found.expiresAt <= context.now) {
      const date = found.expiresAt.toISOString().slice(0, 10);
      throw new AppError('gone', fill(texts.details.invitationExpired, { date }));
    }
    const { workshopId } = found;
    const { userId } = context.who;
    const roles = await join(tx, context, workshopId, found.roles);
    await tx.update(invitation).set({ acceptedAt: context.now, acceptedBy: userId }).where(eq(invitation.id, found.id));
    await audit(tx, context, { act: 'invitation.accept', workshopId, subjectId: found.id });
    return { id: workshopId, name: found.workshopName, roles };
  });
}
