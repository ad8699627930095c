declare global {
  interface Window {
    /** Only under ?perf=1: how often geometry and figures were worked out, and the time it took in all. */
    __recompute?: { n: number; ms: number };
  }
}

/** Counts recomputations where a measuring run can read them; elsewhere it does nothing. */
export function recomputeCounter(): (ms: number) => void {
  if (new URLSearchParams(window.location.search).get('perf') !== '1') return () => {};
  const counter = { n: 0, ms: 0 };
  window.__recompute = counter;
  return (ms) => {
    counter.n += 1;
    counter.ms += ms;
  };
}
