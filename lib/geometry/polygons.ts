import type { Vec2 } from '@/lib/numerics/vec';

// Closed outlines in the plane, without a repeated last point. Lengths in mm; counter-clockwise is positive.
// Integrals over a polygon as sums over its edges (Green's theorem).

export type Outline = readonly Vec2[];

export interface Bounds {
  readonly minX: number;
  readonly minY: number;
  readonly maxX: number;
  readonly maxY: number;
}

/** The edges of an outline, the closing one included. */
export function edges(outline: Outline): (readonly [Vec2, Vec2])[] {
  const first = outline[0];
  if (!first) return [];
  return outline.map((point, index) => [point, outline[index + 1] ?? first] as const);
}

/** Area, positive when the outline runs counter-clockwise. */
export function signedArea(outline: Outline): number {
  return edges(outline).reduce((sum, [[x0, y0], [x1, y1]]) => sum + x0 * y1 - x1 * y0, 0) / 2;
}

/** Throws RangeError unless the outline has three points, all finite, and encloses area counter-clockwise. */
export function assertOutline(outline: Outline): void {
  if (outline.length < 3) throw new RangeError(`outline needs 3 points, got ${outline.length}`);
  if (!outline.flat().every(Number.isFinite)) throw new RangeError('outline must be finite');
  const area = signedArea(outline);
  if (!(area > 0)) throw new RangeError(`outline must run counter-clockwise and enclose area, got ${area}`);
}

/** The outline running counter-clockwise. */
export function counterClockwise(outline: Outline): Outline {
  return signedArea(outline) < 0 ? [...outline].reverse() : outline;
}

/** Length of the outline, closed. */
export function perimeter(outline: Outline): number {
  return edges(outline).reduce((sum, [[x0, y0], [x1, y1]]) => sum + Math.hypot(x1 - x0, y1 - y0), 0);
}

/** Centre of the enclosed area. Throws RangeError when the outline encloses none. */
export function centroid(outline: Outline): Vec2 {
  return secondMoments(outline).centroid;
}

export interface SecondMoments {
  readonly area: number;
  readonly centroid: Vec2;
  /** About axes through the centroid: integral of (y - cy)^2, of (x - cx)^2, and of their product. */
  readonly ixx: number;
  readonly iyy: number;
  readonly ixy: number;
}

/** Area, centroid and second moments of area about the centroid, whichever way the outline runs. Throws RangeError when it encloses no area. */
export function secondMoments(outline: Outline): SecondMoments {
  const origin = outline[0];
  if (!origin) throw new RangeError('outline needs 3 points, got 0');
  const [ox, oy] = origin;
  let [doubled, sx, sy, xx, yy, xy] = [0, 0, 0, 0, 0, 0];
  // Measured from the first point, so that an outline far from the origin loses no digits.
  for (const [[ax, ay], [bx, by]] of edges(outline)) {
    const [x0, y0, x1, y1] = [ax - ox, ay - oy, bx - ox, by - oy];
    const cross = x0 * y1 - x1 * y0;
    doubled += cross;
    sx += (x0 + x1) * cross;
    sy += (y0 + y1) * cross;
    xx += (y0 * y0 + y0 * y1 + y1 * y1) * cross;
    yy += (x0 * x0 + x0 * x1 + x1 * x1) * cross;
    xy += (x0 * y1 + 2 * x0 * y0 + 2 * x1 * y1 + x1 * y0) * cross;
  }
  const signed = doubled / 2;
  if (signed === 0 || !Number.isFinite(signed)) throw new RangeError(`outline must enclose area, got ${signed}`);
  const cx = sx / (6 * signed);
  const cy = sy / (6 * signed);
  const sign = Math.sign(signed);
  return {
    area: Math.abs(signed),
    centroid: [cx + ox, cy + oy],
    ixx: sign * (xx / 12 - signed * cy * cy),
    iyy: sign * (yy / 12 - signed * cx * cx),
    ixy: sign * (xy / 24 - signed * cx * cy),
  };
}

/** Smallest upright rectangle around the points. Throws RangeError when there are none. */
export function bounds(points: readonly Vec2[]): Bounds {
  const first = points[0];
  if (!first) throw new RangeError('bounds of no points');
  return points.reduce<Bounds>(
    (box, [x, y]) => ({
      minX: Math.min(box.minX, x),
      minY: Math.min(box.minY, y),
      maxX: Math.max(box.maxX, x),
      maxY: Math.max(box.maxY, y),
    }),
    { minX: first[0], minY: first[1], maxX: first[0], maxY: first[1] },
  );
}

/** Whether a point lies inside, by counting crossings; a point on an edge may count as either. */
export function contains(outline: Outline, [px, py]: Vec2): boolean {
  return edges(outline).reduce((inside, [[x0, y0], [x1, y1]]) => {
    if (y0 > py === y1 > py) return inside;
    return px < x0 + ((py - y0) / (y1 - y0)) * (x1 - x0) ? !inside : inside;
  }, false);
}
