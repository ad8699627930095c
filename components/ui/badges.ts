import type { RevisionState, ThreadAnswer } from '@/lib/contract/answers';
import type { VerdictKind } from '@/lib/contract/bodies';
import type { Verdict } from '@/lib/figures/types';
import { words } from '@/lib/text/en/pages';

// Every state is a word, an icon and a colour; this table is the only place that pairs them.

export type BadgeIcon = 'good' | 'watch' | 'bad' | 'seen' | 'frozen';
export interface BadgeLook {
  readonly word: string;
  readonly icon: BadgeIcon;
  readonly tone: 'good' | 'watch' | 'bad' | 'calm';
}

/** A figure's verdict. */
export const FIGURE_BADGES: Record<Verdict, BadgeLook> = {
  good: { word: words.good, icon: 'good', tone: 'good' },
  watch: { word: words.watch, icon: 'watch', tone: 'watch' },
  bad: { word: words.bad, icon: 'bad', tone: 'bad' },
};

/** Where a revision stands. */
export const STATE_BADGES: Record<RevisionState | 'draft', BadgeLook> = {
  draft: { word: words.draft, icon: 'watch', tone: 'calm' },
  released: { word: words.released, icon: 'frozen', tone: 'calm' },
  goodToCut: { word: words.goodToCut, icon: 'good', tone: 'good' },
  held: { word: words.held, icon: 'bad', tone: 'bad' },
};

/** What a reviewer said. */
export const VERDICT_BADGES: Record<VerdictKind, BadgeLook> = {
  goodToCut: { word: words.goodToCut, icon: 'good', tone: 'good' },
  hold: { word: words.hold, icon: 'bad', tone: 'bad' },
  seen: { word: words.seen, icon: 'seen', tone: 'calm' },
};

/** An open thread waits for somebody. */
export const THREAD_BADGES: Record<ThreadAnswer['state'], BadgeLook> = {
  open: { word: words.open, icon: 'watch', tone: 'watch' },
  closed: { word: words.closed, icon: 'good', tone: 'calm' },
};
