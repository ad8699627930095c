import { threadsOf, verdictsOf } from '@/db/queries/review';
import { revisionSummary, revisionsOf } from '@/db/queries/revisions';
import type { Db } from '@/db/types';
import type { RevisionAnswer, RevisionSummary, ThreadAnswer, VerdictRow } from '@/lib/contract/answers';
import type { PlanRevision } from '@/lib/plan/drawing';
import type { ExportFile, Frozen } from '@/lib/plan/job';
import { frozenFigures, frozenOf } from '../artefacts';
import type { Who } from '../context';
import { storedAirframe } from '../drafts';
import type { Member } from '../permissions';
import { notFound } from '../problems';
import { designIn, revisionIn } from './claims';
import { open } from './workshops';

export async function revisionsIn(db: Db, member: Member, designId: string): Promise<RevisionSummary[]> {
  return revisionsOf(db, (await designIn(db, member, designId)).id);
}

/** A revision with its airframe and the figures frozen at its release. */
export async function revisionAnswer(
  db: Db,
  member: Member,
  designId: string,
  number: number | null,
): Promise<RevisionAnswer> {
  const { revision: row, designName } = await revisionIn(db, member, designId, number);
  const summary = await revisionSummary(db, row.id);
  if (summary === undefined) throw notFound();
  const figures = await frozenFigures(db, row.id);
  return { ...summary, designId: row.designId, designName, airframe: storedAirframe(row.body), figures };
}

export async function threadsIn(
  db: Db,
  member: Member,
  designId: string,
  number: number | null,
): Promise<ThreadAnswer[]> {
  return threadsOf(db, (await revisionIn(db, member, designId, number)).revision.id);
}

export async function verdictsIn(
  db: Db,
  member: Member,
  designId: string,
  number: number | null,
): Promise<VerdictRow[]> {
  return verdictsOf(db, (await revisionIn(db, member, designId, number)).revision.id);
}

/** All that the command line needs to print the same pages as the server. */
export async function exportIn(
  db: Db,
  member: Member,
  designId: string,
  number: number | null,
): Promise<Required<ExportFile>> {
  const { revision: row, designName } = await revisionIn(db, member, designId, number);
  const revision: PlanRevision = {
    number: row.number,
    state: row.state,
    releasedAt: row.releasedAt.toISOString(),
    design: designName,
  };
  return { revision, airframe: storedAirframe(row.body), frozen: await frozenOf(db, row.id) };
}

/** Newest first. */
export async function revisions(who: Who, workshopId: string, designId: string): Promise<RevisionSummary[]> {
  const { db, member } = await open(who, workshopId, 'revision.list');
  return revisionsIn(db, member, designId);
}

export async function revision(
  who: Who,
  workshopId: string,
  designId: string,
  number: number,
): Promise<RevisionAnswer> {
  const { db, member } = await open(who, workshopId, 'revision.read');
  return revisionAnswer(db, member, designId, number);
}

/** The parts frozen at the release, with what the check before cutting found about them. */
export async function revisionParts(
  who: Who,
  workshopId: string,
  designId: string,
  number: number,
): Promise<Pick<Frozen, 'development' | 'checks'>> {
  const { db, member } = await open(who, workshopId, 'revision.read');
  return (await exportIn(db, member, designId, number)).frozen;
}

export async function threads(who: Who, workshopId: string, designId: string, number: number): Promise<ThreadAnswer[]> {
  const { db, member } = await open(who, workshopId, 'thread.list');
  return threadsIn(db, member, designId, number);
}

/** Newest first. */
export async function verdicts(who: Who, workshopId: string, designId: string, number: number): Promise<VerdictRow[]> {
  const { db, member } = await open(who, workshopId, 'verdict.list');
  return verdictsIn(db, member, designId, number);
}
