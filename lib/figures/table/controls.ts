import { entriesOf } from './entry';

const entry = entriesOf('controls');

export const controlsEntries = {
  hingeTorquePct: entry('hingeTorquePct', '%', 'percent', 0),
  servoTravelPct: entry('servoTravelPct', '%', 'percent', 0),
  controlSlopDeg: entry('controlSlopDeg', '°', 'deg', 1),
  controlSlopMm: entry('controlSlopMm', 'mm', 'mm', 1),
  rodBucklingFactor: entry('rodBucklingFactor', '', 'none', 1),
} as const;
