import type { Airframe } from '@/lib/airframe/schema/airframe';
import { CARBON_FROM_GPA } from '@/lib/checks/practice';
import type { Development, Part } from '@/lib/parts/types';
import { cautions as words } from '@/lib/text/en/partsPage';

export interface Caution {
  readonly act: string;
  readonly words: string;
}

/** What to mind while sheets are cut and joined, and while tubes are cut to length. */
export interface Cautions {
  readonly sheets: readonly Caution[];
  readonly tubes: readonly Caution[];
}

const CUTTERS: Readonly<Record<Airframe['build']['cutter'], Caution>> = {
  hand: words.knife,
  dragKnife: words.knife,
  hotWire: words.hotWire,
  laser: words.laser,
};

/** Whatever cuts the outlines: folds, bevels, channels and bared strips are made with a blade. */
const workedByHand = ({ operations }: Part): boolean =>
  operations.some(({ kind }) => kind !== 'reference' && kind !== 'register' && kind !== 'cut');

/** The cautions that this aircraft's own work asks for. A tube without a stiffness is taken for carbon. */
export function cautionsFor({ parts, stockPieces }: Development, { build, tubes }: Airframe): Cautions {
  const knife = parts.some(workedByHand) ? [words.knife] : [];
  const carbon = stockPieces.some(({ tubeId }) =>
    tubes.some(
      ({ id, kind, eGpa }) =>
        id === tubeId && kind !== 'foamBox' && (eGpa ?? CARBON_FROM_GPA.value) >= CARBON_FROM_GPA.value,
    ),
  );
  return {
    sheets: [...new Set([CUTTERS[build.cutter], ...knife, words.glue])],
    tubes: carbon ? [words.carbon] : [],
  };
}
