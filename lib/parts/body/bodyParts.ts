import type { Body } from '@/lib/airframe/schema/fuselage';
import type { Material } from '@/lib/airframe/schema/stock';
import { notBuiltYet, type Problem } from '@/lib/numerics/result';
import type { Vec3 } from '@/lib/numerics/vec';
import { texts } from '@/lib/text/en/parts';
import { fill } from '@/lib/text/fill';
import { centrePart } from '../draft';
import type { Developed } from '../surface/surfaceParts';
import { type Box, boxFaces } from './box';
import { boxLines } from './boxLines';
import { doublerParts, insideOf } from './doublers';
import { formerDraft } from './formers';
import { profileParts } from './profile';

const unknown = (id: string, path: string): Problem => ({
  code: 'unknown-reference',
  path,
  message: fill(texts.problems.unknownMaterial, { id }),
});

/** A body developed with whatever its own kind asks: a box, or one plate for a profile. A nacelle is a short box. */
export function bodyParts(
  body: Body,
  index: number,
  origin: Vec3,
  materials: ReadonlyMap<string, Material>,
): Developed {
  const path = `bodies.${index}`;
  const material = materials.get(body.materialId);
  if (!material) return { parts: [], stockPieces: [], problems: [unknown(body.materialId, `${path}.materialId`)] };
  switch (body.kind) {
    case 'profile':
      return profileParts(body, path, origin, material);
    case 'box':
    case 'nacelle':
      return boxParts(body, path, origin, material, materials);
  }
}

function boxParts(
  body: Body,
  path: string,
  origin: Vec3,
  material: Material,
  materials: ReadonlyMap<string, Material>,
): Developed {
  const rounded = body.stations.flatMap(({ cornerMm }, index): Problem[] =>
    cornerMm > 0 ? [notBuiltYet(`${path}.stations.${index}.cornerMm`, texts.notBuilt.corner)] : [],
  );
  const found = boxLines(body, material.thicknessMm, path);
  if ('problems' in found) return { parts: [], stockPieces: [], problems: [...rounded, ...found.problems] };
  const box: Box = { body, path, origin, material, lines: found.lines, name: body.name ?? texts.names.body };
  const faces = boxFaces(box);
  const doublers = doublerParts(box, materials);
  const formers = body.formers.map((former, index) => {
    const place = `${path}.formers.${index}`;
    const own = materials.get(former.materialId);
    if (!own) return { problem: unknown(former.materialId, `${place}.materialId`) };
    const inside = insideOf(box, former.xMm, materials);
    return formerDraft(former, own, { body, bodyName: box.name, path: place, origin, inside });
  });
  return {
    parts: [
      ...faces.parts,
      ...doublers.parts,
      ...formers.flatMap((made) => ('draft' in made ? [centrePart(made.draft)] : [])),
    ],
    stockPieces: [],
    problems: [
      ...rounded,
      ...faces.problems,
      ...doublers.problems,
      ...formers.flatMap((made) => ('problem' in made ? [made.problem] : [])),
    ],
  };
}
