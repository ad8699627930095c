import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import type { Vec2 } from '@/lib/numerics/vec';
import { spread } from './spread';

describe('spread', () => {
  it('leaves a free handle alone and moves the second on one spot', () => {
    const shifts = spread([
      { id: 'root', at: [300, 200] },
      { id: 'end', at: [300, 200] },
      { id: 'tip', at: [300, 90] },
    ]);
    expect(shifts.get('root')).toEqual([0, 0]);
    expect(shifts.get('tip')).toEqual([0, 0]);
    expect(shifts.get('end')).not.toEqual([0, 0]);
  });

  it('leaves no two of a handful within reach of each other', () => {
    const place = fc.tuple(fc.integer({ min: 0, max: 60 }), fc.integer({ min: 0, max: 60 }));
    fc.assert(
      fc.property(fc.array(place, { maxLength: 8 }), (points: Vec2[]) => {
        const places = points.map((at, index) => ({ id: `h${index}`, at }));
        const shifts = spread(places);
        const shown = places.map(({ id, at }) => {
          const [dx, dy] = shifts.get(id) ?? [Number.NaN, Number.NaN];
          return [at[0] + dx, at[1] + dy] as const;
        });
        for (const [i, a] of shown.entries()) {
          for (const b of shown.slice(i + 1))
            expect(Math.max(Math.abs(a[0] - b[0]), Math.abs(a[1] - b[1]))).toBeGreaterThanOrEqual(25);
        }
      }),
    );
  });
});
