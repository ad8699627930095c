import { type ThrustCurve, topLevelSpeedMs } from '@/lib/flight/performance/level';
import { type AircraftPolar, aircraftPolar } from '@/lib/flight/performance/polar';
import type { Result } from '@/lib/numerics/result';
import type { SpreadEnd } from '@/lib/numerics/spread';
import { spentSpeedMs, type Thrust, thrustAtN, thrustOf } from '@/lib/power/thrust';
import type { FigureContext } from './context';

/** What flying level rests on: the polar, and the thrust with what is missing for it; null for a glider. */
export interface LevelFlight {
  readonly polar: AircraftPolar;
  readonly thrust: Result<Thrust | null>;
}

/** What performance starts from. */
export type FlightContext = Omit<FigureContext, 'lines' | 'stability'>;

/** Polar and thrust of an aircraft at its height. */
export function levelFlight({ airframe, resolved, model, wing, balance, air }: FlightContext): LevelFlight {
  const { areaMm2 } = wing;
  return {
    polar: aircraftPolar({ airframe, resolved, model, areaMm2, massG: balance.massG, air }),
    thrust: thrustOf(airframe, air.densityKgM3),
  };
}

/** Thrust by flying speed, at its value or an end of its span. */
export const thrustCurve = (thrust: Thrust, end: SpreadEnd = 'value'): ThrustCurve => ({
  thrustN: (speedMs) => thrustAtN(thrust, speedMs, end),
  spentMs: spentSpeedMs(thrust, end),
});

/** Highest level speed in m/s; null without a motor, a known thrust or enough of it. */
export function highestLevelSpeedMs({ polar, thrust }: LevelFlight): number | null {
  return thrust.ok && thrust.value ? topLevelSpeedMs(polar, thrustCurve(thrust.value)) : null;
}
