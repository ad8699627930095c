import { radFromDeg, type Vec2 } from '@/lib/numerics/vec';
import type { DrawnText } from '../drawing';
import { type Box, isIn, type LabelRoom } from './room';
import { insideRing, type Segment, segmentDistance, segmentsOf } from './segments';

// Finds a place for a label inside its part: clear of the cut lines, so that it is not cut through, of the other labels, and
// of the seams between pages where it can be.

/** Mean width of a letter over the height of a capital, from the fonts' own metrics, rounded up. */
const WIDTH_OVER_CAP: Readonly<Record<DrawnText['font'], number>> = { text: 0.82, mono: 0.87 };
/** Room kept between a label and a cut line or another label, mm: more than half a stroke and half a millimetre of bad hand. */
const CLEAR_MM = 1.2;
/** Labels below this cap height are not drawn: under 1.6 mm print gets hard to read. */
const LEAST_CAP_MM = 1.6;
const SHRINK = [1, 0.8, 0.64, 0.5, 0.4, 0.32] as const;
/** Rather another kind of place than a label smaller than this share of its wished size; then smaller all the same. */
const FAIR_SHARE = 0.5;
/** From the middle of one line of a label to the next, in heights of the taller one. */
const PITCH = 1.75;

export interface Spot {
  /** The label's centre, sheet mm. */
  readonly at: Vec2;
  readonly angleDeg: number;
}

export interface LabelLine {
  readonly text: string;
  readonly heightMm: number;
  readonly font: DrawnText['font'];
}

/** Lines that stand together, the first on top. */
export interface LabelWish {
  readonly lines: readonly LabelLine[];
  /** Where it may stand, best first. */
  readonly spots: readonly Spot[];
}

/** Text reads from the bottom or the right edge of the sheet, never upside down. */
export const upright = (deg: number): number => {
  const wrapped = (((deg + 90) % 180) + 180) % 180;
  return wrapped - 90 === -90 ? 90 : wrapped - 90;
};

interface Block {
  readonly texts: readonly DrawnText[];
  readonly corners: readonly Vec2[];
  readonly bounds: Box;
}

const boundsOf = (points: readonly Vec2[], rimMm: number): Box => {
  const xs = points.map(([x]) => x);
  const ys = points.map(([, y]) => y);
  return [Math.min(...xs) - rimMm, Math.min(...ys) - rimMm, Math.max(...xs) + rimMm, Math.max(...ys) + rimMm];
};

function blockAt(wish: LabelWish, share: number, { at, angleDeg }: Spot): Block {
  const turned = upright(angleDeg);
  const [cos, sin] = [Math.cos(radFromDeg(turned)), Math.sin(radFromDeg(turned))];
  const on = (x: number, y: number): Vec2 => [at[0] + cos * x - sin * y, at[1] + sin * x + cos * y];
  const lines = wish.lines.map((line) => ({
    ...line,
    heightMm: Math.max(LEAST_CAP_MM, line.heightMm * share),
  }));
  let down = 0;
  const middles = lines.map(({ heightMm }, i) => {
    const before = lines[i - 1];
    if (before) down += (PITCH * (before.heightMm + heightMm)) / 2;
    return down;
  });
  const first = (lines[0]?.heightMm ?? 0) / 2;
  const last = (lines.at(-1)?.heightMm ?? 0) / 2;
  const height = first + down + last;
  const halfWidth = Math.max(
    ...lines.map(({ text, font, heightMm }) => (text.length * heightMm * WIDTH_OVER_CAP[font]) / 2),
  );
  const texts = lines.map(({ text, font, heightMm }, i): DrawnText => {
    const y = height / 2 - first - (middles[i] ?? 0);
    return { at: on(0, y), text, heightMm, angleDeg: turned, font, align: 'centre' };
  });
  const corners = [
    on(-halfWidth, -height / 2),
    on(halfWidth, -height / 2),
    on(halfWidth, height / 2),
    on(-halfWidth, height / 2),
  ];
  return { texts, corners, bounds: boundsOf(corners, CLEAR_MM) };
}

const farFrom = ([[ax, ay], [bx, by]]: Segment, [x0, y0, x1, y1]: Box): boolean =>
  Math.max(ax, bx) < x0 || Math.min(ax, bx) > x1 || Math.max(ay, by) < y0 || Math.min(ay, by) > y1;

const clearOf = ({ corners, bounds }: Block, segments: readonly Segment[]): boolean => {
  const near = segments.filter((segment) => !farFrom(segment, bounds));
  if (near.length === 0) return true;
  const edges = segmentsOf(corners, true);
  return near.every(
    (segment) => !insideRing(segment[0], corners) && edges.every((edge) => segmentDistance(edge, segment) >= CLEAR_MM),
  );
};

const meets = (block: Block, other: Block): boolean =>
  !clearOf(block, segmentsOf(other.corners, true)) || block.corners.some((corner) => insideRing(corner, other.corners));

const fits = (block: Block, room: LabelRoom): boolean => {
  const [corner] = block.corners;
  if (!corner || !insideRing(corner, room.outline) || room.holes.some((hole) => insideRing(corner, hole))) return false;
  return clearOf(block, room.cuts);
};

const inOneWindow = ({ corners }: Block, windows: readonly Box[]): boolean =>
  windows.some((window) => corners.every((corner) => isIn(corner, window)));

/** Kinds of place, the best first. */
const PLACES = [
  { oneWindow: true, clearOfLines: true },
  { oneWindow: true, clearOfLines: false },
  { oneWindow: false, clearOfLines: true },
  { oneWindow: false, clearOfLines: false },
] as const;
export type PlaceKind = (typeof PLACES)[number];

export interface Placer {
  /** Puts a label in the best place that has room and keeps the place from the labels after it; false when there is none. */
  readonly place: (wish: LabelWish, kinds?: readonly PlaceKind[]) => boolean;
  /** All that was placed, in order. */
  readonly texts: () => DrawnText[];
}

/** Only places that can be read on one loose page. */
export const ON_ONE_PAGE: readonly PlaceKind[] = PLACES.filter(({ oneWindow }) => oneWindow);

function find(
  wish: LabelWish,
  shares: readonly number[],
  kind: PlaceKind,
  room: LabelRoom,
  taken: readonly Block[],
): Block | null {
  const spots = kind.oneWindow
    ? wish.spots.filter(({ at }) => room.windows.some((window) => isIn(at, window)))
    : wish.spots;
  for (const share of shares) {
    for (const spot of spots) {
      const block = blockAt(wish, share, spot);
      if (kind.oneWindow && !inOneWindow(block, room.windows)) continue;
      if (!fits(block, room) || (kind.clearOfLines && !clearOf(block, room.others))) continue;
      if (taken.some((other) => meets(block, other))) continue;
      return block;
    }
  }
  return null;
}

/** Places labels in a part one after the other. */
export function placer(room: LabelRoom): Placer {
  const taken: Block[] = [];
  return {
    place: (wish, kinds = PLACES) => {
      const tallest = Math.max(...wish.lines.map(({ heightMm }) => heightMm));
      // Once every line is as small as it may get, a smaller share changes nothing.
      const useful = SHRINK.filter((share) => share === 1 || tallest * share >= LEAST_CAP_MM * 0.8);
      const fair = useful.filter((share) => share >= FAIR_SHARE);
      const small = useful.filter((share) => share < FAIR_SHARE);
      for (const shares of [fair, small]) {
        for (const kind of kinds) {
          const block = find(wish, shares, kind, room, taken);
          if (!block) continue;
          taken.push(block);
          return true;
        }
      }
      return false;
    },
    texts: () => taken.flatMap(({ texts }) => texts),
  };
}
