import type { ViewOutline } from '@/lib/airframe/outlines';
import type { FigureMarks } from '@/lib/figures/types';
import { front as words } from '@/lib/text/en/pages';
import { fill } from '@/lib/text/fill';
import { frameAround } from '../thumbnail/frame';
import { PlanDrawing } from '../thumbnail/PlanDrawing';
import { BalanceStrip } from './BalanceStrip';
import type { FigureRow } from './rows';
import { TitleBlock } from './TitleBlock';

interface ShowPieceProps {
  readonly name: string;
  readonly outlines: readonly ViewOutline[];
  readonly marks: FigureMarks;
  readonly rows: readonly FigureRow[];
}

/** An aircraft on its sheet: plan, balance rule on the same x, and the figures that decide in the title block. */
export function ShowPiece({ name, outlines, marks, rows }: ShowPieceProps) {
  const frame = frameAround(
    outlines.map(({ points }) => points),
    0.05,
  );
  if (frame === null) return null;
  return (
    <div className="flex flex-wrap items-start gap-x-6 gap-y-4">
      <div
        className="grid flex-none gap-3"
        style={{ width: `min(100%, calc(64vh * ${frame.widthMm / frame.heightMm}))` }}
      >
        <div className="grid">
          <PlanDrawing outlines={outlines} frame={frame} marks={marks} label={fill(words.drawing, { name })} />
          <BalanceStrip fromMm={frame.x0} toMm={frame.x0 + frame.widthMm} marks={marks} label={words.rule} />
        </div>
        <p className="text-sm text-ink-soft">{fill(words.drawn, { name })}</p>
      </div>
      <div className="min-w-0 grow basis-[190px]">
        <TitleBlock rows={rows} label={fill(words.figures, { name })} />
      </div>
    </div>
  );
}
