import type { z } from 'zod';
import { lockThread, nextCommentNumber } from '@/db/queries/review';
import { comment } from '@/db/schema';
import type { CommentRow } from '@/lib/contract/answers';
import type { CreateComment } from '@/lib/contract/bodies';
import { texts } from '@/lib/text/en/server';
import { type ActContext, transact } from '../context';
import { isId } from '../ids';
import type { Member } from '../permissions';
import { AppError, notFound } from '../problems';
import { audit } from './audit';
import { type RevisionPlace, revisionToReview } from './revisions';

/** Answers in an open thread. */
export function createComment(
  context: ActContext,
  member: Member,
  place: RevisionPlace,
  threadId: string,
  input: z.infer<typeof CreateComment>,
): Promise<CommentRow> {
  return transact(context, async (tx) => {
    const { now, who } = context;
    const revision = await revisionToReview(tx, member, place);
    const thread = isId(threadId) ? await lockThread(tx, revision.id, threadId) : undefined;
    if (thread === undefined) throw notFound();
    if (thread.state === 'closed') throw new AppError('conflict', texts.details.threadClosed);
    const id = context.newId();
    await tx.insert(comment).values({
      id,
      threadId,
      number: await nextCommentNumber(tx, threadId),
      authorId: who.userId,
      text: input.text,
      createdAt: now,
    });
    await audit(tx, context, { act: 'comment.create', workshopId: member.workshopId, subjectId: id });
    return { id, author: { id: who.userId, name: who.name }, text: input.text, createdAt: now.toISOString() };
  });
}
