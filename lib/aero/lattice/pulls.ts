import { eachBound } from './coefficients';
import type { Lattice } from './types';

// The law of Kutta and Joukowski on every piece of vortex that lies on a surface, in the streams that a steady flight is made of: linear in
// circulation and stream, so it is worked out once for a lattice.

/** The undisturbed stream's part along x, what it has along z per radian of angle of attack, and what wind from starboard (a radian), roll
 * and yaw (a radian per length travelled) add to it at a place. */
export const STREAMS = { along: 0, up: 3, beta: 6, roll: 9, yaw: 12 } as const;
/** Numbers a panel: side, roll and yaw in each stream. */
export const PULLS = 15;

/** Per panel, what a unit of its circulation does in each stream: side force, roll about the x axis, yaw about the z axis, in sums over the half
 * model about the origin. A mirrored panel stands for two. */
export function panelPulls(lattice: Lattice): Float64Array {
  const pulls = new Float64Array(lattice.count * PULLS);
  eachVortex(lattice, (panel, lx, ly, lz, x, y, z) => {
    const halves = panel < lattice.mirroredCount ? 2 : 1;
    const from = panel * PULLS;
    const add = (stream: number, fx: number, fy: number, fz: number) => {
      const at = from + stream;
      pulls[at] = (pulls[at] ?? 0) + halves * fy;
      pulls[at + 1] = (pulls[at + 1] ?? 0) + halves * (y * fz - z * fy);
      pulls[at + 2] = (pulls[at + 2] ?? 0) + halves * (x * fy - y * fx);
    };
    // The cross products of each stream, written beside it, with the piece of vortex.
    add(STREAMS.along, 0, -lz, ly); // [1, 0, 0]
    add(STREAMS.up, -ly, lx, 0); // [0, 0, 1]
    add(STREAMS.beta, -lz, 0, lx); // [0, -1, 0]
    add(STREAMS.roll, -z * lz - y * ly, y * lx, z * lx); // [0, -z, y]
    add(STREAMS.yaw, x * lz, y * lz, -y * ly - x * lx); // [-y, x, 0]
  });
  return pulls;
}

type Visit = (panel: number, lx: number, ly: number, lz: number, x: number, y: number, z: number) => void;

/** Visits every piece of vortex that lies on a surface: the bound one of each panel, and its two legs as far as the trailing edge. */
function eachVortex(lattice: Lattice, visit: Visit): void {
  const { surfaces, edgeY, edgeZ, cornerX } = lattice;
  eachBound(lattice, lattice.count, (panel, dy, dz, x, y, z, dx) => visit(panel, dx, dy, dz, x, y, z));
  for (const { rows, strips, firstPanel, firstEdge, firstCorner } of surfaces)
    for (const [k, { inner, outer }] of strips.entries()) {
      const leg = (edge: number, end: number, sign: 1 | -1, r: number) => {
        const from = cornerX[firstCorner + edge * rows + r] ?? 0;
        const y = edgeY[firstEdge + edge] ?? 0;
        const z = edgeZ[firstEdge + edge] ?? 0;
        visit(firstPanel + k * rows + r, sign * (end - from), 0, 0, (from + end) / 2, y, z);
      };
      for (let r = 0; r < rows; r++) {
        leg(k, inner.le[0] + inner.chord, -1, r);
        leg(k + 1, outer.le[0] + outer.chord, 1, r);
      }
    }
}
