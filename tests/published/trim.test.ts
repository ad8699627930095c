import { describe, expect, it } from 'vitest';
import type { SurfaceArea, WingReference } from '@/lib/figures/reference';
import { handbookNeutralPointX } from '@/lib/figures/volumes';
import { axisAbout, pitchAxis, trim } from '@/lib/flight/trim';
import { airframe, control, surface } from '@/tests/support/airframe';

describe('A6: Cessna 182 (Roskam, Airplane Flight Dynamics and Automatic Flight Controls I, app. B)', () => {
  // CL0 0.307, CL_alpha 4.41, CL_de 0.43, Cm0 0.04, Cm_alpha -0.613, Cm_de -1.122, CG at 0.264 of the chord.
  const model = {
    reference: { area: 1e6, chord: 1000, span: 6000, point: [264, 0, 0] as const },
    base: { lift: 0.307, pitch: 0.04 },
    alpha: { lift: 4.41, pitch: -0.613 },
    controls: new Map([['wing/elevator', { lift: 0.43, pitch: -1.122 }]]),
  };
  const elevator = control({
    id: 'elevator',
    kind: 'elevator',
    throwsDeg: { up: 28, down: 22, lowShare: 0.7 },
    mix: { pitch: 1, roll: 0, yaw: 0, flap: 0 },
  });
  const axis = pitchAxis(airframe({ surfaces: [surface({ controls: [elevator] })] }), model);

  // The two equations CL = CL0 + CL_alpha alpha + CL_de de and 0 = Cm0 + Cm_alpha alpha + Cm_de de, solved by hand.
  it.each([
    { lift: 0.5, alpha: 2.438, elevator: 0.711 },
    { lift: 1, alpha: 9.3, elevator: -3.038 },
  ])('at CL $lift alpha is $alpha and the elevator $elevator degrees', ({ lift, alpha, elevator: expected }) => {
    const result = axis && trim(axis, { weight: lift, thrust: { lift: 0, liftPerRad: 0, pitch: 0 } });
    if (!result?.ok) throw new RangeError('not trimmed');
    expect(Math.abs((result.value.state.alphaRad * 180) / Math.PI - alpha)).toBeLessThan(0.01);
    expect(Math.abs(result.value.elevatorDeg - expected)).toBeLessThan(0.01);
  });

  it('has its neutral point at 0.403 of the chord, a margin of 0.139: there the moment no longer changes with alpha', () => {
    if (!axis) throw new RangeError('no pitch control');
    expect(axisAbout(axis, 403).alpha.pitch / 4.41).toBeCloseTo(0, 3);
    expect(axis.alpha.pitch / axis.alpha.lift).toBeCloseTo(-0.139, 3);
  });
});

describe('A11: neutral point with a far, small tail (Nelson, Flight Stability and Automatic Control; Etkin & Reid)', () => {
  // h_n = h_ac + V_H (a_t / a_w)(1 - 2 a_w / (pi A)): wing of aspect ratio 8, a_w 4.9058; tail of aspect ratio 4 and 5 % of the wing's
  // area, a_t 3.8832 (slopes: NACA TN 3911), 6 chords behind: 0.3 x 0.79155 x (1 - 0.39039) = 0.14476 chords.
  const wing: WingReference = {
    areaMm2: 320_000,
    spanMm: 1600,
    macMm: 200,
    macLeXMm: 10,
    macYMm: 340,
    macZMm: 0,
    quarterXMm: 60,
    aspectRatio: 8,
    halfChordSweepRad: 0,
  };
  const tail: SurfaceArea = {
    surface: surface({ id: 'tail', role: 'tailplane' }),
    index: 1,
    sections: [],
    areaMm2: 16_000,
    flatMm2: 16_000,
    uprightMm2: 0,
    quarterXMm: 60 + 1200,
    spanMm: Math.sqrt(4 * 16_000),
  };

  it('is 14.5 % of the chord behind the wing alone, within 5 %', () => {
    const x = handbookNeutralPointX([tail], wing);
    expect(Math.abs(((x ?? Number.NaN) - 60) / 200 - 0.14476)).toBeLessThan(0.05);
    // The whole aircraft's slope instead of the wing's alone takes 2.4 % off the shift.
    expect(((x ?? Number.NaN) - 60) / 200).toBeCloseTo(0.14476 / 1.02413, 4);
  });
});
