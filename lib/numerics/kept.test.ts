import { describe, expect, it } from 'vitest';
import { eachKept, nothingKept } from './kept';

/** Squares numbers by name and says which of them it worked out. */
function squares(memory = nothingKept<number>()) {
  return (common: unknown, items: Readonly<Record<string, number>>) => {
    const worked: string[] = [];
    const values = eachKept(memory, common, Object.entries(items), {
      nameOf: ([name]) => name,
      from: ([, value]) => ({ value }),
      work: ([name, value]) => {
        worked.push(name);
        return value ** 2;
      },
    });
    return { values, worked };
  };
}

describe('results kept from call to call', () => {
  it('only what changed is worked out', () => {
    const call = squares();
    expect(call(1, { a: 2, b: 3 })).toEqual({ values: [4, 9], worked: ['a', 'b'] });
    expect(call(1, { b: 3, a: 5 })).toEqual({ values: [9, 25], worked: ['a'] });
  });

  it('what all rest on changes all', () => {
    const call = squares();
    call({ board: 5 }, { a: 2 });
    expect(call({ board: 5 }, { a: 2 }).worked).toEqual([]);
    expect(call({ board: 6 }, { a: 2 }).worked).toEqual(['a']);
  });

  it('what one call left out is forgotten', () => {
    const call = squares();
    call(1, { a: 2, b: 3 });
    call(1, { a: 2 });
    expect(call(1, { a: 2, b: 3 }).worked).toEqual(['b']);
  });

  it('without a memory all is worked out', () => {
    const values = eachKept(undefined, 0, [1, 2], { nameOf: String, from: (x) => x, work: (x) => 2 * x });
    expect(values).toEqual([2, 4]);
  });
});
