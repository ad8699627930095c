import { eq } from 'drizzle-orm';
import { describe, expect, it } from 'vitest';
import { membersOf, openInvitations, workshopsOf } from '@/db/queries/members';
import { auditEvent, invitation, mailOutbox } from '@/db/schema';
import { acceptInvitation } from '@/server/acts/acceptInvitation';
import { createInvitation } from '@/server/acts/createInvitation';
import { createWorkshop } from '@/server/acts/createWorkshop';
import { removeMember } from '@/server/acts/removeMember';
import { revokeInvitation } from '@/server/acts/revokeInvitation';
import { setRoles } from '@/server/acts/setRoles';
import { claim } from '@/server/permissions';
import { rolledBack } from '../support/db';
import { contextFor, NOW, person, scene } from '../support/people';

const days = (count: number): Date => new Date(NOW.getTime() + count * 24 * 60 * 60 * 1000);

describe('a workshop', () => {
  it('belongs to whoever founded it, and the founding is on record', () =>
    rolledBack(async (tx) => {
      const who = await person(tx, 'Fay Founder');
      const made = await createWorkshop(contextFor(tx, who), { name: 'Shed' });
      expect(await workshopsOf(tx, who.userId)).toEqual([{ id: made.id, name: 'Shed', roles: ['owner', 'designer'] }]);
      const events = await tx.select().from(auditEvent).where(eq(auditEvent.workshopId, made.id));
      expect(events).toMatchObject([{ act: 'workshop.create', actorId: who.userId, at: NOW }]);
    }));

  it('is not found for somebody outside, and forbidden beyond the roles of somebody inside', () =>
    rolledBack(async (tx) => {
      const { workshopId, builder } = await scene(tx);
      const outsider = await person(tx, 'Otto Outside');
      await expect(claim(tx, outsider, workshopId, 'design.list')).rejects.toMatchObject({ kind: 'not-found' });
      await expect(claim(tx, builder.who, 'no-such-id', 'design.list')).rejects.toMatchObject({ kind: 'not-found' });
      await expect(claim(tx, builder.who, workshopId, 'revision.release')).rejects.toMatchObject({
        kind: 'forbidden',
        detail: expect.stringContaining('designer'),
      });
      await expect(claim(tx, builder.who, workshopId, 'design.list')).resolves.toMatchObject({ roles: ['builder'] });
    }));
});

describe('members', () => {
  it('take any set of roles, but the last owner stays one and stays in', () =>
    rolledBack(async (tx) => {
      const { owner, designer } = await scene(tx);
      const lastOwner = { kind: 'conflict', detail: expect.stringContaining('at least one owner') };
      await expect(
        setRoles(owner.context, owner.member, owner.member.id, { roles: ['designer'] }),
      ).rejects.toMatchObject(lastOwner);
      await expect(removeMember(owner.context, owner.member, owner.member.id)).rejects.toMatchObject(lastOwner);

      await setRoles(owner.context, owner.member, designer.member.id, { roles: ['owner', 'designer'] });
      await removeMember(owner.context, owner.member, owner.member.id);
      const left = await membersOf(tx, owner.member.workshopId);
      expect(left.map((member) => member.name)).toEqual(['Bo Builder', 'Dina Designer', 'Rut Reviewer']);
    }));

  it('of another workshop are not found', () =>
    rolledBack(async (tx) => {
      const here = await scene(tx);
      const there = await scene(tx);
      await expect(
        setRoles(here.owner.context, here.owner.member, there.builder.member.id, { roles: ['owner'] }),
      ).rejects.toMatchObject({ kind: 'not-found' });
      await expect(removeMember(here.owner.context, here.owner.member, there.builder.member.id)).rejects.toMatchObject({
        kind: 'not-found',
      });
      expect(await membersOf(tx, there.workshopId)).toHaveLength(4);
    }));
});

describe('an invitation', () => {
  const invite = async (tx: Parameters<Parameters<typeof rolledBack>[0]>[0]) => {
    const { owner, workshopId } = await scene(tx);
    const guest = await person(tx, 'Gus Guest');
    const row = await createInvitation(owner.context, owner.member, {
      email: guest.email.toUpperCase(),
      roles: ['reviewer'],
    });
    const [mail] = await tx.select().from(mailOutbox).where(eq(mailOutbox.recipient, guest.email));
    const token = /\/invite\/([\w-]+)/.exec(mail?.text ?? '')?.[1] ?? '';
    return { owner, workshopId, guest, row, token };
  };

  it('goes out by mail, keeps only the hash of its token, and makes whoever holds the address a member', () =>
    rolledBack(async (tx) => {
      const { workshopId, guest, row, token } = await invite(tx);
      expect(token.length).toBeGreaterThan(40);
      const [stored] = await tx.select().from(invitation).where(eq(invitation.id, row.id));
      expect(JSON.stringify(stored)).not.toContain(token);
      const joined = await acceptInvitation(contextFor(tx, guest), token);
      expect(joined).toEqual({ id: workshopId, name: 'Test shed', roles: ['reviewer'] });
      expect(await workshopsOf(tx, guest.userId)).toHaveLength(1);
      expect(await openInvitations(tx, workshopId, NOW)).toEqual([]);
      await expect(acceptInvitation(contextFor(tx, guest), token)).rejects.toMatchObject({ kind: 'gone' });
    }));

  it('is of no use to another address', () =>
    rolledBack(async (tx) => {
      const { token } = await invite(tx);
      const thief = await person(tx, 'Theo Thief');
      await expect(acceptInvitation(contextFor(tx, thief), token)).rejects.toMatchObject({ kind: 'forbidden' });
      expect(await workshopsOf(tx, thief.userId)).toEqual([]);
    }));

  it('ends after two weeks and when it is withdrawn', () =>
    rolledBack(async (tx) => {
      const { guest, token, owner, row } = await invite(tx);
      const late = contextFor(tx, guest, { now: days(14) });
      await expect(acceptInvitation(late, token)).rejects.toMatchObject({
        kind: 'gone',
        detail: expect.stringContaining('2026-03-28'),
      });
      await revokeInvitation(owner.context, owner.member, row.id);
      await expect(acceptInvitation(contextFor(tx, guest), token)).rejects.toMatchObject({ kind: 'gone' });
      await expect(revokeInvitation(owner.context, owner.member, row.id)).rejects.toMatchObject({ kind: 'not-found' });
    }));

  it('is sent once to an address, and not to a member', () =>
    rolledBack(async (tx) => {
      const { owner, guest, token } = await invite(tx);
      const again = { email: guest.email, roles: ['builder' as const] };
      await expect(createInvitation(owner.context, owner.member, again)).rejects.toMatchObject({ kind: 'conflict' });
      await acceptInvitation(contextFor(tx, guest), token);
      await expect(createInvitation(owner.context, owner.member, again)).rejects.toMatchObject({
        detail: expect.stringContaining('member already'),
      });
    }));

  it('with a token that nobody was sent is not found', () =>
    rolledBack(async (tx) => {
      const guest = await person(tx, 'Gus Guest');
      await expect(acceptInvitation(contextFor(tx, guest), 'x'.repeat(43))).rejects.toMatchObject({
        kind: 'not-found',
      });
    }));
});
