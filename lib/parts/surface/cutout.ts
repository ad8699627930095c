import { pointAt } from '@/lib/airframe/section';
import { counterClockwise } from '@/lib/geometry/polygons';
import type { Opening } from '../opening';
import { toPart } from '../shape/frame';
import { mirrorRing } from '../shape/ring';
import type { Run } from './run';

/** A surface's cutouts that begin on this piece, in its axes, counter-clockwise; both sides' when the piece spans the centre. */
export function cutoutRings(run: Run): Opening[] {
  const { surface } = run.surface;
  const from = run.panels[0]?.root.station ?? 0;
  const to = run.panels.at(-1)?.tip.station ?? 1;
  return surface.cutouts.flatMap(({ outline }, index) => {
    const stations = outline.map(([station]) => station);
    if (Math.max(...stations) <= from || Math.min(...stations) >= to) return [];
    const ring = [
      ...counterClockwise(outline.map(([station, at]) => toPart(run.frame, pointAt(run.surface, station, at)))),
    ];
    const path = `surfaces.${run.surface.index}.cutouts.${index}.outline`;
    return [{ path, rings: run.centre ? [ring, mirrorRing(ring)] : [ring] }];
  });
}
