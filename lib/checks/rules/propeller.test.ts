import { describe, expect, it } from 'vitest';
import type { Airframe } from '@/lib/airframe/schema/airframe';
import { radFromDeg } from '@/lib/numerics/vec';
import { airframe, body, boom, control, drive, panel, surface } from '@/tests/support/airframe';
import { checked, speaks } from '../testing/checked';

// A pusher whose disc stands at x = 0, its foot 30 mm ahead, 152 mm across: 10 mm of air is wanted. Bent 3 degrees, the blade tip reaches
// R cos 3 + L sin 3 from the shaft's line, and forward of the disc by R sin 3 + L (1 - cos 3).
const [R, L, FLEX] = [76, 30, radFromDeg(3)];
const OUT = R * Math.cos(FLEX) + L * Math.sin(FLEX);
const FORWARD = R * Math.sin(FLEX) + L * (1 - Math.cos(FLEX));

const pusher = (diameterMm = 2 * R) =>
  drive({
    facing: 'pusher',
    mount: { to: 'datum', at: [0, 0, 0] },
    propeller: { diameterMm, pitchMm: 100, blades: 2, massG: 5 },
  });
/** Far away from everything. */
const farWing = surface({ mount: { to: 'datum', at: [-600, 0, 0] } });
const craft = (over: Partial<Airframe>): Airframe => airframe({ surfaces: [farWing], drives: [pusher()], ...over });

const boomAt = (y: number) => boom({ mount: { to: 'datum', at: [-200, y, 0] } });
/** A square sheet whose trailing edge stands so far ahead of the disc. */
const wingAhead = (mm: number, over = {}) => surface({ mount: { to: 'datum', at: [-190 - mm, 0, 0] }, ...over });

describe('propeller clearance', () => {
  it.each([
    { mm: 10.05, level: 'ok' },
    { mm: 9.95, level: 'watch' },
    { mm: 5.05, level: 'watch' },
    { mm: 4.95, level: 'bad' },
  ])('boom tubes of 4 mm with $mm mm of air: $level', ({ mm, level }) => {
    const found = checked(craft({ booms: [boomAt(OUT + 2 + mm)] }), 'propeller-clearance');
    expect(found.level).toBe(level);
    expect(found.measured?.value).toBeCloseTo(mm, 2);
    expect(Math.abs(found.at[1])).toBeCloseTo(OUT + 2 + mm, 6);
  });

  it.each([
    { mm: 10.05, level: 'ok' },
    { mm: 9.95, level: 'watch' },
  ])('a trailing edge $mm mm ahead of the bent blades: $level', ({ mm, level }) => {
    const found = checked(craft({ surfaces: [wingAhead(FORWARD + mm)] }), 'propeller-clearance');
    expect(found.level).toBe(level);
    expect(found.measured?.value).toBeCloseTo(mm, 2);
  });

  it('a large propeller wants 5 % of its diameter', () => {
    const found = checked(craft({ drives: [pusher(300)], booms: [boomAt(200)] }), 'propeller-clearance');
    expect(found.measured?.least).toBeCloseTo(15, 9);
  });

  it('a propeller through the sheet meets it, and is free in a slot that is large enough', () => {
    const through = surface({ mount: { to: 'datum', at: [-95, 0, 0] } });
    const slot = (wide: number) => ({
      ...through,
      // Shares of a panel 310 mm long and 190 mm deep, the disc at half of the chord.
      cutouts: [
        {
          id: 'slot',
          outline: [
            [0, 0.5 - wide / 190],
            [0.35, 0.5 - wide / 190],
            [0.35, 0.5 + wide / 190],
            [0, 0.5 + wide / 190],
          ] satisfies [number, number][],
        },
      ],
    });
    const level = (wing: typeof through) => checked(craft({ surfaces: [wing] }), 'propeller-clearance').level;
    expect(level(through)).toBe('bad');
    expect(level(slot(FORWARD + 12))).toBe('ok');
    expect(level(slot(FORWARD + 8))).toBe('watch');
  });

  it.each([
    { mm: 10.05, level: 'ok' },
    { mm: 9.95, level: 'watch' },
  ])('under a slab of 12 % of 190 mm where it is thickest, $mm mm of air: $level', ({ mm, level }) => {
    const section = {
      kind: 'slab' as const,
      thicknessShare: 0.12,
      profile: [
        [1, 0],
        [0.3, 0.06],
        [0, 0],
        [0.3, -0.06],
      ] satisfies [number, number][],
    };
    const wing = surface({
      mount: { to: 'datum', at: [-FORWARD - 0.3 * 190, 0, OUT + 11.4 + mm] },
      panels: [panel({ section })],
    });
    const found = checked(craft({ surfaces: [wing] }), 'propeller-clearance');
    expect(found.measured?.value).toBeCloseTo(mm, 2);
    expect(found.level).toBe(level);
  });

  it.each([
    { down: 10, level: 'ok' },
    { down: 20, level: 'watch' },
  ])('a control above the disc that comes down by $down°: $level', ({ down, level }) => {
    // 60 mm of control from its hinge comes down by 60 sin: 10.4 mm at 10 degrees, 20.5 mm at 20; half of the sheet's 5 mm lies below.
    const wing = surface({
      mount: { to: 'datum', at: [-190, 0, OUT + 25] },
      panels: [panel({ lengthMm: 300, rootChordMm: 200, tipChordMm: 200 })],
      controls: [
        control({
          from: 0,
          to: 0.9,
          chordShare: [0.3, 0.3],
          throwsDeg: { up: 5, down, lowShare: 0.7 },
          hinge: { kind: 'paper', side: 'upper', bevelDeg: [0, 40] },
        }),
      ],
    });
    expect(checked(craft({ surfaces: [wing] }), 'propeller-clearance').level).toBe(level);
  });

  it.each([
    { y: 100, level: 'ok' },
    { y: -100, level: 'ok' },
    { y: 60, level: 'bad' },
  ])('a rod that runs past it at y = $y: $level', ({ y, level }) => {
    const tail = surface({
      id: 'tail',
      role: 'tailplane',
      mount: { to: 'datum', at: [300, 0, 0] },
      controls: [
        control({
          id: 'elevator',
          kind: 'elevator',
          from: 0,
          to: 0.9,
          mix: { pitch: 1, roll: 0, yaw: 0, flap: 0 },
          linkage: {
            servoItemId: 'servo',
            servoArmMm: 8,
            hornMm: 12,
            hornStation: Math.abs(y) / 310,
            rodMm: 2,
            face: 'upper',
          },
        }),
      ],
    });
    const servo = {
      id: 'servo',
      kind: 'servo' as const,
      massG: 9,
      sizeMm: [23, 12, 24] satisfies [number, number, number],
      mount: { to: 'datum', at: [-300, y, 0] satisfies [number, number, number] },
    };
    const found = checked(craft({ surfaces: [farWing, tail], items: [servo] }), 'propeller-clearance');
    expect(found.level).toBe(level);
  });

  it('passes the body that carries the motor, and no other', () => {
    const carrier = body({ mount: { to: 'datum', at: [-525, 0, 0] } });
    expect(checked(craft({ bodies: [carrier] }), 'propeller-clearance').level).toBe('ok');
    const beside = body({ mount: { to: 'datum', at: [-260, 100, 0] } });
    expect(checked(craft({ bodies: [beside] }), 'propeller-clearance').level).toBe('bad');
    const through = body({ mount: { to: 'datum', at: [-260, 0, 0] } });
    expect(checked(craft({ bodies: [through] }), 'propeller-clearance').level).toBe('bad');
  });

  it.each([
    { mm: 10.05, level: 'ok' },
    { mm: 9.95, level: 'watch' },
  ])('a wheel under the bent blades with $mm mm of air: $level', ({ mm, level }) => {
    const wheel = {
      id: 'wheel',
      kind: 'wheel' as const,
      mount: { to: 'datum', at: [-FORWARD, 0, -(OUT + mm + 25)] satisfies [number, number, number] },
      mirrored: false,
      wheelMm: 50,
      massG: 10,
    };
    const found = checked(craft({ gear: [wheel] }), 'propeller-clearance');
    expect(found.measured?.value).toBeCloseTo(mm, 2);
    expect(found.level).toBe(level);
  });
});

describe('largest propeller between booms', () => {
  // D / 2 cos 3 + L sin 3 + 2 mm of tube + 10 mm = 110 mm.
  const most = (2 * (110 - 2 - 10 - L * Math.sin(FLEX))) / Math.cos(FLEX);
  it.each([
    { has: 193, level: 'ok' },
    { has: 194, level: 'watch' },
  ])('booms 220 mm apart leave room for 193 mm: $has mm is $level', ({ has, level }) => {
    const found = checked(craft({ drives: [pusher(has)], booms: [boomAt(110)] }), 'propeller-largest');
    expect(found.level).toBe(level);
    expect(found.measured?.most).toBeCloseTo(most, 1);
    expect(found.words).toContain('193 mm');
  });

  it('is not asked where no boom stands beside the disc', () => {
    expect(speaks(craft({}), 'propeller-largest')).toBe(false);
    expect(speaks(craft({ booms: [boom({ mount: { to: 'datum', at: [1500, 90, 0] } })] }), 'propeller-largest')).toBe(
      false,
    );
  });
});
