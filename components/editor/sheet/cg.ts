import type { ResolvedPlace } from '@/lib/airframe/resolved';
import type { MassLine } from '@/lib/figures/types';
import type { Vec3 } from '@/lib/numerics/vec';

export type Places = ReadonlyMap<string, ResolvedPlace>;

/** The element that a mass belongs to: keys begin with its id. */
const ownerOf = (key: string): string => key.split('/')[0] ?? key;

/**
 * The CG of this very frame: the masses as last worked out, each moved with its element since. What only moves (a pack, a
 * motor, a whole tail) is exact; what changes its size catches up with the next figures. Null when nothing weighs anything.
 * Sideways the CG stays as worked out: what the board moves, it moves along the aircraft.
 */
export function cgNow(masses: readonly MassLine[], then: Places, now: Places): Vec3 | null {
  let mass = 0;
  const moment: [number, number, number] = [0, 0, 0];
  for (const { key, massG, at } of masses) {
    const owner = ownerOf(key);
    const [before, after] = [then.get(owner)?.at, now.get(owner)?.at];
    const moved = before !== undefined && after !== undefined;
    mass += massG;
    moment[0] += massG * (at[0] + (moved ? after[0] - before[0] : 0));
    moment[1] += massG * at[1];
    moment[2] += massG * (at[2] + (moved ? after[2] - before[2] : 0));
  }
  return mass > 0 ? [moment[0] / mass, moment[1] / mass, moment[2] / mass] : null;
}
