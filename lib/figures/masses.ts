import type { ResolvedAirframe } from '@/lib/airframe/resolved';
import type { Airframe } from '@/lib/airframe/schema/airframe';
import { type Balance, balance } from '@/lib/balance/balance';
import type { MassLine as WeighedLine } from '@/lib/balance/line';
import { massList } from '@/lib/balance/masses';
import { type Problem, type Result, refuse } from '@/lib/numerics/result';
import { developResolved } from '@/lib/parts/develop';
import { texts } from '@/lib/text/en/figures';
import type { AnalyseMemory } from './memory';
import type { MassLine } from './types';

export interface Masses {
  /** As it is shown and kept. */
  readonly lines: readonly MassLine[];
  /** The same list with what only a calculation needs: extent, and what errs together. */
  readonly weighed: readonly WeighedLine[];
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
export function massesOf(airframe: Airframe, resolved: ResolvedAirframe, memory?: AnalyseMemory): Masses {
  const development = developResolved(airframe, resolved, memory?.development);
  const list = massList(airframe, resolved, development, memory?.partMasses);
  const total = list.reduce((sum, { massG }) => sum + massG, 0);
  return {
    lines: list.map(({ key, name, group, massG, at }) => ({ key, name, group, massG, at })),
    weighed: list,
    balance: total > 0 ? { ok: true, value: balance(list) } : refuse(noMass),
    problems: development.problems,
  };
}
