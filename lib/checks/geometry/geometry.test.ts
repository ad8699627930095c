import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { add3, length3, lerp3, radFromDeg, scale3, sub3, type Vec3 } from '@/lib/numerics/vec';
import { drive } from '@/tests/support/airframe';
import { boxAbout, boxGap, lineToBox, pointToBox, sameLane } from './box';
import { type Disc, discOver, discsOf, distanceToDisc, type PropellerDrive } from './disc';
import { nearest } from './nearest';

const disc = (flexDeg: number): Disc => ({
  foot: [0, 0, 0],
  centre: [30, 0, 0],
  axis: [1, 0, 0],
  reachMm: 30,
  radiusMm: 76,
  flexDeg,
});

const propeller = (over: Partial<PropellerDrive> = {}): PropellerDrive => {
  const made = drive(over);
  if (made.kind !== 'propeller') throw new RangeError('a propeller was asked for');
  return made;
};

const coordinate = fc.double({ min: -150, max: 150, noNaN: true });
const point = fc.tuple(coordinate, coordinate, coordinate);

/** Distance to a round plate at right angles to a leaning axis, straight from its definition. */
function toPlate(p: Vec3, leanDeg: number, wayRad: number): number {
  const lean = radFromDeg(leanDeg);
  const axis: Vec3 = [Math.cos(lean), Math.sin(lean) * Math.cos(wayRad), Math.sin(lean) * Math.sin(wayRad)];
  const from = sub3(p, scale3(axis, 30));
  const along = from[0] * axis[0] + from[1] * axis[1] + from[2] * axis[2];
  const across = length3(sub3(from, scale3(axis, along)));
  return Math.hypot(along, Math.max(0, across - 76));
}

describe('distance to a disc', () => {
  it('is that to a round plate while the shaft is stiff', () => {
    fc.assert(
      fc.property(point, (p) => {
        expect(distanceToDisc(disc(0), p)).toBeCloseTo(toPlate(p, 0, 0), 6);
      }),
    );
  });

  it('is the least over every way that the shaft can lean', () => {
    const leans = Array.from({ length: 31 }, (_, index) => index / 10);
    fc.assert(
      fc.property(point, (p) => {
        const own = Math.atan2(p[2], p[1]);
        const ways = [own, own + Math.PI, ...Array.from({ length: 24 }, (_, k) => (k * Math.PI) / 12)];
        const least = Math.min(...leans.flatMap((lean) => ways.map((way) => toPlate(p, lean, way))));
        const found = distanceToDisc(disc(3), p);
        expect(found).toBeLessThan(least + 1e-6);
        // Steps of 0.1 degrees leave at most half a step's arc at this distance from the foot.
        expect(found).toBeGreaterThan(least - 0.3);
      }),
    );
  });

  it('is none where the bent blades go', () => {
    expect(distanceToDisc(disc(3), [30 + 76 * Math.sin(radFromDeg(2)), 0, 70])).toBeCloseTo(0, 9);
    expect(distanceToDisc(disc(0), [30 + 76 * Math.sin(radFromDeg(2)), 0, 70])).toBeGreaterThan(2);
  });

  it('from a blade tip straight away from the foot is that stretch', () => {
    const far = Math.hypot(30, 76);
    const beyond = 1 + 10 / far;
    expect(distanceToDisc(disc(3), [30 * beyond, 76 * beyond, 0])).toBeCloseTo(10, 9);
  });

  it('has its foot behind a tractor and ahead of a pusher, and a fellow to port where the drive has', () => {
    const [tractor] = discsOf(propeller(), [-200, 40, 0], 3);
    expect(tractor?.foot).toEqual([-170, 40, 0]);
    const twins = discsOf(propeller({ facing: 'pusher', mirrored: true }), [-200, 40, 0], 3);
    expect(twins.map(({ foot }) => foot)).toEqual([
      [-230, 40, 0],
      [-230, -40, 0],
    ]);
  });

  it('stands over level ground by its lowest point', () => {
    expect(discOver({ ...disc(0), centre: [0, 0, 100] }, [500, 0, -10], [0, 0, 1])).toBeCloseTo(34, 9);
    // Lying flat, every point is as high as the middle.
    expect(discOver({ ...disc(0), centre: [0, 0, 100], axis: [0, 0, 1] }, [0, 0, 0], [0, 0, 1])).toBeCloseTo(100, 9);
  });
});

describe('boxes', () => {
  const a = boxAbout([0, 0, 0], [20, 20, 20]);
  it.each([
    { name: 'beside', at: [25, 0, 0] as const, gap: 5 },
    { name: 'across a corner', at: [23, 24, 0] as const, gap: 5 },
    { name: 'touching', at: [20, 3, 1] as const, gap: 0 },
    { name: 'into each other', at: [18, 5, 5] as const, gap: -2 },
  ])('$name', ({ at, gap }) => {
    expect(boxGap(a, boxAbout(at, [20, 20, 20]))).toBeCloseTo(gap, 9);
  });

  it('parted along the axis of the least overlap just touch', () => {
    const size = fc.integer({ min: 1, max: 60 });
    const place = fc.tuple(
      fc.integer({ min: -40, max: 40 }),
      fc.integer({ min: -40, max: 40 }),
      fc.integer({ min: -40, max: 40 }),
    );
    fc.assert(
      fc.property(place, fc.tuple(size, size, size), (at, sizes) => {
        const other = boxAbout(at, sizes);
        const into = -boxGap(a, other);
        if (into <= 0) return;
        const moves: Vec3[] = [
          [into, 0, 0],
          [-into, 0, 0],
          [0, into, 0],
          [0, -into, 0],
          [0, 0, into],
          [0, 0, -into],
        ];
        const gaps = moves.map((move) => boxGap(a, boxAbout(add3(at, move), sizes)));
        expect(Math.max(...gaps)).toBeCloseTo(0, 9);
      }),
    );
  });

  it('share a lane only when one slid along x would meet the other', () => {
    expect(sameLane(a, boxAbout([300, 15, 15], [20, 20, 20]))).toBe(true);
    expect(sameLane(a, boxAbout([300, 20, 0], [20, 20, 20]))).toBe(false);
  });

  it('have no line nearer than the nearest of its points', () => {
    fc.assert(
      fc.property(point, point, (from, to) => {
        const found = lineToBox(a, from, to);
        const sampled = Array.from({ length: 201 }, (_, k) => pointToBox(a, lerp3(from, to, k / 200)));
        expect(found.mm).toBeLessThan(Math.min(...sampled) + 1e-3);
        expect(pointToBox(a, found.at)).toBeCloseTo(found.mm, 9);
      }),
    );
  });
});

describe('nearest point of a patch', () => {
  it('of a square plate is the foot of the perpendicular, or its edge', () => {
    const plate = { grid: [5, 5], place: ([u = 0, v = 0]: readonly number[]): Vec3 => [100 * u, 100 * v, 0] };
    const to = (target: Vec3) => nearest(plate, (p) => length3(sub3(p, target)));
    expect(to([33.3, 71.7, 12])?.mm).toBeCloseTo(12, 3);
    expect(to([130, 50, 40])?.mm).toBeCloseTo(50, 3);
  });

  it('keeps out of what is cut out', () => {
    const ring = {
      grid: [21, 21],
      place: ([u = 0, v = 0]: readonly number[]): Vec3 | null =>
        Math.abs(u - 0.5) < 0.2 && Math.abs(v - 0.5) < 0.2 ? null : [100 * u, 100 * v, 0],
    };
    expect(nearest(ring, (p) => length3(sub3(p, [50, 50, 0])))?.mm).toBeCloseTo(20, 2);
  });

  it('is nothing where the patch has no point', () => {
    expect(nearest({ grid: [3], place: () => null }, () => 1)).toBeNull();
  });
});
