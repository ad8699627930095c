import type { Vec2 } from '@/lib/numerics/vec';
import { holdsBox, type Room } from '@/lib/parts/marks/room';
import type { PartLabel } from '@/lib/parts/types';

/** Cap heights tried, mm. */
const LEAST_HEIGHT_MM = 1.8;
const HEIGHTS_MM = [4, 3, 2.4, LEAST_HEIGHT_MM] as const;
/** Width of a letter over its cap height, rounded up. */
const LETTER_WIDTH = 0.9;
const LINE_PITCH = 1.8;

/** A block of lines about a place; `at` of each is its middle. */
function block(lines: readonly string[], [x, y]: Vec2, heightMm: number, angleDeg: 0 | 90): PartLabel[] {
  return lines.map((text, index) => {
    const down = (index - (lines.length - 1) / 2) * LINE_PITCH * heightMm;
    return { at: angleDeg === 0 ? [x, y - down] : [x + down, y], text, heightMm, angleDeg };
  });
}

/**
 * The lines of a piece's label, inside it and as large as there is room for. At a wanted place, or where there is room for none, all of them
 * stand on one point, in the latter case the deepest: a drawing finds places of its own, and lists in its key what has none.
 */
export function labelsIn(room: Room, lines: readonly string[], wanted?: Vec2): PartLabel[] {
  if (wanted) return lines.map((text) => ({ at: wanted, text, heightMm: LEAST_HEIGHT_MM, angleDeg: 0 }));
  const letters = Math.max(...lines.map((line) => line.length));
  for (const heightMm of HEIGHTS_MM) {
    const halfW = (letters * LETTER_WIDTH * heightMm) / 2 + 1;
    const halfH = (lines.length * LINE_PITCH * heightMm) / 2;
    for (const angleDeg of [0, 90] as const) {
      const place = room.places.find((here) => holdsBox(room, here, halfW, halfH, angleDeg));
      if (place) return block(lines, place.at, heightMm, angleDeg);
    }
  }
  const [deepest] = room.places;
  return deepest ? lines.map((text) => ({ at: deepest.at, text, heightMm: LEAST_HEIGHT_MM, angleDeg: 0 })) : [];
}
