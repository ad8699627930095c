import type { ResolvedSurface } from '@/lib/airframe/resolved';
import type { Joint } from '@/lib/airframe/schema/fuselage';
import type { Vec3 } from '@/lib/numerics/vec';
import { texts } from '@/lib/text/en/checks';
import { fill } from '@/lib/text/fill';
import { type Context, mm, result } from '../context';
import { CAR_SPAN_MM } from '../practice';
import type { CheckResult } from '../types';

// What only the builder can judge: said, never held against the design.

interface Wing {
  readonly resolved: ResolvedSurface;
  readonly tip: Vec3;
}

const wingOf = ({ resolved }: Context): Wing | null => {
  const wing = resolved.surfaces.find(({ surface }) => surface.role === 'wing');
  const tip = wing?.panels.at(-1)?.tip.le;
  return wing && tip ? { resolved: wing, tip } : null;
};

const base = ({ resolved }: Wing, at: Vec3) =>
  ({ elementId: resolved.surface.id, path: `surfaces.${resolved.index}`, at, basis: 'CP' }) as const;

/** How the wing is joined to what carries it, loosest first. */
function wingJoint({ airframe }: Context, wingId: string): Joint['kind'] {
  const kinds = airframe.joints.filter(({ between }) => between.includes(wingId)).map(({ kind }) => kind);
  return (['bands', 'bolts', 'tube'] as const).find((kind) => kinds.includes(kind)) ?? 'glued';
}

function rightWayUp({ airframe }: Context, wing: Wing): CheckResult {
  const used = airframe.surfaces.flatMap(({ panels }) => panels.map(({ coveringId }) => coveringId));
  const count = new Set(used.filter((id) => id !== undefined)).size;
  const differ = count > 1;
  return result('right-way-up', {
    ...base(wing, wing.tip),
    level: differ ? 'ok' : 'note',
    words: fill(differ ? texts.words.coveringsDiffer : texts.words.coverings, { count }),
    fix: texts.rules['right-way-up'].fix,
  });
}

function wingOff(context: Context, wing: Wing): CheckResult {
  const tips = wing.resolved.panels.map(({ tip }) => Math.abs(tip.le[1]));
  const span = Math.max(...tips) * (wing.resolved.surface.mirrored ? 2 : 1);
  const joint = wingJoint(context, wing.resolved.surface.id);
  const limit = CAR_SPAN_MM.value;
  const large = span > limit;
  const values = { span: mm(span), joint: texts.joints[joint], limit: mm(limit) };
  const { wingFixed, wingLoose, wingSmall } = texts.words;
  return result('wing-off', {
    ...base(wing, wing.resolved.panels[0]?.root.le ?? wing.tip),
    level: large && joint === 'glued' ? 'note' : 'ok',
    words: joint === 'glued' ? fill(large ? wingFixed : wingSmall, values) : fill(wingLoose, values),
    measured: { value: span, quantity: 'mm', ...(joint === 'glued' ? { most: limit } : {}) },
    fix: texts.rules['wing-off'].fix,
  });
}

/** The foremost thing on the ground's side of a hard landing: a propeller in front, else the pack's push on the nose, else the wing. */
function breaksFirst(context: Context, wing: Wing): CheckResult {
  const { airframe, placeOf } = context;
  const tractor = airframe.drives.find((drive) => drive.kind === 'propeller' && drive.facing === 'tractor');
  const pack = airframe.items.find(({ kind }) => kind === 'pack');
  const { breaksBands, breaksPack, breaksTractor, breaksWing } = texts.words;
  const first = tractor ? breaksTractor : airframe.bodies.length > 0 && pack ? breaksPack : breaksWing;
  const bands = wingJoint(context, wing.resolved.surface.id) === 'bands';
  const element = tractor ?? (first === breaksPack ? pack : undefined);
  const [nose] = airframe.bodies;
  const hit = tractor ? `drives.${airframe.drives.indexOf(tractor)}` : first === breaksPack && nose ? 'bodies.0' : null;
  return result('breaks-first', {
    ...base(wing, element ? placeOf(element.id) : (wing.resolved.panels[0]?.root.le ?? wing.tip)),
    ...(hit === null ? {} : { path: hit, elementId: tractor?.id ?? nose?.id ?? wing.resolved.surface.id }),
    level: 'note',
    words: bands ? `${first}; ${breaksBands}` : first,
    fix: texts.rules['breaks-first'].fix,
  });
}

/** Seen the right way up, off for the car, and what breaks first. */
export function noteRules(context: Context): CheckResult[] {
  const wing = wingOf(context);
  return wing ? [rightWayUp(context, wing), wingOff(context, wing), breaksFirst(context, wing)] : [];
}
