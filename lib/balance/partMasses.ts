import type { Airframe } from '@/lib/airframe/schema/airframe';
import { contains, edges, signedArea } from '@/lib/geometry/polygons';
import { add3, mirror3, scale3, sub3, type Vec2, type Vec3 } from '@/lib/numerics/vec';
import { type Facet, facetsOf } from '@/lib/parts/shape/facets';
import { fromPart } from '@/lib/parts/shape/frame';
import { distanceToRing } from '@/lib/parts/shape/ring';
import type { Development, Operation, Part } from '@/lib/parts/types';
import { texts } from '@/lib/text/en/balance';
import { fill } from '@/lib/text/fill';
import type { MassLine } from './line';
import { addSpread, offsetSpread, POINT, plate, rodSpread, scaleSpread } from './spread';

// Masses of what is cut from sheet, and of the glue and tape that the parts call for.

/** Glue as a share of the foam's mass when no part says where it goes. Common practice, no source: weigh yours. */
export const GLUE_SHARE = 0.05;
/** Width of a strip of tape when the part does not say, mm: clear packing tape. Common practice, no source. */
const TAPE_WIDTH_MM = 48;

type Piece = Pick<MassLine, 'massG' | 'at' | 'spread'>;

interface Size {
  readonly lengthMm: number;
  /** What a closed path encloses; 0 for an open one. */
  readonly areaMm2: number;
}

/** Several masses as one: their sum at their common centre. */
function together(pieces: readonly Piece[]): Piece {
  const massG = pieces.reduce((sum, piece) => sum + piece.massG, 0);
  const moment = pieces.reduce<Vec3>((sum, piece) => add3(sum, scale3(piece.at, piece.massG)), [0, 0, 0]);
  const at = scale3(moment, 1 / massG);
  const spread = pieces.reduce(
    (sum, piece) => addSpread(sum, addSpread(piece.spread, offsetSpread(piece.massG, sub3(piece.at, at)))),
    POINT,
  );
  return { massG, at, spread };
}

/** The flat piece that a point of a part lies on: the nearest, for a point on an edge or a fold. */
function facetAt(facets: readonly Facet[], p: Vec2): Facet {
  const [first, ...more] = facets;
  if (!first) throw new RangeError('a part has at least one flat piece');
  if (more.length === 0) return first;
  return (
    facets.find(({ outline }) => contains(outline, p)) ??
    more.reduce(
      (best, facet) => (distanceToRing(p, facet.outline) < distanceToRing(p, best.outline) ? facet : best),
      first,
    )
  );
}

/** One line per part: its area with holes off, times the sheet's mass per area, spread as the plates it is folded to. */
export function foamLines(airframe: Airframe, parts: readonly Part[]): MassLine[] {
  return parts.map((part) => {
    const material = airframe.materials.find(({ id }) => id === part.materialId);
    if (!material) throw new RangeError(`part ${part.key} names an unknown material ${part.materialId}`);
    const pieces = facetsOf(part).map(({ outline, holes, frame }): Piece => {
      const flat = plate(outline, holes, part.thicknessMm, frame);
      const massG = (flat.areaMm2 * material.arealMassGm2) / 1e6;
      return { massG, at: flat.at, spread: scaleSpread(flat.spread, massG) };
    });
    return { key: part.key, name: part.name, group: 'foam', ...together(pieces) };
  });
}

/** Glue or tape on one part, in the places where its folds bring it. */
function onPart(
  part: Part,
  kind: Operation['kind'],
  massOf: (size: Size, operation: Operation) => number,
): Piece | null {
  const operations = part.operations.filter((operation) => operation.kind === kind);
  if (operations.length === 0) return null;
  const facets = facetsOf(part);
  const pieces = operations.flatMap((operation): Piece[] => {
    const { path, closed, sharedBy = 1 } = operation;
    const areaMm2 = closed ? Math.abs(signedArea(path)) : 0;
    const stretches = closed ? edges(path) : edges(path).slice(0, -1);
    const lengths = stretches.map(([a, b]) => Math.hypot(b[0] - a[0], b[1] - a[1]));
    const lengthMm = lengths.reduce((sum, length) => sum + length, 0);
    if (lengthMm === 0) return [];
    const whole = massOf({ lengthMm, areaMm2 }, operation) / sharedBy;
    return stretches.map(([a, b], index) => {
      const massG = (whole * (lengths[index] ?? 0)) / lengthMm;
      const { frame } = facetAt(facets, [(a[0] + b[0]) / 2, (a[1] + b[1]) / 2]);
      const [from, to] = [fromPart(frame, a), fromPart(frame, b)];
      return { massG, at: scale3(add3(from, to), 0.5), spread: rodSpread(massG, from, to) };
    });
  });
  return pieces.some(({ massG }) => massG > 0) ? together(pieces) : null;
}

/**
 * Glue, each joint once: along each marked line by its length, over each marked area by its area, and along each spar or boom let into foam by
 * the length of the tube. When the parts mark none, a stated share of the foam at the foam's own centre.
 */
export function glueLines(
  airframe: Airframe,
  { parts, stockPieces }: Development,
  foam: readonly MassLine[],
): MassLine[] {
  const { glueGPerM, glueGm2 } = airframe.build;
  const marked = parts.flatMap((part): MassLine[] => {
    const glue = onPart(part, 'glue', ({ lengthMm, areaMm2 }) =>
      areaMm2 > 0 ? (areaMm2 * glueGm2) / 1e6 : (lengthMm * glueGPerM) / 1000,
    );
    if (!glue) return [];
    return [{ key: `${part.key}/glue`, name: fill(texts.glue, { part: part.name }), group: 'glue', ...glue }];
  });
  const booms = new Set(airframe.booms.map(({ id }) => id));
  const tubes = stockPieces
    .filter(({ key }) => !booms.has(key.split('/')[0] ?? ''))
    .flatMap(({ key, name, lengthMm, count, from, to }): MassLine[] => {
      const massG = (lengthMm * glueGPerM) / 1000;
      if (massG === 0) return [];
      const middle = scale3(add3(from, to), 0.5);
      const line = {
        name: fill(texts.glueTube, { tube: name }),
        group: 'glue' as const,
        massG,
        spread: rodSpread(massG, from, to),
      };
      const onSide = (side: 'stbd' | 'port') => fill(texts.side, { name: line.name, side: texts[side] });
      if (count !== 2) return [{ ...line, key: `${key}/glue`, at: middle }];
      return [
        { ...line, key: `${key}/glue/stbd`, name: onSide('stbd'), at: middle },
        {
          ...line,
          key: `${key}/glue/port`,
          name: onSide('port'),
          at: mirror3(middle),
          spread: rodSpread(massG, mirror3(from), mirror3(to)),
        },
      ];
    });
  if (marked.length > 0 || foam.length === 0) return [...marked, ...tubes];
  return [...tubes, sharedGlue(foam)];
}

/** Glue as a share of the foam, spread as the foam is. */
function sharedGlue(foam: readonly MassLine[]): MassLine {
  const { massG, at, spread } = together(foam);
  return {
    key: 'glue',
    name: texts.glueShare,
    group: 'glue',
    massG: massG * GLUE_SHARE,
    at,
    spread: scaleSpread(spread, GLUE_SHARE),
  };
}

/** Tape along each marked line, as wide as the part says or as the roll is. */
export function tapeLines(airframe: Airframe, parts: readonly Part[]): MassLine[] {
  return parts.flatMap((part): MassLine[] => {
    const tape = onPart(part, 'tape', ({ lengthMm, areaMm2 }, { widthMm }) => {
      const area = areaMm2 > 0 ? areaMm2 : lengthMm * (widthMm ?? TAPE_WIDTH_MM);
      return (area * airframe.build.tapeGm2) / 1e6;
    });
    if (!tape) return [];
    return [{ key: `${part.key}/tape`, name: fill(texts.tape, { part: part.name }), group: 'glue', ...tape }];
  });
}
