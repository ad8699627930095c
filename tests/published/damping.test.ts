import { describe, expect, it } from 'vitest';
import type { Derivatives } from '@/lib/aero/lattice/derivatives';
import type { LatticeSurface } from '@/lib/aero/lattice/types';
import { wingLiftSlope } from '@/lib/aero/liftSlope';
import { delta, ellipse, FAIR, rectangle, section, solved, wingOf, within } from './support/wings';

const rollDamping = ({ antisymmetric }: Derivatives) => antisymmetric?.rollRate.roll ?? Number.NaN;

describe('roll damping of a wing', () => {
  it('D1: elliptic, aspect ratio 6: 8 to 12 % under the lifting line’s -0.4712 (Glauert; Etkin & Reid), for a surface lifts less', () => {
    const ratio = rollDamping(wingOf(ellipse((6 * Math.PI) / 4, 1, 0.25), FAIR)) / -0.4712;
    expect(ratio).toBeGreaterThan(0.88);
    expect(ratio).toBeLessThan(0.92);
  });

  it.each([
    [8, -0.5236],
    [10, -0.561],
    [20, -0.6545],
  ])('D1: elliptic, aspect ratio %d: under the lifting line’s %d, and nearer than at 6', (aspectRatio, line) => {
    const ratio = rollDamping(wingOf(ellipse((aspectRatio * Math.PI) / 4, 1, 0.25), FAIR)) / line;
    expect(ratio).toBeGreaterThan(0.9);
    expect(ratio).toBeLessThan(1);
  });

  it.each([0.05, 0.1])(
    'D3: slender delta of aspect ratio %d: -pi A / 32 (Ribner, NACA TN 1423), within 4 %%',
    (aspectRatio) => {
      const got = rollDamping(wingOf(delta(aspectRatio), { strips: 16, rows: 16 }));
      within(got, (-Math.PI * aspectRatio) / 32, 0.04);
    },
  );

  it('D4: a rectangle damps less than strip theory’s a0 / 6 = 1.047, and comes nearer the longer it is', () => {
    const values = [6, 20, 60, 200, 1000].map((a) => rollDamping(wingOf(rectangle(a), { strips: 24, rows: 4 })));
    for (const [k, value] of values.entries()) {
      expect(value).toBeGreaterThan(-Math.PI / 3);
      expect(value).toBeLessThan(values[k - 1] ?? 0);
    }
    expect(values.at(-1)).toBeLessThan(-0.95);
  });
});

// A trainer: wing 1.2 by 0.20 m with 5 degrees of dihedral outboard, tail 0.44 by 0.13 at 0.62, fin 0.16/0.10 by 0.18 at 0.60, CG 0.07.
const WING: LatticeSurface = {
  id: 'wing',
  mirrored: true,
  strips: 10,
  rows: 5,
  sections: [section(0, 0, 0.2), section(0, 0.3, 0.2), section(0, 0.6, 0.2, 0.0262466)],
};
const TAIL: LatticeSurface = {
  id: 'tail',
  mirrored: true,
  strips: 6,
  rows: 4,
  sections: [section(0.62, 0, 0.13, 0.02), section(0.62, 0.22, 0.13, 0.02)],
};
const FIN: LatticeSurface = {
  id: 'fin',
  mirrored: false,
  strips: 5,
  rows: 4,
  sections: [section(0.6, 0, 0.16, 0.02), section(0.66, 0, 0.1, 0.2)],
};
const trainer = (surfaces: readonly LatticeSurface[], h = 0) =>
  solved({ surfaces, controls: [], reference: { area: 0.24, chord: 0.2, span: 1.2, point: [0.07 + h * 0.2, 0, 0] } });

it('D5: the moment centre h chords further aft shifts the rate derivatives by algebra alone (Etkin & Reid), 1e-9', () => {
  const h = 0.31;
  const [a, b] = [trainer([WING, TAIL]).symmetric, trainer([WING, TAIL], h).symmetric];
  const near = (got: number, expected: number) => expect(Math.abs(got - expected)).toBeLessThan(1e-9);
  near(b.neutralPointX, a.neutralPointX);
  near(b.pitchRate.lift, a.pitchRate.lift - 2 * h * a.alpha.lift);
  near(b.pitchRate.pitch, a.pitchRate.pitch + h * a.pitchRate.lift - 2 * h * (a.alpha.pitch + h * a.alpha.lift));
});

describe('D6: what a tail damps, Cm_q = -2 a_t V_H l_t / c, CL_q = 2 a_t V_H (Nelson, Flight Stability, table 3.3)', () => {
  // Arm from the CG to the tail's quarter chord 0.5825, volume 0.0572 x 0.5825 / (0.24 x 0.20) = 0.694.
  const arm = 0.5825;
  const volume = (0.0572 * arm) / (0.24 * 0.2);
  const slope = wingLiftSlope(0.44 / 0.13, 0);
  const [whole, tailless] = [trainer([WING, TAIL, FIN]).symmetric, trainer([WING, FIN]).symmetric];

  it('the tail’s share of the lattice’s Cm_q and CL_q within 15 %', () => {
    expect(volume).toBeCloseTo(0.694, 3);
    within(whole.pitchRate.pitch - tailless.pitchRate.pitch, (-2 * slope * volume * arm) / 0.2, 0.15);
    within(whole.pitchRate.lift - tailless.pitchRate.lift, 2 * slope * volume, 0.15);
  });
});

describe('D7: a fin, Cn_beta = a_v V_v, Cn_r = -2 a_v V_v l_v / b (Nelson), a_v by its own aspect ratio, no end plate', () => {
  // Area 0.0234, aspect ratio 0.18^2 / 0.0234, its mean chord's quarter point 0.5908 behind the CG, half-chord sweep atan(1 / 6).
  const area = 0.0234;
  const arm = 0.5908;
  const volume = (area * arm) / (0.24 * 1.2);
  const slope = wingLiftSlope(0.18 ** 2 / area, Math.atan(1 / 6));
  const share = (others: readonly LatticeSurface[]) => {
    const [full, bare] = [trainer([...others, FIN]).antisymmetric, trainer(others).antisymmetric];
    if (!full || !bare) throw new RangeError('not solved for yaw');
    return { yaw: full.beta.yaw - bare.beta.yaw, damping: full.yawRate.yaw - bare.yawRate.yaw };
  };

  it('with nothing at its foot, within 25 %', () => {
    const { yaw, damping } = share([WING]);
    within(yaw, slope * volume, 0.25);
    within(damping, (-2 * slope * volume * arm) / 1.2, 0.25);
  });

  it('a tailplane at its foot is an end plate and makes it more, by less than the doubled aspect ratio of a plate without end', () => {
    const { yaw } = share([WING, TAIL]);
    expect(yaw).toBeGreaterThan(share([WING]).yaw * 1.2);
    expect(yaw).toBeLessThan(wingLiftSlope((2 * 0.18 ** 2) / area, Math.atan(1 / 6)) * volume * 1.1);
  });
});
