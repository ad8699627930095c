import type { SectionShape } from '@/lib/airframe/schema/surface';
import { monotoneCurve } from '@/lib/numerics/monotone';
import { type Spread, spread } from '@/lib/numerics/spread';
import { laminarFriction, plateFriction } from './friction';

// Drag of a section of sheet without lift, by its chord; and what lift adds to it. Sources: S. F. Hoerner, "Fluid-Dynamic Drag" (1965),
// from memory; A. Pelletier and T. J. Mueller, Journal of Aircraft 37(5) 2000, pp. 825-832.

/** What of a section's shape makes drag. Shares of the chord. */
export interface DragSection {
  readonly kind: SectionShape['kind'];
  readonly thickness: number;
  /** Height of the cut front edge, and of the blunt back edge. */
  readonly frontEdge: number;
  readonly backEdge: number;
  /** Where the boundary layer turns turbulent. */
  readonly transition: number;
}

/** A cut edge trips the layer at once; a fold keeps it laminar to its thickest place, a slab about to there, a turbulator ends that early. */
const TRANSITION = { slab: 0.3, turbulator: 0.1 } as const;

/** The section of a panel where its chord is `chordMm`, cut from a sheet; the layers of a stepped one are `layersMm` thick together. */
export function dragSection(section: SectionShape, chordMm: number, sheetMm: number, layersMm: number): DragSection {
  const sheet = Math.min(1, sheetMm / chordMm);
  switch (section.kind) {
    case 'flat':
      return { kind: 'flat', thickness: sheet, frontEdge: sheet, backEdge: sheet, transition: 0 };
    case 'stepped': {
      const thickness = Math.min(1, (sheetMm + layersMm) / chordMm);
      // Each step is one more blunt edge facing aft; layers that begin at the front make that edge higher.
      return { kind: 'stepped', thickness, frontEdge: thickness, backEdge: thickness, transition: 0 };
    }
    case 'folded': {
      const transition = section.turbulatorMm === undefined ? section.maxAt : TRANSITION.turbulator;
      return { kind: 'folded', thickness: section.thicknessShare, frontEdge: 0, backEdge: sheet, transition };
    }
    case 'slab':
      return {
        kind: 'slab',
        thickness: section.thicknessShare,
        frontEdge: 0,
        backEdge: 0,
        transition: TRANSITION.slab,
      };
  }
}

/** Thickness makes the flow faster: 1 + 2 t + 60 t^4 (Hoerner, ch. 6). */
const formFactor = (thickness: number): number => 1 + 2 * thickness + 60 * thickness ** 4;

/**
 * Friction of both sides with the form factor. The low end is a layer that stays laminar, the high end 10 % over the value: paper and
 * tape are not smooth.
 */
export function frictionDrag({ thickness, transition }: DragSection, reynolds: number): Spread {
  const both = 2 * formFactor(thickness);
  const value = both * plateFriction(reynolds, transition);
  return { value, low: Math.min(value, both * laminarFriction(reynolds)), high: 1.1 * value };
}

/**
 * Pressure drag of a cut front edge over its own height: near nothing when it is well rounded, about 0.7 when it is left square (Hoerner,
 * ch. 3, from memory); a builder's is between.
 */
const FRONT_EDGE: Spread = { value: 0.2, low: 0.02, high: 0.7 };
/** Thin plates showed little of their back edge's shape (Pelletier & Mueller), so the low end is far down. */
const BACK_EDGE: Spread = { value: 1, low: 0.3, high: 1.3 };

/**
 * Pressure drag of the two edges. The front one feels the stream across it, so sweep takes the square of its cosine; the back one sucks
 * by 0.135 / cbrt(Cf), Cf the friction over the edge's own height (Hoerner, ch. 3, blunt trailing edges; also J. Aeron. Sci. 1950).
 */
export function edgeDrag({ frontEdge, backEdge }: DragSection, friction: number, sweepRad: number): Spread {
  const front = frontEdge * Math.cos(sweepRad) ** 2;
  if (backEdge === 0) return spread((end) => front * FRONT_EDGE[end]);
  const base = (backEdge * 0.135) / Math.cbrt(friction / backEdge);
  return spread((end) => front * FRONT_EDGE[end] + base * BACK_EDGE[end]);
}

/**
 * What lift adds to the drag of a plate, by its share of the greatest lift coefficient. From a flat plate of aspect ratio 2 at Re 140 000:
 * CD 0.015, 0.03, 0.08, 0.18, 0.28 at CL 0, 0.30, 0.50, 0.70, 0.75, less 0.015 and less the CL^2 / (2 pi) that its tips cost.
 */
const plateGrowth = monotoneCurve([
  [0, 0],
  [0.3 / 0.75, 0.0007],
  [0.5 / 0.75, 0.0252],
  [0.7 / 0.75, 0.087],
  [1, 0.1755],
]);
/** A curved nose keeps half of the suction that a plate loses. From memory, no source. */
const CURVED_SHARE = 0.5;
/** How far the growth may be off either way, as a share of it. Common practice, no source. */
export const GROWTH_OFF = 0.4;

/**
 * Growth of the profile drag coefficient with lift, up to the stall.
 * @param share lift coefficient over the greatest; beyond 1 the wing has stalled, and a RangeError says so
 */
export function liftedDrag(kind: SectionShape['kind'], share: number): number {
  if (!(Math.abs(share) <= 1 + 1e-9)) throw new RangeError(`past the stall: ${share} of the greatest lift`);
  return plateGrowth(Math.abs(share)) * (kind === 'flat' || kind === 'stepped' ? 1 : CURVED_SHARE);
}
