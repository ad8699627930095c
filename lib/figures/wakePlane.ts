import { cutAt } from '@/lib/aero/lattice/stations';
import type { LatticeSection } from '@/lib/aero/lattice/types';
import type { Problem } from '@/lib/numerics/result';
import { texts } from '@/lib/text/en/figures';
import type { SurfaceArea } from './reference';

/** A surface this close to the plane of a wing ahead of it, mm, all along, lies in its wake: less than a sheet sags. */
const IN_PLANE_MM = 0.5;

/** Surfaces that fly exactly in the wake of a wing ahead of them; the figures stand, with what is to be said of them. */
export function wakePlaneProblems(surfaces: readonly SurfaceArea[]): Problem[] {
  const wings = surfaces.filter(({ surface }) => surface.role === 'wing' && surface.mirrored);
  return surfaces
    .filter(
      ({ surface, sections }) =>
        surface.role === 'tailplane' && wings.some((wing) => isBehind(sections, wing.sections)),
    )
    .map(({ index }) => ({
      code: 'tail-in-wake-plane',
      path: `surfaces.${index}.mount`,
      message: texts.problems.wakePlane,
      fix: texts.problems.wakePlaneFix,
    }));
}

function isBehind(tail: readonly LatticeSection[], wing: readonly LatticeSection[]): boolean {
  const spans = wing.map(({ le }) => le[1]);
  const [root, tip] = [spans[0] ?? 0, spans.at(-1) ?? 0];
  return tail.every(({ le: [x, y, z] }) => {
    if (y < root || y > tip) return false;
    const ahead = cutAt(wing, spans, y);
    return Math.abs(ahead.le[2] - z) < IN_PLANE_MM && x >= ahead.le[0] + ahead.chord;
  });
}
