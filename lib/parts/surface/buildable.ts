import type { ResolvedPanel, ResolvedSurface } from '@/lib/airframe/resolved';
import type { Material } from '@/lib/airframe/schema/stock';
import { notBuiltYet, type Problem } from '@/lib/numerics/result';
import { SAME_POINT_MM } from '@/lib/numerics/tolerances';
import { texts } from '@/lib/text/en/parts';
import { fill } from '@/lib/text/fill';
import { trimmedDigits } from '@/lib/units/number';

/** What of a surface can be cut from flat sheet or folded from it, and what stands in the way of the rest. */
export function buildablePanels(
  resolved: ResolvedSurface,
  materials: ReadonlyMap<string, Material>,
): { flat: ResolvedPanel[]; folded: ResolvedPanel[]; problems: Problem[] } {
  const base = `surfaces.${resolved.index}`;
  const problems: Problem[] = [];
  const buildable = resolved.panels.filter(({ panel, index }) => {
    const path = `${base}.panels.${index}`;
    const before = resolved.panels[index - 1]?.panel;
    if (before && Math.abs(before.tipChordMm - panel.rootChordMm) > SAME_POINT_MM) {
      const message = fill(texts.problems.chordStep, {
        here: trimmedDigits(panel.rootChordMm, 2),
        before: trimmedDigits(before.tipChordMm, 2),
      });
      problems.push({ code: 'chord-step', path: `${path}.rootChordMm`, message, fix: texts.problems.chordStepFix });
    }
    if (panel.joint === 'gusset' || panel.joint === 'rib') {
      problems.push(notBuiltYet(`${path}.joint`, fill(texts.notBuilt.jointKind, { joint: panel.joint })));
    }
    if (!materials.has(panel.materialId)) {
      const message = fill(texts.problems.unknownMaterial, { id: panel.materialId });
      problems.push({ code: 'unknown-reference', path: `${path}.materialId`, message });
      return false;
    }
    if (panel.section.kind !== 'flat' && panel.section.kind !== 'folded') {
      problems.push(
        notBuiltYet(`${path}.section.kind`, fill(texts.notBuilt.sectionKind, { kind: panel.section.kind })),
      );
      return false;
    }
    if (panel.washoutDeg !== 0) {
      problems.push(notBuiltYet(`${path}.washoutDeg`, texts.notBuilt.washout));
      return false;
    }
    return true;
  });
  if (resolved.surface.ribs.length > 0) problems.push(notBuiltYet(`${base}.ribs`, texts.notBuilt.ribs));
  const folded = buildable.filter(({ panel }) => panel.section.kind === 'folded');
  return { flat: buildable.filter((panel) => !folded.includes(panel)), folded, problems };
}
