import type { Material } from '@/lib/airframe/schema/stock';

/** Sheets' edges are crushed in handling, so parts keep this far from them, mm. Common practice, no source. */
export const EDGE_MARGIN_MM = 5;

/** Which ways round a piece may lie: along the grain where the sheet has one. */
function waysRound(grain: Material['grain']): { readonly level: boolean; readonly turned: boolean } {
  switch (grain) {
    case 'none':
      return { level: true, turned: true };
    case 'alongWidth':
      return { level: true, turned: false };
    case 'alongHeight':
      return { level: false, turned: true };
  }
}

/** Whether a piece of this size, its x along the sheet's grain, lies on one sheet of the material. mm. */
export function fitsSheet(material: Material, wMm: number, hMm: number): boolean {
  const { level, turned } = waysRound(material.grain);
  return material.sheets.some((sheet) => {
    const w = sheet.wMm - 2 * EDGE_MARGIN_MM;
    const h = sheet.hMm - 2 * EDGE_MARGIN_MM;
    return (level && wMm <= w && hMm <= h) || (turned && wMm <= h && hMm <= w);
  });
}
