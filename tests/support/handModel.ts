import { wingLiftSlope } from '@/lib/aero/liftSlope';
import type { AeroModel } from '@/lib/aero/model';
import { radFromDeg } from '@/lib/numerics/vec';

const NONE = { roll: 0, yaw: 0, side: 0 } as const;

/**
 * A model by hand: a flat wing by its lift slope with an elliptic far field, at no lift without incidence. Nothing of it comes from the lattice.
 * @param incidenceDeg of the wing, so that lift without angle of attack is not nothing
 */
export function handModel(areaMm2: number, spanMm: number, macMm: number, incidenceDeg = 0, efficiency = 1): AeroModel {
  const aspectRatio = spanMm ** 2 / areaMm2;
  const slope = wingLiftSlope(aspectRatio, 0);
  const lift = (alphaRad: number) => slope * (alphaRad + radFromDeg(incidenceDeg));
  return {
    reference: { area: areaMm2, chord: macMm, span: spanMm, point: [0, 0, 0] },
    base: { lift: lift(0), pitch: 0 },
    alpha: { lift: slope, pitch: -0.1 * slope },
    pitchRate: { lift: 5, pitch: -10 },
    controls: new Map(),
    neutralPointX: 0.1 * macMm,
    contributions: [],
    lateral: () => ({ beta: NONE, rollRate: NONE, yawRate: NONE, controls: new Map() }),
    inducedDrag: ({ alphaRad }) => lift(alphaRad) ** 2 / (Math.PI * aspectRatio * efficiency),
    spanEfficiency: efficiency,
  };
}
