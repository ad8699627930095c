'use client';

import { Provenance } from '@/components/figures/FigureList';
import { figureRows } from '@/components/figures/rows';
import { FigureBadge } from '@/components/ui/Badge';
import { Value } from '@/components/ui/Value';
import { figures as texts } from '@/lib/text/en/board';
import { useBoardState } from '../useBoard';
import { cgInside, type StripId } from './readings';

/** One figure opened: its value, what it means, how it was worked out, from what, and when not to trust it. */
export function FigureExplained({ id }: { readonly id: StripId }) {
  const settled = useBoardState((state) => state.settled);
  const system = useBoardState((state) => state.system);
  if (settled === null) return <p>{texts.working}</p>;
  const inside = id === 'cgAtBodySideMm' ? cgInside(settled.marks, system) : null;
  return (
    <div className="grid gap-3">
      {figureRows(settled, [id], system).map((row) => (
        <div key={row.id} className="grid gap-3">
          <p className="flex flex-wrap items-baseline gap-x-4">
            {row.text === null ? texts.none : <Value text={row.text} unit={row.unit} large />}
            {row.verdict === undefined ? null : <FigureBadge level={row.verdict.level} words={row.verdict.words} />}
          </p>
          {inside === null ? null : <p>{inside}</p>}
          <Provenance row={row} />
        </div>
      ))}
      <p className="text-sm text-ink-soft">{texts.estimate}</p>
    </div>
  );
}
