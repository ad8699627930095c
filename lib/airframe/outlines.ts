import type { Vec3 } from '@/lib/numerics/vec';
import { bodyOutline, boomOutlines, driveOutlines, gearOutlines, itemOutlines } from './outlines/solids';
import { controlOutlines, surfaceOutlines } from './outlines/surfaces';
import type { View, ViewOutline } from './outlines/view';
import { resolve } from './resolve';
import type { ResolvedAirframe } from './resolved';
import type { Airframe } from './schema/airframe';

export type { OutlineKind, OutlineSide, View, ViewOutline } from './outlines/view';

const resolvedOf = (airframe: Airframe): ResolvedAirframe => {
  const result = resolve(airframe);
  if (!result.ok) throw new RangeError(`airframe does not resolve: ${result.problems[0]?.message ?? 'unknown mount'}`);
  return result.value;
};

/**
 * Every line of a view in aircraft mm, port and starboard: surfaces, their controls, bodies, booms, drives, items, gear.
 * Throws RangeError for an airframe whose mounts do not resolve, which a parsed one never is.
 */
export function outlines(
  view: View,
  airframe: Airframe,
  resolved: ResolvedAirframe = resolvedOf(airframe),
): ViewOutline[] {
  const at = (id: string): Vec3 => {
    const place = resolved.places.get(id);
    if (!place) throw new RangeError(`element ${id} has no place`);
    return place.at;
  };
  const surfaces = resolved.surfaces.flatMap((surface) => [
    ...surfaceOutlines(view, surface, airframe),
    ...resolved.controls
      .filter(({ surfaceId }) => surfaceId === surface.surface.id)
      .flatMap((control) => controlOutlines(view, control, surface, airframe)),
  ]);
  const booms = airframe.booms.flatMap((boom) => {
    const placed = resolved.booms.find(({ boomId }) => boomId === boom.id);
    return placed ? boomOutlines(view, boom, placed, airframe) : [];
  });
  return [
    ...surfaces,
    ...airframe.bodies.map((body) => bodyOutline(view, body, at(body.id))),
    ...booms,
    ...airframe.drives.flatMap((drive) => driveOutlines(view, drive, at(drive.id))),
    ...airframe.items.flatMap((item) => itemOutlines(view, item, at(item.id))),
    ...airframe.gear.flatMap((gear) => gearOutlines(view, gear, at(gear.id))),
  ];
}

/** The view from above: [x aft, y starboard]. */
export const planOutlines = (airframe: Airframe, resolved?: ResolvedAirframe): ViewOutline[] =>
  outlines('plan', airframe, resolved);
/** The view from starboard: [x aft, z up]. */
export const sideOutlines = (airframe: Airframe, resolved?: ResolvedAirframe): ViewOutline[] =>
  outlines('side', airframe, resolved);
/** The view from behind: [y starboard, z up]. */
export const frontOutlines = (airframe: Airframe, resolved?: ResolvedAirframe): ViewOutline[] =>
  outlines('front', airframe, resolved);
