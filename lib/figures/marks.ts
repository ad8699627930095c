import type { WingReference } from './reference';
import type { Stability } from './stability';
import type { FigureMarks } from './types';

export const NO_MARKS: FigureMarks = {
  mac: null,
  aerodynamicCentreXMm: null,
  neutralPointXMm: null,
  neutralPointBandXMm: null,
  cgRangeXMm: null,
  firstFlightCgXMm: null,
  cg: null,
};

/** Where to draw the wing's mean chord, and what is known of stability; the CG is added by whoever has one. */
export function marksOf(wing: WingReference, stability: Stability | null): FigureMarks {
  return {
    ...NO_MARKS,
    mac: { lengthMm: wing.macMm, leXMm: wing.macLeXMm, yMm: wing.macYMm, zMm: wing.macZMm },
    aerodynamicCentreXMm: wing.quarterXMm,
    neutralPointXMm: stability?.neutralPointX ?? null,
    neutralPointBandXMm: stability?.bandX ?? null,
    cgRangeXMm: stability && stability.firstFlightX !== null ? [stability.foreLimitX, stability.aftLimitX] : null,
    firstFlightCgXMm: stability?.firstFlightX ?? null,
  };
}
