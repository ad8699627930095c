// Where a function of one variable is nothing, or least. Both keep the answer between two given places.

const MAX_STEPS = 200;

/**
 * A root of a continuous function between two places where its signs differ, to within `tolerance`; null when the signs are the same.
 * Regula falsi with the Illinois step (Dowell & Jarratt, BIT 11, 1971): the root stays bracketed, and an end that does not move counts
 * half. Throws RangeError when the function is not finite at an end.
 */
export function rootBetween(
  f: (x: number) => number,
  low: number,
  high: number,
  tolerance = 1e-9 * Math.max(Math.abs(low), Math.abs(high)),
): number | null {
  let [a, b] = [low, high];
  let [fa, fb] = [f(a), f(b)];
  if (!Number.isFinite(fa) || !Number.isFinite(fb)) throw new RangeError(`no finite value at ${low} or ${high}`);
  if (fa === 0) return a;
  if (fb === 0) return b;
  if (fa > 0 === fb > 0) return null;
  for (let step = 0; step < MAX_STEPS && Math.abs(b - a) > tolerance; step += 1) {
    // Every third step halves the bracket, so that it shrinks at both ends.
    const x = step % 3 === 2 ? (a + b) / 2 : b - (fb * (b - a)) / (fb - fa);
    const fx = f(x);
    if (fx === 0) return x;
    if (fx > 0 === fb > 0) fa /= 2;
    else [a, fa] = [b, fb];
    [b, fb] = [x, fx];
  }
  return (a + b) / 2;
}

/** Steps in which the lowest place is looked for before the golden section begins. */
const STEPS = 12;
const GOLDEN = (Math.sqrt(5) - 1) / 2;

/**
 * The place between two others where a function is least, to within `tolerance`. Looked for on twelve equal steps first and then by the
 * golden section (Kiefer, Proc. AMS 4, 1953) around the lowest of them, so a second, shallower dip between two steps does no harm.
 */
export function leastBetween(
  f: (x: number) => number,
  low: number,
  high: number,
  tolerance = 1e-5 * (high - low),
): number {
  if (!(high >= low)) throw new RangeError(`nothing lies between ${low} and ${high}`);
  const at = (i: number) => low + ((high - low) * i) / STEPS;
  let best = 0;
  let least = Number.POSITIVE_INFINITY;
  for (let i = 0; i <= STEPS; i += 1) {
    const value = f(at(i));
    if (value < least) [best, least] = [i, value];
  }
  let [a, b] = [at(Math.max(0, best - 1)), at(Math.min(STEPS, best + 1))];
  let [c, d] = [b - GOLDEN * (b - a), a + GOLDEN * (b - a)];
  let [fc, fd] = [f(c), f(d)];
  while (b - a > tolerance) {
    if (fc < fd) [b, d, fd, c] = [d, c, fc, d - GOLDEN * (d - a)];
    else [a, c, fc, d] = [c, d, fd, c + GOLDEN * (b - c)];
    [fc, fd] = [f(c), f(d)];
  }
  return (a + b) / 2;
}
