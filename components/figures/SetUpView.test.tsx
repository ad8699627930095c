import { renderToStaticMarkup } from 'react-dom/server';
import { describe, expect, it } from 'vitest';
import type { SetUpControl, SetUpSheet } from '@/lib/figures/setUp';
import { setUp as texts } from '@/lib/text/en/figurePages';
import { setUp as words } from '@/lib/text/en/setUp';
import { SetUpView } from './SetUpView';
import { sheetParts } from './setUpTable';

const elevon: SetUpControl = {
  id: 'wing/elevon',
  surface: 'Wing',
  control: 'elevon',
  mirrored: true,
  neutral: { way: 'up', deg: 2.5, mm: 2.2 },
  widestMm: 51,
  lowShare: 0.7,
  differential: 0,
  throws: [
    { stick: 'pitch', high: { way: 'up', deg: 10, mm: 8.9 }, low: { way: 'up', deg: 7, mm: 6.2 } },
    { stick: 'pitch', high: { way: 'down', deg: 9, mm: 8 }, low: { way: 'down', deg: 6.3, mm: 5.6 } },
    { stick: 'flap', high: { way: 'down', deg: 15, mm: 13.3 }, low: null },
  ],
  moves: [
    {
      sticks: ['pitch'],
      sides: [
        { side: 'stbd', way: 'up', deg: 10, mm: 8.9 },
        { side: 'port', way: 'up', deg: 10, mm: 8.9 },
      ],
      overShared: false,
    },
  ],
  linkage: null,
};
const sheet: SetUpSheet = {
  lowRate: 0.7,
  expo: 0.25,
  sharedThrowDeg: 28,
  controls: [elevon],
  incidences: [{ id: 'wing', name: 'Wing', deg: 1.5 }],
  thrusts: [],
  problems: [],
};
const partOf = (title: RegExp) => {
  const part = sheetParts(sheet).find((each) => title.test(each.title));
  if (part === undefined) throw new RangeError(`no part ${title}`);
  return part;
};

describe('sheetParts', () => {
  it('puts what the sticks do into a table, low and high, and the way in a word', () => {
    expect(partOf(/Elevon/).throws.map(({ name, low, high }) => [name, low, high])).toEqual([
      ['Elevator stick, up', { mm: '6.2', deg: '7' }, { mm: '8.9', deg: '10' }],
      ['Elevator stick, down', { mm: '5.6', deg: '6.3' }, { mm: '8', deg: '9' }],
      ['Flap switch, down', null, { mm: '13.3', deg: '15' }],
    ]);
  });
  it('does not say the same again in sentences, and keeps the rest', () => {
    const ids = partOf(/Elevon/).lines.map(({ id }) => id);
    expect(ids.filter((id) => /pitch|flap/.test(id))).toEqual([]);
    expect(ids).toEqual(expect.arrayContaining(['wing/elevon/neutral', 'wing/elevon/widest']));
  });
  it('keeps the directions of every control as lines, for both sides', () => {
    const [line] = sheetParts(sheet).flatMap(({ lines }) => lines.filter(({ id }) => id === 'wing/elevon/way/pitch'));
    expect(line?.text).toMatch(/starboard.*port/);
  });
});

describe('SetUpView', () => {
  const markup = renderToStaticMarkup(<SetUpView sheet={sheet} />);
  it('says the caution before anything else, and that the figures are estimates', () => {
    expect(markup).toContain(words.caution);
    expect(markup.indexOf(words.caution)).toBeLessThan(markup.indexOf('<h2'));
    expect(markup).toContain(texts.estimates);
  });
  it('gives every line and every throw a box with a name', () => {
    const parts = sheetParts(sheet);
    const wanted = parts.reduce((sum, { throws, lines }) => sum + throws.length + lines.length, 0);
    expect(markup.match(/type="checkbox"/g)).toHaveLength(wanted);
    expect(markup.match(/<label/g)).toHaveLength(wanted);
  });
  it('writes millimetres before degrees', () => expect(markup).toMatch(/6\.2<[\s\S]{0,80}mm<[\s\S]{0,120}7°/));
});
