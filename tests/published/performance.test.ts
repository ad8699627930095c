import { describe, expect, it } from 'vitest';
import { airAt } from '@/lib/aero/atmosphere';
import { FLAT_PLATE_CL_MAX } from '@/lib/aero/clMax';
import { laminarFriction, turbulentFriction } from '@/lib/aero/drag/friction';
import { edgeDrag, frictionDrag, liftedDrag } from '@/lib/aero/drag/section';
import { bestGlide, leastSink, levelDragN } from '@/lib/flight/performance/level';
import type { Polar } from '@/lib/flight/performance/polar';
import { turnRadiusM } from '@/lib/flight/performance/speeds';

describe('skin friction (Schlichting, Boundary-Layer Theory)', () => {
  it.each([
    [1e4, 0.01328],
    [1e5, 0.0041995],
    [2.5e5, 0.002656],
  ])('laminar at Re %d: 1.328 / sqrt(Re) = %d (Blasius, ch. 7)', (re, expected) => {
    expect(laminarFriction(re) / expected - 1).toBeCloseTo(0, 4);
  });

  it('turbulent: 0.455 / (log10 Re)^2.58 is 0.00447 at Re 1e6 and 0.00300 at 1e7 (table 21.1, from memory)', () => {
    expect(turbulentFriction(1e6)).toBeCloseTo(0.00447, 5);
    expect(turbulentFriction(1e7)).toBeCloseTo(0.003, 5);
  });
});

// Pelletier & Mueller, Journal of Aircraft 37(5) 2000: flat plate of 1.93 % thickness, full aspect ratio 2, Re 140 000.
const PLATE = [
  [0.3, 0.03],
  [0.5, 0.08],
  [0.7, 0.18],
] as const;

describe('drag of a flat plate (Pelletier & Mueller 2000, Re 140 000, aspect ratio 2)', () => {
  // Their edges were an ellipse in front and a taper behind, so there is nothing blunt in it.
  const shape = { kind: 'flat', thickness: 0.0193, frontEdge: 0, backEdge: 0, transition: 0 } as const;
  const friction = frictionDrag(shape, 1.4e5);

  it('without lift 0.015: within 15 %, and inside the span', () => {
    expect(Math.abs(friction.value / 0.015 - 1)).toBeLessThan(0.15);
    expect(friction.low).toBeLessThan(0.015);
    expect(friction.high).toBeGreaterThan(0.015);
    expect(edgeDrag(shape, friction.value, 0).value).toBe(0);
  });

  it.each(PLATE)('at CL %d the whole is %d within 10 %', (cl, cd) => {
    const induced = cl ** 2 / (Math.PI * 2);
    const whole = friction.value + liftedDrag('flat', cl / FLAT_PLATE_CL_MAX.value) + induced;
    expect(Math.abs(whole / cd - 1)).toBeLessThan(0.1);
  });
});

/** A parabolic polar: CD = CD0 + CL^2 / (pi A e), without a stall that matters. */
function parabolic(zeroLift: number, factor: number, weightN: number, areaM2: number): Polar {
  const densityKgM3 = airAt(0).densityKgM3;
  return {
    weightN,
    areaM2,
    densityKgM3,
    stallMs: Math.sqrt((2 * weightN) / (densityKgM3 * areaM2 * 3)),
    dragCoefficient: (cl) => zeroLift + factor * cl ** 2,
  };
}

describe('glide of a parabolic polar (Anderson, Aircraft Performance and Design, ch. 5)', () => {
  const [zeroLift, factor] = [0.031, 1 / (Math.PI * 5.2 * 0.83)];
  const polar = parabolic(zeroLift, factor, 5.4, 0.21);
  const speedAt = (cl: number) => Math.sqrt((2 * 5.4) / (1.225 * 0.21 * cl));

  it('the flattest is at CL = sqrt(CD0 / k), and its ratio is 1 / (2 sqrt(k CD0))', () => {
    const glide = bestGlide(polar);
    expect(glide.ratio).toBeCloseTo(1 / (2 * Math.sqrt(factor * zeroLift)), 5);
    expect(glide.speedMs).toBeCloseTo(speedAt(Math.sqrt(zeroLift / factor)), 2);
  });

  it('the slowest sink is at CL = sqrt(3 CD0 / k), where induced drag is three times the rest', () => {
    const cl = Math.sqrt((3 * zeroLift) / factor);
    const glide = leastSink(polar);
    expect(glide.speedMs).toBeCloseTo(speedAt(cl), 2);
    // Sink = sqrt(2 W / (rho S)) CD / CL^1.5
    expect(glide.sinkMs).toBeCloseTo((Math.sqrt((2 * 5.4) / (1.225 * 0.21)) * 4 * zeroLift) / cl ** 1.5, 5);
    // 3^(1/4) = 1.31607 times slower than the flattest glide.
    expect(bestGlide(polar).speedMs / glide.speedMs).toBeCloseTo(1.31607, 3);
  });

  it('elliptic loading, A 8, CL 0.6: induced drag alone is CL^2 / (pi A) = 0.014324 (Prandtl)', () => {
    const tips = parabolic(0, 1 / (Math.PI * 8), 5.4, 0.21);
    const speed = speedAt(0.6);
    expect(levelDragN(tips, speed, 'on') / (0.5 * 1.225 * speed ** 2 * 0.21)).toBeCloseTo(0.014324, 6);
  });
});

it('turn: at 12 m/s and 2 g 144 / (9.80665 sqrt 3) = 8.478 m (Anderson, Aircraft Performance and Design, ch. 6)', () => {
  expect(turnRadiusM(12, 2)).toBeCloseTo(8.478, 3);
  expect(() => turnRadiusM(12, 1)).toThrow(RangeError);
});
