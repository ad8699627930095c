import { type Problem, type Result, refuse } from '@/lib/numerics/result';
import { texts } from '@/lib/text/en/figures';
import type { VerdictBand } from './bands';
import type { FigureId } from './table/entry';
import type { FigureValue, Verdict } from './types';

/** Some of the figures; each part of the analysis gives its own. */
export type FigureSet = Partial<Record<FigureId, FigureValue>>;

type Extras = Omit<FigureValue, 'value' | 'problem'>;

/** A figure that could be worked out. A number that is not finite is never shown: it becomes a problem that says so. */
export function known(value: number, extras: Extras = {}): FigureValue {
  if (Number.isFinite(value)) return { value, ...extras };
  return missing({ code: 'figure-not-finite', path: '', message: texts.problems.notFinite });
}

/** A figure that could not be worked out, and why. */
export const missing = (problem: Problem): FigureValue => ({ value: null, problem });

/** A figure that this layout does not have: nothing is wrong. */
export const doesNotApply = (message: string): FigureValue =>
  missing({ code: 'does-not-apply', path: 'surfaces', message });

/** The same reason for several figures. */
export const allMissing = (ids: readonly FigureId[], problem: Problem): FigureSet =>
  Object.fromEntries(ids.map((id) => [id, missing(problem)]));

/** The first problem of a refusal, for a figure to carry; the whole list goes with the figures. */
export function firstProblem(result: { readonly problems: readonly Problem[] }): Problem {
  const [first] = result.problems;
  if (!first) throw new RangeError('a refusal without a problem');
  return first;
}

/** Refuses a value that is not positive, or not finite, as a problem rather than as a fault. */
export const positive = (value: number, problem: Problem): Result<number> =>
  Number.isFinite(value) && value > 0 ? { ok: true, value } : refuse(problem);

export interface BandWords {
  readonly veryLow: string;
  readonly low: string;
  readonly good: string;
  readonly high: string;
  readonly veryHigh: string;
}

/** Where a value lies in its band, in words. */
export function verdictOf(
  value: number,
  { good, watch }: VerdictBand,
  words: BandWords,
): { level: Verdict; words: string } {
  if (value < watch[0]) return { level: 'bad', words: words.veryLow };
  if (value < good[0]) return { level: 'watch', words: words.low };
  if (value <= good[1]) return { level: 'good', words: words.good };
  if (value <= watch[1]) return { level: 'watch', words: words.high };
  return { level: 'bad', words: words.veryHigh };
}
