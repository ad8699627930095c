import type { Vec3 } from '@/lib/numerics/vec';
import type { Spread } from './spread';

/** What a mass was worked out from; masses of one group are as sure as each other. */
export type MassGroup = 'foam' | 'covering' | 'glue' | 'tube' | 'item' | 'drive' | 'gear';

/** One mass of the aircraft: what it is, how heavy, where its centre stands, and how it is spread about that. */
export interface MassLine {
  /** Part key, stock key or element id. */
  readonly key: string;
  readonly name: string;
  readonly group: MassGroup;
  readonly massG: number;
  readonly at: Vec3;
  /** About its own centre, g mm2. */
  readonly spread: Spread;
  /** What it was weighed by: lines with the same one (one sheet, one kind of tube, the glue gun) are too heavy or too light together. */
  readonly basis: string;
}
