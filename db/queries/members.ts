import { and, asc, eq, gt, isNull, sql } from 'drizzle-orm';
import type { InvitationRow, MemberRow, WorkshopSummary } from '@/lib/contract/answers';
import type { Role } from '@/lib/contract/roles';
import { invitation, membership, user, workshop } from '../schema';
import type { Db } from '../types';

export async function membershipOf(
  db: Db,
  workshopId: string,
  userId: string,
): Promise<{ id: string; roles: Role[] } | undefined> {
  const [row] = await db
    .select({ id: membership.id, roles: membership.roles })
    .from(membership)
    .where(and(eq(membership.workshopId, workshopId), eq(membership.userId, userId)));
  return row;
}

/** The workshops somebody belongs to, by name. */
export async function workshopsOf(db: Db, userId: string): Promise<WorkshopSummary[]> {
  return db
    .select({ id: workshop.id, name: workshop.name, roles: membership.roles })
    .from(membership)
    .innerJoin(workshop, eq(workshop.id, membership.workshopId))
    .where(eq(membership.userId, userId))
    .orderBy(asc(workshop.name), asc(workshop.id));
}

export async function workshopName(db: Db, workshopId: string): Promise<string | undefined> {
  const [row] = await db.select({ name: workshop.name }).from(workshop).where(eq(workshop.id, workshopId));
  return row?.name;
}

const memberColumns = {
  id: membership.id,
  userId: membership.userId,
  name: user.name,
  email: user.email,
  roles: membership.roles,
};

export async function membersOf(db: Db, workshopId: string): Promise<MemberRow[]> {
  return db
    .select(memberColumns)
    .from(membership)
    .innerJoin(user, eq(user.id, membership.userId))
    .where(eq(membership.workshopId, workshopId))
    .orderBy(asc(user.name), asc(membership.id));
}

export async function memberById(db: Db, workshopId: string, memberId: string): Promise<MemberRow | undefined> {
  const [row] = await db
    .select(memberColumns)
    .from(membership)
    .innerJoin(user, eq(user.id, membership.userId))
    .where(and(eq(membership.workshopId, workshopId), eq(membership.id, memberId)));
  return row;
}

export async function memberByEmail(db: Db, workshopId: string, email: string): Promise<{ id: string } | undefined> {
  const [row] = await db
    .select({ id: membership.id })
    .from(membership)
    .innerJoin(user, eq(user.id, membership.userId))
    .where(and(eq(membership.workshopId, workshopId), eq(user.email, email)));
  return row;
}

/** Holds the workshop's row until the transaction ends, so that two acts on its members come one after the other. */
export async function lockWorkshop(db: Db, workshopId: string): Promise<void> {
  await db.select({ id: workshop.id }).from(workshop).where(eq(workshop.id, workshopId)).for('update');
}

export async function ownersOf(db: Db, workshopId: string): Promise<{ id: string }[]> {
  return db
    .select({ id: membership.id })
    .from(membership)
    .where(and(eq(membership.workshopId, workshopId), sql`'owner' = any(${membership.roles})`));
}

/** Neither accepted, nor revoked, nor expired. */
export async function openInvitations(db: Db, workshopId: string, now: Date): Promise<InvitationRow[]> {
  const rows = await db
    .select({
      id: invitation.id,
      email: invitation.email,
      roles: invitation.roles,
      invitedBy: user.name,
      expiresAt: invitation.expiresAt,
    })
    .from(invitation)
    .innerJoin(user, eq(user.id, invitation.invitedBy))
    .where(
      and(
        eq(invitation.workshopId, workshopId),
        isNull(invitation.acceptedAt),
        isNull(invitation.revokedAt),
        gt(invitation.expiresAt, now),
      ),
    )
    .orderBy(asc(invitation.createdAt), asc(invitation.id));
  return rows.map((row) => ({ ...row, expiresAt: row.expiresAt.toISOString() }));
}

export type InvitationRecord = typeof invitation.$inferSelect & { readonly workshopName: string };

/** The invitation whose token has this hash, held until the transaction ends. */
export async function invitationByToken(db: Db, tokenHash: string): Promise<InvitationRecord | undefined> {
  const [row] = await db
    .select({ invitation, workshopName: workshop.name })
    .from(invitation)
    .innerJoin(workshop, eq(workshop.id, invitation.workshopId))
    .where(eq(invitation.tokenHash, tokenHash))
    .for('update', { of: invitation });
  return row === undefined ? undefined : { ...row.invitation, workshopName: row.workshopName };
}
