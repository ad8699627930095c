import { cp, m } from './defaults';

// Figures of the trade that no document holds: what power, energy, launch and print are judged by. Same marks as the defaults.

export const POWER = {
  trainerWPerKg: cp([150, 200] as const, 'W/kg', 'trainer'),
  trainerThrustToWeight: cp([0.6, 0.8] as const, '', 'trainer'),
  sportWPerKg: cp([220, 300] as const, 'W/kg', 'sport'),
  sportThrustToWeight: cp([0.9, 1.1] as const, '', 'sport'),
  fanThrustToWeight: cp([0.8, 0.9] as const, '', 'ducted fan'),
  pitchSpeedOverStall: cp([2.5, 3] as const, '', 'pitch speed over stall speed'),
} as const;

export const ENERGY = {
  usedShare: cp(0.8, '', 'flight time counts to this share of the capacity'),
  landAtV: cp(3.5, 'V', 'a cell under load; about 3.75 V at rest'),
  statedRatingShare: cp(0.5, '', 'stated C ratings used at half unless measured'),
  controllerMargin: cp(0.2, '', 'a margin under this warns'),
  servoA: cp(0.7, 'A', 'each 9 g servo while it moves'),
  supplyMarginA: cp(1, 'A', 'left on the supply'),
} as const;

export const GEAR = {
  noseWheelMainsDeg: cp(12, '°', 'mains behind the CG, nose wheel'),
  tailWheelMainsDeg: cp(17, '°', 'mains ahead of the CG, tail wheel'),
  groundClearanceMm: cp(25, 'mm', 'propeller, level and tail down'),
} as const;

export const COOLING = {
  inletMm2Per100W: m(300, 'mm²', 'inlet for each 100 W'),
  outletOverInlet: m([1.5, 2] as const, '', 'outlet over inlet'),
  fanInletShare: cp(1, '', 'of the swept area, or more'),
  fanExitShare: cp([0.8, 0.95] as const, '', 'of the swept area'),
} as const;

export const CLEARANCE = {
  propellerMm: cp(10, 'mm', 'or 5 % of the diameter, the larger, with 3° of shaft flex'),
  propellerShare: cp(0.05, '', 'of the diameter'),
  shaftFlexDeg: cp(3, '°', 'foam mounts give'),
  aerialFromCarbonMm: cp(30, 'mm', 'aerials from carbon, at right angles to each other'),
} as const;

export const PRINTER = {
  overlapMm: cp(10, 'mm', 'of neighbouring pages'),
  marginMm: cp(6.4, 'mm', 'what a printer cannot reach'),
  trailingMarginMm: cp(13, 'mm', 'trailing edge of older inkjets'),
} as const;
