import type { Vec3 } from '@/lib/numerics/vec';
import { texts } from '@/lib/text/en/checks';
import { fill } from '@/lib/text/fill';
import { type Hollow, hollows, outsideAt } from '../bodySpace';
import { type Context, leastLevel, mm, result } from '../context';
import { HOLD } from '../practice';
import type { CheckResult } from '../types';

/** Less than this share of a hand's width and it slips. */
const BAD_SHARE = 0.5;

/** Bodies that reach under the wing at the CG: what a hand closes on from below. */
function underCg(context: Context, cg: Vec3): Hollow | null {
  const wings = context.resolved.surfaces.filter(({ surface }) => surface.role === 'wing');
  const wingZ = Math.min(...wings.flatMap(({ panels }) => panels.map(({ root }) => Math.min(root.le[2], root.te[2]))));
  const found = hollows(context).find((hollow) => {
    const cut = outsideAt(hollow, cg[0]);
    return cut && cut.port <= cg[1] && cut.stbd >= cg[1] && cut.bottom <= wingZ - HOLD.wideMm.value[0];
  });
  return found ?? null;
}

/** Free bottom about the CG, between openings and the body's ends, mm fore and aft of it. */
function freeBottom({ body, origin, fromX, toX }: Hollow, x: number): readonly [from: number, to: number] {
  let [from, to] = [fromX, toX];
  for (const opening of body.openings) {
    if (opening.face !== 'bottom') continue;
    const [a, b] = [origin[0] + opening.fromX, origin[0] + opening.toX];
    if (b <= x) from = Math.max(from, b);
    else if (a >= x) to = Math.min(to, a);
    else return [x, x];
  }
  return [from, to];
}

function held(context: Context, hollow: Hollow, cg: Vec3): CheckResult {
  const cut = outsideAt(hollow, cg[0]);
  const bottom: Vec3 = [cg[0], hollow.origin[1], cut?.bottom ?? cg[2]];
  const [from, to] = freeBottom(hollow, cg[0]);
  const least = HOLD.freeMm.value;
  // The hand needs its width about the CG; what is free farther away does not help.
  const [handFrom, handTo] = [Math.max(from, cg[0] - least), Math.min(to, cg[0] + least)];
  const [narrow, broad] = HOLD.wideMm.value;
  const wide = cut ? cut.stbd - cut.port : 0;
  const discs = context.airframe.drives.flatMap((drive) =>
    drive.kind === 'propeller' ? [context.placeOf(drive.id)[0]] : [],
  );
  const hand: readonly [number, number] = [cg[0] - least / 2, cg[0] + least / 2];
  const away = Math.min(...discs.map((x) => Math.max(hand[0] - x, x - hand[1])));
  const base = {
    elementId: hollow.body.id,
    path: hollow.path,
    at: bottom,
    fix: fill(texts.rules['hand-hold'].fix, { least: mm(least) }),
    basis: HOLD.freeMm.basis,
  } as const;
  if (away < HOLD.fromPropellerMm.value) {
    const limit = HOLD.fromPropellerMm.value;
    return result('hand-hold', {
      ...base,
      level: 'bad',
      words: fill(texts.words.holdPropeller, { has: mm(Math.max(0, away)), least: mm(limit) }),
      measured: { value: away, quantity: 'mm', least: limit },
    });
  }
  if (wide < narrow || wide > broad) {
    return result('hand-hold', {
      ...base,
      level: 'watch',
      words: fill(texts.words.holdWide, { has: mm(wide), least: mm(narrow), most: mm(broad) }),
      measured: { value: wide, quantity: 'mm', least: narrow, most: broad },
    });
  }
  const free = handTo - handFrom;
  return result('hand-hold', {
    ...base,
    level: leastLevel(free, least, BAD_SHARE),
    words: fill(texts.words.holdFree, { has: mm(free), least: mm(least) }),
    measured: { value: free, quantity: 'mm', least },
  });
}

/** Where a hand holds it for the throw, where it is thrown and the CG is known. */
export function holdRule(context: Context): CheckResult[] {
  const cg = context.figures?.cg;
  if (!cg || context.airframe.flight.launch !== 'hand') return [];
  const hollow = underCg(context, cg);
  if (hollow) return [held(context, hollow, cg)];
  const wing = context.resolved.surfaces.find(({ surface }) => surface.role === 'wing');
  if (!wing) return [];
  return [
    result('hand-hold', {
      elementId: wing.surface.id,
      path: `surfaces.${wing.index}`,
      at: cg,
      level: 'note',
      words: texts.words.holdNone,
      fix: fill(texts.rules['hand-hold'].fix, { least: mm(HOLD.freeMm.value) }),
      basis: HOLD.freeMm.basis,
    }),
  ];
}
