import { randomUUID } from 'node:crypto';
import type { Db, Tx } from '@/db/types';
import type { JobAnswer, JobRequest } from '@/lib/plan/job';

/** The person behind a request. */
export interface Who {
  readonly userId: string;
  readonly name: string;
  readonly email: string;
}

/** Runs one job of the chain outside this process. */
export type Engine = (request: JobRequest, signal?: AbortSignal) => Promise<JobAnswer>;

/** Ties an act to the Idempotency-Key of its request, inside the act's own transaction. */
export interface Once {
  readonly begin: (tx: Tx) => Promise<void>;
  readonly end: (tx: Tx, result: unknown) => Promise<void>;
}

/** All that an act may know of the world. Time and ids come in, so that a test can hold them. */
export interface ActContext {
  readonly db: Db;
  readonly who: Who;
  readonly now: Date;
  readonly newId: () => string;
  readonly engine: Engine;
  /** Where links in mails lead, e.g. "http://127.0.0.1:3000". */
  readonly baseUrl: string;
  readonly signal?: AbortSignal;
  /** Throws unless the person may still do the act: a body can take minutes to arrive, and a computation to end. */
  readonly proof?: (tx: Tx) => Promise<unknown>;
  readonly once?: Once;
}

export const newId = (): string => randomUUID();

/** One act, one transaction. The key of a repeated request is taken first, so a second run ends before it begins. */
export function transact<T>(context: ActContext, work: (tx: Tx) => Promise<T>): Promise<T> {
  return context.db.transaction(async (tx) => {
    await context.proof?.(tx);
    await context.once?.begin(tx);
    const result = await work(tx);
    await context.once?.end(tx, result);
    return result;
  });
}
