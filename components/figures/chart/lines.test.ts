import { describe, expect, it } from 'vitest';
import type { Chart } from '@/lib/figures/charts';
import { chartIn, chartLines } from './lines';
import { MOST_POINTS, thinned } from './thin';

const chart: Chart = {
  id: 'trimSpeed',
  title: 'Elevator to trim',
  x: { label: 'speed', unit: 'm/s' },
  y: { label: 'load factor', unit: 'g' },
  series: [
    {
      name: 'at the CG',
      kind: 'main',
      points: [
        [7, 3],
        [9, 2],
      ],
    },
    {
      name: 'aft limit',
      kind: 'other',
      points: [
        [7, 1],
        [9, 0.5],
      ],
    },
    {
      name: 'at the CG',
      kind: 'main',
      points: [
        [11, 1.5],
        [12, Number.NaN],
      ],
    },
    { name: 'nothing', kind: 'other', points: [] },
    { name: 'fore limit', kind: 'other', points: [[7, 4]] },
  ],
  marks: [{ x: 13.4112, label: 'cruise' }],
  note: '',
};

describe('chartLines', () => {
  const lines = chartLines(chart);
  it('takes series of one name as one line with a gap, and leaves out what cannot be drawn', () => {
    expect(lines.map(({ name, runs }) => [name, runs.map((run) => run.length)])).toEqual([
      ['at the CG', [2, 1]],
      ['aft limit', [2]],
      ['fore limit', [1]],
    ]);
  });
  it('tells lines apart without colour: no two share dash and shape', () => {
    const looks = lines.map(({ look }) => `${look.dash} ${look.shape}`);
    expect(new Set(looks).size).toBe(looks.length);
    expect(new Set(lines.map(({ look }) => look.dash)).size).toBe(lines.length);
  });
});

describe('chartIn', () => {
  it('turns the axis, the points and the marks together, and leaves a load factor alone', () => {
    const turned = chartIn(chart, 'imperial');
    // 0.44704 m/s to the mile an hour.
    expect([turned.x.unit, turned.y.unit]).toEqual(['mph', 'g']);
    expect(turned.series[0]?.points[0]?.[0]).toBeCloseTo(15.6586, 3);
    expect(turned.series[0]?.points[0]?.[1]).toBe(3);
    expect(turned.marks[0]?.x).toBeCloseTo(30, 6);
  });
  it('gives the same chart back in the units that it is in', () => expect(chartIn(chart, 'metric')).toEqual(chart));
});

describe('thinned', () => {
  it('keeps a short run whole, and the ends and the order of a long one', () => {
    expect(thinned([4, 8, 15])).toEqual([4, 8, 15]);
    const run = Array.from({ length: 400 }, (_, index) => index + 3);
    const kept = thinned(run);
    expect(kept).toHaveLength(MOST_POINTS);
    expect([kept[0], kept.at(-1)]).toEqual([3, 402]);
    expect([...kept].sort((a, b) => a - b)).toEqual(kept);
  });
});
