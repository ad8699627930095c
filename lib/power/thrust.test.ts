import { describe, expect, it } from 'vitest';
import { drive } from '@/tests/support/drive';
import { figureOfMerit, idealHover } from './disc';
import { spentSpeedMs, type Thrust, thrustAtN, thrustOf } from './thrust';

const SEA_LEVEL = 1.225;

function of(...drives: ReturnType<typeof drive>[]): Thrust {
  const result = thrustOf({ drives }, SEA_LEVEL);
  if (!result.ok || !result.value) throw new RangeError('no thrust');
  return result.value;
}

describe('thrust from the document', () => {
  it('is what is stated, for each of two motors, without a span', () => {
    expect(of(drive({ statedN: 3.2 })).staticN).toEqual({ value: 3.2, low: 3.2, high: 3.2 });
    expect(of(drive({ statedN: 3.2, mirrored: true })).staticN.value).toBeCloseTo(6.4, 12);
  });

  it('is estimated from the largest power otherwise, never more than physics allows', () => {
    const { staticN, drives } = of(drive({ maxW: 120 }));
    const [only] = drives;
    expect(only?.basis).toBe('estimated');
    expect(staticN.low).toBeLessThan(staticN.value);
    expect(staticN.high).toBeGreaterThan(staticN.value);
    const areaM2 = Math.PI * 0.1 ** 2;
    expect(figureOfMerit(staticN.high, 120, areaM2, SEA_LEVEL)).toBeLessThan(1);
    // Two thirds of the power's logarithm: eight times the power is four times the thrust.
    expect(of(drive({ maxW: 960 })).staticN.value / staticN.value).toBeCloseTo(4, 9);
  });

  it('compares a stated thrust with the motor: over 1 is impossible', () => {
    const ideal = idealHover(5, Math.PI * 0.1 ** 2, SEA_LEVEL).powerW;
    expect(of(drive({ statedN: 5, maxW: ideal })).drives[0]?.merit).toBeCloseTo(1, 9);
    expect(of(drive({ statedN: 5, maxW: ideal / 2 })).drives[0]?.merit).toBeCloseTo(2, 9);
    expect(of(drive({ statedN: 5 })).drives[0]?.merit).toBeNull();
  });

  it('is refused at its own field when nothing says what a motor gives, and null for a glider', () => {
    expect(thrustOf({ drives: [drive({ statedN: 2 }), drive()] }, SEA_LEVEL)).toMatchObject({
      ok: false,
      problems: [{ code: 'no-thrust', path: 'drives.1.statedThrustN' }],
    });
    expect(thrustOf({ drives: [] }, SEA_LEVEL)).toEqual({ ok: true, value: null });
  });
});

describe('thrust against speed', () => {
  const thrust = of(drive({ statedN: 4 }));

  it('falls in a straight line to nothing at pitch speed, and is nothing beyond', () => {
    const end = spentSpeedMs(thrust);
    expect(thrustAtN(thrust, 0)).toBe(4);
    expect(thrustAtN(thrust, end / 4)).toBeCloseTo(3, 12);
    expect(thrustAtN(thrust, end)).toBeCloseTo(0, 12);
    expect(thrustAtN(thrust, 2 * end)).toBe(0);
  });

  it('ends in between for two unlike motors: the faster one still pulls', () => {
    const both = of(drive({ statedN: 4 }), drive({ statedN: 4, pitchMm: 180 }));
    expect(spentSpeedMs(both)).toBeCloseTo(1.5 * spentSpeedMs(thrust), 9);
    const between = 1.2 * spentSpeedMs(thrust);
    expect(thrustAtN(both, between)).toBeCloseTo(4 * (1 - 1.2 / 1.5), 9);
  });

  it('a third blade turns slower for the same thrust', () => {
    expect(spentSpeedMs(of(drive({ statedN: 4, blades: 3 })))).toBeLessThan(spentSpeedMs(thrust));
  });
});
