import { describe, expect, it } from 'vitest';
import { resolve } from '@/lib/airframe/resolve';
import type { Surface } from '@/lib/airframe/schema/surface';
import { airframe, control, panel, surface, tube } from '@/tests/support/airframe';
import { beamOf, halfWing, sparsAt } from './halfWing';

const spar = (over: Partial<Surface['spars'][number]> = {}): Surface['spars'][number] => ({
  id: 'spar',
  tubeId: 'tube',
  chordShare: [0.3, 0.3],
  from: 0,
  to: 1,
  let: 'face',
  face: 'lower',
  ...over,
});

function wingOf(over: Partial<Surface>) {
  const document = airframe({ surfaces: [surface(over)], tubes: [tube({ eGpa: 110 })] });
  const resolved = resolve(document);
  const wing = resolved.ok ? resolved.value.surfaces[0] : undefined;
  if (!wing) throw new RangeError('does not resolve');
  return { document, wing };
}
const strips = (over: Partial<Surface>) => {
  const { document, wing } = wingOf(over);
  return halfWing(document, wing, 'likely');
};
const sum = (list: readonly number[]) => list.reduce((a, b) => a + b, 0);

describe('halfWing', () => {
  it('covers the whole length, and a control by what it covers, wherever it ends', () => {
    const cut = strips({ controls: [control({ from: 0.513, to: 0.547 })] });
    expect(sum(cut.map(({ widthMm }) => widthMm))).toBeCloseTo(310, 9);
    const covered = cut.map(({ controls, widthMm }) => (controls.get('aileron')?.covered ?? 0) * widthMm);
    expect(sum(covered)).toBeCloseTo((0.547 - 0.513) * 310, 9);
  });

  it('a spar adds its own stiffness where it is, and draws the axis to itself', () => {
    const bare = strips({});
    const sparred = strips({ spars: [spar({ to: 0.5 })] });
    // 110 GPa by pi (4^4 - 2^4) / 64.
    const own = 110_000 * (Math.PI / 64) * (256 - 16);
    expect((sparred[0]?.bendingNmm2 ?? 0) - (bare[0]?.bendingNmm2 ?? 0)).toBeCloseTo(own, 3);
    expect(sparred[0]?.torsionNmm2).toBeGreaterThan(bare[0]?.torsionNmm2 ?? 0);
    expect(sparred.at(-1)?.bendingNmm2).toBe(bare.at(-1)?.bendingNmm2);
    expect(bare[0]?.axisXMm).toBeCloseTo(95, 9);
    expect(sparred[0]?.axisXMm).toBeLessThan(80);
    expect(sparred[0]?.axisXMm).toBeGreaterThan(0.3 * 190);
  });

  it('leaves a spar without a bought tube out', () => {
    const { document, wing } = wingOf({ spars: [spar({ tubeId: undefined, materialId: 'board' })] });
    expect(sparsAt(document, wing, 0.2, 'likely')).toEqual([]);
  });

  it('the beam of a swept wing is longer by the sweep', () => {
    const straight = beamOf(strips({}));
    const swept = beamOf(strips({ panels: [panel({ sweepDeg: 30 })] }));
    expect(straight.at(-1)?.toMm).toBeCloseTo(310, 9);
    expect(swept.at(-1)?.toMm).toBeCloseTo(310 / Math.cos(Math.PI / 6), 6);
  });
});
