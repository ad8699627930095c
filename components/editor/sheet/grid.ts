import { MM_PER_IN } from '@/lib/units/factors';
import type { UnitSystem } from '@/lib/units/quantity';

/** Lines closer than this, px, would be a grey wash instead of a grid. */
const LEAST_GAP_PX = 9;

const STEPS_MM = [1, 5, 10, 50, 100, 500, 1000];
const STEPS_IN = [1 / 16, 1 / 8, 1 / 4, 1 / 2, 1, 2, 6, 12, 24, 48].map((inches) => inches * MM_PER_IN);

export interface GridStep {
  /** Distance between lines, mm. */
  readonly stepMm: number;
  /** Every so many lines one is heavier. */
  readonly heavyEvery: number;
}

/** The finest grid that stays readable at this zoom (px per mm). Throws RangeError for a scale that is not positive. */
export function gridStep(scale: number, system: UnitSystem): GridStep {
  if (!(scale > 0)) throw new RangeError(`scale must be positive, got ${scale}`);
  const steps = system === 'metric' ? STEPS_MM : STEPS_IN;
  const stepMm = steps.find((step) => step * scale >= LEAST_GAP_PX) ?? steps.at(-1) ?? 1000;
  return { stepMm, heavyEvery: system === 'metric' ? (String(stepMm).startsWith('5') ? 2 : 10) : 4 };
}
