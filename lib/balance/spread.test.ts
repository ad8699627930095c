import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import type { Vec2, Vec3 } from '@/lib/numerics/vec';
import { balance, type Weighed } from './balance';
import {
  barSpread,
  boxSpread,
  gathered,
  mirrorSpread,
  POINT,
  plate,
  rodSpread,
  type Spread,
  scaleSpread,
} from './spread';

const flat = { origin: [0, 0, 0], ex: [1, 0, 0], ey: [0, 1, 0] } satisfies { origin: Vec3; ex: Vec3; ey: Vec3 };
const rectangle = (l: number, w: number, x = 0, y = 0): Vec2[] => [
  [x, y],
  [x + l, y],
  [x + l, y + w],
  [x, y + w],
];
const close = (a: Spread, b: Spread) => {
  for (const key of ['xx', 'yy', 'zz', 'xy', 'xz', 'yz'] as const) expect(a[key], key).toBeCloseTo(b[key], 6);
};

describe('spreads', () => {
  it('a plate without holes is a box', () => {
    const { areaMm2, at, spread } = plate(rectangle(200, 80, 30, -10), [], 5, flat);
    expect(areaMm2).toBe(16000);
    expect(at).toEqual([130, 30, 0]);
    close(spread, boxSpread(1, [200, 80, 5]));
  });
  it('a hole takes its mass from where it was', () => {
    const hole = [...rectangle(40, 40, 140, 20)].reverse();
    const whole = plate(rectangle(200, 80), [], 5, flat);
    const cut = plate(rectangle(200, 80), [hole], 5, flat);
    const plug = plate(rectangle(40, 40, 140, 20), [], 5, flat);
    const weighed = (piece: typeof whole): Weighed => ({
      key: 'x',
      massG: piece.areaMm2,
      at: piece.at,
      spread: scaleSpread(piece.spread, piece.areaMm2),
    });
    const together = balance([weighed(cut), weighed(plug)]);
    const alone = balance([weighed(whole)]);
    expect(together.cg[0]).toBeCloseTo(alone.cg[0], 9);
    expect(together.inertiaKgM2.zz).toBeCloseTo(alone.inertiaKgM2.zz, 9);
    expect(together.inertiaKgM2.xy).toBeCloseTo(0, 9);
  });
  it('a plate stood upright carries its spread into z', () => {
    const { at, spread } = plate(rectangle(200, 80), [], 5, { origin: [7, 3, 1], ex: [1, 0, 0], ey: [0, 0, 1] });
    expect(at).toEqual([107, 3, 41]);
    close(spread, boxSpread(1, [200, 5, 80]));
  });
  it('a plate turned in its own plane keeps what is invariant and gains a product', () => {
    const c = Math.cos(0.6);
    const s = Math.sin(0.6);
    const { spread } = plate(rectangle(200, 80), [], 5, { origin: [0, 0, 0], ex: [c, s, 0], ey: [-s, c, 0] });
    const straight = boxSpread(1, [200, 80, 5]);
    expect(spread.xx + spread.yy).toBeCloseTo(straight.xx + straight.yy, 6);
    expect(spread.xy).toBeCloseTo((straight.xx - straight.yy) * c * s, 6);
  });
  it('a rod is a box without width, a thin bar a rod', () => {
    close(rodSpread(12, [0, -50, 0], [0, 50, 0]), boxSpread(12, [0, 100, 0]));
    close(barSpread(12, [0, 1, 0], 100, 0), rodSpread(12, [0, -50, 0], [0, 50, 0]));
  });
  it('a disc has m r^2 / 4 across and m r^2 / 2 about its axis', () => {
    const { inertiaKgM2 } = balance([
      { key: 'disc', massG: 40, at: [9, 9, 9], spread: barSpread(40, [1, 0, 0], 0, 100) },
    ]);
    expect(inertiaKgM2.xx).toBeCloseTo((0.04 * 0.1 ** 2) / 2, 12);
    expect(inertiaKgM2.yy).toBeCloseTo((0.04 * 0.1 ** 2) / 4, 12);
  });
  it('mirrored twice is the same, and a pair has no product across the centre plane', () => {
    const { spread } = gathered([
      { massG: 5, at: [1, 2, 3] },
      { massG: 4, at: [5, 10, 2.5], spread: rodSpread(4, [0, 0, 0], [10, 20, 5]) },
    ]);
    expect(mirrorSpread(mirrorSpread(spread))).toEqual(spread);
    const { spread: pair } = gathered([
      { massG: 9, at: [7, 5, 1], spread },
      { massG: 9, at: [7, -5, 1], spread: mirrorSpread(spread) },
    ]);
    expect([pair.xy, pair.yz]).toEqual([0, 0]);
    expect(pair.xz).not.toBe(0);
  });
  it('refuses a plate that is all hole', () => {
    expect(() => plate(rectangle(10, 10), [rectangle(10, 10)], 5, flat)).toThrow(RangeError);
  });
});

const masses = fc.array(
  fc.record({
    massG: fc.integer({ min: 1, max: 500 }),
    at: fc.tuple(
      fc.integer({ min: -400, max: 900 }),
      fc.integer({ min: -500, max: 500 }),
      fc.integer({ min: -200, max: 200 }),
    ),
  }),
  { minLength: 2, maxLength: 12 },
);
const lines = (list: readonly { massG: number; at: Vec3 }[]): Weighed[] =>
  list.map((one, index) => ({ key: `m${index}`, ...one }));

describe('balance', () => {
  it('moved as a whole, the CG moves along and the inertia stays', () => {
    fc.assert(
      fc.property(masses, fc.integer({ min: -500, max: 500 }), (list, dx) => {
        const a = balance(lines(list));
        const b = balance(lines(list.map(({ massG, at: [x, y, z] }) => ({ massG, at: [x + dx, y, z] }))));
        expect(b.cg[0] - a.cg[0]).toBeCloseTo(dx, 6);
        expect(b.inertiaKgM2.yy).toBeCloseTo(a.inertiaKgM2.yy, 9);
      }),
    );
  });
  it('two halves of a mass at one place weigh as the whole', () => {
    fc.assert(
      fc.property(masses, (list) => {
        const halves = list.flatMap(({ massG, at }) => [
          { massG: massG / 2, at },
          { massG: massG / 2, at },
        ]);
        const [a, b] = [balance(lines(list)), balance(lines(halves))];
        expect(b.cg[0]).toBeCloseTo(a.cg[0], 6);
        expect(b.inertiaKgM2.xx).toBeCloseTo(a.inertiaKgM2.xx, 9);
      }),
    );
  });
  it('no two moments of inertia are less than the third', () => {
    fc.assert(
      fc.property(masses, (list) => {
        const { xx, yy, zz } = balance(lines(list)).inertiaKgM2;
        const most = Math.max(xx, yy, zz);
        expect(xx + yy + zz - most).toBeGreaterThanOrEqual(most * (1 - 1e-9));
      }),
    );
  });
  it('refuses nothing', () => {
    expect(() => balance([])).toThrow(RangeError);
    expect(() => balance([{ key: 'air', massG: 0, at: [0, 0, 0], spread: POINT }])).toThrow(RangeError);
  });
});
