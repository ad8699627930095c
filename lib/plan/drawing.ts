import type { Vec2 } from '@/lib/numerics/vec';
import type { OperationKind } from '@/lib/parts/types';

// Lines and text by line type, in sheet millimetres, y up, origin at the sheet's lower left. Knows no file format.

export type LineType = OperationKind | 'sheetEdge' | 'check';

export interface DrawnLine {
  readonly id: string;
  readonly type: LineType;
  readonly partKey?: string;
  readonly points: readonly Vec2[];
  readonly closed: boolean;
}

export interface DrawnText {
  readonly at: Vec2;
  readonly text: string;
  readonly heightMm: number;
  readonly angleDeg: number;
  readonly font: 'text' | 'mono';
  readonly align: 'left' | 'centre' | 'right';
}

/** A text in the key of a sheet; `mark` is what stands on the part instead, null when not even that had room. */
export interface KeyEntry {
  readonly mark: string | null;
  readonly text: string;
}

export interface Drawing {
  /** The laid sheet's id. */
  readonly id: string;
  /** As a person reads it: "Sheet 1". */
  readonly name: string;
  /** Material and thickness in words. */
  readonly material: string;
  readonly sheetMm: Vec2;
  readonly strokeMm: number;
  readonly lines: readonly DrawnLine[];
  readonly texts: readonly DrawnText[];
  /** What found no room in its part. */
  readonly key: readonly KeyEntry[];
  /** The part whose corners lie farthest apart, and how far; null for a sheet without parts. */
  readonly longest: { readonly name: string; readonly lengthMm: number } | null;
}

/** What a released plan says of its origin; without it every page says "draft". */
export interface PlanRevision {
  readonly number: number;
  readonly state: 'released' | 'goodToCut' | 'held';
  /** ISO 8601: a date, or a time in UTC of which the date is printed. */
  readonly releasedAt: string;
  readonly design: string;
}

/** The day of a release, yyyy-mm-dd. */
export const releaseDay = ({ releasedAt }: Pick<PlanRevision, 'releasedAt'>): string => releasedAt.slice(0, 10);

export interface Paper {
  readonly id: string;
  readonly name: string;
  readonly wMm: number;
  readonly hMm: number;
}
