import { type Folded, reflexFrom, upperHeight } from '@/lib/airframe/foldedSection';
import { radFromDeg } from '@/lib/numerics/vec';

// The outside of a folded section in shares of its chord: x aft from the leading edge, height above the line from leading to trailing
// edge, which is the lower skin's outer face. Straight from edge to edge, as the lattice reads it.

/** The straight lines along a folded panel, from its trailing edge forward over the upper skin and back along the lower one. */
export type LineName = 'te' | 'reflex' | 'crest' | 'nose' | 'lower';

export interface OuterPoint {
  readonly name: LineName;
  readonly share: number;
  readonly height: number;
}

/** Corners of the outside, from the trailing edge forward and round the nose to the lower skin's rear edge. */
export function outerPoints(section: Folded): OuterPoint[] {
  const from = reflexFrom(section);
  const rise = from === null ? 0 : Math.tan(radFromDeg(section.reflexDeg ?? 0)) * (1 - from);
  const reflex: OuterPoint[] =
    from === null ? [] : [{ name: 'reflex', share: from, height: upperHeight(section, from) }];
  return [
    { name: 'te', share: 1, height: rise },
    ...reflex,
    { name: 'crest', share: section.maxAt, height: section.thicknessShare },
    { name: 'nose', share: 0, height: 0 },
    { name: 'lower', share: section.lowerTo, height: 0 },
  ];
}
