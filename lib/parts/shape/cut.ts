import { distance } from '@/lib/geometry/lines';
import { edges } from '@/lib/geometry/polygons';
import type { Vec2 } from '@/lib/numerics/vec';
import { cleanRing, distanceToEdge, NOTHING_MM, type Ring } from './ring';

// Cutting a ring along a path whose two ends lie on its edge. Exact: no point of the ring moves.

/** A cut that ends nearer to the edge than this ends on it, mm: rounding of a path worked out from other lines. */
const ON_EDGE_MM = 1e-3;

interface Spot {
  readonly edge: number;
  readonly along: number;
}

function spotOn(ring: Ring, p: Vec2): Spot | null {
  let best: Spot = { edge: 0, along: 0 };
  let least = Number.POSITIVE_INFINITY;
  for (let edge = 0; edge < ring.length; edge++) {
    const [a, b] = [ring[edge], ring[(edge + 1) % ring.length]];
    if (!a || !b) break;
    const away = distanceToEdge(p, a, b);
    if (away < least - 1e-12) {
      least = away;
      best = { edge, along: distance(a, p) };
    }
  }
  return least <= ON_EDGE_MM ? best : null;
}

/** The ring's corners met between two spots, going its own way round. */
function between(ring: Ring, from: Spot, to: Spot): Vec2[] {
  const n = ring.length;
  const onward = to.edge === from.edge && to.along >= from.along;
  const steps = onward ? 0 : (to.edge - from.edge + n) % n || n;
  return Array.from({ length: steps }, (_, step) => ring[(from.edge + 1 + step) % n]).filter((p) => p !== undefined);
}

/**
 * Cuts a counter-clockwise ring along a path that runs through its inside from edge to edge; the two pieces, to the left
 * and to the right of the path, both counter-clockwise; null when an end lies off the outline.
 */
export function cutRing(ring: Ring, path: readonly Vec2[]): { left: Vec2[]; right: Vec2[] } | null {
  const first = path[0];
  const last = path.at(-1);
  if (!first || !last || path.length < 2) throw new RangeError(`a cut needs two points, got ${path.length}`);
  const a = spotOn(ring, first);
  const b = spotOn(ring, last);
  if (!a || !b) return null;
  return {
    left: cleanRing([...between(ring, b, a), ...path]),
    right: cleanRing([...between(ring, a, b), ...[...path].reverse()]),
  };
}

/** Where a ray from a point inside first meets the ring; null when it never does or has no direction. `direction` need not have unit length. */
export function rayTo(ring: Ring, from: Vec2, direction: Vec2): Vec2 | null {
  const size = Math.hypot(...direction);
  if (!(size > 0)) return null;
  const [dx, dy] = [direction[0] / size, direction[1] / size];
  let nearest = Number.POSITIVE_INFINITY;
  for (const [a, b] of edges(ring)) {
    const ex = b[0] - a[0];
    const ey = b[1] - a[1];
    const across = dx * ey - dy * ex;
    if (across === 0) continue;
    const reach = ((a[0] - from[0]) * ey - (a[1] - from[1]) * ex) / across;
    const along = ((a[0] - from[0]) * dy - (a[1] - from[1]) * dx) / across;
    const slack = NOTHING_MM / Math.hypot(ex, ey);
    if (reach > NOTHING_MM && along >= -slack && along <= 1 + slack) nearest = Math.min(nearest, reach);
  }
  return Number.isFinite(nearest) ? [from[0] + dx * nearest, from[1] + dy * nearest] : null;
}
