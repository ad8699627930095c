import type { Verdict } from '@/lib/figures/types';
import { type BadgeIcon, type BadgeLook, FIGURE_BADGES, STATE_BADGES } from './badges';
import { BadIcon, FrozenIcon, GoodIcon, SeenIcon, WatchIcon } from './icons';

const ICONS: Record<BadgeIcon, () => React.ReactElement> = {
  good: GoodIcon,
  watch: WatchIcon,
  bad: BadIcon,
  seen: SeenIcon,
  frozen: FrozenIcon,
};
const TONES = { good: 'text-good', watch: 'text-watch', bad: 'text-bad', calm: 'text-ink-soft' } as const;

/** Icon and word side by side; a longer wording may take the word's place. */
export function Badge({ look, words }: { readonly look: BadgeLook; readonly words?: string }) {
  const Mark = ICONS[look.icon];
  return (
    <span className={`inline-flex items-start gap-1.5 text-sm font-[560] ${TONES[look.tone]} [&>svg]:mt-0.5`}>
      <Mark />
      {words ?? look.word}
    </span>
  );
}

export const FigureBadge = ({ level, words }: { readonly level: Verdict; readonly words?: string }) => (
  <Badge look={FIGURE_BADGES[level]} words={words} />
);

export const StateBadge = ({ state }: { readonly state: keyof typeof STATE_BADGES }) => (
  <Badge look={STATE_BADGES[state]} />
);
