import type { Vec2 } from '@/lib/numerics/vec';

// Open lines that run from left to right: x never goes back. mm.

export type Polyline = readonly Vec2[];

/** Height of the line at an x; beyond its ends it goes on straight. Throws RangeError with fewer than two points. */
export function heightAt(line: Polyline, x: number): number {
  let a = line[0];
  let b = line[1];
  if (!a || !b) throw new RangeError(`a line needs two points, got ${line.length}`);
  for (let index = 1; index + 1 < line.length && b[0] < x; index += 1) {
    a = b;
    b = line[index + 1] ?? b;
  }
  return b[0] === a[0] ? b[1] : a[1] + ((b[1] - a[1]) * (x - a[0])) / (b[0] - a[0]);
}

/** The line moved sideways, to its left by a positive distance, corners mitred; its ends stay at their own x. */
export function offsetLine(line: Polyline, leftMm: number): Vec2[] {
  const pieces = line.slice(1).map((to, index) => {
    const from = line[index] ?? to;
    const size = Math.hypot(to[0] - from[0], to[1] - from[1]);
    if (!(size > 0)) throw new RangeError(`a line must not repeat the point ${to.join(', ')}`);
    const along: Vec2 = [(to[0] - from[0]) / size, (to[1] - from[1]) / size];
    const at: Vec2 = [from[0] - along[1] * leftMm, from[1] + along[0] * leftMm];
    return { at, slope: along[1] / along[0], along };
  });
  const on = (piece: (typeof pieces)[number], x: number): Vec2 => [x, piece.at[1] + piece.slope * (x - piece.at[0])];
  return line.flatMap((point, index) => {
    const before = pieces[index - 1];
    const after = pieces[index];
    const only = before ?? after;
    if (!only) throw new RangeError('a line needs two points');
    if (!before || !after || before.slope === after.slope) return [on(only, point[0])];
    const x =
      (after.at[1] - before.at[1] + before.slope * before.at[0] - after.slope * after.at[0]) /
      (before.slope - after.slope);
    return [on(before, x)];
  });
}
