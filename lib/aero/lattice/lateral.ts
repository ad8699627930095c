import { ANTISYMMETRIC_CASES, SYMMETRIC_CASES } from './boundary';
import type { AntisymmetricEffect } from './coefficients';
import { type AntisymmetricDerivatives, rateMixes } from './derivatives';
import { type FarField, stripCirculation, wash, washBack } from './farField';
import { PULLS, panelPulls, STREAMS } from './pulls';
import type { LatticeSolution } from './solve';
import type { Lattice, LatticeReference } from './types';
import { wakeSkewCirculation } from './wakeSkew';

// Roll and yaw at an angle of attack. The load that carries the aircraft meets a stream that sideslip, roll or yaw has turned, and the
// load that these bring meets the stream from below: the law of Kutta and Joukowski, force = circulation x local velocity, kept to first
// order in the disturbance (Katz & Plotkin, "Low-Speed Aerodynamics", section 12.1). The part that the vortices themselves induce is taken
// by strips as half of what their wake does far behind (Munk, NACA TR 121). Left out: the wake's curve in roll and yaw, and profile drag.
// All of it is linear in the circulations, so what does not depend on the flight state is worked out once for a solution.

/** Columns of the symmetric circulations that a state of steady flight is made of: all but the pitch rate. */
const stateColumns = ({ pitching }: LatticeSolution): number[] => [
  0,
  1,
  ...pitching.map((_, k) => SYMMETRIC_CASES.length + k),
];

/** What each of these counts for. */
const stateWeights = (
  { pitching }: LatticeSolution,
  alphaRad: number,
  deflectionsRad: ReadonlyMap<string, number>,
): number[] => [1, alphaRad, ...pitching.map(({ id }) => deflectionsRad.get(id) ?? 0)];

/** Some columns of circulations (row-major, `columns` wide) by themselves. */
function picked(matrix: Float64Array, columns: number, wanted: readonly number[]): Float64Array {
  const rows = matrix.length / columns;
  const out = new Float64Array(rows * wanted.length);
  for (let k = 0; k < wanted.length; k++)
    for (let i = 0; i < rows; i++) out[i * wanted.length + k] = matrix[i * columns + (wanted[k] ?? 0)] ?? 0;
  return out;
}

/** Sum of columns by their weights, row by row. */
function weighted(matrix: Float64Array, weights: readonly number[]): Float64Array {
  const columns = weights.length;
  const sums = new Float64Array(matrix.length / columns);
  for (let i = 0; i < sums.length; i++) {
    let sum = 0;
    for (let c = 0; c < columns; c++) sum += (weights[c] ?? 0) * (matrix[i * columns + c] ?? 0);
    sums[i] = sum;
  }
  return sums;
}

/** Force on each half of the half model in sums: side, roll about the x axis, yaw about the z axis; all about the origin. */
interface Sums {
  readonly side: number;
  readonly roll: number;
  readonly yaw: number;
}

const NONE: Sums = { side: 0, roll: 0, yaw: 0 };

/** What states of flight take from a solution, whichever they are. */
export interface LateralLoads {
  readonly solution: LatticeSolution;
  readonly field: FarField;
  /** Symmetric circulations of what a flight state is made of: row-major, panels by base, angle of attack and controls. */
  readonly parts: Float64Array;
  /** Antisymmetric ones that the slant of the wake brings to each of these in sideslip. */
  readonly skew: Float64Array;
  /** Antisymmetric circulations: row-major, panels by cases and controls. */
  readonly fresh: Float64Array;
  /** What a unit of each panel's circulation does in each of `STREAMS`. */
  readonly pulls: Float64Array;
}

/** Prepares a solution for `lateralAt`. Throws RangeError for one without the antisymmetric part. */
export function lateralLoads(solution: LatticeSolution, field: FarField): LateralLoads {
  const { antisymmetric, antisymmetricFactors, lattice, symmetric, pitching } = solution;
  if (!antisymmetric || !antisymmetricFactors) throw new RangeError('roll and yaw need the antisymmetric solution');
  const columns = stateColumns(solution);
  const parts = picked(symmetric, SYMMETRIC_CASES.length + pitching.length, columns);
  const skew = wakeSkewCirculation(lattice, antisymmetricFactors, parts, columns.length);
  return { solution, field, parts, skew, fresh: antisymmetric, pulls: panelPulls(lattice) };
}

/** Symmetric circulations of one flight state, panel by panel, over stream speed. */
export const stateCirculation = (
  { solution, parts }: LateralLoads,
  alphaRad: number,
  deflectionsRad: ReadonlyMap<string, number>,
): Float64Array => weighted(parts, stateWeights(solution, alphaRad, deflectionsRad));

/**
 * Derivatives in roll and yaw about the reference point at a flight state, in stability axes: rates and moments turn with the angle of
 * attack (Etkin & Reid, "Dynamics of Flight", app. B).
 */
export function lateralAt(
  loads: LateralLoads,
  reference: LatticeReference,
  alphaRad: number,
  deflectionsRad: ReadonlyMap<string, number>,
): AntisymmetricDerivatives {
  const { solution, fresh, skew, parts } = loads;
  const { controls } = solution;
  const weights = stateWeights(solution, alphaRad, deflectionsRad);
  const carried = weighted(parts, weights);
  const pulls = freshPulls(loads, carried, alphaRad);
  const cases = freshSums(pulls, fresh, ANTISYMMETRIC_CASES.length + controls.length);
  const [beta = NONE, roll = NONE, yaw = NONE, ...turned] = cases;
  const [slanted = NONE] = freshSums(pulls, weighted(skew, weights), 1);
  const turnedStream = (stream: number, own: Sums) => combine([1, own], [1, carriedSums(loads.pulls, carried, stream)]);
  const sums = {
    skew: slanted,
    beta: turnedStream(STREAMS.beta, beta),
    roll: turnedStream(STREAMS.roll, roll),
    yaw: turnedStream(STREAMS.yaw, yaw),
    turned,
  };
  return inStabilityAxes(sums, reference, alphaRad, solution);
}

/** What a unit of fresh circulation does on each panel at a flight state: side, roll, yaw. */
function freshPulls({ solution, field, pulls }: LateralLoads, carried: Float64Array, alphaRad: number): Float64Array {
  const { lattice } = solution;
  const ofState = new Float64Array(lattice.count * 3);
  for (let panel = 0; panel < lattice.count; panel++)
    for (let k = 0; k < 3; k++) {
      const at = panel * PULLS + k;
      ofState[panel * 3 + k] = (pulls[at + STREAMS.along] ?? 0) + alphaRad * (pulls[at + STREAMS.up] ?? 0);
    }
  addInduced(lattice, inducedYaw(lattice, field, carried), ofState);
  return ofState;
}

/**
 * Yaw by half of the wake's own wash, per unit of a strip's fresh circulation: fresh load in the wash of the load of flight, and the load of
 * flight in the wash of the fresh one.
 */
function inducedYaw(lattice: Lattice, field: FarField, carried: Float64Array): Float64Array {
  const load = stripCirculation(lattice, carried, 1, 0);
  const yaw = wash(field.symmetric, load);
  let s = 0;
  for (const { input, strips } of lattice.surfaces)
    for (const { width, inner, outer } of strips) {
      const arm = ((input.mirrored ? 2 : 1) * (width / 2) * (inner.le[1] + outer.le[1])) / 2;
      yaw[s] = (yaw[s] ?? 0) * arm;
      load[s] = (load[s] ?? 0) * arm;
      s++;
    }
  const other = washBack(field.antisymmetric, load);
  for (let i = 0; i < s; i++) yaw[i] = (yaw[i] ?? 0) + (other[i] ?? 0);
  return yaw;
}

/** Adds each strip's yaw to all of its panels. */
function addInduced({ surfaces }: Lattice, yaw: Float64Array, pulls: Float64Array): void {
  let s = 0;
  for (const { strips, rows, firstPanel } of surfaces)
    for (let k = 0; k < strips.length; k++, s++)
      for (let panel = firstPanel + k * rows; panel < firstPanel + (k + 1) * rows; panel++)
        pulls[panel * 3 + 2] = (pulls[panel * 3 + 2] ?? 0) + (yaw[s] ?? 0);
}

/** Sums of every column of fresh circulations. */
function freshSums(pulls: Float64Array, fresh: Float64Array, columns: number): Sums[] {
  const sums = new Float64Array(columns * 3);
  for (let panel = 0; panel * 3 < pulls.length; panel++) {
    const side = pulls[panel * 3] ?? 0;
    const roll = pulls[panel * 3 + 1] ?? 0;
    const yaw = pulls[panel * 3 + 2] ?? 0;
    for (let c = 0; c < columns; c++) {
      const strength = fresh[panel * columns + c] ?? 0;
      sums[c * 3] = (sums[c * 3] ?? 0) + strength * side;
      sums[c * 3 + 1] = (sums[c * 3 + 1] ?? 0) + strength * roll;
      sums[c * 3 + 2] = (sums[c * 3 + 2] ?? 0) + strength * yaw;
    }
  }
  return Array.from({ length: columns }, (_, c) => sumsAt(sums, c * 3));
}

/** What the load of flight does in a stream. */
function carriedSums(pulls: Float64Array, carried: Float64Array, stream: number): Sums {
  let side = 0;
  let roll = 0;
  let yaw = 0;
  for (let panel = 0; panel < carried.length; panel++) {
    const strength = carried[panel] ?? 0;
    const at = panel * PULLS + stream;
    side += strength * (pulls[at] ?? 0);
    roll += strength * (pulls[at + 1] ?? 0);
    yaw += strength * (pulls[at + 2] ?? 0);
  }
  return { side, roll, yaw };
}

const sumsAt = (sums: Float64Array, at: number): Sums => ({
  side: sums[at] ?? 0,
  roll: sums[at + 1] ?? 0,
  yaw: sums[at + 2] ?? 0,
});

function combine(...terms: readonly (readonly [weight: number, sums: Sums])[]): Sums {
  const of = (pick: keyof Sums) => terms.reduce((sum, [weight, each]) => sum + weight * each[pick], 0);
  return { side: of('side'), roll: of('roll'), yaw: of('yaw') };
}

interface Cases {
  readonly skew: Sums;
  readonly beta: Sums;
  readonly roll: Sums;
  readonly yaw: Sums;
  /** By control. */
  readonly turned: readonly Sums[];
}

function inStabilityAxes(
  { skew, beta, roll, yaw, turned }: Cases,
  reference: LatticeReference,
  alphaRad: number,
  { controls }: LatticeSolution,
): AntisymmetricDerivatives {
  const [cos, sin] = [Math.cos(alphaRad), Math.sin(alphaRad)];
  const [rollMix, yawMix] = rateMixes(reference);
  const { area, span, point } = reference;
  const effect = (sums: Sums): AntisymmetricEffect => {
    const bodyRoll = (-2 / (area * span)) * (sums.roll + point[2] * sums.side);
    const bodyYaw = (-2 / (area * span)) * (sums.yaw - point[0] * sums.side);
    return {
      side: (2 / area) * sums.side,
      roll: bodyRoll * cos + bodyYaw * sin,
      yaw: bodyYaw * cos - bodyRoll * sin,
    };
  };
  // About another point a rate is also a sideslip, but its wake does not lie aslant.
  const bodyRate = (rate: Sums, mix: number) => combine([2 / span, rate], [(2 / span) * mix, beta]);
  const [p, r] = [bodyRate(roll, rollMix), bodyRate(yaw, yawMix)];
  return {
    beta: effect(combine([1, beta], [1, skew])),
    rollRate: effect(combine([cos, p], [sin, r])),
    yawRate: effect(combine([cos, r], [-sin, p])),
    controls: new Map(controls.map(({ id }, k) => [id, effect(turned[k] ?? NONE)])),
  };
}
