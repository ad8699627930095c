import { cutAt, sectionLengths } from './stations';
import type { LatticeSection, LatticeSurface } from './types';

// Where the end of one surface meets another: such an end carries no tip vortex, and the strips of both should begin there.

export interface Junction {
  /** The surface whose end it is. */
  readonly of: number;
  readonly end: 'root' | 'tip';
  /** The surface that is met, and where: a length from its root. */
  readonly on: number;
  readonly at: number;
  /** True when it is met at its own root or tip. */
  readonly endToEnd: boolean;
}

/** An end closer to another surface, in the front view, than this share of its chord stands on it: about a sheet's thickness. With a
 * wider gap air passes between them. Common practice, no source. */
const STANDS_ON = 0.05;

/** Every junction between different surfaces. */
export function junctions(surfaces: readonly LatticeSurface[]): Junction[] {
  const found: Junction[] = [];
  for (const [of, surface] of surfaces.entries()) {
    for (const end of ['root', 'tip'] as const) {
      const section = end === 'root' ? surface.sections[0] : surface.sections[surface.sections.length - 1];
      if (!section) continue;
      for (const [on, other] of surfaces.entries()) {
        if (on === of) continue;
        const met = meets(section, other.sections);
        if (met) found.push({ of, end, on, ...met });
      }
    }
  }
  return found;
}

function meets(end: LatticeSection, sections: readonly LatticeSection[]): { at: number; endToEnd: boolean } | null {
  const lengths = sectionLengths(sections);
  const total = lengths[lengths.length - 1] ?? 0;
  const nearest = nearestLength(end, sections, lengths);
  if (nearest.distance > end.chord * STANDS_ON) return null;
  const there = cutAt(sections, lengths, nearest.at);
  const overlap = Math.min(end.le[0] + end.chord, there.le[0] + there.chord) - Math.max(end.le[0], there.le[0]);
  if (overlap <= 0) return null;
  const margin = total * 0.02;
  return { at: nearest.at, endToEnd: nearest.at < margin || nearest.at > total - margin };
}

/** Closest place of a surface to a section's leading edge, in the front view. */
function nearestLength(end: LatticeSection, sections: readonly LatticeSection[], lengths: readonly number[]) {
  let best = { at: 0, distance: Number.POSITIVE_INFINITY };
  for (let i = 1; i < sections.length; i++) {
    const a = sections[i - 1];
    const b = sections[i];
    if (!a || !b) break;
    const dy = b.le[1] - a.le[1];
    const dz = b.le[2] - a.le[2];
    const square = dy * dy + dz * dz;
    if (square === 0) continue;
    const along = ((end.le[1] - a.le[1]) * dy + (end.le[2] - a.le[2]) * dz) / square;
    const t = Math.min(1, Math.max(0, along));
    const distance = Math.hypot(end.le[1] - a.le[1] - t * dy, end.le[2] - a.le[2] - t * dz);
    const from = lengths[i - 1] ?? 0;
    if (distance < best.distance) best = { at: from + t * ((lengths[i] ?? 0) - from), distance };
  }
  return best;
}

/** Surfaces that continue each other, end to end and nearly parallel, count as one: the same number for each. */
export function families(surfaces: readonly LatticeSurface[], met: readonly Junction[]): number[] {
  const family = surfaces.map((_, index) => index);
  for (const { of, on, endToEnd } of met) {
    const a = surfaces[of];
    const b = surfaces[on];
    if (!endToEnd || !a || !b || Math.abs(rollOf(a) - rollOf(b)) > NEARLY_PARALLEL_RAD) continue;
    const from = family[of] ?? of;
    const to = family[on] ?? on;
    for (const [i, f] of family.entries()) if (f === from) family[i] = to;
  }
  return family;
}

const NEARLY_PARALLEL_RAD = Math.PI / 4;

function rollOf({ sections }: LatticeSurface): number {
  const root = sections[0];
  const tip = sections[sections.length - 1];
  return root && tip ? Math.atan2(tip.le[2] - root.le[2], tip.le[1] - root.le[1]) : 0;
}
