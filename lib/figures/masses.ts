import type { ResolvedAirframe } from '@/lib/airframe/resolved';
import type { Airframe } from '@/lib/airframe/schema/airframe';
import { type Balance, balance } from '@/lib/balance/balance';
import { massList } from '@/lib/balance/masses';
import { type Problem, type Result, refuse } from '@/lib/numerics/result';
import { developResolved } from '@/lib/parts/develop';
import { texts } from '@/lib/text/en/figures';
import type { MassLine } from './types';

export interface Masses {
  readonly lines: readonly MassLine[];
  readonly balance: Result<Balance>;
  /** What the parts could not be made of; their mass is missing from the list. */
  readonly problems: readonly Problem[];
}

const noMass: Problem = {
  code: 'no-mass',
  path: 'items',
  message: texts.problems.noMass,
  fix: texts.problems.noMassFix,
};

/** Every mass of the aircraft from its own parts, and their balance. */
export function massesOf(airframe: Airframe, resolved: ResolvedAirframe): Masses {
  const development = developResolved(airframe, resolved);
  const list = massList(airframe, resolved, development);
  const total = list.reduce((sum, { massG }) => sum + massG, 0);
  return {
    lines: list.map(({ key, name, group, massG, at }) => ({ key, name, group, massG, at })),
    balance: total > 0 ? { ok: true, value: balance(list) } : refuse(noMass),
    problems: development.problems,
  };
}
