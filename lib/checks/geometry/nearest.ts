import type { Vec3 } from '@/lib/numerics/vec';

// The point of a shape that is nearest to something. A shape is a patch of one to three parameters from 0 to 1.

export interface Patch {
  /** Points along each parameter of the first look, two at least. */
  readonly grid: readonly number[];
  /** A point of the shape, mm; null where there is none, as inside a cutout. */
  readonly place: (at: readonly number[]) => Vec3 | null;
}

export interface Nearest {
  readonly mm: number;
  readonly at: Vec3;
}

/** The search stops when its step is this share of the shape. */
const SMALLEST_STEP = 1e-6;

function gridPoints(grid: readonly number[]): number[][] {
  return grid.reduce<number[][]>(
    (points, count) =>
      points.flatMap((point) => Array.from({ length: count }, (_, index) => [...point, index / (count - 1)])),
    [[]],
  );
}

/** Moves of one step along every parameter and every pair of ways. */
const waysOf = (count: number): number[][] =>
  Array.from({ length: count }).reduce<number[][]>(
    (ways) => ways.flatMap((way) => [-1, 0, 1].map((move) => [...way, move])),
    [[]],
  );

/**
 * Least value of a distance over a patch: a look at every point of its grid, then steps that are halved around the best. Finds the
 * nearest place of anything that is not finer than the grid. Null when the patch has no point.
 */
export function nearest(patch: Patch, distance: (point: Vec3) => number): Nearest | null {
  let best: { mm: number; at: Vec3; where: number[] } | null = null;
  const look = (where: number[]): boolean => {
    const at = patch.place(where);
    if (!at) return false;
    const mm = distance(at);
    if (best && mm >= best.mm) return false;
    best = { mm, at, where };
    return true;
  };
  for (const where of gridPoints(patch.grid)) look(where);
  const ways = waysOf(patch.grid.length);
  const clamp = (value: number): number => Math.min(1, Math.max(0, value));
  const around = (step: number): boolean => {
    const from = best?.where;
    if (!from) return false;
    return ways.some((way) =>
      look(from.map((value, index) => clamp(value + ((way[index] ?? 0) * step) / ((patch.grid[index] ?? 2) - 1)))),
    );
  };
  for (let step = 0.5; step > SMALLEST_STEP; ) if (!around(step)) step /= 2;
  return best;
}
