import { CENTRE_PLANE_SHARE } from '@/lib/numerics/tolerances';
import type { Junction } from './junctions';
import { cutAt, type SectionRun, sectionLengths } from './stations';
import type { LaidStrip, LatticeControl, LatticeOptions, LatticeSurface } from './types';

// Where strips begin and end.

/** A place where a strip should begin. */
interface Break {
  readonly at: number;
  readonly kind: keyof typeof CROWDED;
}

/**
 * A break closer than this share of a strip to a more important one is dropped, for even strips matter more than a break: what a
 * control's end stands for is then met in part by a strip. A junction must be met, or the leg from the root of the surface
 * that stands there passes beside the control points of this one. Own tests of refinement.
 */
const CROWDED = { panel: 0, junction: 0.35, control: 1.5 } as const;

/** Strips that a control needs for its power to come out; own tests of refinement. */
const STRIPS_PER_CONTROL = 3;

/** Lays the strips of one run of a surface: from each break to the next, as nearly equal in width as can be. */
export function layStrips(
  surface: LatticeSurface,
  index: number,
  run: SectionRun,
  controls: readonly LatticeControl[],
  met: readonly Junction[],
  options: LatticeOptions,
): LaidStrip[] {
  const total = sectionLengths(surface.sections).at(-1) ?? 0;
  const spans = controls
    .filter((c) => c.surfaceId === surface.id)
    .map((c): [number, number] => [c.from * total, c.to * total]);
  const stands = options.alignJunctions ? met.filter((j) => j.on === index) : [];
  const breaks: Break[] = [
    ...run.lengths.map((at) => ({ at, kind: 'panel' as const })),
    ...stands.map(({ at }) => ({ at, kind: 'junction' as const })),
    ...spans.flat().map((at) => ({ at, kind: 'control' as const })),
  ];
  const inset = insets(surface, index, run, total, met, options);
  const stations = stripStations(breaks, run, total / surface.strips, spans, inset);
  return stations.slice(1).map((to, k) => strip(run, total, stations[k] ?? 0, to));
}

/** Shares of a strip by which the lattice is shorter at each end of a run: only where the surface's own end is free. */
function insets(
  { sections, mirrored }: LatticeSurface,
  index: number,
  run: SectionRun,
  total: number,
  met: readonly Junction[],
  { tipInset }: LatticeOptions,
) {
  const free = (end: 'root' | 'tip') => !met.some((j) => j.of === index && j.end === end);
  const meetsImage = mirrored && Math.abs(sections[0]?.le[1] ?? 0) <= total * CENTRE_PLANE_SHARE;
  const isRoot = run.lengths[0] === 0;
  const isTip = run.lengths.at(-1) === total;
  return { root: isRoot && !meetsImage && free('root') ? tipInset : 0, tip: isTip && free('tip') ? tipInset : 0 };
}

function stripStations(
  breaks: readonly Break[],
  run: SectionRun,
  wanted: number,
  controls: readonly (readonly [from: number, to: number])[],
  inset: { readonly root: number; readonly tip: number },
): number[] {
  const [start, end] = [run.lengths[0] ?? 0, run.lengths.at(-1) ?? 0];
  const kept = keptBreaks(breaks, wanted).filter((at) => at >= start && at <= end);
  const stations: number[] = [];
  for (let i = 1; i < kept.length; i++) {
    const from = kept[i - 1] ?? 0;
    const to = kept[i] ?? 0;
    const first = i === 1 ? inset.root : 0;
    const last = i === kept.length - 1 ? inset.tip : 0;
    const count = Math.max(leastStrips(from, to, controls), Math.round((to - from) / wanted));
    const width = (to - from) / (count + first + last);
    if (i === 1) stations.push(from + width * first);
    for (let k = 1; k < count; k++) stations.push(from + width * (first + k));
    stations.push(to - width * last);
  }
  return stations;
}

function leastStrips(from: number, to: number, controls: readonly (readonly [from: number, to: number])[]): number {
  let least = 1;
  for (const [inner, outer] of controls) {
    const covered = Math.min(to, outer) - Math.max(from, inner);
    if (covered > 0) least = Math.max(least, Math.round((STRIPS_PER_CONTROL * covered) / (outer - inner)));
  }
  return least;
}

function keptBreaks(breaks: readonly Break[], wanted: number): number[] {
  const kept: number[] = [];
  for (const kind of ['panel', 'junction', 'control'] as const) {
    for (const { at } of breaks.filter((b) => b.kind === kind)) {
      const gap = kept.reduce((least, other) => Math.min(least, Math.abs(other - at)), Number.POSITIVE_INFINITY);
      if (gap > CROWDED[kind] * wanted) kept.push(at);
    }
  }
  return kept.sort((a, b) => a - b);
}

function strip({ sections, lengths }: SectionRun, total: number, from: number, to: number): LaidStrip {
  const inner = cutAt(sections, lengths, from);
  const outer = cutAt(sections, lengths, to);
  const dy = outer.le[1] - inner.le[1];
  const dz = outer.le[2] - inner.le[2];
  const width = Math.hypot(dy, dz);
  return { from: from / total, to: to / total, width, ny: -dz / width, nz: dy / width, inner, outer };
}
