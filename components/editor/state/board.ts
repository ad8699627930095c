import { createStore, type StoreApi } from 'zustand/vanilla';
import { ALL_COUNTED, type Corrections } from '@/lib/aero/corrections';
import { setHandle } from '@/lib/airframe/handles';
import type { Airframe } from '@/lib/airframe/schema/airframe';
import type { DraftAnswer } from '@/lib/contract/answers';
import type { Figures } from '@/lib/figures/types';
import type { Vec3 } from '@/lib/numerics/vec';
import type { UnitSystem } from '@/lib/units/quantity';
import type { Sheet, SheetRoom } from '../sheet/fold';
import { layOfSheet } from '../sheet/lay';
import { extentsOf, type Scene } from '../sheet/scene';
import { type FrameLoop, frameLoop } from './frames';
import { followFigures } from './liveFigures';
import { cgMemo, sceneMemo } from './memos';
import type { SaveState } from './saver';
import * as session from './session';

// The board without React: the store, the picture of the moment, and the acts. Components translate events into acts and
// paint what changed; nothing here renders.

export interface BoardState extends session.Session {
  /** The newest figures; during a gesture they trail the hand by a frame or two. */
  readonly figures: Figures | null;
  /** The airframe that the newest figures are of. */
  readonly figuresOf: Airframe | null;
  /** Figures as they were when nothing was in the hand: what lists and explanations read. */
  readonly settled: Figures | null;
  readonly figuresFault: string | null;
  /** Where the last gesture was stopped, and why. */
  readonly stop: { readonly handleId: string; readonly reason: string } | null;
  readonly save: SaveState;
  readonly system: UnitSystem;
  /** What the figures count beside the lifting surfaces. */
  readonly corrections: Corrections;
  /** A line about something that happened by itself. */
  readonly notice: string | null;
  /** What a person can do about saving; null while nothing is saved by itself. */
  readonly sync: SyncActs | null;
}

export interface SyncActs {
  /** Tries to save at once. */
  readonly retry: () => void;
  /** Saves what waits; false when it could not be saved. */
  readonly flush: () => Promise<boolean>;
  /** Goes on from a newer draft; undo brings the former one back. */
  readonly take: (theirs: DraftAnswer) => void;
}

export interface Board {
  readonly store: StoreApi<BoardState>;
  readonly frames: FrameLoop;
  readonly readOnly: boolean;
  /** Starts the worker and the loop; the answer stops them. May be started again. */
  start(): () => void;
  /** The picture of what is drawn now. */
  scene(): Scene;
  /** The picture of an airframe; the one that is drawn costs nothing. */
  sceneOf(airframe: Airframe): Scene;
  /** Where the aircraft balances in this frame; null until masses are known. */
  cg(): Vec3 | null;
  /** How the sheet lies in the window; null until it has a size. */
  sheet(): Sheet | null;
  resize(room: SheetRoom): void;
  /** Puts the sheet where the person wants it; it then stays until `fit`. */
  lay(sheet: Sheet): void;
  fit(): void;
  begin(handleId: string, value: number): void;
  move(value: number): void;
  release(): void;
  cancel(): void;
  /** A typed value. Answers why it was refused, or null when it stands. */
  type(handleId: string, value: number): string | null;
  edit(airframe: Airframe): void;
  undo(): void;
  redo(): void;
  select(elementId: string): void;
  /** Units on this screen; the document keeps its millimetres. */
  setSystem(system: UnitSystem): void;
  /** What the figures on this screen count; a release always counts everything. */
  setCorrections(corrections: Corrections): void;
}

export interface BoardOptions {
  readonly airframe: Airframe;
  readonly readOnly: boolean;
  readonly save: SaveState;
  readonly system: UnitSystem;
}

const startState = ({ airframe, save, system }: BoardOptions): BoardState => ({
  ...session.startSession(airframe),
  figures: null,
  figuresOf: null,
  settled: null,
  figuresFault: null,
  stop: null,
  save,
  system,
  corrections: ALL_COUNTED,
  notice: null,
  sync: null,
});

/** Makes a board over an airframe. Nothing runs until it is started. */
export function createBoard(options: BoardOptions): Board {
  const store = createStore<BoardState>()(() => startState(options));
  const frames = frameLoop((act) => requestAnimationFrame(act), cancelAnimationFrame);
  const picture = sceneMemo(store);
  const lay = layOfSheet(frames, () => extentsOf(picture.scene()));
  const apply = (next: session.Session, stop: BoardState['stop'] = null) => {
    store.setState({ ...next, stop });
    frames.request();
  };
  const settle = (next: session.Session, stop: BoardState['stop'] = null) => {
    apply(next, stop);
    lay.rested();
  };
  return {
    store,
    frames,
    readOnly: options.readOnly,
    start() {
      const stopFigures = followFigures(store, picture.ms);
      const leave = store.subscribe(frames.request);
      return () => {
        leave();
        stopFigures();
        frames.stop();
      };
    },
    scene: picture.scene,
    sceneOf: picture.of,
    cg: cgMemo(store, picture.scene),
    sheet: lay.sheet,
    resize: lay.resize,
    lay: lay.lay,
    fit: lay.fit,
    begin: (handleId, value) => {
      if (!options.readOnly) apply(session.begin(store.getState(), handleId, value));
    },
    move(value) {
      const { gesture, history } = store.getState();
      if (gesture === null) return;
      apply(session.preview(store.getState(), setHandle(history.present, gesture.handleId, value)));
    },
    release() {
      const state = store.getState();
      const { gesture } = state;
      const stopped = gesture !== null && gesture.stopped !== null;
      settle(session.release(state), stopped ? { handleId: gesture.handleId, reason: gesture.stopped } : null);
    },
    cancel: () => settle(session.cancel(store.getState())),
    type(handleId, value) {
      if (options.readOnly) return null;
      const change = setHandle(store.getState().history.present, handleId, value);
      if (change.stopped !== null) return change.stopped;
      if (change.airframe === store.getState().history.present) return null;
      settle(session.edit(store.getState(), change.airframe));
      return null;
    },
    edit: (airframe) => settle(session.edit(store.getState(), airframe)),
    undo: () => settle(session.undoEdit(store.getState())),
    redo: () => settle(session.redoEdit(store.getState())),
    select: (elementId) => apply(session.select(store.getState(), elementId)),
    setSystem: (system) => store.setState({ system }),
    setCorrections: (corrections) => store.setState({ corrections }),
  };
}
