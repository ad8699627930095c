import { describe, expect, it } from 'vitest';
import { startFrom } from '@/lib/airframe/layouts';
import type { Airframe } from '@/lib/airframe/schema/airframe';
import { analyse } from '@/lib/figures/analyse';
import { handlingEntries } from '@/lib/figures/table/handling';
import { structureEntries } from '@/lib/figures/table/structure';
import { trimEntries } from '@/lib/figures/table/trim';
import type { Figures } from '@/lib/figures/types';
import { board } from './support/airframe';
import {
  bareFins,
  erraticPusher,
  FIN_HEIGHT_MM,
  MOTOR_FORWARD_MM,
  motorForwardPackAft,
  TAIL,
} from './support/erraticPusher';
import {
  figureIn,
  full,
  HELD,
  labelled,
  made,
  NAMES,
  ordersOf,
  pitchDamping,
  sideOf,
  startsFor,
  study,
  subsetsOf,
  valueIn,
} from './support/erraticStudy';

// A swept tailless pusher with a heavy motor far aft, and what each change to it does: one at a time, in any order, and from every state
// that the others may have left. Directions are those of the equations of motion; where a size is expected its formula stands beside it.

const { figuresOf, at, verdictAt, rankAt } = study();
const HOME_X = at([], 'cgXMm');

/** Each figure, its verdict and why it is missing; numbers but for rounding. */
function expectSame(found: Figures, expected: Figures, label: string): void {
  for (const [id, { value, verdict, problem }] of Object.entries(expected.values)) {
    const other = found.values[id];
    expect(other?.problem?.code, `${label}: ${id}`).toBe(problem?.code);
    expect(other?.verdict, `${label}: ${id}`).toEqual(verdict);
    if (value !== null) {
      const off = Math.abs((other?.value ?? Number.NaN) - value);
      expect(off, `${label}: ${id}`).toBeLessThan(1e-8 * Math.max(1, Math.abs(value)));
    }
  }
}

describe('any order', () => {
  it.each(labelled(subsetsOf(NAMES)))('of $label ends in the same figures', ({ names }) => {
    for (const order of ordersOf(names)) expectSame(full(made(order)), figuresOf(names), order.join(', '));
  });

  it('of all of them, with the CG held by the pack when the motor moves', () => {
    const expected = full(made(NAMES, HELD));
    for (const order of ordersOf(NAMES)) expectSame(full(made(order, HELD)), expected, order.join(', '));
  });
});

describe('the motor 100 mm forward', () => {
  it.each(startsFor('motor'))('after $label: less pitch inertia, more margin', ({ names }) => {
    const to = [...names, 'motor'] as const;
    expect(at(to, 'pitchInertiaKgM2')).toBeLessThan(0.9 * at(names, 'pitchInertiaKgM2'));
    // 120 g by 100 mm, over the mass and the chord of 190 mm; the propeller's own force takes a little of it back.
    const gained = (100 * 120 * MOTOR_FORWARD_MM) / at(names, 'allUpMassG') / 190;
    expect(at(to, 'staticMarginPct') - at(names, 'staticMarginPct')).toBeGreaterThan(gained - 0.5);
    expect(at(to, 'staticMarginPct') - at(names, 'staticMarginPct')).toBeLessThan(gained);
    expect(at(to, 'slopPullG')).toBeLessThan(at(names, 'slopPullG'));
  });

  /** Only the inertia changes when the propeller's own force, which moves with it, is left out. */
  const still = (document: Airframe) =>
    analyse(document, { depth: 'full', corrections: { bodies: true, propellers: false } });

  it.each(startsFor('motor'))(
    'after $label, the CG held: it answers and settles sooner, by inertia alone',
    ({ names }) => {
      const [before, after] = [still(made(names)), still(motorForwardPackAft(made(names)))];
      const ratio = valueIn(after, 'pitchInertiaKgM2') / valueIn(before, 'pitchInertiaKgM2');
      expect(ratio).toBeLessThan(0.75);
      for (const id of ['cgXMm', 'staticMarginPct', 'manoeuvreMarginPct', 'pitchPowerPerDeg', 'slopPullG'] as const)
        expect(valueIn(after, id), id).toBeCloseTo(valueIn(before, id), 6);
      // Stiffness and damping are moments: over the inertia, the one is the square of the frequency, the other a rate of decay.
      const hz = valueIn(after, 'shortPeriodHz') / valueIn(before, 'shortPeriodHz');
      expect(hz * Math.sqrt(ratio)).toBeGreaterThan(0.97);
      expect(hz * Math.sqrt(ratio)).toBeLessThan(1.03);
      expect(valueIn(after, 'shortPeriodHalfS')).toBeLessThan(valueIn(before, 'shortPeriodHalfS'));
      expect((valueIn(after, 'controlAnticipation') / valueIn(before, 'controlAnticipation')) * ratio).toBeCloseTo(
        1,
        1,
      );
    },
  );

  it('with the CG held and all counted, the margin moves by the propeller alone: less than half a per cent', () => {
    const held = full(motorForwardPackAft(erraticPusher()));
    expect(valueIn(held, 'cgXMm')).toBeCloseTo(HOME_X, 6);
    expect(Math.abs(valueIn(held, 'staticMarginPct') - at([], 'staticMarginPct'))).toBeLessThan(0.5);
    expect(valueIn(held, 'pitchInertiaKgM2')).toBeLessThan(at(['motor'], 'pitchInertiaKgM2'));
  });
});

describe('fins on booms', () => {
  it.each(startsFor('fins'))('after $label: pitch damping stays, yaw is stiffer and damped', ({ names }) => {
    const to = [...names, 'fins'] as const;
    expect(pitchDamping(to) / pitchDamping(names)).toBeGreaterThan(0.95);
    expect(pitchDamping(to) / pitchDamping(names)).toBeLessThan(1.05);
    const [before, after] = [sideOf(names), sideOf(to)];
    expect(after.beta.yaw).toBeGreaterThan(before.beta.yaw + 0.03);
    expect(after.yawRate.yaw).toBeLessThan(before.yawRate.yaw - 0.02);
    expect(at(to, 'dutchRollHz')).toBeGreaterThan(at(names, 'dutchRollHz'));
    expect(at(to, 'dutchRollDamping')).toBeGreaterThan(at(names, 'dutchRollDamping'));
  });

  it('take margin where the pack is not moved for them', () => {
    const figures = full(bareFins(erraticPusher()));
    expect(valueIn(figures, 'staticMarginPct')).toBeLessThan(at([], 'staticMarginPct') - 2);
    expect(valueIn(figures, 'slopPullG')).toBeGreaterThan(at([], 'slopPullG'));
  });
});

describe('a tailplane on booms', () => {
  const slopeOf = (aspect: number) => (2 * Math.PI * aspect) / (2 + Math.sqrt(4 + aspect ** 2));

  it.each(startsFor('tail'))('after $label: damps pitch as its arm and area say', ({ names }) => {
    const to = [...names, 'tail'] as const;
    const about = at(to, 'cgXMm');
    const added = pitchDamping(to, about) - pitchDamping(names, about);
    // Nelson, "Flight Stability", table 3.3: Cm_q of a tail is -2 a V_H l / c; a by Lowry & Polhamus, NACA TN 3911 (1957).
    const aspect = TAIL.spanMm / TAIL.chordMm;
    const arm = (TAIL.leXMm + TAIL.chordMm / 4 - about) / 190;
    const volume = ((TAIL.spanMm * TAIL.chordMm) / (900 * 190)) * arm;
    const byFormula = (a: number) => -2 * slopeOf(a) * volume * arm;
    // Fins that stand on it are end plates: A (1 + 1.9 h / b), Hoerner, "Fluid-Dynamic Drag", ch. 7, from memory; here they stand inside its tips.
    const plated = names.includes('fins') ? aspect * (1 + (1.9 * FIN_HEIGHT_MM) / TAIL.spanMm) : aspect;
    expect(added / byFormula(aspect)).toBeGreaterThan(0.85);
    expect(added / byFormula(plated)).toBeLessThan(1.15);
    expect(at(to, 'staticMarginPct')).toBeGreaterThan(at(names, 'staticMarginPct') + 5);
    expect(at(to, 'slopPullG')).toBeLessThan(at(names, 'slopPullG'));
  });

  it('multiplies pitch damping; nothing else does about the same place', () => {
    expect(pitchDamping(['tail'], HOME_X) / pitchDamping([], HOME_X)).toBeGreaterThan(2.5);
    for (const name of ['motor', 'fins', 'inboard'] as const) {
      const ratio = pitchDamping([name], HOME_X) / pitchDamping([], HOME_X);
      expect(ratio, name).toBeGreaterThan(0.95);
      expect(ratio, name).toBeLessThan(1.05);
    }
  });
});

describe('elevons moved inboard', () => {
  it.each(startsFor('inboard'))('after $label: less pitch and roll a degree, less twist of the tip', ({ names }) => {
    const to = [...names, 'inboard'] as const;
    expect(at(to, 'pitchPowerPerDeg')).toBeLessThan(0.85 * at(names, 'pitchPowerPerDeg'));
    expect(at(to, 'rollRatePerDeg')).toBeLessThan(0.9 * at(names, 'rollRatePerDeg'));
    expect(at(to, 'slopPullG')).toBeLessThan(0.85 * at(names, 'slopPullG'));
    expect(at(to, 'tipTwistPerDeg')).toBeLessThan(0.7 * at(names, 'tipTwistPerDeg'));
    expect(at(to, 'controlLossAtCruisePct')).toBeLessThan(at(names, 'controlLossAtCruisePct'));
    expect(at(to, 'reversalSpeedMs')).toBeGreaterThan(at(names, 'reversalSpeedMs'));
    expect(at(to, 'pitchInertiaKgM2') / at(names, 'pitchInertiaKgM2')).toBeCloseTo(1, 2);
  });
});

describe('what is said of it', () => {
  it('as it is, the trouble is named', () => {
    expect(verdictAt([], 'pitchPowerPerDeg')).toEqual({ level: 'watch', words: 'quick in pitch' });
    const slop = at([], 'slopPullG').toFixed(2);
    expect(verdictAt([], 'slopPullG')).toEqual({
      level: 'bad',
      words: `slop alone is worth ${slop} g either way: hunts in pitch`,
    });
    expect(verdictAt([], 'dutchRollDamping').words).toContain('will wander');
    expect(verdictAt([], 'controlLossAtCruisePct')).toMatchObject({ level: 'bad' });
    expect(verdictAt([], 'controlLossAtCruisePct').words).toContain('twist');
    expect(verdictAt([], 'reversalSpeedMs').level).toBe('bad');
    expect(verdictAt([], 'throttleTrimDeg').words).toMatch(/^nose down with power: \d\.\d° of nose-up elevator/);
    expect(verdictAt([], 'staticMarginPct').level).toBe('watch');
  });

  it('slop is half the free movement of the elevons times their pull a degree', () => {
    expect(at([], 'slopPullG')).toBeCloseTo((at([], 'controlSlopDeg') / 2) * at([], 'pitchPowerPerDeg'), 6);
  });

  it.each([
    ['motor', 'pitchPowerPerDeg'],
    ['tail', 'pitchPowerPerDeg'],
    ['inboard', 'pitchPowerPerDeg'],
    ['motor', 'slopPullG'],
    ['tail', 'slopPullG'],
    ['inboard', 'slopPullG'],
    ['fins', 'dutchRollDamping'],
  ] as const)('the %s change betters the verdict on %s', (name, id) => {
    expect(rankAt([name], id)).toBeLessThan(rankAt([], id));
  });

  it('inertia alone cures neither a quick stick nor slop', () => {
    const held = full(motorForwardPackAft(erraticPusher()));
    for (const id of ['pitchPowerPerDeg', 'slopPullG'] as const)
      expect(figureIn(held, id).verdict?.level).toBe(verdictAt([], id).level);
  });

  it('a board twice as thick twists less, and that is said', () => {
    const stiff = full({ ...erraticPusher(), materials: [board({ thicknessMm: 10 })] });
    expect(valueIn(stiff, 'controlLossAtCruisePct')).toBeLessThan(0.6 * at([], 'controlLossAtCruisePct'));
    expect(figureIn(stiff, 'controlLossAtCruisePct').verdict?.level).not.toBe('bad');
  });

  it('a thrust line through the CG leaves the trim alone', () => {
    const [, , cgZ = Number.NaN] = figuresOf([]).marks.cg ?? [];
    const from = erraticPusher();
    const level = full({
      ...from,
      drives: from.drives.map((each) => ({ ...each, mount: { to: 'datum', at: [300, 0, cgZ] } })),
    });
    expect(Math.abs(at([], 'throttleTrimDeg'))).toBeGreaterThan(2);
    expect(Math.abs(valueIn(level, 'throttleTrimDeg'))).toBeLessThan(1);
  });
});

describe('a sound trainer', () => {
  const figures = full(startFrom('trainer', 'Trainer'));
  const ids = [...Object.keys(handlingEntries), ...Object.keys(trimEntries), ...Object.keys(structureEntries)];

  it('is not red in handling, trim and structure', () => {
    for (const id of ids) expect(figures.values[id]?.verdict?.level, id).not.toBe('bad');
  });

  it('holds its path in spite of slop', () => {
    expect(figureIn(figures, 'slopPullG').verdict?.level).toBe('good');
  });
});
