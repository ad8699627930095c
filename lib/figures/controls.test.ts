import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { airAt } from '@/lib/aero/atmosphere';
import { resolve } from '@/lib/airframe/resolve';
import type { Airframe } from '@/lib/airframe/schema/airframe';
import type { Control } from '@/lib/airframe/schema/surface';
import { balance } from '@/lib/balance/balance';
import { airframe, control, panel, surface } from '@/tests/support/airframe';
import { handModel } from '@/tests/support/handModel';
import { CONTROL_SLOP, HINGE_TORQUE, ROD_BUCKLING, SERVO_TRAVEL } from './controlBands';
import type { ControlContext } from './controlLoads';
import { controlFigures } from './controls';
import { areasOf } from './reference';
import type { FigureValue } from './types';

const LINKAGE = {
  servoItemId: 'servo',
  servoArmMm: 8,
  hornMm: 13,
  hornStation: 0.6,
  rodMm: 1.2,
  face: 'upper',
} as const;

/** A wing of 400 mm a side with ailerons of 50 mm chord, servo 90 mm ahead of the hinge. */
function winged(over: Partial<Control> = {}, rest: Partial<Airframe> = {}): Airframe {
  return airframe({
    surfaces: [
      surface({
        panels: [panel({ lengthMm: 400, rootChordMm: 200, tipChordMm: 200 })],
        controls: [control({ from: 0.5, to: 0.9, chordShare: [0.25, 0.25], linkage: LINKAGE, ...over })],
      }),
    ],
    items: [servo()],
    ...rest,
  });
}
const servo = (spec?: string, xMm = 60): Airframe['items'][number] => ({
  id: 'servo',
  kind: 'servo',
  massG: 9,
  sizeMm: [23, 12, 24],
  mount: { to: 'datum', at: [xMm, 240, 5] },
  ...(spec ? { spec } : {}),
});

function context(from: Airframe): ControlContext {
  const resolved = resolve(from);
  if (!resolved.ok) throw new RangeError('does not resolve');
  const { wing } = areasOf(from, resolved.value);
  if (!wing.ok) throw new RangeError('no wing');
  const { areaMm2, spanMm, macMm } = wing.value;
  return {
    airframe: from,
    resolved: resolved.value,
    wing: wing.value,
    balance: balance([{ key: 'all', massG: 600, at: [50, 0, 0] }]),
    model: handModel(areaMm2, spanMm, macMm),
    air: airAt(0),
  };
}
const at = (from: Airframe, topSpeedMs: number | null = 20) => controlFigures(context(from), topSpeedMs);
const figure = (
  from: Airframe,
  id: 'hingeTorquePct' | 'servoTravelPct' | 'controlSlopDeg' | 'controlSlopMm' | 'rodBucklingFactor',
  topSpeedMs: number | null = 20,
): FigureValue => at(from, topSpeedMs).figures[id] ?? { value: null };
const numberIn = (found: FigureValue): number => found.value ?? Number.NaN;
const input = (found: FigureValue, name: RegExp): number =>
  found.inputs?.find((one) => name.test(one.name))?.value ?? Number.NaN;
const throws = (deg: number, lowShare = 0.7) => ({ throwsDeg: { up: deg, down: deg, lowShare } });

describe('servo torque', () => {
  it('grows a little less than with the speed squared, for the angle of attack falls', () => {
    const [slow, fast] = [15, 30].map((speed) => numberIn(figure(winged(), 'hingeTorquePct', speed)));
    const ratio = (fast ?? 0) / (slow ?? 1);
    expect(ratio).toBeGreaterThan(3.5);
    expect(ratio).toBeLessThan(4);
  });

  it('by hand: aileron 157 x 50 mm, 15 degrees, 40 m/s, b2 0.9436 and b1 0.5654 at a quarter of the chord', () => {
    const found = figure(winged(), 'hingeTorquePct');
    // Pressure 980 Pa; lift coefficient 0.0375 of 600 g on 16 dm2, over the hand model's slope of 3.88 per rad.
    const pressure = 0.5 * 1.225 * 40 ** 2;
    const alpha = (0.6 * 9.80665) / (pressure * 0.16) / 3.8832;
    const ch = 0.9436 * ((15 * Math.PI) / 180) + 0.5654 * alpha;
    const kgCm = (pressure * ch * 0.157 * 0.05 ** 2) / 0.0980665;
    expect(input(found, /^hinge moment/)).toBeCloseTo(kgCm, 2);
  });

  it('takes a typed torque as it is, and guesses with a wider band without one', () => {
    const typed = figure(winged({}, { items: [servo('1.25 kg cm')] }), 'hingeTorquePct');
    const guessed = figure(winged(), 'hingeTorquePct');
    expect(numberIn(typed)).toBeCloseTo(numberIn(guessed), 9);
    expect(guessed.band?.low).toBeLessThan(typed.band?.low ?? 0);
    expect(guessed.band?.high).toBeGreaterThan(typed.band?.high ?? Number.POSITIVE_INFINITY);
    expect(guessed.inputs?.some(({ name }) => name.includes('assumed'))).toBe(true);
    expect(typed.inputs?.some(({ name }) => name.includes('assumed'))).toBe(false);
  });

  it('a horn twice as long and an arm half as long ease the servo', () => {
    const easy = winged({ linkage: { ...LINKAGE, servoArmMm: 6, hornMm: 18 } });
    expect(numberIn(figure(easy, 'hingeTorquePct'))).toBeLessThan(0.65 * numberIn(figure(winged(), 'hingeTorquePct')));
  });

  it('reckons with one and a half times cruise while the highest level speed is not known, and says so', () => {
    const unknown = figure(winged(), 'hingeTorquePct', null);
    expect(numberIn(unknown)).toBeCloseTo(numberIn(figure(winged(), 'hingeTorquePct', 12 * 1.5)), 9);
    expect(unknown.inputs?.some(({ name, value }) => name.includes('assumed from cruise') && value === 18)).toBe(true);
  });

  it.each([
    [8, 'good', 'strong enough'],
    [22, 'watch', 'watch'],
    [60, 'bad', 'too weak'],
  ] as const)('at %d m/s: %s', (speed, level, words) => {
    const found = figure(winged(), 'hingeTorquePct', speed);
    expect(found.verdict?.level).toBe(level);
    expect(found.verdict?.words).toContain(words);
    expect(found.verdict?.words).toContain('Wing, aileron');
  });

  it('joined halves of an elevator load their servo twice', () => {
    const mix = { pitch: 1, roll: 0, yaw: 0, flap: 0 };
    const moment = (over: Partial<Control>) =>
      input(figure(winged({ linkage: undefined, mix, ...over }), 'hingeTorquePct'), /^hinge moment/);
    const length = (from: number, to: number) => 400 * (to - from) - 3;
    expect(moment({ from: 0, to: 0.4 }) / moment({ from: 0.5, to: 0.9 })).toBeCloseTo(
      (2 * length(0, 0.4)) / length(0.5, 0.9),
      9,
    );
  });
});

describe('servo travel', () => {
  it('has a verdict on each side of every limit', () => {
    const level = (deg: number) => {
      const found = figure(winged(throws(deg)), 'servoTravelPct');
      return [numberIn(found), found.verdict?.level] as const;
    };
    expect(SERVO_TRAVEL.good).toEqual([70, 100]);
    expect(level(15)[0]).toBeLessThan(70);
    expect(level(15)[1]).toBe('watch');
    expect(level(22)[0]).toBeGreaterThan(70);
    expect(level(22)[1]).toBe('good');
    expect(level(28)[0]).toBeGreaterThan(100);
    expect(level(28)[1]).toBe('watch');
  });

  it('counts sticks that share a control together', () => {
    const elevon = { ...throws(14), mix: { pitch: 1, roll: 1, yaw: 0, flap: 0 } };
    expect(numberIn(figure(winged(elevon), 'servoTravelPct'))).toBeCloseTo(
      numberIn(figure(winged(throws(28)), 'servoTravelPct')),
      9,
    );
  });

  it('a throw beyond the dead centre is a problem at the linkage, and no number', () => {
    const result = at(winged(throws(60)));
    expect(result.figures.servoTravelPct?.value).toBeNull();
    expect(result.problems?.map(({ code, path }) => `${path} ${code}`)).toEqual([
      'surfaces.0.controls.0.linkage linkage-dead-centre',
    ]);
    expect(numberIn(result.figures.controlSlopDeg ?? { value: null })).toBeGreaterThan(0);
  });

  it('names the suggested holes where the document has no linkage, and knows no rod', () => {
    const from = winged({ linkage: undefined });
    const found = figure(from, 'servoTravelPct');
    expect(found.verdict?.words).toMatch(/with arm 7 and horn 16 mm/);
    expect(figure(from, 'rodBucklingFactor')).toMatchObject({ value: null, problem: { code: 'does-not-apply' } });
  });
});

describe('slop', () => {
  it('is play over horn plus centring times gear ratio: 0.2 mm on 13 mm and 1 degree by 8 to 13', () => {
    const found = figure(winged(), 'controlSlopDeg');
    // The rod lies at a right angle to the arm, and within a degree of it to the horn.
    expect(numberIn(found)).toBeCloseTo((0.2 / 13) * (180 / Math.PI) + 8 / 13, 2);
    expect(found.verdict?.level).toBe('good');
  });

  it('in millimetres at the trailing edge: the angle by 50 mm of chord', () => {
    const deg = numberIn(figure(winged(), 'controlSlopDeg'));
    expect(numberIn(figure(winged(), 'controlSlopMm'))).toBeCloseTo((deg * Math.PI * 50) / 180, 3);
  });

  it('a short horn on a long arm is loose, and worse', () => {
    const level = (servoArmMm: number, hornMm: number) =>
      figure(winged({ linkage: { ...LINKAGE, servoArmMm, hornMm } }), 'controlSlopDeg').verdict?.level;
    expect(CONTROL_SLOP.good[1]).toBe(2);
    expect(level(8, 8)).toBe('watch');
    expect(level(8, 4)).toBe('bad');
  });
});

describe('rod', () => {
  it('falls with the square of its length, and the verdict says how often to guide it', () => {
    const withRod = (hingeTo: number) =>
      figure(winged({}, { items: [servo(undefined, 150 - hingeTo)] }), 'rodBucklingFactor');
    const [short, long] = [withRod(90), withRod(360)];
    expect(numberIn(short) / numberIn(long)).toBeCloseTo(16, 0);
    expect(short.verdict?.level).toBe('good');
    expect(long.verdict?.level).not.toBe('good');
    expect(long.verdict?.words).toMatch(/every \d+ mm/);
    expect(ROD_BUCKLING.good[0]).toBe(2);
  });
});

describe('all of them', () => {
  it('show the worst control and name it', () => {
    const two = winged();
    const [wing] = two.surfaces;
    const tail = surface({
      id: 'tail',
      role: 'tailplane',
      mount: { to: 'datum', at: [600, 0, 0] },
      controls: [
        control({
          id: 'elevator',
          kind: 'elevator',
          from: 0,
          to: 1,
          chordShare: [0.5, 0.5],
          ...throws(25),
          mix: { pitch: 1, roll: 0, yaw: 0, flap: 0 },
        }),
      ],
    });
    const both = { ...two, surfaces: wing ? [wing, tail] : [] };
    const found = figure(both, 'hingeTorquePct');
    expect(found.verdict?.words).toContain('Tailplane, elevator');
    expect(numberIn(found)).toBeGreaterThan(numberIn(figure(two, 'hingeTorquePct')));
    expect(HINGE_TORQUE.good[1]).toBe(50);
  });

  it('do not apply to an aircraft without controls', () => {
    const none = winged();
    const bare = { ...none, surfaces: none.surfaces.map((one) => ({ ...one, controls: [] })) };
    for (const found of Object.values(at(bare).figures)) {
      expect(found).toMatchObject({ value: null, problem: { code: 'does-not-apply' } });
    }
  });

  it('are finite and inside their bands for any linkage', () => {
    const mm = (min: number, max: number) => fc.double({ min, max, noNaN: true });
    fc.assert(
      fc.property(mm(2, 60), mm(2, 80), mm(-400, 140), mm(1, 45), mm(1, 60), (arm, horn, x, deg, speed) => {
        const from = winged(
          { linkage: { ...LINKAGE, servoArmMm: arm, hornMm: horn }, ...throws(deg) },
          { items: [servo(undefined, x)] },
        );
        const result = at(from, speed);
        for (const found of Object.values(result.figures)) {
          if (found.value === null) expect(found.problem?.message).toBeTruthy();
          else {
            expect(Number.isFinite(found.value)).toBe(true);
            expect(found.band?.low ?? found.value).toBeLessThanOrEqual(found.value);
            expect(found.band?.high ?? found.value).toBeGreaterThanOrEqual(found.value);
          }
        }
        expect(JSON.stringify(result)).not.toMatch(/NaN|Infinity/);
      }),
      { numRuns: 150 },
    );
  });
});

describe('chart', () => {
  it('runs through neutral and marks the ends of the throw on the curve', () => {
    const [chart] = at(winged(throws(20))).charts ?? [];
    const [curve] = chart?.series ?? [];
    expect(curve?.points.find(([x]) => x === 0)?.[1]).toBeCloseTo(0, 9);
    expect(chart?.marks.map(({ label }) => label)).toEqual(['full up', 'full down']);
    const [up, down] = chart?.marks ?? [];
    // Rod pushed aft, horn above: trailing edge down.
    expect(up?.x).toBeLessThan(0);
    expect(down?.x).toBeGreaterThan(0);
    const rising = curve?.points.map(([, y]) => y) ?? [];
    expect(rising).toEqual([...rising].sort((a, b) => a - b));
    expect(chart?.title).toContain('Wing, aileron');
  });
});
