import { describe, expect, it } from 'vitest';
import hask from '@/examples/hask.json';
import ombry from '@/examples/ombry-1000.json';
import quenlet from '@/examples/quenlet-700.json';
import tarrel from '@/examples/tarrel-620.json';
import { parseAirframe } from '@/lib/airframe/parse';
import type { Airframe } from '@/lib/airframe/schema/airframe';
import type { Control } from '@/lib/airframe/schema/surface';
import { pitchCommand } from '@/lib/flight/commands';
import { degFromRad } from '@/lib/numerics/vec';
import { airframe, control, panel, surface } from '@/tests/support/airframe';
import { type SetUpSheet, setUpSheet } from './setUp';
import { setUpSections } from './setUpWords';

const example = (json: unknown): Airframe => {
  const parsed = parseAirframe(json);
  if (!parsed.ok) throw new RangeError(parsed.problems[0]?.message);
  return parsed.value;
};
const sheetOf = (from: Airframe): SetUpSheet => {
  const sheet = setUpSheet(from);
  if (!sheet.ok) throw new RangeError(sheet.problems[0]?.message);
  return sheet.value;
};
const textsOf = (from: Airframe): string[] =>
  setUpSections(sheetOf(from)).flatMap(({ rows }) => rows.map(({ text }) => text));
/** A straight wing of 200 mm chord, its control 50 mm deep. */
const winged = (over: Partial<Control>, rest: Partial<Airframe> = {}): Airframe =>
  airframe({
    surfaces: [
      surface({
        panels: [panel({ lengthMm: 400, rootChordMm: 200, tipChordMm: 200 })],
        controls: [control({ from: 0.5, to: 0.9, chordShare: [0.25, 0.25], ...over })],
      }),
    ],
    ...rest,
  });

describe('throws', () => {
  it('stand in degrees and in millimetres at the widest chord, high and low', () => {
    const [only] = sheetOf(winged({ throwsDeg: { up: 20, down: 16, lowShare: 0.6 }, differential: 0.5 })).controls;
    expect(only?.widestMm).toBeCloseTo(50, 9);
    expect(only?.throws.map(({ stick, high, low }) => [stick, high.way, high.deg, low?.deg])).toEqual([
      ['roll', 'up', 20, 12],
      ['roll', 'down', 10, 6],
    ]);
    // The chord of an arc: 2 x 50 x sin 10 degrees = 17.365 mm.
    expect(only?.throws[0]?.high.mm).toBeCloseTo(17.365, 3);
  });

  it('neutral is a magnitude with its way', () => {
    const [only] = sheetOf(winged({ neutralDeg: -2.5 })).controls;
    expect(only?.neutral).toMatchObject({ way: 'up', deg: 2.5 });
    expect(only?.neutral.mm).toBeCloseTo(2 * 50 * Math.sin((1.25 * Math.PI) / 180), 9);
  });

  /** Full up stick: what the handling figures turn and what the sheet prints, trailing edge down positive, by control. */
  function upStick(from: Airframe): { figures: [string, number][]; sheet: [string, number][] } {
    // Directions are the document's: the effects of the controls only have to be there.
    const effects = new Map(
      from.surfaces.flatMap(({ id, controls }) => controls.map((one) => [`${id}/${one.id}`, { lift: 1, pitch: -1 }])),
    );
    const moved = sheetOf(from).controls.flatMap(({ id, moves }): [string, number][] => {
      const alone = moves.find(({ sticks }) => sticks.length === 1 && sticks[0] === 'pitch');
      const [first] = alone?.sides ?? [];
      return first ? [[id, first.way === 'down' ? first.deg : -first.deg]] : [];
    });
    const command = pitchCommand(from, effects);
    return { figures: [...(command?.deflectionsRad ?? [])].map(([id, rad]) => [id, degFromRad(rad)]), sheet: moved };
  }
  function expectSame(from: Airframe): void {
    const { figures, sheet } = upStick(from);
    expect(sheet.length).toBeGreaterThan(0);
    expect(sheet.map(([id]) => id)).toEqual(figures.map(([id]) => id));
    for (const [i, [, deg]] of sheet.entries()) expect(deg).toBeCloseTo(figures[i]?.[1] ?? Number.NaN, 9);
  }

  it.each([
    ['Hask', hask],
    ['Ombry', ombry],
    ['Quenlet', quenlet],
    ['Tarrel', tarrel],
  ])('%s: full pitch stick is what the handling figures reckon with, and up', (_, json) => {
    const from = example(json);
    expectSame(from);
    for (const [, deg] of upStick(from).sheet) expect(deg).toBeLessThan(0);
  });

  const elevator = { id: 'elevator', kind: 'elevator', mix: { pitch: 1, roll: 0, yaw: 0, flap: 0 } } as const;
  const tail = (xMm: number, over: Partial<Control> = {}) =>
    surface({
      id: 'tail',
      role: 'tailplane',
      mount: { to: 'datum', at: [xMm, 0, 0] },
      controls: [control({ ...elevator, ...over })],
    });
  const flapped = (pitch: number): Airframe => {
    const from = winged({ id: 'flap', kind: 'flap', mix: { pitch, roll: 0, yaw: 0, flap: 1 } });
    return { ...from, surfaces: [...from.surfaces, tail(600)] };
  };

  it.each<[string, Airframe, number[]]>([
    ['a wing flap with a positive share of pitch goes up with the elevator', flapped(0.3), [-4.5, -15]],
    ['a wing flap with a negative share goes down with the elevator', flapped(-0.3), [4.5, -15]],
    ['an elevator with a negative share goes down', winged({ ...elevator, mix: { ...elevator.mix, pitch: -1 } }), [15]],
    ['a tailplane ahead of the wing goes down', airframe({ surfaces: [surface(), tail(-400)] }), [15]],
    [
      'elevons on a wing swept forward go up',
      airframe({
        surfaces: [
          surface({
            panels: [panel({ lengthMm: 450, sweepDeg: -30 })],
            controls: [control({ ...elevator, from: 0.6, to: 0.95 })],
          }),
        ],
      }),
      [-15],
    ],
  ])('%s, in the figures and on the sheet', (_, from, expected) => {
    expectSame(from);
    expect(upStick(from).sheet.map(([, deg]) => deg)).toEqual(expected.map((deg) => expect.closeTo(deg, 9)));
  });

  it('a rudder with a negative share goes to port', () => {
    const fin = (yaw: number): Airframe => {
      const rudder = control({ id: 'rudder', kind: 'rudder', mix: { pitch: 0, roll: 0, yaw, flap: 0 } });
      const standing = surface({
        id: 'fin',
        role: 'fin',
        cantDeg: 90,
        mirrored: false,
        mount: { to: 'datum', at: [600, 0, 0] },
        controls: [rudder],
      });
      return airframe({ surfaces: [surface(), standing] });
    };
    expect(textsOf(fin(1))).toContain('Rudder stick right: rudder to starboard 15°.');
    expect(textsOf(fin(-1))).toContain('Rudder stick right: rudder to port 15°.');
  });
});

describe('mixes', () => {
  it('elevons: each side for each stick, and for both', () => {
    const [elevon] = sheetOf(example(quenlet)).controls;
    expect(
      elevon?.moves.map(({ sticks, sides }) => [sticks.join('+'), ...sides.map(({ way, deg }) => `${way} ${deg}`)]),
    ).toEqual([
      ['pitch', 'up 14', 'up 14'],
      ['roll', 'up 14', 'down 14'],
      ['pitch+roll', 'up 28', 'none 0'],
    ]);
    expect(elevon?.moves.some(({ overShared }) => overShared)).toBe(false);
  });

  it('a V-tail that asks for more than the shared throw is told so', () => {
    const vtail = (throwDeg: number) => {
      const from = winged({});
      const tail = surface({
        id: 'tail',
        role: 'vtail',
        cantDeg: 38,
        mount: { to: 'datum', at: [600, 0, 0] },
        controls: [
          control({
            id: 'ruddervator',
            kind: 'ruddervator',
            throwsDeg: { up: throwDeg, down: throwDeg, lowShare: 0.7 },
            mix: { pitch: 1, roll: 0, yaw: 1, flap: 0 },
          }),
        ],
      });
      return { ...from, surfaces: [...from.surfaces, tail] };
    };
    const both = (from: Airframe) => sheetOf(from).controls[1]?.moves.find(({ sticks }) => sticks.length === 2);
    expect(both(vtail(13))).toMatchObject({ overShared: false, sides: [{ way: 'none' }, { way: 'up', deg: 26 }] });
    expect(both(vtail(16))).toMatchObject({ overShared: true, sides: [{ way: 'none' }, { way: 'up', deg: 32 }] });
    expect(textsOf(vtail(16)).some((text) => text.includes('Over the 28°'))).toBe(true);
  });
});

describe('in words', () => {
  it('says what is seen from behind', () => {
    const texts = textsOf(example(ombry));
    expect(texts).toContain('Aileron stick right: starboard aileron up 15°, port aileron down 9°.');
    expect(texts).toContain('Elevator stick back: starboard elevator up 12°, port elevator up 12°.');
    expect(texts).toContain('Rudder stick right: rudder to starboard 25°.');
    expect(texts).toContain('Motor: thrust line 2° down, 2° right.');
    expect(texts.some((text) => text.includes('softer at the centre'))).toBe(true);
  });

  it('every row has an id of its own, and every text is filled', () => {
    for (const json of [hask, ombry, quenlet, tarrel]) {
      const rows = setUpSections(sheetOf(example(json))).flatMap((section) => section.rows);
      expect(new Set(rows.map(({ id }) => id)).size).toBe(rows.length);
      for (const { text } of rows) expect(text).not.toMatch(/[{}]|NaN|undefined/);
    }
  });

  it('gives holes, rod and travel of the linkage, or says that it only suggests', () => {
    const linkage = { servoItemId: 's', servoArmMm: 9, hornMm: 14, hornStation: 0.6, rodMm: 2, face: 'upper' } as const;
    const at = (xMm: number): Airframe =>
      winged(
        { linkage },
        {
          items: [
            {
              id: 's',
              name: 'Left one',
              kind: 'servo',
              massG: 9,
              sizeMm: [23, 12, 24],
              mount: { to: 'datum', at: [xMm, 240, 5] },
            },
          ],
        },
      );
    const texts = textsOf(at(60));
    expect(texts).toContain('Linkage: arm hole 9 mm from the shaft of Left one, horn hole 14 mm from the hinge.');
    expect(texts).toContain('Rod: carbon, 2 mm, 90 mm between the holes.');
    expect(textsOf(winged({})).some((text) => text.startsWith('No linkage in the document.'))).toBe(true);
    const broken = sheetOf(at(149));
    expect(broken.problems.map(({ path }) => path)).toEqual(['surfaces.0.controls.0.linkage.servoArmMm']);
    expect(broken.controls[0]?.linkage).toBeNull();
  });

  it('no expo is no expo', () => {
    expect(textsOf(winged({}, { radio: { lowRate: 0.5, expo: 0, roles: [] } })).slice(0, 2)).toEqual([
      'Low rate: 50 % of the throw, on a switch. First flight on low rate.',
      'No expo.',
    ]);
  });
});
