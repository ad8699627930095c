import { axisAbout, type Trim } from '@/lib/flight/trim';
import type { Result } from '@/lib/numerics/result';
import { texts } from '@/lib/text/en/figures/trim';
import { fill } from '@/lib/text/fill';
import { fixedDigits } from '@/lib/units/number';
import type { Chart, ChartSeries } from './charts';
import { fullThrottle, holdSpeed, type TrimBench } from './trimBench';

const POINTS = 41;
/** The curve begins a little above the stall, where straight flight still exists, and ends at twice cruise. */
const FROM_STALL = 1.05;
const TO_CRUISE = 2;

/** Elevator against speed: as balanced, at both CG limits, and with full throttle; null when cruise is so slow that nothing is left. */
export function trimChart(bench: TrimBench): Chart | null {
  const { context, axis, stallMs, thrust } = bench;
  const words = texts.chart;
  const { cruiseMs } = context.airframe.flight;
  const [from, to] = [FROM_STALL * stallMs, TO_CRUISE * cruiseMs];
  if (!(to > from)) return null;
  const speeds = Array.from({ length: POINTS }, (_, i) => from + ((to - from) * i) / (POINTS - 1));
  const curve = (name: string, kind: ChartSeries['kind'], at: (speedMs: number) => Result<Trim>) =>
    runs(speeds, at).map((points): ChartSeries => ({ name, kind, points }));
  const { foreLimitX, aftLimitX, firstFlightX } = context.stability;
  const [fore, aft] = [axisAbout(axis, foreLimitX), axisAbout(axis, aftLimitX)];
  const power = thrust.ok ? thrust.value : null;
  return {
    id: 'trimSpeed',
    title: words.title,
    x: { label: words.speed, unit: 'm/s' },
    y: { label: words.elevator, unit: '°' },
    series: [
      ...curve(words.current, 'main', (v) => holdSpeed(bench, axis, v)),
      ...(firstFlightX === null
        ? []
        : [
            ...curve(words.fore, 'limit', (v) => holdSpeed(bench, fore, v)),
            ...curve(words.aft, 'limit', (v) => holdSpeed(bench, aft, v)),
          ]),
      ...(power ? curve(words.power, 'other', (v) => holdSpeed(bench, axis, v, fullThrottle(bench, power, v))) : []),
    ],
    marks: [
      { x: stallMs, label: words.stall },
      { x: cruiseMs, label: words.cruise },
    ],
    note: fill(words.note, { up: fixedDigits(axis.up.throwDeg, 1), down: fixedDigits(axis.down?.throwDeg ?? 0, 1) }),
  };
}

type Points = ChartSeries['points'];

/** Stretches of speed that the throw can hold. */
function runs(speeds: readonly number[], at: (speedMs: number) => Result<Trim>): Points[] {
  const found: [number, number][][] = [];
  let open = false;
  for (const speedMs of speeds) {
    const held = at(speedMs);
    const within = held.ok && Math.abs(held.value.stick) <= 1;
    if (within && !open) found.push([]);
    if (within) found.at(-1)?.push([speedMs, held.value.elevatorDeg]);
    open = within;
  }
  return found;
}
