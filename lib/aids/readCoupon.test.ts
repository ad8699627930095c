import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { type CouponReadings, readCoupon } from './readCoupon';

const GOOD: CouponReadings = { massG: 4.8, thicknessMm: 5, deflectionMm: 4, loadG: 100, gripSlotMm: 5.2 };
const pathsOf = (over: Partial<CouponReadings>): string[] => {
  const read = readCoupon({ ...GOOD, ...over });
  return read.ok ? [] : read.problems.map(({ path }) => path);
};

describe('readings of a coupon', () => {
  it('that make sense are taken', () => expect(pathsOf({})).toEqual([]));

  it.each([
    ['massG', 0],
    ['massG', Number.NaN],
    ['thicknessMm', -5],
    ['deflectionMm', 0],
    ['loadG', Number.POSITIVE_INFINITY],
    ['gripSlotMm', 0],
    ['spanMm', 0],
  ] as const)('%s of %s is refused there', (path, value) => expect(pathsOf({ [path]: value })).toEqual([path]));

  it.each([
    { name: 'kilograms for grams', over: { massG: 0.0048 }, path: 'massG' },
    { name: 'the mass of a whole sheet', over: { massG: 240 }, path: 'massG' },
    { name: 'a thickness in centimetres', over: { thicknessMm: 0.3 }, path: 'thicknessMm' },
    { name: 'a strip that hardly bends', over: { deflectionMm: 0.5 }, path: 'deflectionMm' },
    { name: 'a strip that hangs through', over: { deflectionMm: 20.5 }, path: 'deflectionMm' },
    { name: 'a load in kilograms', over: { loadG: 0.1 }, path: 'loadG' },
    { name: 'a load that would crush it', over: { loadG: 6000 }, path: 'loadG' },
    { name: 'a slot narrower than the board', over: { gripSlotMm: 4.8 }, path: 'gripSlotMm' },
    { name: 'a slot that holds nothing', over: { gripSlotMm: 6.6 }, path: 'gripSlotMm' },
    { name: 'a board too thick for its strip', over: { thicknessMm: 13, massG: 10, gripSlotMm: 13.2 }, path: 'spanMm' },
    {
      name: 'a stiffness of nothing known',
      over: { thicknessMm: 0.5, gripSlotMm: 0.5, deflectionMm: 1, loadG: 5000, massG: 2 },
      path: 'deflectionMm',
    },
  ])('$name: refused at $path, and said what to do', ({ over, path }) => {
    const read = readCoupon({ ...GOOD, ...over });
    if (read.ok) throw new RangeError('it was taken');
    expect(read.problems.map((one) => one.path)).toEqual([path]);
    for (const { fix, message } of read.problems) {
      expect(fix).toBeTruthy();
      expect(message).not.toContain('{');
    }
  });

  it('takes both sides of each limit of the deflection', () => {
    expect(pathsOf({ deflectionMm: 1 })).toEqual([]);
    expect(pathsOf({ deflectionMm: 0.99 })).toEqual(['deflectionMm']);
    expect(pathsOf({ deflectionMm: 20 })).toEqual([]);
    expect(pathsOf({ deflectionMm: 20.01 })).toEqual(['deflectionMm']);
  });

  it('names every field that is wrong at once', () => {
    expect(pathsOf({ massG: 0, loadG: 0 })).toEqual(['massG', 'loadG']);
    expect(pathsOf({ massG: 900, deflectionMm: 60 })).toEqual(['massG', 'deflectionMm']);
  });

  it('gives a stiffness that goes with the load and against the deflection, and no number that is none', () => {
    const reading = fc.double({ noDefaultInfinity: false, noNaN: false });
    fc.assert(
      fc.property(
        reading,
        reading,
        reading,
        reading,
        reading,
        (massG, thicknessMm, deflectionMm, loadG, gripSlotMm) => {
          const read = readCoupon({ massG, thicknessMm, deflectionMm, loadG, gripSlotMm });
          if (read.ok) expect(Object.values(read.value).every(Number.isFinite)).toBe(true);
          else expect(read.problems.length).toBeGreaterThan(0);
        },
      ),
    );
    fc.assert(
      fc.property(fc.double({ min: 1.1, max: 9, noNaN: true }), (factor) => {
        const [one, more] = [readCoupon(GOOD), readCoupon({ ...GOOD, loadG: GOOD.loadG * factor })];
        if (!one.ok || !more.ok) throw new RangeError('both make sense');
        expect(more.value.eMpa / one.value.eMpa).toBeCloseTo(factor, 9);
      }),
    );
  });
});
