import { gyrationMm } from '@/lib/balance/balance';
import { extentX } from '@/lib/balance/ballast';
import type { BalanceError } from '@/lib/balance/errors';
import type { MassGroup } from '@/lib/balance/line';
import { texts } from '@/lib/text/en/figures/balance';
import { fill } from '@/lib/text/fill';
import { fixedDigits } from '@/lib/units/number';
import { LATERAL_PCT } from './balanceBands';
import { type BalanceContext, packFigures } from './balancePack';
import { bandBySquares } from './bySquares';
import type { FigureGroupResult } from './context';
import { massErrorOf } from './massError';
import { marginFigures } from './stability';
import { massLoadings } from './stall';
import type { FigureValue, Verdict } from './types';
import { type FigureSet, known } from './value';

// Mass, CG, inertia and what brings the CG where it belongs.

const GROUPS = ['foam', 'covering', 'glue', 'tube', 'item', 'drive', 'gear'] as const satisfies readonly MassGroup[];

/** A band that the masses cause. */
const massBand = (value: number, error: number) => ({
  band: { low: value - error, high: value + error, cause: texts.causes.mass },
});

/**
 * Figures of balance: mass, CG and inertia with the band that the masses leave, radii of gyration, where the packs must sit, least
 * ballast, another pack, and the balance from side to side.
 */
export function balanceFigures(context: BalanceContext): FigureGroupResult {
  const error = massErrorOf(context);
  return {
    figures: {
      ...weightOf(context, error),
      ...lateralFigures(context, error),
      ...inertiaFigures(context, error),
      ...gyrationFigures(context, error),
      ...packFigures(context, error),
    },
  };
}

/** Mass, loadings, CG and static margin alone, with the same bands: cheap, for every move of a handle. */
export const weightFigures = (context: BalanceContext): FigureSet => weightOf(context, massErrorOf(context));

const weightOf = (context: BalanceContext, error: BalanceError): FigureSet => ({
  allUpMassG: massFigure(context, error),
  ...massLoadings(context.wing, context.balance.massG, error.massG),
  ...cgFigures(context, error),
});

function massFigure({ airframe, lines, balance }: BalanceContext, error: BalanceError): FigureValue {
  const inputs = GROUPS.flatMap((group) => {
    const massG = lines.filter((line) => line.group === group).reduce((sum, line) => sum + line.massG, 0);
    return massG > 0 ? [{ name: texts.inputs[group], value: massG, unit: 'g' }] : [];
  });
  const limit = airframe.flight.massLimitG;
  return known(balance.massG, {
    ...massBand(balance.massG, error.massG),
    ...(limit === undefined ? {} : { verdict: limitVerdict(balance.massG, error.massG, limit) }),
    inputs: limit === undefined ? inputs : [...inputs, { name: texts.inputs.massLimit, value: limit, unit: 'g' }],
  });
}

/** Against a limit that the owner typed; no claim about any law. */
function limitVerdict(massG: number, errorG: number, limitG: number): { level: Verdict; words: string } {
  const limit = fixedDigits(limitG, 0);
  const { verdicts } = texts;
  if (massG > limitG) {
    const over = fixedDigits(massG - limitG, 0);
    return { level: 'bad', words: fill(verdicts.massOverLimit, { over, limit }) };
  }
  if (massG + errorG > limitG) return { level: 'watch', words: fill(verdicts.massNearLimit, { limit }) };
  return { level: 'good', words: fill(verdicts.massInLimit, { limit }) };
}

function cgFigures({ airframe, wing, balance, stability }: BalanceContext, { cgMm }: BalanceError): FigureSet {
  const [x, , z] = balance.cg;
  const { cgXMm, ...margin } = marginFigures(airframe, wing, stability, x, cgMm[0]);
  return {
    ...margin,
    cgXMm: { ...(cgXMm ?? known(x)), ...massBand(x, cgMm[0]) },
    cgZMm: known(z, massBand(z, cgMm[2])),
  };
}

/** How the aircraft hangs from side to side, and the mass in the lighter tip that would level it. */
function lateralFigures({ wing, balance }: BalanceContext, { cgMm }: BalanceError): FigureSet {
  const y = balance.cg[1];
  const half = wing.spanMm / 2;
  const tipG = (balance.massG * Math.abs(y)) / half;
  const verdict = lateralVerdict((y / half) * 100, y > 0 ? texts.places.portTip : texts.places.stbdTip, tipG);
  const inputs = [{ name: texts.inputs.span, value: wing.spanMm, unit: 'mm' }];
  return {
    cgYMm: known(y, { ...massBand(y, cgMm[1]), verdict, inputs }),
    tipBalanceG: known(tipG, { verdict, inputs }),
  };
}

function lateralVerdict(pct: number, tip: string, tipG: number): { level: Verdict; words: string } {
  const mass = fixedDigits(tipG, 1);
  const { good, watch } = LATERAL_PCT;
  if (pct >= good[0] && pct <= good[1]) return { level: 'good', words: texts.verdicts.level };
  if (pct >= watch[0] && pct <= watch[1]) return { level: 'watch', words: fill(texts.verdicts.heavy, { mass, tip }) };
  return { level: 'bad', words: fill(texts.verdicts.veryHeavy, { mass, tip }) };
}

function inertiaFigures({ balance }: BalanceContext, error: BalanceError): FigureSet {
  const { xx, yy, zz, xz } = balance.inertiaKgM2;
  const out = error.inertiaKgM2;
  return {
    rollInertiaKgM2: known(xx, massBand(xx, out.xx)),
    pitchInertiaKgM2: known(yy, massBand(yy, out.yy)),
    yawInertiaKgM2: known(zz, massBand(zz, out.zz)),
    productXzKgM2: known(xz, massBand(xz, out.xz)),
  };
}

/** Radius of gyration in mm of a moment of inertia; null for one that no mass has. */
const radiusMm = (inertiaKgM2: number, massG: number): number | null =>
  inertiaKgM2 < 0 || !(massG > 0) ? null : Math.sqrt((inertiaKgM2 * 1e9) / massG);

function gyrationFigures({ airframe, resolved, wing, balance }: BalanceContext, error: BalanceError): FigureSet {
  const { roll, pitch, yaw } = gyrationMm(balance);
  const [fore, aft] = extentX(airframe, resolved);
  const share = (radius: number, axis: 'xx' | 'yy' | 'zz', name: string, size: number): FigureValue => {
    const pct = (inertia: number, massG: number) => {
      const mm = radiusMm(inertia, massG);
      return mm === null ? null : (mm / size) * 100;
    };
    const { massG } = balance;
    const inertia = balance.inertiaKgM2[axis];
    const byInertia = [-1, 1].map((way) => pct(inertia + way * error.inertiaKgM2[axis], massG));
    const byMass = [-1, 1].map((way) => pct(inertia, massG + way * error.massG));
    const value = (radius / size) * 100;
    return known(value, {
      ...bandBySquares(value, [byInertia, byMass], texts.causes.mass),
      inputs: [
        { name: texts.inputs.radius, value: radius, unit: 'mm' },
        { name, value: size, unit: 'mm' },
      ],
    });
  };
  return {
    gyrationPitchMacPct: share(pitch, 'yy', texts.inputs.mac, wing.macMm),
    gyrationPitchLengthPct: share(pitch, 'yy', texts.inputs.length, aft - fore),
    gyrationRollSpanPct: share(roll, 'xx', texts.inputs.span, wing.spanMm),
    gyrationYawSpanPct: share(yaw, 'zz', texts.inputs.span, wing.spanMm),
  };
}
