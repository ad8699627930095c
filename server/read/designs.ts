import { designSummary, designsOf, latestRevision, newestDraft } from '@/db/queries/designs';
import type { Db } from '@/db/types';
import type { DesignSummary, DraftAnswer } from '@/lib/contract/answers';
import type { Who } from '../context';
import { draftAnswer } from '../drafts';
import type { Member } from '../permissions';
import { designIn } from './claims';
import { open } from './workshops';

export async function summaryIn(db: Db, member: Member, designId: string): Promise<DesignSummary> {
  const row = await designIn(db, member, designId);
  return designSummary(row, (await latestRevision(db, row.id)) ?? null);
}

export async function draftIn(db: Db, member: Member, designId: string): Promise<DraftAnswer> {
  const row = await designIn(db, member, designId);
  const newest = await newestDraft(db, row.id);
  if (newest === undefined) throw new RangeError(`design ${row.id} has no draft`);
  return draftAnswer(row, newest);
}

/** Designs that are not archived, last touched first. */
export async function designs(who: Who, workshopId: string): Promise<DesignSummary[]> {
  const { db, member } = await open(who, workshopId, 'design.list');
  return designsOf(db, member.workshopId);
}

export async function design(who: Who, workshopId: string, designId: string): Promise<DesignSummary> {
  const { db, member } = await open(who, workshopId, 'design.read');
  return summaryIn(db, member, designId);
}

/** The newest draft save. */
export async function draft(who: Who, workshopId: string, designId: string): Promise<DraftAnswer> {
  const { db, member } = await open(who, workshopId, 'draft.read');
  return draftIn(db, member, designId);
}
