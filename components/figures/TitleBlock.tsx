import { FigureBadge } from '../ui/Badge';
import { Value } from '../ui/Value';
import type { FigureRow } from './rows';

/** The figures that decide, ruled off like the title block of a drawing. `before` shows the same figures of an earlier revision. */
export function TitleBlock({
  rows,
  before,
  beforeName,
  label,
}: {
  readonly rows: readonly FigureRow[];
  readonly before?: readonly FigureRow[];
  readonly beforeName?: string;
  readonly label: string;
}) {
  return (
    <section aria-label={label}>
      <dl className="flex flex-wrap border-t border-l border-rule">
        {rows.map((row) => {
          const earlier = before?.find(({ id }) => id === row.id);
          return (
            <div
              key={row.id}
              className="grid grow basis-[150px] content-start gap-1 border-r border-b border-rule bg-paper px-3 py-2.5"
            >
              <dt className="text-sm text-ink-soft">{row.name}</dt>
              <dd>
                {row.text === null ? (
                  <span className="text-ink-soft">–</span>
                ) : (
                  <Value text={row.text} unit={row.unit} large />
                )}
              </dd>
              {earlier?.text === undefined || earlier.text === null ? null : (
                <dd className="text-sm text-ink-soft">
                  {beforeName} <Value text={earlier.text} unit={row.unit} />
                </dd>
              )}
              {row.verdict === undefined ? null : (
                <dd className="dense">
                  <FigureBadge level={row.verdict.level} words={row.verdict.words} />
                </dd>
              )}
            </div>
          );
        })}
      </dl>
    </section>
  );
}
