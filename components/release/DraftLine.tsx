import type { DraftAnswer } from '@/lib/contract/answers';
import type { Problem } from '@/lib/numerics/result';
import { release as words } from '@/lib/text/en/pages';
import { fill } from '@/lib/text/fill';
import { Notice } from '../ui/Notice';
import { Time } from '../ui/Time';

/** Which draft is looked at. */
export function DraftLine({ draft }: { readonly draft: DraftAnswer }) {
  return (
    <p className="text-sm text-ink-soft">
      {fill(words.version, { version: draft.version, by: draft.savedBy })}, <Time iso={draft.savedAt} />
    </p>
  );
}

/** What the chain could not work out about the draft, each at its place in the document. */
export function ProblemList({ problems }: { readonly problems: readonly Problem[] }) {
  if (problems.length === 0) return null;
  return (
    <Notice tone="watch" title={words.problems}>
      <ul className="grid gap-1">
        {problems.map(({ code, path, message, fix }) => (
          <li key={`${code} ${path} ${message}`}>
            {message}
            {fix === undefined ? null : `. ${fix}`}
          </li>
        ))}
      </ul>
    </Notice>
  );
}
