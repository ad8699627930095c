import { describe, expect, it } from 'vitest';
import { perimeter, signedArea } from '@/lib/geometry/polygons';
import { unrollStrip } from '@/lib/geometry/unroll/strip';
import type { Vec2, Vec3 } from '@/lib/numerics/vec';

// Source: solid geometry, closed form. Circles are followed by n chords; n = 4000 leaves less than 0.001 mm of a turn.

const N = 4000;

/** A circle about the x axis. */
const circle = (radius: number, x: number, turn = 1): Vec3[] =>
  Array.from({ length: N + 1 }, (_, i): Vec3 => {
    const angle = (2 * Math.PI * turn * i) / N;
    return [x, radius * Math.cos(angle), radius * Math.sin(angle)];
  });

const outlineOf = ({ a, b }: { a: readonly Vec2[]; b: readonly Vec2[] }): Vec2[] => [...b, ...[...a].reverse()];
const gap = (p: Vec2 | undefined, q: Vec2 | undefined): number =>
  p && q ? Math.hypot(p[0] - q[0], p[1] - q[1]) : Number.NaN;

describe('solid geometry, closed form', () => {
  it('a cylinder 60 across and 140 long unrolls to a rectangle of pi d by h', () => {
    const flat = unrollStrip(circle(30, 0), circle(30, 140));
    expect(flat.kind).toBe('cylinder');
    expect(flat.errorMm).toBe(0);
    expect(gap(flat.a[0], flat.a.at(-1))).toBeCloseTo(Math.PI * 60, 2);
    expect(gap(flat.b[0], flat.b.at(-1))).toBeCloseTo(Math.PI * 60, 2);
    expect(gap(flat.a.at(-1), flat.b.at(-1))).toBeCloseTo(140, 9);
    expect(signedArea(outlineOf(flat))).toBeCloseTo(Math.PI * 60 * 140, 0);
    expect(perimeter(outlineOf(flat))).toBeCloseTo(2 * (Math.PI * 60 + 140), 2);
  });

  it.each([
    [40, 25, 90],
    [25, 40, 90],
    [12, 30, 200],
  ])('a cone frustum of radii %d and %d, %d high, unrolls to an annular sector', (r1, r2, height) => {
    const flat = unrollStrip(circle(r1, 0), circle(r2, height));
    expect(flat.kind).toBe('cone');
    const slant = Math.hypot(height, r2 - r1);
    // Half angle s at the apex: sin s = (difference of radii) / slant; the sector opens by 2 pi sin s about radii r / sin s.
    const sine = Math.abs(r2 - r1) / slant;
    const [inner, outer] = [Math.min(r1, r2) / sine, Math.max(r1, r2) / sine];
    const angle = 2 * Math.PI * sine;
    const apex: Vec2 = [r1 > r2 ? outer : -inner, 0];
    const [ofA, ofB] = r1 > r2 ? [outer, inner] : [inner, outer];
    for (const p of flat.a) expect(gap(p, apex)).toBeCloseTo(ofA, 6);
    for (const p of flat.b) expect(gap(p, apex)).toBeCloseTo(ofB, 6);
    const last = flat.b.at(-1) ?? [0, 0];
    const turned = Math.abs(Math.atan2(last[1], r1 > r2 ? apex[0] - last[0] : last[0] - apex[0]));
    expect(turned).toBeCloseTo(angle > Math.PI ? 2 * Math.PI - angle : angle, 5);
    for (const [i, p] of flat.a.entries()) expect(gap(p, flat.b[i])).toBeCloseTo(slant, 8);
    // Lateral area of a frustum: pi (r1 + r2) slant.
    expect(signedArea(outlineOf(flat)) / (Math.PI * (r1 + r2) * slant)).toBeCloseTo(1, 5);
  });

  it('half an oblique cone keeps every generator and both edges', () => {
    const half = circle(30, 0, 0.5);
    const small = circle(18, 120, 0.5).map(([x, y, z]): Vec3 => [x, y + 35, z]);
    const flat = unrollStrip(half, small);
    expect(flat.kind).toBe('cone');
    const size = (p: readonly number[], q: readonly number[]) => Math.hypot(...p.map((v, k) => v - (q[k] ?? 0)));
    for (const [i, p] of flat.a.entries()) {
      expect(gap(p, flat.b[i])).toBeCloseTo(size(half[i] ?? [], small[i] ?? []), 8);
      if (i === 0) continue;
      expect(gap(p, flat.a[i - 1])).toBeCloseTo(size(half[i] ?? [], half[i - 1] ?? []), 8);
    }
  });
});
