import type { Vec2 } from '@/lib/numerics/vec';
import { lineStyle, path } from './ink';

/** ISO/IEC 7810, ID-1: 85.60 x 53.98 mm (from memory); its corners are rounded by 2.88 to 3.48 mm, drawn at the middle. */
export const ID1_MM: Vec2 = [85.6, 53.98];
const CORNER_MM = 3.18;
const STEPS = 8;

/** The outline of a bank card with its lower left at a point, to lay a card on when there is no rule. */
export function card([x, y]: Vec2): string {
  const [w, h] = ID1_MM;
  const r = CORNER_MM;
  const centres: readonly Vec2[] = [
    [x + w - r, y + h - r],
    [x + r, y + h - r],
    [x + r, y + r],
    [x + w - r, y + r],
  ];
  const points = centres.flatMap(([cx, cy], quarter) =>
    Array.from({ length: STEPS + 1 }, (_, i): Vec2 => {
      const angle = ((quarter + i / STEPS) * Math.PI) / 2;
      return [cx + r * Math.cos(angle), cy + r * Math.sin(angle)];
    }),
  );
  return [lineStyle(0.2), path(points, true)].join('\n');
}
