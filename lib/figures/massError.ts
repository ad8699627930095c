import { type BalanceError, balanceError } from '@/lib/balance/errors';
import type { MassGroup } from '@/lib/balance/line';
import { MASS_ERROR_PCT } from './balanceBands';
import type { FigureContext } from './context';

const SHARE_PCT: Readonly<Record<MassGroup, number>> = {
  foam: MASS_ERROR_PCT.foam.value,
  covering: MASS_ERROR_PCT.covering.value,
  glue: MASS_ERROR_PCT.glue.value,
  tube: MASS_ERROR_PCT.tube.value,
  item: MASS_ERROR_PCT.item.value,
  drive: MASS_ERROR_PCT.drive.value,
  gear: MASS_ERROR_PCT.gear.value,
};

/** How far mass, CG and inertia may be out because the masses are: every figure that rests on one of them takes it from here. */
export const massErrorOf = ({ lines, balance }: Pick<FigureContext, 'lines' | 'balance'>): BalanceError =>
  balanceError(lines, balance, SHARE_PCT);
