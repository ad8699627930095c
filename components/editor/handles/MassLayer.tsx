'use client';

import { useMemo, useRef } from 'react';
import type { Handle } from '@/lib/airframe/handles';
import { sheet as texts } from '@/lib/text/en/board';
import { fill } from '@/lib/text/fill';
import { shownText } from '@/lib/units/quantity';
import { mmFromScreen } from '../sheet/fold';
import { hangingAt, hungOn } from '../sheet/paintRule';
import { useBoard, useBoardState, usePainter } from '../useBoard';
import { paintSlider } from './paintSlider';
import { type Pointing, useHandleDrag } from './useHandleDrag';

const BUTTON = 'absolute -top-3 -left-3 size-6 cursor-ew-resize touch-none rounded-cut';

/** On the rule a mass moves along the aircraft and only there. */
const placeHandle = (handles: readonly Handle[], elementId: string): Handle | undefined =>
  handles.find(
    (handle) => handle.elementId === elementId && handle.unit === 'mm' && Math.abs(handle.direction[0]) > 0.99,
  );

/** The masses on the balance rule as sliders: what hangs there is taken by hand or by key. */
export function MassLayer() {
  const board = useBoard();
  const present = useBoardState((state) => state.history.present);
  const system = useBoardState((state) => state.system);
  const buttons = useRef(new Map<string, HTMLButtonElement>());
  const pointing = useMemo<Pointing>(
    () => (px, handle) => {
      const sheet = board.sheet();
      return sheet && [mmFromScreen(sheet.rule, px)[0], handle.at[1]];
    },
    [board],
  );
  const events = useHandleDrag(pointing);
  const hung = useMemo(() => {
    const { masses, handles } = board.sceneOf(present);
    return masses.map((mass) => ({ mass, handle: placeHandle(handles, mass.elementId) }));
  }, [board, present]);

  usePainter(() => {
    const sheet = board.sheet();
    if (sheet === null) return;
    const { masses, handles } = board.scene();
    for (const mass of hungOn(sheet, masses)) {
      const button = buttons.current.get(mass.elementId);
      const handle = placeHandle(handles, mass.elementId);
      if (button === undefined || handle === undefined) continue;
      paintSlider(button, handle, hangingAt(sheet, mass), board.store.getState().system);
      // One on top of another could only be taken by chance; the slip has its number, and a closer look makes room.
      const visibility = mass.crowded ? 'hidden' : 'visible';
      if (button.style.visibility !== visibility) button.style.visibility = visibility;
    }
  });

  if (board.readOnly) return null;
  return (
    <fieldset aria-label={texts.masses} className="contents">
      {hung.map(({ mass, handle }) =>
        handle === undefined ? null : (
          <button
            key={mass.elementId}
            type="button"
            role="slider"
            ref={(button) => {
              if (button !== null) buttons.current.set(mass.elementId, button);
              return () => {
                buttons.current.delete(mass.elementId);
              };
            }}
            data-testid={`mass-${mass.elementId}`}
            aria-label={fill(texts.massOnRule, { name: mass.name, mass: shownText(mass.massG, 'g', 0, system) })}
            title={`${mass.name}, ${shownText(mass.massG, 'g', 0, system)}`}
            aria-orientation="horizontal"
            aria-valuenow={handle.value}
            aria-valuemin={handle.min}
            aria-valuemax={handle.max}
            className={BUTTON}
            {...events(handle.id)}
          />
        ),
      )}
    </fieldset>
  );
}
