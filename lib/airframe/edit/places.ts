import type { Vec3 } from '@/lib/numerics/vec';
import { texts } from '@/lib/text/en/airframe';
import { fill } from '@/lib/text/fill';
import { trimmedDigits } from '@/lib/units/number';
import { boomDirection } from '../mounts';
import { elementWithin, namedElements } from '../names';
import { outlines, type ViewOutline } from '../outlines';
import type { ResolvedAirframe } from '../resolved';
import type { Airframe } from '../schema/airframe';
import type { Mount } from '../schema/common';
import type { Item } from '../schema/equipment';
import { MAX_LENGTH_MM } from '../schema/limits';
import { sectionAt } from '../section';
import { AFT, type Grip, inPlan } from './grip';

/** Shortest boom that the document holds, mm. */
const MIN_BOOM_MM = 10;
/** A thing without a slide goes at least this far past the rest of the aircraft, mm: room to try, and a bound for the slider. */
const CLEAR_MM = 200;
/** Bounds of the document for a slide's ends and for a place on a chord. */
const SLIDE_LIMIT_MM = 2000;
const CHORD_SHARES: readonly [number, number] = [-1, 2];

interface Range {
  readonly min: number;
  readonly max: number;
  readonly atMin: string;
  readonly atMax: string;
}

const narrower = (a: Range, b: Range): Range => ({
  ...(b.min > a.min ? { min: b.min, atMin: b.atMin } : { min: a.min, atMin: a.atMin }),
  ...(b.max < a.max ? { max: b.max, atMax: b.atMax } : { max: a.max, atMax: a.atMax }),
});

/** The stretch of x a thing may stand in: the rest of the aircraft and as much again ahead and behind. */
function freeRange(lines: readonly ViewOutline[], elementId: string): Range {
  const xs = lines.filter((outline) => outline.elementId !== elementId).flatMap(({ points }) => points.map(([x]) => x));
  const fore = Math.min(0, ...xs);
  const aft = Math.max(0, ...xs);
  const margin = Math.ceil(Math.max(CLEAR_MM, aft - fore));
  return {
    min: fore - margin,
    max: aft + margin,
    atMin: fill(texts.stops.clearOfAircraftFore, { margin }),
    atMax: fill(texts.stops.clearOfAircraftAft, { margin }),
  };
}

/** How a mount moves along x, and how far the document lets it: an offset in mm, or a share of the chord it stands on. */
function mountMove(mount: Mount, resolved: ResolvedAirframe, x: number): { perMm: number; range: Range } {
  const { at, to } = mount;
  if (Array.isArray(at)) {
    const words = fill(texts.stops.longest, { max: MAX_LENGTH_MM });
    const range = { min: x - MAX_LENGTH_MM - at[0], max: x + MAX_LENGTH_MM - at[0], atMin: words, atMax: words };
    return { perMm: 1, range };
  }
  const surface = resolved.surfaces.find((one) => one.surface.id === to);
  if (!surface || !('station' in at)) throw new RangeError(`mount on ${to} does not resolve`);
  const { le, te } = sectionAt(surface, at.station);
  const chord = te[0] - le[0];
  const words = texts.stops.chordReach;
  if (Math.abs(chord) < 1e-9) return { perMm: 0, range: { min: x, max: x, atMin: words, atMax: words } };
  const xs = CHORD_SHARES.map((share) => le[0] + share * chord);
  return { perMm: 1 / chord, range: { min: Math.min(...xs), max: Math.max(...xs), atMin: words, atMax: words } };
}

/** A mount moved along x; `perMm` turns mm into what the mount counts in. */
function movedMount(mount: Mount, perMm: number, dx: number): Mount {
  const { at } = mount;
  if (Array.isArray(at)) return { ...mount, at: [at[0] + dx * perMm, at[1], at[2]] };
  if (!('station' in at)) return mount;
  const [low, high] = CHORD_SHARES;
  return { ...mount, at: { ...at, chordShare: Math.min(Math.max(at.chordShare + dx * perMm, low), high) } };
}

interface Movable {
  readonly id: string;
  readonly mount: Mount;
}

function placeGrip(
  element: Movable,
  name: string,
  at: Vec3,
  own: Range,
  resolved: ResolvedAirframe,
  apply: (mount: Mount, dx: number) => Airframe,
): Grip {
  const [x] = at;
  const { perMm, range } = mountMove(element.mount, resolved, x);
  const { min, max, atMin, atMax } = narrower(own, range);
  return {
    handle: {
      id: `${element.id}/x`,
      elementId: element.id,
      label: fill(texts.handles.placeX, { element: name }),
      unit: 'mm',
      value: x,
      min: Math.min(min, x),
      max: Math.max(max, x),
      step: 1,
      at: inPlan(at),
      direction: AFT,
      perMm: 1,
    },
    atMin,
    atMax,
    set: (next) => apply(movedMount(element.mount, perMm, next - x), next - x),
  };
}

/** A slide is measured from the item's place, so moving the place keeps both its ends where they are on the aircraft. */
function slideRange(slide: NonNullable<Item['slide']>, x: number): Range {
  return {
    min: x + Math.max(slide.fromMm, slide.toMm - SLIDE_LIMIT_MM),
    max: x + Math.min(slide.toMm, slide.fromMm + SLIDE_LIMIT_MM),
    atMin: texts.stops.slideFore,
    atMax: texts.stops.slideAft,
  };
}

const movedItem = (item: Item, mount: Mount, dx: number): Item => {
  if (!item.slide) return { ...item, mount };
  const { fromMm, toMm } = item.slide;
  return { ...item, mount, slide: { fromMm: Math.min(0, fromMm - dx), toMm: Math.max(0, toMm - dx) } };
};

const replaced = <T extends { readonly id: string }>(list: readonly T[], id: string, change: (one: T) => T): T[] =>
  list.map((one) => (one.id === id ? change(one) : one));

/** Handles that move a thing fore and aft: items (within their slide), drives, and every surface but the wing that sets the origin. */
export function placeGrips(airframe: Airframe, resolved: ResolvedAirframe, wanted: (id: string) => boolean): Grip[] {
  const at = (id: string): Vec3 => {
    const place = resolved.places.get(id);
    if (!place) throw new RangeError(`element ${id} has no place`);
    return place.at;
  };
  const words = new Map(namedElements(airframe).map(({ id, within }) => [id, within]));
  const name = (id: string): string => words.get(id) ?? id;
  let drawn: readonly ViewOutline[] | null = null;
  const free = (id: string): Range => {
    drawn ??= outlines('plan', airframe, resolved);
    return freeRange(drawn, id);
  };
  const items = airframe.items
    .filter(({ id }) => wanted(id))
    .map((item) => {
      const place = at(item.id);
      const own = item.slide ? slideRange(item.slide, place[0]) : free(item.id);
      return placeGrip(item, name(item.id), place, own, resolved, (mount, dx) => ({
        ...airframe,
        items: replaced(airframe.items, item.id, (one) => movedItem(one, mount, dx)),
      }));
    });
  const drives = airframe.drives
    .filter(({ id }) => wanted(id))
    .map((drive) =>
      placeGrip(drive, name(drive.id), at(drive.id), free(drive.id), resolved, (mount) => ({
        ...airframe,
        drives: replaced(airframe.drives, drive.id, (one) => ({ ...one, mount })),
      })),
    );
  const surfaces = airframe.surfaces
    .filter(({ id, role }) => role !== 'wing' && wanted(id))
    .map((surface) =>
      placeGrip(surface, name(surface.id), at(surface.id), free(surface.id), resolved, (mount) => ({
        ...airframe,
        surfaces: replaced(airframe.surfaces, surface.id, (one) => ({ ...one, mount })),
      })),
    );
  return [...items, ...drives, ...surfaces];
}

/** Length of each boom, up to the stock it is cut from; what hangs on its aft end follows. */
export function boomGrips(airframe: Airframe, resolved: ResolvedAirframe): Grip[] {
  return airframe.booms.flatMap((boom): Grip[] => {
    const placed = resolved.booms.find(({ boomId }) => boomId === boom.id);
    if (!placed) return [];
    const stock = airframe.tubes.find(({ id }) => id === boom.tubeId)?.stockLengthMm ?? MAX_LENGTH_MM;
    const [dx, dy] = boomDirection(boom);
    const inView = Math.hypot(dx, dy);
    const max = Math.max(Math.min(stock, MAX_LENGTH_MM), boom.lengthMm);
    return [
      {
        handle: {
          id: `${boom.id}/length`,
          elementId: boom.id,
          label: fill(texts.handles.length, { element: elementWithin(airframe, boom.id) }),
          unit: 'mm',
          value: boom.lengthMm,
          min: MIN_BOOM_MM,
          max,
          step: 1,
          at: inPlan(placed.aft),
          direction: [dx / inView, dy / inView],
          perMm: 1 / inView,
        },
        atMin: fill(texts.stops.shortest, { min: MIN_BOOM_MM }),
        atMax: fill(texts.stops.stockLength, { max: trimmedDigits(max, 1) }),
        set: (next) => ({
          ...airframe,
          booms: replaced(airframe.booms, boom.id, (one) => ({ ...one, lengthMm: next })),
        }),
      },
    ];
  });
}
