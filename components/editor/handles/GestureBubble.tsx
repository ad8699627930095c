'use client';

import { useRef } from 'react';
import { screenFromMm } from '../sheet/fold';
import { useBoard, usePainter } from '../useBoard';
import { valueText } from './valueText';

const setText = (element: HTMLElement | null, text: string) => {
  if (element !== null && element.textContent !== text) element.textContent = text;
};

/** The dimension under the hand beside the handle, and why it goes no further, which stays until the next act. */
export function GestureBubble() {
  const board = useBoard();
  const box = useRef<HTMLDivElement>(null);
  const value = useRef<HTMLSpanElement>(null);
  const reason = useRef<HTMLSpanElement>(null);

  usePainter(() => {
    const { gesture, stop, system } = board.store.getState();
    const sheet = board.sheet();
    const handleId = gesture?.handleId ?? stop?.handleId;
    const handle = board.scene().handles.find(({ id }) => id === handleId);
    const element = box.current;
    if (element === null) return;
    element.dataset.shown = handle && sheet ? 'yes' : 'no';
    setText(reason.current, (gesture === null ? stop?.reason : gesture.stopped) ?? '');
    if (!handle || !sheet) return;
    setText(value.current, `${handle.label} ${valueText(handle.value, handle.unit, system)}`);
    const [x, y] = screenFromMm(sheet.plan, handle.at);
    // Kept on the sheet: beside the handle, on whichever side has the room.
    const left = Math.min(Math.max(x + 18, 8), Math.max(sheet.width - 240, 8));
    const top = Math.min(Math.max(y - 44, 8), sheet.height - 60);
    element.style.transform = `translate(${left.toFixed(0)}px, ${top.toFixed(0)}px)`;
  });

  return (
    <div
      ref={box}
      data-shown="no"
      className="pointer-events-none absolute top-0 left-0 z-20 grid max-w-[228px] gap-0.5 rounded-cut border border-tape bg-paper px-2 py-1 text-xs data-[shown=no]:opacity-0"
    >
      <span ref={value} className="figure" aria-hidden="true" />
      <span ref={reason} role="status" aria-live="polite" className="text-bad" data-testid="stopped" />
    </div>
  );
}
