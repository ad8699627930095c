import { describe, expect, it } from 'vitest';
import { typedValue, valueNumber, valueText } from './valueText';

describe('value text', () => {
  it.each([
    [620, 'mm', 'metric', '620 mm'],
    [138.04, 'mm', 'metric', '138 mm'],
    [254, 'mm', 'imperial', '10 in'],
    [-2.5, 'deg', 'metric', '-2.5°'],
    [0.425, 'share', 'metric', '42.5 %'],
  ] as const)('%d %s in %s reads %s', (value, unit, system, text) => {
    expect(valueText(value, unit, system)).toBe(text);
  });

  it.each([
    ['312', 'mm', 'metric', 312],
    [' 12,5 mm', 'mm', 'metric', 12.5],
    ['8.5in', 'mm', 'imperial', 215.9],
    ['−3', 'deg', 'metric', -3],
    ['35 %', 'share', 'metric', 0.35],
    ['', 'mm', 'metric', null],
    ['12e3', 'mm', 'metric', null],
    ['wide', 'mm', 'metric', null],
    ['1.2.3', 'mm', 'metric', null],
  ] as const)('"%s" typed as %s in %s is %s', (text, unit, system, value) => {
    const typed = typedValue(text, unit, system);
    if (value === null) expect(typed).toBeNull();
    else expect(typed).toBeCloseTo(value, 9);
  });

  it('reads back what it shows', () => {
    for (const unit of ['mm', 'deg', 'share'] as const) {
      for (const system of ['metric', 'imperial'] as const) {
        expect(typedValue(valueNumber(0.4, unit, system), unit, system)).toBeCloseTo(0.4, 1);
      }
    }
  });
});
