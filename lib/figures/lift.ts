import { type Derivatives, derivatives } from '@/lib/aero/lattice/derivatives';
import { airframeLattice } from '@/lib/aero/lattice/fromAirframe';
import type { ResolvedAirframe } from '@/lib/airframe/resolved';
import type { Airframe } from '@/lib/airframe/schema/airframe';
import { notBuiltYet, type Problem, type Result } from '@/lib/numerics/result';
import type { Vec3 } from '@/lib/numerics/vec';
import { texts } from '@/lib/text/en/figures';
import type { WingReference } from './reference';

/** Derivatives of the whole aircraft about a point; problems point into the document. */
export function liftOf(
  airframe: Airframe,
  resolved: ResolvedAirframe,
  wing: WingReference,
  point: Vec3,
  depth: 'symmetric' | 'both',
): Result<Derivatives> {
  const reference = { area: wing.areaMm2, chord: wing.macMm, span: wing.spanMm, point };
  const result = derivatives({ ...airframeLattice(airframe, resolved), reference }, depth);
  if (result.ok) return result;
  const indexOf = (id: string) => airframe.surfaces.findIndex((surface) => surface.id === id);
  return {
    ok: false,
    problems: result.problems.map((p) => (indexOf(p.path) >= 0 ? { ...p, path: `surfaces.${indexOf(p.path)}` } : p)),
  };
}

/** Sections whose own lift the lattice leaves out so far. */
export function sectionProblems(airframe: Airframe): Problem[] {
  return airframe.surfaces.flatMap(({ panels }, s) =>
    panels.flatMap(({ section }, p) =>
      section.kind === 'flat' ? [] : [notBuiltYet(`surfaces.${s}.panels.${p}.section`, texts.problems.sectionAsFlat)],
    ),
  );
}
