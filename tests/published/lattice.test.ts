import { describe, expect, it } from 'vitest';
import { type Derivatives, derivatives } from '@/lib/aero/lattice/derivatives';
import type { LatticeControl, LatticeInput, LatticeOptions, LatticeSection } from '@/lib/aero/lattice/types';
import { wingLiftSlope } from '@/lib/aero/liftSlope';

// Planforms that others have published, in their own units. Tolerances are those fair to the lattice used in each case.

interface Trapezoid {
  readonly span: number;
  readonly root: number;
  readonly tip: number;
  readonly leSweepRad: number;
}

const section = (x: number, y: number, chord: number): LatticeSection => ({ le: [x, y, 0], chord, incidenceRad: 0 });

/** Sweep of the leading edge of an untapered or tapered wing from that of the line at `share` of the chord. */
const leSweep = (sweepRad: number, share: number, span: number, root: number, tip: number) =>
  Math.atan(Math.tan(sweepRad) + (share * (root - tip)) / (span / 2));

function wing(
  { span, root, tip, leSweepRad }: Trapezoid,
  lattice: { strips: number; rows: number; options?: Partial<LatticeOptions> },
  reference: Partial<LatticeInput['reference']> = {},
  controls: LatticeControl[] = [],
): Derivatives {
  const half = span / 2;
  const result = derivatives(
    {
      surfaces: [
        {
          id: 'wing',
          mirrored: true,
          strips: lattice.strips,
          rows: lattice.rows,
          sections: [section(0, 0, root), section(half * Math.tan(leSweepRad), half, tip)],
        },
      ],
      controls,
      reference: { area: (half * (root + tip)) as number, chord: 1, span, point: [0, 0, 0], ...reference },
      options: lattice.options,
    },
    'both',
  );
  if (!result.ok) throw new RangeError(result.problems.map((p) => p.message).join('; '));
  return result.value;
}

const within = (got: number, expected: number, share: number) =>
  expect(Math.abs(got / expected - 1), `${got} against ${expected}`).toBeLessThanOrEqual(share);

/** Without tips there is nothing to inset. */
const TWO_DIMENSIONAL = { strips: 8, rows: 4, options: { tipInset: 0 } };

const WARREN_12 = { span: 2.8284, root: 1.5, tip: 0.5, leSweepRad: (53.54 * Math.PI) / 180 };

describe('V1: Warren 12 planform (W. H. Mason, Applied Computational Aerodynamics, ch. 6.9, after Warren)', () => {
  it('CL_alpha 2.743, Cm_alpha -3.10 about the apex with the average chord 1.0, within 1 %', () => {
    const { symmetric } = wing(WARREN_12, { strips: 12, rows: 4 });
    within(symmetric.alpha.lift, 2.743, 0.01);
    within(symmetric.alpha.pitch, -3.1, 0.01);
  });
});

describe('V2: four horseshoes a half (Bertin & Smith, Aerodynamics for Engineers, worked vortex-lattice example)', () => {
  // Aspect ratio 5, untapered, swept 45 degrees, span 1; equal strips, no inset: the same lattice as in the book.
  const plain = wing(
    { span: 1, root: 0.2, tip: 0.2, leSweepRad: Math.PI / 4 },
    { strips: 4, rows: 1, options: { tipInset: 0 } },
  );

  it('vortex strengths over 4 pi b V alpha are 0.0273 0.0287 0.0286 0.0250 from root to tip', () => {
    const columns = 3;
    const strengths = [0, 1, 2, 3].map((k) => (plain.symmetric.circulation[k * columns + 1] ?? 0) / (4 * Math.PI));
    expect(strengths.map((s) => s.toFixed(4))).toEqual(['0.0273', '0.0287', '0.0286', '0.0250']);
  });

  it('CL is 3.443 alpha, within 0.1 %', () => within(plain.symmetric.alpha.lift, 3.443, 0.001));
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
    { a: 6, sweep: 0, k: 0.95, expected: 4.371 },
  ])('formula at A $a, sweep $sweep, k $k', ({ a, sweep, k, expected }) => {
    expect(Math.abs(wingLiftSlope(a, sweep, k) - expected)).toBeLessThan(1e-4);
  });

  it.each([1, 2, 3, 4, 5, 6, 8, 10])('the lattice is within 8 %% of it for a rectangle of aspect ratio %d', (a) => {
    const { symmetric } = wing({ span: a, root: 1, tip: 1, leSweepRad: 0 }, { strips: 12, rows: 4 });
    within(symmetric.alpha.lift, wingLiftSlope(a, 0), 0.08);
  });

  it('the lattice is within 8 % of it for the swept wing and for Warren 12', () => {
    const swept = wing({ span: 1, root: 0.2, tip: 0.2, leSweepRad: deg45 }, { strips: 12, rows: 4 });
    within(swept.symmetric.alpha.lift, 3.3605, 0.08);
    within(wing(WARREN_12, { strips: 12, rows: 4 }).symmetric.alpha.lift, 2.746, 0.08);
  });
});

describe('low aspect ratios and limits', () => {
  it('V7: square wing 1.4602 (E. O. Tuck 1993, J. Austral. Math. Soc. B 35; from memory), within 0.5 %', () => {
    within(
      wing({ span: 1, root: 1, tip: 1, leSweepRad: 0 }, { strips: 12, rows: 4 }).symmetric.alpha.lift,
      1.4602,
      0.005,
    );
  });

  it('V8: aspect ratio 2, 2.474 and centre 0.2094 c (Garner, Hewitt & Labrujere, R&M 3597, 1968; from memory)', () => {
    const { symmetric } = wing({ span: 2, root: 1, tip: 1, leSweepRad: 0 }, { strips: 16, rows: 6 });
    within(symmetric.alpha.lift, 2.474, 0.005);
    expect(Math.abs(symmetric.neutralPointX - 0.2094)).toBeLessThan(0.004);
  });

  // Root chord 1, so that A = 2 b / c.
  const delta = (a: number) =>
    wing({ span: a / 2, root: 1, tip: 0, leSweepRad: Math.atan(4 / a) }, { strips: 16, rows: 16 });

  it('V18: slender delta: pi A / 2, centre at 2/3 of the root (R. T. Jones, NACA TR 835), Cl_p -pi A / 32 (Ribner, TN 1423)', () => {
    const { symmetric, antisymmetric } = delta(0.05);
    within(symmetric.alpha.lift, (Math.PI * 0.05) / 2, 0.02);
    expect(Math.abs(symmetric.neutralPointX - 2 / 3)).toBeLessThan(0.01);
    within(antisymmetric?.rollRate.roll ?? 0, (-Math.PI * 0.05) / 32, 0.04);
    // A limit: the wider delta is further from it.
    expect(delta(0.1).symmetric.alpha.lift / 0.1).toBeLessThan(symmetric.alpha.lift / 0.05);
  });

  it('V20: two-dimensional limit 2 pi, centre at c/4 (thin-aerofoil theory), within 0.1 %', () => {
    const { symmetric } = wing({ span: 1e4, root: 1, tip: 1, leSweepRad: 0 }, TWO_DIMENSIONAL);
    within(symmetric.alpha.lift, 2 * Math.PI, 0.001);
    expect(Math.abs(symmetric.neutralPointX - 0.25)).toBeLessThan(0.001);
  });
});

describe('F1, F3: flap effectiveness by thin-aerofoil theory (Glauert, ARC R&M 1095, 1927)', () => {
  const tau = (share: number) => {
    const control = { id: 'flap', surfaceId: 'wing', from: 0, to: 1, chordShare: [share, share] as const };
    const { symmetric } = wing({ span: 1e4, root: 1, tip: 1, leSweepRad: 0 }, { ...TWO_DIMENSIONAL, rows: 6 }, {}, [
      control,
    ]);
    return (symmetric.controls.get('flap')?.lift ?? 0) / symmetric.alpha.lift;
  };

  it.each([
    { share: 0.1, expected: 0.3958 },
    { share: 0.15, expected: 0.4805 },
    { share: 0.2, expected: 0.5498 },
    { share: 0.25, expected: 0.609 },
    { share: 0.3, expected: 0.6607 },
    { share: 0.4, expected: 0.7478 },
    { share: 0.5, expected: 0.8183 },
  ])('a flap of $share of the chord turns $expected as much as the whole, within 1 %', ({ share, expected }) => {
    within(tau(share), expected, 0.01);
  });

  it('grows smoothly as the hinge crosses a panel', () => {
    const values = Array.from({ length: 31 }, (_, k) => tau(0.15 + k * 0.01));
    const steps = values.slice(1).map((v, k) => v - (values[k] ?? 0));
    for (const [k, step] of steps.entries()) {
      expect(step).toBeGreaterThan(0);
      expect(Math.abs(step - (steps[k - 1] ?? step))).toBeLessThan(0.004);
    }
  });
});

it('F4: an all-moving surface is a change of incidence (identity), within 0.1 %', () => {
  const moving = { id: 'all', surfaceId: 'wing', from: 0, to: 1, chordShare: [1, 1] as const };
  const { symmetric } = wing({ span: 1.2, root: 0.3, tip: 0.15, leSweepRad: 0.5 }, { strips: 10, rows: 4 }, {}, [
    moving,
  ]);
  within(symmetric.controls.get('all')?.lift ?? 0, symmetric.alpha.lift, 0.001);
  within(symmetric.controls.get('all')?.pitch ?? 0, symmetric.alpha.pitch, 0.001);
});

it('V21: the same lift slope with the stream reversed (reverse-flow theorem, Ursell & Ward 1950, Flax 1952), within 0.2 %', () => {
  const [span, root, tip] = [3, 1, 0.5];
  const sweep = leSweep(Math.PI / 6, 0.25, span, root, tip);
  const forward = wing({ span, root, tip, leSweepRad: sweep }, { strips: 12, rows: 4 });
  // Seen from behind, the trailing edge leads.
  const backSweep = -Math.atan(Math.tan(sweep) - (root - tip) / (span / 2));
  const backward = wing({ span, root, tip, leSweepRad: backSweep }, { strips: 12, rows: 4 });
  within(backward.symmetric.alpha.lift, forward.symmetric.alpha.lift, 0.002);
  within(backward.antisymmetric?.rollRate.roll ?? 0, forward.antisymmetric?.rollRate.roll ?? 0, 0.002);
});
