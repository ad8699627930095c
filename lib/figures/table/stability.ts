import { entriesOf } from './entry';

const entry = entriesOf('stability');

export const stabilityEntries = {
  neutralPointXMm: entry('neutralPointXMm', 'mm', 'mm', 1),
  neutralPointHandbookXMm: entry('neutralPointHandbookXMm', 'mm', 'mm', 1),
  staticMarginPct: entry('staticMarginPct', '% MAC', 'percent', 1),
  cgForeLimitXMm: entry('cgForeLimitXMm', 'mm', 'mm', 1),
  cgAftLimitXMm: entry('cgAftLimitXMm', 'mm', 'mm', 1),
  firstFlightCgXMm: entry('firstFlightCgXMm', 'mm', 'mm', 1),
  cgFromBodySideMm: entry('cgFromBodySideMm', 'mm', 'mm', 1),
  liftSlopePerRad: entry('liftSlopePerRad', '/rad', 'perRad', 2),
} as const;
