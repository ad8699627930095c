/** What a key asks of a handle or of the board. */
export interface KeyPress {
  readonly key: string;
  readonly shiftKey: boolean;
  readonly altKey: boolean;
  readonly ctrlKey: boolean;
  readonly metaKey: boolean;
}

export interface Steppable {
  readonly value: number;
  readonly min: number;
  readonly max: number;
  readonly step: number;
}

/** Steps of one press: plain 1, Shift 10, Alt 0.1. */
export const stepFactor = ({ shiftKey, altKey }: Pick<KeyPress, 'shiftKey' | 'altKey'>): number =>
  shiftKey ? 10 : altKey ? 0.1 : 1;

/** Digits that keep sums of steps from growing a tail of nines. */
const STEP_DIGITS = 9;
const tidy = (value: number): number => Number(value.toFixed(STEP_DIGITS));

/**
 * The value that a key asks for, or null when the key is no step. Arrow up and right raise, down and left lower, Page
 * keys go ten steps, Home and End to the ends of the range. Nothing is clamped here: whoever sets the value says why it stops.
 */
export function keyStep(press: KeyPress, handle: Steppable): number | null {
  if (press.ctrlKey || press.metaKey) return null;
  const by = (steps: number) => tidy(handle.value + steps * handle.step * stepFactor(press));
  switch (press.key) {
    case 'ArrowUp':
    case 'ArrowRight':
      return by(1);
    case 'ArrowDown':
    case 'ArrowLeft':
      return by(-1);
    case 'PageUp':
      return tidy(handle.value + 10 * handle.step);
    case 'PageDown':
      return tidy(handle.value - 10 * handle.step);
    case 'Home':
      return handle.min;
    case 'End':
      return handle.max;
    default:
      return null;
  }
}

/** Rounds to whole steps, or to tenths of one when fine. */
export function toStep(value: number, step: number, fine: boolean): number {
  if (!(step > 0)) throw new RangeError(`step must be positive, got ${step}`);
  const grain = fine ? step / 10 : step;
  return tidy(Math.round(value / grain) * grain);
}

export type BoardKey = 'undo' | 'redo' | 'help';

/** The board's own keys: Ctrl or Cmd with Z, Shift+Z and Y, and the question mark. */
export function boardKey(press: KeyPress): BoardKey | null {
  const command = press.ctrlKey || press.metaKey;
  const key = press.key.toLowerCase();
  if (command && !press.altKey && key === 'z') return press.shiftKey ? 'redo' : 'undo';
  if (command && !press.altKey && !press.shiftKey && key === 'y') return 'redo';
  if (!command && !press.altKey && press.key === '?') return 'help';
  return null;
}
