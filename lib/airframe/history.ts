// Undo as a value: shared, never changed snapshots. The present is what is drawn; a preview stays beside the history.

export interface History<T> {
  readonly past: readonly T[];
  readonly present: T;
  readonly future: readonly T[];
}

/** Steps that can be taken back. A document is about 20 kB and snapshots share what did not change. */
export const HISTORY_LIMIT = 200;

/** A history that begins here. */
export const begin = <T>(present: T): History<T> => ({ past: [], present, future: [] });

/** One more step; nothing that was undone can be redone after it. The same value is no step. */
export function record<T>(history: History<T>, next: T, limit = HISTORY_LIMIT): History<T> {
  if (Object.is(next, history.present)) return history;
  return { past: [...history.past, history.present].slice(-limit), present: next, future: [] };
}

/** One step back; the same history when there is none. */
export function undo<T>(history: History<T>): History<T> {
  const before = history.past.at(-1);
  if (before === undefined) return history;
  return { past: history.past.slice(0, -1), present: before, future: [history.present, ...history.future] };
}

/** One step forward again; the same history when there is none. */
export function redo<T>(history: History<T>): History<T> {
  const [next, ...rest] = history.future;
  if (next === undefined) return history;
  return { past: [...history.past, history.present], present: next, future: rest };
}

export const canUndo = (history: History<unknown>): boolean => history.past.length > 0;
export const canRedo = (history: History<unknown>): boolean => history.future.length > 0;
