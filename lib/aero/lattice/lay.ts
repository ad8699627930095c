import { type Problem, type Result, refuse } from '@/lib/numerics/result';
import { texts } from '@/lib/text/en/figures';
import { fill } from '@/lib/text/fill';
import { pairProblems, surfaceProblems } from './check';
import { turnShares } from './hinge';
import { families, joined, junctions, neighbours } from './junctions';
import { sectionRuns } from './stations';
import { layStrips } from './strips';
import {
  LATTICE_DEFAULTS,
  type LaidStrip,
  type LaidSurface,
  type Lattice,
  type LatticeProblem,
  type MeanLine,
} from './types';

/** Panels that are still solved in a few seconds: fifteen times what an aircraft of this kind needs. */
const MOST_PANELS = 2000;

const tooLarge = (count: number): Problem => ({
  code: 'lattice-too-large',
  path: 'surfaces',
  message: fill(texts.problems.latticeTooLarge, { count, most: MOST_PANELS }),
  fix: texts.problems.latticeTooLargeFix,
});

/**
 * Lays the lattice: rows of equal share of the chord, strips of nearly equal width, breaks at panel ends, control ends and
 * junctions, a quarter-strip inset at free tips. A surface without length or chord, or one that neither is a starboard half nor
 * stands on the centre plane, is a problem whose path is the surface's id.
 */
export function layLattice(input: LatticeProblem): Result<Lattice> {
  const options = { ...LATTICE_DEFAULTS, ...input.options };
  const given = [...input.surfaces.filter((s) => s.mirrored), ...input.surfaces.filter((s) => !s.mirrored)];
  const problems = given.flatMap(surfaceProblems);
  if (problems.length === 0) problems.push(...pairProblems(given));
  if (problems.length > 0) return refuse(...problems);
  const met = junctions(given);
  const surfaces = joined(given, met);
  const touched = neighbours(surfaces, met);
  const family = families(surfaces, met);
  const laid: LaidSurface[] = [];
  const size = { panels: 0, edges: 0, corners: 0 };
  for (const [index, surface] of surfaces.entries()) {
    for (const run of sectionRuns(surface.sections)) {
      const strips = layStrips(surface, index, run, input.controls, met, options);
      laid.push({
        input: surface,
        index,
        family: family[index] ?? index,
        touches: touched[index] ?? new Set(),
        rows: surface.rows,
        strips,
        firstPanel: size.panels,
        firstEdge: size.edges,
        firstCorner: size.corners,
      });
      size.panels += strips.length * surface.rows;
      size.edges += strips.length + 1;
      size.corners += (strips.length + 1) * surface.rows;
    }
  }
  if (size.panels > MOST_PANELS) return refuse(tooLarge(size.panels));
  const lattice: Lattice = {
    options,
    surfaces: laid,
    mirroredCount: laid.reduce((sum, s) => sum + (s.input.mirrored ? s.strips.length * s.rows : 0), 0),
    count: size.panels,
    points: new Float64Array(size.panels * 3),
    normals: new Float64Array(size.panels * 3),
    edgeY: new Float64Array(size.edges),
    edgeZ: new Float64Array(size.edges),
    cornerX: new Float64Array(size.corners),
  };
  for (const surface of laid) placeSurface(lattice, surface);
  return { ok: true, value: lattice };
}

/**
 * Writes one surface's edges, corners, control points and normals. The bound vortex lies at the quarter and the control point at
 * three quarters of each panel (Katz & Plotkin, "Low-Speed Aerodynamics", section 12.1).
 */
function placeSurface(lattice: Lattice, surface: LaidSurface): void {
  const { rows, strips, firstEdge, firstCorner } = surface;
  const cuts = strips.map((s) => s.inner);
  const last = strips[strips.length - 1];
  if (last) cuts.push(last.outer);
  for (const [k, cut] of cuts.entries()) {
    lattice.edgeY[firstEdge + k] = cut.le[1];
    lattice.edgeZ[firstEdge + k] = cut.le[2];
    for (let r = 0; r < rows; r++)
      lattice.cornerX[firstCorner + k * rows + r] = cut.le[0] + (cut.chord * (r + 0.25)) / rows;
  }
  for (const [k, strip] of strips.entries()) placeStrip(lattice, strip, surface.firstPanel + k * rows, rows);
}

function placeStrip(lattice: Lattice, { inner, outer, ny, nz }: LaidStrip, first: number, rows: number): void {
  const chord = (inner.chord + outer.chord) / 2;
  const slopes = rowSlopes(rows, inner.meanLine, outer.meanLine);
  for (let r = 0; r < rows; r++) {
    const i = (first + r) * 3;
    const incidence = (inner.incidenceRad + outer.incidenceRad) / 2 - Math.atan(slopes[r] ?? 0);
    lattice.points[i] = (inner.le[0] + outer.le[0]) / 2 + (chord * (r + 0.75)) / rows;
    lattice.points[i + 1] = (inner.le[1] + outer.le[1]) / 2;
    lattice.points[i + 2] = (inner.le[2] + outer.le[2]) / 2;
    lattice.normals[i] = Math.sin(incidence);
    lattice.normals[i + 1] = ny * Math.cos(incidence);
    lattice.normals[i + 2] = nz * Math.cos(incidence);
  }
}

/** Slope of the mean line at each row, so that in two dimensions its lift is that of thin-aerofoil theory: each kink turns like a hinge. */
function rowSlopes(rows: number, ...lines: readonly (MeanLine | undefined)[]): Float64Array {
  const slopes = new Float64Array(rows);
  for (const line of lines)
    for (const { at, slope } of line ?? [])
      for (const [r, share] of turnShares(rows, 1 - at).entries())
        slopes[r] = (slopes[r] ?? 0) + (share * slope) / lines.length;
  return slopes;
}
