import { FIGURES, type FigureEntry, type FigureGroup } from '@/lib/figures/table';
import type { Figures, FigureValue, Verdict } from '@/lib/figures/types';
import { list } from '@/lib/text/en/figurePages';
import { figuresText } from '@/lib/text/en/review';
import { fill } from '@/lib/text/fill';
import type { UnitSystem } from '@/lib/units/quantity';
import { type Measure, measured, shownBySymbol } from './units';

/** A figure as it is read: texts only, nothing left to work out. */
export interface FigureRow {
  readonly id: string;
  /** `other` for what a frozen revision holds and the table of today does not. */
  readonly group: FigureGroup | 'other';
  readonly name: string;
  /** Null when there is no value; `absent` then says so in a word or two, and `problem` why. */
  readonly text: string | null;
  readonly unit: string;
  readonly absent: string;
  readonly problem?: string;
  readonly verdict?: { readonly level: Verdict; readonly words: string };
  readonly band?: string;
  readonly bandCause?: string;
  readonly inputs: readonly { readonly name: string; readonly text: string; readonly unit: string }[];
  readonly explanation: string;
  readonly method: string;
  readonly source: string;
  readonly limits: string;
}

const entries = new Map<string, FigureEntry>(Object.entries(FIGURES));

/** How a figure is shown whose name the table no longer holds. */
const UNKNOWN: Measure = { unit: '', quantity: 'none', digits: 2 };
const NO_WORDS = { explanation: '', method: '', source: '', limits: '' };

function rowOf(id: string, figure: FigureValue, system: UnitSystem): FigureRow {
  const { value, band, verdict, inputs = [], problem } = figure;
  const entry = entries.get(id);
  const { explanation, method, source, limits } = entry ?? NO_WORDS;
  const read = (each: number) => measured(each, entry ?? UNKNOWN, system);
  return {
    id,
    group: entry?.group ?? 'other',
    name: entry?.name ?? id,
    text: value === null ? null : read(value).number,
    unit: read(0).unit,
    absent: problem?.code === 'does-not-apply' ? list.doesNotApply : figuresText.notWorkedOut,
    problem: problem?.message,
    verdict,
    band:
      band === undefined
        ? undefined
        : fill(figuresText.bandOf, { low: read(band.low).number, high: read(band.high).number }),
    bandCause: band?.cause,
    inputs: inputs.map((input) => {
      const { number, unit } = shownBySymbol(input.value, input.unit, 3, system);
      return { name: input.name, text: number, unit };
    }),
    explanation,
    method,
    source,
    limits,
  };
}

/** The figures in the order of the table, then any the table of today no longer knows; only those named in `ids` when given. */
export function figureRows(
  { values }: Figures,
  ids?: readonly string[],
  system: UnitSystem = 'metric',
): readonly FigureRow[] {
  const known = ids ?? [...entries.keys()];
  const rest = ids === undefined ? Object.keys(values).filter((id) => !entries.has(id)) : [];
  return [...known, ...rest].flatMap((id) => {
    const figure = values[id];
    return figure === undefined ? [] : [rowOf(id, figure, system)];
  });
}
