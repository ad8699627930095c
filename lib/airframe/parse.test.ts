import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import v1 from '@/tests/fixtures/airframe/v1.json';
import { startFrom, startingLayouts } from './layouts';
import { parseAirframe, parseAirframeText } from './parse';
import { at, broken, control, first, type Path, panel, pusher, put, wing } from './testing/broken';

describe('what opens', () => {
  it.each(startingLayouts)('$id parses and comes back unchanged', ({ id }) => {
    const airframe = startFrom(id, 'Test');
    expect(parseAirframe(airframe)).toEqual({ ok: true, value: airframe });
    expect(parseAirframeText(JSON.stringify(airframe))).toEqual({ ok: true, value: airframe });
  });
  it('takes every key of version 1', () => {
    expect(parseAirframe(v1)).toEqual({ ok: true, value: v1 });
  });
  it('takes a byte order mark before the text', () => {
    expect(parseAirframeText(`\uFEFF${JSON.stringify(pusher)}`).ok).toBe(true);
  });
  it('turns minus zero into zero', () => {
    const result = parseAirframe(put(pusher, at(panel('sweepDeg')), -0));
    expect(result.ok && Object.is(result.value.surfaces[0]?.panels[0]?.sweepDeg, 0)).toBe(true);
  });
  it('does not change what it was given', () => {
    const input = put(pusher, at(panel('sweepDeg')), -0);
    const before = structuredClone(input);
    parseAirframe(input);
    expect(input).toEqual(before);
  });
  it('takes a pointed tip with nothing hinged there', () => {
    const pointed = put(put(pusher, at(panel('tipChordMm')), 0), at(control('to')), 0.8);
    expect(parseAirframe(pointed).ok).toBe(true);
  });
});

describe('one wrong value: the problem stands at its field', () => {
  it.each([
    {
      name: 'negative chord',
      path: panel('rootChordMm'),
      value: -180,
      code: 'too-small',
      says: ['rootChordMm', 'at least 1 mm', '-180 mm'],
    },
    {
      name: 'chord as text',
      path: panel('rootChordMm'),
      value: '180',
      code: 'wrong-type',
      says: ['rootChordMm', 'a number', '"180"'],
    },
    { name: 'not a number', path: panel('lengthMm'), value: Number.NaN, code: 'not-finite', says: ['lengthMm', 'NaN'] },
    {
      name: 'infinite',
      path: panel('lengthMm'),
      value: Number.POSITIVE_INFINITY,
      code: 'not-finite',
      says: ['Infinity'],
    },
    {
      name: 'absurdly large',
      path: 'items.0.massG',
      value: 1e308,
      code: 'too-big',
      says: ['massG', '50000 g', '1e+308'],
    },
    { name: 'sweep too large', path: panel('sweepDeg'), value: 80, code: 'too-big', says: ['sweepDeg', '75°', '80°'] },
    {
      name: 'missing number',
      path: panel('sweepDeg'),
      value: undefined,
      code: 'missing-field',
      says: ['sweepDeg', 'missing', 'number'],
    },
    { name: 'missing list', path: 'booms', value: undefined, code: 'missing-field', says: ['booms', 'a list'] },
    { name: 'missing choice', path: wing('role'), value: undefined, code: 'missing-field', says: ['role', '"wing"'] },
    {
      name: 'missing kind',
      path: panel('section'),
      value: {},
      code: 'missing-field',
      at: panel('section.kind'),
      says: ['kind', '"folded"'],
    },
    {
      name: 'unknown choice',
      path: wing('role'),
      value: 'canard',
      code: 'not-one-of',
      says: ['"foreplane"', '"canard"'],
    },
    {
      name: 'unknown kind of section',
      path: panel('section'),
      value: { kind: 'hollow' },
      code: 'not-one-of',
      at: panel('section.kind'),
      says: ['"slab"', '"hollow"'],
    },
    { name: 'yes for true', path: wing('mirrored'), value: 'yes', code: 'wrong-type', says: ['true or false'] },
    {
      name: 'half a blade',
      path: 'drives.0.propeller.blades',
      value: 2.5,
      code: 'not-whole',
      says: ['whole number', '2.5'],
    },
    {
      name: 'no panel',
      path: wing('panels'),
      value: [],
      code: 'too-small',
      says: ['panels', 'at least 1 entries', 'got 0'],
    },
    {
      name: 'too many panels',
      path: wing('panels'),
      value: Array.from({ length: 13 }, (_, i) => ({ ...v1.surfaces[0]?.panels[0], id: `p${i}` })),
      code: 'too-big',
      says: ['at most 12', 'got 13'],
    },
    { name: 'two coordinates', path: wing('mount.at'), value: [1, 2], code: 'too-small', says: ['at least 3'] },
    { name: 'a place that is a word', path: wing('mount.at'), value: 'nose', code: 'wrong-type', says: ['"nose"'] },
    {
      name: 'a station past the tip',
      path: 'surfaces.1.mount.at',
      value: { station: 1.2, chordShare: 0 },
      code: 'too-big',
      at: 'surfaces.1.mount.at.station',
      says: ['at most 1'],
    },
    {
      name: 'an id with a space',
      path: 'items.0.id',
      value: 'my pack',
      code: 'bad-id',
      says: ['lower-case', '"my pack"'],
    },
    { name: 'an empty name', path: 'name', value: '  ', code: 'empty-text', says: ['name', 'empty'] },
    { name: 'half a surrogate pair', path: 'name', value: 'kite \uD83E', code: 'invalid', says: ['well-formed'] },
    {
      name: 'a line break in a name',
      path: 'items.0.spec',
      value: 'a\nb',
      code: 'bad-text',
      says: ['control characters'],
    },
    { name: 'a long name', path: 'name', value: 'x'.repeat(81), code: 'too-big', says: ['80 characters', '81'] },
    { name: 'null', path: 'flight', value: null, code: 'wrong-type', says: ['flight', 'null'] },
  ])('$name', ({ path, value, code, says, at: where }) => {
    const problems = broken(path, value);
    expect(problems[0]).toMatchObject({ code, path: where ?? path });
    for (const words of says) expect(problems[0]?.message).toContain(words);
  });
  it('finds several at once', () => {
    const two = put(put(pusher, at(panel('rootChordMm')), -1), at('flight.cruiseMs'), 'fast');
    const result = parseAirframe(two);
    expect(!result.ok && result.problems.map(({ path }) => path)).toEqual([panel('rootChordMm'), 'flight.cruiseMs']);
  });
});

describe('keys', () => {
  it.each([
    { path: panel('rootChrodMm'), fix: 'did you mean "rootChordMm"?' },
    { path: panel('rootChord'), fix: 'did you mean "rootChordMm"?' },
    { path: 'surface', fix: 'did you mean "surfaces"?' },
    { path: 'drives.0.propeller.diameter', fix: 'did you mean "diameterMm"?' },
    { path: 'drives.0.fan', fix: 'remove it; keys known here: ' },
    { path: 'colour', fix: 'remove it; keys known here: format, version, name' },
  ])('refuses $path by name', ({ path, fix }) => {
    const problem = first(path, 1);
    expect(problem).toMatchObject({ code: 'unknown-key', path });
    expect(problem?.message).toContain(`"${path.split('.').at(-1)}"`);
    expect(problem?.fix).toContain(fix);
  });
  it('guesses at slips only, so that a flood of keys costs no more than reading them', () => {
    const flood = Object.fromEntries(Array.from({ length: 60 }, (_, index) => [`surfaces${index}`, 0]));
    const long = `${'surfaces'.repeat(8)}s`;
    const result = parseAirframe({ ...startFrom('pusher', 'Test'), [long]: 0, ...flood });
    const fixes = new Map(result.ok ? [] : result.problems.map(({ path, fix }) => [path, fix ?? '']));
    expect(fixes.get('surfaces0')).toBe('did you mean "surfaces"?');
    expect(fixes.get(long)).toContain('remove it');
    // Fifty rows and one that counts the rest.
    expect(fixes.size).toBe(51);
  });
  it.each(['__proto__', 'constructor', 'prototype'])('refuses the key %s', (key) => {
    const text = JSON.stringify(pusher).replace('"booms":', `"${key}":{"polluted":true},"booms":`);
    expect(parseAirframeText(text)).toMatchObject({ ok: false, problems: [{ code: 'forbidden-key', path: key }] });
    expect('polluted' in {}).toBe(false);
  });
});

describe('what kind of document', () => {
  it.each([
    { name: 'no format', path: 'format', value: undefined, code: 'missing-field' },
    { name: 'another format', path: 'format', value: 'someone.else', code: 'unknown-format' },
    { name: 'no version', path: 'version', value: undefined, code: 'missing-field' },
    { name: 'a later version', path: 'version', value: 2, code: 'unknown-version' },
    { name: 'a version in words', path: 'version', value: '1', code: 'unknown-version' },
    { name: 'version zero', path: 'version', value: 0, code: 'unknown-version' },
  ])('$name is said plainly and alone', ({ path, value, code }) => {
    const problems = broken(path, value);
    expect(problems).toHaveLength(1);
    expect(problems[0]).toMatchObject({ code, path });
  });
  it.each([null, 3, 'text', true, [], undefined])('%j is not a document', (input) => {
    expect(parseAirframe(input)).toMatchObject({ ok: false, problems: [{ path: '' }] });
  });
  it('refuses what is not plain data', () => {
    expect(first('name', new Date(0))).toMatchObject({ code: 'not-plain-data', path: 'name' });
    expect(first('name', () => 'x')).toMatchObject({ code: 'not-plain-data', path: 'name' });
    expect(first('flight.cruiseMs', 12n)).toMatchObject({ code: 'not-plain-data', path: 'flight.cruiseMs' });
  });
});

describe('text', () => {
  it.each([
    { name: 'empty', text: '', code: 'empty-document', says: 'empty' },
    { name: 'blank', text: ' \n', code: 'empty-document', says: 'empty' },
    { name: 'cut off', text: '{"format": "foldspar.airframe",', code: 'bad-json', says: 'JSON' },
    { name: 'not JSON', text: 'wing: 300', code: 'bad-json', says: 'JSON' },
  ])('$name', ({ text, code, says }) => {
    const result = parseAirframeText(text);
    expect(result).toMatchObject({ ok: false, problems: [{ code, path: '' }] });
    expect(!result.ok && result.problems[0]?.message).toContain(says);
  });
  it('names the line of a slip', () => {
    const result = parseAirframeText('{\n  "format": "foldspar.airframe",\n  "version" 1\n}');
    expect(!result.ok && result.problems[0]?.message).toContain('line 3');
  });
  it('refuses 5 MB before reading it', () => {
    const result = parseAirframeText(`{"name":"${'x'.repeat(5 * 1024 * 1024)}"}`);
    expect(result).toMatchObject({ ok: false, problems: [{ code: 'document-too-large' }] });
    expect(!result.ok && result.problems[0]?.message).toContain('2 MB');
  });
  it('counts bytes, not letters', () => {
    const result = parseAirframeText(`{"name":"${'é'.repeat(1.1 * 1024 * 1024)}"}`);
    expect(result).toMatchObject({ ok: false, problems: [{ code: 'document-too-large' }] });
  });
  it('refuses deep nesting, in text and in data', () => {
    expect(parseAirframeText('['.repeat(100_000))).toMatchObject({ ok: false, problems: [{ code: 'too-deep' }] });
    const ring: { self?: unknown } = {};
    ring.self = ring;
    expect(parseAirframe(ring)).toMatchObject({ ok: false, problems: [{ code: 'too-deep' }] });
  });
  it('does not take brackets inside a text for nesting', () => {
    const result = parseAirframeText(JSON.stringify(put(pusher, at('items.0.spec'), `a "quoted" ${'['.repeat(70)}`)));
    expect(result.ok).toBe(true);
  });
});

describe('any mutilation', () => {
  const paths: Path[] = [];
  const walk = (value: unknown, path: Path): void => {
    if (path.length > 0) paths.push(path);
    if (Array.isArray(value)) for (const [index, item] of value.entries()) walk(item, [...path, index]);
    else if (typeof value === 'object' && value !== null)
      for (const [key, item] of Object.entries(value)) walk(item, [...path, key]);
  };
  walk(v1, []);
  it('gives problems with words and a path, never a fault', () => {
    const junk = fc.oneof(fc.anything(), fc.constantFrom(undefined, null, -1, 0, 1e308, Number.NaN, '', 'x', [], {}));
    fc.assert(
      fc.property(fc.constantFrom(...paths), junk, (path, value) => {
        const result = parseAirframe(put(v1, path, value));
        if (result.ok) return;
        expect(result.problems.length).toBeGreaterThan(0);
        for (const problem of result.problems) {
          expect(problem.message.length).toBeGreaterThan(5);
          expect(problem.message).not.toMatch(/\{[a-z]+\}|undefined is|Invalid input/);
        }
      }),
      { numRuns: 400 },
    );
  });
  it('a wall of problems is cut short and says so', () => {
    const many = put(
      v1,
      ['items'],
      Array.from({ length: 90 }, () => 3),
    );
    const result = parseAirframe(many);
    expect(!result.ok && result.problems).toHaveLength(51);
    expect(!result.ok && result.problems.at(-1)?.message).toContain('more problems');
  });
});
