import type { Airframe } from '@/lib/airframe/schema/airframe';
import { signedArea } from '@/lib/geometry/polygons';
import { add3, mirror3, scale3, type Vec2, type Vec3 } from '@/lib/numerics/vec';
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

/** One line per part: its area with holes off, times the sheet's mass per area, spread as a plate. */
export function foamLines(airframe: Airframe, parts: readonly Part[]): MassLine[] {
  return parts.map((part) => {
    const material = airframe.materials.find(({ id }) => id === part.materialId);
    if (!material) throw new RangeError(`part ${part.key} names an unknown material ${part.materialId}`);
    const flat = plate(part.outline, part.holes, part.thicknessMm, part.frame);
    const massG = (flat.areaMm2 * material.arealMassGm2) / 1e6;
    return {
      key: part.key,
      name: part.name,
      group: 'foam',
      massG,
      at: flat.at,
      spread: scaleSpread(flat.spread, massG),
    };
  });
}

interface Run {
  readonly lengthMm: number;
  readonly areaMm2: number;
  readonly middle: Vec2;
}

/** Length and middle of an operation's path; the area it encloses when it is closed. */
function runOf({ path, closed }: Operation): Run | null {
  const first = path[0];
  if (!first) return null;
  const points = closed ? [...path, first] : path;
  let [lengthMm, mx, my] = [0, 0, 0];
  for (const [index, b] of points.entries()) {
    const a = points[index - 1];
    if (!a) continue;
    const step = Math.hypot(b[0] - a[0], b[1] - a[1]);
    lengthMm += step;
    mx += (step * (a[0] + b[0])) / 2;
    my += (step * (a[1] + b[1])) / 2;
  }
  if (lengthMm === 0) return null;
  return { lengthMm, areaMm2: closed ? Math.abs(signedArea(path)) : 0, middle: [mx / lengthMm, my / lengthMm] };
}

const inSpace = ({ frame: { origin, ex, ey } }: Part, [x, y]: Vec2): Vec3 =>
  add3(origin, add3(scale3(ex, x), scale3(ey, y)));

/** What is spread on one part's operations of a kind, as one point mass at its middle. */
function onPart(part: Part, kind: Operation['kind'], massOf: (run: Run, operation: Operation) => number) {
  let massG = 0;
  let moment: Vec3 = [0, 0, 0];
  for (const operation of part.operations) {
    const run = operation.kind === kind ? runOf(operation) : null;
    if (!run) continue;
    const mass = massOf(run, operation);
    massG += mass;
    moment = add3(moment, scale3(inSpace(part, run.middle), mass));
  }
  return massG > 0 ? { massG, at: scale3(moment, 1 / massG) } : null;
}

/**
 * Glue: along each marked line by its length, over each marked area by its area, and along each spar or boom let into foam by
 * the length of the tube. When the parts mark none, a stated share of the foam at the foam's own centre.
 */
export function glueLines(
  airframe: Airframe,
  { parts, stockPieces }: Development,
  foam: readonly MassLine[],
): MassLine[] {
  const { glueGPerM, glueGm2 } = airframe.build;
  const marked = parts.flatMap((part): MassLine[] => {
    const glue = onPart(part, 'glue', (run) =>
      run.areaMm2 > 0 ? (run.areaMm2 * glueGm2) / 1e6 : (run.lengthMm * glueGPerM) / 1000,
    );
    if (!glue) return [];
    return [
      { key: `${part.key}/glue`, name: fill(texts.glue, { part: part.name }), group: 'glue', ...glue, spread: POINT },
    ];
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
      if (count !== 2) return [{ ...line, key: `${key}/glue`, at: middle }];
      return [
        { ...line, key: `${key}/glue/stbd`, at: middle },
        { ...line, key: `${key}/glue/port`, at: mirror3(middle), spread: rodSpread(massG, mirror3(from), mirror3(to)) },
      ];
    });
  if (marked.length > 0 || foam.length === 0) return [...marked, ...tubes];
  return [...tubes, sharedGlue(foam)];
}

/** Glue as a share of the foam, spread as the foam is. */
function sharedGlue(foam: readonly MassLine[]): MassLine {
  const foamG = foam.reduce((sum, line) => sum + line.massG, 0);
  const at = scale3(
    foam.reduce<Vec3>((sum, line) => add3(sum, scale3(line.at, line.massG)), [0, 0, 0]),
    1 / foamG,
  );
  const spread = foam.reduce((sum, line) => {
    const offset: Vec3 = [line.at[0] - at[0], line.at[1] - at[1], line.at[2] - at[2]];
    return addSpread(sum, addSpread(line.spread, offsetSpread(line.massG, offset)));
  }, POINT);
  return {
    key: 'glue',
    name: texts.glueShare,
    group: 'glue',
    massG: foamG * GLUE_SHARE,
    at,
    spread: scaleSpread(spread, GLUE_SHARE),
  };
}

/** Tape along each marked line, as wide as the part says or as the roll is. */
export function tapeLines(airframe: Airframe, parts: readonly Part[]): MassLine[] {
  return parts.flatMap((part): MassLine[] => {
    const tape = onPart(part, 'tape', (run, { widthMm }) => {
      const area = run.areaMm2 > 0 ? run.areaMm2 : run.lengthMm * (widthMm ?? TAPE_WIDTH_MM);
      return (area * airframe.build.tapeGm2) / 1e6;
    });
    if (!tape) return [];
    return [
      { key: `${part.key}/tape`, name: fill(texts.tape, { part: part.name }), group: 'glue', ...tape, spread: POINT },
    ];
  });
}
