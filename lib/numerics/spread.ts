/** A quantity with the span that its true value is expected in. */
export interface Spread {
  readonly value: number;
  readonly low: number;
  readonly high: number;
}
export type SpreadEnd = keyof Spread;

/** Works each end out by itself. */
export const spread = (at: (end: SpreadEnd) => number): Spread => ({
  value: at('value'),
  low: at('low'),
  high: at('high'),
});

/** A quantity without a span of its own. */
export const exactly = (value: number): Spread => ({ value, low: value, high: value });

/** Sum of quantities whose errors have nothing to do with each other: deviations add by their squares, each way for itself. */
export function independentSum(parts: readonly Spread[]): Spread {
  const value = parts.reduce((sum, part) => sum + part.value, 0);
  const off = (end: 'low' | 'high') => Math.hypot(...parts.map((part) => part[end] - part.value));
  return { value, low: value - off('low'), high: value + off('high') };
}
