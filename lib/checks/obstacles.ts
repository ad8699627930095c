import { controlWithin } from '@/lib/airframe/names';
import { hingeShares, pointAt } from '@/lib/airframe/resolve';
import type { ResolvedSurface } from '@/lib/airframe/resolved';
import type { Control } from '@/lib/airframe/schema/surface';
import { SHARED_THROW_DEG } from '@/lib/airframe/sticks';
import { add3, cross3, length3, lerp3, mirror3, scale3, sub3, type Vec3 } from '@/lib/numerics/vec';
import { texts } from '@/lib/text/en/checks';
import { fill } from '@/lib/text/fill';
import { hollows, outsideAt } from './bodySpace';
import type { Context } from './context';
import { boxedEquipment } from './equipment';
import type { Patch } from './geometry/nearest';
import { controlPatch, panelPatch } from './geometry/sheetPatch';

/** Something that a propeller could meet. */
export interface Obstacle {
  readonly elementId: string;
  readonly kind: 'boom' | 'surface' | 'control' | 'rod' | 'body' | 'item' | 'wheel';
  readonly name: string;
  readonly patch: Patch;
  /** Half of its thickness round the patch, mm. */
  readonly roundMm: number;
}

const LINE_GRID = [65];
const BODY_GRID = [33, 9, 9];
const BOX_GRID = [5, 5, 5];
const WHEEL_GRID = [25, 3, 3];
/** Width of a foam wheel as a share of its diameter. Common practice, no source. */
const WHEEL_WIDTH_SHARE = 0.3;

const mirrored = ({ grid, place }: Patch): Patch => ({
  grid,
  place: (at) => {
    const point = place(at);
    return point && mirror3(point);
  },
});

const bothSides = (obstacle: Obstacle, both: boolean): Obstacle[] =>
  both ? [obstacle, { ...obstacle, patch: mirrored(obstacle.patch) }] : [obstacle];

const line = (from: Vec3, to: Vec3): Patch => ({ grid: LINE_GRID, place: ([t = 0]) => lerp3(from, to, t) });

/** Boom tubes. */
export function boomObstacles({ airframe, resolved, nameOf }: Context): Obstacle[] {
  return airframe.booms.flatMap((boom) => {
    const placed = resolved.booms.find(({ boomId }) => boomId === boom.id);
    const tube = airframe.tubes.find(({ id }) => id === boom.tubeId);
    if (!placed || !tube) return [];
    const obstacle: Obstacle = {
      elementId: boom.id,
      kind: 'boom',
      name: fill(texts.things.boom, { name: nameOf(boom.id) }),
      patch: line(placed.fore, placed.aft),
      roundMm: Math.max(...tube.outerMm) / 2,
    };
    return bothSides(obstacle, boom.mirrored);
  });
}

/** Farthest that a control turns from its sheet's plane each way, degrees, neutral and all sticks together counted. */
function endTurns({ mix, throwsDeg, neutralDeg }: Control): readonly [upDeg: number, downDeg: number] {
  const shares = [mix.pitch, mix.roll, mix.yaw, mix.flap].map(Math.abs);
  const together = shares.reduce((sum, share) => sum + share, 0);
  const largest = Math.max(...shares);
  // A shared linkage has no more than this; one stick alone may.
  const most = (oneWay: number): number =>
    Math.min(oneWay * together, Math.max(oneWay * largest, SHARED_THROW_DEG.value));
  return [neutralDeg - most(throwsDeg.up), neutralDeg + most(throwsDeg.down)];
}

function rodObstacles(context: Context, surface: ResolvedSurface, control: Control, name: string): Obstacle[] {
  const { linkage } = control;
  const servo = linkage && context.resolved.places.get(linkage.servoItemId)?.at;
  if (!linkage || !servo || linkage.hornStation < control.from || linkage.hornStation > control.to) return [];
  const shares = hingeShares(control);
  const along = (linkage.hornStation - control.from) / (control.to - control.from);
  const share = shares[0] + (shares[1] - shares[0]) * along;
  const hinge = pointAt(surface, linkage.hornStation, share);
  const chord = sub3(pointAt(surface, linkage.hornStation, 1), pointAt(surface, linkage.hornStation, 0));
  const out = cross3(chord, sub3(pointAt(surface, control.to, 0), pointAt(surface, control.from, 0)));
  const tall = scale3(out, ((linkage.face === 'upper' ? 1 : -1) * linkage.hornMm) / length3(out));
  const horn = add3(hinge, tall);
  // The horn stands on the servo's own side; what rolls or steers has a fellow across.
  const port = surface.surface.mirrored && servo[1] < 0;
  const obstacle: Obstacle = {
    elementId: surface.surface.id,
    kind: 'rod',
    name: fill(texts.things.rod, { control: name }),
    patch: line(servo, port ? mirror3(horn) : horn),
    roundMm: linkage.rodMm / 2,
  };
  return bothSides(obstacle, surface.surface.mirrored && (control.mix.roll !== 0 || control.mix.yaw !== 0));
}

function surfaceObstacles(context: Context, resolved: ResolvedSurface): Obstacle[] {
  const { surface, panels } = resolved;
  const sheetOf = (id: string): number => context.airframe.materials.find((one) => one.id === id)?.thicknessMm ?? 0;
  const name = context.nameOf(surface.id);
  const base = { elementId: surface.id, roundMm: 0 } as const;
  const sheets = panels.map((panel): Obstacle => {
    const patch = panelPatch(resolved, panel, sheetOf(panel.panel.materialId));
    return { ...base, kind: 'surface', name: fill(texts.things.surface, { name }), patch };
  });
  const rods: Obstacle[] = [];
  const moved = surface.controls.flatMap((control): Obstacle[] => {
    const within = controlWithin(surface, control);
    const panel = panels.find(({ tip }) => control.from < tip.station) ?? panels.at(-1);
    rods.push(...rodObstacles(context, resolved, control, within));
    return endTurns(control).flatMap((turnDeg): Obstacle[] => {
      const patch = controlPatch(resolved, control, sheetOf(panel?.panel.materialId ?? ''), turnDeg);
      if (!patch) return [];
      return [{ ...base, kind: 'control', name: fill(texts.things.control, { control: within, name }), patch }];
    });
  });
  return [...[...sheets, ...moved].flatMap((one) => bothSides(one, surface.mirrored)), ...rods];
}

/** Wheels as round plates; where their legs run is not drawn. */
function wheelObstacles({ airframe, nameOf, placeOf }: Context): Obstacle[] {
  return airframe.gear.flatMap(({ id, wheelMm, mirrored: both }) => {
    if (wheelMm === undefined) return [];
    const [x, y, z] = placeOf(id);
    const place: Patch['place'] = ([around = 0, out = 0, across = 0]) => {
      const turn = 2 * Math.PI * around;
      const radius = (out * wheelMm) / 2;
      const side = (across - 0.5) * wheelMm * WHEEL_WIDTH_SHARE;
      return [x + radius * Math.cos(turn), y + side, z + radius * Math.sin(turn)];
    };
    const patch: Patch = { grid: WHEEL_GRID, place };
    return bothSides({ elementId: id, kind: 'wheel', name: nameOf(id), roundMm: 0, patch }, both);
  });
}

/** Everything but booms. */
export function otherObstacles(context: Context): Obstacle[] {
  const bodies = hollows(context).map((hollow): Obstacle => {
    const place: Patch['place'] = ([along = 0, across = 0, up = 0]) => {
      const x = hollow.fromX + (hollow.toX - hollow.fromX) * along;
      const cut = outsideAt(hollow, x);
      return cut && [x, cut.port + (cut.stbd - cut.port) * across, cut.bottom + (cut.top - cut.bottom) * up];
    };
    const { id } = hollow.body;
    const name = fill(texts.things.body, { name: context.nameOf(id) });
    return { elementId: id, kind: 'body', name, roundMm: 0, patch: { grid: BODY_GRID, place } };
  });
  const items = boxedEquipment(context)
    .filter(({ kind }) => kind !== 'motor')
    .map(({ id, box: { min, max } }): Obstacle => {
      const place: Patch['place'] = ([x = 0, y = 0, z = 0]) => [
        min[0] + (max[0] - min[0]) * x,
        min[1] + (max[1] - min[1]) * y,
        min[2] + (max[2] - min[2]) * z,
      ];
      return { elementId: id, kind: 'item', name: context.nameOf(id), roundMm: 0, patch: { grid: BOX_GRID, place } };
    });
  return [
    ...context.resolved.surfaces.flatMap((surface) => surfaceObstacles(context, surface)),
    ...bodies,
    ...items,
    ...wheelObstacles(context),
  ];
}
