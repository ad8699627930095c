import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { balance } from './balance';
import { balanceError } from './errors';
import type { MassGroup, MassLine } from './line';
import { boxSpread, POINT } from './spread';

const NONE: Record<MassGroup, number> = { foam: 0, covering: 0, glue: 0, tube: 0, item: 0, drive: 0, gear: 0 };
const line = (key: string, group: MassGroup, massG: number, x: number, basis = key): MassLine => ({
  key,
  name: key,
  group,
  massG,
  at: [x, 0, 0],
  spread: POINT,
  basis,
});

describe('what uncertain masses leave', () => {
  it('by hand: one of two equal masses out by 10 % moves the CG by a tenth of half its arm', () => {
    const lines = [line('a', 'foam', 100, 0), line('b', 'item', 100, 200)];
    const error = balanceError(lines, balance(lines), { ...NONE, foam: 10 });
    expect(error.massG).toBeCloseTo(10, 9);
    // dm (x - cg) / m = 10 x 100 / 200.
    expect(error.cgMm[0]).toBeCloseTo(5, 9);
    expect(error.inertiaKgM2.yy).toBeCloseTo(0.1 * 0.1 * 0.1 ** 2, 12);
  });
  it('adds what errs together, and by squares what does not', () => {
    const sheets = (basis: [string, string]) => [
      line('a', 'foam', 30, 10, basis[0]),
      line('b', 'foam', 40, 10, basis[1]),
      line('c', 'item', 30, -70),
    ];
    const error = (basis: [string, string]) => {
      const lines = sheets(basis);
      return balanceError(lines, balance(lines), { ...NONE, foam: 10 }).massG;
    };
    expect(error(['board', 'board'])).toBeCloseTo(7, 9);
    expect(error(['board', 'ply'])).toBeCloseTo(5, 9);
  });
  it('one sheet that carries the CG in its own middle does not move it', () => {
    const lines = [line('a', 'foam', 50, -80, 'board'), line('b', 'foam', 50, 80, 'board'), line('c', 'item', 60, 0)];
    const error = balanceError(lines, balance(lines), { ...NONE, foam: 10 });
    expect(error.cgMm[0]).toBeCloseTo(0, 12);
    expect(error.inertiaKgM2.yy).toBeGreaterThan(0);
  });
  it('is what happens when the masses are really out, to first order', () => {
    const lines = fc.array(
      fc.record({ massG: fc.integer({ min: 5, max: 200 }), x: fc.integer({ min: -300, max: 600 }) }),
      { minLength: 2, maxLength: 6 },
    );
    fc.assert(
      fc.property(lines, (masses) => {
        const all = masses.map(({ massG, x }, index) => ({
          ...line(`m${index}`, index === 0 ? 'foam' : 'item', massG, x),
          spread: boxSpread(massG, [90, 40, 20]),
        }));
        const share = 1e-4;
        const [first, ...rest] = all;
        if (!first) return;
        const heavier = [
          { ...first, massG: first.massG * (1 + share), spread: boxSpread(first.massG * (1 + share), [90, 40, 20]) },
          ...rest,
        ];
        const [before, after] = [balance(all), balance(heavier)];
        const error = balanceError(all, before, { ...NONE, foam: share * 100 });
        const shift = Math.abs(after.cg[0] - before.cg[0]);
        expect(Math.abs(error.cgMm[0] - shift)).toBeLessThan(2e-4 * shift + 1e-9);
        const grown = after.inertiaKgM2.yy - before.inertiaKgM2.yy;
        expect(Math.abs(error.inertiaKgM2.yy - grown)).toBeLessThan(1e-3 * grown + 1e-12);
      }),
    );
  });
});
