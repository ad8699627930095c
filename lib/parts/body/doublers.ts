import type { Body } from '@/lib/airframe/schema/fuselage';
import type { Material } from '@/lib/airframe/schema/stock';
import type { Problem } from '@/lib/numerics/result';
import { texts } from '@/lib/text/en/parts';
import { fill } from '@/lib/text/fill';
import { trimmedDigits } from '@/lib/units/number';
import { centrePart, type Draft, sidePart } from '../draft';
import { openDraft } from '../opening';
import { offsetLine, type Polyline } from '../shape/polyline';
import type { Part } from '../types';
import type { Box } from './box';
import { type BodyFace, type FacePiece, facePiece } from './faces';
import type { Inside } from './formers';
import { openingsThrough } from './openings';
import { stretch } from './unroll';

// Doublers lie against the inside of a face, between the neighbouring sheets, and make room for themselves in the formers.

type Doubler = Body['doublers'][number];

const negated = (line: Polyline): Polyline => line.map(([x, y]) => [x, 0 - y]);

/** The inside of a box at an x, what doublers there take up taken off. */
export function insideOf({ body, lines }: Box, x: number, materials: ReadonlyMap<string, Material>): Inside {
  const taken = (face: BodyFace): number =>
    body.doublers
      .filter((doubler) => doubler.face === face && doubler.fromX <= x && x < doubler.toX)
      .reduce((sum, { materialId }) => sum + (materials.get(materialId)?.thicknessMm ?? 0), 0);
  return {
    stbd: offsetLine(lines.halfIn, -taken('stbd')),
    port: negated(offsetLine(lines.halfIn, -taken('port'))),
    top: offsetLine(lines.topIn, -taken('top')),
    bottom: offsetLine(lines.bottomIn, taken('bottom')),
  };
}

function doublerPiece({ lines, origin }: Box, { face, fromX, toX }: Doubler, material: Material): FacePiece {
  const cut = (line: Polyline): Polyline => stretch(line, fromX, toX);
  const { halfIn, topIn, bottomIn } = lines;
  switch (face) {
    case 'stbd':
    case 'port':
      return facePiece('stbd', cut(halfIn), cut(bottomIn), cut(topIn), material, origin);
    case 'top':
      return facePiece('top', cut(topIn), cut(negated(halfIn)), cut(halfIn), material, origin);
    case 'bottom':
      return facePiece('bottom', cut(bottomIn), cut(negated(halfIn)), cut(halfIn), material, origin);
  }
}

function doublerPart(box: Box, doubler: Doubler, material: Material): { part: Part; problems: readonly Problem[] } {
  const piece = doublerPiece(box, doubler, material);
  const onSide = doubler.face === 'stbd' || doubler.face === 'port';
  const values = { body: box.name, id: doubler.id };
  const draft: Draft = {
    key: `${box.body.id}/${doubler.id}/doubler`,
    name: (side) =>
      onSide
        ? fill(texts.names.doublerSide, { ...values, side: texts.sides[side] })
        : fill(texts.names.doubler, values),
    elementId: doubler.id,
    material,
    outline: piece.outline,
    holes: [],
    operations: piece.folds,
    frame: piece.frame,
    faces: ['outer', 'inner'],
    grainDeg: onSide ? 0 : 90,
  };
  const made = openDraft(draft, openingsThrough(doubler.face, piece, box.body, box.path));
  const part =
    doubler.face === 'stbd' || doubler.face === 'port' ? sidePart(made.draft, doubler.face) : centrePart(made.draft);
  return { part, problems: made.problems };
}

/** All doublers of a box body, and a problem for each that leaves it. */
export function doublerParts(
  box: Box,
  materials: ReadonlyMap<string, Material>,
): { parts: Part[]; problems: Problem[] } {
  const from = box.body.stations[0]?.xMm ?? 0;
  const to = box.body.stations.at(-1)?.xMm ?? 0;
  const parts: Part[] = [];
  const problems: Problem[] = [];
  for (const [index, doubler] of box.body.doublers.entries()) {
    const path = `${box.path}.doublers.${index}`;
    const material = materials.get(doubler.materialId);
    if (!material) {
      const message = fill(texts.problems.unknownMaterial, { id: doubler.materialId });
      problems.push({ code: 'unknown-reference', path: `${path}.materialId`, message });
    } else if (!(doubler.fromX >= from && doubler.toX <= to && doubler.fromX < doubler.toX)) {
      const values = { from: trimmedDigits(from, 1), to: trimmedDigits(to, 1) };
      problems.push({
        code: 'outside-body',
        path: `${path}.fromX`,
        message: fill(texts.problems.doublerOutsideBody, values),
      });
    } else {
      const made = doublerPart(box, doubler, material);
      parts.push(made.part);
      problems.push(...made.problems);
    }
  }
  return { parts, problems };
}
