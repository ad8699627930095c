import { describe, expect, it } from 'vitest';
import type { Vec2 } from '@/lib/numerics/vec';
import type { Drawing, DrawnLine } from '../drawing';
import { PAPERS } from '../paper';
import { TILE_DEFAULTS } from './format';
import { joinChecks } from './joinChecks';
import { tileSheets } from './tileSheets';

const box = (id: string, type: DrawnLine['type'], w: number, h: number): DrawnLine => ({
  id,
  type,
  closed: true,
  points: [
    [0, 0],
    [w, 0],
    [w, h],
    [0, h],
  ],
});
const tiled = (lines: readonly DrawnLine[]) => {
  const drawing: Drawing = {
    id: 'sheet-1',
    name: 'Sheet 1',
    material: 'foam',
    sheetMm: [800, 600],
    strokeMm: 0.2,
    lines,
    texts: [],
    key: [],
    longest: { name: 'Wing', lengthMm: 762.24 },
  };
  const [sheet] = tileSheets([drawing], PAPERS.a4, TILE_DEFAULTS);
  if (!sheet) throw new Error('no sheet came back');
  return sheet;
};

describe('joinChecks', () => {
  it('gives the longest part, and lengths between marks that are printed on different pages', () => {
    const sheet = tiled([box('a', 'cut', 700, 500), box('c', 'check', 100, 100)]);
    const rows = joinChecks(sheet);
    expect(rows[0]).toBe('Sheet 1: Wing, between its farthest corners, should read 762.2 mm');
    const at = new Map(sheet.pages.flatMap(({ marks }) => marks.map(({ letter, at: place }) => [letter, place])));
    const lengths = rows.slice(1).map((row) => {
      const [, a = '', b = '', mm] = /from mark (\w+) to mark (\w+) should read ([\d.]+) mm/.exec(row) ?? [];
      const [p, q]: (Vec2 | undefined)[] = [at.get(a), at.get(b)];
      if (!p || !q) throw new Error(`no such marks: ${row}`);
      expect(Number(mm)).toBeCloseTo(Math.hypot(p[0] - q[0], p[1] - q[1]), 0.9);
      return Number(mm);
    });
    expect(lengths).toHaveLength(2);
    // The marks lie inside 700 x 500 mm, and the longer of the two lengths spans most of it.
    expect(Math.max(...lengths)).toBeGreaterThan(400);
    expect(Math.max(...lengths)).toBeLessThan(Math.hypot(700, 500));
  });

  it('asks for nothing on a single page, and says when a sheet has no test square', () => {
    expect(joinChecks(tiled([box('c', 'check', 100, 100)]))).toEqual([]);
    const [row] = joinChecks(tiled([box('a', 'cut', 100, 100)]));
    expect(row).toContain('no room for the 100 mm test square');
  });
});
