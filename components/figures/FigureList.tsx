import type { ReactNode } from 'react';
import { figuresText as words } from '@/lib/text/en/review';
import { fill } from '@/lib/text/fill';
import { FigureBadge } from '../ui/Badge';
import { OpenMark } from '../ui/icons';
import { Value } from '../ui/Value';
import type { FigureRow } from './rows';

interface FigureListProps {
  readonly rows: readonly FigureRow[];
  /** Stands at the foot of an opened row. */
  readonly foot?: (row: FigureRow) => ReactNode;
  /** Stands behind the name, e.g. numbers of comments. */
  readonly tag?: (row: FigureRow) => ReactNode;
}

/** Every figure on a line of its own; it opens to what it means, how it came about and when not to trust it. */
export function FigureList({ rows, foot, tag }: FigureListProps) {
  return (
    <div className="border-t border-ink-soft">
      {rows.map((row) => (
        <details key={row.id} id={`figure-${row.id}`} className="group border-b border-rule">
          <summary className="grid min-h-9 grid-cols-[16px_1fr_auto] items-baseline gap-x-2 py-2 bench:min-h-11 md:grid-cols-[16px_minmax(180px,1.3fr)_minmax(110px,0.7fr)_minmax(0,2fr)]">
            <OpenMark className="translate-y-0.5 text-ink-soft transition-transform group-open:rotate-90" />
            <span>
              {row.name} {tag?.(row)}
            </span>
            <span className="text-right">
              {row.text === null ? (
                <span className="text-ink-soft">{words.notWorkedOut}</span>
              ) : (
                <Value text={row.text} unit={row.unit} />
              )}
            </span>
            <span className="col-start-2 col-end-4 md:col-start-4 md:col-end-5 md:pl-4">
              {row.verdict === undefined ? null : <FigureBadge level={row.verdict.level} words={row.verdict.words} />}
            </span>
          </summary>
          <Provenance row={row} />
          {foot === undefined ? null : <div className="pb-4 pl-6">{foot(row)}</div>}
        </details>
      ))}
    </div>
  );
}

export function Provenance({ row }: { readonly row: FigureRow }) {
  return (
    <dl className="grid max-w-[80ch] gap-x-4 gap-y-1 pb-4 pl-6 text-sm md:grid-cols-[160px_1fr]">
      <Line name={words.notWorkedOut} text={row.problem} />
      <Line name={words.means} text={row.explanation} />
      <Line
        name={words.band}
        text={
          row.band === undefined
            ? undefined
            : `${row.band} ${row.unit}, ${fill(words.because, { cause: row.bandCause ?? '' })}`
        }
      />
      <Line name={words.method} text={row.method} />
      {row.inputs.length === 0 ? null : (
        <>
          <dt className="text-ink-soft">{words.inputs}</dt>
          <dd className="flex flex-wrap gap-x-5">
            {row.inputs.map((input) => (
              <span key={input.name}>
                {input.name} <Value text={input.text} unit={input.unit} />
              </span>
            ))}
          </dd>
        </>
      )}
      <Line name={words.source} text={row.source} />
      <Line name={words.limits} text={row.limits} />
    </dl>
  );
}

function Line({ name, text }: { readonly name: string; readonly text: string | undefined }) {
  if (text === undefined || text === '') return null;
  return (
    <>
      <dt className="text-ink-soft">{name}</dt>
      <dd className="mb-1">{text}</dd>
    </>
  );
}
