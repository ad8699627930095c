import type { Body } from '@/lib/airframe/schema/fuselage';
import type { Material } from '@/lib/airframe/schema/stock';
import type { Problem } from '@/lib/numerics/result';
import type { Vec3 } from '@/lib/numerics/vec';
import { texts } from '@/lib/text/en/parts';
import { fill } from '@/lib/text/fill';
import { bothSides, centrePart, type Draft, sidePart } from '../draft';
import { openDraft } from '../opening';
import type { Polyline } from '../shape/polyline';
import type { Operation, Part } from '../types';
import type { BoxLines } from './boxLines';
import { type BodyFace, type FacePiece, facePiece } from './faces';
import { openingsOn } from './openings';

export interface Box {
  readonly body: Body;
  /** The body's path in the document. */
  readonly path: string;
  readonly origin: Vec3;
  readonly material: Material;
  readonly lines: BoxLines;
  readonly name: string;
}

const negated = (line: Polyline): Polyline => line.map(([x, y]) => [x, 0 - y]);

/** The three different faces of a box: a side (starboard), top and bottom. */
export function facesOf({ lines, material, origin }: Pick<Box, 'lines' | 'material' | 'origin'>) {
  const { half, halfIn, top, bottom } = lines;
  const across = [negated(halfIn), halfIn] as const;
  return {
    side: facePiece('stbd', half, bottom, top, material, origin),
    top: facePiece('top', top, ...across, material, origin),
    bottom: facePiece('bottom', bottom, ...across, material, origin),
  };
}

/** Lines on a side where the edges of top and bottom are glued. */
function glueLines(piece: FacePiece): Operation[] {
  const edges = [
    ['glue-top', piece.high],
    ['glue-bottom', piece.low],
  ] as const;
  return edges.map(([id, line]) => ({
    id,
    kind: 'glue',
    path: line.map(([x, v]) => piece.place(piece.unrolled.sAt(x), v)),
    closed: false,
    face: 'inner',
  }));
}

function draftOf(box: Box, piece: FacePiece, key: string, name: Draft['name']): Draft {
  return {
    key: `${box.body.id}/${key}`,
    name,
    elementId: box.body.id,
    material: box.material,
    outline: piece.outline,
    holes: [],
    operations: piece.folds,
    frame: piece.frame,
    faces: ['outer', 'inner'],
    // Along the body: a side lies nose to the right, top and bottom nose up.
    grainDeg: key === 'side' ? 0 : 90,
  };
}

const sameBothSides = ({ openings }: Body): boolean =>
  openings.every(({ face }) => face === 'top' || face === 'bottom');

/** Sides, top and bottom of a box body. */
export function boxFaces(box: Box): { parts: Part[]; problems: Problem[] } {
  const { body, path } = box;
  const faces = facesOf(box);
  const values = { body: box.name };
  const sideName: Draft['name'] = (side) => fill(texts.names.bodySide, { ...values, side: texts.sides[side] });
  const cut = (face: BodyFace, piece: FacePiece, draft: Draft) => {
    const on = openingsOn(face, piece, body, path);
    const made = openDraft(draft, on.openings);
    return { draft: made.draft, problems: [...on.problems, ...made.problems] };
  };
  const plain = draftOf(box, faces.side, 'side', sideName);
  const side: Draft = { ...plain, operations: [...plain.operations, ...glueLines(faces.side)] };
  const stbd = cut('stbd', faces.side, side);
  const port = cut('port', faces.side, side);
  const top = cut(
    'top',
    faces.top,
    draftOf(box, faces.top, 'top', () => fill(texts.names.bodyTop, values)),
  );
  const bottom = cut(
    'bottom',
    faces.bottom,
    draftOf(box, faces.bottom, 'bottom', () => fill(texts.names.bodyBottom, values)),
  );
  const sides = sameBothSides(body)
    ? bothSides(stbd.draft)
    : [sidePart(stbd.draft, 'stbd'), sidePart(port.draft, 'port')];
  return {
    parts: [...sides, centrePart(top.draft), centrePart(bottom.draft)],
    problems: [stbd, port, top, bottom].flatMap(({ problems }) => problems),
  };
}
