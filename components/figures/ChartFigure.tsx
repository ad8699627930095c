import type { Chart, ChartAxis } from '@/lib/figures/charts';
import { chart as texts } from '@/lib/text/en/figurePages';
import { fill } from '@/lib/text/fill';
import { fixedDigits } from '@/lib/units/number';
import type { UnitSystem } from '@/lib/units/quantity';
import { ChartPlot } from './chart/ChartPlot';
import { ChartPoints } from './chart/ChartPoints';
import { type Axis, type ChartFrame, chartFrame } from './chart/frame';
import { lineLabels } from './chart/labels';
import { type ChartLine, chartIn, chartLines } from './chart/lines';
import { markFlags } from './chart/marks';
import { LineSample } from './chart/signs';

interface ChartFigureProps {
  /** Of its element; two charts of one kind may stand on a page. */
  readonly id: string;
  readonly chart: Chart;
  readonly system?: UnitSystem;
}

/** A curve that goes with the figures: drawn without a script, with its note and its points in numbers. */
export function ChartFigure({ id, chart: given, system = 'metric' }: ChartFigureProps) {
  const chart = chartIn(given, system);
  const lines = chartLines(chart);
  const frame = chartFrame(lines, chart.marks);
  return (
    <figure className="grid grid-cols-1 gap-1 break-inside-avoid">
      <p className="text-sm font-[560]">{chart.title}</p>
      {frame === null ? (
        <p className="text-sm text-ink-soft">{texts.none}</p>
      ) : (
        <Drawn id={id} chart={chart} frame={frame} lines={lines} />
      )}
      <figcaption className="max-w-[64ch] text-sm text-ink-soft">{chart.note}</figcaption>
    </figure>
  );
}

interface Contents {
  readonly chart: Chart;
  readonly frame: ChartFrame;
  readonly lines: readonly ChartLine[];
}

function Drawn({ id, chart, frame, lines }: Contents & { readonly id: string }) {
  const { labels, rest } = lines.length > 1 ? lineLabels(lines, frame) : { labels: [], rest: [] };
  return (
    <>
      <AxisName axis={chart.y} />
      <ChartPlot
        id={id}
        title={chart.title}
        description={inWords({ chart, frame, lines })}
        frame={frame}
        lines={lines}
        labels={labels}
        flags={markFlags(chart.marks, frame)}
      />
      <span className="justify-self-end pr-4">
        <AxisName axis={chart.x} />
      </span>
      {rest.length === 0 ? null : (
        <ul aria-label={texts.key} className="flex flex-wrap gap-x-5 text-xs">
          {rest.map(({ name, look }) => (
            <li key={`${name} ${look.shape}`} className="flex items-center gap-2">
              <LineSample look={look} />
              {name}
            </li>
          ))}
        </ul>
      )}
      <ChartPoints chart={chart} frame={frame} lines={lines} />
    </>
  );
}

/** What an axis carries, its unit in a lighter tone. */
const AxisName = ({ axis: { label, unit } }: { readonly axis: ChartAxis }) => (
  <span className="text-xs">
    {label}
    {unit === '' ? null : <span className="figure text-ink-soft">{` ${unit}`}</span>}
  </span>
);

function spanText({ label, unit }: ChartAxis, values: readonly number[], { ticks }: Axis): string {
  const read = (value: number) => fixedDigits(value, ticks.digits + 1);
  return fill(texts.span, { label, low: read(Math.min(...values)), high: read(Math.max(...values)), unit }).trim();
}

/** The chart in a few words, for whoever does not see it. */
function inWords({ chart, frame, lines }: Contents): string {
  const marks = chart.marks
    .filter(({ x }) => Number.isFinite(x))
    .map(({ label, x }) =>
      fill(texts.markAt, { label, x: fixedDigits(x, frame.x.ticks.digits + 1), unit: chart.x.unit }).trim(),
    );
  const points = lines.flatMap(({ runs }) => runs.flat());
  const along = points.map(([x]) => x);
  const up = points.map(([, y]) => y);
  return [
    `${spanText(chart.x, along, frame.x)}. ${spanText(chart.y, up, frame.y)}.`,
    fill(texts.drawn, { names: lines.map(({ name }) => name).join(', ') }),
    marks.length === 0 ? '' : fill(texts.marked, { names: marks.join(', ') }),
  ]
    .join(' ')
    .trim();
}
