/** As many points of a run as a table shows. */
export const MOST_POINTS = 13;

/** No more than `MOST_POINTS` items, evenly picked; the first and the last stay. */
export function thinned<T>(run: readonly T[]): readonly T[] {
  if (run.length <= MOST_POINTS) return run;
  const step = (run.length - 1) / (MOST_POINTS - 1);
  const kept = new Set(Array.from({ length: MOST_POINTS }, (_, index) => Math.round(index * step)));
  return run.filter((_, index) => kept.has(index));
}
