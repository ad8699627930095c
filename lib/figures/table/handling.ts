import { entriesOf } from './entry';

const entry = entriesOf('handling');

export const handlingEntries = {
  pitchPowerPerDeg: entry('pitchPowerPerDeg', 'g/°', 'perDeg', 2),
  rollRatePerDeg: entry('rollRatePerDeg', '°/s per °', 'degPerS', 1),
  rollHelix: entry('rollHelix', '', 'none', 3),
} as const;
