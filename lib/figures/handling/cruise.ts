import type { LateralDerivatives, SymmetricState } from '@/lib/aero/model';
import type { BalanceError } from '@/lib/balance/errors';
import { froudeScale } from '@/lib/flight/criteria';
import { levelTrim } from '@/lib/flight/modes/levelTrim';
import { type PullDerivatives, withNeutralPointMoved } from '@/lib/flight/modes/manoeuvre';
import { type FlightPoint, levelLift } from '@/lib/flight/modes/point';
import { type Problem, type Result, refuse } from '@/lib/numerics/result';
import { texts } from '@/lib/text/en/figures/handling';
import type { FigureContext } from '../context';
import { cruiseProblem } from '../glide';
import { massErrorOf } from '../massError';

/** Level flight at cruise speed, in trim. */
export interface Cruise {
  readonly point: FlightPoint;
  readonly trim: SymmetricState;
  readonly lateral: LateralDerivatives;
  /** How many times smaller than a light aircraft. */
  readonly scale: number;
  /** How far mass, CG and inertia may be out. */
  readonly error: BalanceError;
}

const noLift: Problem = { code: 'needs-lattice', path: 'surfaces', message: texts.problems.noLift };

/** The trim that every figure of handling starts from; refused when nothing lifts, and under the stall, where the wing does not carry. */
export function cruiseOf(context: FigureContext): Result<Cruise> {
  const { airframe, wing, balance, model, air, stability } = context;
  const point: FlightPoint = {
    massG: balance.massG,
    inertiaKgM2: balance.inertiaKgM2,
    areaMm2: wing.areaMm2,
    chordMm: wing.macMm,
    spanMm: wing.spanMm,
    speedMs: airframe.flight.cruiseMs,
    densityKgM3: air.densityKgM3,
  };
  const lift = levelLift(point);
  const stallMs = point.speedMs * Math.sqrt(lift / stability.clMax.value);
  if (point.speedMs < stallMs) return refuse(cruiseProblem(point.speedMs, stallMs));
  const trim = levelTrim(airframe, model, lift);
  if (!trim) return refuse(noLift);
  const lateral = model.lateral(trim);
  return {
    ok: true,
    value: { point, trim, lateral, scale: froudeScale(wing.spanMm), error: massErrorOf(context) },
  };
}

/**
 * The same derivatives at the least and at the largest static margin of its band: that of the neutral point, and by squares that of the
 * CG, which is out with the masses.
 */
export const atMarginEnds = <D extends PullDerivatives>(
  { stability, wing }: FigureContext,
  { error }: Pick<Cruise, 'error'>,
  derivatives: D,
): readonly [least: D, largest: D] => {
  const moved = (end: number, way: -1 | 1) => {
    const mm = Math.hypot(end - stability.neutralPointX, error.cgMm[0]);
    return withNeutralPointMoved(derivatives, (way * mm) / wing.macMm);
  };
  return [moved(stability.bandX[0], -1), moved(stability.bandX[1], 1)];
};

/** Whether the mass has the extent that makes the equations of motion: one that no body has would be a fault there. */
export const turnsAgainstInertia = ({ inertiaKgM2: { xx, yy, zz, xz } }: FlightPoint): boolean =>
  xx > 0 && yy > 0 && zz > 0 && xz ** 2 < xx * zz;

/** The point with one moment of inertia at the ends of its error; null for an end that no mass has. */
export const inertiaEnds = (
  { point, error }: Pick<Cruise, 'point' | 'error'>,
  axis: 'xx' | 'yy' | 'zz',
): readonly (FlightPoint | null)[] =>
  [-1, 1].map((way) => {
    const { inertiaKgM2 } = point;
    const moved = inertiaKgM2[axis] + way * error.inertiaKgM2[axis];
    const end = { ...point, inertiaKgM2: { ...inertiaKgM2, [axis]: moved } };
    return turnsAgainstInertia(end) ? end : null;
  });

const { inputs } = texts;
export const speedInput = ({ point }: Cruise) => ({ name: inputs.speed, value: point.speedMs, unit: 'm/s' });
export const scaleInput = ({ scale }: Cruise) => ({ name: inputs.scale, value: scale, unit: '' });
export const throwInput = (throwDeg: number) => ({ name: inputs.throwDeg, value: throwDeg, unit: '°' });
export const limitInput = (value: number, unit: string) => ({ name: inputs.levelOne, value, unit });
