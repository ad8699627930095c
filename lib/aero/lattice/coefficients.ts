import type { Lattice } from './types';

// From circulation to force and moment coefficients, by the law of Kutta and Joukowski on the bound vortices in the stream
// along x: Katz & Plotkin, "Low-Speed Aerodynamics", section 12.1. Forces of second order (induced drag) are not in these.

/** Lift and nose-up pitching moment, per unit of the case. */
export interface SymmetricEffect {
  readonly lift: number;
  readonly pitch: number;
}

/** Force to starboard, moment right wing down, moment nose right, per unit of the case. */
export interface AntisymmetricEffect {
  readonly side: number;
  readonly roll: number;
  readonly yaw: number;
}

/** What a column of circulations (row-major, `columns` wide) lifts and pitches, both halves together. */
export function symmetricEffect(
  lattice: Lattice,
  circulation: Float64Array,
  columns: number,
  column: number,
): SymmetricEffect {
  const { area, chord, point } = lattice.reference;
  let lift = 0;
  let pitch = 0;
  eachBound(lattice, lattice.mirroredCount, (panel, dy, _dz, x) => {
    const force = (4 / area) * (circulation[panel * columns + column] ?? 0) * dy;
    lift += force;
    pitch -= (force * (x - point[0])) / chord;
  });
  return { lift, pitch };
}

/** What a column of circulations pushes sideways, rolls and yaws, both halves together. */
export function antisymmetricEffect(
  lattice: Lattice,
  circulation: Float64Array,
  columns: number,
  column: number,
): AntisymmetricEffect {
  const { area, span, point } = lattice.reference;
  let side = 0;
  let roll = 0;
  let yaw = 0;
  eachBound(lattice, lattice.count, (panel, dy, dz, x, y, z) => {
    const halves = panel < lattice.mirroredCount ? 2 : 1;
    const strength = (2 / area) * halves * (circulation[panel * columns + column] ?? 0);
    const up = strength * dy;
    const toStarboard = -strength * dz;
    side += toStarboard;
    roll -= ((y - point[1]) * up - (z - point[2]) * toStarboard) / span;
    yaw -= ((x - point[0]) * toStarboard) / span;
  });
  return { side, roll, yaw };
}

type Visit = (panel: number, dy: number, dz: number, x: number, y: number, z: number) => void;

/** Visits the bound vortex of each panel: its run in the front view and its middle. */
function eachBound({ surfaces, edgeY, edgeZ, cornerX }: Lattice, count: number, visit: Visit): void {
  for (const { rows, strips, firstPanel, firstEdge, firstCorner } of surfaces) {
    if (firstPanel >= count) continue;
    for (let k = 0; k < strips.length; k++) {
      const ay = edgeY[firstEdge + k] ?? 0;
      const az = edgeZ[firstEdge + k] ?? 0;
      const by = edgeY[firstEdge + k + 1] ?? 0;
      const bz = edgeZ[firstEdge + k + 1] ?? 0;
      for (let corner = k * rows; corner < (k + 1) * rows; corner++) {
        const x = ((cornerX[firstCorner + corner] ?? 0) + (cornerX[firstCorner + corner + rows] ?? 0)) / 2;
        visit(firstPanel + corner, by - ay, bz - az, x, (ay + by) / 2, (az + bz) / 2);
      }
    }
  }
}
