import { convexHull } from '@/lib/geometry/hull';
import type { Vec2, Vec3 } from '@/lib/numerics/vec';

export type View = 'plan' | 'side' | 'front';
export type OutlineKind = 'surface' | 'control' | 'body' | 'boom' | 'drive' | 'item' | 'gear';
export type OutlineSide = 'stbd' | 'port' | 'centre';

/** One line of a view, aircraft mm in the view's axes: plan [x aft, y starboard], side [x aft, z up], front [y starboard, z up]. */
export interface ViewOutline {
  /** The element in the document; a control carries its surface's id. */
  readonly elementId: string;
  /** Element id, or "wing/aileron" for a control. */
  readonly key: string;
  readonly kind: OutlineKind;
  readonly side: OutlineSide;
  readonly closed: boolean;
  readonly points: readonly Vec2[];
}

const AXES: Readonly<Record<View, readonly [0 | 1 | 2, 0 | 1 | 2]>> = { plan: [0, 1], side: [0, 2], front: [1, 2] };

/** A point of the aircraft in a view's axes. */
export function project(view: View, point: Vec3): Vec2 {
  const [across, up] = AXES[view];
  return [point[across], point[up]];
}

/** A line drawn on the centre, or on the starboard side and again mirrored to port. */
export function onSides(
  base: Omit<ViewOutline, 'side' | 'points'>,
  mirrored: boolean,
  view: View,
  points: readonly Vec3[],
  silhouette = false,
): ViewOutline[] {
  const flat = points.map((point) => project(view, point));
  return flatOnSides(base, mirrored, view, silhouette ? convexHull(flat) : flat);
}

/** As `onSides`, for a line that is in the view's axes already. From the side both halves lie on each other. */
export function flatOnSides(
  base: Omit<ViewOutline, 'side' | 'points'>,
  mirrored: boolean,
  view: View,
  points: readonly Vec2[],
): ViewOutline[] {
  if (!mirrored) return [{ ...base, side: 'centre', points }];
  const across = AXES[view].map((axis) => (axis === 1 ? -1 : 1));
  const port = points.map(([x, y]): Vec2 => [x * (across[0] ?? 1), y * (across[1] ?? 1)]);
  return [
    { ...base, side: 'stbd', points },
    { ...base, side: 'port', points: port },
  ];
}

/** The eight corners of a box about its centre, edges along the given half-vectors. */
export function boxCorners(centre: Vec3, halves: readonly [Vec3, Vec3, Vec3]): Vec3[] {
  const signs = [-1, 1];
  const [a, b, c] = halves;
  return signs.flatMap((i) =>
    signs.flatMap((j) =>
      signs.map(
        (k): Vec3 => [
          centre[0] + i * a[0] + j * b[0] + k * c[0],
          centre[1] + i * a[1] + j * b[1] + k * c[1],
          centre[2] + i * a[2] + j * b[2] + k * c[2],
        ],
      ),
    ),
  );
}
