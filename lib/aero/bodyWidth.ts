import type { ResolvedAirframe } from '@/lib/airframe/resolved';
import type { Airframe } from '@/lib/airframe/schema/airframe';
import { CENTRE_PLANE_MM } from '@/lib/numerics/tolerances';

/**
 * Half of the largest width, in mm, that a body on the centre plane has between two places along x; 0 where there is none.
 * Widths run straight between a body's stations.
 */
export function bodyHalfWidthMm(airframe: Airframe, { places }: ResolvedAirframe, fromX: number, toX: number): number {
  let widest = 0;
  for (const body of airframe.bodies) {
    const at = places.get(body.id)?.at;
    if (!at || Math.abs(at[1]) > CENTRE_PLANE_MM) continue;
    for (const [i, b] of body.stations.entries()) {
      const a = body.stations[i - 1];
      if (!a) continue;
      const [x0, x1] = [at[0] + a.xMm, at[0] + b.xMm];
      const from = Math.max(fromX, Math.min(x0, x1));
      const to = Math.min(toX, Math.max(x0, x1));
      if (to < from || x1 === x0) continue;
      const widthAt = (x: number) => a.widthMm + ((b.widthMm - a.widthMm) * (x - x0)) / (x1 - x0);
      widest = Math.max(widest, widthAt(from), widthAt(to));
    }
  }
  return widest / 2;
}
