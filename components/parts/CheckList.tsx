import type { CheckLevel } from '@/lib/checks/types';
import { checks as words } from '@/lib/text/en/partsPage';
import { fill } from '@/lib/text/fill';
import { Badge } from '../ui/Badge';
import { type BadgeLook, FIGURE_BADGES } from '../ui/badges';
import { OpenMark } from '../ui/icons';
import { Value } from '../ui/Value';
import { type CheckRow, type CheckRows, countOf } from './checkRows';
import { groupAnchor } from './elements';
import { WherePlan } from './WherePlan';
import type { PlanSprite } from './where';

const LOOKS: Readonly<Record<CheckLevel, BadgeLook>> = {
  bad: FIGURE_BADGES.bad,
  watch: FIGURE_BADGES.watch,
  note: { word: words.noteWord, icon: 'seen', tone: 'calm' },
  ok: FIGURE_BADGES.good,
};

interface CheckListProps {
  readonly rows: CheckRows;
  readonly sprite: PlanSprite | null;
}

/** What the check before cutting found: what is broken first, what is kept folded away. */
export function CheckList({ rows, sprite }: CheckListProps) {
  const { open, passed } = rows;
  if (open.length + passed.length === 0) return <p className="text-ink-soft">{words.nothing}</p>;
  return (
    <div className="grid grid-cols-1 gap-4">
      <Counts rows={rows} />
      {open.length === 0 ? null : <Findings rows={open} sprite={sprite} />}
      {passed.length === 0 ? null : (
        <details className="group border-y border-rule">
          <summary className="flex min-h-9 items-center gap-2 text-sm bench:min-h-11 pointer-coarse:min-h-11">
            <OpenMark className="text-ink-soft transition-transform group-open:rotate-90" />
            {passed.length === 1 ? words.passedOne : fill(words.passed, { count: passed.length })}
          </summary>
          <div className="pb-4">
            <Findings rows={passed} sprite={sprite} />
          </div>
        </details>
      )}
    </div>
  );
}

function Counts({ rows }: { readonly rows: CheckRows }) {
  const waived = rows.open.filter((row) => row.waived !== null).length;
  const counts = (['bad', 'watch', 'note'] as const).map((level) => ({ level, count: countOf(rows, level) }));
  const clear = counts.every(({ level, count }) => level === 'note' || count === 0);
  return (
    <p className="flex flex-wrap gap-x-5 gap-y-1">
      {clear ? <Badge look={FIGURE_BADGES.good} words={words.clear} /> : null}
      {counts.map(({ level, count }) =>
        count === 0 ? null : <Badge key={level} look={LOOKS[level]} words={fill(words[level], { count })} />,
      )}
      {waived === 0 ? null : <span className="text-sm">{fill(words.waivedCount, { count: waived })}</span>}
    </p>
  );
}

function Findings({ rows, sprite }: { readonly rows: readonly CheckRow[]; readonly sprite: PlanSprite | null }) {
  return (
    <ul className="grid grid-cols-1 gap-x-10 lg:grid-cols-2">
      {rows.map((row) => (
        <li key={row.id} className="flex justify-between gap-4 border-t border-rule py-4">
          <Finding row={row} />
          {sprite === null ? null : (
            <WherePlan
              sprite={sprite}
              where={{ pieces: [], at: row.at }}
              label={fill(words.pinned, { element: row.element })}
              className="h-16 max-w-24 shrink-0"
            />
          )}
        </li>
      ))}
    </ul>
  );
}

function Finding({ row }: { readonly row: CheckRow }) {
  return (
    <div className="grid min-w-0 content-start gap-1 text-sm">
      <div className="flex flex-wrap gap-x-4">
        <h3 className="text-base">{row.title}</h3>
        <Badge look={LOOKS[row.level]} />
      </div>
      {row.waived === null ? null : <p className="font-[560]">{fill(words.waived, { reason: row.waived })}</p>}
      <p>{row.words}</p>
      {row.numbers.length === 0 ? null : (
        <p className="flex flex-wrap gap-x-4">
          {row.numbers.map(({ word, shown }) => (
            <span key={word}>
              <span className="text-ink-soft">{word}</span> <Value text={shown.number} unit={shown.unit} />
            </span>
          ))}
        </p>
      )}
      {row.fix === null ? null : (
        <p>
          <span className="text-ink-soft">{words.fix}:</span> {row.fix}
        </p>
      )}
      <p className="text-ink-soft">
        {words.place}: <Place row={row} /> · {words.source}: {row.source}
      </p>
    </div>
  );
}

function Place({ row }: { readonly row: CheckRow }) {
  if (row.ownerId === null) return row.element;
  return (
    <a
      href={`#${groupAnchor(row.ownerId)}`}
      aria-label={fill(words.placeOf, { element: row.element })}
      className="inline-flex min-h-6 items-center text-petrol bench:min-h-11"
    >
      {row.element}
    </a>
  );
}
