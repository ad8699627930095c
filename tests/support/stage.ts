import { eq } from 'drizzle-orm';
import { mailOutbox, session } from '@/db/schema';
import type { Db } from '@/db/types';
import type { Role } from '@/lib/contract/roles';
import { createDesign } from '@/server/acts/createDesign';
import { createInvitation } from '@/server/acts/createInvitation';
import { createThread } from '@/server/acts/createThread';
import { releaseRevision } from '@/server/acts/releaseRevision';
import { removeMember } from '@/server/acts/removeMember';
import type { Who } from '@/server/context';
import { pusher } from './airframes';
import { type Account, account } from './api';
import { contextFor, foundWorkshop, joinWorkshop } from './people';

/** Ids that a route's [names] can take. */
export interface Ids {
  readonly workshop: string;
  readonly member: string;
  readonly invitation: string;
  readonly token: string;
  readonly design: string;
  readonly number: string;
  readonly thread: string;
}

export interface StagedWorkshop {
  readonly ids: Ids;
  readonly owner: Account;
  readonly designer: Account;
  readonly builder: Account;
  readonly reviewer: Account;
}

/** The token in the newest invitation to an address. */
async function tokenFor(db: Db, email: string): Promise<string> {
  const mails = await db.select().from(mailOutbox).where(eq(mailOutbox.recipient, email));
  const token = /\/invite\/([\w-]+)/.exec(mails.at(-1)?.text ?? '')?.[1];
  if (token === undefined) throw new RangeError(`no invitation was mailed to ${email}`);
  return token;
}

/** A workshop with one signed-in member a role, a released design with a comment on it, and an open invitation. */
export async function stagedWorkshop(db: Db, name: string): Promise<StagedWorkshop> {
  const workshop = await foundWorkshop(db, name);
  const join = async (role: Role) => {
    const made = await account(`${name} ${role}`);
    return { ...made, member: await joinWorkshop(db, made.who, workshop, [role]) };
  };
  const [owner, designer, builder, reviewer] = [
    await join('owner'),
    await join('designer'),
    await join('builder'),
    await join('reviewer'),
  ];
  const drawing = contextFor(db, designer.who);
  const { id: design } = await createDesign(drawing, designer.member, { name: `${name} one`, airframe: pusher() });
  const why = { reason: 'First.', expectedEffect: 'Flies.', draftVersion: 1 };
  await releaseRevision(drawing, designer.member, design, why);
  const thread = await createThread(
    contextFor(db, reviewer.who),
    reviewer.member,
    { designId: design, number: 1 },
    { anchor: { kind: 'element', key: 'wing' }, text: 'Here.' },
  );
  const email = `guest.of.${workshop.slice(0, 8)}@example.test`;
  const invited = await createInvitation(contextFor(db, owner.who, { now: new Date() }), owner.member, {
    email,
    roles: ['builder'],
  });
  const token = await tokenFor(db, email);
  const ids = {
    workshop,
    member: builder.member.id,
    invitation: invited.id,
    token,
    design,
    number: '1',
    thread: thread.id,
  };
  return { ids, owner, designer, builder, reviewer };
}

/** Somebody who was a designer here and is no member any more; their session goes on. */
export async function removedMember(db: Db, { ids, owner }: StagedWorkshop): Promise<Account> {
  const made = await account('Rolf Removed');
  const { id } = await joinWorkshop(db, made.who, ids.workshop, ['designer', 'owner']);
  const remover = { workshopId: ids.workshop, userId: owner.who.userId, roles: ['owner' as const] };
  await removeMember(contextFor(db, owner.who), remover, id);
  return made;
}

/** A session of this person that has ended: by idling, or by its absolute age. */
export async function endedSession(db: Db, who: Who, how: 'idle' | 'age'): Promise<void> {
  const day = 24 * 60 * 60 * 1000;
  const change =
    how === 'idle' ? { expiresAt: new Date(Date.now() - 1000) } : { createdAt: new Date(Date.now() - 31 * day) };
  await db.update(session).set(change).where(eq(session.userId, who.userId));
}
