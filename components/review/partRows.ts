import type { Airframe } from '@/lib/airframe/schema/airframe';
import type { Part, StockPiece } from '@/lib/parts/types';
import { materials as words } from '@/lib/text/en/elements';
import { fixedDigits, trimmedDigits } from '@/lib/units/number';
import type { PartRow, StockRow } from './PartsTable';

const materialWords = (airframe: Airframe, id: string): string => {
  const kind = airframe.materials.find((material) => material.id === id)?.kind;
  return kind === undefined ? id : words[kind];
};

const extent = (values: readonly number[]): number => Math.max(...values) - Math.min(...values);

/** The list of parts as it is read: what each is cut from, and the smallest upright box it needs as drawn. */
export function partRows(parts: readonly Part[], airframe: Airframe): readonly PartRow[] {
  return parts.map(({ key, name, elementId, side, materialId, thicknessMm, outline }) => {
    const width = extent(outline.map(([x]) => x));
    const height = extent(outline.map(([, y]) => y));
    return {
      key,
      name,
      elementId,
      side,
      material: materialWords(airframe, materialId),
      thickness: trimmedDigits(thicknessMm, 2),
      size: outline.length < 2 ? '' : `${fixedDigits(width, 0)} × ${fixedDigits(height, 0)}`,
    };
  });
}

/** Tubes, rods and strips to buy and cut to length. */
export const stockRows = (pieces: readonly StockPiece[]): readonly StockRow[] =>
  pieces.map(({ key, name, tubeId, lengthMm, count }) => ({
    key,
    name,
    tube: tubeId,
    length: fixedDigits(lengthMm, 0),
    count: String(count),
  }));
