import { entriesOf } from './entry';

const entry = entriesOf('balance');

export const balanceEntries = {
  allUpMassG: entry('allUpMassG', 'g', 'g', 0),
  cgXMm: entry('cgXMm', 'mm', 'mm', 1),
  cgZMm: entry('cgZMm', 'mm', 'mm', 1),
  cgYMm: entry('cgYMm', 'mm', 'mm', 1),
  tipBalanceG: entry('tipBalanceG', 'g', 'g', 1),
  packForeMm: entry('packForeMm', 'mm', 'mm', 0),
  packAftMm: entry('packAftMm', 'mm', 'mm', 0),
  packFirstFlightMm: entry('packFirstFlightMm', 'mm', 'mm', 0),
  packCgPerCm: entry('packCgPerCm', 'mm', 'mm', 1),
  packSwapCgMm: entry('packSwapCgMm', 'mm', 'mm', 1),
  ballastG: entry('ballastG', 'g', 'g', 0),
  wingLoadingGdm2: entry('wingLoadingGdm2', 'g/dm²', 'gdm2', 1),
  cubicLoadingKgM3: entry('cubicLoadingKgM3', 'kg/m³', 'kgm3', 1),
  rollInertiaKgM2: entry('rollInertiaKgM2', 'kg m²', 'kgm2', 5),
  pitchInertiaKgM2: entry('pitchInertiaKgM2', 'kg m²', 'kgm2', 5),
  yawInertiaKgM2: entry('yawInertiaKgM2', 'kg m²', 'kgm2', 5),
  productXzKgM2: entry('productXzKgM2', 'kg m²', 'kgm2', 5),
  gyrationPitchMacPct: entry('gyrationPitchMacPct', '% MAC', 'percent', 0),
  gyrationPitchLengthPct: entry('gyrationPitchLengthPct', '% length', 'percent', 1),
  gyrationRollSpanPct: entry('gyrationRollSpanPct', '% span', 'percent', 1),
  gyrationYawSpanPct: entry('gyrationYawSpanPct', '% span', 'percent', 1),
} as const;
