import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { fixedDigits, trimmedDigits } from './number';
import { fromShown, QUANTITIES, shown, shownText, UNIT_SYSTEMS } from './quantity';

describe('numbers', () => {
  it.each([
    [12.345, 2, '12.35'],
    [-0.004, 2, '0.00'],
    [-0, 0, '0'],
    [-0.4, 0, '0'],
    [-0.5, 1, '-0.5'],
    [1e-9, 3, '0.000'],
    [250000, 0, '250000'],
  ])('%d with %d digits is %s', (value, digits, text) => expect(fixedDigits(value, digits)).toBe(text));
  it.each([
    [5, 2, '5'],
    [5.5, 2, '5.5'],
    [100, 0, '100'],
    [100, 3, '100'],
    [-0.0001, 2, '0'],
    [0.125, 4, '0.125'],
  ])('%d trimmed to %d digits is %s', (value, digits, text) => expect(trimmedDigits(value, digits)).toBe(text));
  it.each([Number.NaN, Number.POSITIVE_INFINITY])('refuses %d', (value) => {
    expect(() => fixedDigits(value, 1)).toThrow(RangeError);
  });
  it('refuses digits that are no count', () => {
    expect(() => fixedDigits(1, -1)).toThrow(RangeError);
    expect(() => fixedDigits(1, 1.5)).toThrow(RangeError);
  });
  it('never prints minus zero, and reads back within half a digit', () => {
    fc.assert(
      fc.property(fc.double({ min: -1e6, max: 1e6, noNaN: true }), fc.integer({ min: 0, max: 6 }), (value, digits) => {
        const text = fixedDigits(value, digits);
        expect(text).not.toMatch(/^-0(\.0*)?$/);
        expect(Math.abs(Number(text) - value)).toBeLessThanOrEqual(0.5 * 10 ** -digits + 1e-9);
        expect(Number(trimmedDigits(value, digits))).toBe(Number(text));
      }),
    );
  });
});

describe('quantities', () => {
  it('puts the unit as the trade writes it', () => {
    expect(shownText(620, 'mm', 0)).toBe('620 mm');
    expect(shownText(2.5, 'deg', 1)).toBe('2.5°');
    expect(shownText(11, 'percent', 0)).toBe('11 %');
    expect(shownText(4.2, 'perRad', 1)).toBe('4.2/rad');
    expect(shownText(0.3, 'share', 2)).toBe('0.30');
  });
  it('gives the larger unit the digits it needs', () => {
    expect(shown(620, 'mm', 0, 'imperial')).toEqual({ number: '24.41', unit: 'in' });
    expect(shown(283.5, 'g', 0, 'imperial')).toEqual({ number: '10.00', unit: 'oz' });
  });
  it('what is shown, typed back, is the value', () => {
    const quantity = fc.constantFrom('mm', 'g', 'dm2', 'ms', 'deg', 'n');
    fc.assert(
      fc.property(
        quantity,
        fc.double({ min: 0.01, max: 1e4, noNaN: true }),
        fc.constantFrom(...UNIT_SYSTEMS),
        (name, value, system) => {
          const { factor } = QUANTITIES[name][system];
          expect(fromShown(value / factor, name, system)).toBeCloseTo(value, 9);
        },
      ),
    );
  });
});
