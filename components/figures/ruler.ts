// Ticks of a steel rule over a stretch of millimetres.

const STEPS_MM = [1, 2, 5, 10, 20, 50, 100, 200, 500, 1000, 2000];

export interface Ruler {
  readonly minor: readonly number[];
  readonly major: readonly number[];
}

const multiples = (from: number, to: number, step: number): number[] => {
  const first = Math.ceil(from / step);
  const count = Math.floor(to / step) - first + 1;
  return Array.from({ length: Math.max(count, 0) }, (_, index) => (first + index) * step + 0);
};

/** Numbered ticks no more than `most` in all, and plain ticks five to a numbered one. Throws RangeError for an empty stretch. */
export function ruler(fromMm: number, toMm: number, most = 9): Ruler {
  if (!(toMm > fromMm) || !Number.isFinite(toMm - fromMm))
    throw new RangeError(`a rule needs from < to, got ${fromMm} to ${toMm}`);
  const step = STEPS_MM.find((each) => multiples(fromMm, toMm, each).length <= most) ?? (toMm - fromMm) / most;
  return { major: multiples(fromMm, toMm, step), minor: multiples(fromMm, toMm, step / 5) };
}
