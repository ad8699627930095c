import type { ResolvedControl } from '@/lib/airframe/resolved';
import { SAME_POINT_MM } from '@/lib/numerics/tolerances';
import { radFromDeg, type Vec2 } from '@/lib/numerics/vec';
import { rayTo } from '../shape/cut';
import { toPart } from '../shape/frame';
import { heightAt } from '../shape/polyline';
import { mirror2, NOTHING_MM, type Ring } from '../shape/ring';
import type { PartFrame } from '../types';
import type { Strip } from './strip';

// Where a control is parted from its sheet. All paths run from the inner to the outer end with the control on their right.

/** How a control's end lies: it runs out at a free edge, stops inside the sheet, stops at a glued edge, or goes on across the centre. */
export type EndKind = 'free' | 'inside' | 'seam' | 'through' | 'centreGap';

/** Path of the cut at one end, from inner to outer: along the fixed sheet, and along the control a gap away from it. */
interface EndCut {
  readonly fixed: readonly Vec2[];
  readonly moving: readonly Vec2[];
}

export interface ControlCut {
  readonly inner: EndCut;
  readonly outer: EndCut;
  readonly hinge: readonly [Vec2, Vec2];
  /** How the two halves of a control meet on the centre line of a piece that spans both. */
  readonly joined: 'through' | 'gap' | 'apart';
  readonly gapMm: number;
}

interface Cutting {
  readonly ring: Ring;
  readonly strip: Strip;
  readonly control: ResolvedControl;
  readonly frame: PartFrame;
}

/** The hinge line of a control in its sheet's axes. */
export function hingeLine(control: ResolvedControl, frame: PartFrame): readonly [Vec2, Vec2] {
  return [toPart(frame, control.hingeInner), toPart(frame, control.hingeOuter)];
}

const alongLine = ([a, b]: readonly [Vec2, Vec2], x: number): Vec2 => [
  x,
  a[1] + ((b[1] - a[1]) * (x - a[0])) / (b[0] - a[0]),
];

/** Both halves' controls are one moving piece: the hinge runs straight across the centre and the halves never move apart. */
export function goesThrough(control: ResolvedControl, frame: PartFrame): boolean {
  const [a, b] = hingeLine(control, frame);
  const lean = Math.abs((b[1] - a[1]) / (b[0] - a[0]));
  return control.control.mix.roll === 0 && lean <= Math.tan(radFromDeg(0.1));
}

/** Paths of a control's cuts, or null when its ends do not meet the sheet's trailing edge. */
export function controlCut(
  { ring, strip, control, frame }: Cutting,
  kinds: readonly [EndKind, EndKind],
): ControlCut | null {
  const hinge = hingeLine(control, frame);
  const [a, b] = hinge;
  const middle: Vec2 = [(a[0] + b[0]) / 2, (a[1] + b[1]) / 2];
  const gapMm = control.control.endGapMm;
  const onTe = (x: number): Vec2 => [x, heightAt(strip.te, x)];
  const edge = (sign: 1 | -1): Vec2 | null => rayTo(ring, middle, [sign * (b[0] - a[0]), sign * (b[1] - a[1])]);

  const endCut = (kind: EndKind, sign: 1 | -1): EndCut | null => {
    const x = sign < 0 ? a[0] : b[0];
    const order = (points: readonly Vec2[]): readonly Vec2[] => (sign < 0 ? points : [...points].reverse());
    const upAt = (at: number): readonly Vec2[] => order([onTe(at), alongLine(hinge, at)]);
    switch (kind) {
      case 'free': {
        const end = edge(sign);
        return end && { fixed: [end], moving: [end] };
      }
      case 'inside':
        return { fixed: upAt(x), moving: upAt(x - sign * gapMm) };
      case 'seam': {
        const end = edge(sign);
        const corner = sign < 0 ? strip.te[0] : strip.te.at(-1);
        if (!end || !corner) return null;
        const reach = sign < 0 ? Math.max(end[0], corner[0]) : Math.min(end[0], corner[0]);
        return { fixed: [end], moving: upAt(reach - sign * gapMm) };
      }
      case 'through':
        return { fixed: [], moving: [] };
      case 'centreGap':
        return { fixed: [alongLine(hinge, 0)], moving: upAt(gapMm) };
    }
  };
  const inner = endCut(kinds[0], -1);
  const outer = endCut(kinds[1], 1);
  if (!inner || !outer || !meetsTe(strip, [...inner.fixed, ...inner.moving, ...outer.fixed, ...outer.moving]))
    return null;
  const joined = kinds[0] === 'through' ? 'through' : kinds[0] === 'centreGap' ? 'gap' : 'apart';
  const to = outer.moving[0];
  const from = joined === 'through' ? to && mirror2(to) : inner.moving.at(-1);
  return from && to && from[0] < to[0] ? { inner, outer, hinge: [from, to], joined, gapMm } : null;
}

/** Trailing-edge points must lie between the ends of the trailing edge, which a raked tip shortens. */
function meetsTe({ te }: Strip, points: readonly Vec2[]): boolean {
  const end = te.at(-1)?.[0] ?? 0;
  return points.every(([x, y]) => x <= end + NOTHING_MM || y > heightAt(te, x) + SAME_POINT_MM);
}

const flip = (path: readonly Vec2[]): Vec2[] => path.map(mirror2).reverse();

/** Paths that part the control from its sheet, along one edge of the gap or the other: one path, or one a side. */
export function partingPaths(cut: ControlCut, edge: 'fixed' | 'moving', centre: boolean): Vec2[][] {
  const outer = [...cut.outer[edge]];
  const half = cut.joined === 'through' ? outer : [...cut.inner[edge], ...outer];
  if (!centre) return [half];
  const across = cut.joined === 'through' || (cut.joined === 'gap' && edge === 'fixed');
  return across ? [[...flip(half), ...half]] : [half, flip(half)];
}

/** Slots that free the ends of a control that stays on the sheet; what lies to the right of each path is taken out. */
export function gapPaths(cut: ControlCut, centre: boolean): Vec2[][] {
  if (cut.gapMm === 0) return [];
  const backed = (points: readonly Vec2[]): Vec2[] => [...points].reverse();
  const inner = [...cut.inner.fixed, ...backed(cut.inner.moving)];
  const outer = [...backed(cut.outer.moving), ...cut.outer.fixed];
  if (!centre) return [inner, outer].filter(isCut);
  const inners = cut.joined === 'gap' ? [[...flip(inner), ...inner]] : [inner, flip(inner)];
  return [...inners, outer, flip(outer)].filter(isCut);
}

const isCut = (path: readonly Vec2[]): boolean => path.length > 2;

/** Where a control without a gap is slit from its sheet at its ends. */
export function slits(cut: ControlCut): readonly (readonly Vec2[])[] {
  return cut.gapMm === 0 ? [cut.inner.moving, cut.outer.moving].filter((path) => path.length > 1) : [];
}
