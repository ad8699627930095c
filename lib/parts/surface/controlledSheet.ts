import type { ResolvedControl } from '@/lib/airframe/resolved';
import type { Problem } from '@/lib/numerics/result';
import type { Vec2 } from '@/lib/numerics/vec';
import { texts } from '@/lib/text/en/parts';
import { fill } from '@/lib/text/fill';
import { trimmedDigits } from '@/lib/units/number';
import { cutRing } from '../shape/cut';
import { beginAt, mirror2 } from '../shape/ring';
import type { Operation } from '../types';
import { type ControlCut, controlCut, type EndKind, gapPaths, goesThrough, partingPaths, slits } from './control';
import { hingeOperations, hingeProblems, isSeparate } from './hinge';
import type { Run } from './run';
import { ringOf, type Strip } from './strip';

/** A control that is a piece of its own. `centre`: it spans both sides. */
export interface MovingPiece {
  readonly control: ResolvedControl;
  readonly outline: readonly Vec2[];
  readonly operations: readonly Operation[];
  readonly centre: boolean;
}

/** A flat piece with its controls cut free. */
export interface ControlledSheet {
  /** What is cut from the board as the sheet, hinged controls on it. */
  readonly outline: Vec2[];
  /** What of it stays put: no spar or boom may reach beyond. */
  readonly solid: Vec2[];
  readonly operations: readonly Operation[];
  readonly moving: readonly MovingPiece[];
  readonly problems: readonly Problem[];
}

interface Ends {
  readonly rootSeam: boolean;
  readonly tipSeam: boolean;
}

const SAME_STATION = 1e-9;

function endKinds(run: Run, control: ResolvedControl, ends: Ends): readonly [EndKind, EndKind] {
  const start = run.panels[0]?.root.station ?? 0;
  const end = run.panels.at(-1)?.tip.station ?? 1;
  const atRoot = control.control.from - start < SAME_STATION;
  const atTip = end - control.control.to < SAME_STATION;
  const across: EndKind = goesThrough(control, run.frame) ? 'through' : 'centreGap';
  const root: EndKind = run.centre ? across : ends.rootSeam ? 'seam' : 'free';
  return [atRoot ? root : 'inside', atTip ? (ends.tipSeam ? 'seam' : 'free') : 'inside'];
}

/** The controls that lie on this piece, inner first, and a problem for each that begins on it and runs off it. */
function controlsHere(
  run: Run,
  controls: readonly ResolvedControl[],
): { here: ResolvedControl[]; problems: Problem[] } {
  const start = run.panels[0]?.root.station ?? 0;
  const end = run.panels.at(-1)?.tip.station ?? 1;
  const begin = controls.filter(
    ({ control }) =>
      control.kind !== 'allMoving' && control.from > start - SAME_STATION && control.from < end - SAME_STATION,
  );
  const problems = begin
    .filter(({ control }) => control.to > end + SAME_STATION)
    .map((crossing): Problem => {
      const path = `surfaces.${run.surface.index}.controls.${run.surface.surface.controls.indexOf(crossing.control)}.to`;
      const fix = fill(texts.problems.controlAcrossJointFix, { station: trimmedDigits(end, 4) });
      return { code: 'control-across-joint', path, message: texts.problems.controlAcrossJoint, fix };
    });
  const here = begin.filter(({ control }) => control.to <= end + SAME_STATION);
  return { here: here.sort((a, b) => a.control.from - b.control.from), problems };
}

/** What is left of a sheet when what lies to the right of each path is taken off; null when a path does not end on its edge. */
function cutOff(ring: readonly Vec2[], paths: readonly (readonly Vec2[])[]): Vec2[] | null {
  let left: Vec2[] = [...ring];
  for (const path of paths) {
    const cut = cutRing(left, path);
    if (!cut) return null;
    left = cut.left;
  }
  return left;
}

function slitOperations(cut: ControlCut, id: string, run: Run, face: 'upper' | 'lower'): Operation[] {
  const own = slits(cut);
  const paths = run.centre ? [...own, ...own.map((path) => path.map(mirror2))] : own;
  return paths.map((path, index) => ({
    id: `${id}-end-${index + 1}`,
    kind: 'cut',
    path,
    closed: false,
    face,
    note: texts.notes.slit,
  }));
}

/** Hinge operations on the sheet, and the piece that comes off it; null when the control does not end on the sheet's edge. */
function parted(run: Run, control: ResolvedControl, cut: ControlCut, solid: readonly Vec2[]) {
  const { thicknessMm } = run.material;
  const own = hingeOperations(control.control, cut.hinge, thicknessMm, '');
  const twoHinges = run.centre && cut.joined !== 'through';
  const [from, to] = cut.hinge;
  const other = hingeOperations(control.control, [mirror2(to), mirror2(from)], thicknessMm, '-port');
  const operations = twoHinges ? [...own.fixed, ...other.fixed] : own.fixed;
  if (!isSeparate(control.control)) return { operations, moving: [] };
  // The port half of a pair is the mirror of this one, made when the parts are.
  const [path] = partingPaths(cut, 'moving', run.centre);
  const piece = path && cutRing(solid, path);
  if (!piece) return null;
  const centre = run.centre && cut.joined === 'through';
  const moving: MovingPiece[] = [{ control, outline: piece.right, operations: own.moving, centre }];
  return { operations, moving };
}

interface Sheet {
  readonly outline: Vec2[];
  readonly solid: Vec2[];
  readonly operations: readonly Operation[];
  readonly moving: readonly MovingPiece[];
}

/** The sheet with one more control cut free, or null when the control does not end on the sheet's edge. */
function freed(sheet: Sheet, run: Run, strip: Strip, control: ResolvedControl, ends: Ends): Sheet | null {
  const cut = controlCut({ ring: sheet.solid, strip, control, frame: run.frame }, endKinds(run, control, ends));
  const pieces = cut && parted(run, control, cut, sheet.solid);
  if (!cut || !pieces) return null;
  const separate = isSeparate(control.control);
  const parting = partingPaths(cut, 'fixed', run.centre);
  const solid = cutOff(sheet.solid, parting);
  const outline = cutOff(sheet.outline, separate ? parting : gapPaths(cut, run.centre));
  if (!solid || !outline) return null;
  const slitted = separate ? [] : slitOperations(cut, control.control.id, run, control.control.hinge.side);
  return {
    outline,
    solid,
    operations: [...sheet.operations, ...pieces.operations, ...slitted],
    moving: [...sheet.moving, ...pieces.moving],
  };
}

/** Cuts the controls of a flat piece free: slots at the ends of those that stay on it, whole pieces of those that do not. */
export function controlledSheet(
  run: Run,
  strip: Strip,
  controls: readonly ResolvedControl[],
  ends: Ends,
): ControlledSheet {
  const whole = ringOf(strip, run.centre);
  const { here, problems: crossing } = controlsHere(run, controls);
  const problems = [...crossing];
  let sheet: Sheet = { outline: whole, solid: whole, operations: [], moving: [] };
  for (const control of here) {
    const index = run.surface.surface.controls.indexOf(control.control);
    const path = `surfaces.${run.surface.index}.controls.${index}`;
    problems.push(...hingeProblems(control.control, run.material, path));
    const next = freed(sheet, run, strip, control, ends);
    if (next) sheet = next;
    else problems.push({ code: 'control-off-sheet', path: `${path}.to`, message: texts.problems.controlOffSheet });
  }
  return { ...sheet, outline: beginAt(sheet.outline, whole[0]), problems };
}
