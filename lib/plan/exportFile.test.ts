import { readFileSync } from 'node:fs';
import { join } from 'node:path';
import { describe, expect, it } from 'vitest';
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
