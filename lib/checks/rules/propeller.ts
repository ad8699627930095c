import { CLEARANCE } from '@/lib/airframe/practice';
import { add3, scale3, type Vec3 } from '@/lib/numerics/vec';
import { texts } from '@/lib/text/en/checks';
import { fill } from '@/lib/text/fill';
import { type Hollow, hollows, outsideAt } from '../bodySpace';
import { type Context, leastLevel, mm, result, whole } from '../context';
import { type Disc, discsOf, distanceToDisc, type PropellerDrive } from '../geometry/disc';
import { type Nearest, nearest } from '../geometry/nearest';
import { boomObstacles, type Obstacle, otherObstacles } from '../obstacles';
import { AXIS_BODY_MM } from '../practice';
import type { CheckResult } from '../types';

/** Under this share of the wanted clearance a soft mount or a bent shaft lets the blades touch. */
const BAD_SHARE = 0.5;
/** A propeller this large is limited by something else. */
const LARGEST_MM = 800;
/** The largest propeller is found to this. */
const FOUND_MM = 0.01;
/** How finely the shaft's line is looked along for the body that carries the motor. */
const AXIS_STEPS = 24;

/** Clearance that a propeller wants, mm: a length or a share of its diameter, the larger. */
const wantedMm = (diameterMm: number): number =>
  Math.max(CLEARANCE.propellerMm.value, CLEARANCE.propellerShare.value * diameterMm);

interface Close extends Nearest {
  readonly obstacle: Obstacle;
}

const closest = (discs: readonly Disc[], obstacles: readonly Obstacle[]): Close | null =>
  obstacles
    .flatMap((obstacle) =>
      discs.flatMap((disc): Close[] => {
        const found = nearest(obstacle.patch, (point) => distanceToDisc(disc, point));
        return found ? [{ ...found, mm: found.mm - obstacle.roundMm, obstacle }] : [];
      }),
    )
    .reduce<Close | null>((best, one) => (best && best.mm <= one.mm ? best : one), null);

/**
 * Bodies that end on the shaft's line carry the motor: the blades pass their end, as close as their maker likes. One that goes on past the
 * disc is cut by it.
 */
function carriers(context: Context, discs: readonly Disc[]): ReadonlySet<string> {
  const onAxis = discs.flatMap(({ centre, axis }) =>
    Array.from({ length: AXIS_STEPS + 1 }, (_, step) =>
      add3(centre, scale3(axis, (-AXIS_BODY_MM.value * step) / AXIS_STEPS)),
    ),
  );
  const holds = (hollow: Hollow, [x, y, z]: Vec3): boolean => {
    const cut = outsideAt(hollow, x);
    return cut !== null && y >= cut.port && y <= cut.stbd && z >= cut.bottom && z <= cut.top;
  };
  const carrying = hollows(context).filter(
    (hollow) => onAxis.some((point) => holds(hollow, point)) && !discs.some(({ centre }) => holds(hollow, centre)),
  );
  return new Set(carrying.map(({ body }) => body.id));
}

function clearance(context: Context, drive: PropellerDrive, obstacles: readonly Obstacle[]): CheckResult {
  const centre = context.placeOf(drive.id);
  const discs = discsOf(drive, centre, CLEARANCE.shaftFlexDeg.value);
  const own = carriers(context, discs);
  const close = closest(
    discs,
    obstacles.filter(({ kind, elementId }) => kind !== 'body' || !own.has(elementId)),
  );
  const limit = wantedMm(drive.propeller.diameterMm);
  const values = { flex: mm(CLEARANCE.shaftFlexDeg.value), limit: mm(limit), what: close?.obstacle.name ?? '' };
  const words = !close
    ? texts.words.propellerNothing
    : close.mm > 0
      ? fill(texts.words.propellerClear, { ...values, mm: mm(close.mm) })
      : fill(texts.words.propellerMeets, values);
  return result('propeller-clearance', {
    elementId: drive.id,
    path: context.pathOf(drive.id),
    at: close?.at ?? centre,
    level: close ? leastLevel(close.mm, limit, BAD_SHARE) : 'ok',
    words,
    ...(close ? { measured: { value: close.mm, quantity: 'mm', least: limit } } : {}),
    fix: texts.rules['propeller-clearance'].fix,
    basis: CLEARANCE.propellerMm.basis,
  });
}

/** The largest propeller that stays clear of obstacles, mm; null when they limit nothing. */
function largestPropellerMm(
  drive: PropellerDrive,
  discs: readonly Disc[],
  obstacles: readonly Obstacle[],
): number | null {
  const fits = (diameterMm: number): boolean => {
    const close = closest(
      discs.map((disc) => ({ ...disc, radiusMm: diameterMm / 2 })),
      obstacles,
    );
    return !close || close.mm >= wantedMm(diameterMm);
  };
  if (fits(Math.max(LARGEST_MM, drive.propeller.diameterMm))) return null;
  let [low, high] = [0, LARGEST_MM];
  while (high - low > FOUND_MM) {
    const middle = (low + high) / 2;
    if (fits(middle)) low = middle;
    else high = middle;
  }
  return low;
}

function largest(context: Context, drive: PropellerDrive, booms: readonly Obstacle[]): CheckResult[] {
  const discs = discsOf(drive, context.placeOf(drive.id), CLEARANCE.shaftFlexDeg.value);
  const most = booms.length > 0 ? largestPropellerMm(drive, discs, booms) : null;
  if (most === null) return [];
  const has = drive.propeller.diameterMm;
  const values = { largest: whole(Math.floor(most)), has: mm(has) };
  return [
    result('propeller-largest', {
      elementId: drive.id,
      path: `${context.pathOf(drive.id)}.propeller.diameterMm`,
      at: closest(discs, booms)?.at ?? context.placeOf(drive.id),
      level: has <= most ? 'ok' : 'watch',
      words: fill(texts.words.largest, values),
      measured: { value: has, quantity: 'mm', most },
      fix: fill(texts.rules['propeller-largest'].fix, { largest: values.largest }),
      basis: CLEARANCE.propellerMm.basis,
    }),
  ];
}

/** Propellers against booms, sheets, moved controls, rods and equipment, and the largest that the booms leave room for. */
export function propellerRules(context: Context): CheckResult[] {
  const booms = boomObstacles(context);
  const all = [...booms, ...otherObstacles(context)];
  return context.airframe.drives.flatMap((drive) =>
    drive.kind === 'propeller' ? [clearance(context, drive, all), ...largest(context, drive, booms)] : [],
  );
}
