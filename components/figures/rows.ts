import { FIGURES } from '@/lib/figures/table';
import type { Figures, FigureValue, Verdict } from '@/lib/figures/types';
import { figuresText } from '@/lib/text/en/review';
import { fill } from '@/lib/text/fill';
import { fixedDigits, trimmedDigits } from '@/lib/units/number';

/** A figure as it is read: texts only, nothing left to work out. */
export interface FigureRow {
  readonly id: string;
  readonly name: string;
  /** Null when it could not be worked out; `problem` then says why. */
  readonly text: string | null;
  readonly unit: string;
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

const entries = new Map<string, (typeof FIGURES)[keyof typeof FIGURES]>(Object.entries(FIGURES));

function rowOf(id: string, figure: FigureValue): FigureRow {
  const { value, band, verdict, inputs = [], problem } = figure;
  const entry = entries.get(id);
  const digits = entry?.digits ?? 2;
  const number = (each: number) => fixedDigits(each, digits);
  return {
    id,
    name: entry?.name ?? id,
    text: value === null ? null : number(value),
    unit: entry?.unit ?? '',
    problem: problem?.message,
    verdict,
    band: band === undefined ? undefined : fill(figuresText.bandOf, { low: number(band.low), high: number(band.high) }),
    bandCause: band?.cause,
    inputs: inputs.map((input) => ({ name: input.name, text: trimmedDigits(input.value, 3), unit: input.unit })),
    explanation: entry?.explanation ?? '',
    method: entry?.method ?? '',
    source: entry?.source ?? '',
    limits: entry?.limits ?? '',
  };
}

/** The figures in the order of the table, then any the table of today no longer knows; only those named in `ids` when given. */
export function figureRows({ values }: Figures, ids?: readonly string[]): readonly FigureRow[] {
  const known = ids ?? [...entries.keys()];
  const rest = ids === undefined ? Object.keys(values).filter((id) => !entries.has(id)) : [];
  return [...known, ...rest].flatMap((id) => {
    const figure = values[id];
    return figure === undefined ? [] : [rowOf(id, figure)];
  });
}
