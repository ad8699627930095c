import type { Material } from '@/lib/airframe/schema/stock';
import type { Control } from '@/lib/airframe/schema/surface';
import type { Problem } from '@/lib/numerics/result';
import type { Vec2 } from '@/lib/numerics/vec';
import { texts } from '@/lib/text/en/parts';
import { fill } from '@/lib/text/fill';
import type { Operation } from '../types';

// What a hinge does to the sheet. A hinge turns about one face (paper, single bevel) or about the middle (double bevel).

/** A bevel leaves this much more than the throw towards it, or the foam touches before the throw is reached. Common practice, no source. */
export const BEVEL_CLEARANCE_DEG = 10;

type SheetFace = 'upper' | 'lower';
export const oppositeFace = (face: SheetFace): SheetFace => (face === 'upper' ? 'lower' : 'upper');

/** Whether the control is a piece of its own. */
export function isSeparate(control: Control): boolean {
  const { kind } = control.hinge;
  switch (kind) {
    case 'paper':
    case 'flexible':
      return false;
    case 'tape':
    case 'pinned':
      return true;
  }
}

/** Both edges of the joint bevelled to the middle of the sheet: the hinge then turns about mid-thickness. */
export const isDoubleBevel = ({ hinge }: Control): boolean =>
  isSeparateKind(hinge.kind) && hinge.bevelDeg[0] > 0 && hinge.bevelDeg[1] > 0;

const isSeparateKind = (kind: Control['hinge']['kind']): boolean => kind === 'tape' || kind === 'pinned';

const bevelOn = (control: Control, face: SheetFace): number => control.hinge.bevelDeg[face === 'upper' ? 0 : 1];

/** How far the control turns from flat towards a face, degrees: its throw that way, its neutral setting counted in. */
function travelTowards({ throwsDeg, neutralDeg }: Control, face: SheetFace): number {
  return face === 'lower' ? throwsDeg.down + neutralDeg : throwsDeg.up - neutralDeg;
}

/** The faces that close as the control moves, which is where it needs a bevel. */
function closingFaces(control: Control): SheetFace[] {
  if (control.hinge.kind === 'flexible') return [];
  return isDoubleBevel(control) ? ['upper', 'lower'] : [oppositeFace(control.hinge.side)];
}

/** What is wrong with a hinge: too little bevel for the throw, or a paper hinge in a board without paper. `path` is the control's. */
export function hingeProblems(control: Control, material: Material, path: string): Problem[] {
  const problems: Problem[] = [];
  if (control.hinge.kind === 'paper' && material.kind !== 'paperFacedBoard') {
    problems.push({
      code: 'paper-hinge-needs-paper',
      path: `${path}.hinge.kind`,
      message: texts.problems.paperHingeNeedsPaper,
      fix: texts.problems.paperHingeNeedsPaperFix,
    });
  }
  for (const face of closingFaces(control)) {
    const need = travelTowards(control, face) + BEVEL_CLEARANCE_DEG;
    const has = bevelOn(control, face);
    if (travelTowards(control, face) <= 0 || has >= need) continue;
    problems.push({
      code: 'bevel-too-small',
      path: `${path}.hinge.bevelDeg.${face === 'upper' ? 0 : 1}`,
      message: fill(texts.problems.bevelTooSmall, { face: texts.faces[face], has, need }),
      fix: fill(texts.problems.bevelTooSmallFix, { need }),
    });
  }
  return problems;
}

/** Operations along the hinge on the fixed piece and on the moving piece; the same piece when the control stays on the sheet. */
export function hingeOperations(
  control: Control,
  line: readonly [Vec2, Vec2],
  thicknessMm: number,
  suffix: string,
): { fixed: Operation[]; moving: Operation[] } {
  const worked = oppositeFace(control.hinge.side);
  const name = (what: string): string => `${control.id}-${what}${suffix}`;
  const along = { path: line, closed: false };
  const angleDeg = worked === 'lower' ? control.neutralDeg : 0 - control.neutralDeg;
  const bevel = (face: SheetFace, depthMm: number): Operation[] =>
    bevelOn(control, face) > 0
      ? [{ ...along, id: name(`bevel-${face}`), kind: 'bevel', face, angleDeg: bevelOn(control, face), depthMm }]
      : [];
  switch (control.hinge.kind) {
    case 'paper': {
      const cut: Operation = {
        ...along,
        id: name('hinge'),
        kind: 'cutToPaper',
        face: worked,
        angleDeg,
        note: texts.notes.paperHinge,
      };
      return { fixed: [cut, ...bevel(worked, thicknessMm)], moving: [] };
    }
    case 'flexible': {
      const crease: Operation = { ...along, id: name('hinge'), kind: 'crease', face: worked, angleDeg };
      const grooves = bevel(worked, thicknessMm / 2).map((op) => ({ ...op, note: texts.notes.flexGroove }));
      return { fixed: [crease, ...grooves], moving: [] };
    }
    case 'tape':
    case 'pinned': {
      const double = isDoubleBevel(control);
      const bevels = double
        ? [...bevel('upper', thicknessMm / 2), ...bevel('lower', thicknessMm / 2)]
        : bevel(worked, thicknessMm);
      const faces: SheetFace[] = double ? ['upper', 'lower'] : [control.hinge.side];
      const marks = faces.map(
        (face): Operation =>
          control.hinge.kind === 'tape'
            ? { ...along, id: name(`tape-${face}`), kind: 'tape', face, sharedBy: 2, note: texts.notes.tapeHinge }
            : { ...along, id: name(`pins-${face}`), kind: 'reference', face, note: texts.notes.pinnedHinge },
      );
      return { fixed: marks, moving: [...bevels, ...marks] };
    }
  }
}
