import { begin as beginHistory, type History, record, redo, undo } from '@/lib/airframe/history';
import type { Airframe } from '@/lib/airframe/schema/airframe';

// What is being edited, as values. A gesture previews beside the history; letting go makes one entry of it, Escape none.

export interface Gesture {
  readonly handleId: string;
  /** The value when the hand took hold. */
  readonly from: number;
  readonly airframe: Airframe;
  readonly value: number;
  /** Why the value asked for was not reached. */
  readonly stopped: string | null;
}

export interface Session {
  readonly history: History<Airframe>;
  readonly gesture: Gesture | null;
  /** Element id. */
  readonly selected: string;
}

/** What `setHandle` answers. */
export interface HandleChange {
  readonly airframe: Airframe;
  readonly value: number;
  readonly stopped: string | null;
}

/** What is selected when nothing else is: the main wing. */
const firstSelected = ({ surfaces }: Airframe): string =>
  (surfaces.find(({ role }) => role === 'wing') ?? surfaces[0])?.id ?? '';

const holds = ({ surfaces, bodies, booms, drives, items, gear }: Airframe, elementId: string): boolean =>
  [surfaces, bodies, booms, drives, items, gear].some((list) => list.some(({ id }) => id === elementId));

export const startSession = (airframe: Airframe): Session => ({
  history: beginHistory(airframe),
  gesture: null,
  selected: firstSelected(airframe),
});

/** The session at another point of its history; what is selected may be gone there. */
function at(session: Session, history: History<Airframe>): Session {
  const { present } = history;
  return {
    history,
    gesture: null,
    selected: holds(present, session.selected) ? session.selected : firstSelected(present),
  };
}

/** The airframe to draw: the one in the hand, else the present one. */
export const current = (session: Session): Airframe => session.gesture?.airframe ?? session.history.present;

/** Takes a handle in the hand; nothing has moved yet. */
export const begin = (session: Session, handleId: string, value: number): Session => ({
  ...session,
  gesture: { handleId, from: value, airframe: session.history.present, value, stopped: null },
});

/** The handle moved. Without a gesture under way nothing happens. */
export const preview = (session: Session, change: HandleChange): Session =>
  session.gesture === null ? session : { ...session, gesture: { ...session.gesture, ...change } };

/** Lets go: the whole gesture is one entry, and one that ends where it began is none. */
export function release(session: Session): Session {
  const { gesture, history } = session;
  if (gesture === null) return session;
  const moved = gesture.value !== gesture.from;
  return { ...session, gesture: null, history: moved ? record(history, gesture.airframe) : history };
}

/** Gives the gesture up: everything is as before it. */
export const cancel = (session: Session): Session =>
  session.gesture === null ? session : { ...session, gesture: null };

/** A whole change at once: a typed value, a newer draft taken. A gesture under way is given up. */
export const edit = (session: Session, airframe: Airframe): Session => at(session, record(session.history, airframe));

export const select = (session: Session, elementId: string): Session =>
  session.selected === elementId ? session : { ...session, selected: elementId };

export const undoEdit = (session: Session): Session => at(session, undo(session.history));
export const redoEdit = (session: Session): Session => at(session, redo(session.history));
