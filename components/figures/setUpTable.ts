import type { EdgeMove, SetUpControl, SetUpSheet } from '@/lib/figures/setUp';
import { type SetUpRow, setUpSections } from '@/lib/figures/setUpWords';
import { setUp as texts } from '@/lib/text/en/figurePages';
import { setUp as words } from '@/lib/text/en/setUp';
import { fill } from '@/lib/text/fill';
import { trimmedDigits } from '@/lib/units/number';

/** A move as a builder sets it: by the rule first, then by the angle. */
export interface ThrowCell {
  readonly mm: string;
  readonly deg: string;
}

export interface ThrowRow {
  readonly id: string;
  readonly name: string;
  /** Null for what no rate switch changes. */
  readonly low: ThrowCell | null;
  readonly high: ThrowCell;
}

/** A heading of the sheet with its throws as a table and the rest as lines to tick. */
export interface SheetPart {
  readonly title: string;
  readonly throws: readonly ThrowRow[];
  readonly mirrored: boolean;
  readonly lines: readonly SetUpRow[];
}

const cell = ({ mm, deg }: EdgeMove): ThrowCell => ({ mm: trimmedDigits(mm, 1), deg: trimmedDigits(deg, 1) });

const throwRows = ({ id, throws }: SetUpControl): readonly ThrowRow[] =>
  throws.map(({ stick, high, low }) => ({
    id: `${id}/${stick}/${high.way}`,
    name: fill(texts.row, { stick: words.sticks[stick], way: texts.ways[high.way] }),
    low: low === null ? null : cell(low),
    high: cell(high),
  }));

/** Lines that say in a sentence what the table shows. */
const inTable = ({ id, throws }: SetUpControl): ReadonlySet<string> =>
  new Set(throws.flatMap(({ stick }) => [`${id}/${stick}`, `${id}/${stick}/high`, `${id}/${stick}/low`]));

/** The set-up sheet in the order of its sections; what each control's sticks do stands in a table instead of in sentences. */
export function sheetParts(sheet: SetUpSheet): readonly SheetPart[] {
  return setUpSections(sheet).map(({ title, rows }) => {
    const control = sheet.controls.find(({ id }) => rows.some((row) => row.id === `${id}/neutral`));
    if (control === undefined) return { title, throws: [], mirrored: false, lines: rows };
    const shown = inTable(control);
    return {
      title,
      throws: throwRows(control),
      mirrored: control.mirrored,
      lines: rows.filter(({ id }) => !shown.has(id)),
    };
  });
}
