import { expose } from 'comlink';
import type { Corrections } from '@/lib/aero/corrections';
import type { Airframe } from '@/lib/airframe/schema/airframe';
import { analyse } from '@/lib/figures/analyse';
import { newMemory } from '@/lib/figures/memory';
import type { Figures } from '@/lib/figures/types';

/** Figures with the time the worker spent on them, ms. */
export interface TimedFigures {
  readonly figures: Figures;
  readonly ms: number;
}

/** One board, one aircraft: what was worked out for the last call serves the next as far as the edit does not touch it. */
const memory = newMemory();

const figuresWorker = {
  analyse(airframe: Airframe, depth: 'live' | 'full', corrections: Corrections): TimedFigures {
    const begun = performance.now();
    const figures = analyse(airframe, { depth, corrections, memory });
    return { figures, ms: performance.now() - begun };
  },
};
export type FiguresWorker = typeof figuresWorker;

expose(figuresWorker);
