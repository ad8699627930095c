import { describe, expect, it } from 'vitest';
import { layOut } from '@/lib/layout/layOut';
import { LAYOUT_DEFAULTS } from '@/lib/layout/stock';
import type { SheetStock } from '@/lib/layout/types';
import { radFromDeg, type Vec2 } from '@/lib/numerics/vec';
import type { Part } from '@/lib/parts/types';
import { inside, polygonDistance } from '@/tests/support/distance';
import { makePart, rectangle, sampleParts } from '@/tests/support/parts';
import { draw } from './draw';
import type { Drawing, DrawnText } from './drawing';
import { expectedLines } from './expected';

const stock: readonly SheetStock[] = [
  { id: 'foam', materialId: 'foam-5', thicknessMm: 5, wMm: 700, hMm: 500, count: null, grain: 'none' },
  { id: 'ply', materialId: 'ply-3', thicknessMm: 3, wMm: 300, hMm: 200, count: null, grain: 'none' },
];
const drawn = (parts: readonly Part[]): Drawing[] => draw(parts, layOut(parts, stock, LAYOUT_DEFAULTS));

/** Room that a text takes at least, with letters at half the height of a capital wide. */
const boxOf = ({ at, text, heightMm, angleDeg }: DrawnText): Vec2[] => {
  const [hw, hh] = [(text.length * heightMm * 0.5) / 2, heightMm / 2];
  const [cos, sin] = [Math.cos(radFromDeg(angleDeg)), Math.sin(radFromDeg(angleDeg))];
  return rectangle(2 * hw, 2 * hh).map(([x, y]) => [
    at[0] + cos * (x - hw) - sin * (y - hh),
    at[1] + sin * (x - hw) + cos * (y - hh),
  ]);
};

describe('draw', () => {
  it('draws every cut line that is expected, where it is expected', () => {
    const parts = sampleParts();
    const layout = layOut(parts, stock, LAYOUT_DEFAULTS);
    const expected = expectedLines(parts, layout);
    for (const { id, lines } of draw(parts, layout)) {
      const cuts = lines.filter(({ type }) => type === 'cut' || type === 'check');
      expect(cuts.map(({ id: line, points, closed }) => ({ line, points, closed }))).toEqual(
        expected.get(id)?.map(({ id: line, points, closed }) => ({ line, points, closed })),
      );
    }
  });

  it('keeps every line type of the operations', () => {
    const types = new Set(drawn(sampleParts()).flatMap(({ lines }) => lines.map(({ type }) => type)));
    expect([...types].sort()).toEqual(
      ['bevel', 'check', 'crease', 'cut', 'cutToPaper', 'glue', 'reference', 'sheetEdge'].sort(),
    );
  });

  it('names every part inside its own outline, clear of its cut lines and of other words', () => {
    const parts = sampleParts();
    for (const { lines, texts } of drawn(parts)) {
      const outlines = lines.filter(({ id }) => id.endsWith('#outline'));
      for (const { partKey, points } of outlines) {
        const part = parts.find(({ key }) => key === partKey);
        const name = texts.find(({ text }) => text === part?.name);
        expect(name, part?.name).toBeDefined();
        expect(name && boxOf(name).every((corner) => inside(corner, points))).toBe(true);
      }
      texts.forEach((text, i) => {
        for (const other of texts.slice(i + 1)) expect(polygonDistance(boxOf(text), boxOf(other))).toBeGreaterThan(0.5);
      });
    }
  });

  it('never writes upside down', () => {
    const turned = makePart('t', rectangle(60, 400), {
      labels: [{ at: [30, 200], text: 'T', heightMm: 5, angleDeg: 180 }],
    });
    for (const { angleDeg } of drawn([turned, ...sampleParts()]).flatMap(({ texts }) => texts)) {
      expect(angleDeg).toBeGreaterThan(-90);
      expect(angleDeg).toBeLessThanOrEqual(90);
    }
  });

  it('marks a point to be pinned through by a cross', () => {
    const pin = { id: 'pin', kind: 'register', path: [[20, 30]], closed: false, face: 'upper' } as const;
    const [sheet] = drawn([makePart('p', rectangle(50, 60), { operations: [pin] })]);
    const cross = sheet?.lines.filter(({ type }) => type === 'register') ?? [];
    expect(cross.map(({ points }) => points.length)).toEqual([2, 2]);
  });

  it('says so when a sheet has no room for the test square', () => {
    const [sheet] = drawn([makePart('full', rectangle(690, 490))]);
    expect(sheet?.lines.some(({ type }) => type === 'check')).toBe(false);
    expect(sheet?.texts.some(({ text }) => text.includes('no room for the 100 mm test square'))).toBe(true);
  });

  it('refuses a layout of other parts by name', () => {
    const layout = layOut(sampleParts(), stock, LAYOUT_DEFAULTS);
    expect(() => draw([], layout)).toThrow(/which is not among the parts/);
    expect(() => expectedLines([], layout)).toThrow(/which is not among the parts/);
  });
});
