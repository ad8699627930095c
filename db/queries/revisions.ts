import { and, asc, desc, eq, sql } from 'drizzle-orm';
import type { RevisionSummary } from '@/lib/contract/answers';
import { type ArtefactKind, artefact, commentThread, design, revision, user } from '../schema';
import type { Db } from '../types';

export type RevisionRecord = typeof revision.$inferSelect;

const summaryColumns = {
  id: revision.id,
  number: revision.number,
  state: revision.state,
  reason: revision.reason,
  expectedEffect: revision.expectedEffect,
  releasedAt: revision.releasedAt,
  releasedById: user.id,
  releasedByName: user.name,
  sha256: revision.sha256,
  openThreads: sql<number>`(select count(*)::int from ${commentThread} where ${commentThread.revisionId} = ${revision.id} and ${commentThread.state} = 'open')`,
};

type SummaryRow = Omit<RevisionSummary, 'releasedAt' | 'releasedBy'> & {
  readonly releasedAt: Date;
  readonly releasedById: string;
  readonly releasedByName: string;
};

const summary = ({ releasedAt, releasedById, releasedByName, ...rest }: SummaryRow): RevisionSummary => ({
  ...rest,
  releasedAt: releasedAt.toISOString(),
  releasedBy: { id: releasedById, name: releasedByName },
});

/** Newest first. The design's id must have been proven. */
export async function revisionsOf(db: Db, designId: string): Promise<RevisionSummary[]> {
  const rows = await db
    .select(summaryColumns)
    .from(revision)
    .innerJoin(user, eq(user.id, revision.releasedBy))
    .where(eq(revision.designId, designId))
    .orderBy(desc(revision.number));
  return rows.map(summary);
}

export async function revisionSummary(db: Db, revisionId: string): Promise<RevisionSummary | undefined> {
  const [row] = await db
    .select(summaryColumns)
    .from(revision)
    .innerJoin(user, eq(user.id, revision.releasedBy))
    .where(eq(revision.id, revisionId));
  return row === undefined ? undefined : summary(row);
}

/** A revision by its number, through its design and workshop. */
export async function revisionByNumber(
  db: Db,
  workshopId: string,
  designId: string,
  number: number,
): Promise<{ revision: RevisionRecord; designName: string; archivedAt: Date | null } | undefined> {
  const [row] = await db
    .select({ revision, designName: design.name, archivedAt: design.archivedAt })
    .from(revision)
    .innerJoin(design, eq(design.id, revision.designId))
    .where(and(eq(design.workshopId, workshopId), eq(design.id, designId), eq(revision.number, number)));
  return row;
}

/** Holds the revision's row until the transaction ends: numbers of threads and verdicts are given under it. */
export async function lockRevision(db: Db, revisionId: string): Promise<void> {
  await db.select({ id: revision.id }).from(revision).where(eq(revision.id, revisionId)).for('update');
}

/** Frozen bodies of a revision, by kind. */
export async function artefactsOf(
  db: Db,
  revisionId: string,
): Promise<{ kind: ArtefactKind; engine: string; body: Uint8Array }[]> {
  return db
    .select({ kind: artefact.kind, engine: artefact.engine, body: artefact.body })
    .from(artefact)
    .where(eq(artefact.revisionId, revisionId))
    .orderBy(asc(artefact.kind));
}

export async function artefactOf(db: Db, revisionId: string, kind: ArtefactKind): Promise<Uint8Array | undefined> {
  const [row] = await db
    .select({ body: artefact.body })
    .from(artefact)
    .where(and(eq(artefact.revisionId, revisionId), eq(artefact.kind, kind)));
  return row?.body;
}
