import { describe, expect, it } from 'vitest';
import { fill } from './fill';

describe('fill', () => {
  it('puts each value at its placeholder, as often as it stands there', () => {
    expect(fill('{a} of {b}, {a} again', { a: 'one', b: 7 })).toBe('one of 7, one again');
  });
  it('leaves braces alone that hold no name', () => {
    const text: string = '{} {1} {a}';
    expect(fill(text, { a: 'x' })).toBe('{} {1} x');
  });
  it('refuses a text whose value is missing, with the name', () => {
    const text: string = 'from {from}';
    expect(() => fill(text, {})).toThrow(/\{from\}/);
  });
  it('takes a value that looks like a placeholder as it is', () => {
    expect(fill('{a}', { a: '{b}' })).toBe('{b}');
  });
});
