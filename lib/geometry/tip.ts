import { radFromDeg, type Vec2 } from '@/lib/numerics/vec';
import { arcPoints } from './arc';
import { distance, lineMeet } from './lines';

// Tips are cut from the square tip: the outermost point stays at the panel's length, so the span is what the document says.

/** Leading and trailing edge of a flat surface from root to tip: x outboard, y forward, mm. */
export interface Edges {
  readonly le: readonly Vec2[];
  readonly te: readonly Vec2[];
}

const replaceEnd = (line: readonly Vec2[], points: readonly Vec2[]): Vec2[] => [...line.slice(0, -1), ...points];

/** The tip edge turned about its longer end: positive leaves the trailing edge outermost, negative the leading edge. Null when it does not fit. */
export function rakedTip(edges: Edges, angleDeg: number): Edges | null {
  const [le, te] = [edges.le.at(-1), edges.te.at(-1)];
  const line = angleDeg > 0 ? edges.le : edges.te;
  const kept = angleDeg > 0 ? te : le;
  const inner = line.at(-2);
  const last = line.at(-1);
  if (!kept || !inner || !last) return null;
  const lean = Math.tan(radFromDeg(Math.abs(angleDeg)));
  const met = lineMeet(inner, [last[0] - inner[0], last[1] - inner[1]], kept, [-lean, angleDeg > 0 ? 1 : -1]);
  if (!met || met[0] <= inner[0] || met[0] > last[0]) return null;
  return angleDeg > 0 ? { ...edges, le: replaceEnd(line, [met]) } : { ...edges, te: replaceEnd(line, [met]) };
}

/** Both tip corners rounded to a radius. Null when it does not fit. */
export function roundedTip(edges: Edges, radiusMm: number): Edges | null {
  const [le, te] = [edges.le.at(-1), edges.te.at(-1)];
  const innerLe = edges.le.at(-2);
  const innerTe = edges.te.at(-2);
  if (!le || !te || !innerLe || !innerTe || distance(le, te) === 0) return null;
  const atLe = arcPoints(innerLe, le, te, radiusMm);
  const atTe = arcPoints(innerTe, te, le, radiusMm);
  const taken = atLe.tangentMm + atTe.tangentMm;
  if (taken > distance(le, te) || atLe.tangentMm > distance(innerLe, le) || atTe.tangentMm > distance(innerTe, te))
    return null;
  return { le: replaceEnd(edges.le, atLe.points), te: replaceEnd(edges.te, atTe.points) };
}
