import { describe, expect, it } from 'vitest';
import { resolve } from '@/lib/airframe/resolve';
import type { Airframe } from '@/lib/airframe/schema/airframe';
import { balance } from '@/lib/balance/balance';
import { airframe, body, panel, surface } from '@/tests/support/airframe';
import { drive } from '@/tests/support/drive';
import { handModel } from '@/tests/support/handModel';
import { plain } from '@/tests/support/plainAircraft';
import type { FigureGroupResult } from './context';
import { performanceFigures } from './performance';
import { CLIMB_MS, FAN_THRUST_TO_WEIGHT, PITCH_SPEED_OVER_STALL, THRUST_TO_WEIGHT } from './performanceBands';
import { areasOf } from './reference';
import { airOf, clMaxOf, loadingFigures } from './stall';
import { performanceEntries } from './table/performance';

function contextOf(document: Airframe, massG: number) {
  const resolved = resolve(document);
  if (!resolved.ok) throw new RangeError('does not resolve');
  const areas = areasOf(document, resolved.value);
  if (!areas.wing.ok) throw new RangeError('no wing');
  const wing = areas.wing.value;
  return {
    airframe: document,
    resolved: resolved.value,
    areas,
    wing,
    balance: balance([{ key: 'all', massG, at: [40, 0, 0] }]),
    model: handModel(wing.areaMm2, wing.spanMm, wing.macMm, 1, 0.92),
    air: airOf(document),
  };
}
const of = (document: Airframe, massG = 500): FigureGroupResult => performanceFigures(contextOf(document, massG));
const value = ({ figures }: FigureGroupResult, id: keyof typeof performanceEntries) => figures[id]?.value ?? Number.NaN;
const words = ({ figures }: FigureGroupResult, id: keyof typeof performanceEntries) => figures[id]?.verdict?.words;

const powered = (over: Parameters<typeof drive>[0] = { statedN: 4 }) => plain({ drives: [drive(over)] });
const flying = (cruiseMs: number, document = powered()): Airframe => ({
  ...document,
  flight: { ...document.flight, cruiseMs },
});

describe('the performance figures', () => {
  const result = of(powered());

  it('are all there, finite, inside their bands', () => {
    for (const id of Object.keys(performanceEntries)) {
      if (id === 'stallSpeedMs') continue;
      const figure = Object.entries(result.figures).find(([key]) => key === id)?.[1];
      expect(figure?.value, id).not.toBeNull();
      expect(Number.isFinite(figure?.value), id).toBe(true);
      if (!figure?.band) continue;
      expect(figure.band.low, id).toBeLessThanOrEqual(figure.value ?? Number.NaN);
      expect(figure.band.high, id).toBeGreaterThanOrEqual(figure.value ?? Number.NaN);
      expect(figure.band.cause.length, id).toBeGreaterThan(3);
    }
    expect(result.problems).toEqual([]);
  });

  it('itemise the drag: what goes in adds up to the area', () => {
    const figure = result.figures.dragAreaCm2;
    const sum = figure?.inputs?.reduce((all, input) => all + input.value, 0);
    expect(sum).toBeCloseTo(figure?.value ?? Number.NaN, 9);
    expect(figure?.inputs?.map(({ name }) => name)).toContain('Wing: friction');
    expect(value(of(plain({ drives: [drive({ statedN: 4 })], bodies: [body()] })), 'dragAreaCm2')).toBeGreaterThan(
      value(result, 'dragAreaCm2'),
    );
  });

  it('agree with each other: power is drag times speed, launch is 1.1 stalls', () => {
    expect(value(result, 'levelPowerW')).toBeCloseTo(value(result, 'dragCruiseN') * 12, 9);
    const { airframe: document, wing } = contextOf(powered(), 500);
    const stall = loadingFigures(document, wing, 500).stallSpeedMs?.value ?? Number.NaN;
    expect(value(result, 'launchSpeedMs')).toBeCloseTo(1.1 * stall, 9);
  });

  it('fly faster when heavier, and glide about as far', () => {
    const heavy = of(powered(), 800);
    expect(value(heavy, 'bestGlideSpeedMs')).toBeGreaterThan(value(result, 'bestGlideSpeedMs'));
    expect(value(heavy, 'leastSinkMs')).toBeGreaterThan(value(result, 'leastSinkMs'));
    expect(value(heavy, 'climbMs')).toBeLessThan(value(result, 'climbMs'));
  });
});

describe('the chart of power', () => {
  const charted = of(powered());
  const chart = charted.charts?.[0];

  it('has both curves, finite and in order, and meets at the highest level speed', () => {
    expect(chart?.id).toBe('powerRequired');
    expect(chart?.series.map(({ kind }) => kind)).toEqual(['main', 'limit', 'other']);
    for (const { points } of chart?.series ?? []) {
      expect(points.flat().every(Number.isFinite)).toBe(true);
      expect(points.map(([x]) => x)).toEqual([...points.map(([x]) => x)].sort((a, b) => a - b));
    }
    const top = chart?.marks.find(({ label }) => label === 'highest level speed')?.x ?? Number.NaN;
    expect(top).toBe(value(charted, 'topSpeedMs'));
    const at = (kind: string, x: number) => {
      const points = chart?.series.find((series) => series.kind === kind)?.points ?? [];
      return points.reduce((near, point) => (Math.abs(point[0] - x) < Math.abs(near[0] - x) ? point : near))[1];
    };
    expect(at('other', top) / at('main', top)).toBeCloseTo(1, 1);
  });

  it('leaves the thrust out without a motor', () => {
    const glider = of(plain()).charts?.[0];
    expect(glider?.series.map(({ kind }) => kind)).toEqual(['main', 'limit']);
    expect(glider?.marks.map(({ label }) => label)).toEqual(['stall', 'least sink', 'best glide', 'cruise']);
  });
});

describe('what is missing says why, and the rest shows', () => {
  it('thrust that nobody states', () => {
    const result = of(powered({}));
    for (const id of ['staticThrustN', 'thrustToWeight', 'pitchSpeedMs', 'topSpeedMs', 'climbMs'] as const)
      expect(result.figures[id]).toMatchObject({ value: null, problem: { code: 'no-thrust' } });
    expect(result.problems).toMatchObject([{ path: 'drives.0.statedThrustN' }]);
    expect(value(result, 'bestGlideRatio')).toBeGreaterThan(1);
  });

  it('a glider has no thrust, and that is no problem', () => {
    const result = of(plain());
    expect(result.figures.climbMs).toMatchObject({ value: null, problem: { code: 'does-not-apply' } });
    expect(result.problems).toEqual([]);
  });

  it('a cruise speed below the stall', () => {
    const result = of(flying(4));
    expect(result.figures.dragCruiseN?.problem).toMatchObject({ code: 'cruise-below-stall', path: 'flight.cruiseMs' });
    expect(result.problems).toMatchObject([{ path: 'flight.cruiseMs' }]);
    expect(value(result, 'topSpeedMs')).toBeGreaterThan(4);
  });

  it('thrust that cannot keep it up', () => {
    const result = of(powered({ statedN: 0.5 }));
    expect(result.figures.topSpeedMs?.problem?.code).toBe('cannot-fly-level');
  });

  it('a pointed tip', () => {
    const pointed = airframe({ surfaces: [surface({ panels: [panel({ tipChordMm: 0 })] })] });
    expect(of(pointed).figures.reynoldsTip?.problem?.code).toBe('does-not-apply');
    expect(value(of(pointed), 'reynoldsRoot')).toBeGreaterThan(1e5);
  });
});

describe('verdicts on each side of their limits', () => {
  const weightN = 0.5 * 9.80665;

  it.each([
    [0.3, 'bad'],
    [0.5, 'watch'],
    [0.8, 'good'],
    [1.8, 'watch'],
    [3, 'bad'],
  ])('thrust over weight %d is %s (common practice: trainer 0.6 to 0.8, sport 0.9 to 1.1)', (ratio, level) => {
    expect(of(powered({ statedN: ratio * weightN })).figures.thrustToWeight?.verdict?.level).toBe(level);
  });

  it.each([
    [1.2, 'bad'],
    [2, 'watch'],
    [2.75, 'good'],
    [4, 'watch'],
    [6, 'bad'],
  ])('a pitch speed of %d stalls is %s (common practice: 2.5 to 3 times)', (ratio, level) => {
    const at = of(powered({ statedN: 4, pitchMm: 100 }));
    const stall = value(at, 'launchSpeedMs') / 1.1;
    const pitchMm = (100 * ratio * stall) / value(at, 'pitchSpeedMs');
    expect(of(powered({ statedN: 4, pitchMm })).figures.pitchSpeedMs?.verdict?.level).toBe(level);
  });

  it('a stated thrust that its motor cannot give is called impossible, or doubtful (momentum theory)', () => {
    // 5 N on 200 mm: sqrt(5^3 / (2 x 1.225 x 0.0314159)) = 40.30 W without losses.
    expect(words(of(powered({ statedN: 5, maxW: 40 })), 'staticThrustN')).toMatch(/more than physics allows/);
    expect(words(of(powered({ statedN: 5, maxW: 45 })), 'staticThrustN')).toMatch(/hardly possible/);
    expect(words(of(powered({ statedN: 5, maxW: 90 })), 'staticThrustN')).toBeUndefined();
  });

  it('a turn at cruise is good above 1.41 stalls and stalls below', () => {
    const stall = value(of(powered()), 'launchSpeedMs') / 1.1;
    const [fast, slow] = [of(flying(1.5 * stall)), of(flying(1.3 * stall))];
    expect(fast.figures.turnRadius2gM?.verdict?.level).toBe('good');
    expect(slow.figures.turnRadius2gM?.verdict?.level).toBe('watch');
    // Then it is that of the slowest speed that carries it: 2 V^2 / (g sqrt 3).
    expect(value(slow, 'turnRadius2gM')).toBeCloseTo((2 * stall ** 2) / (9.80665 * Math.sqrt(3)), 6);
  });

  it('climbing is judged by its rate, and straight up is said', () => {
    expect(words(of(powered({ statedN: 12, pitchMm: 150 })), 'climbMs')).toBe('climbs straight up');
    expect(of(powered({ statedN: 1.9 })).figures.climbMs?.verdict?.level).not.toBe('good');
  });

  it.each(Object.entries({ THRUST_TO_WEIGHT, FAN_THRUST_TO_WEIGHT, PITCH_SPEED_OVER_STALL, CLIMB_MS }))(
    '%s: good lies inside watch, and it names its source',
    (_, { good, watch, source }) => {
      expect([...watch, ...good].sort((a, b) => a - b)).toEqual([watch[0], good[0], good[1], watch[1]]);
      expect(source.length).toBeGreaterThan(10);
    },
  );
});

describe('the stall', () => {
  it('is the same with a greatest lift typed in as found, without a band', () => {
    const { airframe: document, wing } = contextOf(plain(), 500);
    const found = loadingFigures(document, wing, 500).stallSpeedMs;
    const clMax = clMaxOf(document, wing, 500).value;
    const typed = loadingFigures({ ...document, flight: { ...document.flight, clMax } }, wing, 500).stallSpeedMs;
    expect(typed?.value).toBeCloseTo(found?.value ?? Number.NaN, 9);
    expect(found?.band?.cause).toMatch(/Pelletier & Mueller/);
    expect(typed?.band).toBeUndefined();
    expect(typed?.inputs?.[0]?.name).toMatch(/typed in/);
  });

  it('without a mass the greatest lift is that at cruise speed', () => {
    const { airframe: document, wing } = contextOf(plain(), 500);
    expect(clMaxOf(document, wing, null).value).toBe(0.75);
  });
});
