import { and, desc, eq, isNull } from 'drizzle-orm';
import type { DesignSummary, RevisionState } from '@/lib/contract/answers';
import { design, draftSave, revision, user } from '../schema';
import type { Db } from '../types';

export type DesignRecord = typeof design.$inferSelect;

/** A design of this workshop, archived or not. */
export async function designById(db: Db, workshopId: string, designId: string): Promise<DesignRecord | undefined> {
  const [row] = await db
    .select()
    .from(design)
    .where(and(eq(design.id, designId), eq(design.workshopId, workshopId)));
  return row;
}

/** As `designById`, and holds the row until the transaction ends. */
export async function lockDesign(db: Db, workshopId: string, designId: string): Promise<DesignRecord | undefined> {
  const [row] = await db
    .select()
    .from(design)
    .where(and(eq(design.id, designId), eq(design.workshopId, workshopId)))
    .for('update');
  return row;
}

interface LatestRevision {
  readonly number: number;
  readonly state: RevisionState;
  readonly releasedAt: Date;
}

/** The newest revision of one design, or undefined. */
export async function latestRevision(db: Db, designId: string): Promise<(LatestRevision & { id: string }) | undefined> {
  const [row] = await db
    .select({ id: revision.id, number: revision.number, state: revision.state, releasedAt: revision.releasedAt })
    .from(revision)
    .where(eq(revision.designId, designId))
    .orderBy(desc(revision.number))
    .limit(1);
  return row;
}

export const designSummary = (row: DesignRecord, latest: LatestRevision | null): DesignSummary => ({
  id: row.id,
  name: row.name,
  updatedAt: row.updatedAt.toISOString(),
  latestRevision:
    latest === null
      ? null
      : { number: latest.number, state: latest.state, releasedAt: latest.releasedAt.toISOString() },
  spanMm: row.spanMm,
  massG: row.massG,
  thumbnail: row.thumbnail,
});

/** The designs that are not archived, last touched first, each with its newest revision, in one query. */
export async function designsOf(db: Db, workshopId: string): Promise<DesignSummary[]> {
  const newest = db
    .selectDistinctOn([revision.designId], {
      designId: revision.designId,
      number: revision.number,
      state: revision.state,
      releasedAt: revision.releasedAt,
    })
    .from(revision)
    .innerJoin(design, eq(design.id, revision.designId))
    .where(eq(design.workshopId, workshopId))
    .orderBy(revision.designId, desc(revision.number))
    .as('newest');
  const rows = await db
    .select({ design, number: newest.number, state: newest.state, releasedAt: newest.releasedAt })
    .from(design)
    .leftJoin(newest, eq(newest.designId, design.id))
    .where(and(eq(design.workshopId, workshopId), isNull(design.archivedAt)))
    .orderBy(desc(design.updatedAt), desc(design.id));
  return rows.map(({ design: row, number, state, releasedAt }) =>
    designSummary(row, number === null || state === null || releasedAt === null ? null : { number, state, releasedAt }),
  );
}

export interface DraftRecord {
  readonly version: number;
  readonly body: string;
  readonly sha256: string;
  readonly savedAt: Date;
  readonly savedBy: string;
}

/** The newest draft save of a design. */
export async function newestDraft(db: Db, designId: string): Promise<DraftRecord | undefined> {
  const [row] = await db
    .select({
      version: draftSave.version,
      body: draftSave.body,
      sha256: draftSave.sha256,
      savedAt: draftSave.createdAt,
      savedBy: user.name,
    })
    .from(draftSave)
    .innerJoin(user, eq(user.id, draftSave.authorId))
    .where(eq(draftSave.designId, designId))
    .orderBy(desc(draftSave.version))
    .limit(1);
  return row;
}
