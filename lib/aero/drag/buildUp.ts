import type { ResolvedAirframe, ResolvedPanel, ResolvedSurface } from '@/lib/airframe/resolved';
import type { Airframe } from '@/lib/airframe/schema/airframe';
import { independentSum, type Spread, spread } from '@/lib/numerics/spread';
import { radFromDeg } from '@/lib/numerics/vec';
import { type Air, reynoldsNumber } from '../atmosphere';
import { bodyDragArea } from './bodies';
import { boomDragArea, gearDragArea, motorDragArea } from './fittings';
import { dragSection, edgeDrag, frictionDrag } from './section';

// Drag without lift, piece by piece, as areas: what each would cost as that many mm2 of full dynamic pressure.

export type DragKind = 'friction' | 'edges' | 'gaps' | 'body' | 'boom' | 'gear' | 'motor' | 'small';

/** One piece of the drag. */
export interface DragItem {
  /** Null for what belongs to the whole aircraft. */
  readonly elementId: string | null;
  readonly kind: DragKind;
  readonly areaMm2: Spread;
}

/** Strips that each panel is cut into: the Reynolds number goes with the chord. */
const STRIPS = 4;
/** What the gap at a hinge adds, as a share of the drag of the length it runs over. Common practice, no source. */
const GAP_SHARE: Spread = { value: 0.05, low: 0.02, high: 0.12 };
/** Horns, rods, wires, aerials and junctions, as a share of all the rest. Common practice, no source. */
const SMALL_SHARE: Spread = { value: 0.1, low: 0.05, high: 0.25 };

/**
 * Drag of an airframe at a speed without lift, itemised: friction and edges of each surface strip by strip, hinge gaps, bodies, booms,
 * gear, motors, and a share for what is too small to draw. A surface counts whole where it passes through a body.
 */
export function dragBuildUp(airframe: Airframe, resolved: ResolvedAirframe, speedMs: number, air: Air): DragItem[] {
  const items: DragItem[] = [
    ...resolved.surfaces.flatMap((surface) => surfaceItems(airframe, surface, speedMs, air)),
    ...airframe.bodies.map((body) => item(body.id, 'body', bodyDragArea(body, speedMs, air))),
    ...airframe.booms.map((boom) => item(boom.id, 'boom', boomDragArea(boom, airframe, speedMs, air))),
    ...airframe.gear.map((gear) => item(gear.id, 'gear', gearDragArea(gear, airframe))),
    ...airframe.drives.map((drive) => item(drive.id, 'motor', motorDragArea(drive))),
  ].filter(({ areaMm2 }) => areaMm2.value > 0);
  const rest = items.reduce((sum, { areaMm2 }) => sum + areaMm2.value, 0);
  return [
    ...items,
    item(
      null,
      'small',
      spread((end) => rest * SMALL_SHARE[end]),
    ),
  ];
}

const item = (elementId: string | null, kind: DragKind, areaMm2: Spread): DragItem => ({ elementId, kind, areaMm2 });

/** All items together, mm2. Pieces of one kind are off the same way; kinds have nothing to do with each other. */
export function dragAreaOf(items: readonly DragItem[]): Spread {
  const kinds = new Map<DragKind, Spread[]>();
  for (const { kind, areaMm2 } of items) kinds.set(kind, [...(kinds.get(kind) ?? []), areaMm2]);
  return independentSum([...kinds.values()].map(sumOf));
}

const sumOf = (parts: readonly Spread[]): Spread => spread((end) => parts.reduce((sum, part) => sum + part[end], 0));

function surfaceItems(airframe: Airframe, resolved: ResolvedSurface, speedMs: number, air: Air): DragItem[] {
  const { surface, panels } = resolved;
  const strips = panels.flatMap((panel) => panelStrips(airframe, panel, speedMs, air));
  const sides = surface.mirrored ? 2 : 1;
  const friction = sumOf(strips.map((strip) => strip.friction));
  const edges = sumOf(strips.map((strip) => strip.edges));
  const hinged = surface.controls.reduce(
    (sum, { kind, from, to }) => (kind === 'allMoving' ? sum : sum + Math.max(0, to - from)),
    0,
  );
  const gap = (friction.value + edges.value) * Math.min(1, hinged);
  const both = (at: Spread) => spread((end) => sides * at[end]);
  return [
    item(surface.id, 'friction', both(friction)),
    item(surface.id, 'edges', both(edges)),
    item(surface.id, 'gaps', both(spread((end) => gap * GAP_SHARE[end]))),
  ];
}

/** Drag areas of the strips of one panel, one side. */
function panelStrips(airframe: Airframe, { panel, root, tip }: ResolvedPanel, speedMs: number, air: Air) {
  const thickness = (id: string) => airframe.materials.find((m) => m.id === id)?.thicknessMm ?? 0;
  const { section } = panel;
  const layersMm =
    section.kind === 'stepped' ? section.layers.reduce((sum, { materialId }) => sum + thickness(materialId), 0) : 0;
  return Array.from({ length: STRIPS }, (_, i) => {
    const chordMm = root.chordMm + ((tip.chordMm - root.chordMm) * (i + 0.5)) / STRIPS;
    const shape = dragSection(section, chordMm, thickness(panel.materialId), layersMm);
    const areaMm2 = (panel.lengthMm / STRIPS) * chordMm;
    const friction = frictionDrag(shape, reynoldsNumber(speedMs, chordMm / 1000, air));
    const edges = edgeDrag(shape, friction.value, radFromDeg(panel.sweepDeg));
    return {
      friction: spread((end) => areaMm2 * friction[end]),
      edges: spread((end) => areaMm2 * edges[end]),
    };
  });
}
