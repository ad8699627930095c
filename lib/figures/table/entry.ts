import { figureTexts } from '@/lib/text/en/figureTable';
import type { Quantity } from '@/lib/units/quantity';

export type FigureId = keyof typeof figureTexts;

/** What figures are about; they are listed under these headings, in this order. */
export const FIGURE_GROUPS = [
  'shape',
  'balance',
  'stability',
  'handling',
  'trim',
  'performance',
  'controls',
  'structure',
] as const;
export type FigureGroup = (typeof FIGURE_GROUPS)[number];

/** What a figure is; its value stands in `Figures.values` under the same id. */
export interface FigureEntry {
  readonly id: FigureId;
  readonly group: FigureGroup;
  readonly name: string;
  /** As printed behind the number, metric. */
  readonly unit: string;
  /** For showing it in other units. */
  readonly quantity: Quantity;
  /** Decimals that mean something. */
  readonly digits: number;
  readonly explanation: string;
  readonly method: string;
  readonly source: string;
  readonly limits: string;
}

/** Makes the entries of one group: the texts come by the id. */
export const entriesOf =
  (group: FigureGroup) =>
  (id: FigureId, unit: string, quantity: Quantity, digits: number): FigureEntry => ({
    id,
    group,
    unit,
    quantity,
    digits,
    ...figureTexts[id],
  });
