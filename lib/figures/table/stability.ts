import { entriesOf } from './entry';

const entry = entriesOf('stability');

export const stabilityEntries = {
  staticMarginPct: entry('staticMarginPct', '% MAC', 'percent', 1),
  cgAtBodySideMm: entry('cgAtBodySideMm', 'mm', 'mm', 1),
  cgPct: entry('cgPct', '% MAC', 'percent', 1),
  firstFlightCgPct: entry('firstFlightCgPct', '% MAC', 'percent', 1),
  cgFromBodySideMm: entry('cgFromBodySideMm', 'mm', 'mm', 1),
  firstFlightAtStationMm: entry('firstFlightAtStationMm', 'mm', 'mm', 1),
  firstFlightFromNoseMm: entry('firstFlightFromNoseMm', 'mm', 'mm', 1),
  cgForeLimitPct: entry('cgForeLimitPct', '% MAC', 'percent', 1),
  cgAftLimitPct: entry('cgAftLimitPct', '% MAC', 'percent', 1),
  neutralPointPct: entry('neutralPointPct', '% MAC', 'percent', 1),
  neutralPointXMm: entry('neutralPointXMm', 'mm', 'mm', 1),
  neutralPointHandbookXMm: entry('neutralPointHandbookXMm', 'mm', 'mm', 1),
  cgForeLimitXMm: entry('cgForeLimitXMm', 'mm', 'mm', 1),
  cgAftLimitXMm: entry('cgAftLimitXMm', 'mm', 'mm', 1),
  firstFlightCgXMm: entry('firstFlightCgXMm', 'mm', 'mm', 1),
  liftSlopePerRad: entry('liftSlopePerRad', '/rad', 'perRad', 2),
} as const;
