import { subtractRings } from '@/lib/geometry/clipping';
import { contains, counterClockwise, edges, signedArea } from '@/lib/geometry/polygons';
import type { Problem } from '@/lib/numerics/result';
import type { Vec2 } from '@/lib/numerics/vec';
import { texts } from '@/lib/text/en/parts';
import type { Draft } from './draft';
import { clipOperations } from './shape/clip';
import { beginAt, cleanRing, distanceToRing, edgesCross, NOTHING_MM, type Ring } from './shape/ring';

// Openings in a sheet: a hole where they lie inside it, a notch where they reach its edge.

/** One opening: its rings, counter-clockwise, and the document path that asks for it. */
export interface Opening {
  readonly path: string;
  readonly rings: readonly Vec2[][];
}

export interface Opened {
  readonly outline: Vec2[];
  readonly holes: readonly Vec2[][];
  readonly problems: readonly Problem[];
}

/** Smaller than a square millimetre is no opening. */
const LEAST_OPENING_MM2 = 1;

const crosses = (a: Ring, b: Ring): boolean =>
  edges(a).some(([p, q]) => edges(b).some(([r, s]) => edgesCross(p, q, r, s)));

const wellInside = (ring: Ring, outline: Ring): boolean =>
  ring.every((p) => contains(outline, p) && distanceToRing(p, outline) > NOTHING_MM) && !crosses(ring, outline);

/** Corners of a ring and the middles of its edges: where a ring lies is told by these when its corners stand on another's edge. */
const marksOf = (ring: Ring): Vec2[] =>
  edges(ring).flatMap(([a, b]): Vec2[] => [a, [(a[0] + b[0]) / 2, (a[1] + b[1]) / 2]]);

const wellOutside = (ring: Ring, outline: Ring): boolean => {
  const reaches = (one: Ring, other: Ring): boolean =>
    marksOf(one).some((p) => contains(other, p) && distanceToRing(p, other) > NOTHING_MM);
  return !crosses(ring, outline) && !reaches(ring, outline) && !reaches(outline, ring);
};

/** Takes openings out of a piece. An opening that would part it in two is a problem and is left out. */
export function openRing(outline: Vec2[], openings: readonly Opening[]): Opened {
  let left = outline;
  let holes: Vec2[][] = [];
  const problems: Problem[] = [];
  for (const { path, rings } of openings) {
    const touching = rings.filter((ring) => !wellOutside(ring, left));
    if (touching.length === 0) continue;
    if (touching.some((ring) => signedArea(ring) < LEAST_OPENING_MM2)) {
      problems.push({ code: 'opening-too-small', path, message: texts.problems.openingTooSmall });
      continue;
    }
    const apart = touching.every((ring, index) => touching.slice(index + 1).every((other) => wellOutside(ring, other)));
    const clear = touching.every(
      (ring) => wellInside(ring, left) && holes.every((hole) => wellOutside(ring, counterClockwise(hole))),
    );
    if (apart && clear) {
      holes = [...holes, ...touching.map((ring) => cleanRing(ring).reverse())];
      continue;
    }
    const result = subtractRings([left, ...holes], touching).map(cleanRing);
    const [whole, ...more] = result.filter((ring) => signedArea(ring) > 0);
    if (!whole || more.length > 0) {
      problems.push({ code: 'opening-parts-sheet', path, message: texts.problems.openingPartsSheet });
      continue;
    }
    left = beginAt(whole, outline[0]);
    holes = result.filter((ring) => signedArea(ring) < 0);
  }
  return { outline: left, holes, problems };
}

/** A draft with its openings cut; what is worked on it ends where the sheet does. */
export function openDraft(draft: Draft, openings: readonly Opening[]): { draft: Draft; problems: readonly Problem[] } {
  if (openings.length === 0) return { draft, problems: [] };
  const { outline, holes, problems } = openRing([...draft.outline], openings);
  const operations = clipOperations(draft.operations, outline, holes);
  return { draft: { ...draft, outline, holes, operations }, problems };
}
