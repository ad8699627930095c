import type { ReactNode } from 'react';
import { fixedDigits } from '@/lib/units/number';
import { type Axis, type ChartFrame, shareOf } from './frame';
import { type LineLabel, NARROWEST } from './labels';
import type { ChartLine, Point } from './lines';
import type { MarkFlag } from './marks';
import { EndShape } from './signs';

interface ChartPlotProps {
  /** Of the element, for what names and describes it. */
  readonly id: string;
  readonly title: string;
  readonly description: string;
  readonly frame: ChartFrame;
  readonly lines: readonly ChartLine[];
  readonly labels: readonly LineLabel[];
  readonly flags: readonly MarkFlag[];
}

const LANE_PX = 16;
/** The curves are drawn on a square of this many units and stretched over the plot; what has a size in px is laid over them by shares. */
const SQUARE = 1000;
/** Advance of a digit at 12 px, rounded up. */
const DIGIT_PX = 7.6;

const percent = (share: number): string => `${Math.round(share * 1e5) / 1e3}%`;
const tickTexts = ({ ticks }: Axis): readonly (readonly [number, string])[] =>
  ticks.at.map((at) => [at, fixedDigits(at, ticks.digits)]);

/** The drawing itself. Text keeps its size at every width; the curves stretch. */
export function ChartPlot({ id, title, description, frame, lines, labels, flags }: ChartPlotProps) {
  const widest = Math.max(...tickTexts(frame.y).map(([, text]) => text.length));
  const lanes = flags.length === 0 ? 0 : Math.max(...flags.map(({ lane }) => lane)) + 1;
  const room = {
    paddingTop: lanes * LANE_PX + 6,
    paddingLeft: widest * DIGIT_PX + 8,
    paddingRight: 18,
    paddingBottom: 22,
  };
  return (
    <div style={room}>
      <svg
        role="img"
        aria-labelledby={`${id}-name`}
        aria-describedby={`${id}-desc`}
        height={NARROWEST.heightPx}
        className="block w-full overflow-visible text-xs"
      >
        <title id={`${id}-name`}>{title}</title>
        <desc id={`${id}-desc`}>{description}</desc>
        <rect width="100%" height="100%" fill="var(--paper)" />
        <Scales frame={frame} />
        <Flags flags={flags} />
        <Curves frame={frame} lines={lines} />
        {lines.length > 1 ? <Ends frame={frame} lines={lines} /> : null}
        {labels.map(({ line, x, baselinePx, anchor }) => (
          <text
            key={line.name}
            x={percent(x)}
            y={baselinePx}
            textAnchor={anchor}
            paintOrder="stroke"
            stroke="var(--paper)"
            strokeWidth="3"
            className="fill-ink"
          >
            {line.name}
          </text>
        ))}
      </svg>
    </div>
  );
}

/** Ruling, numbers, the two axes, and where zero lies when it is inside. */
function Scales({ frame: { x, y } }: { readonly frame: ChartFrame }) {
  const zero = y.from < 0 && y.to > 0 ? percent(1 - shareOf(y, 0)) : null;
  return (
    <g>
      {tickTexts(x).map(([at, text]) => (
        <g key={text}>
          <line x1={percent(shareOf(x, at))} x2={percent(shareOf(x, at))} y2="100%" stroke="var(--rule)" />
          <text x={percent(shareOf(x, at))} y="100%" dy="16" textAnchor="middle" className="figure fill-ink-soft">
            {text}
          </text>
        </g>
      ))}
      {tickTexts(y).map(([at, text]) => (
        <g key={text}>
          <line x2="100%" y1={percent(1 - shareOf(y, at))} y2={percent(1 - shareOf(y, at))} stroke="var(--rule)" />
          <text x="-7" y={percent(1 - shareOf(y, at))} dy="4" textAnchor="end" className="figure fill-ink-soft">
            {text}
          </text>
        </g>
      ))}
      {zero === null ? null : <line x2="100%" y1={zero} y2={zero} stroke="var(--ink-soft)" />}
      <line y2="100%" stroke="var(--ink-soft)" />
      <line x2="100%" y1="100%" y2="100%" stroke="var(--ink-soft)" />
    </g>
  );
}

const Flags = ({ flags }: Pick<ChartPlotProps, 'flags'>) =>
  flags.map(({ label, x, anchor, lane }) => (
    <g key={label}>
      <line
        x1={percent(x)}
        x2={percent(x)}
        y1={-lane * LANE_PX - 3}
        y2="100%"
        stroke="var(--ink-soft)"
        strokeDasharray="1 3"
      />
      <text x={percent(x)} y={-lane * LANE_PX - 6} textAnchor={anchor} className="fill-ink">
        {label}
      </text>
    </g>
  ));

function Curves({ frame, lines }: Pick<ChartPlotProps, 'frame' | 'lines'>) {
  const unit = (share: number): number => Math.round(share * SQUARE * 10) / 10;
  const at = ([x, y]: Point): string => `${unit(shareOf(frame.x, x))},${unit(1 - shareOf(frame.y, y))}`;
  return (
    <svg
      aria-hidden="true"
      width="100%"
      height="100%"
      viewBox={`0 0 ${SQUARE} ${SQUARE}`}
      preserveAspectRatio="none"
      overflow="visible"
      fill="none"
    >
      {lines.flatMap(({ name, runs, look }) =>
        runs.map((run) => (
          <polyline
            key={`${name} ${look.shape} ${run[0]?.join()}`}
            points={run.map(at).join(' ')}
            stroke={look.stroke}
            strokeWidth={look.widthPx}
            strokeDasharray={look.dash}
            strokeLinejoin="round"
            vectorEffect="non-scaling-stroke"
          />
        )),
      )}
    </svg>
  );
}

function Ends({ frame, lines }: Pick<ChartPlotProps, 'frame' | 'lines'>): ReactNode {
  return lines.map(({ name, runs, look }) => {
    const last = runs.at(-1)?.at(-1);
    if (last === undefined) return null;
    return (
      <svg
        key={`${name} ${look.shape}`}
        aria-hidden="true"
        x={percent(shareOf(frame.x, last[0]))}
        y={percent(1 - shareOf(frame.y, last[1]))}
        width="1"
        height="1"
        overflow="visible"
      >
        <EndShape look={look} />
      </svg>
    );
  });
}
