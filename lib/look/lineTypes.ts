// Dash patterns of the lines on parts, black only. Patterns after the line types of ISO 128-2 (dash 12, long dash 24, short
// dash 6, dot 0.5, gap 3 line widths; from memory); what each line means is ours, and every legend says it.

/** Everything that is drawn with a line type of its own: the operations on a sheet, its edge, and the test square. */
export const LINE_TYPE_KINDS = [
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
  'sheetEdge',
  'check',
] as const;
export type LineTypeKind = (typeof LINE_TYPE_KINDS)[number];

export interface LineStyle {
  /** Width of the line over the width of a cut line. */
  readonly widthShare: number;
  /** Dashes and gaps by turns, in widths of the cut line; empty for a continuous line. */
  readonly dash: readonly number[];
}

const dash = 12;
const long = 24;
const short = 6;
const dot = 0.5;
const gap = 3;

export const LINE_STYLES: Readonly<Record<LineTypeKind, LineStyle>> = {
  cut: { widthShare: 1, dash: [] },
  check: { widthShare: 1, dash: [] },
  cutToPaper: { widthShare: 1, dash: [long, gap, short, gap] },
  crease: { widthShare: 1, dash: [dash, gap] },
  bevel: { widthShare: 0.7, dash: [dash, gap, dot, gap] },
  paperOff: { widthShare: 0.7, dash: [dash, gap, dot, gap, dot, gap] },
  foamOut: { widthShare: 0.7, dash: [long, gap, short, gap, short, gap] },
  glue: { widthShare: 0.7, dash: [dot * 2, gap] },
  tape: { widthShare: 0.7, dash: [long, gap, dot, gap, dot, gap] },
  reference: { widthShare: 0.6, dash: [long, gap, dot, gap] },
  register: { widthShare: 0.6, dash: [] },
  sheetEdge: { widthShare: 0.6, dash: [short, gap] },
};
