import Link from 'next/link';
import type { DesignSummary } from '@/lib/contract/answers';
import { may, type Role } from '@/lib/contract/roles';
import { designs as words } from '@/lib/text/en/pages';
import { fill } from '@/lib/text/fill';
import { fixedDigits } from '@/lib/units/number';
import { Thumbnail } from '../thumbnail/Thumbnail';
import { StateBadge } from '../ui/Badge';
import { LinkButton } from '../ui/Button';
import { paths } from '../ui/paths';
import { Time } from '../ui/Time';
import { Value } from '../ui/Value';

interface DesignListProps {
  readonly workshopId: string;
  readonly designs: readonly DesignSummary[];
  readonly roles: readonly Role[];
}

/** Designs one under the other, each with its own drawing, where it stands and where one goes from here. */
export function DesignList({ workshopId, designs, roles }: DesignListProps) {
  return (
    <ul className="border-t border-ink-soft">
      {designs.map((design) => (
        <li key={design.id} className="grid gap-x-6 gap-y-4 border-b border-rule py-5 sm:grid-cols-[184px_1fr]">
          <Link
            href={paths.board(workshopId, design.id)}
            tabIndex={-1}
            aria-hidden="true"
            className="block max-w-[240px]"
          >
            <Thumbnail outlines={design.thumbnail.outlines} label={fill(words.picture, { name: design.name })} />
          </Link>
          <div className="grid min-w-0 content-between gap-4">
            <Facts workshopId={workshopId} design={design} />
            <Ways workshopId={workshopId} design={design} roles={roles} />
          </div>
        </li>
      ))}
    </ul>
  );
}

function Facts({ workshopId, design }: { readonly workshopId: string; readonly design: DesignSummary }) {
  const { id, name, latestRevision, spanMm, massG, updatedAt } = design;
  return (
    <div className="grid gap-2">
      <div className="flex flex-wrap items-baseline gap-x-4 gap-y-1">
        <h2 className="text-lg">
          <Link href={paths.board(workshopId, id)} className="text-ink no-underline hover:underline">
            {name}
          </Link>
        </h2>
        {latestRevision === null ? (
          <span className="text-sm text-ink-soft">{words.noRevision}</span>
        ) : (
          <span className="flex flex-wrap items-center gap-x-3 text-sm">
            {fill(words.revision, { number: latestRevision.number })}
            <StateBadge state={latestRevision.state} />
          </span>
        )}
      </div>
      <dl className="flex flex-wrap gap-x-6 gap-y-1 text-sm [&>div]:flex [&>div]:gap-2 [&_dt]:text-ink-soft">
        <div>
          <dt>{words.span}</dt>
          <dd>
            <Value text={fixedDigits(spanMm, 0)} unit="mm" />
          </dd>
        </div>
        <div>
          <dt>{words.mass}</dt>
          <dd>{massG === null ? words.massUnknown : <Value text={fixedDigits(massG, 0)} unit="g" />}</dd>
        </div>
        <div>
          <dt>{words.changed}</dt>
          <dd>
            <Time iso={updatedAt} day />
          </dd>
        </div>
      </dl>
    </div>
  );
}

function Ways({
  workshopId,
  design,
  roles,
}: {
  readonly workshopId: string;
  readonly design: DesignSummary;
  readonly roles: readonly Role[];
}) {
  const { id, name, latestRevision } = design;
  const number = latestRevision?.number;
  return (
    <div className="flex flex-wrap gap-2">
      <LinkButton
        href={paths.board(workshopId, id)}
        aria-label={`${may(roles, 'draft.save') ? words.board : words.look}: ${name}`}
      >
        {may(roles, 'draft.save') ? words.board : words.look}
      </LinkButton>
      {number === undefined ? null : (
        <>
          <LinkButton
            href={paths.review(workshopId, id, number)}
            aria-label={`${fill(words.review, { number })}: ${name}`}
          >
            {fill(words.review, { number })}
          </LinkButton>
          <LinkButton
            href={paths.print(workshopId, id, number)}
            aria-label={`${fill(words.print, { number })}: ${name}`}
          >
            {fill(words.print, { number })}
          </LinkButton>
        </>
      )}
      {number === undefined && may(roles, 'draft.print') ? (
        <LinkButton href={paths.printDraft(workshopId, id)} aria-label={`${words.printDraft}: ${name}`}>
          {words.printDraft}
        </LinkButton>
      ) : null}
      <LinkButton href={paths.revisions(workshopId, id)} weight="bare" aria-label={`${words.revisions}: ${name}`}>
        {words.revisions}
      </LinkButton>
    </div>
  );
}
