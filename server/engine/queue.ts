import { texts } from '@/lib/text/en/server';
import { AppError } from '../problems';

/** Each job fills a core. */
const AT_ONCE = 2;
/** More than this waiting would be answered after everybody has given up. */
const MAX_WAITING = 30;

// Bounds this process's own children; it holds no data and losing it loses nothing.
let running = 0;
const waiting: (() => void)[] = [];

/** Hands the place to whoever waits longest, so that nobody who comes now can take it first. */
function next(): void {
  const first = waiting.shift();
  if (first === undefined) running -= 1;
  else first();
}

/** Runs the work when one of the few places is free; refuses it as "busy" when too many wait already. */
export async function queued<T>(work: () => Promise<T>, signal?: AbortSignal): Promise<T> {
  if (running >= AT_ONCE) {
    if (waiting.length >= MAX_WAITING) throw new AppError('busy', texts.details.busy, { retryAfterSeconds: 10 });
    await new Promise<void>((resolve) => waiting.push(resolve));
  } else running += 1;
  try {
    if (signal?.aborted) throw new AppError('busy', texts.details.busy);
    return await work();
  } finally {
    next();
  }
}
