import type { Vec2 } from '@/lib/numerics/vec';

/** A kind of sheet on hand. `count` null: as many as it takes. */
export interface SheetStock {
  readonly id: string;
  readonly materialId: string;
  readonly thicknessMm: number;
  readonly wMm: number;
  readonly hMm: number;
  readonly count: number | null;
  readonly grain: 'alongWidth' | 'alongHeight' | 'none';
  readonly price?: number;
}

export interface LayoutOptions {
  readonly spacingMm: number;
  readonly marginMm: number;
  readonly seed: number;
}

/** A part on a sheet: turned counter-clockwise about the part's origin, then moved. Never mirrored. */
export interface Placement {
  readonly partKey: string;
  readonly turnDeg: number;
  readonly moveMm: Vec2;
}

export interface LaidSheet {
  /** "sheet-1", in order of use. */
  readonly id: string;
  readonly stockId: string;
  readonly materialId: string;
  readonly thicknessMm: number;
  readonly wMm: number;
  readonly hMm: number;
  readonly placements: readonly Placement[];
  /** Lower left corner of the 100 mm test square, which lies in the sheet's waste; null when there is no room for it. */
  readonly checkSquareMm: Vec2 | null;
  /** Area of the parts over area of the sheet. */
  readonly utilisation: number;
}

export type LayoutFailure =
  | { readonly kind: 'too-large'; readonly partKey: string; readonly sizeMm: Vec2 }
  | { readonly kind: 'no-stock'; readonly partKey: string; readonly materialId: string }
  | { readonly kind: 'no-room'; readonly partKey: string; readonly sheetsTried: number }
  /** Nothing was laid: `partKey` is the first part over the limit. */
  | { readonly kind: 'too-many-parts'; readonly partKey: string; readonly count: number; readonly most: number }
  | { readonly kind: 'too-many-sheets'; readonly partKey: string; readonly most: number };

export interface SheetLayout {
  readonly options: LayoutOptions;
  readonly sheets: readonly LaidSheet[];
  readonly failures: readonly LayoutFailure[];
}
