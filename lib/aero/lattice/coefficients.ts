import type { Lattice, LatticeReference } from './types';

// From circulation to force and moment coefficients, by the law of Kutta and Joukowski on the bound vortices in the stream
// along x: Katz & Plotkin, "Low-Speed Aerodynamics", section 12.1. Forces of second order (induced drag, and what grows with lift in
// sideslip, roll and yaw) are in farField.ts and lateral.ts.

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

/** A case as its circulation adds up to it, before areas and chords: sums over the half model's bound vortices. */
export interface SymmetricSums {
  readonly lift: number;
  /** Lift times x. */
  readonly moment: number;
}

export interface AntisymmetricSums {
  readonly side: number;
  /** Up force times y, less side force times z. */
  readonly roll: number;
  /** Side force times x. */
  readonly yaw: number;
}

/** Sums of every column of symmetric circulations (row-major, `columns` wide). */
export function symmetricSums(lattice: Lattice, circulation: Float64Array, columns: number): SymmetricSums[] {
  const lift = new Float64Array(columns);
  const moment = new Float64Array(columns);
  eachBound(lattice, lattice.mirroredCount, (panel, dy, _dz, x) => {
    for (let c = 0; c < columns; c++) {
      const force = (circulation[panel * columns + c] ?? 0) * dy;
      lift[c] = (lift[c] ?? 0) + force;
      moment[c] = (moment[c] ?? 0) + force * x;
    }
  });
  return Array.from(lift, (each, c) => ({ lift: each, moment: moment[c] ?? 0 }));
}

/** Sums of every column of antisymmetric circulations; a surface on the centre plane has no second half. */
export function antisymmetricSums(lattice: Lattice, circulation: Float64Array, columns: number): AntisymmetricSums[] {
  const side = new Float64Array(columns);
  const roll = new Float64Array(columns);
  const yaw = new Float64Array(columns);
  eachBound(lattice, lattice.count, (panel, dy, dz, x, y, z) => {
    const halves = panel < lattice.mirroredCount ? 2 : 1;
    for (let c = 0; c < columns; c++) {
      const strength = halves * (circulation[panel * columns + c] ?? 0);
      const up = strength * dy;
      const toStarboard = -strength * dz;
      side[c] = (side[c] ?? 0) + toStarboard;
      roll[c] = (roll[c] ?? 0) + y * up - z * toStarboard;
      yaw[c] = (yaw[c] ?? 0) + x * toStarboard;
    }
  });
  return Array.from(side, (each, c) => ({ side: each, roll: roll[c] ?? 0, yaw: yaw[c] ?? 0 }));
}

/** Lift and pitching moment coefficients about the reference point, both halves together. */
export function symmetricEffect(sums: SymmetricSums, { area, chord, point }: LatticeReference): SymmetricEffect {
  return {
    lift: (4 / area) * sums.lift,
    pitch: (-4 / (area * chord)) * (sums.moment - point[0] * sums.lift),
  };
}

/** Side force, rolling and yawing moment coefficients about the reference point. */
export function antisymmetricEffect(
  sums: AntisymmetricSums,
  { area, span, point }: LatticeReference,
): AntisymmetricEffect {
  return {
    side: (2 / area) * sums.side,
    roll: (-2 / (area * span)) * (sums.roll + point[2] * sums.side),
    yaw: (-2 / (area * span)) * (sums.yaw - point[0] * sums.side),
  };
}

type Visit = (panel: number, dy: number, dz: number, x: number, y: number, z: number, dx: number) => void;

/** Visits the bound vortex of each of the first `count` panels: its run in the front view, its middle, and its run along x. */
export function eachBound({ surfaces, edgeY, edgeZ, cornerX }: Lattice, count: number, visit: Visit): void {
  for (const { rows, strips, firstPanel, firstEdge, firstCorner } of surfaces) {
    if (firstPanel >= count) continue;
    for (let k = 0; k < strips.length; k++) {
      const ay = edgeY[firstEdge + k] ?? 0;
      const az = edgeZ[firstEdge + k] ?? 0;
      const by = edgeY[firstEdge + k + 1] ?? 0;
      const bz = edgeZ[firstEdge + k + 1] ?? 0;
      for (let corner = k * rows; corner < (k + 1) * rows; corner++) {
        const ax = cornerX[firstCorner + corner] ?? 0;
        const bx = cornerX[firstCorner + corner + rows] ?? 0;
        visit(firstPanel + corner, by - ay, bz - az, (ax + bx) / 2, (ay + by) / 2, (az + bz) / 2, bx - ax);
      }
    }
  }
}
