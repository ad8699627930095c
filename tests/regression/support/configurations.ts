import { z } from 'zod';
import { type Derivatives, derivatives } from '@/lib/aero/lattice/derivatives';
import type { LatticeControl, LatticeInput, LatticeOptions, LatticeSurface } from '@/lib/aero/lattice/types';
import { radFromDeg } from '@/lib/numerics/vec';
import data from '../data/lattice-configurations.json';

// Four configurations worked by another vortex-lattice program written for such checks only. Agreement shows that two programs solve
// the same equations alike; it is not evidence about flight.

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

export const NAMES = ['trainer', 'tailless', 'canard', 'navion'] as const;
export type Name = (typeof NAMES)[number];

export function configuration(name: Name): Configuration {
  const found = CONFIGURATIONS[name];
  if (!found) throw new RangeError(`no configuration ${name}`);
  return found;
}

/** Strips and rows of a surface of an aircraft. */
export type Mesh = (surface: string, aircraft: Name) => { strips: number; rows: number };

/** What the product gives each surface: more rows to a wing that has no tail. */
export const DEFAULT_MESH: Mesh = (surface, aircraft) => {
  if (surface === 'wing') return { strips: 10, rows: aircraft === 'tailless' ? 6 : 5 };
  return surface.startsWith('fin') ? { strips: 5, rows: 4 } : { strips: 6, rows: 4 };
};

export const everySurface =
  (strips: number, rows: number): Mesh =>
  () => ({ strips, rows });

/** A configuration as the lattice wants it. */
export function inputOf(name: Name, mesh: Mesh = DEFAULT_MESH, options: Partial<LatticeOptions> = {}): LatticeInput {
  const { geometry } = configuration(name);
  const surfaces: LatticeSurface[] = [];
  const controls: LatticeControl[] = [];
  for (const { name: id, sections, mirror, hinge, controls: listed } of geometry.surfaces) {
    surfaces.push({
      id,
      mirrored: mirror,
      ...mesh(id, name),
      sections: sections.map((s) => ({ le: [s.x, s.y, s.z], chord: s.chord, incidenceRad: radFromDeg(s.inc_deg) })),
    });
    const lengths = [0];
    for (const [i, s] of sections.entries()) {
      const before = sections[i - 1];
      if (before) lengths.push((lengths.at(-1) ?? 0) + Math.hypot(s.y - before.y, s.z - before.z));
    }
    const station = (index: number) => (lengths[index] ?? 0) / (lengths.at(-1) ?? 1);
    for (const { name: control, panel } of listed)
      controls.push({
        id: control,
        surfaceId: id,
        from: station(panel[0]),
        to: station(panel[1]),
        chordShare: [1 - hinge, 1 - hinge],
      });
  }
  const { S, c, b, xref, zref } = geometry.ref;
  return { surfaces, controls, reference: { area: S, chord: c, span: b, point: [xref, 0, zref] }, options };
}

export function solved(input: LatticeInput): Derivatives {
  const result = derivatives(input, 'both');
  if (!result.ok) throw new RangeError(result.problems.map((p) => p.message).join('; '));
  return result.value;
}

/** By the names of the data file. Ailerons there are positive right wing down: starboard trailing edge up. */
export function named({ symmetric, antisymmetric }: Derivatives): Record<string, number> {
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

/** A configuration's coefficients by name. */
export const coefficients = (name: Name, mesh?: Mesh, options?: Partial<LatticeOptions>): Record<string, number> =>
  named(solved(inputOf(name, mesh, options)));
