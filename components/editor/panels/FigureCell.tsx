'use client';

import { useRef } from 'react';
import { BadIcon, GoodIcon, WatchIcon } from '@/components/ui/icons';
import { figures as texts } from '@/lib/text/en/board';
import { fill } from '@/lib/text/fill';
import { useBoard, usePainter } from '../useBoard';
import { figureName, type Reading, readingOf, type StripId } from './readings';

// A fixed height: words that come and go during a drag must not move the sheet above them.
const CELL =
  'group/cell grid h-[104px] md:h-[88px] lg:h-[104px] min-w-0 overflow-hidden content-start justify-items-start gap-0 border-l border-rule px-2 py-1 text-left hover:bg-board ' +
  'data-[level=bad]:bg-[color-mix(in_srgb,var(--bad)_7%,var(--paper))]';
const VERDICT =
  'flex items-start gap-1 text-xs group-data-[level=good]/cell:text-good group-data-[level=watch]/cell:text-watch group-data-[level=bad]/cell:text-bad';

const sameReading = (one: Reading, other: Reading): boolean =>
  one.number === other.number &&
  one.unit === other.unit &&
  one.level === other.level &&
  one.words === other.words &&
  one.band === other.band;

/** A figure that decides: number, verdict in a word and a sign, band. It is written with the frame, not rendered. */
export function FigureCell({ id, onOpen }: { readonly id: StripId; readonly onOpen: (id: StripId) => void }) {
  const board = useBoard();
  const cell = useRef<HTMLButtonElement>(null);
  const number = useRef<HTMLSpanElement>(null);
  const unit = useRef<HTMLSpanElement>(null);
  const words = useRef<HTMLSpanElement>(null);
  const band = useRef<HTMLSpanElement>(null);
  const written = useRef<Reading | null>(null);
  const name = figureName(id);

  usePainter(() => {
    const { figures, system } = board.store.getState();
    const reading = readingOf(id, figures, system);
    if (cell.current === null || (written.current !== null && sameReading(written.current, reading))) return;
    written.current = reading;
    cell.current.dataset.level = reading.level ?? 'none';
    const pairs = [
      [number, reading.number],
      [unit, reading.unit],
      [words, reading.words],
      [band, reading.band],
    ] as const;
    for (const [element, text] of pairs) if (element.current !== null) element.current.textContent = text;
  });

  return (
    <button
      ref={cell}
      type="button"
      data-testid={`figure-${id}`}
      data-level="none"
      title={fill(texts.open, { name })}
      className={CELL}
      onClick={() => onOpen(id)}
    >
      <span className="dense text-xs text-ink-soft">{name}</span>
      <span className="whitespace-nowrap">
        <span ref={number} className="figure text-base" /> <span ref={unit} className="figure text-xs text-ink-soft" />
      </span>
      <span ref={band} className="figure text-xs text-ink-soft" />
      <span className={VERDICT}>
        <span className="mt-px hidden group-data-[level=good]/cell:block">
          <GoodIcon />
        </span>
        <span className="mt-px hidden group-data-[level=watch]/cell:block">
          <WatchIcon />
        </span>
        <span className="mt-px hidden group-data-[level=bad]/cell:block">
          <BadIcon />
        </span>
        <span ref={words} className="dense line-clamp-3" />
      </span>
    </button>
  );
}
