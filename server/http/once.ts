import { and, eq, lt } from 'drizzle-orm';
import { idempotencyKey } from '@/db/schema';
import type { Db } from '@/db/types';
import { texts } from '@/lib/text/en/server';
import type { Once, Who } from '../context';
import { sha256 } from '../ids';
import { AppError } from '../problems';

/** Long enough for a tablet that was out of reach over a weekend. */
const KEPT_MS = 7 * 24 * 60 * 60 * 1000;

/** Thrown inside an act's transaction when its request has been done before: nothing of this run remains. */
export class AlreadyDone extends Error {
  override readonly name = 'AlreadyDone';
  constructor(
    /** What the first request was answered with, JSON. */
    readonly answer: string,
  ) {
    super('this request has been done before');
  }
}

/** The key of a creating request, or null when it has none. */
export function idempotencyKeyOf(headers: Headers): string | null {
  const key = headers.get('idempotency-key');
  if (key === null) return null;
  if (!/^[\x21-\x7e]{1,200}$/.test(key)) throw new AppError('invalid', texts.details.keyUnreadable);
  return key;
}

export interface OnceRequest {
  readonly key: string;
  readonly who: Who;
  readonly method: string;
  readonly path: string;
  readonly body: string;
  readonly now: Date;
}

const hashOf = ({ method, path, body }: OnceRequest): string => sha256(`${method} ${path}\n${body}`);

async function storedFor(db: Db, request: OnceRequest): Promise<string | null> {
  const [row] = await db
    .select()
    .from(idempotencyKey)
    .where(and(eq(idempotencyKey.userId, request.who.userId), eq(idempotencyKey.key, request.key)));
  if (row === undefined) return null;
  if (row.requestHash !== hashOf(request)) throw new AppError('invalid', texts.details.keyReused);
  return row.answer;
}

/** The answer of an earlier run of this request, or null. Throws when the key was used for something else. */
export const earlierAnswer = (db: Db, request: OnceRequest): Promise<string | null> => storedFor(db, request);

/**
 * Ties an act's transaction to the request's key. The row goes in first: a second run waits on it until the first has ended,
 * then finds the answer (and throws AlreadyDone) or, when the first was rolled back, takes its place.
 */
export function onceFor(request: OnceRequest): Once {
  const { who, key, now } = request;
  const mine = and(eq(idempotencyKey.userId, who.userId), eq(idempotencyKey.key, key));
  return {
    begin: async (tx) => {
      const old = new Date(now.getTime() - KEPT_MS);
      await tx
        .delete(idempotencyKey)
        .where(and(eq(idempotencyKey.userId, who.userId), lt(idempotencyKey.createdAt, old)));
      const taken = await tx
        .insert(idempotencyKey)
        .values({ userId: who.userId, key, requestHash: hashOf(request), answer: '', createdAt: now })
        .onConflictDoNothing()
        .returning({ key: idempotencyKey.key });
      if (taken.length > 0) return;
      const stored = await storedFor(tx, request);
      if (stored === null) throw new AppError('busy', texts.details.busy, { retryAfterSeconds: 1 });
      throw new AlreadyDone(stored);
    },
    end: async (tx, result) => {
      await tx
        .update(idempotencyKey)
        .set({ answer: JSON.stringify(result) })
        .where(mine);
    },
  };
}
