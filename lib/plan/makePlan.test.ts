import { readFileSync } from 'node:fs';
import { join } from 'node:path';
import { describe, expect, it } from 'vitest';
import { parseAirframeText } from '@/lib/airframe/parse';
import { layOut } from '@/lib/layout/layOut';
import { LAYOUT_DEFAULTS } from '@/lib/layout/stock';
import type { SheetLayout } from '@/lib/layout/types';
import type { Part } from '@/lib/parts/types';
import { planFonts } from '@/tests/support/fonts';
import { makePart, rectangle } from '@/tests/support/parts';
import { makePlan } from './makePlan';
import { PAPERS } from './paper';

const parsed = parseAirframeText(readFileSync(join(import.meta.dirname, '../../examples/tarrel-620.json'), 'utf8'));
if (!parsed.ok) throw new Error(JSON.stringify(parsed.problems));
const airframe = parsed.value;

const stock = {
  id: 'foam',
  materialId: 'foam-5',
  thicknessMm: 5,
  wMm: 900,
  hMm: 600,
  count: null,
  grain: 'none',
} as const;
const make = (parts: readonly Part[], layout: SheetLayout = layOut(parts, [stock], LAYOUT_DEFAULTS)) =>
  makePlan({
    airframe,
    figures: null,
    development: { parts, stockPieces: [], problems: [] },
    layout,
    paper: PAPERS.a4,
    fonts: planFonts(),
  });
const many = (count: number, w: number, h: number): Part[] =>
  Array.from({ length: count }, (_, i) => makePart(`p/${i}`, rectangle(w, h)));

describe('makePlan refuses', () => {
  it('10,000 parts, with the limit and what to change', async () => {
    const result = await make(many(10_000, 20, 20));
    expect(result).toMatchObject({ ok: false, problems: [{ code: 'too-many-parts' }] });
    expect(!result.ok && result.problems[0]?.message).toMatch(/10000 parts.*2000/);
    expect(!result.ok && result.problems[0]?.fix).toMatch(/split/);
  });

  it('more sheets than are laid out, as one problem', async () => {
    const result = await make(many(203, 880, 580));
    expect(result).toMatchObject({ ok: false, problems: [{ code: 'too-many-sheets' }] });
    expect(!result.ok && result.problems).toHaveLength(1);
  });

  it('more pages than 500, by their number', async () => {
    // One part a sheet, and each takes more than ten pages of A4: 880 x 580 mm over at most 200 x 290 mm.
    const result = await make(many(50, 880, 580));
    expect(result).toMatchObject({ ok: false, problems: [{ code: 'too-many-pages', path: 'paper' }] });
    expect(!result.ok && result.problems[0]?.message).toMatch(/at most 500/);
  });

  it('parts without any', async () => {
    expect(await make([])).toMatchObject({ ok: false, problems: [{ code: 'no-parts' }] });
  });
});
