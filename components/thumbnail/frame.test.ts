import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import type { Vec2 } from '@/lib/numerics/vec';
import { frameAround, mmAt, pathData, percentAt, toDrawing } from './frame';

const WING: readonly Vec2[] = [
  [-20, 300],
  [180, 310],
  [150, -310],
];

describe('frameAround', () => {
  it('holds every point inside its margin', () => {
    expect(frameAround([WING], 0.1)).toEqual({ x0: -82, y0: 372, widthMm: 324, heightMm: 744 });
  });
  it.each([
    ['nothing', []],
    ['one point', [[[3, 4]]]],
    [
      'two points in one place',
      [
        [
          [3, 4],
          [3, 4],
        ],
      ],
    ],
    [
      'no numbers',
      [
        [
          [Number.NaN, 4],
          [Number.POSITIVE_INFINITY, 1],
        ],
      ],
    ],
  ] as const)('draws nothing for %s', (_what, rings) => expect(frameAround(rings)).toBeNull());
});

describe('from the aircraft to the screen', () => {
  const frame = { x0: -100, y0: 400, widthMm: 500, heightMm: 800 };

  it('puts the nose left and starboard up', () => {
    expect(toDrawing(frame, [-60, 350])).toEqual([40, 50]);
    expect(toDrawing(frame, [200, -350])).toEqual([300, 750]);
  });
  it('writes percent for a mark', () => {
    expect(percentAt(frame, [25, 100])).toEqual({ left: '25%', top: '37.5%' });
  });
  it('writes path data to a tenth of a millimetre', () => {
    expect(
      pathData(
        frame,
        [
          [0, 0.04],
          [10.26, -3],
        ],
        true,
      ),
    ).toBe('M100 400L110.3 403Z');
    expect(pathData(frame, [[0, 0]], true)).toBe('');
  });
});

describe('mmAt', () => {
  const frame = { x0: -100, y0: 400, widthMm: 500, heightMm: 800 };
  const box = { left: 30, top: 70, width: 250, height: 400 };

  it('reads the place under the pointer, half size on the screen', () => {
    expect(mmAt(frame, box, 30 + 80, 70 + 150)).toEqual([60, 100]);
  });
  it('is the way back from the mark', () => {
    fc.assert(
      fc.property(fc.integer({ min: -99, max: 399 }), fc.integer({ min: -399, max: 399 }), (x, y) => {
        const { left, top } = percentAt(frame, [x, y]);
        const back = mmAt(
          frame,
          box,
          box.left + (Number.parseFloat(left) / 100) * box.width,
          box.top + (Number.parseFloat(top) / 100) * box.height,
        );
        // Percent are written to a tenth: half of that of the larger side is what may be lost, and a tenth of a mm.
        expect(Math.abs((back?.[0] ?? Number.NaN) - x)).toBeLessThanOrEqual(0.51);
        expect(Math.abs((back?.[1] ?? Number.NaN) - y)).toBeLessThanOrEqual(0.51);
      }),
    );
  });
  it.each([
    [29, 100],
    [281, 100],
    [100, 69],
    [100, 471],
  ])('is nothing outside the drawing (%i, %i)', (x, y) => expect(mmAt(frame, box, x, y)).toBeNull());
  it('is nothing while the box has no size', () => {
    expect(mmAt(frame, { ...box, width: 0, height: 0 }, 30, 70)).toBeNull();
  });
});
