import { type DraftPlace, fetchDraft, saveDraft } from '@/client/drafts';
import { dropDraft, keepDraft, keptDraft } from '@/client/kept';
import { canonicalText } from '@/lib/airframe/canonical';
import type { Airframe } from '@/lib/airframe/schema/airframe';
import type { DraftAnswer } from '@/lib/contract/answers';
import { save as texts } from '@/lib/text/en/board';
import { fill } from '@/lib/text/fill';
import type { Board } from './board';
import { createSaver, type Saver } from './saver';

// A board tied to the draft on the server: saves go out, newer drafts come in, and what did not get out last time comes back.

export interface DraftSync {
  /** A draft that was asked for: shown when it is newer and nothing of ours waits. */
  arrived(draft: DraftAnswer): void;
  stop(): void;
}

const same = (one: Airframe, other: Airframe) => canonicalText(one) === canonicalText(other);

const later = (ms: number, act: () => void) => {
  const timer = setTimeout(act, ms);
  return () => clearTimeout(timer);
};

/** Kept changes as an airframe, or the reason why they are none. The checker is large, so it is fetched only when needed. */
async function readKept(airframe: unknown): Promise<Airframe | string> {
  const { parseAirframe } = await import('@/lib/airframe/parse');
  const result = parseAirframe(airframe);
  return result.ok ? result.value : (result.problems[0]?.message ?? '');
}

/** For those who may only look: newer drafts come in, nothing goes out. */
export function watchDraft(board: Board, start: DraftAnswer): DraftSync {
  let { version } = start;
  return {
    arrived(draft) {
      if (draft.version <= version) return;
      version = draft.version;
      board.edit(draft.airframe);
    },
    stop() {},
  };
}

/** Changes of an earlier visit that the server never got, or null; a line to show when they cannot be read. */
async function restore(place: DraftPlace, start: DraftAnswer, tell: (notice: string) => void) {
  const kept = keptDraft(place.designId);
  if (kept === null) return null;
  const airframe = await readKept(kept.airframe);
  if (typeof airframe === 'string') {
    tell(fill(texts.keptUnreadable, { message: airframe }));
    return null;
  }
  return same(airframe, start.airframe) ? null : { airframe, version: kept.version };
}

function saverFor(
  board: Board,
  place: DraftPlace,
  start: { readonly airframe: Airframe; readonly version: number },
): Saver {
  const holder = crypto.randomUUID();
  return createSaver(
    {
      put: (airframe, version) => saveDraft(place, airframe, version),
      newest: () => fetchDraft(place),
      keep(airframe, version) {
        if (airframe === null) return dropDraft(place.designId, holder);
        if (!keepDraft(place.designId, { version, holder, airframe })) board.store.setState({ notice: texts.noRoom });
      },
      same,
      later,
      report: (save) => board.store.setState({ save }),
    },
    start,
  );
}

/** Keeps the board and the draft together until it is stopped. */
export function syncDraft(board: Board, place: DraftPlace, start: DraftAnswer): DraftSync {
  const { store } = board;
  const tell = (notice: string | null) => store.setState({ notice });
  let saver: Saver | null = null;
  let stopped = false;
  const retry = () => saver?.retry();
  const take = (theirs: DraftAnswer) => {
    board.edit(theirs.airframe);
    saver?.took(theirs);
  };
  const leave = store.subscribe((state, before) => {
    if (state.history !== before.history) saver?.changed(state.history.present);
  });
  const begin = async () => {
    const restored = await restore(place, start, tell);
    if (stopped) return;
    // Changes from another day still build on the draft they were made on; the server says whether that is the newest.
    saver = saverFor(board, place, { airframe: start.airframe, version: restored?.version ?? start.version });
    if (restored !== null) {
      board.edit(restored.airframe);
      tell(texts.restored);
    }
    saver.changed(store.getState().history.present);
    store.setState({ sync: { retry, take, flush: saver.flush } });
  };
  begin().catch((error: unknown) => tell(fill(texts.keptUnreadable, { message: String(error) })));
  window.addEventListener('online', retry);
  return {
    arrived(draft) {
      if (saver === null || !saver.clean() || draft.version <= saver.version() || store.getState().gesture !== null)
        return;
      take(draft);
      tell(fill(texts.newer, { by: draft.savedBy }));
    },
    stop() {
      stopped = true;
      leave();
      saver?.stop();
      window.removeEventListener('online', retry);
      store.setState({ sync: null });
    },
  };
}
