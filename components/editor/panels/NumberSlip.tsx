'use client';

import { useMemo } from 'react';
import { ScoreLine } from '@/components/ui/ScoreLine';
import { elementName } from '@/lib/airframe/names';
import { slip as texts } from '@/lib/text/en/board';
import { fill } from '@/lib/text/fill';
import { useBoard, useBoardState } from '../useBoard';
import { NumberField } from './NumberField';

/** Docked beside the drawing: every number of the selected part, typed. */
export function NumberSlip() {
  const board = useBoard();
  const present = useBoardState((state) => state.history.present);
  const selected = useBoardState((state) => state.selected);
  const handles = useMemo(
    () => board.sceneOf(present).handles.filter((handle) => handle.elementId === selected),
    [board, selected, present],
  );
  const name = elementName(present, selected);
  return (
    <section
      aria-label={fill(texts.title, { name })}
      data-testid="slip"
      className="z-10 grid max-h-[calc(100%-24px)] content-start gap-2 overflow-y-auto border border-rule bg-paper p-3 max-md:border-x-0 md:absolute md:top-3 md:right-3 md:w-[268px] md:rounded-cut"
    >
      <h2 className="text-base">{name}</h2>
      <ScoreLine />
      {board.readOnly ? <p className="text-sm text-ink-soft">{texts.readOnly}</p> : null}
      {handles.length === 0 ? <p className="text-sm text-ink-soft">{texts.none}</p> : null}
      {handles.map((handle) => (
        <NumberField key={handle.id} handle={handle} />
      ))}
    </section>
  );
}
