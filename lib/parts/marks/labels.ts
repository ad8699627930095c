import { texts } from '@/lib/text/en/parts';
import { fill } from '@/lib/text/fill';
import type { PartLabel } from '../types';
import { holdsBox, type Room } from './room';

/** Cap heights tried, mm: large enough to read across a bench, down to what a printer still draws cleanly. */
const HEIGHTS_MM = [5, 4, 3, 2.4, 1.8] as const;
/** Width of a letter over its cap height, widest of the fonts used, rounded up. */
const LETTER_WIDTH = 0.9;
const LINE_PITCH = 1.8;

interface Count {
  readonly index: number;
  readonly of: number;
  readonly twoFaced: boolean;
}

/** Name of the part, which of how many it is, and whether it is turned over: inside the part, as large as there is room. A label's `at` is its middle. */
export function partLabels(room: Room, name: string, count: Count): PartLabel[] {
  const notes = [
    ...(count.of > 1 ? [fill(texts.marks.count, { index: count.index, of: count.of })] : []),
    ...(count.twoFaced ? [texts.marks.turnOver] : []),
  ];
  const lines = [name, ...(notes.length > 0 ? [notes.join(' · ')] : [])];
  const letters = Math.max(...lines.map((line) => line.length));
  for (const heightMm of HEIGHTS_MM) {
    const halfW = (letters * LETTER_WIDTH * heightMm) / 2 + 1;
    const halfH = (lines.length * LINE_PITCH * heightMm) / 2;
    for (const angleDeg of [0, 90]) {
      const place = room.places.find((here) => holdsBox(room, here, halfW, halfH, angleDeg));
      if (!place) continue;
      return lines.map((text, index) => {
        const down = (index - (lines.length - 1) / 2) * LINE_PITCH * heightMm;
        const at =
          angleDeg === 0 ? ([place.at[0], place.at[1] - down] as const) : ([place.at[0] + down, place.at[1]] as const);
        return { at, text, heightMm, angleDeg };
      });
    }
  }
  return [];
}
