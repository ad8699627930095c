'use client';

import { useRouter } from 'next/navigation';
import { useEffect, useRef, useState } from 'react';
import { Unreachable } from '@/client/api';
import { QueryProvider } from '@/client/query';
import type { ThreadAnswer, VerdictRow } from '@/lib/contract/answers';
import type { Anchor } from '@/lib/contract/bodies';
import type { FigureMarks } from '@/lib/figures/types';
import { review, sheet, verdicts as verdictWords, threads as words } from '@/lib/text/en/review';
import type { FigureRow } from '../figures/rows';
import { Notice } from '../ui/Notice';
import { Section } from '../ui/Page';
import { AboutPicker } from './AboutPicker';
import type { Subjects } from './anchors';
import { useStartThread, useThreads, useVerdicts } from './hooks';
import type { PartRow, StockRow } from './PartsTable';
import { PinSheet } from './PinSheet';
import { ReviewLists } from './ReviewLists';
import { ThreadList } from './ThreadList';
import { VerdictPanel } from './VerdictPanel';

export interface ReviewBoardProps {
  /** Address of the revision in the API. */
  readonly base: string;
  readonly name: string;
  readonly subjects: Subjects;
  readonly marks: FigureMarks;
  readonly lists: {
    readonly figures: readonly FigureRow[];
    readonly parts: readonly PartRow[];
    readonly stock: readonly StockRow[];
  };
  readonly threads: readonly ThreadAnswer[];
  readonly verdicts: readonly VerdictRow[];
  readonly may: { readonly comment: boolean; readonly close: boolean; readonly verdict: boolean };
  /** Who looks released this revision. */
  readonly own: boolean;
}

export const ReviewBoard = (props: ReviewBoardProps) => (
  <QueryProvider>
    <Board {...props} />
  </QueryProvider>
);

/** A frozen revision under review: the plan with pins, what was said, the verdict, figures and parts. */
function Board({ base, name, subjects, marks, lists, may, own, ...initial }: ReviewBoardProps) {
  const threads = useThreads(base, initial.threads);
  const verdicts = useVerdicts(base, initial.verdicts);
  const { draft, setDraft, selected, choose, select, send } = useConversation(base);
  const picker = useRef<HTMLSelectElement>(null);
  const talk = useRef<HTMLDivElement>(null);
  useRefreshOn(verdicts.data.map(({ id }) => id).join());

  /** Figures and parts lie far below the place where one writes. */
  const comment = (anchor: Anchor) => {
    choose(anchor);
    talk.current?.scrollIntoView({ block: 'start' });
  };
  return (
    <div className="grid gap-10">
      {threads.error instanceof Unreachable ? <Notice tone="watch" title={review.offline} live /> : null}
      <div className="grid gap-8 lg:grid-cols-[minmax(0,1fr)_400px]">
        <Section title={sheet.title} id="plan">
          {may.comment ? <p className="text-sm text-ink-soft">{sheet.hint}</p> : null}
          <PinSheet
            name={name}
            subjects={subjects}
            marks={marks}
            threads={threads.data}
            draft={draft}
            selected={selected}
            onPlace={choose}
            onKey={() => picker.current?.focus()}
            onSelect={select}
          />
        </Section>
        <div className="grid content-start gap-8" ref={talk}>
          <Section title={words.title} id="comments">
            {may.comment ? <AboutPicker ref={picker} subjects={subjects} draft={draft} onChoose={choose} /> : null}
            <ThreadList
              base={base}
              subjects={subjects}
              threads={threads.data}
              draft={draft}
              selected={selected}
              may={may}
              onSelect={select}
              onSend={send}
              onCancel={() => setDraft(null)}
            />
          </Section>
          <Section title={verdictWords.title} id="verdict">
            <VerdictPanel base={base} rows={verdicts.data} mayGive={may.verdict} own={own} />
          </Section>
        </div>
      </div>
      <ReviewLists {...lists} threads={threads.data} mayComment={may.comment} onComment={comment} onSelect={select} />
    </div>
  );
}

/** What is being written about, or which thread is read: one of the two, never both. */
function useConversation(base: string) {
  const start = useStartThread(base);
  const [draft, setDraft] = useState<Anchor | null>(null);
  const [selected, setSelected] = useState<string | null>(null);
  const choose = (anchor: Anchor | null) => {
    setDraft(anchor);
    setSelected(null);
  };
  const select = (threadId: string) => {
    setDraft(null);
    setSelected((now) => (now === threadId ? null : threadId));
  };
  const send = async (text: string) => {
    if (draft === null) return;
    const { data } = await start.mutateAsync({ anchor: draft, text });
    setDraft(null);
    setSelected(data.id);
  };
  return { draft, setDraft, selected, choose, select, send };
}

/** The state of the revision stands in the page's head, which the server draws: a new verdict asks for it again. */
function useRefreshOn(key: string) {
  const router = useRouter();
  const shown = useRef(key);
  useEffect(() => {
    if (shown.current === key) return;
    shown.current = key;
    router.refresh();
  }, [key, router]);
}
