import type { Vec2 } from '@/lib/numerics/vec';

export interface Hittable {
  readonly elementId: string;
  readonly points: readonly Vec2[];
  readonly closed: boolean;
}

/** Even-odd test of a point against a closed ring. */
export function insideRing(ring: readonly Vec2[], [px, py]: Vec2): boolean {
  let inside = false;
  let previous = ring.at(-1);
  for (const point of ring) {
    if (previous !== undefined) {
      const [x0, y0] = previous;
      const [x1, y1] = point;
      if (y0 > py !== y1 > py && px < x0 + ((py - y0) / (y1 - y0)) * (x1 - x0)) inside = !inside;
    }
    previous = point;
  }
  return inside;
}

function distanceToSegment([px, py]: Vec2, [x0, y0]: Vec2, [x1, y1]: Vec2): number {
  const dx = x1 - x0;
  const dy = y1 - y0;
  const squared = dx * dx + dy * dy;
  const t = squared === 0 ? 0 : Math.min(1, Math.max(0, ((px - x0) * dx + (py - y0) * dy) / squared));
  return Math.hypot(px - x0 - t * dx, py - y0 - t * dy);
}

/** Distance from a point to the nearest segment of a path, in the path's unit. */
export function distanceToPath(points: readonly Vec2[], closed: boolean, at: Vec2): number {
  let least = Number.POSITIVE_INFINITY;
  let previous = closed ? points.at(-1) : undefined;
  for (const point of points) {
    if (previous !== undefined) least = Math.min(least, distanceToSegment(at, previous, point));
    previous = point;
  }
  return least;
}

/** The element under a point: the last drawn that holds it or whose line is within `reachMm`; null over bare board. */
export function elementAt(outlines: readonly Hittable[], at: Vec2, reachMm: number): string | null {
  for (let index = outlines.length - 1; index >= 0; index -= 1) {
    const outline = outlines[index];
    if (outline === undefined) continue;
    const inside = outline.closed && insideRing(outline.points, at);
    if (inside || distanceToPath(outline.points, outline.closed, at) <= reachMm) return outline.elementId;
  }
  return null;
}
