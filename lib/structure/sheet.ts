import type { Material } from '@/lib/airframe/schema/stock';
import { MEASURED_SPREAD, PAPER, SHEET_MODULI, type Stiffness } from './moduli';

// Stiffness of flat sheet: plain, faced with paper, or several glued on each other. Lengths mm, moduli MPa; what is given per width is
// per mm of chord.

/** A layer of one stuff. */
export interface Layer {
  readonly thicknessMm: number;
  readonly modulusMpa: number;
  readonly shearMpa: number;
  /** A stiff face over a soft core. */
  readonly face: boolean;
}

/** Layers of one sheet from its lower face up; a board that is faced has paper on both sides. */
export function sheetLayers(material: Material, stiffness: Stiffness): Layer[] {
  const { kind, thicknessMm, facesGm2, eMpa } = material;
  const { coreMpa, shearShare } = SHEET_MODULI[kind].value;
  const core = coreMpa[stiffness];
  const faceMm = kind === 'paperFacedBoard' ? facesGm2 / 2 / PAPER.densityKgM3.value : 0;
  const coreMm = thicknessMm - 2 * faceMm;
  const measured = eMpa === undefined ? null : eMpa * MEASURED[stiffness];
  if (!(faceMm > 0 && coreMm > 0)) {
    const modulusMpa = measured ?? core;
    return [{ thicknessMm, modulusMpa, shearMpa: modulusMpa * shearShare, face: false }];
  }
  // A board's modulus as measured counts for its whole thickness, and it is the faces that give it.
  const facesOnly = thicknessMm ** 3 / (thicknessMm ** 3 - coreMm ** 3);
  const paper = measured === null ? PAPER.mpa.value[stiffness] : measured * facesOnly;
  const face: Layer = {
    thicknessMm: faceMm,
    modulusMpa: paper,
    shearMpa: paper * PAPER.shearShare.value,
    face: true,
  };
  const soft = measured === null ? core : 0;
  return [face, { thicknessMm: coreMm, modulusMpa: soft, shearMpa: core * shearShare, face: false }, face];
}

const MEASURED: Readonly<Record<Stiffness, number>> = {
  low: 1 - MEASURED_SPREAD.value,
  likely: 1,
  high: 1 + MEASURED_SPREAD.value,
};

/** Layers glued on each other, with what they come to. */
export interface Stack {
  readonly layers: readonly Layer[];
  /** Modulus by second moment about the layers' own middle, N mm2 per mm of width. */
  readonly bendingPerWidth: number;
  /** The same of the shear modulus: of the cores, and of the faces. */
  readonly coreTwist: number;
  readonly faceTwist: number;
  /** How fast the faces' part builds up from the strip's edges, 1/mm; null without a soft core between them. */
  readonly edgeRate: number | null;
}

export function stackOf(layers: readonly Layer[]): Stack {
  const shear = stackMoment(layers, ({ shearMpa }) => shearMpa);
  return {
    layers,
    bendingPerWidth: stackMoment(layers, ({ modulusMpa }) => modulusMpa).whole,
    coreTwist: shear.whole - shear.faces,
    faceTwist: shear.faces,
    edgeRate: edgeRate(layers),
  };
}

/**
 * Torsional stiffness of an open strip, N mm2: four times its width by the integral of G z^2. For one plain layer that is c t^3 G / 3
 * (Roark, table 10.1). Faces over a soft core are held less near the strip's edges: their part is lowered by 1 - tanh(u) / u with
 * u = k c / 2, k^2 = 2 Gc / (Gf tf h), from the least strain energy of faces and core together (the theory of P. Seide, "On the torsion
 * of rectangular sandwich plates", Journal of Applied Mechanics 23, 1956, from memory).
 */
export function stripTorsion({ coreTwist, faceTwist, edgeRate: k }: Stack, widthMm: number): number {
  const u = k === null ? Number.POSITIVE_INFINITY : (k * widthMm) / 2;
  return 4 * widthMm * (coreTwist + faceTwist * (1 - Math.tanh(u) / u));
}

function edgeRate(layers: readonly Layer[]): number | null {
  const face = layers.find((layer) => layer.face);
  const core = layers.find((layer) => !layer.face);
  if (!face || !core) return null;
  const heightMm = core.thicknessMm + face.thicknessMm;
  return Math.sqrt((2 * core.shearMpa) / (face.shearMpa * face.thicknessMm * heightMm));
}

/** Integral of modulus by z squared over the thickness, about the layers' common middle; and the faces' part of it. */
function stackMoment(layers: readonly Layer[], modulus: (layer: Layer) => number): { whole: number; faces: number } {
  let [weight, moment, z] = [0, 0, 0];
  for (const layer of layers) {
    const area = modulus(layer) * layer.thicknessMm;
    weight += area;
    moment += area * (z + layer.thicknessMm / 2);
    z += layer.thicknessMm;
  }
  const middle = moment / weight;
  let [whole, faces] = [0, 0];
  z = 0;
  for (const layer of layers) {
    const [a, b] = [z - middle, z + layer.thicknessMm - middle];
    const part = (modulus(layer) * (b ** 3 - a ** 3)) / 3;
    whole += part;
    if (layer.face) faces += part;
    z += layer.thicknessMm;
  }
  return { whole, faces };
}
