import type { ThreadAnswer } from '@/lib/contract/answers';
import { words as states } from '@/lib/text/en/pages';
import { threads as words } from '@/lib/text/en/review';
import { fill } from '@/lib/text/fill';

interface PinProps {
  readonly number: number;
  readonly state: ThreadAnswer['state'];
  readonly about: string;
  readonly place: { readonly left: string; readonly top: string };
  /** Pins at one spot step aside. */
  readonly step: number;
  readonly selected: boolean;
  readonly onSelect: () => void;
}

/** A numbered flag whose foot stands on the place: open in full line, closed in dashes, the selected one in tape. */
export function Pin({ number, state, about, place, step, selected, onSelect }: PinProps) {
  const edge = selected
    ? 'border-2 border-tape'
    : state === 'open'
      ? 'border-2 border-ink'
      : 'border border-dashed border-ink-soft text-ink-soft';
  return (
    <button
      type="button"
      onClick={onSelect}
      aria-pressed={selected}
      aria-label={fill(words.pinLabel, { number, state: states[state], place: about })}
      style={{ ...place, transform: `translate(calc(-50% + ${step * 26}px), -100%)`, zIndex: selected ? 2 : 1 }}
      className="absolute grid justify-items-center"
    >
      <span
        className={`figure grid h-6 min-w-6 place-items-center rounded-cut bg-paper px-1 text-xs bench:h-9 bench:min-w-9 ${edge}`}
      >
        {number}
      </span>
      <span
        aria-hidden="true"
        className={`h-2 w-0.5 ${selected ? 'bg-tape' : state === 'open' ? 'bg-ink' : 'bg-ink-soft'}`}
      />
    </button>
  );
}
