import type { Corrections } from '@/lib/aero/corrections';
import type { Problem } from '@/lib/numerics/result';
import type { Vec3 } from '@/lib/numerics/vec';
import type { Chart } from './charts';
import type { SetUpSheet } from './setUp';

export type Verdict = 'good' | 'watch' | 'bad';

/** One computed number. What it means, its unit, method, source and limits stand in the table of figures under the same id. */
export interface FigureValue {
  /** `null` when it could not be worked out; `problem` then says why. */
  readonly value: number | null;
  /** The span the true value is expected in, same unit, with its cause. */
  readonly band?: { readonly low: number; readonly high: number; readonly cause: string };
  readonly verdict?: { readonly level: Verdict; readonly words: string };
  /** What went in, for the reader: name, value, unit. */
  readonly inputs?: readonly { readonly name: string; readonly value: number; readonly unit: string }[];
  readonly problem?: Problem;
}

/** Places to draw on the board, aircraft axes, mm. */
export interface FigureMarks {
  readonly mac: {
    readonly lengthMm: number;
    readonly leXMm: number;
    readonly yMm: number;
    readonly zMm: number;
  } | null;
  readonly aerodynamicCentreXMm: number | null;
  readonly neutralPointXMm: number | null;
  readonly neutralPointBandXMm: readonly [number, number] | null;
  readonly cgRangeXMm: readonly [fore: number, aft: number] | null;
  readonly firstFlightCgXMm: number | null;
  readonly cg: Vec3 | null;
}

export interface MassLine {
  /** Part key or element id. */
  readonly key: string;
  readonly name: string;
  readonly group: 'foam' | 'covering' | 'glue' | 'tube' | 'item' | 'drive' | 'gear';
  readonly massG: number;
  readonly at: Vec3;
}

export interface Figures {
  /** Version of the engine that computed them; a cache key together with the airframe's hash. */
  readonly engine: string;
  readonly depth: 'live' | 'full';
  /** What was counted beside the lifting surfaces; the first engine counted nothing. */
  readonly counted?: Corrections;
  readonly values: Readonly<Record<string, FigureValue>>;
  readonly marks: FigureMarks;
  readonly masses: readonly MassLine[];
  readonly problems: readonly Problem[];
  /** At the depth "full"; earlier engines had none. */
  readonly charts?: readonly Chart[];
  /** At the depth "full": throws, mixes and holes; `null` when a control cannot be set up. Earlier engines had none. */
  readonly setUp?: SetUpSheet | null;
}
