import type { ResolvedControl } from '@/lib/airframe/resolved';
import { lerp3 } from '@/lib/numerics/vec';
import { texts } from '@/lib/text/en/checks';
import { fill } from '@/lib/text/fill';
import { type Context, result, whole } from '../context';
import { HINGE_TORQUE_PCT } from '../practice';
import type { CheckLevel, CheckResult } from '../types';

/** What the air's moment about a hinge grows with: its length times the square of the control's chord. */
function leverMm3({ control, inner, outer }: ResolvedControl): number {
  const chord = (inner.chordMm * control.chordShare[0] + outer.chordMm * control.chordShare[1]) / 2;
  return (outer.lengthMm - inner.lengthMm) * chord * chord;
}

function levelOf(pct: number): CheckLevel {
  if (pct <= HINGE_TORQUE_PCT.good.value) return 'ok';
  return pct > HINGE_TORQUE_PCT.bad.value ? 'bad' : 'watch';
}

/** The servo that has most to hold, where the figures say how much; pinned to the control with the largest lever. */
export function hingeRule({ resolved, figures }: Context): CheckResult[] {
  const pct = figures?.hingeTorquePct;
  const [largest] = [...resolved.controls].sort((a, b) => leverMm3(b) - leverMm3(a));
  if (pct === undefined || !largest) return [];
  const surface = resolved.surfaces.find((one) => one.surface.id === largest.surfaceId);
  if (!surface) return [];
  const limit = HINGE_TORQUE_PCT.good.value;
  return [
    result('hinge-moment', {
      elementId: largest.surfaceId,
      path: `surfaces.${surface.index}.controls.${surface.surface.controls.indexOf(largest.control)}`,
      at: lerp3(largest.hingeInner, largest.hingeOuter, 0.5),
      level: levelOf(pct),
      words: fill(texts.words.hinge, { pct: whole(pct), limit: whole(limit) }),
      measured: { value: pct, quantity: 'percent', most: limit },
      fix: texts.rules['hinge-moment'].fix,
      basis: HINGE_TORQUE_PCT.good.basis,
    }),
  ];
}
