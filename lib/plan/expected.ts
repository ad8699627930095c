import { CHECK_SQUARE_MM } from '@/lib/layout/openSheet';
import { placePath } from '@/lib/layout/turns';
import type { LaidSheet, SheetLayout } from '@/lib/layout/types';
import type { Vec2 } from '@/lib/numerics/vec';
import type { Part } from '@/lib/parts/types';

// The cut lines that must come out of the printer, from the parts and their places alone. The drawing is made elsewhere and
// never read here: a checker that compares the two would otherwise prove nothing.

export interface ExpectedLine {
  readonly id: string;
  /** Key of the part, or "check" for the test square. */
  readonly part: string;
  readonly closed: boolean;
  readonly points: readonly Vec2[];
}

/** Of each laid sheet, by its id. */
export type ExpectedLines = ReadonlyMap<string, readonly ExpectedLine[]>;

function ofSheet(sheet: LaidSheet, parts: ReadonlyMap<string, Part>): ExpectedLine[] {
  const lines: ExpectedLine[] = [];
  for (const placement of sheet.placements) {
    const part = parts.get(placement.partKey);
    if (!part) throw new RangeError(`the layout places ${placement.partKey}, which is not among the parts`);
    const add = (id: string, closed: boolean, path: readonly Vec2[]) =>
      lines.push({ id: `${part.key}#${id}`, part: part.key, closed, points: placePath(path, placement) });
    add('outline', true, part.outline);
    part.holes.forEach((hole, i) => {
      add(`hole-${i + 1}`, true, hole);
    });
    for (const { id, kind, closed, path } of part.operations) if (kind === 'cut') add(id, closed, path);
  }
  if (sheet.checkSquareMm) {
    const [x, y] = sheet.checkSquareMm;
    const s = CHECK_SQUARE_MM;
    const points: Vec2[] = [
      [x, y],
      [x + s, y],
      [x + s, y + s],
      [x, y + s],
    ];
    lines.push({ id: `${sheet.id}#check`, part: 'check', closed: true, points });
  }
  return lines;
}

/** Every cut line of every sheet, in sheet mm. Throws RangeError when the layout places a part that is not given. */
export function expectedLines(parts: readonly Part[], layout: SheetLayout): ExpectedLines {
  const byKey = new Map(parts.map((part) => [part.key, part]));
  return new Map(layout.sheets.map((sheet) => [sheet.id, ofSheet(sheet, byKey)]));
}
