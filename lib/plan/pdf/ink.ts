import { radFromDeg, type Vec2 } from '@/lib/numerics/vec';
import { fixed } from '../fixed';
import type { Face, Typefaces } from './fonts';

// Small words of a PDF content stream (ISO 32000-1, 8.2 and 9.4), as text. Lengths in mm: the page scales once.

/** Points in a millimetre: 1 unit is 1/72 in (ISO 32000-1, 8.3.2.3). */
export const PT_PER_MM = 72 / 25.4;

/** Everything after it is in mm. Nine decimals, for four would be 15 ppm off. */
export const toMillimetres = (): string => `${PT_PER_MM.toFixed(9)} 0 0 ${PT_PER_MM.toFixed(9)} 0 0 cm`;

/** What is drawn inside leaves no state behind. */
export const group = (...parts: readonly string[]): string => ['q', ...parts, 'Q'].join('\n');

export const shift = (x: number, y: number): string => `1 0 0 1 ${fixed(x)} ${fixed(y)} cm`;

export const clip = (x0: number, y0: number, x1: number, y1: number): string =>
  `${fixed(x0)} ${fixed(y0)} ${fixed(x1 - x0)} ${fixed(y1 - y0)} re W n`;

/** Line width and dash pattern in mm. Butt caps and mitred corners, so that a line ends where it ends. */
export const lineStyle = (widthMm: number, dashMm: readonly number[] = []): string =>
  `${fixed(widthMm)} w [${dashMm.map(fixed).join(' ')}] 0 d`;

/** Grey of lines and of fills: 0 black, 1 white. */
export const grey = (level: number): string => `${fixed(level)} G ${fixed(level)} g`;

export function path(points: readonly Vec2[], closed: boolean): string {
  const steps = points.map(([x, y], i) => `${fixed(x)} ${fixed(y)} ${i === 0 ? 'm' : 'l'}`);
  return [...steps, closed ? 's' : 'S'].join('\n');
}

export const line = (from: Vec2, to: Vec2): string => path([from, to], false);

export const box = (x: number, y: number, w: number, h: number, paint: 'S' | 'f'): string =>
  `${fixed(x)} ${fixed(y)} ${fixed(w)} ${fixed(h)} re ${paint}`;

export interface Lettering {
  readonly face: Face;
  readonly capMm: number;
  readonly align?: 'left' | 'centre' | 'right';
  readonly angleDeg?: number;
}

/** One line of text whose baseline begins, has its middle or ends at a point. */
export function letter(faces: Typefaces, text: string, [x, y]: Vec2, style: Lettering): string {
  if (text.length === 0) return '';
  const face = faces[style.face];
  const width = face.width(text, style.capMm);
  const back = style.align === 'centre' ? width / 2 : style.align === 'right' ? width : 0;
  const rad = radFromDeg(style.angleDeg ?? 0);
  const [cos, sin] = [Math.cos(rad), Math.sin(rad)];
  const matrix = [cos, sin, -sin, cos, x - cos * back, y - sin * back].map(fixed).join(' ');
  return `BT /${face.resource} ${fixed(face.sizeForCap(style.capMm))} Tf ${matrix} Tm ${face.encode(text)} Tj ET`;
}

/** Breaks a text into lines no wider than `widthMm`. A single word that is wider is broken by letters. */
export function wrap(faces: Typefaces, text: string, widthMm: number, { face, capMm }: Lettering): string[] {
  const fits = (line: string): boolean => faces[face].width(line, capMm) <= widthMm;
  const lines: string[] = [];
  let current = '';
  for (const word of text.split(/\s+/).filter(Boolean)) {
    const joined = current ? `${current} ${word}` : word;
    if (fits(joined)) {
      current = joined;
      continue;
    }
    if (current) lines.push(current);
    current = '';
    for (const char of word) {
      if (current && !fits(current + char)) {
        lines.push(current);
        current = '';
      }
      current += char;
    }
  }
  if (current) lines.push(current);
  return lines;
}

/** A text cut short with an ellipsis so that it is no wider than `widthMm`. */
export function shorten(faces: Typefaces, text: string, widthMm: number, { face, capMm }: Lettering): string {
  if (faces[face].width(text, capMm) <= widthMm) return text;
  const chars = [...text];
  while (chars.length > 0 && faces[face].width(`${chars.join('')}…`, capMm) > widthMm) chars.pop();
  return `${chars.join('').trimEnd()}…`;
}
