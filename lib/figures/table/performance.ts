import { entriesOf } from './entry';

const entry = entriesOf('performance');

export const performanceEntries = {
  stallSpeedMs: entry('stallSpeedMs', 'm/s', 'ms', 1),
  launchSpeedMs: entry('launchSpeedMs', 'm/s', 'ms', 1),
  bestGlideRatio: entry('bestGlideRatio', '', 'none', 1),
  bestGlideSpeedMs: entry('bestGlideSpeedMs', 'm/s', 'ms', 1),
  leastSinkMs: entry('leastSinkMs', 'm/s', 'ms', 2),
  leastSinkSpeedMs: entry('leastSinkSpeedMs', 'm/s', 'ms', 1),
  topSpeedMs: entry('topSpeedMs', 'm/s', 'ms', 1),
  climbMs: entry('climbMs', 'm/s', 'ms', 1),
  turnRadius2gM: entry('turnRadius2gM', 'm', 'm', 1),
  staticThrustN: entry('staticThrustN', 'N', 'n', 1),
  thrustToWeight: entry('thrustToWeight', '', 'none', 2),
  pitchSpeedMs: entry('pitchSpeedMs', 'm/s', 'ms', 1),
  levelPowerW: entry('levelPowerW', 'W', 'w', 1),
  dragCruiseN: entry('dragCruiseN', 'N', 'n', 2),
  dragAreaCm2: entry('dragAreaCm2', 'cm²', 'cm2', 1),
  zeroLiftDrag: entry('zeroLiftDrag', '', 'none', 4),
  reynoldsRoot: entry('reynoldsRoot', '', 'none', 0),
  reynoldsTip: entry('reynoldsTip', '', 'none', 0),
} as const;
