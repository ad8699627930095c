import { dragAreaOf, dragBuildUp } from '@/lib/aero/drag/buildUp';
import { elementName } from '@/lib/airframe/names';
import { bestGlide, type Glide, leastSink, levelDragN, levelLift } from '@/lib/flight/performance/level';
import type { AircraftPolar } from '@/lib/flight/performance/polar';
import type { Problem } from '@/lib/numerics/result';
import type { Spread, SpreadEnd } from '@/lib/numerics/spread';
import { texts } from '@/lib/text/en/figures/performance';
import { fill } from '@/lib/text/fill';
import { fixedDigits } from '@/lib/units/number';
import { bandOf } from './bandOf';
import type { FlightContext } from './levelFlight';
import type { FigureValue } from './types';
import { type FigureSet, known, missing } from './value';

/** A glide at its value and at both ends of the drag's span. */
export type GlideSpread = Readonly<Record<SpreadEnd, Glide>>;

export interface Glides {
  readonly flattest: GlideSpread;
  readonly slowest: GlideSpread;
}

/** The flattest and the slowest glide, motor off. */
export function glidesOf(polar: AircraftPolar): Glides {
  const ends = (find: (p: AircraftPolar, end: SpreadEnd) => Glide): GlideSpread => ({
    value: find(polar, 'value'),
    low: find(polar, 'low'),
    high: find(polar, 'high'),
  });
  return { flattest: ends(bestGlide), slowest: ends(leastSink) };
}

/** Glide ratio, sink and their speeds, motor off. */
export function glideFigures({ stallMs, stopped }: AircraftPolar, glides: Glides, motors: number): FigureSet {
  const cause = motors > 0 ? texts.causes.dragStopped : texts.causes.drag;
  const inputs = [
    { name: texts.inputs.stall, value: stallMs, unit: 'm/s' },
    { name: texts.inputs.stopped, value: stopped.value, unit: '' },
  ];
  const figure = ({ value, low, high }: GlideSpread, pick: (glide: Glide) => number) =>
    known(pick(value), { band: bandOf(cause, pick(value), pick(low), pick(high)), inputs });
  return {
    bestGlideRatio: figure(glides.flattest, ({ ratio }) => ratio),
    bestGlideSpeedMs: figure(glides.flattest, ({ speedMs }) => speedMs),
    leastSinkMs: figure(glides.slowest, ({ sinkMs }) => sinkMs),
    leastSinkSpeedMs: figure(glides.slowest, ({ speedMs }) => speedMs),
  };
}

/** Drag at cruise speed, what it is made of, and the power it takes. */
export function dragFigures(context: FlightContext, polar: AircraftPolar): FigureSet {
  const { airframe, resolved, wing, air } = context;
  const { cruiseMs } = airframe.flight;
  const items = dragBuildUp(airframe, resolved, cruiseMs, air);
  const area = dragAreaOf(items);
  const spread = (at: Spread, scale: number) => bandOf(texts.causes.drag, at.low * scale, at.high * scale);
  return {
    dragAreaCm2: known(area.value / 100, {
      band: spread(area, 0.01),
      inputs: items.map(({ elementId, kind, areaMm2 }) => ({
        name: fill(texts.drag[kind], { name: elementId === null ? '' : elementName(airframe, elementId) }),
        value: areaMm2.value / 100,
        unit: 'cm²',
      })),
    }),
    zeroLiftDrag: known(area.value / wing.areaMm2, { band: spread(area, 1 / wing.areaMm2) }),
    ...(cruiseMs < polar.stallMs ? tooSlow(cruiseProblem(cruiseMs, polar.stallMs)) : cruising(polar, cruiseMs)),
  };
}

const tooSlow = (problem: Problem): FigureSet => ({ dragCruiseN: missing(problem), levelPowerW: missing(problem) });

/** The cruise speed that the document asks for cannot be flown. */
export const cruiseProblem = (cruiseMs: number, stallMs: number): Problem => ({
  code: 'cruise-below-stall',
  path: 'flight.cruiseMs',
  message: fill(texts.problems.cruiseBelowStall, { cruise: fixedDigits(cruiseMs, 1), stall: fixedDigits(stallMs, 1) }),
  fix: texts.problems.cruiseBelowStallFix,
});

function cruising(polar: AircraftPolar, cruiseMs: number): FigureSet {
  const cl = levelLift(polar, cruiseMs);
  const { zeroLift, growth, induced } = polar.parts(cl, cruiseMs);
  const coefficient = (name: string, value: number) => ({ name, value, unit: '' });
  const inputs: FigureValue['inputs'] = [
    { name: texts.inputs.speed, value: cruiseMs, unit: 'm/s' },
    coefficient(texts.inputs.liftCoefficient, cl),
    coefficient(texts.inputs.zeroLift, zeroLift),
    coefficient(texts.inputs.growth, growth),
    coefficient(texts.inputs.induced, induced),
  ];
  const [value, low, high] = [
    levelDragN(polar, cruiseMs, 'on'),
    levelDragN(polar, cruiseMs, 'on', 'low'),
    levelDragN(polar, cruiseMs, 'on', 'high'),
  ];
  return {
    dragCruiseN: known(value, { band: bandOf(texts.causes.drag, low, high), inputs }),
    levelPowerW: known(value * cruiseMs, {
      band: bandOf(texts.causes.drag, low * cruiseMs, high * cruiseMs),
      inputs,
    }),
  };
}
