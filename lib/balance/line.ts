import type { Vec3 } from '@/lib/numerics/vec';
import type { Spread } from './spread';

/** One mass of the aircraft: what it is, how heavy, where its centre stands, and how it is spread about that. */
export interface MassLine {
  /** Part key, stock key or element id. */
  readonly key: string;
  readonly name: string;
  readonly group: 'foam' | 'covering' | 'glue' | 'tube' | 'item' | 'drive' | 'gear';
  readonly massG: number;
  readonly at: Vec3;
  /** About its own centre, g mm2. */
  readonly spread: Spread;
}
