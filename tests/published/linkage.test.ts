import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { hornAngleRad, layFourBar, leversAt, servoAngleRad } from '@/lib/linkage/fourBar';
import { allMovingByTurn, hingeByAlpha, hingeByTurn, hingeMomentNmm } from '@/lib/linkage/hingeMoment';
import { LOW_REYNOLDS_SHARE } from '@/lib/linkage/practice';
import { bucklingForceN, freeLengthMm } from '@/lib/linkage/rod';
import { NMM_PER_KG_CM } from '@/lib/linkage/servo';
import { degFromRad, radFromDeg } from '@/lib/numerics/vec';

describe('hinge moment of a plain flap (Glauert, ARC R&M 1095, 1927; Etkin & Reid, Dynamics of Flight, app. B)', () => {
  // Glauert's pressure of a flat plate with a flap, dCp = 4 [A0 cot(t/2) + (1/pi) ln |sin((t+h)/2) / sin((t-h)/2)|], integrated over the
  // flap numerically apart from this project (400 000 midpoints); the closed forms under test are another way to the same integral.
  it.each([
    [0.2, -0.49938, -0.92288],
    [0.25, -0.56535, -0.94361],
    [0.3, -0.62741, -0.9654],
    [0.4, -0.7448, -1.01266],
    [0.5, -0.85841, -1.06582],
  ])('flap of %d of the chord: b1 %d, b2 %d', (share, b1, b2) => {
    expect(hingeByAlpha(share)).toBeCloseTo(b1, 4);
    expect(hingeByTurn(share)).toBeCloseTo(b2, 4);
  });

  it('the whole chord about its leading edge: lift 2 pi at the quarter chord, so both are -pi/2', () => {
    expect(hingeByAlpha(1)).toBeCloseTo(-Math.PI / 2, 12);
    expect(hingeByTurn(1)).toBeCloseTo(-Math.PI / 2, 12);
    expect(allMovingByTurn(0, 0)).toBeCloseTo(-Math.PI / 2, 12);
    expect(allMovingByTurn(0.25, 0)).toBeCloseTo(0, 12);
  });

  it('a vanishing flap: b1 goes to 0, b2 to -8 / (3 pi) = -0.8488', () => {
    // Expansion of both integrals for small shares.
    expect(hingeByAlpha(1e-3)).toBeCloseTo(-(8 / 15) * 2 * Math.sqrt(1e-3), 3);
    expect(hingeByTurn(1e-3)).toBeCloseTo(-8 / (3 * Math.PI), 2);
  });

  it('both grow with the flap, and a flap outside the chord is refused', () => {
    const shares = [0.05, 0.1, 0.2, 0.4, 0.6, 0.8, 1];
    for (const coefficient of [hingeByAlpha, hingeByTurn]) {
      const values = shares.map(coefficient);
      expect(values).toEqual([...values].sort((a, b) => b - a));
      expect(() => coefficient(1.01)).toThrow(RangeError);
      expect(() => coefficient(0)).toThrow(RangeError);
    }
  });

  it('common practice, no source: aileron 350 x 50 mm, 20 degrees, 30 m/s, Ch 0.2 to 0.3 is 1.0 to 1.5 kg cm', () => {
    const pressurePa = 0.5 * 1.225 * 30 ** 2;
    const kgCm = (ch: number) => hingeMomentNmm(pressurePa, ch, 350 * 50 ** 2) / NMM_PER_KG_CM;
    expect(kgCm(0.2)).toBeCloseTo(1, 1);
    expect(kgCm(0.3)).toBeCloseTo(1.5, 1);
    // And that is where a flap of a quarter of the chord comes out, inside the band for low Reynolds numbers.
    const ch = Math.abs(hingeByTurn(0.25)) * radFromDeg(20);
    expect(ch * LOW_REYNOLDS_SHARE.value.low).toBeLessThan(0.2);
    expect(ch * LOW_REYNOLDS_SHARE.value.high).toBeGreaterThan(0.3);
  });
});

describe('four-bar linkage', () => {
  it('Norton, Design of Machinery, position analysis example (from memory): links 100, 40, 120, 80, crank at 40 degrees, rocker at 57.33', () => {
    // Ground 100, crank 40, coupler 120, rocker 80. His angles run from the ground line; ours from the square to it, aft. Our neutral has the
    // rocker upright, where the crank stands at the angle that the two triangles over the diagonal give.
    const diagonal = Math.hypot(100, 80);
    const crankAtNeutral = Math.atan2(80, 100) + Math.acos((40 ** 2 + diagonal ** 2 - 120 ** 2) / (2 * 40 * diagonal));
    const bar = {
      shaft: [-100, 0],
      armMm: 40,
      hornMm: 80,
      rodLengthMm: 120,
      armRad: Math.PI / 2 - crankAtNeutral,
    } as const;
    const horn = hornAngleRad(bar, crankAtNeutral - radFromDeg(40));
    // Printed to two decimals.
    expect(Math.abs(90 - degFromRad(horn ?? Number.NaN) - 57.33)).toBeLessThan(0.01);
    expect(degFromRad(servoAngleRad(bar, radFromDeg(90 - 57.325)) ?? Number.NaN)).toBeCloseTo(
      degFromRad(crankAtNeutral) - 40,
      1,
    );
  });

  it('a parallelogram turns both ends alike (every textbook of kinematics)', () => {
    const bar = layFourBar([-73, 0], 11, 11);
    if (!bar) throw new RangeError('no room');
    for (const deg of [-60, -25, 10, 45, 70]) {
      expect(degFromRad(hornAngleRad(bar, radFromDeg(deg)) ?? Number.NaN)).toBeCloseTo(deg, 9);
      expect(leversAt(bar, radFromDeg(deg))?.ratio).toBeCloseTo(1, 9);
    }
  });

  it("holds Freudenstein's equation (Freudenstein, Approximate Synthesis of Four-Bar Linkages, Trans. ASME 77, 1955): K1 cos f - K2 cos c + K3 = cos(c - f)", () => {
    const size = (min: number, max: number) => fc.double({ min, max, noNaN: true });
    fc.assert(
      fc.property(size(50, 200), size(5, 12), size(12, 25), size(-0.7, 0.7), (ground, arm, horn, servo) => {
        const bar = layFourBar([-ground, 0], arm, horn);
        const rocker = bar && hornAngleRad(bar, servo);
        fc.pre(bar !== null && rocker !== null);
        if (!bar || rocker === null) return;
        const [c, f] = [Math.PI / 2 - bar.armRad - servo, Math.PI / 2 - rocker];
        const k3 = (arm ** 2 - bar.rodLengthMm ** 2 + horn ** 2 + ground ** 2) / (2 * arm * horn);
        const left = (ground / arm) * Math.cos(f) - (ground / horn) * Math.cos(c) + k3;
        expect(left).toBeCloseTo(Math.cos(c - f), 8);
      }),
    );
  });
});

describe("Euler column with pinned ends (Young & Budynas, Roark's Formulas for Stress and Strain; Timoshenko)", () => {
  it('1.2 mm steel wire, 150 mm: I 0.101788 mm4, pi2 x 200 000 x 0.101788 / 22 500 = 8.930 N', () => {
    expect(bucklingForceN(1.2, 150)).toBeCloseTo(8.93, 3);
  });

  it('2.5 mm carbon, 400 mm: I 1.917476 mm4, pi2 x 110 000 x 1.917476 / 160 000 = 13.011 N', () => {
    expect(bucklingForceN(2.5, 400)).toBeCloseTo(13.011, 2);
  });

  it('twice the length carries a quarter, and the free length is where it just buckles', () => {
    expect(bucklingForceN(1.2, 300)).toBeCloseTo(bucklingForceN(1.2, 150) / 4, 12);
    expect(bucklingForceN(1.5, freeLengthMm(1.5, 4.2))).toBeCloseTo(4.2, 9);
    expect(() => bucklingForceN(1.2, 0)).toThrow(RangeError);
  });

  it('common practice, no source: 150 mm of free 1.2 mm wire carries half the stall torque of a 9 g servo on an 8 mm arm', () => {
    expect(bucklingForceN(1.2, 150)).toBeGreaterThan((0.5 * 1.25 * 98.0665) / 8);
  });
});
