'use client';

import type { ReactNode } from 'react';
import { Icon } from '@/components/ui/icons';
import { canRedo, canUndo } from '@/lib/airframe/history';
import { header as texts } from '@/lib/text/en/board';
import { shell } from '@/lib/text/en/pages';
import { fill } from '@/lib/text/fill';
import { useBoard, useBoardState } from '../useBoard';
import { downloadAirframe } from './download';
import { SaveLine } from './SaveLine';

const TOOL =
  'inline-flex min-h-8 items-center gap-1.5 rounded-cut px-2 text-sm text-ink hover:bg-board disabled:cursor-not-allowed disabled:opacity-45 pointer-coarse:min-h-11';

const UNDO_PATH = 'M6.5 3 3 6.5 6.5 10M3.5 6.5H9a3.75 3.75 0 0 1 0 7.5H6';

const Arrow = ({ mirrored = false }: { readonly mirrored?: boolean }) => (
  <Icon>
    <path d={UNDO_PATH} transform={mirrored ? 'translate(16 0) scale(-1 1)' : undefined} />
  </Icon>
);

interface BoardHeaderProps {
  readonly title: string;
  /** Where this draft stands: its last revision, or that it is read only. */
  readonly standing: ReactNode;
  readonly lead: ReactNode;
  readonly links: ReactNode;
  readonly savedWords?: string;
  readonly onKeys: () => void;
}

/** Above the strip: name, where the draft stands, saving, undo and redo, units, and the ways on from here. */
export function BoardHeader({ title, standing, lead, links, savedWords, onKeys }: BoardHeaderProps) {
  const board = useBoard();
  const undoable = useBoardState((state) => canUndo(state.history));
  const redoable = useBoardState((state) => canRedo(state.history));
  const system = useBoardState((state) => state.system);
  const other = system === 'metric' ? 'imperial' : 'metric';
  return (
    <header className="relative flex flex-wrap items-center gap-x-4 gap-y-1 border-b border-rule bg-paper px-3 py-1">
      <a href="#content" className="sr-only focus:not-sr-only">
        {shell.skip}
      </a>
      <div className="flex min-w-0 flex-wrap items-baseline gap-x-3">
        {lead}
        <h1 className="min-w-0 text-lg">{title}</h1>
        <span className="text-sm text-ink-soft">{standing}</span>
      </div>
      <SaveLine words={savedWords} />
      <div className="ml-auto flex flex-wrap items-center gap-x-1">
        {board.readOnly ? null : (
          <>
            <button type="button" className={TOOL} disabled={!undoable} onClick={board.undo}>
              <Arrow />
              {texts.undo}
            </button>
            <button type="button" className={TOOL} disabled={!redoable} onClick={board.redo}>
              <Arrow mirrored />
              {texts.redo}
            </button>
          </>
        )}
        <button
          type="button"
          className={`${TOOL} figure`}
          aria-label={fill(texts.units, { system: texts[system], other: texts[other] })}
          onClick={() => board.setSystem(other)}
        >
          {texts[system]}
        </button>
        <button type="button" className={TOOL} onClick={onKeys}>
          {texts.keys}
        </button>
        <button type="button" className={TOOL} onClick={() => downloadAirframe(board.store.getState().history.present)}>
          {texts.download}
        </button>
        {links}
      </div>
    </header>
  );
}
