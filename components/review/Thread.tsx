'use client';

import { useEffect, useRef, useState } from 'react';
import type { ThreadAnswer } from '@/lib/contract/answers';
import { threads as words } from '@/lib/text/en/review';
import { fill } from '@/lib/text/fill';
import { Badge } from '../ui/Badge';
import { Button } from '../ui/Button';
import { THREAD_BADGES } from '../ui/badges';
import { FieldError } from '../ui/Field';
import { problemOf } from '../ui/problem';
import { Time } from '../ui/Time';
import { useAnswer, useSetThreadState } from './hooks';
import { TextForm } from './TextForm';

interface ThreadProps {
  readonly base: string;
  readonly thread: ThreadAnswer;
  readonly about: string;
  readonly selected: boolean;
  readonly onSelect: () => void;
  readonly mayAnswer: boolean;
  readonly mayClose: boolean;
}

/** One matter: what it is about, what was said, an answer, and whether it is settled. */
export function Thread({ base, thread, about, selected, onSelect, mayAnswer, mayClose }: ThreadProps) {
  const [answering, setAnswering] = useState(false);
  const answer = useAnswer(base, thread.id);
  const box = useRef<HTMLElement>(null);
  useEffect(() => {
    if (selected) box.current?.scrollIntoView({ block: 'nearest' });
  }, [selected]);
  return (
    <article
      ref={box}
      id={`thread-${thread.number}`}
      aria-label={fill(words.number, { number: thread.number })}
      className={`grid gap-2 border-b border-rule py-3 pl-3 ${selected ? 'border-l-3 border-l-tape' : 'border-l-3 border-l-transparent'}`}
    >
      <header className="flex flex-wrap items-center justify-between gap-2">
        <button
          type="button"
          onClick={onSelect}
          className="flex min-h-8 min-w-0 items-center gap-2 text-left bench:min-h-11"
        >
          <span className="figure grid h-6 min-w-6 place-items-center rounded-cut border border-ink-soft px-1 text-xs">
            {thread.number}
          </span>
          <span className="min-w-0 text-sm font-[560]">{about}</span>
        </button>
        <Badge
          look={THREAD_BADGES[thread.state]}
          words={thread.closedBy === null ? undefined : fill(words.closedBy, { name: thread.closedBy })}
        />
      </header>
      <Comments comments={thread.comments} />
      {answering ? (
        <TextForm
          label={words.answer}
          submit={words.send}
          autoFocus
          onCancel={() => setAnswering(false)}
          onSend={async (text) => {
            await answer.mutateAsync({ text });
            setAnswering(false);
          }}
        />
      ) : (
        <div className="flex flex-wrap gap-1">
          {mayAnswer && thread.state === 'open' ? (
            <Button weight="bare" onClick={() => setAnswering(true)}>
              {words.answer}
            </Button>
          ) : null}
          {mayClose ? <CloseButton base={base} thread={thread} /> : null}
        </div>
      )}
    </article>
  );
}

const Comments = ({ comments }: Pick<ThreadAnswer, 'comments'>) => (
  <ol className="grid gap-3">
    {comments.map(({ id, author, text, createdAt }) => (
      <li key={id}>
        <p className="text-sm text-ink-soft">
          <span className="font-[560] text-ink">{author.name}</span> · <Time iso={createdAt} />
        </p>
        <p className="whitespace-pre-line">{text}</p>
      </li>
    ))}
  </ol>
);

function CloseButton({ base, thread }: Pick<ThreadProps, 'base' | 'thread'>) {
  const set = useSetThreadState(base, thread.id);
  const closed = thread.state === 'closed';
  return (
    <>
      <Button
        weight="bare"
        disabled={set.isPending}
        aria-label={fill(closed ? words.reopenOf : words.closeOf, { number: thread.number })}
        onClick={() => set.mutate({ state: closed ? 'open' : 'closed' })}
      >
        {closed ? words.reopen : words.close}
      </Button>
      <FieldError
        id={`thread-${thread.id}-error`}
        error={set.error === null ? undefined : problemOf(set.error).message}
      />
    </>
  );
}
