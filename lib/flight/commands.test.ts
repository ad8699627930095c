import { describe, expect, it } from 'vitest';
import { ALL_COUNTED } from '@/lib/aero/corrections';
import { wholeAircraft } from '@/lib/aero/wholeAircraft';
import { resolve } from '@/lib/airframe/resolve';
import type { Airframe } from '@/lib/airframe/schema/airframe';
import type { Control, Surface } from '@/lib/airframe/schema/surface';
import { airframe, control, panel, surface } from '@/tests/support/airframe';
import {
  neutralControls,
  neutralDeflections,
  pitchCommand,
  rollCommand,
  upStickProblems,
  yawCommand,
} from './commands';

const deg = (value: number) => (value * Math.PI) / 180;
const flying = (...controls: Control[]) => airframe({ surfaces: [surface({ controls })] });
const elevon = (over: Partial<Control> = {}) =>
  control({
    id: 'elevon',
    kind: 'elevon',
    throwsDeg: { up: 18, down: 11, lowShare: 0.7 },
    mix: { pitch: 0.6, roll: 0.5, yaw: 0, flap: 0 },
    ...over,
  });
const only = <T>(effect: T) => new Map([['wing/elevon', effect]]);
/** Trailing edge down lifts and drops the nose: behind the CG. */
const aft = only({ lift: 0.9, pitch: -0.4 });
/** Trailing edge down lifts and raises the nose: ahead of the CG. */
const ahead = only({ lift: 0.9, pitch: 0.7 });
const rolling = only({ side: 0.05, roll: -0.2, yaw: 0.03 });

describe('the elevator stick', () => {
  const foreplane = airframe({ surfaces: [surface({ role: 'foreplane', controls: [elevon()] })] });

  it('turns an elevon up for nose up, and a control on a foreplane down', () => {
    const tail = pitchCommand(flying(elevon()), aft);
    const fore = pitchCommand(foreplane, ahead);
    expect(tail?.deflectionsRad.get('wing/elevon')).toBeCloseTo(-deg(18 * 0.6), 12);
    expect(tail?.pitch).toBeCloseTo(0.4 * deg(18 * 0.6), 12);
    expect(tail?.lift).toBeCloseTo(-0.9 * deg(18 * 0.6), 12);
    expect(fore?.deflectionsRad.get('wing/elevon')).toBeCloseTo(deg(11 * 0.6), 12);
    expect(fore?.pitch).toBeCloseTo(0.7 * deg(11 * 0.6), 12);
  });

  it('uses the other throw for nose down', () => {
    const tail = pitchCommand(flying(elevon()), aft, 'down');
    const fore = pitchCommand(foreplane, ahead, 'down');
    expect(tail?.deflectionsRad.get('wing/elevon')).toBeCloseTo(deg(11 * 0.6), 12);
    expect(tail?.pitch).toBeCloseTo(-0.4 * deg(11 * 0.6), 12);
    expect(fore?.deflectionsRad.get('wing/elevon')).toBeCloseTo(-deg(18 * 0.6), 12);
  });

  it('gets what roll leaves of the 28 degrees that a shared linkage has', () => {
    const wide = elevon({
      throwsDeg: { up: 30, down: 30, lowShare: 0.7 },
      mix: { pitch: 1, roll: 0.7, yaw: 0, flap: 0 },
    });
    expect(pitchCommand(flying(wide), aft)?.throwDeg).toBeCloseTo(28 - 21, 12);
    const apart = elevon({
      throwsDeg: { up: 30, down: 30, lowShare: 0.7 },
      mix: { pitch: 1, roll: 0, yaw: 0, flap: 0 },
    });
    expect(pitchCommand(flying(apart), aft)?.throwDeg).toBeCloseTo(30, 12);
  });

  it('does not exist without a share of pitch, without the effect, or without travel', () => {
    expect(pitchCommand(flying(control()), aft)).toBeNull();
    expect(pitchCommand(flying(elevon()), new Map())).toBeNull();
    const stuck = elevon({ throwsDeg: { up: 0, down: 11, lowShare: 0.7 } });
    expect(pitchCommand(flying(stuck), aft)).toBeNull();
    expect(pitchCommand(flying(stuck), aft, 'down')).not.toBeNull();
  });

  it('turns by the document alone, so its moment is negative where that drops the nose', () => {
    const tail = pitchCommand(flying(elevon()), aft);
    const fore = pitchCommand(flying(elevon()), ahead);
    expect(fore?.deflectionsRad).toEqual(tail?.deflectionsRad);
    expect(fore?.pitch).toBeCloseTo(-0.7 * deg(18 * 0.6), 12);
  });

  it('honours the sign of the share, with the throw of the way it then goes', () => {
    const turned = elevon({ mix: { pitch: -0.6, roll: 0.5, yaw: 0, flap: 0 } });
    const command = pitchCommand(flying(turned), aft);
    expect(command?.deflectionsRad.get('wing/elevon')).toBeCloseTo(deg(11 * 0.6), 12);
    expect(command?.pitch).toBeCloseTo(-0.4 * deg(11 * 0.6), 12);
  });

  it('adds up controls that move together', () => {
    const two = flying(elevon(), elevon({ id: 'inner', throwsDeg: { up: 6, down: 6, lowShare: 0.7 } }));
    const effects = new Map([...aft, ['wing/inner', { lift: 0.5, pitch: -0.1 }]]);
    const command = pitchCommand(two, effects);
    expect(command?.pitch).toBeCloseTo(0.4 * deg(10.8) + 0.1 * deg(3.6), 12);
    expect(command?.throwDeg).toBeCloseTo(10.8, 12);
  });
});

describe('up stick that drops the nose', () => {
  const flap = (pitch: number) => elevon({ id: 'flap', kind: 'flap', mix: { pitch, roll: 0, yaw: 0, flap: 1 } });
  const both = (pitch: number) => flying(elevon(), flap(pitch));
  /** Neutral point a tenth of the chord behind the reference point. */
  const alpha = { lift: 5, pitch: -0.5 };
  const model = (flapPitch: number) => ({
    alpha,
    controls: new Map([...aft, ['wing/flap', { lift: 0.9, pitch: flapPitch }]]),
  });

  it('is a problem at the share of each control that drops it', () => {
    expect(upStickProblems(flying(elevon()), { alpha, controls: ahead })).toMatchObject([
      { code: 'up-stick-drops-nose', path: 'surfaces.0.controls.0.mix.pitch' },
    ]);
    const problems = upStickProblems(both(-1), model(-2));
    expect(problems.map(({ path }) => path)).toEqual(['surfaces.0.controls.1.mix.pitch']);
    expect(problems[0]?.message).toContain('the flap turns');
  });

  it('is judged about the neutral point: a control between it and the CG works the wrong way', () => {
    const between = (pitch: number) => ({ alpha, controls: only({ lift: 0.9, pitch }) });
    expect(upStickProblems(flying(elevon()), between(-0.0899))).toHaveLength(1);
    expect(upStickProblems(flying(elevon()), between(-0.0901))).toEqual([]);
    const reversed = elevon({ mix: { pitch: -0.6, roll: 0.5, yaw: 0, flap: 0 } });
    expect(upStickProblems(flying(reversed), between(-0.0899))).toEqual([]);
    expect(upStickProblems(flying(reversed), between(-0.0901))).toHaveLength(1);
  });

  it('is none while the others outweigh it, and none without a pitch control', () => {
    expect(upStickProblems(both(-0.3), model(-0.2))).toEqual([]);
    expect(upStickProblems(both(0.3), model(-0.2))).toEqual([]);
    expect(upStickProblems(flying(control()), { alpha, controls: aft })).toEqual([]);
  });
});

describe('the aileron stick', () => {
  it('rolls right by the mean of both sides, and left with a negative share', () => {
    const left = rollCommand(flying(elevon({ mix: { pitch: 0.6, roll: -0.5, yaw: 0, flap: 0 } })), rolling);
    expect(left?.roll).toBeCloseTo(-0.2 * deg((9 + 5.5) / 2), 12);
    const right = rollCommand(flying(elevon()), rolling);
    expect(right?.roll).toBeCloseTo(0.2 * deg((9 + 5.5) / 2), 12);
    expect(right?.yaw).toBeCloseTo(-0.03 * deg((9 + 5.5) / 2), 12);
    expect(right?.throwDeg).toBeCloseTo(9, 12);
  });

  it('moves the down-going side less by the differential', () => {
    const full = elevon({
      throwsDeg: { up: 20, down: 20, lowShare: 0.7 },
      mix: { pitch: 0, roll: 1, yaw: 0, flap: 0 },
    });
    const roll = (differential: number) => rollCommand(flying({ ...full, differential }), rolling)?.roll ?? 0;
    expect(roll(0)).toBeCloseTo(0.2 * deg(20), 12);
    expect(roll(0.4)).toBeCloseTo(0.2 * deg((20 + 12) / 2), 12);
    expect(roll(1)).toBeCloseTo(0.2 * deg(10), 12);
  });

  it('does not exist without a share of roll', () => {
    expect(rollCommand(flying(elevon({ mix: { pitch: 1, roll: 0, yaw: 0, flap: 0 } })), rolling)).toBeNull();
  });
});

describe('the rudder stick', () => {
  const rudder = (yaw: number): Control =>
    elevon({ throwsDeg: { up: 24, down: 20, lowShare: 0.7 }, mix: { pitch: 0, roll: 0, yaw, flap: 0 } });

  it.each([
    [0.5, 1],
    [-0.5, -1],
  ])('turns both sides by the share %d, by the mean of both', (share, sign) => {
    const command = yawCommand(flying(rudder(share)), only({ side: 0.1, roll: 0.02, yaw: 0.03 }));
    expect(command?.yaw).toBeCloseTo(sign * 0.03 * deg(11), 12);
    expect(command?.side).toBeCloseTo(sign * 0.1 * deg(11), 12);
  });

  it('turns one fin on the centre plane by the throw of the way it goes', () => {
    const fin = (yaw: number) =>
      airframe({ surfaces: [surface({ role: 'fin', cantDeg: 90, mirrored: false, controls: [rudder(yaw)] })] });
    const effect = only({ side: 0.1, roll: 0.02, yaw: 0.03 });
    expect(yawCommand(fin(0.5), effect)?.yaw).toBeCloseTo(0.03 * deg(10), 12);
    expect(yawCommand(fin(-0.5), effect)?.yaw).toBeCloseTo(-0.03 * deg(12), 12);
  });

  it('does not exist without a share of yaw', () => expect(yawCommand(flying(elevon()), rolling)).toBeNull());
});

describe('controls at rest', () => {
  it('lift and pitch by their rest position', () => {
    const reflexed = flying(elevon({ neutralDeg: -2.5 }));
    expect(neutralControls(reflexed, aft).lift).toBeCloseTo(-0.9 * deg(2.5), 12);
    expect(neutralControls(reflexed, aft).pitch).toBeCloseTo(0.4 * deg(2.5), 12);
    expect(neutralDeflections(reflexed).get('wing/elevon')).toBeCloseTo(-deg(2.5), 12);
  });
});

describe('on whole aircraft, CG at the quarter chord', () => {
  const wing = surface({ panels: [panel({ lengthMm: 450 })] });
  const stabiliser = (x: number, over: Partial<Surface>): Surface =>
    surface({
      id: 'tail',
      mount: { to: 'datum', at: [x, 0, 40] },
      panels: [panel({ lengthMm: 150, rootChordMm: 90, tipChordMm: 90 })],
      ...over,
    });
  const moved = (kind: Control['kind'], pitch: number, yaw: number): Control =>
    control({ id: 'c', kind, from: 0.05, to: 0.95, chordShare: [0.4, 0.4], mix: { pitch, roll: 0, yaw, flap: 0 } });
  function modelOf(document: Airframe) {
    const resolved = resolve(document);
    if (!resolved.ok) throw new RangeError('does not resolve');
    const reference = { area: 2 * 450 * 190, chord: 190, span: 900, point: [47.5, 0, 0] as const };
    const model = wholeAircraft(document, resolved.value, reference, ALL_COUNTED);
    if (!model.ok) throw new RangeError(model.problems[0]?.message);
    return model.value;
  }
  const pitched = (document: Airframe) => pitchCommand(document, modelOf(document).controls)?.pitch;
  const yawed = (document: Airframe) =>
    yawCommand(document, modelOf(document).lateral({ alphaRad: 0.05, deflectionsRad: new Map() }).controls)?.yaw;

  it.each<[string, number, Partial<Surface>]>([
    ['a tailplane behind', 600, { role: 'tailplane' }],
    ['a tailplane ahead', -400, { role: 'tailplane' }],
    ['a foreplane', -400, { role: 'foreplane' }],
    ['a V-tail', 600, { role: 'vtail', cantDeg: 38 }],
    ['a V-tail that hangs', 600, { role: 'vtail', cantDeg: -38 }],
  ])('up stick on %s lifts the nose, and its reversed share drops it', (_, x, over) => {
    const flown = (pitch: number) =>
      airframe({ surfaces: [wing, stabiliser(x, { ...over, controls: [moved('elevator', pitch, 0)] })] });
    expect(pitched(flown(1))).toBeGreaterThan(0.1);
    expect(pitched(flown(-1))).toBeLessThan(-0.1);
  });

  it('up stick on a tail that runs inward from two booms to a peak lifts the nose', () => {
    const tail = stabiliser(600, { role: 'vtail', cantDeg: 142, controls: [moved('ruddervator', 1, 1)] });
    const peaked = airframe({ surfaces: [wing, { ...tail, mount: { to: 'datum', at: [600, 125, 0] } }] });
    expect(pitched(peaked)).toBeGreaterThan(0.1);
    expect(yawed(peaked)).toBeGreaterThan(0.005);
  });

  it.each<[string, number, Partial<Surface>]>([
    ['a fin behind', 600, { role: 'fin', cantDeg: 90, mirrored: false }],
    ['a fin that hangs', 600, { role: 'fin', cantDeg: -90, mirrored: false }],
    ['a fin ahead', -400, { role: 'fin', cantDeg: 90, mirrored: false }],
    ['a V-tail', 600, { role: 'vtail', cantDeg: 38 }],
    ['a V-tail that hangs', 600, { role: 'vtail', cantDeg: -38 }],
  ])('right rudder on %s turns the nose right, and its reversed share left', (_, x, over) => {
    const flown = (yaw: number) =>
      airframe({ surfaces: [wing, stabiliser(x, { ...over, controls: [moved('rudder', 0, yaw)] })] });
    expect(yawed(flown(1))).toBeGreaterThan(0.005);
    expect(yawed(flown(-1))).toBeLessThan(-0.005);
  });
});
