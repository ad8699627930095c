import type { ResolvedAirframe } from '@/lib/airframe/resolved';
import type { Airframe } from '@/lib/airframe/schema/airframe';
import type { Body } from '@/lib/airframe/schema/fuselage';
import type { Vec3 } from '@/lib/numerics/vec';
import type { LatticeSection } from './lattice/types';

// A body lifts nothing to speak of, but it turns nose into the wind's way: slender-body theory, a couple that depends on its width and on
// how the wing bends the stream along it. M. M. Munk, NACA TR 184 (1924); H. Multhopp, NACA TM 1036 (1942): inside the root chord the
// stream follows the wing, ahead of it it is bent up, behind it down.

/** Air moved along by a rectangle that moves sideways, over that of the circle on its width: width over depth, factor. From memory, after
 * T. Sarpkaya & M. Isaacson, "Mechanics of Wave Forces on Offshore Structures", table of added masses. */
const RECTANGLE = [
  [0.1, 2.23],
  [0.2, 1.98],
  [0.5, 1.7],
  [1, 1.51],
  [2, 1.36],
  [5, 1.21],
  [10, 1.14],
] as const;

/** Slices that a body is cut into. */
const SLICES = 24;

/** Added-mass factor of a rectangle; straight in the logarithm of its shape between known ones, a plate's beyond the last. */
export function rectangleFactor(width: number, depth: number): number {
  if (!(width > 0)) return 0;
  const shape = depth > 0 ? width / depth : Number.POSITIVE_INFINITY;
  const above = RECTANGLE.findIndex(([at]) => shape <= at);
  const [first] = RECTANGLE;
  if (above === 0) return first[1];
  const b = RECTANGLE[above];
  const a = RECTANGLE[above - 1];
  // Thinner than one to ten: it falls to the flat plate's 1.
  if (!a || !b) return 1 + (1.14 - 1) * (10 / shape);
  const t = Math.log(shape / a[0]) / Math.log(b[0] / a[0]);
  return a[1] + (b[1] - a[1]) * t;
}

/** Couples per unit of dynamic pressure and radian, mm3: nose up in angle of attack, nose left in sideslip. */
export interface BodyCouples {
  readonly pitchMm3: number;
  readonly yawMm3: number;
}

/**
 * Couples of all bodies: 2 pi k (w / 2)^2 summed along the body, times the local angle of the stream over the angle of attack.
 * @param wings sections of each, root first
 * @param upwash what the wing adds to one radian of angle of attack at a place, in radians
 */
export function bodyCouples(
  airframe: Airframe,
  { places }: ResolvedAirframe,
  wings: readonly (readonly LatticeSection[])[],
  upwash: (at: Vec3) => number,
): BodyCouples {
  let [pitchMm3, yawMm3] = [0, 0];
  for (const body of airframe.bodies) {
    const at = places.get(body.id)?.at;
    if (!at) throw new RangeError(`body ${body.id} has no place`);
    for (const slice of slices(body, at)) {
      const { x, y, z, lengthMm, widthMm, heightMm } = slice;
      const couple = (across: number, along: number) =>
        2 * Math.PI * rectangleFactor(across, along) * (across / 2) ** 2 * lengthMm;
      yawMm3 += couple(heightMm, widthMm);
      if (!wings.some((wing) => covers(wing, x))) pitchMm3 += couple(widthMm, heightMm) * (1 + upwash([x, y, z]));
    }
  }
  return { pitchMm3, yawMm3 };
}

/** True where the wing's root chord runs along the body. */
function covers([root]: readonly LatticeSection[], x: number): boolean {
  return root !== undefined && x >= root.le[0] && x <= root.le[0] + root.chord;
}

type Station = Body['stations'][number];

interface Slice {
  readonly x: number;
  readonly y: number;
  readonly z: number;
  readonly lengthMm: number;
  readonly widthMm: number;
  readonly heightMm: number;
}

/** Even slices of a body, each as its middle finds it; sizes run straight between stations. */
function slices({ stations }: Body, [x0, y0, z0]: Vec3): Slice[] {
  const sorted = [...stations].sort((a, b) => a.xMm - b.xMm);
  const from = sorted[0]?.xMm ?? 0;
  const lengthMm = ((sorted.at(-1)?.xMm ?? 0) - from) / SLICES;
  if (!(lengthMm > 0)) return [];
  return Array.from({ length: SLICES }, (_, i): Slice => {
    const x = from + (i + 0.5) * lengthMm;
    const next = sorted.findIndex(({ xMm }) => xMm >= x);
    const b = sorted[next];
    const a = sorted[next - 1] ?? b;
    if (!a || !b) throw new RangeError('a slice lies between stations');
    const t = b.xMm > a.xMm ? (x - a.xMm) / (b.xMm - a.xMm) : 0;
    const run = (pick: (s: Station) => number) => pick(a) + (pick(b) - pick(a)) * t;
    const [top, bottom] = [run((s) => s.topMm), run((s) => s.bottomMm)];
    return {
      x: x0 + x,
      y: y0,
      z: z0 + (top + bottom) / 2,
      lengthMm,
      widthMm: run((s) => s.widthMm),
      heightMm: Math.max(0, top - bottom),
    };
  });
}
