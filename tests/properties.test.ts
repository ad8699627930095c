import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { type Derivatives, derivatives } from '@/lib/aero/lattice/derivatives';
import type { LatticeControl, LatticeSection, LatticeSurface } from '@/lib/aero/lattice/types';
import { planform } from '@/lib/geometry/planform';
import type { Vec3 } from '@/lib/numerics/vec';

// What must hold for any aircraft of wing, tail and fin, whatever its numbers. Millimetres.

interface Aircraft {
  readonly wing: LatticeSurface;
  readonly tail: LatticeSurface;
  readonly fin: LatticeSurface;
  /** Where moments are taken about. */
  readonly point: Vec3;
}

const section = (x: number, y: number, z: number, chord: number, incidenceRad = 0): LatticeSection => ({
  le: [x, y, z],
  chord,
  incidenceRad,
});
const between = (min: number, max: number) => fc.double({ min, max, noNaN: true });

/** Swept either way, tapered, bent up or down, twisted; the tail well below or above the wake, so that it meets no leg head on. */
const aircraft: fc.Arbitrary<Aircraft> = fc
  .record({
    half: between(300, 700),
    joint: between(0.3, 0.7),
    chords: fc.tuple(between(150, 260), between(130, 230), between(80, 180)),
    sweep: between(-0.3, 0.6),
    dihedral: between(-0.05, 0.2),
    incidence: between(-0.05, 0.08),
    washout: between(0, 0.06),
    arm: between(450, 800),
    tailHalf: between(120, 260),
    tailChord: between(80, 140),
    tailZ: fc.oneof(between(60, 120), between(-120, -60)),
    fin: fc.tuple(between(90, 200), between(100, 160), between(0.5, 1)),
    cg: between(0, 120),
  })
  .map((a) => {
    const at = (share: number, chord: number, incidenceRad: number) =>
      section(share * a.half * a.sweep, share * a.half, share * a.half * a.dihedral, chord, incidenceRad);
    const [height, finChord, finTaper] = a.fin;
    return {
      wing: {
        id: 'wing',
        mirrored: true,
        strips: 8,
        rows: 4,
        sections: [
          at(0, a.chords[0], a.incidence),
          at(a.joint, a.chords[1], a.incidence),
          at(1, a.chords[2], a.incidence - a.washout),
        ],
      },
      tail: {
        id: 'tail',
        mirrored: true,
        strips: 6,
        rows: 3,
        sections: [section(a.arm, 0, a.tailZ, a.tailChord), section(a.arm, a.tailHalf, a.tailZ, a.tailChord * 0.8)],
      },
      fin: {
        id: 'fin',
        mirrored: false,
        strips: 5,
        rows: 3,
        sections: [
          section(a.arm, 0, a.tailZ, finChord),
          section(a.arm + height * 0.3, 0, a.tailZ + Math.sign(a.tailZ) * height, finChord * finTaper),
        ],
      },
      point: [a.cg, 0, 0],
    };
  });

const AREA = 2e5;
const CHORD = 180;
const SPAN = 1000;

interface Changes {
  readonly controls?: readonly LatticeControl[];
  readonly point?: Vec3;
  readonly scale?: number;
}

function solved(
  surfaces: readonly LatticeSurface[],
  { controls = [], point = [0, 0, 0], scale = 1 }: Changes = {},
): Derivatives {
  const reference = { area: AREA * scale * scale, chord: CHORD * scale, span: SPAN * scale, point };
  const result = derivatives({ surfaces, controls, reference }, 'both');
  if (!result.ok) throw new RangeError(result.problems.map((p) => p.code).join());
  return result.value;
}

const whole = ({ wing, tail, fin, point }: Aircraft, changes: Changes = {}) =>
  solved([wing, tail, fin], { point, ...changes });

/** Every coefficient by name. */
function coefficients({ symmetric, antisymmetric }: Derivatives): Map<string, number> {
  const list: [string, number][] = [];
  const { base, alpha, pitchRate, controls } = symmetric;
  for (const [name, effect] of [['base', base], ['alpha', alpha], ['q', pitchRate], ...controls] as const)
    list.push([`${name} lift`, effect.lift], [`${name} pitch`, effect.pitch]);
  if (!antisymmetric) throw new RangeError('not solved for roll and yaw');
  const { beta, rollRate, yawRate } = antisymmetric;
  for (const [name, effect] of [['beta', beta], ['p', rollRate], ['r', yawRate], ...antisymmetric.controls] as const)
    list.push([`${name} side`, effect.side], [`${name} roll`, effect.roll], [`${name} yaw`, effect.yaw]);
  return new Map(list);
}

function expectSame(a: Derivatives, b: Derivatives, tolerance: number): void {
  const other = coefficients(b);
  for (const [name, value] of coefficients(a))
    expect(Math.abs(value - (other.get(name) ?? Number.NaN)), name).toBeLessThan(
      tolerance * Math.max(1, Math.abs(value)),
    );
}

const changed = (surface: LatticeSurface, change: (cut: LatticeSection) => LatticeSection): LatticeSurface => ({
  ...surface,
  sections: surface.sections.map(change),
});
const each = ({ wing, tail, fin, point }: Aircraft, change: (cut: LatticeSection) => LatticeSection): Aircraft => ({
  wing: changed(wing, change),
  tail: changed(tail, change),
  fin: changed(fin, change),
  point,
});
const scaled = (k: number) => (cut: LatticeSection) => ({
  ...cut,
  le: [cut.le[0] * k, cut.le[1] * k, cut.le[2] * k] as const,
  chord: cut.chord * k,
});

const check = <T extends [unknown, ...unknown[]]>(
  arbitraries: { [K in keyof T]: fc.Arbitrary<T[K]> },
  holds: (...values: T) => void,
  numRuns = 15,
) => fc.assert(fc.property(...arbitraries, holds), { numRuns, endOnFailure: true });

describe('what changes no coefficient', () => {
  it('cutting a panel in two by the section that lies there', () =>
    check([aircraft, between(0.05, 0.95)], (a, t) => {
      const [root, joint, tip] = a.wing.sections;
      if (!root || !joint || !tip) throw new RangeError('three sections');
      const mix = (from: number, to: number) => from + (to - from) * t;
      const cut = section(
        mix(joint.le[0], tip.le[0]),
        mix(joint.le[1], tip.le[1]),
        mix(joint.le[2], tip.le[2]),
        mix(joint.chord, tip.chord),
        mix(joint.incidenceRad, tip.incidenceRad),
      );
      expectSame(whole(a), whole({ ...a, wing: { ...a.wing, sections: [root, joint, cut, tip] } }), 1e-9);
    }));

  it('making every length k times as large, 25.4 among them, to 1e-10; areas then go by k squared', () =>
    check([aircraft, fc.oneof(fc.constant(25.4), between(0.02, 40))], (a, k) => {
      const point: Vec3 = [a.point[0] * k, 0, 0];
      const large = each(a, scaled(k));
      expectSame(whole(a), whole(large, { point, scale: k }), 1e-10);
      const planformOf = ({ wing }: Aircraft) =>
        planform(wing.sections.map(({ le, chord }) => ({ x: le[0], y: le[1], chord })));
      expect(planformOf(large).area / planformOf(a).area / k ** 2).toBeCloseTo(1, 10);
      expect(planformOf(large).mac / planformOf(a).mac / k).toBeCloseTo(1, 10);
    }));

  it('moving the datum: every place moves with it, no margin does', () =>
    check([aircraft, between(-900, 900), between(-60, 60)], (a, dx, dz) => {
      const there = each(a, (cut) => ({ ...cut, le: [cut.le[0] + dx, cut.le[1], cut.le[2] + dz] }));
      const point: Vec3 = [a.point[0] + dx, 0, a.point[2] + dz];
      const [here, moved] = [whole(a), whole(there, { point })];
      expectSame(here, moved, 1e-8);
      expect(moved.symmetric.neutralPointX - here.symmetric.neutralPointX).toBeCloseTo(dx, 6);
    }));

  it('naming the surfaces in another order', () =>
    check([aircraft], (a) => expectSame(whole(a), solved([a.fin, a.tail, a.wing], { point: a.point }), 1e-9)));
});

describe('mirror images', () => {
  it('upside down, lift and pitch turn their signs where incidence makes them, roll and yaw keep to their sides', () =>
    check([aircraft], (a) => {
      const over = each(a, (cut) => ({
        ...cut,
        le: [cut.le[0], cut.le[1], -cut.le[2]],
        incidenceRad: -cut.incidenceRad,
      }));
      const [upright, inverted] = [coefficients(whole(a)), coefficients(whole(over))];
      // Roll by sideslip and by yaw rate, sideways force and yaw by roll rate.
      const turning = /^(base lift|base pitch|beta roll|r roll|p side|p yaw)$/;
      for (const [name, value] of upright) {
        const expected = turning.test(name) ? -value : value;
        expect(Math.abs((inverted.get(name) ?? Number.NaN) - expected), name).toBeLessThan(
          1e-8 * Math.max(1, Math.abs(value)),
        );
      }
    }));
});

describe('sums', () => {
  const flap = (id: string, from: number, to: number): LatticeControl => ({
    id,
    surfaceId: 'wing',
    from,
    to,
    chordShare: [0.25, 0.25],
  });

  it('half a flap and the other half make the flap, on a wing of one panel', () =>
    check([aircraft, between(0.35, 0.65)], (a, t) => {
      const [root, , tip] = a.wing.sections;
      if (!root || !tip) throw new RangeError('three sections');
      const wing = { ...a.wing, strips: 12, sections: [root, tip] };
      const controls = [flap('inner', 0, t), flap('outer', t, 1), flap('whole', 0, 1)];
      const found = coefficients(whole({ ...a, wing }, { controls }));
      for (const kind of ['lift', 'pitch', 'roll', 'yaw']) {
        const [inner = 0, outer = 0, both = 0] = ['inner', 'outer', 'whole'].map((id) => found.get(`${id} ${kind}`));
        expect(Math.abs(inner + outer - both), kind).toBeLessThan(1e-9);
      }
    }));

  it('setting flat surfaces nose up is angle of attack, for small angles', () =>
    check([aircraft], (a) => {
      const small = 1e-5;
      const flatWing = changed(a.wing, (cut) => ({ ...cut, le: [cut.le[0], cut.le[1], 0] }));
      const set = (incidenceRad: number) =>
        solved(
          [flatWing, a.tail].map((s) => changed(s, (cut) => ({ ...cut, incidenceRad }))),
          { point: a.point },
        ).symmetric;
      const flat = set(0);
      expect(set(small).base.lift / small).toBeCloseTo(flat.alpha.lift, 4);
      expect(set(small).base.pitch / small).toBeCloseTo(flat.alpha.pitch, 4);
    }));
});

describe('refining the lattice', () => {
  it('converges: by the second step neutral point, slope and damping change by less than 0.4 %, or much less than by the first', () =>
    check(
      [aircraft],
      (a) => {
        const [coarse, finer, finest] = [1, 2, 3].map((n) => refined(a, n));
        for (const [k, first] of (coarse ?? []).entries()) {
          const [second, third] = [finer?.[k] ?? Number.NaN, finest?.[k] ?? Number.NaN];
          expect(Math.abs(second - first)).toBeLessThan(0.03);
          expect(Math.abs(third - second)).toBeLessThan(Math.max(0.004, 0.7 * Math.abs(second - first)));
        }
      },
      5,
    ));
});

/** Neutral point in chords, and slope and dampings as logarithms, so that differences are shares. */
function refined({ wing, tail, point }: Aircraft, n: number): number[] {
  const finer = (s: LatticeSurface) => ({ ...s, strips: s.strips * n, rows: s.rows * n });
  const { symmetric, antisymmetric } = solved([finer(wing), finer(tail)], { point });
  const rates = [symmetric.alpha.lift, -symmetric.pitchRate.pitch, -(antisymmetric?.rollRate.roll ?? Number.NaN)];
  return [symmetric.neutralPointX / CHORD, ...rates.map(Math.log)];
}

describe('what is taken away', () => {
  it('the tail: the neutral point goes forward and pitch damping falls', () =>
    check([aircraft], (a) => {
      const [full, without] = [whole(a).symmetric, solved([a.wing, a.fin], { point: a.point }).symmetric];
      expect(without.neutralPointX).toBeLessThan(full.neutralPointX - 1);
      expect(without.pitchRate.pitch).toBeGreaterThan(full.pitchRate.pitch);
    }));

  it('the fin: weathercock stability and yaw damping fall', () =>
    check([aircraft], (a) => {
      const [full, without] = [whole(a).antisymmetric, solved([a.wing, a.tail], { point: a.point }).antisymmetric];
      expect(without?.beta.yaw).toBeLessThan((full?.beta.yaw ?? 0) - 0.01);
      expect(without?.yawRate.yaw).toBeGreaterThan((full?.yawRate.yaw ?? 0) + 0.01);
    }));

  it('the outer panel: less lift per angle and less roll damping, by the same area and span', () =>
    check([aircraft], (a) => {
      const short = { ...a.wing, strips: 5, sections: a.wing.sections.slice(0, 2) };
      const [full, cut] = [solved([a.wing]), solved([short])];
      expect(cut.symmetric.alpha.lift).toBeLessThan(full.symmetric.alpha.lift);
      expect(cut.antisymmetric?.rollRate.roll).toBeGreaterThan(full.antisymmetric?.rollRate.roll ?? 0);
    }));

  it('half of the tail’s arm: the neutral point goes forward', () =>
    check([aircraft], (a) => {
      const near = changed(a.tail, (cut) => ({ ...cut, le: [cut.le[0] - 150, cut.le[1], cut.le[2]] }));
      const at = (tail: LatticeSurface) => solved([a.wing, tail]).symmetric.neutralPointX;
      expect(at(near)).toBeLessThan(at(a.tail));
    }));
});
