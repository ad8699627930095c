import type { Material } from '@/lib/airframe/schema/stock';
import type { Vec2 } from '@/lib/numerics/vec';
import { grainArrow } from './marks/grain';
import { partLabels } from './marks/labels';
import { registerMarks } from './marks/register';
import { roomIn } from './marks/room';
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

/** Work that a face decides: marks and glue can be read from either. */
const cutsFace = ({ kind }: Operation): boolean =>
  kind === 'cutToPaper' || kind === 'crease' || kind === 'bevel' || kind === 'foamOut' || kind === 'paperOff';

/** A part is drawn on the face where most of its work is, so that a template is glued where the knife goes. */
function onWorkedFace(draft: Draft): Draft {
  const work = draft.operations.filter(cutsFace);
  const back = work.filter(({ face }) => face === draft.faces[1]).length;
  return back > work.length - back ? turnedOver(draft) : draft;
}

function finish(draft: Draft, side: Part['side'], count: { index: number; of: number }, mirrorOf?: string): Part {
  const grainDeg = draft.material.grain === 'none' ? null : draft.grainDeg;
  const twoFaced = draft.operations.some((operation) => cutsFace(operation) && operation.face === draft.faces[1]);
  const name = draft.name(side);
  const shape = { outline: draft.outline, holes: draft.holes };
  const room = roomIn(draft.outline, draft.holes);
  return {
    key: `${draft.key}/${side}`,
    name,
    elementId: draft.elementId,
    side,
    materialId: draft.material.id,
    thicknessMm: draft.material.thicknessMm,
    ...(mirrorOf ? { mirrorOf } : {}),
    face: draft.faces[0],
    ...shape,
    operations: [
      ...draft.operations,
      ...(grainDeg === null ? [] : grainArrow(room, grainDeg, draft.faces[0])),
      ...(twoFaced ? registerMarks(room.places, draft.faces[0]) : []),
    ],
    labels: partLabels(room, name, { ...count, twoFaced }),
    grainDeg,
    frame: draft.frame,
  };
}

/** One part on the centre line. */
export const centrePart = (draft: Draft): Part => finish(onWorkedFace(draft), 'centre', { index: 1, of: 1 });

/** One part on a side, without a mirrored fellow. */
export const sidePart = (draft: Draft, side: 'stbd' | 'port'): Part =>
  finish(onWorkedFace(side === 'port' ? otherSide(draft) : draft), side, { index: 1, of: 1 });

/** The starboard part and its true mirror on the port side. */
export function bothSides(draft: Draft): Part[] {
  const worked = onWorkedFace(draft);
  return [
    finish(worked, 'stbd', { index: 1, of: 2 }),
    finish(otherSide(worked), 'port', { index: 2, of: 2 }, `${draft.key}/stbd`),
  ];
}
