import type { Problem } from '@/lib/numerics/result';
import { CENTRE_PLANE_SHARE } from '@/lib/numerics/tolerances';
import { texts } from '@/lib/text/en/figures';
import { foldsOnItself, liesIn, slices } from './junctions';
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
  if (foldsOnItself(sections)) return [{ ...selfFolded, path: surface.id }];
  return [];
}

const selfFolded = {
  code: 'surface-folds-on-itself',
  message: texts.problems.foldsOnItself,
  fix: texts.problems.foldsOnItselfFix,
};

/** What keeps two surfaces from being worked out side by side; the path is the later one's id. */
export function pairProblems(surfaces: readonly LatticeSurface[]): Problem[] {
  return surfaces.flatMap((later, i) =>
    surfaces.slice(0, i).flatMap((earlier): Problem[] => {
      if (liesIn(later, earlier) || liesIn(earlier, later)) return [coincident(later.id)];
      if (!slices(earlier, later)) return [];
      const { surfacesCross, surfacesCrossFix } = texts.problems;
      return [{ code: 'surfaces-cross', path: later.id, message: surfacesCross, fix: surfacesCrossFix }];
    }),
  );
}

/** Two surfaces in one place. */
export const coincident = (path: string): Problem => ({
  code: 'coincident-surfaces',
  path,
  message: texts.problems.coincident,
  fix: texts.problems.coincidentFix,
});
