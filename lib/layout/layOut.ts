import type { Vec2 } from '@/lib/numerics/vec';
import type { Part } from '@/lib/parts/types';
import { noFits } from './noFit';
import {
  addSquare,
  type Bench,
  CHECK_OUTLINE,
  type Job,
  layOnSheet,
  type OpenSheet,
  roomOf,
  startSheet,
} from './openSheet';
import { insideFit } from './place';
import { type Shape, shapeOf, UM } from './shape';
import { allowedTurns } from './turns';
import type { LaidSheet, LayoutFailure, LayoutOptions, SheetLayout, SheetStock } from './types';

/** Two thicknesses closer than this, mm, are one kind of sheet: a document writes them to a hundredth at best. */
const SAME_THICKNESS_MM = 0.005;

/** More is beyond any airframe that is cut by hand, and would keep a computer busy for minutes. */
export const MAX_PARTS = 2000;
export const MAX_SHEETS = 200;

const areaOf = (ring: readonly Vec2[]): number => {
  let twice = 0;
  ring.forEach(([x, y], i) => {
    const [x2, y2] = ring[(i + 1) % ring.length] ?? [x, y];
    twice += x * y2 - x2 * y;
  });
  return twice / 2;
};

const jobOf = (part: Part): Job => {
  const xs = part.outline.map(([x]) => x);
  const ys = part.outline.map(([, y]) => y);
  const holes = part.holes.reduce((sum, hole) => sum + Math.abs(areaOf(hole)), 0);
  return {
    part,
    areaMm2: Math.abs(areaOf(part.outline)) - holes,
    boxMm: [Math.max(...xs) - Math.min(...xs), Math.max(...ys) - Math.min(...ys)],
  };
};

const byKey = (a: Job, b: Job): number => (a.part.key < b.part.key ? -1 : a.part.key > b.part.key ? 1 : 0);
/** Orders in which the parts are laid; the one that needs the least foam is kept. */
const ORDERS: readonly ((a: Job, b: Job) => number)[] = [
  (a, b) => b.areaMm2 - a.areaMm2 || byKey(a, b),
  (a, b) => Math.max(...b.boxMm) - Math.max(...a.boxMm) || byKey(a, b),
  (a, b) => Math.min(...b.boxMm) - Math.min(...a.boxMm) || b.areaMm2 - a.areaMm2 || byKey(a, b),
];

const fitsEmpty = (job: Job, stock: SheetStock, bench: Bench): boolean =>
  allowedTurns(job.part, stock).some((turn) => insideFit(roomOf(stock, bench.options), bench.shape(job.part, turn)));

interface Run {
  readonly sheets: OpenSheet[];
  readonly failures: LayoutFailure[];
}

/** First fit: each part goes on the first open sheet with room for it, else on a new sheet of the first kind that holds it. */
function runOnce(jobs: readonly Job[], stock: readonly SheetStock[], bench: Bench, keepSquare: boolean): Run {
  const sheets: OpenSheet[] = [];
  const failures: LayoutFailure[] = [];
  for (const job of jobs) {
    const { part } = job;
    const kinds = stock.filter(
      (kind) =>
        kind.materialId === part.materialId && Math.abs(kind.thicknessMm - part.thicknessMm) <= SAME_THICKNESS_MM,
    );
    if (kinds.length === 0) {
      failures.push({ kind: 'no-stock', partKey: part.key, materialId: part.materialId });
      continue;
    }
    const open = sheets.filter((sheet) => kinds.includes(sheet.stock));
    if (open.some((sheet) => layOnSheet(job, sheet, bench))) continue;
    const large = kinds.filter((kind) => fitsEmpty(job, kind, bench));
    const left = large.filter(
      (kind) => kind.count === null || sheets.filter((sheet) => sheet.stock === kind).length < kind.count,
    );
    const next = left[0];
    if (next && sheets.length >= MAX_SHEETS) {
      failures.push({ kind: 'too-many-sheets', partKey: part.key, most: MAX_SHEETS });
    } else if (next) {
      sheets.push(startSheet(job, next, bench, keepSquare));
    } else if (large.length === 0) {
      failures.push({ kind: 'too-large', partKey: part.key, sizeMm: job.boxMm });
    } else {
      failures.push({ kind: 'no-room', partKey: part.key, sheetsTried: open.length });
    }
  }
  for (const sheet of sheets) if (!sheet.square) addSquare(sheet, bench);
  return { sheets, failures };
}

/** What counts against a run, worst first: parts left out, foam taken, sheets without a test square, and how far the fullest reach of each goes, so that what is left over stays in one piece. */
const foamUsed = (run: Run): readonly number[] => {
  const taken = run.sheets.reduce((sum, { stock }) => sum + stock.wMm * stock.hMm, 0);
  const reached = run.sheets.reduce((sum, sheet) => {
    const long = sheet.room.sizeUm[0] >= sheet.room.sizeUm[1] ? 0 : 1;
    const ends = sheet.laid.map(({ at, shape }) => (at[long] ?? 0) + (shape.sizeUm[long] ?? 0));
    return sum + Math.max(0, ...ends) * (sheet.room.sizeUm[1 - long] ?? 0);
  }, 0);
  const bare = run.sheets.filter(({ square }) => square === null).length;
  return [run.failures.length, taken, bare, reached];
};

const lessFoam = (a: readonly number[], b: readonly number[]): boolean => {
  for (let i = 0; i < a.length; i++) if (a[i] !== b[i]) return (a[i] ?? 0) < (b[i] ?? 0);
  return false;
};

function close(sheet: OpenSheet, index: number): LaidSheet {
  const { stock, square } = sheet;
  return {
    id: `sheet-${index + 1}`,
    stockId: stock.id,
    materialId: stock.materialId,
    thicknessMm: stock.thicknessMm,
    wMm: stock.wMm,
    hMm: stock.hMm,
    placements: sheet.placements,
    checkSquareMm: square && [square[0] / UM, square[1] / UM],
    utilisation: sheet.areaMm2 / (stock.wMm * stock.hMm),
  };
}

function checkOptions({ spacingMm, marginMm }: LayoutOptions): void {
  if (!(spacingMm >= 0) || !(spacingMm <= 100)) throw new RangeError(`spacingMm must be 0 to 100, got ${spacingMm}`);
  if (!(marginMm >= 0) || !(marginMm <= 500)) throw new RangeError(`marginMm must be 0 to 500, got ${marginMm}`);
}

/**
 * Lays parts on sheets of their material and thickness: true outlines, by no-fit polygons, first fit over three orders of
 * the parts, of which the one that uses least foam is kept. Parts stay `spacingMm` apart and `marginMm` inside the sheet, lie
 * along the grain where both have one, and are never mirrored. A 100 mm test square goes into each sheet's waste
 * when it costs no further sheet.
 * The same input gives the same layout; the seed is kept with the layout and this method draws no random number from it.
 * Parts that find no place are returned as failures, each once, and lie on no sheet. Over `MAX_PARTS` parts nothing is laid
 * and one failure says so; over `MAX_SHEETS` sheets the parts left are failures.
 */
export function layOut(parts: readonly Part[], stock: readonly SheetStock[], options: LayoutOptions): SheetLayout {
  checkOptions(options);
  if (new Set(parts.map(({ key }) => key)).size !== parts.length) throw new RangeError('two parts share a key');
  const over = parts[MAX_PARTS];
  if (over) {
    const failure = { kind: 'too-many-parts', partKey: over.key, count: parts.length, most: MAX_PARTS } as const;
    return { options, sheets: [], failures: [failure] };
  }
  const shapes = new Map<string, Shape>();
  const bench: Bench = {
    options,
    store: noFits(),
    square: shapeOf(CHECK_OUTLINE, 0, options.spacingMm),
    shape: (part, turnDeg) => {
      const id = `${part.key} ${turnDeg}`;
      const shape = shapes.get(id) ?? shapeOf(part.outline, turnDeg, options.spacingMm);
      shapes.set(id, shape);
      return shape;
    },
  };
  const jobs = parts.map(jobOf);
  let best: Run | null = null;
  for (const keepSquare of [false, true]) {
    // Room for the square is kept only when a layout without that care left a sheet bare.
    if (keepSquare && best?.sheets.every(({ square }) => square !== null)) break;
    for (const order of ORDERS) {
      const run = runOnce([...jobs].sort(order), stock, bench, keepSquare);
      if (!best || lessFoam(foamUsed(run), foamUsed(best))) best = run;
    }
  }
  const { sheets, failures } = best ?? { sheets: [], failures: [] };
  const sorted = [...sheets].sort(
    (a, b) =>
      stock.findIndex((kind) => kind.materialId === a.stock.materialId) -
      stock.findIndex((kind) => kind.materialId === b.stock.materialId),
  );
  return { options, sheets: sorted.map((sheet, i) => close(sheet, i)), failures };
}
