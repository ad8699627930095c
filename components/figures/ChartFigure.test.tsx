import { renderToStaticMarkup } from 'react-dom/server';
import { describe, expect, it } from 'vitest';
import type { Chart } from '@/lib/figures/charts';
import { chart as texts } from '@/lib/text/en/figurePages';
import { ChartFigure } from './ChartFigure';

const chart: Chart = {
  id: 'powerRequired',
  title: 'Power against speed',
  x: { label: 'speed', unit: 'm/s' },
  y: { label: 'power', unit: 'W' },
  series: [
    {
      name: 'needed',
      kind: 'main',
      points: [
        [7, 21.25],
        [9, 18.5],
        [15, 63.75],
      ],
    },
    {
      name: 'at hand',
      kind: 'limit',
      points: [
        [7, 90],
        [15, 80],
      ],
    },
  ],
  marks: [{ x: 9, label: 'least power' }],
  note: 'Level flight in still air.',
};
const draw = (over: Partial<Chart> = {}, system: 'metric' | 'imperial' = 'metric') =>
  renderToStaticMarkup(<ChartFigure id="power" chart={{ ...chart, ...over }} system={system} />);
const inner = (markup: string, pattern: RegExp): string => pattern.exec(markup)?.[1] ?? '';

describe('ChartFigure', () => {
  it('is a picture with a name and a description that say what is drawn', () => {
    const markup = draw();
    const name = inner(markup, /role="img" aria-labelledby="([^"]+)"/);
    expect(inner(markup, new RegExp(`<title id="${name}">([^<]+)`))).toBe('Power against speed');
    const description = inner(markup, /<desc[^>]*>([^<]+)/);
    for (const word of ['speed', '7.0', '15.0', 'power', '18', '90', 'needed', 'at hand', 'least power'])
      expect(description).toContain(word);
  });
  it('draws a line for every series, each with a dash of its own', () => {
    const dashes = [...draw().matchAll(/<polyline [^>]*stroke-dasharray="([^"]*)"/g)].map(([, dash]) => dash);
    expect(dashes).toHaveLength(2);
    expect(new Set(dashes).size).toBe(2);
  });
  it('names the lines at the lines and the mark above the plot, once each', () => {
    const texts = [...draw().matchAll(/<text [^>]*>([^<]+)<\/text>/g)].map(([, text]) => text);
    for (const name of ['needed', 'at hand', 'least power'])
      expect(texts.filter((text) => text === name)).toHaveLength(1);
  });
  it('names lines in a key when there is no room at them', () => {
    const crowd = Array.from({ length: 24 }, (_, index) => ({
      name: `line ${index}`,
      kind: 'other' as const,
      points: [
        [7, index],
        [15, index],
      ] as const,
    }));
    const markup = draw({ series: crowd });
    expect(markup).toContain(`aria-label="${texts.key}"`);
    for (const { name } of crowd) expect(markup).toMatch(new RegExp(`>${name}<`));
  });
  it('gives the points in a table, rounded, and the note', () => {
    const markup = draw();
    expect(markup).toMatch(/<details[\s\S]*<table[\s\S]*18\.5[\s\S]*<\/table>/);
    expect(markup).toContain('Level flight in still air.');
  });
  it('switches the units of the axes with the points', () => {
    const markup = draw({}, 'imperial');
    expect(markup).toContain('mph');
    // 15 m/s at 0.44704 m/s to the mile an hour.
    expect(inner(markup, /<desc[^>]*>([^<]+)/)).toContain('33.6 mph');
  });
  it('says so when there is nothing to draw, and keeps the note', () => {
    const markup = draw({ series: [{ name: 'needed', kind: 'main', points: [[7, Number.NaN]] }] });
    expect(markup).not.toContain('<svg');
    expect(markup).toContain(texts.none);
    expect(markup).toContain('Level flight in still air.');
  });
});
