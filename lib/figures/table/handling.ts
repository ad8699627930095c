import { entriesOf } from './entry';

const entry = entriesOf('handling');

export const handlingEntries = {
  pitchPowerPerDeg: entry('pitchPowerPerDeg', 'g/°', 'perDeg', 2),
  pitchPowerTwistedPerDeg: entry('pitchPowerTwistedPerDeg', 'g/°', 'perDeg', 2),
  pitchRatePerDeg: entry('pitchRatePerDeg', '°/s per °', 'degPerS', 1),
  pullPerStickMm: entry('pullPerStickMm', 'g/mm', 'none', 3),
  slopPullG: entry('slopPullG', 'g load', 'none', 2),
  controlAnticipation: entry('controlAnticipation', '1/(g s²)', 'none', 1),
  manoeuvrePointXMm: entry('manoeuvrePointXMm', 'mm', 'mm', 1),
  manoeuvreMarginPct: entry('manoeuvreMarginPct', '% MAC', 'percent', 1),
  shortPeriodHz: entry('shortPeriodHz', 'Hz', 'none', 2),
  shortPeriodDamping: entry('shortPeriodDamping', '', 'none', 2),
  shortPeriodHalfS: entry('shortPeriodHalfS', 's', 's', 2),
  pitchDoubleS: entry('pitchDoubleS', 's', 's', 2),
  phugoidPeriodS: entry('phugoidPeriodS', 's', 's', 1),
  phugoidDamping: entry('phugoidDamping', '', 'none', 3),
  rollRatePerDeg: entry('rollRatePerDeg', '°/s per °', 'degPerS', 1),
  rollRateTwistedPerDeg: entry('rollRateTwistedPerDeg', '°/s per °', 'degPerS', 1),
  rollHelix: entry('rollHelix', '', 'none', 3),
  sideslipPerDeg: entry('sideslipPerDeg', '° per °', 'share', 2),
  rollModeS: entry('rollModeS', 's', 's', 3),
  dutchRollHz: entry('dutchRollHz', 'Hz', 'none', 2),
  dutchRollDamping: entry('dutchRollDamping', '', 'none', 2),
  spiralDoubleS: entry('spiralDoubleS', 's', 's', 1),
} as const;
