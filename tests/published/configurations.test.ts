import { describe, expect, it } from 'vitest';
import type { LatticeSection, LatticeSurface } from '@/lib/aero/lattice/types';
import { radFromDeg } from '@/lib/numerics/vec';
import { ellipse, FAIR, section, solved, within } from './support/wings';

// A light aircraft whose geometry and derivatives are published, by its lifting surfaces alone: no fuselage, no propeller. Metres.

const turned = (cut: LatticeSection, incidenceDeg: number): LatticeSection => ({
  ...cut,
  incidenceRad: radFromDeg(incidenceDeg),
});

/** The wing's cut at a share of the half span: quarter chord swept 0.165, dihedral 7.5 degrees, twist from 2 to -1 degrees. */
function wingCut(share: number): LatticeSection {
  const y = 5.083 * share;
  const chord = 2.1944 + (1.185 - 2.1944) * share;
  const quarterX = 1.6526 + 2.1944 / 4 + y * Math.tan(radFromDeg(0.165));
  return turned(section(quarterX - chord / 4, y, chord, -0.601 + y * Math.tan(radFromDeg(7.5))), 2 - 3 * share);
}

const AIRCRAFT: readonly LatticeSurface[] = [
  { id: 'wing', mirrored: true, strips: 10, rows: 5, sections: [wingCut(0), wingCut(1)] },
  {
    id: 'tail',
    mirrored: true,
    strips: 6,
    rows: 4,
    sections: [section(6.5452, 0, 1.2394, 0.204), section(6.5452 + 2 * Math.tan(radFromDeg(6)), 2, 0.8304, 0.204)],
  },
  {
    id: 'fin',
    mirrored: false,
    strips: 5,
    rows: 4,
    sections: [
      section(7.1274, 0, 1.2176, 0.304),
      section(7.1274 + 1.4816 * Math.tan(radFromDeg(20)), 0, 0.587, 0.304 + 1.4816),
    ],
  },
];

const { symmetric, antisymmetric } = solved({
  surfaces: AIRCRAFT,
  controls: [{ id: 'elevator', surfaceId: 'tail', from: 0.1, to: 0.9, chordShare: [0.3, 0.3] }],
  reference: { area: 17.112, chord: 1.74, span: 10.166, point: [2.2397, 0, -0.131] },
});
const margin = -symmetric.alpha.pitch / symmetric.alpha.lift;

/** Nelson, Flight Stability and Automatic Control, app. B. */
const NELSON = { liftSlope: 4.44, pitchSlope: -0.683, pitchDamping: -9.96, rollDamping: -0.41, weathercock: 0.071 };
/** Seckel & Morris, FAA-RD-71-6 (1971). */
const SECKEL = {
  liftSlope: 6.04,
  pitchSlope: -0.715,
  pitchDamping: -13.39,
  rollDamping: -0.46,
  weathercock: 0.086,
  elevator: -1.42,
};

describe('A4: the light aircraft by its surfaces alone, between two published sets (Nelson; Seckel & Morris, FAA-RD-71-6)', () => {
  it.each([NELSON, SECKEL])('Cl_p within 8 %% of $rollDamping', ({ rollDamping }) => {
    within(antisymmetric?.rollRate.roll ?? 0, rollDamping, 0.08);
  });

  it('Cm_q between -9.96 and -13.39', () => {
    expect(symmetric.pitchRate.pitch).toBeLessThan(NELSON.pitchDamping);
    expect(symmetric.pitchRate.pitch).toBeGreaterThan(SECKEL.pitchDamping);
  });

  it('lift slope between 4.44 and 6.04', () => {
    expect(symmetric.alpha.lift).toBeGreaterThan(NELSON.liftSlope);
    expect(symmetric.alpha.lift).toBeLessThan(SECKEL.liftSlope);
  });

  it.each([NELSON, SECKEL])(
    'Cn_beta above $weathercock, for the fuselage that takes some away is not there, by at most 28 %%',
    ({ weathercock }) => {
      const ratio = (antisymmetric?.beta.yaw ?? 0) / weathercock;
      expect(ratio).toBeGreaterThan(1);
      expect(ratio).toBeLessThan(1.28);
    },
  );

  it('Cm by elevator at -1.42 of the second set, within 3 %', () => {
    within(symmetric.controls.get('elevator')?.pitch ?? 0, SECKEL.elevator, 0.03);
  });

  it.each([NELSON, SECKEL])(
    'neutral point 0.05 to 0.13 chords aft of flight’s, for the same reason ($pitchSlope / $liftSlope)',
    ({ pitchSlope, liftSlope }) => {
      const aft = margin - -pitchSlope / liftSlope;
      expect(aft).toBeGreaterThan(0.05);
      expect(aft).toBeLessThan(0.13);
    },
  );
});

describe('A11: a small tail far behind an elliptic wing, in its wake plane (Nelson; Etkin & Reid, Dynamics of Flight)', () => {
  const root = 1;
  const span = 2 * Math.PI;
  const wing: LatticeSurface = { id: 'wing', mirrored: true, ...FAIR, sections: ellipse(span, root, 0.25) };
  const area = (Math.PI / 4) * root * span;
  const chord = (8 / (3 * Math.PI)) * root;
  const alone = (surface: LatticeSurface, reference: { area: number; chord: number }) =>
    solved({ surfaces: [surface], controls: [], reference: { ...reference, span, point: [0, 0, 0] } }).symmetric;

  it.each([6, 8, 12])(
    '%d chords back: h_n = h_ac + V_H (a_t / a_w)(1 - 2 a_w / (pi A)), within 5 %% of the chord',
    (chords) => {
      const size = { span: 1, chord: 0.25 };
      const tail: LatticeSurface = {
        id: 'tail',
        mirrored: true,
        strips: 6,
        rows: 4,
        sections: [section(chords * chord, 0, size.chord), section(chords * chord, size.span / 2, size.chord)],
      };
      const bare = alone(wing, { area, chord });
      const tailOnly = alone(tail, { area: size.span * size.chord, chord: size.chord });
      const both = solved({
        surfaces: [wing, tail],
        controls: [],
        reference: { area, chord, span, point: [0, 0, 0] },
      }).symmetric;
      const volume = (size.span * size.chord * (tailOnly.neutralPointX - bare.neutralPointX)) / (area * chord);
      const downwash = (2 * bare.alpha.lift) / (Math.PI * (span ** 2 / area));
      const byHand = volume * (tailOnly.alpha.lift / bare.alpha.lift) * (1 - downwash);
      const aft = (both.neutralPointX - bare.neutralPointX) / chord;
      expect(aft).toBeGreaterThan(0.1);
      expect(Math.abs(aft - byHand)).toBeLessThan(0.05);
    },
  );
});
