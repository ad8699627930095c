import { texts } from '@/lib/text/en/checks';
import { fill } from '@/lib/text/fill';
import { hollows, insideAt, plates } from '../bodySpace';
import { type Context, mm, result } from '../context';
import { type Boxed, boxedEquipment } from '../equipment';
import { type Box, boxCentre, boxGap } from '../geometry/box';
import { FIT_MM } from '../practice';
import type { CheckResult } from '../types';

interface Pair {
  readonly one: Boxed;
  readonly other: string;
  readonly gapMm: number;
}

/** Formers and firewalls of all bodies. */
function plateBoxes(context: Context): { name: string; box: Box }[] {
  return hollows(context).flatMap((hollow) =>
    plates(context, hollow).flatMap(({ former, fromX, toX }) => {
      const cut = insideAt(context, hollow, (fromX + toX) / 2);
      if (!cut) return [];
      const plate: Box = { min: [fromX, cut.port, cut.bottom], max: [toX, cut.stbd, cut.top] };
      return [{ name: fill(texts.things.former, { id: former.id }), box: plate }];
    }),
  );
}

function pairsOf(context: Context): Pair[] {
  const all = boxedEquipment(context);
  const plateBoxed = plateBoxes(context);
  return all.flatMap((one, index) => [
    ...all
      .slice(index + 1)
      .filter(({ id }) => id !== one.id)
      .map((other): Pair => ({ one, other: context.nameOf(other.id), gapMm: boxGap(one.box, other.box) })),
    ...plateBoxed.map(({ name, box }): Pair => ({ one, other: name, gapMm: boxGap(one.box, box) })),
  ]);
}

function said(context: Context, { one, other, gapMm }: Pair): CheckResult {
  const meets = gapMm < -FIT_MM.value;
  const values = { one: context.nameOf(one.id), other, mm: mm(Math.abs(gapMm)) };
  return result('boxes-meet', {
    elementId: one.id,
    path: context.pathOf(one.id),
    at: boxCentre(one.box),
    level: meets ? 'bad' : 'ok',
    words: fill(meets ? texts.words.boxesMeet : texts.words.boxesApart, values),
    measured: { value: gapMm, quantity: 'mm', least: -FIT_MM.value },
    fix: fill(texts.rules['boxes-meet'].fix, { by: values.mm }),
    basis: FIT_MM.basis,
  });
}

/** Servos, packs, receivers, controllers, motors and formers: the worst of each that meets something, else the closest pair of all. */
export function boxRules(context: Context): CheckResult[] {
  const worst = new Map<string, Pair>();
  for (const pair of pairsOf(context)) {
    const known = worst.get(pair.one.id);
    if (!known || pair.gapMm < known.gapMm) worst.set(pair.one.id, pair);
  }
  const sorted = [...worst.values()].sort((a, b) => a.gapMm - b.gapMm);
  const meeting = sorted.filter(({ gapMm }) => gapMm < -FIT_MM.value);
  return (meeting.length > 0 ? meeting : sorted.slice(0, 1)).map((pair) => said(context, pair));
}
