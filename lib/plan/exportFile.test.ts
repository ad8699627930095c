import { readFileSync } from 'node:fs';
import { join } from 'node:path';
import { describe, expect, it } from 'vitest';
import { parseAirframe } from '@/lib/airframe/parse';
import { analyse } from '@/lib/figures/analyse';
import type { Figures } from '@/lib/figures/types';
import { layOut } from '@/lib/layout/layOut';
import { LAYOUT_DEFAULTS } from '@/lib/layout/stock';
import { sampleParts } from '@/tests/support/parts';
import { parseExport } from './exportFile';

const airframe: unknown = JSON.parse(readFileSync(join(import.meta.dirname, '../../examples/tarrel-620.json'), 'utf8'));
const revision = { number: 4, state: 'released', releasedAt: '2031-04-05T10:00:00Z', design: 'Wren' };
const marks = {
  mac: null,
  aerodynamicCentreXMm: null,
  neutralPointXMm: null,
  neutralPointBandXMm: null,
  cgRangeXMm: null,
  firstFlightCgXMm: null,
  cg: null,
};
const frozen = {
  figures: { engine: '1', depth: 'full', values: { allUpMassG: { value: 280 } }, marks, masses: [], problems: [] },
  development: { parts: sampleParts(), stockPieces: [], problems: [] },
  layout: layOut(
    sampleParts(),
    [{ id: 'foam', materialId: 'foam-5', thicknessMm: 5, wMm: 700, hMm: 500, count: null, grain: 'none' }],
    LAYOUT_DEFAULTS,
  ),
};
const pathsOf = (input: unknown): string[] => {
  const result = parseExport(input);
  return result.ok ? [] : result.problems.map(({ path }) => path);
};

describe('parseExport', () => {
  it('takes a bare airframe, and an export with revision and frozen artefacts unchanged', () => {
    expect(parseExport(airframe)).toEqual({ ok: true, value: { airframe } });
    const whole: unknown = JSON.parse(JSON.stringify({ revision, airframe, frozen }));
    expect(parseExport(whole)).toEqual({ ok: true, value: whole });
  });

  it('keeps the engine that computed the frozen figures', () => {
    const result = parseExport({ airframe, frozen: { ...frozen, figures: { ...frozen.figures, engine: '2031.4' } } });
    expect(result).toMatchObject({ ok: true, value: { frozen: { figures: { engine: '2031.4' } } } });
  });

  describe('figures of this engine', () => {
    const parsed = parseAirframe(airframe);
    if (!parsed.ok) throw new RangeError(parsed.problems[0]?.message);
    const full: Figures = analyse(parsed.value, { depth: 'full' });
    const file = (figures: unknown): unknown =>
      JSON.parse(JSON.stringify({ airframe: parsed.value, frozen: { ...frozen, figures } }));
    const text = JSON.stringify(full);

    it('come through whole, with charts and set-up sheet', () => {
      expect(full.charts?.length).toBeGreaterThan(0);
      expect(full.setUp?.controls.length).toBeGreaterThan(0);
      const result = parseExport(file(full));
      expect(result.ok && result.value.frozen?.figures).toEqual(JSON.parse(text));
      const failed = parseExport(file({ ...full, setUp: null }));
      expect(failed.ok && failed.value.frozen?.figures.setUp).toBeNull();
    });

    it.each([
      ['a way that is none', /"way":"up"/, '"way":"sideways"', /setUp\.controls\.0\.throws/],
      [
        'a throw of a million millimetres',
        /"way":"up","deg":15,"mm":[\d.]+/,
        '"way":"up","deg":15,"mm":1e6',
        /throws\.0\.high\.mm/,
      ],
      ['a control without a name', /"control":"aileron",/, '', /setUp\.controls\.0\.control/],
      ['a low rate over the whole throw', /"lowRate":[\d.]+/, '"lowRate":4', /setUp\.lowRate/],
      ['a chart of words', /"points":\[\[[^\]]+\]/, '"points":[["a","b"]', /charts\.0\.series\.0\.points/],
    ])('%s is refused at its path', (_, found, put, path) => {
      const edited = text.replace(found, put);
      expect(edited).not.toBe(text);
      const [first] = pathsOf(file(JSON.parse(edited)));
      expect(first).toMatch(path);
    });
  });

  it.each([
    { name: 'an unknown key', input: { airframe, layout: 1 }, path: 'layout' },
    {
      name: 'a fault in the airframe',
      input: { airframe: { format: 'foldspar.airframe', version: 99 } },
      path: 'airframe.version',
    },
    {
      name: 'a revision number of zero',
      input: { airframe, revision: { ...revision, number: 0 } },
      path: 'revision.number',
    },
    {
      name: 'an unknown state',
      input: { airframe, revision: { ...revision, state: 'draft' } },
      path: 'revision.state',
    },
    {
      name: 'a date that is none',
      input: { airframe, revision: { ...revision, releasedAt: 'today' } },
      path: 'revision.releasedAt',
    },
    {
      name: 'a frozen part of two points',
      input: {
        airframe,
        frozen: {
          ...frozen,
          development: {
            ...frozen.development,
            parts: [
              {
                ...sampleParts()[3],
                outline: [
                  [0, 0],
                  [1, 1],
                ],
              },
            ],
          },
        },
      },
      path: 'frozen.development.parts.0.outline',
    },
    {
      name: 'frozen figures that do not say which engine computed them',
      input: { airframe, frozen: { ...frozen, figures: { ...frozen.figures, engine: undefined } } },
      path: 'frozen.figures.engine',
    },
    { name: 'a list', input: [], path: '' },
    { name: 'an object that is neither', input: { wing: 1 }, path: '' },
  ])('refuses $name at its path', ({ input, path }) => {
    expect(pathsOf(input)).toContain(path);
  });
});
