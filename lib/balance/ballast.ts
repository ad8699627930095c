import type { ResolvedAirframe } from '@/lib/airframe/resolved';
import type { Airframe } from '@/lib/airframe/schema/airframe';

/**
 * Least mass at a place that brings the CG along one axis to where it is wanted, g: m (cg - wanted) / (wanted - place). Null when no
 * mass there can: the place does not lie beyond the wanted CG. 0 when the CG is there already.
 */
export function ballastG(massG: number, cgMm: number, wantedMm: number, placeMm: number): number | null {
  if (cgMm === wantedMm) return 0;
  const needed = (massG * (cgMm - wantedMm)) / (wantedMm - placeMm);
  return Number.isFinite(needed) && needed > 0 ? needed : null;
}

/** Foremost and aftmost point of bodies, booms and surfaces, x in mm: the aircraft's length without its propeller. */
export function extentX(airframe: Airframe, resolved: ResolvedAirframe): readonly [fore: number, aft: number] {
  const surfaces = resolved.surfaces.flatMap(({ panels }) =>
    panels.flatMap(({ root, tip }) => [root.le[0], root.te[0], tip.le[0], tip.te[0]]),
  );
  const bodies = airframe.bodies.flatMap(({ id, stations, outline = [] }) => {
    const origin = resolved.places.get(id)?.at[0] ?? 0;
    return [...stations.map(({ xMm }) => origin + xMm), ...outline.map(([x]) => origin + x)];
  });
  const booms = resolved.booms.flatMap(({ fore, aft }) => [fore[0], aft[0]]);
  const all = [...surfaces, ...bodies, ...booms];
  return [Math.min(...all), Math.max(...all)];
}

export interface BallastPlace {
  readonly xMm: number;
  /** Where that is: an item of ballast that the document holds, or an end of the aircraft. */
  readonly at: { readonly itemId: string } | 'nose' | 'tail';
}

/**
 * Where ballast for a CG that must go forward (or aft) is put: where the document has ballast on that side, the furthest of it;
 * else inside that end of the aircraft. `insetMm` is how far inside the end its middle can lie.
 */
export function ballastPlace(
  airframe: Airframe,
  resolved: ResolvedAirframe,
  wantedXMm: number,
  side: 'nose' | 'tail',
  insetMm: number,
): BallastPlace {
  const sign = side === 'nose' ? -1 : 1;
  const beyond = ({ xMm }: BallastPlace) => (xMm - wantedXMm) * sign;
  const held = airframe.items
    .filter(({ kind }) => kind === 'ballast')
    .map(({ id }): BallastPlace => ({ xMm: resolved.places.get(id)?.at[0] ?? 0, at: { itemId: id } }))
    .filter((place) => beyond(place) > 0);
  const [fore, aft] = extentX(airframe, resolved);
  const end: BallastPlace = { xMm: side === 'nose' ? fore + insetMm : aft - insetMm, at: side };
  return held.reduce((best, place) => (best.at === side || beyond(place) > beyond(best) ? place : best), end);
}
