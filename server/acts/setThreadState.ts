import { eq } from 'drizzle-orm';
import type { z } from 'zod';
import { lockThread, threadsOf } from '@/db/queries/review';
import { commentThread } from '@/db/schema';
import type { ThreadAnswer } from '@/lib/contract/answers';
import type { SetThreadState } from '@/lib/contract/bodies';
import { texts } from '@/lib/text/en/server';
import { fill } from '@/lib/text/fill';
import { type ActContext, transact } from '../context';
import { isId } from '../ids';
import type { Member } from '../permissions';
import { AppError, notFound } from '../problems';
import { audit } from './audit';
import { type RevisionPlace, revisionToReview } from './revisions';

/** Closes a thread, or opens it again. */
export function setThreadState(
  context: ActContext,
  member: Member,
  place: RevisionPlace,
  threadId: string,
  { state }: z.infer<typeof SetThreadState>,
): Promise<ThreadAnswer> {
  return transact(context, async (tx) => {
    const revision = await revisionToReview(tx, member, place);
    const thread = isId(threadId) ? await lockThread(tx, revision.id, threadId) : undefined;
    if (thread === undefined) throw notFound();
    if (thread.state === state) throw new AppError('conflict', fill(texts.details.threadStateAlready, { state }));
    const closing = state === 'closed';
    await tx
      .update(commentThread)
      .set({ state, closedBy: closing ? context.who.userId : null, closedAt: closing ? context.now : null })
      .where(eq(commentThread.id, thread.id));
    await audit(tx, context, {
      act: closing ? 'thread.close' : 'thread.reopen',
      workshopId: member.workshopId,
      subjectId: thread.id,
    });
    const [made] = await threadsOf(tx, revision.id, thread.id);
    if (made === undefined) throw new RangeError(`thread ${thread.id} is gone`);
    return made;
  });
}
