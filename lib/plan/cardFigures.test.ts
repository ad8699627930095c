import { describe, expect, it } from 'vitest';
import type { Figures, FigureValue } from '@/lib/figures/types';
import { texts } from '@/lib/text/en/figures/stability';
import { cgFigures, estimateFigures } from './cardFigures';

const figures = (values: Record<string, FigureValue>, over: Partial<Figures['marks']> = {}): Figures => ({
  engine: '1',
  depth: 'full',
  values,
  marks: {
    mac: null,
    aerodynamicCentreXMm: null,
    neutralPointXMm: null,
    neutralPointBandXMm: null,
    cgRangeXMm: null,
    firstFlightCgXMm: null,
    cg: null,
    ...over,
  },
  masses: [],
  problems: [],
});
const from = (value: number, name: string, at: number): FigureValue => ({
  value,
  inputs: [{ name, value: at, unit: 'mm' }],
});

describe('the first-flight CG', () => {
  const station = 'station';
  // On a swept wing the leading edge at the body side stands 20 mm behind the origin, and 35 mm behind it at the station.
  const swept = figures(
    {
      cgFromBodySideMm: from(130, 'body side', 40),
      firstFlightAtStationMm: from(115, station, 63),
      firstFlightFromNoseMm: from(270, texts.inputs.noseBody, -120),
    },
    { cgRangeXMm: [141, 172], firstFlightCgXMm: 150 },
  );

  it('names the place, how far out it is, and the range from the same edge', () => {
    expect(cgFigures(swept).map(({ value, notes }) => [value, ...notes])).toEqual([
      ['130', 'aft of the leading edge', '40 mm from the centre line', 'estimate · range 121 to 152 mm'],
      ['115', 'aft of the leading edge', '63 mm from the centre line', 'estimate · range 106 to 137 mm'],
      ['270', 'aft of the front end of the body', 'estimate · range 261 to 292 mm'],
    ]);
  });

  it('gives the one place that an earlier engine knew', () => {
    expect(
      cgFigures(figures({ cgFromBodySideMm: { value: 47 } })).map(({ value, notes }) => [value, ...notes]),
    ).toEqual([['47', 'aft of the leading edge', 'estimate']]);
  });

  it('says that a wing without a body is measured on the centre line', () => {
    const [card] = cgFigures(figures({ cgFromBodySideMm: from(106, 'body side', 0) }));
    expect(card).toMatchObject({ name: 'On the centre line', notes: ['aft of the leading edge', 'estimate'] });
  });

  it('says why there is none', () => {
    const lost: FigureValue = { value: null, problem: { code: 'lost', path: '', message: 'no wing above it' } };
    const cards = cgFigures(figures({ cgFromBodySideMm: lost, firstFlightAtStationMm: lost }));
    expect(cards.map(({ value, notes }) => [value, ...notes])).toEqual([
      [null, 'no wing above it'],
      [null, 'no wing above it'],
    ]);
    expect(cgFigures(null)).toMatchObject([{ value: null, notes: [] }]);
  });
});

describe('estimates', () => {
  const mass: FigureValue = {
    value: 412.4,
    band: { low: 391.6, high: 433.2, cause: 'mass' },
    inputs: [
      { name: 'foam', value: 160.3, unit: 'g' },
      { name: 'tubes', value: 21.8, unit: 'g' },
    ],
  };

  it('the mass says what was counted', () => {
    const [card] = estimateFigures(figures({ allUpMassG: mass }));
    expect(card).toMatchObject({
      value: '412',
      unit: 'g',
      notes: ['estimate · 392 to 433 g', 'counted: foam 160 g, tubes 22 g'],
    });
  });

  it.each([
    [71.2, 'with the CG as drawn, 9 mm behind the first-flight CG'],
    [55, 'with the CG as drawn, 7 mm ahead of the first-flight CG'],
    [62.6, 'with the CG as drawn, at the first-flight CG'],
  ])('the margin says which CG it is for: %d mm', (drawn, said) => {
    const values = { staticMarginPct: { value: 9.14 }, cgXMm: { value: drawn } };
    const [, card] = estimateFigures(figures(values, { firstFlightCgXMm: 62 }));
    expect(card).toMatchObject({ value: '9.1', unit: '% MAC', notes: ['estimate', said] });
  });
});
