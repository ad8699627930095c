'use client';

import { useMemo } from 'react';
import { type NamedElement, namedElements } from '@/lib/airframe/names';
import { planOutlines, sideOutlines, type ViewOutline } from '@/lib/airframe/outlines';
import { strip as texts } from '@/lib/text/en/board';
import { useBoard, useBoardState } from '../useBoard';
import { PartPicture } from './PartPicture';

const BUTTON =
  'grid min-w-16 justify-items-center gap-1 border-b-2 px-2 pt-2 pb-1 text-xs whitespace-nowrap pointer-coarse:min-h-11 ' +
  'border-transparent text-ink-soft hover:text-ink aria-pressed:border-tape aria-pressed:text-ink aria-pressed:font-[560]';

/** The element's own lines, starboard alone; what stands upright is drawn from the side. */
function linesOf(
  { id, kind }: NamedElement,
  plan: readonly ViewOutline[],
  side: readonly ViewOutline[],
): readonly ViewOutline[] {
  const own = (outlines: readonly ViewOutline[]) =>
    outlines.filter((line) => line.elementId === id && line.side !== 'port');
  const height = (lines: readonly ViewOutline[]) => {
    const across = lines.flatMap(({ points }) => points.map((point) => point[1]));
    return Math.max(...across) - Math.min(...across);
  };
  const [above, beside] = [own(plan), own(side)];
  return kind === 'body' || (kind === 'surface' && height(beside) > height(above)) ? beside : above;
}

/** Along the top: the airframe's parts, drawn, in the order in which they are built. */
export function PartsStrip() {
  const board = useBoard();
  const airframe = useBoardState((state) => state.history.present);
  const selected = useBoardState((state) => state.selected);
  const parts = useMemo(() => {
    const plan = planOutlines(airframe);
    const side = sideOutlines(airframe);
    return namedElements(airframe).map((element) => ({ element, lines: linesOf(element, plan, side) }));
  }, [airframe]);
  return (
    <nav aria-label={texts.title} className="min-w-0 overflow-x-auto border-b border-rule bg-paper">
      <ul className="flex w-max px-2">
        {parts.map(({ element, lines }) => (
          <li key={element.id}>
            <button
              type="button"
              aria-pressed={element.id === selected}
              data-testid={`part-${element.id}`}
              className={BUTTON}
              onClick={() => board.select(element.id)}
            >
              <PartPicture lines={lines} />
              {element.name}
            </button>
          </li>
        ))}
      </ul>
    </nav>
  );
}
