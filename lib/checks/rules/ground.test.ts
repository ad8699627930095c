import { describe, expect, it } from 'vitest';
import type { Airframe } from '@/lib/airframe/schema/airframe';
import type { Gear } from '@/lib/airframe/schema/fuselage';
import { airframe, drive } from '@/tests/support/airframe';
import { checked, speaks } from '../testing/checked';

// Main wheels of 50 mm with their axles at x = 0: the ground is 25 mm under them. A propeller of 200 mm reaches 100 mm down.
const gear = (id: string, at: [number, number, number], over: Partial<Gear> = {}): Gear => ({
  id,
  kind: 'wheel',
  mount: { to: 'datum', at },
  mirrored: false,
  wheelMm: 50,
  massG: 10,
  ...over,
});
const mains = (z: number) => gear('mains', [0, 80, z], { mirrored: true });
const motor = (x: number) =>
  drive({
    mount: { to: 'datum', at: [x, 0, 0] },
    propeller: { diameterMm: 200, pitchMm: 100, blades: 2, massG: 8 },
  });
/** The wing's trailing edge ends at x = 190, z = 0: the only structure. */
const craft = (over: Partial<Airframe>): Airframe => airframe({ drives: [motor(-200)], ...over });

describe('level', () => {
  it.each([
    { air: 25.1, level: 'ok' },
    { air: 24.9, level: 'watch' },
    { air: 10.1, level: 'watch' },
    { air: 9.9, level: 'bad' },
    { air: -3, level: 'bad' },
  ])('$air mm under the blades: $level', ({ air, level }) => {
    const found = checked(craft({ gear: [mains(-100 - air + 25)] }), 'ground-clearance-level');
    expect(found.level).toBe(level);
    expect(found.measured?.value).toBeCloseTo(air, 9);
  });

  it('stands on whatever is lowest', () => {
    const nose = gear('nose', [-150, 0, -140]);
    expect(checked(craft({ gear: [mains(-120), nose] }), 'ground-clearance-level').measured?.value).toBeCloseTo(65, 9);
  });
});

describe('tail down', () => {
  it.each([
    { skidZ: -63, level: 'watch' },
    { skidZ: -70, level: 'ok' },
  ])('a pusher behind the wheels with a tail skid at $skidZ mm: $level', ({ skidZ, level }) => {
    // Ground runs from the wheels at -150 to the skid 600 mm behind: at the disc, 180 mm behind, it has risen by 0.3 of that.
    const skid = gear('skid', [600, 0, skidZ], { kind: 'skid', wheelMm: undefined });
    const found = checked(craft({ drives: [motor(180)], gear: [mains(-125), skid] }), 'ground-clearance-tail-down');
    const rise = skidZ + 150;
    const air = (-100 - (-150 + rise * 0.3)) / Math.hypot(1, rise / 600);
    expect(found.measured?.value).toBeCloseTo(air, 6);
    expect(found.level).toBe(level);
  });

  it('without a skid the tail end itself comes down', () => {
    // The trailing edge, 190 mm behind and 150 mm up, is what touches.
    const found = checked(craft({ gear: [mains(-125)] }), 'ground-clearance-tail-down');
    const slope = 150 / 190;
    const air = (-100 + 150 + slope * 200) / Math.hypot(1, slope);
    expect(found.measured?.value).toBeCloseTo(air, 6);
  });
});

it('is not asked of what has no wheels', () => {
  expect(speaks(craft({ gear: [gear('keel', [0, 0, -40], { kind: 'keel' })] }), 'ground-clearance-level')).toBe(false);
});
