import { ALL_COUNTED, type Corrections } from '@/lib/aero/corrections';
import type { AeroModel } from '@/lib/aero/model';
import { resolve } from '@/lib/airframe/resolve';
import type { ResolvedAirframe } from '@/lib/airframe/resolved';
import type { Airframe } from '@/lib/airframe/schema/airframe';
import type { Stall } from '@/lib/flight/performance/speeds';
import type { Problem, Result } from '@/lib/numerics/result';
import { weightFigures } from './balance';
import type { FigureContext } from './context';
import { ENGINE_VERSION } from './engine';
import { fullGroups } from './groups';
import { feelFigures } from './handling';
import { liftOf } from './lift';
import { marksOf, NO_MARKS } from './marks';
import { type Masses, massesOf } from './masses';
import type { AnalyseMemory } from './memory';
import { type Areas, areasOf, type WingReference, wingFigures } from './reference';
import { setUpSheet } from './setUp';
import { shapeFigures } from './shape';
import { type Stability, stabilityOf } from './stability';
import { airOf, clMaxOf, loadingFigures, stallAt } from './stall';
import { DECIDING, FIGURES, type FigureId } from './table';
import { cgTouchFigures, touchFigures } from './touch';
import type { Figures } from './types';
import { allMissing, type FigureSet, firstProblem, known } from './value';
import { wakePlaneProblems } from './wakePlane';

export interface AnalyseOptions {
  /** `live`: the deciding figures, for every move of a handle. `full`: all of them. */
  readonly depth: 'live' | 'full';
  /** What is counted beside the lifting surfaces; everything when it is not said. */
  readonly corrections?: Corrections;
  /** What earlier calls for the same aircraft worked out and this one need not: the figures are the same without it. */
  readonly memory?: AnalyseMemory;
}

/**
 * Works out the figures of an airframe: areas, balance, stability, handling, performance and set-up, each with its band, verdict and
 * inputs. What could not be worked out is null with its problem; the rest still shows. No figure is ever NaN or infinite.
 */
export function analyse(airframe: Airframe, options: AnalyseOptions): Figures {
  const { depth } = options;
  const resolved = resolve(airframe);
  if (!resolved.ok) return unresolved(depth, resolved.problems);
  const areas = areasOf(airframe, resolved.value);
  const masses = massesOf(airframe, resolved.value, options.memory);
  const { wing } = areas;
  if (!wing.ok)
    return figuresOf(options, masses, {
      values: massFigures(masses),
      lost: firstProblem(wing),
      problems: wing.problems,
    });
  const stall = masses.balance.ok ? stallAt(airframe, wing.value, masses.balance.value.massG) : null;
  const start: Start = { airframe, resolved: resolved.value, areas, masses, wing: wing.value, stall };
  const model = modelAbout(start, options);
  const plain = { ...massFigures(masses), ...wingFigures(wing.value), ...loadings(start) };
  const shape = depth === 'full' ? shapeFigures(start, model) : {};
  if (!model.ok)
    return figuresOf(options, masses, {
      values: { ...plain, ...shape },
      lost: firstProblem(model),
      problems: model.problems,
      marks: marksOf(wing.value, null),
    });
  const stability = stabilityAt(start, model.value);
  const values = { ...plain, ...shape, ...stability.figures, ...touchFigures({ ...start, stability }) };
  const marks = marksOf(wing.value, stability);
  if (!masses.balance.ok)
    return figuresOf(options, masses, {
      values,
      lost: firstProblem(masses.balance),
      problems: stability.problems,
      marks,
    });
  const context: FigureContext = {
    ...start,
    lines: masses.weighed,
    balance: masses.balance.value,
    model: model.value,
    stability,
    air: airOf(airframe),
  };
  const weights = weightFigures(context);
  const cg = weights.cgXMm ? cgTouchFigures(context, wing.value, weights.cgXMm) : {};
  if (depth === 'live')
    return figuresOf(options, masses, {
      values: { ...values, ...weights, ...cg, ...feelFigures(context) },
      problems: stability.problems,
      marks,
    });
  const groups = fullGroups(context);
  return figuresOf(options, masses, {
    values: { ...values, ...cg, ...groups.figures },
    problems: [...stability.problems, ...wakePlaneProblems(areas.surfaces), ...(groups.problems ?? [])],
    marks,
    charts: groups.charts,
    setUp: setUpSheet(airframe),
  });
}

/** What there is before any aerodynamics. */
export interface Start {
  readonly airframe: Airframe;
  readonly resolved: ResolvedAirframe;
  readonly areas: Areas;
  readonly masses: Masses;
  readonly wing: WingReference;
  /** `null` without a mass. */
  readonly stall: Stall | null;
}

/** The aircraft about its CG, or about the wing's quarter point when there is no CG; the neutral point is the same. */
function modelAbout(
  { airframe, resolved, masses, wing }: Start,
  { corrections = ALL_COUNTED, memory }: AnalyseOptions,
): Result<AeroModel> {
  const [x, , z] = masses.balance.ok ? masses.balance.value.cg : [wing.quarterXMm, 0, 0];
  return liftOf(airframe, resolved, wing, [x, 0, z], corrections, memory?.aero);
}

const stabilityAt = ({ airframe, wing, stall }: Start, model: AeroModel): Stability =>
  stabilityOf(airframe, wing, model, stall?.clMax ?? clMaxOf(airframe, wing, null));

const massFigures = ({ balance }: Masses): FigureSet =>
  balance.ok ? { allUpMassG: known(balance.value.massG), cgXMm: known(balance.value.cg[0]) } : {};

const loadings = ({ airframe, masses: { balance }, wing, stall }: Start): FigureSet =>
  balance.ok && stall ? loadingFigures(airframe, wing, balance.value.massG, stall) : {};

const ALL_IDS = Object.values(FIGURES).map(({ id }) => id);
const wantedIds = (depth: AnalyseOptions['depth']): readonly FigureId[] => (depth === 'live' ? DECIDING : ALL_IDS);

type Found = Partial<Pick<Figures, 'marks' | 'charts'>> & {
  readonly values: FigureSet;
  /** Why every figure that is not there is missing. */
  readonly lost?: Problem;
  readonly problems: readonly Problem[];
  readonly setUp?: ReturnType<typeof setUpSheet>;
};

function figuresOf(
  { depth, corrections = ALL_COUNTED }: AnalyseOptions,
  { balance, lines, problems }: Masses,
  { values, lost, problems: found, marks = NO_MARKS, charts, setUp }: Found,
): Figures {
  const absent = wantedIds(depth).filter((id) => values[id] === undefined);
  if (absent.length > 0 && !lost) throw new RangeError(`no figure and no reason: ${absent.join(', ')}`);
  const shown = Object.fromEntries(wantedIds(depth).flatMap((id) => (values[id] ? [[id, values[id]]] : [])));
  return {
    engine: ENGINE_VERSION,
    depth,
    counted: corrections,
    values: { ...shown, ...(lost ? allMissing(absent, lost) : {}) },
    marks: { ...marks, cg: balance.ok ? balance.value.cg : null },
    masses: lines,
    problems: unique([
      ...problems,
      ...(balance.ok ? [] : balance.problems),
      ...found,
      ...(setUp && !setUp.ok ? setUp.problems : []),
    ]),
    ...(charts ? { charts } : {}),
    ...(setUp ? { setUp: setUp.ok ? setUp.value : null } : {}),
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
