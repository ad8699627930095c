import { sameContent } from '@/lib/numerics/content';
import { type Factors, factor, solve } from '@/lib/numerics/lu';
import { type Problem, type Result, refuse } from '@/lib/numerics/result';
import { texts } from '@/lib/text/en/figures';
import { ANTISYMMETRIC_CASES, antisymmetricSides, SYMMETRIC_CASES, symmetricSides } from './boundary';
import { coincident } from './check';
import { assemble } from './influence';
import { layLattice } from './lay';
import type { Lattice, LatticeControl, LatticeProblem } from './types';

/** Vortex strengths over stream speed for every unit case: row-major, panels by cases, controls behind them. */
export interface LatticeSolution {
  readonly lattice: Lattice;
  /** Cases base, alpha, pitch rate, then `pitching`. */
  readonly symmetric: Float64Array;
  /** Controls on mirrored surfaces. */
  readonly pitching: readonly LatticeControl[];
  /** Cases beta, roll rate, yaw rate, then `controls`; `null` when it was not asked for. */
  readonly antisymmetric: Float64Array | null;
  readonly controls: readonly LatticeControl[];
  /** For a further antisymmetric case; `null` like the circulations. */
  readonly antisymmetricFactors: Factors | null;
}

/**
 * What is kept from one solution to the next: the whole of it while surfaces and controls stay as they are, the factors as long as the
 * lattice does, whatever happens to controls. Belongs to the caller, who passes the same one for the same aircraft.
 */
export interface LatticeMemory {
  factors: {
    readonly lattice: Lattice;
    readonly symmetric: Factors;
    readonly antisymmetric: Factors | null;
  } | null;
  solved: { readonly problem: LatticeProblem; readonly solution: LatticeSolution } | null;
}

/** A memory with nothing in it. */
export const newLatticeMemory = (): LatticeMemory => ({ factors: null, solved: null });

/** Lays and solves the lattice. Problems: what the lattice refuses, surfaces that coincide, a configuration without lift. */
export function solveLattice(
  problem: LatticeProblem,
  depth: 'symmetric' | 'both',
  memory: LatticeMemory = newLatticeMemory(),
): Result<LatticeSolution> {
  const { solved } = memory;
  const enough = solved && (depth === 'symmetric' || solved.solution.antisymmetric);
  if (enough && sameContent(solved.problem, problem)) return { ok: true, value: solved.solution };
  const laid = layLattice(problem);
  if (!laid.ok) return laid;
  const lattice = laid.value;
  if (lattice.mirroredCount === 0) return refuse(noLift);
  const factors = factorsOf(lattice, depth, memory);
  if (!factors.ok) return factors;
  const solution = solutionOf(problem, lattice, factors.value);
  memory.solved = { problem, solution };
  return { ok: true, value: solution };
}

type FactorPair = NonNullable<LatticeMemory['factors']>;

function factorsOf(lattice: Lattice, depth: 'symmetric' | 'both', memory: LatticeMemory): Result<FactorPair> {
  const kept = memory.factors;
  if (kept && (depth === 'symmetric' || kept.antisymmetric) && sameLattice(kept.lattice, lattice))
    return { ok: true, value: kept };
  const fresh = factored(lattice, depth);
  if (!fresh.ok) return fresh;
  memory.factors = { lattice, ...fresh.value };
  return { ok: true, value: memory.factors };
}

function solutionOf(
  { controls, surfaces }: LatticeProblem,
  lattice: Lattice,
  { symmetric: one, antisymmetric: other }: Pick<FactorPair, 'symmetric' | 'antisymmetric'>,
): LatticeSolution {
  const pitching = controls.filter((c) => surfaces.some((s) => s.id === c.surfaceId && s.mirrored));
  const symmetric = symmetricSides(lattice, pitching);
  solve(one, symmetric, SYMMETRIC_CASES.length + pitching.length);
  const antisymmetric = other && antisymmetricSides(lattice, controls);
  if (other && antisymmetric) solve(other, antisymmetric, ANTISYMMETRIC_CASES.length + controls.length);
  return { lattice, symmetric, pitching, antisymmetric, controls, antisymmetricFactors: other };
}

function factored(
  lattice: Lattice,
  depth: 'symmetric' | 'both',
): Result<{ symmetric: Factors; antisymmetric: Factors | null }> {
  const influence = assemble(lattice, depth === 'both');
  const symmetric = factor(influence.symmetric, lattice.mirroredCount);
  if (!symmetric.ok) return refuse(coincident('surfaces'));
  if (!influence.antisymmetric) return { ok: true, value: { symmetric: symmetric.value, antisymmetric: null } };
  const antisymmetric = factor(influence.antisymmetric, lattice.count);
  if (!antisymmetric.ok) return refuse(coincident('surfaces'));
  return { ok: true, value: { symmetric: symmetric.value, antisymmetric: antisymmetric.value } };
}

/** True when every place, normal, family and junction is the same: then so is the matrix. */
function sameLattice(a: Lattice, b: Lattice): boolean {
  return (
    a.count === b.count &&
    a.mirroredCount === b.mirroredCount &&
    a.options.coreShare === b.options.coreShare &&
    a.options.parallel === b.options.parallel &&
    a.surfaces.length === b.surfaces.length &&
    a.surfaces.every((s, i) => {
      const other = b.surfaces[i];
      return (
        other !== undefined &&
        s.family === other.family &&
        sameMembers(s.touches, other.touches) &&
        s.rows === other.rows &&
        s.strips.length === other.strips.length &&
        s.firstPanel === other.firstPanel
      );
    }) &&
    sameNumbers(a.points, b.points) &&
    sameNumbers(a.normals, b.normals) &&
    sameNumbers(a.edgeY, b.edgeY) &&
    sameNumbers(a.edgeZ, b.edgeZ) &&
    sameNumbers(a.cornerX, b.cornerX)
  );
}

const sameMembers = (a: ReadonlySet<number>, b: ReadonlySet<number>) =>
  a.size === b.size && [...a].every((x) => b.has(x));

const sameNumbers = (a: Float64Array, b: Float64Array) => a.length === b.length && a.every((x, i) => x === b[i]);

/** Nothing gives lift when the aircraft pitches. */
export const noLift: Problem = {
  code: 'no-lifting-surface',
  path: 'surfaces',
  message: texts.problems.noLift,
  fix: texts.problems.noLiftFix,
};
