import type { EdgeMove, SetUpControl, SetUpSheet, StickEnd } from '@/lib/figures/setUp';
import { plan } from '@/lib/text/en/plan';
import { setUp } from '@/lib/text/en/setUp';
import { fill } from '@/lib/text/fill';
import { trimmedDigits } from '@/lib/units/number';

// The throws of the set-up sheet as a table for the first page: one row for each stick that moves a control.

const words = plan.throws;

export interface ThrowRow {
  readonly surface: string;
  /** After the surface's name: ", elevon · Elevator stick". */
  readonly control: string;
  /** Both ends of the stick; null for what no rate switch changes. */
  readonly low: readonly string[] | null;
  readonly high: readonly string[];
}

/** A move of a trailing edge in one piece: "up 9.5 mm (12°)". */
export const moveWords = ({ way, mm, deg }: EdgeMove): string =>
  fill(words.move, { way: words.ways[way], mm: trimmedDigits(mm, 1), deg: trimmedDigits(deg, 1) });

function rowOf({ surface, control, throws }: SetUpControl, ends: readonly StickEnd[]): ThrowRow {
  const [first] = ends;
  const only = throws.length === ends.length;
  const lows = ends.flatMap(({ low }) => low ?? []);
  return {
    surface,
    control:
      only || !first
        ? fill(words.within, { control })
        : fill(words.withStick, { control, stick: setUp.sticks[first.stick] }),
    low: lows.length === 0 ? null : lows.map(moveWords),
    high: ends.map(({ high }) => moveWords(high)),
  };
}

/** The throws at low and high rate, in the order of the set-up sheet. */
export const throwRows = ({ controls }: SetUpSheet): ThrowRow[] =>
  controls.flatMap((control) =>
    [...new Set(control.throws.map(({ stick }) => stick))].map((stick) =>
      rowOf(
        control,
        control.throws.filter((end) => end.stick === stick),
      ),
    ),
  );
