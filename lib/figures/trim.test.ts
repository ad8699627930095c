import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { startFrom } from '@/lib/airframe/layouts';
import type { Airframe } from '@/lib/airframe/schema/airframe';
import { spread } from '@/lib/numerics/spread';
import { control } from '@/tests/support/airframe';
import { pitchContext, pitchModel } from '@/tests/support/pitchContext';
import { fin, plain, tail, wing } from '@/tests/support/plainAircraft';
import type { FigureContext } from './context';
import { trimFigures } from './trim';
import { stallBandVerdict, stallVerdict, throttleVerdict, trimVerdict } from './trimVerdicts';

const degrees = (rad: number) => (rad * 180) / Math.PI;
/** Elevator with these throws; 15 both ways in the plain aircraft. */
const thrown = (up: number, down = up): Airframe =>
  plain({
    surfaces: [
      wing(),
      tail(560, { controls: tail().controls.map((c) => ({ ...c, throwsDeg: { up, down, lowShare: 0.7 } })) }),
      fin(),
    ],
  });
const figureOf = (context: FigureContext, id: keyof ReturnType<typeof trimFigures>['figures']) =>
  trimFigures(context).figures[id];

/** Motors of a starting layout, at a place, with a stated thrust. */
const motors = (x: number, z: number, downDeg = 0, statedThrustN: number | undefined = 5): Airframe['drives'] =>
  startFrom('trainer', 'Test').drives.map((drive) => ({
    ...drive,
    mount: { to: 'datum', at: [x, 0, z] },
    thrustDeg: [downDeg, 0],
    statedThrustN,
    controllerItemId: undefined,
    packItemId: undefined,
  }));

describe('elevator at cruise', () => {
  // 500 g at 12 m/s over 0.18 m2, sea level.
  const weight = (0.5 * 9.80665) / (0.5 * 1.225 * 144 * 0.18);

  it('solves the two equations of lift and moment', () => {
    // a = (W - 0.15 - 0.5 d) / 4.5 and 0.02 - 0.5 a - 1.4 d = 0.
    const delta = (0.02 - (0.5 * (weight - 0.15)) / 4.5) / (1.4 - (0.5 * 0.5) / 4.5);
    const figure = figureOf(pitchContext(thrown(15)), 'trimElevatorDeg');
    expect(figure?.value).toBeCloseTo(degrees(delta), 4);
    expect(figureOf(pitchContext(thrown(15)), 'trimShareOfThrowPct')?.value).toBeCloseTo(
      (100 * Math.abs(degrees(delta))) / 15,
      3,
    );
  });

  it('has a band that holds it, from the neutral point', () => {
    const figure = figureOf(pitchContext(thrown(15)), 'trimElevatorDeg');
    const { low = 0, high = 0, cause } = figure?.band ?? {};
    expect(low).toBeLessThan(figure?.value ?? 0);
    expect(high).toBeGreaterThan(figure?.value ?? 0);
    expect(cause).toContain('neutral point');
  });

  it('wants more up at the forward limit than at the aft one', () => {
    const inputs = figureOf(pitchContext(thrown(15)), 'trimElevatorDeg')?.inputs ?? [];
    const at = (name: string) => inputs.find((input) => input.name.includes(name))?.value ?? Number.NaN;
    expect(at('forward')).toBeLessThan(at('aft'));
  });

  it('is named as a problem of the cruise speed when that is under the stall', () => {
    const document = thrown(15);
    const slow = pitchContext({ ...document, flight: { ...document.flight, cruiseMs: 5 } });
    const { figures, problems } = trimFigures(slow);
    expect(figures.trimElevatorDeg?.problem?.path).toBe('flight.cruiseMs');
    expect(problems?.map(({ code }) => code)).toEqual(['cruise-below-stall']);
    expect(figures.stallElevatorSharePct?.value).not.toBeNull();
  });

  it('does not apply without a pitch control, and is refused for one between CG and neutral point', () => {
    const none = plain({ surfaces: [wing(), tail(560, { controls: [] }), fin()] });
    expect(figureOf(pitchContext(none), 'trimElevatorDeg')?.problem?.code).toBe('does-not-apply');
    const idle = pitchModel({ controls: new Map([['tail/elevator', { lift: 0.5, pitch: -0.02 }]]) });
    expect(figureOf(pitchContext(thrown(15), idle), 'trimElevatorDeg')?.problem?.code).toBe('up-stick-drops-nose');
  });

  it('does not depend on where the origin of the model lies', () => {
    fc.assert(
      fc.property(fc.double({ min: -300, max: 300, noNaN: true }), (dx) => {
        const here = trimFigures(pitchContext(thrown(15))).figures;
        const there = trimFigures(pitchContext(thrown(15), pitchModel({ cgX: 60 + dx }))).figures;
        for (const id of ['trimElevatorDeg', 'trimShareOfThrowPct', 'stallElevatorSharePct'] as const)
          expect(there[id]?.value).toBeCloseTo(here[id]?.value ?? Number.NaN, 9);
      }),
      { numRuns: 10 },
    );
  });

  it.each([
    { share: 25, level: 'good' },
    { share: 25.1, level: 'watch' },
    { share: 50, level: 'watch' },
    { share: 50.1, level: 'bad' },
    { share: 130, level: 'bad' },
  ])('taking $share % of the throw is $level', ({ share, level }) => expect(trimVerdict(share).level).toBe(level));
});

describe('the stall', () => {
  it('is reached by a larger share of a smaller throw, in proportion', () => {
    const share = (up: number) => figureOf(pitchContext(thrown(up)), 'stallElevatorSharePct')?.value ?? 0;
    expect(share(10)).toBeCloseTo(1.5 * share(15), 9);
  });

  it('a throw too small cannot flare, a large one is too much, and one between is right', () => {
    const words = (up: number) => figureOf(pitchContext(thrown(up)), 'stallElevatorSharePct')?.verdict;
    expect(words(1)).toMatchObject({ level: 'bad', words: expect.stringContaining('cannot flare') });
    expect(words(30)).toMatchObject({ level: 'watch', words: expect.stringContaining('too much throw') });
    expect(words(3)).toMatchObject({ level: 'good' });
  });

  it.each([
    { stallPct: 115, flarePct: 100.1, stable: true, level: 'bad' },
    { stallPct: 114, flarePct: 99.9, stable: true, level: 'good' },
    { stallPct: 51, flarePct: 45, stable: true, level: 'good' },
    { stallPct: 49, flarePct: 44, stable: true, level: 'watch' },
    { stallPct: -2, flarePct: -6, stable: true, level: 'bad' },
    { stallPct: 70, flarePct: 60, stable: false, level: 'bad' },
  ])('$stallPct % for the stall and $flarePct % for the flare is $level', ({ level, ...found }) =>
    expect(stallVerdict(found).level).toBe(level),
  );

  const found = (stallPct: number, flarePct = stallPct - 10) => ({ stallPct, flarePct, stable: true });
  it.each([
    { name: 'both ends are right', ends: [found(55), found(95)], level: 'good', words: 'stalls it' },
    {
      name: 'one end cannot flare',
      ends: [found(60), found(130)],
      level: 'watch',
      words: 'weak end of its band: cannot flare',
    },
    {
      name: 'one end stalls at rest',
      ends: [found(-3), found(90)],
      level: 'watch',
      words: 'stalls with the stick at rest',
    },
    {
      name: 'it holds too much and too little',
      ends: [found(14), found(150)],
      level: 'watch',
      words: 'from too much throw to',
    },
    { name: 'one end is only too much throw', ends: [found(45), found(90)], level: 'good', words: 'stalls it' },
  ])('in the middle of its band it is right; $name: $level', ({ ends, level, words }) => {
    const verdict = stallBandVerdict(found(72), ends);
    expect(verdict.level).toBe(level);
    expect(verdict.words).toContain(words);
  });

  it('what is not good in the middle stays what it is', () => {
    expect(stallBandVerdict(found(40), [found(10), found(150)]).words).toContain('under half');
    expect(stallBandVerdict(found(130), [found(60)]).level).toBe('bad');
  });

  it('has a band from the greatest lift as well', () => {
    const exact = figureOf(pitchContext(thrown(15)), 'stallElevatorSharePct')?.band;
    const clMax = spread((end) => ({ value: 0.8, low: 0.7, high: 0.95 })[end]);
    const wide = figureOf(pitchContext(thrown(15), pitchModel(), clMax), 'stallElevatorSharePct')?.band;
    expect(wide?.low).toBeLessThan(exact?.low ?? 0);
    expect(wide?.high).toBeGreaterThan(exact?.high ?? 0);
  });
});

describe('the throttle', () => {
  const change = (drives: Airframe['drives']) => figureOf(pitchContext({ ...thrown(15), drives }), 'throttleTrimDeg');

  it('a motor above the CG pitches nose down, one below nose up, and the words say so', () => {
    const [high, low] = [change(motors(-100, 40)), change(motors(-100, -40))];
    expect(high?.value).toBeLessThan(-0.5);
    expect(high?.verdict?.words).toContain('nose down with power');
    expect(high?.verdict?.words).toContain('less downthrust');
    expect(low?.value).toBeGreaterThan(0.5);
    expect(low?.verdict?.words).toContain('nose up with power');
    expect(low?.verdict?.words).toContain('more downthrust');
  });

  it('downthrust of a low tractor lessens it, degree by degree', () => {
    const perDegree = change(motors(-100, -40))?.inputs?.at(-1)?.value ?? 0;
    expect(perDegree).toBeLessThan(0);
    const turned = (change(motors(-100, -40, 1))?.value ?? 0) - (change(motors(-100, -40))?.value ?? 0);
    expect(turned).toBeCloseTo(perDegree, 9);
  });

  it('behind the CG the same downthrust adds to it', () => {
    expect(change(motors(260, -40))?.verdict?.words).toContain('less downthrust');
  });

  it('has no figure without a motor, and names the missing thrust', () => {
    expect(change([])?.problem?.code).toBe('does-not-apply');
    const dark = motors(-100, 0).map((d) => ({
      ...d,
      statedThrustN: undefined,
      motor: { ...d.motor, maxW: undefined },
    }));
    expect(change(dark)?.problem?.path).toBe('drives.0.statedThrustN');
  });

  it.each([
    { changeDeg: 0.4, stickChange: -0.6, stick: 0, pullG: 0.1, level: 'good' },
    { changeDeg: 1, stickChange: -0.24, stick: 0.1, pullG: 0.45, level: 'good' },
    { changeDeg: 1, stickChange: -0.26, stick: 0.1, pullG: 0.1, level: 'watch' },
    { changeDeg: -4, stickChange: 0.51, stick: 0.1, pullG: 0.1, level: 'bad' },
    { changeDeg: -4, stickChange: 0.2, stick: 1.1, pullG: 0.1, level: 'bad' },
    { changeDeg: -2.5, stickChange: 0.2, stick: 0.1, pullG: 0.55, level: 'watch' },
    { changeDeg: -2.5, stickChange: 0.2, stick: 0.1, pullG: 1.95, level: 'watch' },
    { changeDeg: -2.5, stickChange: 0.2, stick: 0.1, pullG: 2.05, level: 'bad' },
    { changeDeg: -2.5, stickChange: 0.2, stick: 0.1, pullG: null, level: 'good' },
  ])('a change of $changeDeg degrees, $stickChange of the stick, worth $pullG g, is $level', ({ level, ...found }) =>
    expect(throttleVerdict({ ...found, perDownDeg: -0.1 }).level).toBe(level),
  );
});

describe('the chart of elevator against speed', () => {
  const chartOf = (document: Airframe) => trimFigures(pitchContext(document)).charts?.[0];
  const names = (document: Airframe) => chartOf(document)?.series.map(({ name }) => name);

  it('holds the CG as it is, both limits, and full throttle where there is a motor', () => {
    expect(names(thrown(15))).toHaveLength(3);
    expect(names({ ...thrown(15), drives: motors(-100, 20) })).toHaveLength(4);
  });

  it('runs from a little over the stall to twice cruise, rising as a stable aircraft does', () => {
    const points = chartOf(thrown(15))?.series[0]?.points ?? [];
    const stall = Math.sqrt((2 * 0.5 * 9.80665) / (1.225 * 0.18 * 0.8));
    expect(points[0]?.[0]).toBeCloseTo(1.05 * stall, 4);
    expect(points.at(-1)?.[0]).toBeCloseTo(24, 9);
    for (const [i, [, y]] of points.entries()) expect(y).toBeGreaterThanOrEqual(points[i - 1]?.[1] ?? y);
  });

  it('passes through the figure at cruise', () => {
    const document = thrown(15);
    const points = chartOf(document)?.series[0]?.points ?? [];
    const wanted = figureOf(pitchContext(document), 'trimElevatorDeg')?.value ?? Number.NaN;
    const after = points.findIndex(([x]) => x >= 12);
    expect(points[after - 1]?.[1]).toBeLessThanOrEqual(wanted);
    expect(points[after]?.[1]).toBeGreaterThanOrEqual(wanted);
  });

  it('stops where the throw ends', () => {
    const points = chartOf(thrown(1))?.series[0]?.points ?? [];
    const stall = Math.sqrt((2 * 0.5 * 9.80665) / (1.225 * 0.18 * 0.8));
    expect(points[0]?.[0]).toBeGreaterThan(1.05 * stall + 0.1);
    for (const [, y] of points) expect(Math.abs(y)).toBeLessThanOrEqual(1);
  });

  it('is left out when twice cruise is no faster than the stall', () => {
    const document = thrown(15);
    expect(chartOf({ ...document, flight: { ...document.flight, cruiseMs: 3 } })).toBeUndefined();
  });
});

describe('a control on a foreplane', () => {
  it('turns trailing edge down to slow, and counts as nose-up stick', () => {
    const fore = control({ id: 'elevator', kind: 'elevator', mix: { pitch: 1, roll: 0, yaw: 0, flap: 0 } });
    const document = plain({ surfaces: [wing(), tail(-350, { id: 'fore', role: 'foreplane', controls: [fore] })] });
    const model = pitchModel({ controls: new Map([['fore/elevator', { lift: 0.5, pitch: 1.2 }]]) });
    const { figures, charts } = trimFigures(pitchContext(document, model));
    expect(figures.stallElevatorSharePct?.value).toBeGreaterThan(0);
    const points = charts?.[0]?.series[0]?.points ?? [];
    expect(points[0]?.[1]).toBeGreaterThan(points.at(-1)?.[1] ?? Number.NaN);
  });
});
