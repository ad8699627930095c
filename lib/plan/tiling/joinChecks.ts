import type { Vec2 } from '@/lib/numerics/vec';
import { plan } from '@/lib/text/en/plan';
import { fill } from '@/lib/text/fill';
import { fixedDigits } from '@/lib/units/number';
import type { Mark } from './marks';
import type { TiledSheet } from './tileSheets';

const words = plan.cover;

type Pair = readonly [Mark, Mark];

const between = ([a, b]: Pair): Vec2 => [b.at[0] - a.at[0], b.at[1] - a.at[1]];
const lengthOf = (pair: Pair): number => Math.hypot(...between(pair));

/** The two marks farthest apart, and the pair that lies most across it: together they show a stretch and a skew. */
export function checkPairs(marks: readonly Mark[]): Pair[] {
  const pairs = marks.flatMap((a, i) => marks.slice(i + 1).map((b): Pair => [a, b]));
  const best = (score: (pair: Pair) => number): Pair | null =>
    pairs.reduce<Pair | null>((most, pair) => (most && score(most) >= score(pair) ? most : pair), null);
  const long = best(lengthOf);
  if (!long) return [];
  const [ux, uy] = between(long).map((v) => v / lengthOf(long));
  const across = (pair: Pair): number => {
    const [x, y] = between(pair);
    return Math.abs(x * (uy ?? 0) - y * (ux ?? 0));
  };
  const wide = best(across);
  return wide && across(wide) > 50 ? [long, wide] : [long];
}

/** What to measure on a sheet once its pages are joined, one line each; a sheet on a single page needs no such check. */
export function joinChecks({ drawing: { name: sheet, longest }, pages }: TiledSheet): string[] {
  if (pages.length < 2) return [];
  const marks = [...new Map(pages.flatMap((page) => page.marks.map((mark) => [mark.letter, mark]))).values()];
  const lines = checkPairs(marks).map((pair) =>
    fill(words.checkMarks, { sheet, a: pair[0].letter, b: pair[1].letter, mm: fixedDigits(lengthOf(pair), 1) }),
  );
  if (!longest) return lines;
  return [fill(words.checkPart, { sheet, part: longest.name, mm: fixedDigits(longest.lengthMm, 1) }), ...lines];
}
