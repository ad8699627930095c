import { pullOf } from '@/lib/flight/modes/manoeuvre';
import {
  axisAbout,
  type PitchAxis,
  pitchAxis,
  stickTrims,
  type ThrustLine,
  type Trim,
  trim,
  whyNoTrim,
  withNeutralPoint,
} from '@/lib/flight/trim';
import type { Result } from '@/lib/numerics/result';
import type { SpreadEnd } from '@/lib/numerics/spread';
import { degFromRad } from '@/lib/numerics/vec';
import { thrustAtN } from '@/lib/power/thrust';
import { texts as shared } from '@/lib/text/en/figures';
import { texts } from '@/lib/text/en/figures/trim';
import { fill } from '@/lib/text/fill';
import type { FigureContext, FigureGroupResult } from './context';
import { cruiseProblem } from './glide';
import { cruiseOf } from './handling/cruise';
import { FLARE_LIFT_PCT } from './trimBands';
import { fullThrottle, holdSpeed, type TrimBench, trimBench } from './trimBench';
import { trimChart } from './trimChart';
import { type StallTrim, stallBandVerdict, throttleVerdict, trimVerdict } from './trimVerdicts';
import type { FigureValue } from './types';
import { allMissing, doesNotApply, type FigureSet, firstProblem, known, missing } from './value';

const IDS = ['trimElevatorDeg', 'trimShareOfThrowPct', 'stallElevatorSharePct', 'throttleTrimDeg'] as const;

/**
 * Trim in straight flight: elevator at cruise, its share of the throw, the share that reaches the stall, what the throttle changes, and the
 * chart of elevator against speed.
 */
export function trimFigures(context: FigureContext): FigureGroupResult {
  const { airframe, model } = context;
  const axis = pitchAxis(airframe, model);
  if (!axis) {
    const none = doesNotApply(shared.problems.noPitchControl);
    return { figures: Object.fromEntries(IDS.map((id) => [id, none])) };
  }
  if (!stickTrims(axis)) return { figures: allMissing(IDS, firstProblem({ problems: whyNoTrim(airframe, model) })) };
  const bench = trimBench(context, axis);
  const { cruiseMs } = airframe.flight;
  const slow = cruiseMs < bench.stallMs ? cruiseProblem(cruiseMs, bench.stallMs) : null;
  const chart = trimChart(bench);
  return {
    figures: {
      ...(slow ? allMissing(IDS, slow) : { ...cruiseFigures(bench), throttleTrimDeg: throttleFigure(bench) }),
      stallElevatorSharePct: stallFigure(bench),
    },
    charts: chart ? [chart] : [],
    problems: slow ? [slow] : [],
  };
}

/** Smallest and largest of what is at both ends of a band; nothing when an end cannot be trimmed. */
function bandOf(ends: readonly (number | null)[], cause: string): Pick<FigureValue, 'band'> {
  const values = ends.filter((end) => end !== null);
  return values.length < ends.length ? {} : { band: { low: Math.min(...values), high: Math.max(...values), cause } };
}

const from = (result: Result<Trim>, pick: (trimmed: Trim) => number): number | null =>
  result.ok ? pick(result.value) : null;

const restDeg = ({ restRad, leader }: PitchAxis): number => degFromRad(restRad.get(leader) ?? 0);

function cruiseFigures(bench: TrimBench): FigureSet {
  const { context, axis, shiftsMm } = bench;
  const { cruiseMs } = context.airframe.flight;
  const held = holdSpeed(bench, axis, cruiseMs);
  if (!held.ok) return allMissing(['trimElevatorDeg', 'trimShareOfThrowPct'], firstProblem(held));
  const { state, stick, elevatorDeg } = held.value;
  const ends = shiftsMm.map((shift) => holdSpeed(bench, withNeutralPoint(axis, shift), cruiseMs));
  const sticks = ends.map((end) => from(end, (t) => 100 * t.stick));
  const crossing = sticks.some((s) => (s ?? 0) * stick < 0);
  const { foreLimitX, aftLimitX } = context.stability;
  const atLimits = [
    { name: texts.inputs.atForeLimit, x: foreLimitX },
    { name: texts.inputs.atAftLimit, x: aftLimitX },
  ].flatMap(({ name, x }) => {
    const limit = holdSpeed(bench, axisAbout(axis, x), cruiseMs);
    return limit.ok ? [{ name, value: limit.value.elevatorDeg, unit: '°' }] : [];
  });
  const speed = { name: texts.inputs.speed, value: cruiseMs, unit: 'm/s' };
  return {
    trimElevatorDeg: known(elevatorDeg, {
      ...bandOf(
        ends.map((end) => from(end, (t) => t.elevatorDeg)),
        texts.causes.neutralPoint,
      ),
      inputs: [
        speed,
        { name: texts.inputs.alpha, value: degFromRad(state.alphaRad), unit: '°' },
        { name: texts.inputs.rest, value: restDeg(axis), unit: '°' },
        ...atLimits,
      ],
    }),
    trimShareOfThrowPct: known(Math.abs(100 * stick), {
      ...bandOf([...sticks.map((s) => s && Math.abs(s)), ...(crossing ? [0] : [])], texts.causes.neutralPoint),
      verdict: trimVerdict(Math.abs(100 * stick)),
      inputs: [speed, ...throwInputs(axis)],
    }),
  };
}

const throwInputs = ({ up, down }: PitchAxis) => [
  { name: texts.inputs.fullUp, value: up.throwDeg, unit: '°' },
  { name: texts.inputs.fullDown, value: down?.throwDeg ?? 0, unit: '°' },
];

const NO_THRUST = { lift: 0, liftPerRad: 0, pitch: 0 } as const;

/** Share of up stick that trims the greatest lift, power off. */
function stallFigure({ context, axis, shiftsMm }: TrimBench): FigureValue {
  const { clMax } = context.stability;
  const at = (lift: number, about = axis) => trim(about, { weight: lift, thrust: NO_THRUST });
  const held = at(clMax.value);
  const flare = at((clMax.value * FLARE_LIFT_PCT.value) / 100);
  if (!held.ok) return missing(firstProblem(held));
  if (!flare.ok) return missing(firstProblem(flare));
  const sharePct = (t: Trim) => 100 * t.stick;
  const found: StallTrim = {
    stallPct: sharePct(held.value),
    flarePct: sharePct(flare.value),
    stable: axis.alpha.pitch < 0,
  };
  const ends = shiftsMm.flatMap((shift) => {
    const about = withNeutralPoint(axis, shift);
    return [clMax.low, clMax.high].map((lift): StallTrim | null => {
      const stallPct = from(at(lift, about), sharePct);
      const flarePct = from(at((lift * FLARE_LIFT_PCT.value) / 100, about), sharePct);
      return stallPct === null || flarePct === null ? null : { stallPct, flarePct, stable: about.alpha.pitch < 0 };
    });
  });
  return known(found.stallPct, {
    ...bandOf(
      ends.map((end) => end?.stallPct ?? null),
      texts.causes.neutralPointAndClMax,
    ),
    verdict: stallBandVerdict(
      found,
      ends.filter((end) => end !== null),
    ),
    inputs: [
      { name: texts.inputs.clMax, value: clMax.value, unit: '' },
      { name: texts.inputs.fullUp, value: axis.up.throwDeg, unit: '°' },
      { name: fill(texts.inputs.shareAtFlare, { share: FLARE_LIFT_PCT.value }), value: found.flarePct, unit: '%' },
    ],
  });
}

/** Change of the elevator from power off to full throttle, both held at cruise speed. */
function throttleFigure(bench: TrimBench): FigureValue {
  const { context, axis, shiftsMm, thrust } = bench;
  if (!thrust.ok) return missing({ ...firstProblem(thrust), message: texts.problems.noThrust });
  if (!thrust.value) return doesNotApply(texts.problems.noDrive);
  const { cruiseMs } = context.airframe.flight;
  const full = thrust.value;
  const line = (end: SpreadEnd, downDeg = 0) => fullThrottle(bench, full, cruiseMs, end, downDeg);
  const change = (about: PitchAxis, power: ThrustLine) => {
    const [off, on] = [holdSpeed(bench, about, cruiseMs), holdSpeed(bench, about, cruiseMs, power)];
    return off.ok && on.ok ? on.value.elevatorDeg - off.value.elevatorDeg : null;
  };
  const off = holdSpeed(bench, axis, cruiseMs);
  const on = holdSpeed(bench, axis, cruiseMs, line('value'));
  if (!off.ok) return missing(firstProblem(off));
  if (!on.ok) return missing(firstProblem(on));
  const changeDeg = on.value.elevatorDeg - off.value.elevatorDeg;
  const lower = change(axis, line('value', 1));
  const ends = shiftsMm.flatMap((shift) =>
    (['low', 'high'] as const).map((end) => change(withNeutralPoint(axis, shift), line(end))),
  );
  return known(changeDeg, {
    ...bandOf([changeDeg, ...ends], texts.causes.thrust),
    verdict: throttleVerdict({
      changeDeg,
      stickChange: on.value.stick - off.value.stick,
      stick: on.value.stick,
      perDownDeg: lower === null ? 0 : lower - changeDeg,
      pullG: pullOfStick(bench, on.value.stick - off.value.stick),
    }),
    inputs: [
      { name: texts.inputs.speed, value: cruiseMs, unit: 'm/s' },
      { name: texts.inputs.thrust, value: thrustAtN(full, cruiseMs), unit: 'N' },
      ...(lower === null ? [] : [{ name: texts.inputs.perDownthrust, value: lower - changeDeg, unit: '°' }]),
    ],
  });
}

/** Load factor of a steady pull at cruise by this much of the stick, either way; null behind the manoeuvre point. */
function pullOfStick({ context, axis }: TrimBench, stick: number): number | null {
  const cruise = cruiseOf(context);
  const pull = cruise.ok ? pullOf(cruise.value.point, context.model, axis.up) : null;
  return pull === null ? null : Math.abs(pull * stick);
}
