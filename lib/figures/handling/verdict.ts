import type { Judged } from '@/lib/flight/criteria';
import { texts } from '@/lib/text/en/figures/handling';
import { fill } from '@/lib/text/fill';
import type { FigureValue } from '../types';
import type { BandWords } from '../value';

type Verdicted = NonNullable<FigureValue['verdict']>;

/** A level of a published criterion in words: level 1 is good, level 2 wants watching, the rest is bad. */
export function levelVerdict({ level, side }: Judged, words: BandWords): Verdicted {
  if (level === 1) return { level: 'good', words: words.good };
  if (level === 2) return { level: 'watch', words: side === 'low' ? words.low : words.high };
  return { level: 'bad', words: side === 'low' ? words.veryLow : words.veryHigh };
}

/** Nothing is good whose band holds what is bad: then its weak end is told, and wants watching. */
export function mindingWeakEnd(middle: Verdicted, weak: Verdicted): Verdicted {
  if (middle.level !== 'good' || weak.level !== 'bad') return middle;
  return { level: 'watch', words: fill(texts.verdicts.weakEnd, { words: weak.words }) };
}
