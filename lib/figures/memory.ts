import { type AeroMemory, newAeroMemory } from '@/lib/aero/wholeAircraft';
import type { PartMasses } from '@/lib/balance/partMasses';
import { type Kept, nothingKept } from '@/lib/numerics/kept';
import { type DevelopmentMemory, newDevelopmentMemory } from '@/lib/parts/develop';

/**
 * What one analysis leaves for the next, each part with all that it was worked out from, so that figures come out the same with it and
 * without. It belongs to the caller, who passes the same one while one aircraft is worked on.
 */
export interface AnalyseMemory {
  readonly aero: AeroMemory;
  readonly development: DevelopmentMemory;
  readonly partMasses: Kept<PartMasses>;
}

/** A memory with nothing in it. */
export const newMemory = (): AnalyseMemory => ({
  aero: newAeroMemory(),
  development: newDevelopmentMemory(),
  partMasses: nothingKept(),
});
