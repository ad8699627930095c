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

const cutOff = (ring: readonly Vec2[], paths: readonly (readonly Vec2[])[]): Vec2[] =>
  paths.reduce<Vec2[]>((left, path) => cutRing(left, path).left, [...ring]);

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

/** Hinge operations on the sheet and on the pieces that come off it. */
function parted(run: Run, control: ResolvedControl, cut: ControlCut, outline: readonly Vec2[]) {
  const { thicknessMm } = run.material;
  const own = hingeOperations(control.control, cut.hinge, thicknessMm, '');
  const twoHinges = run.centre && cut.joined !== 'through';
  const [from, to] = cut.hinge;
  const other = hingeOperations(control.control, [mirror2(to), mirror2(from)], thicknessMm, '-port');
  const operations = twoHinges ? [...own.fixed, ...other.fixed] : own.fixed;
  if (!isSeparate(control.control)) return { operations, moving: [] };
  // The port half of a pair is the mirror of this one, made when the parts are.
  const [path] = partingPaths(cut, 'moving', run.centre);
  const moving: MovingPiece[] = path
    ? [
        {
          control,
          outline: cutRing(outline, path).right,
          operations: own.moving,
          centre: run.centre && cut.joined === 'through',
        },
      ]
    : [];
  return { operations, moving };
}

/** Cuts the controls of a flat piece free: slots at the ends of those that stay on it, whole pieces of those that do not. */
export function controlledSheet(
  run: Run,
  strip: Strip,
  controls: readonly ResolvedControl[],
  ends: Ends,
): ControlledSheet {
  const whole = ringOf(strip, run.centre);
  const corner = whole[0];
  const { here, problems: crossing } = controlsHere(run, controls);
  const problems = [...crossing];
  const operations: Operation[] = [];
  const moving: MovingPiece[] = [];
  let outline: Vec2[] = whole;
  let solid: Vec2[] = whole;
  for (const control of here) {
    const index = run.surface.surface.controls.indexOf(control.control);
    const path = `surfaces.${run.surface.index}.controls.${index}`;
    problems.push(...hingeProblems(control.control, run.material, path));
    const cut = controlCut({ ring: solid, strip, control, frame: run.frame }, endKinds(run, control, ends));
    if (!cut) {
      problems.push({ code: 'control-off-sheet', path: `${path}.to`, message: texts.problems.controlOffSheet });
      continue;
    }
    const pieces = parted(run, control, cut, solid);
    operations.push(...pieces.operations);
    moving.push(...pieces.moving);
    solid = cutOff(solid, partingPaths(cut, 'fixed', run.centre));
    if (isSeparate(control.control)) {
      outline = cutOff(outline, partingPaths(cut, 'fixed', run.centre));
    } else {
      outline = cutOff(outline, gapPaths(cut, run.centre));
      operations.push(...slitOperations(cut, control.control.id, run, control.control.hinge.side));
    }
  }
  return { outline: beginAt(outline, corner), solid, operations, moving, problems };
}
