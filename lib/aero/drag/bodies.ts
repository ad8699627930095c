import type { Body } from '@/lib/airframe/schema/fuselage';
import { type Spread, spread } from '@/lib/numerics/spread';
import { type Air, reynoldsNumber } from '../atmosphere';
import { turbulentFriction } from './friction';

// Drag of a box of sheet along the stream, as an area in mm2. S. F. Hoerner, "Fluid-Dynamic Drag" (1965), from memory.

/** A box whose corners are sharp separates along them: D. P. Raymer, "Aircraft Design", ch. 12, some 40 %. */
const SQUARE_CORNERS = 1.4;
/** Pressure drag of a flat nose over its area: rounded off with a motor in it, against left square (0.8). From memory. */
const FLAT_NOSE: Spread = { value: 0.35, low: 0.1, high: 0.8 };
/** Form, base and joints of a hand-made box: how far the value may be off. Common practice, no source. */
const BOX_OFF: Spread = { value: 1, low: 0.75, high: 1.4 };

/**
 * Drag area of a body: friction of its wetted area, turbulent from the nose, times the form factor 1 + 60 / f^3 + f / 400 of its fineness
 * f (Raymer, ch. 12, after Hoerner), the base's suction 0.029 / sqrt(Cf) over the base (Hoerner, ch. 3), and the flat nose.
 */
export function bodyDragArea({ stations }: Pick<Body, 'stations'>, speedMs: number, air: Air): Spread {
  const [first, last] = [stations[0], stations.at(-1)];
  const lengthMm = (last?.xMm ?? 0) - (first?.xMm ?? 0);
  const wetted = wettedArea(stations);
  const largest = stations.reduce((most, s) => Math.max(most, frameArea(s)), 0);
  if (!first || !last || !(lengthMm > 0 && wetted > 0 && largest > 0)) return { value: 0, low: 0, high: 0 };
  const friction = turbulentFriction(reynoldsNumber(speedMs, lengthMm / 1000, air)) * wetted;
  const fineness = lengthMm / Math.sqrt((4 * largest) / Math.PI);
  const square = stations.some(({ cornerMm }) => cornerMm > 0) ? 1 : SQUARE_CORNERS;
  const sides = friction * (1 + 60 / fineness ** 3 + fineness / 400) * square;
  const baseArea = frameArea(last);
  const base = baseArea > 0 ? (baseArea * 0.029) / Math.sqrt(friction / baseArea) : 0;
  return spread((end) => (sides + base) * BOX_OFF[end] + frameArea(first) * FLAT_NOSE[end]);
}

type Frame = Body['stations'][number];

const frameArea = ({ widthMm, topMm, bottomMm }: Frame): number => widthMm * Math.max(0, topMm - bottomMm);
const girth = ({ widthMm, topMm, bottomMm }: Frame): number => 2 * (widthMm + Math.max(0, topMm - bottomMm));

function wettedArea(stations: readonly Frame[]): number {
  return stations.reduce((sum, b, i) => {
    const a = stations[i - 1];
    return a ? sum + (Math.abs(b.xMm - a.xMm) * (girth(a) + girth(b))) / 2 : sum;
  }, 0);
}
