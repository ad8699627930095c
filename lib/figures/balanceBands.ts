import type { MassGroup } from '@/lib/balance/line';
import type { Limit } from '@/lib/flight/limits';
import type { VerdictBand } from './bands';

// What the figures of balance rest on, with where each comes from.

const PRACTICE = 'common practice, no source';

/** How far each kind of mass may be out, % either way. */
export const MASS_ERROR_PCT = {
  foam: { value: 10, source: `${PRACTICE}: sheets sold as one grade differ by this; weigh yours` },
  covering: { value: 20, source: `${PRACTICE}: a coat of resin or film is as heavy as the hand that lays it` },
  glue: { value: 40, source: `${PRACTICE}: beads of hot glue differ by this` },
  tube: { value: 5, source: `${PRACTICE}: walls of pultruded tube` },
  item: { value: 2, source: `${PRACTICE}: masses typed in from a scale or a label` },
  drive: { value: 2, source: `${PRACTICE}: masses typed in from a scale or a label` },
  gear: { value: 2, source: `${PRACTICE}: masses typed in from a scale or a label` },
} as const satisfies Record<MassGroup, Limit>;

/** How far the CG may lie off the centre plane, % of the half span, either way. */
export const LATERAL_PCT: VerdictBand = { good: [-0.5, 0.5], watch: [-2, 2], source: PRACTICE };

/** Masses of other packs that are worked out beside the one in the document, as a share of it. */
export const OTHER_PACK_FACTORS = [0.75, 1.25, 1.5] as const;

/** Ballast of more than this share of the all-up mass says that something heavy is in the wrong place. */
export const BALLAST_SHARE: Limit = { value: 0.1, source: PRACTICE };

/** How far inside an end of the aircraft the middle of ballast can lie, mm. */
export const BALLAST_INSET_MM: Limit = { value: 10, source: PRACTICE };
