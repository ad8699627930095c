import { distance } from '@/lib/geometry/lines';
import { contains, edges, signedArea } from '@/lib/geometry/polygons';
import { SAME_POINT_MM } from '@/lib/numerics/tolerances';
import { scale3, sub3, type Vec2, type Vec3 } from '@/lib/numerics/vec';
import type { Operation, Part, PartFrame } from '../types';
import { cutRing } from './cut';
import { fromPart, normalOf, turnFrame, unit3 } from './frame';
import { edgesCross, type Ring, turnOf } from './ring';

// Where the flat pieces of a folded part stand in the aircraft. The part is parted along its folds; each piece beyond a fold
// is turned about the face that the fold leaves whole. The piece with the outline's first corner stands in the part's frame.

/** A flat piece of a part between its folds: still in the part's own axes, with the frame that puts it in the aircraft. */
export interface Facet {
  readonly outline: Ring;
  /** Parts of openings that lie in this piece, clockwise; one across a fold touches the outline. */
  readonly holes: readonly Ring[];
  readonly frame: PartFrame;
}

interface Fold {
  readonly operation: Operation;
  /** From edge to edge of the part: the fold, and the slits at its ends where it does not reach an edge itself. */
  readonly path: readonly Vec2[];
  readonly a: Vec2;
  readonly b: Vec2;
}

interface Piece {
  readonly outline: Ring;
  readonly holes: readonly Ring[];
}

const isFold = ({ kind, angleDeg, closed, path }: Operation): boolean =>
  (kind === 'cutToPaper' || kind === 'crease') &&
  angleDeg !== undefined &&
  angleDeg !== 0 &&
  !closed &&
  path.length > 1;

/** How far beside a fold the two pieces that it joins are looked for, mm. */
const BESIDE_MM = 0.01;
/** A piece smaller than this weighs nothing, mm2: rounding beside a fold on an edge. */
const LEAST_PIECE_MM2 = 0.01;

/** The rest of a fold's line when an opening parts it: "fold-1-2" goes on from "fold-1". */
function restOf(fold: Operation, all: readonly Operation[]): Operation[] {
  return all.filter((other) => other.id.startsWith(`${fold.id}-`) && /^\d+$/.test(other.id.slice(fold.id.length + 1)));
}

/** Folds of a part, each as one line. */
function foldsOf({ operations }: Part): Fold[] {
  const all = operations.filter(isFold);
  const rests = new Set(all.flatMap((fold) => restOf(fold, all)));
  return all
    .filter((fold) => !rests.has(fold))
    .flatMap((operation): Fold[] => {
      const points = [operation, ...restOf(operation, all)].flatMap(({ path }) => path);
      const [a, b] = [points[0], points.at(-1)];
      return a && b
        ? [{ operation, a, b, path: [...slitTo(a, operations).reverse(), a, b, ...slitTo(b, operations)] }]
        : [];
    });
}

/** A slit that begins where a fold ends, from there on; empty when there is none. */
function slitTo(end: Vec2, operations: readonly Operation[]): Vec2[] {
  for (const { kind, path, closed } of operations) {
    const [first, last] = [path[0], path.at(-1)];
    if (kind !== 'cut' || closed || !first || !last || path.length < 2) continue;
    if (distance(first, end) < SAME_POINT_MM) return path.slice(1);
    if (distance(last, end) < SAME_POINT_MM) return path.slice(0, -1).reverse();
  }
  return [];
}

/** The part of a ring to the left of a line. Pieces joined along the line by a slit of no width add up to the right area and moments. */
function leftOf(ring: Ring, a: Vec2, b: Vec2): Vec2[] {
  return edges(ring).flatMap(([p, q]): Vec2[] => {
    const [s, t] = [turnOf(a, b, p), turnOf(a, b, q)];
    const own: Vec2[] = s >= 0 ? [p] : [];
    if (s >= 0 === t >= 0) return own;
    const k = s / (s - t);
    return [...own, [p[0] + (q[0] - p[0]) * k, p[1] + (q[1] - p[1]) * k]];
  });
}

/** What of a part's openings lies in a piece on the left of a fold from a to b. */
function holesIn(outline: Ring, holes: readonly Ring[], a: Vec2, b: Vec2): Ring[] {
  return holes.flatMap((hole): Ring[] => {
    if (edges(hole).some(([p, q]) => edgesCross(p, q, a, b))) return [leftOf(hole, a, b)];
    const [p, q] = hole;
    return p && q && contains(outline, [(p[0] + q[0]) / 2, (p[1] + q[1]) / 2]) ? [hole] : [];
  });
}

/** A piece parted along a fold, or null when the fold does not run across it. */
function parted({ outline, holes }: Piece, { path, a, b }: Fold): readonly [left: Piece, right: Piece] | null {
  if (!contains(outline, [(a[0] + b[0]) / 2, (a[1] + b[1]) / 2])) return null;
  const cut = cutRing(outline, path);
  if (!cut || signedArea(cut.left) < LEAST_PIECE_MM2 || signedArea(cut.right) < LEAST_PIECE_MM2) return null;
  return [
    { outline: cut.left, holes: holesIn(cut.left, holes, a, b) },
    { outline: cut.right, holes: holesIn(cut.right, holes, b, a) },
  ];
}

function partedAll(part: Part, folds: readonly Fold[]): Piece[] {
  const pieces: Piece[] = [{ outline: part.outline, holes: part.holes }];
  for (const fold of folds) {
    for (const [index, piece] of pieces.entries()) {
      const halves = parted(piece, fold);
      if (!halves) continue;
      pieces.splice(index, 1, ...halves);
      break;
    }
  }
  return pieces;
}

/** The frame of the piece on the left or right of a fold, from that of its neighbour across the fold. */
function turned(frame: PartFrame, part: Part, { operation, a, b }: Fold, toLeft: boolean): PartFrame {
  const worked = operation.face === part.face ? 1 : -1;
  const pivot = (p: Vec2): Vec3 => {
    const [x, y, z] = fromPart(frame, p);
    const [nx, ny, nz] = scale3(normalOf(frame), (-worked * part.thicknessMm) / 2);
    return [x + nx, y + ny, z + nz];
  };
  const along = unit3(sub3(pivot(b), pivot(a)));
  // Right-handed about a to b, the left side rises towards the normal.
  const angle = (operation.angleDeg ?? 0) * worked * (toLeft ? 1 : -1);
  return turnFrame(frame, pivot(a), along, angle);
}

/**
 * The flat pieces of a part as they stand in the assembled aircraft; the part itself when nothing on it folds. Pieces beyond a
 * fold that does not run from edge to edge stay where the flat part is.
 */
export function facetsOf(part: Part): Facet[] {
  const folds = foldsOf(part);
  if (folds.length === 0) return [{ outline: part.outline, holes: part.holes, frame: part.frame }];
  const pieces = partedAll(part, folds);
  const [corner] = part.outline;
  const start = Math.max(
    0,
    pieces.findIndex(({ outline }) => corner && outline.some((p) => distance(p, corner) < SAME_POINT_MM)),
  );
  const frames = new Map<number, PartFrame>([[start, part.frame]]);
  // A map grows as it is walked: every piece is reached from a neighbour that already stands.
  for (const [index, frame] of frames) {
    for (const fold of folds) {
      const [left, right] = besides(pieces, fold);
      const to = index === left ? right : index === right ? left : -1;
      if (to >= 0 && !frames.has(to)) frames.set(to, turned(frame, part, fold, to === left));
    }
  }
  return pieces.map((piece, index) => ({ ...piece, frame: frames.get(index) ?? part.frame }));
}

/** Indices of the pieces on the left and on the right of a fold, or -1. */
function besides(pieces: readonly Piece[], { a, b }: Fold): readonly [left: number, right: number] {
  const size = distance(a, b);
  const at = (sign: 1 | -1): number => {
    const p: Vec2 = [
      (a[0] + b[0]) / 2 - (sign * BESIDE_MM * (b[1] - a[1])) / size,
      (a[1] + b[1]) / 2 + (sign * BESIDE_MM * (b[0] - a[0])) / size,
    ];
    return pieces.findIndex(({ outline }) => contains(outline, p));
  };
  return [at(1), at(-1)];
}
