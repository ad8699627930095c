'use client';

import { useMemo, useRef } from 'react';
import type { Handle } from '@/lib/airframe/handles';
import { elementName } from '@/lib/airframe/names';
import type { Vec2 } from '@/lib/numerics/vec';
import { sheet as texts } from '@/lib/text/en/board';
import { fill } from '@/lib/text/fill';
import { mmFromScreen, screenFromMm } from '../sheet/fold';
import { useBoard, useBoardState, usePainter } from '../useBoard';
import { gripTurnDeg, paintSlider } from './paintSlider';
import { spread } from './spread';
import { type Pointing, useHandleDrag } from './useHandleDrag';

/** A button of 24 px about its place: the smallest target that every finger and pointer can hit. */
const BUTTON =
  'group absolute -top-3 -left-3 grid size-6 touch-none place-items-center rounded-cut pointer-coarse:-top-4 pointer-coarse:-left-4 pointer-coarse:size-8';
const GRIP =
  'block h-[18px] w-[9px] rounded-cut border-2 border-tape bg-paper group-hover:bg-tape group-focus-visible:bg-tape pointer-coarse:h-[24px] pointer-coarse:w-[12px]';

/** The selected element's handles, as sliders over the drawing. Their places are painted, not rendered. */
export function HandleLayer() {
  const board = useBoard();
  const selected = useBoardState((state) => state.selected);
  const present = useBoardState((state) => state.history.present);
  const buttons = useRef(new Map<string, HTMLButtonElement>());
  const shifts = useRef<ReadonlyMap<string, Vec2>>(new Map());
  // The list is that of the airframe at rest: a gesture moves handles but never adds or removes one.
  const handles = useMemo(
    () => board.sceneOf(present).handles.filter((handle) => handle.elementId === selected),
    [board, selected, present],
  );

  const pointing = useMemo<Pointing>(
    () => (px) => {
      const sheet = board.sheet();
      return sheet && mmFromScreen(sheet.plan, px);
    },
    [board],
  );
  const events = useHandleDrag(pointing);

  usePainter(() => {
    const sheet = board.sheet();
    if (sheet === null) return;
    const { gesture, system } = board.store.getState();
    const shown = board.scene().handles.filter(({ id }) => buttons.current.has(id));
    const places = shown.map(({ id, at }) => ({ id, at: screenFromMm(sheet.plan, at) }));
    // Under the hand nothing steps aside, or handles would jump past each other.
    if (gesture === null) shifts.current = spread(places);
    for (const [index, handle] of shown.entries()) {
      const button = buttons.current.get(handle.id);
      const place = places[index];
      if (button === undefined || place === undefined) continue;
      const [dx, dy] = shifts.current.get(handle.id) ?? [0, 0];
      paintSlider(button, handle, [place.at[0] + dx, place.at[1] + dy], system);
    }
  });

  if (board.readOnly || handles.length === 0) return null;
  return (
    <fieldset aria-label={fill(texts.handles, { name: elementName(present, selected) })} className="contents">
      {handles.map((handle) => (
        <HandleButton key={handle.id} handle={handle} buttons={buttons.current} events={events(handle.id)} />
      ))}
    </fieldset>
  );
}

interface HandleButtonProps {
  readonly handle: Handle;
  readonly buttons: Map<string, HTMLButtonElement>;
  readonly events: ReturnType<ReturnType<typeof useHandleDrag>>;
}

function HandleButton({ handle, buttons, events }: HandleButtonProps) {
  const { id, label, direction, value, min, max } = handle;
  return (
    <button
      type="button"
      role="slider"
      ref={(button) => {
        if (button !== null) buttons.set(id, button);
        return () => {
          buttons.delete(id);
        };
      }}
      data-testid={`handle-${id}`}
      aria-label={label}
      aria-orientation={Math.abs(direction[0]) > Math.abs(direction[1]) ? 'horizontal' : 'vertical'}
      aria-valuenow={value}
      aria-valuemin={min}
      aria-valuemax={max}
      className={`${BUTTON} ${Math.abs(direction[0]) > Math.abs(direction[1]) ? 'cursor-ew-resize' : 'cursor-ns-resize'}`}
      {...events}
    >
      <span className={GRIP} style={{ transform: `rotate(${gripTurnDeg(direction)}deg)` }} />
    </button>
  );
}
