import type { Face, Operation } from '../types';
import type { Place } from './room';

/** A pin hole needs this much foam around it, mm. */
const PIN_ROOM_MM = 2;

/**
 * Points to pin through a part that is worked from both faces: the two that lie farthest apart and the one farthest from
 * both, so that the back can be drawn only one way round. A path of one point.
 */
export function registerMarks(all: readonly Place[], face: Face): Operation[] {
  const places = all.filter(({ depthMm }) => depthMm >= PIN_ROOM_MM);
  const apart = (a: readonly [number, number], b: readonly [number, number]): number =>
    Math.hypot(a[0] - b[0], a[1] - b[1]);
  const first = places.reduce<Place | undefined>((best, place) => {
    const sum = (p: Place): number => p.at[0] - p.at[1];
    return !best || sum(place) < sum(best) ? place : best;
  }, undefined);
  if (!first) return [];
  const farthest = (from: readonly Place[]): Place =>
    places.reduce((best, place) => {
      const least = (p: Place): number => Math.min(...from.map(({ at }) => apart(at, p.at)));
      return least(place) > least(best) + 1e-9 ? place : best;
    }, first);
  const second = farthest([first]);
  const third = farthest([first, second]);
  return [first, second, third].map(({ at }, index) => ({
    id: `pin-${index + 1}`,
    kind: 'register',
    path: [at],
    closed: false,
    face,
  }));
}
