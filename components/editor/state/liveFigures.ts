import type { StoreApi } from 'zustand/vanilla';
import { type FiguresJob, figuresSource } from '@/client/figures';
import type { BoardState } from './board';
import { recomputeCounter } from './perf';
import { current } from './session';

/** Asks the worker for figures whenever the airframe changed: those that decide while a handle is in the hand, all of them at rest. */
export function followFigures(
  store: StoreApi<BoardState>,
  sceneMs: () => number,
  makeSource: typeof figuresSource = figuresSource,
): () => void {
  const count = recomputeCounter();
  const source = makeSource({
    show: (figures, job, ms) => {
      count(ms + sceneMs());
      const { gesture, history } = store.getState();
      const resting = gesture === null && job.airframe === history.present && job.depth === 'full';
      store.setState({
        figures,
        figuresOf: job.airframe,
        figuresFault: null,
        ...(resting ? { settled: figures } : {}),
      });
    },
    failed: (error) => store.setState({ figuresFault: error instanceof Error ? error.message : String(error) }),
  });
  let asked: FiguresJob | null = null;
  const ask = (state: BoardState) => {
    const { corrections, gesture } = state;
    const job: FiguresJob = { airframe: current(state), depth: gesture === null ? 'full' : 'live', corrections };
    // Taking a handle without moving it is no reason to know less.
    const same = asked?.airframe === job.airframe && asked.corrections === corrections;
    if (same && (asked?.depth === 'full' || job.depth === 'live')) return;
    asked = job;
    source.ask(job);
  };
  ask(store.getState());
  const leave = store.subscribe((state, before) => {
    const changed = (['gesture', 'history', 'corrections'] as const).some((key) => state[key] !== before[key]);
    if (changed) ask(state);
  });
  return () => {
    leave();
    source.stop();
  };
}
