import { CHECK_SQUARE_MM } from '@/lib/layout/openSheet';
import { placePath, placePoint } from '@/lib/layout/turns';
import type { LaidSheet, Placement, SheetLayout } from '@/lib/layout/types';
import type { Vec2 } from '@/lib/numerics/vec';
import type { Operation, Part } from '@/lib/parts/types';
import { plan } from '@/lib/text/en/plan';
import { fill } from '@/lib/text/fill';
import { trimmedDigits } from '@/lib/units/number';
import { deepPoints, type LabelRoom, type LabelWish, placeLabels, type Spot } from './draw/labels';
import { partLines } from './draw/partLines';
import { type Segment, segmentsOf } from './draw/segments';
import type { Drawing, DrawnLine, DrawnText } from './drawing';

/** Width of a cut line on paper, mm. */
export const STROKE_MM = 0.2;
const NAME_CAP_MM = 4;
const NOTE_CAP_MM = 2.2;
/** How far from its line a note may stand, and where along it. */
const NOTE_OFFSETS_MM = [3, 4.5, 7, 10] as const;
const NOTE_ALONG = [0.5, 0.35, 0.65, 0.2, 0.8, 0.08, 0.92] as const;

export interface DrawMeta {
  /** Name of a material as it is to be read, by its id. */
  readonly materialName?: (materialId: string) => string;
}

const noteOf = (operation: Operation): string | null => {
  if (operation.note) return operation.note;
  if (operation.kind === 'glue' || operation.kind === 'tape') return plan.lines[operation.kind];
  if (operation.angleDeg === undefined || operation.angleDeg === 0) return null;
  const angle = trimmedDigits(Math.abs(operation.angleDeg), 1);
  if (operation.kind === 'bevel') return fill(plan.sheet.bevelAngle, { angle });
  if (operation.kind === 'crease') return fill(plan.sheet.foldAngle, { angle });
  return null;
};

/** Spots beside a path's longest stretch, the middle and the nearest first: a note further off would belong to no line. */
function besideLongest(path: readonly Vec2[]): Spot[] {
  const lengthOf = ([[ax, ay], [bx, by]]: Segment): number => Math.hypot(bx - ax, by - ay);
  const [longest] = segmentsOf(path, false).sort((a, b) => lengthOf(b) - lengthOf(a));
  const length = longest ? lengthOf(longest) : 0;
  if (!longest || length === 0) return [];
  const [[ax, ay], [bx, by]] = longest;
  const [ux, uy] = [(bx - ax) / length, (by - ay) / length];
  const angleDeg = (Math.atan2(uy, ux) * 180) / Math.PI;
  return NOTE_OFFSETS_MM.flatMap((off) =>
    NOTE_ALONG.flatMap((share) =>
      [off, -off].map(
        (side): Spot => ({
          at: [ax + ux * length * share - uy * side, ay + uy * length * share + ux * side],
          angleDeg,
        }),
      ),
    ),
  );
}

function wishesOf(part: Part, placement: Placement, room: LabelRoom): LabelWish[] {
  const wishes: LabelWish[] = part.labels.map(({ at, text, heightMm, angleDeg }) => ({
    text,
    heightMm,
    font: 'text',
    spots: [{ at: placePoint(at, placement), angleDeg: angleDeg + placement.turnDeg }],
  }));
  if (!part.labels.some(({ text }) => text.includes(part.name))) {
    wishes.push({ text: part.name, heightMm: NAME_CAP_MM, font: 'text', spots: [] });
  }
  for (const operation of part.operations) {
    const text = noteOf(operation);
    if (!text) continue;
    wishes.push({
      text,
      heightMm: NOTE_CAP_MM,
      font: 'mono',
      spots: besideLongest(placePath(operation.path, placement)),
    });
  }
  const face = fill(plan.sheet.face, { face: plan.faces[part.face] });
  const [deepest] = deepPoints(room);
  const spots: Spot[] = deepest ? [{ at: [deepest[0], deepest[1] - NAME_CAP_MM * 1.8], angleDeg: 0 }] : [];
  wishes.push({ text: face, heightMm: NOTE_CAP_MM, font: 'mono', spots });
  return wishes;
}

function drawPart(part: Part, placement: Placement): { lines: DrawnLine[]; texts: DrawnText[] } {
  const lines = partLines(part, placement);
  const segments = (wanted: (line: DrawnLine) => boolean): Segment[] =>
    lines.filter(wanted).flatMap(({ points, closed }) => segmentsOf(points, closed));
  const room: LabelRoom = {
    outline: placePath(part.outline, placement),
    holes: part.holes.map((hole) => placePath(hole, placement)),
    cuts: segments(({ type }) => type === 'cut'),
    others: segments(({ type }) => type !== 'cut'),
  };
  return { lines, texts: placeLabels(wishesOf(part, placement, room), room) };
}

const square = (x: number, y: number, w: number, h: number): Vec2[] => [
  [x, y],
  [x + w, y],
  [x + w, y + h],
  [x, y + h],
];

function drawCheck(sheet: LaidSheet): { lines: DrawnLine[]; texts: DrawnText[] } {
  if (!sheet.checkSquareMm) {
    const text = plan.sheet.noCheck;
    const at: Vec2 = [sheet.wMm / 2, 1.2];
    return { lines: [], texts: [{ at, text, heightMm: 2, angleDeg: 0, font: 'text', align: 'centre' }] };
  }
  const [x, y] = sheet.checkSquareMm;
  const half = CHECK_SQUARE_MM / 2;
  const text = (at: Vec2, angleDeg: number): DrawnText => ({
    at,
    text: plan.sheet.check,
    heightMm: 3,
    angleDeg,
    font: 'mono',
    align: 'centre',
  });
  return {
    lines: [
      { id: `${sheet.id}#check`, type: 'check', points: square(x, y, CHECK_SQUARE_MM, CHECK_SQUARE_MM), closed: true },
    ],
    texts: [text([x + half, y + 4], 0), text([x + 4, y + half], 90)],
  };
}

function drawSheet(sheet: LaidSheet, parts: ReadonlyMap<string, Part>, meta: DrawMeta): Drawing {
  const drawn = sheet.placements.map((placement) => {
    const part = parts.get(placement.partKey);
    if (!part) throw new RangeError(`the layout places ${placement.partKey}, which is not among the parts`);
    return drawPart(part, placement);
  });
  const check = drawCheck(sheet);
  const edge: DrawnLine = {
    id: `${sheet.id}#edge`,
    type: 'sheetEdge',
    points: square(0, 0, sheet.wMm, sheet.hMm),
    closed: true,
  };
  return {
    id: sheet.id,
    title: fill(plan.sheet.title, {
      material: meta.materialName?.(sheet.materialId) ?? sheet.materialId,
      thickness: trimmedDigits(sheet.thicknessMm, 2),
    }),
    sheetMm: [sheet.wMm, sheet.hMm],
    strokeMm: STROKE_MM,
    lines: [edge, ...drawn.flatMap(({ lines }) => lines), ...check.lines],
    texts: [...drawn.flatMap(({ texts }) => texts), ...check.texts],
  };
}

/**
 * Every laid sheet as lines by type and texts, in sheet mm, y up, origin at the lower left. Labels stand inside their parts,
 * clear of cut lines; one that finds no place at a readable size is left out.
 * Throws RangeError when the layout places a part that is not given.
 */
export function draw(parts: readonly Part[], layout: SheetLayout, meta: DrawMeta = {}): Drawing[] {
  const byKey = new Map(parts.map((part) => [part.key, part]));
  return layout.sheets.map((sheet) => drawSheet(sheet, byKey, meta));
}
