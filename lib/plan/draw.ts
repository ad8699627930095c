import { CHECK_SQUARE_MM } from '@/lib/layout/openSheet';
import { placePath } from '@/lib/layout/turns';
import type { LaidSheet, Placement, SheetLayout } from '@/lib/layout/types';
import type { Vec2 } from '@/lib/numerics/vec';
import type { Part } from '@/lib/parts/types';
import { plan } from '@/lib/text/en/plan';
import { fill } from '@/lib/text/fill';
import { trimmedDigits } from '@/lib/units/number';
import { partLines } from './draw/partLines';
import { type Key, newKey, partTexts } from './draw/partTexts';
import { type Box, isIn } from './draw/room';
import { type Segment, segmentsOf } from './draw/segments';
import type { Drawing, DrawnLine, DrawnText } from './drawing';

/** Width of a cut line on paper, mm. */
export const STROKE_MM = 0.2;

export interface DrawMeta {
  /** Name of a material as it is to be read, by its id. */
  readonly materialName?: (materialId: string) => string;
  /** What the printed pages of a sheet show away from their seams, by the sheet's id: labels keep inside one of them. */
  readonly windows?: ReadonlyMap<string, readonly Box[]>;
  /** Lines alone, for finding the pages that they take. */
  readonly withoutTexts?: boolean;
}

function textsOf(
  part: Part,
  placement: Placement,
  lines: readonly DrawnLine[],
  windows: readonly Box[],
  key: Key,
): DrawnText[] {
  const segments = (wanted: (line: DrawnLine) => boolean): Segment[] =>
    lines.filter(wanted).flatMap(({ points, closed }) => segmentsOf(points, closed));
  const room = {
    outline: placePath(part.outline, placement),
    holes: part.holes.map((hole) => placePath(hole, placement)),
    cuts: segments(({ type }) => type === 'cut'),
    others: segments(({ type }) => type !== 'cut'),
    windows,
  };
  return partTexts(part, placement, room, key);
}

/** The two corners of a ring that lie farthest apart, as a length, mm. */
function reachOf(ring: readonly Vec2[]): number {
  let most = 0;
  for (const [ax, ay] of ring) for (const [bx, by] of ring) most = Math.max(most, Math.hypot(bx - ax, by - ay));
  return most;
}

/** The part with the longest reach: what is measured after the pages are joined. */
function longestOf(parts: readonly Part[]): Drawing['longest'] {
  return parts.reduce<Drawing['longest']>((best, { name, outline }) => {
    const lengthMm = reachOf(outline);
    return best && best.lengthMm >= lengthMm ? best : { name, lengthMm };
  }, null);
}

const square = (x: number, y: number, w: number, h: number): Vec2[] => [
  [x, y],
  [x + w, y],
  [x + w, y + h],
  [x, y + h],
];

/** Where along an edge of the test square its length may be written. */
const CHECK_SHARES = [0.5, 0.25, 0.75, 0.12, 0.88] as const;
const CHECK_CAP_MM = 3;
/** Half of the room that the words take along an edge, mm. */
const CHECK_REACH_MM = 10;

function drawCheck(sheet: LaidSheet, windows: readonly Box[]): { lines: DrawnLine[]; texts: DrawnText[] } {
  if (!sheet.checkSquareMm) {
    const text = plan.sheet.noCheck;
    const at: Vec2 = [sheet.wMm / 2, 1.2];
    return { lines: [], texts: [{ at, text, heightMm: 2, angleDeg: 0, font: 'text', align: 'centre' }] };
  }
  const [x, y] = sheet.checkSquareMm;
  const side = CHECK_SQUARE_MM;
  const texts = ([0, 90] as const).map((angleDeg): DrawnText => {
    const on = (along: number): Vec2 => (angleDeg === 0 ? [x + along, y + 4] : [x + 4, y + along]);
    const onePage = CHECK_SHARES.find((share) =>
      windows.some((window) => [-1, 1].every((end) => isIn(on(share * side + end * CHECK_REACH_MM), window))),
    );
    const at = on((onePage ?? 0.5) * side);
    return { at, text: plan.sheet.check, heightMm: CHECK_CAP_MM, angleDeg, font: 'mono', align: 'centre' };
  });
  return {
    lines: [{ id: `${sheet.id}#check`, type: 'check', points: square(x, y, side, side), closed: true }],
    texts,
  };
}

function drawSheet(
  sheet: LaidSheet,
  number: number,
  parts: ReadonlyMap<string, Part>,
  { materialName, windows, withoutTexts }: DrawMeta,
): Drawing {
  const key = newKey();
  const placed = sheet.placements.map((placement) => {
    const part = parts.get(placement.partKey);
    if (!part) throw new RangeError(`the layout places ${placement.partKey}, which is not among the parts`);
    return { part, placement };
  });
  const shown = windows?.get(sheet.id) ?? [];
  const drawn = placed.map(({ part, placement }) => {
    const lines = partLines(part, placement);
    return { lines, texts: withoutTexts ? [] : textsOf(part, placement, lines, shown, key) };
  });
  const check = drawCheck(sheet, shown);
  const edge: DrawnLine = {
    id: `${sheet.id}#edge`,
    type: 'sheetEdge',
    points: square(0, 0, sheet.wMm, sheet.hMm),
    closed: true,
  };
  return {
    id: sheet.id,
    name: fill(plan.sheet.name, { number }),
    material: fill(plan.sheet.material, {
      material: materialName?.(sheet.materialId) ?? sheet.materialId,
      thickness: trimmedDigits(sheet.thicknessMm, 2),
    }),
    sheetMm: [sheet.wMm, sheet.hMm],
    strokeMm: STROKE_MM,
    lines: [edge, ...drawn.flatMap(({ lines }) => lines), ...check.lines],
    texts: [...drawn.flatMap(({ texts }) => texts), ...check.texts],
    key: key.entries,
    longest: longestOf(placed.map(({ part }) => part)),
  };
}

/**
 * Every laid sheet as lines by type and texts, in sheet mm, y up, origin at the lower left. Labels stand inside their parts,
 * clear of cut lines; one that finds no place at a readable size is listed in the sheet's key.
 * Throws RangeError when the layout places a part that is not given.
 */
export function draw(parts: readonly Part[], layout: SheetLayout, meta: DrawMeta = {}): Drawing[] {
  const byKey = new Map(parts.map((part) => [part.key, part]));
  return layout.sheets.map((sheet, i) => drawSheet(sheet, i + 1, byKey, meta));
}
