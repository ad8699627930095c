import type { Vec3 } from '@/lib/numerics/vec';
import { type Balance, inertiaOf } from './balance';
import type { MassGroup, MassLine } from './line';
import { POINT, type Spread } from './spread';

/** How far a balance may be out either way because the masses are. */
export interface BalanceError {
  readonly massG: number;
  readonly cgMm: Vec3;
  /** Of the moments xx, yy, zz and the product xz. */
  readonly inertiaKgM2: Pick<Balance['inertiaKgM2'], 'xx' | 'yy' | 'zz' | 'xz'>;
}

/** What one basis, too heavy by its share, adds: mass, moment about the CG in g mm, spread about the CG. Summed in place. */
interface Excess {
  massG: number;
  readonly moment: [number, number, number];
  readonly spread: Record<keyof Spread, number>;
}

const noExcess = (): Excess => ({ massG: 0, moment: [0, 0, 0], spread: { ...POINT } });

function addLine(sum: Excess, { massG, at, spread }: MassLine, cg: Vec3, share: number): void {
  const x = at[0] - cg[0];
  const y = at[1] - cg[1];
  const z = at[2] - cg[2];
  const own = massG * share;
  sum.massG += own;
  sum.moment[0] += own * x;
  sum.moment[1] += own * y;
  sum.moment[2] += own * z;
  sum.spread.xx += share * spread.xx + own * x * x;
  sum.spread.yy += share * spread.yy + own * y * y;
  sum.spread.zz += share * spread.zz + own * z * z;
  sum.spread.xy += share * spread.xy + own * x * y;
  sum.spread.xz += share * spread.xz + own * x * z;
  sum.spread.yz += share * spread.yz + own * y * z;
}

/** Root of the sum of squares: errors that have nothing to do with each other. */
const rss = (values: readonly number[]): number => Math.hypot(...values);

/**
 * Errors of mass, CG and inertia when every mass is uncertain by the stated share of its group, to first order: lines of one basis err
 * together and add up, different bases are independent and add by their squares (propagation of uncertainty, JCGM 100:2008, 5.1 and 5.2).
 * A mass that is out by dm moves the CG by dm (r - r_cg) / m and adds its own moment of inertia about the CG; that the CG moves
 * changes the inertia only to second order.
 */
export function balanceError(
  lines: readonly MassLine[],
  { massG, cg }: Pick<Balance, 'massG' | 'cg'>,
  sharePct: Readonly<Record<MassGroup, number>>,
): BalanceError {
  const byBasis = new Map<string, Excess>();
  for (const line of lines) {
    const sum = byBasis.get(line.basis) ?? noExcess();
    addLine(sum, line, cg, sharePct[line.group] / 100);
    byBasis.set(line.basis, sum);
  }
  const all = [...byBasis.values()];
  const inertia = all.map(({ spread }) => inertiaOf(spread));
  const cgError = (axis: 0 | 1 | 2) => rss(all.map(({ moment }) => moment[axis])) / massG;
  return {
    massG: rss(all.map((one) => one.massG)),
    cgMm: [cgError(0), cgError(1), cgError(2)],
    inertiaKgM2: {
      xx: rss(inertia.map(({ xx }) => xx)),
      yy: rss(inertia.map(({ yy }) => yy)),
      zz: rss(inertia.map(({ zz }) => zz)),
      xz: rss(inertia.map(({ xz }) => xz)),
    },
  };
}
