import { type Air, airAt, reynoldsNumber } from '@/lib/aero/atmosphere';
import type { Airframe } from '@/lib/airframe/schema/airframe';
import { texts } from '@/lib/text/en/figures';
import { fill } from '@/lib/text/fill';
import { STANDARD_GRAVITY } from '@/lib/units/factors';
import { fixedDigits } from '@/lib/units/number';
import { FLAT_PLATE_CL_MAX, HAND_THROW_MS, LAUNCH_OVER_STALL } from './bands';
import type { WingReference } from './reference';
import type { FigureValue } from './types';
import { type FigureSet, known } from './value';

/** The greatest lift coefficient used, with its band when it is the flat plate's. */
export interface ClMax {
  readonly value: number;
  readonly band: { readonly low: number; readonly high: number } | null;
}

export const clMaxOf = ({ flight }: Airframe): ClMax =>
  flight.clMax === undefined
    ? { value: FLAT_PLATE_CL_MAX.value, band: FLAT_PLATE_CL_MAX }
    : { value: flight.clMax, band: null };

export const airOf = ({ flight }: Airframe): Air => airAt(flight.altitudeM, flight.temperatureOffsetC);

const MM2_PER_M2 = 1e6;

/** Level speed at which a lift coefficient carries the mass, m/s: V = sqrt(2 m g / (rho S CL)). */
export function speedAtLift(massG: number, areaMm2: number, cl: number, densityKgM3: number): number {
  return Math.sqrt((2 * (massG / 1000) * STANDARD_GRAVITY) / (densityKgM3 * (areaMm2 / MM2_PER_M2) * cl));
}

/** Mass, loadings and stall. */
export function loadingFigures(airframe: Airframe, wing: WingReference, massG: number): FigureSet {
  const areaDm2 = wing.areaMm2 / 10_000;
  return {
    wingLoadingGdm2: known(massG / areaDm2),
    cubicLoadingKgM3: known(massG / 1000 / (areaDm2 / 100) ** 1.5),
    stallSpeedMs: stallSpeed(airframe, wing, massG),
  };
}

function stallSpeed(airframe: Airframe, wing: WingReference, massG: number): FigureValue {
  const clMax = clMaxOf(airframe);
  const air = airOf(airframe);
  const at = (cl: number) => speedAtLift(massG, wing.areaMm2, cl, air.densityKgM3);
  const speed = at(clMax.value);
  return known(speed, {
    ...(clMax.band
      ? { band: { low: at(clMax.band.high), high: at(clMax.band.low), cause: texts.causes.flatPlateClMax } }
      : {}),
    ...(airframe.flight.launch === 'hand' ? { verdict: handLaunch(speed) } : {}),
    inputs: [
      { name: texts.inputs.clMax, value: clMax.value, unit: '' },
      { name: texts.inputs.density, value: air.densityKgM3, unit: 'kg/m³' },
      { name: texts.inputs.mass, value: massG, unit: 'g' },
    ],
  });
}

function handLaunch(stallMs: number) {
  const need = stallMs * LAUNCH_OVER_STALL.value;
  if (need <= HAND_THROW_MS.value) return { level: 'good' as const, words: texts.verdicts.stallHand };
  const words = fill(texts.verdicts.stallHandFast, { throw: HAND_THROW_MS.value, need: fixedDigits(need, 1) });
  return { level: 'watch' as const, words };
}

/** Reynolds number at the mean aerodynamic chord, cruising. */
export function reynoldsFigure(airframe: Airframe, wing: WingReference): FigureValue {
  return known(reynoldsNumber(airframe.flight.cruiseMs, wing.macMm / 1000, airOf(airframe)), {
    inputs: [{ name: texts.inputs.speed, value: airframe.flight.cruiseMs, unit: 'm/s' }],
  });
}
