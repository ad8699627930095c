import { lineMeet } from '@/lib/geometry/lines';
import type { Vec2 } from '@/lib/numerics/vec';
import { toPart } from '../shape/frame';
import type { Polyline } from '../shape/polyline';
import { cleanRing, mirror2 } from '../shape/ring';
import type { Run } from './run';

// A flat piece between its leading and its trailing edge, root to tip. Part axes, starboard: x outboard, y forward.

export interface Strip {
  readonly le: Polyline;
  readonly te: Polyline;
}

/** A straight edge across the piece: a point on it and its direction. */
export interface Across {
  readonly at: Vec2;
  readonly along: Vec2;
}

/** The piece as the sections give it, before tips and joints. */
export function stripOf({ panels, frame, centre }: Run): Strip {
  const sections = panels.flatMap(({ root, tip }, index) => (index === 0 ? [root, tip] : [tip]));
  // On the centre line both halves begin at exactly x = 0, or they would not close.
  const place = (p: Vec2, index: number): Vec2 => (centre && index === 0 ? [0, p[1]] : p);
  return {
    le: sections.map(({ le }, index) => place(toPart(frame, le), index)),
    te: sections.map(({ te }, index) => place(toPart(frame, te), index)),
  };
}

function moveEnd(line: Polyline, end: 'root' | 'tip', edge: Across): Vec2[] {
  const ordered = end === 'root' ? [...line] : [...line].reverse();
  const [last, inner, ...rest] = ordered;
  if (!last || !inner) throw new RangeError('a strip needs two sections');
  const met = lineMeet(last, [inner[0] - last[0], inner[1] - last[1]], edge.at, edge.along);
  const moved = [met ?? last, inner, ...rest];
  return end === 'root' ? moved : moved.reverse();
}

/** The piece lengthened or shortened along its own edges to a straight line across it. */
export const trimStrip = ({ le, te }: Strip, end: 'root' | 'tip', edge: Across): Strip => ({
  le: moveEnd(le, end, edge),
  te: moveEnd(te, end, edge),
});

/** The outline, counter-clockwise, beginning at the tip's leading edge: the corner that no control takes. */
export function ringOf({ le, te }: Strip, centre: boolean): Vec2[] {
  const fore = [...le].reverse();
  if (!centre) return cleanRing([...fore, ...te]);
  return cleanRing([...fore, ...le.map(mirror2), ...[...te].reverse().map(mirror2), ...te]);
}

/** The line across the piece at its root or tip. */
export function endOf({ le, te }: Strip, end: 'root' | 'tip'): readonly [le: Vec2, te: Vec2] {
  const a = end === 'root' ? le[0] : le.at(-1);
  const b = end === 'root' ? te[0] : te.at(-1);
  if (!a || !b) throw new RangeError('a strip needs two sections');
  return [a, b];
}
