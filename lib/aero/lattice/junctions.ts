import { cutAt, sectionLengths } from './stations';
import type { LatticeSection, LatticeSurface } from './types';

// Where the end of one surface meets another: such an end carries no tip vortex, and the strips of both should begin there.

export interface Junction {
  /** The surface whose end it is, or that passes through the other. */
  readonly of: number;
  readonly end: 'root' | 'tip' | 'through';
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
  return [...found, ...crossings(surfaces, found)];
}

/** Where surfaces pass through each other away from their ends, e.g. a fin that reaches below the tail it is slotted to. */
function crossings(surfaces: readonly LatticeSurface[], ends: readonly Junction[]): Junction[] {
  return surfaces.flatMap((a, i) =>
    surfaces.slice(i + 1).flatMap((b, offset): Junction[] => {
      const j = i + 1 + offset;
      if (ends.some(({ of, on }) => (of === i && on === j) || (of === j && on === i))) return [];
      const at = crossing(a.sections, b.sections);
      if (!at) return [];
      return [
        { of: i, end: 'through', on: j, at: at[1], endToEnd: false },
        { of: j, end: 'through', on: i, at: at[0], endToEnd: false },
      ];
    }),
  );
}

/** Lengths at which two surfaces cross in the front view where their chords overlap; null when they do not. */
function crossing(a: readonly LatticeSection[], b: readonly LatticeSection[]): [number, number] | null {
  const [alongA, alongB] = [sectionLengths(a), sectionLengths(b)];
  for (let i = 1; i < a.length; i++)
    for (let j = 1; j < b.length; j++) {
      const [a0, a1, b0, b1] = [a[i - 1]?.le, a[i]?.le, b[j - 1]?.le, b[j]?.le];
      if (!a0 || !a1 || !b0 || !b1) continue;
      const [ay, az, by, bz] = [a1[1] - a0[1], a1[2] - a0[2], b1[1] - b0[1], b1[2] - b0[2]];
      const turn = ay * bz - az * by;
      if (turn === 0) continue;
      const s = ((b0[1] - a0[1]) * bz - (b0[2] - a0[2]) * by) / turn;
      const t = ((b0[1] - a0[1]) * az - (b0[2] - a0[2]) * ay) / turn;
      if (!(s > 0 && s < 1 && t > 0 && t < 1)) continue;
      const [from, to] = [alongA[i - 1] ?? 0, alongB[j - 1] ?? 0];
      const at: [number, number] = [from + s * ((alongA[i] ?? 0) - from), to + t * ((alongB[j] ?? 0) - to)];
      const [cutA, cutB] = [cutAt(a, alongA, at[0]), cutAt(b, alongB, at[1])];
      if (cutA.le[0] < cutB.le[0] + cutB.chord && cutB.le[0] < cutA.le[0] + cutA.chord) return at;
    }
  return null;
}

/**
 * The surfaces with each end that stands on another moved, in the front view, onto it: a slot's depth or a sheet's thickness must not leave
 * a sliver that air could pass. Of two ends that stand on each other the shorter surface's moves. An end whose surface would lose more
 * than a tenth of its length by it stays.
 */
export function joined(surfaces: readonly LatticeSurface[], met: readonly Junction[]): LatticeSurface[] {
  const longs = surfaces.map(({ sections }) => sectionLengths(sections).at(-1) ?? 0);
  return surfaces.map((surface, index) => {
    let sections = [...surface.sections];
    for (const { of, end, on, at } of met) {
      const other = surfaces[on]?.sections;
      if (of !== index || end === 'through' || !other) continue;
      const mutual = met.some((back) => back.of === on && back.on === index && back.end !== 'through');
      if (mutual && (longs[on] ?? 0) <= (longs[index] ?? 0)) continue;
      const k = end === 'root' ? 0 : sections.length - 1;
      const [, y, z] = cutAt(other, sectionLengths(other), at).le;
      const moved = sections.map((section, i) =>
        i === k ? { ...section, le: [section.le[0], surface.mirrored ? y : section.le[1], z] as const } : section,
      );
      if ((sectionLengths(moved).at(-1) ?? 0) > KEPT_LENGTH * (longs[index] ?? 0)) sections = moved;
    }
    return { ...surface, sections };
  });
}

/** Least share of its length that a surface keeps when its end is moved onto another. */
const KEPT_LENGTH = 0.9;

/** For each surface, those that it touches. */
export function neighbours(surfaces: readonly LatticeSurface[], met: readonly Junction[]): ReadonlySet<number>[] {
  return surfaces.map((_, i) => new Set(met.flatMap(({ of, on }) => (of === i ? [on] : on === i ? [of] : []))));
}

function meets(
  end: LatticeSection,
  sections: readonly LatticeSection[],
  gap = end.chord * STANDS_ON,
): { at: number; endToEnd: boolean } | null {
  const lengths = sectionLengths(sections);
  const total = lengths[lengths.length - 1] ?? 0;
  const nearest = nearestLength(end, sections, lengths);
  if (nearest.distance > gap) return null;
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

/** Two sheets closer than this share of the chord lie in one place. */
const ONE_PLACE = 1e-3;
/** Surfaces that cross at less than this angle slice each other lengthwise. Common practice, no source. */
const SLICING_RAD = Math.PI / 9;

/** True when one surface lies within another from end to end, so that their lift cannot be told apart. */
export function liesIn({ sections }: LatticeSurface, other: LatticeSurface): boolean {
  const [root, tip] = [sections[0], sections.at(-1)];
  if (!root || !tip) return false;
  return [root, tip].every((end) => meets(end, other.sections, ONE_PLACE * Math.max(root.chord, tip.chord)) !== null);
}

/**
 * True when one stretch of a surface comes back over another, in the front view: crossing it, or closer than a twentieth of its chord. A
 * stretch may bend at most to a right angle and a half from the one before it.
 */
export function foldsOnItself(sections: readonly LatticeSection[]): boolean {
  const runs = sections.slice(1).flatMap((outer, i) => {
    const inner = sections[i];
    const long = inner ? Math.hypot(outer.le[1] - inner.le[1], outer.le[2] - inner.le[2]) : 0;
    return inner && long > 0 ? [{ inner, outer, long }] : [];
  });
  return runs.some((run, i) => {
    const before = runs[i - 1];
    if (before && bendCosine(before, run) < SHARPEST_BEND) return true;
    return runs.slice(0, Math.max(0, i - 1)).some((earlier) => touches(earlier, run));
  });
}

/** Cosine of the sharpest bend between neighbouring stretches: 135 degrees. */
const SHARPEST_BEND = Math.cos((3 * Math.PI) / 4);

interface Stretch {
  readonly inner: LatticeSection;
  readonly outer: LatticeSection;
  readonly long: number;
}

function bendCosine(a: Stretch, b: Stretch): number {
  const along = (s: Stretch, axis: 1 | 2) => s.outer.le[axis] - s.inner.le[axis];
  return (along(a, 1) * along(b, 1) + along(a, 2) * along(b, 2)) / (a.long * b.long);
}

/** True when a stretch crosses one that is not its neighbour, or has an end beside it: not beyond its ends, where a wing goes on. */
function touches(a: Stretch, b: Stretch): boolean {
  const sections = [a.inner, a.outer];
  const beside = [b.inner, b.outer].some((end) => {
    const { at, distance } = nearestLength(end, sections, [0, a.long]);
    return distance <= end.chord * STANDS_ON && at > 0 && at < a.long;
  });
  return beside || crossing(sections, [b.inner, b.outer]) !== null;
}

/** True when two surfaces cross nearly flat to each other. */
export const slices = (a: LatticeSurface, b: LatticeSurface): boolean =>
  Math.abs(Math.sin(rollOf(a) - rollOf(b))) < Math.sin(SLICING_RAD) && crossing(a.sections, b.sections) !== null;

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
