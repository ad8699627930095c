import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { alphaPitch, contextOf, figure, LATERAL, run, type Turn, value } from '@/tests/support/handling';
import { plain } from '@/tests/support/plainAircraft';
import { feelFigures } from './handling';
import { handlingEntries } from './table/handling';

function expectWhole(turn: Turn) {
  const { figures, charts } = run(turn);
  expect(Object.keys(figures).sort()).toEqual(Object.keys(handlingEntries).sort());
  for (const [id, { value: number, band, problem }] of Object.entries(figures)) {
    if (number === null) expect(problem?.message, id).toBeTruthy();
    else expect(Number.isFinite(number), id).toBe(true);
    if (band && number !== null) {
      expect(band.low, id).toBeLessThanOrEqual(number);
      expect(band.high, id).toBeGreaterThanOrEqual(number);
      expect(band.cause.length, id).toBeGreaterThan(10);
    }
  }
  expect(JSON.stringify({ figures, charts })).not.toMatch(/NaN|Infinity/);
}

describe('a sound aircraft', () => {
  it('has every figure of the table, nothing is red, and nothing runs away', () => {
    expectWhole({});
    for (const [id, { verdict }] of Object.entries(run().figures)) expect(verdict?.level ?? 'good', id).toBe('good');
    expect(figure('pitchDoubleS').problem?.code).toBe('does-not-apply');
  });

  it('the quick way gives the same feel as the whole', () => {
    const whole = run().figures;
    const feel = feelFigures(contextOf());
    expect(Object.keys(feel).sort()).toEqual(['pitchPowerPerDeg', 'rollHelix', 'rollRatePerDeg']);
    for (const id of ['pitchPowerPerDeg', 'rollHelix', 'rollRatePerDeg'] as const) expect(feel[id]).toEqual(whole[id]);
  });

  it('says how many times smaller it is than what the published limits were written for', () => {
    const inputs = figure('controlAnticipation').inputs ?? [];
    expect(inputs.find(({ name }) => name.startsWith('scale N'))?.value).toBeCloseTo(10, 9);
  });
});

describe('whatever the derivatives and the inertia', () => {
  const any = fc.record({
    pitch: fc.double({ min: -3, max: 1, noNaN: true }),
    damping: fc.double({ min: -25, max: 1, noNaN: true }),
    yaw: fc.double({ min: -0.3, max: 0.4, noNaN: true }),
    dihedral: fc.double({ min: -0.5, max: 0.3, noNaN: true }),
    roll: fc.double({ min: -0.8, max: 0.05, noNaN: true }),
    xx: fc.double({ min: 0.0005, max: 0.1, noNaN: true }),
    yy: fc.double({ min: 0.0005, max: 0.1, noNaN: true }),
    halfMm: fc.double({ min: 0, max: 40, noNaN: true }),
  });
  it('every figure is a finite number in its band, or says why not', () => {
    fc.assert(
      fc.property(any, ({ pitch, damping, yaw, dihedral, roll, xx, yy, halfMm }) =>
        expectWhole({
          model: { alpha: { lift: 4.6, pitch }, pitchRate: { lift: 7, pitch: damping } },
          lateral: {
            beta: { side: -0.3, roll: dihedral, yaw },
            rollRate: { ...LATERAL.rollRate, roll },
          },
          inertia: { xx, yy, zz: xx + yy, xz: 0 },
          halfMm,
        }),
      ),
      { numRuns: 80 },
    );
  });

  it('moving the datum moves the manoeuvre point and nothing else', () => {
    fc.assert(
      fc.property(fc.double({ min: -500, max: 500, noNaN: true }), (datumMm) => {
        const [here, there] = [run().figures, run({ datumMm }).figures];
        for (const [id, before] of Object.entries(here)) {
          const after = Object.entries(there).find(([other]) => other === id)?.[1];
          const shift = id === 'manoeuvrePointXMm' ? datumMm : 0;
          // Where a surface twists is taken from the airframe, which stays where it is here.
          if (id === 'pitchPowerTwistedPerDeg') continue;
          if (before.value !== null) expect(after?.value, id).toBeCloseTo(before.value + shift, 6);
          expect(after?.verdict, id).toEqual(before.verdict);
        }
      }),
      { numRuns: 20 },
    );
  });
});

describe('what is missing', () => {
  it('without inertia the steady figures still show, and the motion says why not', () => {
    const { figures, problems, charts } = run({ inertia: { yy: 0 } });
    expect(problems?.map(({ code }) => code)).toEqual(['no-inertia']);
    expect(figures.shortPeriodHz?.problem?.code).toBe('no-inertia');
    expect(figures.pitchPowerPerDeg?.value).toBeGreaterThan(0);
    expect(charts).toBeUndefined();
  });

  it('slower than the stall nothing can be said, and the cruise speed is named', () => {
    // 480 g on 0.18 m2 at 5 m/s would take a lift coefficient of 1.7, and it has 0.75: the stall is at 7.5 m/s.
    const turn = { airframe: plain({ flight: { ...plain().flight, cruiseMs: 5 } }) };
    expect(Object.keys(run(turn).figures).sort()).toEqual(Object.keys(handlingEntries).sort());
    for (const { problem } of Object.values(run(turn).figures)) {
      expect(problem).toMatchObject({ code: 'cruise-below-stall', path: 'flight.cruiseMs' });
      expect(problem?.message).toContain('7.5 m/s');
    }
    expect(run(turn).charts).toBeUndefined();
    expect(feelFigures(contextOf(turn)).rollHelix?.problem?.code).toBe('cruise-below-stall');
  });

  it('without lift nothing can be said', () => {
    const turn = { model: { alpha: { lift: 0, pitch: 0 } } };
    expect(Object.keys(run(turn).figures).sort()).toEqual(Object.keys(handlingEntries).sort());
    for (const { problem } of Object.values(run(turn).figures)) expect(problem?.code).toBe('needs-lattice');
    expect(feelFigures(contextOf(turn)).rollHelix?.problem?.code).toBe('needs-lattice');
  });
});

describe('motions in time', () => {
  const chart = (id: string, turn: Turn = {}) => {
    const found = run(turn).charts?.find((each) => each.id === id);
    if (!found) throw new RangeError(`no chart ${id}`);
    return found;
  };
  const points = (id: string, turn: Turn = {}) =>
    chart(id, turn).series.find(({ kind }) => kind === 'main')?.points ?? [];

  it('an elevator behind the CG first sinks the aircraft, then the pull comes near the steady one', () => {
    const pulls = points('pitchStep').map(([, pull]) => pull);
    expect(pulls[0]).toBeLessThan(0);
    const most = Math.max(...pulls);
    expect(most).toBeGreaterThan(value('pitchPowerPerDeg') * 0.8);
    expect(most).toBeLessThan(value('pitchPowerPerDeg') * 1.25);
  });

  it('a roll reaches most of its steady rate after a few time constants', () => {
    const after = points('rollStep').find(([time]) => time >= 4 * value('rollModeS'));
    expect((after?.[1] ?? 0) / value('rollRatePerDeg')).toBeGreaterThan(0.8);
    expect((after?.[1] ?? 0) / value('rollRatePerDeg')).toBeLessThan(1.05);
  });

  it('sideslip starts at 5 degrees and dies away', () => {
    const slip = points('yawRelease').map(([, deg]) => deg);
    expect(slip[0]).toBeCloseTo(5, 12);
    expect(Math.abs(slip.at(-1) ?? 9)).toBeLessThan(0.5);
  });

  it('what runs away leaves the chart instead of going through the roof', () => {
    const pulls = points('pitchStep', alphaPitch(2)).map(([, pull]) => Math.abs(pull));
    expect(pulls.length).toBeLessThan(101);
    expect(Math.max(...pulls)).toBeLessThanOrEqual(4);
  });
});
