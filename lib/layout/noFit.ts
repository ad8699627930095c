import { area, FillRule, minkowskiDiff, type Path64, type Paths64, union } from 'clipper2-ts';
import type { Shape } from './shape';

// No-fit polygons: where a moving shape's reference point may not lie without the two shapes overlapping.

const isConvex = (path: Path64): boolean => {
  for (let i = 0; i < path.length; i++) {
    const a = path[i];
    const b = path[(i + 1) % path.length];
    const c = path[(i + 2) % path.length];
    if (!a || !b || !c) return false;
    if ((b.x - a.x) * (c.y - b.y) - (b.y - a.y) * (c.x - b.x) < 0) return false;
  }
  return true;
};

/** Edges of a convex ring from its lowest point on, in the order of their direction. */
const edgesFromLowest = (path: Path64) => {
  let start = 0;
  path.forEach((point, i) => {
    const lowest = path[start];
    if (lowest && (point.y < lowest.y || (point.y === lowest.y && point.x < lowest.x))) start = i;
  });
  const ring = [...path.slice(start), ...path.slice(0, start)];
  const edges = ring.map((point, i) => {
    const next = ring[(i + 1) % ring.length] ?? point;
    return { x: next.x - point.x, y: next.y - point.y };
  });
  return { first: ring[0] ?? { x: 0, y: 0 }, edges };
};

/** Minkowski sum of two convex rings by merging their edges by direction: no clipping needed. */
function convexSum(a: Path64, b: Path64): Path64 {
  const p = edgesFromLowest(a);
  const q = edgesFromLowest(b);
  let at = { x: p.first.x + q.first.x, y: p.first.y + q.first.y };
  const ring: Path64 = [];
  let [i, j] = [0, 0];
  while (i < p.edges.length || j < q.edges.length) {
    ring.push(at);
    const u = p.edges[i];
    const v = q.edges[j];
    const turn = u && v ? u.x * v.y - u.y * v.x : u ? 1 : -1;
    let step = { x: 0, y: 0 };
    if (u && turn >= 0) {
      step = { x: step.x + u.x, y: step.y + u.y };
      i++;
    }
    if (v && turn <= 0) {
      step = { x: step.x + v.x, y: step.y + v.y };
      j++;
    }
    at = { x: at.x + step.x, y: at.y + step.y };
  }
  return ring;
}

const negated = (path: Path64): Path64 => path.map(({ x, y }) => ({ x: 0 - x, y: 0 - y }));

/** Where the moving shape's zero may not lie when the fixed shape's zero is at the origin. Pockets without a way in are filled. */
function noFit(fixed: Shape, moving: Shape): Paths64 {
  if (isConvex(fixed.grown) && isConvex(moving.grown)) return [convexSum(fixed.grown, negated(moving.grown))];
  const swept = minkowskiDiff(moving.grown, fixed.grown, true);
  return union(
    swept.filter((ring) => area(ring) > 0),
    FillRule.NonZero,
  );
}

/** A no-fit polygon for each pair of shapes, worked out once. */
export interface NoFits {
  readonly between: (fixed: Shape, moving: Shape) => Paths64;
}

/** A fresh store; it lives as long as one layout. */
export function noFits(): NoFits {
  const known = new Map<string, Map<string, Paths64>>();
  return {
    between: (fixed, moving) => {
      let row = known.get(fixed.key);
      if (!row) {
        row = new Map();
        known.set(fixed.key, row);
      }
      let paths = row.get(moving.key);
      if (!paths) {
        paths = noFit(fixed, moving);
        row.set(moving.key, paths);
      }
      return paths;
    },
  };
}
