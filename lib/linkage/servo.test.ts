import { describe, expect, it } from 'vitest';
import { NMM_PER_KG_CM, servoTorque } from './servo';

const typed = (spec?: string): number | null => {
  const { kgCm, assumed } = servoTorque({ massG: 9, ...(spec ? { spec } : {}) });
  return assumed ? null : kgCm;
};

describe('the torque that somebody typed', () => {
  it.each([
    ['1.4 kg cm at 5 V', 1.4],
    ['metal gear, 1,8kg·cm', 1.8],
    ['2.2 kg-cm', 2.2],
    ['9 g', null],
    ['cable 25 cm', null],
    ['0 kg cm', null],
    [undefined, null],
  ])('%s', (spec, kgCm) => expect(typed(spec)).toBe(kgCm));

  it('in N cm: 9.80665 of them are a kg cm', () => {
    expect(typed('19.6133 N cm')).toBeCloseTo(2, 12);
    expect(NMM_PER_KG_CM).toBeCloseTo(98.0665, 10);
  });
});

describe('servoTorque', () => {
  it('is as typed, without a span', () => {
    expect(servoTorque({ massG: 9, spec: '1.4 kg cm' })).toEqual({
      kgCm: 1.4,
      lowKgCm: 1.4,
      highKgCm: 1.4,
      assumed: false,
    });
  });

  it('is assumed from the mass without a typed one: a 9 g servo has 1.0 to 1.5 kg cm', () => {
    const nine = { kgCm: 1.25, lowKgCm: 1, highKgCm: 1.5, assumed: true };
    expect(servoTorque({ massG: 9 })).toEqual(nine);
    expect(servoTorque(null)).toEqual(nine);
  });

  it('never falls with the mass', () => {
    const kgCm = [2, 5, 9, 14, 25, 40, 80].map((massG) => servoTorque({ massG }).kgCm);
    expect(kgCm).toEqual([...kgCm].sort((a, b) => a - b));
  });
});
