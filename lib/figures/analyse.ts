import { bodyHalfWidthMm } from '@/lib/aero/bodyWidth';
import type { Derivatives } from '@/lib/aero/lattice/derivatives';
import { cutAt } from '@/lib/aero/lattice/stations';
import { resolve } from '@/lib/airframe/resolve';
import type { ResolvedAirframe } from '@/lib/airframe/resolved';
import type { Airframe } from '@/lib/airframe/schema/airframe';
import type { Balance } from '@/lib/balance/balance';
import type { Problem, Result } from '@/lib/numerics/result';
import { texts } from '@/lib/text/en/figures';
import { ENGINE_VERSION } from './engine';
import { pitchFeel, rollFeel } from './feel';
import { liftOf, sectionProblems } from './lift';
import { type Masses, massesOf } from './masses';
import { type Areas, areasOf, type WingReference, wingFigures } from './reference';
import { marginFigures, type Stability, stabilityOf, touchFigure } from './stability';
import { clMaxOf, loadingFigures, reynoldsFigure } from './stall';
import { DECIDING, FIGURES, type FigureId } from './table';
import type { FigureMarks, Figures } from './types';
import { allMissing, type FigureSet, firstProblem, known, missing } from './value';
import { handbookFigure, tailVolumeH, tailVolumeV } from './volumes';

export interface AnalyseOptions {
  /** `live`: the deciding figures, for every move of a handle. `full`: all of them. */
  readonly depth: 'live' | 'full';
}

/**
 * Works out the figures of an airframe: areas, balance, stability and feel, each with its band, verdict and inputs. What could not
 * be worked out is null with its problem; the rest still shows. No figure is ever NaN or infinite.
 */
export function analyse(airframe: Airframe, { depth }: AnalyseOptions): Figures {
  const resolved = resolve(airframe);
  if (!resolved.ok) return unresolved(depth, resolved.problems);
  const areas = areasOf(airframe, resolved.value);
  const masses = massesOf(airframe, resolved.value);
  const { wing } = areas;
  const weight = massFigures(masses);
  if (!wing.ok) {
    const lost = allMissing(wantedIds(depth), firstProblem(wing));
    return figuresOf(depth, { ...lost, ...weight }, NO_MARKS, masses, wing.problems);
  }
  const parts = { airframe, resolved: resolved.value, areas, masses, wing: wing.value };
  const lift = liftAbout(parts);
  const stability = lift.ok ? stabilityOf(airframe, wing.value, lift.value, clMaxOf(airframe)) : null;
  const values = {
    ...weight,
    ...wingFigures(wing.value),
    ...stabilityFigures(parts, lift, stability),
    ...loadings(parts),
    ...feelFigures(parts, lift, stability),
    ...(depth === 'full' ? fullFigures(parts, lift, stability) : {}),
  };
  const problems = [...sectionProblems(airframe), ...(lift.ok ? [] : lift.problems), ...(stability?.problems ?? [])];
  return figuresOf(depth, values, marksOf(parts, stability), masses, problems);
}

interface Parts {
  readonly airframe: Airframe;
  readonly resolved: ResolvedAirframe;
  readonly areas: Areas;
  readonly masses: Masses;
  readonly wing: WingReference;
}

/** The lattice about the CG, or about the wing's quarter point when there is no CG; the neutral point is the same. */
function liftAbout({ airframe, resolved, masses, wing }: Parts): Result<Derivatives> {
  const point = masses.balance.ok ? masses.balance.value.cg : ([wing.quarterXMm, 0, 0] as const);
  return liftOf(airframe, resolved, wing, [point[0], 0, point[2]], 'both');
}

function massFigures({ balance }: Masses): FigureSet {
  if (!balance.ok) return allMissing(['allUpMassG', 'cgXMm', 'pitchInertiaKgM2'], firstProblem(balance));
  const { massG, cg, inertiaKgM2 } = balance.value;
  return { allUpMassG: known(massG), cgXMm: known(cg[0]), pitchInertiaKgM2: known(inertiaKgM2.yy) };
}

const LIFT_FIGURES = [
  'neutralPointXMm',
  'cgForeLimitXMm',
  'cgAftLimitXMm',
  'firstFlightCgXMm',
  'cgFromBodySideMm',
  'staticMarginPct',
] as const satisfies readonly FigureId[];

function stabilityFigures(parts: Parts, lift: Result<Derivatives>, stability: Stability | null): FigureSet {
  if (!lift.ok) return allMissing(LIFT_FIGURES, firstProblem(lift));
  if (!stability) return {};
  const { balance } = parts.masses;
  const { figures, firstFlightX } = stability;
  return {
    ...figures,
    cgFromBodySideMm: touchFigure(firstFlightX, edgeAtBodySide(parts), figures.firstFlightCgXMm),
    ...(balance.ok
      ? marginFigures(parts.airframe, parts.wing, stability, balance.value.cg[0])
      : allMissing(['staticMarginPct'], firstProblem(balance))),
  };
}

function loadings({ airframe, masses, wing }: Parts): FigureSet {
  const { balance } = masses;
  if (!balance.ok) return allMissing(['wingLoadingGdm2', 'cubicLoadingKgM3', 'stallSpeedMs'], firstProblem(balance));
  return loadingFigures(airframe, wing, balance.value.massG);
}

const FEEL_FIGURES = ['pitchPowerPerDeg', 'rollRatePerDeg', 'rollHelix'] as const satisfies readonly FigureId[];

function feelFigures(
  { airframe, wing, masses }: Parts,
  lift: Result<Derivatives>,
  stability: Stability | null,
): FigureSet {
  if (!lift.ok || !stability) return allMissing(FEEL_FIGURES, lift.ok ? needsLattice : firstProblem(lift));
  return {
    pitchPowerPerDeg: masses.balance.ok
      ? pitchFeel(airframe, wing, lift.value, stability, masses.balance.value.massG)
      : missing(firstProblem(masses.balance)),
    ...rollFeel(airframe, wing, lift.value),
  };
}

function fullFigures(
  { airframe, areas, wing }: Parts,
  lift: Result<Derivatives>,
  stability: Stability | null,
): FigureSet {
  return {
    tailVolumeH: tailVolumeH(areas.surfaces, wing),
    tailVolumeV: tailVolumeV(areas.surfaces, wing),
    neutralPointHandbookXMm: handbookFigure(areas.surfaces, wing, stability?.neutralPointX ?? null),
    reynoldsMac: reynoldsFigure(airframe, wing),
    liftSlopePerRad: lift.ok ? known(lift.value.symmetric.alpha.lift) : missing(firstProblem(lift)),
  };
}

const needsLattice: Problem = { code: 'needs-lattice', path: 'surfaces', message: texts.problems.needsLattice };

/** Leading edge of the wing beside the body, or at its root where no body covers it. */
function edgeAtBodySide({ airframe, resolved, areas }: Parts): { x: number; y: number } | null {
  const wing = areas.surfaces.find(({ surface }) => surface.role === 'wing' && surface.mirrored);
  const root = wing?.sections[0];
  if (!wing || !root) return null;
  const spans = wing.sections.map(({ le }) => le[1]);
  const half = bodyHalfWidthMm(airframe, resolved, root.le[0], root.le[0] + root.chord);
  const y = Math.min(Math.max(half, root.le[1]), spans.at(-1) ?? 0);
  return { x: cutAt(wing.sections, spans, y).le[0], y };
}

const NO_MARKS: FigureMarks = {
  mac: null,
  aerodynamicCentreXMm: null,
  neutralPointXMm: null,
  neutralPointBandXMm: null,
  cgRangeXMm: null,
  firstFlightCgXMm: null,
  cg: null,
};

const cgOf = (balance: Result<Balance>) => (balance.ok ? balance.value.cg : null);

function marksOf({ wing, masses }: Parts, stability: Stability | null): FigureMarks {
  return {
    mac: { lengthMm: wing.macMm, leXMm: wing.macLeXMm, yMm: wing.macYMm, zMm: wing.macZMm },
    aerodynamicCentreXMm: wing.quarterXMm,
    neutralPointXMm: stability?.neutralPointX ?? null,
    neutralPointBandXMm: stability?.bandX ?? null,
    cgRangeXMm: stability && stability.firstFlightX !== null ? [stability.foreLimitX, stability.aftLimitX] : null,
    firstFlightCgXMm: stability?.firstFlightX ?? null,
    cg: cgOf(masses.balance),
  };
}

const ALL_IDS = Object.values(FIGURES).map(({ id }) => id);
const wantedIds = (depth: AnalyseOptions['depth']): readonly FigureId[] => (depth === 'live' ? DECIDING : ALL_IDS);

function figuresOf(
  depth: AnalyseOptions['depth'],
  values: FigureSet,
  marks: FigureMarks,
  masses: Masses,
  problems: readonly Problem[],
): Figures {
  const balanceProblems = masses.balance.ok ? [] : masses.balance.problems;
  return {
    engine: ENGINE_VERSION,
    depth,
    values,
    marks: { ...marks, cg: cgOf(masses.balance) },
    masses: masses.lines,
    problems: unique([...masses.problems, ...balanceProblems, ...problems]),
  };
}

function unresolved(depth: AnalyseOptions['depth'], problems: readonly Problem[]): Figures {
  const values = allMissing(wantedIds(depth), firstProblem({ problems }));
  return { engine: ENGINE_VERSION, depth, values, marks: NO_MARKS, masses: [], problems };
}

/** The same thing found wrong in two places of the chain is told once. */
function unique(problems: readonly Problem[]): Problem[] {
  const seen = new Map(problems.map((p) => [`${p.code}|${p.path}|${p.message}`, p]));
  return [...seen.values()];
}
