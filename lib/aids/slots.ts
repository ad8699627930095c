import type { Build } from '@/lib/airframe/schema/stock';
import type { Vec2 } from '@/lib/numerics/vec';

// How wide a slot is drawn so that a sheet slides in. One place, so that the comb of the coupon and the slots of the aids agree.

type Cutting = Pick<Build, 'kerfMm' | 'slotClearanceMm'>;

/** Width of a drawn slot that is to be called `nominalMm` wide on the comb: what the cutter takes is allowed for. mm. */
export const drawnSlotMm = (nominalMm: number, { kerfMm }: Pick<Cutting, 'kerfMm'>): number => nominalMm + kerfMm;

/** Width of a drawn slot for a sheet: its measured thickness, the clearance and the kerf. mm. */
export const slotWidthMm = (thicknessMm: number, build: Cutting): number =>
  drawnSlotMm(thicknessMm + build.slotClearanceMm, build);

/** Length of a drawn slot for a tab: the tab, the clearance and the kerf. mm. */
export const slotLengthMm = (tabMm: number, build: Cutting): number =>
  drawnSlotMm(tabMm + build.slotClearanceMm, build);

/** A rectangular hole about its middle, clockwise. */
export const slotHole = ([x, y]: Vec2, wMm: number, hMm: number): Vec2[] => [
  [x - wMm / 2, y - hMm / 2],
  [x - wMm / 2, y + hMm / 2],
  [x + wMm / 2, y + hMm / 2],
  [x + wMm / 2, y - hMm / 2],
];
