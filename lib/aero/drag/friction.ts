// Skin friction of one side of a plate, over its wetted area. H. Schlichting, "Boundary-Layer Theory", ch. 7 and 21.

const refuse = (reynolds: number): void => {
  if (!(reynolds > 0 && Number.isFinite(reynolds)))
    throw new RangeError(`Reynolds number must be positive, got ${reynolds}`);
};

/** Laminar from end to end: Blasius, 1.328 / sqrt(Re). */
export function laminarFriction(reynolds: number): number {
  refuse(reynolds);
  return 1.328 / Math.sqrt(reynolds);
}

/** Below this Reynolds number a boundary layer cannot stay turbulent, whatever trips it (Schlichting, ch. 16: 5 x 10^4 to 10^5 with roughness). */
const LEAST_TURBULENT = 3e4;

/**
 * Turbulent from the leading edge: Prandtl and Schlichting, 0.455 / (log10 Re)^2.58. Under a Reynolds number of 30 000, where no layer
 * stays turbulent, it is the laminar one's if that is more.
 */
export function turbulentFriction(reynolds: number): number {
  refuse(reynolds);
  if (reynolds < LEAST_TURBULENT) return Math.max(laminarFriction(reynolds), turbulentFriction(LEAST_TURBULENT));
  return 0.455 / Math.log10(reynolds) ** 2.58;
}

/** A smooth plate's layer turns turbulent by itself here at the latest (Schlichting, ch. 16). */
const NATURAL_TRANSITION = 5e5;

/**
 * Turbulent aft of a share of the chord, laminar ahead of it: Prandtl's rule takes the turbulent friction of the front part off and puts
 * its laminar one there.
 * @param transition 0 for a layer tripped at the edge, 1 for one that is never tripped
 */
export function plateFriction(reynolds: number, transition: number): number {
  const share = Math.min(transition, NATURAL_TRANSITION / reynolds);
  if (!(share > 0)) return turbulentFriction(reynolds);
  if (share >= 1) return laminarFriction(reynolds);
  const front = reynolds * share;
  return turbulentFriction(reynolds) - share * (turbulentFriction(front) - laminarFriction(front));
}
