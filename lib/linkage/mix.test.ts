import { describe, expect, it } from 'vitest';
import { resolve } from '@/lib/airframe/resolve';
import type { Control, Surface } from '@/lib/airframe/schema/surface';
import { type MixedControl, mixedControl, type Sticks, sidesOf, turnDeg } from '@/lib/airframe/sticks';
import { airframe, control, surface } from '@/tests/support/airframe';
import { reachOf, wayOf } from './mix';

function mixed(over: Partial<Control>, on: Partial<Surface> = {}): MixedControl {
  const document = airframe({ surfaces: [surface({ ...on, controls: [control(over)] })] });
  const resolved = resolve(document);
  if (!resolved.ok) throw new RangeError('does not resolve');
  const [first] = resolved.value.surfaces;
  const [only] = first?.surface.controls ?? [];
  if (!first || !only) throw new RangeError('has no control');
  return mixedControl(resolved.value, first, only);
}
const turns = (one: MixedControl, sticks: Sticks): number[] => sidesOf(one).map((side) => turnDeg(one, side, sticks));

describe('ailerons', () => {
  const aileron = mixed({ throwsDeg: { up: 16, down: 14, lowShare: 0.5 }, differential: 0.25 });

  it('right stick: starboard up, port down by the differential', () => {
    expect(turns(aileron, { roll: 1 })).toEqual([-16, 12]);
    expect(turns(aileron, { roll: -1 })).toEqual([12, -16]);
  });

  it('the down throw of the document is the most that goes down', () => {
    expect(turns(mixed({ throwsDeg: { up: 16, down: 7, lowShare: 0.5 }, differential: 0.25 }), { roll: 1 })).toEqual([
      -16, 7,
    ]);
  });

  it('do nothing for the other sticks', () => {
    expect(turns(aileron, { pitch: 1, yaw: 1, flap: 1 })).toEqual([0, 0]);
  });
});

describe('elevons', () => {
  const elevon = (throwDeg: number) =>
    mixed({
      kind: 'elevon',
      throwsDeg: { up: throwDeg, down: throwDeg, lowShare: 0.7 },
      mix: { pitch: 1, roll: 1, yaw: 0, flap: 0 },
    });

  it('stick back and right: starboard has both, port none', () => {
    expect(turns(elevon(14), { pitch: 1, roll: 1 })).toEqual([-28, 0]);
    expect(turns(elevon(14), { pitch: 1 })).toEqual([-14, -14]);
    expect(turns(elevon(14), { pitch: -1, roll: 1 })).toEqual([0, 28]);
  });

  it('pitch gets what roll leaves of the shared throw', () => {
    expect(turns(elevon(20), { pitch: 1 })).toEqual([-8, -8]);
    expect(reachOf(elevon(20), true)).toEqual({ upDeg: 28, downDeg: 28 });
    expect(reachOf(elevon(20), false)).toEqual({ upDeg: 20, downDeg: 20 });
  });
});

describe('tails', () => {
  const pitch = { pitch: 1, roll: 0, yaw: 0, flap: 0 };
  const yaw = { pitch: 0, roll: 0, yaw: 1, flap: 0 };

  it('stick back: elevator up on a tail, down on a foreplane', () => {
    expect(turns(mixed({ kind: 'elevator', mix: pitch }, { role: 'tailplane' }), { pitch: 1 })).toEqual([-15, -15]);
    expect(turns(mixed({ kind: 'elevator', mix: pitch }, { role: 'foreplane' }), { pitch: 1 })).toEqual([15, 15]);
  });

  it('V-tail: stick back both up, right rudder starboard down and port up; upside down the other way', () => {
    const ruddervator = (cantDeg: number) =>
      mixed({ kind: 'ruddervator', mix: { ...pitch, yaw: 0.6 } }, { role: 'vtail', cantDeg });
    expect(turns(ruddervator(40), { pitch: 1 })).toEqual([-15, -15]);
    expect(turns(ruddervator(40), { yaw: 1 })).toEqual([9, -9]);
    expect(turns(ruddervator(-40), { yaw: 1 })).toEqual([-9, 9]);
    expect(turns(ruddervator(40), { pitch: 1, yaw: 1 })).toEqual([-6, -24]);
  });

  it.each([
    ['on top', 90],
    ['below', -90],
  ])('right rudder: a fin %s turns its trailing edge to starboard', (_, cantDeg) => {
    const rudder = mixed({ kind: 'rudder', mix: yaw }, { role: 'fin', cantDeg, mirrored: false });
    const [turn = 0] = turns(rudder, { yaw: 1 });
    expect(Math.abs(turn)).toBe(15);
    expect(wayOf(rudder, 'centre', turn)).toBe('stbd');
  });

  it('a negative share of yaw turns a rudder to port, and a V-tail the other way round', () => {
    const back = { ...yaw, yaw: -1 };
    const rudder = mixed({ kind: 'rudder', mix: back }, { role: 'fin', cantDeg: 90, mirrored: false });
    expect(wayOf(rudder, 'centre', turns(rudder, { yaw: 1 })[0] ?? 0)).toBe('port');
    const ruddervator = mixed({ kind: 'ruddervator', mix: back }, { role: 'vtail', cantDeg: 40 });
    expect(turns(ruddervator, { yaw: 1 })).toEqual([-15, 15]);
  });

  it('a tail that runs inward to a peak is seen from behind, not from its own upper face', () => {
    const peaked = mixed({ kind: 'ruddervator', mix: { ...pitch, yaw: 1 } }, { role: 'vtail', cantDeg: 140 });
    const seen = (sticks: Sticks) => sidesOf(peaked).map((side) => wayOf(peaked, side, turnDeg(peaked, side, sticks)));
    expect(seen({ pitch: 1 })).toEqual(['up', 'up']);
    // Its starboard half faces port and down, so to starboard is up on that side.
    expect(seen({ yaw: 1 })).toEqual(['up', 'down']);
  });

  it('both of a pair of fins turn to the same side', () => {
    const rudder = mixed({ kind: 'rudder', mix: yaw }, { role: 'fin', cantDeg: 90 });
    const [stbd = 0, port = 0] = turns(rudder, { yaw: 1 });
    expect([wayOf(rudder, 'stbd', stbd), wayOf(rudder, 'port', port)]).toEqual(['stbd', 'stbd']);
  });
});

describe('flaps', () => {
  it('flaperons go down for flap and still roll; airbrakes with a negative share go up', () => {
    const flaperon = mixed({ kind: 'flaperon', mix: { pitch: 0, roll: 1, yaw: 0, flap: 0.4 } });
    expect(turns(flaperon, { flap: 1 })).toEqual([6, 6]);
    expect(turns(flaperon, { flap: 1, roll: 1 })).toEqual([-9, 21]);
    const brake = mixed({ kind: 'airbrake', mix: { pitch: 0, roll: 0, yaw: 0, flap: -1 } });
    expect(turns(brake, { flap: 1 })).toEqual([-15, -15]);
  });
});
