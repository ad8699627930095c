import { describe, expect, it } from 'vitest';
import { flapEffectiveness } from '@/lib/aero/lattice/hinge';
import type { LatticeSurface } from '@/lib/aero/lattice/types';
import { radFromDeg } from '@/lib/numerics/vec';
import { FAIR, rectangle, section, solved, TWO_DIMENSIONAL, trapezoid, wingOf, within } from './support/wings';

const flap = (share: number) => ({
  id: 'flap',
  surfaceId: 'wing',
  from: 0,
  to: 1,
  chordShare: [share, share] as const,
});

/** A section: a rectangle so long that it counts as two-dimensional, moments about its quarter chord. */
function sectionWith(share: number, rows: number) {
  const { alpha, controls } = wingOf(rectangle(1e4), { ...TWO_DIMENSIONAL, rows }, { point: [0.25, 0, 0] }, [
    flap(share),
  ]).symmetric;
  const effect = controls.get('flap');
  if (!effect) throw new RangeError('no flap');
  return { effectiveness: effect.lift / alpha.lift, moment: effect.pitch };
}

// Flap chord over chord; 1 - (t - sin t) / pi; -0.5 sin t (1 - cos t), each with cos t = 2 E - 1.
const GLAUERT = [
  { share: 0.1, tau: 0.3958, moment: -0.54 },
  { share: 0.15, tau: 0.4805, moment: -0.607 },
  { share: 0.2, tau: 0.5498, moment: -0.64 },
  { share: 0.25, tau: 0.609, moment: -0.6495 },
  { share: 0.3, tau: 0.6607, moment: -0.6416 },
  { share: 0.4, tau: 0.7478, moment: -0.5879 },
  { share: 0.5, tau: 0.8183, moment: -0.5 },
] as const;

describe('F1: flap effectiveness by thin-aerofoil theory (Glauert, ARC R&M 1095, 1927; Katz & Plotkin, Low-Speed Aerodynamics, ch. 5)', () => {
  it.each(GLAUERT)(
    'a flap of $share of the chord: $tau by formula within 1e-4, by a lattice of 6 rows within 1 %',
    ({ share, tau }) => {
      expect(Math.abs(flapEffectiveness(share) - tau)).toBeLessThan(1e-4);
      within(sectionWith(share, 6).effectiveness, tau, 0.01);
    },
  );
});

describe('F2: pitching moment about the quarter chord per radian of flap (Glauert, same), 3 % at 6 rows, 1 % at 12', () => {
  it.each(GLAUERT)('a flap of $share: $moment', ({ share, moment }) => {
    within(sectionWith(share, 6).moment, moment, 0.03);
    within(sectionWith(share, 12).moment, moment, 0.01);
  });
});

describe('F3: the hinge moves from 0.15 to 0.45 of the chord in steps of 0.01, inside rows and across them', () => {
  const shares = Array.from({ length: 31 }, (_, k) => 0.15 + k * 0.01);
  const values = shares.map((share) => sectionWith(share, 6).effectiveness);

  it('never off thin-aerofoil theory by more than 1.5 %', () => {
    for (const [k, share] of shares.entries()) within(values[k] ?? 0, flapEffectiveness(share), 0.015);
  });

  it('monotone and smooth', () => {
    const steps = values.slice(1).map((v, k) => v - (values[k] ?? 0));
    for (const [k, step] of steps.entries()) {
      expect(step).toBeGreaterThan(0);
      expect(Math.abs(step - (steps[k - 1] ?? step))).toBeLessThan(0.004);
    }
  });
});

describe('F4: an all-moving surface is a change of incidence (identity), within 0.1 %', () => {
  it('a whole wing that turns', () => {
    const moving = { id: 'all', surfaceId: 'wing', from: 0, to: 1, chordShare: [1, 1] as const };
    const wing = trapezoid({ span: 1.2, root: 0.3, tip: 0.15, leSweepRad: 0.5 });
    const { alpha, controls } = wingOf(wing, { strips: 10, rows: 4 }, {}, [moving]).symmetric;
    within(controls.get('all')?.lift ?? 0, alpha.lift, 0.001);
    within(controls.get('all')?.pitch ?? 0, alpha.pitch, 0.001);
  });

  it('a tail behind a wing, against the same tail set at an angle', () => {
    const wing: LatticeSurface = {
      id: 'wing',
      mirrored: true,
      strips: 10,
      rows: 5,
      sections: [section(0, 0, 200), section(0, 600, 200)],
    };
    const tail = (incidenceRad: number): LatticeSurface => ({
      id: 'tail',
      mirrored: true,
      strips: 6,
      rows: 4,
      sections: [section(620, 0, 130, 20), section(620, 220, 130, 20)].map((s) => ({ ...s, incidenceRad })),
    });
    const at = (incidenceRad: number) =>
      solved({
        surfaces: [wing, tail(incidenceRad)],
        controls: [{ id: 'tail', surfaceId: 'tail', from: 0, to: 1, chordShare: [1, 1] }],
        reference: { area: 240_000, chord: 200, span: 1200, point: [70, 0, 0] },
      }).symmetric;
    const small = 0.002;
    const turned = at(0).controls.get('tail');
    within(turned?.lift ?? 0, (at(small).base.lift - at(-small).base.lift) / (2 * small), 0.001);
    within(turned?.pitch ?? 0, (at(small).base.pitch - at(-small).base.pitch) / (2 * small), 0.001);
  });
});

describe('F5: a deflection about a swept hinge counts by the cosine of its sweep (Etkin & Reid, Dynamics of Flight)', () => {
  // Simple sweep theory of a sheared wing of any length: normal to its edges the stream is V cos L, the angle of attack a / cos L and
  // the flap angle whole, so that flap over incidence is tau cos L.
  it.each([20, 30, 45])('sweep %d degrees, within 2 %%', (sweepDeg) => {
    const sheared = trapezoid({ span: 1000, root: 1, tip: 1, leSweepRad: radFromDeg(sweepDeg) });
    for (const { share, tau } of GLAUERT.filter((g) => g.share === 0.2 || g.share === 0.3)) {
      const { alpha, controls } = wingOf(sheared, { strips: 24, rows: 6 }, {}, [flap(share)]).symmetric;
      within((controls.get('flap')?.lift ?? 0) / alpha.lift, tau * Math.cos(radFromDeg(sweepDeg)), 0.02);
    }
  });
});

/** A V-tail alone, aspect ratio 6 when laid flat, coefficients by its unfolded area and span. */
function vTail(dihedralDeg: number) {
  const [cos, sin] = [Math.cos(radFromDeg(dihedralDeg)), Math.sin(radFromDeg(dihedralDeg))];
  const { symmetric, antisymmetric } = solved({
    surfaces: [{ id: 'tail', mirrored: true, ...FAIR, sections: [section(0, 0, 1), section(0, 3 * cos, 1, 3 * sin)] }],
    controls: [{ id: 'ruddervator', surfaceId: 'tail', from: 0, to: 1, chordShare: [0.4, 0.4] }],
    reference: { area: 6, chord: 1, span: 6, point: [-5, 0, 0] },
  });
  return {
    lift: symmetric.alpha.lift,
    damping: symmetric.pitchRate.pitch,
    control: symmetric.controls.get('ruddervator')?.lift ?? Number.NaN,
    side: antisymmetric?.beta.side ?? Number.NaN,
    yaw: antisymmetric?.beta.yaw ?? Number.NaN,
  };
}

describe('F6: a V-tail whose dihedral goes to nothing is the flat tail (identity), within 0.1 %', () => {
  const [flat, nearly] = [vTail(0), vTail(0.1)];
  it.each(['lift', 'damping', 'control'] as const)('%s', (key) => within(nearly[key], flat[key], 0.001));
  it('and pushes to neither side', () => {
    expect(Math.abs(nearly.side)).toBeLessThan(1e-4);
    expect(Math.abs(nearly.yaw)).toBeLessThan(1e-4);
  });
});

describe('F7: V-tail, isolated, by its unfolded area (Purser & Campbell, NACA TR 823, 1945; from memory, sure of the law)', () => {
  it.each([10, 20, 30, 35])(
    'at %d degrees the lift slope is that of the flat tail times cos^2, within 6 %%',
    (dihedralDeg) => {
      within(vTail(dihedralDeg).lift, vTail(0).lift * Math.cos(radFromDeg(dihedralDeg)) ** 2, 0.06);
    },
  );

  it.each([10, 20, 30, 35, 45])('at %d degrees the side force goes with sin^2, within 6 %%', (dihedralDeg) => {
    const perSquare = (deg: number) => vTail(deg).side / Math.sin(radFromDeg(deg)) ** 2;
    within(perSquare(dihedralDeg), perSquare(5), 0.06);
  });

  it('and is less than the flat tail’s lift slope by the report’s factor for opposite loads on the two halves', () => {
    const factor = -vTail(35).side / (vTail(0).lift * Math.sin(radFromDeg(35)) ** 2);
    expect(factor).toBeGreaterThan(0.55);
    expect(factor).toBeLessThan(0.8);
  });
});
