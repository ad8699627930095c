import { describe, expect, it } from 'vitest';
import {
  type Bound,
  type Category,
  CONTROL_ANTICIPATION,
  DUTCH_ROLL_DAMPING,
  DUTCH_ROLL_DECAY,
  DUTCH_ROLL_RADS,
  FROUDE_FACTOR,
  froudeScale,
  judge,
  type Level,
  type Levels,
  PHUGOID_DAMPING,
  ROLL_MODE_S,
  SHORT_PERIOD_DAMPING,
  SPIRAL_DOUBLE_S,
  scaledLevels,
  worse,
} from '@/lib/flight/criteria';

// MIL-F-8785C, "Flying Qualities of Piloted Airplanes" (1980). Bounds are typed from its tables; each is tried on both sides.

interface Row {
  readonly name: string;
  readonly levels: Levels;
  readonly published: readonly (readonly [Bound, Level])[];
}

const levelsOf = (...bounds: readonly Bound[]): (readonly [Bound, Level])[] =>
  bounds.map((bound, i) => [bound, i === 0 ? 1 : i === 1 ? 2 : 3]);

const both = (name: string, table: Record<Category, Levels>, categories: readonly Category[], ...bounds: Bound[]) =>
  categories.map(
    (category): Row => ({
      name: `${name}, category ${category}`,
      levels: table[category],
      published: levelsOf(...bounds),
    }),
  );

const ROWS: readonly Row[] = [
  // T7: 3.2.2.1.2, table IV.
  ...both(
    'short-period damping',
    SHORT_PERIOD_DAMPING,
    ['A', 'C'],
    { least: 0.35, most: 1.3 },
    { least: 0.25, most: 2 },
    { least: 0.15 },
  ),
  ...both(
    'short-period damping',
    SHORT_PERIOD_DAMPING,
    ['B'],
    { least: 0.3, most: 2 },
    { least: 0.2, most: 2 },
    { least: 0.15 },
  ),
  // T8: 3.2.2.1.1, figures 1 to 3.
  ...both('control anticipation', CONTROL_ANTICIPATION, ['A'], { least: 0.28, most: 3.6 }, { least: 0.16, most: 10 }),
  ...both('control anticipation', CONTROL_ANTICIPATION, ['B'], { least: 0.085, most: 3.6 }, { least: 0.038, most: 10 }),
  ...both('control anticipation', CONTROL_ANTICIPATION, ['C'], { least: 0.16, most: 3.6 }, { least: 0.096, most: 10 }),
  // T9: 3.3.1.2, class I.
  ...both('roll mode', ROLL_MODE_S, ['A', 'C'], { most: 1 }, { most: 1.4 }, { most: 10 }),
  ...both('roll mode', ROLL_MODE_S, ['B'], { most: 1.4 }, { most: 3 }, { most: 10 }),
  // 3.3.1.1, table VI, class I, from memory.
  ...both('Dutch roll damping', DUTCH_ROLL_DAMPING, ['A'], { least: 0.19 }, { least: 0.02 }, { least: 0 }),
  ...both('Dutch roll damping', DUTCH_ROLL_DAMPING, ['B', 'C'], { least: 0.08 }, { least: 0.02 }, { least: 0 }),
  ...both('Dutch roll decay', DUTCH_ROLL_DECAY, ['A'], { least: 0.35 }, { least: 0.05 }, { least: 0 }),
  ...both('Dutch roll decay', DUTCH_ROLL_DECAY, ['B', 'C'], { least: 0.15 }, { least: 0.05 }, { least: 0 }),
  ...both('Dutch roll frequency', DUTCH_ROLL_RADS, ['A', 'C'], { least: 1 }, { least: 0.4 }),
  ...both('Dutch roll frequency', DUTCH_ROLL_RADS, ['B'], { least: 0.4 }),
  // 3.3.1.3, from memory.
  ...both('spiral', SPIRAL_DOUBLE_S, ['A', 'C'], { least: 12 }, { least: 8 }, { least: 4 }),
  ...both('spiral', SPIRAL_DOUBLE_S, ['B'], { least: 20 }, { least: 8 }, { least: 4 }),
  // 3.2.1.2, from memory.
  { name: 'phugoid damping', levels: PHUGOID_DAMPING, published: levelsOf({ least: 0.04 }, { least: 0 }) },
];

const rank = (level: Level) => (level === 'beyond' ? 4 : level);

describe('a verdict on each side of every limit', () => {
  it.each(ROWS)('$name', ({ levels, published }) => {
    for (const [{ least, most }, level] of published) {
      for (const [bound, inside] of [
        [least, 1],
        [most, -1],
      ] as const) {
        if (bound === undefined) continue;
        const step = 1e-6 * Math.max(1, Math.abs(bound));
        expect(rank(judge(bound + inside * step, levels).level)).toBeLessThanOrEqual(rank(level));
        expect(rank(judge(bound - inside * step, levels).level)).toBeGreaterThan(rank(level));
        if (level === 1) expect(judge(bound - inside * step, levels).side).toBe(inside === 1 ? 'low' : 'high');
      }
    }
    expect(levels.source).toContain('MIL-F-8785C');
  });

  it.each(ROWS.filter(({ name }) => /Dutch|spiral|phugoid/.test(name)))(
    '$name says that it is from memory',
    ({ levels }) => expect(levels.source).toContain('from memory'),
  );
});

describe('Froude scaling of the limits', () => {
  it('is 10 m over the span', () => {
    expect(froudeScale(10_000)).toBe(1);
    expect(froudeScale(1200)).toBeCloseTo(8.3333, 4);
    expect(() => froudeScale(0)).toThrow(RangeError);
  });

  it('T8: a sound 1.2 m model with an anticipation of 10 to 30 is level 1, though none of it is unscaled', () => {
    const scaled = scaledLevels(CONTROL_ANTICIPATION.C, FROUDE_FACTOR.anticipation(froudeScale(1200)));
    for (const value of [10.5, 20, 29.5]) {
      expect(judge(value, scaled).level).toBe(1);
      expect(judge(value, CONTROL_ANTICIPATION.C).level).toBe('beyond');
    }
    // 0.16 and 3.6 times 8.3333.
    expect(scaled.bounds[0].least).toBeCloseTo(1.3333, 4);
    expect(scaled.bounds[0].most).toBeCloseTo(30, 9);
  });

  it('T9: roll mode of a 2.5 m model, N 4: half of 1.4 s; Dutch roll frequency doubled, damping ratio as it is', () => {
    const scale = froudeScale(2500);
    expect(scaledLevels(ROLL_MODE_S.B, FROUDE_FACTOR.time(scale)).bounds[0].most).toBeCloseTo(0.7, 12);
    expect(scaledLevels(DUTCH_ROLL_RADS.B, FROUDE_FACTOR.frequency(scale)).bounds[0].least).toBeCloseTo(0.8, 12);
    expect(scaledLevels(SHORT_PERIOD_DAMPING.C, FROUDE_FACTOR.ratio()).bounds).toEqual(SHORT_PERIOD_DAMPING.C.bounds);
  });
});

describe('two criteria for one thing', () => {
  it('the worse counts, from either side', () => {
    const good = judge(0.2, DUTCH_ROLL_DAMPING.B);
    const poor = judge(0.06, DUTCH_ROLL_DECAY.B);
    expect([good.level, poor.level]).toEqual([1, 2]);
    expect(worse(good, poor)).toBe(poor);
    expect(worse(poor, good)).toBe(poor);
  });
});
