import type { SectionShape } from './schema/surface';

// The outside of a folded section in shares of its chord, as the lattice and the parts both read it: straight from edge to edge.

export type Folded = Extract<SectionShape, { kind: 'folded' }>;

/** A folded section's reflex turns up what lies behind its lower skin, at most this far forward. Common practice, no source. */
const REFLEX_FROM = 0.75;

/** Height of the upper skin's outer face without its reflex, as a share of the chord. */
export const upperHeight = ({ thicknessShare, maxAt }: Folded, share: number): number =>
  share <= maxAt ? (thicknessShare * share) / maxAt : (thicknessShare * (1 - share)) / (1 - maxAt);

/** Where the reflex begins, or null without one. */
export function reflexFrom({ reflexDeg = 0, lowerTo, maxAt }: Folded): number | null {
  const from = lowerTo > maxAt ? Math.max(lowerTo, REFLEX_FROM) : REFLEX_FROM;
  return reflexDeg === 0 || from >= 1 ? null : from;
}
