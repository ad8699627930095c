import { expose } from 'comlink';
import type { Airframe } from '@/lib/airframe/schema/airframe';
import { analyse } from '@/lib/figures/analyse';
import type { Figures } from '@/lib/figures/types';

/** Figures with the time the worker spent on them, ms. */
export interface TimedFigures {
  readonly figures: Figures;
  readonly ms: number;
}

const figuresWorker = {
  analyse(airframe: Airframe, depth: 'live' | 'full'): TimedFigures {
    const begun = performance.now();
    const figures = analyse(airframe, { depth });
    return { figures, ms: performance.now() - begun };
  },
};
export type FiguresWorker = typeof figuresWorker;

expose(figuresWorker);
