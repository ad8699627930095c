import { and, eq, isNull } from 'drizzle-orm';
import type { z } from 'zod';
import { designById, newestDraft } from '@/db/queries/designs';
import { design, draftSave } from '@/db/schema';
import type { Tx } from '@/db/types';
import { canonicalText } from '@/lib/airframe/canonical';
import { parseAirframe } from '@/lib/airframe/parse';
import type { DraftSaved } from '@/lib/contract/answers';
import type { SaveDraft } from '@/lib/contract/bodies';
import { texts } from '@/lib/text/en/server';
import { fill } from '@/lib/text/fill';
import { type ActContext, transact } from '../context';
import { digest, draftAnswer } from '../drafts';
import { isId, sha256 } from '../ids';
import type { Member } from '../permissions';
import { AppError, invalidDocument, notFound } from '../problems';
import { audit } from './audit';

/**
 * Saves the draft as the version after `base`. Of two saves on one base exactly one wins; the other is told of the version that
 * stands now. Saves are only ever added, so neither loses what was saved before.
 */
export async function saveDraft(
  context: ActContext,
  member: Member,
  designId: string,
  base: number,
  input: z.infer<typeof SaveDraft>,
): Promise<DraftSaved> {
  if (!isId(designId)) throw notFound();
  const parsed = parseAirframe(input.airframe);
  if (!parsed.ok) throw invalidDocument('airframe', parsed.problems);
  const body = canonicalText(parsed.value);
  const shown = digest(parsed.value);
  const version = base + 1;
  return transact(context, async (tx) => {
    const { now, who } = context;
    const won = await tx
      .update(design)
      .set({ draftVersion: version, updatedAt: now, ...shown })
      .where(
        and(
          eq(design.id, designId),
          eq(design.workshopId, member.workshopId),
          eq(design.draftVersion, base),
          isNull(design.archivedAt),
        ),
      )
      .returning({ id: design.id });
    if (won.length === 0) throw await refusal(tx, member, designId, base);
    await tx.insert(draftSave).values({
      id: context.newId(),
      designId,
      version,
      base,
      body,
      sha256: sha256(body),
      authorId: who.userId,
      createdAt: now,
    });
    await audit(tx, context, {
      act: 'draft.save',
      workshopId: member.workshopId,
      subjectId: designId,
      detail: { version },
    });
    return { designId, version, savedAt: now.toISOString(), savedBy: who.name };
  });
}

/** Why the save did not fit: no such design, archived, or the draft has moved on. */
async function refusal(tx: Tx, member: Member, designId: string, base: number): Promise<AppError> {
  const row = await designById(tx, member.workshopId, designId);
  if (row === undefined) return notFound();
  if (row.archivedAt !== null) return new AppError('conflict', texts.details.archivedDesign);
  const current = await newestDraft(tx, designId);
  if (current === undefined) throw new RangeError(`design ${designId} has no draft`);
  const words =
    base > current.version ? fill(texts.details.draftAhead, { asked: base, current: current.version }) : null;
  return new AppError('stale', words ?? fill(texts.details.staleDraft, { base, current: current.version }), {
    more: { current: draftAnswer(row, current) },
  });
}
