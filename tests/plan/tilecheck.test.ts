import { readdirSync, readFileSync } from 'node:fs';
import { join } from 'node:path';
import { describe, expect, it } from 'vitest';
import { parseAirframeText } from '@/lib/airframe/parse';
import { layOut } from '@/lib/layout/layOut';
import { LAYOUT_DEFAULTS, stockOf } from '@/lib/layout/stock';
import type { SheetLayout, SheetStock } from '@/lib/layout/types';
import type { Vec2 } from '@/lib/numerics/vec';
import { develop } from '@/lib/parts/develop';
import type { Part } from '@/lib/parts/types';
import { draw } from '@/lib/plan/draw';
import type { Drawing, Paper } from '@/lib/plan/drawing';
import { expectedLines } from '@/lib/plan/expected';
import { PAPERS } from '@/lib/plan/paper';
import { tile } from '@/lib/plan/tile';
import { planFonts } from '@/tests/support/fonts';
import { sampleParts } from '@/tests/support/parts';
import { tilecheck } from '@/tests/support/tilecheck';

// The printed pages against the cut lines that parts and placements ask for, measured in the rendered ink by a checker that
// knows neither the drawing nor the writer.

/** Largest deviation of any cut line, mm. */
const TOLERANCE_MM = 0.02;
const EXAMPLES = join(import.meta.dirname, '../../examples');
const PAPERS_TRIED = [PAPERS.a4, PAPERS.letter] as const;

const stock: readonly SheetStock[] = [
  { id: 'foam', materialId: 'foam-5', thicknessMm: 5, wMm: 700, hMm: 500, count: null, grain: 'alongWidth' },
  { id: 'ply', materialId: 'ply-3', thicknessMm: 3, wMm: 300, hMm: 200, count: null, grain: 'none' },
];

const print = (
  parts: readonly Part[],
  layout: SheetLayout,
  paper: Paper,
  drawings: readonly Drawing[] = draw(parts, layout),
) =>
  tile(drawings, paper, {
    design: 'Test',
    revision: null,
    figures: null,
    expected: expectedLines(parts, layout),
    fonts: planFonts(),
  });

const check = async (parts: readonly Part[], layout: SheetLayout, paper: Paper): Promise<void> => {
  const { ok, report } = tilecheck(await print(parts, layout, paper), [paper.wMm, paper.hMm], TOLERANCE_MM);
  expect(ok, report).toBe(true);
};

const sample = (): { parts: Part[]; layout: SheetLayout } => {
  const parts = sampleParts();
  return { parts, layout: layOut(parts, stock, LAYOUT_DEFAULTS) };
};

describe('printed pages', () => {
  it.each([...PAPERS_TRIED, PAPERS.a3])('a hand-made set of parts comes out true on $name', async (paper) => {
    const { parts, layout } = sample();
    await check(parts, layout, paper);
  });

  const examples = readdirSync(EXAMPLES).filter((name) => name.endsWith('.json'));

  it('there are examples to print', () => {
    expect(examples.length).toBeGreaterThan(0);
  });

  describe.each(examples)('%s', (name) => {
    it.each(PAPERS_TRIED)('comes out true on $name', async (paper) => {
      const parsed = parseAirframeText(readFileSync(join(EXAMPLES, name), 'utf8'));
      if (!parsed.ok) throw new Error(JSON.stringify(parsed.problems));
      const { parts } = develop(parsed.value);
      const layout = layOut(parts, stockOf(parsed.value), LAYOUT_DEFAULTS);
      expect(layout.failures).toEqual([]);
      await check(parts, layout, paper);
    });
  });

  it('a drawing that is 0.1 mm off is caught', async () => {
    const { parts, layout } = sample();
    const shifted = draw(parts, layout).map((drawing) => ({
      ...drawing,
      lines: drawing.lines.map((line) => ({ ...line, points: line.points.map(([x, y]): Vec2 => [x + 0.1, y]) })),
    }));
    const file = await print(parts, layout, PAPERS.a4, shifted);
    expect(tilecheck(file, [210, 297], TOLERANCE_MM).ok).toBe(false);
  });

  it('a drawing that lacks a cut line is caught', async () => {
    const { parts, layout } = sample();
    const poorer = draw(parts, layout).map((drawing) => ({
      ...drawing,
      lines: drawing.lines.filter(({ id }) => id !== 'fin/sheet#outline'),
    }));
    const file = await print(parts, layout, PAPERS.a4, poorer);
    expect(tilecheck(file, [210, 297], TOLERANCE_MM).ok).toBe(false);
  });
});
