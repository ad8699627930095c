import type { Problem } from '@/lib/numerics/result';
import type { Vec2, Vec3 } from '@/lib/numerics/vec';

/** What is done to a sheet. Each has its own line type, layer and legend text. */
export const OPERATION_KINDS = [
  'cut',
  'cutToPaper',
  'crease',
  'bevel',
  'paperOff',
  'foamOut',
  'glue',
  'tape',
  'reference',
  'register',
] as const;
export type OperationKind = (typeof OPERATION_KINDS)[number];

export type Face = 'upper' | 'lower' | 'inner' | 'outer';

export interface Operation {
  readonly id: string;
  readonly kind: OperationKind;
  /** Part axes, mm. */
  readonly path: readonly Vec2[];
  readonly closed: boolean;
  /** The face it is worked from. */
  readonly face: Face;
  /**
   * Bevel: how far the cut leans from square, so that material leaves the worked face. Fold (crease, cutToPaper): how far
   * the part turns about this line in the assembled aircraft, about the face that is not worked from; positive when the
   * worked face closes.
   */
  readonly angleDeg?: number;
  readonly widthMm?: number;
  /** How deep it goes from the worked face; absent: as deep as the kind says. */
  readonly depthMm?: number;
  /** Glue and tape: on how many parts the same joint is marked, when on more than this one; each holds its share of the mass. */
  readonly sharedBy?: number;
  readonly note?: string;
}

/**
 * Where the flat part stands in the assembled aircraft: part (x, y) on its mid-plane goes to origin + x ex + y ey.
 * Right-angled, unit length; ex x ey points out of the part's `face`. A part with folds: where the piece that holds
 * `outline[0]` stands.
 */
export interface PartFrame {
  readonly origin: Vec3;
  readonly ex: Vec3;
  readonly ey: Vec3;
}

export interface PartLabel {
  readonly at: Vec2;
  readonly text: string;
  /** Cap height on paper. */
  readonly heightMm: number;
  readonly angleDeg: number;
}

/** A flat piece, true size, seen on the face it is worked from. x to the right, y up, mm; no particular origin. */
export interface Part {
  /** From element ids, never from an index: "wing/p1/sheet/stbd". */
  readonly key: string;
  readonly name: string;
  readonly elementId: string;
  readonly side: 'stbd' | 'port' | 'centre';
  readonly materialId: string;
  readonly thicknessMm: number;
  /** Key of the part this one mirrors. */
  readonly mirrorOf?: string;
  readonly face: Face;
  /** What is cut square through the sheet: where an edge is bevelled, its longer face. Counter-clockwise, not closed by a repeated point. */
  readonly outline: readonly Vec2[];
  /** Clockwise. */
  readonly holes: readonly (readonly Vec2[])[];
  readonly operations: readonly Operation[];
  readonly labels: readonly PartLabel[];
  /** Direction of the sheet's grain wanted in part axes, or null when it does not matter. */
  readonly grainDeg: number | null;
  readonly frame: PartFrame;
}

/** Bought length of tube, rod or strip. */
export interface StockPiece {
  readonly key: string;
  readonly name: string;
  readonly tubeId: string;
  readonly lengthMm: number;
  readonly count: number;
  readonly from: Vec3;
  readonly to: Vec3;
}

export interface Development {
  readonly parts: readonly Part[];
  readonly stockPieces: readonly StockPiece[];
  readonly problems: readonly Problem[];
}
