import { entriesOf } from './entry';

const entry = entriesOf('performance');

export const performanceEntries = {
  stallSpeedMs: entry('stallSpeedMs', 'm/s', 'ms', 1),
} as const;
