import { m } from '@/lib/airframe/defaults';
import type { Material } from '@/lib/airframe/schema/stock';

// How stiff and strong stock is where the document does not say. From memory unless a source is named: a bending test of an offcut is better.

/** Softest, likely and stiffest; a figure is worked out at each of them. */
export type Stiffness = 'low' | 'likely' | 'high';
type Spread = Readonly<Record<Stiffness, number>>;

interface SheetModuli {
  /** Modulus of the sheet, or of a faced board's core, MPa. */
  readonly coreMpa: Spread;
  /** Shear modulus over modulus. */
  readonly shearShare: number;
}

const spread = (low: number, likely: number, high: number): Spread => ({ low, likely, high });

export const SHEET_MODULI = {
  paperFacedBoard: m({ coreMpa: spread(6, 10, 16), shearShare: 0.4 }, 'MPa', 'polystyrene core near 35 kg/m³'),
  xps: m(
    { coreMpa: spread(10, 22, 35), shearShare: 0.4 },
    'MPa',
    'along the sheet, near 37 kg/m³; three-point bending tests of 26 to 49 kg/m³ by M. Drela and P. Barnes (2003) gave 8 to 34',
  ),
  epp: m({ coreMpa: spread(2, 4, 7), shearShare: 0.4 }, 'MPa', 'EPP of 20 kg/m³'),
  balsa: m({ coreMpa: spread(1800, 3000, 4500), shearShare: 0.05 }, 'MPa', 'along the grain, medium'),
  ply: m({ coreMpa: spread(4500, 6500, 9000), shearShare: 0.1 }, 'MPa', 'birch'),
} as const satisfies Record<Material['kind'], { readonly value: SheetModuli }>;

/** Paper of faced board: mean of along and across its grain. Shear by the rule of Baum for paper, 0.39 of that mean. */
export const PAPER = {
  mpa: m(spread(2500, 3500, 5000), 'MPa', 'mean of along and across the grain'),
  shearShare: m(0.39, '', 'Baum and others, Tappi Journal 64(8) 1981'),
  densityKgM3: m(800, 'kg/m³', 'so that 80 g/m² are 0.1 mm'),
} as const;

/** A modulus that the document states was measured in bending; what shear makes of it is known no better than this share. */
export const MEASURED_SPREAD = m(0.2, '', 'a bending test says little of shear');

/** Bought bars without figures of their own: pultruded carbon. */
export const BAR = {
  gpa: m(110, 'GPa', 'pultruded carbon, 100 to 120'),
  shearGpa: m(spread(3.5, 4.5, 5.5), 'GPa', 'pultruded carbon: the fibres run along it'),
  /** A box glued of foam sheet has the sheet's. */
  foamBoxGpa: m(0.03, 'GPa', 'foam sheet'),
  strengthMpa: m(600, 'MPa', 'pultruded carbon in bending, the low end of 600 to 1000: it fails on the pressed side'),
} as const;

/** A spar should be stressed no higher than its strength over this. */
export const SPAR_SAFETY = m(1.5, '', 'the usual factor of light aircraft');
