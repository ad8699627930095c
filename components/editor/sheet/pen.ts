import type { Vec2 } from '@/lib/numerics/vec';
import { screenFromMm, type View } from './fold';

// Small words over a canvas context; the painters read like a drawing and hold no state of their own.

/** The part of a canvas context that the painters use. */
export type Pen = Pick<
  CanvasRenderingContext2D,
  | 'save'
  | 'restore'
  | 'beginPath'
  | 'closePath'
  | 'moveTo'
  | 'lineTo'
  | 'arc'
  | 'rect'
  | 'clip'
  | 'fill'
  | 'stroke'
  | 'fillRect'
  | 'fillText'
  | 'setLineDash'
  | 'createLinearGradient'
  | 'strokeStyle'
  | 'fillStyle'
  | 'lineWidth'
  | 'lineJoin'
  | 'lineCap'
  | 'globalAlpha'
  | 'font'
  | 'textAlign'
  | 'textBaseline'
>;

export interface Stroke {
  readonly colour: string;
  readonly width: number;
  readonly dash?: readonly number[];
}

export const FONT = '12px "B612 Mono", ui-monospace, monospace';
/** Long dashes of the score line, and the chain line of a centre line (px). */
export const SCORE_DASH = [20, 5] as const;
export const CHAIN_DASH = [14, 4, 2, 4] as const;
export const HIDDEN_DASH = [5, 4] as const;

/** Lays a path of points in mm. */
export function trace(pen: Pen, view: View, points: readonly Vec2[], closed: boolean): void {
  pen.beginPath();
  for (const [index, point] of points.entries()) {
    const [x, y] = screenFromMm(view, point);
    if (index === 0) pen.moveTo(x, y);
    else pen.lineTo(x, y);
  }
  if (closed) pen.closePath();
}

export function ink(pen: Pen, { colour, width, dash = [] }: Stroke): void {
  pen.strokeStyle = colour;
  pen.lineWidth = width;
  pen.setLineDash([...dash]);
  pen.stroke();
}

export function lineBetween(pen: Pen, from: Vec2, to: Vec2, stroke: Stroke): void {
  pen.beginPath();
  pen.moveTo(from[0], from[1]);
  pen.lineTo(to[0], to[1]);
  ink(pen, stroke);
}

export function words(pen: Pen, text: string, [x, y]: Vec2, colour: string, align: CanvasTextAlign = 'left'): void {
  pen.font = FONT;
  pen.textAlign = align;
  pen.textBaseline = 'middle';
  pen.fillStyle = colour;
  pen.fillText(text, x, y);
}

/** A disc quartered light and dark: where the aircraft's mass acts. */
export function cgSign(pen: Pen, [x, y]: Vec2, radius: number, colour: string, ground: string): void {
  pen.beginPath();
  pen.arc(x, y, radius, 0, 2 * Math.PI);
  pen.fillStyle = ground;
  pen.fill();
  ink(pen, { colour, width: 1.5 });
  pen.fillStyle = colour;
  for (const start of [-Math.PI / 2, Math.PI / 2]) {
    pen.beginPath();
    pen.moveTo(x, y);
    pen.arc(x, y, radius, start, start + Math.PI / 2);
    pen.closePath();
    pen.fill();
  }
}

/** A knife edge, point up: where the lift acts when the nose is disturbed. */
export function npSign(pen: Pen, [x, y]: Vec2, size: number, colour: string, ground: string): void {
  pen.beginPath();
  pen.moveTo(x, y - size);
  pen.lineTo(x + size, y + size * 0.9);
  pen.lineTo(x - size, y + size * 0.9);
  pen.closePath();
  pen.fillStyle = ground;
  pen.fill();
  ink(pen, { colour, width: 1.5 });
}
