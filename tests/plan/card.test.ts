import { execFileSync } from 'node:child_process';
import { mkdtempSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { parseAirframeText } from '@/lib/airframe/parse';
import type { Airframe } from '@/lib/airframe/schema/airframe';
import { analyse } from '@/lib/figures/analyse';
import type { Figures } from '@/lib/figures/types';
import { layOut } from '@/lib/layout/layOut';
import { LAYOUT_DEFAULTS, stockOf } from '@/lib/layout/stock';
import { develop } from '@/lib/parts/develop';
import { makePlan } from '@/lib/plan/makePlan';
import type { PlanFile } from '@/lib/plan/manifest';
import { PAPERS, type PaperId } from '@/lib/plan/paper';
import { planFonts } from '@/tests/support/fonts';

// The builder's card and the set-up sheet as another program reads them off the pages.

const folder = mkdtempSync(join(tmpdir(), 'card-'));
afterAll(() => rmSync(folder, { recursive: true, force: true }));

const example = (name: string): Airframe => {
  const parsed = parseAirframeText(readFileSync(join(import.meta.dirname, `../../examples/${name}.json`), 'utf8'));
  if (!parsed.ok) throw new RangeError(parsed.problems[0]?.message);
  return parsed.value;
};

interface Printed {
  readonly path: string;
  readonly file: PlanFile;
  readonly figures: Figures;
}

async function print(
  name: string,
  airframe: Airframe,
  { paper = 'a4', change = (figures) => figures }: { paper?: PaperId; change?: (figures: Figures) => Figures } = {},
): Promise<Printed> {
  const figures = change(analyse(airframe, { depth: 'full' }));
  const development = develop(airframe);
  const layout = layOut(development.parts, stockOf(airframe), LAYOUT_DEFAULTS);
  const made = await makePlan({ airframe, figures, development, layout, paper: PAPERS[paper], fonts: planFonts() });
  if (!made.ok) throw new RangeError(made.problems[0]?.message);
  const path = join(folder, `${name}-${paper}.pdf`);
  writeFileSync(path, made.value.pdf);
  return { path, file: made.value, figures };
}

const textOf = (path: string, page: number): string =>
  execFileSync('pdftotext', ['-f', String(page), '-l', String(page), '-layout', path, '-'], { encoding: 'utf8' });
const frontOf = ({ path, file }: Printed): string[] => file.manifest.otherPages.map(({ page }) => textOf(path, page));
const rounded = (figures: Figures, id: string): string => (figures.values[id]?.value ?? Number.NaN).toFixed(0);

describe('a plan of the trainer', () => {
  let printed: Printed;
  let card: string;
  beforeAll(async () => {
    printed = await print('trainer', example('ombry-1000'));
    card = textOf(printed.path, 1);
  });

  // The document: aileron 22 % of 215 mm, 15 up and 10 down less 40 % of what goes up, low rate 0.67; elevator 35 % of 130 mm, 12 both.
  // The straight way of an edge is 2 r sin(d / 2): 2 x 47.3 x sin 7.5 = 12.35, sin 4.5 7.42, sin 5.025 8.29, sin 3.015 4.98;
  // 2 x 45.5 x sin 6 = 9.51, sin 4.02 6.38.
  it.each([
    ['Wing, aileron', 'up 8.3 mm (10.1°)', 'down 5 mm (6°)', 'up 12.3 mm (15°)', 'down 7.4 mm (9°)'],
    ['Tailplane, elevator', 'up 6.4 mm (8°)', 'down 6.4 mm (8°)', 'up 9.5 mm (12°)', 'down 9.5 mm (12°)'],
  ])('%s: low rate, then high, in millimetres and degrees', (...cells) => {
    const row = card.split('\n').find((line) => line.includes(cells[0]));
    expect(row?.trim().split(/ {2,}/)).toEqual(cells);
  });

  it('gives expo, low rate, neutral and the thrust line', () => {
    expect(card).toContain('Low rate: 67 % of the throw');
    expect(card).toContain('Expo 30 %, softer at the centre');
    expect(card).toContain('Neutral: every control in line');
    expect(card).toContain('Motor: thrust line 2° down, 2° right.');
  });

  it('says what the mass was added up from, and calls every figure an estimate with its band', () => {
    expect(card).toMatch(/counted: foam \d+ g, glue and tape \d+ g, tubes \d+ g/);
    const { low, high } = printed.figures.values.allUpMassG?.band ?? { low: 0, high: 0 };
    expect(card).toContain(`estimate · ${low.toFixed(0)} to ${high.toFixed(0)} g`);
    expect(card).toContain('% MAC');
    expect(card).toContain('m/s');
  });

  it('has the set-up sheet after the notes, a box for each row, then the tiles', () => {
    const front = frontOf(printed);
    expect(printed.file.manifest.otherPages.map(({ kind }) => kind)).toEqual(['cover', 'legend', 'legend']);
    expect(front[1]).toContain('Joining');
    expect(front[1]).toContain('Sheets and pages');
    expect(front[2]).toContain('Propeller off for every set-up');
    expect(front[2]).toContain('Aileron stick right: starboard aileron up 15°, port aileron down 9°.');
    const [first] = printed.file.manifest.sheets.flatMap(({ pages }) => pages);
    expect(first?.page).toBe(front.length + 1);
    const pages = front.length + printed.file.manifest.sheets.reduce((sum, sheet) => sum + sheet.pages.length, 0);
    expect(front[2]).toContain(`page 3 of ${pages}`);
  });
});

describe('the CG of the first flight', () => {
  it('is measured from what can be touched, never from the origin of the drawing', async () => {
    // The delta's body covers the wing's root: no leading edge stands at the origin.
    const { path, figures } = await print('delta', example('hask'));
    const card = textOf(path, 1);
    for (const id of ['cgFromBodySideMm', 'firstFlightAtStationMm', 'firstFlightFromNoseMm']) {
      expect(card).toMatch(new RegExp(`\\b${rounded(figures, id)} mm`));
    }
    for (const id of ['firstFlightCgXMm', 'cgXMm']) {
      expect(card, id).not.toMatch(new RegExp(`\\b${rounded(figures, id)} mm`));
    }
    const station = figures.values.firstFlightAtStationMm?.inputs?.[0]?.value ?? Number.NaN;
    expect(card).toContain(`${station.toFixed(0)} mm from the centre line`);
  });
});

describe('a revision of an earlier engine', () => {
  const old = ({ charts: _charts, setUp: _setUp, ...figures }: Figures): Figures => {
    const { firstFlightAtStationMm: _a, firstFlightFromNoseMm: _b, packFirstFlightMm: _c, ...values } = figures.values;
    return { ...figures, engine: '1', values };
  };

  it.each([
    ['without a set-up sheet', old],
    ['whose set-up sheet failed', (figures: Figures): Figures => ({ ...figures, setUp: null })],
  ])('%s prints, with the throws of the document and a line that says what is missing', async (_, change) => {
    const printed = await print('old', example('ombry-1000'), { change });
    expect(printed.file.manifest.otherPages.map(({ kind }) => kind)).toEqual(['cover', 'legend']);
    const [card = '', notes = ''] = frontOf(printed);
    expect(card).toContain('Wing, aileron: up 15° (10.1°), down 10° (6.7°)');
    expect(`${card}${notes}`).toContain('hold no set-up sheet');
    expect(card).toContain('aft of the leading edge');
    expect(card).toContain(`${rounded(printed.figures, 'cgFromBodySideMm')} mm`);
  });

  it('prints without any figures', async () => {
    const airframe = example('ombry-1000');
    const development = develop(airframe);
    const layout = layOut(development.parts, stockOf(airframe), LAYOUT_DEFAULTS);
    const fonts = planFonts();
    const made = await makePlan({ airframe, figures: null, development, layout, paper: PAPERS.a4, fonts });
    expect(made.ok).toBe(true);
  });
});

describe('long names', () => {
  /** Words of a page with the right edge of each, mm. */
  const edges = (path: string, page: number): number[] => {
    const html = execFileSync('pdftotext', ['-f', String(page), '-l', String(page), '-bbox', path, '-'], {
      encoding: 'utf8',
    });
    return [...html.matchAll(/xMax="([\d.]+)"/g)].map((match) => (Number(match[1]) * 25.4) / 72);
  };

  it.each(['a4', 'letter'] as const)(
    'stay on the front pages of %s, and the throws keep what they are of',
    async (paper) => {
      const airframe = example('quenlet-700');
      const name = 'Outer panel that somebody gave a name of eighty letters to see where it all goes';
      const surfaces = airframe.surfaces.map((surface) => ({ ...surface, name: name.slice(0, 80) }));
      const items = airframe.items.map((item) => ({ ...item, name: 'W'.repeat(80) }));
      const printed = await print('long', { ...airframe, name: 'W'.repeat(80), surfaces, items }, { paper });
      const right = PAPERS[paper].wMm - 6.4;
      for (const { page } of printed.file.manifest.otherPages) {
        expect(Math.max(...edges(printed.path, page))).toBeLessThanOrEqual(right);
      }
      const [card = ''] = frontOf(printed);
      const rows = card.split('\n').filter((line) => line.includes('mm (') && line.includes('stick'));
      expect(rows).toHaveLength(2);
      for (const row of rows) expect(row).toMatch(/^\s*Outer.*…, elevon · (Elevator|Aileron) stick .*up/);
    },
  );

  it('more throws than the card has room for are counted, and all stand on the set-up sheet', async () => {
    const airframe = example('ombry-1000');
    const surfaces = airframe.surfaces.map((surface) => {
      const [first] = surface.controls;
      if (!first || surface.role !== 'wing') return surface;
      const controls = Array.from({ length: 12 }, (_, i) => ({
        ...first,
        id: `strip${i}`,
        from: 0.05 + 0.07 * i,
        to: 0.11 + 0.07 * i,
      }));
      return { ...surface, controls };
    });
    const printed = await print('many', { ...airframe, surfaces });
    const [card = '', ...rest] = frontOf(printed);
    const [, count] = /and (\d+) more, all on the set-up sheet/.exec(card) ?? [];
    expect(Number(count)).toBe(14 - card.split('\n').filter((line) => line.includes('mm (')).length);
    const sheet = rest.join('');
    for (let i = 1; i <= 12; i++) expect(sheet).toContain(`Aileron ${i}, both sides: Wing`);
  });
});
