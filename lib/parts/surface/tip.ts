import type { Surface } from '@/lib/airframe/schema/surface';
import { notBuiltYet, type Problem } from '@/lib/numerics/result';
import { radFromDeg, type Vec2 } from '@/lib/numerics/vec';
import { texts } from '@/lib/text/en/parts';
import { arcPoints } from '@/lib/geometry/arc';
import { lineMeet } from '@/lib/geometry/lines';
import type { Polyline } from '../shape/polyline';
import { distance } from '../shape/ring';
import { endOf, type Strip } from './strip';

// Tips are cut from the square tip: the outermost point stays at the panel's length, so the span is what the document says.

export interface Tipped {
  readonly strip: Strip;
  readonly problems: readonly Problem[];
}

const replaceEnd = (line: Polyline, points: readonly Vec2[]): Vec2[] => [...line.slice(0, -1), ...points];

/** The tip edge turned about its longer end: positive leaves the trailing edge outermost, negative the leading edge. */
function rake(strip: Strip, angleDeg: number): Strip | null {
  const [le, te] = endOf(strip, 'tip');
  const line = angleDeg > 0 ? strip.le : strip.te;
  const kept = angleDeg > 0 ? te : le;
  const inner = line.at(-2);
  const last = line.at(-1);
  if (!inner || !last) return null;
  const lean = Math.tan(radFromDeg(Math.abs(angleDeg)));
  const met = lineMeet(inner, [last[0] - inner[0], last[1] - inner[1]], kept, [-lean, angleDeg > 0 ? 1 : -1]);
  if (!met || met[0] <= inner[0] || met[0] > last[0]) return null;
  return angleDeg > 0 ? { ...strip, le: replaceEnd(line, [met]) } : { ...strip, te: replaceEnd(line, [met]) };
}

/** Both tip corners rounded to a radius. */
function round(strip: Strip, radiusMm: number): Strip | null {
  const [le, te] = endOf(strip, 'tip');
  const innerLe = strip.le.at(-2);
  const innerTe = strip.te.at(-2);
  if (!innerLe || !innerTe) return null;
  const atLe = arcPoints(innerLe, le, te, radiusMm);
  const atTe = arcPoints(innerTe, te, le, radiusMm);
  const taken = atLe.tangentMm + atTe.tangentMm;
  if (taken > distance(le, te) || atLe.tangentMm > distance(innerLe, le) || atTe.tangentMm > distance(innerTe, te))
    return null;
  return { le: replaceEnd(strip.le, atLe.points), te: replaceEnd(strip.te, atTe.points) };
}

/** The strip with the surface's tip cut to shape; a shape that does not fit leaves it square and says so. */
export function tipped(strip: Strip, tip: Surface['tip'], path: string): Tipped {
  const or = (shaped: Strip | null, key: string): Tipped =>
    shaped
      ? { strip: shaped, problems: [] }
      : {
          strip,
          problems: [{ code: 'tip-does-not-fit', path: `${path}.${key}`, message: texts.problems.tipDoesNotFit }],
        };
  switch (tip.shape) {
    case 'square':
      return { strip, problems: [] };
    case 'raked':
      return tip.angleDeg === 0 ? { strip, problems: [] } : or(rake(strip, tip.angleDeg), 'angleDeg');
    case 'rounded':
      return or(round(strip, tip.radiusMm), 'radiusMm');
    case 'outline':
      return { strip, problems: [notBuiltYet(`${path}.points`, texts.notBuilt.tipOutline)] };
  }
}
