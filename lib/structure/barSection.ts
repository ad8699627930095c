import type { Tube } from '@/lib/airframe/schema/stock';

// Sections of bought tubes, rods and strips. Lengths mm.

export interface BarSection {
  /** Second moment of area for bending up and down, mm4. */
  readonly inertiaMm4: number;
  /** Section modulus at the outermost fibre, mm3. */
  readonly modulusMm3: number;
  /** Torsion constant, mm4: the polar second moment of a round section. */
  readonly torsionMm4: number;
}

/**
 * Section of a tube or rod (round, or an ellipse where its two sizes differ), a strip, or a box of sheet. Sizes are width and height, mm.
 * pi (D^4 - d^4) / 64 and the like: Young & Budynas, "Roark's Formulas for Stress and Strain", tables A.1 and 10.1.
 */
export function barSection({ kind, outerMm, innerMm }: Pick<Tube, 'kind' | 'outerMm' | 'innerMm'>): BarSection {
  const [w, h] = outerMm;
  const inner = kind === 'rod' ? [0, 0] : (innerMm ?? [0, 0]);
  const [wi = 0, hi = 0] = inner;
  const round = kind === 'tube' || kind === 'rod';
  const inertiaMm4 = round ? (Math.PI / 64) * (w * h ** 3 - wi * hi ** 3) : (w * h ** 3 - wi * hi ** 3) / 12;
  const torsionMm4 = round ? ellipseTorsion(w, h) - ellipseTorsion(wi, hi) : boxTorsion(w, h, wi, hi);
  return { inertiaMm4, modulusMm3: inertiaMm4 / (h / 2), torsionMm4 };
}

/** Roark, table 10.1, case 2: pi a^3 b^3 / (a^2 + b^2) with the half axes. */
const ellipseTorsion = (w: number, h: number): number =>
  w > 0 && h > 0 ? (Math.PI / 16) * ((w * h) ** 3 / (w ** 2 + h ** 2)) : 0;

/** A hollow one as a thin closed cell by Bredt and Batho, 4 A^2 over the line integral of ds / t; a full one by Roark, table 10.1, case 4. */
function boxTorsion(w: number, h: number, wi: number, hi: number): number {
  if (wi > 0 && hi > 0) {
    const [side, cap] = [(w - wi) / 2, (h - hi) / 2];
    const [across, up] = [w - side, h - cap];
    return (4 * (across * up) ** 2) / ((2 * across) / cap + (2 * up) / side);
  }
  const [a, b] = [Math.max(w, h) / 2, Math.min(w, h) / 2];
  return a * b ** 3 * (16 / 3 - 3.36 * (b / a) * (1 - b ** 4 / (12 * a ** 4)));
}
