import { type KeyboardEvent, type PointerEvent, useMemo, useRef } from 'react';
import type { Handle } from '@/lib/airframe/handles';
import type { Vec2 } from '@/lib/numerics/vec';
import type { Board } from '../state/board';
import { useBoard } from '../useBoard';
import { follow, grip } from './follow';
import { keyStep, toStep } from './keySteps';

/** Where on the aircraft the pointer is, in the handle's own axes; px are from the sheet's corner. */
export type Pointing = (px: Vec2, handle: Handle) => Vec2 | null;

const MODIFIERS: ReadonlySet<string> = new Set(['Shift', 'Alt', 'Control', 'Meta']);

interface Drag {
  readonly handleId: string;
  readonly offset: Vec2;
  /** The sheet's corner in the window when the hand took hold. */
  readonly corner: Vec2;
}

const handleOf = (board: Board, id: string): Handle | undefined =>
  board.scene().handles.find((handle) => handle.id === id);

const cornerOf = (element: Element): Vec2 => {
  const box = (element.closest('[data-sheet]') ?? element).getBoundingClientRect();
  return [box.left, box.top];
};

/** One move of the hand: the value that brings the handle under the pointer. */
function dragTo(board: Board, drag: Drag, client: Vec2, fine: boolean, pointing: Pointing): void {
  const handle = handleOf(board, drag.handleId);
  if (handle === undefined) return;
  const at = pointing([client[0] - drag.corner[0], client[1] - drag.corner[1]], handle);
  if (at === null) return;
  const value = toStep(follow(at, drag.offset, handle), handle.step, fine);
  if (value !== handle.value) board.move(value);
}

/** Events of a handle's button: pointer drags, arrow steps, Escape. Every gesture is one undo entry. */
export function useHandleDrag(pointing: Pointing) {
  const board = useBoard();
  const drag = useRef<Drag | null>(null);
  /** The handle that a held key moves. */
  const keyed = useRef<string | null>(null);

  return useMemo(() => {
    const giveUp = () => {
      drag.current = null;
      keyed.current = null;
      board.cancel();
    };
    const letGoOfKey = () => {
      if (keyed.current === null) return;
      keyed.current = null;
      board.release();
    };
    return (handleId: string) => ({
      onPointerDown(event: PointerEvent<HTMLElement>) {
        const handle = handleOf(board, handleId);
        if (event.button !== 0 || handle === undefined || board.readOnly) return;
        const corner = cornerOf(event.currentTarget);
        const at = pointing([event.clientX - corner[0], event.clientY - corner[1]], handle);
        if (at === null) return;
        letGoOfKey();
        event.currentTarget.focus({ preventScroll: true });
        event.currentTarget.setPointerCapture(event.pointerId);
        drag.current = { handleId, offset: grip(at, handle), corner };
        board.select(handle.elementId);
        board.begin(handleId, handle.value);
      },
      onPointerMove(event: PointerEvent<HTMLElement>) {
        const held = drag.current;
        if (held === null) return;
        const client: Vec2 = [event.clientX, event.clientY];
        const fine = event.altKey;
        board.frames.input(() => dragTo(board, held, client, fine, pointing));
      },
      onPointerUp() {
        if (drag.current === null) return;
        board.frames.flush();
        drag.current = null;
        board.release();
      },
      onPointerCancel: giveUp,
      onKeyDown(event: KeyboardEvent<HTMLElement>) {
        if (event.key === 'Escape' && (drag.current !== null || keyed.current !== null)) {
          event.preventDefault();
          return giveUp();
        }
        const handle = handleOf(board, handleId);
        if (handle === undefined || drag.current !== null || board.readOnly) return;
        const value = keyStep(event, handle);
        if (value === null) return;
        event.preventDefault();
        if (keyed.current !== handleId) {
          letGoOfKey();
          keyed.current = handleId;
          board.select(handle.elementId);
          board.begin(handleId, handle.value);
        }
        board.move(value);
      },
      onKeyUp(event: KeyboardEvent<HTMLElement>) {
        // Letting go of Shift or Alt between steps does not end the gesture.
        if (!MODIFIERS.has(event.key)) letGoOfKey();
      },
      onBlur: letGoOfKey,
    });
  }, [board, pointing]);
}
