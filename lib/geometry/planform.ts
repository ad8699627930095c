// Reference geometry of a planform given by its sections. Lengths in mm (or any one unit), x aft, y outboard; reads nothing
// but its arguments. Area and mean aerodynamic chord are of the projection on the plane z = 0: dihedral counts by the
// projected y alone.
// Source: mean aerodynamic chord as the integral of c^2 over the area: D. P. Raymer, "Aircraft Design: A Conceptual
// Approach", ch. 7; B. Etkin and L. D. Reid, "Dynamics of Flight", app. C.

/** A chordwise cut: leading edge at (x, y), chord along x. Two cuts at the same y make a step. */
export interface PlanformStation {
  readonly x: number;
  readonly y: number;
  readonly chord: number;
}

/** Reference figures of one side. `areaHalf` is that side's alone. */
export interface HalfPlanform {
  readonly areaHalf: number;
  /** Integral of the squared chord over y, for putting several pieces together. */
  readonly chordSquared: number;
  /** First moments of the strips, weighted by chord: of y and of the leading edge's x. */
  readonly momentY: number;
  readonly momentXLe: number;
  /** y of the outermost station. */
  readonly reach: number;
}

export interface Planform {
  /** Both sides. */
  readonly area: number;
  readonly span: number;
  readonly aspectRatio: number;
  readonly averageChord: number;
  readonly mac: number;
  readonly yMac: number;
  readonly xLeMac: number;
  /** Aerodynamic centre by the quarter-chord rule: x of the quarter chord of the mean aerodynamic chord. */
  readonly xQuarterMac: number;
}

function assertStations(stations: readonly PlanformStation[]): void {
  if (stations.length < 2) throw new RangeError(`a planform needs 2 stations, got ${stations.length}`);
  for (const [index, { x, y, chord }] of stations.entries()) {
    if (![x, y, chord].every(Number.isFinite))
      throw new RangeError(`station ${index} is not finite: ${x}, ${y}, ${chord}`);
    if (chord < 0) throw new RangeError(`station ${index} has a negative chord: ${chord}`);
    const before = stations[index - 1];
    if (before && y < before.y)
      throw new RangeError(`station ${index} at y ${y} lies inside the one before it (${before.y})`);
  }
}

/** Integrals over one side whose edges are straight between stations. Throws RangeError for stations that are not in order of y. */
export function halfPlanform(stations: readonly PlanformStation[]): HalfPlanform {
  assertStations(stations);
  let areaHalf = 0;
  let chordSquared = 0;
  let momentY = 0;
  let momentXLe = 0;
  for (const [index, b] of stations.entries()) {
    const a = stations[index - 1];
    if (!a) continue;
    const dy = b.y - a.y;
    // Products of two linear functions over a strip: exact by (2 f0 g0 + f0 g1 + f1 g0 + 2 f1 g1) / 6.
    const product = (f0: number, f1: number) =>
      (dy / 6) * (2 * f0 * a.chord + f0 * b.chord + f1 * a.chord + 2 * f1 * b.chord);
    areaHalf += (dy * (a.chord + b.chord)) / 2;
    chordSquared += product(a.chord, b.chord);
    momentY += product(a.y, b.y);
    momentXLe += product(a.x, b.x);
  }
  return { areaHalf, chordSquared, momentY, momentXLe, reach: stations.at(-1)?.y ?? 0 };
}

/** Reference figures of a planform that is the same on both sides. Throws RangeError when it encloses no area. */
export function planform(stations: readonly PlanformStation[]): Planform {
  const { areaHalf, chordSquared, momentY, momentXLe, reach } = halfPlanform(stations);
  if (!(areaHalf > 0)) throw new RangeError(`a planform must enclose area, got ${areaHalf}`);
  const area = 2 * areaHalf;
  const span = 2 * reach;
  const mac = chordSquared / areaHalf;
  const xLeMac = momentXLe / areaHalf;
  return {
    area,
    span,
    aspectRatio: span ** 2 / area,
    averageChord: area / span,
    mac,
    yMac: momentY / areaHalf,
    xLeMac,
    xQuarterMac: xLeMac + mac / 4,
  };
}

/** The station on straight edges at y. Throws RangeError outside the planform. */
export function stationAt(stations: readonly PlanformStation[], y: number): PlanformStation {
  assertStations(stations);
  const index = stations.findIndex((station) => station.y >= y);
  const b = stations[index];
  const a = stations[index - 1] ?? b;
  if (!a || !b || y < a.y) throw new RangeError(`y ${y} lies outside the planform`);
  const t = b.y === a.y ? 0 : (y - a.y) / (b.y - a.y);
  return { x: a.x + (b.x - a.x) * t, y, chord: a.chord + (b.chord - a.chord) * t };
}

/** Sweep of the line at a share of the chord between two stations, degrees, positive aft. */
export function sweepBetweenDeg(a: PlanformStation, b: PlanformStation, chordShare: number): number {
  const dx = b.x + b.chord * chordShare - a.x - a.chord * chordShare;
  return (Math.atan2(dx, b.y - a.y) * 180) / Math.PI;
}
