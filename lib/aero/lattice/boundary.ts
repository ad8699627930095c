import { turnShares } from './hinge';
import type { LaidStrip, Lattice, LatticeControl } from './types';

// Right-hand sides: what the stream brings along each normal, per unit of angle, rate or deflection, with its sign turned. All are
// linear about the stream along x, so any flight state is a sum of them.

/** Columns of the symmetric problem, before the controls. */
export const SYMMETRIC_CASES = ['base', 'alpha', 'pitchRate'] as const;
/** Columns of the antisymmetric problem, before the controls. */
export const ANTISYMMETRIC_CASES = ['beta', 'rollRate', 'yawRate'] as const;

/**
 * Right-hand sides of the symmetric problem, row-major: panels by cases, then one column a control. The pitch rate is about the origin, in
 * radians per length travelled; `derivativesAbout` moves it to the reference point.
 */
export function symmetricSides(lattice: Lattice, controls: readonly LatticeControl[]): Float64Array {
  const columns = SYMMETRIC_CASES.length + controls.length;
  const sides = new Float64Array(lattice.mirroredCount * columns);
  for (let i = 0; i < lattice.mirroredCount; i++) {
    const nx = lattice.normals[i * 3] ?? 0;
    const nz = lattice.normals[i * 3 + 2] ?? 0;
    const x = lattice.points[i * 3] ?? 0;
    const z = lattice.points[i * 3 + 2] ?? 0;
    sides[i * columns] = -nx;
    sides[i * columns + 1] = -nz;
    // Nose going up: the air meets a place aft of the origin from below.
    sides[i * columns + 2] = -(x * nz - z * nx);
  }
  writeControls(lattice, controls, sides, columns, SYMMETRIC_CASES.length, lattice.mirroredCount);
  return sides;
}

/**
 * Right-hand sides of the antisymmetric problem, rates likewise about the origin. Control columns: starboard positive, port by the same
 * amount negative.
 */
export function antisymmetricSides(lattice: Lattice, controls: readonly LatticeControl[]): Float64Array {
  const columns = ANTISYMMETRIC_CASES.length + controls.length;
  const sides = new Float64Array(lattice.count * columns);
  for (let i = 0; i < lattice.count; i++) {
    const nx = lattice.normals[i * 3] ?? 0;
    const ny = lattice.normals[i * 3 + 1] ?? 0;
    const nz = lattice.normals[i * 3 + 2] ?? 0;
    const x = lattice.points[i * 3] ?? 0;
    const y = lattice.points[i * 3 + 1] ?? 0;
    const z = lattice.points[i * 3 + 2] ?? 0;
    // Wind from starboard; right wing going down; nose going right.
    sides[i * columns] = ny;
    sides[i * columns + 1] = -(y * nz - z * ny);
    sides[i * columns + 2] = -(x * ny - y * nx);
  }
  writeControls(lattice, controls, sides, columns, ANTISYMMETRIC_CASES.length, lattice.count);
  return sides;
}

function writeControls(
  lattice: Lattice,
  controls: readonly LatticeControl[],
  sides: Float64Array,
  columns: number,
  first: number,
  count: number,
): void {
  for (const [c, control] of controls.entries()) {
    const runs = lattice.surfaces.filter((s) => s.input.id === control.surfaceId);
    if (runs.length === 0)
      throw new RangeError(`control ${control.id} is on no surface of the lattice: ${control.surfaceId}`);
    for (const { firstPanel, rows, strips } of runs) {
      if (firstPanel >= count) continue;
      for (const [k, strip] of strips.entries()) {
        const covered = coverage(strip, control);
        if (!covered) continue;
        for (const [r, share] of turnShares(rows, covered.chordShare).entries())
          sides[(firstPanel + k * rows + r) * columns + first + c] = -share * covered.turn;
      }
    }
  }
}

/**
 * How much of a unit deflection a strip sees: the part of its width that the control covers, times the cosine of the hinge's sweep, for
 * the control turns about its hinge line (Etkin & Reid, "Dynamics of Flight", on swept controls).
 */
function coverage(strip: LaidStrip, control: LatticeControl): { chordShare: number; turn: number } | null {
  const from = Math.max(strip.from, control.from);
  const to = Math.min(strip.to, control.to);
  if (to <= from) return null;
  const [inner, outer] = control.chordShare;
  const shareAt = (station: number) =>
    inner + ((outer - inner) * (station - control.from)) / (control.to - control.from);
  const hingeX = (cut: LaidStrip['inner'], station: number) => cut.le[0] + cut.chord * (1 - shareAt(station));
  const run = hingeX(strip.outer, strip.to) - hingeX(strip.inner, strip.from);
  // A surface that moves as a whole has no hinge line along its leading edge: it turns as its incidence does.
  const whole = inner >= 1 && outer >= 1;
  const cosine = whole ? 1 : strip.width / Math.hypot(run, strip.width);
  return { chordShare: shareAt((from + to) / 2), turn: (cosine * (to - from)) / (strip.to - strip.from) };
}
