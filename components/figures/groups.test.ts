import { describe, expect, it } from 'vitest';
import type { Chart, ChartId } from '@/lib/figures/charts';
import type { Verdict } from '@/lib/figures/types';
import { countVerdicts, needsLook, rowGroups } from './groups';
import type { FigureRow } from './rows';

const row = (id: string, group: FigureRow['group'], level?: Verdict): FigureRow => ({
  id,
  group,
  name: id,
  text: '1',
  unit: '',
  absent: '',
  verdict: level === undefined ? undefined : { level, words: level },
  inputs: [],
  explanation: '',
  method: '',
  source: '',
  limits: '',
});
const chart = (id: ChartId): Chart => ({
  id,
  title: id,
  x: { label: 'time', unit: 's' },
  y: { label: 'pitch rate', unit: '°/s' },
  series: [],
  marks: [],
  note: '',
});

describe('rowGroups', () => {
  it('keeps the order of the groups and of the rows in them, and leaves out empty groups', () => {
    const rows = [row('c', 'other'), row('b', 'trim'), row('a', 'shape'), row('d', 'trim')];
    expect(rowGroups(rows).map(({ id, rows: own }) => [id, own.map((each) => each.id)])).toEqual([
      ['shape', ['a']],
      ['trim', ['b', 'd']],
      ['other', ['c']],
    ]);
  });
  it('puts charts under what they are about, even where no figure stands', () => {
    const charts = [chart('powerRequired'), chart('trimSpeed'), chart('rollStep'), chart('pitchStep')];
    expect(
      rowGroups([row('b', 'trim')], charts).map(({ id, charts: own }) => [id, own.map((each) => each.id)]),
    ).toEqual([
      ['handling', ['rollStep', 'pitchStep']],
      ['trim', ['trimSpeed']],
      ['performance', ['powerRequired']],
    ]);
  });
  it('counts the verdicts of each group by themselves', () => {
    const rows = [
      row('a', 'trim', 'bad'),
      row('b', 'trim', 'watch'),
      row('c', 'trim', 'watch'),
      row('d', 'shape', 'good'),
    ];
    expect(rowGroups(rows).map(({ count }) => count)).toEqual([
      { good: 1, watch: 0, bad: 0 },
      { good: 0, watch: 2, bad: 1 },
    ]);
    expect(countVerdicts(rows)).toEqual({ good: 1, watch: 2, bad: 1 });
  });
});

describe('needsLook', () => {
  it.each([
    ['bad', true],
    ['watch', true],
    ['good', false],
    [undefined, false],
  ] as const)('%s', (level, looked) => expect(needsLook(row('a', 'trim', level))).toBe(looked));
});
