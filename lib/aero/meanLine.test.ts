import { describe, expect, it } from 'vitest';
import type { SectionShape } from '@/lib/airframe/schema/surface';
import { airframe, panel } from '@/tests/support/airframe';
import { derivatives } from './lattice/derivatives';
import type { MeanLine } from './lattice/types';
import { meanLineOf } from './meanLine';

const lineOf = (section: SectionShape, chordMm = 200) => meanLineOf(airframe(), panel({ section }), chordMm);
/** Height of a line at a share of the chord, from the leading edge. */
const heightAt = (line: MeanLine, x: number) => line.reduce((z, { at, slope }) => z + slope * Math.max(0, x - at), 0);

/** A wing so long that it is two-dimensional: what a mean line lifts and pitches about the quarter chord at no angle of attack. */
function twoDimensional(meanLine: MeanLine, rows = 6) {
  const section = (y: number) => ({ le: [0, y, 0] as const, chord: 1, incidenceRad: 0, meanLine });
  const result = derivatives(
    {
      surfaces: [{ id: 'w', mirrored: true, strips: 4, rows, sections: [section(0), section(5e4)] }],
      controls: [],
      reference: { area: 1e5, chord: 1, span: 1e5, point: [0.25, 0, 0] },
      options: { tipInset: 0 },
    },
    'symmetric',
  );
  if (!result.ok) throw new RangeError('refused');
  return result.value.symmetric;
}

/** NACA 4-digit mean line (Abbott & von Doenhoff, "Theory of Wing Sections", ch. 6) between a straight top and bottom of no thickness. */
function nacaProfile(m: number, p: number): [number, number][] {
  const at = (x: number) =>
    x < p ? (m / p ** 2) * (2 * p * x - x * x) : (m / (1 - p) ** 2) * (1 - 2 * p + 2 * p * x - x * x);
  const top = Array.from({ length: 61 }, (_, i): [number, number] => [i / 60, at(i / 60)]);
  return [...top, ...top.slice(1, -1).reverse()];
}

describe('mean lines', () => {
  it('a flat sheet has none', () => expect(lineOf({ kind: 'flat' })).toEqual([]));

  it('a profile lifts at no angle of attack as thin-aerofoil theory says: NACA 2412 has its zero lift at -2.08 degrees', () => {
    const { base, alpha } = twoDimensional(
      lineOf({ kind: 'slab', thicknessShare: 0.12, profile: nacaProfile(0.02, 0.4) }),
    );
    expect(((-base.lift / alpha.lift) * 180) / Math.PI).toBeCloseTo(-2.08, 1);
    // About the quarter chord -0.053 (the same source, thin-aerofoil theory for this mean line).
    expect(base.pitch).toBeCloseTo(-0.053, 2);
  });

  it('a symmetrical profile has a straight line', () => {
    const profile: [number, number][] = [
      [0, 0],
      [0.3, 0.06],
      [1, 0],
      [0.3, -0.06],
    ];
    const line = lineOf({ kind: 'slab', thicknessShare: 0.12, profile });
    for (const x of [0.1, 0.3, 0.6, 1]) expect(heightAt(line, x)).toBeCloseTo(0, 9);
  });

  it('a layer on top of the front half lifts its middle by half a thickness, and lets it down behind', () => {
    const line = lineOf({ kind: 'stepped', layers: [{ from: 0, to: 0.5, face: 'upper', materialId: 'board' }] }, 200);
    // 5 mm of a 200 mm chord, half of it: 0.0125, and nothing that slopes before the step.
    expect(heightAt(line, 0.4)).toBeCloseTo(0, 9);
    expect(heightAt(line, 0.7)).toBeCloseTo(-0.0125, 9);
  });

  it('layers that mirror each other above and below leave a flat plate', () => {
    const layers = (['upper', 'lower'] as const).map((face) => ({ from: 0.2, to: 0.6, face, materialId: 'board' }));
    const line = lineOf({ kind: 'stepped', layers });
    for (const x of [0.15, 0.25, 0.4, 0.6, 0.9]) expect(heightAt(line, x)).toBeCloseTo(0, 12);
  });

  const folded = { kind: 'folded', thicknessShare: 0.1, maxAt: 0.3, lowerTo: 0.6, webAt: 0.3 } as const;
  it('a folded section is half its height where it is thickest, and on its single sheet behind the lower skin', () => {
    const line = lineOf(folded, 200);
    expect(heightAt(line, 0.3)).toBeCloseTo(0.05, 9);
    // Top at 0.9: 0.1 x 0.1 / 0.7; less half of 5 mm in 200.
    expect(heightAt(line, 0.9)).toBeCloseTo(0.1 * (0.1 / 0.7) - 0.0125, 9);
  });

  it('camber lifts at no angle of attack and pitches down; reflex pitches up again', () => {
    const plain = twoDimensional(lineOf(folded));
    const reflexed = twoDimensional(lineOf({ ...folded, reflexDeg: 4 }));
    expect(plain.base.lift).toBeGreaterThan(0.2);
    expect(plain.base.pitch).toBeLessThan(-0.03);
    expect(reflexed.base.pitch).toBeGreaterThan(plain.base.pitch + 0.02);
    expect(reflexed.base.lift).toBeLessThan(plain.base.lift);
  });

  it('shrinks a layer with the chord: the same sheet is twice as thick on half the chord', () => {
    const stepped = { kind: 'stepped', layers: [{ from: 0, to: 0.5, face: 'upper', materialId: 'board' }] } as const;
    const layers = [...stepped.layers];
    expect(heightAt(lineOf({ ...stepped, layers }, 100), 0.9)).toBeCloseTo(
      2 * heightAt(lineOf({ ...stepped, layers }, 200), 0.9),
      9,
    );
  });
});
