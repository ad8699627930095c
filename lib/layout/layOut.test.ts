import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import type { Vec2 } from '@/lib/numerics/vec';
import type { Part } from '@/lib/parts/types';
import { polygonDistance } from '@/tests/support/distance';
import { makePart, rectangle, sampleParts, sweptHalf } from '@/tests/support/parts';
import { layOut } from './layOut';
import { LAYOUT_DEFAULTS } from './stock';
import { placePath } from './turns';
import type { SheetLayout, SheetStock } from './types';

const sheet = (more: Partial<SheetStock> = {}): SheetStock => ({
  id: 'foam-5/700x500',
  materialId: 'foam-5',
  thicknessMm: 5,
  wMm: 700,
  hMm: 500,
  count: null,
  grain: 'none',
  ...more,
});
const ply = sheet({ id: 'ply-3/300x200', materialId: 'ply-3', thicknessMm: 3, wMm: 300, hMm: 200 });

/** Every promise that a layout makes, checked without the clipping library. */
function assertSound(parts: readonly Part[], layout: SheetLayout): void {
  const { spacingMm, marginMm } = layout.options;
  const laid = layout.sheets.flatMap(({ placements }) => placements.map(({ partKey }) => partKey));
  const failed = layout.failures.map(({ partKey }) => partKey);
  expect([...laid, ...failed].sort()).toEqual(parts.map(({ key }) => key).sort());
  for (const { placements, wMm, hMm, checkSquareMm, materialId } of layout.sheets) {
    const rings: Vec2[][] = placements.map((placement) => {
      const part = parts.find(({ key }) => key === placement.partKey);
      expect(part?.materialId).toBe(materialId);
      return placePath(part?.outline ?? [], placement);
    });
    if (checkSquareMm) rings.push(placePath(rectangle(100, 100), { turnDeg: 0, moveMm: checkSquareMm }));
    for (const ring of rings) {
      for (const [x, y] of ring) {
        expect(Math.min(x, y, wMm - x, hMm - y)).toBeGreaterThanOrEqual(marginMm - 0.01);
      }
    }
    rings.forEach((ring, i) => {
      for (const other of rings.slice(i + 1)) {
        expect(polygonDistance(ring, other)).toBeGreaterThanOrEqual(spacingMm - 0.01);
      }
    });
  }
}

/** Star-shaped rings: any outline that has no holes and does not cross itself, notches and spikes included. */
const star = fc.array(fc.double({ min: 12, max: 90, noNaN: true }), { minLength: 3, maxLength: 14 }).map((radii) =>
  radii.map((radius, i): Vec2 => {
    const angle = (i / radii.length) * 2 * Math.PI;
    return [radius * Math.cos(angle), radius * Math.sin(angle)];
  }),
);

describe('layOut', () => {
  it('keeps any parts apart, inside the margin, each exactly once', () => {
    fc.assert(
      fc.property(
        fc.array(star, { minLength: 1, maxLength: 7 }),
        fc.double({ min: 0, max: 9, noNaN: true }),
        fc.constantFrom<SheetStock['grain']>('none', 'alongWidth', 'alongHeight'),
        (outlines, spacingMm, grain) => {
          const parts = outlines.map((outline, i) =>
            makePart(`p/${i}`, outline, { grainDeg: i % 2 === 0 ? null : i * 17.3 }),
          );
          const layout = layOut(parts, [sheet({ grain, wMm: 400, hMm: 330 })], { ...LAYOUT_DEFAULTS, spacingMm });
          expect(layout.failures).toEqual([]);
          assertSound(parts, layout);
        },
      ),
      { numRuns: 60, seed: 20 },
    );
  }, 120_000);

  it('lays a mixed set by material, and puts a test square into the waste', () => {
    const parts = sampleParts();
    const layout = layOut(parts, [sheet(), ply], LAYOUT_DEFAULTS);
    assertSound(parts, layout);
    expect(layout.failures).toEqual([]);
    expect(layout.sheets.map(({ id, materialId }) => [id, materialId])).toEqual([
      ['sheet-1', 'foam-5'],
      ['sheet-2', 'ply-3'],
    ]);
    expect(layout.sheets.every(({ checkSquareMm }) => checkSquareMm !== null)).toBe(true);
  });

  it('interlocks swept panels: four of them fit where their boxes would not', () => {
    const outline = sweptHalf(150, 90, 300, 200);
    const parts = ['a', 'b', 'c', 'd'].map((name) => makePart(`wing/${name}`, outline));
    // Box 290 x 300: two side by side are 584 mm. Four interlocked need 4 x 124 mm of mean chord along the line of the sweep.
    const layout = layOut(parts, [sheet({ wMm: 850, hMm: 320 })], LAYOUT_DEFAULTS);
    assertSound(parts, layout);
    expect(layout.sheets).toHaveLength(1);
    expect(layout.failures).toEqual([]);
  });

  it('uses the pocket of a concave part', () => {
    const angle: Vec2[] = [
      [0, 0],
      [300, 0],
      [300, 60],
      [60, 60],
      [60, 300],
      [0, 300],
    ];
    const parts = [makePart('angle', angle), makePart('block', rectangle(200, 200))];
    const layout = layOut(parts, [sheet({ wMm: 310, hMm: 310 })], LAYOUT_DEFAULTS);
    assertSound(parts, layout);
    expect(layout.sheets).toHaveLength(1);
  });

  it('turns a part only so that its grain runs along the sheet', () => {
    const parts = [
      makePart('along', rectangle(200, 40), { grainDeg: 90 }),
      makePart('askew', rectangle(150, 30), { grainDeg: 20 }),
    ];
    const [wide] = layOut(parts, [sheet({ grain: 'alongWidth' })], LAYOUT_DEFAULTS).sheets;
    const turns = Object.fromEntries(wide?.placements.map(({ partKey, turnDeg }) => [partKey, turnDeg % 180]) ?? []);
    expect(turns).toEqual({ along: 90, askew: 160 });
  });

  it('names the part that has no place, and why', () => {
    const stock = [sheet({ count: 1, wMm: 220, hMm: 220, grain: 'alongWidth' })];
    const parts = [
      makePart('whole', rectangle(200, 200)),
      makePart('second', rectangle(190, 190)),
      makePart('long', rectangle(230, 20)),
      makePart('cross-grain', rectangle(205, 215), { materialId: 'none' }),
    ];
    const { failures } = layOut(parts, stock, LAYOUT_DEFAULTS);
    expect([...failures].sort((a, b) => (a.partKey < b.partKey ? -1 : 1))).toEqual([
      { kind: 'no-stock', partKey: 'cross-grain', materialId: 'none' },
      { kind: 'too-large', partKey: 'long', sizeMm: [230, 20] },
      { kind: 'no-room', partKey: 'second', sheetsTried: 1 },
    ]);
  });

  it('takes a part exactly as large as the sheet inside its margins', () => {
    const parts = [makePart('full', rectangle(690, 490))];
    const layout = layOut(parts, [sheet()], LAYOUT_DEFAULTS);
    assertSound(parts, layout);
    expect(layout.failures).toEqual([]);
    expect(layout.sheets[0]?.checkSquareMm).toBeNull();
    expect(layout.sheets[0]?.utilisation).toBeCloseTo((690 * 490) / (700 * 500), 9);
  });

  it('shifts parts to later sheets so that each keeps its test square, when that costs no sheet', () => {
    // 390 x 200 mm usable: three of these fill a sheet, two leave room for the square.
    const parts = ['a', 'b', 'c', 'd'].map((name) => makePart(name, rectangle(100, 195)));
    const layout = layOut(parts, [sheet({ wMm: 400, hMm: 210 })], LAYOUT_DEFAULTS);
    assertSound(parts, layout);
    expect(layout.sheets.map(({ checkSquareMm }) => checkSquareMm !== null)).toEqual([true, true]);
    // With six parts the square would cost a third sheet, so it gives way.
    const six = [...parts, makePart('e', rectangle(100, 195)), makePart('f', rectangle(100, 195))];
    expect(layOut(six, [sheet({ wMm: 400, hMm: 210 })], LAYOUT_DEFAULTS).sheets).toHaveLength(2);
  });

  it('gives the same layout whatever order the parts come in', () => {
    const parts = sampleParts();
    const layout = layOut(parts, [sheet(), ply], LAYOUT_DEFAULTS);
    expect(layOut([...parts].reverse(), [sheet(), ply], LAYOUT_DEFAULTS)).toEqual(layout);
  });

  it('refuses impossible options by value', () => {
    expect(() => layOut([], [sheet()], { ...LAYOUT_DEFAULTS, spacingMm: Number.NaN })).toThrow(/spacingMm.*NaN/);
    expect(() => layOut([], [sheet()], { ...LAYOUT_DEFAULTS, marginMm: -1 })).toThrow(/marginMm.*-1/);
  });

  it('lays nothing over 2000 parts, and says the first part over and both numbers', () => {
    const many = Array.from({ length: 10_000 }, (_, i) => makePart(`p/${i}`, rectangle(20, 20)));
    const layout = layOut(many, [sheet()], LAYOUT_DEFAULTS);
    expect(layout.sheets).toEqual([]);
    expect(layout.failures).toEqual([{ kind: 'too-many-parts', partKey: 'p/2000', count: 10_000, most: 2000 }]);
  });

  it('opens no more than 200 sheets; the parts left are failures', () => {
    const many = Array.from({ length: 203 }, (_, i) => makePart(`p/${i}`, rectangle(680, 480)));
    const layout = layOut(many, [sheet()], LAYOUT_DEFAULTS);
    expect(layout.sheets).toHaveLength(200);
    expect(layout.failures.map(({ kind }) => kind)).toEqual(Array(3).fill('too-many-sheets'));
    assertSound(many, layout);
  });
});
