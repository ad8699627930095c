import { wingLiftSlope } from '@/lib/aero/liftSlope';
import { texts } from '@/lib/text/en/figures';
import { texts as words } from '@/lib/text/en/figures/stability';
import { fill } from '@/lib/text/fill';
import { fixedDigits } from '@/lib/units/number';
import { HANDBOOK_DIFFERENCE_PCT, TAIL_VOLUME_H, TAIL_VOLUME_V } from './bands';
import type { SurfaceArea, WingReference } from './reference';
import type { FigureValue } from './types';
import { doesNotApply, known, verdictOf } from './value';

const VOLUME_WORDS = {
  veryLow: texts.verdicts.volumeVerySmall,
  low: texts.verdicts.volumeSmall,
  good: texts.verdicts.volumeGood,
  high: texts.verdicts.volumeLarge,
  veryHigh: texts.verdicts.volumeVeryLarge,
};

interface Stabiliser {
  readonly areaMm2: number;
  /** Quarter MAC to quarter MAC, weighted by area. */
  readonly armMm: number;
}

function together(
  surfaces: readonly SurfaceArea[],
  area: (s: SurfaceArea) => number,
  wing: WingReference,
): Stabiliser | null {
  const areaMm2 = surfaces.reduce((sum, s) => sum + area(s), 0);
  if (!(areaMm2 > 0)) return null;
  const moment = surfaces.reduce((sum, s) => sum + area(s) * (s.quarterXMm - wing.quarterXMm), 0);
  return { areaMm2, armMm: moment / areaMm2 };
}

const hasForeplane = (surfaces: readonly SurfaceArea[]) => surfaces.some(({ surface }) => surface.role === 'foreplane');

/** True when two wings stand one behind the other, so that no mean chord stands for both. */
function inTandem(surfaces: readonly SurfaceArea[]): boolean {
  const reaches = surfaces
    .filter(({ surface }) => surface.role === 'wing' && surface.mirrored)
    .map(({ sections }) => ({
      fore: Math.min(...sections.map(({ le }) => le[0])),
      aft: Math.max(...sections.map(({ le, chord }) => le[0] + chord)),
    }));
  return reaches.some((a, i) => reaches.slice(0, i).some((b) => a.fore >= b.aft || b.fore >= a.aft));
}

const isTail = ({ surface }: SurfaceArea) => surface.role === 'tailplane' || surface.role === 'vtail';
const isFin = ({ surface }: SurfaceArea) =>
  surface.role === 'fin' || surface.role === 'tipFin' || surface.role === 'vtail';

/** Tailplane, and V-tail by its share seen from above. */
const tailOf = (surfaces: readonly SurfaceArea[], wing: WingReference) =>
  together(surfaces.filter(isTail), (s) => s.flatMm2, wing);

const inputsOf = (name: string, { areaMm2, armMm }: Stabiliser) => [
  { name, value: areaMm2 / 10_000, unit: 'dm²' },
  { name: texts.inputs.arm, value: armMm, unit: 'mm' },
];

export function tailVolumeH(surfaces: readonly SurfaceArea[], wing: WingReference): FigureValue {
  const tail = tailOf(surfaces, wing);
  if (!tail) return doesNotApply(hasForeplane(surfaces) ? texts.problems.foreplaneVolume : texts.problems.noTailplane);
  const volume = (tail.areaMm2 * tail.armMm) / (wing.areaMm2 * wing.macMm);
  return known(volume, {
    verdict: verdictOf(volume, TAIL_VOLUME_H, VOLUME_WORDS),
    inputs: inputsOf(texts.inputs.tailArea, tail),
  });
}

export function tailVolumeV(surfaces: readonly SurfaceArea[], wing: WingReference): FigureValue {
  const fin = together(surfaces.filter(isFin), (s) => s.uprightMm2, wing);
  if (!fin) return doesNotApply(texts.problems.noFin);
  const volume = (fin.areaMm2 * fin.armMm) / (wing.areaMm2 * wing.spanMm);
  // Usual volumes are of tails behind a wing: with a foreplane the CG lies far ahead of the wing, and the arm says little.
  const judged = hasForeplane(surfaces) ? {} : { verdict: verdictOf(volume, TAIL_VOLUME_V, VOLUME_WORDS) };
  return known(volume, { ...judged, inputs: inputsOf(texts.inputs.finArea, fin) });
}

/**
 * Neutral point by hand, x in mm: h_n = h_ac + V_H (a_t / a)(1 - 2 a_w / (pi A)), V_H with the arm from the wing's aerodynamic
 * centre, a the slope of wing and tail together, a_w (1 + (a_t / a_w)(S_t / S)(1 - 2 a_w / (pi A))) (Etkin & Reid, "Dynamics of
 * Flight", ch. 2; Nelson, "Flight Stability and Automatic Control", ch. 2; slopes by Lowry & Polhamus, NACA TN 3911). Null for a
 * foreplane.
 */
export function handbookNeutralPointX(surfaces: readonly SurfaceArea[], wing: WingReference): number | null {
  if (hasForeplane(surfaces) || inTandem(surfaces)) return null;
  const tails = surfaces.filter(isTail);
  const tail = together(tails, (s) => s.flatMm2, wing);
  if (!tail) return wing.quarterXMm;
  const wingSlope = wingLiftSlope(wing.aspectRatio, wing.halfChordSweepRad);
  const area = tails.reduce((sum, s) => sum + s.areaMm2, 0);
  const spanSquare = tails.reduce((most, s) => Math.max(most, s.spanMm ** 2), 0);
  const tailSlope = wingLiftSlope(spanSquare / area, 0);
  const volume = (tail.areaMm2 * tail.armMm) / (wing.areaMm2 * wing.macMm);
  const share = (tailSlope / wingSlope) * (1 - (2 * wingSlope) / (Math.PI * wing.aspectRatio));
  const wholeOverWing = 1 + (share * tail.areaMm2) / wing.areaMm2;
  return wing.quarterXMm + (wing.macMm * volume * share) / wholeOverWing;
}

/** The simple estimate beside the lattice's, with a note when they are far apart. */
export function handbookFigure(
  surfaces: readonly SurfaceArea[],
  wing: WingReference,
  latticeX: number | null,
): FigureValue {
  const x = handbookNeutralPointX(surfaces, wing);
  if (x === null) return doesNotApply(texts.problems.foreplaneHandbook);
  const inputs = [{ name: words.inputs.ofMac, value: ((x - wing.macLeXMm) / wing.macMm) * 100, unit: '% MAC' }];
  if (latticeX === null) return known(x, { inputs });
  const difference = ((x - latticeX) / wing.macMm) * 100;
  const limit = HANDBOOK_DIFFERENCE_PCT.value;
  const verdict =
    Math.abs(difference) > limit
      ? {
          level: 'watch' as const,
          words: fill(texts.verdicts.handbookDiffers, { difference: fixedDigits(difference, 1) }),
        }
      : { level: 'good' as const, words: fill(texts.verdicts.handbookAgrees, { limit }) };
  return known(x, { verdict, inputs });
}
