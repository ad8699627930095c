import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import type { Vec2 } from '@/lib/numerics/vec';
import type { Drawing } from '../drawing';
import { PAPERS } from '../paper';
import { formatsOf, TILE_DEFAULTS } from './format';
import { letterOf } from './marks';
import { type TiledSheet, type TilePage, tileSheets } from './tileSheets';

const box = (id: string, x: number, y: number, w: number, h: number) => ({
  id,
  type: 'cut' as const,
  closed: true,
  points: [
    [x, y],
    [x + w, y],
    [x + w, y + h],
    [x, y + h],
  ] as const,
});
const drawing = (wMm: number, hMm: number, lines: Drawing['lines']): Drawing => ({
  id: 'sheet-1',
  name: 'Sheet 1',
  material: 'test',
  sheetMm: [wMm, hMm],
  strokeMm: 0.2,
  lines,
  texts: [],
  key: [],
  longest: null,
});
const tiled = (sheet: Drawing): TiledSheet => {
  const [only] = tileSheets([sheet], PAPERS.a4, TILE_DEFAULTS);
  if (!only) throw new Error('no sheet came back');
  return only;
};
const onPage = (tile: TilePage, [x, y]: Vec2): Vec2 => [x + tile.pageFromSheet[4], y + tile.pageFromSheet[5]];
const shows = (tile: TilePage, point: Vec2): boolean => {
  const [x, y] = onPage(tile, point);
  const [x0, y0, x1, y1] = tile.format.clipMm;
  return x > x0 && x < x1 && y > y0 && y < y1;
};

describe('tileSheets', () => {
  it('shows every point of every line on some page', () => {
    const rectangles = fc.array(
      fc.tuple(
        fc.double({ min: 5, max: 900, noNaN: true }),
        fc.double({ min: 5, max: 600, noNaN: true }),
        fc.double({ min: 1, max: 90, noNaN: true }),
        fc.double({ min: 1, max: 90, noNaN: true }),
      ),
      { minLength: 1, maxLength: 6 },
    );
    fc.assert(
      fc.property(rectangles, (boxes) => {
        const lines = boxes.map(([x, y, w, h], i) => box(`b${i}`, x, y, w, h));
        const { pages } = tiled(drawing(1000, 700, lines));
        for (const { points } of lines) {
          points.forEach(([x, y], i) => {
            const [x2, y2] = points[(i + 1) % 4] ?? [x, y];
            for (const t of [0, 0.13, 0.37, 0.5, 0.71, 0.93]) {
              const point: Vec2 = [x + (x2 - x) * t, y + (y2 - y) * t];
              expect(pages.some((page) => shows(page, point))).toBe(true);
            }
          });
        }
      }),
      { numRuns: 25, seed: 7 },
    );
  }, 60_000);

  it('prints nothing for an empty sheet, and no page without ink', () => {
    expect(tiled(drawing(1000, 700, [])).pages).toEqual([]);
    const { pages } = tiled(drawing(1000, 700, [box('a', 5, 5, 40, 40), box('b', 950, 650, 40, 40)]));
    expect(pages).toHaveLength(2);
  });

  it('takes the orientation that needs fewer pages', () => {
    // The window of A4 is 184.2 x 269.2 mm upright and 271.2 x 182.2 mm lying.
    const [wide] = tiled(drawing(1000, 700, [box('a', 5, 5, 260, 170)])).pages;
    expect(wide?.format.mediaMm).toEqual([297, 210]);
    const [high] = tiled(drawing(1000, 700, [box('a', 5, 5, 170, 260)])).pages;
    expect(high?.format.mediaMm).toEqual([210, 297]);
  });

  it('never needs more pages than a plain grid over the whole sheet', () => {
    const lines = [box('a', 5, 5, 300, 100), box('b', 400, 300, 250, 250), box('c', 700, 20, 200, 120)];
    const plain = formatsOf(PAPERS.a4, TILE_DEFAULTS).map(({ clipMm: [x0, y0, x1, y1] }) => {
      const step = TILE_DEFAULTS.overlapMm;
      return Math.ceil((1000 - step) / (x1 - x0 - step)) * Math.ceil((700 - step) / (y1 - y0 - step));
    });
    expect(tiled(drawing(1000, 700, lines)).pages.length).toBeLessThanOrEqual(Math.min(...plain));
  });

  it('puts the same marks at the same place of the sheet on both pages of a seam', () => {
    const { pages } = tiled(drawing(700, 500, [box('a', 5, 5, 690, 490)]));
    const seen = new Map<string, Vec2[]>();
    for (const page of pages) {
      for (const { letter, at } of page.marks) {
        const [x, y] = onPage(page, at);
        const [a, b, c, d, e, f] = page.pageFromSheet;
        expect([a, b, c, d]).toEqual([1, 0, 0, 1]);
        seen.set(letter, [...(seen.get(letter) ?? []), [x - e, y - f]]);
      }
    }
    expect(seen.size).toBeGreaterThan(0);
    for (const places of seen.values()) {
      expect(places.length).toBeGreaterThanOrEqual(2);
      const [[x, y] = [0, 0]] = places;
      for (const place of places) expect(Math.hypot(place[0] - x, place[1] - y)).toBeLessThan(0.1);
    }
  });

  it('marks every seam between printed pages twice', () => {
    const { pages } = tiled(drawing(700, 500, [box('a', 5, 5, 690, 490)]));
    const seams = pages.reduce(
      (sum, { joins }) => sum + (joins.right === null ? 0 : 1) + (joins.below === null ? 0 : 1),
      0,
    );
    const letters = new Set(pages.flatMap(({ marks }) => marks.map(({ letter }) => letter)));
    expect(letters.size).toBe(2 * seams);
  });

  it('counts rows from the top and columns from the left, as pages are read', () => {
    const { pages } = tiled(drawing(700, 500, [box('a', 5, 5, 690, 490)]));
    const at = (row: number, col: number) => pages.find(({ cell }) => cell.row === row && cell.col === col);
    expect(at(0, 0)?.cell.fromMm[1]).toBeGreaterThan(at(1, 0)?.cell.fromMm[1] ?? Infinity);
    expect(at(0, 1)?.cell.fromMm[0]).toBeGreaterThan(at(0, 0)?.cell.fromMm[0] ?? Infinity);
    expect(at(0, 0)?.joins).toMatchObject({ left: null, above: null, right: at(0, 1)?.index, below: at(1, 0)?.index });
  });
});

describe('letterOf', () => {
  it.each([
    [0, 'A'],
    [25, 'Z'],
    [26, 'AA'],
    [51, 'AZ'],
    [52, 'BA'],
  ])('%i is %s', (index, letter) => {
    expect(letterOf(index)).toBe(letter);
  });
});
