'use client';

import type { MouseEvent } from 'react';
import type { ThreadAnswer } from '@/lib/contract/answers';
import type { Anchor } from '@/lib/contract/bodies';
import type { FigureMarks } from '@/lib/figures/types';
import { sheet as words } from '@/lib/text/en/review';
import { fill } from '@/lib/text/fill';
import { BalanceStrip } from '../figures/BalanceStrip';
import { frameAround, mmAt, percentAt } from '../thumbnail/frame';
import { PlanDrawing } from '../thumbnail/PlanDrawing';
import { anchorAtPlace, placeOf, type Subjects, spread, wordsOf } from './anchors';
import { Pin } from './Pin';

interface PinSheetProps {
  readonly name: string;
  readonly subjects: Subjects;
  readonly marks: FigureMarks;
  readonly threads: readonly ThreadAnswer[];
  readonly draft: Anchor | null;
  readonly selected: string | null;
  readonly onPlace: (anchor: Anchor) => void;
  /** Enter on the drawing has no place to mean: it leads to the list instead. */
  readonly onKey: () => void;
  readonly onSelect: (threadId: string) => void;
}

/** The frozen plan, the pins on it and the balance rule under it on the same x. */
export function PinSheet(props: PinSheetProps) {
  const { name, subjects, marks, threads, draft, selected, onPlace, onKey, onSelect } = props;
  const frame = frameAround(
    subjects.outlines.map(({ points }) => points),
    0.08,
  );
  if (frame === null) return null;

  const pin = (event: MouseEvent<HTMLButtonElement>) => {
    if (event.detail === 0) return onKey();
    const mm = mmAt(frame, event.currentTarget.getBoundingClientRect(), event.clientX, event.clientY);
    if (mm !== null) onPlace(anchorAtPlace(subjects, mm));
  };
  const places = threads.map(({ anchor }) => placeOf(subjects, anchor));
  const steps = spread(places, frame.widthMm / 40);
  const draftPlace = draft === null ? null : placeOf(subjects, draft);
  const chosen = threads.find(({ id }) => id === selected)?.anchor ?? draft;

  return (
    <div className="mx-auto grid" style={{ width: `min(100%, calc(78vh * ${frame.widthMm / frame.heightMm}))` }}>
      <PlanDrawing
        outlines={subjects.outlines}
        frame={frame}
        marks={marks}
        label={fill(words.drawing, { name })}
        selected={chosen?.kind === 'point' ? undefined : chosen?.key}
      >
        <button type="button" onClick={pin} className="absolute inset-0 cursor-crosshair" aria-label={words.place} />
        {threads.map(({ id, number, state, anchor }, index) => {
          const place = places[index];
          if (place === undefined || place === null) return null;
          return (
            <Pin
              key={id}
              number={number}
              state={state}
              about={wordsOf(subjects, anchor)}
              place={percentAt(frame, place)}
              step={steps[index] ?? 0}
              selected={id === selected}
              onSelect={() => onSelect(id)}
            />
          );
        })}
        {draftPlace === null ? null : <DraftMark place={percentAt(frame, draftPlace)} />}
      </PlanDrawing>
      <BalanceStrip fromMm={frame.x0} toMm={frame.x0 + frame.widthMm} marks={marks} label={words.rule} />
    </div>
  );
}

function DraftMark({ place }: { readonly place: { readonly left: string; readonly top: string } }) {
  return (
    <span aria-hidden="true" style={place} className="pointer-events-none absolute size-0">
      <svg
        aria-hidden="true"
        viewBox="-16 -16 32 32"
        width="32"
        height="32"
        className="absolute -top-4 -left-4 text-tape"
        fill="none"
        stroke="currentColor"
        strokeWidth="2.5"
      >
        <path d="M0-15V-5M0 5v10M-15 0h10M5 0h10" />
        <circle r="9" />
      </svg>
    </span>
  );
}
