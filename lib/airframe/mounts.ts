import type { Problem } from '@/lib/numerics/result';
import { add3, radFromDeg, type Vec3 } from '@/lib/numerics/vec';
import { texts } from '@/lib/text/en/airframe';
import { fill } from '@/lib/text/fill';
import type { ResolvedBoom, ResolvedPlace, ResolvedSurface } from './resolved';
import type { Airframe } from './schema/airframe';
import type { Mount } from './schema/common';
import type { Boom } from './schema/fuselage';
import { panelled, pointAt } from './section';

// Where every element stands, once its parents stand. An offset is measured in the aircraft's axes, whichever way the
// parent is turned, so what hangs on a parent moves with it but keeps its own attitude.

export interface Placed {
  readonly places: ReadonlyMap<string, ResolvedPlace>;
  readonly surfaces: readonly ResolvedSurface[];
  readonly booms: readonly ResolvedBoom[];
  readonly problems: readonly Problem[];
}

interface Mounted {
  readonly id: string;
  readonly mount: Mount;
  /** Path in the document, without the trailing ".mount". */
  readonly path: string;
}

/** Every element that hangs on something, with its path in the document. */
export function mountedElements(airframe: Airframe): Mounted[] {
  const listed = (key: 'surfaces' | 'bodies' | 'booms' | 'drives' | 'items' | 'gear'): Mounted[] =>
    airframe[key].map(({ id, mount }, index) => ({ id, mount, path: `${key}.${index}` }));
  return [
    ...listed('surfaces'),
    ...listed('bodies'),
    ...listed('booms'),
    ...listed('drives'),
    ...listed('items'),
    ...listed('gear'),
  ];
}

/**
 * Direction of a boom from fore to aft end, unit vector. Pitch is positive with the fore end up, like an incidence, so
 * the aft end goes down; yaw is positive with the aft end to starboard.
 */
export function boomDirection(boom: Pick<Boom, 'pitchDeg' | 'yawDeg'>): Vec3 {
  const pitch = radFromDeg(boom.pitchDeg);
  const yaw = radFromDeg(boom.yawDeg);
  return [Math.cos(pitch) * Math.cos(yaw), Math.cos(pitch) * Math.sin(yaw), -Math.sin(pitch)];
}

const boomAft = (boom: Boom, fore: Vec3): Vec3 => {
  const [x, y, z] = boomDirection(boom);
  return add3(fore, [x * boom.lengthMm, y * boom.lengthMm, z * boom.lengthMm]);
};

/** Places every element, parents first. A loop, an unknown parent or a place that the parent does not have is a problem at its mount. */
export function placeElements(airframe: Airframe): Placed {
  const elements = new Map(mountedElements(airframe).map((element) => [element.id, element]));
  const surfaceIndex = new Map(airframe.surfaces.map((surface, index) => [surface.id, index]));
  const booms = new Map(airframe.booms.map((boom) => [boom.id, boom]));
  const bodies = new Map(airframe.bodies.map((body) => [body.id, body]));
  const places = new Map<string, ResolvedPlace>();
  const surfaces = new Map<string, ResolvedSurface>();
  const problems: Problem[] = [];
  const broken = new Set<string>();

  const refuseMount = (
    element: Mounted,
    code: string,
    key: 'to' | 'at' | 'end',
    message: string,
    fix?: string,
  ): null => {
    problems.push({ code, path: `${element.path}.mount.${key}`, message, ...(fix ? { fix } : {}) });
    broken.add(element.id);
    return null;
  };

  /** Origin of the parent that the mount's offset starts from, or the whole place when it names a spot on a surface. */
  const standOn = (element: Mounted, parent: Vec3): Vec3 | null => {
    const { to, at, end } = element.mount;
    const surface = surfaces.get(to);
    if (!Array.isArray(at) && 'station' in at) {
      if (!surface)
        return refuseMount(element, 'mount-needs-surface', 'at', fill(texts.problems.mountNeedsSurface, { to }));
      if (end) return refuseMount(element, 'mount-without-ends', 'end', fill(texts.problems.mountWithoutEnds, { to }));
      return pointAt(surface, at.station, at.chordShare);
    }
    const offset: Vec3 = Array.isArray(at) ? at : [0, 0, 0];
    if (!end) return add3(parent, offset);
    const boom = booms.get(to);
    if (boom) return add3(end === 'aft' ? boomAft(boom, parent) : parent, offset);
    const stations = bodies.get(to)?.stations;
    const station = end === 'aft' ? stations?.at(-1) : stations?.at(0);
    if (!station)
      return refuseMount(element, 'mount-without-ends', 'end', fill(texts.problems.mountWithoutEnds, { to }));
    return add3(add3(parent, [station.xMm, 0, 0]), offset);
  };

  const settle = (element: Mounted, at: Vec3): void => {
    places.set(element.id, { elementId: element.id, at });
    const index = surfaceIndex.get(element.id);
    const surface = index === undefined ? undefined : airframe.surfaces[index];
    if (surface && index !== undefined) surfaces.set(element.id, panelled(surface, index, at));
  };

  // A walk up the chain of parents with an explicit trail: long chains need no stack, and a loop is met, not followed.
  for (const start of elements.values()) {
    const trail: Mounted[] = [];
    let next: Mounted | undefined = start;
    while (next && !places.has(next.id) && !broken.has(next.id)) {
      const element: Mounted = next;
      const from = trail.indexOf(element);
      if (from >= 0) {
        const loop = [...trail.slice(from), element].map(({ id }) => id).join(' → ');
        refuseMount(element, 'mount-loop', 'to', fill(texts.problems.mountLoop, { loop }), texts.problems.mountLoopFix);
        break;
      }
      trail.push(element);
      next = element.mount.to === 'datum' ? undefined : elements.get(element.mount.to);
      if (!next && element.mount.to !== 'datum') {
        refuseMount(element, 'unknown-mount', 'to', fill(texts.problems.unknownMount, { to: element.mount.to }));
      }
    }
    for (const element of trail.reverse()) {
      if (places.has(element.id) || broken.has(element.id)) continue;
      const parent = element.mount.to === 'datum' ? ([0, 0, 0] satisfies Vec3) : places.get(element.mount.to)?.at;
      const at = parent ? standOn(element, parent) : null;
      if (at) settle(element, at);
      else broken.add(element.id);
    }
  }
  return {
    places,
    surfaces: airframe.surfaces.flatMap(({ id }) => surfaces.get(id) ?? []),
    booms: airframe.booms.flatMap((boom) => {
      const fore = places.get(boom.id)?.at;
      return fore ? [{ boomId: boom.id, fore, aft: boomAft(boom, fore) }] : [];
    }),
    problems,
  };
}
