import { describe, expect, it } from 'vitest';
import { z } from 'zod';
import { type Derivatives, derivatives } from '@/lib/aero/lattice/derivatives';
import type { LatticeControl, LatticeInput, LatticeSurface } from '@/lib/aero/lattice/types';
import { analyse } from '@/lib/figures/analyse';
import { radFromDeg } from '@/lib/numerics/vec';
import { airframe, control, panel, surface } from '@/tests/support/airframe';
import data from './data/lattice-configurations.json';

// Four configurations worked by another vortex-lattice program written for such checks only. Agreement shows that two programs solve
// the same equations alike; it is not evidence about flight. Tolerances are those fair to the default lattice.

const Configuration = z.object({
  geometry: z.object({
    ref: z.object({ S: z.number(), c: z.number(), b: z.number(), xref: z.number(), zref: z.number() }),
    surfaces: z.array(
      z.object({
        name: z.string(),
        sections: z.array(
          z.object({ x: z.number(), y: z.number(), z: z.number(), chord: z.number(), inc_deg: z.number().default(0) }),
        ),
        mirror: z.boolean(),
        hinge: z.number().default(1),
        controls: z
          .array(
            z.object({
              name: z.string(),
              panel: z.tuple([z.number(), z.number()]),
              gain: z.tuple([z.number(), z.number()]),
            }),
          )
          .default([]),
      }),
    ),
  }),
  expected: z.record(z.string(), z.number()),
  lattice_12x6: z.record(z.string(), z.number()),
});
type Configuration = z.infer<typeof Configuration>;
const CONFIGURATIONS = z.record(z.string(), Configuration).parse(data);

type Mesh = (name: string) => { strips: number; rows: number };
/** What an aircraft gets that has a tail and fins; an aircraft without gets more rows. */
const DEFAULT_MESH: Mesh = (name) => {
  if (name === 'wing') return { strips: 10, rows: 6 };
  return name.startsWith('fin') ? { strips: 5, rows: 4 } : { strips: 6, rows: 4 };
};

function inputOf({ geometry }: Configuration, mesh: Mesh, alignJunctions: boolean): LatticeInput {
  const surfaces: LatticeSurface[] = [];
  const controls: LatticeControl[] = [];
  for (const { name, sections, mirror, hinge, controls: listed } of geometry.surfaces) {
    surfaces.push({
      id: name,
      mirrored: mirror,
      ...mesh(name),
      sections: sections.map((s) => ({ le: [s.x, s.y, s.z], chord: s.chord, incidenceRad: radFromDeg(s.inc_deg) })),
    });
    const lengths = [0];
    for (const [i, s] of sections.entries()) {
      const before = sections[i - 1];
      if (before) lengths.push((lengths.at(-1) ?? 0) + Math.hypot(s.y - before.y, s.z - before.z));
    }
    const station = (index: number) => (lengths[index] ?? 0) / (lengths.at(-1) ?? 1);
    for (const c of listed)
      controls.push({
        id: c.name,
        surfaceId: name,
        from: station(c.panel[0]),
        to: station(c.panel[1]),
        chordShare: [1 - hinge, 1 - hinge],
      });
  }
  const { S, c, b, xref, zref } = geometry.ref;
  return {
    surfaces,
    controls,
    reference: { area: S, chord: c, span: b, point: [xref, 0, zref] },
    options: { alignJunctions },
  };
}

function solved(name: string, mesh: Mesh, alignJunctions = true): Derivatives {
  const configuration = CONFIGURATIONS[name];
  if (!configuration) throw new RangeError(`no configuration ${name}`);
  const result = derivatives(inputOf(configuration, mesh, alignJunctions), 'both');
  if (!result.ok) throw new RangeError(result.problems.map((p) => p.message).join('; '));
  return result.value;
}

/** The names of the data file. Ailerons there are positive right wing down: starboard trailing edge up. */
function named({ symmetric, antisymmetric }: Derivatives): Record<string, number> {
  const values: Record<string, number> = {
    CL_alpha: symmetric.alpha.lift,
    Cm_alpha: symmetric.alpha.pitch,
    CL_q: symmetric.pitchRate.lift,
    Cm_q: symmetric.pitchRate.pitch,
    CL_0: symmetric.base.lift,
    Cm_0: symmetric.base.pitch,
    xnp: symmetric.neutralPointX,
  };
  for (const [id, { lift, pitch }] of symmetric.controls) {
    values[`CL_d_${id}`] = lift;
    values[`Cm_d_${id}`] = pitch;
  }
  if (!antisymmetric) return values;
  values.Cl_beta = antisymmetric.beta.roll;
  values.Cn_beta = antisymmetric.beta.yaw;
  values.Cl_p = antisymmetric.rollRate.roll;
  values.Cl_r = antisymmetric.yawRate.roll;
  values.Cn_r = antisymmetric.yawRate.yaw;
  for (const [id, { roll, yaw }] of antisymmetric.controls) {
    const sign = id === 'rud' ? 1 : -1;
    values[`Cl_d_${id}`] = sign * roll;
    values[`Cn_d_${id}`] = sign * yaw;
  }
  return values;
}

const within = (got: number | undefined, expected: number, share: number, what: string) =>
  expect(Math.abs((got ?? Number.NaN) / expected - 1), `${what}: ${got} against ${expected}`).toBeLessThan(share);

describe('A7: the trainer on the default lattice', () => {
  const got = named(solved('trainer', DEFAULT_MESH));
  it('neutral point at 54.2 % of the chord, within 0.5 %', () => {
    expect(Math.abs((got.xnp ?? Number.NaN) - 0.1084) / 0.2).toBeLessThan(0.005);
  });
  it.each([
    ['CL_alpha', 4.718, 0.02],
    ['Cl_p', -0.444, 0.03],
    ['Cm_q', -14.6, 0.03],
    ['CL_q', 8.68, 0.03],
    ['Cn_beta', 0.134, 0.02],
    ['Cn_r', -0.151, 0.03],
    ['Cl_beta', -0.056, 0.02],
    ['CL_d_elev', 0.655, 0.05],
    ['Cm_d_elev', -1.87, 0.05],
    ['Cl_d_ail', 0.33, 0.05],
    ['Cn_d_rud', 0.116, 0.05],
  ] as const)('%s is %d within %d', (name, expected, share) => within(got[name], expected, share, name));
});

describe('the other solver on the same lattice, 12 strips by 6 rows', () => {
  // It turns the normals at a hinge by a coarser rule, so its controls are left to the checks above and below. Its strips do not meet
  // the fins that stand on the wing (see the next block), so that is turned off here.
  const SAME = ['CL_alpha', 'Cm_alpha', 'CL_q', 'Cm_q', 'Cl_beta', 'Cn_beta', 'Cl_p', 'Cl_r', 'Cn_r', 'xnp'];
  it.each(['trainer', 'tailless', 'canard', 'navion'])('%s agrees in every derivative', (name) => {
    const got = named(solved(name, () => ({ strips: 12, rows: 6 }), false));
    const other = CONFIGURATIONS[name]?.lattice_12x6 ?? {};
    // The light aircraft's fin stands a hand's breadth above its tail: an open gap here, closed there.
    const compared = SAME.filter(
      (key) => other[key] !== undefined && !(name === 'navion' && /^C[ln]_(beta|r)$/.test(key)),
    );
    for (const id of compared) within(got[id], other[id] ?? 0, 0.01, id);
  });
});

describe('the default lattice against the other solver refined to 40 by 10', () => {
  const share = (id: string) => {
    if (id.includes('_d_')) return 0.05;
    if (id === 'CL_alpha') return 0.02;
    return /^C[LmnlY]_[pqr]$/.test(id) ? 0.03 : 0.06;
  };
  it.each([
    { name: 'trainer', ids: ['CL_alpha', 'CL_q', 'Cm_q', 'Cl_p', 'CL_d_elev', 'Cm_d_elev', 'Cl_d_ail'] },
    { name: 'navion', ids: ['CL_alpha', 'CL_q', 'Cm_q', 'Cl_p', 'CL_d_elev', 'Cm_d_elev', 'Cl_d_ail', 'Cn_beta'] },
    {
      name: 'tailless',
      ids: ['CL_alpha', 'CL_q', 'Cm_q', 'Cl_p', 'CL_d_elv_pitch', 'Cm_d_elv_pitch', 'Cl_d_elv_roll'],
    },
    { name: 'canard', ids: ['CL_alpha', 'CL_q', 'Cm_q', 'Cl_p', 'Cm_d_elev', 'Cl_d_ail'] },
  ])('$name', ({ name, ids }) => {
    const got = named(solved(name, DEFAULT_MESH));
    const expected = CONFIGURATIONS[name]?.expected ?? {};
    for (const id of ids) within(got[id], expected[id] ?? 0, share(id), id);
    const chord = CONFIGURATIONS[name]?.geometry.ref.c ?? 1;
    expect(Math.abs((got.xnp ?? Number.NaN) - (expected.xnp ?? 0)) / chord).toBeLessThan(0.005);
  });
});

describe('a strip begins where a fin stands', () => {
  // The canard's fins stand at half of the wing's half-span. A wing lattice whose edges pass beside that station lets the leg from
  // the fin's root run close to control points, and the answer swings with the number of strips.
  const rudderless = (strips: number, align: boolean) =>
    named(solved('canard', (name) => ({ strips: name === 'wing' ? strips : 8, rows: 4 }), align)).Cn_beta ?? Number.NaN;
  const spread = (align: boolean) => {
    const values = [10, 11, 12, 13].map((strips) => rudderless(strips, align));
    return (Math.max(...values) - Math.min(...values)) / Math.max(...values);
  };
  it('so directional stability does not swing with the number of strips', () => {
    expect(spread(true)).toBeLessThan(0.03);
    expect(spread(false)).toBeGreaterThan(0.1);
  });
});

describe('A7 as a document, through the whole chain', () => {
  const outerMm = 300 / Math.cos(radFromDeg(5));
  const trainer = airframe({
    surfaces: [
      surface({
        panels: [
          panel({ id: 'p1', lengthMm: 300, rootChordMm: 200, tipChordMm: 200 }),
          panel({ id: 'p2', lengthMm: outerMm, rootChordMm: 200, tipChordMm: 200, dihedralDeg: 5 }),
        ],
        controls: [control({ from: 300 / (300 + outerMm), to: 1, chordShare: [0.25, 0.25] })],
      }),
      surface({
        id: 'tail',
        role: 'tailplane',
        mount: { to: 'datum', at: [620, 0, 20] },
        panels: [panel({ lengthMm: 220, rootChordMm: 130, tipChordMm: 130 })],
      }),
    ],
  });

  it('gives the same neutral point and lift slope as the bare planform', () => {
    const { values } = analyse(trainer, { depth: 'full' });
    expect(Math.abs((values.neutralPointXMm?.value ?? Number.NaN) - 108.4) / 200).toBeLessThan(0.005);
    within(values.liftSlopePerRad?.value ?? undefined, 4.718, 0.02, 'lift slope');
  });

  it('rolls at the rate that its two coefficients give: 0.330 and -0.444 at 12 m/s, 15 degrees up and down', () => {
    const { values } = analyse(trainer, { depth: 'full' });
    within(values.rollHelix?.value ?? undefined, (0.33 * radFromDeg(15)) / 0.444, 0.05, 'pb / 2V');
  });
});
