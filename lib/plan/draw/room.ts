import type { Vec2 } from '@/lib/numerics/vec';
import { insideRing, pointToSegment, type Segment } from './segments';

/** A rectangle along the sheet's axes, mm. */
export type Box = readonly [x0: number, y0: number, x1: number, y1: number];

/** Where the labels of one placed part may stand, sheet mm. */
export interface LabelRoom {
  readonly outline: readonly Vec2[];
  readonly holes: readonly (readonly Vec2[])[];
  /** Segments of every cut line of the part. */
  readonly cuts: readonly Segment[];
  /** Segments of its other lines: kept clear of when there is a choice. */
  readonly others: readonly Segment[];
  /** What each printed page shows away from its seams. A label that stands in one of them can be read on one loose page. */
  readonly windows: readonly Box[];
}

/** The grid of points looked at is this fine, mm, within limits on their number along a side. */
const PITCH_MM = 15;
const LEAST_POINTS = 14;
const MOST_POINTS = 44;

const pointsAlong = (lengthMm: number): number =>
  Math.min(MOST_POINTS, Math.max(LEAST_POINTS, Math.ceil(lengthMm / PITCH_MM)));

export const isIn = ([x, y]: Vec2, [x0, y0, x1, y1]: Box): boolean => x >= x0 && x <= x1 && y >= y0 && y <= y1;

const depthIn = ([x, y]: Vec2, [x0, y0, x1, y1]: Box): number => Math.min(x - x0, x1 - x, y - y0, y1 - y);

/** A point inside a part, and how much of the part it stands for. */
export interface DeepPoint {
  readonly at: Vec2;
  readonly areaMm2: number;
}

/**
 * Inside points on a grid, those deepest in the part and in a page's window first, so that the first with room is also the
 * best looking.
 */
export function deepPoints(room: LabelRoom): DeepPoint[] {
  const xs = room.outline.map(([x]) => x);
  const ys = room.outline.map(([, y]) => y);
  const [left, bottom] = [Math.min(...xs), Math.min(...ys)];
  const [w, h] = [Math.max(...xs) - left, Math.max(...ys) - bottom];
  const [nx, ny] = [pointsAlong(w), pointsAlong(h)];
  const areaMm2 = (w / nx) * (h / ny);
  const found: { at: Vec2; depth: number }[] = [];
  for (let i = 1; i < nx; i++) {
    for (let j = 1; j < ny; j++) {
      const at: Vec2 = [left + (w * i) / nx, bottom + (h * j) / ny];
      if (!insideRing(at, room.outline) || room.holes.some((hole) => insideRing(at, hole))) continue;
      const toCut = room.cuts.reduce((least, cut) => Math.min(least, pointToSegment(at, cut)), Infinity);
      const toSeam = room.windows.reduce((most, window) => Math.max(most, depthIn(at, window)), -Infinity);
      found.push({ at, depth: room.windows.length === 0 ? toCut : Math.min(toCut, toSeam) });
    }
  }
  return found.sort((a, b) => b.depth - a.depth).map(({ at }) => ({ at, areaMm2 }));
}
