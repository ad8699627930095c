import type { ResolvedAirframe } from '@/lib/airframe/resolved';
import type { Airframe } from '@/lib/airframe/schema/airframe';
import { ok, type Result } from '@/lib/numerics/result';
import type { Vec3 } from '@/lib/numerics/vec';
import type { Corrections } from './corrections';
import { SYMMETRIC_CASES } from './lattice/boundary';
import { derivativesAbout, type SymmetricDerivatives } from './lattice/derivatives';
import { farField, inducedDragOf, stripCirculation } from './lattice/farField';
import { airframeLattice } from './lattice/fromAirframe';
import { symmetricFlow } from './lattice/influence';
import { type LateralLoads, lateralAt, lateralLoads, stateCirculation } from './lattice/lateral';
import { type LatticeMemory, type LatticeSolution, newLatticeMemory, solveLattice } from './lattice/solve';
import type { LatticeReference } from './lattice/types';
import type {
  AeroModel,
  AntisymmetricEffect,
  Contribution,
  LateralDerivatives,
  SymmetricEffect,
  SymmetricState,
} from './model';
import { crossForceAreaMm2 } from './propellerForce';
import { bodyCouples } from './slenderBody';

/** What a body or a set of propellers adds; rates as in the model. */
interface Addition extends Contribution {
  readonly pitchRate: SymmetricEffect;
  readonly yawRate: AntisymmetricEffect;
}

/** What is kept from one aircraft to the next. Belongs to the caller. */
export interface AeroMemory {
  readonly lattice: LatticeMemory;
  /** Of the solution that stands in them. */
  loads: LateralLoads | null;
}

/** A memory with nothing in it. */
export const newAeroMemory = (): AeroMemory => ({ lattice: newLatticeMemory(), loads: null });

/**
 * Aerodynamics of the whole aircraft about a point: the lattice of all surfaces, bodies by slender-body theory, propellers and fans by the
 * force across their discs. Problems: what the lattice refuses; their paths are surface ids or "surfaces".
 * @param memory what does not change from one call to the next is not worked out again
 */
export function wholeAircraft(
  airframe: Airframe,
  resolved: ResolvedAirframe,
  reference: LatticeReference,
  corrections: Corrections,
  memory: AeroMemory = newAeroMemory(),
): Result<AeroModel> {
  const problem = airframeLattice(airframe, resolved);
  const solved = solveLattice(problem, 'both', memory.lattice);
  if (!solved.ok) return solved;
  const solution = solved.value;
  const found = derivativesAbout(solution, reference);
  if (!found.ok) return found;
  const wings = problem.surfaces.filter((_, i) => resolved.surfaces[i]?.surface.role === 'wing');
  const upwash = upwashOf(solution);
  const additions = [
    ...(corrections.bodies
      ? [
          bodyAddition(
            airframe,
            resolved,
            wings.map(({ sections }) => sections),
            upwash,
            reference,
          ),
        ]
      : []),
    ...(corrections.propellers ? [propellerAddition(airframe, resolved, upwash, reference)] : []),
  ];
  const loads = memory.loads?.solution === solution ? memory.loads : lateralLoads(solution, farField(solution.lattice));
  memory.loads = loads;
  return ok(modelOf(loads, reference, found.value.symmetric, additions));
}

/** What the surfaces add to one radian of angle of attack at a place, in radians. */
function upwashOf({ lattice, symmetric, pitching }: LatticeSolution): (at: Vec3) => number {
  const flow = symmetricFlow(lattice, symmetric, SYMMETRIC_CASES.length + pitching.length, 1);
  return (at) => flow(at, [0, 0, 1]);
}

const NO_LIFT: SymmetricEffect = { lift: 0, pitch: 0 };
const NO_SIDE: AntisymmetricEffect = { side: 0, roll: 0, yaw: 0 };

function bodyAddition(
  airframe: Airframe,
  resolved: ResolvedAirframe,
  wings: Parameters<typeof bodyCouples>[2],
  upwash: (at: Vec3) => number,
  { area, chord, span }: LatticeReference,
): Addition {
  const { pitchMm3, yawMm3 } = bodyCouples(airframe, resolved, wings, upwash);
  return {
    name: 'bodies',
    alpha: { lift: 0, pitch: pitchMm3 / (area * chord) },
    beta: { side: 0, roll: 0, yaw: -yawMm3 / (area * span) },
    pitchRate: NO_LIFT,
    yawRate: NO_SIDE,
  };
}

function propellerAddition(
  airframe: Airframe,
  { places }: ResolvedAirframe,
  upwash: (at: Vec3) => number,
  { area, chord, span, point }: LatticeReference,
): Addition {
  let [alpha, pitchRate, beta, yawRate] = [NO_LIFT, NO_LIFT, NO_SIDE, NO_SIDE];
  for (const drive of airframe.drives) {
    const at = places.get(drive.id)?.at;
    if (!at) throw new RangeError(`drive ${drive.id} has no place`);
    const share = (crossForceAreaMm2(drive) * (drive.mirrored ? 2 : 1)) / area;
    const [aft, up] = [at[0] - point[0], at[2] - point[2]];
    const lifted = (lift: number): SymmetricEffect => ({ lift, pitch: (-lift * aft) / chord });
    const pushed = (side: number): AntisymmetricEffect => ({
      side,
      roll: (side * up) / span,
      yaw: (-side * aft) / span,
    });
    alpha = sum2(alpha, lifted(share * (1 + upwash(at))));
    pitchRate = sum2(pitchRate, lifted((share * 2 * aft) / chord));
    beta = sum3(beta, pushed(-share));
    yawRate = sum3(yawRate, pushed((share * 2 * aft) / span));
  }
  return { name: 'propellers', alpha, beta, pitchRate, yawRate };
}

const sum2 = (a: SymmetricEffect, b: SymmetricEffect): SymmetricEffect => ({
  lift: a.lift + b.lift,
  pitch: a.pitch + b.pitch,
});
const sum3 = (a: AntisymmetricEffect, b: AntisymmetricEffect): AntisymmetricEffect => ({
  side: a.side + b.side,
  roll: a.roll + b.roll,
  yaw: a.yaw + b.yaw,
});

function modelOf(
  loads: LateralLoads,
  reference: LatticeReference,
  surfaces: SymmetricDerivatives,
  additions: readonly Addition[],
): AeroModel {
  const { solution, field } = loads;
  const { lattice } = solution;
  const { area, chord, span, point } = reference;
  const columns = SYMMETRIC_CASES.length + solution.pitching.length;
  const byAlpha = stripCirculation(lattice, solution.symmetric, columns, 1);
  const alpha = additions.reduce((sum, each) => sum2(sum, each.alpha), surfaces.alpha);
  const inducedDrag = ({ alphaRad, deflectionsRad }: SymmetricState) =>
    inducedDragOf(field, stripCirculation(lattice, stateCirculation(loads, alphaRad, deflectionsRad), 1, 0), area);
  const lateral = ({ alphaRad, deflectionsRad }: SymmetricState): LateralDerivatives => {
    const own = lateralAt(loads, reference, alphaRad, deflectionsRad);
    return {
      ...own,
      beta: additions.reduce((sum, each) => sum3(sum, each.beta), own.beta),
      yawRate: additions.reduce((sum, each) => sum3(sum, each.yawRate), own.yawRate),
    };
  };
  // Worked out when it is first asked for: no figure that follows a handle needs it.
  const surfacesBeta = once(() => lateralAt(loads, reference, 0, new Map()).beta);
  return {
    reference,
    base: surfaces.base,
    alpha,
    pitchRate: additions.reduce((sum, each) => sum2(sum, each.pitchRate), surfaces.pitchRate),
    controls: surfaces.controls,
    neutralPointX: point[0] - (alpha.pitch / alpha.lift) * chord,
    contributions: [
      {
        name: 'surfaces',
        alpha: surfaces.alpha,
        get beta() {
          return surfacesBeta();
        },
      },
      ...additions.map(({ name, alpha: a, beta }) => ({ name, alpha: a, beta })),
    ],
    lateral,
    inducedDrag,
    spanEfficiency: surfaces.alpha.lift ** 2 / (Math.PI * (span ** 2 / area) * inducedDragOf(field, byAlpha, area)),
  };
}

function once<T>(work: () => T): () => T {
  let found: { readonly value: T } | null = null;
  return () => {
    found ??= { value: work() };
    return found.value;
  };
}
