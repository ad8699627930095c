import { bounds, contains, edges, signedArea } from '@/lib/geometry/polygons';
import { SAME_POINT_MM } from '@/lib/numerics/tolerances';
import { dot3, length3, type Vec2 } from '@/lib/numerics/vec';
import { distance, distanceToRing, edgesCross, NOTHING_MM, type Ring, selfCrossing } from './shape/ring';
import type { Part, PartFrame } from './types';

function assertRing(ring: Ring, name: string, sign: 1 | -1): void {
  if (ring.length < 3) throw new RangeError(`${name} needs 3 points, got ${ring.length}`);
  if (!ring.flat().every(Number.isFinite)) throw new RangeError(`${name} must be finite`);
  for (const [a, b] of edges(ring)) {
    if (distance(a, b) < NOTHING_MM) throw new RangeError(`${name} repeats the point ${a.join(', ')}`);
  }
  const crossing = selfCrossing(ring);
  if (crossing) throw new RangeError(`${name} crosses itself at edges ${crossing.join(' and ')}`);
  const area = signedArea(ring) * sign;
  if (!(area > 0))
    throw new RangeError(
      `${name} must run ${sign > 0 ? '' : 'counter-'}clockwise the other way, got area ${area * sign}`,
    );
}

function assertFrame({ origin, ex, ey }: PartFrame, key: string): void {
  if (![...origin, ...ex, ...ey].every(Number.isFinite)) throw new RangeError(`frame of ${key} must be finite`);
  const off = Math.max(Math.abs(length3(ex) - 1), Math.abs(length3(ey) - 1), Math.abs(dot3(ex, ey)));
  if (off > 1e-9) throw new RangeError(`frame of ${key} must be square and of unit length, off by ${off}`);
}

/** Inside the outline or on it, to what a blade can follow. */
const onSheet = (p: Vec2, outline: Ring): boolean =>
  contains(outline, p) || distanceToRing(p, outline) <= SAME_POINT_MM;

function assertHoles({ key, outline, holes }: Part): void {
  for (const [index, hole] of holes.entries()) {
    assertRing(hole, `hole ${index} of ${key}`, -1);
    const others = [outline, ...holes.slice(index + 1)];
    const crossed = others.some((ring) =>
      edges(ring).some(([a, b]) => edges(hole).some(([c, d]) => edgesCross(a, b, c, d))),
    );
    if (crossed || !hole.every((p) => contains(outline, p)))
      throw new RangeError(`hole ${index} of ${key} leaves the part`);
  }
}

/**
 * Throws RangeError for a part that cannot be cut: an outline or hole that is not simple, runs the wrong way or is not
 * finite, an operation or label off the sheet, a frame that is not square.
 */
export function assertPart(part: Part): void {
  const { key, outline } = part;
  if (!/^[a-z0-9-]+(\/[a-z0-9+-]+)+\/(stbd|port|centre)$/.test(key))
    throw new RangeError(`part key ${key} is not in the form element/…/side`);
  if (!key.endsWith(`/${part.side}`)) throw new RangeError(`part key ${key} does not end with its side ${part.side}`);
  if (!(part.thicknessMm > 0)) throw new RangeError(`thickness of ${key} must be positive, got ${part.thicknessMm}`);
  assertRing(outline, `outline of ${key}`, 1);
  assertHoles(part);
  assertFrame(part.frame, key);
  const ids = new Set(part.operations.map(({ id }) => id));
  if (ids.size !== part.operations.length)
    throw new RangeError(`operations of ${key} share an id: ${part.operations.map(({ id }) => id).join(', ')}`);
  for (const { id, path } of part.operations) {
    if (path.length === 0) throw new RangeError(`operation ${id} of ${key} has no points`);
    const off = path.find((p) => !p.every(Number.isFinite) || !onSheet(p, outline));
    if (off) throw new RangeError(`operation ${id} of ${key} leaves the part at ${off.join(', ')}`);
  }
  for (const { at, text } of part.labels) {
    if (!contains(outline, at)) throw new RangeError(`label "${text}" of ${key} lies off the part`);
  }
  const { minX, maxX, minY, maxY } = bounds(outline);
  if (!(maxX - minX > SAME_POINT_MM && maxY - minY > SAME_POINT_MM)) throw new RangeError(`${key} has no size`);
}

/** `assertPart` for each, and no key twice. */
export function assertParts(parts: readonly Part[]): void {
  for (const part of parts) assertPart(part);
  const keys = new Set(parts.map(({ key }) => key));
  if (keys.size !== parts.length) throw new RangeError(`parts share a key: ${parts.map(({ key }) => key).join(', ')}`);
}
