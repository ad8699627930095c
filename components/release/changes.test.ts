import { describe, expect, it } from 'vitest';
import tarrel from '@/examples/tarrel-620.json';
import { changesBetween, keyInWords } from './changes';

const panel = (over: object) => ({
  surfaces: [{ id: 'wing', panels: [{ id: 'p1', lengthMm: 310, sweepDeg: 0, ...over }] }],
});

describe('keyInWords', () => {
  it.each([
    ['rootChordMm', 'root chord', 'mm'],
    ['massPerMetreG', 'mass', 'g/m'],
    ['arealMassGm2', 'areal mass', 'g/m²'],
    ['staticMarginPct', 'static margin', '%'],
    ['cruiseMs', 'cruise', 'm/s'],
    ['massG', 'mass', 'g'],
    ['from', 'from', ''],
  ])('%s is %s in "%s"', (key, words, unit) => expect(keyInWords(key)).toEqual({ words, unit }));
});

describe('changesBetween', () => {
  it('names the element, the value before and after, and the unit', () => {
    expect(changesBetween(panel({}), panel({ lengthMm: 335.5 }))).toEqual([
      { what: 'wing / p1 / length', unit: 'mm', before: '310', after: '335.5' },
    ]);
  });
  it('sees no change in a document and its copy', () =>
    expect(changesBetween(tarrel, structuredClone(tarrel))).toEqual([]));
  it('follows elements by id when the list is in another order', () => {
    const list = {
      booms: [
        { id: 'a', lengthMm: 1 },
        { id: 'b', lengthMm: 2 },
      ],
    };
    expect(changesBetween(list, { booms: [...list.booms].reverse() })).toEqual([]);
  });
  it('shows what came and what went', () => {
    const [change, ...rest] = changesBetween({ items: [{ id: 'pack', massG: 90 }] }, { items: [] });
    expect(change).toEqual({ what: 'pack / mass', unit: 'g', before: '90', after: null });
    expect(rest).toEqual([]);
  });
  it('carries the unit down to the numbers of a pair', () => {
    expect(changesBetween({ thrustDeg: [2, 0] }, { thrustDeg: [2, 1.5] })).toEqual([
      { what: 'thrust / 2', unit: '°', before: '0', after: '1.5' },
    ]);
  });
});
