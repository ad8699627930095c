import { describe, expect, it } from 'vitest';
import { barSection } from './barSection';

describe('barSection', () => {
  it('a rod has twice the bending moment of area in torsion, and no bore', () => {
    const rod = barSection({ kind: 'rod', outerMm: [4, 4], innerMm: [3, 3] });
    // pi 4^4 / 64 and pi 4^4 / 32.
    expect(rod.inertiaMm4).toBeCloseTo(12.5664, 4);
    expect(rod.torsionMm4).toBeCloseTo(25.1327, 4);
  });

  it('a strip of 10 by 3 on its flat: 22.5 mm4, modulus 15 mm3; on its edge 250 mm4', () => {
    expect(barSection({ kind: 'strip', outerMm: [10, 3] })).toMatchObject({ inertiaMm4: 22.5, modulusMm3: 15 });
    expect(barSection({ kind: 'strip', outerMm: [3, 10] }).inertiaMm4).toBeCloseTo(250, 9);
  });

  it.each([
    [1, 0.1406],
    [2, 0.229],
    [10, 0.312],
  ])(
    'a rectangle %d times as wide as thick has the torsion constant %d b t^3 (Timoshenko & Goodier, table of section 109, from memory)',
    (ratio, beta) => {
      const wide = barSection({ kind: 'strip', outerMm: [ratio, 1] }).torsionMm4;
      expect(wide / ratio).toBeCloseTo(beta, 3);
      expect(barSection({ kind: 'strip', outerMm: [1, ratio] }).torsionMm4).toBeCloseTo(wide, 12);
    },
  );

  it('a box of thin walls: square of 20 with walls of 1, 4 A^2 t / (perimeter) = 19^3', () => {
    const box = barSection({ kind: 'foamBox', outerMm: [20, 20], innerMm: [18, 18] });
    expect(box.torsionMm4).toBeCloseTo(19 ** 3, 9);
    expect(box.inertiaMm4).toBeCloseTo((20 ** 4 - 18 ** 4) / 12, 9);
  });
});
