import { entriesOf } from './entry';

const entry = entriesOf('balance');

export const balanceEntries = {
  cgXMm: entry('cgXMm', 'mm', 'mm', 1),
  allUpMassG: entry('allUpMassG', 'g', 'g', 0),
  wingLoadingGdm2: entry('wingLoadingGdm2', 'g/dm²', 'gdm2', 1),
  cubicLoadingKgM3: entry('cubicLoadingKgM3', 'kg/m³', 'kgm3', 1),
  pitchInertiaKgM2: entry('pitchInertiaKgM2', 'kg m²', 'kgm2', 5),
} as const;
