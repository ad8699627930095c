import { secondMoments } from '@/lib/geometry/polygons';
import { add3, cross3, scale3, sub3, type Vec2, type Vec3 } from '@/lib/numerics/vec';

// How a mass is spread about its own centre: integrals of x^2, y^2, z^2, xy, xz, yz over the mass, in g mm2.
// Spreads add; the inertia tensor is read off at the end.

export interface Spread {
  readonly xx: number;
  readonly yy: number;
  readonly zz: number;
  readonly xy: number;
  readonly xz: number;
  readonly yz: number;
}

export const POINT: Spread = { xx: 0, yy: 0, zz: 0, xy: 0, xz: 0, yz: 0 };

const addSpread = (a: Spread, b: Spread): Spread => ({
  xx: a.xx + b.xx,
  yy: a.yy + b.yy,
  zz: a.zz + b.zz,
  xy: a.xy + b.xy,
  xz: a.xz + b.xz,
  yz: a.yz + b.yz,
});

/** Spread of `weight` along a direction: weight times the direction's products with itself. */
const outer = (weight: number, [x, y, z]: Vec3): Spread => ({
  xx: weight * x * x,
  yy: weight * y * y,
  zz: weight * z * z,
  xy: weight * x * y,
  xz: weight * x * z,
  yz: weight * y * z,
});

interface Mass {
  readonly massG: number;
  readonly at: Vec3;
  /** About its own centre; without one it is a point. */
  readonly spread?: Spread;
}

/** Many masses as one: their sum, their common centre, and their spread about it (parallel axes). Not a number without mass. */
export function gathered(masses: readonly Mass[]): Required<Mass> {
  let massG = 0;
  let mx = 0;
  let my = 0;
  let mz = 0;
  for (const { massG: own, at } of masses) {
    massG += own;
    mx += at[0] * own;
    my += at[1] * own;
    mz += at[2] * own;
  }
  const each = 1 / massG;
  const at: Vec3 = [mx * each, my * each, mz * each];
  // Summed in place: a list has hundreds of masses, and a dragged handle asks for it every time it moves.
  const sum = { xx: 0, yy: 0, zz: 0, xy: 0, xz: 0, yz: 0 };
  for (const { massG: own, at: place, spread = POINT } of masses) {
    const x = place[0] - at[0];
    const y = place[1] - at[1];
    const z = place[2] - at[2];
    sum.xx += spread.xx + own * x * x;
    sum.yy += spread.yy + own * y * y;
    sum.zz += spread.zz + own * z * z;
    sum.xy += spread.xy + own * x * y;
    sum.xz += spread.xz + own * x * z;
    sum.yz += spread.yz + own * y * z;
  }
  return { massG, at, spread: sum };
}

/** A thin rod between two points about its middle: m L^2 / 12 along it. */
export const rodSpread = (massG: number, from: Vec3, to: Vec3): Spread => outer(massG / 12, sub3(to, from));

/** A box with edges along the axes about its centre: m a^2 / 12 along each edge. */
export const boxSpread = (massG: number, [l, w, h]: Vec3): Spread => ({
  ...POINT,
  xx: (massG * l * l) / 12,
  yy: (massG * w * w) / 12,
  zz: (massG * h * h) / 12,
});

/** A solid round bar about its centre: m r^2 / 4 across, m L^2 / 12 along its axis (a unit vector). A disc is a bar without length. */
export function barSpread(massG: number, axis: Vec3, lengthMm: number, radiusMm: number): Spread {
  const across = (massG * radiusMm ** 2) / 4;
  const even: Spread = { ...POINT, xx: across, yy: across, zz: across };
  return addSpread(even, outer((massG * lengthMm ** 2) / 12 - across, axis));
}

export interface Plate {
  readonly areaMm2: number;
  readonly at: Vec3;
  /** Of one gram of the plate. */
  readonly spread: Spread;
}

/** A flat plate of even thickness with holes, put in space by a frame on its mid-plane. Throws RangeError when the outline encloses no area. */
export function plate(
  outline: readonly Vec2[],
  holes: readonly (readonly Vec2[])[],
  thicknessMm: number,
  frame: { readonly origin: Vec3; readonly ex: Vec3; readonly ey: Vec3 },
): Plate {
  const whole = secondMoments(outline);
  const pieces = [{ sign: 1, ...whole }, ...holes.map((hole) => ({ sign: -1, ...secondMoments(hole) }))];
  const areaMm2 = pieces.reduce((sum, { sign, area }) => sum + sign * area, 0);
  if (!(areaMm2 > 0)) throw new RangeError(`a plate must have area left around its holes, got ${areaMm2}`);
  const mean = (axis: 0 | 1) => pieces.reduce((sum, p) => sum + p.sign * p.area * p.centroid[axis], 0) / areaMm2;
  const [cx, cy] = [mean(0), mean(1)];
  const about = (pick: (p: (typeof pieces)[number], dx: number, dy: number) => number) =>
    pieces.reduce((sum, p) => sum + p.sign * pick(p, p.centroid[0] - cx, p.centroid[1] - cy), 0) / areaMm2;
  const xx = about((p, dx) => p.iyy + p.area * dx * dx);
  const yy = about((p, _, dy) => p.ixx + p.area * dy * dy);
  const xy = about((p, dx, dy) => p.ixy + p.area * dx * dy);
  const { origin, ex, ey } = frame;
  const sum = outer(xy, add3(ex, ey));
  const cross = addSpread(sum, addSpread(outer(-xy, ex), outer(-xy, ey)));
  const through = outer(thicknessMm ** 2 / 12, cross3(ex, ey));
  return {
    areaMm2,
    at: add3(origin, add3(scale3(ex, cx), scale3(ey, cy))),
    spread: [outer(xx, ex), outer(yy, ey), cross, through].reduce(addSpread),
  };
}

/** The same spread for another mass. */
export const scaleSpread = (spread: Spread, k: number): Spread => ({
  xx: spread.xx * k,
  yy: spread.yy * k,
  zz: spread.zz * k,
  xy: spread.xy * k,
  xz: spread.xz * k,
  yz: spread.yz * k,
});

/** The spread on the other side of the centre plane. */
export const mirrorSpread = (spread: Spread): Spread => ({ ...spread, xy: -spread.xy, yz: -spread.yz });
