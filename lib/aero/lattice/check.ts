import type { Problem } from '@/lib/numerics/result';
import { CENTRE_PLANE_SHARE } from '@/lib/numerics/tolerances';
import { texts } from '@/lib/text/en/figures';
import { sectionLengths } from './stations';
import type { LatticeSurface } from './types';

/** What keeps a surface out of the lattice; the path is the surface's id. */
export function surfaceProblems(surface: LatticeSurface): Problem[] {
  const bad = (code: string, message: string): Problem[] => [{ code, path: surface.id, message }];
  const { sections, mirrored } = surface;
  const numbers = sections.flatMap((s) => [...s.le, s.chord, s.incidenceRad]);
  if (!numbers.every(Number.isFinite)) return bad('surface-not-finite', texts.problems.surfaceNotFinite);
  const length = sectionLengths(sections).at(-1) ?? 0;
  if (sections.length < 2 || !(length > 0)) return bad('surface-without-length', texts.problems.surfaceWithoutLength);
  if (sections.some((s) => s.chord < 0) || !sections.some((s) => s.chord > 0))
    return bad('surface-without-chord', texts.problems.surfaceWithoutChord);
  const onCentre = sections.every((s) => Math.abs(s.le[1]) <= length * CENTRE_PLANE_SHARE);
  if (!mirrored && !onCentre) return bad('surface-one-sided', texts.problems.surfaceOneSided);
  if (mirrored && onCentre) return bad('surface-doubled', texts.problems.surfaceDoubled);
  return [];
}
