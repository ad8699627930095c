import { keepTry } from '@/client/kept';
import { save as texts } from '@/lib/text/en/board';
import type { Board } from './board';

const REST_MS = 400;

/** Keeps a visitor's aircraft in this browser, and nowhere else, until it is stopped. */
export function keepTrying(board: Board): () => void {
  let timer: ReturnType<typeof setTimeout> | undefined;
  const keep = () => {
    if (!keepTry(board.store.getState().history.present)) board.store.setState({ notice: texts.noRoom });
  };
  const leave = board.store.subscribe((state, before) => {
    if (state.history === before.history) return;
    clearTimeout(timer);
    timer = setTimeout(keep, REST_MS);
  });
  keep();
  return () => {
    leave();
    clearTimeout(timer);
    keep();
  };
}
