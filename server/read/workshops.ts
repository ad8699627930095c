import { getDb } from '@/db/client';
import { membersOf, openInvitations, workshopName, workshopsOf } from '@/db/queries/members';
import type { Db } from '@/db/types';
import type { InvitationRow, MemberRow, WorkshopSummary } from '@/lib/contract/answers';
import type { Act } from '@/lib/contract/roles';
import type { Who } from '../context';
import { claim, type Member } from '../permissions';
import { notFound } from '../problems';

// Reads for pages and route handlers. Each takes the person and proves what they may see, or takes a proven member.

/** Database and proven membership for a page. */
export async function open(who: Who, workshopId: string, act: Act): Promise<{ db: Db; member: Member }> {
  const db = await getDb();
  return { db, member: await claim(db, who, workshopId, act) };
}

export async function summaryOf(db: Db, member: Member): Promise<WorkshopSummary> {
  const name = await workshopName(db, member.workshopId);
  if (name === undefined) throw notFound();
  return { id: member.workshopId, name, roles: member.roles };
}

/** The workshops that somebody belongs to, by name. */
export async function myWorkshops(who: Who): Promise<WorkshopSummary[]> {
  return workshopsOf(await getDb(), who.userId);
}

export async function workshop(who: Who, workshopId: string): Promise<WorkshopSummary> {
  const { db, member } = await open(who, workshopId, 'workshop.read');
  return summaryOf(db, member);
}

export async function members(who: Who, workshopId: string): Promise<MemberRow[]> {
  const { db, member } = await open(who, workshopId, 'member.list');
  return membersOf(db, member.workshopId);
}

/** Invitations that can still be accepted. */
export async function invitations(who: Who, workshopId: string, now: Date = new Date()): Promise<InvitationRow[]> {
  const { db, member } = await open(who, workshopId, 'invitation.list');
  return openInvitations(db, member.workshopId, now);
}
