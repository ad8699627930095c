import { airAt } from '@/lib/aero/atmosphere';
import type { AeroModel, SymmetricEffect } from '@/lib/aero/model';
import { resolve } from '@/lib/airframe/resolve';
import type { Airframe } from '@/lib/airframe/schema/airframe';
import type { FigureContext } from '@/lib/figures/context';
import { areasOf } from '@/lib/figures/reference';
import { stabilityOf } from '@/lib/figures/stability';
import { exactly, type Spread } from '@/lib/numerics/spread';

// A model in pitch by its derivatives, and the context of figures around it: no lattice has a say in what comes out.

const NONE = { side: 0, roll: 0, yaw: 0 } as const;

interface PitchDerivatives {
  readonly base?: SymmetricEffect;
  readonly alpha?: SymmetricEffect;
  readonly controls?: ReadonlyMap<string, SymmetricEffect>;
  readonly contributions?: AeroModel['contributions'];
  readonly cgX?: number;
}

/** An aircraft of 0.18 m2 and 182 mm of chord, stable by 11 % of it, with an elevator on a tail. */
export function pitchModel({
  base = { lift: 0.15, pitch: 0.02 },
  alpha = { lift: 4.5, pitch: -0.5 },
  controls = new Map([['tail/elevator', { lift: 0.5, pitch: -1.4 }]]),
  contributions = [],
  cgX = 60,
}: PitchDerivatives = {}): AeroModel {
  const chord = 182;
  return {
    reference: { area: 180_000, chord, span: 1000, point: [cgX, 0, 0] },
    base,
    alpha,
    pitchRate: { lift: 7, pitch: -12 },
    controls,
    neutralPointX: cgX - (chord * alpha.pitch) / alpha.lift,
    contributions,
    lateral: () => ({ beta: NONE, rollRate: NONE, yawRate: NONE, controls: new Map() }),
    inducedDrag: () => 0,
    spanEfficiency: 0.95,
  };
}

/** The context that a document has with a model, 500 g at sea level; the CG is the model's own point. */
export function pitchContext(
  document: Airframe,
  model: AeroModel = pitchModel(),
  clMax: Spread = exactly(0.8),
): FigureContext {
  const resolved = resolve(document);
  if (!resolved.ok) throw new RangeError('does not resolve');
  const areas = areasOf(document, resolved.value);
  if (!areas.wing.ok) throw new RangeError('no wing');
  const wing = areas.wing.value;
  return {
    airframe: document,
    resolved: resolved.value,
    areas,
    wing,
    lines: [],
    balance: {
      massG: 500,
      cg: model.reference.point,
      inertiaKgM2: { xx: 0.01, yy: 0.02, zz: 0.03, xy: 0, xz: 0, yz: 0 },
    },
    model,
    stability: stabilityOf(document, wing, model, clMax),
    air: airAt(0),
  };
}
