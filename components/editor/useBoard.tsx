'use client';

import { createContext, type ReactNode, useContext, useEffect, useRef, useState } from 'react';
import { useStore } from 'zustand';
import { type Board, type BoardOptions, type BoardState, createBoard } from './state/board';

const BoardContext = createContext<Board | null>(null);

/** Makes one board for its children and runs it while they are on the page. */
export function BoardProvider({ options, children }: { readonly options: BoardOptions; readonly children: ReactNode }) {
  const [board] = useState(() => createBoard(options));
  useEffect(() => board.start(), [board]);
  return <BoardContext value={board}>{children}</BoardContext>;
}

export function useBoard(): Board {
  const board = useContext(BoardContext);
  if (board === null) throw new RangeError('no board around this component');
  return board;
}

/** A slice of the board's state. Pick what rests during a gesture, or the component renders with every move. */
export function useBoardState<T>(pick: (state: BoardState) => T): T {
  return useStore(useBoard().store, pick);
}

/** Runs with every frame that the board paints; compare before touching the page. */
export function usePainter(painter: () => void): void {
  const board = useBoard();
  const newest = useRef(painter);
  useEffect(() => {
    newest.current = painter;
    board.frames.request();
  });
  useEffect(() => board.frames.add(() => newest.current()), [board]);
}
