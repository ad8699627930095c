import { distance } from '@/lib/geometry/lines';
import { bounds, contains, edges, signedArea } from '@/lib/geometry/polygons';
import { SAME_POINT_MM } from '@/lib/numerics/tolerances';
import { dot3, length3 } from '@/lib/numerics/vec';
import { edgesCross, NOTHING_MM, onSheet, type Ring, selfCrossing } from './shape/ring';
import type { Part, PartFrame } from './types';

// A part knows how to check itself: what is found here is a fault of the program or a document that no sheet can follow.

/** What is wrong, in words for a programmer, or null. */
type Fault = string | null;

function ringFault(ring: Ring, name: string, runs: 'counter-clockwise' | 'clockwise'): Fault {
  if (ring.length < 3) return `${name} needs 3 points, got ${ring.length}`;
  if (!ring.flat().every(Number.isFinite)) return `${name} must be finite`;
  const repeated = edges(ring).find(([a, b]) => distance(a, b) < NOTHING_MM);
  if (repeated) return `${name} repeats the point ${repeated[0].join(', ')}`;
  const crossing = selfCrossing(ring);
  if (crossing) return `${name} crosses itself at edges ${crossing.join(' and ')}`;
  const area = signedArea(ring);
  const right = runs === 'clockwise' ? area < 0 : area > 0;
  return right ? null : `${name} must run ${runs}, got area ${area}`;
}

function frameFault({ origin, ex, ey }: PartFrame): Fault {
  if (![...origin, ...ex, ...ey].every(Number.isFinite)) return 'frame must be finite';
  const off = Math.max(Math.abs(length3(ex) - 1), Math.abs(length3(ey) - 1), Math.abs(dot3(ex, ey)));
  return off > 1e-9 ? `frame must be square and of unit length, off by ${off}` : null;
}

const crossing = (a: Ring, b: Ring): boolean =>
  edges(a).some(([p, q]) => edges(b).some(([r, s]) => edgesCross(p, q, r, s)));

function holesFault({ outline, holes }: Part): Fault {
  for (const [index, hole] of holes.entries()) {
    const fault = ringFault(hole, `hole ${index}`, 'clockwise');
    if (fault) return fault;
    const meets = [outline, ...holes.slice(index + 1)].some((ring) => crossing(ring, hole));
    if (meets || !hole.every((p) => contains(outline, p))) return `hole ${index} leaves the part`;
  }
  return null;
}

function marksFault({ outline, operations, labels }: Part): Fault {
  if (new Set(operations.map(({ id }) => id)).size !== operations.length) {
    return `operations share an id: ${operations.map(({ id }) => id).join(', ')}`;
  }
  for (const { id, path } of operations) {
    if (path.length === 0) return `operation ${id} has no points`;
    const off = path.find((p) => !p.every(Number.isFinite) || !onSheet(p, outline));
    if (off) return `operation ${id} leaves the part at ${off.join(', ')}`;
  }
  const stray = labels.find(({ at }) => !contains(outline, at));
  return stray ? `label "${stray.text}" lies off the part` : null;
}

function identityFault({ key, side, thicknessMm }: Part): Fault {
  if (!/^[a-z0-9-]+(\/[a-z0-9+-]+)+\/(stbd|port|centre)$/.test(key))
    return 'the part key must have the form element/…/side';
  if (!key.endsWith(`/${side}`)) return `the part key does not end with its side ${side}`;
  return thicknessMm > 0 ? null : `thickness must be positive, got ${thicknessMm}`;
}

function sizeFault({ outline }: Part): Fault {
  const { minX, maxX, minY, maxY } = bounds(outline);
  return maxX - minX > SAME_POINT_MM && maxY - minY > SAME_POINT_MM ? null : 'the part has no size';
}

/**
 * Why a part cannot be cut, or null: an outline or hole that is not simple, runs the wrong way or is not finite, an
 * operation or label off the sheet, a frame that is not square.
 */
export function partFault(part: Part): Fault {
  return (
    identityFault(part) ??
    ringFault(part.outline, 'outline', 'counter-clockwise') ??
    sizeFault(part) ??
    holesFault(part) ??
    frameFault(part.frame) ??
    marksFault(part)
  );
}

/** Throws RangeError with the part's key and its fault when it cannot be cut. */
export function assertPart(part: Part): void {
  const fault = partFault(part);
  if (fault) throw new RangeError(`${part.key}: ${fault}`);
}

/** `assertPart` for each, and no key twice. */
export function assertParts(parts: readonly Part[]): void {
  for (const part of parts) assertPart(part);
  const keys = new Set(parts.map(({ key }) => key));
  if (keys.size !== parts.length) throw new RangeError(`parts share a key: ${parts.map(({ key }) => key).join(', ')}`);
}
