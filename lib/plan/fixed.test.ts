import { describe, expect, it } from 'vitest';
import { fixed } from './fixed';

describe('fixed', () => {
  it.each([
    [1.23456, '1.2346'],
    [-0.00001, '0'],
    [0.1 + 0.2, '0.3'],
    [1e-7, '0'],
    [123456.78, '123456.78'],
    [-2.5, '-2.5'],
  ])('prints %d as %s', (value, text) => {
    expect(fixed(value)).toBe(text);
  });

  it.each([Number.NaN, Infinity, 1e21])('refuses %d', (value) => {
    expect(() => fixed(value)).toThrow(RangeError);
  });
});
