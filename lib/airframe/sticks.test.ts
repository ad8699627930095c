import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { airframe, control, panel, surface } from '@/tests/support/airframe';
import { resolve } from './resolve';
import type { Control, Surface } from './schema/surface';
import { type MixedControl, mixedControl, SHARED_THROW_DEG, type Sticks, sidesOf, turnDeg } from './sticks';

/** A control on its surface, behind or ahead of a straight wing of 190 mm chord whose quarter point lies at 47.5 mm. */
function mixed(over: Partial<Control>, on: Partial<Surface> = {}, wing: Partial<Surface> = {}): MixedControl {
  const carrier = surface({ ...on, controls: [control(over)] });
  const document = airframe({
    surfaces: carrier.role === 'wing' ? [carrier] : [carrier, surface({ id: 'mainplane', ...wing })],
  });
  const resolved = resolve(document);
  if (!resolved.ok) throw new RangeError('does not resolve');
  const [first] = resolved.value.surfaces;
  const [only] = first?.surface.controls ?? [];
  if (!first || !only) throw new RangeError('has no control');
  return mixedControl(resolved.value, first, only);
}
const turns = (one: MixedControl, sticks: Sticks): number[] => sidesOf(one).map((side) => turnDeg(one, side, sticks));

const PITCH = { pitch: 1, roll: 0, yaw: 0, flap: 0 };
const YAW = { pitch: 0, roll: 0, yaw: 1, flap: 0 };
const throwDeg = fc.integer({ min: 0, max: 80 });
const share = fc.integer({ min: -100, max: 100 }).map((pct) => pct / 100);

describe('how far', () => {
  it('a control moves by its share of the mix, each way by its own throw', () => {
    const elevator = mixed({ throwsDeg: { up: 12, down: 8, lowShare: 0.7 }, mix: { ...PITCH, pitch: 0.5 } });
    expect(turns(elevator, { pitch: 1 })).toEqual([-6, -6]);
    expect(turns(elevator, { pitch: -1 })).toEqual([4, 4]);
  });

  it('pitch gets what roll leaves of 28 degrees', () => {
    const elevon = mixed({ throwsDeg: { up: 21, down: 14, lowShare: 0.7 }, mix: { ...PITCH, roll: 1 } });
    expect(turns(elevon, { pitch: 1 })).toEqual([-7, -7]);
    expect(turns(elevon, { pitch: -1 })).toEqual([14, 14]);
  });

  it('the side that goes down moves less by the differential, and never past its own throw', () => {
    const aileron = (down: number) => mixed({ throwsDeg: { up: 20, down, lowShare: 0.7 }, differential: 0.4 });
    expect(turns(aileron(20), { roll: 1 })).toEqual([-20, 12]);
    expect(turns(aileron(20), { roll: -1 })).toEqual([12, -20]);
    expect(turns(aileron(5), { roll: 1 })).toEqual([-20, 5]);
  });

  it('a linkage is asked for no more than both share, unless roll alone does', () => {
    fc.assert(
      fc.property(throwDeg, share, share, (up, pitch, roll) => {
        fc.pre(roll !== 0);
        const elevon = mixed({
          throwsDeg: { up, down: up, lowShare: 0.7 },
          mix: { pitch, roll, yaw: 0, flap: 0 },
        });
        const rolled = Math.max(...turns(elevon, { roll: 1 }).map(Math.abs));
        const most = Math.max(...turns(elevon, { pitch: 1, roll: 1 }).map(Math.abs));
        expect(most).toBeLessThanOrEqual(Math.max(SHARED_THROW_DEG.value, rolled) + 1e-9);
      }),
    );
  });
});

describe('which way', () => {
  const elevator = { kind: 'elevator', mix: PITCH } as const;
  const at = (x: number): Pick<Surface, 'mount' | 'panels'> => ({
    mount: { to: 'datum', at: [x, 0, 0] },
    panels: [panel({ lengthMm: 150, rootChordMm: 80, tipChordMm: 80 })],
  });

  it('up stick: up on a tail, down on a foreplane wherever it stands', () => {
    expect(turns(mixed(elevator, { role: 'tailplane', ...at(500) }), { pitch: 1 })).toEqual([-15, -15]);
    expect(turns(mixed(elevator, { role: 'foreplane', ...at(-300) }), { pitch: 1 })).toEqual([15, 15]);
    expect(turns(mixed(elevator, { role: 'foreplane', ...at(10) }), { pitch: 1 })).toEqual([15, 15]);
  });

  it('a tailplane turns over where the middle of its hinge passes the quarter point of the wing', () => {
    // The hinge of a control of a quarter of 80 mm lies 60 mm behind the leading edge.
    const quarter = { ...elevator, chordShare: [0.25, 0.25] as [number, number] };
    expect(turns(mixed(quarter, { role: 'tailplane', ...at(47.5 - 60 - 1) }), { pitch: 1 })).toEqual([15, 15]);
    expect(turns(mixed(quarter, { role: 'tailplane', ...at(47.5 - 60 + 1) }), { pitch: 1 })).toEqual([-15, -15]);
    // A swept wing of 190 mm: its mean chord stands 310 / 2 x tan 45 degrees further aft.
    const swept = { panels: [panel({ sweepDeg: 45 })] };
    expect(turns(mixed(quarter, { role: 'tailplane', ...at(47.5 + 155 - 60 - 1) }, swept), { pitch: 1 })[0]).toBe(15);
    expect(turns(mixed(quarter, { role: 'tailplane', ...at(47.5 + 155 - 60 + 1) }, swept), { pitch: 1 })[0]).toBe(-15);
  });

  it('elevons go up with up stick wherever sweep puts them', () => {
    for (const sweepDeg of [-35, 0, 35]) {
      const elevon = mixed({ kind: 'elevon', mix: PITCH, from: 0.7 }, { panels: [panel({ sweepDeg })] });
      expect(turns(elevon, { pitch: 1 })).toEqual([-15, -15]);
    }
  });

  it('a negative share turns each stick over, with the throw of that way', () => {
    const throwsDeg = { up: 20, down: 10, lowShare: 0.7 };
    const flap = mixed({ kind: 'flap', throwsDeg, mix: { ...PITCH, pitch: -0.3 } });
    expect(turns(flap, { pitch: 1 })).toEqual([3, 3]);
    expect(turns(flap, { pitch: -1 })).toEqual([-6, -6]);
    const rudder = (yaw: number) =>
      mixed(
        { kind: 'rudder', throwsDeg, mix: { ...YAW, yaw } },
        { role: 'fin', cantDeg: 90, ...at(500), mirrored: false },
      );
    expect(turns(rudder(1), { yaw: 1 })).toEqual([10]);
    expect(turns(rudder(-1), { yaw: 1 })).toEqual([-20]);
    const aileron = mixed({ throwsDeg, mix: { pitch: 0, roll: -1, yaw: 0, flap: 0 } });
    expect(turns(aileron, { roll: 1 })).toEqual([10, -20]);
  });

  it('right rudder ahead of the wing goes to port', () => {
    const rudder = mixed({ kind: 'rudder', mix: YAW }, { role: 'fin', cantDeg: 90, ...at(-300), mirrored: false });
    expect(turns(rudder, { yaw: 1 })).toEqual([-15]);
  });

  it('a panel on its back turns the other way about its own faces', () => {
    const peaked = mixed({ ...elevator, mix: { ...PITCH, flap: 0.5 } }, { role: 'vtail', cantDeg: 140, ...at(500) });
    expect(turns(peaked, { pitch: 1 })).toEqual([15, 15]);
    expect(turns(peaked, { flap: 1 })).toEqual([-7.5, -7.5]);
  });

  it('without a wing, a control is behind it', () => {
    const document = airframe({ surfaces: [surface({ role: 'tailplane', controls: [control({ mix: PITCH })] })] });
    const resolved = resolve(document);
    if (!resolved.ok) throw new RangeError('does not resolve');
    const [first] = resolved.value.surfaces;
    if (!first) throw new RangeError('has no surface');
    expect(mixedControl(resolved.value, first, control()).ahead).toBe(false);
  });
});
