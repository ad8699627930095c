import { describe, expect, it } from 'vitest';
import { conversionOf, measured, shownBySymbol } from './units';

describe('measured', () => {
  it('switches a unit that the quantity stands for by itself', () => {
    // 25.4 mm to the inch.
    expect(measured(620, { unit: 'mm', quantity: 'mm', digits: 0 }, 'imperial')).toEqual({
      number: '24.41',
      unit: 'in',
    });
    expect(measured(620, { unit: 'mm', quantity: 'mm', digits: 0 }, 'metric')).toEqual({ number: '620', unit: 'mm' });
  });
  it('leaves a compound unit, and one without a twin, as it is', () => {
    expect(measured(0.1234, { unit: 'g/°', quantity: 'perDeg', digits: 2 }, 'imperial').unit).toBe('g/°');
    expect(measured(8.25, { unit: '% MAC', quantity: 'percent', digits: 1 }, 'imperial').unit).toBe('% MAC');
    expect(measured(12, { unit: 'mm per °', quantity: 'mm', digits: 0 }, 'imperial')).toEqual({
      number: '12',
      unit: 'mm per °',
    });
  });
});

describe('a number known by its symbol only', () => {
  it('switches where the symbol means one thing', () => {
    // 0.44704 m/s to the mile an hour.
    expect(shownBySymbol(13.4112, 'm/s', 3, 'imperial')).toEqual({ number: '30', unit: 'mph' });
    expect(shownBySymbol(13.4112, 'm/s', 3, 'metric')).toEqual({ number: '13.411', unit: 'm/s' });
  });
  it('never takes a load factor for grams', () =>
    expect(conversionOf('g', 'imperial')).toEqual({ unit: 'g', factor: 1 }));
});
