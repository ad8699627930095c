import { describe, expect, it } from 'vitest';
import { factor, solve } from '@/lib/numerics/lu';
import { board } from '@/tests/support/airframe';
import { type Layer, sheetLayers, stackOf, stripTorsion } from './sheet';

const plain: Layer = { thicknessMm: 6, modulusMpa: 20, shearMpa: 8, face: false };
const face: Layer = { thicknessMm: 0.1, modulusMpa: 3000, shearMpa: 1000, face: true };
const core: Layer = { thicknessMm: 4.8, modulusMpa: 0, shearMpa: 4, face: false };

describe('a plain sheet', () => {
  it('bends as E t^3 / 12 and twists as c t^3 G / 3, however it is cut into layers', () => {
    expect(stackOf([plain]).bendingPerWidth).toBeCloseTo((20 * 216) / 12, 9);
    expect(stripTorsion(stackOf([plain]), 100)).toBeCloseTo((100 * 216 * 8) / 3, 9);
    const halves = [
      { ...plain, thicknessMm: 2 },
      { ...plain, thicknessMm: 4 },
    ];
    expect(stackOf(halves).bendingPerWidth).toBeCloseTo(stackOf([plain]).bendingPerWidth, 9);
    expect(stripTorsion(stackOf(halves), 100)).toBeCloseTo(stripTorsion(stackOf([plain]), 100), 9);
  });
});

/**
 * Torsion of a faced strip by the least strain energy of its faces' sliding u at nodes across the width, without any closed solution:
 * faces shear by u' - twist h / 2, the core by 2 u / h + twist y.
 */
function leastEnergyTorsion(widthMm: number): number {
  const h = core.thicknessMm + face.thicknessMm;
  const n = 160;
  const d = widthMm / n;
  const a = new Float64Array((n + 1) ** 2);
  const b = new Float64Array(n + 1);
  const kFace = 2 * face.shearMpa * face.thicknessMm;
  const kCore = core.shearMpa * h;
  const add = (i: number, j: number, x: number) => {
    a[i * (n + 1) + j] = (a[i * (n + 1) + j] ?? 0) + x;
  };
  let energy = 0;
  for (let e = 0; e < n; e++) {
    const y = -widthMm / 2 + (e + 0.5) * d;
    // One point a cell: u' = (u1 - u0) / d, u = (u0 + u1) / 2, unit twist.
    for (const [i, di] of [
      [e, -1 / d],
      [e + 1, 1 / d],
    ] as const) {
      for (const [j, dj] of [
        [e, -1 / d],
        [e + 1, 1 / d],
      ] as const)
        add(i, j, d * (kFace * di * dj + kCore / h ** 2));
      b[i] = (b[i] ?? 0) + d * (kFace * di * (h / 2) - (kCore / h) * y);
    }
    energy += d * (kFace * (h / 2) ** 2 + kCore * y ** 2);
  }
  const factored = factor(a, n + 1);
  if (!factored.ok) throw new RangeError('refused');
  const u = b.slice();
  solve(factored.value, u, 1);
  // Twice the least energy at unit twist is the stiffness.
  return energy - u.reduce((sum, x, i) => sum + x * (b[i] ?? 0), 0);
}

describe('a board faced with paper', () => {
  const faced = [face, core, face];
  const coreAlone = (4 * 4 * 4.8 ** 3) / 12;

  it.each([20, 60, 150])('%d mm wide twists as the least strain energy says', (width) => {
    const faces = stripTorsion(stackOf(faced), width) - width * coreAlone;
    // The faces' own thickness is left out of the energy: it is 1 part in 7000.
    expect(faces / leastEnergyTorsion(width)).toBeCloseTo(1, 2);
  });

  it('loses to its soft core near the edges: more, the narrower it is', () => {
    const perWidth = (width: number) => stripTorsion(stackOf(faced), width) / width;
    expect(perWidth(30)).toBeLessThan(perWidth(60));
    expect(perWidth(60)).toBeLessThan(perWidth(200));
    // Wide: 2 G t h^2 of the faces and the core's own.
    expect(perWidth(1e5) / (2 * 1000 * 0.1 * 4.9 ** 2 + coreAlone)).toBeCloseTo(1, 2);
  });

  it('is stiffer than the same foam without paper, and thicker paper helps', () => {
    const torsion = (facesGm2: number) => stripTorsion(stackOf(sheetLayers(board({ facesGm2 }), 'likely')), 150);
    expect(torsion(150)).toBeGreaterThan(5 * torsion(0));
    expect(torsion(300)).toBeGreaterThan(torsion(150));
  });

  it('whose modulus is typed in bends as that says, whatever its faces', () => {
    for (const facesGm2 of [0, 100, 300]) {
      const layers = sheetLayers(board({ facesGm2, eMpa: 400 }), 'likely');
      expect(stackOf(layers).bendingPerWidth).toBeCloseTo((400 * 125) / 12, 6);
    }
  });
});
