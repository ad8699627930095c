import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import type { Airframe } from '@/lib/airframe/schema/airframe';
import type { Surface } from '@/lib/airframe/schema/surface';
import { spread } from '@/lib/numerics/spread';
import { airframe, control, panel, surface } from '@/tests/support/airframe';
import { pitchContext, pitchModel } from '@/tests/support/pitchContext';
import { expectHonest, fin, full, neutralPoint, packAt, plain, tail, value, wing } from '@/tests/support/plainAircraft';
import { marginFigures } from './stability';
import type { Figures } from './types';

describe('the CG range', () => {
  const range = (document: Airframe) => {
    const figures = full(document);
    return {
      fore: value(figures, 'cgForeLimitXMm'),
      aft: value(figures, 'cgAftLimitXMm'),
      first: value(figures, 'firstFlightCgXMm'),
    };
  };
  const elevator = (up: number) =>
    tail(560, { controls: tail().controls.map((c) => ({ ...c, throwsDeg: { up, down: 12, lowShare: 0.7 } })) });

  it('ends where the lowest neutral point has the smallest margin, and its first third holds the first flight', () => {
    const { fore, aft, first } = range(plain());
    const mac = value(full(plain()), 'macMm');
    expect(aft).toBeCloseTo(neutralPoint(plain()) - mac * (0.02 + 0.07), 9);
    expect(first).toBeGreaterThan(fore);
    expect(first).toBeLessThan(fore + (aft - fore) / 3);
  });

  it('begins at the largest margin when the elevator is strong, and later when it is weak', () => {
    const mac = value(full(plain()), 'macMm');
    const strong = range(plain({ surfaces: [wing(), elevator(30), fin()] }));
    expect(strong.fore).toBeCloseTo(strong.aft - mac * 0.05, 9);
    const weak = range(plain({ surfaces: [wing(), elevator(3), fin()] }));
    expect(weak.fore).toBeGreaterThan(strong.fore + 5);
  });

  it('a CG at the forward limit of a weak elevator is balanced there by 80 % of it', () => {
    // Turned round: with that elevator fixed as neutral and no more, the CG that needs none is the limit itself.
    const document = plain({ surfaces: [wing(), elevator(3), fin()] });
    const limit = range(document).fore;
    const set = plain({
      surfaces: [
        wing(),
        tail(560, {
          controls: elevator(3).controls.map((c) => ({ ...c, neutralDeg: -2.4, mix: { ...c.mix, pitch: 0 } })),
        }),
        fin(),
      ],
    });
    const weakest = plain({
      surfaces: [
        wing(),
        tail(560, {
          controls: elevator(3).controls.map((c) => ({
            ...c,
            neutralDeg: -2.4,
            throwsDeg: { up: 1e-9, down: 1e-9, lowShare: 0.7 },
          })),
        }),
        fin(),
      ],
    });
    expect(full(set).problems.map((p) => p.code)).toContain('no-pitch-control');
    expect(range(weakest).fore).toBeCloseTo(limit, 5);
  });

  it('says so when nothing is left between its limits', () => {
    const figures = full(plain({ surfaces: [wing(), elevator(0.5), fin()] }));
    expect(figures.problems.map((p) => p.code)).toContain('cg-range-empty');
    expect(figures.values.firstFlightCgXMm?.value).toBeNull();
    expect(figures.marks.cgRangeXMm).toBeNull();
    expectHonest(figures);
  });

  it('reflex is up-elevator already: it moves the forward limit of a tailless wing forward', () => {
    const tailless = (neutralDeg: number) =>
      airframe({
        surfaces: [
          surface({
            panels: [panel({ lengthMm: 450, rootChordMm: 240, tipChordMm: 140, sweepDeg: 25 })],
            controls: [
              control({
                kind: 'elevon',
                neutralDeg,
                from: 0.3,
                mix: { pitch: 1, roll: 1, yaw: 0, flap: 0 },
                throwsDeg: { up: 8, down: 8, lowShare: 0.7 },
              }),
            ],
          }),
        ],
        items: [packAt(60)],
      });
    expect(range(tailless(-3)).fore).toBeLessThan(range(tailless(0)).fore - 1);
  });
});

describe('the CG range of a model by hand', () => {
  const bare = plain();
  // Neutral point 60 + 182 x 0.5 / 4.5 mm; margins 7 to 12 % of the MAC and a band of 2 % are the plain aircraft's.
  const neutral = 60 + (182 * 0.5) / 4.5;
  const clMax = spread((end) => ({ value: 0.8, low: 0.7, high: 0.9 })[end]);
  const rangeOf = (document: Airframe, model = pitchModel(), lift = clMax) => {
    const context = pitchContext(document, model, lift);
    return { ...context.stability, mac: context.wing.macMm, le: context.wing.macLeXMm };
  };
  const weak = (up: number) =>
    plain({
      surfaces: [
        wing(),
        tail(560, { controls: tail().controls.map((c) => ({ ...c, throwsDeg: { up, down: 12, lowShare: 0.7 } })) }),
        fin(),
      ],
    });

  it('is laid out from the lowest neutral point of the band', () => {
    const { aftLimitX, foreLimitX, bandX, mac } = rangeOf(bare);
    expect(bandX[0]).toBeCloseTo(neutral - 0.02 * mac, 9);
    expect(aftLimitX).toBeCloseTo(neutral - 0.09 * mac, 9);
    expect(foreLimitX).toBeCloseTo(neutral - 0.14 * mac, 9);
  });

  it('says every place in % of the MAC from its leading edge too', () => {
    const { figures, mac, le } = rangeOf(bare);
    for (const [mm, pct] of [
      ['neutralPointXMm', 'neutralPointPct'],
      ['cgForeLimitXMm', 'cgForeLimitPct'],
      ['cgAftLimitXMm', 'cgAftLimitPct'],
      ['firstFlightCgXMm', 'firstFlightCgPct'],
    ] as const)
      expect(figures[mm]?.value).toBeCloseTo(le + (mac * (figures[pct]?.value ?? Number.NaN)) / 100, 9);
    expect(figures.neutralPointPct?.band?.low).toBeCloseTo((figures.neutralPointPct?.value ?? 0) - 2, 9);
  });

  it('begins where 80 % of a weak elevator trims 90 % of the greatest lift, worked by hand', () => {
    // Up 2 degrees, 80 % of it: d = -0.027925. Lift 0.72 = 0.15 + 4.5 a + 0.5 d; moment 0.02 - 0.5 a - 1.4 d; x = 60 - 182 M / L.
    const d = (-0.8 * 2 * Math.PI) / 180;
    const a = (0.72 - 0.15 - 0.5 * d) / 4.5;
    const x = 60 - (182 * (0.02 - 0.5 * a - 1.4 * d)) / 0.72;
    const { foreLimitX, figures } = rangeOf(weak(2));
    expect(foreLimitX).toBeCloseTo(x, 9);
    const band = figures.cgForeLimitPct?.band;
    expect(band?.low).toBeLessThan(figures.cgForeLimitPct?.value ?? Number.NaN);
    expect(band?.high).toBeGreaterThan(figures.cgForeLimitPct?.value ?? Number.NaN);
    expect(band?.cause).toContain('greatest lift');
  });

  it('has no band of the greatest lift where the margin sets the limit', () => {
    expect(rangeOf(weak(25)).figures.cgForeLimitPct?.band).toBeUndefined();
  });

  it('moves with the datum, by as much, and its width not at all', () => {
    fc.assert(
      fc.property(fc.double({ min: -400, max: 400, noNaN: true }), (dx) => {
        const [here, there] = [rangeOf(weak(2)), rangeOf(weak(2), pitchModel({ cgX: 60 + dx }))];
        for (const key of ['neutralPointX', 'foreLimitX', 'aftLimitX'] as const)
          expect(there[key]).toBeCloseTo(here[key] + dx, 8);
      }),
      { numRuns: 20 },
    );
  });

  it('of a tailless wing is trimmed by what roll leaves of its elevons, and by less of them further aft', () => {
    const tailless = (roll: number) =>
      airframe({
        surfaces: [
          surface({
            controls: [
              control({
                id: 'elevon',
                kind: 'elevon',
                mix: { pitch: 1, roll, yaw: 0, flap: 0 },
                throwsDeg: { up: 16, down: 16, lowShare: 0.7 },
              }),
            ],
          }),
        ],
      });
    const model = pitchModel({
      base: { lift: 0, pitch: -0.02 },
      controls: new Map([['wing/elevon', { lift: 1.2, pitch: -0.4 }]]),
    });
    const full = rangeOf(tailless(0.001), model).figures.cgForeLimitPct;
    const shared = rangeOf(tailless(1), model).figures.cgForeLimitPct;
    const limit = (figure: typeof full) => figure?.inputs?.find(({ name }) => name.includes('elevator'))?.value ?? 0;
    expect(limit(shared)).toBeGreaterThan(limit(full) + 0.5);
  });

  it('names a control between CG and neutral point, which turns the nose the wrong way, and leaves the margin to set the limit', () => {
    const idle = pitchModel({ controls: new Map([['tail/elevator', { lift: 0.5, pitch: -0.02 }]]) });
    const { problems, foreLimitX, mac } = rangeOf(bare, idle);
    expect(problems.map(({ code }) => code)).toEqual(['up-stick-drops-nose']);
    expect(foreLimitX).toBeCloseTo(neutral - 0.14 * mac, 9);
  });
});

describe('verdicts, one on each side of every limit', () => {
  /** The CG wanted, by moving a heavy pack. */
  function balancedAt(marginPct: number): Figures {
    const figures = full(plain());
    const [mass, cg, mac] = [value(figures, 'allUpMassG'), value(figures, 'cgXMm'), value(figures, 'macMm')];
    // The lowest neutral point is 2 % of the MAC ahead of the lattice's.
    const target = value(figures, 'neutralPointXMm') - (mac * (2 + marginPct)) / 100;
    return full(plain({ items: [packAt(((target - cg) * mass) / 300)] }));
  }
  const levels = (figures: Figures) => [
    figures.values.staticMarginPct?.verdict?.level,
    figures.values.cgXMm?.verdict?.level,
  ];

  // The CG of this aircraft may be out by about 1.5 % of the MAC: with the 2 % of the neutral point another half per cent by squares.
  it.each([
    { margin: -0.5, levels: ['bad', 'bad'] },
    { margin: 1, levels: ['watch', 'watch'] },
    { margin: 6.5, levels: ['watch', 'watch'] },
    { margin: 7.2, levels: ['watch', 'good'] },
    { margin: 8, levels: ['good', 'good'] },
    { margin: 11.5, levels: ['good', 'good'] },
    { margin: 12.3, levels: ['good', 'watch'] },
    { margin: 13.5, levels: ['watch', 'watch'] },
  ])('$margin % of margin but for the CG, where 7 to 12 are wanted: $levels', ({ margin, levels: expected }) => {
    const figures = balancedAt(margin);
    const { cgXMm, staticMarginPct } = figures.values;
    const cgPct = (100 * ((cgXMm?.band?.high ?? Number.NaN) - (cgXMm?.value ?? Number.NaN))) / value(figures, 'macMm');
    expect(staticMarginPct?.band?.low).toBeCloseTo(margin + 2 - Math.hypot(2, cgPct), 6);
    expect(staticMarginPct?.band?.cause).toContain('masses');
    expect(levels(figures)).toEqual(expected);
  });

  describe('a neutral point at 100 +- 3 mm and a CG that may be 4 mm out, on 200 mm of chord', () => {
    const context = pitchContext(plain());
    const stability = { ...context.stability, neutralPointX: 100, bandX: [97, 103] as const, aftLimitX: 83 };
    const margin = (cgX: number, errorMm?: number) =>
      marginFigures(context.airframe, { ...context.wing, macMm: 200 }, stability, cgX, errorMm).staticMarginPct;

    it('leave 10 +- 2.5 % of margin: 3, 4 and 5 mm', () => {
      expect(margin(80, 4)?.value).toBeCloseTo(10, 12);
      expect(margin(80, 4)?.band?.low).toBeCloseTo(7.5, 12);
      expect(margin(80, 4)?.band?.high).toBeCloseTo(12.5, 12);
    });

    it('are judged at the low end of both', () => {
      // 8.3 - 1.5 by the neutral point alone, 8.3 - 2.5 by both; 7 % are wanted.
      expect(margin(82.9)?.verdict?.level).toBe('good');
      expect(margin(82.9, 4)?.verdict?.level).toBe('watch');
    });

    it('could be unstable, or is for certain', () => {
      expect(margin(101, 4)?.verdict?.words).toBe('could be unstable: do not fly it like this');
      expect(margin(110, 4)?.verdict).toEqual({ level: 'bad', words: 'unstable: do not fly it like this' });
      const place = (cgX: number) =>
        marginFigures(context.airframe, context.wing, stability, cgX).cgXMm?.verdict?.words;
      expect(place(99)).toContain('perhaps unstable');
      expect(place(104)).toBe('21 mm behind the range and unstable: do not fly it like this');
    });
  });

  it('a hand launch wants 1.1 times the stall under 8 m/s; other launches are not judged', () => {
    const stall = (massG: number, launch: Airframe['flight']['launch']) =>
      full(plain({ items: [packAt(0, massG)], flight: { ...plain().flight, launch } })).values.stallSpeedMs;
    const light = stall(100, 'hand');
    const heavy = stall(900, 'hand');
    expect((light?.value ?? 9) * 1.1).toBeLessThan(8);
    expect(light?.verdict?.level).toBe('good');
    expect((heavy?.value ?? 0) * 1.1).toBeGreaterThan(8);
    expect(heavy?.verdict?.level).toBe('watch');
    expect(stall(900, 'bungee')?.verdict).toBeUndefined();
  });

  it.each([
    { length: 60, level: 'bad' },
    { length: 80, level: 'watch' },
    { length: 190, level: 'good' },
    { length: 240, level: 'watch' },
    { length: 300, level: 'bad' },
  ])('a tail of $length mm half-span is $level', ({ length, level }) => {
    const small = tail(560, { panels: [panel({ lengthMm: length, rootChordMm: 130, tipChordMm: 110 })] });
    expect(full(plain({ surfaces: [wing(), small, fin()] })).values.tailVolumeH?.verdict?.level).toBe(level);
  });

  it('the simple estimate agrees for a plain aircraft and is flagged for a stubby wing, whose downwash it overrates', () => {
    expect(full(plain()).values.neutralPointHandbookXMm?.verdict?.level).toBe('good');
    const stubby = wing({ panels: [panel({ lengthMm: 150, rootChordMm: 300, tipChordMm: 200, sweepDeg: 20 })] });
    const flagged = full(plain({ surfaces: [stubby, tail(), fin()] })).values.neutralPointHandbookXMm;
    expect(flagged?.verdict?.level).toBe('watch');
  });

  it('the simple estimate is the point about which the lifts of wing and tail balance, however large the tail', () => {
    // Wing 800 x 200, tail 400 x 100: both of aspect ratio 4, so slopes cancel. Quarter points at 50 and 600 + 25.
    const oblong = (rest: Partial<Surface>, lengthMm: number, chord: number) => ({
      ...rest,
      panels: [panel({ lengthMm, rootChordMm: chord, tipChordMm: chord })],
    });
    const pair = plain({ surfaces: [wing(oblong({}, 400, 200)), tail(600, oblong({}, 200, 100))], bodies: [] });
    const slope = (2 * Math.PI * 4) / (2 + Math.sqrt(20));
    const share = 0.25 * (1 - (2 * slope) / (Math.PI * 4));
    const byHand = (50 + share * 625) / (1 + share);
    expect(full(pair).values.neutralPointHandbookXMm?.value).toBeCloseTo(byHand, 6);
  });
});
