import type { Vec2 } from '@/lib/numerics/vec';
import type { Part } from '@/lib/parts/types';
import type { NoFits } from './noFit';
import { bestPlace, type Laid, type Reach, type Room, shorter } from './place';
import { type Shape, UM } from './shape';
import { allowedTurns } from './turns';
import type { LayoutOptions, Placement, SheetStock } from './types';

/** Side of the test square in each sheet's waste, mm. */
export const CHECK_SQUARE_MM = 100;

export const CHECK_OUTLINE: readonly Vec2[] = [
  [0, 0],
  [CHECK_SQUARE_MM, 0],
  [CHECK_SQUARE_MM, CHECK_SQUARE_MM],
  [0, CHECK_SQUARE_MM],
];

export interface OpenSheet {
  readonly stock: SheetStock;
  readonly room: Room;
  readonly laid: Laid[];
  readonly placements: Placement[];
  /** Lower left of the test square, micrometres. */
  square: Vec2 | null;
  areaMm2: number;
}

export interface Job {
  readonly part: Part;
  readonly areaMm2: number;
  readonly boxMm: Vec2;
}

/** What one run over the parts shares: shapes and no-fit polygons are worked out once. */
export interface Bench {
  readonly options: LayoutOptions;
  readonly store: NoFits;
  readonly square: Shape;
  readonly shape: (part: Part, turnDeg: number) => Shape;
}

export const roomOf = (stock: SheetStock, options: LayoutOptions): Room => ({
  sizeUm: [Math.round(stock.wMm * UM), Math.round(stock.hMm * UM)],
  marginUm: Math.round(options.marginMm * UM),
});

const openSheet = (stock: SheetStock, { options }: Bench): OpenSheet => ({
  stock,
  room: roomOf(stock, options),
  laid: [],
  placements: [],
  square: null,
  areaMm2: 0,
});

/** Gives a sheet its test square if there is room. */
export function addSquare(sheet: OpenSheet, bench: Bench): void {
  const place = bestPlace(sheet.room, sheet.laid, bench.square, bench.store);
  if (!place) return;
  sheet.square = place.at;
  sheet.laid.push({ shape: bench.square, at: place.at });
}

/** Lays a part on a sheet at the turn and place of the shortest reach; false when there is no room for it. */
export function layOnSheet(job: Job, sheet: OpenSheet, bench: Bench): boolean {
  let best: { shape: Shape; turnDeg: number; at: Vec2; reach: Reach } | null = null;
  for (const turnDeg of allowedTurns(job.part, sheet.stock)) {
    const shape = bench.shape(job.part, turnDeg);
    const found = bestPlace(sheet.room, sheet.laid, shape, bench.store);
    if (found && (!best || shorter(found.reach, best.reach))) best = { shape, turnDeg, ...found };
  }
  if (!best) return false;
  const { shape, turnDeg, at } = best;
  sheet.laid.push({ shape, at });
  sheet.placements.push({
    partKey: job.part.key,
    turnDeg,
    moveMm: [(at[0] - shape.from[0]) / UM, (at[1] - shape.from[1]) / UM],
  });
  sheet.areaMm2 += job.areaMm2;
  return true;
}

/** A new sheet with the part on it. The square goes first when it is kept for, unless the part then has no room. */
export function startSheet(job: Job, stock: SheetStock, bench: Bench, keepSquare: boolean): OpenSheet {
  if (keepSquare) {
    const sheet = openSheet(stock, bench);
    addSquare(sheet, bench);
    if (layOnSheet(job, sheet, bench)) return sheet;
  }
  const sheet = openSheet(stock, bench);
  if (!layOnSheet(job, sheet, bench)) throw new RangeError(`part ${job.part.key} does not lie on an empty sheet`);
  return sheet;
}
