import { factor, solve } from '@/lib/numerics/lu';
import { CENTRE_PLANE_SHARE } from '@/lib/numerics/tolerances';

// The lifting line of a straight wing, as a check on the lattice that shares nothing with it but the planform. Circulation as a series
// of sines, 2 b V sum(A_n sin n t) at y = (b / 2) cos t; odd terms carry lift, even ones roll.
// H. Glauert, "The Elements of Aerofoil and Airscrew Theory", ch. XI; roll: H. A. Pearson & R. T. Jones, NACA TR 635 (1938).

/** A chordwise cut of the starboard half, any one unit of length. Two at the same y make a step. */
export interface LiftingLineStation {
  readonly y: number;
  readonly chord: number;
  /** Leading edge up is positive. */
  readonly incidenceRad: number;
}

/** Coefficients by the wing's own area and span; per radian, roll rate per p b / 2V. */
export interface LiftingLine {
  readonly liftSlope: number;
  /** Lift coefficient at no angle of attack, by the incidences. */
  readonly baseLift: number;
  /** Glauert's tau: 1 / slope = 1 / a0 + (1 + tau) / (pi A). */
  readonly tau: number;
  /** Glauert's delta: CDi = (1 + delta) CL^2 / (pi A) for the load of angle of attack alone. */
  readonly delta: number;
  /** Cl_p: negative, for it damps. */
  readonly rollDamping: number;
  readonly inducedDrag: (alphaRad: number) => number;
}

/** Terms of either kind; 200 of them change the slope and delta by less than 1e-4 (own tests). */
const TERMS = 60;

/**
 * Solves a wing without sweep or dihedral, its stations root to tip and the first on the centre line; what sweep it has is ignored.
 * Null for a wing that begins off the centre line, runs inwards, or has no span or area.
 * @param sectionSlope a0, lift slope of the section per radian
 */
export function liftingLine(
  stations: readonly LiftingLineStation[],
  sectionSlope = 2 * Math.PI,
  terms = TERMS,
): LiftingLine | null {
  const half = stations.at(-1)?.y ?? 0;
  const area = 2 * halfArea(stations);
  const ordered = stations.every(({ y }, i) => y >= (stations[i - 1]?.y ?? y));
  const onCentre = Math.abs(stations[0]?.y ?? half) <= half * CENTRE_PLANE_SHARE;
  if (!(half > 0 && area > 0 && ordered && onCentre)) return null;
  const piA = (Math.PI * 4 * half * half) / area;
  const wing = { stations, half, sectionSlope, terms };
  const [lifting, twisted] = series(wing, 'lift');
  const [rolling] = series(wing, 'roll');
  const slope = piA * (lifting?.[0] ?? 0);
  const drag = (at: (k: number) => number) => {
    let sum = 0;
    for (let k = 0; k < terms; k++) sum += (2 * k + 1) * at(k) ** 2;
    return piA * sum;
  };
  return {
    liftSlope: slope,
    baseLift: piA * (twisted?.[0] ?? 0),
    tau: piA * (1 / slope - 1 / sectionSlope) - 1,
    delta: (piA * drag((k) => lifting?.[k] ?? 0)) / slope ** 2 - 1,
    rollDamping: (-piA / 4) * (rolling?.[0] ?? 0),
    inducedDrag: (alphaRad) => drag((k) => (lifting?.[k] ?? 0) * alphaRad + (twisted?.[k] ?? 0)),
  };
}

/** Span efficiency CL^2 / (pi A CDi) of the load of angle of attack alone; null where a lifting line does not apply. */
export function liftingLineEfficiency(stations: readonly LiftingLineStation[]): number | null {
  const line = liftingLine(stations);
  return line && 1 / (1 + line.delta);
}

interface Solving {
  readonly stations: readonly LiftingLineStation[];
  readonly half: number;
  readonly sectionSlope: number;
  readonly terms: number;
}

/**
 * The terms A_n of the load by a unit angle and by the incidences (odd n), or by a unit roll rate (even n), from Glauert's equation
 * sum(A_n sin nt (n m + sin t)) = m a sin t, m = a0 c / 4b, met at as many places of the half span.
 */
function series({ stations, half, sectionSlope, terms }: Solving, load: 'lift' | 'roll'): Float64Array[] {
  const matrix = new Float64Array(terms * terms);
  const columns = load === 'lift' ? 2 : 1;
  const sides = new Float64Array(terms * columns);
  const first = load === 'lift' ? 1 : 2;
  for (let i = 0; i < terms; i++) {
    const t = ((i + (load === 'lift' ? 1 : 0.5)) / terms) * (Math.PI / 2);
    const { chord, incidenceRad } = cutAt(stations, half * Math.cos(t));
    const m = (sectionSlope * chord) / (8 * half);
    for (let k = 0; k < terms; k++) {
      const n = 2 * k + first;
      matrix[i * terms + k] = Math.sin(n * t) * (n * m + Math.sin(t));
    }
    sides[i * columns] = m * Math.sin(t) * (load === 'lift' ? 1 : Math.cos(t));
    if (load === 'lift') sides[i * columns + 1] = m * Math.sin(t) * incidenceRad;
  }
  const factors = factor(matrix, terms);
  if (!factors.ok) throw new RangeError(`the lifting line of ${terms} terms is singular`);
  solve(factors.value, sides, columns);
  return Array.from({ length: columns }, (_, c) => sides.filter((_value, at) => at % columns === c));
}

function halfArea(stations: readonly LiftingLineStation[]): number {
  return stations.reduce((sum, b, i) => {
    const a = stations[i - 1] ?? b;
    return sum + ((b.y - a.y) * (a.chord + b.chord)) / 2;
  }, 0);
}

/** The cut at y, straight between the stations beside it; a step lies within one place of the equation of where it stands. */
function cutAt(stations: readonly LiftingLineStation[], y: number): LiftingLineStation {
  const index = stations.findIndex((station) => station.y >= y);
  const b = stations[index] ?? stations.at(-1);
  const a = stations[Math.max(0, index - 1)] ?? b;
  if (!a || !b) throw new RangeError('a lifting line needs stations');
  const t = b.y > a.y ? (y - a.y) / (b.y - a.y) : 0;
  return {
    y,
    chord: a.chord + (b.chord - a.chord) * t,
    incidenceRad: a.incidenceRad + (b.incidenceRad - a.incidenceRad) * t,
  };
}
