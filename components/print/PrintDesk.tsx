'use client';

import { useQuery } from '@tanstack/react-query';
import { useState } from 'react';
import { api } from '@/client/api';
import { QueryProvider } from '@/client/query';
import type { Manifest } from '@/lib/plan/manifest';
import { print as words } from '@/lib/text/en/pages';
import { fill } from '@/lib/text/fill';
import { DownloadLink } from '../ui/Button';
import { Choices } from '../ui/Choices';
import { Notice } from '../ui/Notice';
import { problemOf } from '../ui/problem';

export interface PaperChoice {
  readonly id: string;
  readonly name: string;
  readonly size: string;
}

interface PrintDeskProps {
  /** Address in the API under which /plan and /manifest stand. */
  readonly base: string;
  readonly papers: readonly PaperChoice[];
  /** Address of the airframe file, for a revision. */
  readonly exportHref?: string;
}

export const PrintDesk = (props: PrintDeskProps) => (
  <QueryProvider>
    <Desk {...props} />
  </QueryProvider>
);

/** Pages of a plan, all kinds together. */
const pagesOf = ({ otherPages, sheets }: Manifest): number =>
  otherPages.length + sheets.reduce((sum, sheet) => sum + sheet.pages.length, 0);

/** Choose the paper, see how many pages it makes, take the file. */
function Desk({ base, papers, exportHref }: PrintDeskProps) {
  const [paper, setPaper] = useState(papers[0]?.id ?? '');
  const name = papers.find(({ id }) => id === paper)?.name ?? paper;
  const query = `?paper=${encodeURIComponent(paper)}`;
  const count = useQuery({
    queryKey: ['pages', base, paper],
    queryFn: async ({ signal }) => pagesOf((await api.get<Manifest>(`${base}/manifest${query}`, { signal })).data),
    staleTime: Number.POSITIVE_INFINITY,
  });
  return (
    <div className="grid gap-4">
      <Choices
        kind="radio"
        name="paper"
        legend={words.paper}
        choices={papers.map((each) => ({ value: each.id, label: each.name, hint: each.size }))}
        chosen={[paper]}
        onChange={([chosen]) => setPaper(chosen ?? paper)}
      />
      <p aria-live="polite" className="min-h-6">
        {count.isPending ? words.counting : null}
        {count.isSuccess ? fill(words.pages, { count: count.data, paper: name }) : null}
      </p>
      {count.isError ? (
        <Notice tone="bad" title={fill(words.noPages, { why: problemOf(count.error).message })} live />
      ) : null}
      <div className="flex flex-wrap gap-3">
        <DownloadLink href={`${base}/plan${query}`}>{words.download}</DownloadLink>
        {exportHref === undefined ? null : (
          <DownloadLink href={exportHref} weight="plain">
            {words.exportFile}
          </DownloadLink>
        )}
        <DownloadLink href={`${base}/manifest${query}`} weight="bare">
          {words.manifest}
        </DownloadLink>
      </div>
    </div>
  );
}
