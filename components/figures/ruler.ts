// Ticks of a steel rule over a stretch of millimetres, and of an axis over any stretch.

export interface Ruler {
  readonly minor: readonly number[];
  readonly major: readonly number[];
}

/** A multiple this close to an end of the stretch, in steps, lies on it: 0.6 is three times 0.2 though the machine says less. */
const ON_THE_END = 1e-9;

const multiples = (from: number, to: number, step: number): number[] => {
  const first = Math.ceil(from / step - ON_THE_END);
  const count = Math.floor(to / step + ON_THE_END) - first + 1;
  return Array.from({ length: Math.max(count, 0) }, (_, index) => (first + index) * step + 0);
};

const MANTISSAS = [1, 2, 5, 10, 20];

/** The smallest of 1, 2, 5 times a power of ten of which no more than `most` multiples lie on the stretch. */
function roundStep(from: number, to: number, most: number): number {
  const decade = 10 ** Math.floor(Math.log10((to - from) / most));
  const fits = MANTISSAS.map((mantissa) => mantissa * decade).find((step) => multiples(from, to, step).length <= most);
  return fits ?? 50 * decade;
}

function refuseEmpty(from: number, to: number): void {
  if (!(to > from) || !Number.isFinite(to - from)) throw new RangeError(`a rule needs from < to, got ${from} to ${to}`);
}

/** Numbered ticks no more than `most` in all, and plain ticks five to a numbered one. Throws RangeError for an empty stretch. */
export function ruler(fromMm: number, toMm: number, most = 9): Ruler {
  refuseEmpty(fromMm, toMm);
  const step = Math.max(1, roundStep(fromMm, toMm, most));
  return { major: multiples(fromMm, toMm, step), minor: multiples(fromMm, toMm, step / 5) };
}

export interface Ticks {
  readonly at: readonly number[];
  /** Decimals that tell one tick from the next. */
  readonly digits: number;
}

/** Ticks at round numbers on a stretch of any size, no more than `most`. Throws RangeError for an empty stretch. */
export function ticks(from: number, to: number, most: number): Ticks {
  refuseEmpty(from, to);
  const step = roundStep(from, to, most);
  return {
    at: multiples(from, to, step),
    digits: Math.min(12, Math.max(0, -Math.floor(Math.log10(step) + ON_THE_END))),
  };
}
