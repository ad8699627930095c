import { subtractRings } from '@/lib/geometry/clipping';
import { counterClockwise, signedArea } from '@/lib/geometry/polygons';
import { add3, cross3, length3, scale3, sub3, type Vec2, type Vec3 } from '@/lib/numerics/vec';
import type { ResolvedControl, ResolvedPanel, ResolvedSurface } from '../resolved';
import type { Airframe } from '../schema/airframe';
import { pointAt } from '../section';
import { tippedPanel } from './tips';
import { flatOnSides, onSides, project, type View, type ViewOutline } from './view';

/** A panel that shows less of its face than this is seen edge on, and drawn as thick as its sheet. */
const EDGE_ON_SHARE = 0.2;

const corners = ({ root, tip }: ResolvedPanel): Vec3[] => [root.le, tip.le, tip.te, root.te];

const faceArea = (quad: readonly Vec3[]): number => {
  const [a, b, c, d] = quad;
  if (!a || !b || !c || !d) return 0;
  return length3(cross3(sub3(c, a), sub3(d, b))) / 2;
};

const edgeOn = (view: View, panel: ResolvedPanel): boolean => {
  const quad = corners(panel);
  const seen = Math.abs(signedArea(quad.map((point) => project(view, point))));
  return seen < EDGE_ON_SHARE * faceArea(quad);
};

/** Points of a flat piece on both faces of its sheet. */
const withThickness = (points: readonly Vec3[], panel: ResolvedPanel, thicknessMm: number): Vec3[] => {
  const { root, tip } = panel;
  const across = cross3(sub3(root.te, root.le), sub3(tip.le, root.le));
  const size = length3(across);
  if (size === 0) return [...points];
  const half = scale3(across, thicknessMm / 2 / size);
  return points.flatMap((point) => [add3(point, half), sub3(point, half)]);
};

const thickness = (airframe: Airframe, panel: ResolvedPanel): number =>
  airframe.materials.find(({ id }) => id === panel.panel.materialId)?.thicknessMm ?? 0;

/** A closed line of a surface's face in a view, with its cutouts: notches are part of it, holes are lines inside it. */
function opened(view: View, ring: readonly Vec3[], resolved: ResolvedSurface): { closed: boolean; points: Vec2[] }[] {
  const flat = ring.map((point) => project(view, point));
  const cutouts = resolved.surface.cutouts.map(({ outline }) =>
    counterClockwise(outline.map(([station, share]) => project(view, pointAt(resolved, station, share)))),
  );
  if (cutouts.length === 0) return [{ closed: true, points: flat }];
  return subtractRings([counterClockwise(flat)], cutouts).map((points) => {
    const [first] = points;
    const hole = signedArea(points) < 0;
    return hole && first ? { closed: false, points: [...points, first] } : { closed: true, points };
  });
}

/**
 * A surface's outline, its tip and its cutouts as they are cut: one line where its face is seen, a thick line per panel where it
 * stands edge on. A tip shape that does not fit is drawn square, as it is cut.
 */
export function surfaceOutlines(view: View, resolved: ResolvedSurface, airframe: Airframe): ViewOutline[] {
  const { surface, panels } = resolved;
  const base = { elementId: surface.id, key: surface.id, kind: 'surface' } as const;
  if (panels.every((panel) => edgeOn(view, panel))) {
    return panels.flatMap((panel, index) => {
      const points = index === panels.length - 1 ? tippedPanel(panel, surface.tip).flat() : corners(panel);
      const thick = withThickness(points, panel, thickness(airframe, panel));
      return onSides({ ...base, closed: true }, surface.mirrored, view, thick, true);
    });
  }
  const edgesOf = (panel: ResolvedPanel): readonly [le: readonly Vec3[], te: readonly Vec3[]] =>
    panel.index === panels.length - 1
      ? tippedPanel(panel, surface.tip)
      : [
          [panel.root.le, panel.tip.le],
          [panel.root.te, panel.tip.te],
        ];
  const ring = [
    ...panels.flatMap((panel) => edgesOf(panel)[0]),
    ...panels.flatMap((panel) => edgesOf(panel)[1]).reverse(),
  ];
  const distinct = ring.filter((point, index, all) => {
    const before = all[index - 1];
    return !before || length3(sub3(point, before)) > 1e-9;
  });
  return opened(view, distinct, resolved).flatMap(({ closed, points }) =>
    flatOnSides({ ...base, closed }, surface.mirrored, view, points),
  );
}

/** A control's outline from its hinge line to the trailing edge. */
export function controlOutlines(
  view: View,
  control: ResolvedControl,
  { surface, panels }: ResolvedSurface,
  airframe: Airframe,
): ViewOutline[] {
  const { inner, outer, hingeInner, hingeOuter } = control;
  const base = {
    elementId: surface.id,
    key: `${surface.id}/${control.control.id}`,
    kind: 'control',
    closed: true,
  } as const;
  const whole = control.control.kind === 'allMoving';
  const between = panels
    .filter(({ tip }) => tip.station > inner.station && tip.station < outer.station)
    .map(({ tip }) => tip.te);
  const fore = whole ? [inner.le, outer.le] : [hingeInner, hingeOuter];
  const ring = [...fore, outer.te, ...between.reverse(), inner.te];
  const panel = panels.find(({ tip }) => inner.station < tip.station);
  if (!panel || !panels.every((one) => edgeOn(view, one))) return onSides(base, surface.mirrored, view, ring);
  return onSides(base, surface.mirrored, view, withThickness(ring, panel, thickness(airframe, panel)), true);
}
