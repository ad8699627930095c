import { distance, lineMeet } from '@/lib/geometry/lines';
import { contains, edges } from '@/lib/geometry/polygons';
import { SAME_POINT_MM } from '@/lib/numerics/tolerances';
import type { Vec2 } from '@/lib/numerics/vec';
import type { Operation } from '../types';
import { distanceToEdge, distanceToRing, NOTHING_MM, onSheet, type Ring } from './ring';

// Lines worked on a sheet end where the sheet does: what lies over an opening is not there to be worked.

const between = (a: Vec2, b: Vec2, t: number): Vec2 => [a[0] + (b[0] - a[0]) * t, a[1] + (b[1] - a[1]) * t];

/** Shares along a straight piece at which it may enter or leave the sheet. */
function stopsOn(a: Vec2, b: Vec2, rings: readonly Ring[]): number[] {
  const size = distance(a, b);
  const share = (p: Vec2): number => ((p[0] - a[0]) * (b[0] - a[0]) + (p[1] - a[1]) * (b[1] - a[1])) / (size * size);
  const met = rings.flatMap((ring) =>
    edges(ring).flatMap(([p, q]): number[] => {
      const corner = distanceToEdge(p, a, b) < SAME_POINT_MM ? [share(p)] : [];
      const at = lineMeet(a, [b[0] - a[0], b[1] - a[1]], p, [q[0] - p[0], q[1] - p[1]]);
      return at && distanceToEdge(at, p, q) < NOTHING_MM ? [...corner, share(at)] : corner;
    }),
  );
  return [0, ...met.filter((t) => t > 0 && t < 1).sort((s, t) => s - t), 1];
}

/** The parts of an open line that lie on the sheet. */
function clipLine(path: readonly Vec2[], outline: Ring, holes: readonly Ring[]): Vec2[][] {
  const onFoam = (p: Vec2): boolean =>
    onSheet(p, outline) && !holes.some((hole) => contains(hole, p) && distanceToRing(p, hole) > SAME_POINT_MM);
  const pieces: Vec2[][] = [];
  for (const [index, b] of path.entries()) {
    const a = path[index - 1];
    if (!a || distance(a, b) < NOTHING_MM) continue;
    const stops = stopsOn(a, b, [outline, ...holes]);
    for (const [k, to] of stops.entries()) {
      const from = stops[k - 1];
      if (from === undefined || (to - from) * distance(a, b) < SAME_POINT_MM) continue;
      if (!onFoam(between(a, b, (from + to) / 2))) continue;
      const [start, end] = [between(a, b, from), between(a, b, to)];
      const last = pieces.at(-1);
      const joined = last?.at(-1);
      if (last && joined && distance(joined, start) < 2 * SAME_POINT_MM) last.push(end);
      else pieces.push([start, end]);
    }
  }
  return pieces.map(withoutMiddles);
}

/** Points on the straight line between their neighbours are stops of the clipping, not corners of the path. */
const withoutMiddles = (path: Vec2[]): Vec2[] =>
  path.filter((p, index) => {
    const [a, b] = [path[index - 1], path[index + 1]];
    return !a || !b || distanceToEdge(p, a, b) > NOTHING_MM;
  });

/** Operations as far as they lie on the sheet: a line across an opening becomes two. */
export function clipOperations(operations: readonly Operation[], outline: Ring, holes: readonly Ring[]): Operation[] {
  return operations.flatMap((operation) => {
    if (operation.closed || operation.path.length < 2)
      return operation.path.every((p) => onSheet(p, outline)) ? [operation] : [];
    return clipLine(operation.path, outline, holes).map((path, index) => ({
      ...operation,
      id: index === 0 ? operation.id : `${operation.id}-${index + 1}`,
      path,
    }));
  });
}
