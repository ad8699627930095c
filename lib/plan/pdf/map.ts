import type { Vec2 } from '@/lib/numerics/vec';
import { plan } from '@/lib/text/en/plan';
import { fill } from '@/lib/text/fill';
import type { TiledSheet } from '../tiling/tileSheets';
import type { Typefaces } from './fonts';
import { box, grey, group, letter, lineStyle, path, shift, shorten } from './ink';

/** Room on a page, lower left and size, mm. */
export interface Frame {
  readonly x: number;
  readonly y: number;
  readonly w: number;
  readonly h: number;
}

const CAPTION_MM = 5;
const GAP_MM = 4;

/** How many sheets stand side by side so that they come out largest. */
function gridFor(sheets: readonly TiledSheet[], frame: Frame): { cols: number; scale: number; cell: Vec2 } {
  const widest = Math.max(...sheets.map(({ drawing }) => drawing.sheetMm[0]));
  const highest = Math.max(...sheets.map(({ drawing }) => drawing.sheetMm[1]));
  let best: { cols: number; scale: number; cell: Vec2 } = { cols: 1, scale: 0, cell: [frame.w, frame.h] };
  for (let cols = 1; cols <= sheets.length; cols++) {
    const rows = Math.ceil(sheets.length / cols);
    const cell: Vec2 = [(frame.w - GAP_MM * (cols - 1)) / cols, (frame.h - GAP_MM * (rows - 1)) / rows];
    const scale = Math.min(cell[0] / widest, (cell[1] - CAPTION_MM) / highest);
    if (scale > best.scale) best = { cols, scale, cell };
  }
  return best;
}

function sheetMap(
  faces: Typefaces,
  sheet: TiledSheet,
  at: Vec2,
  scale: number,
  pageOf: (index: number) => number,
): string {
  const [w, h] = sheet.drawing.sheetMm;
  const toMap = ([x, y]: Vec2): Vec2 => [x * scale, y * scale];
  const outlines = sheet.drawing.lines.filter(({ type, closed }) => closed && (type === 'cut' || type === 'check'));
  const parts = [
    grey(0.55),
    lineStyle(0.12),
    ...outlines.map(({ points }) => path(points.map(toMap), true)),
    grey(0),
    lineStyle(0.25),
    box(0, 0, w * scale, h * scale, 'S'),
    lineStyle(0.15, [0.8, 0.6]),
  ];
  // Readable on a small map, in proportion on a large one.
  const cap = Math.min(Math.max(2.4, 12 * scale), Math.max(1.4, 40 * scale));
  for (const { cell, index } of sheet.pages) {
    const [x0, y0, x1, y1] = cell.coreMm;
    const [left, bottom] = [Math.max(0, x0), Math.max(0, y0)];
    const [right, top] = [Math.min(w, x1), Math.min(h, y1)];
    if (right <= left || top <= bottom) continue;
    parts.push(box(left * scale, bottom * scale, (right - left) * scale, (top - bottom) * scale, 'S'));
    const number = String(pageOf(index));
    const half = faces.bold.width(number, cap) / 2 + 0.6;
    const [x, y] = [((left + right) / 2) * scale, ((bottom + top) / 2) * scale];
    parts.push(
      grey(1),
      box(x - half, y - cap / 2 - 0.6, 2 * half, cap + 1.2, 'f'),
      grey(0),
      letter(faces, number, [x, y - cap / 2], { face: 'bold', capMm: cap, align: 'centre' }),
    );
  }
  return group(shift(at[0], at[1]), ...parts);
}

/** Every sheet drawn small, with the printed pages as dashed cells and their page numbers. */
export function map(
  faces: Typefaces,
  sheets: readonly TiledSheet[],
  frame: Frame,
  pageOf: (index: number) => number,
): string {
  if (sheets.length === 0) return '';
  const { cols, scale, cell } = gridFor(sheets, frame);
  const parts = sheets.map((sheet, i) => {
    const [col, row] = [i % cols, Math.floor(i / cols)];
    const [, h] = sheet.drawing.sheetMm;
    const left = frame.x + col * (cell[0] + GAP_MM);
    const top = frame.y + frame.h - row * (cell[1] + GAP_MM);
    const name = fill(plan.cover.mapSheet, {
      name: sheet.drawing.name,
      material: sheet.drawing.material,
    });
    const style = { face: 'mono', capMm: 1.7 } as const;
    const words = shorten(faces, name, cell[0], style);
    return [
      letter(faces, words, [left, top - 2.6], style),
      sheetMap(faces, sheet, [left, top - CAPTION_MM - h * scale], scale, pageOf),
    ].join('\n');
  });
  return parts.join('\n');
}
