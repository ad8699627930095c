import { describe, expect, it } from 'vitest';
import { type Derivatives, derivatives } from '@/lib/aero/lattice/derivatives';
import type { LatticeOptions, LatticeSection } from '@/lib/aero/lattice/types';

// Wings alone against values of another lattice program, written for such checks and refined until they settled. No outside evidence.

const section = (x: number, y: number, chord: number): LatticeSection => ({ le: [x, y, 0], chord, incidenceRad: 0 });

interface Mesh {
  readonly strips: number;
  readonly rows: number;
  readonly options?: Partial<LatticeOptions>;
}

function wing(root: LatticeSection, tip: LatticeSection, { strips, rows, options }: Mesh): Derivatives {
  const half = tip.le[1];
  const result = derivatives(
    {
      surfaces: [{ id: 'wing', mirrored: true, strips, rows, sections: [root, tip] }],
      controls: [],
      reference: { area: half * (root.chord + tip.chord), chord: 1, span: 2 * half, point: [0, 0, 0] },
      options,
    },
    'both',
  );
  if (!result.ok) throw new RangeError(result.problems.map((p) => p.message).join('; '));
  return result.value;
}

const rectangle = (a: number, mesh: Mesh) => wing(section(0, 0, 1), section(0, a / 2, 1), mesh);
const delta = (a: number, mesh: Mesh) => wing(section(0, 0, 1), section(1, a / 4, 0), mesh);
const swept45 = (mesh: Mesh) => wing(section(0, 0, 0.2), section(0.5, 0.5, 0.2), mesh);
const FAIR: Mesh = { strips: 12, rows: 4 };

const within = (got: number | undefined, expected: number, share: number) =>
  expect(Math.abs((got ?? Number.NaN) / expected - 1), `${got} against ${expected}`).toBeLessThan(share);
const rollDamping = ({ antisymmetric }: Derivatives) => antisymmetric?.rollRate.roll;

describe('aspect ratio 5, untapered, swept 45 degrees, span 1', () => {
  it('V3: four strips a half by two rows, no inset: 3.4389 within 0.1 %', () => {
    within(swept45({ strips: 4, rows: 2, options: { tipInset: 0 } }).symmetric.alpha.lift, 3.4389, 0.001);
  });

  it('V4: settled 3.186, centre at 0.2849: within 0.7 % on 12 by 4', () => {
    const { alpha, neutralPointX } = swept45(FAIR).symmetric;
    within(alpha.lift, 3.186, 0.007);
    within(neutralPointX, 0.2849, 0.007);
  });
});

describe('Warren 12, refined', () => {
  const span = 2.8284;
  const half = span / 2;
  it.each([
    [{ strips: 12, rows: 4 }, 2.7415, -3.078],
    [{ strips: 48, rows: 12 }, 2.7471, -3.099],
  ])('V1: $0.strips by $0.rows', (mesh, lift, pitch) => {
    const { alpha } = wing(
      section(0, 0, 1.5),
      section(half * Math.tan((53.54 * Math.PI) / 180), half, 0.5),
      mesh,
    ).symmetric;
    within(alpha.lift, lift, 0.0005);
    within(alpha.pitch, pitch, 0.0005);
  });
});

describe('rectangles', () => {
  it('V7, V8: aspect ratio 1 and 2 on 40 by 12: 1.4599, 2.4739 with its centre at 0.2097', () => {
    const fine: Mesh = { strips: 40, rows: 12 };
    within(rectangle(1, fine).symmetric.alpha.lift, 1.4599, 0.0005);
    const { alpha, neutralPointX } = rectangle(2, fine).symmetric;
    within(alpha.lift, 2.4739, 0.0005);
    expect(Math.abs(neutralPointX - 0.2097)).toBeLessThan(0.0005);
  });

  it.each([
    [2, 2.474],
    [4, 3.611],
    [6, 4.214],
    [8, 4.585],
    [10, 4.838],
    [20, 5.432],
  ])('V12: aspect ratio %d lifts %d by a surface, under the lifting line, within 0.5 %%', (a, expected) => {
    within(rectangle(a, FAIR).symmetric.alpha.lift, expected, 0.005);
  });

  it.each([
    [6, -0.44],
    [8, -0.516],
    [10, -0.575],
  ])('D2: aspect ratio %d damps roll by %d, within 1 %%', (a, expected) => {
    within(rollDamping(rectangle(a, FAIR)), expected, 0.01);
  });
});

describe('V19: deltas, slope within 1.5 %, centre within 0.6 % of the root chord', () => {
  it.each([
    [1, 1.294, 0.616],
    [1.5, 1.784, 0.601],
    [2, 2.2, 0.59],
    [4, 3.351, 0.562],
  ])('aspect ratio %d: %d, %d', (a, slope, centre) => {
    const { alpha, neutralPointX } = delta(a, { strips: 12, rows: 5 }).symmetric;
    within(alpha.lift, slope, 0.015);
    expect(Math.abs(neutralPointX - centre)).toBeLessThan(0.006);
  });
});

describe('the quarter-strip inset of the tips, aspect ratio 6 on 10 by 4', () => {
  const settled = rectangle(6, { strips: 40, rows: 10 });
  const off = (options: Partial<LatticeOptions>) => {
    const coarse = rectangle(6, { strips: 10, rows: 4, options });
    return {
      slope: coarse.symmetric.alpha.lift / settled.symmetric.alpha.lift - 1,
      roll: (rollDamping(coarse) ?? 0) / (rollDamping(settled) ?? 1) - 1,
    };
  };

  it('leaves 0.3 % of the slope and 1 % of the roll damping', () => {
    expect(Math.abs(off({}).slope)).toBeLessThan(0.003);
    expect(Math.abs(off({}).roll)).toBeLessThan(0.01);
  });

  it('without it the slope is 3 % high and the roll damping 8 %', () => {
    expect(Math.abs(off({ tipInset: 0 }).slope - 0.03)).toBeLessThan(0.005);
    expect(Math.abs(off({ tipInset: 0 }).roll - 0.08)).toBeLessThan(0.01);
  });
});
