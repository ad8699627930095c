import { elementName } from '@/lib/airframe/names';
import type { Airframe } from '@/lib/airframe/schema/airframe';
import type { CheckLevel, CheckResult, Measured } from '@/lib/checks/types';
import type { Vec2 } from '@/lib/numerics/vec';
import { checks as words } from '@/lib/text/en/partsPage';
import { trimmedDigits } from '@/lib/units/number';
import { type Shown, shown } from '@/lib/units/quantity';

/** A number beside its word: "measured 8.4 mm", "at least 10 mm". */
export interface CheckNumber {
  readonly word: string;
  readonly shown: Shown;
}

/** One finding as it is read. */
export interface CheckRow {
  readonly id: string;
  readonly level: CheckLevel;
  readonly title: string;
  readonly words: string;
  readonly numbers: readonly CheckNumber[];
  readonly fix: string | null;
  readonly source: string;
  readonly waived: string | null;
  readonly element: string;
  /** The group of parts it leads to; null when nothing of it is cut from sheet. */
  readonly ownerId: string | null;
  /** Plan view, aircraft mm. */
  readonly at: Vec2;
}

export interface CheckRows {
  /** To be read: bad, to watch, then what only a person can judge; what was let pass after the rest of its kind. */
  readonly open: readonly CheckRow[];
  readonly passed: readonly CheckRow[];
}

const ORDER: readonly CheckLevel[] = ['bad', 'watch', 'note', 'ok'];

function numbersOf(measured: Measured | null): CheckNumber[] {
  if (measured === null) return [];
  const { value, quantity, least, most } = measured;
  const number = (word: string, of: number | undefined): CheckNumber[] =>
    of === undefined ? [] : [{ word, shown: { number: trimmedDigits(of, 1), unit: shown(of, quantity, 0).unit } }];
  return [...number(words.measured, value), ...number(words.least, least), ...number(words.most, most)];
}

const rank = ({ level, waived }: CheckResult): number => ORDER.indexOf(level) + (waived === null ? 0 : 0.5);

/** The findings in the order in which they are to be read. `owners` are the elements whose parts are on the page. */
export function checkRows(results: readonly CheckResult[], airframe: Airframe, owners: readonly string[]): CheckRows {
  const rows = [...results]
    .sort((a, b) => rank(a) - rank(b))
    .map(
      ({ ruleId, elementId, at, measured, level, title, words: found, fix, source, waived }): CheckRow => ({
        id: `${ruleId} ${elementId}`,
        level,
        title,
        words: found,
        numbers: numbersOf(measured),
        fix,
        source,
        waived,
        element: elementName(airframe, elementId),
        ownerId: owners.includes(elementId) ? elementId : null,
        at: [at[0], at[1]],
      }),
    );
  return { open: rows.filter(({ level }) => level !== 'ok'), passed: rows.filter(({ level }) => level === 'ok') };
}

/** How many findings are of a level and were not let pass. */
export const countOf = ({ open }: CheckRows, wanted: CheckLevel): number =>
  open.filter(({ level, waived }) => level === wanted && waived === null).length;
