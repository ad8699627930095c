import type { ReactNode } from 'react';
import type { ViewOutline } from '@/lib/airframe/outlines';
import type { FigureMarks } from '@/lib/figures/types';
import { type Frame, pathData } from './frame';
import { inDrawingOrder } from './outline';
import { PlanMarks } from './PlanMarks';

const LOOKS: Record<ViewOutline['kind'], { stroke: string; fill: string; width: number; dash?: string }> = {
  surface: { stroke: 'var(--ink)', fill: 'color-mix(in srgb, var(--paper) 82%, transparent)', width: 1.5 },
  control: { stroke: 'var(--control)', fill: 'color-mix(in srgb, var(--control) 12%, transparent)', width: 1.5 },
  body: { stroke: 'var(--ink)', fill: 'color-mix(in srgb, var(--board) 75%, transparent)', width: 1.25 },
  boom: { stroke: 'var(--ink)', fill: 'var(--board)', width: 1.25 },
  drive: { stroke: 'var(--ink-soft)', fill: 'none', width: 1.25, dash: '8 4' },
  item: { stroke: 'var(--mass)', fill: 'none', width: 1 },
  gear: { stroke: 'var(--ink-soft)', fill: 'none', width: 1.25 },
};

interface PlanDrawingProps {
  readonly outlines: readonly ViewOutline[];
  readonly frame: Frame;
  readonly marks?: FigureMarks;
  readonly label: string;
  /** Element drawn in the colour of what is selected. */
  readonly selected?: string;
  /** Things laid over the drawing in percent of its size. */
  readonly children?: ReactNode;
}

/** The plan view as lines, true to its proportions in whatever width it is given. */
export function PlanDrawing({ outlines, frame, marks, label, selected, children }: PlanDrawingProps) {
  return (
    <div className="film relative w-full border border-rule" style={{ aspectRatio: frame.widthMm / frame.heightMm }}>
      <svg
        viewBox={`0 0 ${frame.widthMm} ${frame.heightMm}`}
        preserveAspectRatio="none"
        role="img"
        aria-label={label}
        className="absolute inset-0 size-full"
      >
        {inDrawingOrder(outlines).map(({ key, kind, side, closed, points }) => {
          const { stroke, fill, width, dash } = LOOKS[kind];
          const chosen = selected === key;
          return (
            <path
              key={`${kind}/${key}/${side}/${points[0]?.join()}`}
              d={pathData(frame, points, closed)}
              fill={closed ? fill : 'none'}
              stroke={chosen ? 'var(--tape)' : stroke}
              strokeWidth={chosen ? 2.5 : width}
              strokeDasharray={dash}
              strokeLinejoin="round"
              vectorEffect="non-scaling-stroke"
            />
          );
        })}
      </svg>
      {marks === undefined ? null : <PlanMarks frame={frame} marks={marks} />}
      {children}
    </div>
  );
}
