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

/** What to measure on a sheet's pages, one line each. A sheet on a single page has no joint to check. */
export function joinChecks({ drawing, pages }: TiledSheet): string[] {
  const { name: sheet, longest, lines } = drawing;
  const rows = lines.some(({ type }) => type === 'check') ? [] : [fill(words.checkNoSquare, { sheet })];
  if (pages.length < 2) return rows;
  if (longest) {
    rows.push(fill(words.checkPart, { sheet, part: longest.name, mm: fixedDigits(longest.lengthMm, 1) }));
  }
  const marks = [...new Map(pages.flatMap((page) => page.marks.map((mark) => [mark.letter, mark]))).values()];
  for (const pair of checkPairs(marks)) {
    const [a, b] = pair;
    rows.push(fill(words.checkMarks, { sheet, a: a.letter, b: b.letter, mm: fixedDigits(lengthOf(pair), 1) }));
  }
  return rows;
}
