import { describe, expect, it } from 'vitest';
import { type CouponReadings, readCoupon } from '@/lib/aids/readCoupon';

// The strip of the stock coupon in three-point bending: E = F L^3 / (48 I d), I = b t^3 / 12. W. C. Young and R. G. Budynas, "Roark's Formulas
// for Stress and Strain", table of beams: both ends simply supported, load at the middle; the same as ASTM D790, "Flexural Properties", modulus
// E = L^3 m / (4 b t^3) with m the slope of load over deflection (both from memory). Worked by hand with b = 30 mm, L = 200 mm,
// g = 9.80665 m/s2. Tolerance 1e-5 of the value.

const within = (value: number, expected: number) => expect(Math.abs(value / expected - 1)).toBeLessThan(1e-5);
const recordOf = (readings: CouponReadings) => {
  const read = readCoupon(readings);
  if (!read.ok) throw new RangeError(read.problems[0]?.message);
  return read.value;
};

describe('modulus of the bending strip (Roark; ASTM D790)', () => {
  it('100 g sink 5 mm board by 4 mm: I = 312.5 mm4, E = 0.980665 x 8e6 / 60 000 = 130.7553 MPa', () => {
    within(recordOf({ massG: 4.8, thicknessMm: 5, deflectionMm: 4, loadG: 100, gripSlotMm: 5.2 }).eMpa, 130.75533);
  });
  it('200 g sink 6 mm board by 3 mm: I = 540 mm4, E = 1.96133 x 8e6 / 77 760 = 201.7829 MPa', () => {
    within(recordOf({ massG: 2.2, thicknessMm: 6, deflectionMm: 3, loadG: 200, gripSlotMm: 6 }).eMpa, 201.78292);
  });
  it('50 g sink 10 mm EPP by 2 mm: I = 2500 mm4, E = 0.4903325 x 8e6 / 240 000 = 16.34442 MPa', () => {
    within(recordOf({ massG: 2, thicknessMm: 10, deflectionMm: 2, loadG: 50, gripSlotMm: 10 }).eMpa, 16.344417);
  });
  it('over 400 mm the same load sinks it eight times as far: D790 with L = 400, m = 0.980665 / 32 gives 130.7553 MPa again', () => {
    const read = recordOf({ massG: 4.8, thicknessMm: 5, deflectionMm: 32, loadG: 100, gripSlotMm: 5.2, spanMm: 400 });
    within(read.eMpa, 130.75533);
  });
});

describe('mass and clearance by definition', () => {
  it('4.8 g on 100 x 100 mm are 480 g/m2; a board of 5.0 mm that a slot of 5.2 mm holds wants 0.2 mm', () => {
    const read = recordOf({ massG: 4.8, thicknessMm: 5, deflectionMm: 4, loadG: 100, gripSlotMm: 5.2 });
    within(read.arealMassGm2, 480);
    within(read.slotClearanceMm, 0.2);
    expect(read.thicknessMm).toBe(5);
  });
  it('a slot of the measured thickness wants none', () => {
    const read = recordOf({ massG: 2, thicknessMm: 6, deflectionMm: 3, loadG: 100, gripSlotMm: 6 });
    expect(read.slotClearanceMm).toBe(0);
  });
});
