'use client';

import { type KeyboardEvent, useId, useRef, useState } from 'react';
import { BadIcon } from '@/components/ui/icons';
import type { Handle } from '@/lib/airframe/handles';
import { slip as texts } from '@/lib/text/en/board';
import { fill } from '@/lib/text/fill';
import { stepFactor } from '../handles/keySteps';
import { typedValue, unitSymbol, valueNumber, valueText } from '../handles/valueText';
import { useBoard, useBoardState, usePainter } from '../useBoard';

const INPUT =
  'figure w-full min-w-0 rounded-cut border border-ink-soft bg-paper px-2 py-1 text-right text-sm read-only:border-rule ' +
  'aria-invalid:border-2 aria-invalid:border-bad pointer-coarse:min-h-11';

/** One number, typed: label, unit, range, and the reason when it is refused. It follows the hand while a handle is dragged. */
export function NumberField({ handle }: { readonly handle: Handle }) {
  const board = useBoard();
  const system = useBoardState((state) => state.system);
  const input = useRef<HTMLInputElement>(null);
  const range = useRef<HTMLSpanElement>(null);
  const typing = useRef(false);
  const [refused, setRefused] = useState<string | null>(null);
  const id = useId();
  /** Marked on the field too, so that the board's undo key knows whose turn it is. */
  const setTyping = (on: boolean) => {
    typing.current = on;
    if (input.current !== null) input.current.dataset.typing = on ? 'yes' : 'no';
  };
  const now = () => board.scene().handles.find((each) => each.id === handle.id);

  usePainter(() => {
    const current = now();
    if (current === undefined) return;
    const { unit } = current;
    const shown = valueNumber(current.value, unit, system);
    if (input.current !== null && !typing.current && input.current.value !== shown) input.current.value = shown;
    const limits = fill(texts.range, {
      min: valueText(current.min, unit, system),
      max: valueText(current.max, unit, system),
    });
    if (range.current !== null && range.current.textContent !== limits) range.current.textContent = limits;
  });

  /** Takes what stands in the field; a number that cannot stand is refused with its reason, and the old one comes back. */
  const take = () => {
    const current = now();
    if (!typing.current || input.current === null || current === undefined) return;
    setTyping(false);
    const value = typedValue(input.current.value, current.unit, system);
    const kept = valueText(current.value, current.unit, system);
    const stopped =
      value === null
        ? fill(texts.notNumber, { example: valueNumber(current.value, current.unit, system) })
        : board.type(handle.id, value);
    setRefused(stopped === null ? null : fill(texts.kept, { reason: stopped, value: kept }));
    board.frames.request();
  };

  const onKeyDown = (event: KeyboardEvent<HTMLInputElement>) => {
    if (event.key === 'Enter') return take();
    if (event.key === 'Escape' && typing.current) {
      setTyping(false);
      setRefused(null);
      board.frames.request();
      return;
    }
    const current = now();
    const steps = event.key === 'ArrowUp' ? 1 : event.key === 'ArrowDown' ? -1 : 0;
    if (steps === 0 || current === undefined || board.readOnly) return;
    event.preventDefault();
    take();
    const stopped = board.type(
      handle.id,
      Number((current.value + steps * current.step * stepFactor(event)).toFixed(9)),
    );
    setRefused(stopped);
  };

  return (
    <div className="grid gap-0.5">
      <label htmlFor={id} className="dense text-sm">
        {handle.label}
      </label>
      <div className="grid grid-cols-[minmax(0,104px)_auto_1fr] items-center gap-2">
        <input
          ref={input}
          id={id}
          type="text"
          inputMode="decimal"
          autoComplete="off"
          data-testid={`number-${handle.id}`}
          defaultValue={valueNumber(handle.value, handle.unit, system)}
          readOnly={board.readOnly}
          aria-invalid={refused === null ? undefined : true}
          aria-describedby={`${id}-range ${id}-refused`}
          className={INPUT}
          onInput={() => setTyping(true)}
          onBlur={take}
          onKeyDown={onKeyDown}
        />
        <span className="figure text-sm text-ink-soft">{unitSymbol(handle.unit, system)}</span>
        <span ref={range} id={`${id}-range`} className="dense justify-self-end text-xs text-ink-soft" />
      </div>
      <p
        id={`${id}-refused`}
        role="status"
        aria-live="polite"
        className="flex items-start gap-1.5 text-xs text-bad [&>svg]:mt-px"
      >
        {refused === null ? null : (
          <>
            <BadIcon />
            {refused}
          </>
        )}
      </p>
    </div>
  );
}
