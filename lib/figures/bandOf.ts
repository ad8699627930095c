/** A band that holds all of these values: ends of a span do not always lie on both sides of what they are ends of. */
export const bandOf = (cause: string, ...values: readonly number[]) => ({
  low: Math.min(...values),
  high: Math.max(...values),
  cause,
});
