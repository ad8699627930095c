import type { Air } from '@/lib/aero/atmosphere';
import { dragAreaOf, dragBuildUp } from '@/lib/aero/drag/buildUp';
import { stoppedDragArea } from '@/lib/aero/drag/fittings';
import { GROWTH_OFF, liftedDrag } from '@/lib/aero/drag/section';
import type { AeroModel } from '@/lib/aero/model';
import type { ResolvedAirframe } from '@/lib/airframe/resolved';
import type { Airframe } from '@/lib/airframe/schema/airframe';
import { exactly, type Spread, type SpreadEnd, spread } from '@/lib/numerics/spread';
import { STANDARD_GRAVITY } from '@/lib/units/factors';
import { inducedPolar } from './induced';
import { type Stall, stallOf } from './speeds';

/** What flying level rests on: weight, wing and drag. */
export interface Polar {
  readonly weightN: number;
  readonly areaM2: number;
  readonly densityKgM3: number;
  readonly stallMs: number;
  /** Drag coefficient at a lift coefficient and a speed; `off` adds the propeller or fan that stands still. Only up to the stall. */
  readonly dragCoefficient: (cl: number, speedMs: number, motor: 'on' | 'off', end: SpreadEnd) => number;
}

/** What an aircraft's polar is made from. */
export interface FlightInput {
  readonly airframe: Airframe;
  readonly resolved: ResolvedAirframe;
  /** About the CG. */
  readonly model: AeroModel;
  readonly areaMm2: number;
  readonly massG: number;
  readonly air: Air;
}

/** The parts of a drag coefficient at one state. */
export interface DragParts {
  readonly zeroLift: number;
  readonly growth: number;
  readonly induced: number;
}

export interface AircraftPolar extends Polar {
  readonly stall: Stall;
  readonly parts: (cl: number, speedMs: number) => DragParts;
  /** Drag coefficient of propellers and fans that stand still. */
  readonly stopped: Spread;
}

/**
 * Polar of an aircraft: drag without lift by its build-up, growth in the wing's sections by their share of the greatest lift, induced drag
 * by the far field in trim. The tail's own growth with lift is left out: it carries little. At the ends of the span the deviations of
 * build-up, growth and stopped propeller add by their squares, having nothing to do with each other.
 */
export function aircraftPolar({ airframe, resolved, model, areaMm2, massG, air }: FlightInput): AircraftPolar {
  const stall = stallOf(airframe, areaMm2, massG, air);
  const induced = inducedPolar(airframe, model);
  const zeroLift = zeroLiftDrag((speedMs) => dragAreaOf(dragBuildUp(airframe, resolved, speedMs, air)), areaMm2);
  const growth = wingGrowth(airframe, stall.clMax.value);
  const stoppedAreas = airframe.drives.map(stoppedDragArea);
  const stopped = spread((end) => stoppedAreas.reduce((sum, area) => sum + area[end], 0) / areaMm2);
  return {
    weightN: (massG / 1000) * STANDARD_GRAVITY,
    areaM2: areaMm2 / 1e6,
    densityKgM3: air.densityKgM3,
    stallMs: stall.speedMs,
    stall,
    stopped,
    parts: (cl, speedMs) => ({ zeroLift: zeroLift(speedMs, 'value'), growth: growth(cl), induced: induced(cl) }),
    dragCoefficient: (cl, speedMs, motor, end) => {
      const clean = zeroLift(speedMs, 'value');
      const lifted = growth(cl);
      const still = motor === 'off' ? stopped : NOTHING;
      const value = clean + lifted + induced(cl) + still.value;
      if (end === 'value') return value;
      const off = Math.hypot(zeroLift(speedMs, end) - clean, GROWTH_OFF * lifted, still[end] - still.value);
      return end === 'high' ? value + off : value - off;
    },
  };
}

const NOTHING = exactly(0);

/** Speeds at which the build-up is worked out, m/s; it changes so little between them that powers of the speed join them. */
const SAMPLED_MS = [2, 4, 7, 12, 20, 35, 60, 100] as const;

/** A drag coefficient by speed from areas at a few places: straight between their logarithms, and on beyond the ends. */
function zeroLiftDrag(
  areaAt: (speedMs: number) => Spread,
  wingMm2: number,
): (speedMs: number, end: SpreadEnd) => number {
  const samples = SAMPLED_MS.map((speedMs) => {
    const area = areaAt(speedMs);
    return { log: Math.log(speedMs), drag: spread((end) => Math.log(area[end] / wingMm2)) };
  });
  return (speedMs, end) => {
    const log = Math.log(speedMs);
    const above = samples.findIndex((sample) => sample.log >= log);
    const i = above < 0 ? samples.length - 1 : Math.max(1, above);
    const [a, b] = [samples[i - 1], samples[i]];
    if (!a || !b) throw new RangeError('a polar needs two speeds');
    return Math.exp(a.drag[end] + ((b.drag[end] - a.drag[end]) * (log - a.log)) / (b.log - a.log));
  };
}

/** What lift adds in the wing's sections, by the kinds of its panels and their areas. */
function wingGrowth({ surfaces }: Airframe, clMax: number): (cl: number) => number {
  const panels = surfaces.filter(({ role, mirrored }) => role === 'wing' && mirrored).flatMap((s) => s.panels);
  const areas = panels.map(({ section, lengthMm, rootChordMm, tipChordMm }) => ({
    kind: section.kind,
    areaMm2: lengthMm * ((rootChordMm + tipChordMm) / 2),
  }));
  const whole = areas.reduce((sum, { areaMm2 }) => sum + areaMm2, 0);
  return (cl) => areas.reduce((sum, { kind, areaMm2 }) => sum + (areaMm2 / whole) * liftedDrag(kind, cl / clMax), 0);
}
