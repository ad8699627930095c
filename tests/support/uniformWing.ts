import type { WingStrip } from '@/lib/structure/halfWing';
import { flexibilityOf, type TwistInput } from '@/lib/structure/twist';

// A wing of one chord and stiffness with a control along all of it: the case that the textbooks solve in closed form.

export const UNIFORM = {
  lengthMm: 500,
  chordMm: 200,
  bendingNmm2: 1e9,
  torsionNmm2: 5e5,
  liftSlope: 5,
  densityKgM3: 1.225,
  control: { lift: 0.6, moment: -0.65 },
} as const;

interface Uniform {
  /** How far the axis lies behind the quarter chord, mm. */
  readonly aftMm: number;
  /** Sweep of the quarter-chord line, positive aft. */
  readonly sweepRad: number;
  readonly bendingNmm2: number;
  readonly torsionNmm2: number;
  readonly strips: number;
}

export function uniformWing(over: Partial<Uniform> = {}): TwistInput {
  const { bendingNmm2, torsionNmm2 } = { ...UNIFORM, ...over };
  const { aftMm = 40, sweepRad = 0, strips: count = 16 } = over;
  const strips = Array.from({ length: count }, (_, i): WingStrip => {
    const sMm = (UNIFORM.lengthMm * (i + 0.5)) / count;
    const quarterXMm = UNIFORM.chordMm / 4 + sMm * Math.tan(sweepRad);
    return {
      station: (i + 0.5) / count,
      sMm,
      widthMm: UNIFORM.lengthMm / count,
      chordMm: UNIFORM.chordMm,
      quarterXMm,
      axisXMm: quarterXMm + aftMm,
      bendingNmm2,
      torsionNmm2,
      yMm: sMm,
      zMm: 0,
      rollRad: 0,
      controls: new Map(),
    };
  });
  return {
    strips,
    flexibility: flexibilityOf(strips),
    controls: strips.map(() => UNIFORM.control),
    levers: strips.map(({ yMm }) => ({ lift: yMm, couple: 0 })),
    liftSlope: UNIFORM.liftSlope,
    densityKgM3: UNIFORM.densityKgM3,
  };
}

/** Dynamic pressure in MPa. */
export const pressureMpa = (speedMs: number): number => 0.5 * UNIFORM.densityKgM3 * speedMs ** 2 * 1e-6;

/**
 * Rolling power over a rigid wing's, from theta'' + k^2 theta = -m with theta(0) = 0 and theta'(L) = 0: theta = (m / k^2) (cos ky +
 * tan kL sin ky - 1), weighed with y.
 */
export function closedRollPower(speedMs: number, aftMm: number): number {
  const { lengthMm: L, chordMm: c, torsionNmm2: gj, liftSlope: a, control } = UNIFORM;
  const q = pressureMpa(speedMs);
  const k = Math.sqrt((q * c * aftMm * a) / gj);
  const m = (q * c * (aftMm * a * control.lift + c * control.moment)) / gj;
  const weighed = (m / k ** 2) * ((1 / Math.cos(k * L) - 1) / k ** 2 - L ** 2 / 2);
  return 1 + weighed / ((control.lift * L ** 2) / 2);
}
