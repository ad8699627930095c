import { eq } from 'drizzle-orm';
import type { z } from 'zod';
import { nextVerdictNumber, verdictsOf } from '@/db/queries/review';
import { revision as revisions, verdict } from '@/db/schema';
import type { RevisionState, VerdictRow } from '@/lib/contract/answers';
import type { GiveVerdict } from '@/lib/contract/bodies';
import { type ActContext, transact } from '../context';
import type { Member } from '../permissions';
import { audit } from './audit';
import { type RevisionPlace, revisionToReview } from './revisions';

/** What verdicts make of a revision. Of each person only the newest one is in force; one on one's own release has no weight. */
export function stateOf(newestFirst: readonly VerdictRow[]): RevisionState {
  const inForce = new Map<string, VerdictRow>();
  for (const row of newestFirst) {
    if (row.counts && !inForce.has(row.by.id)) inForce.set(row.by.id, row);
  }
  const kinds = new Set([...inForce.values()].map((row) => row.verdict));
  if (kinds.has('hold')) return 'held';
  return kinds.has('goodToCut') ? 'goodToCut' : 'released';
}

/** Adds a verdict and brings the revision's state in line with all of them. */
export function giveVerdict(
  context: ActContext,
  member: Member,
  place: RevisionPlace,
  input: z.infer<typeof GiveVerdict>,
): Promise<VerdictRow> {
  return transact(context, async (tx) => {
    const { now, who } = context;
    const revision = await revisionToReview(tx, member, place);
    const counts = revision.releasedBy !== who.userId;
    const id = context.newId();
    await tx.insert(verdict).values({
      id,
      revisionId: revision.id,
      userId: who.userId,
      number: await nextVerdictNumber(tx, revision.id),
      verdict: input.verdict,
      note: input.note,
      counts,
      createdAt: now,
    });
    const state = stateOf(await verdictsOf(tx, revision.id));
    await tx.update(revisions).set({ state }).where(eq(revisions.id, revision.id));
    await audit(tx, context, {
      act: 'verdict.give',
      workshopId: member.workshopId,
      subjectId: revision.id,
      detail: { verdict: input.verdict, counts, state },
    });
    return {
      id,
      verdict: input.verdict,
      note: input.note,
      by: { id: who.userId, name: who.name },
      counts,
      createdAt: now.toISOString(),
    };
  });
}
