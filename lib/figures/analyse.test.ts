import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { startFrom, startingLayouts } from '@/lib/airframe/layouts';
import type { Airframe } from '@/lib/airframe/schema/airframe';
import { body, control, panel, surface } from '@/tests/support/airframe';
import { expectHonest, fin, full, neutralPoint, packAt, plain, tail, value, wing } from '@/tests/support/plainAircraft';
import { analyse } from './analyse';
import { ENGINE_VERSION } from './engine';
import { DECIDING, FIGURES } from './table';
import type { Figures } from './types';

describe('every starting layout', () => {
  it.each(startingLayouts.map(({ id }) => id))('%s has all figures of the table, finite, without a refusal', (id) => {
    const figures = full(startFrom(id, 'Test'));
    expect(Object.keys(figures.values).sort()).toEqual(Object.keys(FIGURES).sort());
    expectHonest(figures);
    for (const deciding of DECIDING) expect(figures.values[deciding]?.value, deciding).not.toBeNull();
    expect(figures.engine).toBe(ENGINE_VERSION);
  });

  it.each(startingLayouts.map(({ id }) => id))(
    '%s: the live depth gives the deciding figures, the same as the full one',
    (id) => {
      const document = startFrom(id, 'Test');
      const [live, all] = [analyse(document, { depth: 'live' }), full(document)];
      for (const deciding of DECIDING) expect(live.values[deciding]).toEqual(all.values[deciding]);
      expect(live.marks).toEqual(all.marks);
      expect(live.values.reynoldsMac).toBeUndefined();
    },
  );
});

describe('the neutral point', () => {
  it('moves forward without the tail, aft with the tail further back, and not at all with a fin', () => {
    const whole = neutralPoint(plain());
    expect(neutralPoint(plain({ surfaces: [wing(), fin()] }))).toBeLessThan(whole - 20);
    expect(neutralPoint(plain({ surfaces: [wing(), tail(650), fin()] }))).toBeGreaterThan(whole + 5);
    expect(neutralPoint(plain({ surfaces: [wing(), tail()] }))).toBeCloseTo(whole, 9);
  });

  it('moves aft with a V-tail as with a flat one, by less the steeper it stands', () => {
    const vtail = (cantDeg: number) =>
      plain({ surfaces: [wing(), tail(560, { role: 'vtail', cantDeg, controls: [] })] });
    expect(neutralPoint(vtail(25))).toBeGreaterThan(neutralPoint(vtail(45)) + 3);
    expect(neutralPoint(vtail(45))).toBeGreaterThan(neutralPoint(plain({ surfaces: [wing()] })) + 5);
  });

  it('moves forward with a foreplane', () => {
    const foreplane = tail(-350, { id: 'fore', role: 'foreplane' });
    expect(neutralPoint(plain({ surfaces: [wing(), foreplane] }))).toBeLessThan(
      neutralPoint(plain({ surfaces: [wing()] })) - 20,
    );
    expect(full(plain({ surfaces: [wing(), foreplane] })).values.neutralPointHandbookXMm?.problem?.code).toBe(
      'does-not-apply',
    );
  });

  it('stays when a panel is cut in two', () => {
    const halves = [
      panel({ id: 'p1', lengthMm: 200, rootChordMm: 210, tipChordMm: 186, sweepDeg: 4 }),
      panel({ id: 'p2', lengthMm: 300, rootChordMm: 186, tipChordMm: 150, sweepDeg: 4 }),
    ];
    expect(neutralPoint(plain({ surfaces: [wing({ panels: halves }), tail(), fin()] }))).toBeCloseTo(
      neutralPoint(plain()),
      6,
    );
  });

  it('has a band that names its cause: wider with a body, widest behind a pusher', () => {
    const width = (document: Airframe) => {
      const { neutralPointXMm, macMm } = full(document).values;
      const band = neutralPointXMm?.band;
      return { pct: band && (100 * (band.high - band.low)) / (2 * (macMm?.value ?? 1)), cause: band?.cause };
    };
    const drive = startFrom('pusher', 'x').drives.map((d) => ({
      ...d,
      controllerItemId: undefined,
      packItemId: undefined,
    }));
    expect(width(plain()).pct).toBeCloseTo(2, 9);
    expect(width(plain({ bodies: [body()] })).pct).toBeCloseTo(3, 9);
    expect(width(plain({ bodies: [body()] })).cause).toContain('body');
    expect(width(plain({ drives: drive })).pct).toBeCloseTo(5, 9);
    expect(width(plain({ drives: drive })).cause).toContain('propeller');
  });
});

describe('moving everything by one distance', () => {
  it('moves every place by it, and no margin', () => {
    fc.assert(
      fc.property(fc.double({ min: -400, max: 400, noNaN: true }), (dx) => {
        const shift = (at: unknown): [number, number, number] => {
          if (!Array.isArray(at)) throw new RangeError('expected an offset');
          return [at[0] + dx, at[1], at[2]];
        };
        const document = plain();
        const moved = {
          ...document,
          surfaces: document.surfaces.map((s) => ({ ...s, mount: { ...s.mount, at: shift(s.mount.at) } })),
          items: document.items.map((i) => ({ ...i, mount: { ...i.mount, at: shift(i.mount.at) } })),
        };
        const [here, there] = [full(document), full(moved)];
        for (const id of Object.keys(FIGURES)) {
          const places = /XMm$/.test(id);
          if (here.values[id]?.value === null) expect(there.values[id]?.value).toBeNull();
          else {
            const expected = value(here, id) + (places ? dx : 0);
            expect(Math.abs(value(there, id) - expected), id).toBeLessThan(1e-6 * Math.max(1, Math.abs(expected)));
          }
        }
      }),
      { numRuns: 8 },
    );
  });
});

describe('feel', () => {
  const pull = (document: Airframe) => full(document).values.pitchPowerPerDeg;

  it('grows as the CG moves back, and is refused behind the manoeuvre point', () => {
    expect(pull(plain({ items: [packAt(40)] }))?.value).toBeGreaterThan((pull(plain())?.value ?? 9) + 0.01);
    expect(pull(plain({ items: [packAt(400)] }))?.problem?.code).toBe('behind-manoeuvre-point');
  });

  it('rolls faster with wider ailerons, and by the mean of both sides with differential', () => {
    const roll = (over: Partial<ReturnType<typeof control>>) =>
      value(full(plain({ surfaces: [wing({ controls: [control(over)] }), tail(), fin()] })), 'rollHelix');
    expect(roll({ from: 0.3 })).toBeGreaterThan(roll({}) * 1.1);
    expect(roll({ differential: 0.5 })).toBeCloseTo(roll({}) * 0.75, 9);
  });

  it('says so when nothing answers the stick', () => {
    const figures = full(plain({ surfaces: [wing({ controls: [] }), tail(560, { controls: [] }), fin()] }));
    expect(figures.values.rollHelix?.problem?.code).toBe('does-not-apply');
    expect(figures.values.pitchPowerPerDeg?.problem?.code).toBe('does-not-apply');
    expectHonest(figures);
  });
});

describe('what cannot be worked out leaves the rest standing', () => {
  const codes = (figures: Figures) => figures.problems.map((p) => `${p.code} ${p.path}`);

  it('no wing: masses and CG still show', () => {
    const figures = full(plain({ surfaces: [tail(), fin()] }));
    expect(codes(figures)).toContain('no-wing surfaces');
    expect(figures.values.neutralPointXMm?.value).toBeNull();
    expect(value(figures, 'allUpMassG')).toBeGreaterThan(300);
    expectHonest(figures);
  });

  it('a wing on one side only: its index is named', () => {
    const figures = full(
      plain({
        surfaces: [tail(), wing(), surface({ id: 'odd', mirrored: false, mount: { to: 'datum', at: [0, 0, 60] } })],
      }),
    );
    expect(codes(figures)).toContain('surface-one-sided surfaces.2');
    expect(figures.values.neutralPointXMm?.value).toBeNull();
    expect(value(figures, 'macMm')).toBeGreaterThan(100);
    expect(figures.values.stallSpeedMs?.value).not.toBeNull();
    expectHonest(figures);
  });

  it('a tail in the very plane of the wing’s wake is named, and the figures stand; a sheet higher it is not', () => {
    const level = (z: number) =>
      full(plain({ surfaces: [wing(), tail(560, { mount: { to: 'datum', at: [560, 0, z] } }), fin()] }));
    expect(codes(level(0))).toContain('tail-in-wake-plane surfaces.1.mount');
    expect(level(0).values.neutralPointXMm?.value).not.toBeNull();
    expect(codes(level(5))).not.toContain('tail-in-wake-plane surfaces.1.mount');
    // It passes through the wake without a jump: under 1 % of the mean chord of 181 mm from one sheet below to one above.
    const places = [-5, -2, -0.3, 0, 0.3, 2, 5].map((z) => value(level(z), 'neutralPointXMm'));
    expect(Math.max(...places) - Math.min(...places)).toBeLessThan(1.8);
  });

  it('two wings in one place', () => {
    const figures = full(plain({ surfaces: [wing(), wing({ id: 'again' }), tail()] }));
    expect(codes(figures)).toContain('coincident-surfaces surfaces.1');
    expectHonest(figures);
  });

  it('a mount that names nothing: every figure says why', () => {
    const figures = full(plain({ surfaces: [wing({ mount: { to: 'nowhere', at: [0, 0, 0] } })] }));
    expect(figures.values.spanMm?.value).toBeNull();
    expect(figures.problems).toHaveLength(1);
    expectHonest(figures);
  });

  it('a folded section lifts by itself: trim and stall change, the neutral point stays', () => {
    const section = { kind: 'folded' as const, thicknessShare: 0.1, maxAt: 0.3, lowerTo: 1, webAt: 0.3 };
    const figures = full(plain({ surfaces: [wing({ panels: [panel({ lengthMm: 500, section })] }), tail(), fin()] }));
    const flat = full(plain({ surfaces: [wing({ panels: [panel({ lengthMm: 500 })] }), tail(), fin()] }));
    // A camber that is not there costs nothing; where it acts is the aerodynamic centre, which it does not move.
    expect(value(figures, 'neutralPointXMm')).toBeCloseTo(value(flat, 'neutralPointXMm'), 0);
    // It lifts more at the stall, and other elevator holds it level.
    expect(Math.abs(value(figures, 'trimElevatorDeg') - value(flat, 'trimElevatorDeg'))).toBeGreaterThan(0.5);
    expect(value(figures, 'stallSpeedMs')).toBeLessThan(value(flat, 'stallSpeedMs'));
    expectHonest(figures);
  });
});

describe('any aircraft the schema allows', () => {
  const document = fc
    .record({
      chord: fc.double({ min: 20, max: 500, noNaN: true }),
      taper: fc.double({ min: 0, max: 2, noNaN: true }),
      length: fc.double({ min: 5, max: 2000, noNaN: true }),
      sweepDeg: fc.double({ min: -60, max: 70, noNaN: true }),
      dihedralDeg: fc.double({ min: -20, max: 60, noNaN: true }),
      washoutDeg: fc.double({ min: -15, max: 15, noNaN: true }),
      tailX: fc.double({ min: -900, max: 900, noNaN: true }),
      tailZ: fc.constantFrom(0, 12, -40),
      packX: fc.double({ min: -500, max: 500, noNaN: true }),
      altitudeM: fc.double({ min: -500, max: 6000, noNaN: true }),
    })
    .map((p) =>
      plain({
        surfaces: [
          wing({
            panels: [
              panel({
                lengthMm: p.length,
                rootChordMm: p.chord,
                tipChordMm: p.chord * p.taper,
                sweepDeg: p.sweepDeg,
                dihedralDeg: p.dihedralDeg,
                washoutDeg: p.washoutDeg,
              }),
            ],
          }),
          tail(p.tailX, { mount: { to: 'datum', at: [p.tailX, 0, p.tailZ] } }),
          fin(p.tailX),
        ],
        items: [packAt(p.packX)],
        flight: { ...plain().flight, altitudeM: p.altitudeM },
      }),
    );

  it('never shows a number that is not one', () => {
    fc.assert(
      fc.property(document, (each) => expectHonest(full(each))),
      { numRuns: 120 },
    );
  });
});
