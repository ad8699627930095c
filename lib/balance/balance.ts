import { add3, scale3, sub3, type Vec3 } from '@/lib/numerics/vec';
import { addSpread, offsetSpread, POINT, type Spread } from './spread';

/** What a balance needs of each mass; a line without a spread is a point. */
export interface Weighed {
  readonly key: string;
  readonly massG: number;
  readonly at: Vec3;
  readonly spread?: Spread;
}

export interface Balance {
  readonly massG: number;
  readonly cg: Vec3;
  /** About the CG, kg m2: moments xx (roll), yy (pitch), zz (yaw), and the product integrals xy, xz, yz over the mass. */
  readonly inertiaKgM2: {
    readonly xx: number;
    readonly yy: number;
    readonly zz: number;
    readonly xy: number;
    readonly xz: number;
    readonly yz: number;
  };
}

/** g mm2 in a kg m2. */
const GMM2_PER_KGM2 = 1e9;

/**
 * All-up mass, centre of gravity and inertia about it, by parallel axes: each line's offset from the CG and its own extent.
 * Throws RangeError when nothing weighs anything, for then there is no centre.
 */
export function balance(lines: readonly Weighed[]): Balance {
  const massG = lines.reduce((sum, line) => sum + line.massG, 0);
  if (!(massG > 0)) throw new RangeError(`a balance needs mass, got ${massG} g`);
  const moment = lines.reduce<Vec3>((sum, line) => add3(sum, scale3(line.at, line.massG)), [0, 0, 0]);
  const cg = scale3(moment, 1 / massG);
  const spread = lines.reduce<Spread>(
    (sum, line) => addSpread(sum, addSpread(line.spread ?? POINT, offsetSpread(line.massG, sub3(line.at, cg)))),
    POINT,
  );
  const si = (value: number) => value / GMM2_PER_KGM2;
  return {
    massG,
    cg,
    inertiaKgM2: {
      xx: si(spread.yy + spread.zz),
      yy: si(spread.xx + spread.zz),
      zz: si(spread.xx + spread.yy),
      xy: si(spread.xy),
      xz: si(spread.xz),
      yz: si(spread.yz),
    },
  };
}
