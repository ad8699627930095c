import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { balance, type Weighed } from './balance';
import { packRange, placeFor } from './packPlace';

const lines: Weighed[] = [
  { key: 'pack', massG: 100, at: [-50, 0, 0] },
  { key: 'rest', massG: 300, at: [90, 4, 2] },
];
const movedTo = (x: number): Weighed[] =>
  lines.map((line) => (line.key === 'pack' ? { ...line, at: [x, line.at[1], line.at[2]] } : line));

describe('where the pack must sit', () => {
  it('by hand: 400 g at 60 mm need 100 g at -30 mm', () => {
    expect(placeFor(lines, 'pack', 60)).toBeCloseTo(-30, 9);
  });
  it('put there, the CG is where it was wanted', () => {
    fc.assert(
      fc.property(fc.double({ min: -100, max: 200, noNaN: true }), (wanted) => {
        expect(balance(movedTo(placeFor(lines, 'pack', wanted))).cg[0]).toBeCloseTo(wanted, 6);
      }),
    );
  });
  it('says what the slide reaches of it', () => {
    const range = packRange(lines, 'pack', [60, 65], [-60, -20]);
    expect(range.foreXMm).toBeCloseTo(-30, 9);
    expect(range.aftXMm).toBeCloseTo(-10, 9);
    expect(range.reached?.[0]).toBeCloseTo(-30, 9);
    expect(range.reached?.[1]).toBe(-20);
    expect(range.cgPerMm).toBe(0.25);
  });
  it('says when it reaches none, and when it is free', () => {
    expect(packRange(lines, 'pack', [60, 65], [-100, -40]).reached).toBeNull();
    const free = packRange(lines, 'pack', [60, 65]);
    expect(free.reached).toEqual([free.foreXMm, free.aftXMm]);
  });
  it('refuses a mass that is not there and a range that runs backwards', () => {
    expect(() => placeFor(lines, 'ballast', 60)).toThrow(/ballast/);
    expect(() => packRange(lines, 'pack', [65, 60])).toThrow(RangeError);
  });
});
