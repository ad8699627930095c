import type { Chart } from '@/lib/figures/charts';
import { chart as texts } from '@/lib/text/en/figurePages';
import { fill } from '@/lib/text/fill';
import { fixedDigits } from '@/lib/units/number';
import { OpenMark } from '../../ui/icons';
import { Cell, Row, RowHead, Table } from '../../ui/Table';
import type { ChartFrame } from './frame';
import type { ChartLine } from './lines';
import { MOST_POINTS, thinned } from './thin';

interface ChartPointsProps {
  readonly chart: Chart;
  readonly frame: ChartFrame;
  readonly lines: readonly ChartLine[];
}

const headOf = ({ label, unit }: Chart['x']): string => (unit === '' ? label : `${label}, ${unit}`);

/** The same curves in numbers, one digit finer than the axes. */
export function ChartPoints({ chart, frame, lines }: ChartPointsProps) {
  const title = fill(texts.points, { title: chart.title });
  const whole = lines.every(({ runs }) => runs.every((run) => run.length <= MOST_POINTS));
  return (
    <details className="group text-sm print:hidden">
      <summary className="inline-flex min-h-8 items-center gap-1 text-petrol bench:min-h-11 pointer-coarse:min-h-11">
        <OpenMark className="transition-transform group-open:rotate-90" />
        {title}
      </summary>
      {whole ? null : <p className="text-ink-soft">{fill(texts.thinned, { most: MOST_POINTS })}</p>}
      <Table
        caption={title}
        head={[
          { text: texts.line },
          { text: headOf(chart.x), numeric: true },
          { text: headOf(chart.y), numeric: true },
        ]}
      >
        {lines.flatMap(({ name, runs, look }) =>
          runs.flatMap((run) =>
            thinned(run).map(([x, y]) => (
              <Row key={`${name} ${look.shape} ${x} ${y}`}>
                <RowHead className="font-normal">{name}</RowHead>
                <Cell numeric className="figure">
                  {fixedDigits(x, frame.x.ticks.digits + 1)}
                </Cell>
                <Cell numeric className="figure">
                  {fixedDigits(y, frame.y.ticks.digits + 1)}
                </Cell>
              </Row>
            )),
          ),
        )}
      </Table>
    </details>
  );
}
