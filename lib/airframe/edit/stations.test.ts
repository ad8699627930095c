import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { restated } from './stations';

const lengths = fc.array(fc.integer({ min: 5, max: 500 }), { minLength: 1, maxLength: 5 });

describe('stations after a change of length', () => {
  it('by hand: half of the second panel stays half of it', () => {
    expect(restated([200, 100], [200, 300])(250 / 300)).toBeCloseTo(350 / 500, 12);
    expect(restated([200, 100], [200, 300])(0.5)).toBeCloseTo(150 / 500, 12);
  });
  it('joints go to joints, ends stay ends, and order is kept', () => {
    fc.assert(
      fc.property(lengths, fc.integer({ min: 5, max: 500 }), fc.nat(4), (old, next, at) => {
        const changed = old.map((length, index) => (index === at % old.length ? next : length));
        const move = restated(old, changed);
        const sums = (list: number[]) =>
          list.map((_, i) => list.slice(0, i + 1).reduce((a, b) => a + b, 0) / list.reduce((a, b) => a + b, 0));
        const moved = sums(old).map(move);
        for (const [index, joint] of sums(changed).entries()) expect(moved[index]).toBeCloseTo(joint, 9);
        expect([move(0), move(1)]).toEqual([0, 1]);
        expect(move(0.3)).toBeLessThanOrEqual(move(0.4));
      }),
    );
  });
  it('there and back again is where it was', () => {
    fc.assert(
      fc.property(lengths, lengths, fc.double({ min: 0, max: 1, noNaN: true }), (a, b, station) => {
        fc.pre(a.length === b.length);
        expect(restated(b, a)(restated(a, b)(station))).toBeCloseTo(station, 9);
      }),
    );
  });
});
