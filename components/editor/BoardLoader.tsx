'use client';

import dynamic from 'next/dynamic';
import type { BoardProps } from './Board';
import { BoardWaiting } from './BoardWaiting';

// The canvas, the worker and this browser's store exist only in a browser.
const LoadedBoard = dynamic(() => import('./Board').then(({ Board }) => Board), { ssr: false, loading: BoardWaiting });

/** The board, fetched when the page is in a browser. */
export const BoardLoader = (props: BoardProps) => <LoadedBoard {...props} />;
