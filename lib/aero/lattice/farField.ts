import type { Lattice } from './types';

// The wake far behind, cut across: straight vortices that stretch both ways. What it costs to leave them behind is the induced drag.
// Katz & Plotkin, "Low-Speed Aerodynamics", section 12.1 (Trefftz plane); M. M. Munk, NACA TR 121 (stagger changes nothing).

/** The wake's strips, in the order of the lattice's, those of mirrored surfaces first. */
export interface FarField {
  readonly count: number;
  readonly mirrored: number;
  readonly width: Float64Array;
  /** Velocity along each strip's normal by each strip of unit strength and its image: row-major, count x count. */
  readonly symmetric: Float64Array;
  readonly antisymmetric: Float64Array;
}

interface Wake {
  readonly index: number;
  readonly touches: ReadonlySet<number>;
  readonly mirrored: boolean;
  readonly ay: number;
  readonly az: number;
  readonly by: number;
  readonly bz: number;
  readonly ny: number;
  readonly nz: number;
  readonly width: number;
}

/** Works out how the strips of the wake blow on each other. */
export function farField(lattice: Lattice): FarField {
  const wakes = wakesOf(lattice);
  const { coreShare } = lattice.options;
  const n = wakes.length;
  const symmetric = new Float64Array(n * n);
  const antisymmetric = new Float64Array(n * n);
  for (let i = 0; i < n; i++)
    for (let j = 0; j < n; j++) {
      const [target, source] = [wakes[i], wakes[j]];
      if (!target || !source) continue;
      const own = crossFlow(coreShare, target, source, 1);
      const image = source.mirrored ? crossFlow(coreShare, target, source, -1) : 0;
      symmetric[i * n + j] = source.mirrored ? own + image : 0;
      antisymmetric[i * n + j] = own - image;
    }
  return {
    count: n,
    mirrored: wakes.filter(({ mirrored }) => mirrored).length,
    width: Float64Array.from(wakes, ({ width }) => width),
    symmetric,
    antisymmetric,
  };
}

function wakesOf({ surfaces, edgeY, edgeZ }: Lattice): Wake[] {
  return surfaces.flatMap(({ input, index, touches, strips, firstEdge }) =>
    strips.map(
      ({ ny, nz, width }, k): Wake => ({
        index,
        touches,
        mirrored: input.mirrored,
        ay: edgeY[firstEdge + k] ?? 0,
        az: edgeZ[firstEdge + k] ?? 0,
        by: edgeY[firstEdge + k + 1] ?? 0,
        bz: edgeZ[firstEdge + k + 1] ?? 0,
        ny,
        nz,
        width,
      }),
    ),
  );
}

/**
 * Velocity along the target's normal by the source's two vortices; on the other side, by mirroring the target instead of the source. Between
 * strips of one surface and of surfaces that meet, whose edges are laid together, at the target's middle. Between surfaces apart, where a
 * vortex may pass anywhere through the target, as the mean over its width: the flow through it, with the leg's core.
 */
function crossFlow(coreShare: number, target: Wake, source: Wake, side: 1 | -1): number {
  const through = target.index !== source.index && !target.touches.has(source.index);
  const core = through ? (coreShare * source.width) ** 2 : 0;
  const b = by(target, side, source.by, source.bz, core, through);
  return (b - by(target, side, source.ay, source.az, core, through)) / (2 * Math.PI);
}

/** The same by one vortex at (ey, ez) of strength 2 pi. */
function by(target: Wake, side: 1 | -1, ey: number, ez: number, core: number, through: boolean): number {
  const { ay, az, ny, nz, width } = target;
  const ady = side * ay - ey;
  const adz = az - ez;
  const bdy = side * target.by - ey;
  const bdz = target.bz - ez;
  if (through) return (side * Math.log((bdy * bdy + bdz * bdz + core) / (ady * ady + adz * adz + core))) / (2 * width);
  const dy = (ady + bdy) / 2;
  const dz = (adz + bdz) / 2;
  const square = dy * dy + dz * dz;
  return square > 0 ? (nz * dy - side * ny * dz) / square : 0;
}

/** Circulation of each strip, all rows together, of one column. */
export function stripCirculation(
  { surfaces }: Lattice,
  circulation: Float64Array,
  columns: number,
  column: number,
): Float64Array {
  const strips = new Float64Array(surfaces.reduce((count, { strips: own }) => count + own.length, 0));
  let s = 0;
  for (const { rows, strips: own, firstPanel } of surfaces)
    for (let k = 0; k < own.length; k++) {
      let sum = 0;
      for (let r = 0; r < rows; r++) sum += circulation[(firstPanel + k * rows + r) * columns + column] ?? 0;
      strips[s++] = sum;
    }
  return strips;
}

/** Velocity along each strip's normal, far behind. */
export function wash(matrix: Float64Array, strengths: Float64Array): Float64Array {
  const n = strengths.length;
  return strengths.map((_, i) => {
    let sum = 0;
    for (let j = 0; j < n; j++) sum += (matrix[i * n + j] ?? 0) * (strengths[j] ?? 0);
    return sum;
  });
}

/** The other way round: for each strip, what a unit of it blows through all strips, by their weights. */
export function washBack(matrix: Float64Array, weights: Float64Array): Float64Array {
  const n = weights.length;
  const sums = new Float64Array(n);
  for (let i = 0; i < n; i++)
    for (let j = 0; j < n; j++) sums[j] = (sums[j] ?? 0) + (matrix[i * n + j] ?? 0) * (weights[i] ?? 0);
  return sums;
}

/** Induced drag coefficient of a symmetric load by strips, both halves together. */
export function inducedDragOf(field: FarField, strengths: Float64Array, area: number): number {
  const along = wash(field.symmetric, strengths);
  let sum = 0;
  for (let i = 0; i < field.mirrored; i++) sum -= (strengths[i] ?? 0) * (along[i] ?? 0) * (field.width[i] ?? 0);
  return (2 / area) * sum;
}
