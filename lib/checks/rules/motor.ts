import { motorCentre } from '@/lib/airframe/thrust';
import { perimeter } from '@/lib/geometry/polygons';
import { add3, length3, scale3, sub3, type Vec3 } from '@/lib/numerics/vec';
import { texts } from '@/lib/text/en/checks';
import { fill } from '@/lib/text/fill';
import { STANDARD_GRAVITY } from '@/lib/units/factors';
import { bayAt, type Hollow, hollowAround, hollows, openingCentre, outsideAt, type Plate, plates } from '../bodySpace';
import { type Context, cm2, leastLevel, mm, result, whole } from '../context';
import { discsOf, type PropellerDrive } from '../geometry/disc';
import { AXIS_BODY_MM, MOTOR } from '../practice';
import type { CheckResult } from '../types';

interface Mounted {
  readonly drive: PropellerDrive;
  /** Middle of the motor's foot. */
  readonly foot: Vec3;
  readonly motor: Vec3;
  readonly hollow: Hollow;
  readonly firewall: Plate | null;
}

/** Box bodies on the shaft's line, with the firewall nearest to the motor's foot. */
function mountedIn(context: Context, drive: PropellerDrive): Mounted | null {
  const centre = context.placeOf(drive.id);
  const [disc] = discsOf(drive, centre, 0);
  if (!disc) return null;
  const behind = [0, 0.25, 0.5, 0.75, 1].map((share) => sub3(disc.foot, scale3(disc.axis, share * AXIS_BODY_MM.value)));
  const hollow = behind.map((point) => hollowAround(context, point)).find((found) => found !== null);
  if (!hollow) return null;
  const off = ({ fromX, toX }: Plate): number => Math.max(0, fromX - disc.foot[0], disc.foot[0] - toX);
  const near = plates(context, hollow)
    .filter((plate) => plate.former.role === 'firewall' && off(plate) <= MOTOR.firewallWithinMm.value)
    .sort((a, b) => off(a) - off(b));
  return { drive, foot: disc.foot, motor: motorCentre(drive, centre), hollow, firewall: near[0] ?? null };
}

/** Places that a driver comes in by: openings wide enough, and the open ends of the motor's own bay. */
function waysIn(context: Context, { hollow, motor }: Mounted): Vec3[] {
  const least = MOTOR.driverWideMm.value;
  const cut = hollow.body.openings
    .filter(({ purpose, fromX, toX, widthMm }) => purpose !== 'tube' && Math.min(toX - fromX, widthMm) >= least)
    .map((opening) => openingCentre(hollow, opening));
  const bay = bayAt(context, hollow, motor[0]);
  const ends = [...(bay.openFore ? [hollow.fromX] : []), ...(bay.openAft ? [hollow.toX] : [])];
  return [...cut, ...ends.map((x): Vec3 => [x, motor[1], motor[2]])];
}

function screws(context: Context, mounted: Mounted): CheckResult {
  const { drive, foot, motor, hollow } = mounted;
  const inside = hollows(context).some((one) => {
    const cut = outsideAt(one, motor[0]);
    return cut && motor[1] > cut.port && motor[1] < cut.stbd && motor[2] > cut.bottom && motor[2] < cut.top;
  });
  const limit = MOTOR.driverReachMm.value;
  const reaches = waysIn(context, mounted).map((way) => length3(sub3(way, foot)));
  const value = reaches.length > 0 ? Math.min(...reaches) : null;
  const said =
    value === null ? texts.words.screwsClosed : fill(texts.words.screwsNear, { mm: mm(value), limit: mm(limit) });
  const body = context.nameOf(hollow.body.id);
  return result('motor-screws', {
    elementId: drive.id,
    path: context.pathOf(drive.id),
    at: foot,
    level: !inside || (value !== null && value <= limit) ? 'ok' : 'watch',
    words: inside ? said : fill(texts.words.screwsOutside, { body }),
    ...(inside && value !== null ? { measured: { value, quantity: 'mm', most: limit } } : {}),
    fix: texts.rules['motor-screws'].fix,
    basis: MOTOR.driverReachMm.basis,
  });
}

/** Doublers on both sides that reach the firewall. */
function backed({ body, origin }: Hollow, { fromX, toX }: Plate): boolean {
  const within = MOTOR.doublerWithinMm.value;
  return (['port', 'stbd'] as const).every((side) =>
    body.doublers.some(
      (one) => one.face === side && origin[0] + one.fromX <= toX + within && origin[0] + one.toX >= fromX - within,
    ),
  );
}

/** Glue along a firewall's edges, mm2, from the part as it is cut. */
function glueMm2({ development }: Context, bodyId: string, { former, fromX, toX }: Plate): number {
  const part = development.parts.find(({ key }) => key.startsWith(`${bodyId}/${former.id}/`));
  return part ? perimeter(part.outline) * (toX - fromX) : 0;
}

function loadPath(context: Context, { drive, foot, hollow, firewall }: Mounted): CheckResult {
  const base = { elementId: drive.id, at: foot, fix: texts.rules['firewall-load-path'].fix };
  if (!firewall) {
    const words = fill(texts.words.firewallNone, { body: context.nameOf(hollow.body.id) });
    const { basis } = MOTOR.firewallWithinMm;
    return result('firewall-load-path', { ...base, path: `${hollow.path}.formers`, level: 'watch', words, basis });
  }
  const area = glueMm2(context, hollow.body.id, firewall);
  const massKg = (drive.motor.massG + drive.propeller.massG) / 1000;
  const load = (drive.statedThrustN ?? 0) + massKg * MOTOR.hardLandingG.value * STANDARD_GRAVITY;
  const need = load / MOTOR.glueMpa.value;
  const held = backed(hollow, firewall);
  const values = { area: cm2(area), need: cm2(need), load: whole(load) };
  return result('firewall-load-path', {
    ...base,
    at: add3(hollow.origin, [firewall.former.xMm, 0, foot[2] - hollow.origin[2]]),
    path: firewall.path,
    level: held ? 'ok' : leastLevel(area, need, 0),
    words: held ? fill(texts.words.firewallDoublers, values) : fill(texts.words.firewallGlue, values),
    measured: { value: area / 100, quantity: 'cm2', ...(held ? {} : { least: need / 100 }) },
    basis: MOTOR.glueMpa.basis,
  });
}

/** Motors on box bodies: whether their screws are reached, and what holds the firewall. */
export function motorRules(context: Context): CheckResult[] {
  return context.airframe.drives.flatMap((drive) => {
    const mounted = drive.kind === 'propeller' ? mountedIn(context, drive) : null;
    return mounted ? [screws(context, mounted), loadPath(context, mounted)] : [];
  });
}
