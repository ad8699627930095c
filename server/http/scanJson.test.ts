import { describe, expect, it } from 'vitest';
import { AppError } from '../problems';
import { MAX_DEPTH, scanJson } from './scanJson';

const errorOf = (text: string): AppError | null => {
  try {
    scanJson(text);
    return null;
  } catch (error) {
    if (error instanceof AppError) return error;
    throw error;
  }
};

describe('scanJson', () => {
  it.each([
    ['a plain object', '{"a":1,"b":{"a":2},"c":[{"a":3},{"a":4}]}'],
    ['brackets and colons inside texts', '{"a":"{\\"a\\":[","b":"a\\\\","c":":"}'],
    ['equal texts that are no keys', '["a","a",{"k":"a","l":"a"}]'],
    ['nothing but a number', '12'],
  ])('lets %s through', (_, text) => {
    expect(errorOf(text)).toBeNull();
  });

  it.each([
    ['{"a":1,"a":2}', 'a'],
    ['{"x":{"b":1,"c":[],"b":null}}', 'b'],
    ['[{"\\u0061":1,"a":2}]', 'a'],
    ['{"":1,"":2}', ''],
    ['{"a" : 1 ,\n "a" : 2}', 'a'],
  ])('finds the key that stands twice in %s', (text, key) => {
    expect(errorOf(text)?.extras.errors).toMatchObject([{ path: key, code: 'duplicate-key' }]);
  });

  it('counts levels', () => {
    const nested = (depth: number): string => '['.repeat(depth) + ']'.repeat(depth);
    expect(errorOf(nested(MAX_DEPTH))).toBeNull();
    expect(errorOf(nested(MAX_DEPTH + 1))?.extras.errors).toMatchObject([{ code: 'too-deep' }]);
  });

  it('reads two megabytes of the worst kind without falling over', () => {
    const started = performance.now();
    for (const text of [
      JSON.stringify('\\'.repeat(1_000_000)),
      JSON.stringify('x'.repeat(2_000_000)),
      JSON.stringify(Object.fromEntries(Array.from({ length: 150_000 }, (_, i) => [`k${i}`, i]))),
      JSON.stringify(Array(600_000).fill('')),
    ])
      expect(errorOf(text)).toBeNull();
    // It takes tenths of a second; what grows faster than the text takes minutes.
    expect(performance.now() - started).toBeLessThan(10_000);
  });
});
