import { describe, expect, it } from 'vitest';
import type { MassLine } from '@/lib/balance/line';
import { POINT } from '@/lib/balance/spread';
import { contextOf, LATERAL, levelOf, type Turn } from '@/tests/support/handling';
import { handlingFigures } from '../handling';
import { structureFigures } from '../structure';
import type { handlingEntries } from '../table/handling';

// What the masses, the lattice and the foam leave open, worked by hand.

const CG_X = 40;

/** Foam at a distance from the CG: all of one sheet, so it is 10 % too heavy or too light together. */
const foam = (massG: number, at: MassLine['at']): MassLine => ({
  key: `${at}`,
  name: 'foam',
  group: 'foam',
  massG,
  at,
  spread: POINT,
  basis: 'sheet',
});
const figuresWith = (lines: readonly MassLine[], turn: Turn = {}) =>
  handlingFigures({ ...contextOf({ halfMm: 0, ...turn }), lines }).figures;
const ends = (id: keyof typeof handlingEntries, lines: readonly MassLine[], turn: Turn = {}) => {
  const found = figuresWith(lines, turn)[id];
  const value = found?.value ?? Number.NaN;
  return {
    low: (found?.band?.low ?? Number.NaN) / value,
    high: (found?.band?.high ?? Number.NaN) / value,
    cause: found?.band?.cause,
  };
};

describe('inertia by the masses', () => {
  it('a pitch inertia of 0.012 +- 0.001 kg m2 swings by its root slower or faster', () => {
    // 0.1 x 1000 g x (100 mm)^2.
    const lines = [foam(500, [CG_X - 100, 0, 0]), foam(500, [CG_X + 100, 0, 0])];
    const hz = ends('shortPeriodHz', lines);
    expect(hz.high).toBeCloseTo(Math.sqrt(12 / 11), 2);
    expect(hz.low).toBeCloseTo(Math.sqrt(12 / 13), 2);
    expect(hz.cause).toContain('masses');
    // Control anticipation is the square of it.
    expect(ends('controlAnticipation', lines).high).toBeCloseTo(12 / 11, 2);
    expect(ends('controlAnticipation', lines).low).toBeCloseTo(12 / 13, 2);
  });

  it('a roll inertia of 0.007 +- 0.001 kg m2 and 3 % of roll damping go into the roll mode by their squares', () => {
    const lines = [foam(500, [CG_X, 100, 0]), foam(500, [CG_X, -100, 0])];
    const plainRoll: Turn = {
      inertia: { xz: 0 },
      lateral: { beta: { ...LATERAL.beta, roll: 0 }, rollRate: { side: 0, roll: -0.42, yaw: 0 } },
    };
    const roll = ends('rollModeS', lines, plainRoll);
    expect(roll.high).toBeCloseTo(1 + Math.hypot(1 / 7, 1 / 0.97 - 1), 2);
    expect(roll.low).toBeCloseTo(1 - Math.hypot(1 / 7, 1 - 1 / 1.03), 2);
    expect(roll.cause).toContain('masses');
    expect(ends('rollModeS', [], plainRoll).high).toBeCloseTo(1 / 0.97, 3);
  });

  it('an end that no mass has leaves the band out', () => {
    const heavy = [foam(10_000, [CG_X, 100, 0]), foam(10_000, [CG_X, -100, 0])];
    expect(figuresWith(heavy).rollModeS?.value).toBeGreaterThan(0);
    expect(figuresWith(heavy).rollModeS?.band).toBeUndefined();
  });
});

describe('the CG by the masses', () => {
  it('moves the margin as the neutral point does, by squares', () => {
    // 48 g of foam at 100 mm: 4.8 g x 100 mm over 480 g is 1 mm, and the neutral point may be 2.4 mm off: 2.6 mm.
    const lines = [foam(48, [CG_X + 100, 0, 0])];
    const both = handlingFigures({ ...contextOf({ halfMm: 2.4 }), lines }).figures;
    const wide = handlingFigures(contextOf({ halfMm: 2.6 })).figures;
    expect(both.manoeuvreMarginPct?.band?.low).toBeCloseTo(wide.manoeuvreMarginPct?.band?.low ?? Number.NaN, 9);
    expect(both.pitchPowerPerDeg?.band?.high).toBeCloseTo(wide.pitchPowerPerDeg?.band?.high ?? Number.NaN, 9);
    // Where the manoeuvre point lies does not depend on where the CG is.
    const alone = handlingFigures(contextOf({ halfMm: 2.4 })).figures;
    expect(both.manoeuvrePointXMm?.band?.low).toBeCloseTo(alone.manoeuvrePointXMm?.band?.low ?? Number.NaN, 9);
  });
});

describe('power of the controls by the lattice', () => {
  it('5 % of the aileron and 3 % of the damping are in the roll rate by their squares', () => {
    const high = 1 + Math.hypot(0.05, 1 / 0.97 - 1);
    expect(ends('rollRatePerDeg', []).high).toBeCloseTo(high, 12);
    expect(ends('rollHelix', []).high).toBeCloseTo(high, 12);
  });
  it.each(['pitchPowerPerDeg', 'pitchRatePerDeg', 'pullPerStickMm'] as const)(
    '5 %% of the elevator are in %s',
    (id) => {
      expect(ends(id, []).low).toBeCloseTo(0.95, 12);
      expect(ends(id, []).high).toBeCloseTo(1.05, 12);
    },
  );
});

describe('foam that twists', () => {
  it('takes from roll and pull what the figures of stiffness say', () => {
    const context = contextOf();
    const { figures } = handlingFigures(context);
    const lost = (twisted: keyof typeof handlingEntries, rigid: keyof typeof handlingEntries) =>
      1 - (figures[twisted]?.value ?? Number.NaN) / (figures[rigid]?.value ?? Number.NaN);
    const losses = [
      lost('rollRateTwistedPerDeg', 'rollRatePerDeg'),
      lost('pitchPowerTwistedPerDeg', 'pitchPowerPerDeg'),
    ];
    const loss = structureFigures(context).figures.controlLossAtCruisePct;
    expect(100 * Math.max(...losses)).toBeCloseTo(loss?.value ?? Number.NaN, 9);
    expect(Math.min(...losses)).toBeGreaterThan(0);
    // Its stiffness alone leaves as much open as there; the lattice comes on top.
    const { band, value = null } = figures.rollRateTwistedPerDeg ?? {};
    const softest = (figures.rollRatePerDeg?.value ?? 0) * (1 - (loss?.band?.high ?? 0) / 100);
    expect(band?.low).toBeLessThan(softest);
    expect(value).toBeLessThan(figures.rollRatePerDeg?.value ?? 0);
    expect(band?.cause).toContain('foam twists');
  });
});

describe('controls that answer the wrong way', () => {
  it('are told to be reversed, not to be given more throw', () => {
    const roll = { lateral: { controls: new Map([['wing/aileron', { side: 0, roll: 0.3, yaw: 0 }]]) } };
    expect(levelOf('rollHelix', roll)).toBe('bad');
    expect(figuresWith([], roll).rollHelix?.verdict?.words).toBe('rolls the wrong way: reverse it');
    // It lifts at so short an arm that what it takes from the lift counts for more than what it turns.
    const pitch = { model: { controls: new Map([['tail/elevator', { lift: 0.4, pitch: -0.02 }]]) } };
    const { pitchPowerPerDeg, pullPerStickMm } = figuresWith([], pitch);
    expect(pitchPowerPerDeg?.value).toBeLessThan(0);
    for (const figure of [pitchPowerPerDeg, pullPerStickMm])
      expect(figure?.verdict).toMatchObject({
        level: 'bad',
        words: expect.stringContaining('the wrong way: reverse it'),
      });
  });
});
