import { describe, expect, it } from 'vitest';
import { barSection } from '@/lib/structure/barSection';
import { ellipticMoment, endDeflection, uniformMoment } from '@/lib/structure/beam';
import { stackOf, stripTorsion } from '@/lib/structure/sheet';
import { twistOf } from '@/lib/structure/twist';
import { pressureMpa, UNIFORM, uniformWing } from '@/tests/support/uniformWing';

const tube = barSection({ kind: 'tube', outerMm: [8, 8], innerMm: [6, 6] });

describe('S1: tube 8 by 6 mm, pi (D^4 - d^4) / 64 (Roark)', () => {
  it('I 137.445 mm4, Z 34.361 mm3', () => {
    expect(tube.inertiaMm4 / 137.445).toBeCloseTo(1, 5);
    expect(tube.modulusMm3 / 34.361).toBeCloseTo(1, 5);
  });
  it('twice I in torsion: polar second moment', () => expect(tube.torsionMm4).toBeCloseTo(2 * tube.inertiaMm4, 9));
});

describe('S2: spar bending, 0.8 kg at 3 g on 1.2 m', () => {
  const halfLoadN = (0.8 * 3 * 9.80665) / 2;
  it.each([
    ['elliptic load, (n W / 2) (4 / 3 pi) (b / 2)', ellipticMoment, 2.9967, 87.21],
    ['uniform load', uniformMoment, 3.5304, 102.74],
  ])('%s: %d N m, %d MPa', (_, moment, expectedNm, expectedMpa) => {
    const root = moment(halfLoadN, 600, 0);
    expect(root / 1000 / expectedNm).toBeCloseTo(1, 4);
    expect(root / tube.modulusMm3 / expectedMpa).toBeCloseTo(1, 4);
  });
});

describe('S3: 5 N at the end of 500 mm of the tube of S1, E 120 GPa, P l^3 / 3 EI', () => {
  it('tip 12.631 mm, root stress 72.757 MPa', () => {
    const moment = (s: number) => 5 * (500 - s);
    const whole = [{ fromMm: 0, toMm: 500, bendingNmm2: 120e3 * tube.inertiaMm4 }];
    expect(endDeflection(whole, moment) / 12.631).toBeCloseTo(1, 4);
    expect(moment(0) / tube.modulusMm3 / 72.757).toBeCloseTo(1, 4);
  });
});

describe('torsion of a thin strip (Roark, table 10.1, from memory)', () => {
  it('is c t^3 G / 3: 200 by 5 mm with G 8 MPa, 66 667 N mm2', () => {
    const layer = { thicknessMm: 5, modulusMpa: 20, shearMpa: 8, face: false };
    expect(stripTorsion(stackOf([layer]), 200)).toBeCloseTo(66_666.67, 1);
  });
});

describe('uniform wing held at its root, strip theory (Bisplinghoff, Ashley & Halfman, Aeroelasticity, ch. 8, from memory)', () => {
  const { lengthMm: l, chordMm: c, torsionNmm2: gj, liftSlope: a, control } = UNIFORM;

  it('diverges at q = (pi / 2 l)^2 GJ / (c e a)', () => {
    const expected = ((Math.PI / (2 * l)) ** 2 * gj) / (c * 40 * a);
    const speed = twistOf(uniformWing({ aftMm: 40 }))?.divergenceMs ?? Number.NaN;
    expect(pressureMpa(speed) / expected).toBeCloseTo(1, 2);
  });

  it('with the axis at the quarter chord its ailerons reverse at q = 12 GJ (cl by control / cl by angle) / (5 c^2 l^2 cm)', () => {
    // theta = -m (l y - y^2 / 2) weighed with y: 5 m l^4 / 24 against tau l^2 / 2.
    const expected = (12 * gj * control.lift) / (5 * c ** 2 * l ** 2 * Math.abs(control.moment));
    const speed = twistOf(uniformWing({ aftMm: 0 }))?.reversalMs ?? Number.NaN;
    expect(pressureMpa(speed) / expected).toBeCloseTo(1, 2);
  });
});
