import { reflexFrom } from '@/lib/airframe/foldedSection';
import type { ResolvedControl } from '@/lib/airframe/resolved';
import { notBuiltYet, type Problem } from '@/lib/numerics/result';
import { add3, scale3, sub3, type Vec2 } from '@/lib/numerics/vec';
import { texts } from '@/lib/text/en/foldedParts';
import { fill } from '@/lib/text/fill';
import { trimmedDigits } from '@/lib/units/number';
import { fromPart, normalOf, turnFrame, unit3 } from '../../shape/frame';
import { beginAt } from '../../shape/ring';
import type { Operation, PartFrame } from '../../types';
import { controlledSheet, type MovingPiece } from '../controlledSheet';
import { isDoubleBevel } from '../hinge';
import type { Run } from '../run';
import { flatAt, type Shell } from './shell';
import { type Skin, skinStrip } from './skin';

// Controls of a folded panel are cut from its single sheet, behind the lower skin: a hinge there works as on flat sheet.

interface Freed {
  readonly outline: Vec2[];
  readonly operations: readonly Operation[];
  readonly moving: readonly MovingPiece[];
  readonly problems: readonly Problem[];
  /** Frame of the sheet that the controls are cut from. */
  readonly frame: PartFrame;
}

const SAME_STATION = 1e-9;
const share = (value: number): string => trimmedDigits(value, 3);

/** Upper and lower as a hinge names them are the skin's outer and inner face. */
const onSkin = (operation: Operation): Operation => ({
  ...operation,
  face: operation.face === 'upper' ? 'outer' : operation.face === 'lower' ? 'inner' : operation.face,
});

/** A control whose hinge lies on the single sheet, or what keeps it from that. */
function hingeProblem(run: Run, shell: Shell, { control }: ResolvedControl): Problem | null {
  const path = `surfaces.${run.surface.index}.controls.${run.surface.surface.controls.indexOf(control)}`;
  const { lowerTo } = shell.section;
  const fore = 1 - Math.max(...control.chordShare);
  if (fore < lowerTo) {
    const widest = control.chordShare[0] >= control.chordShare[1] ? 0 : 1;
    const message = fill(texts.problems.controlOnLower, { hinge: share(fore), to: share(lowerTo) });
    const most = trimmedDigits(Math.floor((1 - lowerTo) * 1000) / 1000, 3);
    const fix = fill(texts.problems.controlOnLowerFix, { most });
    return { code: 'control-on-lower-skin', path: `${path}.chordShare.${widest}`, message, fix };
  }
  const reflex = reflexFrom(shell.section);
  return reflex !== null && fore < reflex ? notBuiltYet(`${path}.chordShare`, texts.notBuilt.controlReflex) : null;
}

/** The control as it lies on the unrolled skin. */
function laidFlat(run: Run, shell: Shell, resolved: ResolvedControl, frame: PartFrame): ResolvedControl {
  const [panel] = run.panels;
  if (!panel) throw new RangeError('a folded piece needs a panel');
  const at = (station: number, chordShare: number) => {
    const along = (station - panel.root.station) / (panel.tip.station - panel.root.station);
    return fromPart(frame, flatAt(shell, 'upper', 1 - chordShare, along));
  };
  const { from, to, chordShare } = resolved.control;
  return { ...resolved, hingeInner: at(from, chordShare[0]), hingeOuter: at(to, chordShare[1]) };
}

/** The upper skin with its controls cut free. */
export function freedSkin(
  run: Run,
  shell: Shell,
  skin: Skin,
  controls: readonly ResolvedControl[],
  seams: { readonly root: boolean; readonly tip: boolean },
): Freed {
  const [rear] = shell.faces;
  if (!rear) throw new RangeError('a folded section has faces');
  const { frame } = rear;
  const { station: start } = run.panels[0]?.root ?? { station: 0 };
  const { station: end } = run.panels[0]?.tip ?? { station: 1 };
  const here = controls.filter(
    ({ control }) => control.from > start - SAME_STATION && control.from < end - SAME_STATION,
  );
  const judged = here.map((control) => ({ control, problem: hingeProblem(run, shell, control) }));
  const laid = judged.filter(({ problem }) => !problem).map(({ control }) => laidFlat(run, shell, control, frame));
  const sheet = controlledSheet({ ...run, frame }, skinStrip(skin), laid, { rootSeam: seams.root, tipSeam: seams.tip });
  return {
    outline: beginAt(sheet.outline, skin.corner),
    operations: sheet.operations.map(onSkin),
    moving: sheet.moving,
    problems: [...judged.flatMap(({ problem }) => problem ?? []), ...sheet.problems],
    frame,
  };
}

/** The frame of a control's own piece at its neutral setting, turned about its hinge: positive trailing edge down. */
export function settledFrame(
  { control, hingeInner, hingeOuter }: ResolvedControl,
  frame: PartFrame,
  thicknessMm: number,
): PartFrame {
  if (control.neutralDeg === 0) return frame;
  const a = hingeInner;
  const axis = unit3(sub3(hingeOuter, a));
  const off = isDoubleBevel(control) ? 0 : control.hinge.side === 'upper' ? thicknessMm / 2 : -thicknessMm / 2;
  return turnFrame(frame, add3(a, scale3(normalOf(frame), off)), axis, control.neutralDeg);
}
