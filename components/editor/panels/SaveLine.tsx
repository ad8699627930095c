'use client';

import { BadIcon, GoodIcon, WatchIcon } from '@/components/ui/icons';
import { save as texts } from '@/lib/text/en/board';
import type { SaveState } from '../state/saver';
import { useBoardState } from '../useBoard';

const SHORT: Record<SaveState['kind'], { readonly words: string; readonly tone: 'good' | 'watch' | 'bad' | 'calm' }> = {
  off: { words: texts.off, tone: 'calm' },
  saved: { words: texts.saved, tone: 'good' },
  waiting: { words: texts.waiting, tone: 'calm' },
  saving: { words: texts.saving, tone: 'calm' },
  offline: { words: texts.offlineShort, tone: 'watch' },
  signedOut: { words: texts.signedOutShort, tone: 'watch' },
  stale: { words: texts.staleShort, tone: 'bad' },
  refused: { words: texts.refusedShort, tone: 'bad' },
};
const TONES = { good: 'text-good', watch: 'text-watch', bad: 'text-bad', calm: 'text-ink-soft' } as const;

/** Where the work is: a word and a sign that change by themselves. */
export function SaveLine({ words }: { readonly words?: string }) {
  const kind = useBoardState((state) => state.save.kind);
  const { words: own, tone } = SHORT[kind];
  return (
    <span
      role="status"
      aria-live="polite"
      data-testid="save-state"
      data-save={kind}
      className={`inline-flex items-center gap-1.5 text-sm ${TONES[tone]}`}
    >
      {tone === 'good' ? <GoodIcon /> : tone === 'watch' ? <WatchIcon /> : tone === 'bad' ? <BadIcon /> : null}
      {words ?? own}
    </span>
  );
}
