import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { resolve } from '@/lib/airframe/resolve';
import type { Airframe } from '@/lib/airframe/schema/airframe';
import type { Drive } from '@/lib/airframe/schema/equipment';
import type { Control } from '@/lib/airframe/schema/surface';
import { airframe, control, surface } from '@/tests/support/airframe';
import {
  axisAbout,
  type PitchAxis,
  POWER_OFF,
  pitchAxis,
  stickTrims,
  type ThrustLine,
  thrustLine,
  trim,
  trimLoad,
  trimmedCgX,
  withNeutralPoint,
} from './trim';

const reference = { area: 240_000, chord: 200, span: 1200, point: [70, 0, 0] as const };
const elevator = (over: Partial<Control> = {}) =>
  control({
    id: 'elevator',
    kind: 'elevator',
    throwsDeg: { up: 14, down: 9, lowShare: 0.7 },
    mix: { pitch: 1, roll: 0, yaw: 0, flap: 0 },
    ...over,
  });
const flying = (...controls: Control[]) => airframe({ surfaces: [surface({ controls })] });
const MODEL = {
  reference,
  base: { lift: 0.2, pitch: 0.03 },
  alpha: { lift: 4.7, pitch: -0.8 },
  controls: new Map([['wing/elevator', { lift: 0.65, pitch: -1.8 }]]),
};
type Model = typeof MODEL;

function axisOf(model: Model = MODEL, document: Airframe = flying(elevator())): PitchAxis {
  const axis = pitchAxis(document, model);
  if (!axis) throw new RangeError('no pitch control');
  return axis;
}
function trimmed(axis: PitchAxis, weight: number, thrust = { lift: 0, liftPerRad: 0, pitch: 0 }) {
  const result = trim(axis, { weight, thrust });
  if (!result.ok) throw new RangeError(result.problems[0]?.message);
  return result.value;
}

const signed = (most: number) => fc.double({ min: -most, max: most, noNaN: true });
const stableModel = fc
  .record({
    lift: signed(0.6),
    pitch: signed(0.2),
    slope: fc.double({ min: 1.5, max: 6.5, noNaN: true }),
    margin: fc.double({ min: 0.01, max: 0.6, noNaN: true }),
    elevatorLift: fc.double({ min: 0.1, max: 1.5, noNaN: true }),
    arm: fc.double({ min: 0.7, max: 5, noNaN: true }),
  })
  .map(
    ({ lift, pitch, slope, margin, elevatorLift, arm }): Model => ({
      reference,
      base: { lift, pitch },
      alpha: { lift: slope, pitch: -margin * slope },
      controls: new Map([['wing/elevator', { lift: elevatorLift, pitch: -arm * elevatorLift }]]),
    }),
  );
const thrusts = fc.record({
  lift: signed(0.1),
  liftPerRad: fc.double({ min: 0, max: 0.8, noNaN: true }),
  pitch: signed(0.1),
});

describe('a trimmed state', () => {
  it('has no moment and carries the weight, for any stable aircraft, thrust and rest position', () => {
    fc.assert(
      fc.property(
        stableModel,
        thrusts,
        fc.double({ min: 0.05, max: 1.2, noNaN: true }),
        signed(8),
        (model, thrust, weight, rest) => {
          const { state } = trimmed(axisOf(model, flying(elevator({ neutralDeg: rest }))), weight, thrust);
          const delta = state.deflectionsRad.get('wing/elevator') ?? Number.NaN;
          const effect = model.controls.get('wing/elevator') ?? { lift: 0, pitch: 0 };
          const lift = model.base.lift + model.alpha.lift * state.alphaRad + effect.lift * delta;
          const pitch = model.base.pitch + model.alpha.pitch * state.alphaRad + effect.pitch * delta;
          expect(Math.abs(lift + thrust.lift + thrust.liftPerRad * state.alphaRad - weight)).toBeLessThan(1e-6);
          expect(Math.abs(pitch + thrust.pitch)).toBeLessThan(1e-6);
        },
      ),
    );
  });

  it('wants more up the slower it flies when stable, and less when not', () => {
    const unstable = withNeutralPoint(axisOf(), -60);
    for (const [axis, sign] of [[axisOf(), 1] as const, [unstable, -1] as const])
      expect(Math.sign(trimmed(axis, 0.8).stick - trimmed(axis, 0.3).stick)).toBe(sign);
  });

  it('measures nose-up stick by the up throw and nose-down stick by the down throw', () => {
    const up = trimmed(axisOf(), 1.1);
    const down = trimmed(axisOf(), 0.1);
    expect(up.elevatorDeg).toBeLessThan(0);
    expect(up.stick).toBeCloseTo(-up.elevatorDeg / 14, 12);
    expect(down.elevatorDeg).toBeGreaterThan(0);
    expect(down.stick).toBeCloseTo(-down.elevatorDeg / 9, 12);
  });

  it('names the control that moves most', () => {
    const small = elevator({ id: 'small', throwsDeg: { up: 5, down: 5, lowShare: 0.7 } });
    const model = { ...MODEL, controls: new Map([...MODEL.controls, ['wing/small', { lift: 0.3, pitch: -0.6 }]]) };
    expect(axisOf(model, flying(small, elevator())).leader).toBe('wing/elevator');
  });

  it('is refused when the control has no travel on that side', () => {
    const upOnly = axisOf(MODEL, flying(elevator({ throwsDeg: { up: 14, down: 0, lowShare: 0.7 } })));
    expect(trim(upOnly, { weight: 1.1, thrust: { lift: 0, liftPerRad: 0, pitch: 0 } }).ok).toBe(true);
    const nose = trim(upOnly, { weight: 0.1, thrust: { lift: 0, liftPerRad: 0, pitch: 0 } });
    expect(nose.ok ? null : nose.problems[0]?.code).toBe('no-travel-to-trim');
  });

  it('is refused when the control lies ahead of the neutral point but behind the CG: up stick would speed it up', () => {
    // Acts 10 % of the chord behind the CG; the neutral point lies 17 % behind it.
    const model = { ...MODEL, controls: new Map([['wing/elevator', { lift: 0.6, pitch: -0.06 }]]) };
    expect(stickTrims(axisOf(model))).toBe(false);
    const result = trim(axisOf(model), { weight: 0.9, thrust: { lift: 0, liftPerRad: 0, pitch: 0 } });
    expect(result.ok ? null : result.problems[0]?.code).toBe('stick-does-not-trim');
    expect(stickTrims(axisOf())).toBe(true);
  });

  it('has no axis without a pitch control', () => expect(pitchAxis(flying(control()), MODEL)).toBeNull());
});

describe('moving the CG', () => {
  it('changes no lift, and the stick at its limit is the share that set it', () => {
    fc.assert(
      fc.property(stableModel, fc.double({ min: 0.2, max: 0.95, noNaN: true }), (model, share) => {
        const axis = axisOf(model);
        const x = trimmedCgX(axis, share, 0.7);
        expect(trimmed(axisAbout(axis, x), 0.7).stick).toBeCloseTo(share, 6);
      }),
    );
  });

  it('and back again changes nothing', () => {
    const there = axisAbout(axisAbout(axisOf(), 40), 70);
    expect(there.alpha.pitch).toBeCloseTo(-0.8, 12);
    expect(there.up.pitch).toBeCloseTo(axisOf().up.pitch, 12);
  });

  it('forward wants more up, backward less', () => {
    const stickAt = (x: number) => trimmed(axisAbout(axisOf(), x), 0.6).stick;
    expect(stickAt(60)).toBeGreaterThan(stickAt(70));
    expect(stickAt(80)).toBeLessThan(stickAt(70));
  });

  it('to the neutral point leaves the same stick for every speed', () => {
    // 70 mm + 0.8 / 4.7 of the chord.
    const neutral = axisAbout(axisOf(), 70 + (200 * 0.8) / 4.7);
    expect(neutral.alpha.pitch).toBeCloseTo(0, 12);
    expect(trimmed(neutral, 0.9).stick).toBeCloseTo(trimmed(neutral, 0.3).stick, 9);
  });

  it('or the neutral point by as much the other way leaves the same margin', () => {
    expect(withNeutralPoint(axisOf(), 12).alpha.pitch).toBeCloseTo(axisAbout(axisOf(), 58).alpha.pitch, 12);
  });
});

describe('the thrust line', () => {
  type Over = Partial<Pick<Drive, 'mount' | 'mirrored' | 'facing' | 'thrustDeg'>>;
  const drive = (over: Over): Drive => ({
    id: 'motor',
    mount: { to: 'datum', at: [-100, 0, 30] },
    mirrored: false,
    facing: 'tractor',
    turns: 'cw',
    thrustDeg: [0, 0],
    motor: { massG: 60, diameterMm: 28, lengthMm: 30, kvRpmPerV: 1200 },
    kind: 'propeller',
    propeller: { diameterMm: 228, pitchMm: 114, blades: 2, massG: 12 },
    ...over,
  });
  function lineOf(over: Over, downDeg = 0): ThrustLine {
    const document = airframe({ drives: [drive(over)] });
    const resolved = resolve(document);
    if (!resolved.ok) throw new RangeError('does not resolve');
    return thrustLine(document, resolved.value, [70, 0, 0], () => 5, downDeg);
  }
  const elevatorChange = (line: ThrustLine) => {
    const axis = axisOf();
    const at = (with_: ThrustLine) => {
      const result = trim(axis, trimLoad(axis, 8, 120, with_));
      if (!result.ok) throw new RangeError('not trimmed');
      return result.value.elevatorDeg;
    };
    return at(line) - at(POWER_OFF);
  };

  it('above the CG pitches nose down by force times height, below it nose up', () => {
    expect(lineOf({}).noseUpNm).toBeCloseTo(-5 * 0.03, 12);
    expect(lineOf({ mount: { to: 'datum', at: [-100, 0, -30] } }).noseUpNm).toBeCloseTo(5 * 0.03, 12);
    expect(lineOf({}).upN).toBeCloseTo(0, 12);
    expect(lineOf({}).upPerRadN).toBeCloseTo(5, 12);
  });

  it('a high motor wants up with power, a low one down', () => {
    expect(elevatorChange(lineOf({}))).toBeLessThan(-0.1);
    expect(elevatorChange(lineOf({ mount: { to: 'datum', at: [-100, 0, -30] } }))).toBeGreaterThan(0.1);
  });

  it('downthrust of a tractor pulls the nose down: down force at an arm ahead of the CG', () => {
    const level = lineOf({ mount: { to: 'datum', at: [-100, 0, 0] } });
    const down = lineOf({ mount: { to: 'datum', at: [-100, 0, 0] }, thrustDeg: [4, 0] });
    expect(level.noseUpNm).toBeCloseTo(0, 12);
    expect(down.upN).toBeCloseTo(-5 * Math.sin((4 * Math.PI) / 180), 12);
    expect(down.noseUpNm).toBeCloseTo(-5 * Math.sin((4 * Math.PI) / 180) * 0.17, 12);
    expect(elevatorChange(down)).toBeLessThan(elevatorChange(level));
  });

  it('downthrust of a pusher behind the CG pitches it nose up', () => {
    const pusher: Over = { facing: 'pusher', mount: { to: 'datum', at: [250, 0, 0] } };
    expect(lineOf({ ...pusher, thrustDeg: [3, 0] }).noseUpNm).toBeGreaterThan(0.01);
  });

  it('a degree more by argument is a degree more in the document', () => {
    expect(lineOf({ thrustDeg: [1, 2] }, 2)).toEqual(lineOf({ thrustDeg: [3, 2] }));
  });

  it('counts a mirrored drive twice', () => {
    const single = lineOf({});
    const pair = lineOf({ mirrored: true, mount: { to: 'datum', at: [-100, 180, 30] } });
    expect(pair.noseUpNm).toBeCloseTo(2 * single.noseUpNm, 12);
    expect(pair.upPerRadN).toBeCloseTo(2 * single.upPerRadN, 12);
  });
});

describe('the load', () => {
  it('is force over pressure and area, moment over chord besides', () => {
    const load = trimLoad(axisOf(), 7.2, 100, { upN: 2.4, upPerRadN: 4.8, noseUpNm: 0.24 });
    expect(load.weight).toBeCloseTo(0.3, 12);
    expect(load.thrust.lift).toBeCloseTo(0.1, 12);
    expect(load.thrust.liftPerRad).toBeCloseTo(0.2, 12);
    expect(load.thrust.pitch).toBeCloseTo(0.05, 12);
  });

  it('needs wind', () => expect(() => trimLoad(axisOf(), 7, 0)).toThrow(RangeError));
});
