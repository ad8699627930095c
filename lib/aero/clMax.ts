import type { Airframe } from '@/lib/airframe/schema/airframe';
import type { Panel, SectionShape } from '@/lib/airframe/schema/surface';
import { exactly, type Spread, spread } from '@/lib/numerics/spread';
import { radFromDeg } from '@/lib/numerics/vec';
import { type Air, reynoldsNumber } from './atmosphere';
import { meanLineOf } from './meanLine';

// The greatest lift coefficient of a wing, from what its sections are made like. No lattice knows where a wing stalls: these are
// measurements and the trade's experience, each with its span and where it comes from.

/** A greatest lift coefficient with the span it is expected in, and where it comes from. */
export interface SectionClMax extends Spread {
  readonly source: string;
}

/** A plain plate of sheet. The data's own peak is 0.75 at 20 degrees, with 0.70 at 15 and 0.67 at 25. */
export const FLAT_PLATE_CL_MAX = {
  value: 0.75,
  low: 0.65,
  high: 0.85,
  source:
    'Pelletier & Mueller, Journal of Aircraft 37(5) 2000, pp. 825-832: thin flat plate, aspect ratio 2, Re 140 000, 0.75 at 20 degrees',
} as const satisfies SectionClMax;

/** A plate with a second layer: a blunt front step, little camber. */
const STEPPED_CL_MAX = {
  value: 0.8,
  low: 0.65,
  high: 0.95,
  source: 'common practice, no source: between a plain and a cambered plate',
} as const satisfies SectionClMax;

/** A folded, cambered section of sheet. */
const FOLDED_CL_MAX = {
  value: 1,
  low: 0.9,
  high: 1.1,
  source: 'from memory, moderately sure: folded and cambered plates at Re 60 000 to 200 000 reach 0.9 to 1.1',
} as const satisfies SectionClMax;

/** What a trailing edge turned up takes off a folded section. */
const REFLEX_LOSS = 0.1;

/** A shaped slab: symmetrical ones 0.85, more with camber (in shares of the chord). */
const SLAB_CL_MAX = {
  symmetrical: 0.85,
  perCamber: 7,
  /** No credit for more camber than this share of the chord. */
  mostCamber: 0.05,
  eachWay: 0.15,
  source:
    'from memory: sections of 9 to 12 % at Re 100 000, symmetrical 0.9, with 3.5 % of camber 1.15, less 5 % for rough foam',
} as const;

/**
 * Under this Reynolds number the flow round a curved nose no longer lies on again and thick sections lose lift; a plate, which separates
 * at its edge anyway, does not (low sensitivity over three powers of ten: Aerospace 10(7) 597, 2023, rectangular flat plates of low
 * aspect ratio, after published tests). The rate is from memory: a third less at 15 000.
 */
const THICK_LIMIT = { reynolds: 50_000, power: 0.33 } as const;
/** Under the same Reynolds number a plate's lower end comes down by this share. Common practice, no source. */
const PLATE_LOW_SHARE = 0.9;

/**
 * What the section of one panel lifts at most at a Reynolds number, on a swept wing. Sweep takes the cosine of the quarter chord's off
 * sections that the flow follows (Raymer, "Aircraft Design", ch. 12: 0.9 cl cos L). A plate has separated long before, and what sweep
 * takes the vortex of its edge gives back (Polhamus, NASA TN D-3767): there only the low end comes down.
 * @param camber height of the mean line at half chord, share of the chord; counts for slabs
 */
function sectionClMax(section: SectionShape, camber: number, reynolds: number, quarterSweepDeg: number): SectionClMax {
  const swept = Math.cos(radFromDeg(quarterSweepDeg));
  const slow = Math.min(1, reynolds / THICK_LIMIT.reynolds);
  if (section.kind === 'flat' || section.kind === 'stepped') {
    const plate = section.kind === 'flat' ? FLAT_PLATE_CL_MAX : STEPPED_CL_MAX;
    return { ...plate, low: plate.low * swept * (slow < 1 ? PLATE_LOW_SHARE : 1) };
  }
  const own = section.kind === 'folded' ? foldedClMax(section) : slabClMax(camber);
  const share = swept * slow ** THICK_LIMIT.power;
  // However slow or swept, a thick section is no worse than a plate of its outline.
  const least = FLAT_PLATE_CL_MAX;
  return { ...spread((end) => Math.max(least[end], own[end] * share)), source: own.source };
}

function foldedClMax({ reflexDeg = 0 }: Extract<SectionShape, { kind: 'folded' }>): SectionClMax {
  const loss = reflexDeg > 0 ? REFLEX_LOSS : 0;
  const { value, low, high, source } = FOLDED_CL_MAX;
  return { value: value - loss, low: low - loss, high, source };
}

function slabClMax(camber: number): SectionClMax {
  const { symmetrical, perCamber, mostCamber, eachWay, source } = SLAB_CL_MAX;
  const value = symmetrical + perCamber * Math.min(mostCamber, Math.max(0, camber));
  return { value, low: value - eachWay, high: value + eachWay, source };
}

/** Greatest lift coefficient of the whole wing. */
export interface WingClMax extends SectionClMax {
  /** The person's own figure: no span, no source. */
  readonly typed: boolean;
}

/**
 * Greatest lift coefficient at a flying speed: what the document types in, else the panels of all wings weighted by their area, each by
 * its own section, sweep and Reynolds number; the source is that of the largest panel. Throws RangeError for a document without a wing.
 */
export function wingClMax(airframe: Airframe, speedMs: number, air: Air): WingClMax {
  const { clMax } = airframe.flight;
  if (clMax !== undefined) return { ...exactly(clMax), source: '', typed: true };
  const panels = airframe.surfaces.filter(({ role, mirrored }) => role === 'wing' && mirrored).flatMap((s) => s.panels);
  const parts = panels.map((panel) => ({ area: panelArea(panel), clMax: panelClMax(airframe, panel, speedMs, air) }));
  const area = parts.reduce((sum, part) => sum + part.area, 0);
  const [largest] = [...parts].sort((a, b) => b.area - a.area);
  if (!largest || !(area > 0)) throw new RangeError('a document without a wing has no greatest lift coefficient');
  const mean = spread((end) => parts.reduce((sum, part) => sum + (part.area / area) * part.clMax[end], 0));
  return { ...mean, source: largest.clMax.source, typed: false };
}

/** Seen from above, up to the cant that a wing's panels share. */
const panelArea = ({ lengthMm, rootChordMm, tipChordMm, dihedralDeg }: Panel): number =>
  lengthMm * ((rootChordMm + tipChordMm) / 2) * Math.abs(Math.cos(radFromDeg(dihedralDeg)));

function panelClMax(airframe: Airframe, panel: Panel, speedMs: number, air: Air): SectionClMax {
  const chordMm = (panel.rootChordMm + panel.tipChordMm) / 2;
  const camber = meanLineOf(airframe, panel, chordMm).reduce(
    (z, { at, slope }) => z + slope * Math.max(0, 0.5 - at),
    0,
  );
  return sectionClMax(panel.section, camber, reynoldsNumber(speedMs, chordMm / 1000, air), panel.sweepDeg);
}
