import type { Vec3 } from '@/lib/numerics/vec';
import type { LaidSurface, Lattice } from './types';

// What each vortex of unit strength does at each control point, along its normal. Horseshoes: a bound part on the quarter line of
// a panel and two legs that trail from its corners to infinity along the x axis of the aircraft, not along the stream; the
// matrix then holds for every angle of attack. Biot and Savart's law for straight parts: Katz & Plotkin, "Low-Speed
// Aerodynamics", section 2.12.

/** Rows are control points, columns vortices; all panels in `antisymmetric`, those of mirrored surfaces in `symmetric`. */
export interface Influence {
  readonly symmetric: Float64Array;
  readonly antisymmetric: Float64Array | null;
}

/**
 * Assembles the half model in both symmetries from one pass: a starboard vortex and its port image, added or subtracted. The
 * image's effect at P is the starboard vortex's effect at P mirrored, so only starboard vortices are ever stored. A surface on
 * the centre plane has no image, and carries nothing in the symmetric case.
 */
export function assemble(lattice: Lattice, withAntisymmetric: boolean): Influence {
  const m = lattice.mirroredCount;
  const n = withAntisymmetric ? lattice.count : m;
  const symmetric = new Float64Array(m * m);
  const antisymmetric = withAntisymmetric ? new Float64Array(n * n) : null;
  const own = new Float64Array(lattice.count);
  const image = new Float64Array(lattice.count);
  const legs = legTable(lattice);
  for (const target of lattice.surfaces) {
    if (!withAntisymmetric && !target.input.mirrored) continue;
    for (let k = 0; k < target.strips.length * target.rows; k++) {
      const i = target.firstPanel + k;
      influenceAt(lattice, legs, probe(lattice, target, i, 1), n, own);
      influenceAt(lattice, legs, probe(lattice, target, i, -1), m, image);
      if (antisymmetric) {
        for (let j = 0; j < m; j++) antisymmetric[i * n + j] = (own[j] ?? 0) - (image[j] ?? 0);
        for (let j = m; j < n; j++) antisymmetric[i * n + j] = own[j] ?? 0;
      }
      if (i < m) for (let j = 0; j < m; j++) symmetric[i * m + j] = (own[j] ?? 0) + (image[j] ?? 0);
    }
  }
  return { symmetric, antisymmetric };
}

/**
 * The velocity along a direction that a symmetric load brings at any place off the surfaces.
 * @param circulation of the panels of mirrored surfaces: row-major, `columns` wide, of which `column` is meant
 */
export function symmetricFlow(
  lattice: Lattice,
  circulation: Float64Array,
  columns: number,
  column: number,
): (at: Vec3, along: Vec3) => number {
  const legs = legTable(lattice);
  const count = lattice.mirroredCount;
  const own = new Float64Array(lattice.count);
  const image = new Float64Array(lattice.count);
  return ([x, y, z], [nx, ny, nz]) => {
    influenceAt(lattice, legs, placeOff(x, y, z, nx, ny, nz), count, own);
    // On the centre plane a vortex and its image do the same.
    const central = y === 0 && ny === 0;
    if (!central) influenceAt(lattice, legs, placeOff(x, -y, z, nx, -ny, nz), count, image);
    const other = central ? own : image;
    let sum = 0;
    for (let j = 0; j < count; j++) sum += ((own[j] ?? 0) + (other[j] ?? 0)) * (circulation[j * columns + column] ?? 0);
    return sum;
  };
}

/** Of each edge: square of the core radius that other surfaces feel, and the normal there. */
interface LegTable {
  readonly coreSquare: Float64Array;
  readonly ny: Float64Array;
  readonly nz: Float64Array;
  /** Of each corner of the surface at hand: its distance from the point, and the effect of the leg from it. */
  readonly distance: Float64Array;
  readonly leg: Float64Array;
}

function legTable({ surfaces, options, edgeY }: Lattice): LegTable {
  const coreSquare = new Float64Array(edgeY.length);
  const ny = new Float64Array(edgeY.length);
  const nz = new Float64Array(edgeY.length);
  let most = 0;
  for (const { strips, firstEdge, rows } of surfaces) {
    most = Math.max(most, (strips.length + 1) * rows);
    for (let k = 0; k <= strips.length; k++) {
      const a = strips[Math.max(0, k - 1)];
      const b = strips[Math.min(strips.length - 1, k)];
      if (!a || !b) continue;
      coreSquare[firstEdge + k] = (options.coreShare * (a.width + b.width) * 0.5) ** 2;
      ny[firstEdge + k] = (a.ny + b.ny) / 2;
      nz[firstEdge + k] = (a.nz + b.nz) / 2;
    }
  }
  return { coreSquare, ny, nz, distance: new Float64Array(most), leg: new Float64Array(most) };
}

/** A control point, or its mirror image, with the normals there. */
interface Probe {
  readonly family: number;
  readonly touches: ReadonlySet<number>;
  readonly x: number;
  readonly y: number;
  readonly z: number;
  readonly nx: number;
  readonly ny: number;
  readonly nz: number;
  /** Half the width of the strip it stands for; 0 for a place on no surface. */
  readonly half: number;
}

function probe(
  { points, normals }: Lattice,
  { family, touches, strips, firstPanel, rows }: LaidSurface,
  i: number,
  side: 1 | -1,
): Probe {
  return {
    family,
    touches,
    half: (strips[Math.floor((i - firstPanel) / rows)]?.width ?? 0) / 2,
    x: points[i * 3] ?? 0,
    y: side * (points[i * 3 + 1] ?? 0),
    z: points[i * 3 + 2] ?? 0,
    nx: normals[i * 3] ?? 0,
    ny: side * (normals[i * 3 + 1] ?? 0),
    nz: normals[i * 3 + 2] ?? 0,
  };
}

const NO_NEIGHBOURS: ReadonlySet<number> = new Set();

/** A place on no surface: every leg is felt with its core. Written like `probe`, so that one shape of object runs through the loops. */
const placeOff = (x: number, y: number, z: number, nx: number, ny: number, nz: number): Probe => ({
  family: -1,
  touches: NO_NEIGHBOURS,
  half: 0,
  x,
  y,
  z,
  nx,
  ny,
  nz,
});

/** Velocity along the normal at the probe by each of the first `count` vortices, into `out`. */
function influenceAt(lattice: Lattice, legs: LegTable, at: Probe, count: number, out: Float64Array): void {
  for (const source of lattice.surfaces) {
    if (source.firstPanel >= count) continue;
    tableLegs(lattice, legs, at, source);
    addBoundParts(lattice, legs, at, source, out);
  }
}

const QUARTER_PI_INVERSE = 1 / (4 * Math.PI);

/** Distances and leg effects of every corner of a surface: once for the two panels that share it. */
function tableLegs({ edgeY, edgeZ, cornerX, options }: Lattice, legs: LegTable, at: Probe, source: LaidSurface): void {
  const { x, y, z, ny, nz } = at;
  const { rows } = source;
  const other = source.family !== at.family;
  // Where surfaces meet at an angle their edges are laid together, and a core would part them.
  const meets = at.touches.has(source.index);
  for (let k = 0; k <= source.strips.length; k++) {
    const edge = source.firstEdge + k;
    const dy = y - (edgeY[edge] ?? 0);
    const dz = z - (edgeZ[edge] ?? 0);
    const square = dy * dy + dz * dz;
    const parallel = Math.abs(ny * (legs.ny[edge] ?? 0) + nz * (legs.nz[edge] ?? 0)) > options.parallel;
    const cored = other && (parallel || !meets);
    const turn = cored ? meanTurn(at, dy, dz, legs.coreSquare[edge] ?? 0) : turnAt(at, dy, dz, 0);
    for (let corner = k * rows; corner < (k + 1) * rows; corner++) {
      const dx = x - (cornerX[source.firstCorner + corner] ?? 0);
      const distance = Math.sqrt(dx * dx + square);
      legs.distance[corner] = distance;
      legs.leg[corner] = distance > 0 ? turn * (1 + dx / distance) : 0;
    }
  }
}

/** What a straight vortex along x turns at a place beside it; in line with it, nothing. */
function turnAt({ ny, nz }: Probe, dy: number, dz: number, coreSquare: number): number {
  const square = dy * dy + dz * dz + coreSquare;
  return square > 0 ? (nz * dy - ny * dz) / square : 0;
}

/**
 * The same as the mean over the width of the strip: a leg of another surface may pass anywhere beside a control point, and what it does
 * at that one point says little of the strip.
 */
function meanTurn(at: Probe, dy: number, dz: number, coreSquare: number): number {
  const { half, ny, nz } = at;
  if (half === 0 || coreSquare === 0) return turnAt(at, dy, dz, coreSquare);
  const hy = half * nz;
  const hz = -half * ny;
  const outer = (dy + hy) ** 2 + (dz + hz) ** 2 + coreSquare;
  const inner = (dy - hy) ** 2 + (dz - hz) ** 2 + coreSquare;
  return Math.log(outer / inner) / (4 * half);
}

/** A bound vortex seen from closer to its line than this share of its corners' distances: the point lies on it, and feels nothing. */
const ON_THE_LINE = 1e-12;

function addBoundParts(
  { edgeY, edgeZ, cornerX }: Lattice,
  { distance, leg }: LegTable,
  { x, y, z, nx, ny, nz }: Probe,
  { rows, strips, firstEdge, firstCorner, firstPanel }: LaidSurface,
  out: Float64Array,
): void {
  for (let k = 0; k < strips.length; k++) {
    const ay = y - (edgeY[firstEdge + k] ?? 0);
    const az = z - (edgeZ[firstEdge + k] ?? 0);
    const by = y - (edgeY[firstEdge + k + 1] ?? 0);
    const bz = z - (edgeZ[firstEdge + k + 1] ?? 0);
    // The triple product n . (ra x rb) with its factors of x gathered.
    const constant = nx * (ay * bz - az * by);
    const perAx = nz * by - ny * bz;
    const perBx = ny * az - nz * ay;
    const across = ay * by + az * bz;
    for (let inner = k * rows; inner < (k + 1) * rows; inner++) {
      const outer = inner + rows;
      const ax = x - (cornerX[firstCorner + inner] ?? 0);
      const bx = x - (cornerX[firstCorner + outer] ?? 0);
      const ra = distance[inner] ?? 0;
      const rb = distance[outer] ?? 0;
      const product = ra * rb;
      const span = product + ax * bx + across;
      const cross = constant + perAx * ax + perBx * bx;
      const bound = span > ON_THE_LINE * product ? (cross * (ra + rb)) / (product * span) : 0;
      out[firstPanel + inner] = (bound + (leg[outer] ?? 0) - (leg[inner] ?? 0)) * QUARTER_PI_INVERSE;
    }
  }
}
