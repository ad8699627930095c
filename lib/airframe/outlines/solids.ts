import { convexHull } from '@/lib/geometry/hull';
import { add3, cross3, length3, scale3, sub3, type Vec2, type Vec3 } from '@/lib/numerics/vec';
import type { ResolvedBoom } from '../resolved';
import type { Airframe } from '../schema/airframe';
import type { Drive, Item } from '../schema/equipment';
import type { Body, Boom, Gear } from '../schema/fuselage';
import { motorCentre, thrustDirection } from '../thrust';
import { boxCorners, onSides, type View, type ViewOutline } from './view';

const CIRCLE_POINTS = 48;
/** Width of a foam wheel as a share of its diameter; for the drawing only. Common practice, no source. */
const WHEEL_WIDTH_SHARE = 0.3;
/** How large a skid, keel or hook without a size of its own is drawn, mm. */
const SMALL_MM = 6;

/** A body: its stations' widths in plan, its outline or tops and bottoms from the side, its largest frames from the front. */
export function bodyOutline(view: View, body: Body, origin: Vec3): ViewOutline {
  const base = { elementId: body.id, key: body.id, kind: 'body', side: 'centre', closed: true } as const;
  const [x, y, z] = origin;
  const { stations } = body;
  if (view === 'plan') {
    const stbd = stations.map((s): Vec2 => [x + s.xMm, y + s.widthMm / 2]);
    const port = stations.map((s): Vec2 => [x + s.xMm, y - s.widthMm / 2]).reverse();
    return { ...base, points: [...stbd, ...port] };
  }
  if (view === 'front') {
    const frames = stations.flatMap(({ widthMm, topMm, bottomMm }): Vec2[] =>
      [-0.5, 0.5].flatMap((side): Vec2[] => [
        [y + side * widthMm, z + topMm],
        [y + side * widthMm, z + bottomMm],
      ]),
    );
    return { ...base, points: convexHull(frames) };
  }
  if (body.outline) return { ...base, points: body.outline.map(([ox, oz]): Vec2 => [x + ox, z + oz]) };
  const top = stations.map((s): Vec2 => [x + s.xMm, z + s.topMm]);
  const bottom = stations.map((s): Vec2 => [x + s.xMm, z + s.bottomMm]).reverse();
  return { ...base, points: [...top, ...bottom] };
}

/** A boom as its tube stands: a slender box from fore to aft end. */
export function boomOutlines(view: View, boom: Boom, { fore, aft }: ResolvedBoom, airframe: Airframe): ViewOutline[] {
  const [width, height] = airframe.tubes.find(({ id }) => id === boom.tubeId)?.outerMm ?? [0, 0];
  const along = scale3(sub3(aft, fore), 0.5);
  const level: Vec3 = [-along[1], along[0], 0];
  const across = scale3(level, width / 2 / length3(level));
  const upward = cross3(along, across);
  const up = scale3(upward, height / 2 / length3(upward));
  const base = { elementId: boom.id, key: boom.id, kind: 'boom', closed: true } as const;
  return onSides(base, boom.mirrored, view, boxCorners(add3(fore, along), [along, across, up]), true);
}

/** Two unit vectors across a direction: one level, one upward. */
function across(direction: Vec3): readonly [level: Vec3, up: Vec3] {
  const level: Vec3 = [-direction[1], direction[0], 0];
  const unit = scale3(level, -1 / length3(level));
  return [unit, cross3(unit, direction)];
}

/** A drive: the propeller's or fan's disc as a line (a circle from the front) and its motor as a box. */
export function driveOutlines(view: View, drive: Drive, disc: Vec3): ViewOutline[] {
  const base = { elementId: drive.id, key: drive.id, kind: 'drive' } as const;
  const radius = (drive.kind === 'propeller' ? drive.propeller.diameterMm : drive.fan.diameterMm) / 2;
  const direction = thrustDirection(drive);
  const [level, up] = across(direction);
  const round = Array.from({ length: CIRCLE_POINTS }, (_, index): Vec3 => {
    const turn = (2 * Math.PI * index) / CIRCLE_POINTS;
    return add3(disc, add3(scale3(level, radius * Math.cos(turn)), scale3(up, radius * Math.sin(turn))));
  });
  const axis = view === 'plan' ? level : up;
  const line = [add3(disc, scale3(axis, radius)), sub3(disc, scale3(axis, radius))];
  const { lengthMm, diameterMm } = drive.motor;
  const halves = [scale3(direction, lengthMm / 2), scale3(level, diameterMm / 2), scale3(up, diameterMm / 2)] as const;
  return [
    ...onSides({ ...base, closed: view === 'front' }, drive.mirrored, view, view === 'front' ? round : line),
    ...onSides({ ...base, closed: true }, drive.mirrored, view, boxCorners(motorCentre(drive, disc), halves), true),
  ];
}

/** An item as its box about its centre. */
export function itemOutlines(view: View, item: Item, at: Vec3): ViewOutline[] {
  const [length, width, height] = item.sizeMm;
  const corners = boxCorners(at, [
    [length / 2, 0, 0],
    [0, width / 2, 0],
    [0, 0, height / 2],
  ]);
  return onSides({ elementId: item.id, key: item.id, kind: 'item', closed: true }, false, view, corners, true);
}

/** Landing gear: a wheel about its axle (the mount), round from the side; anything else as a small box. */
export function gearOutlines(view: View, gear: Gear, at: Vec3): ViewOutline[] {
  const base = { elementId: gear.id, key: gear.id, kind: 'gear', closed: true } as const;
  const diameter = gear.wheelMm ?? SMALL_MM;
  if (gear.wheelMm !== undefined && view === 'side') {
    const round = Array.from({ length: CIRCLE_POINTS }, (_, index): Vec3 => {
      const turn = (2 * Math.PI * index) / CIRCLE_POINTS;
      return add3(at, [(diameter / 2) * Math.cos(turn), 0, (diameter / 2) * Math.sin(turn)]);
    });
    return onSides(base, gear.mirrored, view, round);
  }
  const width = gear.wheelMm === undefined ? SMALL_MM : diameter * WHEEL_WIDTH_SHARE;
  const corners = boxCorners(at, [
    [diameter / 2, 0, 0],
    [0, width / 2, 0],
    [0, 0, diameter / 2],
  ]);
  return onSides(base, gear.mirrored, view, corners, true);
}
