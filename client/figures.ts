import { wrap } from 'comlink';
import type { Corrections } from '@/lib/aero/corrections';
import type { Airframe } from '@/lib/airframe/schema/airframe';
import type { Figures } from '@/lib/figures/types';
import type { FiguresWorker, TimedFigures } from '@/workers/figures.worker';
import { latestWins } from './latestWins';

export interface FiguresJob {
  readonly airframe: Airframe;
  readonly depth: 'live' | 'full';
  readonly corrections: Corrections;
}

export interface FiguresSource {
  ask(job: FiguresJob): void;
  stop(): void;
}

export interface FiguresListener {
  readonly show: (figures: Figures, job: FiguresJob, ms: number) => void;
  readonly failed: (error: unknown, job: FiguresJob) => void;
}

/** Starts the worker that computes figures. Ask as often as you like: one job runs, the newest waits. */
export function figuresSource({ show, failed }: FiguresListener): FiguresSource {
  const worker = new Worker(new URL('../workers/figures.worker.ts', import.meta.url), { type: 'module' });
  const remote = wrap<FiguresWorker>(worker);
  // A worker that cannot load answers no call at all, so its own error event has to end the waiting.
  let fault: Error | null = null;
  let endWaiting: (error: Error) => void = () => {};
  worker.addEventListener('error', (event) => {
    fault = new Error(event.message || 'the figures worker did not start');
    endWaiting(fault);
  });
  const run = ({ airframe, depth, corrections }: FiguresJob) =>
    new Promise<TimedFigures>((resolve, reject) => {
      if (fault !== null) return reject(fault);
      endWaiting = reject;
      remote.analyse(airframe, depth, corrections).then(resolve, reject);
    });
  const queue = latestWins<FiguresJob, TimedFigures>({
    run,
    show: ({ figures, ms }, job) => show(figures, job, ms),
    failed,
  });
  return {
    ask: queue.ask,
    stop() {
      queue.stop();
      worker.terminate();
    },
  };
}
