import { COOLING } from '@/lib/airframe/practice';
import type { Drive } from '@/lib/airframe/schema/equipment';
import { texts } from '@/lib/text/en/checks';
import { fill } from '@/lib/text/fill';
import { endCentre, type Hollow, hollowOf, openEndMm2 } from '../bodySpace';
import { type Context, cm2, leastLevel, mm, result, whole } from '../context';
import { boxedEquipment } from '../equipment';
import type { CheckLevel, CheckResult } from '../types';

/** The limit is from memory, so too little air is never worse than "watch". */
const NEVER_BAD = 0;

/** All openings of a purpose, mm2; null when there is none. */
export function openingsMm2({ body }: Hollow, purpose: 'inlet' | 'outlet'): number | null {
  const found = body.openings.filter((opening) => opening.purpose === purpose);
  if (found.length === 0) return null;
  return found.reduce((sum, { fromX, toX, widthMm }) => sum + (toX - fromX) * widthMm, 0);
}

interface Cooled {
  readonly drive: Drive;
  readonly hollow: Hollow;
  readonly powerW: number;
}

/** Propeller drives of known power with something warm inside a body: the motor or its controller. */
function cooledIn(context: Context): Cooled[] {
  const boxes = boxedEquipment(context);
  return context.airframe.drives.flatMap((drive): Cooled[] => {
    const { maxW } = drive.motor;
    if (drive.kind !== 'propeller' || maxW === undefined) return [];
    const warm = boxes.filter(({ id }) => id === drive.id || id === drive.controllerItemId);
    const hollow = warm.map(({ box }) => hollowOf(context, box)).find((found) => found !== null);
    return hollow ? [{ drive, hollow, powerW: maxW * (drive.mirrored ? 2 : 1) }] : [];
  });
}

/** Over the usual share costs drag only. */
function outletLevel(ratio: number): CheckLevel {
  const [least, most] = COOLING.outletOverInlet.value;
  if (ratio < least) return 'watch';
  return ratio > most ? 'note' : 'ok';
}

/** Outlets against the inlets, or against what the inlets would have to be where they are larger. */
function outlet(context: Context, { drive, hollow }: Cooled, inletMm2: number): CheckResult {
  const [least, most] = COOLING.outletOverInlet.value;
  const has = (openingsMm2(hollow, 'outlet') ?? 0) + openEndMm2(context, hollow, 'aft');
  const ratio = has / inletMm2;
  return result('cooling-outlet', {
    elementId: drive.id,
    path: `${hollow.path}.openings`,
    at: endCentre(hollow, 'aft'),
    level: outletLevel(ratio),
    words: fill(texts.words.outlet, { has: cm2(has), inlet: cm2(inletMm2), least: mm(least), most: mm(most) }),
    measured: {
      value: has / 100,
      quantity: 'cm2',
      least: (least * inletMm2) / 100,
      most: (most * inletMm2) / 100,
    },
    fix: fill(texts.rules['cooling-outlet'].fix, { least: cm2(least * inletMm2), most: cm2(most * inletMm2) }),
    basis: COOLING.outletOverInlet.basis,
  });
}

function cooled(context: Context, { drive, hollow, powerW }: Cooled): CheckResult[] {
  const has = (openingsMm2(hollow, 'inlet') ?? 0) + openEndMm2(context, hollow, 'fore');
  const need = (COOLING.inletMm2Per100W.value * powerW) / 100;
  const body = context.nameOf(hollow.body.id);
  const inlet = result('cooling-inlet', {
    elementId: drive.id,
    path: `${hollow.path}.openings`,
    at: endCentre(hollow, 'fore'),
    level: leastLevel(has, need, NEVER_BAD),
    words: fill(texts.words.inlet, { has: cm2(has), need: cm2(need), power: whole(powerW) }),
    measured: { value: has / 100, quantity: 'cm2', least: need / 100 },
    fix: fill(texts.rules['cooling-inlet'].fix, { need: cm2(need), body }),
    basis: COOLING.inletMm2Per100W.basis,
  });
  return has > 0 ? [inlet, outlet(context, { drive, hollow, powerW }, Math.min(has, need))] : [inlet];
}

/** Cooling air in and out of bodies that hold a motor or its controller. A fan's own air cools it. */
export const coolingRules = (context: Context): CheckResult[] =>
  cooledIn(context).flatMap((one) => cooled(context, one));
