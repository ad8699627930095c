import { radFromDeg, type Vec2 } from '@/lib/numerics/vec';
import { texts } from '@/lib/text/en/parts';
import type { Face, Operation } from '../types';
import { holdsBox, type Room } from './room';

const LENGTHS_MM = [60, 40, 25, 12] as const;
const HEAD_MM = 3;

/** An arrow along the grain wanted, inside the part; none when the part is too small for one. */
export function grainArrow(room: Room, grainDeg: number, face: Face): Operation[] {
  const c = Math.cos(radFromDeg(grainDeg));
  const s = Math.sin(radFromDeg(grainDeg));
  for (const length of LENGTHS_MM) {
    // The label takes the deepest place; the arrow looks from the shallow end, so that the two keep apart.
    const place = room.places.findLast((here) => holdsBox(room, here, length / 2 + 1, HEAD_MM, grainDeg));
    if (!place) continue;
    const on = (x: number, y: number): Vec2 => [place.at[0] + c * x - s * y, place.at[1] + s * x + c * y];
    const tip = length / 2;
    const path = [on(-tip, 0), on(tip, 0), on(tip - HEAD_MM, HEAD_MM / 2), on(tip, 0), on(tip - HEAD_MM, -HEAD_MM / 2)];
    return [{ id: 'grain', kind: 'reference', path, closed: false, face, note: texts.marks.grain }];
  }
  return [];
}
