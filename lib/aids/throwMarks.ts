import type { EdgeMove, SetUpControl, StickEnd } from '@/lib/figures/setUp';
import { radFromDeg, type Vec2 } from '@/lib/numerics/vec';
import { texts } from '@/lib/text/en/aids';
import { fill } from '@/lib/text/fill';
import { trimmedDigits } from '@/lib/units/number';

const words = texts.throwGauge;

/** A line of a throw gauge: where the trailing edge stands, as an angle from the surface ahead of it, up or to port positive. */
export interface ThrowMark {
  readonly id: string;
  readonly turnDeg: number;
  readonly text: string;
}

/** Turns closer than this are one line, degrees: less than a blade or an eye tells apart. */
const SAME_DEG = 0.3;

/** As it is drawn on the gauge: up and to port positive. */
function signed({ way, deg }: EdgeMove): number {
  switch (way) {
    case 'up':
    case 'port':
      return deg;
    case 'down':
    case 'stbd':
      return -deg;
    case 'none':
      return 0;
  }
}

interface Found {
  readonly turnDeg: number;
  readonly sticks: StickEnd['stick'][];
  readonly move: string;
}

const moveText = ({ way, mm }: EdgeMove, rate: keyof typeof words.mark): string =>
  fill(words.mark[rate], { mm: trimmedDigits(mm, 1), way: words.ways[way] });

/** Neutral and every end of every stick at each rate, sorted; ends that fall on one line share it. */
export function throwMarks({ neutral, throws }: SetUpControl): ThrowMark[] {
  const zero = signed(neutral);
  const moves = throws.flatMap(({ stick, high, low }): Found[] => {
    const found = (move: EdgeMove, rate: keyof typeof words.mark): Found => ({
      turnDeg: zero + signed(move),
      sticks: [stick],
      move: moveText(move, rate),
    });
    return low === null ? [found(high, 'only')] : [found(high, 'high'), found(low, 'low')];
  });
  const sorted = [{ turnDeg: zero, sticks: [], move: words.neutral }, ...moves].sort((a, b) => a.turnDeg - b.turnDeg);
  const lines: Found[] = [];
  for (const one of sorted) {
    const last = lines.at(-1);
    if (last && one.turnDeg - last.turnDeg <= SAME_DEG) last.sticks.push(...one.sticks);
    else lines.push({ ...one, sticks: [...one.sticks] });
  }
  // With one stick alone there is nothing to tell apart.
  const several = new Set(throws.map(({ stick }) => stick)).size > 1;
  return lines.map(({ turnDeg, sticks, move }, i) => ({
    id: `throw-${i + 1}`,
    turnDeg,
    text:
      several && sticks.length > 0
        ? fill(words.withSticks, { sticks: sticks.map((stick) => words.sticks[stick]).join(', '), mark: move })
        : move,
  }));
}

/** The point at a distance from the hinge and an angle on the gauge. */
export const onArc = (radiusMm: number, turnDeg: number): Vec2 => [
  radiusMm * Math.cos(radFromDeg(turnDeg)),
  radiusMm * Math.sin(radFromDeg(turnDeg)),
];
