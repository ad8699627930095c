import type { Vec2 } from '@/lib/numerics/vec';

/** What a checker needs to find every cut line on the printed pages. Millimetres, y up, origins at the lower left. */
export interface Manifest {
  readonly version: 1;
  readonly units: 'mm';
  /** Of the finished file; the copy inside the PDF has none. */
  readonly pdfSha256?: string;
  readonly otherPages: readonly {
    readonly page: number;
    readonly kind: 'cover' | 'card' | 'legend' | 'check';
    readonly media_mm: Vec2;
  }[];
  readonly sheets: readonly ManifestSheet[];
}

export interface ManifestSheet {
  readonly id: string;
  readonly sheet_mm: Vec2;
  readonly stroke_mm: number;
  readonly pages: readonly ManifestPage[];
  readonly expected: readonly {
    readonly id: string;
    readonly part: string;
    readonly closed: boolean;
    readonly points: readonly Vec2[];
  }[];
}

/** x_page = a x + c y + e, y_page = b x + d y + f. */
export interface ManifestPage {
  readonly page: number;
  readonly kind: 'tile';
  readonly row: number;
  readonly col: number;
  readonly media_mm: Vec2;
  readonly page_from_sheet: readonly [a: number, b: number, c: number, d: number, e: number, f: number];
  readonly clip_mm: readonly [x0: number, y0: number, x1: number, y1: number];
  readonly overlap_mm?: number;
  readonly marks_mm?: readonly Vec2[];
}

export interface PlanFile {
  readonly pdf: Uint8Array;
  readonly manifest: Manifest;
}
