import { figureTexts } from '@/lib/text/en/figureTable';
import type { Quantity } from '@/lib/units/quantity';

/** What a figure is; its value stands in `Figures.values` under the same id. */
export interface FigureEntry {
  readonly id: FigureId;
  readonly name: string;
  /** As printed behind the number, metric. */
  readonly unit: string;
  /** For showing it in other units. */
  readonly quantity: Quantity;
  /** Decimals that mean something. */
  readonly digits: number;
  readonly explanation: string;
  readonly method: string;
  readonly source: string;
  readonly limits: string;
}

export type FigureId = keyof typeof figureTexts;

const entry = (id: FigureId, unit: string, quantity: Quantity, digits: number): FigureEntry => ({
  id,
  unit,
  quantity,
  digits,
  ...figureTexts[id],
});

/** Every figure, once: screen, command line, paper and help read it here. In the order in which they are shown. */
export const FIGURES: { readonly [Id in FigureId]: FigureEntry } = {
  spanMm: entry('spanMm', 'mm', 'mm', 0),
  wingAreaDm2: entry('wingAreaDm2', 'dm²', 'dm2', 2),
  aspectRatio: entry('aspectRatio', '', 'none', 2),
  macMm: entry('macMm', 'mm', 'mm', 1),
  aerodynamicCentreXMm: entry('aerodynamicCentreXMm', 'mm', 'mm', 1),
  neutralPointXMm: entry('neutralPointXMm', 'mm', 'mm', 1),
  neutralPointHandbookXMm: entry('neutralPointHandbookXMm', 'mm', 'mm', 1),
  cgXMm: entry('cgXMm', 'mm', 'mm', 1),
  staticMarginPct: entry('staticMarginPct', '% MAC', 'percent', 1),
  cgForeLimitXMm: entry('cgForeLimitXMm', 'mm', 'mm', 1),
  cgAftLimitXMm: entry('cgAftLimitXMm', 'mm', 'mm', 1),
  firstFlightCgXMm: entry('firstFlightCgXMm', 'mm', 'mm', 1),
  cgFromBodySideMm: entry('cgFromBodySideMm', 'mm', 'mm', 1),
  allUpMassG: entry('allUpMassG', 'g', 'g', 0),
  wingLoadingGdm2: entry('wingLoadingGdm2', 'g/dm²', 'gdm2', 1),
  cubicLoadingKgM3: entry('cubicLoadingKgM3', 'kg/m³', 'kgm3', 1),
  stallSpeedMs: entry('stallSpeedMs', 'm/s', 'ms', 1),
  tailVolumeH: entry('tailVolumeH', '', 'none', 2),
  tailVolumeV: entry('tailVolumeV', '', 'none', 3),
  liftSlopePerRad: entry('liftSlopePerRad', '/rad', 'perRad', 2),
  pitchPowerPerDeg: entry('pitchPowerPerDeg', 'g/°', 'perDeg', 2),
  rollRatePerDeg: entry('rollRatePerDeg', '°/s per °', 'degPerS', 1),
  rollHelix: entry('rollHelix', '', 'none', 3),
  pitchInertiaKgM2: entry('pitchInertiaKgM2', 'kg m²', 'kgm2', 5),
  reynoldsMac: entry('reynoldsMac', '', 'none', 0),
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
  'firstFlightCgXMm',
  'cgFromBodySideMm',
  'allUpMassG',
  'wingLoadingGdm2',
  'stallSpeedMs',
  'pitchPowerPerDeg',
  'rollRatePerDeg',
  'rollHelix',
] as const satisfies readonly FigureId[];
