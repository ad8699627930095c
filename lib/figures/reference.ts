import { flatSurface } from '@/lib/aero/flatSections';
import { cutAt, sectionLengths } from '@/lib/aero/lattice/stations';
import type { LatticeSection } from '@/lib/aero/lattice/types';
import type { ResolvedAirframe } from '@/lib/airframe/resolved';
import type { Airframe } from '@/lib/airframe/schema/airframe';
import type { Surface } from '@/lib/airframe/schema/surface';
import { type HalfPlanform, halfPlanform } from '@/lib/geometry/planform';
import { type Problem, type Result, refuse } from '@/lib/numerics/result';
import { texts } from '@/lib/text/en/figures';
import { type FigureSet, known } from './value';

/** A surface as areas and arms see it; both sides together. Lengths mm, areas mm2. */
export interface SurfaceArea {
  readonly surface: Surface;
  readonly index: number;
  readonly sections: readonly LatticeSection[];
  /** Along the surface, not projected. */
  readonly areaMm2: number;
  /** Parts of it that lie flat and stand upright: by the squares of cosine and sine of its roll. */
  readonly flatMm2: number;
  readonly uprightMm2: number;
  /** Quarter point of its own mean chord. */
  readonly quarterXMm: number;
  readonly spanMm: number;
}

/** What coefficients and margins are measured by: the wing, projected. */
export interface WingReference {
  readonly areaMm2: number;
  readonly spanMm: number;
  readonly macMm: number;
  readonly macLeXMm: number;
  readonly macYMm: number;
  readonly macZMm: number;
  /** Quarter point of the mean aerodynamic chord. */
  readonly quarterXMm: number;
  readonly aspectRatio: number;
  /** Of the half-chord line, averaged over the area. */
  readonly halfChordSweepRad: number;
}

export interface Areas {
  readonly surfaces: readonly SurfaceArea[];
  readonly wing: Result<WingReference>;
}

/** Areas of all surfaces, and the wing as reference. */
export function areasOf(airframe: Airframe, resolved: ResolvedAirframe): Areas {
  const surfaces = resolved.surfaces.map((r) =>
    surfaceArea(r.surface, r.index, flatSurface(airframe, resolved, r).sections),
  );
  return {
    surfaces,
    wing: wingReference(surfaces.filter(({ surface }) => surface.role === 'wing' && surface.mirrored)),
  };
}

/** Integrals over the strips between sections, along the surface. */
function surfaceArea(surface: Surface, index: number, sections: readonly LatticeSection[]): SurfaceArea {
  let [area, flat, upright, moment] = [0, 0, 0, 0];
  for (const [i, b] of sections.entries()) {
    const a = sections[i - 1];
    if (!a) continue;
    const dy = b.le[1] - a.le[1];
    const dz = b.le[2] - a.le[2];
    const length = Math.hypot(dy, dz);
    if (length === 0) continue;
    const strip = (length * (a.chord + b.chord)) / 2;
    area += strip;
    flat += strip * (dy / length) ** 2;
    upright += strip * (dz / length) ** 2;
    // Quarter points weighted by chord, exact for straight edges.
    const qa = a.le[0] + a.chord / 4;
    const qb = b.le[0] + b.chord / 4;
    moment += (length / 6) * (2 * a.chord * qa + a.chord * qb + b.chord * qa + 2 * b.chord * qb);
  }
  const sides = surface.mirrored ? 2 : 1;
  return {
    surface,
    index,
    sections,
    areaMm2: area * sides,
    flatMm2: flat * sides,
    uprightMm2: upright * sides,
    quarterXMm: area > 0 ? moment / area : 0,
    spanMm: (sectionLengths(sections).at(-1) ?? 0) * sides,
  };
}

const noWing: Problem = {
  code: 'no-wing',
  path: 'surfaces',
  message: texts.problems.noWing,
  fix: texts.problems.noWingFix,
};

function wingReference(wings: readonly SurfaceArea[]): Result<WingReference> {
  if (wings.length === 0) return refuse(noWing);
  const back = wings.find(({ sections }) => sections.some((s, i) => s.le[1] < (sections[i - 1]?.le[1] ?? s.le[1])));
  if (back) return refuse(foldsBack(back.index));
  const halves = wings.map(({ sections }) =>
    halfPlanform(sections.map(({ le, chord }) => ({ x: le[0], y: le[1], chord }))),
  );
  const sum = (pick: (half: HalfPlanform) => number) => halves.reduce((total, half) => total + pick(half), 0);
  const half = sum((h) => h.areaHalf);
  if (!(half > 0)) return refuse(noWing);
  const spanMm = 2 * halves.reduce((most, h) => Math.max(most, h.reach), 0);
  const macMm = sum((h) => h.chordSquared) / half;
  const macLeXMm = sum((h) => h.momentXLe) / half;
  const macYMm = sum((h) => h.momentY) / half;
  return {
    ok: true,
    value: {
      areaMm2: 2 * half,
      spanMm,
      macMm,
      macLeXMm,
      macYMm,
      macZMm: heightAt(wings, macYMm),
      quarterXMm: macLeXMm + macMm / 4,
      aspectRatio: spanMm ** 2 / (2 * half),
      halfChordSweepRad: Math.atan(halfChordSlope(wings)),
    },
  };
}

const foldsBack = (index: number): Problem => ({
  code: 'wing-folds-back',
  path: `surfaces.${index}`,
  message: texts.problems.wingFoldsBack,
  fix: texts.problems.wingFoldsBackFix,
});

/** Height of the first wing that reaches to y. */
function heightAt(wings: readonly SurfaceArea[], y: number): number {
  for (const { sections } of wings) {
    const spans = sections.map(({ le }) => le[1]);
    if ((spans.at(-1) ?? 0) >= y) return cutAt(sections, spans, y).le[2];
  }
  return 0;
}

function halfChordSlope(wings: readonly SurfaceArea[]): number {
  let [area, weighted] = [0, 0];
  for (const { sections } of wings)
    for (const [i, b] of sections.entries()) {
      const a = sections[i - 1];
      if (!a) continue;
      const chord = (a.chord + b.chord) / 2;
      area += (b.le[1] - a.le[1]) * chord;
      weighted += (b.le[0] + b.chord / 2 - a.le[0] - a.chord / 2) * chord;
    }
  return area > 0 ? weighted / area : 0;
}

/** mm2 in a dm2. */
const MM2_PER_DM2 = 10_000;

/** Figures of the wing's own shape. */
export function wingFigures(wing: WingReference): FigureSet {
  return {
    spanMm: known(wing.spanMm),
    wingAreaDm2: known(wing.areaMm2 / MM2_PER_DM2),
    aspectRatio: known(wing.aspectRatio),
    macMm: known(wing.macMm),
    aerodynamicCentreXMm: known(wing.quarterXMm),
  };
}
