import type { Vec3 } from '@/lib/numerics/vec';
import { cross3, dot3, length3, sub3 } from '@/lib/numerics/vec';
import { type Facet, type FlatPart, foldUp } from './fold';
import { apart, bestPlacement, byTriangle, type Placement, place, toPolygon, turn } from './solid';

/** A part and the surface it stands for, as the lattice sees it. */
export interface Wanted {
  /** Flat pieces of the mean surface that this part may lie on. */
  readonly patches: readonly (readonly Vec3[])[];
  /** Corners of the surface that this part must reach. */
  readonly corners: readonly Vec3[];
  /** Where the part's worked face looks, roughly. */
  readonly looks: Vec3;
}

export interface Refolded {
  readonly faults: readonly string[];
  readonly facets: readonly Facet[];
  readonly placement: Placement | null;
  readonly worstMm: { readonly size: number; readonly off: number; readonly bare: number };
}

/** What the parts may depart from the surface, mm. */
export const TOLERANCE_MM = 0.3;

/** A part's corner farther than this from a corner of the surface is another corner, mm. */
const CORNER_REACH_MM = 1.2;

type Triangle = readonly [Vec3, Vec3, Vec3];

/** Triangles of corners to lay the part by, the largest first: a corner on a straight edge of the part has none of its own. */
function triangles(corners: readonly Vec3[]): Triangle[] {
  const found: { corners: Triangle; area: number }[] = [];
  for (const [i, a] of corners.entries())
    for (const [j, b] of corners.entries())
      for (const [k, c] of corners.entries()) {
        if (!(i < j && j < k)) continue;
        const [p, q, r] = [apart(a, b), apart(b, c), apart(c, a)];
        const s = (p + q + r) / 2;
        found.push({ corners: [a, b, c], area: Math.sqrt(Math.max(0, s * (s - p) * (s - q) * (s - r))) });
      }
  return found
    .sort((one, other) => other.area - one.area)
    .slice(0, TRIANGLES)
    .map((entry) => entry.corners);
}

const TRIANGLES = 6;

const nearest = (points: readonly Vec3[], to: Vec3): { point: Vec3; away: number } =>
  points.reduce<{ point: Vec3; away: number }>(
    (best, point) => (apart(point, to) < best.away ? { point, away: apart(point, to) } : best),
    { point: to, away: Number.POSITIVE_INFINITY },
  );

/** Every way to lay three of the part's own corners on a triangle of the surface; the one that reaches the other corners best. */
function layOn(points: readonly Vec3[], target: Triangle, { corners, looks }: Wanted): Placement | null {
  const [ab, bc, ca] = [apart(target[0], target[1]), apart(target[1], target[2]), apart(target[2], target[0])];
  const near = (a: Vec3, b: Vec3, size: number): boolean => Math.abs(apart(a, b) - size) <= 2 * TOLERANCE_MM;
  let best: Placement | null = null;
  let least = Number.POSITIVE_INFINITY;
  for (const a of points)
    for (const b of points) {
      if (!near(a, b, ab)) continue;
      for (const c of points) {
        if (!near(b, c, bc) || !near(c, a, ca)) continue;
        const tried = byTriangle([a, b, c], target);
        if (dot3(turn(tried, [0, 0, 1]), looks) <= 0) continue;
        const placed = points.map((p) => place(tried, p));
        const miss = corners.reduce((sum, corner) => sum + Math.min(5, nearest(placed, corner).away), 0);
        if (miss < least - 1e-9) [best, least] = [tried, miss];
      }
    }
  return best;
}

function search(points: readonly Vec3[], wanted: Wanted): Placement | null {
  for (const target of triangles(wanted.corners)) {
    const found = layOn(points, target, wanted);
    if (found) return found;
  }
  return null;
}

/** Whether points hold a plane: three of them span a triangle of more than a square centimetre. */
const spansArea = (points: readonly Vec3[]): boolean =>
  points.some((a) => points.some((b) => points.some((c) => length3(cross3(sub3(b, a), sub3(c, a))) > 200)));

/**
 * Folds a part up, lays it on its surface by its own corners, without being told where it belongs, and measures: how far
 * distances between its corners are from those on the surface, how far it stands off, and what it leaves bare.
 */
export function refold(part: FlatPart, wanted: Wanted): Refolded {
  const facets = foldUp(part);
  const points = facets.flat();
  const guess = search(points, wanted);
  if (!guess)
    return {
      faults: ['no way to lay it on its surface'],
      facets,
      placement: null,
      worstMm: { size: Infinity, off: Infinity, bare: Infinity },
    };
  // A corner of the surface that lies on a straight edge of the part has no corner of the part to match: it must be covered, below.
  const matched = wanted.corners.flatMap((corner) => {
    const placed = points.map((own) => ({ own, away: apart(place(guess, own), corner) }));
    const best = placed.reduce((least, entry) => (entry.away < least.away ? entry : least));
    return best.away < CORNER_REACH_MM ? [{ corner, own: best.own }] : [];
  });
  const size = Math.max(
    ...matched.flatMap((a) => matched.map((b) => Math.abs(apart(a.own, b.own) - apart(a.corner, b.corner)))),
  );
  // Laid by the piece that holds its first corner alone, so that an error of a fold shows where it leads.
  const [fixed = []] = facets;
  const held = matched.filter(({ own }) => fixed.some((p) => apart(p, own) < 1e-9));
  const laid = spansArea(held.map(({ corner }) => corner)) ? held : matched;
  const placement = bestPlacement(
    laid.map(({ own }) => own),
    laid.map(({ corner }) => corner),
  );
  const placed = facets.map((facet) => facet.map((p) => place(placement, p)));
  const off = Math.max(...placed.flat().map((p) => Math.min(...wanted.patches.map((patch) => toPolygon(p, patch)))));
  const bare = Math.max(
    ...wanted.corners.map((corner) => Math.min(...placed.map((facet) => toPolygon(corner, facet)))),
  );
  const faults = [
    ...(size > TOLERANCE_MM ? [`its size is wrong by ${size.toFixed(3)} mm`] : []),
    ...(off > TOLERANCE_MM ? [`it stands off the surface by ${off.toFixed(3)} mm`] : []),
    ...(bare > TOLERANCE_MM ? [`it leaves ${bare.toFixed(3)} mm of a corner bare`] : []),
  ];
  return { faults, facets, placement, worstMm: { size, off, bare } };
}
