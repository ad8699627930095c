'use client';

import type { ThreadAnswer } from '@/lib/contract/answers';
import type { Anchor } from '@/lib/contract/bodies';
import { figuresText, partsText, threads as words } from '@/lib/text/en/review';
import { fill } from '@/lib/text/fill';
import { FigureList } from '../figures/FigureList';
import type { FigureRow } from '../figures/rows';
import { Button } from '../ui/Button';
import { CommentIcon } from '../ui/icons';
import { Section } from '../ui/Page';
import { type PartRow, PartsTable, type StockRow, StockTable } from './PartsTable';

interface ReviewListsProps {
  readonly figures: readonly FigureRow[];
  readonly parts: readonly PartRow[];
  readonly stock: readonly StockRow[];
  readonly threads: readonly ThreadAnswer[];
  readonly mayComment: boolean;
  readonly onComment: (anchor: Anchor) => void;
  readonly onSelect: (threadId: string) => void;
}

/** Figures and parts of the revision, each with its comments and a way to write one. */
export function ReviewLists({ figures, parts, stock, threads, mayComment, onComment, onSelect }: ReviewListsProps) {
  const about = (kind: Anchor['kind'], key: string) =>
    threads.filter(({ anchor }) => anchor.kind === kind && anchor.key === key);
  return (
    <>
      <Section title={figuresText.title} id="figures">
        <p className="max-w-[68ch] text-ink-soft">{figuresText.lead}</p>
        <FigureList
          rows={figures}
          tag={({ id }) => <Count threads={about('figure', id)} />}
          foot={({ id, name }) => (
            <span className="flex flex-wrap items-center gap-2">
              <Numbers threads={about('figure', id)} onSelect={onSelect} />
              {mayComment ? (
                <Button onClick={() => onComment({ kind: 'figure', key: id })}>
                  <CommentIcon />
                  {fill(figuresText.comment, { name })}
                </Button>
              ) : null}
            </span>
          )}
        />
      </Section>
      <Section title={partsText.title} id="parts">
        <PartsTable
          rows={parts}
          act={({ key, name }) => (
            <span className="flex items-center justify-end gap-1">
              <Numbers threads={about('part', key)} onSelect={onSelect} />
              {mayComment ? (
                <Button
                  weight="bare"
                  className="min-w-9"
                  aria-label={fill(partsText.comment, { name })}
                  onClick={() => onComment({ kind: 'part', key })}
                >
                  <CommentIcon />
                </Button>
              ) : null}
            </span>
          )}
        />
        <StockTable rows={stock} />
      </Section>
    </>
  );
}

/** How many comments there are on a figure, beside its name. */
function Count({ threads }: { readonly threads: readonly ThreadAnswer[] }) {
  if (threads.length === 0) return null;
  return (
    <span className="ml-1 inline-flex items-center gap-1 text-sm text-ink-soft">
      <CommentIcon />
      <span className="figure">{threads.length}</span>
      <span className="sr-only">{words.title}</span>
    </span>
  );
}

interface NumbersProps {
  readonly threads: readonly ThreadAnswer[];
  readonly onSelect: (threadId: string) => void;
}

/** The comments themselves, by number; each leads to what was said. */
const Numbers = ({ threads, onSelect }: NumbersProps) =>
  threads.map(({ id, number }) => (
    <button
      key={id}
      type="button"
      onClick={() => onSelect(id)}
      aria-label={fill(words.number, { number })}
      className="figure inline-grid size-7 place-items-center rounded-cut border border-ink-soft text-xs"
    >
      {number}
    </button>
  ));
