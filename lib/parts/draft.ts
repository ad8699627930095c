import type { Material } from '@/lib/airframe/schema/stock';
import type { Vec2 } from '@/lib/numerics/vec';
import { cutsFace } from './marks/withMarks';
import { mirrorFrame } from './shape/frame';
import { mirror2, mirrorRing } from './shape/ring';
import type { Face, Operation, Part, PartFrame } from './types';

/** A flat piece before its marks: seen on its main face, starboard or centre. */
export interface Draft {
  /** Key without the side. */
  readonly key: string;
  readonly name: (side: Part['side']) => string;
  readonly elementId: string;
  readonly material: Material;
  readonly outline: readonly Vec2[];
  readonly holes: readonly (readonly Vec2[])[];
  readonly operations: readonly Operation[];
  readonly frame: PartFrame;
  /** The two faces: the one that `frame` looks out of, and its back. */
  readonly faces: readonly [Face, Face];
  /** Wanted grain in part axes; ignored for a material without grain. */
  readonly grainDeg: number;
}

const mirrorOperation = (operation: Operation): Operation => ({ ...operation, path: operation.path.map(mirror2) });

/** The piece seen from its back: nothing moves in the aircraft. */
const turnedOver = (draft: Draft): Draft => ({
  ...draft,
  outline: mirrorRing(draft.outline),
  holes: draft.holes.map(mirrorRing),
  operations: draft.operations.map(mirrorOperation),
  frame: { ...draft.frame, ex: [0 - draft.frame.ex[0], 0 - draft.frame.ex[1], 0 - draft.frame.ex[2]] },
  faces: [draft.faces[1], draft.faces[0]],
});

/** The same piece on the other side of the aircraft. */
const otherSide = (draft: Draft): Draft => ({
  ...draft,
  outline: mirrorRing(draft.outline),
  holes: draft.holes.map(mirrorRing),
  operations: draft.operations.map(mirrorOperation),
  frame: mirrorFrame(draft.frame),
});

/** A part is drawn on the face where most of its work is, so that a template is glued where the knife goes. */
function onWorkedFace(draft: Draft): Draft {
  const work = draft.operations.filter(cutsFace);
  const back = work.filter(({ face }) => face === draft.faces[1]).length;
  return back > work.length - back ? turnedOver(draft) : draft;
}

function finish(draft: Draft, side: Part['side'], mirrorOf?: string): Part {
  return {
    key: `${draft.key}/${side}`,
    name: draft.name(side),
    elementId: draft.elementId,
    side,
    materialId: draft.material.id,
    thicknessMm: draft.material.thicknessMm,
    ...(mirrorOf ? { mirrorOf } : {}),
    face: draft.faces[0],
    outline: draft.outline,
    holes: draft.holes,
    operations: draft.operations,
    labels: [],
    grainDeg: draft.material.grain === 'none' ? null : draft.grainDeg,
    frame: draft.frame,
  };
}

/** One part on the centre line. */
export const centrePart = (draft: Draft): Part => finish(onWorkedFace(draft), 'centre');

/** One part on a side, without a mirrored fellow. */
export const sidePart = (draft: Draft, side: 'stbd' | 'port'): Part =>
  finish(onWorkedFace(side === 'port' ? otherSide(draft) : draft), side);

/** The starboard part and its true mirror on the port side. */
export function bothSides(draft: Draft): Part[] {
  const worked = onWorkedFace(draft);
  return [finish(worked, 'stbd'), finish(otherSide(worked), 'port', `${draft.key}/stbd`)];
}
