import { renderToStaticMarkup } from 'react-dom/server';
import { describe, expect, it } from 'vitest';
import type { Chart } from '@/lib/figures/charts';
import type { Figures, FigureValue } from '@/lib/figures/types';
import { groups, list as texts } from '@/lib/text/en/figurePages';
import { FigureList } from './FigureList';
import { figureRows } from './rows';

const EMPTY: Figures = {
  engine: '1',
  depth: 'full',
  values: {},
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
};
const values: Record<string, FigureValue> = {
  spanMm: { value: 620 },
  cgXMm: { value: 52, verdict: { level: 'watch', words: 'near the aft limit' } },
  allUpMassG: { value: 280, verdict: { level: 'good', words: 'light' } },
  stallSpeedMs: { value: 7.1, verdict: { level: 'good', words: 'slow enough' } },
};
const rows = figureRows({ ...EMPTY, values });
const chart: Chart = {
  id: 'pitchStep',
  title: 'Pitch after a step',
  x: { label: 'time', unit: 's' },
  y: { label: 'pitch rate', unit: '°/s' },
  series: [
    {
      name: 'pitch rate',
      kind: 'main',
      points: [
        [0, 0],
        [1, 40],
      ],
    },
  ],
  marks: [],
  note: 'Stick fixed.',
};
const list = (over: Partial<Parameters<typeof FigureList>[0]> = {}) =>
  renderToStaticMarkup(<FigureList rows={rows} {...over} />);

/** Class of the element with this id, or of the one that holds its heading. */
const classOf = (markup: string, id: string): string =>
  new RegExp(`id="${id}"[^>]*class="([^"]*)"`).exec(markup)?.[1] ?? '';
const sectionClass = (markup: string, group: string): string =>
  new RegExp(`<section aria-labelledby="figures-${group}-title" class="([^"]*)"`).exec(markup)?.[1] ?? '';

describe('FigureList', () => {
  it('keeps every row under the id that comments lead to', () => {
    const markup = list();
    for (const id of ['spanMm', 'cgXMm', 'allUpMassG', 'stallSpeedMs']) expect(markup).toContain(`id="figure-${id}"`);
  });
  it('has a way to every heading, in the order of the headings', () => {
    const markup = list();
    const ways = [...markup.matchAll(/href="#([^"]+)"/g)].map(([, id]) => id);
    const headings = [...markup.matchAll(/<h3 id="([^"]+)"/g)].map(([, id]) => id);
    expect(ways).toEqual(headings);
    expect(markup).toContain(groups.balance);
  });
  it('takes its headings one below what it stands under', () => {
    expect(list({ level: 'h2' })).toMatch(/<h2 id="figures-shape-title"/);
    expect(list({ level: 'h2' })).not.toContain('<h3');
  });
  it('hides under the filter what is good or not judged, and a heading with nothing else', () => {
    const markup = list();
    const hidden = /:checked\]\/figures:hidden/;
    expect(classOf(markup, 'figure-cgXMm')).not.toMatch(hidden);
    expect(sectionClass(markup, 'balance')).not.toMatch(hidden);
    for (const id of ['figure-spanMm', 'figure-allUpMassG', 'figure-stallSpeedMs'])
      expect(classOf(markup, id)).toMatch(hidden);
    expect(sectionClass(markup, 'performance')).toMatch(hidden);
    expect(markup).toContain(texts.only);
  });
  it('says that nothing needs a look instead of offering a filter that empties the page', () => {
    const markup = list({ rows: rows.filter(({ id }) => id !== 'cgXMm') });
    expect(markup).not.toContain(texts.only);
    expect(markup).toContain(texts.nothing);
  });
  it('puts a chart under its own heading', () => {
    const markup = list({ charts: [chart] });
    expect(markup.indexOf('Stick fixed.')).toBeGreaterThan(markup.indexOf('figures-handling-title">'));
    expect(markup.indexOf('Stick fixed.')).toBeLessThan(markup.indexOf('<h3 id="figures-performance-title"'));
  });
  it('puts what the reader adds behind the name and at the foot', () => {
    const markup = list({ tag: ({ id }) => `tag of ${id}`, foot: ({ id }) => `foot of ${id}` });
    expect(markup).toContain('tag of cgXMm');
    expect(markup).toContain('foot of cgXMm');
  });
});
