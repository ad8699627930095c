import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { lateralModesOf, lateralSystem, type SideDerivatives } from './lateral';
import { type LongitudinalDerivatives, longitudinalModesOf, longitudinalSystem } from './longitudinal';
import { manoeuvreMargin, pitchRateDegSPerG, pullOf, withNeutralPointMoved } from './manoeuvre';
import { type FlightPoint, levelLift, stabilityInertia } from './point';
import { dampingOf, naturalRadSOf } from './roots';

// A trainer of 1.2 m and 0.8 kg at 12 m/s. Derivatives of that order; only what follows from the equations is asserted.
const POINT: FlightPoint = {
  massG: 800,
  inertiaKgM2: { xx: 0.03, yy: 0.045, zz: 0.07, xz: 0.002 },
  areaMm2: 240_000,
  chordMm: 200,
  spanMm: 1200,
  speedMs: 12,
  densityKgM3: 1.225,
};
const PITCH: LongitudinalDerivatives = {
  alpha: { lift: 4.7, pitch: -0.9 },
  pitchRate: { lift: 8.7, pitch: -14.6 },
  drag: 0.05,
  dragAlpha: 0.3,
};
const SIDE: SideDerivatives = {
  beta: { side: -0.3, roll: -0.06, yaw: 0.13 },
  rollRate: { side: 0.05, roll: -0.44, yaw: -0.03 },
  yawRate: { side: 0.25, roll: 0.12, yaw: -0.15 },
};
const ELEVATOR = { lift: -0.01, pitch: 0.03 };

const shortPeriod = (point: FlightPoint, d: LongitudinalDerivatives) => longitudinalModesOf(point, d).shortPeriod;

/** Every length k times as large, alike in shape, at the same Froude number and in the same air relative to its mass. */
const alike = (point: FlightPoint, k: number): FlightPoint => ({
  massG: point.massG * k ** 3,
  inertiaKgM2: {
    xx: point.inertiaKgM2.xx * k ** 5,
    yy: point.inertiaKgM2.yy * k ** 5,
    zz: point.inertiaKgM2.zz * k ** 5,
    xz: point.inertiaKgM2.xz * k ** 5,
  },
  areaMm2: point.areaMm2 * k ** 2,
  chordMm: point.chordMm * k,
  spanMm: point.spanMm * k,
  speedMs: point.speedMs * Math.sqrt(k),
  densityKgM3: point.densityKgM3,
});

const factor = fc.double({ min: 0.1, max: 10, noNaN: true });

describe('Froude scaling', () => {
  it('times grow by the root of the size, damping ratios stay, in all modes', () => {
    fc.assert(
      fc.property(factor, (k) => {
        const [small, large] = [POINT, alike(POINT, k)];
        const modes = (point: FlightPoint) => {
          const { shortPeriod: fast, phugoid } = longitudinalModesOf(point, PITCH);
          const { dutchRoll, rollSpiral } = lateralModesOf(point, 0.05, SIDE);
          return [fast, phugoid, dutchRoll, rollSpiral];
        };
        const before = modes(small);
        for (const [i, mode] of modes(large).entries()) {
          const other = before[i];
          if (!other) throw new RangeError('a mode is missing');
          expect(mode.kind).toBe(other.kind);
          if (mode.kind === 'aperiodic' && other.kind === 'aperiodic') {
            for (const [j, rate] of mode.ratesPerS.entries())
              expect((rate * Math.sqrt(k)) / (other.ratesPerS[j] ?? 0)).toBeCloseTo(1, 6);
          } else {
            expect(((naturalRadSOf(mode) ?? 0) * Math.sqrt(k)) / (naturalRadSOf(other) ?? 1)).toBeCloseTo(1, 6);
            expect(dampingOf(mode)).toBeCloseTo(dampingOf(other) ?? 0, 8);
          }
        }
      }),
      { numRuns: 30 },
    );
  });

  it('a degree of elevator adds the same load factor at any size, and the same manoeuvre margin', () => {
    fc.assert(
      fc.property(factor, (k) => {
        expect(pullOf(alike(POINT, k), PITCH, ELEVATOR)).toBeCloseTo(pullOf(POINT, PITCH, ELEVATOR) ?? 0, 10);
        expect(manoeuvreMargin(alike(POINT, k), PITCH)).toBeCloseTo(manoeuvreMargin(POINT, PITCH), 10);
      }),
    );
  });
});

describe('inertia', () => {
  it('more pitch inertia lowers the short period’s frequency and leaves pull and margin alone', () => {
    const heavy = { ...POINT, inertiaKgM2: { ...POINT.inertiaKgM2, yy: 0.09 } };
    expect(naturalRadSOf(shortPeriod(heavy, PITCH))).toBeLessThan(
      (naturalRadSOf(shortPeriod(POINT, PITCH)) ?? 0) * 0.8,
    );
    expect(pullOf(heavy, PITCH, ELEVATOR)).toBe(pullOf(POINT, PITCH, ELEVATOR));
    expect(manoeuvreMargin(heavy, PITCH)).toBe(manoeuvreMargin(POINT, PITCH));
  });

  it('turned into stability axes it keeps its trace and its invariant, and a rod along the stream has none about it', () => {
    fc.assert(
      fc.property(fc.double({ min: -1.5, max: 1.5, noNaN: true }), (alpha) => {
        const { xx, yy, zz, xz } = stabilityInertia(POINT.inertiaKgM2, alpha);
        const before = POINT.inertiaKgM2;
        expect(xx + zz).toBeCloseTo(before.xx + before.zz, 12);
        expect(xx * zz - xz ** 2).toBeCloseTo(before.xx * before.zz - before.xz ** 2, 12);
        expect(yy).toBe(before.yy);
        // A rod of unit moment that points nose-down by alpha in the aircraft: x aft, z up, so its product is negative.
        const [c, s] = [Math.cos(alpha), Math.sin(alpha)];
        const rod = stabilityInertia({ xx: s * s, yy: 1, zz: c * c, xz: c * s }, alpha);
        expect(rod.xx).toBeCloseTo(0, 12);
        expect(rod.xz).toBeCloseTo(0, 12);
      }),
    );
  });

  it('with yaw held by a huge inertia, roll alone has the time constant of its own damping', () => {
    const stiff = { ...POINT, inertiaKgM2: { xx: 0.03, yy: 0.045, zz: 1e6, xz: 0 } };
    const { matrix } = lateralSystem(stiff, 0, SIDE);
    // -Ix / (q S b Clp b / 2V), by hand: q S = 0.5 * 1.225 * 144 * 0.24 = 21.168 N.
    const byHand = 0.03 / (21.168 * 1.2 * 0.44 * (1.2 / 24));
    expect(-1 / matrix[1][1]).toBeCloseTo(byHand, 9);
  });

  it.each([
    { name: 'no mass', over: { massG: 0 } },
    { name: 'no speed', over: { speedMs: 0 } },
    { name: 'no air', over: { densityKgM3: Number.NaN } },
    { name: 'no pitch inertia', over: { inertiaKgM2: { ...POINT.inertiaKgM2, yy: 0 } } },
    { name: 'a product that no mass has', over: { inertiaKgM2: { ...POINT.inertiaKgM2, xz: 0.05 } } },
  ])('refuses $name', ({ over }) => {
    expect(() => longitudinalModesOf({ ...POINT, ...over }, PITCH)).toThrow(RangeError);
    expect(() => lateralModesOf({ ...POINT, ...over }, 0, SIDE)).toThrow(RangeError);
  });
});

describe('pull-ups', () => {
  /** Derivatives about a point further aft by h chords: Etkin & Reid, moment centre shift. */
  const about = (h: number): LongitudinalDerivatives => {
    const { alpha, pitchRate } = PITCH;
    const pitch = alpha.pitch + h * alpha.lift;
    return {
      ...PITCH,
      alpha: { lift: alpha.lift, pitch },
      pitchRate: {
        lift: pitchRate.lift - 2 * h * alpha.lift,
        pitch: pitchRate.pitch + h * pitchRate.lift - 2 * h * pitch,
      },
    };
  };

  it('the manoeuvre point stays where it is when the CG moves, so an aft CG has less margin by as much', () => {
    fc.assert(
      fc.property(fc.double({ min: -0.5, max: 0.5, noNaN: true }), (h) => {
        expect(manoeuvreMargin(POINT, about(h)) + h).toBeCloseTo(manoeuvreMargin(POINT, PITCH), 10);
      }),
    );
  });

  it('lies aft of the neutral point by what pitch damping gives, and at it without damping', () => {
    const static_ = 0.9 / 4.7;
    expect(manoeuvreMargin(POINT, { ...PITCH, pitchRate: { lift: 0, pitch: 0 } })).toBeCloseTo(static_, 12);
    // c g / 2 V^2 = 0.00681005 and CW = 0.8 * 9.80665 / 21.168: by hand.
    const rate = (0.2 * 9.80665) / (2 * 144);
    const weight = (0.8 * 9.80665) / 21.168;
    expect(levelLift(POINT)).toBeCloseTo(weight, 12);
    const byHand = static_ * (1 - (8.7 * rate) / weight) + (14.6 * rate) / weight;
    expect(manoeuvreMargin(POINT, PITCH)).toBeCloseTo(byHand, 12);
  });

  it('pulls more and more towards the manoeuvre point, and has no pull behind it', () => {
    const margin = manoeuvreMargin(POINT, PITCH);
    const pulls = [0, 0.5, 0.9, 0.99].map((share) => pullOf(POINT, about(share * margin), ELEVATOR) ?? 0);
    expect([...pulls].sort((a, b) => a - b)).toEqual(pulls);
    expect(pulls.at(-1)).toBeGreaterThan(30 * (pulls[0] ?? 0));
    expect(pullOf(POINT, about(margin + 1e-6), ELEVATOR)).toBeNull();
  });

  it('is the state in which the equations of motion stand still but for the turn of the path', () => {
    const pull = pullOf(POINT, PITCH, ELEVATOR) ?? 0;
    const rate = (pitchRateDegSPerG(POINT) * pull * Math.PI) / 180;
    expect(rate).toBeCloseTo((9.80665 * pull) / 12, 12);
    const { matrix, input } = longitudinalSystem(POINT, { ...PITCH, drag: 0 });
    const b = input(ELEVATOR);
    // Of the pitch equation: the angle of attack that holds the moment; then the angle of attack must not change either.
    const alpha = -(b[2] + matrix[2][2] * rate) / matrix[2][1];
    expect(matrix[1][1] * alpha + matrix[1][2] * rate + b[1]).toBeCloseTo(0, 10);
  });

  it('a neutral point further aft adds its shift to the margin, as a share of what a pull-up leaves of it', () => {
    const moved = withNeutralPointMoved(PITCH, 0.05);
    expect(moved.alpha.pitch / moved.alpha.lift).toBeCloseTo(-0.9 / 4.7 - 0.05, 12);
    const left = 1 - (8.7 * 0.2 * 9.80665) / (2 * 144) / levelLift(POINT);
    expect(manoeuvreMargin(POINT, moved) - manoeuvreMargin(POINT, PITCH)).toBeCloseTo(0.05 * left, 12);
  });
});
