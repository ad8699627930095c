import { type ControlLinkage, leversTurned, servoForDeg, surfaceAtDeg } from '@/lib/linkage/ofControl';
import { SERVO_TRAVEL_DEG, SUGGESTED_ROD_MM } from '@/lib/linkage/practice';
import { texts } from '@/lib/text/en/figures/controls';
import { fill } from '@/lib/text/fill';
import type { Chart, ChartMark, ChartSeries } from './charts';
import type { StudiedControl } from './controlLoads';

const words = texts.chart;
const STEP_DEG = 2.5;

/** Surface angle over the servo's travel; a dead centre ends the curve. */
function curve(linkage: ControlLinkage): ChartSeries['points'] {
  const steps = Math.round(SERVO_TRAVEL_DEG.value / STEP_DEG);
  return Array.from({ length: 2 * steps + 1 }, (_, i) => (i - steps) * STEP_DEG).flatMap((servoDeg) => {
    const surfaceDeg = surfaceAtDeg(linkage, servoDeg);
    return surfaceDeg === null ? [] : [[servoDeg, surfaceDeg] as const];
  });
}

/** The straight line of the gear ratio at neutral, as far as the curve goes. */
function straight(linkage: ControlLinkage, points: ChartSeries['points']): ChartSeries[] {
  const ratio = leversTurned(linkage, 0)?.ratio;
  const ends = [points[0], points.at(-1)].flatMap((point) => (point ? [point[0]] : []));
  if (ratio === undefined) return [];
  return [
    {
      name: words.straight,
      kind: 'other',
      points: ends.map((servoDeg) => [servoDeg, servoDeg * ratio * linkage.sign] as const),
    },
  ];
}

/** Surface angle against servo angle of one control, trailing edge down and arm aft positive, with the ends of its throw marked. */
export function throwTravelChart({ name, together }: StudiedControl, linkage: ControlLinkage): Chart {
  const points = curve(linkage);
  const mark = (surfaceDeg: number, label: string): ChartMark[] => {
    const x = surfaceDeg === 0 ? null : servoForDeg(linkage, surfaceDeg);
    return x === null ? [] : [{ x, label }];
  };
  return {
    id: 'throwTravel',
    title: fill(words.title, { control: name }),
    x: { label: words.servo, unit: '°' },
    y: { label: words.surface, unit: '°' },
    series: [{ name: words.curve, kind: 'main', points }, ...straight(linkage, points)],
    marks: [...mark(-together.upDeg, words.fullUp), ...mark(together.downDeg, words.fullDown)],
    note: linkage.suggested ? fill(words.noteSuggested, { rod: SUGGESTED_ROD_MM.value }) : words.note,
  };
}
