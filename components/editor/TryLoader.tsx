'use client';

import dynamic from 'next/dynamic';
import type { LayoutChoice } from '@/components/workshop/NewDesign';
import { BoardWaiting } from './BoardWaiting';

const LoadedTry = dynamic(() => import('./TryBoard').then(({ TryBoard }) => TryBoard), {
  ssr: false,
  loading: BoardWaiting,
});

/** The board for a visitor, fetched when the page is in a browser. */
export const TryLoader = ({ layouts }: { readonly layouts: readonly LayoutChoice[] }) => (
  <LoadedTry layouts={layouts} />
);
