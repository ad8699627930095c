import { airAt } from '@/lib/aero/atmosphere';
import type { AeroModel, LateralDerivatives } from '@/lib/aero/model';
import { resolve } from '@/lib/airframe/resolve';
import type { Airframe } from '@/lib/airframe/schema/airframe';
import type { FigureContext } from '@/lib/figures/context';
import { handlingFigures } from '@/lib/figures/handling';
import { areasOf } from '@/lib/figures/reference';
import type { handlingEntries } from '@/lib/figures/table/handling';
import type { FigureValue } from '@/lib/figures/types';
import { plain } from './plainAircraft';

// A plain aircraft with a model made by hand: what follows from turning one number at a time, not the numbers themselves.

/** What differs from the plain aircraft. */
export interface Turn {
  readonly airframe?: Airframe;
  readonly model?: Partial<AeroModel>;
  readonly lateral?: Partial<LateralDerivatives>;
  readonly inertia?: Partial<FigureContext['balance']['inertiaKgM2']>;
  /** Half width of the neutral point's band, mm. */
  readonly halfMm?: number;
  /** Moves everything along x, mm. */
  readonly datumMm?: number;
}

export const LATERAL: LateralDerivatives = {
  beta: { side: -0.3, roll: -0.06, yaw: 0.09 },
  rollRate: { side: 0.05, roll: -0.42, yaw: -0.03 },
  yawRate: { side: 0.25, roll: 0.1, yaw: -0.14 },
  controls: new Map([['wing/aileron', { side: 0, roll: -0.3, yaw: 0.01 }]]),
};

function geometryOf(airframe: Airframe): Pick<FigureContext, 'airframe' | 'resolved' | 'areas' | 'wing'> {
  const resolved = resolve(airframe);
  if (!resolved.ok) throw new RangeError('does not resolve');
  const areas = areasOf(airframe, resolved.value);
  if (!areas.wing.ok) throw new RangeError('no wing');
  return { airframe, resolved: resolved.value, areas, wing: areas.wing.value };
}

const PLAIN = geometryOf(plain());

export function contextOf(turn: Turn = {}): FigureContext {
  const geometry = turn.airframe ? geometryOf(turn.airframe) : PLAIN;
  const wingOf = geometry.wing;
  const cgX = 40 + (turn.datumMm ?? 0);
  const alpha = turn.model?.alpha ?? { lift: 4.6, pitch: -0.6 };
  const neutralPointX = cgX - (alpha.pitch / alpha.lift) * wingOf.macMm;
  const half = turn.halfMm ?? 5;
  const lateral = { ...LATERAL, ...turn.lateral };
  const model: AeroModel = {
    reference: { area: wingOf.areaMm2, chord: wingOf.macMm, span: wingOf.spanMm, point: [cgX, 0, 0] },
    base: { lift: 0.02, pitch: 0.01 },
    pitchRate: { lift: 7, pitch: -9 },
    controls: new Map([
      ['wing/aileron', { lift: 0.9, pitch: -0.15 }],
      ['tail/elevator', { lift: 0.4, pitch: -1.1 }],
    ]),
    contributions: [{ name: 'surfaces', alpha, beta: lateral.beta }],
    inducedDrag: ({ alphaRad }) => (0.02 + 4.6 * alphaRad) ** 2 / (Math.PI * 5.5),
    spanEfficiency: 1,
    ...turn.model,
    alpha,
    neutralPointX,
    lateral: () => lateral,
  };
  return {
    ...geometry,
    lines: [],
    balance: {
      massG: 480,
      cg: [cgX, 0, 0],
      inertiaKgM2: { xx: 0.007, yy: 0.012, zz: 0.018, xy: 0, xz: 0.0005, yz: 0, ...turn.inertia },
    },
    model,
    stability: {
      neutralPointX,
      bandX: [neutralPointX - half, neutralPointX + half],
      foreLimitX: cgX - 5,
      aftLimitX: cgX + 5,
      firstFlightX: cgX,
      clMax: { value: 0.75, low: 0.65, high: 0.85 },
      figures: {},
      problems: [],
    },
    air: airAt(0),
  };
}

/** Figures of handling, and what is asked of them. */
export const run = (turn: Turn = {}) => handlingFigures(contextOf(turn));
export const figure = (id: keyof typeof handlingEntries, turn: Turn = {}): FigureValue => {
  const found = run(turn).figures[id];
  if (!found) throw new RangeError(`no figure ${id}`);
  return found;
};
export const value = (id: keyof typeof handlingEntries, turn: Turn = {}): number =>
  figure(id, turn).value ?? Number.NaN;
export const levelOf = (id: keyof typeof handlingEntries, turn: Turn) => figure(id, turn).verdict?.level;

export const alphaPitch = (pitch: number): Turn => ({ model: { alpha: { lift: 4.6, pitch } } });
export const yawStiffness = (yaw: number, over: Partial<LateralDerivatives> = {}): Turn => ({
  lateral: { beta: { ...LATERAL.beta, yaw }, ...over },
});
