import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { type FourBar, hornAngleRad, layFourBar, leversAt, servoAngleRad } from './fourBar';

const laid = (shaft: readonly [number, number], armMm: number, hornMm: number): FourBar => {
  const bar = layFourBar(shaft, armMm, hornMm);
  if (!bar) throw new RangeError('no room for a rod');
  return bar;
};
/** Servo a rod's length ahead or behind, arm parallel to the horn. */
const parallel = (armMm: number, hornMm: number, rodMm = 90): FourBar => laid([-rodMm, hornMm - armMm], armMm, hornMm);

const anyBar = fc
  .record({
    x: fc.double({ min: -300, max: -40, noNaN: true }),
    z: fc.double({ min: -20, max: 20, noNaN: true }),
    arm: fc.double({ min: 5, max: 14, noNaN: true }),
    horn: fc.double({ min: 8, max: 25, noNaN: true }),
  })
  .map(({ x, z, arm, horn }) => laid([x, z], arm, horn));
const turn = fc.double({ min: -0.6, max: 0.6, noNaN: true });

describe('layFourBar', () => {
  it('gives arm, rod and horn the lengths that the drawing has: a rectangle', () => {
    const bar = parallel(9, 9, 80);
    expect(bar.rodLengthMm).toBeCloseTo(80, 10);
    expect(bar.armRad).toBeCloseTo(0, 10);
  });

  it('meets the arm at a right angle at neutral: the lever of the rod is the whole arm', () => {
    fc.assert(
      fc.property(anyBar, (bar) => {
        expect(leversAt(bar, 0)?.armMm).toBeCloseTo(bar.armMm, 9);
      }),
    );
  });

  it('has no room for a rod when the servo stands within an arm of the horn', () => {
    expect(layFourBar([-6, 12], 8, 12)).toBeNull();
    expect(layFourBar([-9, 12], 8, 12)).not.toBeNull();
  });
});

describe('forward and back', () => {
  it('neutral is neutral', () => {
    fc.assert(
      fc.property(anyBar, (bar) => {
        expect(hornAngleRad(bar, 0)).toBeCloseTo(0, 9);
        expect(servoAngleRad(bar, 0)).toBeCloseTo(0, 9);
      }),
    );
  });

  it('the inverse of forward is the identity, and the rod keeps its length', () => {
    fc.assert(
      fc.property(anyBar, turn, (bar, servo) => {
        const horn = hornAngleRad(bar, servo);
        fc.pre(horn !== null);
        if (horn === null) return;
        expect(servoAngleRad(bar, horn)).toBeCloseTo(servo, 6);
        const end = [
          bar.shaft[0] + bar.armMm * Math.sin(bar.armRad + servo),
          bar.shaft[1] + bar.armMm * Math.cos(bar.armRad + servo),
        ] as const;
        const hole = [bar.hornMm * Math.sin(horn), bar.hornMm * Math.cos(horn)] as const;
        expect(Math.hypot(end[0] - hole[0], end[1] - hole[1])).toBeCloseTo(bar.rodLengthMm, 8);
      }),
    );
  });

  it('a linkage mirrored fore and aft turns as much the other way', () => {
    fc.assert(
      fc.property(anyBar, turn, (bar, servo) => {
        const mirrored = laid([-bar.shaft[0], bar.shaft[1]], bar.armMm, bar.hornMm);
        const [one, other] = [hornAngleRad(bar, servo), hornAngleRad(mirrored, -servo)];
        if (one === null || other === null) expect(one).toBe(other);
        else expect(other).toBeCloseTo(-one, 9);
      }),
    );
  });

  it('a longer horn gives less throw, a longer arm more', () => {
    fc.assert(
      fc.property(
        fc.double({ min: 6, max: 10, noNaN: true }),
        fc.double({ min: 12, max: 20, noNaN: true }),
        fc.double({ min: 0.1, max: 0.7, noNaN: true }),
        fc.double({ min: 0.5, max: 4, noNaN: true }),
        (arm, horn, servo, more) => {
          const throwOf = (bar: FourBar) => Math.abs(hornAngleRad(bar, servo) ?? Number.NaN);
          expect(throwOf(parallel(arm, horn + more))).toBeLessThan(throwOf(parallel(arm, horn)));
          expect(throwOf(parallel(arm + more, horn))).toBeGreaterThan(throwOf(parallel(arm, horn)));
        },
      ),
    );
  });

  it('the levers give the slope of the curve', () => {
    fc.assert(
      fc.property(anyBar, fc.double({ min: -0.4, max: 0.4, noNaN: true }), (bar, servo) => {
        const step = 1e-5;
        const [low, high] = [hornAngleRad(bar, servo - step), hornAngleRad(bar, servo + step)];
        const levers = leversAt(bar, servo);
        fc.pre(low !== null && high !== null && levers !== null && Math.abs(levers.ratio) < 3);
        if (low === null || high === null || levers === null) return;
        expect((high - low) / (2 * step)).toBeCloseTo(levers.ratio, 4);
        expect(Math.abs(levers.ratio)).toBeCloseTo(levers.armMm / levers.hornMm, 9);
      }),
    );
  });
});

describe('dead centres', () => {
  it('an arm longer than the horn drives it to a dead centre, and then there is no answer', () => {
    const bar = parallel(16, 10, 60);
    expect(hornAngleRad(bar, 0.5)).not.toBeNull();
    expect(hornAngleRad(bar, 1)).toBeNull();
    expect(leversAt(bar, 1)).toBeNull();
  });

  it('a horn longer than the arm cannot be turned further than the arm carries it', () => {
    const bar = parallel(8, 16);
    expect(servoAngleRad(bar, 0.4)).not.toBeNull();
    expect(servoAngleRad(bar, 0.7)).toBeNull();
  });

  it('never answers with a number that is none', () => {
    fc.assert(
      fc.property(anyBar, fc.double({ min: -3, max: 3, noNaN: true }), (bar, angle) => {
        for (const found of [hornAngleRad(bar, angle), servoAngleRad(bar, angle)]) {
          if (found !== null) expect(Number.isFinite(found)).toBe(true);
        }
      }),
    );
  });
});
