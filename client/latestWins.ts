// One job at a time, and only the newest waiting: what a hand drags faster than the worker computes is dropped in the
// middle, never at the end, and an answer to an older input is never shown after a newer one.

export interface LatestWins<I> {
  /** Asks for this input to be worked out; replaces whatever is still waiting. */
  ask(input: I): void;
  /** Forgets what waits and ignores what runs. */
  stop(): void;
}

export interface LatestWinsHooks<I, O> {
  readonly run: (input: I) => Promise<O>;
  readonly show: (output: O, input: I) => void;
  readonly failed: (error: unknown, input: I) => void;
}

/** Makes a queue that runs one job and keeps one waiting. Jobs run in the order asked, so what is shown only gets newer. */
export function latestWins<I, O>({ run, show, failed }: LatestWinsHooks<I, O>): LatestWins<I> {
  let running = false;
  let stopped = false;
  let waiting: { readonly input: I } | null = null;

  const next = (): void => {
    if (running || stopped || waiting === null) return;
    const { input } = waiting;
    waiting = null;
    running = true;
    run(input)
      .then(
        (output) => {
          if (!stopped) show(output, input);
        },
        (error: unknown) => {
          if (!stopped) failed(error, input);
        },
      )
      .finally(() => {
        running = false;
        next();
      });
  };

  return {
    ask(input) {
      waiting = { input };
      next();
    },
    stop() {
      stopped = true;
      waiting = null;
    },
  };
}
