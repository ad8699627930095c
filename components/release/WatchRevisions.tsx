'use client';

import { useQuery } from '@tanstack/react-query';
import { useRouter } from 'next/navigation';
import { useEffect, useRef } from 'react';
import { api } from '@/client/api';
import { QueryProvider } from '@/client/query';
import type { RevisionSummary } from '@/lib/contract/answers';

/** Often enough that a release or a verdict shows while one waits for it. A hidden tab asks nothing. */
const POLL_MS = 5_000;

/** What the page shows of the revisions: when this changes, the page is old. */
const shownOf = (revisions: readonly RevisionSummary[], only: number | undefined): string =>
  revisions
    .filter(({ number }) => only === undefined || number === only)
    .map(({ number, state, openThreads }) => `${number} ${state} ${openThreads}`)
    .sort()
    .join();

interface WatchProps {
  /** Address of the revisions in the API. */
  readonly base: string;
  /** As the page was drawn with. */
  readonly revisions: readonly RevisionSummary[];
  /** The one revision that the page is about; without it every revision counts. */
  readonly only?: number;
}

export const WatchRevisions = (props: WatchProps) => (
  <QueryProvider>
    <Watch {...props} />
  </QueryProvider>
);

/** Draws the page again when something was released, said or judged elsewhere. It shows nothing itself. */
function Watch({ base, revisions, only }: WatchProps) {
  const router = useRouter();
  const shown = useRef(shownOf(revisions, only));
  const { data } = useQuery({
    queryKey: ['revisions', base],
    queryFn: async ({ signal }) => (await api.get<readonly RevisionSummary[]>(base, { signal })).data,
    refetchInterval: POLL_MS,
  });
  useEffect(() => {
    if (data === undefined) return;
    const now = shownOf(data, only);
    if (now === shown.current) return;
    shown.current = now;
    router.refresh();
  }, [data, only, router]);
  return null;
}
