import { contains } from '@/lib/geometry/polygons';
import type { Vec2 } from '@/lib/numerics/vec';
import type { Facet } from '@/lib/parts/shape/facets';
import { distanceToRing } from '@/lib/parts/shape/ring';

/** The flat piece that a point of a part lies on: the nearest, for a point on an edge or a fold. Throws RangeError without any piece. */
export function facetAt(facets: readonly Facet[], p: Vec2): Facet {
  const [first, ...more] = facets;
  if (!first) throw new RangeError('a part has at least one flat piece');
  if (more.length === 0) return first;
  return (
    facets.find(({ outline }) => contains(outline, p)) ??
    more.reduce(
      (best, facet) => (distanceToRing(p, facet.outline) < distanceToRing(p, best.outline) ? facet : best),
      first,
    )
  );
}
