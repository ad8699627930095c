import { describe, expect, it } from 'vitest';
import type { SectionShape } from '@/lib/airframe/schema/surface';
import { airframe, panel, surface } from '@/tests/support/airframe';
import { airAt } from './atmosphere';
import { FLAT_PLATE_CL_MAX, wingClMax } from './clMax';

const flat: SectionShape = { kind: 'flat' };
const folded: SectionShape = { kind: 'folded', thicknessShare: 0.08, maxAt: 0.3, lowerTo: 0.6, webAt: 0.3 };
const slab = (camber: number): SectionShape => ({
  kind: 'slab',
  thicknessShare: 0.1,
  profile: [
    [1, 0],
    [0.5, camber + 0.05],
    [0, 0],
    [0.5, camber - 0.05],
  ],
});
const wing = (...sections: readonly SectionShape[]) =>
  airframe({
    surfaces: [
      surface({ panels: sections.map((section, i) => panel({ id: `p${i}`, lengthMm: 200 * (i + 1), section })) }),
    ],
  });
const air = airAt(0);

/** Of a wing with one section, 190 mm of chord, at a Reynolds number: kinematic viscosity is 1.46072e-5 at sea level. */
function sectionAt(section: SectionShape, reynolds: number, sweepDeg = 0) {
  const document = airframe({ surfaces: [surface({ panels: [panel({ section, sweepDeg })] })] });
  return wingClMax(document, (reynolds * 1.46072e-5) / 0.19, air);
}

describe('the greatest lift of a section', () => {
  it('of a plate does not fall with speed, but its low end does', () => {
    expect(sectionAt(flat, 20_000).value).toBe(FLAT_PLATE_CL_MAX.value);
    expect(sectionAt(flat, 20_000).low).toBeLessThan(sectionAt(flat, 120_000).low);
  });

  it('of a folded section falls under a Reynolds number of 50 000, never under the plate', () => {
    const at = (reynolds: number) => sectionAt(folded, reynolds).value;
    expect(at(200_000)).toBe(1);
    expect(at(51_000)).toBe(1);
    expect(at(35_000)).toBeLessThan(at(51_000));
    expect(at(3_000)).toBe(FLAT_PLATE_CL_MAX.value);
  });

  it('loses by sweep where the flow follows the nose, and only at the low end on a plate', () => {
    // cos 30 degrees is 0.8660.
    expect(sectionAt(folded, 100_000, 30).value).toBeCloseTo(0.866, 4);
    expect(sectionAt(flat, 100_000, 30).value).toBe(FLAT_PLATE_CL_MAX.value);
    expect(sectionAt(flat, 100_000, 30).low).toBeCloseTo(0.65 * 0.866, 4);
  });

  it('is less with reflex', () => {
    expect(sectionAt({ ...folded, reflexDeg: 3 }, 100_000).value).toBeLessThan(1);
  });
});

describe('the greatest lift of a wing', () => {
  it('is the mean of its panels by their area', () => {
    // A third plate, two thirds folded: 0.25 + 0.6667.
    expect(wingClMax(wing(flat, folded), 12, air).value).toBeCloseTo(0.9167, 4);
  });

  it('grows with the camber of a slab, which a symmetrical one has not', () => {
    const of = (camber: number) => wingClMax(wing(slab(camber)), 12, air).value;
    expect(of(0)).toBeCloseTo(0.85, 3);
    expect(of(0.03)).toBeCloseTo(0.85 + 7 * 0.03, 2);
    expect(of(-0.03)).toBeCloseTo(0.85, 3);
  });

  it('is what the person types, without a span', () => {
    const document = wing(flat);
    const typed = wingClMax({ ...document, flight: { ...document.flight, clMax: 1.3 } }, 12, air);
    expect(typed).toMatchObject({ value: 1.3, low: 1.3, high: 1.3, typed: true });
  });

  it('is refused without a wing', () => {
    const document = airframe({ surfaces: [surface({ role: 'tailplane' })] });
    expect(() => wingClMax(document, 12, air)).toThrow(RangeError);
  });
});
