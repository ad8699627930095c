import { FIGURES } from '@/lib/figures/table';
import type { FigureMarks, Figures, FigureValue, Verdict } from '@/lib/figures/types';
import { figures as texts } from '@/lib/text/en/board';
import { fill } from '@/lib/text/fill';
import { fixedDigits } from '@/lib/units/number';
import { QUANTITIES, shown, shownText, type UnitSystem } from '@/lib/units/quantity';

/** Figures at the foot of the board, in the order in which a builder asks. */
export const STRIP_IDS = [
  'cgAtBodySideMm',
  'allUpMassG',
  'stallSpeedMs',
  'staticMarginPct',
  'pitchPowerPerDeg',
  'rollRatePerDeg',
  'wingAreaDm2',
  'macMm',
  'neutralPointPct',
] as const;
export type StripId = (typeof STRIP_IDS)[number];

/** One cell of the strip as it is read. */
export interface Reading {
  readonly number: string;
  readonly unit: string;
  readonly level: Verdict | null;
  readonly words: string;
  readonly band: string;
}

export const figureName = (id: StripId): string => FIGURES[id].name;

function numberOf(value: number, id: StripId, system: UnitSystem): { readonly number: string; readonly unit: string } {
  const { unit, digits, quantity } = FIGURES[id];
  const { metric, imperial } = QUANTITIES[quantity];
  const switches = system === 'imperial' && metric !== imperial;
  return switches ? shown(value, quantity, digits, system) : { number: fixedDigits(value, digits), unit };
}

/** How far the CG lies from the ends of its range, in mm; null while it is not inside, or either is unknown. */
export function cgInside({ cg, cgRangeXMm }: FigureMarks, system: UnitSystem): string | null {
  if (cg === null || cgRangeXMm === null) return null;
  const [fore, aft] = cgRangeXMm;
  const mm = (value: number) => shownText(value, 'mm', 0, system);
  return cg[0] < fore || cg[0] > aft ? null : fill(texts.within, { fore: mm(cg[0] - fore), aft: mm(aft - cg[0]) });
}

function bandText(figure: FigureValue, id: StripId, system: UnitSystem): string {
  if (figure.band === undefined) return '';
  const low = numberOf(figure.band.low, id, system).number;
  const high = numberOf(figure.band.high, id, system).number;
  return fill(texts.bandShort, { low, high });
}

/** What a cell shows of the figures; dashes while there are none. */
export function readingOf(id: StripId, figures: Figures | null, system: UnitSystem): Reading {
  const figure = figures?.values[id];
  if (figures === null || figure === undefined)
    return { number: '–', unit: '', level: null, words: texts.working, band: '' };
  if (figure.value === null)
    return { number: '–', unit: '', level: null, words: figure.problem?.message ?? texts.none, band: '' };
  const { verdict } = figure;
  return {
    ...numberOf(figure.value, id, system),
    level: verdict?.level ?? null,
    words: (id === 'cgAtBodySideMm' ? cgInside(figures.marks, system) : null) ?? verdict?.words ?? '',
    band: bandText(figure, id, system),
  };
}
