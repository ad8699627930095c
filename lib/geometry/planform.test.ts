import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { halfPlanform, type PlanformStation, planform, stationAt, sweepBetweenDeg } from './planform';

const stations = fc
  .array(
    fc.record({
      x: fc.integer({ min: -200, max: 600 }),
      step: fc.integer({ min: 1, max: 400 }),
      chord: fc.integer({ min: 1, max: 400 }),
    }),
    { minLength: 2, maxLength: 6 },
  )
  .map((list) => {
    let y = 0;
    return list.map(({ x, step, chord }, index): PlanformStation => {
      y += index === 0 ? 0 : step;
      return { x, y, chord };
    });
  });

describe('planform', () => {
  it('of a rectangle is the rectangle', () => {
    const wing = planform([
      { x: 7, y: 0, chord: 190 },
      { x: 7, y: 450, chord: 190 },
    ]);
    expect(wing).toEqual({
      area: 171000,
      span: 900,
      aspectRatio: 900 / 190,
      averageChord: 190,
      mac: 190,
      yMac: 225,
      xLeMac: 7,
      xQuarterMac: 54.5,
    });
  });
  it('a cut anywhere changes nothing', () => {
    fc.assert(
      fc.property(stations, fc.double({ min: 0.01, max: 0.99, noNaN: true }), (list, share) => {
        const y = share * (list.at(-1)?.y ?? 0);
        const index = list.findIndex((station) => station.y >= y);
        const cut = planform([...list.slice(0, index), stationAt(list, y), ...list.slice(index)]);
        const whole = planform(list);
        for (const key of ['area', 'mac', 'yMac', 'aspectRatio'] as const)
          expect(cut[key] / whole[key]).toBeCloseTo(1, 9);
        expect(cut.xLeMac).toBeCloseTo(whole.xLeMac, 6);
      }),
    );
  });
  it('moved aft moves with its chord, and scaled scales', () => {
    fc.assert(
      fc.property(stations, fc.integer({ min: -300, max: 300 }), fc.integer({ min: 2, max: 30 }), (list, dx, k) => {
        const whole = planform(list);
        const moved = planform(list.map((station) => ({ ...station, x: station.x + dx })));
        expect(moved.xQuarterMac).toBeCloseTo(whole.xQuarterMac + dx, 6);
        expect(moved.mac).toBe(whole.mac);
        const scaled = planform(list.map(({ x, y, chord }) => ({ x: k * x, y: k * y, chord: k * chord })));
        expect(scaled.area / whole.area).toBeCloseTo(k * k, 6);
        expect(scaled.mac / whole.mac).toBeCloseTo(k, 9);
      }),
    );
  });
  it('keeps the mean chord between the average and the largest chord', () => {
    fc.assert(
      fc.property(stations, (list) => {
        const { mac, averageChord } = planform(list);
        expect(mac).toBeGreaterThanOrEqual(averageChord * (1 - 1e-12));
        expect(mac).toBeLessThanOrEqual(Math.max(...list.map(({ chord }) => chord)) * (1 + 1e-12));
      }),
    );
  });
  it('takes a step in chord as two stations at one y', () => {
    const { areaHalf } = halfPlanform([
      { x: 0, y: 0, chord: 100 },
      { x: 0, y: 10, chord: 100 },
      { x: 20, y: 10, chord: 60 },
      { x: 20, y: 30, chord: 60 },
    ]);
    expect(areaHalf).toBe(1000 + 1200);
  });
  it.each([
    { name: 'one station', list: [{ x: 0, y: 0, chord: 3 }] },
    {
      name: 'a negative chord',
      list: [
        { x: 0, y: 0, chord: 3 },
        { x: 0, y: 5, chord: -1 },
      ],
    },
    {
      name: 'stations going inward',
      list: [
        { x: 0, y: 5, chord: 3 },
        { x: 0, y: 2, chord: 3 },
      ],
    },
    {
      name: 'no area',
      list: [
        { x: 0, y: 0, chord: 0 },
        { x: 0, y: 5, chord: 0 },
      ],
    },
    {
      name: 'a place that is not a number',
      list: [
        { x: Number.NaN, y: 0, chord: 3 },
        { x: 0, y: 5, chord: 3 },
      ],
    },
  ])('refuses $name', ({ list }) => expect(() => planform(list)).toThrow(RangeError));
  it('measures sweep at the line asked for', () => {
    const root = { x: 0, y: 0, chord: 200 };
    const tip = { x: 100, y: 100, chord: 100 };
    expect(sweepBetweenDeg(root, tip, 0)).toBeCloseTo(45, 9);
    expect(sweepBetweenDeg(root, tip, 1)).toBeCloseTo(0, 9);
  });
});
