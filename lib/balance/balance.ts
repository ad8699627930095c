import type { Vec3 } from '@/lib/numerics/vec';
import { gathered, type Spread } from './spread';

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
  const { massG, at: cg, spread } = gathered(lines);
  if (!(massG > 0)) throw new RangeError(`a balance needs mass, got ${massG} g`);
  return { massG, cg, inertiaKgM2: inertiaOf(spread) };
}

/** Moments and product integrals of a spread about its own centre, kg m2. */
export function inertiaOf(spread: Spread): Balance['inertiaKgM2'] {
  const si = (value: number) => value / GMM2_PER_KGM2;
  return {
    xx: si(spread.yy + spread.zz),
    yy: si(spread.xx + spread.zz),
    zz: si(spread.xx + spread.yy),
    xy: si(spread.xy),
    xz: si(spread.xz),
    yz: si(spread.yz),
  };
}

/** Radii of gyration in roll, pitch and yaw, mm: where the whole mass would have to lie to be as hard to turn. */
export function gyrationMm({ massG, inertiaKgM2 }: Balance): { roll: number; pitch: number; yaw: number } {
  const radius = (momentKgM2: number) => Math.sqrt((momentKgM2 * GMM2_PER_KGM2) / massG);
  return { roll: radius(inertiaKgM2.xx), pitch: radius(inertiaKgM2.yy), yaw: radius(inertiaKgM2.zz) };
}
