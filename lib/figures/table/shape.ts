import { entriesOf } from './entry';

const entry = entriesOf('shape');

export const shapeEntries = {
  spanMm: entry('spanMm', 'mm', 'mm', 0),
  wingAreaDm2: entry('wingAreaDm2', 'dm²', 'dm2', 2),
  aspectRatio: entry('aspectRatio', '', 'none', 2),
  macMm: entry('macMm', 'mm', 'mm', 1),
  aerodynamicCentreXMm: entry('aerodynamicCentreXMm', 'mm', 'mm', 1),
  tailVolumeH: entry('tailVolumeH', '', 'none', 2),
  tailVolumeV: entry('tailVolumeV', '', 'none', 3),
  spanEfficiency: entry('spanEfficiency', '', 'none', 2),
  reynoldsMac: entry('reynoldsMac', '', 'none', 0),
} as const;
