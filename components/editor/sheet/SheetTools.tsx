'use client';

import { Icon } from '@/components/ui/icons';
import { sheet as texts } from '@/lib/text/en/board';
import { useBoard } from '../useBoard';
import { zoomSheet } from './fold';

const STEP = 1.25;
const BUTTON =
  'grid size-8 place-items-center rounded-cut border border-rule bg-paper text-ink hover:border-ink-soft pointer-coarse:size-11';

/** Zoom and fit for whoever has no wheel. */
export function SheetTools() {
  const board = useBoard();
  const zoom = (factor: number) => {
    const sheet = board.sheet();
    if (sheet === null) return;
    const { x, y, w, h } = sheet.plan.box;
    board.lay(zoomSheet(sheet, factor, [x + w / 2, y + h / 2]));
  };
  const tools = [
    { label: texts.zoomIn, act: () => zoom(STEP), path: 'M8 3v10M3 8h10' },
    { label: texts.zoomOut, act: () => zoom(1 / STEP), path: 'M3 8h10' },
    { label: texts.fit, act: () => board.fit(), path: 'M2.5 6V2.5H6M10 2.5h3.5V6M13.5 10v3.5H10M6 13.5H2.5V10' },
  ];
  return (
    <div className="absolute top-8 left-3 z-10 flex flex-col gap-1">
      {tools.map(({ label, act, path }) => (
        <button key={label} type="button" aria-label={label} title={label} onClick={act} className={BUTTON}>
          <Icon>
            <path d={path} />
          </Icon>
        </button>
      ))}
    </div>
  );
}
