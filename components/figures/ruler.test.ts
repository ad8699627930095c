import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { ruler, ticks } from './ruler';

describe('ruler', () => {
  it('numbers round millimetres inside the stretch', () => {
    expect(ruler(-187, 402).major).toEqual([-100, 0, 100, 200, 300, 400]);
    expect(ruler(-187, 402).minor.slice(0, 3)).toEqual([-180, -160, -140]);
  });
  it('never numbers more than it may, and each numbered tick is a tick', () => {
    fc.assert(
      fc.property(fc.integer({ min: -3000, max: 3000 }), fc.integer({ min: 20, max: 9000 }), (from, length) => {
        const { major, minor } = ruler(from, from + length);
        expect(major.length).toBeLessThanOrEqual(9);
        expect(major.length).toBeGreaterThan(0);
        for (const mark of major) {
          expect(mark).toBeGreaterThanOrEqual(from);
          expect(mark).toBeLessThanOrEqual(from + length);
          expect(minor.some((tick) => Math.abs(tick - mark) < 1e-6)).toBe(true);
        }
      }),
    );
  });
  it('refuses an empty stretch with its numbers', () => expect(() => ruler(5, 5)).toThrow('5 to 5'));
});

describe('ticks', () => {
  it.each([
    { from: 0, to: 0.6, most: 4, at: [0, 0.2, 0.4, 0.6], digits: 1 },
    { from: -0.13, to: 0.31, most: 5, at: [-0.1, 0, 0.1, 0.2, 0.3], digits: 1 },
    { from: 6.4, to: 23, most: 4, at: [10, 15, 20], digits: 0 },
    { from: 0, to: 0.012, most: 4, at: [0, 0.005, 0.01], digits: 3 },
    { from: 120, to: 7400, most: 4, at: [2000, 4000, 6000], digits: 0 },
  ])('numbers round places from $from to $to', ({ from, to, most, at, digits }) => {
    const made = ticks(from, to, most);
    expect(made.digits).toBe(digits);
    expect(made.at.map((place) => place.toFixed(digits))).toEqual(at.map((place) => place.toFixed(digits)));
  });
  it('never numbers more than it may, nor outside the stretch', () => {
    const from = fc.double({ min: -1e4, max: 1e4, noNaN: true });
    const length = fc.double({ min: 1e-3, max: 1e5, noNaN: true });
    fc.assert(
      fc.property(from, length, fc.integer({ min: 3, max: 9 }), (start, size, most) => {
        const { at, digits } = ticks(start, start + size, most);
        expect(at.length).toBeLessThanOrEqual(most);
        expect(at.length).toBeGreaterThan(0);
        expect(new Set(at.map((place) => place.toFixed(digits))).size).toBe(at.length);
        for (const place of at) {
          expect(place).toBeGreaterThanOrEqual(start - size * 1e-6);
          expect(place).toBeLessThanOrEqual(start + size * (1 + 1e-6));
        }
      }),
    );
  });
  it('refuses an empty stretch', () => expect(() => ticks(3, 3, 5)).toThrow('3 to 3'));
});
