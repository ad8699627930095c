import { keepTry } from '@/client/kept';
import { save as texts } from '@/lib/text/en/board';
import type { Board } from './board';

/**
 * Keeps a visitor's aircraft in this browser, and nowhere else, until it is stopped. Every act is kept at once: whoever
 * closes the page right after one finds it again.
 */
export function keepTrying(board: Board): () => void {
  const keep = () => {
    if (!keepTry(board.store.getState().history.present)) board.store.setState({ notice: texts.noRoom });
  };
  keep();
  return board.store.subscribe((state, before) => {
    if (state.history !== before.history) keep();
  });
}
