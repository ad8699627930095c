import { type Factors, solve } from '@/lib/numerics/lu';
import type { LaidSurface, Lattice } from './types';

// In sideslip the wake leaves the trailing edge with the stream, aslant to the aircraft: the tip vortex of the windward side moves in under
// the wing, the other one away from it. The lattice's wake lies along x; this is what a radian of sideslip changes in it.

/** Derivative by sideslip of the velocity along a normal that a vortex of unit strength, from the origin along the stream, brings at a place.
 * Biot and Savart for a half-infinite line along d: (d x r)(|r| + d . r) / (4 pi |r| (|d x r|^2 + core^2)). */
function turned(rx: number, ry: number, rz: number, coreSquare: number, nx: number, ny: number, nz: number): number {
  const r = Math.sqrt(rx * rx + ry * ry + rz * rz);
  const square = ry * ry + rz * rz + coreSquare;
  if (!(r > 0 && square > 0)) return 0;
  const size = 4 * Math.PI * r * square;
  const along = (r + rx) / size;
  const shift = -ry / size - (along * 2 * rx * ry) / square;
  return -rz * along * nx - rz * shift * ny + (rx * along + ry * shift) * nz;
}

/**
 * Circulations that the slant of the wake brings, per radian of wind from starboard, antisymmetric: what the turned wake blows through each
 * panel has to be met. One column for each of the `columns` of symmetric circulations (row-major).
 */
export function wakeSkewCirculation(
  lattice: Lattice,
  factors: Factors,
  symmetric: Float64Array,
  columns: number,
): Float64Array {
  const sides = new Float64Array(lattice.count * columns);
  const strengths = new Float64Array(columns);
  for (const source of lattice.surfaces) {
    if (!source.input.mirrored) continue;
    const { strips, index } = source;
    for (let e = 0; e <= strips.length; e++) {
      const strip = strips[Math.min(e, strips.length - 1)];
      const cut = e < strips.length ? strip?.inner : strip?.outer;
      if (!strip || !cut || !legStrengths(source, e, symmetric, strengths)) continue;
      const coreSquare = (lattice.options.coreShare * strip.width) ** 2;
      blow(lattice, index, [cut.le[0] + cut.chord, cut.le[1], cut.le[2]], coreSquare, strengths, sides);
    }
  }
  solve(factors, sides, columns);
  return sides;
}

/** What the strips on both sides of an edge leave in the leg from its trailing edge, for every column; false when it is nothing. */
function legStrengths(
  { strips, rows, firstPanel }: LaidSurface,
  edge: number,
  symmetric: Float64Array,
  out: Float64Array,
): boolean {
  const columns = out.length;
  out.fill(0);
  for (let strip = Math.max(0, edge - 1); strip <= Math.min(edge, strips.length - 1); strip++) {
    const sign = strip < edge ? 1 : -1;
    for (let panel = firstPanel + strip * rows; panel < firstPanel + (strip + 1) * rows; panel++)
      for (let c = 0; c < columns; c++) out[c] = (out[c] ?? 0) + sign * (symmetric[panel * columns + c] ?? 0);
  }
  return out.some((strength) => strength !== 0);
}

/** Takes what one leg and its image blow through every panel off the right-hand sides. */
function blow(
  { points, normals, surfaces }: Lattice,
  sourceIndex: number,
  [ex, ey, ez]: readonly [number, number, number],
  coreSquare: number,
  strengths: Float64Array,
  sides: Float64Array,
): void {
  const columns = strengths.length;
  for (const { index, firstPanel, strips, rows } of surfaces) {
    const core = index === sourceIndex ? 0 : coreSquare;
    for (let i = firstPanel; i < firstPanel + strips.length * rows; i++) {
      const nx = normals[i * 3] ?? 0;
      const ny = normals[i * 3 + 1] ?? 0;
      const nz = normals[i * 3 + 2] ?? 0;
      const x = (points[i * 3] ?? 0) - ex;
      const y = points[i * 3 + 1] ?? 0;
      const z = (points[i * 3 + 2] ?? 0) - ez;
      const unit = turned(x, y - ey, z, core, nx, ny, nz) - turned(x, y + ey, z, core, nx, ny, nz);
      for (let c = 0; c < columns; c++)
        sides[i * columns + c] = (sides[i * columns + c] ?? 0) - (strengths[c] ?? 0) * unit;
    }
  }
}
