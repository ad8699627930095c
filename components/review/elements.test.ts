import { describe, expect, it } from 'vitest';
import tarrel from '@/examples/tarrel-620.json';
import { parseAirframe } from '@/lib/airframe/parse';
import { elementList, elementName } from './elements';

const parsed = parseAirframe(tarrel);
if (!parsed.ok) throw new RangeError(`the example does not open: ${parsed.problems[0]?.message}`);
const list = elementList(parsed.value);

describe('elementList', () => {
  it('calls things by the names that the board gives them, never by an id', () => {
    expect(elementName(list, 'servo-ele')).toBe('Servo 3');
    expect(elementName(list, 'pod')).toBe('Body');
  });
  it('names controls by the surface that carries them', () => {
    expect(elementName(list, 'wing/aileron')).toBe('aileron of the wing');
    expect(elementName(list, 'tail/elevator')).toBe('elevator of the tailplane');
  });
  it('gives every element a name of its own, so that no two entries of the list read alike', () => {
    expect(new Set(list.map(({ name }) => name)).size).toBe(list.length);
    expect(list.length).toBeGreaterThan(8);
  });
  it('falls back on the key', () => expect(elementName(list, 'nothing-there')).toBe('nothing-there'));
});
