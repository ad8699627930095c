import { and, asc, desc, eq, inArray, sql } from 'drizzle-orm';
import { alias } from 'drizzle-orm/pg-core';
import type { CommentRow, ThreadAnswer, VerdictRow } from '@/lib/contract/answers';
import { comment, commentThread, user, verdict } from '../schema';
import type { Db } from '../types';

export type ThreadRecord = typeof commentThread.$inferSelect;

/** A thread of this revision, held until the transaction ends. */
export async function lockThread(db: Db, revisionId: string, threadId: string): Promise<ThreadRecord | undefined> {
  const [row] = await db
    .select()
    .from(commentThread)
    .where(and(eq(commentThread.id, threadId), eq(commentThread.revisionId, revisionId)))
    .for('update');
  return row;
}

/** The next thread's number. The revision's row must be locked. */
export async function nextThreadNumber(db: Db, revisionId: string): Promise<number> {
  const [row] = await db
    .select({ next: sql<number>`coalesce(max(${commentThread.number}), 0)::int + 1` })
    .from(commentThread)
    .where(eq(commentThread.revisionId, revisionId));
  return row?.next ?? 1;
}

/** The next comment's number. The thread's row must be locked. */
export async function nextCommentNumber(db: Db, threadId: string): Promise<number> {
  const [row] = await db
    .select({ next: sql<number>`coalesce(max(${comment.number}), 0)::int + 1` })
    .from(comment)
    .where(eq(comment.threadId, threadId));
  return row?.next ?? 1;
}

/** The next verdict's number. The revision's row must be locked. */
export async function nextVerdictNumber(db: Db, revisionId: string): Promise<number> {
  const [row] = await db
    .select({ next: sql<number>`coalesce(max(${verdict.number}), 0)::int + 1` })
    .from(verdict)
    .where(eq(verdict.revisionId, revisionId));
  return row?.next ?? 1;
}

async function commentsOf(db: Db, threadIds: readonly string[]): Promise<Map<string, CommentRow[]>> {
  const byThread = new Map<string, CommentRow[]>(threadIds.map((id) => [id, []]));
  if (threadIds.length === 0) return byThread;
  const rows = await db
    .select({
      id: comment.id,
      threadId: comment.threadId,
      text: comment.text,
      createdAt: comment.createdAt,
      authorId: user.id,
      authorName: user.name,
    })
    .from(comment)
    .innerJoin(user, eq(user.id, comment.authorId))
    .where(inArray(comment.threadId, [...threadIds]))
    .orderBy(asc(comment.number));
  for (const { threadId, authorId, authorName, createdAt, ...rest } of rows) {
    byThread
      .get(threadId)
      ?.push({ ...rest, author: { id: authorId, name: authorName }, createdAt: createdAt.toISOString() });
  }
  return byThread;
}

/** Threads of a revision by number, each with its comments, oldest first; or only the one that is asked for. */
export async function threadsOf(db: Db, revisionId: string, threadId?: string): Promise<ThreadAnswer[]> {
  const closer = alias(user, 'closer');
  const here = eq(commentThread.revisionId, revisionId);
  const rows = await db
    .select({
      id: commentThread.id,
      number: commentThread.number,
      anchor: commentThread.anchor,
      state: commentThread.state,
      closedBy: closer.name,
    })
    .from(commentThread)
    .leftJoin(closer, eq(closer.id, commentThread.closedBy))
    .where(threadId === undefined ? here : and(here, eq(commentThread.id, threadId)))
    .orderBy(asc(commentThread.number));
  const comments = await commentsOf(
    db,
    rows.map((row) => row.id),
  );
  return rows.map((row) => ({ ...row, comments: comments.get(row.id) ?? [] }));
}

/** Every verdict on a revision, newest first: a changed mind shows both. */
export async function verdictsOf(db: Db, revisionId: string): Promise<VerdictRow[]> {
  const rows = await db
    .select({
      id: verdict.id,
      verdict: verdict.verdict,
      note: verdict.note,
      counts: verdict.counts,
      createdAt: verdict.createdAt,
      byId: user.id,
      byName: user.name,
    })
    .from(verdict)
    .innerJoin(user, eq(user.id, verdict.userId))
    .where(eq(verdict.revisionId, revisionId))
    .orderBy(desc(verdict.number));
  return rows.map(({ byId, byName, createdAt, ...rest }) => ({
    ...rest,
    by: { id: byId, name: byName },
    createdAt: createdAt.toISOString(),
  }));
}
