// Exact factors between the document's units and the others that people read.
// Source: NIST Special Publication 811 (2008), Thompson & Taylor, appendix B.8; each is exact by definition.

export const MM_PER_IN = 25.4;
export const MM_PER_FT = 304.8;
export const G_PER_OZ = 28.349523125;
export const G_PER_LB = 453.59237;
export const DM2_PER_FT2 = 9.290304;
export const DM2_PER_IN2 = 0.064516;
export const N_PER_LBF = 4.4482216152605;
/** Standard acceleration of free fall, m/s2. */
export const STANDARD_GRAVITY = 9.80665;
export const N_PER_KGF = 9.80665;
export const MS_PER_KMH = 1 / 3.6;
export const MS_PER_MPH = 0.44704;
/** One international knot is 1852 m in an hour. */
export const MS_PER_KT = 1852 / 3600;
/** g/dm2 in one oz/ft2. */
export const GDM2_PER_OZFT2 = G_PER_OZ / DM2_PER_FT2;
/** kg/m3 in one oz/ft3: cubic loading. */
export const KGM3_PER_OZFT3 = G_PER_OZ / 1000 / (MM_PER_FT / 1000) ** 3;
