import { balanceEntries } from './table/balance';
import { controlsEntries } from './table/controls';
import type { FigureEntry, FigureId } from './table/entry';
import { handlingEntries } from './table/handling';
import { performanceEntries } from './table/performance';
import { shapeEntries } from './table/shape';
import { stabilityEntries } from './table/stability';
import { structureEntries } from './table/structure';
import { trimEntries } from './table/trim';

export { FIGURE_GROUPS, type FigureEntry, type FigureGroup, type FigureId } from './table/entry';

/** Every figure, once: screen, command line, paper and help read it here. In the order in which they are shown. */
export const FIGURES: { readonly [Id in FigureId]: FigureEntry } = {
  ...shapeEntries,
  ...balanceEntries,
  ...stabilityEntries,
  ...handlingEntries,
  ...trimEntries,
  ...performanceEntries,
  ...controlsEntries,
  ...structureEntries,
};

/** What decides whether it will fly: shown while a handle is dragged, and worked out at the depth "live". */
export const DECIDING = [
  'spanMm',
  'wingAreaDm2',
  'macMm',
  'neutralPointXMm',
  'cgXMm',
  'staticMarginPct',
  'cgForeLimitXMm',
  'cgAftLimitXMm',
  'cgAtBodySideMm',
  'cgPct',
  'neutralPointPct',
  'firstFlightCgXMm',
  'firstFlightCgPct',
  'cgFromBodySideMm',
  'firstFlightAtStationMm',
  'allUpMassG',
  'wingLoadingGdm2',
  'stallSpeedMs',
  'pitchPowerPerDeg',
  'rollRatePerDeg',
  'rollHelix',
] as const satisfies readonly FigureId[];
