import { ApiProblem } from '@/client/api';
import type { Airframe } from '@/lib/airframe/schema/airframe';
import type { DraftAnswer, ProblemDetails } from '@/lib/contract/answers';

// Saving by itself. One save is under way at a time, each names the version it builds on, and whatever is not on the
// server yet is kept in this browser until it is. A newer draft of somebody else is never written over: saving stops and
// the person chooses.

export type SaveState =
  | { readonly kind: 'off' }
  | { readonly kind: 'saved' }
  | { readonly kind: 'waiting' }
  | { readonly kind: 'saving' }
  /** Nobody answered, or the server is unwell; it is tried again. */
  | { readonly kind: 'offline' }
  | { readonly kind: 'signedOut' }
  /** Somebody saved a newer draft; theirs lies ready. */
  | { readonly kind: 'stale'; readonly theirs: DraftAnswer }
  | { readonly kind: 'refused'; readonly problem: ProblemDetails };

export interface SaverPorts {
  /** Saves on top of a version and says which version that made. Throws ApiProblem or Unreachable. */
  readonly put: (airframe: Airframe, version: number) => Promise<number>;
  readonly newest: () => Promise<DraftAnswer>;
  /** Keeps what the server does not have yet in this browser; null when there is nothing of the kind. */
  readonly keep: (airframe: Airframe | null, version: number) => void;
  readonly same: (one: Airframe, other: Airframe) => boolean;
  /** Runs an act later; returns its cancellation. */
  readonly later: (ms: number, act: () => void) => () => void;
  readonly report: (state: SaveState) => void;
}

export interface Saver {
  /** The present airframe; compared by identity with what was saved last. */
  changed(airframe: Airframe): void;
  /** The person took a newer draft: it is the present one now. */
  took(theirs: DraftAnswer): void;
  /** Tries at once instead of waiting: the line came back, or the person asked. */
  retry(): void;
  /** Saves at once what waits: true when the server has everything, false when it could not be saved. */
  flush(): Promise<boolean>;
  /** Version the next save builds on. */
  version(): number;
  /** True when nothing waits for the server. */
  clean(): boolean;
  stop(): void;
}

export const SAVE_TIMES = { restMs: 700, firstRetryMs: 2_000, lastRetryMs: 30_000 } as const;

type Failure = 'stale' | 'signedOut' | 'refused' | 'again';

function failureOf(error: unknown): Failure {
  if (!(error instanceof ApiProblem)) return 'again';
  if (error.status === 412) return 'stale';
  if (error.status === 401) return 'signedOut';
  return error.status >= 500 || error.status === 429 || error.status === 408 ? 'again' : 'refused';
}

/** Starts from a draft that the server holds. */
export function createSaver(
  ports: SaverPorts,
  start: { readonly airframe: Airframe; readonly version: number },
): Saver {
  let { version } = start;
  let saved = start.airframe;
  let latest = start.airframe;
  let flying = false;
  let stopped = false;
  let state: SaveState['kind'] = 'saved';
  let wait: number = SAVE_TIMES.firstRetryMs;
  let cancel: () => void = () => {};
  let waiters: ((saved: boolean) => void)[] = [];

  const answer = (isSaved: boolean) => {
    for (const waiter of waiters) waiter(isSaved);
    waiters = [];
  };
  const say = (next: SaveState) => {
    state = next.kind;
    if (!stopped) ports.report(next);
    if (next.kind !== 'waiting' && next.kind !== 'saving') answer(next.kind === 'saved');
  };
  const plan = (ms: number) => {
    cancel();
    cancel = ports.later(ms, () => void save());
  };
  const settle = (airframe: Airframe, newVersion: number) => {
    version = newVersion;
    saved = airframe;
    wait = SAVE_TIMES.firstRetryMs;
    if (latest === saved) {
      ports.keep(null, version);
      return say({ kind: 'saved' });
    }
    ports.keep(latest, version);
    say({ kind: 'waiting' });
    plan(waiters.length > 0 ? 0 : SAVE_TIMES.restMs);
  };
  const again = () => {
    say({ kind: 'offline' });
    plan(wait);
    wait = Math.min(wait * 2, SAVE_TIMES.lastRetryMs);
  };
  /** A save whose answer got lost comes back as stale although the newest draft is our own. */
  const compare = async (sent: Airframe) => {
    const theirs = await ports.newest();
    if (stopped) return;
    if (ports.same(theirs.airframe, sent)) return settle(sent, theirs.version);
    say({ kind: 'stale', theirs });
  };
  const failed = async (error: unknown, sent: Airframe) => {
    const failure = failureOf(error);
    if (failure === 'again') return again();
    if (failure === 'signedOut') return say({ kind: 'signedOut' });
    if (failure === 'refused' && error instanceof ApiProblem) return say({ kind: 'refused', problem: error.problem });
    try {
      await compare(sent);
    } catch {
      // Whatever kept the newer draft from coming, the next try meets it again and says so.
      again();
    }
  };
  async function save(): Promise<void> {
    cancel();
    if (flying || stopped || state === 'stale' || latest === saved) return;
    const sent = latest;
    flying = true;
    say({ kind: 'saving' });
    try {
      settle(sent, await ports.put(sent, version));
    } catch (error) {
      if (!stopped) await failed(error, sent);
    } finally {
      flying = false;
    }
    // What was refused may have been mended while it was under way.
    if (!stopped && state === 'refused' && latest !== sent) plan(SAVE_TIMES.restMs);
  }

  return {
    changed(airframe) {
      if (airframe === latest) return;
      latest = airframe;
      ports.keep(latest === saved ? null : latest, version);
      if (flying || state === 'stale') return;
      if (latest === saved) {
        cancel();
        return say({ kind: 'saved' });
      }
      say({ kind: 'waiting' });
      plan(SAVE_TIMES.restMs);
    },
    took(theirs) {
      cancel();
      latest = theirs.airframe;
      settle(theirs.airframe, theirs.version);
    },
    retry() {
      wait = SAVE_TIMES.firstRetryMs;
      void save();
    },
    flush() {
      if (!flying && latest === saved) return Promise.resolve(true);
      if (state === 'stale') return Promise.resolve(false);
      const done = new Promise<boolean>((resolve) => waiters.push(resolve));
      void save();
      return done;
    },
    version: () => version,
    clean: () => !flying && latest === saved,
    stop() {
      const waits = !flying && latest !== saved && (state === 'waiting' || state === 'offline');
      stopped = true;
      cancel();
      answer(false);
      // A last try on the way out. When it fails the changes stay kept, and the next visit sends them.
      if (waits)
        ports.put(latest, version).then(
          (made) => ports.keep(null, made),
          () => {},
        );
    },
  };
}
