import type { Item } from '@/lib/airframe/schema/equipment';
import { mainPacks } from '@/lib/balance/packPlace';
import { texts } from '@/lib/text/en/checks';
import { fill } from '@/lib/text/fill';
import { bayAt, type Hollow, hollowOf, outOfInside } from '../bodySpace';
import { type Context, mm, result } from '../context';
import { boxedEquipment } from '../equipment';
import { type Box, boxAbout, boxGap, sameLane } from '../geometry/box';
import { FIT_MM } from '../practice';
import type { CheckLevel, CheckResult } from '../types';

/** How finely a way through a body that narrows is followed, mm. */
const STEP_MM = 0.5;

const moved = ({ min, max }: Box, byMm: number): Box => ({
  min: [min[0] + byMm, min[1], min[2]],
  max: [max[0] + byMm, max[1], max[2]],
});

/** Whether a box may stand where it is: inside its body's walls and bay, and in nothing else. */
function stands(context: Context, hollow: Hollow, box: Box, blockers: readonly Box[]): boolean {
  return (
    outOfInside(context, hollow, box) <= FIT_MM.value && blockers.every((other) => boxGap(box, other) >= -FIT_MM.value)
  );
}

/** Room one way until the bay ends or something stands in its lane, then until the walls are met, mm. */
function roomMm(context: Context, hollow: Hollow, box: Box, blockers: readonly Box[], way: 1 | -1): number {
  const bay = bayAt(context, hollow, (box.min[0] + box.max[0]) / 2);
  const lane = blockers.filter((other) => sameLane(box, other));
  const ends =
    way === 1
      ? [bay.toX, ...lane.map(({ min }) => min[0])].map((x) => x - box.max[0])
      : [bay.fromX, ...lane.map(({ max }) => max[0])].map((x) => box.min[0] - x);
  // What is already passed cannot stop it.
  const most = Math.min(...ends.filter((end) => end > -FIT_MM.value));
  let room = 0;
  while (room < most && stands(context, hollow, moved(box, way * Math.min(most, room + STEP_MM)), blockers))
    room = Math.min(most, room + STEP_MM);
  return room;
}

interface Slide {
  readonly from: number;
  readonly to: number;
}

function judged(room: Slide, slide: Slide, move: number | null): { level: CheckLevel; words: string } {
  const range = { from: mm(room.from), to: mm(room.to) };
  const over = (ask: Slide): number => Math.max(room.from - ask.from, ask.to - room.to);
  if (move !== null && over({ from: move, to: move }) > FIT_MM.value) {
    const words = fill(texts.words.slideFirstFlight, { move: mm(move), ...range });
    return { level: 'bad', words };
  }
  const values = { fore: mm(-room.from), aft: mm(room.to), from: mm(slide.from), to: mm(slide.to) };
  const overMm = over(slide);
  return { level: overMm > FIT_MM.value ? 'watch' : 'ok', words: fill(texts.words.slideFits, values) };
}

function slideOf(context: Context, pack: Item, hollow: Hollow, box: Box): CheckResult {
  const blockers = boxedEquipment(context)
    .filter(({ id }) => id !== pack.id)
    .map((one) => one.box);
  const slide: Slide = { from: Math.min(0, pack.slide?.fromMm ?? 0), to: Math.max(0, pack.slide?.toMm ?? 0) };
  const bay = bayAt(context, hollow, (box.min[0] + box.max[0]) / 2);
  const intoMm = Math.max(
    outOfInside(context, hollow, box),
    bay.fromX - box.min[0],
    box.max[0] - bay.toX,
    ...blockers.map((other) => -boxGap(box, other)),
  );
  const clash = intoMm > FIT_MM.value;
  const room: Slide = clash
    ? { from: 0, to: 0 }
    : {
        from: 0 - roomMm(context, hollow, box, blockers, -1),
        to: roomMm(context, hollow, box, blockers, 1),
      };
  const main = mainPacks(context.airframe)?.keys.includes(pack.id) ?? false;
  const move = main ? (context.figures?.packFirstFlightMm ?? null) : null;
  const placeWords = fill(texts.words.slidePlace, { mm: mm(Math.max(0, intoMm)) });
  const said = clash ? { level: 'bad' as const, words: placeWords } : judged(room, slide, move);
  const from = Math.max(room.from, slide.from);
  const to = Math.min(room.to, slide.to);
  return result('pack-slide', {
    elementId: pack.id,
    path: `${context.pathOf(pack.id)}.slide`,
    at: context.placeOf(pack.id),
    level: said.level,
    words: said.words,
    // The words give the reach on both sides; a single number would say less.
    fix: clash ? texts.fixes.packPlace : fill(texts.rules['pack-slide'].fix, { from: mm(from), to: mm(to) }),
    basis: FIT_MM.basis,
  });
}

/** Whether each pack in a body stands free there, slides as far as it says, and reaches its place for the first flight. */
export function packSlideRule(context: Context): CheckResult[] {
  return context.airframe.items.flatMap((pack): CheckResult[] => {
    if (pack.kind !== 'pack') return [];
    const box = boxAbout(context.placeOf(pack.id), pack.sizeMm);
    const hollow = hollowOf(context, box);
    return hollow ? [slideOf(context, pack, hollow, box)] : [];
  });
}
