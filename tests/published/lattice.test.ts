import { describe, expect, it } from 'vitest';
import type { Derivatives } from '@/lib/aero/lattice/derivatives';
import { symmetricFlow } from '@/lib/aero/lattice/influence';
import { wingLiftSlope } from '@/lib/aero/liftSlope';
import { radFromDeg } from '@/lib/numerics/vec';
import { delta, ellipse, FAIR, leSweep, rectangle, TWO_DIMENSIONAL, trapezoid, wingOf, within } from './support/wings';

// Wings alone whose planforms others have published. Tolerances are those fair to the lattice used in each case.

const WARREN_12 = trapezoid({ span: 2.8284, root: 1.5, tip: 0.5, leSweepRad: radFromDeg(53.54) });
/** Aspect ratio 5, untapered, swept 45 degrees, span 1. */
const SWEPT_45 = trapezoid({ span: 1, root: 0.2, tip: 0.2, leSweepRad: Math.PI / 4 });

describe('V1: Warren 12 planform (W. H. Mason, Applied Computational Aerodynamics, ch. 6.9, after Warren)', () => {
  it('CL_alpha 2.743, Cm_alpha -3.10 about the apex with the average chord 1.0, within 1 %', () => {
    const { alpha } = wingOf(WARREN_12, FAIR).symmetric;
    within(alpha.lift, 2.743, 0.01);
    within(alpha.pitch, -3.1, 0.01);
  });

  it('so the centre lies at 3.10 / 2.743 = 1.1302 behind the apex, within 1 % of the chord', () => {
    expect(Math.abs(wingOf(WARREN_12, FAIR).symmetric.neutralPointX - 1.1302)).toBeLessThan(0.01);
  });
});

describe('V2: four horseshoes a half (Bertin & Smith, Aerodynamics for Engineers, worked vortex-lattice example)', () => {
  // Equal strips, no inset: the same lattice as in the book.
  const plain = wingOf(SWEPT_45, { strips: 4, rows: 1, options: { tipInset: 0 } });

  it('vortex strengths over 4 pi b V alpha are 0.0273 0.0287 0.0286 0.0250 from root to tip', () => {
    expect(strengths(plain).map((s) => (s / (4 * Math.PI)).toFixed(4))).toEqual([
      '0.0273',
      '0.0287',
      '0.0286',
      '0.0250',
    ]);
  });

  it('CL is 3.443 alpha, within 0.1 %', () => within(plain.symmetric.alpha.lift, 3.443, 0.001));
});

describe('V5, V6: the same wing in a wind tunnel, 12 % thick, Re 1.7e6 (Weber & Brebner, ARC R&M 2882, 1958, tables 3 and 4)', () => {
  const solved = wingOf(SWEPT_45, { strips: 12, rows: 5 });
  const { symmetric, lattice } = solved;

  it('measured CL / alpha at 4.2 degrees is 0.238 / 4.2 a degree = 3.25 a radian: the lattice lies 6 % below to 3 % above', () => {
    const ratio = symmetric.alpha.lift / (0.238 / radFromDeg(4.2));
    expect(ratio).toBeGreaterThan(0.94);
    expect(ratio).toBeLessThan(1.03);
  });

  it.each([
    [2.1, 0.121],
    [6.3, 0.35],
    [8.4, 0.456],
  ])('at %d degrees measured CL %d, in the same bounds', (alphaDeg, measured) => {
    const ratio = (symmetric.alpha.lift * radFromDeg(alphaDeg)) / measured;
    expect(ratio).toBeGreaterThan(0.94);
    expect(ratio).toBeLessThan(1.03);
  });

  it.each([
    [0.041, 1.013],
    [0.082, 1.042],
    [0.163, 1.063],
    [0.245, 1.055],
    [0.367, 1.055],
    [0.51, 1.055],
    [0.653, 1.034],
    [0.898, 0.807],
  ])('at 2y/b %d the section carries %d of the mean, within 7 %%', (station, measured) => {
    const strips = lattice.surfaces[0]?.strips ?? [];
    const loads = strengths(solved).map((s, k) => ({
      at: ((strips[k]?.from ?? 0) + (strips[k]?.to ?? 0)) / 2,
      share: (2 * s) / 0.2 / symmetric.alpha.lift,
    }));
    within(between(loads, station), measured, 0.07);
  });
});

/** Circulation of each strip of a wing alone, over V alpha. */
function strengths({ solution, lattice }: Derivatives): number[] {
  const [surface] = lattice.surfaces;
  if (!surface) throw new RangeError('no surface');
  const columns = solution.symmetric.length / lattice.mirroredCount;
  return surface.strips.map((_, k) => {
    let sum = 0;
    for (let r = 0; r < surface.rows; r++) sum += solution.symmetric[(k * surface.rows + r) * columns + 1] ?? 0;
    return sum;
  });
}

function between(loads: readonly { at: number; share: number }[], at: number): number {
  const index = Math.max(
    1,
    loads.findIndex((l) => l.at >= at),
  );
  const [a, b] = [loads[index - 1], loads[index]];
  if (!a || !b) throw new RangeError(`no strips about ${at}`);
  return a.share + ((b.share - a.share) * (at - a.at)) / (b.at - a.at);
}

describe('low aspect ratios', () => {
  it('V7: square wing 1.4602 (E. O. Tuck 1993, J. Austral. Math. Soc. B 35; from memory, sure), within 0.5 %', () => {
    within(wingOf(rectangle(1), FAIR).symmetric.alpha.lift, 1.4602, 0.005);
  });

  it('V8: aspect ratio 2, 2.474 and centre 0.2094 c (Garner, Hewitt & Labrujere, R&M 3597, 1968; from memory)', () => {
    const { alpha, neutralPointX } = wingOf(rectangle(2), { strips: 16, rows: 6 }).symmetric;
    within(alpha.lift, 2.474, 0.005);
    expect(Math.abs(neutralPointX - 0.2094)).toBeLessThan(0.004);
  });

  it('V9: circular wing 1.7900, centre 0.2605 diameters ahead of the middle (P. F. Jordan 1971; from memory), within 3 %', () => {
    const { alpha, neutralPointX } = wingOf(ellipse(1, 1, 0.5), { strips: 12, rows: 5 }).symmetric;
    within(alpha.lift, 1.79, 0.03);
    within(neutralPointX, -0.2605, 0.03);
  });

  it.each([
    [0, 2.524],
    [30, 2.48],
    [45, 2.359],
  ])(
    'V10: aspect ratio 2 swept %d degrees, %d of the 126-vortex lattice (Falkner, R&M 2591, 1948, tables 25, 26, 28), within 5 %%',
    (sweepDeg, expected) => {
      const wing = trapezoid({ span: 2, root: 1, tip: 1, leSweepRad: radFromDeg(sweepDeg) });
      within(wingOf(wing, FAIR).symmetric.alpha.lift, expected, 0.05);
    },
  );

  it('V18: slender delta: pi A / 2, centre at 2/3 of the root (R. T. Jones, NACA TR 835), Cl_p -pi A / 32 (Ribner, TN 1423)', () => {
    const { symmetric, antisymmetric } = wingOf(delta(0.05), { strips: 16, rows: 16 });
    within(symmetric.alpha.lift, (Math.PI * 0.05) / 2, 0.02);
    expect(Math.abs(symmetric.neutralPointX - 2 / 3)).toBeLessThan(0.01);
    within(antisymmetric?.rollRate.roll ?? 0, (-Math.PI * 0.05) / 32, 0.04);
  });

  it('V18: at aspect ratio 0.1 it is still near, if the point of the delta is not inset', () => {
    const { symmetric, antisymmetric } = wingOf(delta(0.1), { strips: 16, rows: 16, options: { tipInset: 0 } });
    within(symmetric.alpha.lift, (Math.PI * 0.1) / 2, 0.02);
    expect(Math.abs(symmetric.neutralPointX - 2 / 3)).toBeLessThan(0.01);
    within(antisymmetric?.rollRate.roll ?? 0, (-Math.PI * 0.1) / 32, 0.04);
    // A limit: the wider delta is further from it.
    expect(symmetric.alpha.lift / 0.1).toBeLessThan(
      wingOf(delta(0.05), { strips: 16, rows: 16, options: { tipInset: 0 } }).symmetric.alpha.lift / 0.05,
    );
  });

  it.each([
    [1, 1.3],
    [1.5, 1.8],
    [2, 2.2],
  ])(
    'V19: delta of aspect ratio %d, potential-lift constant %d (Polhamus, NASA TN D-3767, 1966; read from a figure, from memory), within 2 %%',
    (aspectRatio, expected) => {
      within(wingOf(delta(aspectRatio), { strips: 12, rows: 5 }).symmetric.alpha.lift, expected, 0.02);
    },
  );
});

describe('V14: elliptic wing, b 5, root chord 1, 5.7106 degrees (van Garrel, ECN-C-03-079, 2003, p. 29)', () => {
  it('a lifting surface gives 3 to 6 % less than the lifting line’s CL 0.4765', () => {
    const ratio = (wingOf(ellipse(5, 1, 0.25), FAIR).symmetric.alpha.lift * radFromDeg(5.7106)) / 0.4765;
    expect(ratio).toBeGreaterThan(0.94);
    expect(ratio).toBeLessThan(0.97);
  });
});

describe('V17: lift slope of any aspect ratio (Lowry & Polhamus, NACA TN 3911, 1957; DATCOM 4.1.3.2)', () => {
  const deg45 = Math.PI / 4;
  it.each([
    { a: 1, sweep: 0, k: 1, expected: 1.4833 },
    { a: 2, sweep: 0, k: 1, expected: 2.6026 },
    { a: 3, sweep: 0, k: 1, expected: 3.3627 },
    { a: 4, sweep: 0, k: 1, expected: 3.8832 },
    { a: 5, sweep: 0, k: 1, expected: 4.2539 },
    { a: 6, sweep: 0, k: 1, expected: 4.5287 },
    { a: 8, sweep: 0, k: 1, expected: 4.9058 },
    { a: 10, sweep: 0, k: 1, expected: 5.151 },
    { a: 5, sweep: deg45, k: 1, expected: 3.3605 },
    { a: 4, sweep: Math.PI / 6, k: 1, expected: 3.5734 },
    // Warren 12: aspect ratio 2.8284, half-chord sweep 44.996 degrees.
    { a: 2.8284, sweep: radFromDeg(44.996), k: 1, expected: 2.746 },
    { a: 6, sweep: 0, k: 0.95, expected: 4.371 },
  ])('formula at A $a, sweep $sweep, k $k', ({ a, sweep, k, expected }) => {
    expect(Math.abs(wingLiftSlope(a, sweep, k) - expected)).toBeLessThan(1e-4);
  });

  it.each([1, 2, 3, 4, 5, 6, 8, 10])('the lattice is within 8 %% of it for a rectangle of aspect ratio %d', (a) => {
    within(wingOf(rectangle(a), FAIR).symmetric.alpha.lift, wingLiftSlope(a, 0), 0.08);
  });

  it('the lattice is within 8 % of it for the swept wing and for Warren 12', () => {
    within(wingOf(SWEPT_45, FAIR).symmetric.alpha.lift, 3.3605, 0.08);
    within(wingOf(WARREN_12, FAIR).symmetric.alpha.lift, 2.746, 0.08);
  });
});

it('V20: two-dimensional limit 2 pi, centre at c/4 (thin-aerofoil theory), within 0.1 %', () => {
  const { alpha, neutralPointX } = wingOf(rectangle(1e4), TWO_DIMENSIONAL).symmetric;
  within(alpha.lift, 2 * Math.PI, 0.001);
  expect(Math.abs(neutralPointX - 0.25)).toBeLessThan(0.001);
});

describe('V21: the same lift slope and Cl_p with the stream reversed (reverse-flow theorem, Ursell & Ward 1950, Flax 1952)', () => {
  interface Case {
    readonly aspectRatio: number;
    readonly taper: number;
    readonly quarterSweepDeg: number;
  }
  function both({ aspectRatio, taper, quarterSweepDeg }: Case, strips: number, rows: number) {
    const span = (aspectRatio * (1 + taper)) / 2;
    const lead = leSweep(radFromDeg(quarterSweepDeg), 0.25, span, 1, taper);
    // Seen from behind, the trailing edge leads.
    const trail = -Math.atan(Math.tan(lead) - (1 - taper) / (span / 2));
    const [forward, backward] = [lead, trail].map((leSweepRad) =>
      wingOf(trapezoid({ span, root: 1, tip: taper, leSweepRad }), { strips, rows }),
    );
    if (!forward || !backward) throw new RangeError('two streams');
    return {
      slopes: backward.symmetric.alpha.lift / forward.symmetric.alpha.lift,
      rolls: (backward.antisymmetric?.rollRate.roll ?? 0) / (forward.antisymmetric?.rollRate.roll ?? 1),
    };
  }
  const aft = { aspectRatio: 4, taper: 0.5, quarterSweepDeg: 30 };
  const forward = { aspectRatio: 6, taper: 0.4, quarterSweepDeg: -25 };
  const sharp = { aspectRatio: 3, taper: 1, quarterSweepDeg: 40 };

  it.each([
    { name: 'A 4, taper 0.5, swept 30 degrees, 12 by 4', wing: aft, strips: 12, rows: 4, share: 0.002 },
    { name: 'A 6, taper 0.4, swept forward 25 degrees, 24 by 8', wing: forward, strips: 24, rows: 8, share: 0.002 },
    { name: 'A 3, untapered, swept 40 degrees, 12 by 4', wing: sharp, strips: 12, rows: 4, share: 0.005 },
  ])('$name: within $share', ({ wing, strips, rows, share }) => {
    const { slopes, rolls } = both(wing, strips, rows);
    within(slopes, 1, share);
    within(rolls, 1, share);
  });

  it.each([aft, forward, sharp])('A $aspectRatio swept $quarterSweepDeg: closer on a finer lattice', (wing) => {
    const [coarse, fine] = [both(wing, 12, 4), both(wing, 24, 8)];
    expect(Math.abs(fine.slopes - 1)).toBeLessThan(Math.abs(coarse.slopes - 1));
    expect(Math.abs(fine.rolls - 1)).toBeLessThan(Math.abs(coarse.rolls - 1));
  });
});

describe('V22: downwash far behind an elliptic wing of aspect ratio 8, in its wake: 2 CL / (pi A) (Prandtl; Etkin & Reid, app. B)', () => {
  const span = 2 * Math.PI;
  const { lattice, solution, symmetric } = wingOf(ellipse(span, 1, 0.25), FAIR);
  const columns = solution.symmetric.length / lattice.mirroredCount;
  const far = (2 * symmetric.alpha.lift) / (Math.PI * 8);

  /** In the middle of a strip's wake, where the sheet is met and not one of the vortices that stand for it. */
  function downwash(chords: number, y: number): number {
    const middles = lattice.surfaces.flatMap(({ strips }) => strips.map((s) => (s.inner.le[1] + s.outer.le[1]) / 2));
    const nearest = middles.reduce((a, b) => (Math.abs(b - y) < Math.abs(a - y) ? b : a));
    const flow = symmetricFlow(lattice, solution.symmetric, columns, 1);
    return flow([chords, y === 0 ? 0 : nearest, 0], [0, 0, -1]);
  }

  it.each([
    [8, 0, 0.05],
    [8, 0.25, 0.05],
    [20, 0, 0.03],
    [20, 0.25, 0.03],
    [40, 0, 0.03],
    [40, 0.25, 0.03],
  ])('%d chords back at y/b %d, within %d', (chords, share, tolerance) => {
    within(downwash(chords, share * span), far, tolerance);
  });
});
