import { COOLING } from '@/lib/airframe/practice';
import type { Drive } from '@/lib/airframe/schema/equipment';
import { texts } from '@/lib/text/en/checks';
import { fill } from '@/lib/text/fill';
import { hollowAround, openEndMm2 } from '../bodySpace';
import { type Context, cm2, leastLevel, result, whole } from '../context';
import { FAN_INLET_BAD } from '../practice';
import type { CheckResult } from '../types';
import { openingsMm2 } from './cooling';

type Fan = Extract<Drive, { kind: 'ductedFan' }>;

/** What the blades sweep: the disc without its hub, mm2. */
const sweptMm2 = ({ fan }: Fan): number => (Math.PI / 4) * (fan.diameterMm ** 2 - fan.hubMm ** 2);

/** The narrower of what the duct says and what the body is open for; null when neither says anything. */
function narrowest(...areas: readonly (number | null | undefined)[]): number | null {
  const known = areas.flatMap((area) => (area ? [area] : []));
  return known.length > 0 ? Math.min(...known) : null;
}

function inlet(context: Context, drive: Fan): CheckResult {
  const at = context.placeOf(drive.id);
  const hollow = hollowAround(context, at);
  const cut = hollow && openingsMm2(hollow, 'inlet');
  const has = narrowest(drive.duct?.inletMm2, cut ?? (hollow && openEndMm2(context, hollow, 'fore')));
  const swept = sweptMm2(drive);
  const limit = COOLING.fanInletShare.value;
  const base = {
    elementId: drive.id,
    path: `${context.pathOf(drive.id)}.duct`,
    at,
    fix: fill(texts.rules['fan-inlet'].fix, { need: cm2(limit * swept) }),
    basis: COOLING.fanInletShare.basis,
  } as const;
  if (has === null) return result('fan-inlet', { ...base, level: 'watch', words: texts.words.fanInletUnknown });
  const share = has / swept;
  return result('fan-inlet', {
    ...base,
    level: leastLevel(share, limit, FAN_INLET_BAD.value),
    words: fill(texts.words.fanInlet, { has: cm2(has), pct: whole(100 * share), limit: whole(100 * limit) }),
    measured: { value: 100 * share, quantity: 'percent', least: 100 * limit },
  });
}

function exit(context: Context, drive: Fan): CheckResult {
  const at = context.placeOf(drive.id);
  const hollow = hollowAround(context, at);
  const cut = hollow && openingsMm2(hollow, 'outlet');
  // The duct ends where it says; only without a word on it is it the body's own open end.
  const has = drive.duct?.outletMm2 ?? narrowest(cut ?? (hollow && openEndMm2(context, hollow, 'aft')));
  const swept = sweptMm2(drive);
  const [least, most] = COOLING.fanExitShare.value;
  const base = {
    elementId: drive.id,
    path: `${context.pathOf(drive.id)}.duct`,
    at,
    fix: fill(texts.rules['fan-exit'].fix, { least: cm2(least * swept), most: cm2(most * swept) }),
    basis: COOLING.fanExitShare.basis,
  } as const;
  if (has === null) return result('fan-exit', { ...base, level: 'watch', words: texts.words.fanExitUnknown });
  const share = has / swept;
  const limits = { least: whole(100 * least), most: whole(100 * most) };
  return result('fan-exit', {
    ...base,
    level: share >= least && share <= most ? 'ok' : 'watch',
    words: fill(texts.words.fanExit, { has: cm2(has), pct: whole(100 * share), ...limits }),
    measured: { value: 100 * share, quantity: 'percent', least: 100 * least, most: 100 * most },
  });
}

/** Air in and out of ducted fans against the area that their blades sweep. */
export const fanRules = (context: Context): CheckResult[] =>
  context.airframe.drives.flatMap((drive) =>
    drive.kind === 'ductedFan' ? [inlet(context, drive), exit(context, drive)] : [],
  );
