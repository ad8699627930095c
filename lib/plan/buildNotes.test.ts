import { readFileSync } from 'node:fs';
import { join } from 'node:path';
import { describe, expect, it } from 'vitest';
import { parseAirframeText } from '@/lib/airframe/parse';
import type { Airframe } from '@/lib/airframe/schema/airframe';
import type { Mount } from '@/lib/airframe/schema/common';
import { setUpSheet } from '@/lib/figures/setUp';
import type { Figures } from '@/lib/figures/types';
import { layOut } from '@/lib/layout/layOut';
import { LAYOUT_DEFAULTS, stockOf } from '@/lib/layout/stock';
import { develop } from '@/lib/parts/develop';
import { buildNotes, tubeWords } from './buildNotes';
import { materialWords } from './materialWords';

const example = (name: string): Airframe => {
  const parsed = parseAirframeText(readFileSync(join(import.meta.dirname, `../../examples/${name}.json`), 'utf8'));
  if (!parsed.ok) throw new Error(JSON.stringify(parsed.problems));
  return parsed.value;
};
const notesOf = (airframe: Airframe, cgXMm: number | null = null, more: Partial<Figures> = {}) => {
  const development = develop(airframe);
  const layout = layOut(development.parts, stockOf(airframe), LAYOUT_DEFAULTS);
  const marks = {
    mac: null,
    aerodynamicCentreXMm: null,
    neutralPointXMm: null,
    neutralPointBandXMm: null,
    cgRangeXMm: null,
    firstFlightCgXMm: cgXMm,
    cg: null,
  };
  const figures = { engine: '1', depth: 'full', values: {}, marks, masses: [], problems: [], ...more } as const;
  return buildNotes(airframe, development, layout, figures);
};

describe('buildNotes', () => {
  // The document says: aileron 15 up and 10 down, elevator 12 both, low rate 0.67; 4/2 and 5/3 mm tubes; motor 0, 0.
  const airframe = example('tarrel-620');

  it('lists sheets by kind and tubes by section and length', () => {
    const { need } = notesOf(airframe);
    expect(need).toContain('1 × paper-faced board, 5 mm, 1000 × 700 mm');
    expect(need).toContain('1 × ply, 2 mm, 300 × 200 mm');
    expect(need.some((row) => /^2 × 5\/3 mm tube, 470 mm: .*\(carbon-5-3\)$/.test(row))).toBe(true);
  });

  it('gives throws both ways at both rates, and the thrust line', () => {
    const { setUp } = notesOf(airframe);
    // 0.67 of 15, 10 and 12.
    expect(setUp).toContain('Wing, aileron: up 15° (10.1°), down 10° (6.7°)');
    expect(setUp).toContain('Tailplane, elevator: up 12° (8°), down 12° (8°)');
    expect(setUp.some((row) => row.endsWith('thrust line straight.'))).toBe(true);
  });

  it('gives the place of the pack from the balance line, and none without one', () => {
    // 151 mm ahead of the datum, and the line 50 mm behind it.
    const mount: Mount = { to: 'datum', at: [-151, 0, 0] };
    const slide = { fromMm: -15, toMm: 40 };
    const items = airframe.items.map((item) => (item.kind === 'pack' ? { ...item, mount, slide } : item));
    const { setUp } = notesOf({ ...airframe, items }, 50);
    expect(setUp.some((row) => row.includes('201 mm ahead of the first-flight CG (estimate)'))).toBe(true);
    expect(setUp).toContain('It slides 15 mm forward and 40 mm aft of there.');
    expect(notesOf(airframe).setUp.some((row) => row.includes('first-flight CG'))).toBe(false);
  });

  it('calls a reflexed elevon up: a negative neutral angle lifts the trailing edge', () => {
    expect(notesOf(example('hask')).setUp).toContain('Wing, elevon: neutral 2.5° up');
  });

  it('leaves the throws to the set-up sheet where the figures hold one, and says so where they do not', () => {
    const hask = example('hask');
    const sheet = setUpSheet(hask);
    if (!sheet.ok) throw new RangeError(sheet.problems[0]?.message);
    const { setUp } = notesOf(hask, null, { setUp: sheet.value });
    expect(setUp.some((row) => /elevon: up/.test(row))).toBe(false);
    // The document's low rate and expo.
    expect(setUp[0]).toContain('67 %');
    expect(setUp[1]).toContain('Expo 30 %');
    expect(setUp.some((row) => /^Wing, elevon: neutral up [\d.]+ mm \(2.5°\)$/.test(row))).toBe(true);
    expect(setUp.some((row) => row.includes('no set-up sheet'))).toBe(false);
    expect(notesOf(hask, null, { setUp: null }).setUp.some((row) => row.includes('no set-up sheet'))).toBe(true);
  });

  it('says how far the pack has to go for the first flight', () => {
    const verdict = { level: 'good', words: 'move it 12 mm aft' } as const;
    const { setUp } = notesOf(airframe, 50, { values: { packFirstFlightMm: { value: 12, verdict } } });
    expect(setUp).toContain('Pack, to bring the CG there: move it 12 mm aft.');
  });
});

describe('words for stock', () => {
  it('name a material by its kind, and by its id too where two are alike', () => {
    const board = { kind: 'paperFacedBoard', thicknessMm: 5 } as const;
    const one = materialWords([{ id: 'a', ...board }]);
    expect(one('a')).toBe('paper-faced board');
    expect(one('gone')).toBe('gone');
    const two = materialWords([
      { id: 'a', ...board },
      { id: 'b', ...board },
    ]);
    expect(two('b')).toBe('paper-faced board (b)');
  });

  it('name a tube by its section', () => {
    expect(tubeWords({ kind: 'tube', outerMm: [6, 6], innerMm: [4, 4] })).toBe('6/4 mm tube');
    expect(tubeWords({ kind: 'rod', outerMm: [2, 2] })).toBe('2 mm rod');
    expect(tubeWords({ kind: 'strip', outerMm: [5, 1] })).toBe('5 × 1 mm strip');
  });
});
