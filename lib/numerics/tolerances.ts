// Every tolerance of the calculations in one place, each with its physical reason.

/** Two points closer than this, in mm, are one corner: a tenth of what a blade can follow. */
export const SAME_POINT_MM = 0.01;

/** A pivot smaller than this share of the largest entry means that two equations say the same. Lattice matrices have a
 * condition number of 20 to 40, so a genuine one never comes near. */
export const SINGULAR_PIVOT_SHARE = 1e-10;

/** A surface whose every point lies closer to the centre plane than this share of its own length stands on it. */
export const CENTRE_PLANE_SHARE = 1e-6;

/** Lift slopes below this, per radian, are no lift: the moment axis of nothing would lie anywhere. */
export const LEAST_LIFT_SLOPE = 1e-6;

/** A section this close to the straight line between its neighbours, as a share of the length (or in radians), bends nothing. */
export const STRAIGHT_SHARE = 1e-9;

/** An element whose reference point is nearer to the centre plane than this, in mm, stands on it. */
export const CENTRE_PLANE_MM = 0.5;
