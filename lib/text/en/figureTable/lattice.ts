// What figures of several groups say of their method.

export const LATTICE = 'Vortex lattice over all surfaces, both halves; legs along the x axis, quarter-strip tip inset.';
export const LATTICE_SOURCE =
  'Katz & Plotkin, Low-Speed Aerodynamics, ch. 12; tip inset: Hough, Journal of Aircraft 10 (1973); controls: Glauert, ARC R&M 1095 (1927).';
export const LATTICE_LIMITS =
  'Bodies by slender-body theory, propellers by the force across their disc; no propeller stream, no stall, no compressibility, no thickness; rigid foam.';

/** Places along x are measured from a point that nobody can touch. */
export const FOR_DRAWING =
  'Measured from the construction origin, the leading edge on the centre line: for drawing, not for measuring on the aircraft.';
