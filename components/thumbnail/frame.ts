import type { Vec2 } from '@/lib/numerics/vec';

// From aircraft mm to the drawing and back. Plan view with the nose to the left: across the screen runs x aft, up it runs y to starboard.

export interface Frame {
  /** Left edge, aircraft x. */
  readonly x0: number;
  /** Upper edge, aircraft y. */
  readonly y0: number;
  readonly widthMm: number;
  readonly heightMm: number;
}

/** Where a box stands on the screen, px. */
export interface ScreenBox {
  readonly left: number;
  readonly top: number;
  readonly width: number;
  readonly height: number;
}

/** The frame around all points, with a margin as a share of the longer side; null when there is nothing to draw. */
export function frameAround(rings: readonly (readonly Vec2[])[], margin = 0.04): Frame | null {
  const points = rings.flat().filter(([x, y]) => Number.isFinite(x) && Number.isFinite(y));
  if (points.length < 2) return null;
  const xs = points.map(([x]) => x);
  const ys = points.map(([, y]) => y);
  const [x0, x1, y0, y1] = [Math.min(...xs), Math.max(...xs), Math.min(...ys), Math.max(...ys)];
  const pad = Math.max(x1 - x0, y1 - y0) * margin;
  if (!(pad > 0)) return null;
  return { x0: x0 - pad, y0: y1 + pad, widthMm: x1 - x0 + 2 * pad, heightMm: y1 - y0 + 2 * pad };
}

/** Aircraft mm to the drawing's own axes (x right, y down, from its upper left). */
export const toDrawing = (frame: Frame, [x, y]: Vec2): Vec2 => [x - frame.x0, frame.y0 - y];

const short = (value: number) => Math.round(value * 10) / 10 + 0;

/** Path data of an outline; empty for fewer than two points. */
export function pathData(frame: Frame, points: readonly Vec2[], closed: boolean): string {
  if (points.length < 2) return '';
  const corners = points.map((point) => toDrawing(frame, point).map(short).join(' '));
  return `M${corners.join('L')}${closed ? 'Z' : ''}`;
}

/** Share of the drawing's width and height, in percent, for a mark laid over it. */
export function percentAt(frame: Frame, point: Vec2): { readonly left: string; readonly top: string } {
  const [x, y] = toDrawing(frame, point);
  return { left: `${short((x / frame.widthMm) * 100)}%`, top: `${short((y / frame.heightMm) * 100)}%` };
}

/** The place under a pointer, aircraft mm to a tenth; null outside the box. */
export function mmAt(frame: Frame, box: ScreenBox, clientX: number, clientY: number): Vec2 | null {
  const across = (clientX - box.left) / box.width;
  const down = (clientY - box.top) / box.height;
  if (!(across >= 0 && across <= 1 && down >= 0 && down <= 1)) return null;
  return [short(frame.x0 + across * frame.widthMm), short(frame.y0 - down * frame.heightMm)];
}
