import type { Body } from '@/lib/airframe/schema/fuselage';
import type { Material } from '@/lib/airframe/schema/stock';
import { contains, counterClockwise } from '@/lib/geometry/polygons';
import { notBuiltYet, type Problem } from '@/lib/numerics/result';
import type { Vec2, Vec3 } from '@/lib/numerics/vec';
import { texts } from '@/lib/text/en/parts';
import { fill } from '@/lib/text/fill';
import { centrePart } from '../draft';
import { type Opening, openDraft } from '../opening';
import { heightAt } from '../shape/polyline';
import { cleanRing, distanceToRing, mirror2, selfCrossing } from '../shape/ring';
import type { Developed } from '../surface/surfaceParts';
import { OPENING_EDGE_MM } from './openings';

const NONE: Developed = { parts: [], stockPieces: [], problems: [] };

/** Side view of the plate, body axes: x aft, z up. */
const sideView = ({ outline, stations }: Body): Vec2[] =>
  outline
    ? outline.map(([x, z]): Vec2 => [x, z])
    : [
        ...stations.map(({ xMm, topMm }): Vec2 => [xMm, topMm]),
        ...[...stations].reverse().map(({ xMm, bottomMm }): Vec2 => [xMm, bottomMm]),
      ];

function plateOpenings(
  body: Body,
  path: string,
  outline: readonly Vec2[],
): { openings: Opening[]; problems: Problem[] } {
  const problems: Problem[] = [];
  const middle = (x: number): number =>
    (heightAt(
      body.stations.map(({ xMm, topMm }): Vec2 => [xMm, topMm]),
      x,
    ) +
      heightAt(
        body.stations.map(({ xMm, bottomMm }): Vec2 => [xMm, bottomMm]),
        x,
      )) /
    2;
  const openings = body.openings.flatMap(({ face, fromX, toX, widthMm }, index) => {
    const z = middle((fromX + toX) / 2);
    const ring: Vec2[] = [
      [-toX, z - widthMm / 2],
      [-fromX, z - widthMm / 2],
      [-fromX, z + widthMm / 2],
      [-toX, z + widthMm / 2],
    ];
    const inside = ring.every((p) => contains(outline, p) && distanceToRing(p, outline) >= OPENING_EDGE_MM);
    const place = `${path}.openings.${index}`;
    if ((face === 'port' || face === 'stbd') && inside) return [{ path: place, rings: [ring] }];
    problems.push({ code: 'opening-off-face', path: place, message: texts.problems.openingOffFace });
    return [];
  });
  return { openings, problems };
}

/** A body that is one flat plate on the centre plane, seen from starboard: nose to the right. */
export function profileParts(body: Body, path: string, origin: Vec3, material: Material): Developed {
  const problems: Problem[] = [];
  if (body.formers.length > 0) problems.push(notBuiltYet(`${path}.formers`, texts.notBuilt.profileFormers));
  if (body.doublers.length > 0) problems.push(notBuiltYet(`${path}.doublers`, texts.notBuilt.profileDoublers));
  const ring = cleanRing([...counterClockwise(sideView(body).map(mirror2))]);
  if (ring.length < 3 || selfCrossing(ring)) {
    const place = body.outline ? `${path}.outline` : `${path}.stations`;
    return {
      ...NONE,
      problems: [...problems, { code: 'outline-crosses', path: place, message: texts.problems.plateCrosses }],
    };
  }
  const found = plateOpenings(body, path, ring);
  const { draft, problems: cut } = openDraft(
    {
      key: `${body.id}/plate`,
      name: () => fill(texts.names.bodyPlate, { body: body.name ?? texts.names.body }),
      elementId: body.id,
      material,
      outline: ring,
      holes: [],
      operations: [],
      frame: { origin, ex: [-1, 0, 0], ey: [0, 0, 1] },
      faces: ['outer', 'inner'],
      grainDeg: 0,
    },
    found.openings,
  );
  return { parts: [centrePart(draft)], stockPieces: [], problems: [...problems, ...found.problems, ...cut] };
}
