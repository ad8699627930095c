import Link from 'next/link';
import type { RevisionSummary } from '@/lib/contract/answers';
import { designs, revisions as words } from '@/lib/text/en/pages';
import { fill } from '@/lib/text/fill';
import { StateBadge } from '../ui/Badge';
import { LinkButton } from '../ui/Button';
import { paths } from '../ui/paths';
import { Time } from '../ui/Time';

interface RevisionListProps {
  readonly workshopId: string;
  readonly designId: string;
  readonly revisions: readonly RevisionSummary[];
}

/** What was released, why, and what was expected of it. */
export function RevisionList({ workshopId, designId, revisions }: RevisionListProps) {
  return (
    <ol className="border-t border-ink-soft">
      {revisions.map(({ id, number, state, reason, expectedEffect, releasedAt, releasedBy, openThreads }) => (
        <li key={id} className="grid gap-x-8 gap-y-4 border-b border-rule py-5 md:grid-cols-[1fr_auto]">
          <div className="grid max-w-[72ch] gap-2">
            <div className="flex flex-wrap items-baseline gap-x-4 gap-y-1">
              <h2 className="text-lg">
                <Link
                  href={paths.review(workshopId, designId, number)}
                  className="text-ink no-underline hover:underline"
                >
                  {fill(designs.revision, { number })}
                </Link>
              </h2>
              <StateBadge state={state} />
            </div>
            <p className="text-sm text-ink-soft">
              {words.by} <Time iso={releasedAt} /> · {releasedBy.name} · {words.comments}:{' '}
              <span className="figure">{openThreads}</span>
            </p>
            <dl className="grid gap-x-4 gap-y-1 text-sm sm:grid-cols-[130px_1fr] [&_dt]:text-ink-soft">
              <dt>{words.reason}</dt>
              <dd className="whitespace-pre-line">{reason}</dd>
              <dt>{words.effect}</dt>
              <dd className="whitespace-pre-line">{expectedEffect}</dd>
            </dl>
          </div>
          <div className="flex flex-wrap content-start gap-2">
            <LinkButton href={paths.review(workshopId, designId, number)}>{fill(words.review, { number })}</LinkButton>
            <LinkButton href={paths.print(workshopId, designId, number)}>{fill(words.print, { number })}</LinkButton>
          </div>
        </li>
      ))}
    </ol>
  );
}
