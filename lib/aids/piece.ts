import type { Material } from '@/lib/airframe/schema/stock';
import type { Vec2, Vec3 } from '@/lib/numerics/vec';
import { bothSides, centrePart, type Draft } from '@/lib/parts/draft';
import { grainArrow } from '@/lib/parts/marks/grain';
import { roomIn } from '@/lib/parts/marks/room';
import type { Face, Operation, Part, PartFrame } from '@/lib/parts/types';
import { texts } from '@/lib/text/en/aids';
import { texts as partTexts } from '@/lib/text/en/parts';
import { fill } from '@/lib/text/fill';
import { labelsIn } from './labels';

/** What no element of the aircraft is called by: aids hang on none. */
export const AID_ID = 'aid';

/** A flat piece of an aid before its labels. */
export interface Piece {
  /** Key without the side: "aid/cg-stand/base". */
  readonly key: string;
  readonly name: string;
  /** What it is for and which numbers it holds, a line each. */
  readonly about: readonly string[];
  readonly material: Material;
  readonly outline: readonly Vec2[];
  readonly holes?: readonly (readonly Vec2[])[];
  readonly operations?: readonly Operation[];
  readonly frame: PartFrame;
  readonly faces?: readonly [Face, Face];
  /** Where its label stands on a piece that is cut once, when not simply where there is most room. */
  readonly labelAt?: Vec2;
  /** Only where it matters which way the sheet's grain runs. */
  readonly grainDeg?: number;
}

/** The frame of an upright piece seen from port: x aft, y up. */
export const sideOn = (origin: Vec3): PartFrame => ({ origin, ex: [1, 0, 0], ey: [0, 0, 1] });
/** The frame of an upright piece across the aircraft, seen from behind: x to starboard, y up. */
export const across = (origin: Vec3): PartFrame => ({ origin, ex: [0, 1, 0], ey: [0, 0, 1] });

/** A line to be drawn on a piece, with words beside it. */
export const markLine = (id: string, path: readonly Vec2[], note: string | undefined, face: Face): Operation => ({
  id,
  kind: 'reference',
  path,
  closed: false,
  face,
  ...(note === undefined ? {} : { note }),
});

const draftOf = (piece: Piece): Draft => ({
  key: piece.key,
  // Which side a gauge of a pair is used on is plain: its count tells the two apart.
  name: () => piece.name,
  elementId: AID_ID,
  material: piece.material,
  outline: piece.outline,
  holes: piece.holes ?? [],
  operations: piece.operations ?? [],
  frame: piece.frame,
  faces: piece.faces ?? ['outer', 'inner'],
  grainDeg: piece.grainDeg ?? 0,
});

function labelled(part: Part, { about, grainDeg, labelAt }: Piece, count: string | null): Part {
  const room = roomIn(part.outline, part.holes);
  const lines = [part.name, ...(count === null ? [] : [count]), texts.notPart, ...about];
  const grained = grainDeg !== undefined && part.grainDeg !== null;
  return {
    ...part,
    grainDeg: grained ? part.grainDeg : null,
    operations: [...part.operations, ...(grained ? grainArrow(room, grainDeg, part.face) : [])],
    labels: labelsIn(room, lines, labelAt),
  };
}

/** One piece, cut once. */
export const onePiece = (piece: Piece): Part => labelled(centrePart(draftOf(piece)), piece, null);

/** A piece for starboard and its mirror image for port. */
export const pairOf = (piece: Piece): Part[] =>
  bothSides(draftOf(piece)).map((part, i) =>
    labelled(part, piece, fill(partTexts.marks.count, { index: i + 1, of: 2 })),
  );
