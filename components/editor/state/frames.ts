/** Work that runs before a frame is painted: input first (what the hand did since the last frame), then painters. */
export interface FrameLoop {
  /** Ends with the next frame: takes the newest of its kind only. */
  input(act: () => void): void;
  /** Asks for a frame. Asking from an input act joins the frame under way. */
  request(): void;
  /** Does waiting input at once: before a release is taken, the last move has to count. */
  flush(): void;
  /** Adds a painter; returns its removal. */
  add(painter: () => void): () => void;
  stop(): void;
}

type Schedule = (act: () => void) => number;

/** Makes a loop over a scheduler such as requestAnimationFrame, so that one frame sees one input and one painting. */
export function frameLoop(schedule: Schedule, unschedule: (handle: number) => void): FrameLoop {
  const painters = new Set<() => void>();
  let pending: (() => void) | null = null;
  let handle: number | null = null;
  let taking = false;

  const take = () => {
    const act = pending;
    pending = null;
    taking = true;
    try {
      act?.();
    } finally {
      taking = false;
    }
  };
  const frame = () => {
    handle = null;
    take();
    for (const painter of painters) painter();
  };
  const request = () => {
    if (handle === null && !taking) handle = schedule(frame);
  };

  return {
    input(act) {
      pending = act;
      request();
    },
    request,
    flush() {
      if (pending === null) return;
      take();
      request();
    },
    add(painter) {
      painters.add(painter);
      request();
      return () => painters.delete(painter);
    },
    stop() {
      if (handle !== null) unschedule(handle);
      handle = null;
      painters.clear();
    },
  };
}
