import { describe, expect, it } from 'vitest';
import { bandBySquares, byShare } from './bySquares';

describe('a band by squares', () => {
  it('of 3 and 4 off is 5 off, each way for itself', () => {
    const { band } =
      bandBySquares(
        100,
        [
          [97, 105],
          [96, 112],
        ],
        'two causes',
      ) ?? {};
    expect(band).toEqual({ low: 95, high: 113, cause: 'two causes' });
  });
  it('of ends on one side leaves the other where it is', () => {
    expect(bandBySquares(10, [[11, 12]], 'one cause')?.band).toEqual({ low: 10, high: 12, cause: 'one cause' });
  });
  it('is left out where a cause leaves no value', () => {
    expect(bandBySquares(10, [[9, null]], 'a cause')).toBeUndefined();
    expect(bandBySquares(10, [[9, Number.NaN]], 'a cause')).toBeUndefined();
  });
  it('does not pass the bottom of what has one', () => {
    expect(
      bandBySquares(
        5,
        [
          [0, 6],
          [2, 6],
        ],
        'a cause',
        0,
      )?.band?.low,
    ).toBe(0);
  });
  it('a share either way', () => expect(byShare(200, 0.05)).toEqual([190, 210]));
});
