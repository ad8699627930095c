import { entriesOf } from './entry';

const entry = entriesOf('trim');

export const trimEntries = {
  trimElevatorDeg: entry('trimElevatorDeg', '°', 'deg', 1),
  trimShareOfThrowPct: entry('trimShareOfThrowPct', '%', 'percent', 0),
  stallElevatorSharePct: entry('stallElevatorSharePct', '%', 'percent', 0),
  throttleTrimDeg: entry('throttleTrimDeg', '°', 'deg', 1),
} as const;
