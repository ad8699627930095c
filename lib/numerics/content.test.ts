import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { sameContent } from './content';

describe('the same content', () => {
  it('a copy has it', () => {
    fc.assert(fc.property(fc.jsonValue(), (value) => sameContent(value, structuredClone(value))));
  });

  it('of two values when they are written the same', () => {
    const sorted = (value: unknown): string =>
      JSON.stringify(value, (_, v: unknown) =>
        typeof v === 'object' && v !== null && !Array.isArray(v) ? Object.entries(v).sort() : v,
      );
    const small = fc.letrec((tie) => ({
      value: fc.oneof(
        fc.constantFrom(0, 1, 'a', null, true),
        fc.array(tie('value'), { maxLength: 2 }),
        fc.dictionary(fc.constantFrom('a', 'b'), tie('value'), { maxKeys: 2, noNullPrototype: true }),
      ),
    })).value;
    // A list of pairs and a record are written alike by `sorted`, so only one direction holds for them.
    fc.assert(fc.property(small, small, (a, b) => !sameContent(a, b) || sorted(a) === sorted(b)));
  });

  it.each([
    ['another number', { a: 1 }, { a: 1 + Number.EPSILON }],
    ['the other zero', [0], [-0]],
    ['a key more', { a: 1 }, { a: 1, b: null }],
    ['a key less', { a: 1, b: null }, { a: 1 }],
    ['another key', { a: 1 }, { b: 1 }],
    ['a longer list', [1], [1, undefined]],
    ['a list and a record', [], {}],
    ['nothing and a record', null, {}],
    ['two maps', new Map(), new Map()],
  ])('%s is a difference', (_, a, b) => {
    expect(sameContent(a, b)).toBe(false);
    expect(sameContent(b, a)).toBe(false);
  });

  it('a key without a value counts as no key, and no number as itself', () => {
    expect(sameContent({ a: 1, b: undefined }, { a: 1 })).toBe(true);
    expect(sameContent([Number.NaN], [Number.NaN])).toBe(true);
  });
});
