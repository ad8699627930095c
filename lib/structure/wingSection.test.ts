import { describe, expect, it } from 'vitest';
import { board, panel } from '@/tests/support/airframe';
import { sheetLayers, stackOf } from './sheet';
import { sectionStiffness } from './wingSection';

const foam = board({ id: 'foam', kind: 'xps', facesGm2: 0, thicknessMm: 5, eMpa: 20 });
const of = (section: ReturnType<typeof panel>['section'], chordMm = 200, endShare = 1, materialId = 'foam') =>
  sectionStiffness(panel({ section, materialId }), chordMm, endShare, (id) =>
    stackOf(sheetLayers(id === 'foam' ? foam : board(), 'likely')),
  );

describe('sectionStiffness', () => {
  it('a flat sheet: E c t^3 / 12, G c t^3 / 3, axis at mid-chord; behind a hinge nothing', () => {
    const flat = of({ kind: 'flat' });
    expect(flat.bendingNmm2).toBeCloseTo((20 * 200 * 125) / 12, 6);
    expect(flat.torsionNmm2).toBeCloseTo((0.4 * 20 * 200 * 125) / 3, 6);
    expect(flat.axisShare).toBeCloseTo(0.5, 12);
    const hinged = of({ kind: 'flat' }, 200, 0.75);
    expect(hinged.bendingNmm2).toBeCloseTo(flat.bendingNmm2 * 0.75, 6);
    expect(hinged.axisShare).toBeCloseTo(0.375, 12);
  });

  it('a second sheet of the same foam over half of the chord makes that half eight times as stiff', () => {
    const stepped = of({ kind: 'stepped', layers: [{ from: 0, to: 0.5, face: 'upper', materialId: 'foam' }] });
    const flat = of({ kind: 'flat' });
    expect(stepped.bendingNmm2 / flat.bendingNmm2).toBeCloseTo(4.5, 9);
    expect(stepped.torsionNmm2 / flat.torsionNmm2).toBeCloseTo(4.5, 9);
    // 8 parts at a quarter and 1 at three quarters.
    expect(stepped.axisShare).toBeCloseTo((8 * 0.25 + 0.75) / 9, 9);
  });

  it('layers on both faces keep the middle where it is: three sheets are 27 times as stiff', () => {
    const both = of({
      kind: 'stepped',
      layers: [
        { from: 0, to: 1, face: 'upper', materialId: 'foam' },
        { from: 0, to: 1, face: 'lower', materialId: 'foam' },
      ],
    });
    expect(both.torsionNmm2 / of({ kind: 'flat' }).torsionNmm2).toBeCloseTo(27, 9);
  });

  it('a folded section is a closed cell: Bredt and Batho for a triangle, worked by hand, and much stiffer than two sheets', () => {
    const folded = of({ kind: 'folded', thicknessShare: 0.125, maxAt: 0.3, lowerTo: 1, webAt: 0.3 });
    // Skins of 5 mm are 20 mm apart at the most: A = 200 * 20 / 2 = 2000 mm2 round 400 mm; skin G t = 8 * 5.
    const cell = (4 * 2000 ** 2 * 40) / 400;
    expect(folded.torsionNmm2).toBeCloseTo(cell + (2 * 8 * 200 * 125) / 3, 3);
    expect(folded.torsionNmm2).toBeGreaterThan(10 * of({ kind: 'flat' }).torsionNmm2);
    // Cut at the thickest place it is a triangle 60 mm long with a web: A = 600 mm2 round 60 + 60 + 20 mm.
    const cut = of({ kind: 'folded', thicknessShare: 0.125, maxAt: 0.3, lowerTo: 1, webAt: 0.3 }, 200, 0.3);
    expect(cut.torsionNmm2).toBeCloseTo((4 * 600 ** 2 * 40) / 140 + (2 * 8 * 60 * 125) / 3, 3);
  });

  it('a slab with the profile of a rectangle is a sheet of that thickness', () => {
    const square = {
      kind: 'slab' as const,
      thicknessShare: 0.05,
      profile: [
        [0, -0.5],
        [1, -0.5],
        [1, 0.5],
        [0, 0.5],
      ] satisfies [number, number][],
    };
    // 5 % of 200 mm is 10 mm.
    expect(of(square).bendingNmm2).toBeCloseTo((20 * 200 * 1000) / 12, 6);
    expect(of(square).torsionNmm2).toBeCloseTo((8 * 200 * 1000) / 3, 6);
  });

  it('paper makes a board of the same thickness many times as stiff', () => {
    expect(of({ kind: 'flat' }, 200, 1, 'board').torsionNmm2).toBeGreaterThan(5 * of({ kind: 'flat' }).torsionNmm2);
  });
});
