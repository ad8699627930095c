import type { Item } from '@/lib/airframe/schema/equipment';
import type { Vec3 } from '@/lib/numerics/vec';
import { texts } from '@/lib/text/en/checks';
import { fill } from '@/lib/text/fill';
import { type Bay, bayAt, type Hollow, hollowOf, insideAt, openingCentre } from '../bodySpace';
import { type Context, mm, result } from '../context';
import { boxedEquipment } from '../equipment';
import { boxAbout, boxCentre, sameLane } from '../geometry/box';
import { PACK } from '../practice';
import type { CheckLevel, CheckResult } from '../types';

/** A way in for a pack, and what it must let through. mm. */
interface Way {
  readonly kind: 'opening' | 'end';
  readonly at: Vec3;
  readonly path: string;
  readonly has: readonly [longMm: number, wideMm: number];
  readonly needs: readonly [longMm: number, wideMm: number];
  /** Third size of the pack, into the body. */
  readonly tallMm: number;
}

/** Openings that a pack goes in by; under a wing that comes off its saddle is one. */
function waysOf({ airframe }: Context, { body }: Hollow): ReadonlySet<string> {
  const wings = airframe.surfaces.filter(({ role }) => role === 'wing').map(({ id }) => id);
  const loose = airframe.joints.some(
    ({ between, kind }) => kind !== 'glued' && between.includes(body.id) && between.some((id) => wings.includes(id)),
  );
  return new Set(loose ? ['hatch', 'pack', 'saddle'] : ['hatch', 'pack']);
}

function openings(context: Context, hollow: Hollow, bay: Bay, [long, wide, tall]: Item['sizeMm']): Way[] {
  const { body, origin, path } = hollow;
  const purposes = waysOf(context, hollow);
  return body.openings.flatMap((opening, index): Way[] => {
    if (!purposes.has(opening.purpose)) return [];
    const fromX = Math.max(origin[0] + opening.fromX, bay.fromX);
    const toX = Math.min(origin[0] + opening.toX, bay.toX);
    if (toX <= fromX) return [];
    const flat = opening.face === 'top' || opening.face === 'bottom';
    return [
      {
        kind: 'opening',
        at: openingCentre(hollow, opening),
        path: `${path}.openings.${index}`,
        has: [toX - fromX, opening.widthMm],
        needs: flat ? [long, wide] : [long, tall],
        tallMm: flat ? tall : wide,
      },
    ];
  });
}

/** Open ends of the bay with nothing between them and the pack. */
function openEnds(context: Context, hollow: Hollow, bay: Bay, { id, sizeMm }: Item): Way[] {
  const [long, wide, tall] = sizeMm;
  const box = boxAbout(context.placeOf(id), sizeMm);
  const lane = boxedEquipment(context).filter((other) => other.id !== id && sameLane(box, other.box));
  const ends = [
    { open: bay.openFore && !lane.some((other) => boxCentre(other.box)[0] < boxCentre(box)[0]), x: hollow.fromX },
    { open: bay.openAft && !lane.some((other) => boxCentre(other.box)[0] > boxCentre(box)[0]), x: hollow.toX },
  ];
  return ends.flatMap(({ open, x }): Way[] => {
    const cut = open ? insideAt(context, hollow, x) : null;
    if (!cut) return [];
    const at: Vec3 = [x, (cut.port + cut.stbd) / 2, (cut.top + cut.bottom) / 2];
    const has = [cut.top - cut.bottom, cut.stbd - cut.port] as const;
    return [{ kind: 'end', at, path: hollow.path, has, needs: [tall, wide], tallMm: long }];
  });
}

/** Air round the pack as it goes through, in the tighter direction, mm. */
const spareMm = ({ has, needs }: Way): number => Math.min(has[0] - needs[0], has[1] - needs[1]);

function levelOf(way: Way): CheckLevel {
  if (spareMm(way) >= PACK.playMm.value) return 'ok';
  const tilted =
    way.kind === 'opening' &&
    way.has[0] >= way.tallMm * PACK.tilt.value + PACK.playMm.value &&
    way.has[1] >= way.needs[1] + PACK.playMm.value;
  return tilted ? 'watch' : 'bad';
}

const RANK: Readonly<Record<CheckLevel, number>> = { ok: 0, note: 1, watch: 2, bad: 3 };

function saidOf(way: Way, level: CheckLevel): string {
  const [long, wide] = way.has.map(mm);
  const [packLong, packWide] = way.needs.map(mm);
  const values = { long: long ?? '', wide: wide ?? '', packLong: packLong ?? '', packWide: packWide ?? '' };
  const { hatchEnd, hatchFlat, hatchSmall, hatchTilted } = texts.words;
  if (level === 'watch') return fill(hatchTilted, values);
  if (level === 'bad') return fill(hatchSmall, values);
  return fill(way.kind === 'end' ? hatchEnd : hatchFlat, values);
}

/** Whether each pack in a body goes in: through a hatch over its own bay, or through an open end. */
export function packHatchRule(context: Context): CheckResult[] {
  return context.airframe.items.flatMap((pack): CheckResult[] => {
    if (pack.kind !== 'pack') return [];
    const at = context.placeOf(pack.id);
    const hollow = hollowOf(context, boxAbout(at, pack.sizeMm));
    if (!hollow) return [];
    const bay = bayAt(context, hollow, at[0]);
    const ways = [...openings(context, hollow, bay, pack.sizeMm), ...openEnds(context, hollow, bay, pack)];
    const rank = (way: Way): number => 2 * RANK[levelOf(way)] + (way.kind === 'opening' ? 0 : 1);
    const [best] = ways.sort((a, b) => rank(a) - rank(b) || spareMm(b) - spareMm(a));
    const level = best ? levelOf(best) : 'bad';
    const play = PACK.playMm.value;
    const [long, wide] = best && best.kind === 'opening' ? best.needs : pack.sizeMm;
    return [
      result('pack-hatch', {
        elementId: pack.id,
        path: best?.path ?? hollow.path,
        at: best?.at ?? at,
        level,
        words: best ? saidOf(best, level) : texts.words.hatchNone,
        ...(best ? { measured: { value: spareMm(best), quantity: 'mm', least: play } } : {}),
        fix: fill(texts.rules['pack-hatch'].fix, { long: mm(long + play), wide: mm(wide + play) }),
        basis: PACK.playMm.basis,
      }),
    ];
  });
}
