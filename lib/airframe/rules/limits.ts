// Bounds of what can be built from sheet at all. A document past them is refused; taste and safety belong to the before-you-cut check.

/** Length of a surface from root to tip over the thickness of its sheet, at most. Common practice, no source: 5 mm board
 * carries 1.25 m a side on a spar; past 250 times its thickness a panel flutters and droops whatever is let into it. */
export const MAX_SLENDERNESS = 250;

/** Shortest control between its end gaps that can be cut, hinged and given a horn, mm. Common practice, no source. */
export const MIN_CONTROL_MM = 12;

/** How far a hinge line may leave a straight line at a joint between panels, mm: what a taped hinge takes up. Common practice, no source. */
export const HINGE_STRAIGHT_MM = 0.5;

/** Angle between two panels below which they are one plane for a hinge, degrees. Common practice, no source. */
export const HINGE_BEND_DEG = 0.5;

/** A thing this close to the centre plane counts as in it, mm. */
export const CENTRE_PLANE_MM = 0.5;
