'use client';

import { type ReactNode, useEffect, useState } from 'react';
import { boardKey } from './handles/keySteps';
import { BoardHeader } from './panels/BoardHeader';
import { FiguresStrip } from './panels/FiguresStrip';
import { KeysHelp } from './panels/KeysHelp';
import { NumberSlip } from './panels/NumberSlip';
import { PartsStrip } from './panels/PartsStrip';
import { SaveNotices } from './panels/SaveNotices';
import { SheetArea } from './sheet/SheetArea';
import { useBoard } from './useBoard';

export interface BoardFrameProps {
  readonly title: string;
  readonly standing: ReactNode;
  readonly lead: ReactNode;
  readonly links: ReactNode;
  readonly savedWords?: string;
  /** Stands under the strip, for instance what a visitor has to know. */
  readonly note?: ReactNode;
}

/** True while the key belongs to what is being typed. */
const isTyping = ({ target }: KeyboardEvent): boolean =>
  target instanceof HTMLInputElement && target.dataset.typing === 'yes';
const isField = ({ target }: KeyboardEvent): boolean =>
  target instanceof HTMLInputElement || target instanceof HTMLTextAreaElement;

/** The board's keys, wherever the focus is. */
function useBoardKeys(onHelp: () => void): void {
  const board = useBoard();
  useEffect(() => {
    const onKey = (event: KeyboardEvent) => {
      const key = boardKey(event);
      if (key === null || isTyping(event) || (key === 'help' && isField(event))) return;
      event.preventDefault();
      if (key === 'help') return onHelp();
      if (board.readOnly) return;
      if (key === 'undo') board.undo();
      else board.redo();
    };
    window.addEventListener('keydown', onKey);
    return () => window.removeEventListener('keydown', onKey);
  }, [board, onHelp]);
}

/** The whole board: head, strip, sheet with its slip, and the figures at the foot. */
export function BoardFrame({ note, ...head }: BoardFrameProps) {
  const [keysOpen, setKeysOpen] = useState(false);
  const [openKeys] = useState(() => () => setKeysOpen(true));
  useBoardKeys(openKeys);
  return (
    <div className="grid min-h-dvh grid-cols-[minmax(0,1fr)] content-start md:h-dvh md:min-h-[680px] md:grid-rows-[auto_minmax(0,1fr)]">
      <BoardHeader {...head} onKeys={openKeys} />
      <main
        id="content"
        className="grid min-h-0 grid-cols-[minmax(0,1fr)] content-start md:grid-rows-[auto_auto_minmax(0,1fr)_auto]"
      >
        <PartsStrip />
        <div>
          {note}
          <SaveNotices />
        </div>
        <div className="relative grid min-h-0 grid-cols-[minmax(0,1fr)] md:block">
          <SheetArea />
          <NumberSlip />
        </div>
        <FiguresStrip />
      </main>
      <KeysHelp open={keysOpen} onClose={() => setKeysOpen(false)} />
    </div>
  );
}
