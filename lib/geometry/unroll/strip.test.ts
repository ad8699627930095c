import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { signedArea } from '@/lib/geometry/polygons';
import type { Vec2, Vec3 } from '@/lib/numerics/vec';
import { unrollStrip } from './strip';

const apart = (p: readonly number[] = [], q: readonly number[] = []): number =>
  Math.hypot(...p.map((v, k) => v - (q[k] ?? Number.NaN)));

const coordinate = (size: number) => fc.double({ min: -size, max: size, noNaN: true });

describe('strips laid flat', () => {
  it('keep every generator and every piece of both edges when the edges have one shape', () => {
    fc.assert(
      fc.property(
        fc.array(fc.tuple(fc.double({ min: 5, max: 80, noNaN: true }), coordinate(40)), { minLength: 1, maxLength: 6 }),
        fc.double({ min: 0.3, max: 1.6, noNaN: true }),
        fc.tuple(coordinate(120), fc.double({ min: 100, max: 500, noNaN: true }), coordinate(60)),
        (steps, k, shift) => {
          let at: [number, number] = [0, 0];
          const shape = [at, ...steps.map(([dx, dz]) => (at = [at[0] + dx, at[1] + dz]))];
          const a = shape.map(([x, z]): Vec3 => [x, 0, z]);
          const b = shape.map(([x, z]): Vec3 => [shift[0] + k * x, shift[1], shift[2] + k * z]);
          const flat = unrollStrip(a, b);
          expect(flat.errorMm).toBeLessThan(1e-6);
          for (const i of a.keys()) {
            expect(Math.abs(apart(flat.a[i], flat.b[i]) - apart(a[i], b[i]))).toBeLessThan(1e-6);
            if (i === 0) continue;
            expect(Math.abs(apart(flat.a[i], flat.a[i - 1]) - apart(a[i], a[i - 1]))).toBeLessThan(1e-6);
            expect(Math.abs(apart(flat.b[i], flat.b[i - 1]) - apart(b[i], b[i - 1]))).toBeLessThan(1e-6);
            // The diagonal too, or the piece would be sheared.
            expect(Math.abs(apart(flat.a[i], flat.b[i - 1]) - apart(a[i], b[i - 1]))).toBeLessThan(1e-6);
          }
        },
      ),
    );
  });

  it('lies to the left of its first generator, which runs along x from the origin', () => {
    const flat = unrollStrip(
      [
        [0, 0, 0],
        [0, 30, 0],
      ],
      [
        [200, 0, 0],
        [200, 20, 0],
      ],
    );
    expect(flat.a[0]).toEqual([0, 0]);
    expect(flat.b[0]).toEqual([expect.closeTo(200, 9), expect.closeTo(0, 9)]);
    expect(flat.a[1]?.[1]).toBeCloseTo(30, 9);
    const ring: Vec2[] = [...flat.a, ...[...flat.b].reverse()];
    expect(Math.abs(signedArea(ring))).toBeCloseTo(5000, 6);
  });

  it('states what a twisted strip is out by: the other diagonal of its one piece', () => {
    // A square of 100 with one corner raised by 10: sides 100, 100, and two of root (100^2 + 10^2); one diagonal is root 20000, the other root 20100.
    const a: Vec3[] = [
      [0, 0, 0],
      [0, 100, 0],
    ];
    const b: Vec3[] = [
      [100, 0, 0],
      [100, 100, 10],
    ];
    const flat = unrollStrip(a, b);
    expect(flat.kind).toBe('triangles');
    const side = Math.hypot(100, 10);
    expect(apart(flat.b[0], flat.b[1])).toBeCloseTo(side, 9);
    expect(apart(flat.a[1], flat.b[1])).toBeCloseTo(side, 9);
    expect(apart(flat.a[1], flat.b[0])).toBeCloseTo(100 * Math.SQRT2, 9);
    // A kite about the used diagonal: its axis is root(100^2 - 5000) + root(10100 - 5000).
    expect(flat.errorMm).toBeCloseTo(Math.sqrt(5000) + Math.sqrt(5100) - Math.sqrt(20100), 9);
  });

  it('refuses edges that do not match and generators without length', () => {
    expect(() => unrollStrip([[0, 0, 0]], [[1, 0, 0]])).toThrow(RangeError);
    expect(() =>
      unrollStrip(
        [
          [0, 0, 0],
          [0, 1, 0],
        ],
        [[1, 0, 0]],
      ),
    ).toThrow(RangeError);
    expect(() =>
      unrollStrip(
        [
          [0, 0, 0],
          [0, 1, 0],
        ],
        [
          [1, 0, 0],
          [0, 1, 0],
        ],
      ),
    ).toThrow(RangeError);
  });
});
