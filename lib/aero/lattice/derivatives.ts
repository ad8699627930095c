import { type Result, refuse } from '@/lib/numerics/result';
import { LEAST_LIFT_SLOPE } from '@/lib/numerics/tolerances';
import { ANTISYMMETRIC_CASES, SYMMETRIC_CASES } from './boundary';
import {
  type AntisymmetricEffect,
  type AntisymmetricSums,
  antisymmetricEffect,
  antisymmetricSums,
  type SymmetricEffect,
  type SymmetricSums,
  symmetricEffect,
  symmetricSums,
} from './coefficients';
import { type LatticeSolution, noLift, solveLattice } from './solve';
import type { Lattice, LatticeInput, LatticeReference } from './types';

/** All per radian, rates per q c / 2V, p b / 2V and r b / 2V; moments about the reference point. */
export interface SymmetricDerivatives {
  /** At no angle of attack: what incidence, twist and camber lift and pitch. */
  readonly base: SymmetricEffect;
  readonly alpha: SymmetricEffect;
  readonly pitchRate: SymmetricEffect;
  /** Per control, both sides trailing edge down. */
  readonly controls: ReadonlyMap<string, SymmetricEffect>;
  /** Where the lift due to angle of attack acts, along x. */
  readonly neutralPointX: number;
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
  readonly solution: LatticeSolution;
  readonly symmetric: SymmetricDerivatives;
  /** `null` when it was not asked for. */
  readonly antisymmetric: AntisymmetricDerivatives | null;
}

/**
 * Stability and control derivatives of the whole configuration, about the undisturbed stream along x: no compressibility, no
 * stall, no thickness, no wake relaxation, no alpha-dot term. What grows with lift in roll and yaw is in lateral.ts.
 * Problems: what the lattice refuses, surfaces that coincide, a configuration without lift.
 */
export function derivatives(input: LatticeInput, depth: 'symmetric' | 'both'): Result<Derivatives> {
  const solved = solveLattice(input, depth);
  return solved.ok ? derivativesAbout(solved.value, input.reference) : solved;
}

/** The same of a lattice that is solved already: only sums are left. Refused when nothing lifts. */
export function derivativesAbout(solution: LatticeSolution, reference: LatticeReference): Result<Derivatives> {
  const symmetric = symmetricSet(solution, reference);
  if (!(symmetric.alpha.lift > LEAST_LIFT_SLOPE)) return refuse(noLift);
  const antisymmetric = solution.antisymmetric ? antisymmetricSet(solution, solution.antisymmetric, reference) : null;
  return { ok: true, value: { lattice: solution.lattice, solution, symmetric, antisymmetric } };
}

function symmetricSet(
  { lattice, symmetric, pitching }: LatticeSolution,
  reference: LatticeReference,
): SymmetricDerivatives {
  const columns = SYMMETRIC_CASES.length + pitching.length;
  const [base = NONE, alpha = NONE, turn = NONE, ...controls] = symmetricSums(lattice, symmetric, columns);
  const effect = (sums: SymmetricSums) => symmetricEffect(sums, reference);
  const { point, chord } = reference;
  // About a place aft of the origin, turning also lets it sink; about one above, it moves it back.
  const rate = (pick: keyof SymmetricSums) =>
    (2 / chord) * (turn[pick] - point[0] * alpha[pick] + point[2] * base[pick]);
  const inAlpha = effect(alpha);
  return {
    base: effect(base),
    alpha: inAlpha,
    pitchRate: effect({ lift: rate('lift'), moment: rate('moment') }),
    controls: new Map(pitching.map((c, k) => [c.id, effect(controls[k] ?? NONE)])),
    neutralPointX: point[0] - (inAlpha.pitch / inAlpha.lift) * chord,
  };
}

const NONE: SymmetricSums = { lift: 0, moment: 0 };

function antisymmetricSet(
  { lattice, controls }: LatticeSolution,
  circulation: Float64Array,
  reference: LatticeReference,
): AntisymmetricDerivatives {
  const columns = ANTISYMMETRIC_CASES.length + controls.length;
  const [beta = STILL, roll = STILL, yaw = STILL, ...turned] = antisymmetricSums(lattice, circulation, columns);
  const effect = (sums: AntisymmetricSums) => antisymmetricEffect(sums, reference);
  const [rollMix, yawMix] = rateMixes(reference);
  const mixed = (rate: AntisymmetricSums, mix: number) => {
    const of = (pick: keyof AntisymmetricSums) => (2 / reference.span) * (rate[pick] + mix * beta[pick]);
    return effect({ side: of('side'), roll: of('roll'), yaw: of('yaw') });
  };
  return {
    beta: effect(beta),
    rollRate: mixed(roll, rollMix),
    yawRate: mixed(yaw, yawMix),
    controls: new Map(controls.map((c, k) => [c.id, effect(turned[k] ?? STILL)])),
  };
}

const STILL: AntisymmetricSums = { side: 0, roll: 0, yaw: 0 };

/** How much sideslip a roll and a yaw about the reference point hold against the same about the origin, per unit of the rate. */
export const rateMixes = ({ point }: LatticeReference): readonly [roll: number, yaw: number] => [-point[2], point[0]];
