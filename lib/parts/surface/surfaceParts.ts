import type { ResolvedControl, ResolvedSurface } from '@/lib/airframe/resolved';
import type { Material, Tube } from '@/lib/airframe/schema/stock';
import { notBuiltYet, type Problem } from '@/lib/numerics/result';
import { add3, scale3, sub3 } from '@/lib/numerics/vec';
import { texts } from '@/lib/text/en/parts';
import { fill } from '@/lib/text/fill';
import { bothSides, centrePart, type Draft } from '../draft';
import { fromPart, normalOf, turnFrame, unit3 } from '../shape/frame';
import { mirror2 } from '../shape/ring';
import type { Operation, Part, PartFrame, StockPiece } from '../types';
import { type BoomHere, boomsOn } from './boom';
import { buildablePanels } from './buildable';
import { hingeLine } from './control';
import { controlledSheet, type MovingPiece } from './controlledSheet';
import { cutoutRings, openRing } from './cutout';
import { isDoubleBevel } from './hinge';
import { cutToSeam, seamOf, seamOperations, seamProblems } from './joint';
import { meetsItsMirror, type Run, runsOf } from './run';
import { sparsOn, surfaceName } from './spar';
import { stripOf } from './strip';
import { tipped } from './tip';

export interface Developed {
  readonly parts: readonly Part[];
  readonly stockPieces: readonly StockPiece[];
  readonly problems: readonly Problem[];
}

export interface Stock {
  readonly materials: ReadonlyMap<string, Material>;
  readonly tubes: ReadonlyMap<string, Tube>;
}

/** All-moving controls turn the whole surface; anything less than the whole is not built yet. */
function allMoving(
  resolved: ResolvedSurface,
  controls: readonly ResolvedControl[],
): { turning: ResolvedControl[]; problems: Problem[] } {
  const problems: Problem[] = [];
  const turning = controls.filter(({ control }) => {
    if (control.kind !== 'allMoving') return false;
    const path = `surfaces.${resolved.index}.controls.${resolved.surface.controls.indexOf(control)}`;
    const whole = control.from === 0 && control.to === 1;
    if (!whole) problems.push(notBuiltYet(path, texts.notBuilt.allMovingPart));
    const apart = whole && control.mix.roll !== 0 && meetsItsMirror(resolved);
    if (apart) problems.push(notBuiltYet(`${path}.mix.roll`, texts.notBuilt.allMovingRoll));
    return whole && !apart;
  });
  return { turning, problems };
}

/** The frame of what turns with a control, at the control's neutral setting: positive trailing edge down. */
function turnedTo(frame: PartFrame, run: Run, control: ResolvedControl, pivotOff: number): PartFrame {
  const { neutralDeg } = control.control;
  if (neutralDeg === 0) return frame;
  const [from, to] = hingeLine(control, run.frame);
  const a = fromPart(run.frame, from);
  const axis = unit3(sub3(fromPart(run.frame, to), a));
  return turnFrame(frame, add3(a, scale3(normalOf(run.frame), pivotOff)), axis, neutralDeg);
}

function pivotLine(run: Run, control: ResolvedControl): Operation {
  const [from, to] = hingeLine(control, run.frame);
  const path = run.centre ? [mirror2(to), from, to] : [from, to];
  return {
    id: `${control.control.id}-pivot`,
    kind: 'reference',
    path,
    closed: false,
    face: 'upper',
    note: texts.notes.pivot,
  };
}

const panelNames = (run: Run): string => run.panels.map(({ panel }) => panel.id).join(' + ');

function sheetName(run: Run, side: Part['side']): string {
  const { surface, panels } = run.surface;
  const whole = run.panels.length === panels.length;
  const values = { surface: surfaceName(surface), panel: panelNames(run), side: texts.sides[side] };
  if (side === 'centre') return fill(whole ? texts.names.sheet : texts.names.sheetPanel, values);
  return fill(whole ? texts.names.sheetSide : texts.names.sheetPanelSide, values);
}

/** The part or parts of a draft: one on the centre, or both sides of what is mirrored. */
function partsOf(draft: Draft, mirrored: boolean, centre: boolean): Part[] {
  return mirrored && !centre ? bothSides(draft) : [centrePart(draft)];
}

function movingDraft(run: Run, piece: MovingPiece): Draft {
  const { control } = piece.control;
  const { surface } = run.surface;
  const half = run.material.thicknessMm / 2;
  const pivotOff = isDoubleBevel(control) ? 0 : control.hinge.side === 'upper' ? half : -half;
  const values = { surface: surfaceName(surface), control: texts.controls[control.kind] };
  return {
    key: `${surface.id}/${control.id}/control`,
    name: (side) =>
      side === 'centre'
        ? fill(texts.names.control, values)
        : fill(texts.names.controlSide, { ...values, side: texts.sides[side] }),
    elementId: control.id,
    material: run.material,
    outline: piece.outline,
    holes: [],
    operations: piece.operations,
    frame: turnedTo(run.frame, run, piece.control, pivotOff),
    faces: ['upper', 'lower'],
    grainDeg: 0,
  };
}

/** The same work on the port half of a piece that spans the centre. */
const onPortHalf = (operation: Operation): Operation => ({
  ...operation,
  id: `${operation.id}-port`,
  path: operation.path.map(mirror2),
});

/** Everything that is cut from one flat piece of a surface. */
function runParts(
  run: Run,
  controls: readonly ResolvedControl[],
  turning: readonly ResolvedControl[],
  stock: Stock,
  booms: readonly BoomHere[],
): Developed {
  const { surface, index, panels } = run.surface;
  const { thicknessMm } = run.material;
  const isTip = run.panels.at(-1)?.index === panels.length - 1;
  const seams = [seamOf(run, 'root'), seamOf(run, 'tip')].flatMap((seam) => seam ?? []);
  const jointed = seams.reduce((strip, seam) => cutToSeam(strip, seam, thicknessMm), stripOf(run));
  const { strip, problems: tipProblems } = isTip
    ? tipped(jointed, surface.tip, `surfaces.${index}.tip`)
    : { strip: jointed, problems: [] };
  const ends = { rootSeam: seams.some(({ end }) => end === 'root'), tipSeam: seams.some(({ end }) => end === 'tip') };
  const sheet = controlledSheet(run, strip, controls, ends);
  const openings = cutoutRings(run);
  const spars = sparsOn(run, sheet.solid, stock.tubes);
  const opened = openRing(sheet.outline, [...openings, ...spars.slots]);
  const pivot = turning[0];
  const seamWork = seams.flatMap((seam) => seamOperations(strip, seam, thicknessMm, sheet.solid));
  const draft: Draft = {
    key: `${surface.id}/${run.panels.map(({ panel }) => panel.id).join('+')}/sheet`,
    name: (side) => sheetName(run, side),
    elementId: surface.id,
    material: run.material,
    outline: opened.outline,
    holes: opened.holes,
    operations: [
      ...seamWork,
      ...(run.centre ? seamWork.map(onPortHalf) : []),
      ...sheet.operations,
      ...spars.operations,
      ...boomsOn(run, sheet.solid, booms),
      ...turning.map((control) => pivotLine(run, control)),
    ],
    frame: pivot ? turnedTo(run.frame, run, pivot, 0) : run.frame,
    faces: ['upper', 'lower'],
    grainDeg: 0,
  };
  const moving = sheet.moving.map((piece) => {
    const cut = openRing([...piece.outline], openings);
    return {
      piece,
      draft: { ...movingDraft(run, piece), outline: cut.outline, holes: cut.holes },
      problems: cut.problems,
    };
  });
  return {
    parts: [
      ...partsOf(draft, surface.mirrored, run.centre),
      ...moving.flatMap(({ piece, draft: own }) => partsOf(own, surface.mirrored, piece.centre)),
    ],
    stockPieces: spars.stockPieces,
    problems: [
      ...seams.flatMap((seam) => seamProblems(run, seam)),
      ...tipProblems,
      ...sheet.problems,
      ...opened.problems,
      ...moving.flatMap(({ problems }) => problems),
      ...spars.problems,
    ],
  };
}

/** Parts, tubes and problems of one surface. What is not flat sheet is named as not built yet; the rest still comes. */
export function surfaceParts(
  resolved: ResolvedSurface,
  controls: readonly ResolvedControl[],
  stock: Stock,
  booms: readonly BoomHere[],
): Developed {
  const { panels, problems } = buildablePanels(resolved, stock.materials);
  const own = controls.filter(({ surfaceId }) => surfaceId === resolved.surface.id);
  const { turning, problems: turningProblems } = allMoving(resolved, own);
  const runs = runsOf(resolved, panels, stock.materials).map((run) => runParts(run, own, turning, stock, booms));
  return {
    parts: runs.flatMap(({ parts }) => parts),
    stockPieces: runs.flatMap(({ stockPieces }) => stockPieces),
    problems: [...problems, ...turningProblems, ...runs.flatMap((run) => run.problems)],
  };
}
