// What every figure of the lattice says of its method.

export const LATTICE = 'Vortex lattice over all surfaces, both halves; legs along the x axis, quarter-strip tip inset.';
export const LATTICE_SOURCE =
  'Katz & Plotkin, Low-Speed Aerodynamics, ch. 12; tip inset: Hough, Journal of Aircraft 10 (1973); controls: Glauert, ARC R&M 1095 (1927).';
export const LATTICE_LIMITS = 'No body, no propeller stream, no stall, no compressibility, no thickness; rigid foam.';
