import type { FigureValue } from './types';

/** What one cause may make of a value: where it may end; an end that has no value is null. */
type CauseEnds = readonly (number | null)[];

/**
 * Band of a value with several causes that have nothing to do with each other: what each may take off and add on goes in by its squares,
 * each way for itself (propagation of uncertainty, JCGM 100:2008, 5.1). Not lower than `least`, for what has a bottom. Left out when one
 * of the causes leaves no value.
 */
export function bandBySquares(
  value: number,
  causes: readonly CauseEnds[],
  cause: string,
  least = Number.NEGATIVE_INFINITY,
): Pick<FigureValue, 'band'> | undefined {
  let [down, up] = [0, 0];
  for (const ends of causes) {
    const all = [value];
    for (const end of ends) {
      if (end === null || !Number.isFinite(end)) return undefined;
      all.push(end);
    }
    down = Math.hypot(down, value - Math.min(...all));
    up = Math.hypot(up, Math.max(...all) - value);
  }
  return { band: { low: Math.max(Math.min(value, least), value - down), high: value + up, cause } };
}

/** Both ends of a value that may be out by a share either way. */
export const byShare = (value: number, share: number): CauseEnds => [value * (1 - share), value * (1 + share)];
