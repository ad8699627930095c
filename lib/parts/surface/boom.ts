import type { ResolvedBoom } from '@/lib/airframe/resolved';
import type { Boom } from '@/lib/airframe/schema/fuselage';
import type { Tube } from '@/lib/airframe/schema/stock';
import { lineMeet } from '@/lib/geometry/lines';
import { contains, edges } from '@/lib/geometry/polygons';
import { lerp3, mirror3, type Vec2, type Vec3 } from '@/lib/numerics/vec';
import { texts } from '@/lib/text/en/parts';
import { fill } from '@/lib/text/fill';
import { trimmedDigits } from '@/lib/units/number';
import { offPart, toPart } from '../shape/frame';
import { distanceToEdge, NOTHING_MM, type Ring } from '../shape/ring';
import type { Operation } from '../types';
import type { Run } from './run';

// Where a boom lies in or on a flat sheet: a channel for a slotted one, a glue line for one that sits on a saddle.

export interface BoomHere {
  readonly boom: Boom;
  readonly resolved: ResolvedBoom;
  readonly tube: Tube;
}

/** A boom that passes nearer to the sheet's face than this is meant to touch it, mm. */
const REACH_MM = 1;
/** A channel shallower than this is no channel, and foam thinner than this does not stay, mm. */
const LEAST_CHANNEL_MM = 0.1;

/** The stretches of a line that lie over the sheet, as shares of the line. */
function stretches(ring: Ring, a: Vec2, b: Vec2): [number, number][] {
  const dx = b[0] - a[0];
  const dy = b[1] - a[1];
  const size = Math.hypot(dx, dy);
  if (size < NOTHING_MM) return [];
  const at = (p: Vec2): number => ((p[0] - a[0]) * dx + (p[1] - a[1]) * dy) / (size * size);
  const hits = edges(ring).flatMap(([p, q]) => {
    const met = lineMeet(a, [dx, dy], p, [q[0] - p[0], q[1] - p[1]]);
    return met && distanceToEdge(met, p, q) < NOTHING_MM ? [at(met)] : [];
  });
  const stops = [0, ...hits.filter((t) => t > 0 && t < 1).sort((s, t) => s - t), 1];
  return stops.slice(1).flatMap((to, index): [number, number][] => {
    const from = stops[index] ?? 0;
    const middle: Vec2 = [a[0] + (dx * (from + to)) / 2, a[1] + (dy * (from + to)) / 2];
    return (to - from) * size > 1 && contains(ring, middle) ? [[from, to]] : [];
  });
}

/** Marks of one stretch of boom over the sheet; `offMm` is how far its axis stands above the sheet's middle. */
function boomMarks(
  { boom, tube }: BoomHere,
  path: readonly Vec2[],
  offMm: number,
  sheetMm: number,
  id: string,
): Operation[] {
  const [widthMm, heightMm] = tube.outerMm;
  const face = offMm > NOTHING_MM ? 'upper' : 'lower';
  const base = { path, closed: false, face, widthMm } as const;
  const axis: Operation = {
    ...base,
    id: `${id}-axis`,
    kind: 'reference',
    note: fill(texts.notes.boomAxis, { boom: boom.id }),
  };
  const seat: Operation = { ...base, id: `${id}-seat`, kind: 'glue', note: texts.notes.boomSaddle };
  const sunkMm = sheetMm / 2 + heightMm / 2 - Math.abs(offMm);
  if (boom.sleeve === 'saddle' || sunkMm < LEAST_CHANNEL_MM) return [axis, seat];
  const through = sunkMm > sheetMm - LEAST_CHANNEL_MM;
  const depthMm = through ? sheetMm : sunkMm;
  const sizes = { width: trimmedDigits(widthMm, 1), depth: trimmedDigits(depthMm, 1) };
  const note = fill(through ? texts.notes.boomThrough : texts.notes.channel, sizes);
  return [axis, { ...base, id: `${id}-slot`, kind: 'foamOut', depthMm, note }];
}

function boomLine(run: Run, ring: Ring, here: BoomHere, ends: readonly [Vec3, Vec3], suffix: string): Operation[] {
  const [a, b] = [toPart(run.frame, ends[0]), toPart(run.frame, ends[1])];
  const { thicknessMm } = run.material;
  return stretches(ring, a, b).flatMap(([from, to], index): Operation[] => {
    const offMm = offPart(run.frame, lerp3(ends[0], ends[1], (from + to) / 2));
    if (Math.abs(offMm) > thicknessMm / 2 + here.tube.outerMm[1] / 2 + REACH_MM) return [];
    const path = [from, to].map((t): Vec2 => [a[0] + (b[0] - a[0]) * t, a[1] + (b[1] - a[1]) * t]);
    const id = `${here.boom.id}${index === 0 ? '' : `-${index + 1}`}${suffix}`;
    return boomMarks(here, path, offMm, thicknessMm, id);
  });
}

/** Marks of every boom that touches this piece. */
export function boomsOn(run: Run, ring: Ring, booms: readonly BoomHere[]): Operation[] {
  const { mirrored } = run.surface.surface;
  return booms.flatMap((here) => {
    const { fore, aft } = here.resolved;
    const own = boomLine(run, ring, here, [fore, aft], '');
    const bothSides = here.boom.mirrored && (run.centre || !mirrored);
    return bothSides ? [...own, ...boomLine(run, ring, here, [mirror3(fore), mirror3(aft)], '-port')] : own;
  });
}
