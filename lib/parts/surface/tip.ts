import type { Surface } from '@/lib/airframe/schema/surface';
import { rakedTip, roundedTip } from '@/lib/geometry/tip';
import { notBuiltYet, type Problem } from '@/lib/numerics/result';
import { texts } from '@/lib/text/en/parts';
import type { Strip } from './strip';

export interface Tipped {
  readonly strip: Strip;
  readonly problems: readonly Problem[];
}

/** The strip with the surface's tip cut to shape; a shape that does not fit leaves it square and says so. */
export function tipped(strip: Strip, tip: Surface['tip'], path: string): Tipped {
  const or = (shaped: Strip | null, key: string): Tipped =>
    shaped
      ? { strip: shaped, problems: [] }
      : {
          strip,
          problems: [{ code: 'tip-does-not-fit', path: `${path}.${key}`, message: texts.problems.tipDoesNotFit }],
        };
  switch (tip.shape) {
    case 'square':
      return { strip, problems: [] };
    case 'raked':
      return tip.angleDeg === 0 ? { strip, problems: [] } : or(rakedTip(strip, tip.angleDeg), 'angleDeg');
    case 'rounded':
      return or(roundedTip(strip, tip.radiusMm), 'radiusMm');
    case 'outline':
      return { strip, problems: [notBuiltYet(`${path}.points`, texts.notBuilt.tipOutline)] };
  }
}
