import { controlWithin } from '@/lib/airframe/names';
import type { ResolvedControl, ResolvedSurface } from '@/lib/airframe/resolved';
import type { Material, Tube } from '@/lib/airframe/schema/stock';
import { notBuiltYet, type Problem } from '@/lib/numerics/result';
import { add3, scale3, sub3, type Vec2 } from '@/lib/numerics/vec';
import { texts } from '@/lib/text/en/parts';
import { fill } from '@/lib/text/fill';
import { bothSides, centrePart, type Draft } from '../draft';
import { openDraft } from '../opening';
import { fromPart, normalOf, turnFrame, unit3 } from '../shape/frame';
import { mirror2 } from '../shape/ring';
import type { Operation, Part, PartFrame, StockPiece } from '../types';
import { type BoomHere, boomsOn } from './boom';
import { buildablePanels } from './buildable';
import { hingeLine } from './control';
import { controlledSheet, type MovingPiece } from './controlledSheet';
import { cutoutRings } from './cutout';
import { foldedParts } from './folded/foldedParts';
import { isDoubleBevel } from './hinge';
import { cutToSeam, type Seam, seamOf, seamOperations, seamProblems } from './joint';
import { meetsItsMirror, type Run, runsOf } from './run';
import { sparsOn, surfaceName } from './spar';
import { type Strip, stripOf } from './strip';
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
  const values = { surface: surfaceName(surface), control: controlWithin(surface, control) };
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

/** A flat piece cut to its seams and its tip. */
function shaped(run: Run): { strip: Strip; seams: Seam[]; problems: readonly Problem[] } {
  const { surface, index, panels } = run.surface;
  const seams = [seamOf(run, 'root'), seamOf(run, 'tip')].flatMap((seam) => seam ?? []);
  const jointed = seams.reduce((strip, seam) => cutToSeam(strip, seam, run.material.thicknessMm), stripOf(run));
  const isTip = run.panels.at(-1)?.index === panels.length - 1;
  const made = isTip ? tipped(jointed, surface.tip, `surfaces.${index}.tip`) : { strip: jointed, problems: [] };
  return {
    strip: made.strip,
    seams,
    problems: [...seams.flatMap((seam) => seamProblems(run, seam)), ...made.problems],
  };
}

function sheetDraft(
  run: Run,
  outline: readonly Vec2[],
  operations: readonly Operation[],
  turning: ResolvedControl | undefined,
): Draft {
  return {
    key: `${run.surface.surface.id}/${run.panels.map(({ panel }) => panel.id).join('+')}/sheet`,
    name: (side) => sheetName(run, side),
    elementId: run.surface.surface.id,
    material: run.material,
    outline,
    holes: [],
    operations: [...operations, ...(turning ? [pivotLine(run, turning)] : [])],
    frame: turning ? turnedTo(run.frame, run, turning, 0) : run.frame,
    faces: ['upper', 'lower'],
    grainDeg: 0,
  };
}

interface Fittings {
  readonly controls: readonly ResolvedControl[];
  /** The control that turns the whole surface, if one does. */
  readonly turning: ResolvedControl | undefined;
  readonly stock: Stock;
  readonly booms: readonly BoomHere[];
}

/** Everything that is cut from one flat piece of a surface. */
function runParts(run: Run, { controls, turning, stock, booms }: Fittings): Developed {
  const { mirrored } = run.surface.surface;
  const { strip, seams, problems } = shaped(run);
  const has = (end: Seam['end']): boolean => seams.some((seam) => seam.end === end);
  const sheet = controlledSheet(run, strip, controls, { rootSeam: has('root'), tipSeam: has('tip') });
  const spars = sparsOn(run, sheet.solid, stock.tubes);
  const seamWork = seams.flatMap((seam) => seamOperations(strip, seam, run.material.thicknessMm, sheet.solid));
  const operations = [
    ...seamWork,
    ...(run.centre ? seamWork.map(onPortHalf) : []),
    ...sheet.operations,
    ...spars.operations,
    ...boomsOn(run, sheet.solid, booms),
  ];
  const cutouts = cutoutRings(run);
  const fixed = openDraft(sheetDraft(run, sheet.outline, operations, turning), [...cutouts, ...spars.slots]);
  const moving = sheet.moving.map((piece) => ({
    centre: piece.centre,
    ...openDraft(movingDraft(run, piece), cutouts),
  }));
  return {
    parts: [
      ...partsOf(fixed.draft, mirrored, run.centre),
      ...moving.flatMap(({ draft, centre }) => partsOf(draft, mirrored, centre)),
    ],
    stockPieces: spars.stockPieces,
    problems: [
      ...problems,
      ...sheet.problems,
      ...fixed.problems,
      ...moving.flatMap((piece) => piece.problems),
      ...spars.problems,
    ],
  };
}

/** Parts, tubes and problems of one surface. What is neither flat nor folded is named as not built yet; the rest still comes. */
export function surfaceParts(
  resolved: ResolvedSurface,
  controls: readonly ResolvedControl[],
  stock: Stock,
  booms: readonly BoomHere[],
): Developed {
  const { flat, folded, problems } = buildablePanels(resolved, stock.materials);
  const own = controls.filter(({ surfaceId }) => surfaceId === resolved.surface.id);
  const { turning, problems: turningProblems } = allMoving(resolved, own);
  const runs: Developed[] = runsOf(resolved, flat, stock.materials).map((run) =>
    runParts(run, { controls: own, turning: turning[0], stock, booms }),
  );
  if (folded.length > 0) runs.push(foldedParts(resolved, folded, { controls: own, ...stock, booms }));
  return {
    parts: runs.flatMap(({ parts }) => parts),
    stockPieces: runs.flatMap(({ stockPieces }) => stockPieces),
    problems: [...problems, ...turningProblems, ...runs.flatMap((run) => run.problems)],
  };
}
