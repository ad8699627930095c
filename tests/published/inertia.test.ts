import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { balance, gyrationMm, type Weighed } from '@/lib/balance/balance';
import { barSpread, boxSpread, mirrorSpread, plate, rodSpread, scaleSpread } from '@/lib/balance/spread';
import type { Vec2, Vec3 } from '@/lib/numerics/vec';

// Inertia of homogeneous and of composite bodies against closed forms: J. L. Meriam and L. G. Kraige, "Engineering Mechanics:
// Dynamics", app. B and table D/4, from memory. Masses in g, places in mm, moments in kg m2; tolerance 1e-9 of the value, for this is
// arithmetic.

const within = (value: number, expected: number) => expect(Math.abs(value / expected - 1)).toBeLessThan(1e-9);
const flat = { origin: [0, 0, 0], ex: [1, 0, 0], ey: [0, 1, 0] } satisfies { origin: Vec3; ex: Vec3; ey: Vec3 };
const plateOf = (
  key: string,
  outline: readonly Vec2[],
  massG: number,
  at: Vec3 = [0, 0, 0],
  thicknessMm = 0,
): Weighed => {
  const made = plate(outline, [], thicknessMm, { ...flat, origin: at });
  return { key, massG, at: made.at, spread: scaleSpread(made.spread, massG) };
};
const alone = (massG: number, spread: NonNullable<Weighed['spread']>) =>
  balance([{ key: 'one', massG, at: [31, -12, 7], spread }]).inertiaKgM2;

describe('homogeneous bodies about their own centre (Meriam & Kraige, table D/4, from memory)', () => {
  it('slender rod of 180 g and 600 mm: m l^2 / 12', () => {
    const { xx, yy, zz } = alone(180, rodSpread(180, [0, -300, 0], [0, 300, 0]));
    within(xx, 0.0054);
    within(zz, 0.0054);
    expect(yy).toBe(0);
  });
  it('rectangular block of 240 g, 200 x 90 x 40 mm: m (a^2 + b^2) / 12', () => {
    const { xx, yy, zz } = alone(240, boxSpread(240, [200, 90, 40]));
    within(xx, (0.24 * (0.09 ** 2 + 0.04 ** 2)) / 12);
    within(yy, (0.24 * (0.2 ** 2 + 0.04 ** 2)) / 12);
    within(zz, (0.24 * (0.2 ** 2 + 0.09 ** 2)) / 12);
  });
  it('circular cylinder of 90 g, 28 mm across and 30 mm long: m r^2 / 2 about it, m r^2 / 4 + m l^2 / 12 across', () => {
    const { xx, yy, zz } = alone(90, barSpread(90, [1, 0, 0], 30, 14));
    within(xx, 0.5 * 0.09 * 0.014 ** 2);
    within(yy, 0.09 * (0.014 ** 2 / 4 + 0.03 ** 2 / 12));
    within(zz, yy);
  });
  it('thin disc of 12 g, 254 mm across: m r^2 / 2 about its axis, m r^2 / 4 across', () => {
    const { xx, yy } = alone(12, barSpread(12, [1, 0, 0], 0, 127));
    within(xx, 0.5 * 0.012 * 0.127 ** 2);
    within(yy, 0.25 * 0.012 * 0.127 ** 2);
  });
  it('thin rectangular plate of 160 g, 200 x 1200 mm: m (b^2 + l^2) / 12 across it', () => {
    const half = 600;
    const { xx, yy, zz } = balance([
      plateOf(
        'wing',
        [
          [0, -half],
          [200, -half],
          [200, half],
          [0, half],
        ],
        160,
      ),
    ]).inertiaKgM2;
    within(xx, (0.16 * 1.2 ** 2) / 12);
    within(yy, (0.16 * 0.2 ** 2) / 12);
    within(zz, (0.16 * (0.2 ** 2 + 1.2 ** 2)) / 12);
  });
  it('thin right-angled triangle of 90 g, 300 x 120 mm: m h^2 / 18 about the axis along its base, and the product m b h / 36', () => {
    const { cg, inertiaKgM2 } = balance([
      plateOf(
        'fin',
        [
          [0, 0],
          [300, 0],
          [0, 120],
        ],
        90,
      ),
    ]);
    within(cg[0], 100);
    within(cg[1], 40);
    within(inertiaKgM2.xx, (0.09 * 0.12 ** 2) / 18);
    within(inertiaKgM2.yy, (0.09 * 0.3 ** 2) / 18);
    within(inertiaKgM2.xy, (-0.09 * 0.3 * 0.12) / 36);
  });
  it('slender rod leaning by 30 degrees: m l^2 / 12 cos^2, and the product m l^2 / 12 sin cos', () => {
    const [c, s] = [Math.cos(Math.PI / 6), Math.sin(Math.PI / 6)];
    const { xx, yy, zz, xz } = alone(60, rodSpread(60, [0, 0, 0], [400 * c, 0, 400 * s]));
    const whole = (0.06 * 0.4 ** 2) / 12;
    within(xx, whole * s * s);
    within(zz, whole * c * c);
    within(yy, whole);
    within(xz, whole * s * c);
  });
});

describe('composite bodies by parallel axes (Meriam & Kraige, app. B, from memory)', () => {
  it('a rod with a disc at its end: sum of each about the common centre', () => {
    // Rod 180 g, 600 mm along x from 0; disc 60 g, radius 100 mm, across x at 600 mm.
    const bodies: Weighed[] = [
      { key: 'rod', massG: 180, at: [300, 0, 0], spread: rodSpread(180, [0, 0, 0], [600, 0, 0]) },
      { key: 'disc', massG: 60, at: [600, 0, 0], spread: barSpread(60, [1, 0, 0], 0, 100) },
    ];
    const { cg, inertiaKgM2 } = balance(bodies);
    within(cg[0], 375);
    // 0.0054 + 0.18 x 0.075^2 + 0.00015 + 0.06 x 0.225^2
    within(inertiaKgM2.yy, 0.0054 + 0.0010125 + 0.00015 + 0.0030375);
    within(inertiaKgM2.xx, 0.0003);
  });
  it('two slender rods as a T: m l^2 / 12 of the bar, the leg, and their offsets', () => {
    const bodies: Weighed[] = [
      { key: 'bar', massG: 100, at: [0, 0, 0], spread: rodSpread(100, [0, -250, 0], [0, 250, 0]) },
      { key: 'leg', massG: 100, at: [250, 0, 0], spread: rodSpread(100, [0, 0, 0], [500, 0, 0]) },
    ];
    const { cg, inertiaKgM2 } = balance(bodies);
    within(cg[0], 125);
    const own = (0.1 * 0.5 ** 2) / 12;
    within(inertiaKgM2.zz, 2 * own + 2 * 0.1 * 0.125 ** 2);
    within(inertiaKgM2.xx, own);
    within(inertiaKgM2.yy, own + 2 * 0.1 * 0.125 ** 2);
  });
  it('radius of gyration: a ring of point masses lies all at its radius', () => {
    const ring = Array.from({ length: 12 }, (_, index): Weighed => {
      const turn = (2 * Math.PI * index) / 12;
      return { key: `${index}`, massG: 5, at: [40 + 130 * Math.cos(turn), 130 * Math.sin(turn), 9] };
    });
    const { roll, pitch, yaw } = gyrationMm(balance(ring));
    within(yaw, 130);
    within(roll, 130 / Math.SQRT2);
    within(pitch, 130 / Math.SQRT2);
  });
});

const bodies = fc.array(
  fc.record({
    massG: fc.integer({ min: 1, max: 400 }),
    at: fc.tuple(
      fc.integer({ min: -300, max: 700 }),
      fc.integer({ min: -500, max: 500 }),
      fc.integer({ min: -90, max: 90 }),
    ),
    to: fc.tuple(
      fc.integer({ min: -200, max: 200 }),
      fc.integer({ min: -200, max: 200 }),
      fc.integer({ min: -60, max: 60 }),
    ),
  }),
  { minLength: 1, maxLength: 8 },
);
type Bodies = readonly { readonly massG: number; readonly at: Vec3; readonly to: Vec3 }[];
const rods = (list: Bodies, k = 1): Weighed[] =>
  list.map(({ massG, at, to }, index) => {
    const heavy = massG * k ** 3;
    const end: Vec3 = [to[0] * k, to[1] * k, to[2] * k];
    return {
      key: `b${index}`,
      massG: heavy,
      at: [at[0] * k, at[1] * k, at[2] * k],
      spread: rodSpread(heavy, [0, 0, 0], end),
    };
  });
const keys = ['xx', 'yy', 'zz', 'xy', 'xz', 'yz'] as const;
const close = (value: number, expected: number, size: number) =>
  expect(Math.abs(value - expected)).toBeLessThanOrEqual(1e-9 * size + 1e-15);

describe('what holds for any bodies', () => {
  it('weighed in parts, the whole has the same CG and inertia', () => {
    fc.assert(
      fc.property(bodies, fc.nat({ max: 7 }), (list, cut) => {
        const all = rods(list);
        const whole = balance(all);
        const groups = [all.slice(0, cut), all.slice(cut)].filter((group) => group.length > 0);
        const parts = groups.map((group, index): Weighed => {
          const { massG, cg, inertiaKgM2: i } = balance(group);
          // Back from moments to the integrals of x^2, y^2, z^2 in g mm2.
          const spread = {
            xx: ((i.yy + i.zz - i.xx) / 2) * 1e9,
            yy: ((i.xx + i.zz - i.yy) / 2) * 1e9,
            zz: ((i.xx + i.yy - i.zz) / 2) * 1e9,
            xy: i.xy * 1e9,
            xz: i.xz * 1e9,
            yz: i.yz * 1e9,
          };
          return { key: `g${index}`, massG, at: cg, spread };
        });
        const again = balance(parts);
        for (const axis of [0, 1, 2] as const) expect(again.cg[axis]).toBeCloseTo(whole.cg[axis], 8);
        const size = whole.inertiaKgM2.xx + whole.inertiaKgM2.yy + whole.inertiaKgM2.zz;
        for (const key of keys) close(again.inertiaKgM2[key], whole.inertiaKgM2[key], size);
      }),
    );
  });
  it('with its mirror image beside it, the CG lies in the centre plane and no product crosses it', () => {
    fc.assert(
      fc.property(bodies, (list) => {
        const own = rods(list);
        const image = own.map(({ at: [x, y, z], spread, ...rest }): Weighed => {
          if (!spread) throw new RangeError('every body has a spread');
          return { ...rest, at: [x, -y, z], spread: mirrorSpread(spread) };
        });
        const { cg, inertiaKgM2 } = balance([...own, ...image]);
        expect(cg[1]).toBeCloseTo(0, 9);
        close(inertiaKgM2.xy, 0, inertiaKgM2.zz);
        close(inertiaKgM2.yz, 0, inertiaKgM2.zz);
      }),
    );
  });
  it('lengths times k and masses times k^3 give k^5 of the inertia and k of every radius', () => {
    fc.assert(
      fc.property(bodies, fc.double({ min: 0.2, max: 4, noNaN: true }), (list, k) => {
        const [small, large] = [balance(rods(list)), balance(rods(list, k))];
        const size = large.inertiaKgM2.xx + large.inertiaKgM2.yy + large.inertiaKgM2.zz;
        for (const key of keys) close(large.inertiaKgM2[key], small.inertiaKgM2[key] * k ** 5, size);
        expect(gyrationMm(large).pitch).toBeCloseTo(gyrationMm(small).pitch * k, 6);
      }),
    );
  });
  it('moved as a whole, only the CG moves', () => {
    fc.assert(
      fc.property(
        bodies,
        fc.tuple(fc.integer({ min: -900, max: 900 }), fc.integer({ min: -90, max: 90 })),
        (list, [dx, dz]) => {
          const here = balance(rods(list));
          const there = balance(
            rods(list).map((body) => ({ ...body, at: [body.at[0] + dx, body.at[1], body.at[2] + dz] })),
          );
          expect(there.cg[0] - here.cg[0]).toBeCloseTo(dx, 8);
          expect(there.cg[2] - here.cg[2]).toBeCloseTo(dz, 8);
          const size = here.inertiaKgM2.xx + here.inertiaKgM2.yy + here.inertiaKgM2.zz + 1e-6;
          for (const key of keys) close(there.inertiaKgM2[key], here.inertiaKgM2[key], size);
        },
      ),
    );
  });
  it('no moment is more than the other two together, and no product more than they allow', () => {
    fc.assert(
      fc.property(bodies, (list) => {
        const { xx, yy, zz, xz } = balance(rods(list)).inertiaKgM2;
        const slack = 1e-12 * (xx + yy + zz) + 1e-18;
        expect(xx).toBeLessThanOrEqual(yy + zz + slack);
        expect(yy).toBeLessThanOrEqual(xx + zz + slack);
        expect(zz).toBeLessThanOrEqual(xx + yy + slack);
        // The mean square of x and z bounds their product (Cauchy and Schwarz): (xz)^2 <= sum x^2 times sum z^2.
        const [sumX, sumZ] = [(yy + zz - xx) / 2, (xx + yy - zz) / 2];
        expect(xz * xz).toBeLessThanOrEqual(sumX * sumZ + slack * (xx + yy + zz));
      }),
    );
  });
});
