import { GEAR } from '@/lib/airframe/practice';
import { mirror3, sub3, type Vec3 } from '@/lib/numerics/vec';
import { texts } from '@/lib/text/en/checks';
import { fill } from '@/lib/text/fill';
import { hollows, outsideAt } from '../bodySpace';
import { type Context, leastLevel, mm, result } from '../context';
import { discOver, discsOf, type PropellerDrive } from '../geometry/disc';
import type { CheckResult } from '../types';

/** Under this share of the wanted clearance a blade of grass is enough. */
const BAD_SHARE = 0.4;

/** Lowest points of wheels, skids and keels. */
const contacts = (context: Context): Vec3[] =>
  context.airframe.gear.flatMap(({ id, kind, wheelMm = 0 }) => {
    const [x, y, z] = context.placeOf(id);
    return kind === 'towHook' ? [] : [[x, y, z - (kind === 'wheel' ? wheelMm / 2 : 0)] satisfies Vec3];
  });

/** Corners of everything that could touch behind the wheels when the tail goes down. */
function structure(context: Context): Vec3[] {
  const surfaces = context.resolved.surfaces.flatMap(({ panels, surface }) => {
    const corners = panels.flatMap(({ root, tip }) => [root.le, root.te, tip.le, tip.te]);
    return surface.mirrored ? [...corners, ...corners.map(mirror3)] : corners;
  });
  const booms = context.resolved.booms.flatMap(({ fore, aft }) => [fore, aft]);
  const bodies = hollows(context).flatMap((hollow) =>
    hollow.body.stations.flatMap(({ xMm }): Vec3[] => {
      const cut = outsideAt(hollow, hollow.origin[0] + xMm);
      return cut ? [[hollow.origin[0] + xMm, hollow.origin[1], cut.bottom]] : [];
    }),
  );
  return [...surfaces, ...booms, ...bodies];
}

/** The wheels that carry: the pair, or the lowest wheel where there is none. */
function mainWheel(context: Context): Vec3 | null {
  const wheels = context.airframe.gear.filter(({ kind }) => kind === 'wheel');
  const pairs = wheels.filter(({ id, mirrored }) => mirrored || context.placeOf(id)[1] !== 0);
  const bottoms = (pairs.length > 0 ? pairs : wheels).map(({ id, wheelMm = 0 }): Vec3 => {
    const [x, y, z] = context.placeOf(id);
    return [x, y, z - wheelMm / 2];
  });
  return bottoms.reduce<Vec3 | null>((low, one) => (low && low[2] <= one[2] ? low : one), null);
}

interface Ground {
  readonly ruleId: 'ground-clearance-level' | 'ground-clearance-tail-down';
  readonly through: Vec3;
  readonly up: Vec3;
}

/** Level on the lowest contact, and turned about the main wheels until something behind them touches. */
function grounds(context: Context, mains: Vec3): Ground[] {
  const touching = contacts(context);
  const lowest = touching.reduce((low, one) => (one[2] < low[2] ? one : low), mains);
  const level: Ground = { ruleId: 'ground-clearance-level', through: lowest, up: [0, 0, 1] };
  const behind = [...touching, ...structure(context)].filter(([x]) => x > mains[0] + 1);
  if (behind.length === 0) return [level];
  const slope = Math.min(...behind.map((point) => sub3(point, mains)).map(([x, , z]) => z / x));
  const size = Math.hypot(1, slope);
  return [level, { ruleId: 'ground-clearance-tail-down', through: mains, up: [-slope / size, 0, 1 / size] }];
}

function over(context: Context, drive: PropellerDrive, { ruleId, through, up }: Ground): CheckResult {
  const centre = context.placeOf(drive.id);
  const value = Math.min(...discsOf(drive, centre, 0).map((disc) => discOver(disc, through, up)));
  const limit = GEAR.groundClearanceMm.value;
  const said = value < 0 ? texts.words.groundMeets : texts.words.ground;
  return result(ruleId, {
    elementId: drive.id,
    path: context.pathOf(drive.id),
    at: [centre[0], centre[1], centre[2] - drive.propeller.diameterMm / 2],
    level: leastLevel(value, limit, BAD_SHARE),
    words: fill(said, { mm: mm(Math.abs(value)), limit: mm(limit) }),
    measured: { value, quantity: 'mm', least: limit },
    fix: texts.rules[ruleId].fix,
    basis: GEAR.groundClearanceMm.basis,
  });
}

/** Propellers over the ground, for what stands on wheels. */
export function groundRules(context: Context): CheckResult[] {
  const mains = mainWheel(context);
  if (!mains) return [];
  const stands = grounds(context, mains);
  return context.airframe.drives.flatMap((drive) =>
    drive.kind === 'propeller' ? stands.map((ground) => over(context, drive, ground)) : [],
  );
}
