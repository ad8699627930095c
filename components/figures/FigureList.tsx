import type { ReactNode } from 'react';
import type { Chart } from '@/lib/figures/charts';
import { figuresText as words } from '@/lib/text/en/review';
import { fill } from '@/lib/text/fill';
import type { UnitSystem } from '@/lib/units/quantity';
import { FigureBadge } from '../ui/Badge';
import { OpenMark } from '../ui/icons';
import { Value } from '../ui/Value';
import { ChartFigure } from './ChartFigure';
import { GroupHead, type HeadLevel, JumpLinks, LookFilter } from './GroupHead';
import { countVerdicts, needsLook, rowGroups } from './groups';
import type { FigureRow } from './rows';

interface RowExtras {
  /** Stands at the foot of an opened row. */
  readonly foot?: (row: FigureRow) => ReactNode;
  /** Stands behind the name, e.g. numbers of comments. */
  readonly tag?: (row: FigureRow) => ReactNode;
}

interface FigureListProps extends RowExtras {
  readonly rows: readonly FigureRow[];
  readonly charts?: readonly Chart[];
  /** Of the charts; the rows are texts already. */
  readonly system?: UnitSystem;
  /** Of the groups' headings, one below what the list stands under. */
  readonly level?: HeadLevel;
}

/** With the filter on, what does not need a look leaves the page: in style alone, so that it works before any script does. */
const UNLESS_FILTERED = 'group-has-[[name=looks]:checked]/figures:hidden';

/** Every figure on a line of its own under the heading of its group; it opens to what it means, how it came about and when not to trust it. */
export function FigureList({ rows, charts = [], system = 'metric', level = 'h3', ...extras }: FigureListProps) {
  const groups = rowGroups(rows, charts);
  return (
    <div className="group/figures @container grid grid-cols-1 gap-8">
      <div className="grid gap-2">
        <JumpLinks groups={groups} />
        <LookFilter count={countVerdicts(rows)} />
      </div>
      {groups.map((group) => (
        <section
          key={group.id}
          aria-labelledby={`figures-${group.id}-title`}
          className={`grid grid-cols-1 gap-2 ${group.rows.some(needsLook) ? '' : UNLESS_FILTERED}`}
        >
          <GroupHead group={group} level={level} />
          <div className={group.charts.length > 0 ? BESIDE : ''}>
            <Lines rows={group.rows} {...extras} />
            {group.charts.length === 0 ? null : (
              <div className="grid grid-cols-1 content-start gap-8 pt-3">
                {group.charts.map((chart, index) => {
                  const id = `chart-${chart.id}-${index + 1}`;
                  return <ChartFigure key={id} id={id} chart={chart} system={system} />;
                })}
              </div>
            )}
          </div>
        </section>
      ))}
    </div>
  );
}

/** Charts stand beside their figures where there is room for both, and under them where there is not. */
const BESIDE = 'grid grid-cols-1 gap-x-8 gap-y-4 @min-[1000px]:grid-cols-[minmax(0,1fr)_400px]';

function Lines({ rows, ...extras }: RowExtras & { readonly rows: readonly FigureRow[] }) {
  if (rows.length === 0) return null;
  return (
    <div className="border-t border-rule">
      {rows.map((row) => (
        <FigureLine key={row.id} row={row} {...extras} />
      ))}
    </div>
  );
}

function FigureLine({ row, foot, tag }: RowExtras & { readonly row: FigureRow }) {
  const kept = needsLook(row) ? '' : UNLESS_FILTERED;
  return (
    <details
      id={`figure-${row.id}`}
      className={`group border-b border-rule target:shadow-[inset_3px_0_0_var(--tape)] ${kept}`}
    >
      <summary className="grid min-h-9 grid-cols-[16px_1fr_auto] items-baseline gap-x-2 py-2 bench:min-h-11 pointer-coarse:min-h-11 md:grid-cols-[16px_minmax(160px,1.3fr)_minmax(110px,0.7fr)_minmax(0,2fr)]">
        <OpenMark className="translate-y-0.5 text-ink-soft transition-transform group-open:rotate-90" />
        <span>
          {row.name} {tag?.(row)}
        </span>
        <span className="text-right">
          {row.text === null ? (
            <span className="text-ink-soft">{row.absent}</span>
          ) : (
            <Value text={row.text} unit={row.unit} />
          )}
        </span>
        <span className="col-start-2 col-end-4 flex flex-wrap items-baseline gap-x-4 md:col-start-4 md:col-end-5 md:pl-4">
          {row.band === undefined ? null : <span className="figure text-xs text-ink-soft">{row.band}</span>}
          {row.verdict === undefined ? null : <FigureBadge level={row.verdict.level} words={row.verdict.words} />}
        </span>
      </summary>
      <Provenance row={row} />
      {foot === undefined ? null : <div className="pb-4 pl-6">{foot(row)}</div>}
    </details>
  );
}

export function Provenance({ row }: { readonly row: FigureRow }) {
  return (
    <dl className="grid max-w-[80ch] gap-x-4 gap-y-1 pb-4 pl-6 text-sm md:grid-cols-[160px_1fr]">
      <Line name={row.absent} text={row.problem} />
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
