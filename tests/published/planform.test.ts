import { describe, expect, it } from 'vitest';
import { startFrom } from '@/lib/airframe/layouts';
import { resolve, sectionAt } from '@/lib/airframe/resolve';
import type { Airframe } from '@/lib/airframe/schema/airframe';
import { type PlanformStation, planform, stationAt, sweepBetweenDeg } from '@/lib/geometry/planform';

// Reference planforms. Sources: D. P. Raymer, "Aircraft Design: A Conceptual Approach", ch. 7; B. Etkin and L. D. Reid,
// "Dynamics of Flight", app. C (mean aerodynamic chord as the integral of c^2). Expected values are exact arithmetic of those
// formulas, so the tolerance is the printed digits.

const G2: PlanformStation[] = [
  { x: 0, y: 0, chord: 0.3 },
  { x: 0.02, y: 0.3, chord: 0.26 },
  { x: 0.1, y: 0.6, chord: 0.14 },
];

describe('planform against published formulas', () => {
  it('G1: trapezoid, MAC = (2/3) cr (1 + t + t^2) / (1 + t) (Raymer ch. 7; Etkin and Reid app. C)', () => {
    const g1 = planform([
      { x: 0, y: 0, chord: 0.3 },
      { x: 0.12, y: 0.6, chord: 0.15 },
    ]);
    expect(g1.area).toBeCloseTo(0.27, 12);
    expect(g1.aspectRatio).toBeCloseTo(16 / 3, 9);
    expect(g1.mac).toBeCloseTo(0.7 / 3, 9);
    expect(g1.yMac).toBeCloseTo(0.8 / 3, 9);
    expect(g1.xLeMac).toBeCloseTo(0.16 / 3, 9);
    expect(g1.xQuarterMac).toBeCloseTo(0.335 / 3, 9);
  });
  it('G2: two panels (integrals of c^2, c x, c y; same sources)', () => {
    const g2 = planform(G2);
    expect(g2.area).toBeCloseTo(0.288, 12);
    // By hand: integral of c^2 0.03592, of c x 0.00418, of c y 0.0384, half area 0.144.
    expect(g2.mac).toBeCloseTo(0.03592 / 0.144, 10);
    expect(g2.yMac).toBeCloseTo(0.0384 / 0.144, 10);
    expect(g2.xLeMac).toBeCloseTo(0.00418 / 0.144, 10);
    expect(g2.xQuarterMac).toBeCloseTo(0.01316 / 0.144, 10);
    expect(g2.aspectRatio).toBeCloseTo(5, 9);
  });
  it('G3: ellipse with a straight quarter chord, MAC = 8 c0 / (3 pi), within 0.1 % for 40 straight panels (same sources)', () => {
    const stations = Array.from({ length: 41 }, (_, i): PlanformStation => {
      const y = Math.sin((i / 40) * (Math.PI / 2));
      const chord = 0.4 * Math.sqrt(Math.max(0, 1 - y * y));
      return { x: -chord / 4, y, chord };
    });
    const g3 = planform(stations);
    expect(Math.abs(g3.area / ((Math.PI * 2 * 0.4) / 4) - 1)).toBeLessThan(1e-3);
    expect(Math.abs(g3.mac / (0.848826 * 0.4) - 1)).toBeLessThan(1e-3);
    expect(Math.abs(g3.yMac / 0.424413 - 1)).toBeLessThan(1e-3);
    expect(g3.xQuarterMac).toBeCloseTo(0, 9);
  });
  it('G4: triangle, MAC = 2/3 cr at a third of the half span (same sources)', () => {
    const g4 = planform([
      { x: 0, y: 0, chord: 0.6 },
      { x: 0.6, y: 0.4, chord: 0 },
    ]);
    expect(g4.mac).toBeCloseTo(0.4, 12);
    expect(g4.xLeMac).toBeCloseTo(0.2, 12);
    expect(g4.xQuarterMac).toBeCloseTo(0.3, 12);
    expect(g4.yMac).toBeCloseTo(0.8 / 6, 12);
  });
  it('G5: Warren 12 planform (W. H. Mason, "Applied Computational Aerodynamics", ch. 6)', () => {
    const half = 2.8284 / 2;
    const stations: PlanformStation[] = [
      { x: 0, y: 0, chord: 1.5 },
      { x: half * Math.tan((53.54 * Math.PI) / 180), y: half, chord: 0.5 },
    ];
    const g5 = planform(stations);
    expect(g5.area).toBeCloseTo(2.8284, 4);
    expect(g5.aspectRatio).toBeCloseTo(2.8284, 4);
    expect(g5.averageChord).toBeCloseTo(1, 9);
    expect(g5.mac).toBeCloseTo(13 / 12, 9);
    // The sweep is printed to four digits.
    expect(Math.abs(g5.xLeMac - 0.797497)).toBeLessThan(1e-5);
    const [root, tip] = stations;
    if (!root || !tip) throw new RangeError('two stations');
    expect(sweepBetweenDeg(root, tip, 0.5)).toBeCloseTo(44.996, 2);
  });
  it('G6: splitting a panel changes nothing (invariance)', () => {
    const split = planform([...G2.slice(0, 1), stationAt(G2, 0.15), ...G2.slice(1)]);
    const whole = planform(G2);
    for (const key of ['area', 'mac', 'yMac', 'xLeMac', 'xQuarterMac', 'aspectRatio'] as const) {
      expect(Math.abs(split[key] / whole[key] - 1)).toBeLessThan(1e-12);
    }
  });
  it('G7: dihedral with the projected span kept leaves area and MAC unchanged: the reference area is the projected one', () => {
    const figures = (dihedralDeg: number, lengthMm: number) => {
      const base = startFrom('trainer', 'Reference');
      const airframe: Airframe = {
        ...base,
        surfaces: base.surfaces.map((surface) => ({
          ...surface,
          incidenceDeg: 0,
          panels: surface.panels.map((panel) => ({
            ...panel,
            lengthMm,
            dihedralDeg,
            rootChordMm: 190,
            tipChordMm: 130,
            sweepDeg: 11,
          })),
        })),
      };
      const resolved = resolve(airframe);
      if (!resolved.ok) throw new RangeError('the wing resolves');
      const wing = resolved.value.surfaces[0];
      if (!wing) throw new RangeError('there is a wing');
      const stations = [0, 1].map((at): PlanformStation => {
        const { le, chordMm } = sectionAt(wing, at);
        return { x: le[0], y: le[1], chord: chordMm };
      });
      return planform(stations);
    };
    const cos = Math.cos((10 * Math.PI) / 180);
    const flat = figures(0, 400);
    const raised = figures(10, 400 / cos);
    expect(raised.area).toBeCloseTo(flat.area, 6);
    expect(raised.mac).toBeCloseTo(flat.mac, 9);
    expect(raised.yMac).toBeCloseTo(flat.yMac, 9);
  });
});
