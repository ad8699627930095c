import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { length3, sub3, type Vec3 } from '@/lib/numerics/vec';
import { startFrom } from './layouts';
import { pointAt, resolve, sectionAt } from './resolve';
import type { ResolvedAirframe, ResolvedSurface } from './resolved';
import type { Airframe } from './schema/airframe';
import type { Panel, Surface } from './schema/surface';

const base = startFrom('pusher', 'Test');
const plain = base.surfaces[0];
if (!plain) throw new RangeError('the layout has a wing');
const template: Panel =
  plain.panels[0] ??
  (() => {
    throw new RangeError('the wing has a panel');
  })();

const panel = (rest: Partial<Panel>): Panel => ({ ...template, sweepDeg: 0, dihedralDeg: 0, washoutDeg: 0, ...rest });
const wing = (rest: Partial<Surface>): Surface => ({ ...plain, controls: [], spars: [], ...rest });
const withWing = (rest: Partial<Surface>): Airframe => ({ ...base, surfaces: [wing(rest), ...base.surfaces.slice(1)] });

function resolved(airframe: Airframe): ResolvedAirframe {
  const result = resolve(airframe);
  if (!result.ok) throw new RangeError(result.problems[0]?.message ?? 'refused');
  return result.value;
}
function surface(airframe: Airframe, id = 'wing'): ResolvedSurface {
  const found = resolved(airframe).surfaces.find((one) => one.surface.id === id);
  if (!found) throw new RangeError(`no ${id}`);
  return found;
}
const near = (point: Vec3, expected: Vec3) => expect(length3(sub3(point, expected))).toBeLessThan(1e-9);

describe('sections', () => {
  it('keeps the quarter chord straight: a taper moves the leading edge by a quarter of the lost chord', () => {
    const s = surface(withWing({ panels: [panel({ lengthMm: 300, rootChordMm: 200, tipChordMm: 120 })] }));
    near(sectionAt(s, 0).le, [0, 0, 0]);
    near(sectionAt(s, 1).le, [20, 300, 0]);
    near(sectionAt(s, 1).te, [140, 300, 0]);
  });
  it('sweeps the quarter chord by length times the tangent', () => {
    const s = surface(
      withWing({ panels: [panel({ lengthMm: 300, rootChordMm: 200, tipChordMm: 200, sweepDeg: 45 })] }),
    );
    near(sectionAt(s, 1).le, [300, 300, 0]);
  });
  it('runs the length along the panel: at 60° of dihedral half of it is span', () => {
    const s = surface(
      withWing({ panels: [panel({ lengthMm: 200, rootChordMm: 100, tipChordMm: 100, dihedralDeg: 60 })] }),
    );
    near(sectionAt(s, 1).le, [0, 100, 100 * Math.sqrt(3)]);
  });
  it('turns incidence about the quarter chord, leading edge up', () => {
    const s = surface(withWing({ incidenceDeg: 10, panels: [panel({ rootChordMm: 200, tipChordMm: 200 })] }));
    const { le, te } = sectionAt(s, 0);
    expect(le[2]).toBeGreaterThan(0);
    expect(te[2]).toBeLessThan(0);
    near([le[0] * 0.75 + te[0] * 0.25, 0, le[2] * 0.75 + te[2] * 0.25], [50, 0, 0]);
  });
  it('turns a swept plate as one flat piece: both halves lie in the plane that the root chord and the span give', () => {
    const swept = [
      panel({ id: 'a', lengthMm: 310, rootChordMm: 200, tipChordMm: 120, sweepDeg: 5 }),
      panel({ id: 'b', lengthMm: 90, rootChordMm: 120, tipChordMm: 60, sweepDeg: 45 }),
    ];
    const i = (6 * Math.PI) / 180;
    const s = surface(withWing({ incidenceDeg: 6, panels: swept }));
    // The plane through the root's quarter point (50, 0, 0) that falls aft by sin 6 degrees holds the port half too: y is not in it.
    for (const station of [0, 0.3, 0.775, 0.9, 1])
      for (const share of [0, 0.25, 1]) {
        const [x, , z] = pointAt(s, station, share);
        expect((x - 50) * Math.sin(i) + z * Math.cos(i)).toBeCloseTo(0, 9);
      }
    // Laid flat, the quarter chord still sweeps by length times tangent.
    const [x, y, z] = pointAt(s, 1, 0.25);
    const run = 310 * Math.tan((5 * Math.PI) / 180) + 90;
    expect(Math.hypot(x - 50, z)).toBeCloseTo(run, 9);
    expect(y).toBeCloseTo(400, 9);
  });
  it('turns an upright fin with incidence so that its trailing edge goes to starboard', () => {
    const s = surface(withWing({ cantDeg: 90, incidenceDeg: 5, panels: [panel({ lengthMm: 100 })] }));
    const { le, te } = sectionAt(s, 0);
    expect(te[1]).toBeGreaterThan(le[1]);
    expect(sectionAt(s, 1).le[2]).toBeCloseTo(100, 9);
  });
  it('gathers washout outward: the second panel begins where the first ended', () => {
    const panels = [panel({ id: 'a', washoutDeg: 2 }), panel({ id: 'b', washoutDeg: 1 })];
    const [a, b] = surface(withWing({ incidenceDeg: 3, panels })).panels;
    expect([a?.root, a?.tip, b?.root, b?.tip].map((s) => s?.incidenceDeg)).toEqual([3, 1, 1, 0]);
  });
  it('refuses a station outside the surface', () => {
    expect(() => sectionAt(surface(base), 1.01)).toThrow(RangeError);
    expect(() => sectionAt(surface(base), Number.NaN)).toThrow(RangeError);
  });
});

const panels = fc.array(
  fc.record({
    lengthMm: fc.integer({ min: 20, max: 400 }),
    rootChordMm: fc.integer({ min: 40, max: 300 }),
    tipChordMm: fc.integer({ min: 40, max: 300 }),
    sweepDeg: fc.integer({ min: -40, max: 60 }),
    dihedralDeg: fc.integer({ min: -10, max: 80 }),
    washoutDeg: fc.integer({ min: -5, max: 5 }),
  }),
  { minLength: 1, maxLength: 4 },
);

describe('invariants of sections', () => {
  it('every section is as long as it says, and stands on its own quarter chord line', () => {
    fc.assert(
      fc.property(panels, fc.double({ min: 0, max: 1, noNaN: true }), (list, station) => {
        const s = surface(withWing({ incidenceDeg: 2, panels: list.map((one, i) => panel({ ...one, id: `p${i}` })) }));
        const section = sectionAt(s, station);
        expect(length3(sub3(section.te, section.le))).toBeCloseTo(section.chordMm, 6);
        expect(section.lengthMm).toBeCloseTo(station * s.lengthMm, 6);
      }),
    );
  });
  it('an untwisted panel cut in two is the same surface', () => {
    fc.assert(
      fc.property(
        panels,
        fc.double({ min: 0.1, max: 0.9, noNaN: true }),
        fc.double({ min: 0, max: 1, noNaN: true }),
        (list, cut, at) => {
          const flat = list.map((one, i) => panel({ ...one, washoutDeg: 0, id: `p${i}` }));
          const [first, ...rest] = flat;
          if (!first) return;
          const middle = first.rootChordMm + (first.tipChordMm - first.rootChordMm) * cut;
          const inner = { ...first, lengthMm: first.lengthMm * cut, tipChordMm: middle };
          const outer = { ...first, id: 'cut', lengthMm: first.lengthMm * (1 - cut), rootChordMm: middle };
          const whole = pointAt(surface(withWing({ panels: flat })), at, 0.6);
          const parted = pointAt(surface(withWing({ panels: [inner, outer, ...rest] })), at, 0.6);
          expect(length3(sub3(whole, parted))).toBeLessThan(1e-6);
        },
      ),
    );
  });
});

describe('mounts', () => {
  const place = (airframe: Airframe, id: string): Vec3 => {
    const found = resolved(airframe).places.get(id);
    if (!found) throw new RangeError(`no ${id}`);
    return found.at;
  };
  it('hangs on the aft end of a boom and follows its length', () => {
    near(place(base, 'tail'), [435, 0, 1]);
    const longer = { ...base, booms: base.booms.map((boom) => ({ ...boom, lengthMm: boom.lengthMm + 60 })) };
    near(place(longer, 'tail'), [495, 0, 1]);
  });
  it('points a pitched boom down at its aft end and a yawed one to starboard', () => {
    const turned = { ...base, booms: base.booms.map((boom) => ({ ...boom, lengthMm: 100, pitchDeg: 30, yawDeg: 0 })) };
    near(resolved(turned).booms[0]?.aft ?? [0, 0, 0], [40 + 50 * Math.sqrt(3), 110, -55]);
    const yawed = { ...base, booms: base.booms.map((boom) => ({ ...boom, lengthMm: 100, pitchDeg: 0, yawDeg: 30 })) };
    near(resolved(yawed).booms[0]?.aft ?? [0, 0, 0], [40 + 50 * Math.sqrt(3), 160, -5]);
  });
  it('stands on a surface by station and chord share', () => {
    const tailless = startFrom('tailless', 'Test');
    near(place(tailless, 'tipfin'), pointAt(surface(tailless), 1, 0.1));
  });
  it('hangs on the ends of a body', () => {
    const [first, ...rest] = base.items;
    if (!first) throw new RangeError('the layout has items');
    const on = (end: 'fore' | 'aft' | undefined): Airframe => ({
      ...base,
      items: [{ ...first, mount: { to: 'pod', at: [1, 2, 3], end } }, ...rest],
    });
    near(place(on('aft'), first.id), [-230 + 405 + 1, 2, -1]);
    near(place(on('fore'), first.id), [-229, 2, -1]);
    near(place(on(undefined), first.id), [-229, 2, -1]);
  });
  it('refuses loops of any length by name, and what hangs on them does not hang the program', () => {
    const loop: Airframe = {
      ...base,
      bodies: base.bodies.map((body) => ({ ...body, mount: { to: 'boom', at: [0, 0, 0] } })),
      booms: base.booms.map((boom) => ({ ...boom, mount: { to: 'pod', at: [0, 0, 0] } })),
    };
    const result = resolve(loop);
    expect(result.ok).toBe(false);
    if (result.ok) return;
    expect(result.problems).toHaveLength(1);
    expect(result.problems[0]).toMatchObject({ code: 'mount-loop', path: 'booms.0.mount.to' });
    expect(result.problems[0]?.message).toContain('boom → pod → boom');
  });
  it('refuses a thing mounted on itself', () => {
    const self: Airframe = {
      ...base,
      booms: base.booms.map((boom) => ({ ...boom, mount: { to: 'boom', at: [0, 0, 0] } })),
    };
    expect(resolve(self)).toMatchObject({ ok: false, problems: [{ code: 'mount-loop', path: 'booms.0.mount.to' }] });
  });
  it.each([
    {
      name: 'nothing',
      to: 'nowhere',
      at: [0, 0, 0] satisfies [number, number, number],
      end: undefined,
      code: 'unknown-mount',
      key: 'to',
    },
    {
      name: 'a station on a body',
      to: 'pod',
      at: { station: 0, chordShare: 0 },
      end: undefined,
      code: 'mount-needs-surface',
      key: 'at',
    },
    {
      name: 'an end of a surface',
      to: 'wing',
      at: [0, 0, 0] satisfies [number, number, number],
      end: 'aft' as const,
      code: 'mount-without-ends',
      key: 'end',
    },
  ])('refuses a mount on $name', ({ to, at, end, code, key }) => {
    const broken: Airframe = { ...base, drives: base.drives.map((drive) => ({ ...drive, mount: { to, at, end } })) };
    expect(resolve(broken)).toMatchObject({ ok: false, problems: [{ code, path: `drives.0.mount.${key}` }] });
  });
});

describe('controls', () => {
  it('hinge where their chord share says', () => {
    const control = resolved(base).controls.find(({ control: { id } }) => id === 'elevator');
    near(control?.hingeInner ?? [0, 0, 0], [435 + 105 * 0.65, 0, 1]);
    near(control?.hingeOuter ?? [0, 0, 0], [435 + 105 * 0.65, 125 * 0.82, 1]);
  });
  it('turn about their axis when the whole surface moves', () => {
    const tail = base.surfaces.find(({ id }) => id === 'tail');
    const elevator = tail?.controls[0];
    if (!tail || !elevator) throw new RangeError('the layout has an elevator');
    const moving: Airframe = {
      ...base,
      surfaces: [{ ...tail, controls: [{ ...elevator, kind: 'allMoving', hinge: { ...elevator.hinge, axis: 0.3 } }] }],
    };
    near(resolved(moving).controls[0]?.hingeInner ?? [0, 0, 0], [435 + 105 * 0.3, 0, 1]);
  });
});
