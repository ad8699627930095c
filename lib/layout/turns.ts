import type { Vec2 } from '@/lib/numerics/vec';
import { radFromDeg } from '@/lib/numerics/vec';
import type { Part } from '@/lib/parts/types';
import type { Placement, SheetStock } from './types';

const QUARTERS = [0, 90, 180, 270] as const;

/** An angle in [0, 360), rounded to a millionth of a degree so that equal turns compare equal. */
const wrapDeg = (deg: number): number => {
  const rounded = Math.round((((deg % 360) + 360) % 360) * 1e6) / 1e6;
  return rounded === 360 ? 0 : rounded;
};

/**
 * The turns, in degrees counter-clockwise, at which a part may lie on a sheet. A part that asks for grain on a sheet that
 * has it lies along the grain, either way round; everything else may lie in quarter turns.
 */
export function allowedTurns(part: Pick<Part, 'grainDeg'>, stock: Pick<SheetStock, 'grain'>): readonly number[] {
  if (part.grainDeg === null || stock.grain === 'none') return QUARTERS;
  const sheetGrainDeg = stock.grain === 'alongWidth' ? 0 : 90;
  const along = wrapDeg(sheetGrainDeg - part.grainDeg);
  return [along, wrapDeg(along + 180)].sort((a, b) => a - b);
}

/** Cosine and sine, exact for quarter turns: sin(180 deg) in floating point is not zero. */
export function turnOf(turnDeg: number): { readonly cos: number; readonly sin: number } {
  switch (wrapDeg(turnDeg)) {
    case 0:
      return { cos: 1, sin: 0 };
    case 90:
      return { cos: 0, sin: 1 };
    case 180:
      return { cos: -1, sin: 0 };
    case 270:
      return { cos: 0, sin: -1 };
  }
  const rad = radFromDeg(turnDeg);
  return { cos: Math.cos(rad), sin: Math.sin(rad) };
}

/** A point of a part, where the placement puts it on the sheet, mm. */
export function placePoint(point: Vec2, placement: Pick<Placement, 'turnDeg' | 'moveMm'>): Vec2 {
  const { cos, sin } = turnOf(placement.turnDeg);
  const [x, y] = point;
  return [cos * x - sin * y + placement.moveMm[0], sin * x + cos * y + placement.moveMm[1]];
}

/** A ring or path of a part, where the placement puts it on the sheet, mm. */
export function placePath(points: readonly Vec2[], placement: Pick<Placement, 'turnDeg' | 'moveMm'>): Vec2[] {
  const { cos, sin } = turnOf(placement.turnDeg);
  const [dx, dy] = placement.moveMm;
  return points.map(([x, y]) => [cos * x - sin * y + dx, sin * x + cos * y + dy]);
}
