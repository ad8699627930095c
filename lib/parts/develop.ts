import { elementName } from '@/lib/airframe/names';
import { resolve } from '@/lib/airframe/resolve';
import type { ResolvedAirframe } from '@/lib/airframe/resolved';
import type { Airframe } from '@/lib/airframe/schema/airframe';
import type { Problem } from '@/lib/numerics/result';
import { length3, sub3 } from '@/lib/numerics/vec';
import { texts } from '@/lib/text/en/parts';
import { fill } from '@/lib/text/fill';
import { bodyParts } from './body/bodyParts';
import { withMarks } from './marks/withMarks';
import type { BoomHere } from './surface/boom';
import { tooLong } from './surface/spar';
import { type Developed, surfaceParts } from './surface/surfaceParts';
import type { Development, Part, StockPiece } from './types';
import { partFault } from './validate';

const byId = <T extends { readonly id: string }>(list: readonly T[]): ReadonlyMap<string, T> =>
  new Map(list.map((entry) => [entry.id, entry]));

function boomPieces(booms: readonly BoomHere[], airframe: Airframe): { pieces: StockPiece[]; problems: Problem[] } {
  const pieces = booms.map(
    ({ boom, resolved, tube }): StockPiece => ({
      key: `${boom.id}/tube`,
      name: elementName(airframe, boom.id),
      tubeId: tube.id,
      lengthMm: length3(sub3(resolved.aft, resolved.fore)),
      count: boom.mirrored ? 2 : 1,
      from: resolved.fore,
      to: resolved.aft,
    }),
  );
  const problems = booms.flatMap(({ boom, tube }) =>
    tooLong(tube, boom.lengthMm, `booms.${airframe.booms.indexOf(boom)}.lengthMm`),
  );
  return { pieces, problems };
}

/** Nothing leaves here that a blade cannot follow: such a part is left out and named at its element. */
function cuttable(made: Developed, path: string): Developed {
  const parts: Part[] = [];
  const faults: Problem[] = [];
  for (const part of made.parts) {
    const fault = partFault(part);
    if (!fault) {
      parts.push(part);
      continue;
    }
    const message = fill(texts.problems.partCannotBeCut, { part: part.name, fault });
    faults.push({ code: 'part-cannot-be-cut', path, message, fix: texts.problems.partCannotBeCutFix });
  }
  return faults.length === 0 ? made : { ...made, parts, problems: [...made.problems, ...faults] };
}

/**
 * As `develop`, for a caller that has the resolved airframe already and reads no marks: the same parts, cut and folded alike,
 * without labels, grain arrows and pin points. `withMarks` adds those.
 */
export function developResolved(airframe: Airframe, resolved: ResolvedAirframe): Development {
  const stock = { materials: byId(airframe.materials), tubes: byId(airframe.tubes) };
  const boomsById = byId(airframe.booms);
  const booms = resolved.booms.flatMap((place): BoomHere[] => {
    const boom = boomsById.get(place.boomId);
    const tube = boom && stock.tubes.get(boom.tubeId);
    return boom && tube ? [{ boom, resolved: place, tube }] : [];
  });
  const surfaces = resolved.surfaces.map((surface) =>
    cuttable(surfaceParts(surface, resolved.controls, stock, booms), `surfaces.${surface.index}`),
  );
  const bodies = airframe.bodies.map((body, index) => {
    const place = resolved.places.get(body.id);
    if (!place) throw new RangeError(`body ${body.id} has no place in the resolved airframe`);
    return cuttable(bodyParts(body, index, place.at, stock.materials), `bodies.${index}`);
  });
  const { pieces, problems } = boomPieces(booms, airframe);
  return {
    parts: [...surfaces, ...bodies].flatMap(({ parts }) => parts),
    stockPieces: [...surfaces.flatMap(({ stockPieces }) => stockPieces), ...pieces],
    problems: [...[...surfaces, ...bodies].flatMap((made) => made.problems), ...problems],
  };
}

/**
 * Turns an airframe into flat parts, true size in mm, with every operation on them, and into bought lengths of tube.
 * Deterministic: the same document gives the same parts in the same order. What cannot be developed yet, or cannot be cut,
 * is a problem at its path; all other parts still come. A document that does not resolve gives only its problems.
 */
export function develop(airframe: Airframe): Development {
  const resolved = resolve(airframe);
  if (!resolved.ok) return { parts: [], stockPieces: [], problems: resolved.problems };
  const development = developResolved(airframe, resolved.value);
  return { ...development, parts: withMarks(development.parts) };
}
