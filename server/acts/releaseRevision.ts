import { eq } from 'drizzle-orm';
import type { z } from 'zod';
import { type DesignRecord, type DraftRecord, designById, latestRevision, newestDraft } from '@/db/queries/designs';
import { artefact, design, revision } from '@/db/schema';
import type { RevisionSummary } from '@/lib/contract/answers';
import type { ReleaseRevision } from '@/lib/contract/bodies';
import type { Frozen } from '@/lib/plan/job';
import { texts } from '@/lib/text/en/server';
import { fill } from '@/lib/text/fill';
import { packFrozen } from '../artefacts';
import { type ActContext, transact } from '../context';
import { draftAnswer, storedAirframe } from '../drafts';
import { isId } from '../ids';
import type { Member } from '../permissions';
import { AppError, invalidDocument, notFound } from '../problems';
import { audit } from './audit';
import { designToChange } from './designs';

/**
 * Freezes the draft as the next revision, with its reason and the effect expected. Figures, parts and layout are worked out before
 * the transaction begins, and the draft is looked at again inside it: only the version that the caller saw is released.
 */
export async function releaseRevision(
  context: ActContext,
  member: Member,
  designId: string,
  input: z.infer<typeof ReleaseRevision>,
): Promise<RevisionSummary> {
  const draft = await draftToRelease(context, member, designId, input.draftVersion);
  const { engine, frozen } = await freeze(context, draft);
  const packed = await packFrozen(frozen);
  return transact(context, async (tx) => {
    const row = await designToChange(tx, member, designId);
    if (row.draftVersion !== draft.version) throw moved(row, draft, input.draftVersion, row.draftVersion);
    const previous = await latestRevision(tx, designId);
    const number = (previous?.number ?? 0) + 1;
    const { now, who } = context;
    const id = context.newId();
    await tx.insert(revision).values({
      id,
      designId,
      number,
      parentRevisionId: previous?.id ?? null,
      draftVersion: draft.version,
      body: draft.body,
      sha256: draft.sha256,
      engine,
      reason: input.reason,
      expectedEffect: input.expectedEffect,
      releasedBy: who.userId,
      releasedAt: now,
      ...summaryColumns(frozen),
    });
    await tx.insert(artefact).values(packed.map((one) => ({ id: context.newId(), revisionId: id, engine, ...one })));
    await tx.update(design).set({ updatedAt: now }).where(eq(design.id, designId));
    await audit(tx, context, {
      act: 'revision.release',
      workshopId: member.workshopId,
      subjectId: id,
      detail: { designId, number, sha256: draft.sha256 },
    });
    return {
      id,
      number,
      state: 'released',
      reason: input.reason,
      expectedEffect: input.expectedEffect,
      releasedAt: now.toISOString(),
      releasedBy: { id: who.userId, name: who.name },
      sha256: draft.sha256,
      openThreads: 0,
    };
  });
}

async function draftToRelease(
  { db }: ActContext,
  member: Member,
  designId: string,
  asked: number,
): Promise<DraftRecord> {
  if (!isId(designId)) throw notFound();
  const row = await designById(db, member.workshopId, designId);
  if (row === undefined) throw notFound();
  if (row.archivedAt !== null) throw new AppError('conflict', texts.details.archivedDesign);
  const draft = await newestDraft(db, designId);
  if (draft === undefined) throw new RangeError(`design ${designId} has no draft`);
  if (draft.version !== asked) throw moved(row, draft, asked, draft.version);
  return draft;
}

function moved(row: DesignRecord, draft: DraftRecord, asked: number, current: number): AppError {
  const words = fill(texts.details.releaseMoved, { asked, current });
  return new AppError(
    'conflict',
    words,
    draft.version === current ? { more: { current: draftAnswer(row, draft) } } : {},
  );
}

async function freeze({ engine, signal }: ActContext, draft: DraftRecord): Promise<{ engine: string; frozen: Frozen }> {
  const answer = await engine({ kind: 'freeze', airframe: storedAirframe(draft.body) }, signal);
  if (!answer.ok) throw invalidDocument('airframe', answer.problems);
  if (answer.kind !== 'freeze') throw new RangeError(`the engine answered a freeze with a ${answer.kind}`);
  return { engine: answer.engine, frozen: answer.frozen };
}

function summaryColumns({ figures: { values } }: Frozen) {
  return {
    spanMm: values.spanMm?.value ?? null,
    wingAreaDm2: values.wingAreaDm2?.value ?? null,
    allUpMassG: values.allUpMassG?.value ?? null,
    staticMarginPct: values.staticMarginPct?.value ?? null,
  };
}
