import { bounds, contains, edges } from '@/lib/geometry/polygons';
import type { Vec2 } from '@/lib/numerics/vec';
import { distanceToEdge, edgesCross, type Ring } from '../shape/ring';

/** A point inside a piece and its distance to the nearest cut edge, mm. */
export interface Place {
  readonly at: Vec2;
  readonly depthMm: number;
}

/** Where marks can stand on a piece. */
export interface Room {
  readonly holes: readonly Ring[];
  readonly sides: readonly (readonly [Vec2, Vec2])[];
  /** The deepest first. */
  readonly places: readonly Place[];
}

const GRID = 12;

/** Looks over a piece on a coarse grid: enough for marks, quick enough to be done again while a handle is dragged. */
export function roomIn(outline: Ring, holes: readonly Ring[]): Room {
  const { minX, minY, maxX, maxY } = bounds(outline);
  const sides = [outline, ...holes].flatMap(edges);
  const places: Place[] = [];
  for (let i = 1; i < GRID; i += 1) {
    for (let j = 1; j < GRID; j += 1) {
      const at: Vec2 = [minX + ((maxX - minX) * i) / GRID, minY + ((maxY - minY) * j) / GRID];
      if (!contains(outline, at) || holes.some((hole) => contains(hole, at))) continue;
      let depthMm = Number.POSITIVE_INFINITY;
      for (const [a, b] of sides) depthMm = Math.min(depthMm, distanceToEdge(at, a, b));
      places.push({ at, depthMm });
    }
  }
  // Equal depths keep the order of the grid, so that the same piece always gets the same marks.
  places.sort((a, b) => (Math.abs(b.depthMm - a.depthMm) < 1e-6 ? 0 : b.depthMm - a.depthMm));
  return { holes, sides, places };
}

/** Whether a box around a place stands wholly inside the piece. `halfW` runs along the angle. */
export function holdsBox(room: Room, { at, depthMm }: Place, halfW: number, halfH: number, angleDeg: number): boolean {
  if (depthMm < Math.min(halfW, halfH)) return false;
  if (depthMm > Math.hypot(halfW, halfH)) return true;
  const c = Math.cos((angleDeg * Math.PI) / 180);
  const s = Math.sin((angleDeg * Math.PI) / 180);
  const corner = (w: number, h: number): Vec2 => [at[0] + c * w - s * h, at[1] + s * w + c * h];
  const corners = [corner(-halfW, -halfH), corner(halfW, -halfH), corner(halfW, halfH), corner(-halfW, halfH)];
  const box = edges(corners);
  // The place itself is inside: a box that no edge crosses and that swallows no hole is inside too.
  return (
    room.sides.every(([p, q]) => box.every(([r, t]) => !edgesCross(p, q, r, t))) &&
    !room.holes.some((hole) => hole.some((p) => contains(corners, p)))
  );
}
