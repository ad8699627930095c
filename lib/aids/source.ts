import type { ResolvedAirframe } from '@/lib/airframe/resolved';
import type { Airframe } from '@/lib/airframe/schema/airframe';
import type { Material } from '@/lib/airframe/schema/stock';
import type { SetUpSheet } from '@/lib/figures/setUp';
import { signedArea } from '@/lib/geometry/polygons';
import type { Part } from '@/lib/parts/types';

/** Everything that the aids of one aircraft are worked out from. */
export interface AidSource {
  readonly airframe: Airframe;
  readonly resolved: ResolvedAirframe;
  readonly setUp: SetUpSheet;
  /** The aircraft's own parts: their bevels get blocks. */
  readonly parts: readonly Part[];
  /** What the aids are cut from. */
  readonly material: Material;
}

/** The sheet that most of the aircraft is cut from, of which offcuts are left; the first in the document when nothing is cut yet. */
export function mainSheet({ materials }: Airframe, parts: readonly Part[]): Material | null {
  const areaMm2 = ({ id }: Material): number =>
    parts
      .filter(({ materialId }) => materialId === id)
      .reduce((sum, { outline }) => sum + Math.abs(signedArea(outline)), 0);
  return materials.reduce<Material | null>((most, one) => (most && areaMm2(most) >= areaMm2(one) ? most : one), null);
}

/** Thickness of the sheet that a panel is made of; of the first sheet when the document names one it does not hold. mm. */
export const sheetMm = ({ materials }: Airframe, materialId: string): number =>
  (materials.find(({ id }) => id === materialId) ?? materials[0])?.thicknessMm ?? 0;
