import { figureRows } from '@/components/figures/rows';
import { startFrom, startingLayouts } from '@/lib/airframe/layouts';
import { planOutlines, type ViewOutline } from '@/lib/airframe/outlines';
import { analyse } from '@/lib/figures/analyse';

/** The public page's aircraft, when it flies by its own figures; otherwise the first layout that does. */
const PREFERRED = 'pusher';
const SHOWN = [
  'spanMm',
  'wingAreaDm2',
  'allUpMassG',
  'wingLoadingGdm2',
  'stallSpeedMs',
  'cgAtBodySideMm',
  'neutralPointPct',
  'staticMarginPct',
];

function candidate({ id, name }: { readonly id: string; readonly name: string }) {
  const airframe = startFrom(id, name);
  const figures = analyse(airframe, { depth: 'live' });
  const rows = figureRows(figures, SHOWN);
  return {
    shown: { name, outlines: planOutlines(airframe), marks: figures.marks, rows },
    sound: rows.every(({ text, verdict }) => text !== null && (verdict === undefined || verdict.level === 'good')),
  };
}

function work() {
  const order = [...startingLayouts].sort((a, b) => Number(b.id === PREFERRED) - Number(a.id === PREFERRED));
  const found = order.map(candidate);
  const chosen = found.find(({ sound }) => sound) ?? found[0];
  if (chosen === undefined) throw new RangeError('there is no starting layout');
  return chosen.shown;
}

// A cache and nothing more: the same layouts give the same figures for as long as this program runs.
let kept: ReturnType<typeof work> | undefined;

/** A starting layout drawn and worked out, for the public page. */
export function showcase(): ReturnType<typeof work> {
  kept ??= work();
  return kept;
}

/** Closed lines only: what a thumbnail can show. */
const pictureOf = (outlines: readonly ViewOutline[]) =>
  outlines.filter(({ closed, kind }) => closed && kind !== 'item').map(({ points }) => points);

/** Every starting layout with its picture. */
export const layoutChoices = () =>
  startingLayouts.map(({ id, name, what }) => ({
    id,
    name,
    what,
    outlines: pictureOf(planOutlines(startFrom(id, name))),
  }));
