import { levelDragN } from '@/lib/flight/performance/level';
import type { SpreadEnd } from '@/lib/numerics/spread';
import { texts } from '@/lib/text/en/figures/performance';
import type { Chart } from './charts';
import type { Glides } from './glide';
import { type LevelFlight, thrustCurve } from './levelFlight';

const POINTS = 48;
/** Without thrust the curve ends at this many stall speeds. */
const FASTEST_SHOWN = 2.8;
/** Beyond the highest level speed there is a little to see. */
const BEYOND_TOP = 1.2;

/**
 * Power needed to fly level and power that the thrust gives, against speed.
 * @param top highest level speed, null when it is not known
 */
export function powerChart(
  { polar, thrust }: LevelFlight,
  glides: Glides,
  top: number | null,
  cruiseMs: number,
): Chart {
  const { stallMs } = polar;
  const curve = thrust.ok && thrust.value ? thrustCurve(thrust.value) : null;
  const words = texts.chart;
  const last = top === null ? stallMs * FASTEST_SHOWN : top * BEYOND_TOP;
  const along = (from: number, to: number, power: (speedMs: number) => number) =>
    Array.from({ length: POINTS }, (_, i) => {
      const speedMs = from + ((to - from) * i) / (POINTS - 1);
      return [speedMs, power(speedMs)] as const;
    });
  const required = (end: SpreadEnd) => along(stallMs, last, (v) => v * levelDragN(polar, v, 'on', end));
  return {
    id: 'powerRequired',
    title: words.title,
    x: { label: words.x, unit: 'm/s' },
    y: { label: words.y, unit: 'W' },
    series: [
      { name: words.required, kind: 'main', points: required('value') },
      { name: words.requiredMore, kind: 'limit', points: required('high') },
      ...(curve
        ? [
            {
              name: words.available,
              kind: 'other' as const,
              points: along(0, Math.min(last, curve.spentMs), (v) => v * curve.thrustN(v)),
            },
          ]
        : []),
    ],
    marks: [
      { x: stallMs, label: words.stall },
      { x: glides.slowest.value.speedMs, label: words.leastSink },
      { x: glides.flattest.value.speedMs, label: words.bestGlide },
      { x: cruiseMs, label: words.cruise },
      ...(top === null ? [] : [{ x: top, label: words.top }]),
    ],
    note: words.note,
  };
}
