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

export interface Drawing {
  /** The laid sheet's id. */
  readonly id: string;
  readonly title: string;
  readonly sheetMm: Vec2;
  readonly strokeMm: number;
  readonly lines: readonly DrawnLine[];
  readonly texts: readonly DrawnText[];
}

/** What stands in title blocks and on the card. */
export interface PlanRevision {
  readonly number: number;
  readonly state: 'draft' | 'released' | 'goodToCut' | 'held';
  /** ISO date, yyyy-mm-dd. */
  readonly releasedAt: string;
  readonly design: string;
}

export interface Paper {
  readonly id: string;
  readonly name: string;
  readonly wMm: number;
  readonly hMm: number;
}
