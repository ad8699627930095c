/** Every writer prints its numbers through here: four decimals at most, never "-0", never an exponent. */
export function fixed(value: number): string {
  if (!Number.isFinite(value) || Math.abs(value) >= 1e9) throw new RangeError(`cannot print ${value} on a plan`);
  return String(Math.round(value * 1e4) / 1e4 + 0);
}
