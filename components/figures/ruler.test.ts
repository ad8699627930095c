import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { ruler } from './ruler';

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
