import { describe, expect, it } from 'vitest';
import { derivatives } from './derivatives';
import { joined, junctions } from './junctions';
import type { LatticeSurface } from './types';

const cut = (x: number, y: number, z: number, chord: number) => ({ le: [x, y, z] as const, chord, incidenceRad: 0 });
const surface = (id: string, sections: LatticeSurface['sections'], mirrored = true): LatticeSurface => ({
  id,
  mirrored,
  strips: 6,
  rows: 4,
  sections,
});
const wing = surface('wing', [cut(0, 0, 0, 200), cut(20, 400, 0, 150)]);
const tail = surface('tail', [cut(500, 0, 0, 110), cut(500, 180, 0, 110)]);
/** Twin fins slotted through the tail at y 120, from below it to well above. */
const fins = (below: number) => surface('fin', [cut(505, 120, -below, 100), cut(525, 120, 130, 60)]);

const neutralPoint = (surfaces: readonly LatticeSurface[]) => {
  const result = derivatives(
    { surfaces, controls: [], reference: { area: 140_000, chord: 176, span: 800, point: [0, 0, 0] } },
    'symmetric',
  );
  return result.ok ? result.value.symmetric.neutralPointX : Number.NaN;
};

describe('where surfaces meet', () => {
  it('an end within a sheet of another surface is moved onto it', () => {
    const surfaces = [wing, tail, fins(4)];
    const moved = joined(surfaces, junctions(surfaces))[2]?.sections[0]?.le;
    expect(moved).toEqual([505, 120, 0]);
  });

  it('so the depth of a slot does not move the neutral point', () => {
    for (const depth of [1, 2, 4])
      expect(neutralPoint([wing, tail, fins(depth)])).toBeCloseTo(neutralPoint([wing, tail, fins(0)]), 6);
  });

  it('a fin well through the tail meets it where it passes, on both', () => {
    const met = junctions([wing, tail, fins(40)]);
    expect(met.map(({ of, end, on, at }) => [of, end, on, at])).toEqual([
      [1, 'through', 2, expect.closeTo(40, 9)],
      [2, 'through', 1, 120],
    ]);
  });

  it('and refining it changes little: strips of both begin at the crossing', () => {
    const fine = [wing, tail, fins(40)].map((s) => ({ ...s, strips: s.strips * 4 }));
    // 0.8 % of the chord of 176: a tail in the wing's own plane is the lattice's worst case.
    expect(Math.abs(neutralPoint([wing, tail, fins(40)]) - neutralPoint(fine))).toBeLessThan(1.4);
  });

  it('a fin behind the tail meets nothing', () => {
    const behind = surface('fin', [cut(700, 120, -40, 90), cut(710, 120, 90, 60)]);
    expect(junctions([wing, tail, behind])).toEqual([]);
  });
});
