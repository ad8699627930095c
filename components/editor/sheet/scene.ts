import { type Handle, handles } from '@/lib/airframe/handles';
import { namedElements } from '@/lib/airframe/names';
import { frontOutlines, planOutlines, sideOutlines, type ViewOutline } from '@/lib/airframe/outlines';
import { resolve } from '@/lib/airframe/resolve';
import type { ResolvedAirframe } from '@/lib/airframe/resolved';
import type { Airframe } from '@/lib/airframe/schema/airframe';
import { type PlanformStation, planform } from '@/lib/geometry/planform';
import type { Vec2 } from '@/lib/numerics/vec';
import type { Places } from './cg';
import type { Extents, Range } from './fold';
import type { HangingMass } from './masses';

// What the sheet shows of one airframe, worked out on the page itself so that it follows the hand in the same frame.

export interface MacMark {
  readonly leXMm: number;
  readonly lengthMm: number;
  readonly yMm: number;
}

export interface Scene {
  readonly airframe: Airframe;
  readonly plan: readonly ViewOutline[];
  readonly side: readonly ViewOutline[];
  readonly front: readonly ViewOutline[];
  readonly handles: readonly Handle[];
  readonly mac: MacMark | null;
  /** Where every element stands. */
  readonly places: Places;
  /** What hangs on the balance rule. */
  readonly masses: readonly HangingMass[];
}

/** Mean chord of the main wing from its sections, or null when the wing has no area. */
export function wingMac({ surfaces }: ResolvedAirframe): MacMark | null {
  const wing = surfaces.find(({ surface }) => surface.role === 'wing');
  if (wing === undefined) return null;
  const stations = wing.panels.flatMap(({ root, tip }): PlanformStation[] =>
    [root, tip].map(({ le, chordMm }) => ({ x: le[0], y: le[1], chord: chordMm })),
  );
  const reach = stations.at(-1)?.y ?? 0;
  if (reach - (stations[0]?.y ?? 0) < 1) return null;
  const { mac, xLeMac, yMac } = planform(stations);
  return { leXMm: xLeMac, lengthMm: mac, yMm: yMac };
}

function hangingMasses(airframe: Airframe, resolved: ResolvedAirframe): readonly HangingMass[] {
  const names = new Map(namedElements(airframe).map(({ id, name }) => [id, name]));
  const station = (elementId: string) => resolved.places.get(elementId)?.at[0] ?? 0;
  const items = airframe.items.map((item) => ({
    elementId: item.id,
    name: names.get(item.id) ?? item.id,
    massG: item.massG,
    xMm: station(item.id),
  }));
  const drives = airframe.drives.map((drive) => ({
    elementId: drive.id,
    name: names.get(drive.id) ?? drive.id,
    massG: drive.motor.massG + (drive.kind === 'propeller' ? drive.propeller.massG : drive.fan.massG),
    xMm: station(drive.id),
  }));
  return [...items, ...drives];
}

function resolvedOf(airframe: Airframe): ResolvedAirframe {
  const result = resolve(airframe);
  if (!result.ok) throw new RangeError(`airframe does not resolve: ${result.problems[0]?.message ?? 'unknown mount'}`);
  return result.value;
}

/** Where every element stands. Throws RangeError for an airframe whose mounts do not resolve. */
export const placesOf = (airframe: Airframe): Places => resolvedOf(airframe).places;

/** Works the picture out. Throws RangeError for an airframe whose mounts do not resolve, which a parsed one never is. */
export function sceneOf(airframe: Airframe): Scene {
  const resolved = resolvedOf(airframe);
  return {
    airframe,
    plan: planOutlines(airframe, resolved),
    side: sideOutlines(airframe, resolved),
    front: frontOutlines(airframe, resolved),
    handles: handles(airframe),
    mac: wingMac(resolved),
    places: resolved.places,
    masses: hangingMasses(airframe, resolved),
  };
}

const widen = ([min, max]: Range, value: number): Range => [Math.min(min, value), Math.max(max, value)];
const NOTHING: Range = [Number.POSITIVE_INFINITY, Number.NEGATIVE_INFINITY];

/** How far the drawn aircraft reaches in each axis, mm. */
export function extentsOf({ plan, side }: Pick<Scene, 'plan' | 'side'>): Extents {
  const grow = (range: Range, outlines: readonly ViewOutline[], axis: 0 | 1) =>
    outlines.reduce((all, { points }) => points.reduce((each, point: Vec2) => widen(each, point[axis]), all), range);
  const extents = { x: grow(grow(NOTHING, plan, 0), side, 0), y: grow(NOTHING, plan, 1), z: grow(NOTHING, side, 1) };
  const ranges = Object.values(extents);
  if (!ranges.every(([min, max]) => min <= max)) throw new RangeError('an airframe without outlines has no extents');
  return extents;
}
