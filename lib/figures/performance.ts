import { turnRadiusM } from '@/lib/flight/performance/speeds';
import { texts } from '@/lib/text/en/figures/performance';
import { fill } from '@/lib/text/fill';
import { fixedDigits } from '@/lib/units/number';
import { bandOf } from './bandOf';
import { LAUNCH_OVER_STALL } from './bands';
import type { FigureGroupResult } from './context';
import { cruiseProblem, dragFigures, glideFigures, glidesOf } from './glide';
import { type FlightContext, highestLevelSpeedMs, type LevelFlight, levelFlight } from './levelFlight';
import { TURN_LOAD_FACTOR } from './performanceBands';
import { powerChart } from './performanceChart';
import { poweredFigures, thrustFigures } from './powered';
import type { SurfaceArea } from './reference';
import { clMaxCause, reynoldsFigure } from './stall';
import type { FigureId } from './table/entry';
import type { FigureValue } from './types';
import { allMissing, doesNotApply, type FigureSet, firstProblem, known } from './value';

/** Glide, drag, climb, speed, turn, launch and Reynolds numbers, with the chart of power; loadings and stall stand apart, being cheap. */
export function performanceFigures(context: FlightContext, flight = levelFlight(context)): FigureGroupResult {
  const { airframe } = context;
  const { polar, thrust } = flight;
  const { cruiseMs } = airframe.flight;
  const glides = glidesOf(polar);
  const top = highestLevelSpeedMs(flight);
  return {
    figures: {
      ...glideFigures(polar, glides, airframe.drives.length),
      ...dragFigures(context, polar),
      ...motorFigures(flight, top),
      turnRadius2gM: turnFigure(flight, cruiseMs),
      launchSpeedMs: launchFigure(flight),
      ...wingEnds(context),
    },
    charts: [powerChart(flight, glides, top, cruiseMs)],
    problems: [
      ...(thrust.ok ? [] : thrust.problems),
      ...(cruiseMs < polar.stallMs ? [cruiseProblem(cruiseMs, polar.stallMs)] : []),
    ],
  };
}

const MOTOR_FIGURES = [
  'staticThrustN',
  'thrustToWeight',
  'pitchSpeedMs',
  'topSpeedMs',
  'climbMs',
] as const satisfies readonly FigureId[];

function motorFigures({ polar, thrust }: LevelFlight, top: number | null): FigureSet {
  if (!thrust.ok) return allMissing(MOTOR_FIGURES, firstProblem(thrust));
  if (thrust.value === null) {
    const glider = doesNotApply(texts.problems.glider);
    return Object.fromEntries(MOTOR_FIGURES.map((id) => [id, glider]));
  }
  return { ...thrustFigures(thrust.value, polar), ...poweredFigures(thrust.value, polar, top) };
}

/** At cruise speed, or at the slowest speed at which the wing carries the turn when that is faster. */
function turnFigure({ polar }: LevelFlight, cruiseMs: number): FigureValue {
  const slowest = polar.stallMs * Math.sqrt(TURN_LOAD_FACTOR);
  const stalls = cruiseMs < slowest;
  const speedMs = stalls ? slowest : cruiseMs;
  const { clMax } = polar.stall;
  const at = (cl: number) => turnRadiusM(slowest * Math.sqrt(clMax.value / cl), TURN_LOAD_FACTOR);
  return known(turnRadiusM(speedMs, TURN_LOAD_FACTOR), {
    ...(stalls && !clMax.typed ? { band: bandOf(clMaxCause(clMax), at(clMax.high), at(clMax.low)) } : {}),
    verdict: stalls
      ? { level: 'watch', words: fill(texts.verdicts.turnStalls, { speed: fixedDigits(speedMs, 1) }) }
      : { level: 'good', words: texts.verdicts.turnGood },
    inputs: [
      { name: texts.inputs.speed, value: speedMs, unit: 'm/s' },
      { name: texts.inputs.slowestTurn, value: slowest, unit: 'm/s' },
    ],
  });
}

function launchFigure({ polar }: LevelFlight): FigureValue {
  const { stallMs, stall } = polar;
  const { value, low, high, typed } = stall.clMax;
  const speed = (cl: number) => LAUNCH_OVER_STALL.value * stallMs * Math.sqrt(value / cl);
  return known(speed(value), {
    ...(typed ? {} : { band: bandOf(clMaxCause(stall.clMax), speed(high), speed(low)) }),
    inputs: [{ name: texts.inputs.stall, value: stallMs, unit: 'm/s' }],
  });
}

/** Reynolds numbers where the wing is longest and where it ends. */
function wingEnds({ airframe, areas, wing }: FlightContext): FigureSet {
  const chords = mainWing(areas.surfaces)?.sections.map(({ chord }) => chord) ?? [];
  const at = (chordMm: number | undefined) => (chordMm ? reynoldsFigure(airframe, wing, chordMm) : pointed);
  return { reynoldsRoot: at(chords[0]), reynoldsTip: at(chords.at(-1)) };
}

const pointed = doesNotApply(texts.problems.pointedTip);

const mainWing = (surfaces: readonly SurfaceArea[]): SurfaceArea | undefined =>
  surfaces
    .filter(({ surface }) => surface.role === 'wing' && surface.mirrored)
    .reduce<SurfaceArea | undefined>((most, next) => (!most || next.areaMm2 > most.areaMm2 ? next : most), undefined);
