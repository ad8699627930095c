import { texts } from '@/lib/text/en/figures/trim';
import { fill } from '@/lib/text/fill';
import { fixedDigits } from '@/lib/units/number';
import { FLARE_LIFT_PCT, STALL_THROW_PCT, THROTTLE_PULL_G, THROTTLE_UNNOTICED_DEG, TRIM_THROW_PCT } from './trimBands';
import type { Verdict } from './types';

interface Judged {
  readonly level: Verdict;
  readonly words: string;
}

const { verdicts } = texts;

/** How much of the throw trim may take. */
export function trimVerdict(sharePct: number): Judged {
  const { watch, bad } = TRIM_THROW_PCT;
  if (sharePct > 100) return { level: 'bad', words: verdicts.trimNone };
  if (sharePct > bad.value) return { level: 'bad', words: fill(verdicts.trimBad, { limit: bad.value }) };
  if (sharePct > watch.value) return { level: 'watch', words: fill(verdicts.trimWatch, { limit: watch.value }) };
  return { level: 'good', words: verdicts.trimGood };
}

/** Shares of the up throw that trim the greatest lift and the flare's. */
export interface StallTrim {
  readonly stallPct: number;
  readonly flarePct: number;
  readonly stable: boolean;
}

const tooWeak = ({ flarePct }: StallTrim): boolean => flarePct > 100;
const tooStrong = ({ stallPct }: StallTrim): boolean => stallPct < STALL_THROW_PCT.value;

/** Whether the elevator can flare, and whether it can do too much. */
export function stallVerdict(found: StallTrim): Judged {
  const { stallPct, stable } = found;
  if (!stable) return { level: 'bad', words: verdicts.unstable };
  if (tooWeak(found)) return { level: 'bad', words: fill(verdicts.cannotFlare, { share: FLARE_LIFT_PCT.value }) };
  if (stallPct <= 0) return { level: 'bad', words: verdicts.stallsAtRest };
  if (tooStrong(found)) return { level: 'watch', words: verdicts.tooMuchThrow };
  return { level: 'good', words: stallPct > 100 ? verdicts.stallShort : verdicts.stallGood };
}

/** Nothing is good whose band holds what is bad: then its ends are told, and want watching. */
export function stallBandVerdict(found: StallTrim, ends: readonly StallTrim[]): Judged {
  const middle = stallVerdict(found);
  const judged = ends.map(stallVerdict);
  const bad = judged.find(({ level }) => level === 'bad');
  if (middle.level !== 'good' || !bad) return middle;
  const both = ends.some(tooStrong) && ends.some(tooWeak);
  return { level: 'watch', words: both ? verdicts.stallUnsure : fill(verdicts.stallWeakEnd, { words: bad.words }) };
}

/** What the throttle does to the trim. */
interface ThrottleTrim {
  /** From power off to full, trailing edge down positive. */
  readonly changeDeg: number;
  /** The same as a share of full stick, nose up positive. */
  readonly stickChange: number;
  /** The stick that holds it at full throttle. */
  readonly stick: number;
  /** What a degree more of downthrust adds to the change. */
  readonly perDownDeg: number;
  /** What the same change of the elevator would pull at cruise, g; `null` behind the manoeuvre point. */
  readonly pullG: number | null;
}

/** Judged like any trim, and by what it would pull before it is held; the words say which way, and whether downthrust helps. */
export function throttleVerdict({ changeDeg, stickChange, stick, perDownDeg, pullG }: ThrottleTrim): Judged {
  if (Math.abs(stick) > 1) return { level: 'bad', words: verdicts.throttleNotHeld };
  if (Math.abs(changeDeg) < THROTTLE_UNNOTICED_DEG.value) return { level: 'good', words: verdicts.throttleNone };
  const lessens = perDownDeg * changeDeg < 0;
  const noseUp = stickChange < 0;
  // More downthrust helps where it works against the change; less of it where it works with the change.
  const words = noseUp
    ? verdicts[lessens ? 'throttleUpMore' : 'throttleUpLess']
    : verdicts[lessens ? 'throttleDownMore' : 'throttleDownLess'];
  const told = fill(words, { deg: fixedDigits(Math.abs(changeDeg), 1) });
  const levels = [trimVerdict(Math.abs(100 * stickChange)).level, pullLevel(pullG)];
  const level = levels.includes('bad') ? 'bad' : levels.includes('watch') ? 'watch' : 'good';
  const kicks = pullG !== null && pullG > THROTTLE_PULL_G.watch.value;
  return { level, words: kicks ? fill(verdicts.throttleKicks, { told, g: fixedDigits(pullG, 1) }) : told };
}

function pullLevel(pullG: number | null): Verdict {
  if (pullG === null || pullG <= THROTTLE_PULL_G.watch.value) return 'good';
  return pullG > THROTTLE_PULL_G.bad.value ? 'bad' : 'watch';
}
