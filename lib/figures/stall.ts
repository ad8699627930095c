import { type Air, airAt, reynoldsNumber } from '@/lib/aero/atmosphere';
import { type WingClMax, wingClMax } from '@/lib/aero/clMax';
import type { Airframe } from '@/lib/airframe/schema/airframe';
import { type Stall, stallOf } from '@/lib/flight/performance/speeds';
import { texts as balanceTexts } from '@/lib/text/en/figures/balance';
import { texts } from '@/lib/text/en/figures/performance';
import { fill } from '@/lib/text/fill';
import { fixedDigits } from '@/lib/units/number';
import { bandOf } from './bandOf';
import { HAND_THROW_MS, LAUNCH_OVER_STALL } from './bands';
import type { WingReference } from './reference';
import type { FigureValue } from './types';
import { type FigureSet, known } from './value';

// Loadings and the stall: cheap, for every move of a handle.

export const airOf = ({ flight }: Airframe): Air => airAt(flight.altitudeM, flight.temperatureOffsetC);

/** Stall of the whole aircraft, power off. Throws RangeError for a document without a wing. */
export const stallAt = (airframe: Airframe, { areaMm2 }: WingReference, massG: number): Stall =>
  stallOf(airframe, areaMm2, massG, airOf(airframe));

/**
 * Greatest lift coefficient of the aircraft, typed in or by its wing's sections at the stall; without a mass, at cruise speed. Throws
 * RangeError for a document without a wing.
 */
export function clMaxOf(airframe: Airframe, wing: WingReference, massG: number | null): WingClMax {
  if (massG === null) return wingClMax(airframe, airframe.flight.cruiseMs, airOf(airframe));
  return stallAt(airframe, wing, massG).clMax;
}

/** Why a figure that rests on the greatest lift has a band. */
export const clMaxCause = ({ source }: WingClMax): string => fill(texts.causes.sectionClMax, { source });

/** Loadings and stall. */
export function loadingFigures(
  airframe: Airframe,
  wing: WingReference,
  massG: number,
  stall = stallAt(airframe, wing, massG),
): FigureSet {
  return { ...massLoadings(wing, massG), stallSpeedMs: stallSpeed(airframe, massG, stall) };
}

/** Mass by the wing's area, with what the masses may be out by as their band where that is known. */
export function massLoadings(wing: WingReference, massG: number, errorG = 0): FigureSet {
  const areaDm2 = wing.areaMm2 / 10_000;
  const loading = (of: (massG: number) => number): FigureValue =>
    known(
      of(massG),
      errorG > 0 ? { band: bandOf(balanceTexts.causes.mass, of(massG - errorG), of(massG + errorG)) } : {},
    );
  return {
    wingLoadingGdm2: loading((g) => g / areaDm2),
    cubicLoadingKgM3: loading((g) => g / 1000 / (areaDm2 / 100) ** 1.5),
  };
}

function stallSpeed(airframe: Airframe, massG: number, { speedMs, clMax }: Stall): FigureValue {
  const band = {
    low: speedMs * Math.sqrt(clMax.value / clMax.high),
    high: speedMs * Math.sqrt(clMax.value / clMax.low),
    cause: clMaxCause(clMax),
  };
  return known(speedMs, {
    ...(clMax.typed ? {} : { band }),
    ...(airframe.flight.launch === 'hand' ? { verdict: handLaunch(speedMs) } : {}),
    inputs: [
      { name: clMax.typed ? texts.inputs.clMaxTyped : texts.inputs.clMax, value: clMax.value, unit: '' },
      { name: texts.inputs.density, value: airOf(airframe).densityKgM3, unit: 'kg/m³' },
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

/** Reynolds number of a chord, cruising; by default of the mean aerodynamic chord. */
export function reynoldsFigure(airframe: Airframe, wing: WingReference, chordMm = wing.macMm): FigureValue {
  return known(reynoldsNumber(airframe.flight.cruiseMs, chordMm / 1000, airOf(airframe)), {
    inputs: [
      { name: texts.inputs.speed, value: airframe.flight.cruiseMs, unit: 'm/s' },
      { name: texts.inputs.chord, value: chordMm, unit: 'mm' },
    ],
  });
}
