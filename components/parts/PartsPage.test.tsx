import { readFileSync } from 'node:fs';
import { join } from 'node:path';
import { renderToStaticMarkup } from 'react-dom/server';
import { describe, expect, it } from 'vitest';
import { planOutlines } from '@/lib/airframe/outlines';
import { parseAirframe } from '@/lib/airframe/parse';
import { resolve } from '@/lib/airframe/resolve';
import type { Airframe } from '@/lib/airframe/schema/airframe';
import { checkBeforeCut } from '@/lib/checks/checkBeforeCut';
import { develop } from '@/lib/parts/develop';
import { checks as checkWords, parts as words } from '@/lib/text/en/partsPage';
import { stockRows } from '../review/partRows';
import { cautionsFor } from './cautions';
import { checkRows } from './checkRows';
import { partPictures } from './drawings';
import { BeforeYouCut, CutParts } from './PartsPage';
import { planSprite } from './where';

const example = (name: string): Airframe => {
  const path = join(import.meta.dirname, `../../examples/${name}.json`);
  const parsed = parseAirframe(JSON.parse(readFileSync(path, 'utf8')));
  if (!parsed.ok) throw new RangeError(parsed.problems[0]?.message);
  return parsed.value;
};

function shownOf(airframe: Airframe) {
  const development = develop(airframe);
  const resolved = resolve(airframe);
  if (!resolved.ok) throw new RangeError('an example does not resolve');
  const sprite = planSprite(planOutlines(airframe));
  const pictures = partPictures(development.parts, airframe, [], sprite);
  const results = checkBeforeCut({ airframe, resolved: resolved.value, development });
  const checks = checkRows(
    results,
    airframe,
    pictures.groups.map(({ id }) => id),
  );
  const markup = renderToStaticMarkup(
    <>
      <BeforeYouCut checks={checks} engine="1" sprite={sprite} />
      <CutParts
        pictures={pictures}
        stock={stockRows(development.stockPieces)}
        cautions={cautionsFor(development, airframe)}
        sprite={sprite}
      />
    </>,
  );
  return { development, pictures, checks, markup };
}

const idsIn = (markup: string): string[] => [...markup.matchAll(/ id="([^"]+)"/g)].map(([, id = '']) => id);
const waysIn = (markup: string): string[] => [...markup.matchAll(/ href="#([^"]+)"/g)].map(([, id = '']) => id);
const attribute = (markup: string, name: string): string[] =>
  [...markup.matchAll(new RegExp(` ${name}="([^"]*)"`, 'g'))].map(([, value = '']) => value);

describe.each(['hask', 'ombry-1000', 'quenlet-1050', 'quenlet-700', 'tarrel-620'])('%s', (name) => {
  const { development, pictures, markup } = shownOf(example(name));
  const drawings = pictures.groups.flatMap((group) => group.drawings);

  it('draws every part once or mirrors it, with both faces', () => {
    const mirrored = development.parts.filter(({ mirrorOf }) => mirrorOf !== undefined).length;
    expect(drawings).toHaveLength(development.parts.length - mirrored);
    expect(new Set(drawings.map(({ key }) => key)).size).toBe(drawings.length);
    for (const { faces } of drawings)
      for (const { label } of faces) expect(markup.split(`aria-label="${label}"`)).toHaveLength(2);
  });
  it('says where every part goes', () => {
    for (const { where } of drawings) expect(where.pieces.length).toBeGreaterThan(0);
  });
  it('leads nowhere that is not on the page, and gives no id twice', () => {
    const ids = idsIn(markup);
    expect(new Set(ids).size).toBe(ids.length);
    expect(waysIn(markup).filter((way) => !ids.includes(way))).toEqual([]);
  });
  it('stays small: the page holds it twice, as markup and as data', () => {
    expect(markup.length).toBeLessThan(160_000);
  });
});

describe('the filter by material', () => {
  const { markup, pictures } = shownOf(example('ombry-1000'));

  it('has a box for each material that is cut, and everything chosen at first', () => {
    expect(pictures.materials).toEqual(['paper-faced board, 5 mm', 'ply, 2 mm']);
    expect(markup.match(/type="radio"/g)).toHaveLength(3);
    expect(markup).toMatch(/id="material-all" type="radio"[^>]*checked/);
  });
  it('hides parts of other materials, and groups and ways with none of it', () => {
    expect(markup).toContain(
      '[data-parts]:has(#material-m1:checked) :is([data-material]:not([data-material=m1]),' +
        '[data-materials]:not([data-materials~=m1])){display:none}',
    );
    const used = ['m0 m1', 'm0', 'm0', 'm0'];
    expect(pictures.groups.map(({ name }) => name)).toEqual(['Body', 'Wing', 'Tailplane', 'Fin']);
    // Once for the ways, once for the groups themselves.
    expect(attribute(markup, 'data-materials')).toEqual([...used, ...used]);
    expect(attribute(markup, 'data-material').filter((mark) => mark === 'm1')).toHaveLength(1);
  });
  it('is not there where all is of one material', () => {
    expect(shownOf(example('quenlet-700')).markup).not.toContain(words.filter);
  });
});

describe('before you cut', () => {
  it('folds away what is kept and counts it', () => {
    const { markup, checks } = shownOf(example('tarrel-620'));
    expect(checks.passed.length).toBeGreaterThan(1);
    const [shown = '', folded = ''] = markup.split('<details');
    expect(folded).toContain(`${checks.passed.length} checks passed`);
    for (const { words: said } of checks.passed) expect(shown).not.toContain(said);
  });
  it('says so where the engine of then did not check', () => {
    const markup = renderToStaticMarkup(<BeforeYouCut checks={null} engine="2031.4" sprite={null} />);
    expect(markup).toContain('2031.4');
    expect(markup).not.toContain(checkWords.clear);
  });
});

describe('cautions', () => {
  const { build, ...rest } = example('quenlet-700');
  const acts = (cutter: Airframe['build']['cutter']) => {
    const airframe = { ...rest, build: { ...build, cutter } };
    return cautionsFor(develop(airframe), airframe).sheets.map(({ act }) => act);
  };
  it('are those of the cutter, of the blade that folds, and of glue', () => {
    expect(acts('hand')).toEqual(['Knife', 'Glue']);
    expect(acts('hotWire')).toEqual(['Hot wire', 'Knife', 'Glue']);
  });
  it('name carbon where a tube is of it, or may be', () => {
    const airframe = example('quenlet-700');
    const development = develop(airframe);
    const of = (eGpa: number | undefined) =>
      cautionsFor(development, { ...airframe, tubes: airframe.tubes.map((tube) => ({ ...tube, eGpa })) }).tubes;
    expect([of(110), of(undefined), of(20)].map((tubes) => tubes.length)).toEqual([1, 1, 0]);
  });
});
