import type { AeroModel, Contribution } from '@/lib/aero/model';
import type { Airframe } from '@/lib/airframe/schema/airframe';
import { texts } from '@/lib/text/en/figures/stability';
import { fill } from '@/lib/text/fill';
import { fixedDigits } from '@/lib/units/number';
import { NEUTRAL_POINT_BAND_PCT } from './bands';
import { NEUTRAL_POINT_SHARES } from './trimBands';

/** How far from its middle the neutral point may lie, with what that is made of. All in % of the MAC. */
export interface NeutralPointBand {
  readonly pct: number;
  readonly cause: string;
  /** What bodies and propellers move the neutral point by, aft positive; null where there are none. */
  readonly bodiesPct: number | null;
  readonly propellersPct: number | null;
}

/**
 * Half width of the neutral point's band: the lattice's own error and half of what body and propeller theory shift it by, but never under
 * what such aircraft scatter by in practice.
 */
export function neutralPointBand(airframe: Airframe, model: AeroModel): NeutralPointBand {
  const bodiesPct = shiftPct(model, 'bodies');
  const propellersPct = shiftPct(model, 'propellers');
  const share = NEUTRAL_POINT_SHARES.contribution.value;
  const lattice = NEUTRAL_POINT_SHARES.latticePct.value;
  const bodies = share * Math.abs(bodiesPct ?? 0);
  const propellers = share * Math.abs(propellersPct ?? 0);
  const least = leastOf(airframe);
  const said = (text: string, pct: number) => fill(text, { pct: fixedDigits(pct, 1) });
  const cause = [
    said(texts.causes.lattice, lattice),
    ...(bodiesPct === null ? [] : [said(texts.causes.bodies, bodies)]),
    ...(propellersPct === null ? [] : [said(texts.causes.propellers, propellers)]),
    fill(least.text, { pct: least.pct }),
  ].join(', ');
  return { pct: Math.max(least.pct, lattice + bodies + propellers), cause, bodiesPct, propellersPct };
}

/** Neutral point with a contribution less without it, % of the chord; null when nothing of that name does anything. */
function shiftPct({ alpha, contributions }: AeroModel, name: Contribution['name']): number | null {
  const own = contributions.filter((c) => c.name === name);
  const lift = own.reduce((sum, c) => sum + c.alpha.lift, 0);
  const pitch = own.reduce((sum, c) => sum + c.alpha.pitch, 0);
  if (lift === 0 && pitch === 0) return null;
  return 100 * ((alpha.pitch - pitch) / (alpha.lift - lift) - alpha.pitch / alpha.lift);
}

/** Least half width by layout: a stream behind the wing upsets more than a body does. */
function leastOf({ drives, bodies }: Airframe): { readonly pct: number; readonly text: string } {
  const { pusherOrFan, body, bare } = NEUTRAL_POINT_BAND_PCT;
  if (drives.some((drive) => drive.facing === 'pusher' || drive.kind === 'ductedFan'))
    return { pct: pusherOrFan.value, text: texts.causes.leastPusherOrFan };
  if (bodies.length > 0) return { pct: body.value, text: texts.causes.leastBody };
  return { pct: bare.value, text: texts.causes.leastBare };
}
