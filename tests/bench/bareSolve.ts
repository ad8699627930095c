import { ANTISYMMETRIC_CASES, antisymmetricSides, SYMMETRIC_CASES, symmetricSides } from '@/lib/aero/lattice/boundary';
import { assemble } from '@/lib/aero/lattice/influence';
import { layLattice } from '@/lib/aero/lattice/lay';
import type { Lattice, LatticeInput } from '@/lib/aero/lattice/types';
import { type Factors, factor, solve } from '@/lib/numerics/lu';
import type { Result } from '@/lib/numerics/result';

/** A laid lattice, which must be sound. */
export const lay = (input: LatticeInput): Lattice => sound(layLattice(input));

/** What cannot be done without: assembly and both solves with every right-hand side, on a lattice that is laid already. */
export function bareSolve(lattice: Lattice, input: LatticeInput): void {
  const { symmetric, antisymmetric } = assemble(lattice, true);
  if (!antisymmetric) throw new RangeError('no antisymmetric case');
  const pitching = input.controls.filter((c) => input.surfaces.some((s) => s.id === c.surfaceId && s.mirrored));
  const one: Factors = sound(factor(symmetric, lattice.mirroredCount));
  solve(one, symmetricSides(lattice, pitching), SYMMETRIC_CASES.length + pitching.length);
  const other: Factors = sound(factor(antisymmetric, lattice.count));
  solve(other, antisymmetricSides(lattice, input.controls), ANTISYMMETRIC_CASES.length + input.controls.length);
}

function sound<T>(result: Result<T>): T {
  if (!result.ok) throw new RangeError(result.problems[0]?.message ?? 'refused');
  return result.value;
}
