import { cautions as words } from '@/lib/text/en/partsPage';
import { WatchIcon } from '../ui/icons';
import type { Caution } from './cautions';

/** Short words of caution, where the act is. */
export function CautionLines({ cautions }: { readonly cautions: readonly Caution[] }) {
  if (cautions.length === 0) return null;
  return (
    <ul aria-label={words.title} className="grid gap-1 text-sm">
      {cautions.map(({ act, words: text }) => (
        <li key={act} className="flex items-start gap-2">
          <span className="mt-0.5 text-watch">
            <WatchIcon />
          </span>
          <span>
            <strong className="font-[560]">{act}:</strong> {text}
          </span>
        </li>
      ))}
    </ul>
  );
}
