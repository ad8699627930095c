import { describe, expect, it } from 'vitest';
import type { Airframe } from '@/lib/airframe/schema/airframe';
import type { Surface } from '@/lib/airframe/schema/surface';
import { airframe, control, panel, surface } from '@/tests/support/airframe';
import { expectHonest, fin, full, neutralPoint, packAt, plain, tail, value, wing } from '@/tests/support/plainAircraft';
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

  it.each([
    { margin: -0.5, levels: ['bad', 'bad'] },
    { margin: 0.5, levels: ['watch', 'watch'] },
    { margin: 6.5, levels: ['watch', 'watch'] },
    { margin: 7.5, levels: ['good', 'good'] },
    { margin: 11.5, levels: ['good', 'good'] },
    { margin: 12.5, levels: ['watch', 'watch'] },
  ])('at least $margin % of margin where 7 to 12 are wanted: $levels', ({ margin, levels: expected }) => {
    const figures = balancedAt(margin);
    expect(figures.values.staticMarginPct?.band?.low).toBeCloseTo(margin, 6);
    expect(levels(figures)).toEqual(expected);
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
