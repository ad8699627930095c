import { pitchCommand, rollCommand } from '@/lib/flight/commands';
import { lateralSystem, type SideDerivatives } from '@/lib/flight/modes/lateral';
import { type LongitudinalDerivatives, longitudinalSystem } from '@/lib/flight/modes/longitudinal';
import { pullOf } from '@/lib/flight/modes/manoeuvre';
import type { Row4 } from '@/lib/flight/modes/system';
import { type Motion, motion, rateOf } from '@/lib/flight/response';
import { degFromRad, radFromDeg } from '@/lib/numerics/vec';
import { texts } from '@/lib/text/en/figures/handling';
import { STANDARD_GRAVITY } from '@/lib/units/factors';
import type { Chart, ChartSeries } from '../charts';
import type { FigureContext } from '../context';
import { CHART_ENDS } from '../handlingBands';
import { atMarginEnds, type Cruise } from './cruise';
import { sideEnds } from './sideEnds';

// Motions in time after one plain act, from the same linear equations as the modes. The point must have inertia.

const { charts: words } = texts;

const STILL: Row4 = [0, 0, 0, 0];
const STEPS = 100;
const PITCH_S = 2;
const ROLL_S = 1;
const YAW_S = 4;
const RELEASE_DEG = 5;

type Point = readonly [number, number];

/** Up to where the linear equations mean something: an unstable aircraft leaves them within the chart. */
function whileLinear<T>(moments: readonly T[], size: (at: T) => number, most: number): readonly T[] {
  const end = moments.findIndex((at) => Math.abs(size(at)) > most);
  return end < 0 ? moments : moments.slice(0, end);
}

const inSideslip = (states: readonly Motion[]) =>
  whileLinear(states, ({ state }) => degFromRad(state[0]), CHART_ENDS.sideslipDeg);

const time = { label: words.time, unit: 's' };

/** Load factor added after one degree of up-elevator, the stick held; null without a pitch control. */
export function pitchStep(context: FigureContext, cruise: Cruise, d: LongitudinalDerivatives): Chart | null {
  const { airframe, model } = context;
  const command = pitchCommand(airframe, model.controls);
  if (!command) return null;
  const perDeg = { lift: command.lift / command.throwDeg, pitch: command.pitch / command.throwDeg };
  const series = (derivatives: LongitudinalDerivatives): readonly Point[] => {
    const { matrix, input } = longitudinalSystem(cruise.point, derivatives);
    const held = input(perDeg);
    const states = motion(matrix, { start: STILL, input: held, stepS: PITCH_S / STEPS, steps: STEPS });
    // The path bends by what the nose turns more than the angle of attack grows: n = V (q - alpha') / g.
    const pull = (at: Motion) =>
      (cruise.point.speedMs / STANDARD_GRAVITY) * (at.state[2] - rateOf(matrix[1], at, held[1]));
    return whileLinear(states, pull, CHART_ENDS.pullG).map((at) => [at.timeS, pull(at)]);
  };
  const [least, largest] = atMarginEnds(context, cruise, d);
  const steady = pullOf(cruise.point, model, perDeg);
  return {
    id: 'pitchStep',
    title: words.pitchTitle,
    x: time,
    y: { label: words.pitchAxis, unit: 'g' },
    series: [
      { name: words.main, kind: 'main', points: series(d) },
      { name: words.least, kind: 'other', points: series(least) },
      { name: words.largest, kind: 'other', points: series(largest) },
      ...(steady === null ? [] : [level(words.steady, steady, PITCH_S)]),
    ],
    marks: [],
    note: words.pitchNote,
  };
}

const level = (name: string, y: number, end: number): ChartSeries => ({
  name,
  kind: 'limit',
  points: [
    [0, y],
    [end, y],
  ],
});

/** The same motion as worked out, with weaker and with stronger fins. */
function threeWays(
  context: FigureContext,
  { lateral }: Cruise,
  points: (d: SideDerivatives) => readonly Point[],
): ChartSeries[] {
  const [weak, strong] = sideEnds(context, lateral);
  return [
    { name: words.main, kind: 'main', points: points(lateral) },
    { name: words.weak, kind: 'other', points: points(weak) },
    { name: words.strong, kind: 'other', points: points(strong) },
  ];
}

/** Roll rate after one degree of the aileron that goes up, the stick held; null without a roll control. */
export function rollStep(context: FigureContext, cruise: Cruise): Chart | null {
  const command = rollCommand(context.airframe, cruise.lateral.controls);
  if (!command) return null;
  const { roll, yaw, side, throwDeg } = command;
  const perDeg = { roll: roll / throwDeg, yaw: yaw / throwDeg, side: side / throwDeg };
  const series = threeWays(context, cruise, (d) => {
    const { matrix, input } = lateralSystem(cruise.point, cruise.trim.alphaRad, d);
    const states = motion(matrix, { start: STILL, input: input(perDeg), stepS: ROLL_S / STEPS, steps: STEPS });
    return inSideslip(states).map(({ timeS, state }) => [timeS, degFromRad(state[1])]);
  });
  return {
    id: 'rollStep',
    title: words.rollTitle,
    x: time,
    y: { label: words.rollAxis, unit: '°/s' },
    series,
    marks: [],
    note: words.rollNote,
  };
}

/** Sideslip after letting go of it, controls held still. */
export function yawRelease(context: FigureContext, cruise: Cruise): Chart {
  const series = threeWays(context, cruise, (d) => {
    const { matrix } = lateralSystem(cruise.point, cruise.trim.alphaRad, d);
    const start: Row4 = [radFromDeg(RELEASE_DEG), 0, 0, 0];
    const states = motion(matrix, { start, input: STILL, stepS: YAW_S / STEPS, steps: STEPS });
    return inSideslip(states).map(({ timeS, state }) => [timeS, degFromRad(state[0])]);
  });
  return {
    id: 'yawRelease',
    title: words.yawTitle,
    x: time,
    y: { label: words.yawAxis, unit: '°' },
    series,
    marks: [],
    note: words.yawNote,
  };
}
