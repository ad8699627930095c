import { describe, expect, it } from 'vitest';
import { closedRollPower, UNIFORM, uniformWing } from '@/tests/support/uniformWing';
import { flexibilityOf, type Twist, type TwistInput, twistOf } from './twist';

function twist(input: TwistInput): Twist {
  const found = twistOf(input);
  if (!found) throw new RangeError('no power');
  return found;
}
const rad = (deg: number) => (deg * Math.PI) / 180;

describe('twistOf', () => {
  it.each([5, 10, 15, 20])('at %d m/s gives the closed solution of a uniform wing', (speed) => {
    const closed = closedRollPower(speed, 40);
    const by = (strips: number) => (twist(uniformWing({ strips })).at(speed)?.power ?? Number.NaN) / closed;
    expect(by(16)).toBeCloseTo(1, 2);
    expect(by(60)).toBeCloseTo(1, 3);
  });

  it('loses nothing standing still', () => {
    const still = twist(uniformWing()).at(0);
    expect(still?.power).toBeCloseTo(1, 12);
    expect(still?.tipTurn).toBeCloseTo(0, 12);
  });

  it('reverses where the power changes its sign', () => {
    const wing = twist(uniformWing({ aftMm: 0 }));
    const reversal = wing.reversalMs ?? Number.NaN;
    expect(wing.at(reversal * 0.99)?.power).toBeGreaterThan(0);
    expect(wing.at(reversal * 1.01)?.power).toBeLessThan(0);
  });

  it('reverses no sooner for lift ahead of the axis: at reversal a typical section lifts nothing', () => {
    const ahead = twist(uniformWing({ aftMm: 60 })).reversalMs ?? Number.NaN;
    const behind = twist(uniformWing({ aftMm: 1 })).reversalMs ?? Number.NaN;
    expect(ahead / behind).toBeGreaterThan(0.95);
    expect(ahead / behind).toBeLessThan(1.2);
  });

  it('four times the torsional stiffness doubles both speeds', () => {
    const [soft, stiff] = [1, 4].map((k) => twist(uniformWing({ torsionNmm2: UNIFORM.torsionNmm2 * k })));
    expect((stiff?.reversalMs ?? 0) / (soft?.reversalMs ?? 1)).toBeCloseTo(2, 3);
    expect((stiff?.divergenceMs ?? 0) / (soft?.divergenceMs ?? 1)).toBeCloseTo(2, 3);
  });

  it('does not depend on the unit of length', () => {
    const input = uniformWing({ sweepRad: rad(20), bendingNmm2: 3e6 });
    const k = 3;
    const strips = input.strips.map((s) => ({
      ...s,
      sMm: s.sMm * k,
      widthMm: s.widthMm * k,
      chordMm: s.chordMm * k,
      quarterXMm: s.quarterXMm * k,
      axisXMm: s.axisXMm * k,
      bendingNmm2: s.bendingNmm2 * k ** 4,
      torsionNmm2: s.torsionNmm2 * k ** 4,
      yMm: s.yMm * k,
    }));
    const scaled: TwistInput = {
      ...input,
      strips,
      flexibility: flexibilityOf(strips),
      levers: input.levers.map(({ lift, couple }) => ({ lift: lift * k, couple })),
    };
    expect(twist(scaled).reversalMs).toBeCloseTo(twist(input).reversalMs ?? 0, 6);
    expect(twist(scaled).at(9)?.power).toBeCloseTo(twist(input).at(9)?.power ?? 0, 9);
  });

  it('a wing that bends: sweep forward brings divergence nearer, sweep aft takes it away', () => {
    const divergence = (deg: number) =>
      twist(uniformWing({ aftMm: 5, sweepRad: rad(deg), bendingNmm2: 1e6 })).divergenceMs;
    expect(divergence(-20)).toBeLessThan(divergence(0) ?? 0);
    expect(divergence(25)).toBeNull();
  });

  it('with the axis ahead of the quarter chord nothing diverges', () => {
    expect(twist(uniformWing({ aftMm: -10 })).divergenceMs).toBeNull();
  });

  it('finer strips move the reversal speed of a swept wing by less than half a per cent', () => {
    const coarse = twist(uniformWing({ strips: 16, sweepRad: rad(24), bendingNmm2: 2e6 }));
    const fine = twist(uniformWing({ strips: 60, sweepRad: rad(24), bendingNmm2: 2e6 }));
    expect((coarse.reversalMs ?? 0) / (fine.reversalMs ?? 1)).toBeCloseTo(1, 2);
  });

  it('a control without power has none to lose', () => {
    const input = uniformWing();
    expect(twistOf({ ...input, controls: input.controls.map(() => ({ lift: 0, moment: 0 })) })).toBeNull();
  });
});
