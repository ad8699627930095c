import type { z } from 'zod';
import { nextThreadNumber, threadsOf } from '@/db/queries/review';
import { comment, commentThread } from '@/db/schema';
import type { ThreadAnswer } from '@/lib/contract/answers';
import type { CreateThread } from '@/lib/contract/bodies';
import { type ActContext, transact } from '../context';
import type { Member } from '../permissions';
import { audit } from './audit';
import { type RevisionPlace, revisionToReview } from './revisions';

/** Pins a first comment to a place, element, part, figure, sheet or rule of a revision. */
export function createThread(
  context: ActContext,
  member: Member,
  place: RevisionPlace,
  input: z.infer<typeof CreateThread>,
): Promise<ThreadAnswer> {
  return transact(context, async (tx) => {
    const { now, who } = context;
    const revision = await revisionToReview(tx, member, place);
    const id = context.newId();
    const number = await nextThreadNumber(tx, revision.id);
    await tx.insert(commentThread).values({
      id,
      revisionId: revision.id,
      number,
      anchor: input.anchor,
      createdBy: who.userId,
      createdAt: now,
    });
    await tx.insert(comment).values({
      id: context.newId(),
      threadId: id,
      number: 1,
      authorId: who.userId,
      text: input.text,
      createdAt: now,
    });
    await audit(tx, context, { act: 'thread.create', workshopId: member.workshopId, subjectId: id });
    const [made] = await threadsOf(tx, revision.id, id);
    if (made === undefined) throw new RangeError(`thread ${id} was not stored`);
    return made;
  });
}
