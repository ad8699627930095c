import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { hang, massSquarePx } from './masses';

const mass = (elementId: string, xMm: number) => ({ elementId, name: elementId, massG: 20, xMm });

describe('hang', () => {
  it('keeps a free mass high and hangs a crowded one lower', () => {
    const hung = hang([mass('rx', 31), mass('pack', -118), mass('esc', 44), mass('motor', 205), mass('servo', 47)], 30);
    expect(hung.map(({ elementId, row }) => [elementId, row])).toEqual([
      ['pack', 0],
      ['rx', 0],
      ['esc', 1],
      ['servo', 2],
      ['motor', 0],
    ]);
    expect(hung.some(({ crowded }) => crowded)).toBe(false);
  });

  it('says of a mass for which no row has room that it is crowded', () => {
    const hung = hang([mass('a', 0), mass('b', 4), mass('c', 9), mass('d', 15), mass('e', 31)], 30);
    expect(hung.map(({ elementId, row, crowded }) => [elementId, row, crowded])).toEqual([
      ['a', 0, false],
      ['b', 1, false],
      ['c', 2, false],
      ['d', 0, true],
      ['e', 1, true],
    ]);
  });

  it('loses no mass and leaves the stations alone', () => {
    const stations = fc.array(fc.integer({ min: -500, max: 1500 }), { maxLength: 30 });
    fc.assert(
      fc.property(stations, fc.integer({ min: 1, max: 200 }), (xs, least) => {
        const hung = hang(
          xs.map((x, index) => mass(`m${index}`, x)),
          least,
        );
        expect(hung.map(({ xMm }) => xMm)).toEqual([...xs].sort((a, b) => a - b));
      }),
    );
  });
});

it('draws four times the mass twice as wide', () => {
  expect(massSquarePx(64)).toBeCloseTo(2 * massSquarePx(16), 9);
});
