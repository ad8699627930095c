import { namedElements } from '@/lib/airframe/names';
import { resolve } from '@/lib/airframe/resolve';
import type { ResolvedAirframe, ResolvedSurface } from '@/lib/airframe/resolved';
import type { Airframe } from '@/lib/airframe/schema/airframe';
import type { Tube } from '@/lib/airframe/schema/stock';
import { eachKept, type Kept, nothingKept } from '@/lib/numerics/kept';
import type { Problem } from '@/lib/numerics/result';
import { length3, sub3, type Vec3 } from '@/lib/numerics/vec';
import { texts } from '@/lib/text/en/parts';
import { fill } from '@/lib/text/fill';
import { bodyParts } from './body/bodyParts';
import { withMarks } from './marks/withMarks';
import type { BoomHere } from './surface/boom';
import { tooLong } from './surface/spar';
import { type Developed, surfaceParts } from './surface/surfaceParts';
import type { Development, StockPiece } from './types';
import { partFault } from './validate';

const byId = <T extends { readonly id: string }>(list: readonly T[]): ReadonlyMap<string, T> =>
  new Map(list.map((entry) => [entry.id, entry]));

function boomPieces(booms: readonly BoomHere[], airframe: Airframe): { pieces: StockPiece[]; problems: Problem[] } {
  const names = new Map(booms.length > 0 ? namedElements(airframe).map(({ id, name }) => [id, name]) : []);
  const pieces = booms.map(
    ({ boom, resolved, tube }): StockPiece => ({
      key: `${boom.id}/tube`,
      name: names.get(boom.id) ?? boom.id,
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
  const sound = new Set<string>();
  const faults: Problem[] = [];
  for (const part of made.parts) {
    // A mirror image is as sound as its fellow.
    const fault = part.mirrorOf && sound.has(part.mirrorOf) ? null : partFault(part);
    if (!fault) {
      sound.add(part.key);
      continue;
    }
    const message = fill(texts.problems.partCannotBeCut, { part: part.name, fault });
    faults.push({ code: 'part-cannot-be-cut', path, message, fix: texts.problems.partCannotBeCutFix });
  }
  if (faults.length === 0) return made;
  const parts = made.parts.filter(({ key }) => sound.has(key));
  return { ...made, parts, problems: [...made.problems, ...faults] };
}

/** What each surface and body came to the last time. Belongs to the caller. */
export interface DevelopmentMemory {
  readonly surfaces: Kept<Developed>;
  readonly bodies: Kept<Developed>;
}

/** A memory with nothing in it. */
export const newDevelopmentMemory = (): DevelopmentMemory => ({ surfaces: nothingKept(), bodies: nothingKept() });

/**
 * As `develop`, for a caller that has the resolved airframe already and reads no marks: the same parts, cut and folded alike,
 * without labels, grain arrows and pin points. `withMarks` adds those.
 * @param memory surfaces and bodies that have not changed since the last call keep their parts, the very same objects
 */
export function developResolved(
  airframe: Airframe,
  resolved: ResolvedAirframe,
  memory?: DevelopmentMemory,
): Development {
  const { materials, tubes } = airframe;
  const stock = { materials: byId(materials), tubes: byId(tubes) };
  const booms = boomsHere(airframe, resolved, stock.tubes);
  const controlsOf = ({ surface }: ResolvedSurface) =>
    resolved.controls.filter(({ surfaceId }) => surfaceId === surface.id);
  const surfaces = eachKept(memory?.surfaces, { materials, tubes, booms }, resolved.surfaces, {
    nameOf: ({ surface }) => surface.id,
    from: (surface) => [surface, controlsOf(surface)],
    work: (surface) => cuttable(surfaceParts(surface, controlsOf(surface), stock, booms), `surfaces.${surface.index}`),
  });
  const placeOf = (id: string): Vec3 => {
    const place = resolved.places.get(id);
    if (!place) throw new RangeError(`body ${id} has no place in the resolved airframe`);
    return place.at;
  };
  const bodies = eachKept(memory?.bodies, materials, airframe.bodies, {
    nameOf: ({ id }) => id,
    from: (body, index) => [body, index, placeOf(body.id)],
    work: (body, index) => cuttable(bodyParts(body, index, placeOf(body.id), stock.materials), `bodies.${index}`),
  });
  const { pieces, problems } = boomPieces(booms, airframe);
  return {
    parts: [...surfaces, ...bodies].flatMap(({ parts }) => parts),
    stockPieces: [...surfaces.flatMap(({ stockPieces }) => stockPieces), ...pieces],
    problems: [...[...surfaces, ...bodies].flatMap((made) => made.problems), ...problems],
  };
}

function boomsHere(airframe: Airframe, resolved: ResolvedAirframe, tubes: ReadonlyMap<string, Tube>): BoomHere[] {
  const boomsById = byId(airframe.booms);
  return resolved.booms.flatMap((place): BoomHere[] => {
    const boom = boomsById.get(place.boomId);
    const tube = boom && tubes.get(boom.tubeId);
    return boom && tube ? [{ boom, resolved: place, tube }] : [];
  });
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
