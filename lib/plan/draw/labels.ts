import { radFromDeg, type Vec2 } from '@/lib/numerics/vec';
import type { DrawnText } from '../drawing';
import { insideRing, pointToSegment, type Segment, segmentDistance, segmentsOf } from './segments';

// Finds a place for a label inside its part: clear of the cut lines, so that it is not cut through, and of the other labels.

/** Mean width of a letter over the height of a capital, from the fonts' own metrics, rounded up. */
const WIDTH_OVER_CAP: Readonly<Record<DrawnText['font'], number>> = { text: 0.82, mono: 0.87 };
/** Room kept between a label and a cut line or another label, mm: more than half a stroke and half a millimetre of bad hand. */
const CLEAR_MM = 1.2;
/** Labels below this cap height are not drawn: under 1.6 mm print gets hard to read. */
const LEAST_CAP_MM = 1.6;
const SHRINK = [1, 0.8, 0.64, 0.5, 0.4, 0.32] as const;
const GRID = 14;

export interface Spot {
  /** The label's centre, sheet mm. */
  readonly at: Vec2;
  readonly angleDeg: number;
}

export interface LabelWish {
  readonly text: string;
  readonly heightMm: number;
  readonly font: DrawnText['font'];
  /** Where it should stand, best first. When none has room, the deepest places of the part are tried. */
  readonly spots: readonly Spot[];
}

export interface LabelRoom {
  readonly outline: readonly Vec2[];
  readonly holes: readonly (readonly Vec2[])[];
  /** Segments of every cut line of the part. */
  readonly cuts: readonly Segment[];
  /** Segments of its other lines: kept clear of when there is a choice. */
  readonly others: readonly Segment[];
}

/** Text reads from the bottom or the right edge of the sheet, never upside down. */
const upright = (deg: number): number => {
  const wrapped = (((deg + 90) % 180) + 180) % 180;
  return wrapped - 90 === -90 ? 90 : wrapped - 90;
};

const boxOf = ({ text, font }: LabelWish, heightMm: number, at: Vec2, angleDeg: number): Vec2[] => {
  const [hw, hh] = [(text.length * heightMm * WIDTH_OVER_CAP[font]) / 2, heightMm / 2];
  const [cos, sin] = [Math.cos(radFromDeg(angleDeg)), Math.sin(radFromDeg(angleDeg))];
  const corners: Vec2[] = [
    [-hw, -hh],
    [hw, -hh],
    [hw, hh],
    [-hw, hh],
  ];
  return corners.map(([x, y]) => [at[0] + cos * x - sin * y, at[1] + sin * x + cos * y]);
};

const clearOf = (box: readonly Vec2[], segments: readonly Segment[]): boolean => {
  const edges = segmentsOf(box, true);
  return segments.every(
    (segment) => !insideRing(segment[0], box) && edges.every((edge) => segmentDistance(edge, segment) >= CLEAR_MM),
  );
};

const meets = (box: readonly Vec2[], other: readonly Vec2[]): boolean =>
  !clearOf(box, segmentsOf(other, true)) || box.some((corner) => insideRing(corner, other));

const fits = (box: readonly Vec2[], room: LabelRoom): boolean => {
  const [corner] = box;
  if (!corner || !insideRing(corner, room.outline) || room.holes.some((hole) => insideRing(corner, hole))) return false;
  return clearOf(box, room.cuts);
};

/** Inside points on a grid, those deepest in the part first, so that the first that fits is also the best looking. */
export function deepPoints(room: LabelRoom): Vec2[] {
  const xs = room.outline.map(([x]) => x);
  const ys = room.outline.map(([, y]) => y);
  const [left, bottom] = [Math.min(...xs), Math.min(...ys)];
  const [w, h] = [Math.max(...xs) - left, Math.max(...ys) - bottom];
  const found: { point: Vec2; depth: number }[] = [];
  for (let i = 1; i < GRID; i++) {
    for (let j = 1; j < GRID; j++) {
      const point: Vec2 = [left + (w * i) / GRID, bottom + (h * j) / GRID];
      if (!insideRing(point, room.outline)) continue;
      const depth = room.cuts.reduce((least, cut) => Math.min(least, pointToSegment(point, cut)), Infinity);
      found.push({ point, depth });
    }
  }
  return found.sort((a, b) => b.depth - a.depth).map(({ point }) => point);
}

const longestEdgeDeg = (outline: readonly Vec2[]): number => {
  let best = { length: 0, deg: 0 };
  for (const [[ax, ay], [bx, by]] of segmentsOf(outline, true)) {
    const length = Math.hypot(bx - ax, by - ay);
    if (length > best.length) best = { length, deg: (Math.atan2(by - ay, bx - ax) * 180) / Math.PI };
  }
  return best.deg;
};

interface Placed {
  readonly text: DrawnText;
  readonly box: readonly Vec2[];
}

/** The first spot with room, the full height before any smaller one. `avoidLines` keeps clear of fold and place lines too. */
function find(
  wish: LabelWish,
  spots: readonly Spot[],
  avoidLines: boolean,
  room: LabelRoom,
  taken: readonly Placed[],
): Placed | null {
  for (const share of SHRINK) {
    const heightMm = wish.heightMm * share;
    if (heightMm < LEAST_CAP_MM) return null;
    for (const spot of spots) {
      const angleDeg = upright(spot.angleDeg);
      const box = boxOf(wish, heightMm, spot.at, angleDeg);
      if (!fits(box, room) || (avoidLines && !clearOf(box, room.others))) continue;
      if (taken.some((other) => meets(box, other.box))) continue;
      return { text: { at: spot.at, text: wish.text, heightMm, angleDeg, font: wish.font, align: 'centre' }, box };
    }
  }
  return null;
}

/** Places labels in the order of their wishes; one that fits nowhere at a readable size is left out. */
export function placeLabels(wishes: readonly LabelWish[], room: LabelRoom): DrawnText[] {
  const placed: Placed[] = [];
  const angles = [...new Set([0, longestEdgeDeg(room.outline), 90].map(upright))];
  const deep = deepPoints(room).flatMap((at) => angles.map((angleDeg): Spot => ({ at, angleDeg })));
  for (const wish of wishes) {
    const spot =
      find(wish, wish.spots, true, room, placed) ??
      find(wish, wish.spots, false, room, placed) ??
      find(wish, deep, true, room, placed) ??
      find(wish, deep, false, room, placed);
    if (spot) placed.push(spot);
  }
  return placed.map(({ text }) => text);
}
