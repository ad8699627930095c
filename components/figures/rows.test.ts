import { describe, expect, it } from 'vitest';
import type { Figures } from '@/lib/figures/types';
import { figureRows } from './rows';

const figures: Figures = {
  engine: '1',
  depth: 'live',
  marks: {
    mac: null,
    aerodynamicCentreXMm: null,
    neutralPointXMm: null,
    neutralPointBandXMm: null,
    cgRangeXMm: null,
    firstFlightCgXMm: null,
    cg: null,
  },
  masses: [],
  problems: [],
  values: {
    retiredFigure: { value: 12.3456 },
    stallSpeedMs: {
      value: 7.0449,
      band: { low: 6.61, high: 7.5, cause: 'plates stall early' },
      verdict: { level: 'good', words: 'slow enough' },
      inputs: [{ name: 'mass', value: 390.12345, unit: 'g' }],
    },
    wingAreaDm2: { value: 18.5806 },
    tailVolumeH: {
      value: null,
      problem: { code: 'does-not-apply', path: 'surfaces', message: 'there is no tailplane' },
    },
    spanMm: {
      value: null,
      problem: { code: 'not-built-yet', path: 'surfaces.0', message: 'not built yet: surfaces.0' },
    },
  },
};

describe('figureRows', () => {
  it('reads in the order of the table, with what the table no longer knows at the end', () => {
    expect(figureRows(figures).map(({ id }) => id)).toEqual([
      'spanMm',
      'wingAreaDm2',
      'tailVolumeH',
      'stallSpeedMs',
      'retiredFigure',
    ]);
  });
  it('takes only what is asked for, in that order, and skips what there is not', () => {
    expect(figureRows(figures, ['stallSpeedMs', 'macMm', 'spanMm']).map(({ id }) => id)).toEqual([
      'stallSpeedMs',
      'spanMm',
    ]);
  });
  it('shows no more digits than the table allows, and the band with its cause', () => {
    expect(figureRows(figures, ['stallSpeedMs'])[0]).toMatchObject({
      name: 'Stall speed',
      text: '7.0',
      unit: 'm/s',
      band: '6.6 to 7.5',
      bandCause: 'plates stall early',
      verdict: { level: 'good', words: 'slow enough' },
      inputs: [{ name: 'mass', text: '390.123', unit: 'g' }],
    });
  });
  it('says why there is no value instead of inventing one', () => {
    expect(figureRows(figures, ['spanMm'])[0]).toMatchObject({ text: null, problem: 'not built yet: surfaces.0' });
  });
  it('keeps a frozen figure readable under its id when its name is gone', () => {
    expect(figureRows(figures, ['retiredFigure'])[0]).toMatchObject({
      name: 'retiredFigure',
      text: '12.35',
      explanation: '',
    });
  });
  it('names the group of each, and another one for what the table no longer knows', () => {
    const rows = figureRows(figures, ['stallSpeedMs', 'spanMm', 'retiredFigure']);
    expect(rows.map(({ group }) => group)).toEqual(['performance', 'shape', 'other']);
  });
  it('tells what does not apply from what could not be worked out', () => {
    const [tail, span] = figureRows(figures, ['tailVolumeH', 'spanMm']);
    expect(tail).toMatchObject({ text: null, problem: 'there is no tailplane' });
    expect(tail?.absent).not.toBe(span?.absent);
  });
  it('shows value, band and inputs in the units asked for', () => {
    // 0.44704 m/s to the mile an hour, 9.2903 dm² to the square foot.
    expect(figureRows(figures, ['stallSpeedMs'], 'imperial')[0]).toMatchObject({
      text: '15.8',
      unit: 'mph',
      band: '14.8 to 16.8',
    });
    expect(figureRows(figures, ['wingAreaDm2'], 'imperial')[0]).toMatchObject({ text: '2.0000', unit: 'ft²' });
  });
});
