import { describe, expect, it } from 'vitest';
import { type LiftingLine, type LiftingLineStation, liftingLine, liftingLineEfficiency } from '@/lib/aero/liftingLine';
import { radFromDeg } from '@/lib/numerics/vec';
import { ellipse, within } from './support/wings';

// The lifting line against Glauert's and Pearson & Jones's own results and exact consequences of theirs.

const TWO_PI = 2 * Math.PI;

const flat = (y: number, chord: number): LiftingLineStation => ({ y, chord, incidenceRad: 0 });
const tapered = (aspectRatio: number, taper: number) => [flat(0, 1), flat((aspectRatio * (1 + taper)) / 4, taper)];
const elliptic = (aspectRatio: number) =>
  ellipse((aspectRatio * Math.PI) / 4, 1, 0.25, 400).map(({ le, chord }) => flat(le[1], chord));

function line(stations: readonly LiftingLineStation[]): LiftingLine {
  const solved = liftingLine(stations);
  if (!solved) throw new RangeError('no lifting line');
  return solved;
}

describe('V11: tau and delta of rectangles (H. Glauert, The Elements of Aerofoil and Airscrew Theory; recomputed with 200 terms)', () => {
  it.each([
    [0.5, 0.099, 0.02],
    [0.75, 0.135, 0.036],
    [1, 0.166, 0.051],
    [1.25, 0.193, 0.066],
    [1.5, 0.217, 0.081],
    [1.75, 0.238, 0.095],
  ])('A / a0 = %d: tau %d, delta %d, within 0.002', (ratio, tau, delta) => {
    const got = line(tapered(ratio * TWO_PI, 1));
    expect(Math.abs(got.tau - tau)).toBeLessThan(0.002);
    expect(Math.abs(got.delta - delta)).toBeLessThan(0.002);
  });
});

describe('V12: slope and delta of rectangles (same method)', () => {
  it.each([
    [2, 3.038, 0.0101],
    [4, 4.0284, 0.0285],
    [6, 4.5304, 0.0483],
    [8, 4.8377, 0.0676],
    [10, 5.0468, 0.0859],
    [20, 5.5443, 0.1617],
  ])('A %d: a %d within 0.1 %%, delta %d to its digits', (aspectRatio, slope, delta) => {
    const got = line(tapered(aspectRatio, 1));
    within(got.liftSlope, slope, 0.001);
    expect(got.delta).toBeCloseTo(delta, 3);
  });
});

describe('V13: delta over taper at A = 2 pi (Anderson, Fundamentals of Aerodynamics, fig. 5.20, after McCormick)', () => {
  it.each([
    [0, 0.1334],
    [0.2, 0.0195],
    [0.3, 0.0105],
    [0.4, 0.0094],
    [0.6, 0.018],
    [1, 0.0511],
  ])('taper %d: %d, within 0.001', (taper, delta) => {
    expect(Math.abs(line(tapered(TWO_PI, taper)).delta - delta)).toBeLessThan(0.001);
  });

  it('is least near a taper of 0.37', () => {
    const tapers = Array.from({ length: 41 }, (_, i) => 0.2 + i * 0.01);
    const deltas = tapers.map((taper) => line(tapered(TWO_PI, taper)).delta);
    expect(Math.abs((tapers[deltas.indexOf(Math.min(...deltas))] ?? 0) - 0.37)).toBeLessThan(0.03);
  });
});

describe('an ellipse', () => {
  it('V14: b 5, root chord 1, 5.7106 degrees: CL 0.4765 (van Garrel, ECN-C-03-079, 2003, p. 29), within 0.05 %', () => {
    within(line(elliptic(20 / Math.PI)).liftSlope * radFromDeg(5.7106), 0.4765, 5e-4);
  });

  it('has no induced drag above CL^2 / (pi A) (Prandtl)', () => {
    expect(Math.abs(line(elliptic(8)).delta)).toBeLessThan(1e-4);
    expect(Math.abs((liftingLineEfficiency(elliptic(8)) ?? 0) - 1)).toBeLessThan(1e-4);
  });
});

describe('V16: A 8, taper 0.8, a0 2 pi, 5 degrees (Anderson, Fundamentals of Aerodynamics, ex. 5.1; from memory, sure)', () => {
  const got = line(tapered(8, 0.8));
  const slopeBy = (tau: number) => 1 / (1 / TWO_PI + (1 + tau) / (Math.PI * 8));

  it('tau means what it means there: the book’s 0.055 gives a 4.972 and CL 0.4339, and the solved tau the solved slope', () => {
    within(slopeBy(0.055), 4.972, 0.003);
    within(slopeBy(0.055) * radFromDeg(5), 0.4339, 0.003);
    within(slopeBy(got.tau), got.liftSlope, 1e-12);
  });

  it('delta means what it means there: at CL 0.4339 the book’s 0.055 gives CDi 0.00790, and the solved delta the solved drag', () => {
    const dragBy = (delta: number, lift: number) => ((1 + delta) * lift ** 2) / (Math.PI * 8);
    within(dragBy(0.055, 0.4339), 0.0079, 0.003);
    within(got.inducedDrag(radFromDeg(5)), dragBy(got.delta, got.liftSlope * radFromDeg(5)), 1e-9);
  });

  it('solved, the wing lifts within 2 % of the book, which sets tau equal to a delta read off a figure', () => {
    within(got.liftSlope, 4.972, 0.02);
    expect(Math.abs(got.delta - 0.055)).toBeLessThan(0.012);
  });
});

describe('D1: Cl_p of an ellipse, -pi A / (4 (A + 4)) (Glauert; Etkin & Reid, Dynamics of Flight), exact', () => {
  it.each([
    [6, -0.4712],
    [8, -0.5236],
    [10, -0.561],
    [20, -0.6545],
  ])('A %d: %d', (aspectRatio, expected) => {
    expect(line(elliptic(aspectRatio)).rollDamping).toBeCloseTo(expected, 4);
  });
});

describe('D2: Cl_p of rectangles and taper 0.5 (method of Pearson & Jones, NACA TR 635, 1938; 200 terms), within 0.2 %', () => {
  it.each([
    [6, 1, -0.5233],
    [8, 1, -0.5914],
    [10, 1, -0.6421],
    [6, 0.5, -0.4866],
    [8, 0.5, -0.5438],
    [10, 0.5, -0.5854],
  ])('A %d, taper %d: %d', (aspectRatio, taper, expected) => {
    within(line(tapered(aspectRatio, taper)).rollDamping, expected, 0.002);
  });
});
