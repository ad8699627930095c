import type { Chart, ChartSeries } from '@/lib/figures/charts';
import type { UnitSystem } from '@/lib/units/quantity';
import { conversionOf } from '../units';

// What a chart draws, before it has a size: points that can be drawn, in the units of the screen, and how each line looks.

export type Point = readonly [x: number, y: number];
export type Shape = 'disc' | 'square' | 'triangle' | 'diamond';

/** Told apart by dash, weight and the shape at the end; colour only helps. */
export interface LineLook {
  readonly stroke: string;
  readonly widthPx: number;
  readonly dash: string;
  readonly shape: Shape;
}

/** A line by its name, in runs where it has gaps. */
export interface ChartLine {
  readonly name: string;
  readonly look: LineLook;
  readonly runs: readonly (readonly Point[])[];
}

const KINDS: Readonly<Record<ChartSeries['kind'], Omit<LineLook, 'shape' | 'dash'> & { dashes: readonly string[] }>> = {
  main: { stroke: 'var(--air)', widthPx: 2.25, dashes: ['', '14 3', '14 3 3 3'] },
  other: { stroke: 'var(--ink)', widthPx: 1.5, dashes: ['6 4', '2 3', '10 3 2 3'] },
  limit: { stroke: 'var(--watch)', widthPx: 1.5, dashes: ['18 4 4 4', '18 4', '4 8'] },
};
const SHAPES: readonly Shape[] = ['disc', 'square', 'triangle', 'diamond'];

const nth = <T>(list: readonly T[], index: number): T => {
  const item = list[index % list.length];
  if (item === undefined) throw new RangeError('an empty list has no items');
  return item;
};

const drawable = ([x, y]: Point): boolean => Number.isFinite(x) && Number.isFinite(y);

/** The lines of a chart in its order: series of one name and kind are one line with gaps. A line without a point is left out. */
export function chartLines({ series }: Chart): readonly ChartLine[] {
  const lines = new Map<string, { readonly series: ChartSeries; readonly runs: (readonly Point[])[] }>();
  for (const each of series) {
    const points = each.points.filter(drawable);
    if (points.length === 0) continue;
    const key = `${each.kind} ${each.name}`;
    const line = lines.get(key) ?? { series: each, runs: [] };
    line.runs.push(points);
    lines.set(key, line);
  }
  const drawn = { main: 0, other: 0, limit: 0 };
  return [...lines.values()].map(({ series: { name, kind }, runs }, index) => {
    const { stroke, widthPx, dashes } = KINDS[kind];
    drawn[kind] += 1;
    return { name, runs, look: { stroke, widthPx, dash: nth(dashes, drawn[kind] - 1), shape: nth(SHAPES, index) } };
  });
}

/** The same chart in other units, where an axis has a unit that means one thing only. */
export function chartIn(chart: Chart, system: UnitSystem): Chart {
  const x = conversionOf(chart.x.unit, system);
  const y = conversionOf(chart.y.unit, system);
  return {
    ...chart,
    x: { ...chart.x, unit: x.unit },
    y: { ...chart.y, unit: y.unit },
    series: chart.series.map((each) => ({
      ...each,
      points: each.points.map(([along, up]) => [along / x.factor, up / y.factor] as const),
    })),
    marks: chart.marks.map((mark) => ({ ...mark, x: mark.x / x.factor })),
  };
}
