import type { Airframe } from '@/lib/airframe/schema/airframe';
import type { LayoutOptions, SheetStock } from './types';

/** Common practice, no source: 4 mm between parts leaves foam for a blade; the outer 5 mm of a sheet is crushed in transport. */
export const LAYOUT_DEFAULTS = { spacingMm: 4, marginMm: 5, seed: 1 } as const satisfies LayoutOptions;

/**
 * The sheets that the document's own materials are sold in, in the order they are listed, as many as it takes.
 * Ids come from the material and the size ("foam-5/500x700"); a size listed twice is one kind of sheet.
 */
export function stockOf(airframe: Airframe): SheetStock[] {
  const found = new Map<string, SheetStock>();
  for (const material of airframe.materials) {
    for (const sheet of material.sheets) {
      const id = `${material.id}/${sheet.wMm}x${sheet.hMm}`;
      if (found.has(id)) continue;
      found.set(id, {
        id,
        materialId: material.id,
        thicknessMm: material.thicknessMm,
        wMm: sheet.wMm,
        hMm: sheet.hMm,
        count: null,
        grain: material.grain,
        price: sheet.price,
      });
    }
  }
  return [...found.values()];
}
