import { STRAIGHT_SHARE } from '@/lib/numerics/tolerances';
import type { LatticeSection, MeanLine } from './types';

// Places along a surface: its length runs along the panels as the front view shows them.

/** Length of the surface up to each section, in the front view. */
export function sectionLengths(sections: readonly LatticeSection[]): number[] {
  const lengths = [0];
  for (let i = 1; i < sections.length; i++) {
    const a = sections[i - 1];
    const b = sections[i];
    if (!a || !b) break;
    lengths.push((lengths[i - 1] ?? 0) + Math.hypot(b.le[1] - a.le[1], b.le[2] - a.le[2]));
  }
  return lengths;
}

/** The cut at a length from the root, straight between the sections beside it. */
export function cutAt(sections: readonly LatticeSection[], lengths: readonly number[], length: number): LatticeSection {
  let i = 1;
  while (i < sections.length - 1 && (lengths[i] ?? 0) < length) i++;
  const a = sections[i - 1];
  const b = sections[i];
  if (!a || !b) throw new RangeError(`a surface needs two sections, got ${sections.length}`);
  const from = lengths[i - 1] ?? 0;
  const span = (lengths[i] ?? 0) - from;
  const t = span > 0 ? (length - from) / span : 0;
  return {
    le: [a.le[0] + (b.le[0] - a.le[0]) * t, a.le[1] + (b.le[1] - a.le[1]) * t, a.le[2] + (b.le[2] - a.le[2]) * t],
    chord: a.chord + (b.chord - a.chord) * t,
    incidenceRad: a.incidenceRad + (b.incidenceRad - a.incidenceRad) * t,
    ...(a.meanLine && b.meanLine ? { meanLine: between(a.meanLine, b.meanLine, t) } : {}),
  };
}

/** A mean line between two: place and slope of each kink run straight when both ends have the same; otherwise both lines, in parts. */
function between(a: MeanLine, b: MeanLine, t: number): MeanLine {
  const mixed = (line: MeanLine, share: number) => line.map(({ at, slope }) => ({ at, slope: slope * share }));
  if (a.length !== b.length) return [...mixed(a, 1 - t), ...mixed(b, t)];
  return a.map((kink, i) => {
    const other = b[i] ?? kink;
    return { at: kink.at + (other.at - kink.at) * t, slope: kink.slope + (other.slope - kink.slope) * t };
  });
}

/** Sections that follow each other without a step; a step in chord at a joint between panels begins a new run. */
export interface SectionRun {
  readonly sections: readonly LatticeSection[];
  /** Lengths from the surface's root. */
  readonly lengths: readonly number[];
}

/** A surface cut at its steps; within a run, sections that only lie on the straight line between their neighbours are left out. */
export function sectionRuns(sections: readonly LatticeSection[]): SectionRun[] {
  const lengths = sectionLengths(sections);
  const runs: SectionRun[] = [];
  let start = 0;
  for (let i = 1; i <= sections.length; i++) {
    if (i < sections.length && (lengths[i] ?? 0) > (lengths[i - 1] ?? 0)) continue;
    if (i - start > 1) runs.push(withoutStraight(sections.slice(start, i), lengths.slice(start, i)));
    start = i;
  }
  return runs;
}

/** A panel cut in two by an interpolated section is the same panel and gets the same lattice. */
function withoutStraight(sections: readonly LatticeSection[], lengths: readonly number[]): SectionRun {
  const tolerance = (lengths.at(-1) ?? 0) * STRAIGHT_SHARE;
  const kept: number[] = [];
  for (const [i, section] of sections.entries()) {
    const previous = kept.at(-1);
    const before = previous === undefined ? undefined : sections[previous];
    const next = sections[i + 1];
    if (before && next && previous !== undefined) {
      const straight = cutAt([before, next], [lengths[previous] ?? 0, lengths[i + 1] ?? 0], lengths[i] ?? 0);
      if (sameSection(straight, section, tolerance)) continue;
    }
    kept.push(i);
  }
  return { sections: kept.flatMap((i) => sections[i] ?? []), lengths: kept.map((i) => lengths[i] ?? 0) };
}

function sameSection(a: LatticeSection, b: LatticeSection, tolerance: number): boolean {
  const apart = Math.hypot(a.le[0] - b.le[0], a.le[1] - b.le[1], a.le[2] - b.le[2]);
  return (
    apart <= tolerance &&
    Math.abs(a.chord - b.chord) <= tolerance &&
    Math.abs(a.incidenceRad - b.incidenceRad) <= STRAIGHT_SHARE &&
    sameMeanLine(a.meanLine ?? [], b.meanLine ?? [])
  );
}

/** True when two mean lines have the same kinks. */
export const sameMeanLine = (a: MeanLine, b: MeanLine): boolean =>
  a.length === b.length &&
  a.every(({ at, slope }, i) => {
    const other = b[i];
    return (
      other !== undefined &&
      Math.abs(other.at - at) <= STRAIGHT_SHARE &&
      Math.abs(other.slope - slope) <= STRAIGHT_SHARE
    );
  });
