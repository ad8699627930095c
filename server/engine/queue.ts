import { texts } from '@/lib/text/en/server';
import { AppError } from '../problems';

/** Each job fills a core. */
const AT_ONCE = 2;
/** More than this waiting would be answered after everybody has given up. */
const MAX_WAITING = 30;
/** Of one person, running and waiting: a few open pages, and no room to keep everybody else out. */
const MAX_EACH = 6;

// Bounds this process's own children; it holds no data and losing it loses nothing.
let running = 0;
const waiting: (() => void)[] = [];
const standing = new Map<string, number>();

const full = (): AppError => new AppError('busy', texts.details.busy, { retryAfterSeconds: 10 });
const left = (): AppError => new AppError('busy', texts.details.busy);

/** Hands the place to whoever waits longest, so that nobody who comes now can take it first. */
function next(): void {
  const first = waiting.shift();
  if (first === undefined) running -= 1;
  else first();
}

/** Waits in line. Whoever goes away while waiting leaves the line at once. */
function place(signal: AbortSignal | undefined): Promise<void> {
  return new Promise((resolve, reject) => {
    const leave = (): void => {
      waiting.splice(waiting.indexOf(take), 1);
      reject(left());
    };
    const take = (): void => {
      signal?.removeEventListener('abort', leave);
      resolve();
    };
    waiting.push(take);
    signal?.addEventListener('abort', leave, { once: true });
  });
}

export interface QueueOptions {
  readonly signal?: AbortSignal;
  /** Whose work it is; without a name it is the server's own and not counted. */
  readonly by?: string;
}

/** Runs the work when one of the few places is free; refuses it as "busy" when too many wait already, or too many of this person's. */
export async function queued<T>(work: () => Promise<T>, { signal, by }: QueueOptions = {}): Promise<T> {
  if (signal?.aborted) throw left();
  if (by === undefined) return inTurn(work, signal);
  const before = standing.get(by) ?? 0;
  if (before >= MAX_EACH) throw full();
  standing.set(by, before + 1);
  try {
    return await inTurn(work, signal);
  } finally {
    const after = (standing.get(by) ?? 1) - 1;
    if (after === 0) standing.delete(by);
    else standing.set(by, after);
  }
}

async function inTurn<T>(work: () => Promise<T>, signal: AbortSignal | undefined): Promise<T> {
  if (running < AT_ONCE) running += 1;
  else if (waiting.length >= MAX_WAITING) throw full();
  else await place(signal);
  try {
    return await work();
  } finally {
    next();
  }
}
