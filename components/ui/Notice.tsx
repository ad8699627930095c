import type { ReactNode } from 'react';
import { BadIcon, GoodIcon, WatchIcon } from './icons';

export type Tone = 'good' | 'watch' | 'bad';

const TONES = {
  good: { icon: GoodIcon, edge: 'border-good', mark: 'text-good' },
  watch: { icon: WatchIcon, edge: 'border-watch', mark: 'text-watch' },
  bad: { icon: BadIcon, edge: 'border-bad', mark: 'text-bad' },
} as const;

interface NoticeProps {
  readonly tone: Tone;
  readonly title?: string;
  readonly children?: ReactNode;
  /** A message that appears after an act is read out; one that stands on the page from the start is not. */
  readonly live?: boolean;
}

/** A strip with an edge, an icon and words: what happened or what to mind, and what to do next. */
export function Notice({ tone, title, children, live = false }: NoticeProps) {
  const { icon: Mark, edge, mark } = TONES[tone];
  return (
    <div
      role={live ? (tone === 'bad' ? 'alert' : 'status') : undefined}
      className={`flex gap-3 border-l-3 bg-paper px-4 py-3 ${edge}`}
    >
      <span className={`mt-1 ${mark}`}>
        <Mark />
      </span>
      <div className="grid min-w-0 gap-1">
        {title === undefined ? null : <p className="font-[560]">{title}</p>}
        {children === undefined ? null : <div className="text-sm">{children}</div>}
      </div>
    </div>
  );
}
