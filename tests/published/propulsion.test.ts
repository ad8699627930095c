import { describe, expect, it } from 'vitest';
import type { Drive } from '@/lib/airframe/schema/equipment';
import { discThrustN, exitSpeedMs, figureOfMerit, idealHover } from '@/lib/power/disc';
import { pitchSpeedMs } from '@/lib/power/pitchSpeed';
import {
  GENERIC_PROPELLER,
  genericPowerCoefficient,
  genericThrustCoefficient,
  propellerPowerW,
  propellerThrustN,
  turnsForThrust,
} from '@/lib/power/propeller';
import { thrustAtN, thrustOf } from '@/lib/power/thrust';
import { drive } from '../support/drive';

const SEA_LEVEL = 1.225;
const near = (got: number, expected: number, share: number) =>
  expect(Math.abs(got / expected - 1), `${got} against ${expected}`).toBeLessThan(share);
const disc = (diameterM: number) => (Math.PI / 4) * diameterM ** 2;

// UIUC Propeller Database, volume 1, static run kt0835: a 10 x 4.7 in propeller; turns a minute, CT, CP.
const STATIC_10X47 = [
  [2377, 0.1059, 0.0431],
  [2676, 0.1079, 0.0437],
  [2947, 0.1079, 0.0437],
  [3234, 0.1104, 0.0444],
  [3494, 0.1117, 0.045],
  [3762, 0.1143, 0.046],
  [4029, 0.1158, 0.0466],
  [4319, 0.1177, 0.0474],
  [4590, 0.12, 0.0484],
  [4880, 0.1223, 0.0494],
  [5147, 0.1237, 0.05],
  [5417, 0.1252, 0.0508],
  [5715, 0.1263, 0.0513],
  [5960, 0.1278, 0.052],
  [6226, 0.1286, 0.0524],
  [6528, 0.1299, 0.0531],
] as const;

const P4 = [
  { rpm: 2377, ct: 0.1059, cp: 0.0431, thrustN: 0.8475, powerW: 3.471, merit: 0.638 },
  { rpm: 4029, ct: 0.1158, cp: 0.0466, thrustN: 2.6624, powerW: 18.274, merit: 0.675 },
  { rpm: 6528, ct: 0.1299, cp: 0.0531, thrustN: 7.8404, powerW: 88.57, merit: 0.703 },
] as const;

describe('P4: static thrust and power from coefficients (UIUC Propeller Database, volume 1, kt0835)', () => {
  it.each(P4)('at $rpm rpm', ({ rpm, ct, cp, thrustN, powerW }) => {
    near(propellerThrustN(ct, rpm / 60, 0.254, SEA_LEVEL), thrustN, 1e-3);
    near(propellerPowerW(cp, rpm / 60, 0.254, SEA_LEVEL), powerW, 1e-3);
    near(turnsForThrust(thrustN, ct, 0.254, SEA_LEVEL) * 60, rpm, 1e-3);
  });

  it('the generic propeller lies within 10 % of the middle row, and its span holds all sixteen', () => {
    const { low, high } = GENERIC_PROPELLER.thrustCoefficient;
    near(genericThrustCoefficient(2), 0.1158, 0.1);
    near(genericPowerCoefficient(0.1158), 0.0466, 0.1);
    for (const [, ct] of STATIC_10X47) {
      expect(ct).toBeGreaterThan(low);
      expect(ct).toBeLessThan(high);
    }
  });

  it('the estimate from the shaft power alone gives the measured thrust within 10 %', () => {
    // Motor losses taken off beforehand: 18.274 W at the shaft are 24.4 W into a motor of 0.75.
    const estimated = thrustOf(
      { drives: [drive({ maxW: 18.274 / 0.75, diameterMm: 254, pitchMm: 119.4 })] },
      SEA_LEVEL,
    );
    if (!estimated.ok || !estimated.value) throw new RangeError('no thrust');
    near(estimated.value.staticN.value, 2.6624, 0.1);
    near(estimated.value.drives[0]?.propeller?.rpm ?? Number.NaN, 4029, 0.1);
  });
});

// Runs rd0840 (6512 rpm) and rd0841 (6020 rpm) of the same propeller: advance ratio and thrust coefficient.
const FORWARD_6512 = [
  [0.089, 0.1201],
  [0.199, 0.1019],
  [0.308, 0.0833],
  [0.42, 0.0616],
] as const;
const FORWARD_6020 = [
  [0.601, 0.016],
  [0.652, 0.0017],
  [0.671, -0.0039],
] as const;

describe('P5: in forward flight (UIUC Propeller Database, volume 1, rd0840 and rd0841)', () => {
  // Thrust of the same propeller by the straight line, its static thrust stated as measured at 6528 rpm.
  const diameterM = 0.254;
  const measured = (ct: number, rpm: number) => propellerThrustN(ct, rpm / 60, diameterM, SEA_LEVEL);
  const speed = (advance: number, rpm: number) => (advance * rpm * diameterM) / 60;
  const result = thrustOf({ drives: [drive({ statedN: 7.8404, diameterMm: 254, pitchMm: 119.4 })] }, SEA_LEVEL);
  if (!result.ok || !result.value) throw new RangeError('no thrust');
  const thrust = result.value;

  it.each(FORWARD_6512)('at J %d the measured thrust of CT %d lies in the span of the straight line', (j, ct) => {
    const v = speed(j, 6512);
    expect(thrustAtN(thrust, v, 'low')).toBeLessThan(measured(ct, 6512));
    // The measured curve leaves its static thrust more gently than any straight line: there the line is allowed 3 %.
    expect(thrustAtN(thrust, v, 'high')).toBeGreaterThan((j < 0.3 ? 0.97 : 1) * measured(ct, 6512));
  });

  it.each(FORWARD_6512)('at J %d the coefficients give the thrust of CT %d', (j, ct) => {
    // T = CT rho n^2 D^4, written out: 6512 rpm are 108.533 a second, D^4 is 0.0041623.
    near(measured(ct, 6512), ct * 1.225 * 108.5333 ** 2 * 0.00416231, 0.01);
    expect(speed(j, 6512)).toBeCloseTo(j * 27.5675, 2);
  });

  it('thrust ends near J 0.657, past the pitch speed of 0.47: the span reaches it, the value does not', () => {
    const [pulls, drags] = [FORWARD_6020[1], FORWARD_6020[2]];
    expect(pulls[1]).toBeGreaterThan(0);
    expect(drags[1]).toBeLessThan(0);
    const { spentMs, propeller } = thrust.drives[0] ?? {};
    const pitchMs = propeller?.pitchSpeedMs.value ?? Number.NaN;
    // Advance ratio of the pitch speed is pitch over diameter, 0.47.
    const endOfThrust = (0.657 / 0.47) * pitchMs;
    expect(spentMs?.value).toBeLessThan(endOfThrust);
    expect(spentMs?.high).toBeGreaterThan(endOfThrust);
  });
});

describe('P6: a second propeller (UIUC Propeller Database: 9 in, 5943 rpm)', () => {
  it('CT 0.14045 and CP 0.080081 are 4.610 N and 59.52 W', () => {
    near(propellerThrustN(0.14045, 5943 / 60, 0.2286, SEA_LEVEL), 4.61, 1e-3);
    near(propellerPowerW(0.080081, 5943 / 60, 0.2286, SEA_LEVEL), 59.52, 1e-3);
    expect(GENERIC_PROPELLER.thrustCoefficient.high).toBeGreaterThan(0.14045);
  });
});

describe('P7: figure of merit CT^1.5 / CP sqrt(2 / pi) (momentum theory)', () => {
  it.each(P4)('$merit at $rpm rpm', ({ thrustN, powerW, merit }) => {
    near(figureOfMerit(thrustN, powerW, disc(0.254), SEA_LEVEL), merit, 1e-3);
  });

  it('no measured row reaches 1, and all lie in the span of the generic propeller', () => {
    const { low, high } = GENERIC_PROPELLER.figureOfMerit;
    for (const [rpm, ct, cp] of STATIC_10X47) {
      const turns = rpm / 60;
      const merit = figureOfMerit(
        propellerThrustN(ct, turns, 0.254, SEA_LEVEL),
        propellerPowerW(cp, turns, 0.254, SEA_LEVEL),
        disc(0.254),
        SEA_LEVEL,
      );
      expect(merit).toBeGreaterThan(low);
      expect(merit).toBeLessThan(high);
    }
  });
});

it('P8: ideal hover of 5 N on 0.254 m: 6.3463 m/s, 31.732 W, wake 12.693 m/s (Rankine and Froude)', () => {
  const { inducedMs, powerW, wakeMs } = idealHover(5, disc(0.254), SEA_LEVEL);
  near(inducedMs, 6.3463, 1e-4);
  near(powerW, 31.732, 1e-4);
  near(wakeMs, 12.693, 1e-4);
});

describe('P9: ducted fan, 70 mm with a 26 mm hub, 300 W in the air (Pereira, University of Maryland 2008; Hovey)', () => {
  const areaM2 = disc(0.07) - disc(0.026);

  it.each([
    [1, 11.352, 52.853],
    [0.9, 10.961, 54.742],
  ])('exit share %d: %d N at %d m/s', (share, thrustN, exitMs) => {
    const found = discThrustN(300, areaM2, share, SEA_LEVEL);
    near(found, thrustN, 1e-4);
    near(exitSpeedMs(found, share * areaM2, SEA_LEVEL), exitMs, 1e-4);
  });

  it('a free stream, share 0.5: 9.010 N; duct over free is the cube root of 2', () => {
    const free = discThrustN(300, areaM2, 0.5, SEA_LEVEL);
    near(free, 9.01, 1e-4);
    expect(discThrustN(300, areaM2, 1, SEA_LEVEL) / free).toBeCloseTo(1.2599, 4);
  });

  it('an estimated fan of that size gives it from what its motor and blades leave', () => {
    // 0.75 of a motor and 0.62 of a fan leave 300 W of 645.16 W.
    const fan: Drive = {
      ...drive({ maxW: 300 / (0.75 * 0.62) }),
      kind: 'ductedFan',
      fan: { diameterMm: 70, hubMm: 26, blades: 6, massG: 60 },
      duct: { inletMm2: 4000, outletMm2: areaM2 * 1e6 * 0.9 },
    };
    const result = thrustOf({ drives: [fan] }, SEA_LEVEL);
    if (!result.ok || !result.value) throw new RangeError('no thrust');
    near(result.value.staticN.value, 10.961, 1e-3);
    near(result.value.drives[0]?.spentMs.value ?? Number.NaN, 54.742, 1e-3);
  });
});

it('P10: 8000 rpm times 4.7 in over 1056 is 35.606 mph, 15.917 m/s (63 360 in a mile over 60 min is 1056, exactly)', () => {
  const speed = pitchSpeedMs(8000, 4.7 * 25.4);
  // One mile an hour is 0.44704 m/s exactly (NIST SP 811).
  expect(speed / 0.44704).toBeCloseTo(35.606, 3);
  expect(speed).toBeCloseTo(15.917, 3);
  expect(speed / (((8000 * 4.7) / 1056) * 0.44704) - 1).toBeCloseTo(0, 12);
});
