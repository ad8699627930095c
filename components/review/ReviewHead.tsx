import type { RevisionSummary } from '@/lib/contract/answers';
import { review as words } from '@/lib/text/en/review';
import { fill } from '@/lib/text/fill';
import { Time } from '../ui/Time';

/** Why this revision was made and what it should change, before one looks at the drawing. */
export function ReviewHead({ revision }: { readonly revision: RevisionSummary }) {
  return (
    <div className="grid gap-3">
      <dl className="grid gap-x-10 gap-y-3 md:grid-cols-2 [&_dt]:text-sm [&_dt]:text-ink-soft">
        <div>
          <dt>{words.reason}</dt>
          <dd className="whitespace-pre-line">{revision.reason}</dd>
        </div>
        <div>
          <dt>{words.effect}</dt>
          <dd className="whitespace-pre-line">{revision.expectedEffect}</dd>
        </div>
      </dl>
      <p className="text-sm text-ink-soft">
        {fill(words.released, { name: revision.releasedBy.name })}, <Time iso={revision.releasedAt} />. {words.frozen}
      </p>
    </div>
  );
}
