import { factor, solve } from '@/lib/numerics/lu';
import { type Problem, type Result, refuse } from '@/lib/numerics/result';
import { LEAST_LIFT_SLOPE } from '@/lib/numerics/tolerances';
import { texts } from '@/lib/text/en/figures';
import { ANTISYMMETRIC_CASES, antisymmetricSides, SYMMETRIC_CASES, symmetricSides } from './boundary';
import { type AntisymmetricEffect, antisymmetricEffect, type SymmetricEffect, symmetricEffect } from './coefficients';
import { assemble } from './influence';
import { layLattice } from './lay';
import type { Lattice, LatticeControl, LatticeInput } from './types';

/** All per radian, rates per q c / 2V, p b / 2V and r b / 2V; moments about the reference point. */
export interface SymmetricDerivatives {
  /** At no angle of attack: what incidence and twist lift and pitch. */
  readonly base: SymmetricEffect;
  readonly alpha: SymmetricEffect;
  readonly pitchRate: SymmetricEffect;
  /** Per control, both sides trailing edge down. */
  readonly controls: ReadonlyMap<string, SymmetricEffect>;
  /** Where the lift due to angle of attack acts, along x. */
  readonly neutralPointX: number;
  /** Vortex strengths over stream speed: row-major, panels by the cases base, alpha, pitchRate, then the controls. */
  readonly circulation: Float64Array;
}

export interface AntisymmetricDerivatives {
  readonly beta: AntisymmetricEffect;
  readonly rollRate: AntisymmetricEffect;
  readonly yawRate: AntisymmetricEffect;
  /** Per control: starboard trailing edge down and port up; fins on the centre plane, trailing edge to starboard. */
  readonly controls: ReadonlyMap<string, AntisymmetricEffect>;
}

export interface Derivatives {
  readonly lattice: Lattice;
  readonly symmetric: SymmetricDerivatives;
  /** `null` when it was not asked for. */
  readonly antisymmetric: AntisymmetricDerivatives | null;
}

/**
 * Stability and control derivatives of the whole configuration, about the undisturbed stream along x: no compressibility, no
 * stall, no thickness, no wake relaxation, no alpha-dot term; roll and yaw terms that grow with lift (the sweep's part of the
 * rolling moment in sideslip, yaw by roll rate) are left out.
 * Problems: what the lattice refuses, surfaces that coincide, a configuration without lift.
 */
export function derivatives(input: LatticeInput, depth: 'symmetric' | 'both'): Result<Derivatives> {
  const laid = layLattice(input);
  if (!laid.ok) return laid;
  const lattice = laid.value;
  if (lattice.mirroredCount === 0) return refuse(noLift);
  const { symmetric, antisymmetric } = assemble(lattice, depth === 'both');
  const symmetricFactors = factor(symmetric, lattice.mirroredCount);
  if (!symmetricFactors.ok) return refuse(coincident);
  const controls = input.controls;
  const pitching = controls.filter((c) => input.surfaces.some((s) => s.id === c.surfaceId && s.mirrored));
  const circulation = symmetricSides(lattice, pitching);
  solve(symmetricFactors.value, circulation, SYMMETRIC_CASES.length + pitching.length);
  const inSymmetry = symmetricSet(lattice, pitching, circulation);
  if (!(inSymmetry.alpha.lift > LEAST_LIFT_SLOPE)) return refuse(noLift);
  if (!antisymmetric) return { ok: true, value: { lattice, symmetric: inSymmetry, antisymmetric: null } };
  const factors = factor(antisymmetric, lattice.count);
  if (!factors.ok) return refuse(coincident);
  const strengths = antisymmetricSides(lattice, controls);
  solve(factors.value, strengths, ANTISYMMETRIC_CASES.length + controls.length);
  return {
    ok: true,
    value: { lattice, symmetric: inSymmetry, antisymmetric: antisymmetricSet(lattice, controls, strengths) },
  };
}

const noLift: Problem = {
  code: 'no-lifting-surface',
  path: 'surfaces',
  message: texts.problems.noLift,
  fix: texts.problems.noLiftFix,
};

const coincident: Problem = {
  code: 'coincident-surfaces',
  path: 'surfaces',
  message: texts.problems.coincident,
  fix: texts.problems.coincidentFix,
};

function symmetricSet(
  lattice: Lattice,
  controls: readonly LatticeControl[],
  circulation: Float64Array,
): SymmetricDerivatives {
  const columns = SYMMETRIC_CASES.length + controls.length;
  const effect = (column: number) => symmetricEffect(lattice, circulation, columns, column);
  const alpha = effect(1);
  const { point, chord } = lattice.reference;
  return {
    base: effect(0),
    alpha,
    pitchRate: effect(2),
    controls: new Map(controls.map((c, k) => [c.id, effect(SYMMETRIC_CASES.length + k)])),
    neutralPointX: point[0] - (alpha.pitch / alpha.lift) * chord,
    circulation,
  };
}

function antisymmetricSet(
  lattice: Lattice,
  controls: readonly LatticeControl[],
  strengths: Float64Array,
): AntisymmetricDerivatives {
  const columns = ANTISYMMETRIC_CASES.length + controls.length;
  const effect = (column: number) => antisymmetricEffect(lattice, strengths, columns, column);
  return {
    beta: effect(0),
    rollRate: effect(1),
    yawRate: effect(2),
    controls: new Map(controls.map((c, k) => [c.id, effect(ANTISYMMETRIC_CASES.length + k)])),
  };
}
