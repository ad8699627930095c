import { Clipper64, ClipType, FillRule, type Path64, type Paths64, translatePaths } from 'clipper2-ts';
import type { Vec2 } from '@/lib/numerics/vec';
import type { NoFits } from './noFit';
import type { Shape } from './shape';

/** A shape on the sheet: where its own zero (lower left of the true outline) lies, micrometres from the sheet's lower left. */
export interface Laid {
  readonly shape: Shape;
  readonly at: Vec2;
}

export interface Room {
  /** Sheet size, micrometres. */
  readonly sizeUm: Vec2;
  readonly marginUm: number;
}

/** Where a place is judged: first how far along the sheet's long side the part reaches, then across it. Less is better. */
export type Reach = readonly [along: number, across: number, start: number];

export const shorter = (a: Reach, b: Reach): boolean => {
  for (let i = 0; i < a.length; i++) {
    const [p, q] = [a[i] ?? 0, b[i] ?? 0];
    if (p !== q) return p < q;
  }
  return false;
};

/** The box in which a shape's zero may lie so that the true outline stays inside the sheet's margin; null when it is too big. */
export function insideFit(room: Room, shape: Shape): readonly [Vec2, Vec2] | null {
  const { sizeUm, marginUm } = room;
  const low: Vec2 = [marginUm, marginUm];
  const high: Vec2 = [sizeUm[0] - marginUm - shape.sizeUm[0], sizeUm[1] - marginUm - shape.sizeUm[1]];
  // A micrometre of rounding is no reason to refuse a part as wide as the sheet allows.
  return high[0] >= low[0] - 1 && high[1] >= low[1] - 1 ? [low, high] : null;
}

const reachOf = (room: Room, shape: Shape, [x, y]: Vec2): Reach => {
  const [right, top] = [x + shape.sizeUm[0], y + shape.sizeUm[1]];
  return room.sizeUm[0] >= room.sizeUm[1] ? [right, top, y] : [top, right, x];
};

/** Places to try: the corners of the region that the margins leave and no laid shape forbids. */
function candidates(room: Room, laid: readonly Laid[], shape: Shape, store: NoFits): Vec2[] {
  const box = insideFit(room, shape);
  if (!box) return [];
  const [[left, bottom], [right, top]] = box;
  if (laid.length === 0) return [[left, bottom]];
  // A box without width would vanish in the clipping, so it is opened by a micrometre and the corners are put back inside.
  const inside: Path64 = [
    { x: left - 1, y: bottom - 1 },
    { x: right + 1, y: bottom - 1 },
    { x: right + 1, y: top + 1 },
    { x: left - 1, y: top + 1 },
  ];
  const forbidden: Paths64 = laid.flatMap((other) =>
    translatePaths(store.between(other.shape, shape), other.at[0], other.at[1]),
  );
  const engine = new Clipper64();
  engine.addSubject([inside]);
  engine.addClip(forbidden);
  const free: Paths64 = [];
  engine.execute(ClipType.Difference, FillRule.NonZero, free);
  return free.flatMap((ring) =>
    ring.map(({ x, y }): Vec2 => [Math.min(Math.max(x, left), right), Math.min(Math.max(y, bottom), top)]),
  );
}

/** The place with the shortest reach for a shape on a sheet, or null when there is no room. */
export function bestPlace(
  room: Room,
  laid: readonly Laid[],
  shape: Shape,
  store: NoFits,
): { readonly at: Vec2; readonly reach: Reach } | null {
  let best: { at: Vec2; reach: Reach } | null = null;
  for (const at of candidates(room, laid, shape, store)) {
    const reach = reachOf(room, shape, at);
    if (!best || shorter(reach, best.reach)) best = { at, reach };
  }
  return best;
}
