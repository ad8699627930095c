'use client';

import { errors as words } from '@/lib/text/en/pages';
import { fill } from '@/lib/text/fill';
import { Button } from './Button';
import { ScoreLine } from './ScoreLine';

const digestOf = (error: unknown): string | null => {
  if (!(error instanceof Error) || !('digest' in error)) return null;
  return typeof error.digest === 'string' ? error.digest : null;
};

/** What a person sees when a page breaks: what is safe, what to do, and a number for the log. */
export function ErrorBody({ error, retry }: { readonly error: unknown; readonly retry: () => void }) {
  const digest = digestOf(error);
  return (
    <main className="mx-auto grid max-w-[560px] gap-5 px-4 py-16 sm:px-6">
      <h1 className="text-2xl">{words.errorTitle}</h1>
      <ScoreLine />
      <p className="text-ink-soft">{words.errorLead}</p>
      <div className="flex gap-3">
        <Button weight="primary" onClick={retry}>
          {words.retry}
        </Button>
      </div>
      {digest === null ? null : <p className="figure text-xs text-ink-soft">{fill(words.reference, { digest })}</p>}
    </main>
  );
}
