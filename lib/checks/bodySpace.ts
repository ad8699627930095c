import type { Body } from '@/lib/airframe/schema/fuselage';
import type { Vec3 } from '@/lib/numerics/vec';
import type { Context } from './context';
import { type Box, boxCentre } from './geometry/box';

// What is inside a body: sections between its sheets, and bays between its formers. Formers are plates without holes, as they are cut.

/** A cut across a body at one x, aircraft axes, mm. */
export interface Cut {
  readonly port: number;
  readonly stbd: number;
  readonly top: number;
  readonly bottom: number;
}

/** A body that holds things: a box or a nacelle, with its origin. */
export interface Hollow {
  readonly body: Body;
  readonly path: string;
  readonly origin: Vec3;
  readonly sheetMm: number;
  readonly fromX: number;
  readonly toX: number;
}

/** Part of a body between two formers, or between a former and an open end. */
export interface Bay {
  readonly fromX: number;
  readonly toX: number;
  readonly openFore: boolean;
  readonly openAft: boolean;
}

/** Plate across a body. */
export interface Plate {
  readonly former: Body['formers'][number];
  readonly path: string;
  readonly fromX: number;
  readonly toX: number;
}

const thicknessOf = ({ airframe }: Context, id: string): number =>
  airframe.materials.find((material) => material.id === id)?.thicknessMm ?? 0;

/** Every body with an inside; a profile is a plate. */
export function hollows(context: Context): Hollow[] {
  return context.airframe.bodies.flatMap((body, index): Hollow[] => {
    const [first, last] = [body.stations[0], body.stations.at(-1)];
    if (body.kind === 'profile' || !first || !last) return [];
    const origin = context.placeOf(body.id);
    return [
      {
        body,
        path: `bodies.${index}`,
        origin,
        sheetMm: thicknessOf(context, body.materialId),
        fromX: origin[0] + first.xMm,
        toX: origin[0] + last.xMm,
      },
    ];
  });
}

/** The outside of a body at an x inside it; widths and heights run straight between stations. Null outside. */
export function outsideAt({ body, origin }: Hollow, x: number): Cut | null {
  const local = x - origin[0];
  const index = body.stations.findIndex(({ xMm }) => xMm >= local);
  const b = body.stations[index];
  const a = body.stations[index - 1] ?? b;
  if (!a || !b || local < a.xMm) return null;
  const t = a === b ? 0 : (local - a.xMm) / (b.xMm - a.xMm);
  const between = (key: 'widthMm' | 'topMm' | 'bottomMm'): number => a[key] + (b[key] - a[key]) * t;
  const half = between('widthMm') / 2;
  return {
    port: origin[1] - half,
    stbd: origin[1] + half,
    top: origin[2] + between('topMm'),
    bottom: origin[2] + between('bottomMm'),
  };
}

/** The inside at an x, sheets and doublers taken off. Null outside the body. */
export function insideAt(context: Context, hollow: Hollow, x: number): Cut | null {
  const cut = outsideAt(hollow, x);
  if (!cut) return null;
  const local = x - hollow.origin[0];
  const wall = (face: Body['doublers'][number]['face']): number =>
    hollow.sheetMm +
    hollow.body.doublers
      .filter((doubler) => doubler.face === face && local >= doubler.fromX && local <= doubler.toX)
      .reduce((sum, { materialId }) => sum + thicknessOf(context, materialId), 0);
  return {
    port: cut.port + wall('port'),
    stbd: cut.stbd - wall('stbd'),
    top: cut.top - wall('top'),
    bottom: cut.bottom + wall('bottom'),
  };
}

/** How far a box reaches out of the inside, mm: 0 or less is how much air the tightest wall leaves. */
export function outOfInside(context: Context, hollow: Hollow, { min, max }: Box): number {
  const stations = hollow.body.stations.map(({ xMm }) => hollow.origin[0] + xMm);
  const xs = [min[0], max[0], ...stations.filter((x) => x > min[0] && x < max[0])];
  const overs = xs.map((x) => {
    const cut = insideAt(context, hollow, x);
    if (!cut) return Math.max(hollow.fromX - x, x - hollow.toX);
    return Math.max(cut.port - min[1], max[1] - cut.stbd, max[2] - cut.top, cut.bottom - min[2]);
  });
  return Math.max(...overs);
}

const contains = (cut: Cut | null, [, y, z]: Vec3): boolean =>
  cut !== null && y > cut.port && y < cut.stbd && z > cut.bottom && z < cut.top;

/** The body that a point lies in, if any. */
export const hollowAround = (context: Context, point: Vec3): Hollow | null =>
  hollows(context).find((hollow) => contains(outsideAt(hollow, point[0]), point)) ?? null;

/** The body that holds the middle of a box, if any. */
export const hollowOf = (context: Context, box: Box): Hollow | null => hollowAround(context, boxCentre(box));

/** Formers and firewalls, nose first. A former stands with its front face at its x, within the body. Its tilt is left out. */
export function plates(context: Context, { body, path, origin, toX }: Hollow): Plate[] {
  return body.formers
    .map((former, index): Plate => {
      const thick = thicknessOf(context, former.materialId);
      const fromX = Math.min(origin[0] + former.xMm, toX - thick);
      return { former, path: `${path}.formers.${index}`, fromX, toX: fromX + thick };
    })
    .sort((a, b) => a.fromX - b.fromX);
}

/** The bay of a body that an x lies in. Inside a plate it is the bay before it. */
export function bayAt(context: Context, hollow: Hollow, x: number): Bay {
  const all = plates(context, hollow);
  const fore = all.filter((plate) => (plate.fromX + plate.toX) / 2 < x).at(-1);
  const aft = all.find((plate) => (plate.fromX + plate.toX) / 2 >= x);
  return {
    fromX: fore?.toX ?? hollow.fromX,
    toX: aft?.fromX ?? hollow.toX,
    openFore: fore === undefined,
    openAft: aft === undefined,
  };
}

/** Area of an end without a former, mm2. */
export function openEndMm2(context: Context, hollow: Hollow, end: 'fore' | 'aft'): number {
  const x = end === 'fore' ? hollow.fromX : hollow.toX;
  const cut = insideAt(context, hollow, x);
  const closed = plates(context, hollow).some(
    ({ fromX, toX }) => Math.min(Math.abs(fromX - x), Math.abs(toX - x)) < NEAR_END_MM,
  );
  return cut && !closed ? Math.max(0, cut.stbd - cut.port) * Math.max(0, cut.top - cut.bottom) : 0;
}

/** A plate this near to an end closes it. */
const NEAR_END_MM = 25;

/** Middle of a body's end. */
export function endCentre(hollow: Hollow, end: 'fore' | 'aft'): Vec3 {
  const x = end === 'fore' ? hollow.fromX : hollow.toX;
  const cut = outsideAt(hollow, x);
  return cut ? [x, (cut.port + cut.stbd) / 2, (cut.top + cut.bottom) / 2] : [x, hollow.origin[1], hollow.origin[2]];
}

/** An opening's middle, on its face. */
export function openingCentre(hollow: Hollow, { face, fromX, toX }: Body['openings'][number]): Vec3 {
  const x = hollow.origin[0] + (fromX + toX) / 2;
  const cut = outsideAt(hollow, x) ?? { port: 0, stbd: 0, top: 0, bottom: 0 };
  const [y, z] = [(cut.port + cut.stbd) / 2, (cut.top + cut.bottom) / 2];
  if (face === 'port' || face === 'stbd') return [x, cut[face], z];
  return [x, y, cut[face]];
}
