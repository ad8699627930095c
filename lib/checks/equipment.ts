import type { Drive, Item } from '@/lib/airframe/schema/equipment';
import { motorCentre } from '@/lib/airframe/thrust';
import { add3, length3, mirror3, scale3, sub3, type Vec3 } from '@/lib/numerics/vec';
import type { Context } from './context';
import { type Box, boxAbout } from './geometry/box';
import { FAN_LIP_MM } from './practice';

// Boxes of what is built in.

/** Something with a size: a pack, servo, controller or receiver as its box, a motor or fan as the box about it. */
export interface Boxed {
  readonly id: string;
  readonly kind: Item['kind'] | 'motor';
  readonly box: Box;
}

/** Horns, rods, ballast and the like are masses at a place: their size is no thing that stands in the way. */
const HAS_SHAPE: ReadonlySet<Item['kind']> = new Set(['pack', 'controller', 'servo', 'receiver']);

const itemBoxed = (context: Context, { id, kind, sizeMm }: Item): Boxed => ({
  id,
  kind,
  box: boxAbout(context.placeOf(id), sizeMm),
});

/** The box about a round thing of a length along an axis. */
function roundBox(from: Vec3, to: Vec3, diameterMm: number): Box {
  const along = sub3(to, from);
  const length = length3(along);
  const size = (index: 0 | 1 | 2): number => {
    const lean = along[index] / length;
    return Math.abs(along[index]) + diameterMm * Math.sqrt(Math.max(0, 1 - lean * lean));
  };
  return boxAbout(scale3(add3(from, to), 0.5), [size(0), size(1), size(2)]);
}

function driveBoxed(context: Context, drive: Drive): Boxed[] {
  const disc = context.placeOf(drive.id);
  const half = sub3(motorCentre(drive, disc), disc);
  const lip = drive.kind === 'ductedFan' ? -FAN_LIP_MM.value / length3(half) : 0;
  const diameterMm = drive.kind === 'ductedFan' ? drive.fan.diameterMm : drive.motor.diameterMm;
  const ends = [add3(disc, scale3(half, lip)), add3(disc, scale3(half, 2))] as const;
  const box = roundBox(ends[0], ends[1], diameterMm);
  const stbd: Boxed = { id: drive.id, kind: 'motor', box };
  if (!drive.mirrored) return [stbd];
  const port = roundBox(mirror3(ends[0]), mirror3(ends[1]), diameterMm);
  return [stbd, { ...stbd, box: port }];
}

/** Every box, packs first. */
export function boxedEquipment(context: Context): Boxed[] {
  const items = context.airframe.items
    .filter(({ kind, sizeMm }) => HAS_SHAPE.has(kind) && sizeMm.every((size) => size > 0))
    .map((item) => itemBoxed(context, item));
  const packs = items.filter(({ kind }) => kind === 'pack');
  const others = items.filter(({ kind }) => kind !== 'pack');
  return [...packs, ...context.airframe.drives.flatMap((drive) => driveBoxed(context, drive)), ...others];
}
