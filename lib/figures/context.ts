import type { Air } from '@/lib/aero/atmosphere';
import type { AeroModel } from '@/lib/aero/model';
import type { ResolvedAirframe } from '@/lib/airframe/resolved';
import type { Airframe } from '@/lib/airframe/schema/airframe';
import type { Balance } from '@/lib/balance/balance';
import type { MassLine } from '@/lib/balance/line';
import type { Problem } from '@/lib/numerics/result';
import type { Chart } from './charts';
import type { Areas, WingReference } from './reference';
import type { Stability } from './stability';
import type { FigureSet } from './value';

/** Everything a group of figures may start from, once it could all be worked out. */
export interface FigureContext {
  readonly airframe: Airframe;
  readonly resolved: ResolvedAirframe;
  readonly areas: Areas;
  readonly wing: WingReference;
  readonly lines: readonly MassLine[];
  readonly balance: Balance;
  /** About the CG. */
  readonly model: AeroModel;
  readonly stability: Stability;
  readonly air: Air;
}

/** What a group of figures gives. */
export interface FigureGroupResult {
  readonly figures: FigureSet;
  readonly charts?: readonly Chart[];
  readonly problems?: readonly Problem[];
}
