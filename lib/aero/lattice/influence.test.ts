import { expect, it } from 'vitest';
import { add3, cross3, dot3, length3, mirror3, scale3, sub3, type Vec3 } from '@/lib/numerics/vec';
import { assemble } from './influence';
import { layLattice } from './lay';
import type { Lattice } from './types';

// The matrix against Biot and Savart's law integrated numerically along each horseshoe, image and all.

/** Velocity at p by a straight vortex of unit strength from a to b: the integral of dl x r / (4 pi r^3), by Simpson's rule. */
function bySum(p: Vec3, a: Vec3, b: Vec3): Vec3 {
  const pieces = 2000;
  const dl = scale3(sub3(b, a), 1 / pieces);
  let sum: Vec3 = [0, 0, 0];
  for (let i = 0; i <= pieces; i++) {
    const weight = i === 0 || i === pieces ? 1 : i % 2 === 1 ? 4 : 2;
    const r = sub3(p, add3(a, scale3(dl, i)));
    sum = add3(sum, scale3(cross3(dl, r), weight / (3 * length3(r) ** 3)));
  }
  return scale3(sum, 1 / (4 * Math.PI));
}

/** A leg as long as this, in chords, is long enough: what is beyond gives less than 1e-6. */
const FAR = 400;

function horseshoe(p: Vec3, a: Vec3, b: Vec3): Vec3 {
  const back = (c: Vec3): Vec3 => [c[0] + FAR, c[1], c[2]];
  // Long legs in growing pieces, so that the sum is fine near the point.
  const leg = (c: Vec3): Vec3 => {
    let sum: Vec3 = [0, 0, 0];
    let from = c;
    for (let reach = 0.5; from[0] < back(c)[0]; reach *= 2) {
      const to: Vec3 = [Math.min(from[0] + reach, back(c)[0]), c[1], c[2]];
      sum = add3(sum, bySum(p, from, to));
      from = to;
    }
    return sum;
  };
  return add3(bySum(p, a, b), sub3(leg(b), leg(a)));
}

const corner = (l: Lattice, edge: number, at: number): Vec3 => [
  l.cornerX[at] ?? 0,
  l.edgeY[edge] ?? 0,
  l.edgeZ[edge] ?? 0,
];
const triple = (of: Float64Array, i: number): Vec3 => [of[i * 3] ?? 0, of[i * 3 + 1] ?? 0, of[i * 3 + 2] ?? 0];

it('each entry is the velocity along the normal by a horseshoe and its image', () => {
  const laid = layLattice({
    surfaces: [
      {
        id: 'wing',
        mirrored: true,
        strips: 2,
        rows: 2,
        sections: [
          { le: [0, 0, 0], chord: 1, incidenceRad: 0.05 },
          { le: [0.4, 1.7, 0.3], chord: 0.6, incidenceRad: 0 },
        ],
      },
      {
        id: 'fin',
        mirrored: false,
        strips: 1,
        rows: 1,
        sections: [
          { le: [2, 0, 0.4], chord: 0.5, incidenceRad: 0 },
          { le: [2.2, 0, 1.1], chord: 0.4, incidenceRad: 0 },
        ],
      },
    ],
    controls: [],
    // Bare vortices, as the law has them.
    options: { coreShare: 0 },
  });
  if (!laid.ok) throw new RangeError('refused');
  const lattice = laid.value;
  const { symmetric, antisymmetric } = assemble(lattice, true);
  const n = lattice.count;
  const m = lattice.mirroredCount;
  expect([n, m]).toEqual([5, 4]);
  for (const s of lattice.surfaces)
    for (let k = 0; k < s.strips.length; k++)
      for (let r = 0; r < s.rows; r++) {
        const j = s.firstPanel + k * s.rows + r;
        const a = corner(lattice, s.firstEdge + k, s.firstCorner + k * s.rows + r);
        const b = corner(lattice, s.firstEdge + k + 1, s.firstCorner + (k + 1) * s.rows + r);
        for (let i = 0; i < n; i++) {
          const normal = triple(lattice.normals, i);
          const point = triple(lattice.points, i);
          const own = dot3(normal, horseshoe(point, a, b));
          // The image in a symmetric flow turns the other way, from b' to a'.
          const image = j < m ? dot3(normal, horseshoe(point, mirror3(b), mirror3(a))) : 0;
          expect(antisymmetric?.[i * n + j]).toBeCloseTo(own - image, 5);
          if (i < m && j < m) expect(symmetric[i * m + j]).toBeCloseTo(own + image, 5);
        }
      }
});
