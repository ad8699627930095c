import type { Vec2 } from '@/lib/numerics/vec';
import type { Typefaces } from './fonts';
import { type Lettering, letter, lineStyle, path, wrap } from './ink';

/** A column of text that grows downwards from its top; each step answers with the next top. */
export interface Column {
  readonly x: number;
  readonly widthMm: number;
}

/** Heights are of capitals; the line is 1.9 of them. */
export const LEADING = 1.9;

/** A heading with the notched rule under it. */
export function heading(
  faces: Typefaces,
  text: string,
  { x, widthMm }: Column,
  top: number,
): { ink: string; top: number } {
  const cap = 2.5;
  const y = top - cap;
  const rule = y - 1.6;
  const score: Vec2[] = [
    [x, rule + 0.9],
    [x + 0.9, rule],
    [x + widthMm, rule],
  ];
  const ink = [letter(faces, text, [x, y], { face: 'bold', capMm: cap }), lineStyle(0.18, []), path(score, false)];
  return { ink: ink.join('\n'), top: rule - 2 };
}

/** A paragraph, broken to the column's width. */
export function paragraph(
  faces: Typefaces,
  text: string,
  { x, widthMm }: Column,
  top: number,
  style: Lettering,
): { ink: string; top: number } {
  const step = style.capMm * LEADING;
  const lines = wrap(faces, text, widthMm, style);
  const ink = lines.map((words, i) => letter(faces, words, [x, top - style.capMm - i * step], style));
  return { ink: ink.join('\n'), top: top - lines.length * step };
}
