'use client';

import type { ThreadAnswer } from '@/lib/contract/answers';
import type { Anchor } from '@/lib/contract/bodies';
import { threads as words } from '@/lib/text/en/review';
import { fill } from '@/lib/text/fill';
import { type Subjects, wordsOf } from './anchors';
import { TextForm } from './TextForm';
import { Thread } from './Thread';

interface ThreadListProps {
  readonly base: string;
  readonly subjects: Subjects;
  readonly threads: readonly ThreadAnswer[];
  readonly draft: Anchor | null;
  readonly selected: string | null;
  readonly may: { readonly comment: boolean; readonly close: boolean };
  readonly onSelect: (threadId: string) => void;
  readonly onSend: (text: string) => Promise<void>;
  readonly onCancel: () => void;
}

/** The new comment while one is being written, then all threads, open ones first. */
export function ThreadList({
  base,
  subjects,
  threads,
  draft,
  selected,
  may,
  onSelect,
  onSend,
  onCancel,
}: ThreadListProps) {
  const open = threads.filter(({ state }) => state === 'open');
  const closed = threads.filter(({ state }) => state === 'closed');
  return (
    <div className="grid gap-3">
      {draft === null ? null : (
        <div className="border-l-3 border-tape bg-paper p-3">
          <p className="mb-2 text-sm font-[560]">{fill(words.new, { place: wordsOf(subjects, draft) })}</p>
          <TextForm
            key={JSON.stringify(draft)}
            label={words.text}
            submit={words.pin}
            onSend={onSend}
            onCancel={onCancel}
            autoFocus={draft.kind === 'point'}
          />
        </div>
      )}
      <p className="text-sm text-ink-soft" aria-live="polite">
        {threads.length === 0 ? words.none : fill(words.openCount, { open: open.length, closed: closed.length })}
      </p>
      {[...open, ...closed].map((thread) => (
        <Thread
          key={thread.id}
          base={base}
          thread={thread}
          about={wordsOf(subjects, thread.anchor)}
          selected={thread.id === selected}
          onSelect={() => onSelect(thread.id)}
          mayAnswer={may.comment}
          mayClose={may.close}
        />
      ))}
    </div>
  );
}
