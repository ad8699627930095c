import { entriesOf } from './entry';

const entry = entriesOf('structure');

export const structureEntries = {
  sparStressMpa: entry('sparStressMpa', 'MPa', 'mpa', 0),
  tipDeflection1gMm: entry('tipDeflection1gMm', 'mm', 'mm', 1),
  controlLossAtCruisePct: entry('controlLossAtCruisePct', '%', 'percent', 0),
  tipTwistPerDeg: entry('tipTwistPerDeg', '°/°', 'share', 2),
  reversalSpeedMs: entry('reversalSpeedMs', 'm/s', 'ms', 0),
  divergenceSpeedMs: entry('divergenceSpeedMs', 'm/s', 'ms', 0),
} as const;
