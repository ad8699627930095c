import { randomBytes } from 'node:crypto';
import type { z } from 'zod';
import { lockWorkshop, memberByEmail, openInvitations, workshopName } from '@/db/queries/members';
import { invitation } from '@/db/schema';
import type { Tx } from '@/db/types';
import type { InvitationRow } from '@/lib/contract/answers';
import type { CreateInvitation } from '@/lib/contract/bodies';
import { texts as mails } from '@/lib/text/en/mail';
import { texts } from '@/lib/text/en/server';
import { fill } from '@/lib/text/fill';
import { countTry, INVITING } from '../auth/throttle';
import { type ActContext, transact } from '../context';
import { sha256 } from '../ids';
import { queueMail } from '../mail/queue';
import type { Member } from '../permissions';
import { AppError, notFound } from '../problems';
import { audit } from './audit';

/** Long enough for somebody who reads mail once a week, and then some. */
export const INVITATION_DAYS = 14;
const DAY_MS = 24 * 60 * 60 * 1000;

/** Invites an address with a set of roles. The token goes out by mail only; the table keeps its hash. */
export function createInvitation(
  context: ActContext,
  member: Member,
  input: z.infer<typeof CreateInvitation>,
): Promise<InvitationRow> {
  const email = input.email.toLowerCase();
  const { workshopId } = member;
  return transact(context, async (tx) => {
    await lockWorkshop(tx, workshopId);
    const name = await workshopName(tx, workshopId);
    if (name === undefined) throw notFound();
    if ((await memberByEmail(tx, workshopId, email)) !== undefined)
      throw new AppError('conflict', texts.details.alreadyMember);
    const open = await openInvitations(tx, workshopId, context.now);
    if (open.some((other) => other.email === email)) throw new AppError('conflict', texts.details.alreadyInvited);

    await assertNotTooMany(tx, context, email);
    const token = randomBytes(32).toString('base64url');
    const expiresAt = new Date(context.now.getTime() + INVITATION_DAYS * DAY_MS);
    const id = context.newId();
    await tx.insert(invitation).values({
      id,
      workshopId,
      tokenHash: sha256(token),
      email,
      roles: input.roles,
      invitedBy: context.who.userId,
      createdAt: context.now,
      expiresAt,
    });
    await queueMail(tx, context, {
      kind: 'invitation',
      recipient: email,
      subject: fill(mails.invitation.subject, { inviter: context.who.name, workshop: name }),
      text: fill(mails.invitation.text, {
        inviter: context.who.name,
        workshop: name,
        roles: input.roles.join(', '),
        url: `${context.baseUrl}/invite/${token}`,
        expires: expiresAt.toISOString().slice(0, 10),
      }),
    });
    await audit(tx, context, { act: 'invitation.create', workshopId, subjectId: id, detail: { email } });
    return {
      id,
      email,
      roles: input.roles,
      invitedBy: context.who.name,
      expiresAt: expiresAt.toISOString(),
    };
  });
}

/** The mail goes to whatever address was typed, so it counts against who sends and against who would get it. */
async function assertNotTooMany(tx: Tx, { who, now }: ActContext, email: string): Promise<void> {
  const wait = await countTry(tx, { path: INVITING, email, address: who.userId }, now);
  if (wait === null) return;
  const message = fill(texts.details.tooManyInvitations, { minutes: Math.ceil(wait / 60) });
  throw new AppError('too-many', message, { retryAfterSeconds: wait });
}
